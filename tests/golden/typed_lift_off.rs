//! The golden case `lift-off` through the typed way.

use super::super::line;
use super::{fields, layers};
use beamcore::Result;
use beamcore::material::{Creep, Material};
use beamcore::member::{Action, CombinationFactors, Member, Support};
use beamcore::section::{Part, Section, rectangle};
use beamcore::units::Number;

const CASE: &str = "lift-off";

pub fn answers() -> Result<String> {
    let response = member()?.solve();
    let mut text = fields(CASE, &response)?;
    for (combination, time, at) in layers::states() {
        let steps = u32::try_from(response.steps(combination, time)?).expect("few steps");
        text += &line(CASE, &format!("{at}.steps"), f64::from(steps));
        let lifted = response.lifted(combination, time)?;
        let loaded = matches!(combination, "characteristic" | "fundamental");
        assert_eq!(lifted, if loaded { vec!["post"] } else { vec![] });
    }
    Ok(text)
}

fn member() -> Result<Member> {
    let wood = Material::new("wood", 11.GPa(), Creep::factor(0.0));
    let beam = Part::new("beam", rectangle(100.mm(), 240.mm()), wood);
    let load = CombinationFactors {
        psi_0: 0.7,
        psi_1: 0.5,
        psi_2: 0.0,
    };
    Member::of_length(Section::of([beam])?, 8.m())
        .support(Support::roller("post", 0.m()).one_way())
        .support(Support::pin("middle", 3.m()))
        .support(Support::roller("end", 8.m()))
        .action(Action::permanent("weight").uniform(1.2.kN_per_m()))
        .action(Action::variable("load", load).partial(4.kN_per_m(), 3.m(), 8.m()))
        .check()
}
