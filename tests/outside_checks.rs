//! Checks against values of independent scripts and of the standards, through the typed way.

use beamcore::material::{Creep, Material};
use beamcore::member::{Action, CombinationFactors, Member};
use beamcore::section::{Part, Section, rectangle};
use beamcore::time::Time;
use beamcore::units::Number;

fn near(value: f64, expected: f64, half_digit: f64) {
    assert!((value - expected).abs() <= half_digit, "{value} {expected}");
}

/// Glued beam 160 x 600, L 12 m, q 6 kN/m, E 11600: the bending part of the deflection is 48.49 mm
/// (value of an independent script).
#[test]
fn bending_of_a_glued_beam() {
    let material = Material::new("glued", 11.6.GPa(), Creep::factor(0.6));
    let beam = Part::new("beam", rectangle(160.mm(), 600.mm()), material);
    let response = Member::simple_span(Section::of([beam]).unwrap(), 12.m())
        .action(Action::permanent("load").uniform(6.kN_per_m()))
        .check()
        .unwrap()
        .solve();
    let w = response
        .deflection("permanent", Time::Initial)
        .unwrap()
        .greatest();
    near(w.value.to_mm(), 48.49, 0.005);
}

/// One material: w_fin = w_G (1 + k_def) + w_Q (1 + psi_2 k_def); with w_G 6, w_Q 9, psi_2 0.3,
/// k_def 0.6 it is 20.22 mm (EN 1995-1-1:2004 2.2.3, from memory; value of an independent script).
#[test]
fn final_deflection_of_one_material() {
    let material = Material::new("timber", 11.GPa(), Creep::factor(0.6));
    let beam = Part::new("beam", rectangle(100.mm(), 200.mm()), material);
    let span = Member::simple_span(Section::of([beam]).unwrap(), 4.m());
    // A unit load tells the loads that give 6 and 9 mm.
    let unit = span
        .clone()
        .action(Action::permanent("unit").uniform(1.kN_per_m()))
        .check()
        .unwrap()
        .solve();
    let w = unit
        .deflection("permanent", Time::Initial)
        .unwrap()
        .greatest();
    let per_load = w.value.to_mm();
    let factors = CombinationFactors {
        psi_0: 0.7,
        psi_1: 0.5,
        psi_2: 0.3,
    };
    let response = span
        .action(Action::permanent("G").uniform((6.0 / per_load).kN_per_m()))
        .action(Action::variable("Q", factors).uniform((9.0 / per_load).kN_per_m()))
        .check()
        .unwrap()
        .solve();
    let greatest = |name: &str, time| {
        response
            .deflection(name, time)
            .unwrap()
            .greatest()
            .value
            .to_mm()
    };
    near(greatest("characteristic", Time::Initial), 15.0, 1e-9);
    near(greatest("characteristic", Time::Final), 20.22, 1e-9);
}

/// Steel beam (A 8446 mm2, I 23128e4 mm4, h 400) and slab 2500 x 120 mm: with the modular ratio
/// 25.403 z is 168.41 mm from the top and I 57833 cm4, with 2 n0 I is 67115 cm4; E_s 210, E_cm 31
/// GPa (values of an independent script). The steel shape is two plates of the same A and I.
#[test]
fn long_term_ratios_of_a_composite_beam() {
    let (area, second, thickness) = (8446.0_f64, 23_128e4_f64, 10.0_f64);
    let width = area / 2.0 / thickness;
    let own = 2.0 * width * thickness * thickness * thickness / 12.0;
    let arm = ((second - own) / area).sqrt();
    let steel = || Material::new("steel", 210.GPa(), Creep::none());
    let section = |ratio: f64| {
        let plate = |name: &str, z: f64| {
            Part::new(name, rectangle(width.mm(), thickness.mm()), steel()).at(0.mm(), z.mm())
        };
        let concrete = Material::new("concrete", (210.0 / ratio).GPa(), Creep::none());
        let slab = Part::new("slab", rectangle(2500.mm(), 120.mm()), concrete).at(0.mm(), 60.mm());
        Section::of([
            plate("top", arm - 200.0),
            plate("bottom", -200.0 - arm),
            slab,
        ])
        .unwrap()
    };
    let long = section(25.403)
        .transformed_to("steel", Time::Initial)
        .unwrap();
    near(120.0 - long.centroid_z().to_mm(), 168.41, 0.005);
    near(long.second_moment().to_cm4(), 57_833.0, 0.5);
    let twice = section(2.0 * 210.0 / 31.0)
        .transformed_to("steel", Time::Initial)
        .unwrap();
    near(twice.second_moment().to_cm4(), 67_115.0, 0.5);
}
