//! Whether a point lies in a region.

use super::flank::flanks;
use super::point::Point;
use super::region::Region;

/// Where a point lies.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub enum Location {
    /// In the material.
    Inside,
    /// On an edge.
    Boundary,
    /// Outside of the outer loop, or in a hole.
    Outside,
}

/// Where a point lies: on the boundary if an edge is within `slack` (in m) of it, else inside if
/// the contours wind around it.
///
/// # Examples
/// ```
/// use beamcore::outline::{Location, Point, point_in_region, ring};
/// use beamcore::units::Number;
/// let tube = ring(2.m(), 200.mm()).region();
/// assert_eq!(point_in_region(&tube, Point::new(0.0, 0.9), 1e-9), Location::Inside);
/// assert_eq!(point_in_region(&tube, Point::new(0.0, 1.0), 1e-9), Location::Boundary);
/// assert_eq!(point_in_region(&tube, Point::ORIGIN, 1e-9), Location::Outside);
/// ```
#[must_use]
pub fn point_in_region(region: &Region, point: Point, slack: f64) -> Location {
    if region.edges().any(|edge| edge.distance(point) <= slack) {
        return Location::Boundary;
    }
    // Flanks that a level line from the point to the right crosses. An end counts to the flank
    // above it, so that a line through a vertex is counted once or not at all.
    let winding: i32 = flanks(region)
        .iter()
        .filter(|f| f.lower.z <= point.z && point.z < f.upper.z && f.y(point.z) > point.y)
        .map(|f| if f.rises { 1 } else { -1 })
        .sum();
    if winding > 0 {
        Location::Inside
    } else {
        Location::Outside
    }
}
