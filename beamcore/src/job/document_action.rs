//! Actions, loads and combinations as they are written.

use super::document_load::LoadDocument;
use super::document_member::is_false;
use super::written::Written;
use crate::units::Duration;
use schemars::JsonSchema;
use serde::{Deserialize, Serialize};
use std::collections::BTreeMap;

/// An action.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct ActionDocument {
    /// The name of the action.
    pub(crate) name: String,
    /// Whether it is permanent or variable.
    pub(crate) kind: ActionKindDocument,
    /// Whether the action relieves what is being checked; without it, it does not.
    #[serde(default, skip_serializing_if = "is_false")]
    pub(crate) favourable: bool,
    /// How long the action acts at a time; kept with the action, no result depends on it.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) duration: Option<DurationDocument>,
    /// When the action starts; kept with the action, no result depends on it.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) start: Option<Written<Duration>>,
    /// The layer that the loads enter; without it, the highest layer, or the first one where layers
    /// have deflections of their own.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) on: Option<String>,
    /// The loads.
    pub(crate) loads: Vec<LoadDocument>,
}

/// How long an action acts at a time.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case")]
pub(crate) enum DurationDocument {
    Permanent,
    Long,
    Medium,
    Short,
    Instantaneous,
}

/// Whether an action always acts.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case", deny_unknown_fields)]
pub(crate) enum ActionKindDocument {
    /// Acts from the first day to the last.
    Permanent,
    /// Comes and goes.
    Variable {
        /// The category of EN 1990 Table A1.1, which gives the factors.
        #[serde(default, skip_serializing_if = "Option::is_none")]
        category: Option<String>,
        /// The factor beside another leading action.
        #[serde(default, skip_serializing_if = "Option::is_none")]
        psi_0: Option<f64>,
        /// The factor of the frequent value.
        #[serde(default, skip_serializing_if = "Option::is_none")]
        psi_1: Option<f64>,
        /// The factor of the quasi-permanent value.
        #[serde(default, skip_serializing_if = "Option::is_none")]
        psi_2: Option<f64>,
    },
}

/// The partial factors of the fundamental combination.
#[derive(Clone, Copy, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct PartialFactorsDocument {
    /// The factor of unfavourable permanent actions.
    pub(crate) permanent: f64,
    /// The factor of favourable permanent actions.
    pub(crate) permanent_favourable: f64,
    /// The factor of unfavourable variable actions.
    pub(crate) variable: f64,
}

/// A combination of one's own.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct CombinationDocument {
    /// The name of the combination.
    pub(crate) name: String,
    /// The factor of each action that takes part.
    pub(crate) factors: BTreeMap<String, f64>,
    /// Whether design strengths are compared under it.
    pub(crate) ultimate: bool,
}
