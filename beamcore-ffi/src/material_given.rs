//! Materials of a class and a thickness, and values that replace those of a class.

use crate::guard;
use crate::handle::Slot;
use crate::material::{BcMaterial, changed};
use crate::text;
use beamcore::material::{Creep, Material, aluminium, steel_of_thickness};
use beamcore::units::{Density, Length, Modulus, ThermalExpansion};
use std::ffi::c_char;

/// A new material of a class and a thickness, made by `make`.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn of_thickness(
    class_name: *const c_char,
    thickness_m: f64,
    material_out: *mut *mut BcMaterial,
    make: fn(&str, Length) -> beamcore::Result<Material>,
) -> i32 {
    guard::status(|| {
        // SAFETY: by this function's own contract.
        let (class_name, out) = unsafe {
            (
                text::read(class_name, "class_name")?,
                Slot::new(material_out, "material_out")?,
            )
        };
        out.give(BcMaterial(make(class_name, Length::from_m(thickness_m))?));
        Ok(())
    })
}

/// Structural steel of a class ("S275") with the yield and ultimate strengths of a nominal
/// thickness as characteristic strengths.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_steel_of_thickness(
    class_name: *const c_char,
    thickness_m: f64,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { of_thickness(class_name, thickness_m, material_out, steel_of_thickness) }
}

/// Aluminium of an alloy and temper ("EN AW-6082 T6") as an extruded profile of a thickness, with
/// its proof and ultimate strengths away from welds as characteristic strengths.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_aluminium(
    class_name: *const c_char,
    thickness_m: f64,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { of_thickness(class_name, thickness_m, material_out, aluminium) }
}

/// The same material with another mean modulus of elasticity E. The fractile of the modulus and a
/// given shear modulus stay as they are.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_with_modulus(
    material: *const BcMaterial,
    modulus_Pa: f64,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    let modulus = Modulus::from_Pa(modulus_Pa);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(material, material_out, |m| m.modulus_override(modulus)) }
}

/// The same material with a 5 % fractile of the modulus of elasticity, E_05.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_with_fractile_modulus(
    material: *const BcMaterial,
    modulus_Pa: f64,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    let modulus = Modulus::from_Pa(modulus_Pa);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(material, material_out, |m| m.fractile_modulus(modulus)) }
}

/// The same material with a mean shear modulus G; it replaces the shear modulus or Poisson's ratio
/// of a class.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_with_shear_modulus(
    material: *const BcMaterial,
    modulus_Pa: f64,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    let modulus = Modulus::from_Pa(modulus_Pa);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(material, material_out, |m| m.shear_modulus(modulus)) }
}

/// The same material with a Poisson's ratio nu, so that G = E/(2 (1 + nu)); it replaces the shear
/// modulus or Poisson's ratio of a class. Not for timber.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_with_poisson_ratio(
    material: *const BcMaterial,
    ratio: f64,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(material, material_out, |m| m.poisson_ratio(ratio)) }
}

/// The same material with a 5 % fractile of the density, rho_k.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_with_fractile_density(
    material: *const BcMaterial,
    density_kg_per_m3: f64,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    let density = Density::from_kg_per_m3(density_kg_per_m3);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(material, material_out, |m| m.fractile_density(density)) }
}

/// The same material with a thermal expansion alpha, positive where warmth lengthens it.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_with_thermal_expansion(
    material: *const BcMaterial,
    expansion_per_K: f64,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    let expansion = ThermalExpansion::from_per_K(expansion_per_K);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(material, material_out, |m| m.thermal_expansion(expansion)) }
}

/// The same material with another creep factor (0 for no creep).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_with_creep_factor(
    material: *const BcMaterial,
    creep_factor: f64,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    let creep = Creep::factor(creep_factor);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(material, material_out, |m| m.creep_override(creep)) }
}
