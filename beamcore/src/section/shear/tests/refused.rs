//! Sections whose shear stiffness is not worked out.

use super::stuff;
use crate::ErrorKind;
use crate::material::{Creep, Material};
use crate::section::{Joint, Layer, Part, Section, disc, polygon, rectangle};
use crate::time::Time;
use crate::units::Number;

#[test]
fn what_cannot_be_worked_out_is_named() {
    let unknown = Material::new("resin", 3.0.GPa(), Creep::none());
    let block = |name: &str, z: f64| {
        let outline = rectangle(50.mm(), 100.mm());
        Part::new(name, outline, unknown.clone()).at(0.mm(), z.mm())
    };
    let bar = Part::new("bar", disc(20.mm()), stuff("steel", 210e3, 81e3));
    let section = Section::of([
        block("low", 0.0),
        block("high", 100.0),
        bar.set_into("low", 0.mm(), 0.mm()),
    ]);
    let error = section.unwrap().shear_stiffness(Time::Final).unwrap_err();
    let told: Vec<_> = error
        .problems()
        .iter()
        .map(|p| (p.kind(), p.path()))
        .collect();
    assert_eq!(
        told,
        [
            (ErrorKind::Missing, "materials[\"resin\"].shear_modulus"),
            (ErrorKind::Geometry, "section.parts[\"bar\"].outline"),
        ]
    );
    let timber = stuff("timber", 11e3, 690.0);
    let wedge = [(0, 0), (80, 0), (60, 200), (0, 200)].map(|(y, z)| (y.mm(), z.mm()));
    let wedge = Section::of([Part::new(
        "wedge",
        polygon(wedge.to_vec(), vec![]),
        timber.clone(),
    )])
    .unwrap();
    let error = wedge.shear_stiffness(Time::Initial).unwrap_err();
    assert_eq!(error.path(), "section.parts[\"wedge\"].outline");
    let joist = |name: &str, z: f64| {
        let outline = rectangle(50.mm(), 100.mm());
        Part::new(name, outline, timber.clone()).at(0.mm(), z.mm())
    };
    let apart = Section::of([joist("low", 0.0), joist("high", 120.0)]).unwrap();
    let error = apart.shear_stiffness(Time::Initial).unwrap_err();
    assert_eq!(error.kind(), ErrorKind::Geometry);
    assert_eq!(
        error.problems()[0].found(),
        "no material between z = 50 mm and z = 70 mm"
    );
}

/// Layers that may slip on each other have no shear stiffness in common; those that a rigid joint
/// holds together have that of one piece.
#[test]
fn layers_must_be_held_together() {
    let timber = stuff("timber", 11e3, 690.0);
    let of = |joint: fn(&str, &str, &str) -> Joint| {
        let outline = || rectangle(50.mm(), 100.mm());
        let low = Part::new("low", outline(), timber.clone());
        let high = Part::new("high", outline(), timber.clone()).above("low");
        let layers = [Layer::new("lower", ["low"]), Layer::new("upper", ["high"])];
        let joint = joint("glue", "lower", "upper");
        let section = Section::layered([low, high], layers, [joint]).unwrap();
        section.shear_stiffness(Time::Initial)
    };
    let whole = of(|name, lower, upper| Joint::rigid(name, lower, upper));
    let expected = 5.0 / 6.0 * 690e6 * 0.05 * 0.2;
    assert!((whole.unwrap().si() - expected).abs() <= 1e-13 * expected);
    let error = of(|name, lower, upper| Joint::loose(name, lower, upper)).unwrap_err();
    assert_eq!(
        (error.kind(), error.path()),
        (ErrorKind::Geometry, "section.joints")
    );
}
