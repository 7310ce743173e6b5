//! Members of one layer against values of other ways: the three-moment equation, handbooks, thermal
//! curvature, prestress, and two-point boundary-value problems for varying depths.

use super::compare::{compare_fields, compare_values};
use super::read::{file, tables};

/// Two to five unequal spans by the three-moment equation in exact fractions, a support from which
/// the member lifts and one from which it does not.
#[test]
fn continuous_beams_by_three_moments() {
    let file = file("spans_closed.toml");
    tables(&file, "case").for_each(|case| compare_values(case, 1e-12));
}

/// Hinges, springs, support movements, overhangs, steps and shear by handbook formulas.
#[test]
fn single_beams_by_handbook_formulas() {
    let file = file("beams_closed.toml");
    tables(&file, "case").for_each(|case| compare_values(case, 1e-12));
}

/// Depths that vary in a straight line, with shear deformation, by collocation of high order.
#[test]
fn tapers_with_shear() {
    let file = file("taper_shear_bvp.toml");
    tables(&file, "case").for_each(|case| compare_fields(case, 1e-9));
}
