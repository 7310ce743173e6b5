//! Characteristic strengths: 5 % fractiles of a strength class, not yet design values.

use crate::check;
use crate::error::Problem;
use crate::path;
use crate::units::Stress;

/// Characteristic strengths of timber along the grain, with those across where they are known.
#[non_exhaustive]
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct TimberStrength {
    /// Bending, f_m,k.
    pub bending: Stress,
    /// Tension along the grain, f_t,0,k.
    pub tension: Stress,
    /// Compression along the grain, f_c,0,k.
    pub compression: Stress,
    /// Shear, f_v,k.
    pub shear: Stress,
    /// Tension across the grain, f_t,90,k.
    pub tension_across: Option<Stress>,
    /// Compression across the grain, f_c,90,k.
    pub compression_across: Option<Stress>,
}

impl TimberStrength {
    /// The strengths along the grain: bending f_m,k, tension f_t,0,k, compression f_c,0,k and
    /// shear f_v,k.
    #[must_use]
    pub const fn new(bending: Stress, tension: Stress, compression: Stress, shear: Stress) -> Self {
        Self {
            bending,
            tension,
            compression,
            shear,
            tension_across: None,
            compression_across: None,
        }
    }

    /// The same strengths with those across the grain: tension f_t,90,k, compression f_c,90,k.
    #[must_use]
    pub const fn across(mut self, tension: Stress, compression: Stress) -> Self {
        self.tension_across = Some(tension);
        self.compression_across = Some(compression);
        self
    }
}

/// Characteristic strengths of metal.
#[non_exhaustive]
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct MetalStrength {
    /// Yield strength f_y of steel, 0.2 % proof strength f_o of aluminium.
    pub yield_stress: Stress,
    /// Ultimate tensile strength f_u.
    pub ultimate: Option<Stress>,
}

impl MetalStrength {
    /// The yield strength f_y, or the 0.2 % proof strength f_o.
    #[must_use]
    pub const fn new(yield_stress: Stress) -> Self {
        Self {
            yield_stress,
            ultimate: None,
        }
    }

    /// The same strengths with the ultimate tensile strength f_u.
    #[must_use]
    pub const fn ultimate(mut self, ultimate: Stress) -> Self {
        self.ultimate = Some(ultimate);
        self
    }
}

/// Characteristic and mean strengths of concrete.
#[non_exhaustive]
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct ConcreteStrength {
    /// Characteristic compressive strength of cylinders at 28 days, f_ck.
    pub compression: Stress,
    /// Mean compressive strength of cylinders at 28 days, f_cm.
    pub mean_compression: Stress,
    /// Mean axial tensile strength, f_ctm.
    pub mean_tension: Stress,
}

impl ConcreteStrength {
    /// The compressive strengths f_ck and f_cm, and the mean tensile strength f_ctm.
    #[must_use]
    pub const fn new(compression: Stress, mean_compression: Stress, mean_tension: Stress) -> Self {
        Self {
            compression,
            mean_compression,
            mean_tension,
        }
    }
}

/// Characteristic strengths of a material.
///
/// No stress is compared with them: they become design strengths through
/// [`DesignFactors`](super::DesignFactors).
#[non_exhaustive]
#[derive(Clone, Copy, Debug, PartialEq)]
pub enum CharacteristicStrength {
    /// Timber.
    Timber(TimberStrength),
    /// Metal.
    Metal(MetalStrength),
    /// Concrete; it has no design strengths here.
    Concrete(ConcreteStrength),
}

/// One strength: its key in paths, its name with the symbol, its value.
pub(super) type Entry = (&'static str, &'static str, Option<Stress>);

impl CharacteristicStrength {
    /// What the strengths are of: `timber`, `metal` or `concrete`.
    #[must_use]
    pub const fn stuff(&self) -> &'static str {
        match self {
            Self::Timber(_) => "timber",
            Self::Metal(_) => "metal",
            Self::Concrete(_) => "concrete",
        }
    }

    /// All strengths, also those that are not known.
    pub(super) fn entries(&self) -> Vec<Entry> {
        match self {
            Self::Timber(timber) => vec![
                ("bending", "bending strength f_m,k", Some(timber.bending)),
                ("tension", "tensile strength f_t,0,k", Some(timber.tension)),
                (
                    "compression",
                    "compressive strength f_c,0,k",
                    Some(timber.compression),
                ),
                ("shear", "shear strength f_v,k", Some(timber.shear)),
                (
                    "tension_across",
                    "tensile strength f_t,90,k",
                    timber.tension_across,
                ),
                (
                    "compression_across",
                    "compressive strength f_c,90,k",
                    timber.compression_across,
                ),
            ],
            Self::Metal(metal) => vec![
                ("yield", "yield strength", Some(metal.yield_stress)),
                ("ultimate", "ultimate strength f_u", metal.ultimate),
            ],
            Self::Concrete(concrete) => vec![
                (
                    "compression",
                    "compressive strength f_ck",
                    Some(concrete.compression),
                ),
                (
                    "mean_compression",
                    "mean compressive strength f_cm",
                    Some(concrete.mean_compression),
                ),
                (
                    "mean_tension",
                    "mean tensile strength f_ctm",
                    Some(concrete.mean_tension),
                ),
            ],
        }
    }

    /// A problem for each strength that is not greater than zero.
    pub(super) fn check(&self, problems: &mut Vec<Problem>, base: &str) {
        let base = path::key(base, self.stuff());
        for (key, _, strength) in self.entries() {
            if let Some(strength) = strength {
                check::positive(problems, strength, &path::key(&base, key));
            }
        }
    }
}
