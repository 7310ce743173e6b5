//! What was assumed.

use super::build::distinct;
use super::{assumptions_layers, assumptions_loads};
use crate::job::Job;
use crate::member::{Member, SectionChange, ShearModel};
use crate::section::{InitialStrain, PlacedPart, SHEAR_STIFFNESS_DEFINITION, Sideways};

/// What was assumed, first what the job itself says.
pub(super) fn assumptions(job: &Job) -> Vec<String> {
    let member = job.member();
    let mut notes: Vec<String> = job
        .document()
        .assumptions
        .iter()
        .map(|text| format!("For this job: {text}"))
        .collect();
    notes.push(if member.section().merged_layers().len() > 1 {
        "Plane sections stay plane in each layer; materials are linear elastic; deflections are \
         small"
            .into()
    } else {
        "Plane sections stay plane; materials are linear elastic; deflections are small".into()
    });
    notes.extend(assumptions_layers::notes(member));
    notes.push(shear(member));
    notes.push(match member.sideways() {
        Sideways::Held => "The member bends about the level axis only; it is held sideways".into(),
        Sideways::Free => "The member is free to move sideways between its supports, which hold \
                           it there as they hold it upright; loads act through the shear centre"
            .into(),
    });
    notes.extend(sections(job));
    notes.extend(assumptions_loads::notes(member));
    let strained = |part: &&PlacedPart| part.initial_strain() != InitialStrain::NONE;
    for part in member.parts().into_iter().filter(strained) {
        notes.push(format!(
            "Initial strain of part \"{}\" acts from the first day, with the factor 1 in every \
             combination; its stresses relax by creep",
            part.name()
        ));
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

fn shear(member: &Member) -> String {
    match member.shear_model() {
        ShearModel::Rigid => "Deflection by bending only; shear deflection is left out".into(),
        ShearModel::Given(stiffness) => format!(
            "Deflection by bending and shear, with kGA = {stiffness} as given, the same all along \
             and at all times"
        ),
        ShearModel::Flexible if member.section().merged_layers().len() > 1 => format!(
            "Deflection by bending and shear ({SHEAR_STIFFNESS_DEFINITION}); each \
             layer bears the share EI_i/sum of EI of the shear force, whatever its joints"
        ),
        ShearModel::Flexible => {
            format!("Deflection by bending and shear ({SHEAR_STIFFNESS_DEFINITION})")
        }
    }
}

/// What changes of section and a pitch mean.
fn sections(job: &Job) -> Vec<String> {
    let member = job.member();
    let mut notes = Vec::new();
    if !member.changes().is_empty() {
        notes.push(
            "Where the section changes, stresses follow it at once; the axis of the calculation \
             stays at the elastic centroid of the first section"
                .into(),
        );
    }
    let is_taper = |change: &SectionChange| matches!(change, SectionChange::Taper { .. });
    if member.changes().iter().any(is_taper) {
        notes.push(
            "Along a taper every size changes linearly; the slope of its edges is small, so that \
             stresses are those of a member without it"
                .into(),
        );
    }
    if let Some(pitch) = job.document().member.pitch() {
        notes.push(format!(
            "The member rises to the right by {pitch}: lengths are measured along it, gravity \
             loads act downward, deflections are square to it, and supports hold the vertical \
             movement"
        ));
    }
    notes
}
