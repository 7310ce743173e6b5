//! Layers, merged and as a tree, against numbers worked out by hand.

use super::layered::LayerStiffness;
use super::*;
use crate::material::{Creep, Material};
use crate::units::{Number, SlipModulus};

pub(super) fn stuff(name: &str, modulus: f64) -> Material {
    Material::new(name, modulus.GPa(), Creep::none())
}

pub(super) fn block(name: &str, width: i32, height: i32) -> Part {
    Part::new(
        name,
        rectangle(width.mm(), height.mm()),
        stuff("wood", 10.0),
    )
}

pub(super) fn given() -> Slip {
    Slip::Modulus(SlipModulus::from_N_per_mm2(100.0))
}

pub(super) fn near(value: f64, expected: f64) {
    assert!(
        (value - expected).abs() <= 1e-12 * expected.abs().max(1e-3),
        "{value} {expected}"
    );
}

/// Board, web, flange and steel strip on each other; web and flange are glued.
fn stack() -> Section {
    let parts = [
        block("board", 100, 40),
        block("web", 60, 200).above("board"),
        block("flange", 100, 40).above("web"),
        Part::new("strip", rectangle(80.mm(), 10.mm()), stuff("steel", 200.0)).above("flange"),
    ];
    let layers = ["board", "web", "flange", "strip"].map(|name| Layer::new(name, [name]));
    let joints = [
        Joint::slipping("nails", "board", "web", given()),
        Joint::rigid("glue", "web", "flange"),
        Joint::loose("film", "flange", "strip"),
    ];
    Section::layered(parts, layers, joints).unwrap()
}

/// A joint between two layers of the parts at the positions below and from `first` on.
pub(super) fn joined(
    parts: &[Part],
    first: usize,
    change: impl Fn(Joint) -> Joint,
) -> Result<Section> {
    let names = |parts: &[Part]| parts.iter().map(|part| part.name().to_owned()).collect();
    let (lower, upper): (Vec<_>, Vec<_>) = (names(&parts[..first]), names(&parts[first..]));
    let joint = change(Joint::slipping("joint", "lower", "upper", given()));
    Section::layered(
        parts.to_vec(),
        [Layer::new("lower", lower), Layer::new("upper", upper)],
        [joint],
    )
}

#[test]
fn rigid_joints_merge_and_the_others_are_a_tree() {
    let section = stack();
    let merged: Vec<_> = section
        .merged_layers()
        .iter()
        .map(MergedLayer::layers)
        .collect();
    assert_eq!(
        merged,
        [vec!["board"], vec!["web", "flange"], vec!["strip"]]
    );
    assert_eq!(
        [0, 1, 2, 3].map(|part| section.layer_of_part(part)),
        [0, 1, 1, 2]
    );
    let [nails, film] = section.slips() else {
        panic!("two joints are not rigid")
    };
    assert_eq!((nails.joint, nails.lower, nails.upper), (0, 0, 1));
    assert_eq!(nails.above, [1, 2]);
    near(nails.z, 0.02);
    near(nails.width, 0.06);
    assert_eq!((film.joint, film.lower, film.upper), (2, 1, 2));
    assert_eq!(film.above, [2]);
    near(film.z, 0.26);
    near(film.width, 0.08);
    assert_eq!(nails.modulus_at(1.0, Time::Final), 1e8);
    assert_eq!(film.modulus_at(1.0, Time::Initial), 0.0);
    assert_eq!(film.transverse_at(1.0, Time::Initial), None);
    assert_eq!(nails.clearance(), 0.0);
}

/// Web 60 x 200 at z 120 mm and flange 100 x 40 at 240 mm: z = (12000*120 + 4000*240)/16000 = 150
/// mm, I = 4e7 + 12000*30^2 + 100*40^3/12 + 4000*90^2 = 83 733 333 mm4.
#[test]
fn a_merged_layer_has_the_stiffness_of_its_parts() {
    let section = stack();
    let [board, girder, strip] = section.layer_stiffness(Time::Initial)[..] else {
        panic!("three layers are left")
    };
    near(girder.axial, 10e9 * 0.016);
    near(girder.z, 0.15);
    near(girder.bending, 10e9 * 83_733_333.333_333_33e-12);
    near(board.bending, 10e9 * 0.1 * 0.04 * 0.04 * 0.04 / 12.0);
    near(strip.axial, 200e9 * 0.08 * 0.01);
    near(strip.z, 0.265);
    assert_eq!(strip.y, 0.0);
}

#[test]
fn a_section_of_parts_is_one_layer() {
    let section = Section::of([block("a", 100, 40), block("b", 60, 40).above("a")]).unwrap();
    assert_eq!(section.layers(), [Layer::new("section", ["a", "b"])]);
    assert!(section.joints().is_empty() && section.slips().is_empty());
    let stiffness = section.stiffness(Time::Initial);
    let whole = LayerStiffness {
        axial: stiffness.axial().si(),
        bending: stiffness.bending_yy().si(),
        y: stiffness.centroid_y().si(),
        z: stiffness.centroid_z().si(),
    };
    assert_eq!(section.layer_stiffness(Time::Initial), [whole]);
}

#[test]
fn some_of_the_parts_keep_their_layers() {
    let names = |names: &[&str]| -> Vec<String> { names.iter().map(|&n| n.into()).collect() };
    let girder = stack().only(&names(&["web", "flange", "strip"])).unwrap();
    assert_eq!(girder.layers().len(), 3);
    let [film] = girder.slips() else {
        panic!("one joint is left that is not rigid")
    };
    assert_eq!((film.joint, film.lower, film.upper), (1, 0, 1));
    let error = stack().only(&names(&["board", "strip"])).unwrap_err();
    assert_eq!(
        error.to_string(),
        "section.layers: found the layers \"board\" and \"strip\" without the layers that hold \
         them together; expected parts of layers that joints hold together"
    );
}

#[test]
fn notes_on_contact_are_of_one_layer() {
    let parts = [
        block("a", 100, 40),
        block("b", 100, 40).at(0.mm(), 100.mm()),
        block("c", 100, 60).at(0.mm(), 50.mm()),
    ];
    assert!(Section::of(parts.clone()).unwrap().notes().is_empty());
    let layers = [Layer::new("outer", ["a", "b"]), Layer::new("core", ["c"])];
    let joint = Joint::slipping("glue", "outer", "core", given());
    let section = Section::layered(parts, layers, [joint]).unwrap();
    assert_eq!(section.notes().len(), 1);
    assert!(section.notes()[0].starts_with("No chain of contacts joins \"b\" to \"a\""));
    assert_eq!(section.placed_joints()[0].width(), 200.mm());
}
