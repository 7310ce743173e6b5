//! What rests on which rule and what was not checked.

use super::document::{CombinationOutcome, OutcomeDocument};
use crate::job::Job;
use crate::member::{Load, Member, PartialFactors};
use crate::section::{JointKind, Slip};
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
        if member.section().slips().is_empty() {
            "Final state: (combination - quasi-permanent share) with E, plus the quasi-permanent \
             share with E/(1 + creep factor) of each material"
        } else {
            "Final state: (combination - quasi-permanent share) with E and k, plus the \
             quasi-permanent share with E/(1 + creep factor) of each material and \
             k/(1 + creep factor) of each joint"
        }
        .into(),
        "Components of the deflection: EN 1990:2002 A1.4.3 (from memory); creep under psi_2 Q \
         belongs to w_3"
            .into(),
    ]
}

/// What was not checked.
pub(super) fn not_checked(job: &Job) -> Vec<String> {
    let member = job.member();
    let mut notes: Vec<String> = Vec::new();
    if job.limits().is_empty() {
        notes.push("Limits of the deflection: none were given".into());
    }
    for part in member.parts() {
        if part.material().strength().is_none() {
            notes.push(format!(
                "Strength of part \"{}\": its material has no design strengths",
                part.name()
            ));
        }
    }
    let mut say = |text: &str| notes.push(text.into());
    say("Shear stress in the parts and between them");
    let slips = member.section().merged_layers().len() > 1;
    if slips {
        say("Force per fastener and its resistance, spacing and edge distances of fasteners");
        say("Withdrawal of fasteners and what else holds layers from parting");
    } else {
        say("Fasteners and glue lines that make the parts act together");
    }
    if glued(member) {
        say("Strength and creep of the glue in slipping joints");
    }
    say("Transfer of load from part to part, and at the ends of parts");
    say("Bearing at supports and under point loads");
    if !member.changes().is_empty() {
        say("Stress concentrations at steps, and stresses square to tapered edges");
    }
    if !member.hinges().is_empty() {
        say("Resistance of hinges and butt joints");
    }
    if !member.anchors().is_empty() {
        say("Resistance of anchors and of what they bear on");
    }
    if member
        .actions()
        .iter()
        .flat_map(|action| action.loads())
        .any(|load| matches!(load, Load::Prestress { .. }))
    {
        say("Losses of prestress and the zones where tendons are anchored");
    }
    if member.has_axial_force() {
        say("Buckling under axial force and second-order moments");
    }
    say("Lateral buckling, local buckling and torsion");
    say("Vibration");
    say("Fire, corrosion, moisture, fatigue, accidental actions");
    say("Unfavourable patterns of variable actions, favourable permanent actions");
    notes
}

/// Whether a joint slips in its glue.
fn glued(member: &Member) -> bool {
    let joints = member.section().joints().iter();
    joints
        .map(|joint| joint.kind())
        .any(|kind| matches!(kind, JointKind::Slipping(Slip::Glue { .. })))
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
