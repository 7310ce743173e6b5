//! Values of materials, and where they come from.

use crate::choice;
use crate::fault::Fault;
use crate::guard;
use crate::handle::{self, Slot};
use crate::material::{BcMaterial, write_optional};
use crate::text::TextOut;
use beamcore::material::Material;
use beamcore::units::{Density, Modulus, ThermalExpansion};
use std::ffi::c_char;

/// A value of a material that may be unknown.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn optional(
    material: *const BcMaterial,
    has_value_out: *mut i32,
    value_out: (*mut f64, &str),
    value: impl FnOnce(&Material) -> Result<Option<f64>, Fault>,
) -> i32 {
    guard::status(|| {
        // SAFETY: by this function's own contract.
        let (material, has_out, out) = unsafe {
            (
                handle::shared(material, "material")?,
                Slot::new(has_value_out, "has_value_out")?,
                Slot::new(value_out.0, value_out.1)?,
            )
        };
        write_optional(value(&material.0)?, has_out, out);
        Ok(())
    })
}

/// The 5 % fractile of the modulus of elasticity, E_05. Where it is not known, has_value_out is 0 and
/// the modulus is left as it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_fractile_modulus(
    material: *const BcMaterial,
    has_value_out: *mut i32,
    modulus_Pa_out: *mut f64,
) -> i32 {
    let out = (modulus_Pa_out, "modulus_Pa_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        optional(material, has_value_out, out, |m| {
            Ok(m.modulus_05().map(Modulus::si))
        })
    }
}

/// The shear modulus at a time: G at first, G/(1 + creep factor) at the end, with G as given, else
/// E/(2 (1 + nu)). Where it is not known, has_value_out is 0 and the modulus is left as it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_shear_modulus(
    material: *const BcMaterial,
    time: i32,
    has_value_out: *mut i32,
    modulus_Pa_out: *mut f64,
) -> i32 {
    let out = (modulus_Pa_out, "modulus_Pa_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        optional(material, has_value_out, out, |m| {
            Ok(m.shear_modulus_at(choice::time(time)?).map(Modulus::si))
        })
    }
}

/// Poisson's ratio nu. Where it is not given, has_value_out is 0 and the ratio is left as it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_poisson_ratio(
    material: *const BcMaterial,
    has_value_out: *mut i32,
    ratio_out: *mut f64,
) -> i32 {
    let out = (ratio_out, "ratio_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { optional(material, has_value_out, out, |m| Ok(m.poisson())) }
}

/// The mean density rho_mean. Where it is not known, has_value_out is 0 and the density is left as it
/// is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_density(
    material: *const BcMaterial,
    has_value_out: *mut i32,
    density_kg_per_m3_out: *mut f64,
) -> i32 {
    let out = (density_kg_per_m3_out, "density_kg_per_m3_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        optional(material, has_value_out, out, |m| {
            Ok(m.mean_density().map(Density::si))
        })
    }
}

/// The 5 % fractile of the density, rho_k. Where it is not known, has_value_out is 0 and the density
/// is left as it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_fractile_density(
    material: *const BcMaterial,
    has_value_out: *mut i32,
    density_kg_per_m3_out: *mut f64,
) -> i32 {
    let out = (density_kg_per_m3_out, "density_kg_per_m3_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        optional(material, has_value_out, out, |m| {
            Ok(m.density_05().map(Density::si))
        })
    }
}

/// The thermal expansion alpha. Where it is not known, has_value_out is 0 and the expansion is left as
/// it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_thermal_expansion(
    material: *const BcMaterial,
    has_value_out: *mut i32,
    expansion_per_K_out: *mut f64,
) -> i32 {
    let out = (expansion_per_K_out, "expansion_per_K_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        optional(material, has_value_out, out, |m| {
            Ok(m.expansion().map(ThermalExpansion::si))
        })
    }
}

/// The creep factor, 0 for no creep.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_creep_factor(
    material: *const BcMaterial,
    creep_factor_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (material, out) = unsafe {
            (
                handle::shared(material, "material")?,
                Slot::new(creep_factor_out, "creep_factor_out")?,
            )
        };
        out.put(material.0.creep().value());
        Ok(())
    })
}

/// Where the creep factor comes from.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_creep_basis(
    material: *const BcMaterial,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (material, out) = unsafe {
            (
                handle::shared(material, "material")?,
                TextOut::new(buffer, capacity, length_out)?,
            )
        };
        out.put(material.0.creep().basis())
    })
}

/// The standard, edition and class that the values come from; an empty text if they were given one
/// by one.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_origin(
    material: *const BcMaterial,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (material, out) = unsafe {
            (
                handle::shared(material, "material")?,
                TextOut::new(buffer, capacity, length_out)?,
            )
        };
        out.put(material.0.origin().unwrap_or(""))
    })
}

/// The number of values of the class that were overridden; 0 without a class.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_override_count(
    material: *const BcMaterial,
    count_out: *mut i32,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (material, out) = unsafe {
            (
                handle::shared(material, "material")?,
                Slot::new(count_out, "count_out")?,
            )
        };
        out.put(handle::count(material.0.overrides().len())?);
        Ok(())
    })
}

/// A value of the class that was overridden, as in "density 450 kg/m3 instead of 420 kg/m3".
/// Overrides are counted from 0.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_override(
    material: *const BcMaterial,
    index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (material, out) = unsafe {
            (
                handle::shared(material, "material")?,
                TextOut::new(buffer, capacity, length_out)?,
            )
        };
        out.put(handle::element(material.0.overrides(), index)?)
    })
}
