//! The outcome document: every number in SI, with the unit in its name.

#![allow(
    non_snake_case,
    reason = "the units in the names keep their case: N is not n"
)]

use super::document_deflection::{
    CamberOutcome, ComponentsOutcome, LimitOutcome, SpanDeflectionOutcome,
};
use super::document_layers::{
    AnchorOutcome, CompositeOutcome, JointResultOutcome, LayerResultOutcome,
};
use super::document_member::MemberOutcome;
use super::document_section::SectionOutcome;
use super::document_simplified::SimplifiedOutcome;
use super::extremes::{AngleExtremes, ForceExtremes, LengthExtremes, MomentExtremes};
use crate::job::JobDocument;
use schemars::JsonSchema;
use serde::{Deserialize, Serialize};

/// All results of a job.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct OutcomeDocument {
    /// The version of the outcome document.
    pub(super) outcome_version: u32,
    /// The version of the library that made it.
    pub(super) beamcore: String,
    /// The job as it was given.
    pub(super) job: JobDocument,
    /// The rules that the results rest on, with their editions.
    pub(super) rules: Vec<String>,
    /// The materials as they were used.
    pub(super) materials: Vec<MaterialOutcome>,
    /// The section.
    pub(super) section: SectionOutcome,
    /// The member as a whole.
    pub(super) member: MemberOutcome,
    /// The results under each combination.
    pub(super) combinations: Vec<CombinationOutcome>,
    /// The components of the deflection by EN 1990 A1.4.3, under each characteristic combination.
    pub(super) components: Vec<ComponentsOutcome>,
    /// The limits of the deflection, compared with the results.
    pub(super) limits: Vec<LimitOutcome>,
    /// Results of simplified methods beside the exact ones.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(super) simplified: Vec<SimplifiedOutcome>,
    /// The camber, if it was asked for.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(super) camber: Option<CamberOutcome>,
    /// How exact the solution is.
    pub(super) accuracy: AccuracyOutcome,
    /// What was assumed.
    pub(super) assumptions: Vec<String>,
    /// What the engineer should look at.
    pub(super) warnings: Vec<String>,
    /// What was not checked.
    pub(super) not_checked: Vec<String>,
}

/// A material as it was used.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct MaterialOutcome {
    pub(super) name: String,
    /// Where its values come from.
    pub(super) origin: String,
    pub(super) modulus_Pa: f64,
    pub(super) creep_factor: f64,
    /// Where the creep factor comes from.
    pub(super) creep_basis: String,
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(super) shear_modulus_Pa: Option<f64>,
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(super) thermal_expansion_per_K: Option<f64>,
    /// The design shear strength; no shear stress is compared with it yet.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(super) shear_strength_Pa: Option<f64>,
    /// The design strengths with which stresses were compared.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(super) design_strength: Option<StrengthOutcome>,
    /// The values of the class that were overridden.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(super) overrides: Vec<String>,
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(super) density_kg_per_m3: Option<f64>,
}

/// Design strengths.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case", deny_unknown_fields)]
pub(super) enum StrengthOutcome {
    Timber {
        bending_Pa: f64,
        tension_Pa: f64,
        compression_Pa: f64,
    },
    Metal {
        yield_Pa: f64,
    },
}

/// Results under one combination.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct CombinationOutcome {
    pub(super) name: String,
    pub(super) factors: Vec<FactorOutcome>,
    pub(super) initial: ResultsOutcome,
    #[serde(rename = "final")]
    pub(super) end: ResultsOutcome,
}

/// The factor of an action in a combination.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct FactorOutcome {
    /// The name of the action.
    pub(super) name: String,
    pub(super) factor: f64,
}

/// Results under one combination at one time.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct ResultsOutcome {
    pub(super) deflection: LengthExtremes,
    /// The deflection of each span from its own chord.
    pub(super) spans: Vec<SpanDeflectionOutcome>,
    /// The movement sideways, positive towards positive y.
    pub(super) sideways: LengthExtremes,
    pub(super) slope: AngleExtremes,
    /// The rotation of the section, where the member yields in shear; else it is the slope.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(super) rotation: Option<AngleExtremes>,
    pub(super) shear: ForceExtremes,
    /// About the elastic centroid that the section has on the first day.
    pub(super) moment: MomentExtremes,
    /// Tension positive.
    pub(super) axial: ForceExtremes,
    pub(super) reactions: Vec<ReactionOutcome>,
    pub(super) stresses: Vec<StressOutcome>,
    /// The joints that are not rigid.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(super) joints: Vec<JointResultOutcome>,
    /// The layers, where they slip.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(super) layers: Vec<LayerResultOutcome>,
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(super) anchors: Vec<AnchorOutcome>,
    /// The action of layers that slip and share one deflection, under the characteristic and
    /// quasi-permanent combinations.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(super) composite_action: Option<CompositeOutcome>,
    /// The one-way supports that the member has left.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(super) lifted: Vec<String>,
    /// How many linear solutions it took: one, unless supports can be left or joints have
    /// clearance.
    pub(super) steps: usize,
}

/// The reaction of a support.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct ReactionOutcome {
    /// The name of the support.
    pub(super) name: String,
    /// Positive upward.
    pub(super) force_N: f64,
    /// Positive clockwise.
    pub(super) couple_Nm: f64,
    /// The level force, positive to the right; zero where no axial force takes part.
    pub(super) along_N: f64,
    /// What it holds layers with along the member by themselves; part of the level force.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(super) layers: Vec<LayerReactionOutcome>,
}

/// The force with which a support holds one layer along the member by itself.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct LayerReactionOutcome {
    /// The name of the layer.
    pub(super) name: String,
    /// Positive to the right.
    pub(super) along_N: f64,
}

/// The normal stress in a part.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct StressOutcome {
    /// The name of the part.
    pub(super) name: String,
    /// The algebraically greatest stress.
    pub(super) tension: FibreOutcome,
    /// The algebraically least stress.
    pub(super) compression: FibreOutcome,
    /// Stress over design strength, under the fundamental combination.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(super) utilisation: Option<UtilisationOutcome>,
}

/// A stress with its place.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct FibreOutcome {
    pub(super) value_Pa: f64,
    pub(super) at_m: f64,
    pub(super) y_m: f64,
    pub(super) z_m: f64,
}

/// The greatest utilisation of a part.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct UtilisationOutcome {
    pub(super) value: f64,
    pub(super) at_m: f64,
}

/// How exact the solution is.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct AccuracyOutcome {
    /// An estimate of the relative error, the worst of all solutions: what is left of equilibrium
    /// and continuity at the stations, relative to the greatest terms there, and of the equations
    /// between the points of pieces whose section changes. What is left of the equations at the
    /// stations is a matter of rounding; it is no bound for what the assumptions leave out.
    pub(super) residual: f64,
}
