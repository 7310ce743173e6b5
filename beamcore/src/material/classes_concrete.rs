//! Strength classes of normal-weight concrete, EN 1992-1-1:2004 Table 3.1, from memory.

use super::values::Values;
use super::{CharacteristicStrength, ConcreteStrength, Creep, Material};
use crate::units::{Density, Modulus, Stress, ThermalExpansion};

/// One class of concrete; strengths in MPa, E_cm in GPa as the table rounds it.
#[derive(Clone, Copy, Debug)]
pub(super) struct ConcreteRow {
    pub(super) class: &'static str,
    pub(super) f_ck: f64,
    pub(super) f_cm: f64,
    pub(super) f_ctm: f64,
    pub(super) e_cm: f64,
}

/// Name; f_ck, f_cm, f_ctm; E_cm.
type Line = (&'static str, [f64; 4]);

#[rustfmt::skip]
const CONCRETE: [Line; 14] = [
    ("C12/15",  [12.0, 20.0, 1.6, 27.0]),
    ("C16/20",  [16.0, 24.0, 1.9, 29.0]),
    ("C20/25",  [20.0, 28.0, 2.2, 30.0]),
    ("C25/30",  [25.0, 33.0, 2.6, 31.0]),
    ("C30/37",  [30.0, 38.0, 2.9, 33.0]),
    ("C35/45",  [35.0, 43.0, 3.2, 34.0]),
    ("C40/50",  [40.0, 48.0, 3.5, 35.0]),
    ("C45/55",  [45.0, 53.0, 3.8, 36.0]),
    ("C50/60",  [50.0, 58.0, 4.1, 37.0]),
    ("C55/67",  [55.0, 63.0, 4.2, 38.0]),
    ("C60/75",  [60.0, 68.0, 4.4, 39.0]),
    ("C70/85",  [70.0, 78.0, 4.6, 41.0]),
    ("C80/95",  [80.0, 88.0, 4.8, 42.0]),
    ("C90/105", [90.0, 98.0, 5.0, 44.0]),
];

/// All classes, in the order of their strengths.
pub(super) fn rows() -> impl Iterator<Item = ConcreteRow> {
    CONCRETE.into_iter().map(|(class, values)| {
        let [f_ck, f_cm, f_ctm, e_cm] = values;
        ConcreteRow {
            class,
            f_ck,
            f_cm,
            f_ctm,
            e_cm,
        }
    })
}

impl ConcreteRow {
    /// The material of this class, uncracked and with its bars.
    pub(super) fn material(&self, creep: Creep) -> Material {
        let strength = ConcreteStrength::new(
            Stress::from_MPa(self.f_ck),
            Stress::from_MPa(self.f_cm),
            Stress::from_MPa(self.f_ctm),
        );
        let values = Values {
            poisson_ratio: Some(0.2),
            density: Some(Density::from_kg_per_m3(2_500.0)),
            expansion: Some(ThermalExpansion::from_per_K(10e-6)),
            characteristic: Some(CharacteristicStrength::Concrete(strength)),
            ..Values::new(Modulus::from_GPa(self.e_cm), creep)
        };
        Material::of_class(
            self.class,
            values,
            format!("{}, EN 1992-1-1:2004 Table 3.1 (from memory)", self.class),
            "EN 1992-1-1:2004 3.1.3(5) (from memory)",
        )
    }
}
