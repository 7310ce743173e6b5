//! What the engineer should look at.

use super::build::distinct;
use super::document::OutcomeDocument;
use super::figure::figure;
use super::notes::each;
use super::warnings_layers;
use crate::member::{ActionKind, Member};
use crate::section::Sideways;

/// What the engineer should look at.
pub(super) fn warnings(member: &Member, document: &OutcomeDocument) -> Vec<String> {
    let mut notes: Vec<String> = Vec::new();
    for (combination, time, results) in each(document) {
        for stress in &results.stresses {
            if let Some(utilisation) = &stress.utilisation
                && utilisation.value > 1.0
            {
                notes.push(format!(
                    "OVERSTRESSED: part \"{}\" is used to {:.2} of its design strength ({}, {time})",
                    stress.name, utilisation.value, combination.name
                ));
            }
        }
    }
    notes.extend(uplifts(member, document));
    notes.extend(warnings_layers::parting(member, document));
    notes.extend(warnings_layers::lifted(member, document));
    notes.extend(warnings_layers::slender(member, document));
    notes.extend(warnings_layers::bands(member));
    let section = &document.section.initial;
    let (yy, yz) = (
        section.bending_stiffness_yy_Nm2,
        section.bending_stiffness_yz_Nm2,
    );
    if yz.abs() > 1e-9 * yy && member.sideways() == Sideways::Held {
        notes.push(
            "The section has no axis of symmetry: left free sideways it would also bend \
             sideways, and stresses would be others"
                .into(),
        );
    }
    let variable = member
        .actions()
        .iter()
        .any(|action| matches!(action.kind(), ActionKind::Variable(_)));
    if variable && member.spans().len() > 1 {
        notes.push(
            "Variable actions act on the whole of their loads at once: the worst pattern of \
             loaded and unloaded spans was not searched"
                .into(),
        );
    }
    for material in distinct(member.parts()) {
        if let Some(origin) = material.origin() {
            notes.push(format!(
                "Check before use: E and density of \"{}\" are of class {origin}",
                material.name()
            ));
        }
    }
    for material in distinct(member.parts()) {
        for text in material.overrides() {
            notes.push(format!("Overridden in \"{}\": {text}", material.name()));
        }
    }
    notes.extend(member.section().notes().iter().cloned());
    notes.extend(member.notes().iter().cloned());
    notes
}

/// A warning for each support that must hold the member down, with the worst combination.
fn uplifts(member: &Member, document: &OutcomeDocument) -> Vec<String> {
    let worst = |support: &str| {
        each(document)
            .filter_map(|(combination, time, results)| {
                let found = results
                    .reactions
                    .iter()
                    .find(|reaction| reaction.name == support);
                found.map(|reaction| (reaction.force_N, &combination.name, time))
            })
            .min_by(|a, b| a.0.total_cmp(&b.0))
    };
    member
        .supports()
        .iter()
        .filter_map(|support| {
            let (force, combination, time) = worst(support.name())?;
            (force < 0.0).then(|| {
                format!(
                    "UPLIFT: the support \"{}\" must hold the member down, with {} kN at most \
                     ({combination}, {time})",
                    support.name(),
                    figure(-force / 1e3, 2)
                )
            })
        })
        .collect()
}
