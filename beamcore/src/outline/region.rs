//! Regions: an outer loop with holes.

use super::contour::Contour;
use super::edge::{Edge, Turn};
use super::point::Point;

/// The region within an outer loop and outside of its holes.
///
/// The outer loop runs counter-clockwise and the holes clockwise, however they were given, so that
/// the material always lies to the left of an edge.
///
/// # Examples
/// ```
/// use beamcore::outline::{Contour, Point, Region};
/// let bore = Contour::circle(Point::ORIGIN, 0.5);
/// let washer = Region::of(Contour::circle(Point::ORIGIN, 1.0), vec![bore]);
/// assert!((washer.integrals().area - 0.75 * std::f64::consts::PI).abs() < 1e-15);
/// ```
#[derive(Clone, Debug, PartialEq)]
pub struct Region {
    contours: Vec<Contour>,
}

impl Region {
    /// The region within `outer` and outside of `holes`, which lie within `outer` and apart from
    /// each other.
    #[must_use]
    pub fn of(outer: Contour, holes: Vec<Contour>) -> Self {
        let mut contours = vec![outer.turned_to(Turn::CounterClockwise)];
        contours.extend(holes.into_iter().map(|h| h.turned_to(Turn::Clockwise)));
        Self { contours }
    }

    /// The outer loop, then the holes.
    #[must_use]
    pub fn contours(&self) -> &[Contour] {
        &self.contours
    }

    /// All edges, contour by contour.
    pub fn edges(&self) -> impl Iterator<Item = &Edge> {
        self.contours.iter().flat_map(Contour::edges)
    }

    /// The same region at another place.
    #[must_use]
    pub fn moved(&self, by: Point) -> Self {
        Self {
            contours: self.contours.iter().map(|c| c.moved(by)).collect(),
        }
    }
}
