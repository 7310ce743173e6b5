//! Strength classes: named standard materials with their standard and edition.
//!
//! The values are from memory; the outcome says so beside each.

use super::classes_aluminium::ALUMINIUM;
use super::classes_steel::{STEELS, SteelRow};
use super::{Creep, Material, ServiceClass, classes_concrete, classes_glulam, classes_timber};
use crate::error::{ErrorKind, Problem, Result};
use crate::units::Length;

/// Solid timber (C14 to C50, D18 to D70) or glued laminated timber (GL20h to GL32h, GL20c to
/// GL32c): E_0,mean and E_0,05 along the grain, G_mean, rho_mean and rho_k, characteristic
/// strengths, k_def of the service class.
///
/// Source: EN 338:2016, EN 14080:2013, from memory. Thermal expansion along the grain 5e-6 per K:
/// common practice, no source.
///
/// # Errors
/// [`ErrorKind::Name`] for an unknown class.
///
/// # Examples
/// ```
/// use beamcore::material::{ServiceClass, timber};
/// let joist = timber("C24", ServiceClass::One)?;
/// assert_eq!(joist.modulus().to_MPa(), 11_000.0);
/// assert_eq!(joist.mean_shear_modulus().unwrap().to_MPa(), 690.0);
/// # Ok::<(), beamcore::Error>(())
/// ```
pub fn timber(class: &str, service_class: ServiceClass) -> Result<Material> {
    let rows = || {
        classes_timber::softwood()
            .chain(classes_timber::hardwood())
            .chain(classes_glulam::homogeneous())
            .chain(classes_glulam::combined())
    };
    rows()
        .find(|row| row.class == class)
        .map(|row| row.material(Creep::timber(service_class)))
        .ok_or_else(|| unknown(class, "timber", rows().map(|row| row.class)).into())
}

/// Structural steel (S235, S275, S355, S420, S450, S460; S420 and S460 also with N or M): E = 210
/// GPa, G = 81 GPa, 7850 kg/m3, 12e-6 per K, no creep, and no strengths, which depend on the
/// thickness: see [`steel_of_thickness`].
///
/// Source: EN 1993-1-1:2005 3.2.6; density EN 1991-1-1:2002 Table A.4, from memory.
///
/// # Errors
/// [`ErrorKind::Name`] for an unknown class.
pub fn steel(class: &str) -> Result<Material> {
    Ok(steel_row(class)?.material())
}

/// Structural steel as of [`steel`], with the minimum yield strength f_y and the ultimate tensile
/// strength f_u of a nominal thickness as characteristic strengths.
///
/// Thicknesses from 3 mm to 100 mm; of S420 and S460 to 40 mm, above which the normalised (N) and
/// the thermomechanically rolled (M) steels differ.
/// Source: EN 10025-2, -3, -4:2004, from memory; not the simplified EN 1993-1-1 Table 3.1.
///
/// # Errors
/// [`ErrorKind::Name`] for an unknown class, [`ErrorKind::Value`] for a thickness out of range.
///
/// # Examples
/// ```
/// use beamcore::material::{CharacteristicStrength, steel_of_thickness};
/// use beamcore::units::Number;
/// let plate = steel_of_thickness("S355", 20.mm())?;
/// let Some(CharacteristicStrength::Metal(metal)) = plate.characteristic() else { unreachable!() };
/// assert_eq!(metal.yield_stress, 345.MPa());
/// # Ok::<(), beamcore::Error>(())
/// ```
pub fn steel_of_thickness(class: &str, thickness: Length) -> Result<Material> {
    steel_row(class)?.of_thickness(thickness)
}

fn steel_row(class: &str) -> Result<SteelRow> {
    STEELS
        .into_iter()
        .find(|row| row.class == class)
        .ok_or_else(|| unknown(class, "steel", STEELS.iter().map(|row| row.class)).into())
}

/// Aluminium alloy and temper as an extruded profile of a thickness (from 0.6 mm; EN AW-6060 T6 and
/// EN AW-6082 T6 to 15 mm, EN AW-6063 T6 to 25 mm): E = 70 GPa, G = 27 GPa, 2700 kg/m3, 23e-6 per K,
/// no creep, 0.2 % proof strength f_o and ultimate strength f_u away from welds.
///
/// Source: EN 1999-1-1:2007 3.2.5 and Table 3.2b, from memory.
///
/// # Errors
/// [`ErrorKind::Name`] for an unknown alloy and temper, [`ErrorKind::Value`] for a thickness out
/// of range.
///
/// # Examples
/// ```
/// use beamcore::material::aluminium;
/// use beamcore::units::Number;
/// assert_eq!(aluminium("EN AW-6082 T6", 8.mm())?.modulus(), 70.GPa());
/// # Ok::<(), beamcore::Error>(())
/// ```
pub fn aluminium(alloy_and_temper: &str, thickness: Length) -> Result<Material> {
    let names = || ALUMINIUM.iter().map(|row| row.class);
    ALUMINIUM
        .iter()
        .find(|row| row.class == alloy_and_temper)
        .ok_or_else(|| unknown(alloy_and_temper, "aluminium", names()))?
        .of_thickness(thickness)
}

/// Normal-weight concrete (C12/15 to C90/105): the rounded E_cm of the table, Poisson's ratio 0.2
/// (uncracked), 10e-6 per K, f_ck, f_cm and f_ctm; 2500 kg/m3 with its bars (common practice, no
/// source). Its creep must be said.
///
/// Source: EN 1992-1-1:2004 Table 3.1 and 3.1.3, from memory.
///
/// # Errors
/// [`ErrorKind::Name`] for an unknown class.
pub fn concrete(class: &str, creep: &Creep) -> Result<Material> {
    classes_concrete::rows()
        .find(|row| row.class == class)
        .map(|row| row.material(creep.clone()))
        .ok_or_else(|| {
            let names = classes_concrete::rows().map(|row| row.class);
            unknown(class, "concrete", names).into()
        })
}

/// The problem of a class that is not there, with those that are, the nearest first.
fn unknown(class: &str, stuff: &str, names: impl Iterator<Item = &'static str>) -> Problem {
    let names: Vec<_> = names.collect();
    let near: Vec<_> = names
        .iter()
        .filter(|name| is_near(class, name))
        .map(|name| format!("\"{name}\""))
        .collect();
    let first = if near.is_empty() {
        String::new()
    } else {
        format!("{}, or another ", near.join(" or "))
    };
    Problem::new(
        ErrorKind::Name,
        "class",
        format!("the unknown {stuff} class \"{class}\""),
        format!("{first}one of the {stuff} classes {}", names.join(", ")),
    )
}

/// Whether a class may be meant: it has the same letters and digits but for capitals and marks, or
/// it is the text with something left out before, or left out or added behind.
///
/// A wrong number is near to nothing: C23 is as far from C22 as from C24.
fn is_near(written: &str, class: &str) -> bool {
    let plain = |text: &str| -> String {
        text.chars()
            .filter(char::is_ascii_alphanumeric)
            .collect::<String>()
            .to_ascii_lowercase()
    };
    let (written, class) = (plain(written), plain(class));
    written.len() >= 3
        && (class.starts_with(&written) || class.ends_with(&written) || written.starts_with(&class))
}

#[cfg(test)]
mod tests {
    use super::*;

    fn expected(found: Result<Material>) -> String {
        let error = found.unwrap_err();
        assert_eq!((error.kind(), error.path()), (ErrorKind::Name, "class"));
        error.problems()[0].expected().to_owned()
    }

    #[test]
    fn near_classes_are_named_first() {
        let of_timber = |class| expected(timber(class, ServiceClass::One));
        assert!(
            of_timber("c24").starts_with("\"C24\", or another one of the timber classes C14, ")
        );
        assert!(of_timber("GL 28").starts_with("\"GL28h\" or \"GL28c\", or another one of the "));
        assert!(of_timber("C23").starts_with("one of the timber classes C14, C16, "));
        assert!(of_timber("").starts_with("one of the timber classes"));
        let of_steel = |class| expected(steel(class));
        assert_eq!(
            of_steel("S355J2"),
            "\"S355\", or another one of the steel classes S235, S275, S355, S420, S420N, S420M, \
             S450, S460, S460N, S460M"
        );
        assert!(
            expected(concrete("C30", &Creep::none())).starts_with("\"C30/37\", or another one")
        );
        assert_eq!(
            expected(aluminium("6082-T6", Length::from_mm(4.0))),
            "\"EN AW-6082 T6\", or another one of the aluminium classes EN AW-6060 T6, EN AW-6063 \
             T6, EN AW-6082 T6"
        );
    }
}
