//! The member as a whole in the outcome.

#![allow(
    non_snake_case,
    reason = "the units in the names keep their case: N is not n"
)]

use super::document_deflection::SpanOutcome;
use super::document_section::{PartOutcome, StiffnessOutcome};
use schemars::JsonSchema;
use serde::{Deserialize, Serialize};

/// The member as a whole.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct MemberOutcome {
    pub(super) length_m: f64,
    /// How many are made.
    pub(super) quantity: u32,
    pub(super) spans: Vec<SpanOutcome>,
    /// The mass of one.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(super) mass_kg: Option<f64>,
    /// The angle by which it rises to the right.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(super) pitch_rad: Option<f64>,
    /// How shear deformation is taken, by its word in the document.
    pub(super) shear: String,
    /// Whether axial force takes part.
    pub(super) axial_force: bool,
    /// Its changes of section, from left to right.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(super) changes: Vec<ChangeOutcome>,
}

/// A change of the section, and the section after it.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct ChangeOutcome {
    /// The kind by its word in the document.
    pub(super) kind: String,
    pub(super) from_m: f64,
    pub(super) to_m: f64,
    /// The name of the section after it.
    pub(super) section: String,
    pub(super) initial: StiffnessOutcome,
    #[serde(rename = "final")]
    pub(super) end: StiffnessOutcome,
    /// The parts after it.
    pub(super) parts: Vec<PartOutcome>,
}
