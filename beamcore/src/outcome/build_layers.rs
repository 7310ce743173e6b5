//! Layers, joints and anchors of the outcome.

use super::document_layers::{
    AnchorOutcome, CompositeOutcome, FastenersOutcome, JointOutcome, JointResultOutcome,
    JointStretchOutcome, LayerOutcome, LayerResultOutcome, LayerStiffnessOutcome, SlipOutcome,
};
use crate::error::{ErrorKind, Result};
use crate::member::{Combination, CombinationKind, Member};
use crate::response::Response;
use crate::section::{JointKind, PlacedJoint, Section, Slip};
use crate::time::Time;
use crate::units::{Length, SlipModulus};

/// The joints of a section along a member of this length.
pub(super) fn joints(section: &Section, length: Length) -> Vec<JointOutcome> {
    let outcome = |placed: &PlacedJoint| JointOutcome {
        name: placed.joint().name().into(),
        lower: placed.joint().lower().into(),
        upper: placed.joint().upper().into(),
        kind: placed.joint().kind().name().into(),
        z_m: placed.z().to_m(),
        width_m: placed.width().to_m(),
        distance_m: placed.distance().to_m(),
        creep_factor: placed.creep(),
        creep_basis: placed.creep_basis().into(),
        clearance_m: placed.joint().given_clearance().map(|c| c.to_m()),
        fasteners: fasteners(placed.joint().kind()),
        stretches: stretches(placed, length),
    };
    section.placed_joints().iter().map(outcome).collect()
}

fn fasteners(kind: &JointKind) -> Option<FastenersOutcome> {
    match kind {
        JointKind::Slipping(Slip::Fasteners {
            stiffness,
            rows,
            planes,
            ..
        }) => Some(FastenersOutcome {
            stiffness_N_per_m: stiffness.si(),
            rows: *rows,
            planes: *planes,
        }),
        _ => None,
    }
}

/// The moduli between all places where one changes; a stretch has those of its middle.
fn stretches(placed: &PlacedJoint, length: Length) -> Vec<JointStretchOutcome> {
    let mut ends = vec![Length::ZERO];
    ends.extend(
        placed
            .places()
            .into_iter()
            .filter(|at| *at > Length::ZERO && *at < length),
    );
    ends.push(length);
    ends.windows(2)
        .filter_map(|ends| {
            let middle = (ends[0] + ends[1]) / 2.0;
            let si = |modulus: SlipModulus| modulus.si();
            let [initial, end] = Time::ALL.map(|time| placed.slip_modulus_at(middle, time).map(si));
            let [square, square_end] =
                Time::ALL.map(|time| placed.transverse_modulus_at(middle, time).map(si));
            Some(JointStretchOutcome {
                from_m: ends[0].to_m(),
                to_m: ends[1].to_m(),
                modulus_initial_N_per_m2: initial?,
                modulus_final_N_per_m2: end?,
                transverse_initial_N_per_m2: square,
                transverse_final_N_per_m2: square_end,
            })
        })
        .collect()
}

/// The layers of a section that has joints.
pub(super) fn layers(section: &Section) -> Vec<LayerOutcome> {
    if section.joints().is_empty() {
        return Vec::new();
    }
    let stiffness = Time::ALL.map(|time| section.layer_stiffness(time));
    let layers = section.layers().iter().filter_map(|layer| {
        let merged = section.merged_layers();
        let has = |names: &[String]| names.iter().any(|name| name == layer.name());
        let index = merged.iter().position(|merged| has(merged.layers()))?;
        let [initial, end] = stiffness.each_ref().map(|all| LayerStiffnessOutcome {
            axial_stiffness_N: all[index].axial,
            bending_stiffness_Nm2: all[index].bending,
            centroid_z_m: all[index].z,
        });
        Some(LayerOutcome {
            name: layer.name().into(),
            joined: merged[index].layers().to_vec(),
            initial,
            end,
        })
    });
    layers.collect()
}

/// Slip, flow and pressure of the joints that are not rigid.
pub(super) fn joint_results(
    response: &Response,
    combination: &str,
    time: Time,
) -> Result<Vec<JointResultOutcome>> {
    let member = response.member();
    let slips = |placed: &&PlacedJoint| *placed.joint().kind() != JointKind::Rigid;
    let joints = member.section().placed_joints().iter().filter(slips);
    let outcome = |placed: &PlacedJoint| {
        let name = placed.joint().name();
        let joint = response.joint(combination, time, name)?;
        let (left, right) = placed
            .extent()
            .unwrap_or_else(|| (Length::ZERO, member.length()));
        Ok(JointResultOutcome {
            name: name.into(),
            slip: SlipOutcome {
                greatest: joint.slip.greatest().into(),
                maximum: joint.slip.maximum().into(),
                minimum: joint.slip.minimum().into(),
                left_m: joint.slip.value(left)?.to_m(),
                right_m: joint.slip.value(right)?.to_m(),
            },
            flow: (&joint.flow).into(),
            pressure: (&joint.pressure).into(),
        })
    };
    joints.map(outcome).collect()
}

/// The forces of the layers, where they slip.
pub(super) fn layer_results(
    response: &Response,
    combination: &str,
    time: Time,
) -> Result<Vec<LayerResultOutcome>> {
    let member = response.member();
    if member.section().merged_layers().len() < 2 {
        return Ok(Vec::new());
    }
    let outcome = |layer: &crate::section::Layer| {
        let name = layer.name();
        let forces = response.layer(combination, time, name)?;
        let deflection = member
            .has_deflections_of_layers()
            .then(|| response.layer_deflection(combination, time, name))
            .transpose()?;
        Ok(LayerResultOutcome {
            name: name.into(),
            axial: (&forces.axial).into(),
            moment: (&forces.moment).into(),
            deflection: deflection.as_ref().map(Into::into),
        })
    };
    member.section().layers().iter().map(outcome).collect()
}

/// The forces of the anchors.
pub(super) fn anchors(
    response: &Response,
    combination: &str,
    time: Time,
) -> Result<Vec<AnchorOutcome>> {
    let anchors = response.member().anchors().iter();
    anchors
        .map(|anchor| {
            let force = response.anchor_force(combination, time, &anchor.name)?;
            Ok(AnchorOutcome {
                name: anchor.name.clone(),
                force_N: force.to_N(),
            })
        })
        .collect()
}

/// The composite action under the combinations by which deflections are judged, where layers slip
/// and share one deflection; `None` also where the joints make no difference to the deflection.
pub(super) fn composite(
    response: &Response,
    combination: &Combination,
    time: Time,
) -> Result<Option<CompositeOutcome>> {
    let judged = matches!(
        combination.kind(),
        CombinationKind::Characteristic | CombinationKind::QuasiPermanent
    );
    if !judged || !shares_deflection(response.member()) {
        return Ok(None);
    }
    let found = match response.composite_action(combination.name(), time) {
        Ok(found) => found,
        // Under no load there is nothing to compare.
        Err(error) if error.kind() == ErrorKind::Value => return Ok(None),
        Err(error) => return Err(error),
    };
    let is_known = found.degree.is_finite() && found.effective_stiffness.si().is_finite();
    Ok(is_known.then(|| CompositeOutcome {
        degree: found.degree,
        effective_stiffness_Nm2: found.effective_stiffness.to_N_m2(),
        at_m: found.at.to_m(),
        deflection_m: found.deflection.to_m(),
        loose_m: found.loose.to_m(),
        rigid_m: found.rigid.to_m(),
    }))
}

/// Whether layers slip and share one deflection.
fn shares_deflection(member: &Member) -> bool {
    member.section().merged_layers().len() > 1 && !member.has_deflections_of_layers()
}
