//! The golden cases `screwed-floor` and `clearance-floor` through the typed way.

use super::super::line;
use super::{fields, layers};
use beamcore::Result;
use beamcore::material::{Creep, Material};
use beamcore::member::{Action, CombinationFactors, Member};
use beamcore::section::{Band, Joint, Layer, Part, Section, Slip, Spacing, rectangle};
use beamcore::time::Time;
use beamcore::units::{Length, Number};

pub fn answers() -> Result<String> {
    let (floor, clearance) = (screwed_floor()?.solve(), clearance_floor()?.solve());
    let mut text = fields("screwed-floor", &floor)?;
    text += &layers::layered("screwed-floor", &floor)?;
    for time in Time::ALL {
        let at = format!("combinations[\"characteristic\"].{time}.composite_action");
        let action = floor.composite_action("characteristic", time)?;
        text += &line("screwed-floor", &format!("{at}.degree"), action.degree);
        text += &line(
            "screwed-floor",
            &format!("{at}.effective_stiffness_Nm2"),
            action.effective_stiffness.to_N_m2(),
        );
    }
    text += &fields("clearance-floor", &clearance)?;
    text += &layers::layered("clearance-floor", &clearance)?;
    Ok(text)
}

/// A slab of this width and height on a joist, joined as told.
fn section(slab: (i32, i32), creep: f64, joint: Joint) -> Result<Section> {
    let wood = Material::new("wood", 11.GPa(), Creep::factor(0.6));
    let concrete = Material::new("concrete", 31.GPa(), Creep::factor(creep));
    let joist = Part::new("joist", rectangle(100.mm(), 220.mm()), wood);
    let slab = Part::new("slab", rectangle(slab.0.mm(), slab.1.mm()), concrete).above(&joist);
    let layers = [Layer::new("joist", ["joist"]), Layer::new("slab", ["slab"])];
    Section::layered([joist, slab], layers, [joint])
}

fn screws(rows: u32, spacing: Spacing) -> Slip {
    Slip::Fasteners {
        stiffness: 10.kN_per_mm(),
        rows,
        planes: 1,
        spacing,
    }
}

fn screwed_floor() -> Result<Member> {
    let band = |from: Length, to: Length, spacing: Length| Band { from, to, spacing };
    let bands = Spacing::Bands(vec![
        band(0.m(), 1.2.m(), 100.mm()),
        band(1.2.m(), 4.2.m(), 200.mm()),
        band(4.2.m(), 5.4.m(), 100.mm()),
    ]);
    let joint = Joint::slipping("screws", "joist", "slab", screws(1, bands)).creep(1.0);
    let live = CombinationFactors {
        psi_0: 0.7,
        psi_1: 0.5,
        psi_2: 0.3,
    };
    Member::simple_span(section((600, 60), 2.0, joint)?, 5.4.m())
        .action(Action::permanent("dead").on("slab").uniform(2.kN_per_m()))
        .action(
            Action::variable("live", live)
                .on("slab")
                .uniform(1.7.kN_per_m()),
        )
        .check()
}

fn clearance_floor() -> Result<Member> {
    let spacing = Spacing::Uniform(150.mm());
    let joint = Joint::slipping("screws", "joist", "slab", screws(2, spacing))
        .clearance(0.5.mm())
        .creep(1.2);
    Member::simple_span(section((600, 70), 2.5, joint)?, 6.m())
        .action(Action::permanent("load").uniform(3.kN_per_m()))
        .check()
}
