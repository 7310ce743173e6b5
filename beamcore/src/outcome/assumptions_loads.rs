//! What was assumed of supports and loads.

use crate::constants::GRAVITY;
use crate::member::{Load, Member, Support, SupportKind};

/// What holds the member along its axis, and what is behind its loads.
pub(super) fn notes(member: &Member) -> Vec<String> {
    let mut notes: Vec<String> = axis(member);
    let supports = member.supports();
    if supports.iter().any(|s| s.kind() == SupportKind::Fixed) && turns_in_shear(member) {
        notes.push("A fixed support holds the rotation of the section, not the slope".into());
    }
    if supports.iter().any(Support::is_one_way) {
        notes.push(
            "One-way supports push only; each combination is solved by itself, and at the end what \
             lasts and what comes and goes are solved one after the other"
                .into(),
        );
    }
    let has = |is: &dyn Fn(&Load) -> bool| {
        let actions = member.actions().iter();
        actions.flat_map(|action| action.loads()).any(is)
    };
    let mut say = |is: &dyn Fn(&Load) -> bool, text: String| {
        if has(is) {
            notes.push(text);
        }
    };
    say(
        &|load| *load == Load::SelfWeight,
        format!("Self-weight from mean densities with g = {GRAVITY} m/s2"),
    );
    say(
        &|load| matches!(load, Load::Prestress { .. }),
        "Tendons: slopes are small, the force along the member is that of the tendon everywhere; \
         no friction, no losses; the tendon adds no stiffness"
            .into(),
    );
    say(
        &|load| matches!(load, Load::TemperatureDifference { .. }),
        "Temperature differences are linear over the whole height of the section, with the mean \
         unchanged"
            .into(),
    );
    say(
        &|load| {
            matches!(
                load,
                Load::Temperature { .. } | Load::TemperatureDifference { .. } | Load::Strain { .. }
            )
        },
        "Free strains of actions come with the action and its factors; the stresses of their \
         lasting part relax by creep"
            .into(),
    );
    say(
        &|load| matches!(load, Load::Settlement { .. } | Load::ImposedRotation { .. }),
        "Moved supports come with the action and its factors; the forces of their lasting part \
         relax by creep"
            .into(),
    );
    if member.actions().iter().any(|a| a.start().is_some()) {
        notes.push("Starts of actions are recorded only: creep is that of the whole life".into());
    }
    notes
}

fn turns_in_shear(member: &Member) -> bool {
    member.shear_model() != crate::member::ShearModel::Rigid
}

/// At what height the axis is held, or that nothing comes of it.
fn axis(member: &Member) -> Vec<String> {
    let holding = member.supports().iter().filter(|s| s.holds_axis());
    if !member.has_axial_force() {
        return vec![
            "The axial and longitudinal restraint of supports causes no axial force".into(),
        ];
    }
    let mut notes = Vec::new();
    let unsaid: Vec<_> = holding
        .filter(|support| support.given_height().is_none())
        .map(|support| format!("\"{}\"", support.name()))
        .collect();
    if !unsaid.is_empty() {
        notes.push(format!(
            "{} hold{} {} at the elastic centroid that the section at the left end has on the \
             first day, for no height was given",
            unsaid.join(", "),
            if unsaid.len() == 1 { "s" } else { "" },
            if member.section().merged_layers().len() > 1 {
                "all layers together"
            } else {
                "the axis"
            }
        ));
    }
    notes.push(
        "Axial force and deflection do not act on each other: no second-order moments; small \
         deflections do not stretch the axis"
            .into(),
    );
    notes
}
