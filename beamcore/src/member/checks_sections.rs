//! What can be wrong with sections along a member, its layers and what refers to them.

use super::checks_parts::check_self_weight;
use super::plan::MemberPlan;
use super::references::{merged_layer, slip_of, strands};
use super::sections::Stretch;
use super::shear::ShearModel;
use super::{Release, checks_loads, node};
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
            if let Some((from, to)) = checks_loads::extent(first, layer)
                && !(from <= support.at() && support.at() <= to)
            {
                problems.push(Problem::new(
                    ErrorKind::Position,
                    &under,
                    format!(
                        "the layer \"{layer}\", which is there from {from} to {to}, at {}",
                        support.at()
                    ),
                    "layers that are there at the support",
                ));
            }
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
    problems.extend(checks_loads::problems(plan, sections));
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
