//! What loads refer to: layers, supports, parts, points of tendons.

use super::load::{Load, Tendon};
use super::plan::MemberPlan;
use super::sections::Stretch;
use crate::error::{ErrorKind, Problem};
use crate::path;
use crate::section::{Layer, Section};
use crate::units::Length;

/// What loads refer to.
pub(super) fn problems(plan: &MemberPlan, sections: &[Stretch]) -> Vec<Problem> {
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
            if let Some(layer) = action.layer() {
                let on = path::key(&path::named("actions", action.name()), "on");
                problems.extend(beside_layer(plan, layer, load, &on));
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

/// A load must stand where its layer is there.
fn beside_layer(plan: &MemberPlan, name: &str, load: &Load, at: &str) -> Option<Problem> {
    if load.is_strain() || *load == Load::SelfWeight {
        return None;
    }
    if matches!(load, Load::Settlement { .. } | Load::ImposedRotation { .. }) {
        return None;
    }
    let (from, to) = extent(plan.section(), name)?;
    let places = load.places();
    let first = places.first().copied().unwrap_or(Length::ZERO);
    let last = places.last().copied().unwrap_or_else(|| plan.length());
    let slack = plan.length() * super::SAME_PLACE;
    (first < from - slack || last > to + slack).then(|| {
        Problem::new(
            ErrorKind::Position,
            at,
            format!(
                "a load between {first} and {last} on the layer \"{name}\", which is there from \
                 {from} to {to}"
            ),
            "loads within the layer that they enter",
        )
    })
}

/// From where to where a named layer, with those that rigid joints hold to it, is there; `None` for
/// the whole length, and for a name that no layer bears.
pub(super) fn extent(section: &Section, name: &str) -> Option<(Length, Length)> {
    let has = |names: &[String]| names.iter().any(|own| own == name);
    let merged = section.merged_layers().iter().find(|m| has(m.layers()))?;
    let own = section.layers().iter().filter(|layer| {
        let name = layer.name();
        merged.layers().iter().any(|other| other == name)
    });
    own.map(Layer::extent)
        .reduce(|a, b| Some((a?.0.min(b?.0), a?.1.max(b?.1))))
        .flatten()
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
