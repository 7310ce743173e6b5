//! Parts: one piece of one material each.

use super::outline::Outline;
use super::place::{PartName, Placement, Side};
use crate::check;
use crate::error::Problem;
use crate::material::Material;
use crate::path;
use crate::units::{Area, Length, LineMass};

/// One piece of one material in a section, with a name that addresses its results.
///
/// A part that is given no place stands with the middle of its outline at y = 0, z = 0.
#[derive(Clone, Debug, PartialEq)]
pub struct Part {
    name: String,
    outline: Outline,
    material: Material,
    placement: Placement,
}

impl Part {
    /// A part with the middle of its outline at y = 0, z = 0.
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
        if let Placement::At { y, z } = self.placement {
            let at = path::key(&path::key(&base, "place"), "at");
            check::finite(&mut problems, y, &path::key(&at, "y"));
            check::finite(&mut problems, z, &path::key(&at, "z"));
        }
        problems
    }
}

/// A part at its place in a section.
#[derive(Clone, Debug, PartialEq)]
pub struct PlacedPart {
    name: String,
    outline: Outline,
    material: Material,
    left: Length,
    bottom: Length,
}

impl PlacedPart {
    pub(super) fn centred(part: &Part, y: Length, z: Length) -> Self {
        let outline = part.outline;
        Self::with_corner(part, y - outline.width() / 2.0, z - outline.height() / 2.0)
    }

    pub(super) fn beside(part: &Part, side: Side, other: &Self) -> Self {
        let outline = part.outline;
        let left = other.centroid_y() - outline.width() / 2.0;
        let bottom = other.centroid_z() - outline.height() / 2.0;
        match side {
            Side::Left => Self::with_corner(part, other.left() - outline.width(), bottom),
            Side::Right => Self::with_corner(part, other.right(), bottom),
            Side::Above => Self::with_corner(part, left, other.top()),
            Side::Below => Self::with_corner(part, left, other.bottom() - outline.height()),
        }
    }

    fn with_corner(part: &Part, left: Length, bottom: Length) -> Self {
        Self {
            name: part.name.clone(),
            outline: part.outline,
            material: part.material.clone(),
            left,
            bottom,
        }
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

    /// The least y of the outline.
    #[must_use]
    pub const fn left(&self) -> Length {
        self.left
    }

    /// The greatest y of the outline.
    #[must_use]
    pub fn right(&self) -> Length {
        self.left + self.outline.width()
    }

    /// The least z of the outline.
    #[must_use]
    pub const fn bottom(&self) -> Length {
        self.bottom
    }

    /// The greatest z of the outline.
    #[must_use]
    pub fn top(&self) -> Length {
        self.bottom + self.outline.height()
    }

    /// The y of the part's own centroid.
    #[must_use]
    pub fn centroid_y(&self) -> Length {
        self.left + self.outline.width() / 2.0
    }

    /// The z of the part's own centroid.
    #[must_use]
    pub fn centroid_z(&self) -> Length {
        self.bottom + self.outline.height() / 2.0
    }

    /// The area.
    #[must_use]
    pub fn area(&self) -> Area {
        self.outline.area()
    }

    /// Mass per length, density x area; `None` if the material has no density.
    #[must_use]
    pub fn line_mass(&self) -> Option<LineMass> {
        self.material
            .mean_density()
            .map(|density| density * self.area())
    }
}
