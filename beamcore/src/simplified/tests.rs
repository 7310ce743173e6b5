//! The simplified methods against values of independent calculations and closed forms.

mod input;

use super::*;
use crate::material::{Creep, Material};
use crate::section::{Part, Section};
use crate::time::Time;
use crate::units::{BendingStiffness, Force, Modulus, Moment, Number, SlipModulus};

fn near(value: f64, expected: f64, tolerance: f64) {
    assert!((value - expected).abs() <= tolerance, "{value} {expected}");
}

fn same(value: f64, expected: f64) {
    near(value, expected, 1e-12 * expected.abs());
}

/// b, h and the height of the centroid in mm, E in MPa.
fn layer(b: f64, h: f64, z: f64, modulus: f64) -> LayerInput {
    let modulus = Modulus::from_MPa(modulus);
    LayerInput::rectangle(modulus, b.mm(), h.mm(), z.mm())
}

fn joint(modulus: f64) -> SlipModulus {
    SlipModulus::from_N_per_mm2(modulus)
}

/// A joist 100 x 220 of E 11000 and on it a slab 600 x 70 of E 31000, k = 400/3 N/mm2, span 6 m;
/// moduli by `soft`, which are those of joist, slab and joint over those of the first day.
fn floor(soft: [f64; 3]) -> Gamma {
    let layers = [
        layer(100.0, 220.0, 110.0, 11e3 / soft[0]),
        layer(600.0, 70.0, 255.0, 31e3 / soft[1]),
    ];
    let joints = [joint(400.0 / 3.0 / soft[2])];
    Gamma::of(&layers, &joints, ReferenceLength::Span(6.m())).unwrap()
}

/// Deflection in mm under 3 kN/m over 6 m.
fn deflection(stiffness: BendingStiffness) -> f64 {
    5.0 * 3000.0 * 1296.0 / (384.0 * stiffness.si()) * 1000.0
}

/// Values of an independent script: gamma .27195, a 58.868 and 86.132, EI 4.53009e12, w 11.175 (9.934
/// under 10 kN at midspan), end flow 41.41, slab 1.479 +- 3.233, joist 2.823 +- 3.606.
#[test]
fn a_slab_on_a_joist_on_the_first_day() {
    let gamma = floor([1.0; 3]);
    assert_eq!(gamma.base_layer(), 0);
    near(gamma.factors()[1], 0.27195, 5e-6);
    assert_eq!(gamma.factors()[0], 1.0);
    near(gamma.arms()[1].to_mm(), 58.868, 5e-4);
    near(gamma.arms()[0].to_mm(), -86.132, 5e-4);
    let stiffness = gamma.bending_stiffness();
    near(stiffness.to_N_mm2(), 4.53009e12, 5e6);
    near(deflection(stiffness), 11.175, 5e-4);
    let central = 10e3 * 216.0 / (48.0 * stiffness.si()) * 1000.0;
    near(central, 9.934, 5e-4);
    near(gamma.flows(9.kN()).unwrap()[0].to_N_per_mm(), 41.41, 5e-3);
    let forces = gamma.fastener_forces(9.kN(), &[150.mm()]).unwrap();
    near(forces[0].to_N(), 41.41 * 150.0, 0.75);
    let [joist, slab] = gamma.stresses(13.5.kN_m()).unwrap()[..] else {
        panic!("two layers")
    };
    near(slab.axial.to_MPa(), -1.479, 5e-4);
    near(slab.bending.to_MPa(), 3.233, 5e-4);
    near(joist.axial.to_MPa(), 2.823, 5e-4);
    near(joist.bending.to_MPa(), 3.606, 5e-4);
    assert_eq!(slab.top(), slab.axial - slab.bending);
    assert_eq!(joist.bottom(), joist.axial + joist.bending);
    // 0.5 E h^2 V/EI with h = 110 + 86.132, at the axis.
    let tau = gamma.shear_stresses(9.kN()).unwrap()[0];
    let h = 110.0 + 86.132;
    near(
        tau.value.to_MPa(),
        0.5 * 11e3 * h * h * 9e3 / 4.53009e12,
        5e-6,
    );
    near(tau.z.to_mm(), h, 5e-4);
    assert_eq!(gamma.warnings(), [Warning::SineLoad]);
}

/// The same at the end: phi 2.5 of the concrete, k_def .6 of the timber, and of the joint .6 or 1.2:
/// gamma .44967 and .37275, EI 2.43197e12 and 2.28292e12, w 20.82 and 22.18, by an independent
/// script.
#[test]
fn a_slab_on_a_joist_at_the_end() {
    for (joint, factor, stiffness, sag) in [
        (1.6, 0.44967, 2.43197e12, 20.82),
        (2.2, 0.37275, 2.28292e12, 22.18),
    ] {
        let gamma = floor([1.6, 3.5, joint]);
        near(gamma.factors()[1], factor, 5e-6);
        near(gamma.bending_stiffness().to_N_mm2(), stiffness, 5e6);
        near(deflection(gamma.bending_stiffness()), sag, 5e-3);
    }
}

/// Flanges 140 x 45 above (E 11000) and 140 x 60 below (E 11600) of a web 63 x 180 (E 11000), k 8 above
/// and 12 below, span 5 m.
fn three(upside_down: bool) -> ([LayerInput; 3], [SlipModulus; 2]) {
    let upper = (140.0, 45.0, 11e3);
    let lower = (140.0, 60.0, 11.6e3);
    let (top, bottom, joints) = if upside_down {
        (lower, upper, [joint(8.0), joint(12.0)])
    } else {
        (upper, lower, [joint(12.0), joint(8.0)])
    };
    let layers = [
        layer(bottom.0, bottom.1, bottom.1 / 2.0, bottom.2),
        layer(63.0, 180.0, bottom.1 + 90.0, 11e3),
        layer(top.0, top.1, bottom.1 + 180.0 + top.1 / 2.0, top.2),
    ];
    (layers, joints)
}

/// EI 9.03484e11, gammas .22625 above and .23778 below, a2 -6.2127 from the web up to the axis, by an
/// independent script; any number of layers gives the same.
#[test]
fn two_flanges_on_a_web() {
    let span = ReferenceLength::Span(5.m());
    let (layers, joints) = three(false);
    let gamma = Gamma::of(&layers, &joints, span).unwrap();
    near(gamma.bending_stiffness().to_N_mm2(), 9.03484e11, 5e5);
    near(gamma.factors()[2], 0.22625, 5e-6);
    near(gamma.factors()[0], 0.23778, 5e-6);
    near(gamma.arms()[1].to_mm(), 6.2127, 5e-5);
    let sine = SineLayers::of(&layers, &joints, span).unwrap();
    same(
        sine.bending_stiffness().si(),
        gamma.bending_stiffness().si(),
    );
    for i in 0..3 {
        let effective = gamma.factors()[i] * gamma.arms()[i].si();
        near(sine.arms()[i].si(), effective, 1e-16);
    }
    let (a, b) = (sine.flows(5.kN()).unwrap(), gamma.flows(5.kN()).unwrap());
    same(a[0].si(), b[0].si());
    same(a[1].si(), b[1].si());

    // Annex B, written out, with 1 above and 3 below, in N and mm.
    let wave = std::f64::consts::PI * std::f64::consts::PI / (5000.0 * 5000.0);
    let (ea1, ea2, ea3) = (11e3 * 6300.0, 11e3 * 11_340.0, 11.6e3 * 8400.0);
    let (g1, g3) = (
        1.0 / (1.0 + wave * ea1 / 8.0),
        1.0 / (1.0 + wave * ea3 / 12.0),
    );
    let a2 = (g1 * ea1 * 225.0 - g3 * ea3 * 240.0) / (2.0 * (g1 * ea1 + ea2 + g3 * ea3));
    let (a1, a3) = (112.5 - a2, 120.0 + a2);
    let own = (ea1 * 45.0 * 45.0 + ea2 * 180.0 * 180.0 + ea3 * 60.0 * 60.0) / 12.0;
    let stiffness = own + g1 * ea1 * a1 * a1 + ea2 * a2 * a2 + g3 * ea3 * a3 * a3;
    same(gamma.bending_stiffness().to_N_mm2(), stiffness);
    same(b[1].to_N_per_mm(), g1 * ea1 * a1 * 5e3 / stiffness);
    same(b[0].to_N_per_mm(), g3 * ea3 * a3 * 5e3 / stiffness);
    let h = 90.0 + a2;
    let tau = gamma.shear_stresses(5.kN()).unwrap()[1];
    let expected = (g3 * ea3 * a3 + 0.5 * 11e3 * 63.0 * h * h) * 5e3 / (63.0 * stiffness);
    same(tau.value.to_MPa(), expected);
    same(tau.z.to_mm(), 60.0 + h);

    // Upside down, everything is mirrored.
    let (layers, joints) = three(true);
    let turned = Gamma::of(&layers, &joints, span).unwrap();
    same(turned.bending_stiffness().si(), stiffness / 1e6);
    same(turned.arms()[1].si(), -gamma.arms()[1].si());
    same(turned.flows(5.kN()).unwrap()[0].si(), b[1].si());
    let of_sine = sine.shear_stresses(5.kN()).unwrap();
    let of_turned = turned.shear_stresses(5.kN()).unwrap();
    let stresses = gamma.shear_stresses(5.kN()).unwrap();
    for (i, stress) in stresses.iter().enumerate() {
        same(of_sine[i].value.si(), stress.value.si());
        same(of_turned[2 - i].value.si(), stress.value.si());
        same(of_turned[2 - i].z.to_mm(), 285.0 - stress.z.to_mm());
    }
}

/// The differential equation of two layers under M = `M_0` sin px (Girhammar and Gopu 1993, from
/// memory): N = k r M/(EI0 (alpha^2 + p^2)), kappa = (M - N r)/EI0. It does not know which layer has
/// gamma = 1.
#[test]
fn two_layers_solve_their_differential_equation() {
    let gamma = floor([1.0; 3]);
    let [joist, slab] = gamma.layers() else {
        panic!("two layers")
    };
    let (k, r, p) = (400e6 / 3.0, 0.145, std::f64::consts::PI / 6.0);
    let bending = joist.bending.si() + slab.bending.si();
    let soft = 1.0 / joist.axial.si() + 1.0 / slab.axial.si();
    let square = k * (soft + r * r / bending);
    let force = k * r / (bending * (square + p * p));
    same(gamma.bending_stiffness().si(), bending / (1.0 - force * r));
    let found = gamma.axial_forces(Moment::from_N_m(1.0)).unwrap();
    same(found[0].si(), force);
    same(found[1].si(), -force);
}

/// Between the two limits: without joints the sum of `EI_i`, with rigid ones the transformed section.
#[test]
fn joints_lie_between_loose_and_rigid() {
    let (heights, moduli) = ([30.0, 50.0, 20.0, 40.0], [11e3, 9e3, 70e3, 12e3]);
    let (mut bottom, mut layers, mut parts) = (0.0, Vec::new(), Vec::new());
    for (i, (h, modulus)) in heights.iter().zip(moduli).enumerate() {
        let z = bottom + h / 2.0;
        layers.push(layer(100.0, *h, z, modulus));
        let material = Material::new(format!("{i}"), Modulus::from_MPa(modulus), Creep::none());
        let outline = crate::section::rectangle(100.mm(), h.mm());
        parts.push(Part::new(format!("{i}"), outline, material).at(0.mm(), z.mm()));
        bottom += h;
    }
    let whole = Section::of(parts).unwrap().stiffness(Time::Initial);
    let span = ReferenceLength::Span(4.m());
    let with = |k: f64| SineLayers::of(&layers, &[joint(k); 3], span).unwrap();
    let rigid = with(1e30);
    same(rigid.bending_stiffness().si(), whole.bending_yy().si());
    for (layer, arm) in layers.iter().zip(rigid.arms()) {
        near(
            arm.si(),
            (layer.centroid_z - whole.centroid_z()).si(),
            1e-15,
        );
    }
    let own: f64 = layers.iter().map(|layer| layer.bending.si()).sum();
    same(with(0.0).bending_stiffness().si(), own);
    assert!(with(0.0).flows(Force::from_kN(1.0)).unwrap()[1].si() == 0.0);
    // A soft joint passes on nearly k d p-fold: t = k d.
    let soft = with(1e-12);
    let p = std::f64::consts::PI / 4.0;
    let flow = soft.flows(Force::from_N(1.0)).unwrap()[0].si();
    near(flow * own * p * p, 1e-6 * 0.04, 1e-11 * 1e-6 * 0.04);
    // A layer in two, with a rigid joint, is the same layer.
    let split = [
        layers[0],
        layer(100.0, 20.0, 40.0, 9e3),
        layer(100.0, 30.0, 65.0, 9e3),
        layers[2],
        layers[3],
    ];
    let joints = [5.0, 1e30, 5.0, 5.0].map(joint);
    let split = SineLayers::of(&split, &joints, span).unwrap();
    same(
        split.bending_stiffness().si(),
        with(5.0).bending_stiffness().si(),
    );
    // One layer alone has its own EI.
    let alone = SineLayers::of(&layers[..1], &[], span).unwrap();
    assert_eq!(alone.bending_stiffness(), layers[0].bending);
    // A joint amid loose ones.
    let pair = SineLayers::of(&layers, &[0.0, 7.0, 0.0].map(joint), span).unwrap();
    let two = Gamma::of(&layers[1..3], &[joint(7.0)], span).unwrap();
    let others = (layers[0].bending + layers[3].bending).si();
    same(
        pair.bending_stiffness().si(),
        two.bending_stiffness().si() + others,
    );
}

/// With the axis outside of the lower layer the shear stress is greatest at the joint.
#[test]
fn an_axis_above_the_joist_leaves_the_joint_decisive() {
    let layers = [
        layer(100.0, 60.0, 30.0, 11e3),
        layer(900.0, 300.0, 210.0, 31e3),
    ];
    let gamma = Gamma::of(&layers, &[joint(5000.0)], ReferenceLength::Span(8.m())).unwrap();
    assert!(gamma.arms()[0].to_mm() < -30.0);
    let tau = gamma.shear_stresses(Force::from_kN(-20.0)).unwrap()[0];
    let flow = gamma.flows(Force::from_kN(-20.0)).unwrap()[0];
    same(tau.value.si(), flow.si() / 0.1);
    assert_eq!(tau.z, 60.mm());
}
