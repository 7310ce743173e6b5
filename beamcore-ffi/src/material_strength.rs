//! Strengths of materials, and the factors from characteristic to design strengths.

use crate::choice_section::{self, StrengthName};
use crate::guard;
use crate::handle::{self, Slot};
use crate::material::{BcMaterial, changed, write_optional};
use beamcore::material::{
    CharacteristicStrength, ConcreteStrength, DesignFactors, DesignStrength, Material,
    MetalStrength, TimberFactors, TimberStrength,
};
use beamcore::units::Stress;

/// The same material with characteristic strengths of timber along the grain: bending f_m,k,
/// tension f_t,0,k, compression f_c,0,k and shear f_v,k. Stresses are compared with design
/// strengths only: see bc_material_with_timber_factors.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_with_characteristic_timber(
    material: *const BcMaterial,
    bending_Pa: f64,
    tension_Pa: f64,
    compression_Pa: f64,
    shear_Pa: f64,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    let strength = along(bending_Pa, tension_Pa, compression_Pa, shear_Pa);
    let strength = CharacteristicStrength::Timber(strength);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        changed(material, material_out, |m| {
            m.characteristic_strength(strength)
        })
    }
}

/// The same material with characteristic strengths of timber along the grain and, last, across it:
/// tension f_t,90,k and compression f_c,90,k.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_with_characteristic_timber_across(
    material: *const BcMaterial,
    bending_Pa: f64,
    tension_Pa: f64,
    compression_Pa: f64,
    shear_Pa: f64,
    tension_across_Pa: f64,
    compression_across_Pa: f64,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    let strength = along(bending_Pa, tension_Pa, compression_Pa, shear_Pa).across(
        Stress::from_Pa(tension_across_Pa),
        Stress::from_Pa(compression_across_Pa),
    );
    let strength = CharacteristicStrength::Timber(strength);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        changed(material, material_out, |m| {
            m.characteristic_strength(strength)
        })
    }
}

fn along(bending_Pa: f64, tension_Pa: f64, compression_Pa: f64, shear_Pa: f64) -> TimberStrength {
    TimberStrength::new(
        Stress::from_Pa(bending_Pa),
        Stress::from_Pa(tension_Pa),
        Stress::from_Pa(compression_Pa),
        Stress::from_Pa(shear_Pa),
    )
}

/// The same material with the characteristic strength of a metal: yield f_y, or 0.2 % proof f_o.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_with_characteristic_metal(
    material: *const BcMaterial,
    yield_Pa: f64,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    let strength = MetalStrength::new(Stress::from_Pa(yield_Pa));
    let strength = CharacteristicStrength::Metal(strength);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        changed(material, material_out, |m| {
            m.characteristic_strength(strength)
        })
    }
}

/// The same material with the characteristic strengths of a metal, last the ultimate one in
/// tension, f_u.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_with_characteristic_metal_ultimate(
    material: *const BcMaterial,
    yield_Pa: f64,
    ultimate_Pa: f64,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    let strength =
        MetalStrength::new(Stress::from_Pa(yield_Pa)).ultimate(Stress::from_Pa(ultimate_Pa));
    let strength = CharacteristicStrength::Metal(strength);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        changed(material, material_out, |m| {
            m.characteristic_strength(strength)
        })
    }
}

/// The same material with the factors that make design strengths of the characteristic ones of
/// timber: k_mod, the partial factor gamma_M, the size factor k_h and the factor of load sharing
/// k_sys; the last two are 1 where there is none.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_with_timber_factors(
    material: *const BcMaterial,
    k_mod: f64,
    gamma_m: f64,
    k_h: f64,
    k_sys: f64,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    let factors = TimberFactors::new(k_mod, gamma_m).size(k_h).sharing(k_sys);
    let factors = DesignFactors::Timber(factors);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(material, material_out, |m| m.design_factors(factors)) }
}

/// The same material with the partial factor that makes the design strength of the characteristic
/// one of a metal: gamma_M0 of steel, gamma_M1 of aluminium.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_with_metal_factor(
    material: *const BcMaterial,
    gamma_m: f64,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    let factors = DesignFactors::metal(gamma_m);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(material, material_out, |m| m.design_factors(factors)) }
}

/// The same material with a design shear strength, as f_v,d of timber.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_with_shear_strength(
    material: *const BcMaterial,
    shear_Pa: f64,
    material_out: *mut *mut BcMaterial,
) -> i32 {
    let strength = Stress::from_Pa(shear_Pa);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(material, material_out, |m| m.shear_strength(strength)) }
}

/// A strength (BC_STRENGTH_...) of a material. Where it is not known, or is one of another stuff,
/// has_value_out is 0 and the strength is left as it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_material_strength(
    material: *const BcMaterial,
    strength: i32,
    has_value_out: *mut i32,
    strength_Pa_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (material, has_out, out) = unsafe {
            (
                &handle::shared(material, "material")?.0,
                Slot::new(has_value_out, "has_value_out")?,
                Slot::new(strength_Pa_out, "strength_Pa_out")?,
            )
        };
        let strength = strength_of(material, choice_section::strength(strength)?);
        write_optional(strength.map(Stress::si), has_out, out);
        Ok(())
    })
}

/// A strength of a material, if it is known.
fn strength_of(material: &Material, name: StrengthName) -> Option<Stress> {
    use StrengthName as Name;
    match name {
        Name::DesignShear => material.design_shear_strength(),
        Name::DesignBending | Name::DesignTension | Name::DesignCompression | Name::DesignYield => {
            design(material.strength()?, name)
        }
        _ => match material.characteristic()? {
            CharacteristicStrength::Timber(timber) => of_timber(timber, name),
            CharacteristicStrength::Metal(metal) => of_metal(metal, name),
            CharacteristicStrength::Concrete(concrete) => of_concrete(concrete, name),
            _ => None,
        },
    }
}

const fn design(strength: &DesignStrength, name: StrengthName) -> Option<Stress> {
    use StrengthName as Name;
    match (*strength, name) {
        (DesignStrength::Timber { bending, .. }, Name::DesignBending) => Some(bending),
        (DesignStrength::Timber { tension, .. }, Name::DesignTension) => Some(tension),
        (DesignStrength::Timber { compression, .. }, Name::DesignCompression) => Some(compression),
        (DesignStrength::Metal { yield_stress }, Name::DesignYield) => Some(yield_stress),
        _ => None,
    }
}

const fn of_timber(timber: &TimberStrength, name: StrengthName) -> Option<Stress> {
    use StrengthName as Name;
    match name {
        Name::Bending => Some(timber.bending),
        Name::Tension => Some(timber.tension),
        Name::Compression => Some(timber.compression),
        Name::Shear => Some(timber.shear),
        Name::TensionAcross => timber.tension_across,
        Name::CompressionAcross => timber.compression_across,
        _ => None,
    }
}

const fn of_metal(metal: &MetalStrength, name: StrengthName) -> Option<Stress> {
    match name {
        StrengthName::Yield => Some(metal.yield_stress),
        StrengthName::Ultimate => metal.ultimate,
        _ => None,
    }
}

const fn of_concrete(concrete: &ConcreteStrength, name: StrengthName) -> Option<Stress> {
    match name {
        StrengthName::Compression => Some(concrete.compression),
        StrengthName::MeanCompression => Some(concrete.mean_compression),
        StrengthName::MeanTension => Some(concrete.mean_tension),
        _ => None,
    }
}
