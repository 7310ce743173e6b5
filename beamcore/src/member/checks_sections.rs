//! What can be wrong with sections along a member, its layers and what refers to them.

use super::checks_parts::check_self_weight;
use super::load::{Load, Tendon};
use super::plan::MemberPlan;
use super::references::{merged_layer, slip_of, strands};
use super::sections::Stretch;
use super::shear::ShearModel;
use super::{Release, node};
use crate::check;
use crate::error::{ErrorKind, Problem};
use crate::path;
use crate::section::{Section, Sideways};

/// Problems of a plan whose changes of section are in order.
pub(super) fn problems(plan: &MemberPlan, sections: &[Stretch]) -> Vec<Problem> {
    let mut problems = Vec::new();
    let first = plan.section();
    problems.extend(first.position_problems(plan.length()));
    problems.extend(uncovered(plan));
    if let Some(pitch) = plan.pitch_angle()
        && (!pitch.is_finite() || pitch.si().abs() >= std::f64::consts::FRAC_PI_2)
    {
        problems.push(Problem::new(
            ErrorKind::Value,
            "member.pitch",
            pitch.to_string(),
            "an angle between -90 and 90 degrees",
        ));
    }
    for stretch in sections.iter().skip(1) {
        let section = stretch.start();
        let layers = |s: &Section| -> Vec<Vec<String>> {
            s.merged_layers()
                .iter()
                .map(|m| m.layers().to_vec())
                .collect()
        };
        let has_slips = !first.slips().is_empty() || !section.slips().is_empty();
        if has_slips && (layers(section) != layers(first) || section.joints() != first.joints()) {
            problems.push(Problem::new(
                ErrorKind::Geometry,
                "member.changes",
                format!("other layers or joints from {} m on", stretch.from),
                "the same layers and joints all along a member whose joints slip",
            ));
        }
    }
    problems.extend(node::given_shear_problem(first, plan.shear_model()));
    if let ShearModel::Given(stiffness) = plan.shear_model() {
        check::positive(&mut problems, stiffness, "member.shear.given");
    }
    let references = |result: crate::Result<usize>| match result {
        Ok(_) => Vec::new(),
        Err(error) => error.problems().to_vec(),
    };
    for action in plan.actions() {
        if let Some(layer) = action.layer() {
            let at = path::key(&path::named("actions", action.name()), "on");
            problems.extend(references(merged_layer(first, layer, &at)));
        }
    }
    for (i, hinge) in plan.hinges().iter().enumerate() {
        let at = hinge.path(i);
        let layer_at = path::key(&at, "layer");
        match hinge.release() {
            Release::Moment(Some(layer)) => match merged_layer(first, layer, &layer_at) {
                Ok(merged) => problems.extend(shared_deflection(first, layer, merged, &layer_at)),
                Err(error) => problems.extend(error.problems().iter().cloned()),
            },
            Release::Butt(layer) => {
                problems.extend(references(merged_layer(first, layer, &layer_at)));
            }
            Release::Moment(None) | Release::Shear => {}
        }
        if matches!(hinge.release(), Release::Butt(_)) && first.slips().is_empty() {
            problems.push(Problem::new(
                ErrorKind::Value,
                &at,
                "a butt joint in a member without layers that slip",
                "a moment hinge, or a section of layers with a joint that slips",
            ));
        }
    }
    for anchor in plan.anchors() {
        let base = path::named("member.anchors", &anchor.name);
        problems.extend(references(slip_of(
            first,
            &anchor.joint,
            &path::key(&base, "joint"),
        )));
        if let Some(stiffness) = anchor.stiffness {
            check::not_negative(&mut problems, stiffness, &path::key(&base, "stiffness"));
        }
    }
    for support in plan.supports() {
        let base = path::named("member.supports", support.name());
        let under = path::key(&base, "under");
        for layer in support.layers() {
            problems.extend(references(merged_layer(first, layer, &under)));
        }
        for (i, hold) in support.held_layers().iter().enumerate() {
            let at = path::indexed(&path::key(&base, "holding"), i);
            let at = path::key(&at, "layer");
            problems.extend(references(merged_layer(first, &hold.layer, &at)));
        }
    }
    if plan.is_held() == Sideways::Free {
        problems.extend(free_sideways(plan));
    }
    for stretch in sections.iter().skip(1) {
        check_self_weight(&mut problems, stretch.start(), plan.actions());
    }
    problems.extend(loads(plan, sections));
    problems
}

/// A hinge in one layer turns nothing but that layer only where it has a deflection of its own.
fn shared_deflection(section: &Section, name: &str, merged: usize, at: &str) -> Option<Problem> {
    let (_, strands) = strands(section);
    let sharing = strands.iter().filter(|strand| **strand == strands[merged]);
    (sharing.count() > 1).then(|| {
        Problem::new(
            ErrorKind::Value,
            at,
            format!("a hinge in the layer \"{name}\", which shares its deflection with others"),
            "a layer whose joints have a transverse modulus, or a hinge through all layers",
        )
    })
}

/// At each place at least one layer must be there.
fn uncovered(plan: &MemberPlan) -> Option<Problem> {
    let section = plan.section();
    let mut ends: Vec<f64> = section.places();
    ends.extend([0.0, plan.length().si()]);
    ends.retain(|x| *x >= 0.0 && *x <= plan.length().si());
    ends.sort_by(f64::total_cmp);
    let bare = ends.windows(2).find(|ends| {
        let middle = f64::midpoint(ends[0], ends[1]);
        ends[1] > ends[0] && (0..section.placed().len()).all(|p| !section.is_there(p, middle))
    })?;
    Some(Problem::new(
        ErrorKind::Position,
        "section.layers",
        format!("no layer at all between {} m and {} m", bare[0], bare[1]),
        "at least one layer at each place of the member",
    ))
}

/// A member that is free sideways has one section in one layer, without axial force.
fn free_sideways(plan: &MemberPlan) -> Option<Problem> {
    let found = if plan.section().merged_layers().len() > 1 {
        "layers that slip"
    } else if !plan.changes().is_empty() {
        "a section that changes"
    } else if plan.pitch_angle().is_some() {
        "a pitch"
    } else if plan
        .actions()
        .iter()
        .flat_map(|action| action.loads())
        .any(|load| load.is_axial() || load.is_strain())
    {
        "axial forces or free strains"
    } else {
        return None;
    };
    Some(Problem::new(
        ErrorKind::Value,
        "member.sideways",
        format!("{found} in a member that is free sideways"),
        "a member that is held sideways",
    ))
}

/// What loads refer to.
fn loads(plan: &MemberPlan, sections: &[Stretch]) -> Vec<Problem> {
    let mut problems = Vec::new();
    let section = plan.section();
    for action in plan.actions() {
        let base = path::key(&path::named("actions", action.name()), "loads");
        for (i, load) in action.loads().iter().enumerate() {
            let at = path::key(&path::indexed(&base, i), load.name());
            if load.is_axial() && section.merged_layers().len() > 1 && action.layer().is_none() {
                problems.push(Problem::new(
                    ErrorKind::Missing,
                    path::key(&path::named("actions", action.name()), "on"),
                    "a force along a member of several layers that slip",
                    "the layer that it enters",
                ));
            }
            match load {
                Load::Settlement { support, .. } | Load::ImposedRotation { support, .. } => {
                    problems.extend(moved(plan, support, load, &at));
                }
                Load::Temperature { parts, .. } => {
                    for name in parts {
                        problems.extend(part_problem(sections, name, &path::key(&at, "parts")));
                    }
                    problems.extend(expansion_problems(sections, parts, action.name()));
                }
                Load::TemperatureDifference { .. } => {
                    problems.extend(expansion_problems(sections, &[], action.name()));
                }
                Load::Strain { part, .. } => {
                    problems.extend(part_problem(sections, part, &path::key(&at, "part")));
                }
                Load::Prestress { tendon, .. } => {
                    problems.extend(order(tendon, &path::key(&at, "tendon")));
                }
                _ => {}
            }
        }
    }
    problems
}

/// What is moved must be held.
fn moved(plan: &MemberPlan, name: &str, load: &Load, at: &str) -> Option<Problem> {
    let supports = plan.supports();
    let Some(support) = supports.iter().find(|support| support.name() == name) else {
        let names: Vec<_> = supports.iter().map(super::Support::name).collect();
        return Some(Problem::new(
            ErrorKind::Name,
            path::key(at, "support"),
            format!("the unknown support \"{name}\""),
            format!("one of the supports {}", crate::lookup::listed(&names)),
        ));
    };
    let turns = matches!(load, Load::ImposedRotation { .. });
    (turns && !support.holds_rotation()).then(|| {
        Problem::new(
            ErrorKind::Value,
            path::key(at, "support"),
            format!("a rotation of the support \"{name}\", where nothing holds the rotation"),
            "a support that is fixed or has a rotational spring",
        )
    })
}

fn part_problem(sections: &[Stretch], name: &str, at: &str) -> Option<Problem> {
    let parts = sections.iter().flat_map(|stretch| stretch.start().parts());
    let mut names: Vec<&str> = Vec::new();
    for part in parts {
        if !names.contains(&part.name()) {
            names.push(part.name());
        }
    }
    (!names.contains(&name)).then(|| {
        Problem::new(
            ErrorKind::Name,
            at,
            format!("the unknown part \"{name}\""),
            format!("one of the parts {}", crate::lookup::listed(&names)),
        )
    })
}

/// Warming needs the thermal expansion of each part that becomes warmer.
fn expansion_problems(sections: &[Stretch], parts: &[String], action: &str) -> Vec<Problem> {
    let mut told: Vec<&str> = Vec::new();
    let mut problems = Vec::new();
    for part in sections.iter().flat_map(|s| s.start().placed()) {
        let material = part.material();
        let is_warm = parts.is_empty() || parts.iter().any(|name| name == part.name());
        if is_warm && material.expansion().is_none() && !told.contains(&material.name()) {
            told.push(material.name());
            problems.push(Problem::new(
                ErrorKind::Missing,
                path::key(
                    &path::named("materials", material.name()),
                    "thermal_expansion",
                ),
                "no thermal expansion",
                format!("a thermal expansion, since the action \"{action}\" warms it"),
            ));
        }
    }
    problems
}

/// The points of a tendon go from left to right.
fn order(tendon: &Tendon, at: &str) -> Vec<Problem> {
    let points = tendon.points();
    let base = path::key(at, tendon.name());
    if points.len() < 2 {
        return vec![Problem::new(
            ErrorKind::Missing,
            base,
            if points.is_empty() {
                "no points"
            } else {
                "one point"
            },
            "at least two points: both anchors",
        )];
    }
    let mut problems = Vec::new();
    for (i, pair) in points.windows(2).enumerate() {
        if pair[1].0 <= pair[0].0 {
            problems.push(Problem::new(
                ErrorKind::Position,
                path::key(&path::indexed(&base, i + 1), "at"),
                pair[1].0.to_string(),
                format!("a place to the right of the point before, at {}", pair[0].0),
            ));
        }
    }
    problems
}
