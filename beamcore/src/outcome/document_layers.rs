//! Layers, joints and anchors in the outcome.

#![allow(
    non_snake_case,
    reason = "the units in the names keep their case: N is not n"
)]

use super::extremes::{ForceExtremes, LengthExtreme, LengthExtremes, LineExtremes, MomentExtremes};
use schemars::JsonSchema;
use serde::{Deserialize, Serialize};

/// A joint of the section at its place.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct JointOutcome {
    pub(super) name: String,
    /// The name of the lower layer.
    pub(super) lower: String,
    /// The name of the upper layer.
    pub(super) upper: String,
    /// The kind by its word in the document.
    pub(super) kind: String,
    /// The middle of the contact or of the gap.
    pub(super) z_m: f64,
    /// The length of the contact line in the section.
    pub(super) width_m: f64,
    /// The clear distance of the two layers.
    pub(super) distance_m: f64,
    pub(super) creep_factor: f64,
    /// Where the creep factor comes from.
    pub(super) creep_basis: String,
    /// The slip, in either sense, before the joint carries anything.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(super) clearance_m: Option<f64>,
    /// The fasteners it is made of.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(super) fasteners: Option<FastenersOutcome>,
    /// The moduli along the member, from left to right; of a rigid joint none.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(super) stretches: Vec<JointStretchOutcome>,
}

/// The fasteners of a joint.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct FastenersOutcome {
    /// The slip modulus of one fastener in one shear plane.
    pub(super) stiffness_N_per_m: f64,
    pub(super) rows: u32,
    /// The shear planes in which a fastener works.
    pub(super) planes: u32,
}

/// The moduli of a joint over a stretch of the member.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct JointStretchOutcome {
    pub(super) from_m: f64,
    pub(super) to_m: f64,
    /// The slip modulus on the first day, force per length and slip.
    pub(super) modulus_initial_N_per_m2: f64,
    /// The slip modulus at the end.
    pub(super) modulus_final_N_per_m2: f64,
    /// The modulus square to the member on the first day, where the layers have a deflection each.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(super) transverse_initial_N_per_m2: Option<f64>,
    /// The modulus square to the member at the end.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(super) transverse_final_N_per_m2: Option<f64>,
}

/// A layer of the section, with the layers that rigid joints hold to it.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct LayerOutcome {
    pub(super) name: String,
    /// All layers that rigid joints make one piece of, this one among them.
    pub(super) joined: Vec<String>,
    pub(super) initial: LayerStiffnessOutcome,
    #[serde(rename = "final")]
    pub(super) end: LayerStiffnessOutcome,
}

/// E-weighted sums of a layer with those joined to it, about its own centroid.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct LayerStiffnessOutcome {
    pub(super) axial_stiffness_N: f64,
    pub(super) bending_stiffness_Nm2: f64,
    pub(super) centroid_z_m: f64,
}

/// What happens in a joint that is not rigid.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct JointResultOutcome {
    /// The name of the joint.
    pub(super) name: String,
    pub(super) slip: SlipOutcome,
    /// The force per length with which the joint pulls the upper layer to the left.
    pub(super) flow: LineExtremes,
    /// The force per length that passes through the joint square to the member, positive where the
    /// layers press on each other.
    pub(super) pressure: LineExtremes,
}

/// The slip of a joint: displacement along x of the upper layer minus that of the lower one.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct SlipOutcome {
    /// The value of greatest magnitude.
    pub(super) greatest: LengthExtreme,
    /// The algebraically greatest value.
    pub(super) maximum: LengthExtreme,
    /// The algebraically least value.
    pub(super) minimum: LengthExtreme,
    /// At the left end of the length over which both layers are there.
    pub(super) left_m: f64,
    /// At its right end.
    pub(super) right_m: f64,
}

/// The forces of a layer, with the layers that rigid joints hold to it.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct LayerResultOutcome {
    /// The name of the layer.
    pub(super) name: String,
    /// The axial force, tension positive.
    pub(super) axial: ForceExtremes,
    /// The moment about its own centroid, sagging positive.
    pub(super) moment: MomentExtremes,
    /// Its deflection, where layers have deflections of their own.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(super) deflection: Option<LengthExtremes>,
}

/// The force of an anchor; it bears the sign of the slip that it stops.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct AnchorOutcome {
    /// The name of the anchor.
    pub(super) name: String,
    pub(super) force_N: f64,
}

/// How far the joints make the layers act together, seen where the deflection is greatest.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct CompositeOutcome {
    /// 0 where the joints do nothing, 1 where they do not slip.
    pub(super) degree: f64,
    /// The bending stiffness with which a member without slip would deflect as much.
    pub(super) effective_stiffness_Nm2: f64,
    pub(super) at_m: f64,
    /// The deflection there.
    pub(super) deflection_m: f64,
    /// The deflection there with all joints loose.
    pub(super) loose_m: f64,
    /// The deflection there with all joints rigid.
    pub(super) rigid_m: f64,
}
