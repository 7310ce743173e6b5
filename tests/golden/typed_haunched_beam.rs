//! The golden case `haunched-beam` through the typed way.

use super::super::line;
use super::{fields, layers};
use beamcore::Result;
use beamcore::material::{Creep, Material};
use beamcore::member::{Action, CombinationFactors, Hinge, Load, Member, ShearModel, Support};
use beamcore::section::{Part, Section, rectangle};
use beamcore::units::{Length, Modulus, Number, SpringStiffness, ThermalExpansion};

const CASE: &str = "haunched-beam";

pub fn answers() -> Result<String> {
    let response = member()?.solve();
    let mut text = fields(CASE, &response)?;
    for (combination, time, at) in layers::states() {
        let rotation = response.rotation(combination, time)?.greatest().value;
        text += &line(
            CASE,
            &format!("{at}.rotation.greatest.value_rad"),
            rotation.to_rad(),
        );
    }
    Ok(text)
}

fn section(height: Length, z: Length) -> Result<Section> {
    let glulam = Material::new("glulam", 11.6.GPa(), Creep::factor(0.6))
        .shear_modulus(Modulus::from_GPa(0.65))
        .thermal_expansion(ThermalExpansion::from_per_K(5e-6));
    Section::of([Part::new("beam", rectangle(140.mm(), height), glulam).at(0.mm(), z)])
}

fn member() -> Result<Member> {
    let (main, deep) = (section(360.mm(), 0.mm())?, section(600.mm(), (-120).mm())?);
    let sun = CombinationFactors {
        psi_0: 0.6,
        psi_1: 0.5,
        psi_2: 0.0,
    };
    Member::of_length(main.clone(), 10.m())
        .shear(ShearModel::Flexible)
        .support(Support::pin("wall", 0.m()).rotational_spring(4000.kN_m_per_rad()))
        .support(Support::roller("column", 6.m()).spring(SpringStiffness::from_kN_per_mm(8.0)))
        .support(Support::roller("end", 10.m()))
        .taper(4.m(), 6.m(), deep)
        .step(6.m(), main)
        .hinge(Hinge::moment(8.m()))
        .action(Action::permanent("load").uniform(4.kN_per_m()))
        .action(Action::permanent("sinking").load(Load::Settlement {
            support: "column".into(),
            settlement: 5.mm(),
        }))
        .action(
            Action::variable("sun", sun).load(Load::TemperatureDifference { difference: 15.K() }),
        )
        .check()
}
