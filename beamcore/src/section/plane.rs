//! The plane of strain of a section, and the stresses that follow from it.

use super::Section;
use crate::error::{Error, Result};
use crate::outline::Point;
use crate::time::Time;
use crate::units::{Angle, BendingStiffness, Curvature, Force, Length, Moment, Strain, Stress};

/// Forces on a section: axial force (tension positive), moments about the two axes.
///
/// A positive `moment_y` (sagging) stretches the bottom, a positive `moment_z` the side of
/// negative y.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct SectionForces {
    /// N.
    pub axial: Force,
    /// M_y = -int sigma z dA.
    pub moment_y: Moment,
    /// M_z = -int sigma y dA.
    pub moment_z: Moment,
}

/// Whether a section may move sideways.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
pub enum Sideways {
    /// Held, as by a floor: it bends about the level axis only.
    #[default]
    Held,
    /// Free: it also bends about the upright axis where it has no axis of symmetry.
    Free,
}

impl Sideways {
    /// The word used in documents.
    #[must_use]
    pub const fn name(self) -> &'static str {
        match self {
            Self::Held => "held",
            Self::Free => "free",
        }
    }
}

/// The principal bending stiffnesses of a section.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Principal {
    /// The greater one.
    pub greater: BendingStiffness,
    /// The smaller one.
    pub smaller: BendingStiffness,
    /// From the level axis to the axis of the greater one, positive from y towards z.
    pub angle: Angle,
}

/// A plane of strain: eps = axial - `curvature_y` (z - `z_n`) - `curvature_z` (y - `y_n`).
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct StrainPlane {
    /// At the elastic centroid, tension positive.
    pub axial: Strain,
    /// About the level axis, positive where it stretches the bottom.
    pub curvature_y: Curvature,
    /// About the upright axis, positive where it stretches the side of negative y.
    pub curvature_z: Curvature,
    pub(super) centroid: (Length, Length),
}

impl StrainPlane {
    /// The strain at a point of the section.
    #[must_use]
    pub fn strain_at(&self, y: Length, z: Length) -> Strain {
        let (y_n, z_n) = self.centroid;
        self.axial - self.curvature_y * (z - z_n) - self.curvature_z * (y - y_n)
    }

    /// The factors of y and z in the strain.
    const fn slopes(&self) -> (f64, f64) {
        (-self.curvature_z.si(), -self.curvature_y.si())
    }
}

/// A stress at a point of a section.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct PointStress {
    /// The stress, tension positive.
    pub value: Stress,
    /// The point.
    pub y: Length,
    /// The point.
    pub z: Length,
}

impl Section {
    /// The stress in a part at a point of it, under section forces: E x strain. Initial strains of
    /// parts are not in it.
    ///
    /// # Errors
    /// [`crate::ErrorKind::Lookup`] for an unknown part; [`crate::ErrorKind::Value`] for forces that are not
    /// finite.
    pub fn stress_at(
        &self,
        part: &str,
        (y, z): (Length, Length),
        forces: &SectionForces,
        sideways: Sideways,
        time: Time,
    ) -> Result<Stress> {
        let index = self.index(part)?;
        let (plane, stiffness) = self.plane(forces, sideways, time)?;
        Ok(stiffness.moduli()[index] * plane.strain_at(y, z))
    }

    /// The greatest and the least stress in a part under section forces (initial strains are not in
    /// them), with their points: the
    /// strain is linear, so they stand where the outline reaches farthest.
    ///
    /// # Errors
    /// As [`Section::stress_at`].
    pub fn stress_extremes(
        &self,
        part: &str,
        forces: &SectionForces,
        sideways: Sideways,
        time: Time,
    ) -> Result<[PointStress; 2]> {
        let index = self.index(part)?;
        let (plane, stiffness) = self.plane(forces, sideways, time)?;
        let region = self.placed()[index].region();
        let (by_y, by_z) = plane.slopes();
        let stress = |point: Point| {
            let (y, z) = (Length::from_si(point.y), Length::from_si(point.z));
            let value = stiffness.moduli()[index] * plane.strain_at(y, z);
            PointStress { value, y, z }
        };
        Ok([region.greatest(by_y, by_z).at, region.least(by_y, by_z).at].map(stress))
    }

    fn plane(
        &self,
        forces: &SectionForces,
        sideways: Sideways,
        time: Time,
    ) -> Result<(StrainPlane, super::Stiffness)> {
        let mut problems = Vec::new();
        crate::check::finite(&mut problems, forces.axial, "forces.axial");
        crate::check::finite(&mut problems, forces.moment_y, "forces.moment_y");
        crate::check::finite(&mut problems, forces.moment_z, "forces.moment_z");
        Error::check(problems)?;
        let stiffness = self.stiffness(time);
        Ok((stiffness.strain_plane(forces, sideways), stiffness))
    }
}
