//! The golden case `odd-section` through the typed way.

use super::super::line;
use beamcore::Result;
use beamcore::material::{Creep, Material};
use beamcore::member::{Action, ActionKind, Category, Member};
use beamcore::section::{
    MirrorAxis, Part, Section, Sideways, angle, channel, disc, polygon, rectangle, ring,
};
use beamcore::time::Time;
use beamcore::units::Number;

const CASE: &str = "odd-section";

fn section() -> Result<Section> {
    let oak = Material::new("oak", 9.5.GPa(), Creep::factor(0.6)).density(690.kg_per_m3());
    let steel = Material::new("steel", 210.GPa(), Creep::factor(0.0)).density(7850.kg_per_m3());
    let trapezium = || {
        let corners = [(-60, -150), (-40, -180), (40, -180), (60, -150)];
        polygon(corners.map(|(y, z)| (y.mm(), z.mm())).to_vec(), Vec::new())
    };
    Section::of([
        Part::new("stem", rectangle(120.mm(), 300.mm()), oak.clone()),
        Part::new("bar", disc(24.mm()), steel.clone()).set_into("stem", (-30).mm(), (-120).mm()),
        Part::new("foot", trapezium(), oak.clone()),
        Part::new("head", trapezium(), oak).mirror_of("foot", MirrorAxis::Level),
        Part::new(
            "channel",
            channel(100.mm(), 40.mm(), 8.mm(), 6.mm()),
            steel.clone(),
        )
        .at((-80).mm(), 0.mm()),
        Part::new("cheek", angle(90.mm(), 70.mm(), 8.mm()), steel.clone()).right_of("stem"),
        Part::new("pipe", ring(60.mm(), 5.mm()), steel)
            .below("foot")
            .line_mass(9.kg_per_m()),
    ])
}

pub fn answers() -> Result<String> {
    let member = Member::simple_span(section()?, 5.m())
        .sideways(Sideways::Free)
        .action(
            Action::permanent("dead")
                .self_weight()
                .uniform(4.kN_per_m()),
        )
        .action(
            Action::new("crane", ActionKind::Variable(Category::Storage.factors()))
                .point(6.kN(), 2.m()),
        )
        .check()?;
    let response = member.solve();
    let mut text = String::new();
    let mut put = |path: &str, value: f64| text += &line(CASE, path, value);
    for time in Time::ALL {
        let stiffness = member.section().stiffness(time);
        let at = format!("section.{time}");
        put(&format!("{at}.axial_stiffness_N"), stiffness.axial().to_N());
        put(&format!("{at}.centroid_y_m"), stiffness.centroid_y().to_m());
        put(&format!("{at}.centroid_z_m"), stiffness.centroid_z().to_m());
        let bending = [
            ("bending_stiffness_yy_Nm2", stiffness.bending_yy()),
            ("bending_stiffness_zz_Nm2", stiffness.bending_zz()),
            ("bending_stiffness_yz_Nm2", stiffness.bending_yz()),
            ("principal_greater_Nm2", stiffness.principal().greater),
            ("principal_smaller_Nm2", stiffness.principal().smaller),
        ];
        for (name, value) in bending {
            put(&format!("{at}.{name}"), value.to_N_m2());
        }
        for combination in [
            "permanent",
            "quasi-permanent",
            "characteristic",
            "fundamental",
        ] {
            let at = format!("combinations[\"{combination}\"].{time}");
            let deflection = response.deflection(combination, time)?.greatest().value;
            put(
                &format!("{at}.deflection.greatest.value_m"),
                deflection.to_m(),
            );
            let sideways = response.sideways(combination, time)?.greatest().value;
            put(&format!("{at}.sideways.greatest.value_m"), sideways.to_m());
            for part in member.section().parts() {
                let name = part.name();
                let stress = response.stress(combination, time, name)?;
                let tension = stress.greatest_tension().value.to_Pa();
                let compression = stress.greatest_compression().value.to_Pa();
                put(
                    &format!("{at}.stresses[\"{name}\"].tension.value_Pa"),
                    tension,
                );
                put(
                    &format!("{at}.stresses[\"{name}\"].compression.value_Pa"),
                    compression,
                );
            }
        }
    }
    Ok(text)
}
