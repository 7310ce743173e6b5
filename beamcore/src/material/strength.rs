//! Design strengths: given, or made of characteristic ones by factors that the engineer chooses.

use crate::check;
use crate::error::Problem;
use crate::path;
use crate::units::Stress;

/// Design strengths of a material, with the rule by which stresses are compared to them.
///
/// They are *design* values: duration of load, climate, size and partial factors of the local
/// code are already in them.
#[derive(Clone, Copy, Debug, PartialEq)]
#[non_exhaustive]
pub enum DesignStrength {
    /// Timber: the stress at the part's centroid against tension or compression, and what is left
    /// at its edges against bending; the two shares are added
    /// (EN 1995-1-1:2004 6.2.3, linear form, from memory).
    Timber {
        /// f_m,d.
        bending: Stress,
        /// f_t,0,d.
        tension: Stress,
        /// f_c,0,d.
        compression: Stress,
    },
    /// Metal: the greatest stress of either sign against the design yield strength.
    Metal {
        /// f_y,d.
        yield_stress: Stress,
    },
}

impl DesignStrength {
    pub(super) fn check(&self, problems: &mut Vec<Problem>, base: &str) {
        match *self {
            Self::Timber {
                bending,
                tension,
                compression,
            } => {
                let base = path::key(base, "timber");
                check::positive(problems, bending, &path::key(&base, "bending"));
                check::positive(problems, tension, &path::key(&base, "tension"));
                check::positive(problems, compression, &path::key(&base, "compression"));
            }
            Self::Metal { yield_stress } => {
                let base = path::key(base, "metal");
                check::positive(problems, yield_stress, &path::key(&base, "yield"));
            }
        }
    }
}
