//! Sizes, areas and moments of shapes.

use super::integrals::Integrals;
use super::shape::Outline;
use crate::units::{Area, Length, SecondMoment};

impl Outline {
    /// Size along y, of the bounding box.
    #[must_use]
    pub fn width(&self) -> Length {
        match *self {
            Self::Rectangle { width, .. }
            | Self::Tee { width, .. }
            | Self::Channel { width, .. }
            | Self::Angle { width, .. }
            | Self::HollowBox { width, .. } => width,
            Self::Disc { diameter } | Self::Ring { diameter, .. } => diameter,
            Self::IShape {
                top_width,
                bottom_width,
                ..
            } => top_width.max(bottom_width),
            Self::Polygon { .. } => Length::from_si(self.region().bounds().width()),
        }
    }

    /// Size along z, of the bounding box.
    #[must_use]
    pub fn height(&self) -> Length {
        match *self {
            Self::Rectangle { height, .. }
            | Self::IShape { height, .. }
            | Self::Tee { height, .. }
            | Self::Channel { height, .. }
            | Self::Angle { height, .. }
            | Self::HollowBox { height, .. } => height,
            Self::Disc { diameter } | Self::Ring { diameter, .. } => diameter,
            Self::Polygon { .. } => Length::from_si(self.region().bounds().height()),
        }
    }

    /// y of the middle of the bounding box; zero, but for a polygon.
    #[must_use]
    pub fn middle_y(&self) -> Length {
        match self {
            Self::Polygon { .. } => Length::from_si(self.region().bounds().middle().y),
            _ => Length::ZERO,
        }
    }

    /// z of the middle of the bounding box; zero, but for a polygon.
    #[must_use]
    pub fn middle_z(&self) -> Length {
        match self {
            Self::Polygon { .. } => Length::from_si(self.region().bounds().middle().z),
            _ => Length::ZERO,
        }
    }

    /// Area, A = int dA. Rectangle: b h. Disc: pi d^2/4. All others by Green's theorem:
    /// half the sum of `y_i z_j - y_j z_i` over the edges from point i to point j.
    #[must_use]
    pub fn area(&self) -> Area {
        Area::from_si(self.integrals().area)
    }

    /// y of the centroid, int y dA/A, from the point by which the outline is placed.
    #[must_use]
    pub fn centroid_y(&self) -> Length {
        Length::from_si(self.integrals().y)
    }

    /// z of the centroid, int z dA/A, from the point by which the outline is placed.
    #[must_use]
    pub fn centroid_z(&self) -> Length {
        Length::from_si(self.integrals().z)
    }

    /// Second moment of area about the horizontal axis through its own centroid,
    /// int (z - `z_c`)^2 dA. Rectangle: b h^3/12. Disc: pi d^4/64.
    #[must_use]
    pub fn second_moment_yy(&self) -> SecondMoment {
        SecondMoment::from_si(self.integrals().iyy)
    }

    /// Second moment of area about the upright axis through its own centroid,
    /// int (y - `y_c`)^2 dA. Rectangle: h b^3/12. Disc: pi d^4/64.
    #[must_use]
    pub fn second_moment_zz(&self) -> SecondMoment {
        SecondMoment::from_si(self.integrals().izz)
    }

    /// Product moment of area, int (y - `y_c`)(z - `z_c`) dA: exactly zero for a shape with an
    /// upright or level axis of symmetry, negative for an angle with its heel at the bottom left.
    #[must_use]
    pub fn second_moment_yz(&self) -> SecondMoment {
        SecondMoment::from_si(self.integrals().iyz)
    }

    /// Length of all edges, those of holes too. Disc: pi d.
    #[must_use]
    pub fn perimeter(&self) -> Length {
        Length::from_si(self.integrals().perimeter)
    }

    /// All integrals at once, in SI: exact closed forms (see [`Region::integrals`]).
    ///
    /// [`Region::integrals`]: super::Region::integrals
    #[must_use]
    pub fn integrals(&self) -> Integrals {
        let Self::Rectangle { width, height } = *self else {
            return self.symmetric(self.region().integrals());
        };
        Integrals {
            area: (width * height).si(),
            y: 0.0,
            z: 0.0,
            iyy: cubed(width, height).si(),
            izz: cubed(height, width).si(),
            iyz: 0.0,
            perimeter: (2.0 * (width + height)).si(),
        }
    }

    /// Integrals with the zeros that symmetry gives, in place of the roundings that are left of
    /// terms which cancel.
    fn symmetric(&self, integrals: Integrals) -> Integrals {
        let (upright, level) = match self {
            Self::Polygon { .. } | Self::Angle { .. } => (false, false),
            Self::IShape { .. } | Self::Tee { .. } => (true, false),
            Self::Channel { .. } => (false, true),
            Self::Rectangle { .. }
            | Self::Disc { .. }
            | Self::Ring { .. }
            | Self::HollowBox { .. } => (true, true),
        };
        Integrals {
            y: if upright { 0.0 } else { integrals.y },
            z: if level { 0.0 } else { integrals.z },
            iyz: if upright || level { 0.0 } else { integrals.iyz },
            ..integrals
        }
    }
}

/// b h^3/12.
fn cubed(breadth: Length, depth: Length) -> SecondMoment {
    breadth * depth * depth * depth / 12.0
}
