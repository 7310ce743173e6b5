//! Results of simplified methods in the outcome, beside the exact ones.

#![allow(
    non_snake_case,
    reason = "the units in the names keep their case: N is not n"
)]

use super::extremes::{LengthExtreme, LineExtreme};
use schemars::JsonSchema;
use serde::{Deserialize, Serialize};

/// A simplified method.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct SimplifiedOutcome {
    /// The method by its word in the document.
    pub(super) name: String,
    /// Where it holds only nearly or not at all.
    pub(super) limits: Vec<String>,
    /// The combinations by which deflections are judged.
    pub(super) combinations: Vec<SimplifiedCombinationOutcome>,
}

/// A combination by a simplified method.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct SimplifiedCombinationOutcome {
    pub(super) name: String,
    pub(super) initial: SimplifiedStateOutcome,
    #[serde(rename = "final")]
    pub(super) end: SimplifiedStateOutcome,
}

/// A combination at a time.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct SimplifiedStateOutcome {
    pub(super) spans: Vec<SimplifiedSpanOutcome>,
}

/// One span.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct SimplifiedSpanOutcome {
    pub(super) name: String,
    /// The length of the half sine wave.
    pub(super) length_m: f64,
    /// gamma of each layer from the lowest upward.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(super) factors: Vec<f64>,
    /// With the moduli of the time.
    pub(super) bending_stiffness_Nm2: f64,
    pub(super) deflection: LengthExtreme,
    pub(super) exact_deflection: LengthExtreme,
    /// Deflection by the method over the exact one, less one.
    pub(super) difference: f64,
    pub(super) joints: Vec<SimplifiedJointOutcome>,
    /// From the lowest upward.
    pub(super) layers: Vec<SimplifiedLayerOutcome>,
}

/// The greatest flow of a joint over a span.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct SimplifiedJointOutcome {
    pub(super) name: String,
    pub(super) flow: LineExtreme,
    pub(super) exact_flow: LineExtreme,
}

/// A layer at the place of the span's greatest moment.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct SimplifiedLayerOutcome {
    pub(super) name: String,
    pub(super) at_m: f64,
    /// At the middle of the layer's height.
    pub(super) axial_stress_Pa: f64,
    /// What bending of the layer adds at its lower edge and takes off at its upper.
    pub(super) bending_stress_Pa: f64,
    pub(super) exact_axial_N: f64,
    pub(super) exact_moment_Nm: f64,
}
