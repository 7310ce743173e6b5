//! The solver against closed forms, and laws of the sweep.

use super::beam::{Beam, Solved, Unsolvable};
use super::law::{Law, PlainJoint, PlainLayer};
use super::load::LoadCase;
use super::mechanism::Motion;
use super::piece::PieceLaw;
use super::states::States;
use super::station::{Hold, Station};
use crate::math::curve::{Curve, Decaying};
use std::sync::Arc;

fn near(value: f64, expected: f64, peak: f64, what: &str) {
    assert!(
        (value - expected).abs() <= 1e-12 * peak.abs(),
        "{what}: {value} {expected}"
    );
}

/// The value of a field over a piece.
fn at(beam: &Beam, solved: &Solved, piece: usize, field: usize, t: f64) -> f64 {
    let line = beam.field(solved, piece, field);
    let (polynomial, pairs) = line.split_at(beam.terms());
    let slips = beam.states().slips;
    let decaying = pairs
        .chunks_exact(2)
        .zip(&beam.decays()[piece * slips..])
        .map(|(pair, &decay)| Decaying {
            decay,
            from_left: pair[0],
            from_right: pair[1],
        });
    Curve {
        polynomial: polynomial.to_vec(),
        decaying: decaying.collect(),
    }
    .value(t)
}

/// Holds of a station of a member without slip: deflection, rotation.
fn held(states: States, displacements: &[usize]) -> Station {
    let hold = |&i: &usize| {
        let mut direction = vec![0.0; states.half()];
        direction[i] = 1.0;
        Hold {
            direction,
            stiffness: f64::INFINITY,
        }
    };
    Station {
        holds: displacements.iter().map(hold).collect(),
        releases: vec![],
    }
}

fn bending(stiffness: f64) -> PieceLaw {
    let layer = PlainLayer {
        axial: 1.0,
        bending: stiffness,
        z: 0.0,
        shear_flexibility: 0.0,
        strand: 0,
    };
    PieceLaw::Prismatic(Arc::new(Law::new(States::BENDING, vec![layer], &[])))
}

fn plain(places: &[f64], holds: &[&[usize]], stiffness: &[f64]) -> Result<Beam, Unsolvable> {
    let stations = holds.iter().map(|h| held(States::BENDING, h)).collect();
    let laws: Vec<_> = stiffness.iter().map(|&ei| bending(ei)).collect();
    Beam::new(States::BENDING, places.to_vec(), stations, &laws)
}

/// A line load on w over a piece.
fn line(case: &mut LoadCase, piece: usize, left: f64, right: f64) {
    let half = case.states.half();
    case.line[2 * half * piece] += left;
    case.line[2 * half * piece + half] += right;
}

fn uniform(beam: &Beam, q: f64) -> LoadCase {
    let mut case = beam.no_load();
    for piece in 0..beam.stations().len() - 1 {
        line(&mut case, piece, q, q);
    }
    case
}

const W: usize = 0;
const THETA: usize = 1;
const B: usize = 3;

#[test]
fn uniform_load_on_a_simple_span() {
    let (l, ei, q) = (7.3, 2.4e6, 6.1e3);
    let beam = plain(&[0.0, l], &[&[W], &[W]], &[ei]).unwrap();
    let solved = beam.solve(&uniform(&beam, q));
    let peak = 5.0 * q * l * l * l * l / (384.0 * ei);
    near(at(&beam, &solved, 0, W, 0.5), peak, peak, "deflection");
    let m = q * l * l / 8.0;
    near(-at(&beam, &solved, 0, B, 0.5), m, m, "moment");
    near(solved.reactions[0], q * l / 2.0, q * l / 2.0, "reaction");
    assert!(solved.residual < 1e-14, "{}", solved.residual);
}

#[test]
fn point_load_on_a_fixed_span() {
    // Both ends fixed, point load P at a: M_A = -P a b^2/L^2, w = P a^3 b^3/(3 EI L^3).
    let (a, b, ei, p) = (1.3, 2.9, 1.7e6, 9.0e3);
    let l = a + b;
    let fixed: &[usize] = &[W, THETA];
    let beam = plain(&[0.0, a, l], &[fixed, &[], fixed], &[ei, ei]).unwrap();
    let mut case = beam.no_load();
    case.outside[2 + W] = p;
    let solved = beam.solve(&case);
    let left = -p * a * b * b / (l * l);
    near(-at(&beam, &solved, 0, B, 0.0), left, left, "left moment");
    near(solved.reactions[1], -left, left, "left couple");
    let w = p * a * a * a * b * b * b / (3.0 * ei * l * l * l);
    near(
        at(&beam, &solved, 1, W, 0.0),
        w,
        w,
        "deflection under the load",
    );
    assert!(solved.residual < 1e-13, "{}", solved.residual);
}

#[test]
fn triangular_load_and_couple_on_a_simple_span() {
    // Line load growing from 0 to q: w(L/2) = 5 q L^4/(768 EI).
    let (l, ei, q) = (3.7, 1.1e6, 8.0e3);
    let beam = plain(&[0.0, l], &[&[W], &[W]], &[ei]).unwrap();
    let mut case = beam.no_load();
    line(&mut case, 0, 0.0, q);
    let solved = beam.solve(&case);
    let w = 5.0 * q * l * l * l * l / (768.0 * ei);
    near(at(&beam, &solved, 0, W, 0.5), w, w, "deflection");
    near(solved.reactions[0], q * l / 6.0, q * l, "left reaction");
    near(solved.reactions[1], q * l / 3.0, q * l, "right reaction");
    // A clockwise couple C at the left end makes the moment C there: w(L/2) = C L^2/(16 EI).
    let c = 5.0e3;
    let mut case = beam.no_load();
    case.outside[THETA] = c;
    let solved = beam.solve(&case);
    near(solved.reactions[0], -c / l, c / l, "reaction");
    near(-at(&beam, &solved, 0, B, 0.0), c, c, "moment at the couple");
    let w = c * l * l / (16.0 * ei);
    near(at(&beam, &solved, 0, W, 0.5), w, w, "deflection");
    assert!(solved.residual < 1e-13, "{}", solved.residual);
}

#[test]
fn free_curvature_bends_and_restrained_curvature_makes_moments() {
    // Simple span: w = kappa L^2/8 and no moment. Both ends fixed: no deflection, M = -kappa EI.
    let (l, ei, kappa) = (6.2, 3.0e6, 1.4e-3);
    let simple = plain(&[0.0, l], &[&[W], &[W]], &[ei]).unwrap();
    let mut case = simple.no_load();
    case.free[0] = -kappa;
    let solved = simple.solve(&case);
    let w = kappa * l * l / 8.0;
    near(at(&simple, &solved, 0, W, 0.5), w, w, "deflection");
    near(at(&simple, &solved, 0, B, 0.0), 0.0, kappa * ei, "moment");
    let fixed = plain(&[0.0, l], &[&[W, THETA], &[W, THETA]], &[ei]).unwrap();
    let mut case = fixed.no_load();
    case.free[0] = -kappa;
    let solved = fixed.solve(&case);
    near(
        -at(&fixed, &solved, 0, B, 0.0),
        -kappa * ei,
        kappa * ei,
        "moment",
    );
    near(at(&fixed, &solved, 0, W, 0.5), 0.0, w, "deflection");
    near(at(&fixed, &solved, 0, 4, 0.5), 0.0, kappa, "curvature");
}

#[test]
fn ten_thousand_equal_spans_keep_their_digits() {
    // An inner span far from the ends behaves as one with both ends fixed.
    let (ei, q) = (1.0e6, 5.0e3);
    let places: Vec<f64> = (0..=10_000).map(f64::from).collect();
    let n = places.len();
    let hold: &[usize] = &[W];
    let beam = plain(&places, &vec![hold; n], &vec![ei; n - 1]).unwrap();
    let solved = beam.solve(&uniform(&beam, q));
    near(
        -at(&beam, &solved, 5000, B, 0.0),
        -q / 12.0,
        q / 12.0,
        "support moment",
    );
    let w = q / (384.0 * ei);
    near(at(&beam, &solved, 5000, W, 0.5), w, w, "deflection");
    assert!(solved.residual < 1e-12, "{}", solved.residual);
}

#[test]
fn mechanisms_say_what_is_free() {
    let free = |holds: &[&[usize]]| match plain(&[0.0, 1.5, 4.0], holds, &[1.0e6; 2]) {
        Err(Unsolvable::Free(motion)) => motion,
        other => panic!("{other:?}"),
    };
    assert!(free(&[&[], &[], &[]]).to_string().starts_with("free"));
    match free(&[&[], &[W], &[]]) {
        Motion::Rotation(x) => assert!((x - 1.5).abs() < 1e-9, "{x}"),
        other => panic!("a member on one support turns about it, not {other:?}"),
    }
}

/// Two layers on a simple span: the slab and joist of the concrete-timber case in N, m.
fn two_layers(k: f64) -> (States, Law) {
    let layer = |e: f64, b: f64, h: f64, z: f64| PlainLayer {
        axial: e * b * h,
        bending: e * b * h * h * h / 12.0,
        z,
        shear_flexibility: 0.0,
        strand: 0,
    };
    let layers = vec![layer(11e9, 0.1, 0.22, 0.0), layer(31e9, 0.6, 0.07, 0.145)];
    let joint = PlainJoint {
        above: vec![false, true],
        layers: [0, 1],
        strands: [0, 0],
        modulus: k,
        transverse: 0.0,
        z: 0.11,
    };
    let states = States {
        slips: 1,
        ..States::BENDING
    };
    (states, Law::new(states, layers, &[joint]))
}

#[test]
fn a_slipping_joint_between_two_layers() {
    // Computed from the closed form of Newmark, Siess and Viest (1951) by an independent script:
    // w 11.139 mm, N 62906 N, end flow 36.27 N/mm, slip 0.272 mm at L = 6 m, q = 3 N/mm.
    let (states, law) = two_layers(133.333e6);
    let law = PieceLaw::Prismatic(Arc::new(law));
    let stations = vec![held(states, &[0]), held(states, &[0])];
    let beam = Beam::new(states, vec![0.0, 6.0], stations, &[law]).unwrap();
    let solved = beam.solve(&uniform(&beam, 3e3));
    let (slip, force) = (states.slip(0), states.force(states.slip(0)));
    assert!((at(&beam, &solved, 0, 0, 0.5) - 11.139e-3).abs() < 1e-6);
    assert!((at(&beam, &solved, 0, force, 0.5) + 62906.0).abs() < 1.0);
    assert!((at(&beam, &solved, 0, slip, 0.0).abs() - 0.272e-3).abs() < 1e-6);
    assert!(solved.residual < 1e-13, "{}", solved.residual);
}

#[test]
fn collocation_and_modes_agree() {
    for k in [1e3, 1e6, 133e6] {
        let (states, law) = two_layers(k);
        let exact = PieceLaw::Prismatic(Arc::new(law.clone()));
        let laws = super::varying::VaryingLaws {
            points: std::array::from_fn(|_| law.clone()),
            ends: [law.clone(), law.clone()],
        };
        let pieces = 64;
        let stations = |n: usize| {
            let mut s = vec![Station::default(); n + 1];
            s[0] = held(states, &[0, 1]);
            s[n] = held(states, &[0]);
            s
        };
        let one = Beam::new(states, vec![0.0, 6.0], stations(1), &[exact]).unwrap();
        let places = (0..=pieces)
            .map(|i| f64::from(i) * 6.0 / f64::from(pieces))
            .collect();
        let varying = PieceLaw::Varying(Arc::new(laws));
        let many = Beam::new(
            states,
            places,
            stations(pieces as usize),
            &vec![varying; pieces as usize],
        )
        .unwrap();
        let (a, mut case) = (one.solve(&uniform(&one, 3e3)), uniform(&many, 3e3));
        case.at_nodes = vec![vec![0.0; 10 * 5]; pieces as usize];
        let b = many.solve(&case);
        assert!(b.residual < 1e-9, "{k}: {}", b.residual);
        for field in 0..7 {
            let peak = (0..=32)
                .map(|i| at(&one, &a, 0, field, f64::from(i) / 32.0).abs())
                .fold(0.0, f64::max);
            for i in 0..32 {
                let x = at(&one, &a, 0, field, f64::from(i) / 32.0);
                let y = at(&many, &b, 2 * i as usize, field, 0.0);
                assert!((x - y).abs() <= 1e-10 * peak, "{k} {field} {i}: {x} {y}");
            }
        }
    }
}
