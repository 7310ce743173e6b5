//! Outlines of parts and their exact integrals.

use crate::check;
use crate::error::Problem;
use crate::path;
use crate::units::{Area, Length, SecondMoment};

/// The outline of a part, without its place.
#[derive(Clone, Copy, Debug, PartialEq)]
#[non_exhaustive]
pub enum Outline {
    /// A rectangle with its sides along y and z.
    Rectangle {
        /// Size along y, across the section.
        width: Length,
        /// Size along z, upright.
        height: Length,
    },
}

/// A rectangle of the given width (along y) and height (along z).
#[must_use]
pub const fn rectangle(width: Length, height: Length) -> Outline {
    Outline::Rectangle { width, height }
}

impl Outline {
    /// Size along y.
    #[must_use]
    pub const fn width(&self) -> Length {
        let Self::Rectangle { width, .. } = *self;
        width
    }

    /// Size along z.
    #[must_use]
    pub const fn height(&self) -> Length {
        let Self::Rectangle { height, .. } = *self;
        height
    }

    /// Area, b h.
    #[must_use]
    pub fn area(&self) -> Area {
        self.width() * self.height()
    }

    /// Second moment of area about the horizontal axis through its own centroid, b h^3/12.
    #[must_use]
    pub fn second_moment_yy(&self) -> SecondMoment {
        cubed(self.width(), self.height())
    }

    /// Second moment of area about the upright axis through its own centroid, h b^3/12.
    #[must_use]
    pub fn second_moment_zz(&self) -> SecondMoment {
        cubed(self.height(), self.width())
    }

    pub(super) fn problems(&self, base: &str) -> Vec<Problem> {
        let mut problems = Vec::new();
        let base = path::key(base, "rectangle");
        check::positive(&mut problems, self.width(), &path::key(&base, "width"));
        check::positive(&mut problems, self.height(), &path::key(&base, "height"));
        problems
    }
}

fn cubed(breadth: Length, depth: Length) -> SecondMoment {
    breadth * depth * depth * depth / 12.0
}
