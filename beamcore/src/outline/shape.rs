//! The shapes that outlines of parts have.

use crate::error::{ErrorKind, Problem, Result};
use crate::units::Length;

/// A point of a polygon: y to the right, z up.
pub type Vertex = (Length, Length);

/// The outline of a part, without its place. All corners are sharp.
///
/// An outline has a point by which it is placed: the middle of its bounding box, or the origin of
/// its own coordinates if it is a polygon. Widths are along y (to the right), heights along z (up).
/// An outline may hold sizes that are impossible; [`problems`](Self::problems) tells them.
///
/// # Examples
/// ```
/// use beamcore::outline::angle;
/// use beamcore::units::Number;
/// let outline = angle(100.mm(), 100.mm(), 10.mm());
/// assert!(outline.problems("outline").is_empty());
/// assert!((outline.area().to_mm2() - 1900.0).abs() < 1e-9);
/// // 28.684 mm from the outer faces.
/// assert!((outline.centroid_z().to_mm() + 50.0 - 28.684).abs() < 0.001);
/// ```
#[derive(Clone, Debug, PartialEq)]
#[non_exhaustive]
pub enum Outline {
    /// A rectangle with its sides along y and z.
    Rectangle {
        /// Size along y, across the section.
        width: Length,
        /// Size along z, upright.
        height: Length,
    },
    /// A polygon with any number of polygonal holes. The loops close by themselves, and may be
    /// given in either direction.
    Polygon {
        /// The points of the outer loop, in order.
        points: Vec<Vertex>,
        /// The points of each hole, in order.
        holes: Vec<Vec<Vertex>>,
    },
    /// A full disc: a round bar.
    Disc {
        /// Diameter.
        diameter: Length,
    },
    /// A round tube.
    Ring {
        /// Outer diameter.
        diameter: Length,
        /// Thickness of the wall, less than half the diameter.
        wall_thickness: Length,
    },
    /// Two flanges joined by a web in their middle; symmetric about the upright axis.
    IShape {
        /// Overall height.
        height: Length,
        /// Width of the top flange.
        top_width: Length,
        /// Thickness of the top flange.
        top_thickness: Length,
        /// Width of the bottom flange.
        bottom_width: Length,
        /// Thickness of the bottom flange.
        bottom_thickness: Length,
        /// Thickness of the web.
        web_thickness: Length,
    },
    /// A flange on top of a web in its middle; symmetric about the upright axis.
    Tee {
        /// Overall height.
        height: Length,
        /// Width of the flange.
        width: Length,
        /// Thickness of the flange.
        flange_thickness: Length,
        /// Thickness of the web.
        web_thickness: Length,
    },
    /// A web on the left with two equal flanges to the right; symmetric about the level axis.
    Channel {
        /// Overall height.
        height: Length,
        /// Overall width.
        width: Length,
        /// Thickness of each flange.
        flange_thickness: Length,
        /// Thickness of the web.
        web_thickness: Length,
    },
    /// An upright leg on the left and a level leg at the bottom, of one thickness; the heel is at
    /// the bottom left.
    Angle {
        /// Overall height: length of the upright leg.
        height: Length,
        /// Overall width: length of the level leg.
        width: Length,
        /// Thickness of both legs.
        thickness: Length,
    },
    /// A rectangular tube.
    HollowBox {
        /// Overall width.
        width: Length,
        /// Overall height.
        height: Length,
        /// Thickness of each upright side, less than half the width.
        side_thickness: Length,
        /// Thickness of the top and bottom plate each, less than half the height.
        plate_thickness: Length,
    },
}

/// A rectangle of the given width (along y) and height (along z).
#[must_use]
pub const fn rectangle(width: Length, height: Length) -> Outline {
    Outline::Rectangle { width, height }
}

/// A polygon through the given points (y, z), with holes, in its own coordinates.
///
/// # Examples
/// ```
/// use beamcore::outline::polygon;
/// use beamcore::units::Number;
/// let triangle = polygon(vec![(0.mm(), 0.mm()), (30.mm(), 0.mm()), (0.mm(), 60.mm())], vec![]);
/// assert!((triangle.centroid_y().to_mm() - 10.0).abs() < 1e-12);
/// assert!((triangle.centroid_z().to_mm() - 20.0).abs() < 1e-12);
/// ```
#[must_use]
pub const fn polygon(points: Vec<Vertex>, holes: Vec<Vec<Vertex>>) -> Outline {
    Outline::Polygon { points, holes }
}

impl Outline {
    /// The same polygon with one more hole, given by its corners.
    ///
    /// # Errors
    /// [`ErrorKind::Geometry`] for an outline that is no polygon: only polygons have holes.
    pub fn with_hole(self, hole: Vec<Vertex>) -> Result<Self> {
        match self {
            Self::Polygon { points, mut holes } => {
                holes.push(hole);
                Ok(Self::Polygon { points, holes })
            }
            other => {
                Err(Problem::new(ErrorKind::Geometry, "outline", other.name(), "polygon").into())
            }
        }
    }
}

/// A full disc.
#[must_use]
pub const fn disc(diameter: Length) -> Outline {
    Outline::Disc { diameter }
}

/// A round tube of the given outer diameter.
#[must_use]
pub const fn ring(diameter: Length, wall_thickness: Length) -> Outline {
    Outline::Ring {
        diameter,
        wall_thickness,
    }
}

/// Two flanges joined by a web; `height` is overall.
#[must_use]
pub const fn i_shape(
    height: Length,
    top_width: Length,
    top_thickness: Length,
    bottom_width: Length,
    bottom_thickness: Length,
    web_thickness: Length,
) -> Outline {
    Outline::IShape {
        height,
        top_width,
        top_thickness,
        bottom_width,
        bottom_thickness,
        web_thickness,
    }
}

/// A flange on top of a web; `height` is overall.
#[must_use]
pub const fn tee(
    height: Length,
    width: Length,
    flange_thickness: Length,
    web_thickness: Length,
) -> Outline {
    Outline::Tee {
        height,
        width,
        flange_thickness,
        web_thickness,
    }
}

/// A web on the left with two equal flanges; `height` and `width` are overall.
#[must_use]
pub const fn channel(
    height: Length,
    width: Length,
    flange_thickness: Length,
    web_thickness: Length,
) -> Outline {
    Outline::Channel {
        height,
        width,
        flange_thickness,
        web_thickness,
    }
}

/// Two legs of one thickness with the heel at the bottom left; `height` and `width` are overall.
#[must_use]
pub const fn angle(height: Length, width: Length, thickness: Length) -> Outline {
    Outline::Angle {
        height,
        width,
        thickness,
    }
}

/// A rectangular tube; `width` and `height` are overall.
#[must_use]
pub const fn hollow_box(
    width: Length,
    height: Length,
    side_thickness: Length,
    plate_thickness: Length,
) -> Outline {
    Outline::HollowBox {
        width,
        height,
        side_thickness,
        plate_thickness,
    }
}

impl Outline {
    /// The word used in documents: rectangle, polygon, disc, ring, `i_shape`, tee, channel, angle
    /// or box.
    #[must_use]
    pub const fn name(&self) -> &'static str {
        match self {
            Self::Rectangle { .. } => "rectangle",
            Self::Polygon { .. } => "polygon",
            Self::Disc { .. } => "disc",
            Self::Ring { .. } => "ring",
            Self::IShape { .. } => "i_shape",
            Self::Tee { .. } => "tee",
            Self::Channel { .. } => "channel",
            Self::Angle { .. } => "angle",
            Self::HollowBox { .. } => "box",
        }
    }
}
