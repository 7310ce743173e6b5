//! The golden case `side-plates` through the typed way.

use super::{fields, layers};
use beamcore::Result;
use beamcore::material::{Creep, Material};
use beamcore::member::{Action, Member, Support};
use beamcore::section::{Joint, Layer, Part, Section, rectangle};
use beamcore::units::{Number, SlipModulus};

pub fn answers() -> Result<String> {
    let response = member()?.solve();
    let mut text = fields("side-plates", &response)?;
    text += &layers::layered("side-plates", &response)?;
    Ok(text)
}

fn member() -> Result<Member> {
    let wood = Material::new("wood", 11.GPa(), Creep::factor(0.6));
    let steel = Material::new("steel", 210.GPa(), Creep::factor(0.0));
    let joist = Part::new("joist", rectangle(94.mm(), 220.mm()), wood);
    let plate = rectangle(5.mm(), 200.mm());
    let left = Part::new("left plate", plate.clone(), steel.clone()).left_of(&joist);
    let right = Part::new("right plate", plate, steel).right_of(&joist);
    let layers = ["joist", "left plate", "right plate"].map(|name| Layer::new(name, [name]));
    let bolts = |name: &str, plate: &str| {
        Joint::loose(name, "joist", plate)
            .transverse(SlipModulus::from_N_per_mm2(3.0))
            .creep(0.6)
    };
    let joints = [
        bolts("left bolts", "left plate"),
        bolts("right bolts", "right plate"),
    ];
    Member::of_length(
        Section::layered([joist, left, right], layers, joints)?,
        4.m(),
    )
    .support(Support::pin("left", 0.m()).under(["joist"]))
    .support(Support::roller("right", 4.m()).under(["joist"]))
    .action(Action::permanent("floor").on("joist").uniform(5.kN_per_m()))
    .check()
}
