//! The section in the outcome.

#![allow(
    non_snake_case,
    reason = "the units in the names keep their case: N is not n"
)]

use super::document_forces::ForcesOutcome;
use super::document_layers::{JointOutcome, LayerOutcome};
use schemars::JsonSchema;
use serde::{Deserialize, Serialize};

/// The section with its stiffness at both times.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct SectionOutcome {
    pub(super) initial: StiffnessOutcome,
    #[serde(rename = "final")]
    pub(super) end: StiffnessOutcome,
    pub(super) parts: Vec<PartOutcome>,
    /// The layers, where there are joints.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(super) layers: Vec<LayerOutcome>,
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(super) joints: Vec<JointOutcome>,
    /// The stresses under the named forces of the job.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(super) forces: Vec<ForcesOutcome>,
    /// The section transformed to each of its materials.
    pub(super) transformed: Vec<TransformedOutcome>,
}

/// E-weighted sums of a section, as if its layers could not slip.
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
    /// The shear stiffness kGA, of layers that slip the sum of theirs, where the member yields in
    /// shear.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(super) shear_stiffness_N: Option<f64>,
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
