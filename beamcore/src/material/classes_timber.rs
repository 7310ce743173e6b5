//! Strength classes of structural timber, EN 338:2016 Tables 1 and 3, from memory.

use super::values::Values;
use super::{CharacteristicStrength, Creep, Material, TimberStrength};
use crate::units::{Density, Modulus, Stress, ThermalExpansion};

/// One class of timber; stresses and moduli in MPa, densities in kg/m3.
#[derive(Clone, Copy, Debug)]
pub(super) struct TimberRow {
    pub(super) class: &'static str,
    pub(super) standard: &'static str,
    pub(super) f_m: f64,
    pub(super) f_t0: f64,
    pub(super) f_t90: f64,
    pub(super) f_c0: f64,
    pub(super) f_c90: f64,
    pub(super) f_v: f64,
    pub(super) e_mean: f64,
    pub(super) e_05: f64,
    pub(super) g_mean: f64,
    pub(super) rho_k: f64,
    pub(super) rho_mean: f64,
}

/// Name; f_m,k, f_t,0,k, f_c,0,k, f_c,90,k, f_v,k; E_0,mean, E_0,05, G_mean; rho_k, rho_mean.
type Line = (&'static str, [f64; 10]);

/// Softwood, edgewise bending (Table 1); f_t,90,k is 0.4 MPa throughout.
#[rustfmt::skip]
const SOFTWOOD: [Line; 12] = [
    ("C14", [14.0,  7.2, 16.0, 2.0, 3.0,  7_000.0,  4_700.0,   440.0, 290.0, 350.0]),
    ("C16", [16.0,  8.5, 17.0, 2.2, 3.2,  8_000.0,  5_400.0,   500.0, 310.0, 370.0]),
    ("C18", [18.0, 10.0, 18.0, 2.2, 3.4,  9_000.0,  6_000.0,   560.0, 320.0, 380.0]),
    ("C20", [20.0, 11.5, 19.0, 2.3, 3.6,  9_500.0,  6_400.0,   590.0, 330.0, 400.0]),
    ("C22", [22.0, 13.0, 20.0, 2.4, 3.8, 10_000.0,  6_700.0,   630.0, 340.0, 410.0]),
    ("C24", [24.0, 14.5, 21.0, 2.5, 4.0, 11_000.0,  7_400.0,   690.0, 350.0, 420.0]),
    ("C27", [27.0, 16.5, 22.0, 2.5, 4.0, 11_500.0,  7_700.0,   720.0, 360.0, 430.0]),
    ("C30", [30.0, 19.0, 24.0, 2.7, 4.0, 12_000.0,  8_000.0,   750.0, 380.0, 460.0]),
    ("C35", [35.0, 22.5, 25.0, 2.7, 4.0, 13_000.0,  8_700.0,   810.0, 390.0, 470.0]),
    ("C40", [40.0, 26.0, 27.0, 2.8, 4.0, 14_000.0,  9_400.0,   880.0, 400.0, 480.0]),
    ("C45", [45.0, 30.0, 29.0, 2.9, 4.0, 15_000.0, 10_100.0,   940.0, 410.0, 490.0]),
    ("C50", [50.0, 33.5, 30.0, 3.0, 4.0, 16_000.0, 10_700.0, 1_000.0, 430.0, 520.0]),
];

/// Hardwood, edgewise bending (Table 3); f_t,90,k is 0.6 MPa throughout.
#[rustfmt::skip]
const HARDWOOD: [Line; 12] = [
    ("D18", [18.0, 11.0, 18.0,  4.8, 3.5,  9_500.0,  8_000.0,   590.0, 475.0, 570.0]),
    ("D24", [24.0, 14.0, 21.0,  4.9, 3.7, 10_000.0,  8_400.0,   630.0, 485.0, 580.0]),
    ("D27", [27.0, 16.0, 22.0,  5.1, 3.8, 10_500.0,  8_800.0,   660.0, 510.0, 610.0]),
    ("D30", [30.0, 18.0, 24.0,  5.3, 3.9, 11_000.0,  9_200.0,   690.0, 530.0, 640.0]),
    ("D35", [35.0, 21.0, 25.0,  5.4, 4.1, 12_000.0, 10_100.0,   750.0, 540.0, 650.0]),
    ("D40", [40.0, 24.0, 27.0,  5.5, 4.2, 13_000.0, 10_900.0,   810.0, 550.0, 660.0]),
    ("D45", [45.0, 27.0, 29.0,  5.8, 4.4, 13_500.0, 11_300.0,   840.0, 580.0, 700.0]),
    ("D50", [50.0, 30.0, 30.0,  6.2, 4.5, 14_000.0, 11_800.0,   880.0, 620.0, 740.0]),
    ("D55", [55.0, 33.0, 32.0,  6.6, 4.7, 15_500.0, 13_000.0,   970.0, 660.0, 790.0]),
    ("D60", [60.0, 36.0, 33.0, 10.5, 4.8, 17_000.0, 14_300.0, 1_060.0, 700.0, 840.0]),
    ("D65", [65.0, 39.0, 35.0, 11.3, 5.0, 18_500.0, 15_500.0, 1_160.0, 750.0, 900.0]),
    ("D70", [70.0, 42.0, 36.0, 12.0, 5.0, 20_000.0, 16_800.0, 1_250.0, 800.0, 960.0]),
];

/// The classes C, in the order of their strengths.
pub(super) fn softwood() -> impl Iterator<Item = TimberRow> {
    SOFTWOOD.into_iter().map(|line| row(line, 0.4))
}

/// The classes D, in the order of their strengths.
pub(super) fn hardwood() -> impl Iterator<Item = TimberRow> {
    HARDWOOD.into_iter().map(|line| row(line, 0.6))
}

fn row((class, values): Line, f_t90: f64) -> TimberRow {
    let [
        f_m,
        f_t0,
        f_c0,
        f_c90,
        f_v,
        e_mean,
        e_05,
        g_mean,
        rho_k,
        rho_mean,
    ] = values;
    TimberRow {
        class,
        standard: "EN 338:2016",
        f_m,
        f_t0,
        f_t90,
        f_c0,
        f_c90,
        f_v,
        e_mean,
        e_05,
        g_mean,
        rho_k,
        rho_mean,
    }
}

impl TimberRow {
    /// The material of this class.
    pub(super) fn material(&self, creep: Creep) -> Material {
        let strength = TimberStrength::new(
            Stress::from_MPa(self.f_m),
            Stress::from_MPa(self.f_t0),
            Stress::from_MPa(self.f_c0),
            Stress::from_MPa(self.f_v),
        )
        .across(Stress::from_MPa(self.f_t90), Stress::from_MPa(self.f_c90));
        let values = Values {
            modulus_05: Some(Modulus::from_MPa(self.e_05)),
            shear_modulus: Some(Modulus::from_MPa(self.g_mean)),
            density: Some(Density::from_kg_per_m3(self.rho_mean)),
            density_05: Some(Density::from_kg_per_m3(self.rho_k)),
            expansion: Some(ThermalExpansion::from_per_K(5e-6)),
            characteristic: Some(CharacteristicStrength::Timber(strength)),
            ..Values::new(Modulus::from_MPa(self.e_mean), creep)
        };
        Material::of_class(
            self.class,
            values,
            format!("{}, {} (from memory)", self.class, self.standard),
            "timber along the grain, common practice, no source",
        )
    }
}
