//! Outlines of parts: straight and circular edges, exact integrals, exact overlap.
//!
//! An [`Outline`] is a shape with sizes. Its [`Region`] is a list of closed [`Contour`]s of
//! [`Edge`]s in plain metres, from which follow area, centroid and second moments
//! ([`Region::integrals`]), how far it reaches ([`Region::bounds`], [`Region::greatest`]), and how
//! it lies to others ([`overlap_area`], [`contains`], [`touches`], [`point_in_region`]).
//!
//! Coordinates: y to the right, z up, in a drawing that is seen against the direction of x.
//!
//! # Examples
//! ```
//! use beamcore::outline::{Point, disc, overlap_area, tee, touches};
//! use beamcore::units::Number;
//! let stem = tee(200.mm(), 150.mm(), 20.mm(), 12.mm());
//! assert!((stem.area().to_mm2() - (150.0 * 20.0 + 180.0 * 12.0)).abs() < 1e-9);
//! // A bar of 40 mm that lies on the flange touches it at one point.
//! let bar = disc(40.mm()).region().moved(Point::new(0.0, 0.1 + 0.02));
//! assert!(overlap_area(&stem.region(), &bar) < 1e-15);
//! assert!(!touches(&stem.region(), &bar, 1e-9));
//! ```

mod between;
mod contact;
mod contour;
mod contour_problems;
mod crossing;
mod distance;
mod edge;
mod extent;
mod flank;
mod inside;
mod integrals;
mod meeting;
mod mirror;
mod overlap;
mod point;
mod polygon_problems;
mod region;
mod segment;
mod shape;
mod shape_problems;
mod shape_region;
mod shape_values;
#[cfg(test)]
mod tests;

pub use contact::{common_boundary, touches};
pub use contour::Contour;
pub use distance::{Closest, closest};
pub use edge::{Edge, Turn};
pub use extent::{Bounds, Extreme};
pub use inside::{Location, point_in_region};
pub use integrals::Integrals;
pub use overlap::{contains, overlap_area};
pub use point::Point;
pub use region::Region;
pub use shape::{
    Outline, Vertex, angle, channel, disc, hollow_box, i_shape, polygon, rectangle, ring, tee,
};

/// Share of a size below which two places are one, and share of an area below which two regions
/// only touch.
pub const CONTACT: f64 = 1e-9;
