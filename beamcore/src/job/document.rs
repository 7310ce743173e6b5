//! The job document as it is written: the only types, with those of the outcome, that know serde.

use super::document_action::{ActionDocument, CombinationDocument, PartialFactorsDocument};
use super::document_camber::{CamberDocument, LimitDocument};
use super::document_material::MaterialDocument;
use super::document_member::MemberDocument;
use super::document_section::{ChangedSectionDocument, SectionDocument};
use schemars::JsonSchema;
use serde::{Deserialize, Serialize};
use std::collections::BTreeMap;

/// All inputs of one member.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct JobDocument {
    /// The version of the job document.
    pub(crate) version: i64,
    /// The mark of the member on the order.
    pub(crate) mark: String,
    /// What the member is, in a few words.
    pub(crate) title: String,
    /// What was assumed for the job beyond what the calculation assumes; stands in the outcome.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(crate) assumptions: Vec<String>,
    /// How many of them are made; without it, one.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) quantity: Option<u32>,
    /// The materials by name.
    pub(crate) materials: BTreeMap<String, MaterialDocument>,
    /// The section with which the member begins.
    pub(crate) section: SectionDocument,
    /// Other sections along the member by name, for its changes.
    #[serde(default, skip_serializing_if = "BTreeMap::is_empty")]
    pub(crate) sections: BTreeMap<String, ChangedSectionDocument>,
    /// The member.
    pub(crate) member: MemberDocument,
    /// The actions with their loads.
    pub(crate) actions: Vec<ActionDocument>,
    /// Other partial factors than the recommended ones.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) partial_factors: Option<PartialFactorsDocument>,
    /// Combinations of one's own, beside those of EN 1990.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(crate) combinations: Vec<CombinationDocument>,
    /// Limits of the deflection.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(crate) limits: Vec<LimitDocument>,
    /// Simplified methods whose results are wanted beside the exact ones.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(crate) simplified: Vec<SimplifiedDocument>,
    /// The camber to be worked out, if any.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) camber: Option<CamberDocument>,
}

/// A simplified method for layers that slip.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case")]
pub(crate) enum SimplifiedDocument {
    /// The gamma method of EN 1995-1-1 Annex B, for two or three layers.
    Gamma,
    /// The sine-load method, for any number of layers.
    SineLayers,
}
