//! Hinges stand at the centroid of what they cut, also where axial force passes.
use crate::material::{Creep, Material};
use crate::member::{Action, Hinge, Load, Member, Support};
use crate::section::{Joint, Layer, Part, Section, Slip, rectangle};
use crate::time::Time;
use crate::units::{Modulus, Number, SlipModulus};
fn m(e: f64) -> Material {
    Material::new(format!("m{e}"), Modulus::from_GPa(e), Creep::none())
}
#[test]
fn layer_hinge() {
    let joist = Part::new("joist", rectangle(100.mm(), 220.mm()), m(11.0)).at(0.mm(), 110.mm());
    let slab = Part::new("slab", rectangle(600.mm(), 70.mm()), m(31.0)).at(0.mm(), 255.mm());
    let s = Section::layered(
        [joist, slab],
        ["joist", "slab"].map(|n| Layer::new(n, [n])),
        [Joint::slipping(
            "s",
            "joist",
            "slab",
            Slip::Modulus(SlipModulus::from_N_per_mm2(133.0)),
        )
        .transverse(SlipModulus::from_N_per_mm2(100.0))
        .creep(0.0)],
    )
    .unwrap();
    let r = Member::of_length(s, 6.m())
        .support(Support::pin("left", 0.m()).under(["joist"]))
        .support(Support::roller("right", 6.m()).under(["joist"]))
        .hinge(Hinge::moment_of("slab", 2.m()))
        .action(Action::permanent("load").uniform(3.kN_per_m()).on("slab"))
        .check()
        .unwrap()
        .solve();
    let v = r
        .layer("permanent", Time::Initial, "slab")
        .unwrap()
        .moment
        .value(2.m())
        .unwrap()
        .to_N_m();
    assert!(v.abs() < 1e-3, "{v}");
}
#[test]
fn stepped() {
    let h = |h: i32| {
        Section::of(
            [Part::new("b", rectangle(100.mm(), h.mm()), m(200.0)).at(0.mm(), (h / 2).mm())],
        )
        .unwrap()
    };
    let load = Load::Axial {
        load: 10.kN(),
        at: 4.m(),
        height: 50.mm(),
    };
    let r = Member::of_length(h(200), 4.m())
        .support(Support::fixed("l", 0.m()))
        .support(Support::roller("r", 4.m()))
        .step(1.m(), h(100))
        .hinge(Hinge::moment(2.m()))
        .action(Action::permanent("g").load(load))
        .check()
        .unwrap()
        .solve();
    let v = r
        .moment("permanent", Time::Initial)
        .unwrap()
        .value(2.m())
        .unwrap()
        .to_N_m();
    assert!(v.abs() < 1e-6, "{v}");
}
