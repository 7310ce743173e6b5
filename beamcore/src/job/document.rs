//! The job document as it is written: the only types, with those of the outcome, that know serde.

use super::document_action::{ActionDocument, CombinationDocument, PartialFactorsDocument};
use super::document_camber::{CamberDocument, LimitDocument};
use super::written::Written;
use crate::units::{Density, Duration, Length, Modulus, Stress};
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
    /// How many of them are made; without it, one.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) quantity: Option<u32>,
    /// The materials by name.
    pub(crate) materials: BTreeMap<String, MaterialDocument>,
    /// The section.
    pub(crate) section: SectionDocument,
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
    /// The camber to be worked out, if any.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) camber: Option<CamberDocument>,
}

/// A material: by strength class (`timber`, `steel` or `concrete`) or by its values (`modulus`).
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct MaterialDocument {
    /// A strength class of timber, for example "C24".
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) timber: Option<String>,
    /// A strength class of steel, for example "S275".
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) steel: Option<String>,
    /// A strength class of concrete, for example "C30/37".
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) concrete: Option<String>,
    /// The modulus of elasticity of a material given by its values.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) modulus: Option<Written<Modulus>>,
    /// The service class of timber: 1, 2 or 3.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) service_class: Option<i64>,
    /// The creep factor: k_def, phi, or 0 for what does not creep.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) creep_factor: Option<f64>,
    /// What the creep of concrete depends on, by EN 1992-1-1 Annex B.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) concrete_creep: Option<ConcreteCreepDocument>,
    /// The mean density, for the self-weight.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) density: Option<Written<Density>>,
    /// The design strengths.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) design_strength: Option<StrengthDocument>,
}

/// What the creep of concrete depends on.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct ConcreteCreepDocument {
    /// The mean compressive strength at 28 days.
    pub(crate) mean_strength: Written<Stress>,
    /// The relative humidity in percent.
    pub(crate) relative_humidity_percent: f64,
    /// The notional size 2 A/u.
    pub(crate) notional_size: Written<Length>,
    /// The age at which the load comes on.
    pub(crate) age_at_loading: Written<Duration>,
    /// The age at the end of the life.
    pub(crate) age_at_end: Written<Duration>,
    /// The hardening class of the cement.
    pub(crate) cement: CementDocument,
}

/// The hardening class of a cement.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Serialize, Deserialize, JsonSchema)]
pub(crate) enum CementDocument {
    S,
    N,
    R,
}

/// Design strengths and the rule by which stresses are compared to them.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case", deny_unknown_fields)]
pub(crate) enum StrengthDocument {
    /// Design strengths of timber.
    Timber {
        /// The design bending strength.
        bending: Written<Stress>,
        /// The design tension strength along the grain.
        tension: Written<Stress>,
        /// The design compression strength along the grain.
        compression: Written<Stress>,
    },
    /// The design strength of a metal.
    Metal {
        /// The design yield strength.
        #[serde(rename = "yield")]
        yield_stress: Written<Stress>,
    },
}

/// The section.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct SectionDocument {
    /// The parts, rigidly joined.
    pub(crate) parts: Vec<PartDocument>,
}

/// A part of the section.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct PartDocument {
    /// The name of the part.
    pub(crate) name: String,
    /// The name of its material.
    pub(crate) material: String,
    /// The outline of the part.
    pub(crate) outline: OutlineDocument,
    /// The place of the part; without it, the middle of its outline is at y = 0, z = 0.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) place: Option<PlaceDocument>,
}

/// An outline.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case", deny_unknown_fields)]
pub(crate) enum OutlineDocument {
    /// A rectangle.
    Rectangle {
        /// The size across the section.
        width: Written<Length>,
        /// The upright size.
        height: Written<Length>,
    },
}

/// A place in the section.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case", deny_unknown_fields)]
pub(crate) enum PlaceDocument {
    /// The middle of the outline by coordinates.
    At {
        /// The coordinate to the right.
        y: Written<Length>,
        /// The coordinate upward.
        z: Written<Length>,
    },
    /// Touching the left side of a part.
    LeftOf(String),
    /// Touching the right side of a part.
    RightOf(String),
    /// Standing on a part.
    Above(String),
    /// Under a part, touching it.
    Below(String),
}

/// The member.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct MemberDocument {
    /// The length from end to end.
    pub(crate) length: Written<Length>,
    /// The supports.
    pub(crate) supports: Vec<SupportDocument>,
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
}

/// What a support holds.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case")]
pub(crate) enum SupportKindDocument {
    Pin,
    Roller,
    Fixed,
}
