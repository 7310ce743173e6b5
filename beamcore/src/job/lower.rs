//! From the document to the core's own types, through their public constructors.
//!
//! Texts of quantities that are wrong were told by the check against the schema; here they make
//! the thing they belong to unknown (`None`), so that all other mistakes can still be found.

use super::document::{JobDocument, SidewaysDocument, SupportDocument, SupportKindDocument};
use super::{lower_action, lower_camber, lower_material, lower_section};
use crate::camber::{CamberPlan, Trestles};
use crate::error::{Error, ErrorKind, Problem};
use crate::limits::Limit;
use crate::member::{self, Known, Member, Support, SupportKind};
use crate::section::{SectionForces, Sideways};

/// What a document asks for, in the core's own types.
#[derive(Clone, Debug)]
pub(super) struct Lowered {
    pub(super) member: Member,
    pub(super) camber: Option<CamberPlan>,
    pub(super) trestles: Option<Trestles>,
    pub(super) limits: Vec<Limit>,
    pub(super) forces: Vec<(String, SectionForces)>,
}

/// The core's own types of a document, or all mistakes of meaning in it.
pub(super) fn lower(document: &JobDocument) -> Result<Lowered, Vec<Problem>> {
    let mut problems = Vec::new();
    check_quantity(&mut problems, document.quantity);
    let materials = lower_material::all(&document.materials, &mut problems);
    let section = lower_section::section(&document.section, &materials, &mut problems);
    let forces = lower_section::forces(&document.section, &mut problems);
    let length = document.member.length.value();
    let supports: Vec<_> = document
        .member
        .supports
        .iter()
        .filter_map(support)
        .collect();
    let actions = lower_action::actions(&document.actions, &mut problems);
    let known_supports = Known {
        entries: &supports,
        is_complete: supports.len() == document.member.supports.len(),
    };
    let known_actions = Known {
        entries: &actions,
        is_complete: actions.len() == document.actions.len(),
    };
    let all_known = known_supports.is_complete && known_actions.is_complete;
    problems.extend(member::problems_of(
        section.as_ref(),
        length,
        &known_supports,
        &known_actions,
    ));
    let factors = lower_action::partial_factors(document.partial_factors.as_ref());
    let own = lower_action::combinations(&document.combinations);
    let camber = document.camber.as_ref().map(lower_camber::plan);
    let trestles = document.camber.as_ref().and_then(lower_camber::trestles);
    let limits = lower_camber::limits(&document.limits, &mut problems);
    if all_known {
        problems.extend(member::combination_problems(&actions, &factors, &own));
        let combinations = member::combinations_of(&actions, &factors, &own);
        if let Some(Some(plan)) = &camber {
            problems.extend(plan.problems(&supports, &combinations));
        }
        if let (Some(length), false) = (length, supports.is_empty()) {
            let spans = member::spans_of(length, &supports);
            let names: Vec<_> = spans.iter().map(member::Span::name).collect();
            for (i, limit) in limits.iter().enumerate() {
                problems.extend(limit.problems(i, &names, &combinations));
            }
        }
    }
    if let (Some(Some(trestles)), Some(section), Some(length)) = (&trestles, &section, length) {
        problems.extend(trestles.problems(section, length));
    }
    if !problems.is_empty() || !all_known {
        return Err(problems);
    }
    // Whatever is still unknown was told by the check against the schema.
    let (Some(section), Some(length)) = (section, length) else {
        return Err(problems);
    };
    let sideways = match document.member.sideways {
        None | Some(SidewaysDocument::Held) => Sideways::Held,
        Some(SidewaysDocument::Free) => Sideways::Free,
    };
    let plan = Member::of_length(section, length)
        .partial_factors(factors)
        .sideways(sideways);
    let plan = supports.into_iter().fold(plan, member::MemberPlan::support);
    let plan = actions.into_iter().fold(plan, member::MemberPlan::action);
    let plan = own.into_iter().fold(plan, member::MemberPlan::combination);
    let member = plan.check().map_err(into_problems)?;
    Ok(Lowered {
        member,
        camber: camber.flatten(),
        trestles: trestles.flatten(),
        limits,
        forces,
    })
}

fn check_quantity(problems: &mut Vec<Problem>, quantity: Option<u32>) {
    if quantity == Some(0) {
        problems.push(Problem::new(
            ErrorKind::Value,
            "quantity",
            "0",
            "a number from 1",
        ));
    }
}

fn into_problems(error: Error) -> Vec<Problem> {
    error.problems().to_vec()
}

fn support(support: &SupportDocument) -> Option<Support> {
    let kind = match support.kind {
        SupportKindDocument::Pin => SupportKind::Pin,
        SupportKindDocument::Roller => SupportKind::Roller,
        SupportKindDocument::Fixed => SupportKind::Fixed,
    };
    Some(Support::new(&support.name, kind, support.at.value()?))
}
