//! Materials.

use crate::choice;
use crate::guard;
use crate::handle::{self, Slot};
use crate::text::{self, TextOut};
use beamcore::material::concrete::ConcreteCreep;
use beamcore::material::{Creep, DesignStrength, Material, ServiceClass, concrete, steel, timber};
use beamcore::units::{Density, Duration, Length, Modulus, Stress};
use std::ffi::c_char;

/// A material: elastic values, density, creep and design strengths of one stuff.
pub struct BcMaterial(pub(crate) Material);

/// Solid or glued laminated timber of a strength class ("C24", "GL28h"), in service class 1, 2
/// or 3: E, mean density and creep factor of the class.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_timber(
    class_name: *const c_char,
    service_class: i32,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (class_name, out) = unsafe {
            (
                text::read(class_name, "class_name")?,
                Slot::new(material_out, "material_out")?,
            )
        };
        let service_class = ServiceClass::from_number(i64::from(service_class))?;
        out.give(BcMaterial(timber(class_name, service_class)?));
        Ok(())
    })
}

/// Structural steel of a class ("S275"): E and density; no creep.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_steel(
    class_name: *const c_char,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (class_name, out) = unsafe {
            (
                text::read(class_name, "class_name")?,
                Slot::new(material_out, "material_out")?,
            )
        };
        out.give(BcMaterial(steel(class_name)?));
        Ok(())
    })
}

/// Concrete of a class ("C30/37") with its creep factor phi as a number: E_cm and density.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_concrete(
    class_name: *const c_char,
    creep_factor: f64,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (class_name, out) = unsafe {
            (
                text::read(class_name, "class_name")?,
                Slot::new(material_out, "material_out")?,
            )
        };
        out.give(BcMaterial(concrete(
            class_name,
            &Creep::factor(creep_factor),
        )?));
        Ok(())
    })
}

/// Concrete of a class with its creep factor calculated: mean strength f_cm, relative humidity in
/// percent (50 means 50 %), notional size h0 = 2 A/u, the ages at which the load comes on and at
/// which the creep is asked for, and the cement (BC_CEMENT_...).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_concrete_with_creep(
    class_name: *const c_char,
    mean_strength_Pa: f64,
    relative_humidity_percent: f64,
    notional_size_m: f64,
    age_at_loading_s: f64,
    age_at_end_s: f64,
    cement: i32,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (class_name, out) = unsafe {
            (
                text::read(class_name, "class_name")?,
                Slot::new(material_out, "material_out")?,
            )
        };
        let creep = Creep::concrete(&ConcreteCreep {
            mean_strength: Stress::from_Pa(mean_strength_Pa),
            relative_humidity_percent,
            notional_size: Length::from_m(notional_size_m),
            age_at_loading: Duration::from_s(age_at_loading_s),
            age_at_end: Duration::from_s(age_at_end_s),
            cement: choice::cement(cement)?,
        })?;
        out.give(BcMaterial(concrete(class_name, &creep)?));
        Ok(())
    })
}

/// A material by its values: name, modulus of elasticity E and creep factor (0 for none). The
/// values are checked when the material is used in a section.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_new(
    name: *const c_char,
    modulus_Pa: f64,
    creep_factor: f64,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (name, out) = unsafe {
            (
                text::read(name, "name")?,
                Slot::new(material_out, "material_out")?,
            )
        };
        let modulus = Modulus::from_Pa(modulus_Pa);
        out.give(BcMaterial(Material::new(
            name,
            modulus,
            Creep::factor(creep_factor),
        )));
        Ok(())
    })
}

/// A new material with other data than the given one, made by `change`.
///
/// # Safety
/// As for the functions of the ABI.
pub(crate) unsafe fn changed(
    material: *const BcMaterial,
    material_out: *mut *mut BcMaterial,
    change: impl FnOnce(Material) -> Material,
) -> i32 {
    guard::status(|| {
        // SAFETY: by this function's own contract.
        let (material, out) = unsafe {
            (
                handle::shared(material, "material")?,
                Slot::new(material_out, "material_out")?,
            )
        };
        out.give(BcMaterial(change(material.0.clone())));
        Ok(())
    })
}

/// Writes a value that may be unknown.
pub(crate) fn write_optional(value: Option<f64>, has_out: Slot<i32>, value_out: Slot<f64>) {
    has_out.put(i32::from(value.is_some()));
    if let Some(value) = value {
        value_out.put(value);
    }
}

/// The same material under another name.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_named(
    material: *const BcMaterial,
    name: *const c_char,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (material, name, out) = unsafe {
            (
                handle::shared(material, "material")?,
                text::read(name, "name")?,
                Slot::new(material_out, "material_out")?,
            )
        };
        out.give(BcMaterial(material.0.clone().named(name)));
        Ok(())
    })
}

/// The same material with a mean density, from which self-weight follows.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_with_density(
    material: *const BcMaterial,
    density_kg_per_m3: f64,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    let density = Density::from_kg_per_m3(density_kg_per_m3);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(material, material_out, |m| m.density(density)) }
}

/// The same material with design strengths of timber along the grain: bending f_m,d, tension
/// f_t,0,d and compression f_c,0,d.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_with_timber_strength(
    material: *const BcMaterial,
    bending_Pa: f64,
    tension_Pa: f64,
    compression_Pa: f64,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    let strength = DesignStrength::Timber {
        bending: Stress::from_Pa(bending_Pa),
        tension: Stress::from_Pa(tension_Pa),
        compression: Stress::from_Pa(compression_Pa),
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(material, material_out, |m| m.design_strength(strength)) }
}

/// The same material with the design yield strength f_y,d of a metal.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_with_metal_strength(
    material: *const BcMaterial,
    yield_Pa: f64,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    let strength = DesignStrength::Metal {
        yield_stress: Stress::from_Pa(yield_Pa),
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(material, material_out, |m| m.design_strength(strength)) }
}

/// The modulus at a time: E at first, E/(1 + creep factor) at the end.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_modulus(
    material: *const BcMaterial,
    time: i32,
    modulus_Pa_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (material, out) = unsafe {
            (
                handle::shared(material, "material")?,
                Slot::new(modulus_Pa_out, "modulus_Pa_out")?,
            )
        };
        out.put(material.0.modulus_at(choice::time(time)?).si());
        Ok(())
    })
}

/// The name of a material, by which results and errors speak of it.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_name(
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
        out.put(material.0.name())
    })
}

/// Frees a material; NULL is allowed.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_free(material: *mut BcMaterial) {
    // SAFETY: the caller keeps the header's contract for this pointer.
    guard::free(|| unsafe { handle::free(material) });
}
