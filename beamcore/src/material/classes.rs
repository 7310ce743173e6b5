//! Strength classes: named standard materials with their standard and edition.
//!
//! The values are from memory; the outcome says so beside each.

use super::{Creep, Material, ServiceClass};
use crate::error::{ErrorKind, Problem, Result};
use crate::units::{Density, Modulus};

/// One class: its name, E in MPa and mean density in kg/m3.
type Row = (&'static str, f64, f64);

const SOLID: (&str, &[Row]) = (
    "EN 338:2016",
    &[
        ("C16", 8_000.0, 370.0),
        ("C24", 11_000.0, 420.0),
        ("C30", 12_000.0, 460.0),
    ],
);
const GLUED: (&str, &[Row]) = (
    "EN 14080:2013",
    &[
        ("GL24h", 11_500.0, 420.0),
        ("GL28h", 12_600.0, 460.0),
        ("GL32h", 14_200.0, 490.0),
    ],
);
const STEEL: (&str, &[Row]) = (
    "EN 1993-1-1:2005 3.2.6",
    &[
        ("S235", 210_000.0, 7_850.0),
        ("S275", 210_000.0, 7_850.0),
        ("S355", 210_000.0, 7_850.0),
    ],
);
const CONCRETE: (&str, &[Row]) = (
    "EN 1992-1-1:2004 Table 3.1",
    &[("C25/30", 31_000.0, 2_500.0), ("C30/37", 33_000.0, 2_500.0)],
);

/// Solid timber (C16, C24, C30) or glued laminated timber (GL24h, GL28h, GL32h): E_0,mean along
/// the grain, mean density, k_def of the service class.
///
/// Source: EN 338:2016, EN 14080:2013, from memory.
///
/// # Errors
/// [`ErrorKind::Name`] for an unknown class.
///
/// # Examples
/// ```
/// use beamcore::material::{ServiceClass, timber};
/// let joist = timber("C24", ServiceClass::One)?;
/// assert_eq!(joist.modulus().to_MPa(), 11_000.0);
/// # Ok::<(), beamcore::Error>(())
/// ```
pub fn timber(class: &str, service_class: ServiceClass) -> Result<Material> {
    find(
        class,
        &[SOLID, GLUED],
        "timber",
        &Creep::timber(service_class),
    )
}

/// Structural steel (S235, S275, S355): E = 210 GPa, 7850 kg/m3, no creep.
///
/// Source: EN 1993-1-1:2005 3.2.6; density EN 1991-1-1:2002 Table A.4, from memory.
///
/// # Errors
/// [`ErrorKind::Name`] for an unknown class.
pub fn steel(class: &str) -> Result<Material> {
    find(class, &[STEEL], "steel", &Creep::none())
}

/// Concrete (C25/30, C30/37): the rounded E_cm of the table; 2500 kg/m3 with its bars
/// (common practice, no source). Its creep must be said.
///
/// Source: EN 1992-1-1:2004 Table 3.1, from memory.
///
/// # Errors
/// [`ErrorKind::Name`] for an unknown class.
pub fn concrete(class: &str, creep: &Creep) -> Result<Material> {
    find(class, &[CONCRETE], "concrete", creep)
}

fn find(class: &str, tables: &[(&str, &[Row])], stuff: &str, creep: &Creep) -> Result<Material> {
    for (standard, rows) in tables {
        if let Some((name, modulus, density)) = rows.iter().find(|row| row.0 == class) {
            let origin = format!("{name}, {standard} (from memory)");
            return Ok(
                Material::new(*name, Modulus::from_MPa(*modulus), creep.clone())
                    .density(Density::from_kg_per_m3(*density))
                    .of_class(origin),
            );
        }
    }
    let known: Vec<_> = tables
        .iter()
        .flat_map(|t| t.1.iter().map(|row| row.0))
        .collect();
    Err(Problem::new(
        ErrorKind::Name,
        "class",
        format!("the unknown {stuff} class \"{class}\""),
        format!("one of the {stuff} classes {}", known.join(", ")),
    )
    .into())
}
