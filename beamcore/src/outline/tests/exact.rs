//! Polygons with holes against exact rationals.
//!
//! The expected values were worked out by a separate script in exact fractions: sums over the edges
//! of (y_i z_j - y_j z_i) times the known polynomials, holes subtracted, moved to the centroid.
//! They stand here as numerator and denominator, in mm.

use super::*;

/// Outer loop and holes in mm; area, centroid y and z, Iyy, Izz and Iyz as fractions.
struct Case {
    points: &'static [(f64, f64)],
    holes: &'static [&'static [(f64, f64)]],
    expected: [(f64, f64); 6],
}

const CASES: [Case; 3] = [
    Case {
        points: &[
            (0.0, 0.0),
            (120.0, 0.0),
            (150.0, 45.0),
            (90.0, 60.0),
            (100.0, 140.0),
            (20.0, 110.0),
        ],
        holes: &[&[(30.0, 20.0), (60.0, 25.0), (40.0, 50.0)]],
        expected: [
            (12_150.0, 1.0),
            (47_735.0, 729.0),
            (40_520.0, 729.0),
            (34_836_257_500.0, 2187.0),
            (29_229_508_750.0, 2187.0),
            (-2_794_040_000.0, 2187.0),
        ],
    },
    Case {
        points: &[
            (-35.5, -80.0),
            (70.25, -64.5),
            (41.0, 12.75),
            (88.0, 90.0),
            (-12.5, 61.0),
            (-60.0, 97.5),
            (-22.0, 5.0),
        ],
        holes: &[
            &[(0.0, -40.0), (20.0, -40.0), (20.0, -20.0), (0.0, -20.0)],
            &[(0.0, 20.0), (10.0, 35.0), (-10.0, 40.0)],
        ],
        expected: [
            (409_355.0, 32.0),
            (65_697_043.0, 4_912_260.0),
            (24_808_291.0, 4_912_260.0),
            (106_805_950_275_409_603.0, 3_772_615_680.0),
            (43_463_807_398_451_857.0, 3_772_615_680.0),
            (4_293_397_877_112_353.0, 7_545_231_360.0),
        ],
    },
    // Far from the origin, given clockwise, its holes in both directions.
    Case {
        points: &[
            (5000.0, -3000.0),
            (5010.0, -2880.0),
            (5075.0, -2900.0),
            (5060.0, -2960.0),
            (5140.0, -2950.0),
            (5130.0, -3040.0),
        ],
        holes: &[
            &[(5020.0, -2985.0), (5050.0, -2990.0), (5035.0, -2965.0)],
            &[
                (5085.0, -3005.0),
                (5080.0, -2985.0),
                (5110.0, -2975.0),
                (5120.0, -3010.0),
            ],
        ],
        expected: [
            (11_600.0, 1.0),
            (7_045_045.0, 1392.0),
            (-85_975.0, 29.0),
            (489_262_500.0, 29.0),
            (70_037_759_375.0, 4176.0),
            (-228_471_875.0, 29.0),
        ],
    },
];

#[test]
fn polygons_with_holes_are_exact() {
    for case in CASES {
        let holes = case.holes.iter().map(|hole| mm(hole)).collect();
        let outline = polygon(mm(case.points), holes);
        assert_eq!(outline.problems("outline"), []);
        let [area, y, z, iyy, izz, iyz] = case.expected.map(|(num, den)| num / den);
        close(outline.area().to_mm2(), area, area, 1e-12);
        close(outline.centroid_y().to_mm(), y, y, 1e-12);
        close(outline.centroid_z().to_mm(), z, z, 1e-12);
        close(outline.second_moment_yy().to_mm4(), iyy, iyy, 1e-12);
        close(outline.second_moment_zz().to_mm4(), izz, izz, 1e-12);
        close(outline.second_moment_yz().to_mm4(), iyz, iyy, 1e-12);
    }
}
