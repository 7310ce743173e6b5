//! Spans, components, limits and camber in the outcome.

#![allow(
    non_snake_case,
    reason = "the units in the names keep their case: N is not n"
)]

use super::extremes::{LengthExtreme, LengthExtremes};
use schemars::JsonSchema;
use serde::{Deserialize, Serialize};

/// A span or an overhang.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct SpanOutcome {
    pub(super) name: String,
    pub(super) from_m: f64,
    pub(super) to_m: f64,
    /// Whether one of its ends is free.
    pub(super) cantilever: bool,
}

/// The deflection of one span from its own chord.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct SpanDeflectionOutcome {
    /// The name of the span.
    pub(super) name: String,
    pub(super) deflection: LengthExtremes,
}

/// The components of the deflection under one characteristic combination.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct ComponentsOutcome {
    /// The name of the combination.
    pub(super) name: String,
    pub(super) spans: Vec<SpanComponentsOutcome>,
}

/// The greatest of each component in one span, each at its own place.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct SpanComponentsOutcome {
    /// The name of the span.
    pub(super) name: String,
    /// The camber of the unloaded member, positive upward; zero without one.
    pub(super) w_c: LengthExtreme,
    /// Characteristic combination, initial.
    pub(super) w_inst: LengthExtreme,
    /// Permanent actions, initial.
    pub(super) w_1: LengthExtreme,
    /// Added by creep under permanent actions.
    pub(super) w_2: LengthExtreme,
    /// Added by variable actions, with the creep under their lasting part.
    pub(super) w_3: LengthExtreme,
    /// The sum of the three.
    pub(super) w_tot: LengthExtreme,
    /// What is left of it after the camber.
    pub(super) w_max: LengthExtreme,
}

/// A limit compared with the result.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct LimitOutcome {
    /// The symbol of the component.
    pub(super) component: String,
    pub(super) span: String,
    pub(super) combination: String,
    pub(super) value_m: f64,
    pub(super) at_m: f64,
    pub(super) allowed_m: f64,
    pub(super) utilisation: f64,
}

/// The camber to build.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct CamberOutcome {
    pub(super) shape: String,
    /// The radius of an arc.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(super) radius_m: Option<f64>,
    /// Before rounding.
    pub(super) target_m: f64,
    /// At the middle of the chord.
    pub(super) rise_m: f64,
    pub(super) chord_from_m: f64,
    pub(super) chord_to_m: f64,
    /// Where the left end of the member stands, above the chord.
    pub(super) left_end_m: f64,
    /// Where the right end of the member stands, above the chord.
    pub(super) right_end_m: f64,
    pub(super) ordinates: Vec<OrdinateOutcome>,
    /// What remains of the deflection after the camber, positive below the straight line.
    pub(super) remaining: Vec<RemainingOutcome>,
    /// The readings to expect in the shop, if the trestles were told.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(super) readings: Vec<ReadingOutcome>,
}

/// The line that remains under one combination.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct RemainingOutcome {
    /// The name of the combination.
    pub(super) name: String,
    pub(super) initial: LengthExtremes,
    #[serde(rename = "final")]
    pub(super) end: LengthExtremes,
}

/// What a tape shows at one station.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct ReadingOutcome {
    /// From the left end of the chord.
    pub(super) station_m: f64,
    /// With the member lying on its side.
    pub(super) lying_m: f64,
    /// With the member standing on the trestles.
    pub(super) standing_m: f64,
}

/// One ordinate.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct OrdinateOutcome {
    /// From the left end of the chord.
    pub(super) station_m: f64,
    /// Above the chord.
    pub(super) ordinate_m: f64,
}
