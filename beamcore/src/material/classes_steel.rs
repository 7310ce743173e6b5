//! Structural steels: elastic values by EN 1993-1-1:2005 3.2.6, strengths of thicknesses by
//! EN 10025:2004, from memory. The simplified strengths of EN 1993-1-1 Table 3.1 are not used.

use super::values::Values;
use super::{CharacteristicStrength, Creep, Material, MetalStrength};
use crate::error::{ErrorKind, Problem, Result};
use crate::units::{Density, Length, Modulus, Stress, ThermalExpansion};

/// A range of thickness, up to a greatest one in mm, with its strengths f_y and f_u in MPa.
pub(super) type Range = (f64, f64, f64);

/// One steel.
#[derive(Clone, Copy, Debug)]
pub(super) struct SteelRow {
    pub(super) class: &'static str,
    pub(super) standard: &'static str,
    /// By growing thickness, the first from 3 mm.
    pub(super) ranges: &'static [Range],
}

/// Below this thickness in mm, f_u is another.
const THINNEST: f64 = 3.0;

/// Non-alloy steel: EN 10025-2:2004 Table 7.
const NON_ALLOY: &str = "EN 10025-2:2004";
/// Normalised fine grain steel: EN 10025-3:2004 Table 4.
const NORMALISED: &str = "EN 10025-3:2004";
/// Thermomechanically rolled fine grain steel: EN 10025-4:2004 Table 5.
const THERMOMECHANICAL: &str = "EN 10025-4:2004";
/// Where both agree: not above 40 mm.
const FINE_GRAIN: &str = "EN 10025-3:2004 and EN 10025-4:2004";

#[rustfmt::skip]
pub(super) const STEELS: [SteelRow; 10] = [
    SteelRow { class: "S235", standard: NON_ALLOY, ranges: &[
        (16.0, 235.0, 360.0), (40.0, 225.0, 360.0), (100.0, 215.0, 360.0),
    ] },
    SteelRow { class: "S275", standard: NON_ALLOY, ranges: &[
        (16.0, 275.0, 410.0), (40.0, 265.0, 410.0), (63.0, 255.0, 410.0),
        (80.0, 245.0, 410.0), (100.0, 235.0, 410.0),
    ] },
    SteelRow { class: "S355", standard: NON_ALLOY, ranges: &[
        (16.0, 355.0, 470.0), (40.0, 345.0, 470.0), (63.0, 335.0, 470.0),
        (80.0, 325.0, 470.0), (100.0, 315.0, 470.0),
    ] },
    SteelRow { class: "S420", standard: FINE_GRAIN, ranges: &[
        (16.0, 420.0, 520.0), (40.0, 400.0, 520.0),
    ] },
    SteelRow { class: "S420N", standard: NORMALISED, ranges: &[
        (16.0, 420.0, 520.0), (40.0, 400.0, 520.0), (63.0, 390.0, 520.0),
        (80.0, 370.0, 520.0), (100.0, 360.0, 520.0),
    ] },
    SteelRow { class: "S420M", standard: THERMOMECHANICAL, ranges: &[
        (16.0, 420.0, 520.0), (40.0, 400.0, 520.0), (63.0, 390.0, 500.0),
        (80.0, 380.0, 480.0), (100.0, 370.0, 470.0),
    ] },
    SteelRow { class: "S450", standard: NON_ALLOY, ranges: &[
        (16.0, 450.0, 550.0), (40.0, 430.0, 550.0), (63.0, 410.0, 550.0),
        (80.0, 390.0, 550.0), (100.0, 380.0, 550.0),
    ] },
    SteelRow { class: "S460", standard: FINE_GRAIN, ranges: &[
        (16.0, 460.0, 540.0), (40.0, 440.0, 540.0),
    ] },
    SteelRow { class: "S460N", standard: NORMALISED, ranges: &[
        (16.0, 460.0, 540.0), (40.0, 440.0, 540.0), (63.0, 430.0, 540.0),
        (80.0, 410.0, 540.0), (100.0, 400.0, 540.0),
    ] },
    SteelRow { class: "S460M", standard: THERMOMECHANICAL, ranges: &[
        (16.0, 460.0, 540.0), (40.0, 440.0, 540.0), (63.0, 430.0, 530.0),
        (80.0, 410.0, 510.0), (100.0, 400.0, 500.0),
    ] },
];

impl SteelRow {
    /// The steel without strengths, for these depend on the thickness.
    pub(super) fn material(&self) -> Material {
        self.with(None, "")
    }

    /// The steel of a thickness, with its strengths.
    pub(super) fn of_thickness(&self, thickness: Length) -> Result<Material> {
        let strength = strength_of(self.class, self.standard, self.ranges, THINNEST, thickness)?;
        let note = format!("; f_y and f_u of {thickness} by {}", self.standard);
        Ok(self.with(Some(strength), &note))
    }

    fn with(&self, strength: Option<CharacteristicStrength>, note: &str) -> Material {
        let values = Values {
            shear_modulus: Some(Modulus::from_MPa(81_000.0)),
            density: Some(Density::from_kg_per_m3(7_850.0)),
            expansion: Some(ThermalExpansion::from_per_K(12e-6)),
            characteristic: strength,
            ..Values::new(Modulus::from_MPa(210_000.0), Creep::none())
        };
        Material::of_class(
            self.class,
            values,
            format!("{}, EN 1993-1-1:2005 3.2.6{note} (from memory)", self.class),
            "EN 1993-1-1:2005 3.2.6 (from memory)",
        )
    }
}

/// The strengths of the range that a thickness lies in; `thinnest` in mm.
pub(super) fn strength_of(
    class: &str,
    standard: &str,
    ranges: &[Range],
    thinnest: f64,
    thickness: Length,
) -> Result<CharacteristicStrength> {
    let size = thickness.to_mm();
    ranges
        .iter()
        // A size of NaN lies in no range.
        .find(|(thickest, ..)| size >= thinnest && size <= *thickest)
        .map(|(_, yield_stress, ultimate)| {
            CharacteristicStrength::Metal(
                MetalStrength::new(Stress::from_MPa(*yield_stress))
                    .ultimate(Stress::from_MPa(*ultimate)),
            )
        })
        .ok_or_else(|| {
            let thickest = ranges.last().map_or(thinnest, |(thickest, ..)| *thickest);
            Problem::new(
                ErrorKind::Value,
                "thickness",
                thickness.to_string(),
                format!(
                    "a thickness from {thinnest} mm to {thickest} mm, for which the strengths of \
                     {class} are known ({standard})"
                ),
            )
            .into()
        })
}
