//! The layers and joints of a section as they are written.

use super::written::Written;
use crate::units::{FastenerStiffness, Length, Modulus, SlipModulus};
use schemars::JsonSchema;
use serde::{Deserialize, Serialize};

/// A layer: parts that act as one piece.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct LayerDocument {
    /// The name of the layer.
    pub(crate) name: String,
    /// The names of its parts.
    pub(crate) parts: Vec<String>,
    /// Where it begins, from the left end of the member; with `to`.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) from: Option<Written<Length>>,
    /// Where it ends; without it and `from`, it is there over the whole length.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) to: Option<Written<Length>>,
}

/// A joint: what holds two layers together along the member.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct JointDocument {
    /// The name of the joint.
    pub(crate) name: String,
    /// The name of the lower layer; of layers side by side, of either.
    pub(crate) lower: String,
    /// The name of the upper layer; slip is its displacement minus that of the lower one.
    pub(crate) upper: String,
    /// How it holds the layers along the member.
    pub(crate) kind: JointKindDocument,
    /// The clear distance of the layers; must be stated where they do not touch.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) gap: Option<Written<Length>>,
    /// A modulus square to the member; the layers then have a deflection each.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) transverse: Option<Written<SlipModulus>>,
    /// The slip, in either sense, before the joint carries anything, as of bolts in wider holes.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) clearance: Option<Written<Length>>,
    /// The creep factor of the joint; it follows from layers that are wood-based, and must be
    /// given beside others.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) creep: Option<f64>,
}

/// How a joint holds its layers along the member.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case", deny_unknown_fields)]
pub(crate) enum JointKindDocument {
    /// Without slip.
    Rigid,
    /// Not at all.
    Loose,
    /// With a slip modulus as given, force per length and slip.
    Slipping {
        /// The slip modulus.
        modulus: Written<SlipModulus>,
    },
    /// With fasteners: rows x planes x stiffness / spacing.
    Fasteners {
        /// The slip modulus of one fastener in one shear plane.
        stiffness: Written<FastenerStiffness>,
        /// How many rows run along the member.
        rows: u32,
        /// In how many shear planes a fastener works; without it, in one.
        #[serde(default, skip_serializing_if = "Option::is_none")]
        planes: Option<u32>,
        /// The spacing along a row, the same all along.
        #[serde(default, skip_serializing_if = "Option::is_none")]
        spacing: Option<Written<Length>>,
        /// Bands of one spacing each, instead of one spacing; none outside of them.
        #[serde(default, skip_serializing_if = "Option::is_none")]
        bands: Option<Vec<BandDocument>>,
    },
    /// With a soft layer of glue: shear modulus x width / thickness.
    Glue {
        /// The shear modulus of the glue.
        shear_modulus: Written<Modulus>,
        /// The width of the glue line across the member.
        width: Written<Length>,
        /// The thickness of the glue.
        thickness: Written<Length>,
    },
}

/// A length of the member with one spacing.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct BandDocument {
    /// Where it begins, from the left end of the member.
    pub(crate) from: Written<Length>,
    /// Where it ends.
    pub(crate) to: Written<Length>,
    /// The spacing along a row.
    pub(crate) spacing: Written<Length>,
}
