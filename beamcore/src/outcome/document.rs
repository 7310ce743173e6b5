//! The outcome document: every number in SI, with the unit in its name.

#![allow(
    non_snake_case,
    reason = "the units in the names keep their case: N is not n"
)]

use super::document_deflection::{
    CamberOutcome, ComponentsOutcome, LimitOutcome, SpanDeflectionOutcome, SpanOutcome,
};
use super::document_forces::ForcesOutcome;
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

/// The section with its stiffness at both times.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct SectionOutcome {
    pub(super) initial: StiffnessOutcome,
    #[serde(rename = "final")]
    pub(super) end: StiffnessOutcome,
    pub(super) parts: Vec<PartOutcome>,
    /// The stresses under the named forces of the job.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(super) forces: Vec<ForcesOutcome>,
    /// The section transformed to each of its materials.
    pub(super) transformed: Vec<TransformedOutcome>,
}

/// E-weighted sums of a section.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct StiffnessOutcome {
    pub(super) axial_stiffness_N: f64,
    pub(super) centroid_y_m: f64,
    pub(super) centroid_z_m: f64,
    pub(super) bending_stiffness_yy_Nm2: f64,
    pub(super) bending_stiffness_zz_Nm2: f64,
    pub(super) bending_stiffness_yz_Nm2: f64,
    /// The greater principal bending stiffness.
    pub(super) principal_greater_Nm2: f64,
    /// The smaller principal bending stiffness.
    pub(super) principal_smaller_Nm2: f64,
    /// From the level axis to the axis of the greater one, positive from y towards z.
    pub(super) principal_angle_rad: f64,
}

/// A part at its place.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct PartOutcome {
    pub(super) name: String,
    pub(super) material: String,
    /// The outline by its word in the document.
    pub(super) outline: String,
    pub(super) left_m: f64,
    pub(super) right_m: f64,
    pub(super) bottom_m: f64,
    pub(super) top_m: f64,
    pub(super) area_m2: f64,
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(super) line_mass_kg_per_m: Option<f64>,
    /// The mass of the part in one member.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(super) mass_kg: Option<f64>,
    pub(super) initial: PartStiffnessOutcome,
    #[serde(rename = "final")]
    pub(super) end: PartStiffnessOutcome,
}

/// What a part gives to the bending stiffness.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct PartStiffnessOutcome {
    pub(super) modulus_Pa: f64,
    /// The share of the part in the bending stiffness.
    pub(super) share: f64,
}

/// The section as if made of one material.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct TransformedOutcome {
    /// The name of the reference material.
    pub(super) name: String,
    pub(super) initial: TransformedStateOutcome,
    #[serde(rename = "final")]
    pub(super) end: TransformedStateOutcome,
}

/// The transformed section at one time.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct TransformedStateOutcome {
    pub(super) reference_modulus_Pa: f64,
    pub(super) area_m2: f64,
    pub(super) centroid_z_m: f64,
    pub(super) second_moment_m4: f64,
    pub(super) parts: Vec<TransformedPartOutcome>,
}

/// A part of the transformed section.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct TransformedPartOutcome {
    pub(super) name: String,
    /// The modular ratio E/E_ref.
    pub(super) ratio: f64,
    pub(super) width_m: f64,
    /// The corners of the transformed outline, loop by loop, as pairs y, z; arcs by short chords.
    pub(super) loops_m: Vec<Vec<[f64; 2]>>,
}

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
    pub(super) shear: ForceExtremes,
    pub(super) moment: MomentExtremes,
    pub(super) reactions: Vec<ReactionOutcome>,
    pub(super) stresses: Vec<StressOutcome>,
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
    /// What is left of equilibrium and continuity, relative to the greatest terms.
    pub(super) residual: f64,
}
