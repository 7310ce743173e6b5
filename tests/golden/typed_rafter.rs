//! The golden case `rafter` through the typed way.

use super::super::line;
use super::{fields, layers};
use beamcore::Result;
use beamcore::material::{Creep, Material};
use beamcore::member::{Action, CombinationFactors, Load, Member, Support, Tendon};
use beamcore::section::{Part, Section, rectangle};
use beamcore::units::{Angle, Number};

const CASE: &str = "rafter";

pub fn answers() -> Result<String> {
    let response = member()?.solve();
    let mut text = fields(CASE, &response)?;
    for (combination, time, at) in layers::states() {
        let axial = response.axial(combination, time)?.greatest().value.to_N();
        text += &line(CASE, &format!("{at}.axial.greatest.value_N"), axial);
        let along = response.reaction(combination, time, "foot")?.along.to_N();
        text += &line(CASE, &format!("{at}.reactions[\"foot\"].along_N"), along);
    }
    Ok(text)
}

fn member() -> Result<Member> {
    let wood = Material::new("wood", 11.GPa(), Creep::factor(0.6));
    let rafter = Part::new("rafter", rectangle(80.mm(), 220.mm()), wood);
    let snow = CombinationFactors {
        psi_0: 0.5,
        psi_1: 0.2,
        psi_2: 0.0,
    };
    let below = (-50).mm();
    Member::of_length(Section::of([rafter])?, 5.m())
        .pitch(Angle::from_deg(20.0))
        .support(Support::pin("foot", 0.m()).at_height(0.mm()))
        .support(Support::roller("top", 5.m()))
        .action(
            Action::permanent("roof")
                .uniform(0.4.kN_per_m())
                .load(Load::Axial {
                    load: (-6).kN(),
                    at: 5.m(),
                    height: 0.mm(),
                }),
        )
        .action(Action::permanent("tendon").load(Load::Prestress {
            force: 10.kN(),
            tendon: Tendon::Draped(vec![(0.m(), below), (5.m(), below)]),
        }))
        .action(Action::variable("snow", snow).load(Load::Plan {
            load: 1.5.kN_per_m(),
            stretch: None,
        }))
        .check()
}
