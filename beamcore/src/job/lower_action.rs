//! Actions, loads and combinations of the document.

use super::document_action::{
    ActionDocument, ActionKindDocument, CombinationDocument, DurationDocument,
    PartialFactorsDocument,
};
use super::lower_load;
use crate::error::{ErrorKind, Problem};
use crate::member::{
    Action, ActionKind, Category, CombinationFactors, LoadDuration, OwnCombination, PartialFactors,
};
use crate::path;

/// The actions that are known; of the others the check against the schema or a problem tells.
pub(super) fn actions(documents: &[ActionDocument], problems: &mut Vec<Problem>) -> Vec<Action> {
    documents
        .iter()
        .filter_map(|document| action(document, problems))
        .collect()
}

fn action(document: &ActionDocument, problems: &mut Vec<Problem>) -> Option<Action> {
    let base = path::named("actions", &document.name);
    let kind = kind(&document.kind, &path::key(&base, "kind"), problems);
    let loads: Option<Vec<_>> = document
        .loads
        .iter()
        .enumerate()
        .map(|(i, document)| {
            lower_load::load(
                document,
                &path::indexed(&path::key(&base, "loads"), i),
                problems,
            )
        })
        .collect();
    let action = Action::new(&document.name, kind?);
    let action = if document.favourable {
        action.favourable()
    } else {
        action
    };
    let action = match document.duration {
        None => action,
        Some(DurationDocument::Permanent) => action.duration(LoadDuration::Permanent),
        Some(DurationDocument::Long) => action.duration(LoadDuration::Long),
        Some(DurationDocument::Medium) => action.duration(LoadDuration::Medium),
        Some(DurationDocument::Short) => action.duration(LoadDuration::Short),
        Some(DurationDocument::Instantaneous) => action.duration(LoadDuration::Instantaneous),
    };
    let action = match &document.start {
        None => action,
        Some(start) => action.starting(start.value()?),
    };
    let action = match &document.on {
        None => action,
        Some(layer) => action.on(layer),
    };
    Some(loads?.into_iter().fold(action, Action::load))
}

/// A variable action has a category or all three factors, never half of each.
fn kind(kind: &ActionKindDocument, base: &str, problems: &mut Vec<Problem>) -> Option<ActionKind> {
    let ActionKindDocument::Variable {
        category,
        psi_0,
        psi_1,
        psi_2,
    } = kind
    else {
        return Some(ActionKind::Permanent);
    };
    let base = path::key(base, "variable");
    match (category, psi_0, psi_1, psi_2) {
        (Some(name), None, None, None) => match Category::from_name(name) {
            Ok(category) => Some(ActionKind::Variable(category.factors())),
            Err(error) => {
                problems.extend(error.problems().iter().map(|problem| {
                    let at = path::key(&base, "category");
                    Problem::new(problem.kind(), at, problem.found(), problem.expected())
                }));
                None
            }
        },
        (None, Some(psi_0), Some(psi_1), Some(psi_2)) => {
            Some(ActionKind::Variable(CombinationFactors {
                psi_0: *psi_0,
                psi_1: *psi_1,
                psi_2: *psi_2,
            }))
        }
        _ => {
            problems.push(Problem::new(
                ErrorKind::Missing,
                base,
                "neither a category alone nor psi_0, psi_1 and psi_2 alone",
                "one or the other, for example category = \"A\"",
            ));
            None
        }
    }
}

/// The partial factors as given, or the recommended ones.
pub(super) fn partial_factors(document: Option<&PartialFactorsDocument>) -> PartialFactors {
    document.map_or_else(PartialFactors::default, |given| PartialFactors {
        permanent: given.permanent,
        permanent_favourable: given.permanent_favourable,
        variable: given.variable,
    })
}

/// The combinations of one's own.
pub(super) fn combinations(documents: &[CombinationDocument]) -> Vec<OwnCombination> {
    documents
        .iter()
        .map(|own| OwnCombination {
            name: own.name.clone(),
            factors: own
                .factors
                .iter()
                .map(|(name, factor)| (name.clone(), *factor))
                .collect(),
            is_ultimate: own.ultimate,
        })
        .collect()
}
