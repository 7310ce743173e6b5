//! Under a load in the form of half a sine wave the simplified methods are exact.

use super::drawn::{Drawn, drawn};
use super::lines::{axial_of, deflection, flow_of, moment};
use beamcore::member::Load;
use beamcore::simplified::{Gamma, LayerInput, ReferenceLength, SineLayers};
use beamcore::units::{Force, Length, LineLoad, Modulus, Moment, SlipModulus};
use proptest::prelude::*;
use std::f64::consts::PI;

/// The number of stretches in which the wave is replaced by straight lines.
const STRETCHES: u32 = 400;

/// The size of a wave of this size in its polygon: sin^2(a)/a^2, a = pi/(2 n). The next waves of
/// the polygon have 2 n - 1 half waves along the member and (2 n - 1)^-2 of its size.
fn share_of_wave() -> f64 {
    let a = PI / 2.0 / f64::from(STRETCHES);
    let ratio = libm::sin(a) / a;
    ratio * ratio
}

fn wave(q: f64, length: f64) -> Vec<Load> {
    let at = |i: u32| (length * f64::from(i) / f64::from(STRETCHES)).min(length);
    let load = |i: u32| {
        let angle = PI * f64::from(i) / f64::from(STRETCHES);
        LineLoad::from_N_per_m(q * libm::sin(angle))
    };
    (0..STRETCHES)
        .map(|i| Load::Trapezoidal {
            load_from: load(i),
            load_to: load(i + 1),
            from: Length::from_m(at(i)),
            to: Length::from_m(at(i + 1)),
        })
        .collect()
}

proptest! {
    #![proptest_config(ProptestConfig::with_cases(12))]

    /// Any number of layers, and gamma for two and three: deflection and axial forces to 1e-9, flow
    /// to 1e-8 for the waves that the polygon has besides.
    #[test]
    fn the_sine_wave_makes_them_exact(mut member in drawn(3.0..10.0, false)) {
        prop_assume!(member.layers.len() > 1);
        (member.overhang, member.is_fixed, member.shear) = (0.0, false, None);
        member.spans.truncate(1);
        let (length, q) = (member.length(), 1e3);
        let r = member.under(&wave(q, length));
        let q = q * share_of_wave();
        let p = PI / length;
        let (m, v) = (q / p / p, q / p);
        let (mut bottom, mut inputs) = (0.0, Vec::new());
        for [width, height, modulus] in &member.layers {
            let z = Length::from_m(bottom + height / 2.0);
            bottom += height;
            let [width, height] = [*width, *height].map(Length::from_m);
            inputs.push(LayerInput::rectangle(Modulus::from_Pa(*modulus), width, height, z));
        }
        let joints: Vec<_> = member.moduli.iter().map(|k| SlipModulus::from_N_per_m2(*k)).collect();
        let span = ReferenceLength::Span(Length::from_m(length));
        let sine = SineLayers::of(&inputs, &joints, span).unwrap();
        let middle = length / 2.0;
        let near = |value: f64, expected: f64, peak: f64, tolerance: f64| {
            prop_assert!((value - expected).abs() <= tolerance * peak.abs(), "{value} {expected}");
            Ok(())
        };
        near(moment(&r).at(middle), m, m, 1e-9)?;
        let w = m / p / p / sine.bending_stiffness().to_N_m2();
        near(deflection(&r).at(middle), w, w, 1e-9)?;
        let forces = sine.axial_forces(Moment::from_N_m(m)).unwrap();
        for (i, force) in forces.iter().enumerate() {
            let axial = axial_of(&r, &Drawn::layer_name(i));
            near(axial.at(middle).abs(), force.to_N().abs(), axial.peak, 1e-9)?;
        }
        let flows = sine.flows(Force::from_N(v)).unwrap();
        for (j, flow) in flows.iter().enumerate() {
            let line = flow_of(&r, &Drawn::joint_name(j));
            near(line.at(0.0).abs(), flow.to_N_per_m().abs(), line.peak, 1e-8)?;
        }
        if member.layers.len() <= 3 {
            let gamma = Gamma::of(&inputs, &joints, span).unwrap();
            let (a, b) = (gamma.bending_stiffness(), sine.bending_stiffness());
            near(a.to_N_m2(), b.to_N_m2(), b.to_N_m2(), 1e-11)?;
        }
    }
}
