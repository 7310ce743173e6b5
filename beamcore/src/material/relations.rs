//! The rows of the strength classes against relations that the standards make them by.
//!
//! All relations are from memory. "Within half a step" means that the relation, rounded to the
//! step of the table, is the value of the table (a tie may go either way).

use super::classes_aluminium::ALUMINIUM;
use super::classes_steel::STEELS;
use super::classes_timber::TimberRow;
use super::concrete::mean_modulus;
use super::{classes_concrete, classes_glulam, classes_timber};
use crate::math::pow;
use crate::units::Stress;

/// Asserts that the `value` of a table is the `relation` within half a `step`.
fn rounds(class: &str, what: &str, value: f64, relation: f64, step: f64) {
    assert!(
        (value - relation).abs() <= step / 2.0 + 1e-9 * relation,
        "{class}: {what} {value}, by its relation {relation}"
    );
}

/// The number that a class name bears: 24 of C24 and GL24h.
fn number(class: &str) -> f64 {
    let digits: String = class
        .chars()
        .skip_while(|c| !c.is_ascii_digit())
        .take_while(char::is_ascii_digit)
        .collect();
    digits.parse().unwrap()
}

/// Relations that C and D share, by EN 384:2016: f_c,0,k = 4.3 sqrt(f_m,k) to whole MPa, G =
/// E_mean/16 to 10 MPa, rho_mean = 1.2 rho_k to 10 kg/m3.
fn solid(row: &TimberRow) {
    let class = row.class;
    assert_eq!(row.f_m, number(class));
    rounds(class, "f_c0", row.f_c0, 4.3 * row.f_m.sqrt(), 1.0);
    rounds(class, "G", row.g_mean, row.e_mean / 16.0, 10.0);
    rounds(class, "rho_mean", row.rho_mean, 1.2 * row.rho_k, 10.0);
}

/// EN 384:2016 for softwood: f_t,0,k = -3.07 + 0.73 f_m,k to 0.5 MPa (below 8 MPa to 0.1 MPa),
/// f_v,k = 1.6 + 0.1 f_m,k, not above 4.0, and f_c,90,k = 0.007 rho_k to 0.1 MPa,
/// E_05 = 0.67 E_mean to 100 MPa, f_t,90,k = 0.4 MPa.
#[test]
fn softwood() {
    assert_eq!(classes_timber::softwood().count(), 12);
    for row in classes_timber::softwood() {
        let class = row.class;
        solid(&row);
        let step = if row.f_t0 < 8.0 { 0.1 } else { 0.5 };
        rounds(class, "f_t0", row.f_t0, -3.07 + 0.73 * row.f_m, step);
        rounds(class, "f_v", row.f_v, (1.6 + 0.1 * row.f_m).min(4.0), 0.1);
        rounds(class, "f_c90", row.f_c90, 0.007 * row.rho_k, 0.1);
        rounds(class, "E_05", row.e_05, 0.67 * row.e_mean, 100.0);
        assert_eq!(row.f_t90, 0.4);
    }
}

/// EN 384:2016 for hardwood: f_t,0,k = 0.6 f_m,k to whole MPa, f_v,k = 3.0 + 0.03 f_m,k to f_m,k =
/// 60 MPa and 5.0 above, f_c,90,k = 0.010 rho_k, from 700 kg/m3 on 0.015 rho_k, to 0.1 MPa,
/// E_05 = 0.84 E_mean to 100 MPa, f_t,90,k = 0.6 MPa.
#[test]
fn hardwood() {
    assert_eq!(classes_timber::hardwood().count(), 12);
    for row in classes_timber::hardwood() {
        let class = row.class;
        solid(&row);
        rounds(class, "f_t0", row.f_t0, 0.6 * row.f_m, 1.0);
        let f_v = if row.f_m <= 60.0 {
            3.0 + 0.03 * row.f_m
        } else {
            5.0
        };
        rounds(class, "f_v", row.f_v, f_v, 0.1);
        let across = if row.rho_k < 700.0 { 0.010 } else { 0.015 };
        rounds(class, "f_c90", row.f_c90, across * row.rho_k, 0.1);
        rounds(class, "E_05", row.e_05, 0.84 * row.e_mean, 100.0);
        assert_eq!(row.f_t90, 0.6);
    }
}

/// What all glued laminated timber has in common (EN 14080:2013 Tables 4 and 5): the values that
/// are one for all classes, E_05 = 5/6 E_mean within one step of 100 MPa, rho_mean = 1.1 rho_k
/// within one step of 10 kg/m3. The table follows from laminations, so the last two hold to a whole
/// step only: the standard's own models are not at hand.
fn glued(row: &TimberRow) {
    let class = row.class;
    assert_eq!(row.f_m, number(class));
    assert_eq!(
        (row.f_v, row.f_t90, row.f_c90, row.g_mean),
        (3.5, 0.5, 2.5, 650.0)
    );
    rounds(class, "E_05", row.e_05, row.e_mean * 5.0 / 6.0, 200.0);
    rounds(class, "rho_mean", row.rho_mean, 1.1 * row.rho_k, 20.0);
}

/// Homogeneous: f_t,0,k = 0.8 f_m,k within one step of 0.1 MPa (GL28h: 22.3 MPa, so also at
/// structuralbasics.com), f_c,0,k = f_m,k.
#[test]
fn homogeneous_glulam() {
    assert_eq!(classes_glulam::homogeneous().count(), 7);
    for row in classes_glulam::homogeneous() {
        glued(&row);
        rounds(row.class, "f_t0", row.f_t0, 0.8 * row.f_m, 0.2);
        assert_eq!(row.f_c0, row.f_m, "{}", row.class);
    }
}

/// Combined: tension and compression depend on both grades, so only order is asserted: not more
/// than the homogeneous class, not less than the class below.
#[test]
fn combined_glulam() {
    assert_eq!(classes_glulam::combined().count(), 7);
    let mut below: Option<TimberRow> = None;
    for (row, homogeneous) in classes_glulam::combined().zip(classes_glulam::homogeneous()) {
        glued(&row);
        assert_eq!(row.f_m, homogeneous.f_m);
        assert!(row.f_t0 < homogeneous.f_t0 && row.f_c0 < homogeneous.f_c0);
        if let Some(below) = below {
            assert!(row.f_t0 >= below.f_t0 && row.f_c0 >= below.f_c0 && row.e_mean >= below.e_mean);
            assert!(row.rho_k >= below.rho_k && row.rho_mean >= below.rho_mean);
        }
        below = Some(row);
    }
}

/// EN 1992-1-1:2004 Table 3.1: f_cm = f_ck + 8; f_ctm = 0.30 f_ck^(2/3) to C50/60, 2.12 ln(1 +
/// f_cm/10) above, to 0.1 MPa; E_cm = 22 (f_cm/10)^0.3 to whole GPa.
#[test]
fn concrete() {
    assert_eq!(classes_concrete::rows().count(), 14);
    for row in classes_concrete::rows() {
        let class = row.class;
        assert_eq!(row.f_ck, number(class));
        assert_eq!(row.f_cm, row.f_ck + 8.0, "{class}");
        let f_ctm = if row.f_ck <= 50.0 {
            0.30 * pow(row.f_ck, 2.0 / 3.0)
        } else {
            2.12 * libm::log(1.0 + row.f_cm / 10.0)
        };
        rounds(class, "f_ctm", row.f_ctm, f_ctm, 0.1);
        let e_cm = mean_modulus(Stress::from_MPa(row.f_cm)).unwrap().to_GPa();
        rounds(class, "E_cm", row.e_cm, e_cm, 1.0);
    }
}

/// The strength of a steel is the number of its name to 16 mm, falls with thickness, and stays
/// below f_u; S420 and S460 are what the normalised and the rolled steels have in common.
#[test]
fn steel() {
    for row in STEELS {
        let class = row.class;
        assert_eq!((row.ranges[0].0, row.ranges[0].1), (16.0, number(class)));
        for pair in row.ranges.windows(2) {
            let ((thin, strong, ultimate), (thick, weaker, lesser)) = (pair[0], pair[1]);
            assert!(
                thin < thick && strong > weaker && ultimate >= lesser,
                "{class}"
            );
        }
        assert!(
            row.ranges
                .iter()
                .all(|(_, yielding, ultimate)| yielding < ultimate)
        );
    }
    let ranges = |class: &str| STEELS.iter().find(|row| row.class == class).unwrap().ranges;
    for class in ["S420", "S460"] {
        let common = ranges(class);
        for letter in ["N", "M"] {
            let own = ranges(&format!("{class}{letter}"));
            assert_eq!(common, &own[..common.len()], "{class}{letter}");
        }
        let above = |letter: &str| ranges(&format!("{class}{letter}"))[common.len()];
        assert_ne!(above("N"), above("M"), "{class}");
    }
}

/// Proof strengths stay below ultimate ones.
#[test]
fn aluminium() {
    for row in &ALUMINIUM {
        assert!(
            row.ranges
                .iter()
                .all(|(_, proof, ultimate)| proof < ultimate)
        );
        assert!(row.ranges.windows(2).all(|pair| pair[0].0 < pair[1].0));
    }
}
