//! What rests on which rule, what was assumed, what deserves a look, what was not checked.

use super::build::distinct;
use super::document::{CombinationOutcome, OutcomeDocument};
use super::figure::figure;
use crate::constants::GRAVITY;
use crate::job::Job;
use crate::member::{ActionKind, Load, Member, PartialFactors, SupportKind};
use crate::section::{InitialStrain, PlacedPart, Sideways};
use crate::time::Time;

/// The rules that the results rest on.
pub(super) fn rules(member: &Member) -> Vec<String> {
    let factors = member.partial_factors();
    let origin = if *factors == PartialFactors::default() {
        "EN 1990:2002 Table A1.2(B), recommended values (from memory)"
    } else {
        "as given, instead of the recommended ones"
    };
    vec![
        "Combinations: EN 1990:2002 6.4.3.2 eq. 6.10 and 6.5.3, each unfavourable variable action \
         leading in turn (from memory)"
            .into(),
        format!(
            "Partial factors: {} permanent, {} permanent and favourable, {} variable, {origin}",
            factors.permanent, factors.permanent_favourable, factors.variable
        ),
        "Final state: (combination - quasi-permanent share) with E, plus the quasi-permanent \
         share with E/(1 + creep factor) of each material"
            .into(),
        "Components of the deflection: EN 1990:2002 A1.4.3 (from memory); creep under psi_2 Q \
         belongs to w_3"
            .into(),
    ]
}

/// What was assumed.
pub(super) fn assumptions(job: &Job) -> Vec<String> {
    let member = job.member();
    let mut notes: Vec<String> = job
        .document()
        .assumptions
        .iter()
        .map(|text| format!("For this job: {text}"))
        .collect();
    notes.extend([
        "Plane sections stay plane; materials are linear elastic; deflections are small".into(),
        "The parts are joined rigidly, without slip".into(),
        "Deflection by bending only; shear deflection is left out".into(),
        match member.sideways() {
            Sideways::Held => {
                "The member bends about the level axis only; it is held sideways".into()
            }
            Sideways::Free => {
                "The member is free to move sideways between its supports, which hold \
                 it there as they hold it upright; loads act through the shear centre"
                    .into()
            }
        },
        "The axial and longitudinal restraint of supports causes no axial force".into(),
    ]);
    if member
        .actions()
        .iter()
        .any(|action| action.loads().contains(&Load::SelfWeight))
    {
        notes.push(format!(
            "Self-weight from mean densities with g = {GRAVITY} m/s2"
        ));
    }
    if member
        .actions()
        .iter()
        .any(|action| action.start().is_some())
    {
        notes.push("Starts of actions are recorded only: creep is that of the whole life".into());
    }
    let strained = |part: &&PlacedPart| part.initial_strain() != InitialStrain::NONE;
    for part in member.section().placed().iter().filter(strained) {
        notes.push(format!(
            "Initial strain of part \"{}\" acts from the first day, with the factor 1 in every \
             combination; its stresses relax by creep",
            part.name()
        ));
    }
    let holding = |kind| kind == SupportKind::Pin || kind == SupportKind::Fixed;
    if member
        .supports()
        .iter()
        .filter(|support| holding(support.kind()))
        .count()
        > 1
    {
        notes.push(
            "More than one support holds the axis; small deflections do not stretch it".into(),
        );
    }
    for material in distinct(member.parts()) {
        notes.push(format!(
            "Creep of \"{}\": factor {} ({})",
            material.name(),
            material.creep().value(),
            material.creep().basis()
        ));
    }
    if let Some(plan) = job.camber() {
        notes.push(format!(
            "Camber: {} for {} of the deflection, {}, {}, rounded ({}) to {}; beyond the chord \
             the member goes on along its line",
            plan.shape.described(),
            plan.fraction,
            plan.combination,
            plan.time,
            plan.rounding.name(),
            plan.step
        ));
    }
    notes
}

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

/// What was not checked.
pub(super) fn not_checked(job: &Job) -> Vec<String> {
    let member = job.member();
    let mut notes: Vec<String> = Vec::new();
    if job.limits().is_empty() {
        notes.push("Limits of the deflection: none were given".into());
    }
    for part in member.section().placed() {
        if part.material().strength().is_none() {
            notes.push(format!(
                "Strength of part \"{}\": its material has no design strengths",
                part.name()
            ));
        }
    }
    notes.extend(
        [
            "Shear stress in the parts and between them",
            "Fasteners and glue lines that make the parts act together",
            "Transfer of load from part to part, and at the ends of parts",
            "Bearing at supports and under point loads",
            "Lateral buckling, local buckling and torsion",
            "Vibration",
            "Fire, corrosion, moisture, fatigue, accidental actions",
            "Unfavourable patterns of variable actions, favourable permanent actions",
        ]
        .map(String::from),
    );
    notes
}

/// Every combination at every time.
pub(super) fn each(
    document: &OutcomeDocument,
) -> impl Iterator<Item = (&CombinationOutcome, Time, &super::document::ResultsOutcome)> {
    document.combinations.iter().flat_map(|combination| {
        [
            (combination, Time::Initial, &combination.initial),
            (combination, Time::Final, &combination.end),
        ]
    })
}
