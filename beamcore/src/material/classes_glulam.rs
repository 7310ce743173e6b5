//! Strength classes of glued laminated timber, EN 14080:2013 Tables 4 and 5, from memory.

use super::classes_timber::TimberRow;

/// Name; f_m,k, f_t,0,k, f_c,0,k; E_0,mean, E_0,05; rho_k, rho_mean; in MPa and kg/m3.
type Line = (&'static str, [f64; 7]);

/// Combined of laminations of two grades (Table 4).
#[rustfmt::skip]
const COMBINED: [Line; 7] = [
    ("GL20c", [20.0, 15.0, 18.5, 10_400.0,  8_600.0, 355.0, 390.0]),
    ("GL22c", [22.0, 16.0, 20.0, 10_400.0,  8_600.0, 355.0, 390.0]),
    ("GL24c", [24.0, 17.0, 21.5, 11_000.0,  9_100.0, 365.0, 400.0]),
    ("GL26c", [26.0, 19.0, 23.5, 12_000.0, 10_000.0, 385.0, 420.0]),
    ("GL28c", [28.0, 19.5, 24.0, 12_500.0, 10_400.0, 390.0, 420.0]),
    ("GL30c", [30.0, 19.5, 24.5, 13_000.0, 10_800.0, 390.0, 430.0]),
    ("GL32c", [32.0, 19.5, 24.5, 13_500.0, 11_200.0, 400.0, 440.0]),
];

/// Homogeneous, of laminations of one grade (Table 5).
#[rustfmt::skip]
const HOMOGENEOUS: [Line; 7] = [
    ("GL20h", [20.0, 16.0, 20.0,  8_400.0,  7_000.0, 340.0, 370.0]),
    ("GL22h", [22.0, 17.6, 22.0, 10_500.0,  8_800.0, 370.0, 410.0]),
    ("GL24h", [24.0, 19.2, 24.0, 11_500.0,  9_600.0, 385.0, 420.0]),
    ("GL26h", [26.0, 20.8, 26.0, 12_100.0, 10_100.0, 405.0, 445.0]),
    ("GL28h", [28.0, 22.3, 28.0, 12_600.0, 10_500.0, 425.0, 460.0]),
    ("GL30h", [30.0, 24.0, 30.0, 13_600.0, 11_300.0, 430.0, 480.0]),
    ("GL32h", [32.0, 25.6, 32.0, 14_200.0, 11_800.0, 440.0, 490.0]),
];

/// The classes GL..h, in the order of their strengths.
pub(super) fn homogeneous() -> impl Iterator<Item = TimberRow> {
    HOMOGENEOUS.into_iter().map(row)
}

/// The classes GL..c, in the order of their strengths.
pub(super) fn combined() -> impl Iterator<Item = TimberRow> {
    COMBINED.into_iter().map(row)
}

/// Across the grain, in shear and in its shear modulus all glued laminated timber is alike.
fn row((class, values): Line) -> TimberRow {
    let [f_m, f_t0, f_c0, e_mean, e_05, rho_k, rho_mean] = values;
    TimberRow {
        class,
        standard: "EN 14080:2013",
        f_m,
        f_t0,
        f_t90: 0.5,
        f_c0,
        f_c90: 2.5,
        f_v: 3.5,
        e_mean,
        e_05,
        g_mean: 650.0,
        rho_k,
        rho_mean,
    }
}
