//! The member as it is written: its supports, changes of section, hinges and anchors.

use super::written::Written;
use crate::units::{
    Angle, FastenerStiffness, Length, RotationalStiffness, ShearStiffness, SpringStiffness,
};
use schemars::JsonSchema;
use serde::{Deserialize, Serialize};

/// The member.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct MemberDocument {
    /// The length from end to end.
    pub(crate) length: Written<Length>,
    /// The angle by which the member rises to the right; without it, the member is level.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) pitch: Option<Written<Angle>>,
    /// Whether the member is held sideways or free; without it, held.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) sideways: Option<SidewaysDocument>,
    /// Whether the member yields in shear; without it, it does not.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) shear: Option<ShearDocument>,
    /// The supports.
    pub(crate) supports: Vec<SupportDocument>,
    /// Changes of the section along the member, from left to right.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(crate) changes: Vec<ChangeDocument>,
    /// Internal hinges.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(crate) hinges: Vec<HingeDocument>,
    /// What stops the slip of joints.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(crate) anchors: Vec<AnchorDocument>,
}

/// A support.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct SupportDocument {
    /// The name of the support.
    pub(crate) name: String,
    /// What the support holds.
    pub(crate) kind: SupportKindDocument,
    /// The distance from the left end of the member.
    pub(crate) at: Written<Length>,
    /// Holds the deflection by a spring instead of rigidly.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) spring: Option<Written<SpringStiffness>>,
    /// A spring along the axis: of a pin or fixed support instead of its rigid hold, of a roller in
    /// addition.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) axial_spring: Option<Written<SpringStiffness>>,
    /// A spring against rotation: of a fixed support instead of its rigid hold, of a pin or roller
    /// in addition.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) rotational_spring: Option<Written<RotationalStiffness>>,
    /// Whether the support only pushes, so that the member may lift off it; without it, it holds
    /// both ways.
    #[serde(default, skip_serializing_if = "is_false")]
    pub(crate) one_way: bool,
    /// The height of the section at which the axis is held, on the first of the layers that bear on
    /// the support; without it, all layers together at the elastic centroid of the section at the
    /// left end.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) height: Option<Written<Length>>,
    /// The layers that bear on the support; without it, all.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(crate) under: Vec<String>,
    /// The layers that the support holds along the member by themselves.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(crate) holding: Vec<HoldDocument>,
}

/// A layer that a support holds along the member by itself.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct HoldDocument {
    /// The name of the layer.
    pub(crate) layer: String,
    /// The height of the section at which it is held.
    pub(crate) height: Written<Length>,
}

/// What a support holds.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case")]
pub(crate) enum SupportKindDocument {
    Pin,
    Roller,
    Fixed,
}

/// Whether a member is held sideways.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case")]
pub(crate) enum SidewaysDocument {
    Held,
    Free,
}

/// Whether a member yields in shear.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case", deny_unknown_fields)]
pub(crate) enum ShearDocument {
    /// It does not.
    Rigid,
    /// With the shear stiffness of its sections.
    Flexible,
    /// With a shear stiffness as given, the same all along and at all times.
    Given {
        /// The shear stiffness.
        stiffness: Written<ShearStiffness>,
    },
}

/// A change of the section along the member.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case", deny_unknown_fields)]
pub(crate) enum ChangeDocument {
    /// From a place on the member has another section.
    Step {
        /// The place, from the left end of the member.
        at: Written<Length>,
        /// The name of the section to the right of it: one of `sections`, or `main` for the
        /// section with which the member begins.
        section: String,
    },
    /// Between two places every size of the section changes linearly.
    Taper {
        /// Where it begins, from the left end of the member.
        from: Written<Length>,
        /// Where it ends.
        to: Written<Length>,
        /// The name of the section at its end and to the right of it: one of `sections`, or `main`
        /// for the section with which the member begins.
        section: String,
    },
}

/// An internal hinge.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case", deny_unknown_fields)]
pub(crate) enum HingeDocument {
    /// No moment passes.
    Moment {
        /// The place, from the left end of the member.
        at: Written<Length>,
        /// The layer that is hinged, which must have a deflection of its own; without it, all.
        #[serde(default, skip_serializing_if = "Option::is_none")]
        layer: Option<String>,
    },
    /// No shear force passes.
    Shear {
        /// The place, from the left end of the member.
        at: Written<Length>,
    },
    /// No axial force of one layer passes.
    Butt {
        /// The place, from the left end of the member.
        at: Written<Length>,
        /// The layer that is butted.
        layer: String,
    },
}

/// What stops the slip of a joint at a place.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct AnchorDocument {
    /// The name of the anchor.
    pub(crate) name: String,
    /// The name of the joint.
    pub(crate) joint: String,
    /// The place, from the left end of the member.
    pub(crate) at: Written<Length>,
    /// The force per slip; without it, no slip at all.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) stiffness: Option<Written<FastenerStiffness>>,
}

#[expect(
    clippy::trivially_copy_pass_by_ref,
    reason = "serde asks for this form"
)]
pub(super) const fn is_false(value: &bool) -> bool {
    !*value
}
