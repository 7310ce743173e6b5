//! What was assumed of layers and joints.

use crate::member::Member;
use crate::section::{JointKind, PlacedJoint};

/// How layers move together, and what their joints do.
pub(super) fn notes(member: &Member) -> Vec<String> {
    let section = member.section();
    if section.merged_layers().len() < 2 {
        return vec!["The parts are joined rigidly, without slip".into()];
    }
    let mut notes = vec!["The parts of each layer are joined rigidly, without slip".to_owned()];
    let joints = section.placed_joints();
    let of = |is: &dyn Fn(&PlacedJoint) -> bool| -> Vec<String> {
        let joints = joints.iter().filter(|placed| is(placed));
        joints
            .map(|placed| format!("\"{}\"", placed.joint().name()))
            .collect()
    };
    let rigid = of(&|placed| *placed.joint().kind() == JointKind::Rigid);
    if !rigid.is_empty() {
        notes.push(format!("No slip in {}", rigid.join(", ")));
    }
    let square = of(&|placed| placed.joint().transverse_modulus().is_some());
    notes.push(if member.has_deflections_of_layers() {
        format!(
            "Layers have deflections of their own where their joints yield square to the member: \
             {}; the others share theirs. The deflection of the member is that of the first layer, \
             \"{}\"",
            square.join(", "),
            section.layers()[0].name()
        )
    } else {
        "All layers share one deflection: joints do not open".into()
    });
    let slipping = |placed: &PlacedJoint| matches!(placed.joint().kind(), JointKind::Slipping(_));
    if joints.iter().any(slipping) {
        notes.push(
            "Slip moduli as given are used in every combination, ultimate ones too; flow is in \
             proportion to slip, and fasteners are spread evenly over their spacing"
                .into(),
        );
    }
    for placed in joints.iter().filter(|placed| slipping(placed)) {
        notes.push(format!(
            "Creep of joint \"{}\": factor {} ({})",
            placed.joint().name(),
            placed.creep(),
            placed.creep_basis()
        ));
        if let Some(clearance) = placed.joint().given_clearance() {
            notes.push(format!(
                "Joint \"{}\" carries nothing until it has slipped by {clearance}, in either \
                 sense from the same middle; each combination is solved by itself",
                placed.joint().name()
            ));
        }
    }
    let entered = member.entered_layer();
    let unnamed: Vec<_> = member
        .actions()
        .iter()
        .filter(|action| action.layer().is_none())
        .map(|action| format!("\"{}\"", action.name()))
        .collect();
    if !unnamed.is_empty() {
        notes.push(format!(
            "Loads of {} enter the layer \"{entered}\", for none was named; the self-weight of \
             each layer enters that layer",
            unnamed.join(", ")
        ));
    }
    notes
}
