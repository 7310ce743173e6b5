//! Shear stiffness against closed forms and values of independent calculations.

mod refused;

use super::*;
use crate::material::{Creep, Material};
use crate::outline::{Outline, polygon};
use crate::section::{MirrorAxis, Part, angle, channel, hollow_box, i_shape, rectangle, tee};
use crate::units::Number;

/// A material of E and G in MPa.
fn stuff(name: &str, modulus: f64, shear: f64) -> Material {
    Material::new(name, Modulus::from_MPa(modulus), Creep::none())
        .shear_modulus(Modulus::from_MPa(shear))
}

fn near(value: f64, expected: f64, tolerance: f64) {
    assert!((value - expected).abs() <= tolerance, "{value} {expected}");
}

fn same(value: f64, expected: f64) {
    near(value, expected, 1e-13 * expected.abs());
}

/// kGA in N of parts glued to each other.
fn glued(parts: Vec<Part>) -> f64 {
    let section = Section::of(parts).unwrap();
    section.shear_stiffness(Time::Initial).unwrap().si()
}

/// kGA in N of one outline of steel.
fn steel(outline: Outline) -> f64 {
    glued(vec![Part::new(
        "steel",
        outline,
        stuff("steel", 210e3, 81e3),
    )])
}

/// Rectangles of one width in mm, stacked upward, each with its height in mm.
fn stack(width: f64, layers: &[(f64, &Material)]) -> Vec<Part> {
    let mut bottom = 0.0;
    let mut parts = Vec::new();
    for (i, (height, material)) in layers.iter().enumerate() {
        let outline = rectangle(width.mm(), height.mm());
        let part = Part::new(format!("layer {i}"), outline, (*material).clone());
        parts.push(part.at(0.mm(), (bottom + height / 2.0).mm()));
        bottom += height;
    }
    parts
}

/// 5/6 G b h, wherever the rectangle stands and however it is cut.
#[test]
fn a_rectangle_has_five_sixths() {
    let timber = Material::new("timber", 11.0.GPa(), Creep::factor(0.6)).shear_modulus(0.69.GPa());
    let expected = 5.0 / 6.0 * 0.69e9 * 0.08 * 0.2;
    let part = Part::new("joist", rectangle(80.mm(), 200.mm()), timber.clone());
    let section = Section::of([part.clone()]).unwrap();
    let at = |time| section.shear_stiffness(time).unwrap().si();
    same(at(Time::Initial), expected);
    same(at(Time::Final), expected / 1.6);
    near(
        glued(vec![part.at(7.m(), 20.m())]),
        expected,
        1e-12 * expected,
    );
    // Heights that differ by a rounding only make no slab of their own.
    let thirds = [
        (200.0 / 3.0, &timber),
        (200.0 / 7.0, &timber),
        (200.0 - 200.0 / 3.0 - 200.0 / 7.0, &timber),
    ];
    same(glued(stack(80.0, &thirds)), expected);
    let points = [(0, 0), (80, 0), (80, 90), (80, 200), (0, 200)].map(|(y, z)| (y.mm(), z.mm()));
    same(
        glued(vec![Part::new(
            "joist",
            polygon(points.to_vec(), vec![]),
            timber,
        )]),
        expected,
    );
}

/// Equal layers along and across, without stiffness across the grain and with a rolling shear
/// modulus of G/10: .2060 and .2435 of the sum of G A, by an independent script (handbooks: .21 and
/// .24, from memory).
#[test]
fn cross_layers_are_soft_in_shear() {
    let along = stuff("along", 11e3, 690.0);
    // A modulus must be greater than zero: 1e-12 of the other one changes no digit that is compared.
    let across = stuff("across", 1.1e-8, 69.0);
    for (layers, coefficient) in [(3, 0.2060), (5, 0.2435)] {
        let layers: Vec<_> = (0..layers)
            .map(|i| (30.0, if i % 2 == 0 { &along } else { &across }))
            .collect();
        let shear: f64 = layers
            .iter()
            .map(|(h, m)| h / 1000.0 * m.mean_shear_modulus().unwrap().si())
            .sum();
        near(glued(stack(1000.0, &layers)) / shear, coefficient, 5e-5);
    }
}

/// Per mm of width: faces of 1 mm, E 70 GPa, G 26 GPa, core of 40 mm, E 10 MPa, G 5 MPa: kGA 210.2
/// N, EI 5.8900e7 N mm2; under 1 kPa over 2 m 3.537 mm by bending and 2.379 mm by shear; by an
/// independent script. With thin faces and a soft core G b d^2/c (e.g. Allen, Analysis and Design of
/// Structural Sandwich Panels, from memory).
#[test]
fn a_sandwich_shears_in_its_core() {
    let section = |face: f64, modulus: f64| {
        let faces = stuff("face", 70e3, 26e3);
        let core = stuff("core", modulus, 5.0);
        let parts = stack(1.0, &[(face, &faces), (40.0, &core), (face, &faces)]);
        Section::of(parts).unwrap()
    };
    let real = section(1.0, 10.0);
    let shear = real.shear_stiffness(Time::Initial).unwrap().to_N();
    near(shear, 210.2, 0.05);
    let bending = real.stiffness(Time::Initial).bending_yy().to_N_mm2();
    near(bending, 5.89e7, 500.0);
    let (load, span) = (1e-3, 2000.0_f64);
    let square = span * span;
    near(
        5.0 * load * square * square / (384.0 * bending),
        3.537,
        5e-4,
    );
    near(load * square / (8.0 * shear), 2.379, 5e-4);
    // kGA/(G b d^2/c) - 1 falls with the thickness of the faces.
    let thin = section(1e-4, 1e-8).shear_stiffness(Time::Initial).unwrap();
    let d = 40.0 + 1e-4;
    near(thin.to_N() / (5.0 * d * d / 40.0), 1.0, 1e-5);
}

/// int tau^2/G dA by many thin strips of a T of one material, from A, S and I written out by hand.
#[test]
fn a_tee_agrees_with_thin_strips() {
    let (flange, web) = ((0.15, 0.02), (0.012, 0.18));
    let area = flange.0 * flange.1 + web.0 * web.1;
    let axis = (web.0 * web.1 * 0.09 + flange.0 * flange.1 * 0.19) / area;
    let cube = |x: f64| x * x * x;
    let second = (web.0 * (cube(0.18 - axis) + cube(axis))
        + flange.0 * (cube(0.2 - axis) - cube(0.18 - axis)))
        / 3.0;
    let strips = 200_000;
    let height = 0.2 / f64::from(strips);
    let (mut below, mut energy) = (0.0, 0.0);
    for i in 0..strips {
        let z = (f64::from(i) + 0.5) * height;
        let width = if z < 0.18 { web.0 } else { flange.0 };
        let half = width * (axis - z) * height / 2.0;
        let first = below + half;
        energy += first * first / width * height;
        below += 2.0 * half;
    }
    let expected = 81e9 * second * second / energy;
    let found = steel(tee(200.mm(), 150.mm(), 20.mm(), 12.mm()));
    near(found, expected, 1e-8 * expected);
    // Upside down it is the same.
    let part = |name: &str| {
        let outline = tee(200.mm(), 150.mm(), 20.mm(), 12.mm());
        Part::new(name, outline, stuff("steel", 210e3, 81e3))
    };
    let mirrored = part("mirrored").mirror_of("upright", MirrorAxis::Level);
    let both = Section::of([part("upright").at(0.mm(), 100.mm()), mirrored]).unwrap();
    let mirrored = both.only(&["mirrored".into()]).unwrap();
    same(mirrored.shear_stiffness(Time::Initial).unwrap().si(), found);
}

/// Only the widths at each height count: a box is an I shape with the web of both sides, a channel
/// one with the web of its own, an angle a T.
#[test]
fn shapes_of_the_same_widths_are_alike() {
    let i = |web: f64| {
        let (b, t) = (100.mm(), 15.mm());
        steel(i_shape(220.mm(), b, t, b, t, web.mm()))
    };
    same(
        steel(hollow_box(100.mm(), 220.mm(), 8.mm(), 15.mm())),
        i(16.0),
    );
    same(steel(channel(220.mm(), 100.mm(), 15.mm(), 8.mm())), i(8.0));
    near(
        steel(angle(100.mm(), 80.mm(), 10.mm())),
        steel(tee(100.mm(), 80.mm(), 10.mm(), 10.mm())),
        1e-3,
    );
}

/// A plate let into a joist against the same section in pieces.
#[test]
fn a_host_is_net_of_what_is_set_into_it() {
    let (timber, plate) = (stuff("timber", 11e3, 690.0), stuff("steel", 210e3, 81e3));
    let host = Part::new("joist", rectangle(100.mm(), 200.mm()), timber.clone());
    let insert = Part::new("plate", rectangle(20.mm(), 100.mm()), plate.clone());
    let set = glued(vec![
        host.clone(),
        insert.clone().set_into("joist", 10.mm(), 20.mm()),
    ]);
    let piece = |name: &str, width: f64, height: f64, y: f64, z: f64| {
        let outline = rectangle(width.mm(), height.mm());
        Part::new(name, outline, timber.clone()).at(y.mm(), z.mm())
    };
    let pieces = vec![
        piece("low", 100.0, 70.0, 0.0, -65.0),
        piece("left", 50.0, 100.0, -25.0, 20.0),
        piece("right", 30.0, 100.0, 35.0, 20.0),
        piece("high", 100.0, 30.0, 0.0, 85.0),
        insert.clone().at(10.mm(), 20.mm()),
    ];
    same(set, glued(pieces));
    // The host alone, without the insert that is not glued to it, has no shear stiffness here.
    let section = Section::of([host, insert.set_into("joist", 10.mm(), 20.mm())]).unwrap();
    let alone = layer_shear_stiffness(&[&section.placed()[0]], Time::Initial).unwrap_err();
    assert_eq!(alone.kind(), ErrorKind::Geometry);
    assert_eq!(alone.path(), "section.parts[\"joist\"]");
}

/// Two equal parts side by side share V by halves: twice the kGA of one, glued or not. Unequal ones,
/// EI 1 : 3 and kGA 2 and 6: 1/((1/4)^2/2 + (3/4)^2/6) = 8. Both worked by hand.
#[test]
fn parts_side_by_side_share_the_shear_force() {
    near(side_by_side(&[2.0, 2.0], &[5.0, 5.0]), 4.0, 1e-15);
    near(side_by_side(&[2.0, 6.0], &[1.0, 3.0]), 8.0, 1e-14);
    let timber = stuff("timber", 11e3, 690.0);
    let joist = |name: &str| Part::new(name, rectangle(50.mm(), 200.mm()), timber.clone());
    let pair = Section::of([joist("a"), joist("b").right_of("a")]).unwrap();
    let one = 5.0 / 6.0 * 690e6 * 0.05 * 0.2;
    let fastened = |section: &Section| section.fastened_shear_stiffness(Time::Initial);
    same(fastened(&pair).unwrap().si(), 2.0 * one);
    same(pair.shear_stiffness(Time::Initial).unwrap().si(), 2.0 * one);
    // A steel plate of 10 x 120 between them: shares of EI = sum of E b h^3/12.
    let plate = Part::new(
        "plate",
        rectangle(10.mm(), 120.mm()),
        stuff("steel", 210e3, 81e3),
    );
    let flitch = Section::of([
        joist("a"),
        plate.right_of("a"),
        joist("b").right_of("plate"),
    ]);
    let (wood, steel) = (
        11e9 * 0.05 * 0.2 * 0.2 * 0.2,
        210e9 * 0.01 * 0.12 * 0.12 * 0.12,
    );
    let whole = 2.0 * wood + steel;
    let of_plate = 5.0 / 6.0 * 81e9 * 0.01 * 0.12;
    let (wood, steel) = (wood / whole, steel / whole);
    let flexibility = 2.0 * wood * wood / one + steel * steel / of_plate;
    same(fastened(&flitch.unwrap()).unwrap().si(), 1.0 / flexibility);
    let uneven = Section::of([joist("a"), joist("b").at(50.mm(), 10.mm())]).unwrap();
    let error = fastened(&uneven).unwrap_err();
    assert_eq!(error.problems().len(), 2);
    assert_eq!(error.path(), "section.parts[\"a\"].place");
    assert_eq!(error.problems()[0].found(), "a centroid at z = 0 m");
}
