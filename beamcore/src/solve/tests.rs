//! The solver against closed forms, and laws of the sweep.

use super::beam::{Beam, LoadCase};
use super::condition::Holds;
use super::mechanism::Motion;
use super::polynomial::{PieceLoad, PolynomialPiece};
use super::relation::{Piece, Relation};
use super::state::{HALF, STATES, Scale};
use super::sweep::{ChainLoad, Sweep};
use crate::math::polynomial::value;
use nalgebra::{SMatrix, SVector};
use proptest::prelude::*;

fn near(value: f64, expected: f64, peak: f64, what: &str) {
    assert!(
        (value - expected).abs() <= 1e-12 * peak.abs(),
        "{what}: {value} {expected}"
    );
}

fn line(line: [f64; 2]) -> PieceLoad {
    PieceLoad {
        line,
        curvature: 0.0,
    }
}

fn uniform(pieces: usize, q: f64) -> LoadCase {
    LoadCase {
        pieces: vec![line([q, q]); pieces],
        ..LoadCase::none(pieces + 1)
    }
}

#[test]
fn uniform_load_on_a_simple_span() {
    let (l, ei, q) = (7.3, 2.4e6, 6.1e3);
    let beam = Beam::new(vec![0.0, l], vec![Holds::DEFLECTION; 2], &[ei]).unwrap();
    let solved = beam.solve(&uniform(1, q));
    let peak = 5.0 * q * l * l * l * l / (384.0 * ei);
    near(
        value(&solved.fields[0].deflection, 0.5),
        peak,
        peak,
        "deflection",
    );
    near(
        value(&solved.fields[0].moment, 0.5),
        q * l * l / 8.0,
        q * l * l / 8.0,
        "moment",
    );
    near(
        solved.reactions[0].force,
        q * l / 2.0,
        q * l / 2.0,
        "reaction",
    );
    assert!(solved.residual < 1e-15, "{}", solved.residual);
}

#[test]
fn point_load_on_a_fixed_span() {
    // Both ends fixed, point load P at a: M_A = -P a b^2/L^2, clockwise couple at the left end.
    let (a, b, ei, p) = (1.3, 2.9, 1.7e6, 9.0e3);
    let l = a + b;
    let beam = Beam::new(
        vec![0.0, a, l],
        vec![Holds::BOTH, Holds::NOTHING, Holds::BOTH],
        &[ei, ei],
    )
    .unwrap();
    let solved = beam.solve(&LoadCase {
        point: vec![0.0, p, 0.0],
        ..LoadCase::none(3)
    });
    let left = -p * a * b * b / (l * l);
    near(solved.reactions[0].couple, left, left, "left couple");
    near(
        solved.reactions[2].couple,
        p * a * a * b / (l * l),
        left,
        "right couple",
    );
    let w = p * a * a * a * b * b * b / (3.0 * ei * l * l * l);
    near(
        solved.fields[1].deflection[0],
        w,
        w,
        "deflection under the load",
    );
}

#[test]
fn triangular_load_and_couple_on_a_simple_span() {
    // Line load growing from 0 to q: M(x) = q x (L^2 - x^2)/(6 L), w(L/2) = 5 q L^4/(768 EI).
    let (l, ei, q) = (3.7, 1.1e6, 8.0e3);
    let beam = Beam::new(vec![0.0, l], vec![Holds::DEFLECTION; 2], &[ei]).unwrap();
    let solved = beam.solve(&LoadCase {
        pieces: vec![line([0.0, q])],
        ..LoadCase::none(2)
    });
    let w = 5.0 * q * l * l * l * l / (768.0 * ei);
    near(value(&solved.fields[0].deflection, 0.5), w, w, "deflection");
    near(
        solved.reactions[0].force,
        q * l / 6.0,
        q * l,
        "left reaction",
    );
    near(
        solved.reactions[1].force,
        q * l / 3.0,
        q * l,
        "right reaction",
    );
    let m = q * l * l / 16.0;
    near(value(&solved.fields[0].moment, 0.5), m, m, "moment");
    assert!(solved.residual < 1e-14, "{}", solved.residual);
    // A clockwise couple C at the left end: reaction -C/L there; the couple makes the
    // moment C at that end, so the beam sags, w(L/2) = C L^2/(16 EI).
    let c = 5.0e3;
    let solved = beam.solve(&LoadCase {
        couple: vec![c, 0.0],
        ..LoadCase::none(2)
    });
    near(solved.reactions[0].force, -c / l, c / l, "reaction");
    near(solved.fields[0].moment[0], c, c, "moment at the couple");
    let w = c * l * l / (16.0 * ei);
    near(value(&solved.fields[0].deflection, 0.5), w, w, "deflection");
    assert!(solved.residual < 1e-14, "{}", solved.residual);
}

#[test]
fn free_curvature_bends_and_restrained_curvature_makes_moments() {
    // Simple span: w = kappa L^2/8 and no moment. Both ends fixed: no deflection, M = -kappa EI.
    let (l, ei, kappa) = (6.2, 3.0e6, 1.4e-3);
    let case = LoadCase {
        pieces: vec![PieceLoad {
            line: [0.0; 2],
            curvature: kappa,
        }],
        ..LoadCase::none(2)
    };
    let simple = Beam::new(vec![0.0, l], vec![Holds::DEFLECTION; 2], &[ei]).unwrap();
    let solved = simple.solve(&case);
    let w = kappa * l * l / 8.0;
    near(value(&solved.fields[0].deflection, 0.5), w, w, "deflection");
    near(solved.fields[0].moment[0], 0.0, kappa * ei, "moment");
    let fixed = Beam::new(vec![0.0, l], vec![Holds::BOTH; 2], &[ei]).unwrap();
    let solved = fixed.solve(&case);
    near(
        solved.fields[0].moment[0],
        -kappa * ei,
        kappa * ei,
        "moment",
    );
    near(
        value(&solved.fields[0].deflection, 0.5),
        0.0,
        w,
        "deflection",
    );
    assert!(solved.residual < 1e-14, "{}", solved.residual);
}

#[test]
fn ten_thousand_equal_spans_keep_their_digits() {
    // An inner span far from the ends behaves as one with both ends fixed.
    let spans = 10_000_u32;
    let (ei, q) = (1.0e6, 5.0e3);
    let stations: Vec<f64> = (0..=spans).map(f64::from).collect();
    let n = stations.len();
    let beam = Beam::new(stations, vec![Holds::DEFLECTION; n], &vec![ei; n - 1]).unwrap();
    let solved = beam.solve(&uniform(n - 1, q));
    let middle = &solved.fields[5000];
    near(middle.moment[0], -q / 12.0, q / 12.0, "support moment");
    near(
        value(&middle.deflection, 0.5),
        q / (384.0 * ei),
        q / (384.0 * ei),
        "deflection",
    );
    assert!(solved.residual < 1e-12, "{}", solved.residual);
}

#[test]
fn mechanisms_say_what_is_free() {
    let free = |holds: Vec<Holds>| Beam::new(vec![0.0, 1.5, 4.0], holds, &[1.0e6; 2]).unwrap_err();
    assert_eq!(
        free(vec![Holds::NOTHING; 3]).to_string().split(' ').next(),
        Some("free")
    );
    match free(vec![Holds::NOTHING, Holds::DEFLECTION, Holds::NOTHING]) {
        Motion::Rotation(x) => assert!((x - 1.5).abs() < 1e-9, "{x}"),
        Motion::Translation => panic!("a member on one support turns about it"),
    }
}

#[test]
fn a_chain_with_a_dependent_relation_is_singular() {
    // The second relation repeats one equation: nothing then ties the states together.
    let identity = SMatrix::<f64, 2, 2>::identity();
    let mut broken = Relation {
        left: -identity,
        right: identity,
    };
    broken.left.row_mut(1).fill(0.0);
    broken.right.row_mut(1).fill(0.0);
    let whole = Relation {
        left: -identity,
        right: identity,
    };
    let left = SMatrix::<f64, 1, 2>::new(1.0, 0.0);
    let singular = Sweep::<2, 1>::factor(left, &[whole, broken], &left);
    let motion = singular.unwrap_err().motion;
    assert!(motion.iter().any(|state| state.amax() > 0.0));
}

prop_compose! {
    fn chain()(n in 1..6_usize)(
        lengths in prop::collection::vec(0.2..3.0f64, n),
        stiffness in prop::collection::vec(0.3..3.0f64, n),
        line in prop::collection::vec(-5.0..5.0f64, n),
        mix in prop::collection::vec(-1.0..1.0f64, n * STATES * STATES),
    ) -> (Vec<f64>, Vec<f64>, Vec<f64>, Vec<f64>) {
        (lengths, stiffness, line, mix)
    }
}

proptest! {
    /// The relations may be multiplied by any regular matrix: the solution is the same. So the
    /// sweep does not rest on the special form that polynomial pieces give.
    #[test]
    fn mixing_the_relations_changes_nothing((lengths, stiffness, loads, mix) in chain()) {
        let scale = Scale { length: 1.0, stiffness: 1.0 };
        let pieces: Vec<_> = lengths.iter().zip(&stiffness)
            .map(|(&h, &ei)| PolynomialPiece::new(h, ei, scale)).collect();
        let plain: Vec<_> = pieces.iter().map(Piece::relation).collect();
        let sides: Vec<_> = pieces.iter().zip(&loads).map(|(p, &q)| p.load_side(&line([q, 2.0 * q]))).collect();
        let mixer = |k: usize| {
            SMatrix::<f64, STATES, STATES>::from_fn(|i, j| {
                mix[(k * STATES + i) * STATES + j] + if i == j { 3.0 } else { 0.0 }
            })
        };
        let mixed: Vec<_> = plain.iter().enumerate().map(|(k, r)| Relation {
            left: mixer(k) * r.left, right: mixer(k) * r.right,
        }).collect();
        let mixed_sides: Vec<_> = sides.iter().enumerate().map(|(k, s)| mixer(k) * s).collect();
        let end = super::condition::end(Holds::DEFLECTION);
        let solve = |relations: &[Relation<STATES>], sides: Vec<SVector<f64, STATES>>| {
            Sweep::<STATES, HALF>::factor(end, relations, &end).unwrap().solve(&ChainLoad {
                left: SVector::zeros(), relations: sides, right: SVector::zeros(),
            })
        };
        let (a, b) = (solve(&plain, sides), solve(&mixed, mixed_sides));
        let peak = a.iter().map(|s| s.amax()).fold(0.0, f64::max);
        for (x, y) in a.iter().zip(&b) {
            prop_assert!((x - y).amax() <= 1e-10 * peak, "{} {}", x, y);
        }
    }

    /// Cutting a piece in two changes nothing.
    #[test]
    fn a_cut_changes_nothing(cut in 0.05..0.95f64, q in 1.0..5.0f64) {
        let whole = Beam::new(vec![0.0, 1.0], vec![Holds::BOTH, Holds::DEFLECTION], &[1.0]).unwrap();
        let halves = Beam::new(vec![0.0, cut, 1.0],
            vec![Holds::BOTH, Holds::NOTHING, Holds::DEFLECTION], &[1.0; 2]).unwrap();
        let a = whole.solve(&uniform(1, q));
        let b = halves.solve(&uniform(2, q));
        let peak = q / 185.0;
        let at_cut = value(&a.fields[0].deflection, cut);
        prop_assert!((at_cut - b.fields[1].deflection[0]).abs() <= 1e-12 * peak);
        prop_assert!((a.reactions[0].couple - b.reactions[0].couple).abs() <= 1e-12 * q);
    }
}
