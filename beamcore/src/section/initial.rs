//! Initial strains: what a part would be strained by if it were alone.

use super::placed::PlacedPart;
use super::plane::{SectionForces, Sideways, StrainPlane};
use super::stiffness::Stiffness;
use crate::check;
use crate::error::Problem;
use crate::path;
use crate::units::{Curvature, Force, Length, Moment, Strain};

/// The plane of strain that a part bears from the first day, about its own centroid:
/// eps* = axial - `curvature_y` (z - z_i) - `curvature_z` (y - y_i), positive where the part alone
/// would grow longer. Shrinkage, warmth, a part joined under strain are all of this kind.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct InitialStrain {
    /// At the part's own centroid; shrinkage is negative.
    pub axial: Strain,
    /// About the level axis, positive where the bottom would grow longer than the top.
    pub curvature_y: Curvature,
    /// About the upright axis, positive where the side of negative y would grow longer.
    pub curvature_z: Curvature,
}

impl InitialStrain {
    /// No strain.
    pub const NONE: Self = Self {
        axial: Strain::ZERO,
        curvature_y: Curvature::ZERO,
        curvature_z: Curvature::ZERO,
    };

    pub(crate) fn problems(&self, base: &str) -> Vec<Problem> {
        let mut problems = Vec::new();
        check::finite(&mut problems, self.axial, &path::key(base, "axial"));
        check::finite(
            &mut problems,
            self.curvature_y,
            &path::key(base, "curvature_y"),
        );
        check::finite(
            &mut problems,
            self.curvature_z,
            &path::key(base, "curvature_z"),
        );
        problems
    }

    /// This strain and another one together.
    pub(crate) fn plus(&self, other: &Self) -> Self {
        Self {
            axial: self.axial + other.axial,
            curvature_y: self.curvature_y + other.curvature_y,
            curvature_z: self.curvature_z + other.curvature_z,
        }
    }

    /// A multiple of this strain.
    pub(crate) fn times(&self, factor: f64) -> Self {
        Self {
            axial: self.axial * factor,
            curvature_y: self.curvature_y * factor,
            curvature_z: self.curvature_z * factor,
        }
    }

    /// The strain at a point, given the part's own centroid.
    pub(crate) fn at(&self, centroid: (Length, Length), y: Length, z: Length) -> Strain {
        self.axial - self.curvature_y * (z - centroid.1) - self.curvature_z * (y - centroid.0)
    }
}

/// The plane of strain that a section takes freely under the initial strains of its parts: the one
/// that forces N* = sum of E int eps* dA and M* = -sum of E int eps* (z, y) dA would give.
pub(super) fn free_plane(
    parts: &[PlacedPart],
    stiffness: &Stiffness,
    sideways: Sideways,
) -> StrainPlane {
    let (y_n, z_n) = (stiffness.centroid_y().si(), stiffness.centroid_z().si());
    let (mut axial, mut moment_y, mut moment_z) = (0.0, 0.0, 0.0);
    for (part, modulus) in parts.iter().zip(stiffness.moduli()) {
        let (strain, own, e) = (part.initial_strain(), part.net(), modulus.si());
        let (k_y, k_z) = (strain.curvature_y.si(), strain.curvature_z.si());
        let force = own.area * strain.axial.si();
        axial += e * force;
        moment_y -= e * (force * (own.z - z_n) - k_y * own.iyy - k_z * own.iyz);
        moment_z -= e * (force * (own.y - y_n) - k_y * own.iyz - k_z * own.izz);
    }
    let forces = SectionForces {
        axial: Force::from_si(axial),
        moment_y: Moment::from_si(moment_y),
        moment_z: Moment::from_si(moment_z),
    };
    stiffness.strain_plane(&forces, sideways)
}
