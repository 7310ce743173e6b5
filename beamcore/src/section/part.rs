//! Parts: one piece of one material each.

use super::initial::InitialStrain;
use super::place::{MirrorAxis, PartName, Placement, Side};
use crate::check;
use crate::error::Problem;
use crate::material::Material;
use crate::outline::Outline;
use crate::path;
use crate::units::{Length, LineMass};

/// One piece of one material in a section, with a name that addresses its results.
///
/// A part that is given no place stands with the point by which its outline is placed at y = 0, z = 0.
#[derive(Clone, Debug, PartialEq)]
pub struct Part {
    name: String,
    outline: Outline,
    material: Material,
    placement: Placement,
    line_mass: Option<LineMass>,
    initial_strain: InitialStrain,
}

impl Part {
    /// A part with the point by which its outline is placed at y = 0, z = 0.
    pub fn new(name: impl Into<String>, outline: Outline, material: Material) -> Self {
        let placement = Placement::At {
            y: Length::ZERO,
            z: Length::ZERO,
        };
        Self {
            name: name.into(),
            outline,
            material,
            placement,
            line_mass: None,
            initial_strain: InitialStrain::NONE,
        }
    }

    /// The same part with the middle of its outline at (y, z): y to the right, z upward, in a
    /// drawing that is seen against the direction of x.
    #[must_use]
    pub fn at(self, y: Length, z: Length) -> Self {
        self.placed(Placement::At { y, z })
    }

    /// The same part touching the left side of another, centred on its height.
    #[must_use]
    pub fn left_of(self, other: impl Into<PartName>) -> Self {
        self.beside(Side::Left, other)
    }

    /// The same part touching the right side of another, centred on its height.
    #[must_use]
    pub fn right_of(self, other: impl Into<PartName>) -> Self {
        self.beside(Side::Right, other)
    }

    /// The same part standing on another, centred on its width.
    #[must_use]
    pub fn above(self, other: impl Into<PartName>) -> Self {
        self.beside(Side::Above, other)
    }

    /// The same part under another, touching it, centred on its width.
    #[must_use]
    pub fn below(self, other: impl Into<PartName>) -> Self {
        self.beside(Side::Below, other)
    }

    /// The same part on the given side of another, touching it.
    #[must_use]
    pub fn beside(self, side: Side, other: impl Into<PartName>) -> Self {
        self.placed(Placement::Beside {
            side,
            of: other.into().0,
        })
    }

    /// The same part as the mirror image of another: at the mirrored place, with its own outline
    /// mirrored.
    #[must_use]
    pub fn mirror_of(self, other: impl Into<PartName>, axis: MirrorAxis) -> Self {
        self.placed(Placement::MirrorOf {
            of: other.into().0,
            axis,
        })
    }

    /// The same part set into another, its host, at (y, z): it displaces the host exactly, whose
    /// area and moments become smaller by its own.
    #[must_use]
    pub fn set_into(self, host: impl Into<PartName>, y: Length, z: Length) -> Self {
        self.placed(Placement::SetInto {
            host: host.into().0,
            y,
            z,
        })
    }

    /// The same part with a mass per length of its own, instead of density x area.
    #[must_use]
    pub const fn line_mass(mut self, mass: LineMass) -> Self {
        self.line_mass = Some(mass);
        self
    }

    /// The same part with an initial strain from the first day, which makes the section bend and
    /// its parts press on each other.
    #[must_use]
    pub const fn initial_strain(mut self, strain: InitialStrain) -> Self {
        self.initial_strain = strain;
        self
    }

    /// The same part at the given place.
    #[must_use]
    pub fn placed(mut self, placement: Placement) -> Self {
        self.placement = placement;
        self
    }

    /// The name.
    #[must_use]
    pub fn name(&self) -> &str {
        &self.name
    }

    /// The outline.
    #[must_use]
    pub const fn outline(&self) -> &Outline {
        &self.outline
    }

    /// The material.
    #[must_use]
    pub const fn material(&self) -> &Material {
        &self.material
    }

    /// The initial strain; none unless it was given.
    #[must_use]
    pub const fn given_initial_strain(&self) -> InitialStrain {
        self.initial_strain
    }

    /// The mass per length, if it was given instead of density x area.
    #[must_use]
    pub const fn given_line_mass(&self) -> Option<LineMass> {
        self.line_mass
    }

    /// The place as given.
    #[must_use]
    pub const fn placement(&self) -> &Placement {
        &self.placement
    }

    pub(super) fn problems(&self) -> Vec<Problem> {
        let mut problems = Vec::new();
        check::name(&mut problems, &self.name, "section.parts");
        let base = path::named("section.parts", &self.name);
        problems.extend(self.outline.problems(&path::key(&base, "outline")));
        let strain = path::key(&base, "initial_strain");
        problems.extend(self.initial_strain.problems(&strain));
        if let Some(mass) = self.line_mass {
            check::not_negative(&mut problems, mass, &path::key(&base, "line_mass"));
        }
        if let Placement::At { y, z } | Placement::SetInto { y, z, .. } = &self.placement {
            let key = self.placement.refers_to().map_or("at", |(key, _)| key);
            let at = path::key(&path::key(&base, "place"), key);
            check::finite(&mut problems, *y, &path::key(&at, "y"));
            check::finite(&mut problems, *z, &path::key(&at, "z"));
        }
        problems
    }
}
