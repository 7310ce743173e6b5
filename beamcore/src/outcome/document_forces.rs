//! Stresses of the section under named forces, in the outcome.

#![allow(
    non_snake_case,
    reason = "the units in the names keep their case: N is not n"
)]

use schemars::JsonSchema;
use serde::{Deserialize, Serialize};

/// The stresses of the section under named forces.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct ForcesOutcome {
    /// The name of the forces.
    pub(super) name: String,
    pub(super) initial: Vec<PartForcesOutcome>,
    #[serde(rename = "final")]
    pub(super) end: Vec<PartForcesOutcome>,
}

/// The greatest and the least stress in a part under named forces.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct PartForcesOutcome {
    /// The name of the part.
    pub(super) name: String,
    pub(super) greatest: PointOutcome,
    pub(super) least: PointOutcome,
}

/// A stress at a point of the section.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct PointOutcome {
    pub(super) value_Pa: f64,
    pub(super) y_m: f64,
    pub(super) z_m: f64,
}
