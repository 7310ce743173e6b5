//! The golden case `roof-beam` through the typed way.

use super::super::line;
use beamcore::Result;
use beamcore::camber::{CamberPlan, Rounding, Shape, Trestles};
use beamcore::limits::{Allowed, Component, Limit};
use beamcore::material::{ServiceClass, timber};
use beamcore::member::{
    Action, ActionKind, Category, Load, Member, OwnCombination, PartialFactors, Support,
};
use beamcore::response::Response;
use beamcore::section::{Part, Section, rectangle};
use beamcore::time::Time;
use beamcore::units::Number;

const CASE: &str = "roof-beam";
const SPAN: &str = "left to right";
const SNOW: &str = "characteristic, snow leading";

fn member() -> Result<Member> {
    let material = timber("GL24h", ServiceClass::Two)?;
    let beam = Part::new("beam", rectangle(140.mm(), 480.mm()), material);
    let variable = |name: &str, category: Category| {
        Action::new(name, ActionKind::Variable(category.factors()))
    };
    let snow = variable("snow", Category::Snow).trapezoidal(
        2.4.kN_per_m(),
        5.6.kN_per_m(),
        1.2.m(),
        10.m(),
    );
    let wind = variable("wind", Category::Wind).load(Load::Area {
        load: 0.3.kN_per_m2(),
        tributary_width: 3.2.m(),
        stretch: Some((1.2.m(), 10.m())),
    });
    Member::of_length(Section::of([beam])?, 11.2.m())
        .support(Support::pin("left", 1.2.m()))
        .support(Support::roller("right", 10.m()))
        .action(
            Action::permanent("roof")
                .self_weight()
                .area(0.62.kN_per_m2(), 3.2.m()),
        )
        .action(
            Action::permanent("tie")
                .favourable()
                .couple(2.5.kN_m(), 10.m()),
        )
        .action(snow)
        .action(variable("men", Category::Roof).point(1.0.kN(), 5.6.m()))
        .action(wind)
        .partial_factors(PartialFactors {
            permanent: 1.2,
            permanent_favourable: 0.9,
            variable: 1.6,
        })
        .combination(OwnCombination {
            name: "erection".into(),
            factors: vec![("roof".into(), 1.0), ("men".into(), 1.5)],
            is_ultimate: false,
        })
        .check()
}

fn limits() -> [Limit; 3] {
    let limit = |component, allowed| Limit {
        component,
        allowed,
        span: None,
        combination: None,
    };
    [
        limit(Component::Remaining, Allowed::SpanOver(300.0)),
        Limit {
            span: Some(SPAN.into()),
            ..limit(Component::Instant, Allowed::Value(35.mm()))
        },
        Limit {
            combination: Some("erection".into()),
            ..limit(Component::Total, Allowed::SpanOver(150.0))
        },
    ]
}

pub fn answers() -> Result<String> {
    let response = member()?.solve();
    let mut text = fields(&response)?;
    let mut put = |path: &str, value: f64| text += &line(CASE, path, value);
    let camber = response.camber(&CamberPlan {
        shape: Shape::ArcLeastGap,
        combination: "quasi-permanent".into(),
        time: Time::Final,
        fraction: 1.2,
        from: "left".into(),
        to: "right".into(),
        step: 5.mm(),
        rounding: Rounding::Down,
        least: 10.mm(),
        divisions: 8,
    })?;
    for component in Component::ALL {
        let path = format!(
            "components[\"{SNOW}\"].spans[\"{SPAN}\"].{}.value_m",
            component.symbol()
        );
        let found = response.deflection_component(component, SNOW, SPAN, Some(&camber))?;
        put(&path, found.greatest().value.to_m());
    }
    for (i, check) in response
        .check_limits(&limits(), Some(&camber))?
        .iter()
        .enumerate()
    {
        put(&format!("limits[{i}].value_m"), check.found.value.to_m());
        put(&format!("limits[{i}].utilisation"), check.utilisation());
    }
    put("camber.target_m", camber.target().to_m());
    put("camber.rise_m", camber.rise().to_m());
    put(
        "camber.radius_m",
        camber.radius().expect("an arc has a radius").to_m(),
    );
    for (i, ordinate) in camber.ordinates().iter().enumerate() {
        put(
            &format!("camber.ordinates[{i}].ordinate_m"),
            ordinate.ordinate.to_m(),
        );
    }
    let remaining = response.remaining(SNOW, Time::Final, &camber)?.greatest();
    let path = format!("camber.remaining[\"{SNOW}\"].final.greatest.value_m");
    put(&path, remaining.value.to_m());
    let trestles = Trestles {
        left: 2.m(),
        right: 9.2.m(),
        parts: vec!["beam".into()],
    };
    for (i, reading) in response.readings(&camber, &trestles)?.iter().enumerate() {
        put(
            &format!("camber.readings[{i}].standing_m"),
            reading.standing.to_m(),
        );
    }
    Ok(text)
}

fn fields(response: &Response) -> Result<String> {
    let mut text = String::new();
    let mut put = |path: &str, value: f64| text += &line(CASE, path, value);
    for combination in response.member().combinations() {
        let name = combination.name();
        for time in Time::ALL {
            let at = format!("combinations[\"{name}\"].{time}");
            let deflection = response.deflection(name, time)?.greatest();
            put(
                &format!("{at}.deflection.greatest.value_m"),
                deflection.value.to_m(),
            );
            put(
                &format!("{at}.deflection.greatest.at_m"),
                deflection.at.to_m(),
            );
            let moment = response.moment(name, time)?.greatest().value;
            put(&format!("{at}.moment.greatest.value_Nm"), moment.to_N_m());
            for support in ["left", "right"] {
                let reaction = response.reaction(name, time, support)?;
                put(
                    &format!("{at}.reactions[\"{support}\"].force_N"),
                    reaction.force.to_N(),
                );
            }
            let stress = response
                .stress(name, time, "beam")?
                .greatest_tension()
                .value;
            put(
                &format!("{at}.stresses[\"beam\"].tension.value_Pa"),
                stress.to_Pa(),
            );
            let span = response.span_deflection(name, time, SPAN)?.greatest().value;
            put(
                &format!("{at}.spans[\"{SPAN}\"].deflection.greatest.value_m"),
                span.to_m(),
            );
        }
    }
    Ok(text)
}
