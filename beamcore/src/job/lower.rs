//! From the document to the core's own types, through their public constructors.
//!
//! Texts of quantities that are wrong were told by the check against the schema; here they make
//! the thing they belong to unknown (`None`), so that all other mistakes can still be found.

use super::document::{
    JobDocument, OutlineDocument, PartDocument, PlaceDocument, SupportDocument, SupportKindDocument,
};
use super::{lower_action, lower_camber, lower_material};
use crate::camber::{CamberPlan, Trestles};
use crate::error::{Error, ErrorKind, Problem};
use crate::lookup;
use crate::material::Material;
use crate::member::{self, Known, Member, Support, SupportKind};
use crate::path;
use crate::response::Limit;
use crate::section::{Part, Section, Side, rectangle};

/// What a document asks for, in the core's own types.
#[derive(Clone, Debug)]
pub(super) struct Lowered {
    pub(super) member: Member,
    pub(super) camber: Option<CamberPlan>,
    pub(super) trestles: Option<Trestles>,
    pub(super) limits: Vec<Limit>,
}

/// The core's own types of a document, or all mistakes of meaning in it.
pub(super) fn lower(document: &JobDocument) -> Result<Lowered, Vec<Problem>> {
    let mut problems = Vec::new();
    check_quantity(&mut problems, document.quantity);
    let materials = lower_material::all(&document.materials, &mut problems);
    let section = section(document, &materials, &mut problems);
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
    let plan = Member::of_length(section, length).partial_factors(factors);
    let plan = supports.into_iter().fold(plan, member::MemberPlan::support);
    let plan = actions.into_iter().fold(plan, member::MemberPlan::action);
    let plan = own.into_iter().fold(plan, member::MemberPlan::combination);
    let member = plan.check().map_err(into_problems)?;
    Ok(Lowered {
        member,
        camber: camber.flatten(),
        trestles: trestles.flatten(),
        limits,
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

fn section(
    document: &JobDocument,
    materials: &[(String, Option<Material>)],
    problems: &mut Vec<Problem>,
) -> Option<Section> {
    let mut parts = Vec::new();
    let mut known = true;
    for part in &document.section.parts {
        let found = materials
            .iter()
            .find(|material| material.0 == part.material);
        if found.is_none() {
            let names: Vec<_> = materials
                .iter()
                .map(|material| material.0.as_str())
                .collect();
            problems.push(Problem::new(
                ErrorKind::Name,
                path::key(&path::named("section.parts", &part.name), "material"),
                format!("the unknown material \"{}\"", part.material),
                format!("one of the materials {}", lookup::listed(&names)),
            ));
        }
        match found
            .and_then(|material| material.1.as_ref())
            .and_then(|m| lower_part(part, m))
        {
            Some(part) => parts.push(part),
            None => known = false,
        }
    }
    if !known && parts.is_empty() {
        return None;
    }
    match Section::of(parts) {
        Ok(section) => known.then_some(section),
        Err(error) => {
            // A part that is left out here must not be missed by its neighbours.
            let missed = |p: &Problem| !known && p.found().starts_with("the unknown part");
            problems.extend(into_problems(error).into_iter().filter(|p| !missed(p)));
            None
        }
    }
}

fn lower_part(part: &PartDocument, material: &Material) -> Option<Part> {
    let OutlineDocument::Rectangle { width, height } = &part.outline;
    let outline = rectangle(width.value()?, height.value()?);
    let lowered = Part::new(&part.name, outline, material.clone());
    Some(match &part.place {
        None => lowered,
        Some(PlaceDocument::At { y, z }) => lowered.at(y.value()?, z.value()?),
        Some(PlaceDocument::LeftOf(other)) => lowered.beside(Side::Left, other.as_str()),
        Some(PlaceDocument::RightOf(other)) => lowered.beside(Side::Right, other.as_str()),
        Some(PlaceDocument::Above(other)) => lowered.beside(Side::Above, other.as_str()),
        Some(PlaceDocument::Below(other)) => lowered.beside(Side::Below, other.as_str()),
    })
}

fn support(support: &SupportDocument) -> Option<Support> {
    let kind = match support.kind {
        SupportKindDocument::Pin => SupportKind::Pin,
        SupportKindDocument::Roller => SupportKind::Roller,
        SupportKindDocument::Fixed => SupportKind::Fixed,
    };
    Some(Support::new(&support.name, kind, support.at.value()?))
}
