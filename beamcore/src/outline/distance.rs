//! How far two regions are apart.

use super::edge::Edge;
use super::point::Point;
use super::region::Region;

/// A point of one region and a point of another that are nearest to each other, with their
/// distance in m.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Closest {
    /// The distance.
    pub distance: f64,
    /// The point of the first region.
    pub from: Point,
    /// The point of the second region.
    pub to: Point,
}

/// The nearest points of the boundaries of two regions that do not overlap; of several pairs the
/// one found first along the boundary of `a`.
///
/// The least distance of two edges lies at an end of one of them, or, where one is an arc, on the
/// line from its centre square to the other.
///
/// # Examples
/// ```
/// use beamcore::outline::{Point, closest, disc, rectangle};
/// use beamcore::units::Number;
/// let plate = rectangle(4.m(), 2.m()).region();
/// let bar = disc(2.m()).region().moved(Point::new(1.0, 2.5));
/// let found = closest(&plate, &bar);
/// assert_eq!((found.distance, found.from, found.to), (0.5, Point::new(1.0, 1.0), Point::new(1.0, 1.5)));
/// ```
#[must_use]
pub fn closest(a: &Region, b: &Region) -> Closest {
    let mut best = Closest {
        distance: f64::INFINITY,
        from: Point::ORIGIN,
        to: Point::ORIGIN,
    };
    for one in a.edges() {
        for other in b.edges() {
            for p in feet(one, other) {
                consider(&mut best, one.nearest(p), p);
            }
            for p in feet(other, one) {
                consider(&mut best, p, other.nearest(p));
            }
        }
    }
    best
}

fn consider(best: &mut Closest, from: Point, to: Point) {
    let distance = (to - from).norm();
    if distance < best.distance {
        *best = Closest { distance, from, to };
    }
}

/// Points of `other` where it may be nearest to `one`: its ends, and the foot of the line from the
/// centre of `one`.
fn feet(one: &Edge, other: &Edge) -> impl Iterator<Item = Point> {
    let foot = match *one {
        Edge::Straight { .. } => None,
        Edge::Arc { centre, .. } => Some(other.nearest(centre)),
    };
    [Some(other.from()), Some(other.to()), foot]
        .into_iter()
        .flatten()
}

#[cfg(test)]
mod tests {
    use super::super::{disc, rectangle, ring};
    use super::*;
    use crate::units::Number;

    #[test]
    fn distances_by_hand() {
        let at = |region: Region, y: f64, z: f64| region.moved(Point::new(y, z));
        let square = || rectangle(2.m(), 2.m()).region();
        // Corner to corner: 3 across and 4 up.
        assert_eq!(closest(&square(), &at(square(), 5.0, 6.0)).distance, 5.0);
        assert_eq!(closest(&square(), &at(square(), 2.0, 1.0)).distance, 0.0);
        // Circles of radius 1, centres 5 apart.
        let round = || disc(2.m()).region();
        assert!((closest(&round(), &at(round(), 3.0, 4.0)).distance - 3.0).abs() < 1e-15);
        // A bar of radius 1 in a ring of inner radius 4, 2 off its middle.
        let tube = ring(10.m(), 1.m()).region();
        assert!((closest(&tube, &at(round(), 2.0, 0.0)).distance - 1.0).abs() < 1e-15);
        assert!((closest(&at(round(), 0.0, -2.0), &tube).distance - 1.0).abs() < 1e-15);
    }
}
