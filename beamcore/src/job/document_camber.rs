//! Camber and limits as they are written.

use super::written::Written;
use crate::units::Length;
use schemars::JsonSchema;
use serde::{Deserialize, Serialize};

/// The camber to be worked out.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct CamberDocument {
    /// The shape.
    pub(crate) shape: ShapeDocument,
    /// The combination whose deflection is built against.
    pub(crate) combination: String,
    /// The time of that deflection.
    pub(crate) time: TimeDocument,
    /// The share of the deflection that is built in.
    pub(crate) fraction: f64,
    /// The support at the left end of the chord.
    pub(crate) from: String,
    /// The support at the right end of the chord.
    pub(crate) to: String,
    /// The step to which the rise is rounded.
    pub(crate) step: Written<Length>,
    /// The direction of rounding.
    pub(crate) rounding: RoundingDocument,
    /// The least rise worth building; without it, any.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) least: Option<Written<Length>>,
    /// The number of equal divisions of the chord.
    pub(crate) divisions: u32,
    /// How the member stands when it is measured, for the readings to expect.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) trestles: Option<TrestlesDocument>,
}

/// The shape of a camber.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case")]
pub(crate) enum ShapeDocument {
    Parabola,
    Mirror,
    ArcThroughMiddle,
    ArcLeastGap,
}

/// How the member stands when it is measured.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct TrestlesDocument {
    /// The place of the left trestle.
    pub(crate) left: Written<Length>,
    /// The place of the right trestle.
    pub(crate) right: Written<Length>,
    /// The parts that are there.
    pub(crate) parts: Vec<String>,
}

/// A limit of a component of the deflection.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct LimitDocument {
    /// The component by its symbol.
    pub(crate) component: ComponentDocument,
    /// The span over this number is allowed.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) span_over: Option<f64>,
    /// This length is allowed.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) value: Option<Written<Length>>,
    /// The span it holds for; without it, all.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) span: Option<String>,
    /// The combination it holds for; without it, every characteristic one.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) combination: Option<String>,
}

/// A component of the deflection.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case")]
pub(crate) enum ComponentDocument {
    WInst,
    #[serde(rename = "w_1")]
    W1,
    #[serde(rename = "w_2")]
    W2,
    #[serde(rename = "w_3")]
    W3,
    WTot,
    WMax,
}

/// A time.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case")]
pub(crate) enum TimeDocument {
    Initial,
    Final,
}

/// A direction of rounding.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case")]
pub(crate) enum RoundingDocument {
    Nearest,
    Down,
    Up,
}
