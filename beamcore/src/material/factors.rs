//! From characteristic to design strengths.

use super::characteristic::{CharacteristicStrength, TimberStrength};
use super::strength::DesignStrength;
use crate::check;
use crate::error::Problem;
use crate::path;
use crate::units::Stress;

/// Factors by which design strengths of timber follow from characteristic ones.
///
/// f_d = k_mod k_sys f_k/gamma_M, bending and tension along the grain also times k_h.
/// Source: EN 1995-1-1:2004 eq. 2.14, 3.2 (k_h), 6.6 (k_sys), from memory. All four are the
/// engineer's to choose; none has a value of its own.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct TimberFactors {
    k_mod: f64,
    gamma_m: f64,
    k_h: Option<f64>,
    k_sys: Option<f64>,
}

impl TimberFactors {
    /// k_mod, for the duration of the load and the climate, and the partial factor gamma_M.
    #[must_use]
    pub const fn new(k_mod: f64, gamma_m: f64) -> Self {
        Self {
            k_mod,
            gamma_m,
            k_h: None,
            k_sys: None,
        }
    }

    /// The same factors with the size factor k_h, by which bending and tensile strength rise.
    #[must_use]
    pub const fn size(mut self, k_h: f64) -> Self {
        self.k_h = Some(k_h);
        self
    }

    /// The same factors with the factor k_sys, by which all strengths of members rise that share
    /// their load.
    #[must_use]
    pub const fn sharing(mut self, k_sys: f64) -> Self {
        self.k_sys = Some(k_sys);
        self
    }

    /// k_mod.
    #[must_use]
    pub const fn k_mod(&self) -> f64 {
        self.k_mod
    }

    /// The partial factor gamma_M.
    #[must_use]
    pub const fn gamma_m(&self) -> f64 {
        self.gamma_m
    }

    /// The size factor k_h, if it is given.
    #[must_use]
    pub const fn k_h(&self) -> Option<f64> {
        self.k_h
    }

    /// The factor of load sharing k_sys, if it is given.
    #[must_use]
    pub const fn k_sys(&self) -> Option<f64> {
        self.k_sys
    }
}

/// Factors by which design strengths follow from characteristic ones.
#[non_exhaustive]
#[derive(Clone, Copy, Debug, PartialEq)]
pub enum DesignFactors {
    /// Timber: f_d = k_mod k_h k_sys f_k/gamma_M.
    Timber(TimberFactors),
    /// Metal: f_d = f_y/gamma_M.
    Metal {
        /// gamma_M0 of steel (EN 1993-1-1:2005 6.1), gamma_M1 of aluminium (EN 1999-1-1:2007
        /// 6.1.3), from memory.
        gamma_m: f64,
    },
}

impl DesignFactors {
    /// Factors of timber, k_mod and gamma_M, as in
    /// `DesignFactors::Timber(TimberFactors::new(k_mod, gamma_m))`.
    #[must_use]
    pub const fn timber(k_mod: f64, gamma_m: f64) -> Self {
        Self::Timber(TimberFactors::new(k_mod, gamma_m))
    }

    /// The partial factor of metal: gamma_M0 of steel, gamma_M1 of aluminium.
    #[must_use]
    pub const fn metal(gamma_m: f64) -> Self {
        Self::Metal { gamma_m }
    }

    /// What the factors are of: `timber` or `metal`.
    #[must_use]
    pub const fn stuff(&self) -> &'static str {
        match self {
            Self::Timber(_) => "timber",
            Self::Metal { .. } => "metal",
        }
    }

    /// A problem for each factor outside what is possible.
    pub(super) fn check(&self, problems: &mut Vec<Problem>, base: &str) {
        let base = path::key(base, self.stuff());
        let mut check = |factor: f64, least, most, key: &str| {
            check::between(problems, factor, least, most, &path::key(&base, key));
        };
        match self {
            Self::Timber(factors) => {
                check(factors.k_mod, 0.1, 1.1, "k_mod");
                check(factors.gamma_m, 1.0, 5.0, "gamma_m");
                if let Some(k_h) = factors.k_h {
                    check(k_h, 0.5, 1.3, "k_h");
                }
                if let Some(k_sys) = factors.k_sys {
                    check(k_sys, 1.0, 1.5, "k_sys");
                }
            }
            Self::Metal { gamma_m } => check(*gamma_m, 1.0, 5.0, "gamma_m"),
        }
    }
}

/// Design strengths made from characteristic ones.
#[derive(Clone, Copy, Debug, PartialEq)]
pub(super) struct Designed {
    pub(super) strength: DesignStrength,
    pub(super) shear: Stress,
}

impl Designed {
    /// The design strengths; `None` if strengths and factors are of different stuff.
    pub(super) fn of(strength: &CharacteristicStrength, factors: &DesignFactors) -> Option<Self> {
        match (strength, factors) {
            (CharacteristicStrength::Timber(strength), DesignFactors::Timber(factors)) => {
                Some(Self::timber(strength, factors))
            }
            (CharacteristicStrength::Metal(strength), DesignFactors::Metal { gamma_m }) => {
                let yield_stress = strength.yield_stress / *gamma_m;
                Some(Self {
                    strength: DesignStrength::Metal { yield_stress },
                    shear: yield_in_shear(yield_stress),
                })
            }
            _ => None,
        }
    }

    fn timber(strength: &TimberStrength, factors: &TimberFactors) -> Self {
        let all = factors.k_mod * factors.k_sys.unwrap_or(1.0);
        let sized = all * factors.k_h.unwrap_or(1.0);
        Self {
            strength: DesignStrength::Timber {
                bending: sized * strength.bending / factors.gamma_m,
                tension: sized * strength.tension / factors.gamma_m,
                compression: all * strength.compression / factors.gamma_m,
            },
            shear: all * strength.shear / factors.gamma_m,
        }
    }
}

/// The stress at which metal yields in shear, f_y/sqrt(3).
///
/// Source: von Mises; EN 1993-1-1:2005 eq. 6.18 and EN 1999-1-1:2007 eq. 6.29, from memory.
pub(super) fn yield_in_shear(yield_stress: Stress) -> Stress {
    yield_stress / 3.0_f64.sqrt()
}
