//! Aluminium alloys as extruded profiles, EN 1999-1-1:2007 Table 3.2b and 3.2.5, from memory.

use super::classes_steel::{Range, strength_of};
use super::values::Values;
use super::{Creep, Material};
use crate::error::Result;
use crate::units::{Density, Length, Modulus, ThermalExpansion};

/// One alloy and temper; f_o and f_u by thickness.
#[derive(Clone, Copy, Debug)]
pub(super) struct AluminiumRow {
    pub(super) class: &'static str,
    pub(super) ranges: &'static [Range],
}

/// The least thickness in mm that EN 1999-1-1:2007 is for (1.1.2).
const THINNEST: f64 = 0.6;

pub(super) const ALUMINIUM: [AluminiumRow; 3] = [
    AluminiumRow {
        class: "EN AW-6060 T6",
        ranges: &[(15.0, 140.0, 170.0)],
    },
    AluminiumRow {
        class: "EN AW-6063 T6",
        ranges: &[(25.0, 160.0, 195.0)],
    },
    AluminiumRow {
        class: "EN AW-6082 T6",
        ranges: &[(5.0, 250.0, 290.0), (15.0, 260.0, 310.0)],
    },
];

impl AluminiumRow {
    /// The alloy of a thickness, with its strengths away from welds.
    pub(super) fn of_thickness(&self, thickness: Length) -> Result<Material> {
        let standard = "EN 1999-1-1:2007 Table 3.2b";
        let strength = strength_of(self.class, standard, self.ranges, THINNEST, thickness)?;
        let values = Values {
            shear_modulus: Some(Modulus::from_MPa(27_000.0)),
            density: Some(Density::from_kg_per_m3(2_700.0)),
            expansion: Some(ThermalExpansion::from_per_K(23e-6)),
            characteristic: Some(strength),
            ..Values::new(Modulus::from_MPa(70_000.0), Creep::none())
        };
        Ok(Material::of_class(
            self.class,
            values,
            format!(
                "{}, EN 1999-1-1:2007 3.2.5; f_o and f_u of {thickness} by Table 3.2b, extruded \
                 profiles, away from welds (from memory)",
                self.class
            ),
            "EN 1999-1-1:2007 3.2.5 (from memory)",
        ))
    }
}
