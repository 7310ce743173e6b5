//! The typed way refuses what cannot be of layers, joints and supports, by field, value and cure.

mod loads;
mod sections;
mod supports;

use beamcore::material::{ServiceClass, timber};
use beamcore::member::{Action, Member, MemberPlan};
use beamcore::section::{Joint, Layer, Part, Section, Slip, rectangle};
use beamcore::units::{Number, SlipModulus};
use beamcore::{Error, ErrorKind};

fn part(name: &str, z: f64) -> Part {
    let wood = timber("C24", ServiceClass::One).unwrap();
    Part::new(name, rectangle(100.mm(), 200.mm()), wood).at(0.mm(), z.mm())
}

fn section_with(slip: Slip) -> Section {
    Section::layered(
        [part("lower", 0.0), part("upper", 200.0)],
        ["lower", "upper"].map(|name| Layer::new(name, [name])),
        [Joint::slipping("screws", "lower", "upper", slip)],
    )
    .unwrap()
}

fn modulus() -> Slip {
    Slip::Modulus(SlipModulus::from_N_per_mm2(10.0))
}

fn floor() -> Action {
    Action::permanent("floor").uniform(1.kN_per_m())
}

fn plan() -> MemberPlan {
    Member::simple_span(section_with(modulus()), 4.m()).action(floor())
}

fn error(plan: MemberPlan) -> Error {
    plan.check().unwrap_err()
}

fn says(plan: MemberPlan, kind: ErrorKind, message: &str) {
    let error = error(plan);
    assert_eq!(
        (error.kind(), error.to_string()),
        (kind, message.to_owned())
    );
}
