//! What can be wrong with sections along a member, its layers and what refers to them.

use super::load::{Load, Tendon};
use super::plan::MemberPlan;
use super::references::{merged_layer, slip_of};
use super::sections::Stretch;
use super::shear::ShearModel;
use super::{Release, node};
use crate::check;
use crate::error::{ErrorKind, Problem};
use crate::path;
use crate::section::Sideways;
use crate::units::Length;

/// Problems of a plan whose changes of section are in order.
pub(super) fn problems(plan: &MemberPlan, sections: &[Stretch]) -> Vec<Problem> {
    let mut problems = Vec::new();
    let first = plan.section();
    problems.extend(first.position_problems(plan.length()));
    for stretch in sections.iter().skip(1) {
        let section = stretch.start();
        let layers = |s: &crate::section::Section| -> Vec<Vec<String>> {
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
        let at = path::indexed("member.hinges", i);
        match hinge.release() {
            Release::Moment(Some(layer)) | Release::Butt(layer) => {
                problems.extend(references(merged_layer(first, layer, &at)));
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
        let held = support
            .held_layers()
            .iter()
            .map(|hold| (&hold.layer, "holding"));
        let under = support.layers().iter().map(|layer| (layer, "under"));
        for (layer, key) in under.chain(held) {
            problems.extend(references(merged_layer(
                first,
                layer,
                &path::key(&base, key),
            )));
        }
    }
    if plan.is_held() == Sideways::Free {
        problems.extend(free_sideways(plan));
    }
    problems.extend(loads(plan));
    problems
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
fn loads(plan: &MemberPlan) -> Vec<Problem> {
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
                        problems.extend(part_problem(section, name, &path::key(&at, "parts")));
                    }
                    problems.extend(expansion_problems(section, parts, action.name()));
                }
                Load::TemperatureDifference { .. } => {
                    problems.extend(expansion_problems(section, &[], action.name()));
                }
                Load::Strain { part, .. } => {
                    problems.extend(part_problem(section, part, &path::key(&at, "part")));
                }
                Load::Prestress { tendon, .. } => problems.extend(order(tendon, &at)),
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

fn part_problem(section: &crate::section::Section, name: &str, at: &str) -> Option<Problem> {
    let names: Vec<_> = section
        .parts()
        .iter()
        .map(crate::section::Part::name)
        .collect();
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
fn expansion_problems(
    section: &crate::section::Section,
    parts: &[String],
    action: &str,
) -> Vec<Problem> {
    let mut told: Vec<&str> = Vec::new();
    let mut problems = Vec::new();
    for part in section.placed() {
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
    let base = path::key(at, "points");
    if points.len() < 2 {
        return vec![Problem::new(
            ErrorKind::Missing,
            base,
            format!("{} points", points.len()),
            "at least two points: both anchors",
        )];
    }
    let mut problems = Vec::new();
    for (i, pair) in points.windows(2).enumerate() {
        if pair[1].0 <= pair[0].0 {
            problems.push(Problem::new(
                ErrorKind::Position,
                path::indexed(&base, i + 1),
                pair[1].0.to_string(),
                format!("a place to the right of the point before, at {}", pair[0].0),
            ));
        }
    }
    problems
}

/// Changes of the section go from left to right, inside the member.
pub(super) fn order_of_changes(plan: &MemberPlan) -> Vec<Problem> {
    let mut problems = Vec::new();
    let mut reached = Length::ZERO;
    for (i, change) in plan.changes().iter().enumerate() {
        let at = path::indexed("member.changes", i);
        let slack = plan.length() * super::SAME_PLACE;
        if !(change.from() >= reached && change.from() < plan.length()) {
            problems.push(Problem::new(
                ErrorKind::Position,
                &at,
                change.from().to_string(),
                format!(
                    "a place from {reached} on, left of the end at {}",
                    plan.length()
                ),
            ));
        } else if !change.to().is_finite() || change.to() > plan.length() {
            problems.push(Problem::new(
                ErrorKind::Position,
                &at,
                change.to().to_string(),
                format!("a place on the member, up to {}", plan.length()),
            ));
        } else if matches!(change, super::SectionChange::Taper { .. })
            && change.to() - change.from() <= slack
        {
            problems.push(Problem::new(
                ErrorKind::Position,
                &at,
                format!("a taper from {} to {}", change.from(), change.to()),
                "a taper that ends right of where it begins",
            ));
        }
        reached = change.to();
    }
    problems
}

/// Hinges and anchors stand inside the member, each at a place of its own.
pub(super) fn places(plan: &MemberPlan) -> Vec<Problem> {
    let mut problems = Vec::new();
    let slack = plan.length() * super::SAME_PLACE;
    for (i, hinge) in plan.hinges().iter().enumerate() {
        let at = path::key(&path::indexed("member.hinges", i), "at");
        let place = hinge.at();
        if !(place > slack && place < plan.length() - slack) {
            problems.push(Problem::new(
                ErrorKind::Position,
                &at,
                format!("a hinge at {place}, at an end of the member or beyond it"),
                format!("a place between the ends, 0 m and {}", plan.length()),
            ));
        }
        let same = |other: &super::Hinge| {
            other.release() == hinge.release() && (other.at() - place).abs() <= slack
        };
        if plan.hinges()[..i].iter().any(same) {
            problems.push(Problem::new(
                ErrorKind::Duplicate,
                &at,
                format!("two hinges of one kind at {place}"),
                "one hinge at each place",
            ));
        }
    }
    for anchor in plan.anchors() {
        let at = path::key(&path::named("member.anchors", &anchor.name), "at");
        if !(anchor.at >= Length::ZERO && anchor.at <= plan.length()) {
            problems.push(Problem::new(
                ErrorKind::Position,
                at,
                anchor.at.to_string(),
                format!("a place on the member, from 0 m to {}", plan.length()),
            ));
        }
        check::name(&mut problems, &anchor.name, "member.anchors");
    }
    let names = plan.anchors().iter().map(|anchor| anchor.name.as_str());
    check::unique(&mut problems, names, "anchors", "member.anchors");
    problems
}
