//! Materials as they are written.

use super::written::Written;
use crate::units::{Density, Duration, Length, Modulus, Stress, ThermalExpansion};
use schemars::JsonSchema;
use serde::{Deserialize, Serialize};

/// A material: by strength class (`timber`, `steel`, `aluminium` or `concrete`) or by its values
/// (`modulus`). Beside a class, a value overrides that of the class.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct MaterialDocument {
    /// A strength class of timber, for example "C24".
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) timber: Option<String>,
    /// A strength class of steel, for example "S275".
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) steel: Option<String>,
    /// An aluminium alloy with its temper, for example "EN AW-6082 T6".
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) aluminium: Option<String>,
    /// The thickness of steel or aluminium, on which its strength depends.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) thickness: Option<Written<Length>>,
    /// A strength class of concrete, for example "C30/37".
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) concrete: Option<String>,
    /// The modulus of elasticity.
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
    /// The shear modulus.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) shear_modulus: Option<Written<Modulus>>,
    /// Poisson's ratio, from which the shear modulus follows.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) poisson_ratio: Option<f64>,
    /// The thermal expansion.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) thermal_expansion: Option<Written<ThermalExpansion>>,
    /// Characteristic strengths, to be reduced by the design factors.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) characteristic_strength: Option<CharacteristicDocument>,
    /// The factors that make design strengths of characteristic ones.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) design_factors: Option<FactorsDocument>,
    /// The design shear strength.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) shear_strength: Option<Written<Stress>>,
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

/// Characteristic strengths.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case", deny_unknown_fields)]
pub(crate) enum CharacteristicDocument {
    /// Characteristic strengths of timber.
    Timber {
        /// The bending strength.
        bending: Written<Stress>,
        /// The tension strength along the grain.
        tension: Written<Stress>,
        /// The compression strength along the grain.
        compression: Written<Stress>,
        /// The shear strength.
        shear: Written<Stress>,
    },
    /// The strength of a metal.
    Metal {
        /// The yield strength.
        #[serde(rename = "yield")]
        yield_stress: Written<Stress>,
    },
}

/// Factors that make design strengths of characteristic ones.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case", deny_unknown_fields)]
pub(crate) enum FactorsDocument {
    /// Factors of timber.
    Timber {
        /// The factor for load duration and climate.
        k_mod: f64,
        /// The partial factor.
        gamma_m: f64,
        /// The size factor on bending and tension.
        #[serde(default, skip_serializing_if = "Option::is_none")]
        k_h: Option<f64>,
        /// The factor of members that share their load.
        #[serde(default, skip_serializing_if = "Option::is_none")]
        k_sys: Option<f64>,
    },
    /// The factor of a metal.
    Metal {
        /// The partial factor.
        gamma_m: f64,
    },
}
