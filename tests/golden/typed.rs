//! The golden cases through the typed way.

use super::line;
use beamcore::Result;
use beamcore::camber::{CamberPlan, Rounding, Shape};
use beamcore::material::concrete::{Cement, ConcreteCreep};
use beamcore::material::{Creep, Material, ServiceClass, concrete, steel, timber};
use beamcore::member::{Action, CombinationFactors, Member, Support};
use beamcore::response::Response;
use beamcore::section::{Part, Section, rectangle};
use beamcore::time::Time;
use beamcore::units::{Length, Number};

#[path = "typed_haunched_beam.rs"]
mod haunched_beam;
#[path = "typed_layers.rs"]
mod layers;
#[path = "typed_lift_off.rs"]
mod lift_off;
#[path = "typed_odd_section.rs"]
mod odd_section;
#[path = "typed_rafter.rs"]
mod rafter;
#[path = "typed_roof_beam.rs"]
mod roof_beam;
#[path = "typed_screwed_floor.rs"]
mod screwed_floor;
#[path = "typed_shrinking_slab.rs"]
mod shrinking_slab;
#[path = "typed_side_plates.rs"]
mod side_plates;

/// All typed cases, answered.
pub fn answers() -> Result<String> {
    let mut text = fields("flitch", &flitch()?.solve())?;
    text += &fields("two-span", &two_span()?.solve())?;
    let response = slab_strip()?.solve();
    text += &fields("slab-strip", &response)?;
    text += &camber("slab-strip", &response)?;
    text += &roof_beam::answers()?;
    text += &odd_section::answers()?;
    text += &shrinking_slab::answers()?;
    text += &screwed_floor::answers()?;
    text += &side_plates::answers()?;
    text += &rafter::answers()?;
    text += &lift_off::answers()?;
    text += &haunched_beam::answers()?;
    Ok(text)
}

fn flitch() -> Result<Member> {
    let c24 = timber("C24", ServiceClass::One)?;
    let s275 = steel("S275")?;
    let outline = rectangle(47.mm(), 220.mm());
    let left = Part::new("left joist", outline.clone(), c24.clone()).left_of("plate");
    let plate = Part::new("plate", rectangle(10.mm(), 200.mm()), s275);
    let right = Part::new("right joist", outline, c24).right_of(&plate);
    Member::simple_span(Section::of([left, plate, right])?, 4.m())
        .action(Action::permanent("floor").uniform(5.N_per_mm()))
        .check()
}

fn two_span() -> Result<Member> {
    let oak = Material::new("oak", 9.5.GPa(), Creep::factor(0.6)).density(690.kg_per_m3());
    let brass = Material::new("brass", 100.GPa(), Creep::factor(0.0)).density(8500.kg_per_m3());
    let beam = Part::new("beam", rectangle(120.mm(), 240.mm()), oak);
    let strip = Part::new("strip", rectangle(100.mm(), 6.mm()), brass).below(&beam);
    let store = CombinationFactors {
        psi_0: 1.0,
        psi_1: 0.9,
        psi_2: 0.8,
    };
    Member::of_length(Section::of([beam, strip])?, 7.5.m())
        .support(Support::fixed("wall", 0.m()))
        .support(Support::roller("post", 3.2.m()))
        .support(Support::roller("end", 6.9.m()))
        .action(Action::permanent("own weight").self_weight())
        .action(
            Action::permanent("partition")
                .partial(2.4.kN_per_m(), 1.1.m(), 5.3.m())
                .point(3.5.kN(), 7.5.m()),
        )
        .action(
            Action::variable("store", store)
                .uniform(3.1.kN_per_m())
                .point(4.2.kN(), 1.6.m()),
        )
        .check()
}

fn slab_strip() -> Result<Member> {
    let creep = Creep::concrete(&ConcreteCreep {
        mean_strength: 38.MPa(),
        relative_humidity_percent: 55.0,
        notional_size: 140.mm(),
        age_at_loading: 28.d(),
        age_at_end: 18250.d(),
        cement: Cement::N,
    })?;
    let c24 = timber("C24", ServiceClass::One)?;
    let joist = Part::new("joist", rectangle(100.mm(), 220.mm()), c24);
    let slab = Part::new(
        "slab",
        rectangle(600.mm(), 70.mm()),
        concrete("C30/37", &creep)?,
    );
    let live = CombinationFactors {
        psi_0: 0.7,
        psi_1: 0.5,
        psi_2: 0.3,
    };
    Member::simple_span(Section::of([joist.clone(), slab.above(&joist)])?, 5.4.m())
        .action(
            Action::permanent("dead")
                .self_weight()
                .uniform(0.9.kN_per_m()),
        )
        .action(Action::variable("live", live).uniform(1.7.kN_per_m()))
        .check()
}

fn camber(case: &str, response: &Response) -> Result<String> {
    let camber = response.camber(&CamberPlan {
        shape: Shape::Parabola,
        combination: "quasi-permanent".into(),
        time: Time::Final,
        fraction: 1.0,
        from: "left".into(),
        to: "right".into(),
        step: 1.mm(),
        rounding: Rounding::Nearest,
        least: Length::ZERO,
        divisions: 6,
    })?;
    let mut text = line(case, "camber.target_m", camber.target().to_m());
    text += &line(case, "camber.rise_m", camber.rise().to_m());
    for (i, ordinate) in camber.ordinates().iter().enumerate() {
        let path = format!("camber.ordinates[{i}].ordinate_m");
        text += &line(case, &path, ordinate.ordinate.to_m());
    }
    Ok(text)
}

/// Everything that the contract of the typed cases lists.
fn fields(case: &str, response: &Response) -> Result<String> {
    let mut text = String::new();
    let mut put = |path: &str, value: f64| text += &line(case, path, value);
    let member = response.member();
    for time in Time::ALL {
        let stiffness = member.section().stiffness(time);
        let at = format!("section.{time}");
        let ei = stiffness.bending_yy().to_N_m2();
        put(&format!("{at}.bending_stiffness_yy_Nm2"), ei);
        put(&format!("{at}.axial_stiffness_N"), stiffness.axial().to_N());
        put(&format!("{at}.centroid_z_m"), stiffness.centroid_z().to_m());
    }
    for combination in [
        "permanent",
        "quasi-permanent",
        "characteristic",
        "fundamental",
    ] {
        for time in Time::ALL {
            let at = format!("combinations[\"{combination}\"].{time}");
            let deflection = response.deflection(combination, time)?.greatest();
            let place: Length = deflection.at;
            put(
                &format!("{at}.deflection.greatest.value_m"),
                deflection.value.to_m(),
            );
            put(&format!("{at}.deflection.greatest.at_m"), place.to_m());
            let slope = response.slope(combination, time)?.greatest().value;
            put(&format!("{at}.slope.greatest.value_rad"), slope.to_rad());
            let shear = response.shear(combination, time)?.greatest().value;
            put(&format!("{at}.shear.greatest.value_N"), shear.to_N());
            let moment = response.moment(combination, time)?.greatest().value;
            put(&format!("{at}.moment.greatest.value_Nm"), moment.to_N_m());
            for support in member.supports() {
                let name = support.name();
                let reaction = response.reaction(combination, time, name)?;
                put(
                    &format!("{at}.reactions[\"{name}\"].force_N"),
                    reaction.force.to_N(),
                );
                put(
                    &format!("{at}.reactions[\"{name}\"].couple_Nm"),
                    reaction.couple.to_N_m(),
                );
            }
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
