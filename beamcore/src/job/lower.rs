//! From the document to the core's own types, through their public constructors.
//!
//! Texts of quantities that are wrong were told by the check against the schema; here they make
//! the thing they belong to unknown (`None`), so that all other mistakes can still be found.

use super::document::{
    ActionDocument, ActionKindDocument, CamberDocument, JobDocument, LoadDocument, OutlineDocument,
    PartDocument, PlaceDocument, RoundingDocument, SupportDocument, SupportKindDocument,
    TimeDocument,
};
use super::lower_material;
use crate::camber::{CamberPlan, Rounding};
use crate::error::{Error, ErrorKind, Problem};
use crate::lookup;
use crate::material::Material;
use crate::member::{
    self, Action, ActionKind, CombinationFactors, Known, Load, Member, Support, SupportKind,
};
use crate::path;
use crate::section::{Part, Section, Side, rectangle};
use crate::time::Time;

/// The member and the camber wish of a document, or all mistakes of meaning in it.
pub(super) fn lower(document: &JobDocument) -> Result<(Member, Option<CamberPlan>), Vec<Problem>> {
    let mut problems = Vec::new();
    let materials = lower_material::all(&document.materials, &mut problems);
    let section = section(document, &materials, &mut problems);
    let length = document.member.length.value();
    let supports: Vec<_> = document
        .member
        .supports
        .iter()
        .filter_map(support)
        .collect();
    let actions: Vec<_> = document.actions.iter().filter_map(action).collect();
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
    let camber = document.camber.as_ref().map(camber);
    if let Some(Some(plan)) = &camber
        && all_known
    {
        problems.extend(plan.problems(&supports, &member::combinations_of(&actions)));
    }
    if !problems.is_empty() || !all_known {
        return Err(problems);
    }
    // Whatever is still unknown was told by the check against the schema.
    let (Some(section), Some(length)) = (section, length) else {
        return Err(problems);
    };
    let plan = Member::of_length(section, length);
    let plan = supports.into_iter().fold(plan, member::MemberPlan::support);
    let plan = actions.into_iter().fold(plan, member::MemberPlan::action);
    let member = plan.check().map_err(into_problems)?;
    Ok((member, camber.flatten()))
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

fn action(action: &ActionDocument) -> Option<Action> {
    let kind = match action.kind {
        ActionKindDocument::Permanent => ActionKind::Permanent,
        ActionKindDocument::Variable {
            psi_0,
            psi_1,
            psi_2,
        } => ActionKind::Variable(CombinationFactors {
            psi_0,
            psi_1,
            psi_2,
        }),
    };
    let mut lowered = Action::new(&action.name, kind);
    for load in &action.loads {
        lowered = lowered.load(match load {
            LoadDocument::SelfWeight => Load::SelfWeight,
            LoadDocument::Uniform { load } => Load::Uniform {
                load: load.value()?,
            },
            LoadDocument::Partial { load, from, to } => Load::Partial {
                load: load.value()?,
                from: from.value()?,
                to: to.value()?,
            },
            LoadDocument::Point { load, at } => Load::Point {
                load: load.value()?,
                at: at.value()?,
            },
        });
    }
    Some(lowered)
}

fn camber(camber: &CamberDocument) -> Option<CamberPlan> {
    Some(CamberPlan {
        combination: camber.combination.clone(),
        time: match camber.time {
            TimeDocument::Initial => Time::Initial,
            TimeDocument::Final => Time::Final,
        },
        fraction: camber.fraction,
        from: camber.from.clone(),
        to: camber.to.clone(),
        step: camber.step.value()?,
        rounding: match camber.rounding {
            RoundingDocument::Nearest => Rounding::Nearest,
            RoundingDocument::Down => Rounding::Down,
            RoundingDocument::Up => Rounding::Up,
        },
        divisions: camber.divisions,
    })
}
