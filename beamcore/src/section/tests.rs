//! Sections against values of independent calculations.

use super::*;
use crate::material::{Creep, Material};
use crate::units::{Force, Length, Moment, Number, Strain};

fn stuff(name: &str, modulus: f64) -> Material {
    Material::new(name, modulus.GPa(), Creep::none())
}

fn near(value: f64, expected: f64, tolerance: f64) {
    assert!((value - expected).abs() <= tolerance, "{value} {expected}");
}

/// Angle 100 x 100 x 10 with its heel at the bottom left: values of an independent script.
#[test]
fn an_angle_bends_about_both_axes() {
    let outline = angle(100.mm(), 100.mm(), 10.mm());
    let section = Section::of([Part::new("angle", outline, stuff("steel", 1.0))]).unwrap();
    let stiffness = section.stiffness(Time::Initial);
    let e = 1e9;
    let mm4 = |value: crate::units::BendingStiffness| value.to_N_m2() / e * 1e12;
    // From the heel faces: the outline is placed by the middle of its box.
    near(stiffness.centroid_y().to_mm() + 50.0, 28.684, 5e-4);
    near(stiffness.centroid_z().to_mm() + 50.0, 28.684, 5e-4);
    near(mm4(stiffness.bending_yy()), 1.80004e6, 5.0);
    near(mm4(stiffness.bending_yz()).abs(), 1.06579e6, 5.0);
    let principal = stiffness.principal();
    near(mm4(principal.greater), 2.86583e6, 5.0);
    near(mm4(principal.smaller), 0.73425e6, 5.0);
    near(principal.angle.to_deg().abs(), 45.0, 1e-9);
    let forces = SectionForces {
        axial: Force::ZERO,
        moment_y: 2.kN_m(),
        moment_z: Moment::ZERO,
    };
    let stress = |y: f64, z: f64, sideways| {
        let point = ((y - 50.0).mm(), (z - 50.0).mm());
        section
            .stress_at("angle", point, &forces, sideways, Time::Initial)
            .unwrap()
            .to_MPa()
    };
    near(stress(0.0, 100.0, Sideways::Free), -92.95, 5e-3);
    near(stress(10.0, 100.0, Sideways::Free), -103.08, 5e-3);
    near(stress(0.0, 0.0, Sideways::Free), 78.13, 5e-3);
    near(stress(100.0, 0.0, Sideways::Free), -23.17, 5e-3);
    // Held sideways, the coupling is taken by what holds it.
    near(stress(0.0, 100.0, Sideways::Held), -79.24, 5e-3);
    let extremes = section.stress_extremes("angle", &forces, Sideways::Free, Time::Initial);
    let [greatest, least] = extremes.unwrap();
    near(least.value.to_MPa(), -103.08, 5e-3);
    near((least.y.to_mm() + 50.0) - 10.0, 0.0, 1e-9);
    near((least.z.to_mm() + 50.0) - 100.0, 0.0, 1e-9);
    near(greatest.value.to_MPa(), 78.13, 5e-3);
}

/// Steel beam and concrete slab, transformed to steel: A 8446 mm2, I 23128e4 mm4, h 400; slab
/// 2500 x 120 of E 31 GPa: z 101.64 from the top, I 76392 cm4. Values of an independent script; the
/// steel shape is here two plates of the same area and second moment, which is all that counts.
#[test]
fn a_slab_on_a_steel_beam() {
    let (area, second, thickness) = (8446.0_f64, 23128e4_f64, 10.0_f64);
    let width = area / 2.0 / thickness;
    let own = 2.0 * width * thickness * thickness * thickness / 12.0;
    let arm = ((second - own) / area).sqrt();
    let plate = |name: &str, z: f64| {
        let outline = rectangle(width.mm(), thickness.mm());
        Part::new(name, outline, stuff("steel", 210.0)).at(0.mm(), z.mm())
    };
    let concrete = stuff("concrete", 31.0);
    let slab = Part::new("slab", rectangle(2500.mm(), 120.mm()), concrete).at(0.mm(), 60.mm());
    let parts = [
        plate("top", arm - 200.0),
        plate("bottom", -200.0 - arm),
        slab,
    ];
    let section = Section::of(parts).unwrap();
    assert_eq!(section.notes().len(), 1);
    let transformed = section.transformed_to("steel", Time::Initial).unwrap();
    near(120.0 - transformed.centroid_z().to_mm(), 101.64, 5e-3);
    near(transformed.second_moment().to_cm4(), 76392.0, 0.5);
}

#[test]
fn an_insert_displaces_its_host_exactly() {
    let host = Part::new("host", rectangle(200.mm(), 300.mm()), stuff("wood", 10.0));
    let bar = |name: &str, y: f64, z: f64| {
        Part::new(name, disc(20.mm()), stuff("steel", 200.0)).set_into("host", y.mm(), z.mm())
    };
    let section =
        Section::of([host, bar("left", -60.0, -110.0), bar("right", 60.0, -110.0)]).unwrap();
    let host = section.part("host").unwrap();
    let bars = 2.0 * std::f64::consts::PI * 100.0;
    near(host.area().to_mm2(), 200.0 * 300.0 - bars, 1e-7);
    near(
        host.centroid_z().to_mm(),
        bars * 110.0 / (60_000.0 - bars),
        1e-9,
    );
    // The same sums as a whole host plus bars of the difference of the moduli.
    let whole = Section::of([Part::new(
        "host",
        rectangle(200.mm(), 300.mm()),
        stuff("wood", 10.0),
    )])
    .unwrap()
    .stiffness(Time::Initial);
    let ea = whole.axial().to_N() + 190e9 * bars * 1e-6;
    let stiffness = section.stiffness(Time::Initial);
    near(stiffness.axial().to_N() / ea, 1.0, 1e-14);
    let z = -190e9 * bars * 1e-6 * 0.11 / ea;
    near(stiffness.centroid_z().to_m(), z, 1e-15);
    let bar_own = std::f64::consts::PI * 1e-8 / 4.0 * 2.0;
    let ei = whole.bending_yy().to_N_m2()
        + whole.axial().to_N() * z * z
        + 190e9 * (bar_own + bars * 1e-6 * (0.11 + z) * (0.11 + z));
    near(stiffness.bending_yy().to_N_m2() / ei, 1.0, 1e-13);
}

#[test]
fn a_part_that_reaches_out_of_its_host_is_refused() {
    let host = Part::new("host", rectangle(200.mm(), 300.mm()), stuff("wood", 10.0));
    let bar = Part::new("bar", disc(20.mm()), stuff("steel", 200.0));
    let error = Section::of([host, bar.set_into("host", 95.mm(), 0.mm())]).unwrap_err();
    assert_eq!(
        error.to_string(),
        "section.parts[\"bar\"].place.set_into: found a part that reaches out of its host \
         \"host\"; expected a place wholly within the host"
    );
}

#[test]
fn mirror_images_stand_opposite() {
    let profile = channel(200.mm(), 80.mm(), 12.mm(), 8.mm());
    let left = Part::new("left", profile.clone(), stuff("steel", 210.0)).at((-60).mm(), 15.mm());
    let right =
        Part::new("right", profile, stuff("steel", 210.0)).mirror_of(&left, MirrorAxis::Upright);
    let section = Section::of([left, right]).unwrap();
    let stiffness = section.stiffness(Time::Initial);
    near(stiffness.centroid_y().to_mm(), 0.0, 1e-12);
    near(
        stiffness.bending_yz().to_N_m2() / stiffness.bending_yy().to_N_m2(),
        0.0,
        1e-15,
    );
    let [a, b] = ["left", "right"].map(|name| section.part(name).unwrap().clone());
    near(a.centroid_y().to_mm() + b.centroid_y().to_mm(), 0.0, 1e-12);
    near(a.left().to_mm() + b.right().to_mm(), 0.0, 1e-12);
}

#[test]
fn overlaps_of_round_parts_are_measured() {
    let disc_part = |name: &str| Part::new(name, disc(100.mm()), stuff("steel", 210.0));
    let apart = Section::of([disc_part("a"), disc_part("b").at(100.mm(), Length::ZERO)]);
    assert!(apart.is_ok());
    let error =
        Section::of([disc_part("a"), disc_part("b").at(50.mm(), Length::ZERO)]).unwrap_err();
    // Lens of two circles of radius r at the distance r: r^2 (2 pi/3 - sqrt(3)/2) = 3070.92 mm2.
    assert!(
        error.to_string().contains("overlap by 3070.92 mm2"),
        "{error}"
    );
}

/// Two strips, steel 1 mm below aluminium 2 mm, warmer by 80 K: 4.3797e-4 per mm, a value of an
/// independent script from Timoshenko's formula (J. Opt. Soc. Am. 11, 1925, 233).
#[test]
fn two_warm_strips_bend() {
    let warm = |alpha: f64| InitialStrain {
        axial: Strain::from_ratio(alpha * 80.0),
        ..InitialStrain::NONE
    };
    let steel = Part::new("steel", rectangle(10.mm(), 1.mm()), stuff("steel", 210.0))
        .initial_strain(warm(12e-6));
    let aluminium = Part::new(
        "aluminium",
        rectangle(10.mm(), 2.mm()),
        stuff("aluminium", 70.0),
    )
    .initial_strain(warm(23e-6))
    .above(&steel);
    let section = Section::of([steel, aluminium]).unwrap();
    let plane = section.free_plane(Time::Initial, Sideways::Held);
    // The strip that grows more is on top: the member bends upward.
    near(plane.curvature_y.to_per_mm(), -4.3797e-4, 5e-9);
}

/// Equal layers of one material, one of them longer by d: kappa = 1.5 d/h.
#[test]
fn equal_layers_bend_by_one_and_a_half() {
    let strain = InitialStrain {
        axial: Strain::from_permille(1.0),
        ..InitialStrain::NONE
    };
    let lower = Part::new("lower", rectangle(10.mm(), 5.mm()), stuff("wood", 10.0));
    let upper = Part::new("upper", rectangle(10.mm(), 5.mm()), stuff("wood", 10.0));
    let section = Section::of([lower.initial_strain(strain), upper.above("lower")]).unwrap();
    let plane = section.free_plane(Time::Initial, Sideways::Held);
    near(plane.curvature_y.to_per_m(), 1.5e-3 / 0.01, 1e-12);
}

/// The transformed outline has the transformed area: exactly for straight edges, by chords for a
/// disc.
#[test]
fn transformed_outlines_have_the_transformed_area() {
    let wood = Part::new("wood", rectangle(90.mm(), 200.mm()), stuff("wood", 10.0));
    let rod = Part::new("rod", disc(30.mm()), stuff("steel", 200.0)).below(&wood);
    let section = Section::of([wood, rod]).unwrap();
    let transformed = section.transformed_to("wood", Time::Initial).unwrap();
    let area = |corners: &[(Length, Length)]| {
        let next = corners.iter().cycle().skip(1);
        let cross = corners
            .iter()
            .zip(next)
            .map(|(a, b)| (a.0 * b.1 - b.0 * a.1).to_mm2());
        cross.sum::<f64>() / 2.0
    };
    let [wood, rod] = [&transformed.parts()[0].loops, &transformed.parts()[1].loops];
    near(area(&wood[0]), 90.0 * 200.0, 1e-9);
    let exact = 20.0 * std::f64::consts::PI * 225.0;
    near(area(&rod[0]) / exact, 1.0, 0.002);
    assert!(area(&rod[0]) < exact);
}
