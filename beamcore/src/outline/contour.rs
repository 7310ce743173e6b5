//! Closed loops of edges.

use super::edge::{Edge, Turn};
use super::point::Point;
use super::{contour_problems, integrals};
use crate::error::{Error, Result};

/// A closed loop of straight and circular edges.
///
/// # Examples
/// ```
/// use beamcore::outline::{Contour, Edge, Point, Turn};
/// // A quarter of a disc of radius 2 m.
/// let (heel, right, top) = (Point::ORIGIN, Point::new(2.0, 0.0), Point::new(0.0, 2.0));
/// let quarter = Contour::closed(vec![
///     Edge::Straight { from: heel, to: right },
///     Edge::Arc { from: right, to: top, centre: heel, turn: Turn::CounterClockwise },
///     Edge::Straight { from: top, to: heel },
/// ])?;
/// assert!((quarter.signed_area() - std::f64::consts::PI).abs() < 1e-15);
/// # Ok::<(), beamcore::Error>(())
/// ```
#[derive(Clone, Debug, PartialEq)]
pub struct Contour {
    edges: Vec<Edge>,
}

impl Contour {
    /// A loop of the given edges, each of which begins exactly where the one before ends.
    ///
    /// # Errors
    /// [`ErrorKind::Geometry`](crate::ErrorKind::Geometry), under the path `edges[i]`, i counted
    /// from 0: a loop of fewer than two edges, an edge that does not begin where the one before
    /// ends, an edge without length (below 1e-9 of the loop's size), an arc whose centre is not as
    /// far from one end as from the other (to 1e-9 of the radius).
    /// [`ErrorKind::Value`](crate::ErrorKind::Value): a coordinate that is not finite.
    pub fn closed(edges: Vec<Edge>) -> Result<Self> {
        Error::check(contour_problems::problems(&edges))?;
        Ok(Self { edges })
    }

    /// A full circle, counter-clockwise, as two half circles; centre and radius in m.
    #[must_use]
    pub fn circle(centre: Point, radius: f64) -> Self {
        let (right, left) = (
            Point::new(centre.y + radius, centre.z),
            Point::new(centre.y - radius, centre.z),
        );
        let half = |from, to| Edge::Arc {
            from,
            to,
            centre,
            turn: Turn::CounterClockwise,
        };
        Self {
            edges: vec![half(right, left), half(left, right)],
        }
    }

    /// A loop of edges that are known to close.
    pub(super) const fn of(edges: Vec<Edge>) -> Self {
        Self { edges }
    }

    /// The loop of straight edges through the points; a point equal to the one before it is passed
    /// over. What is no polygon is left to the checks of the caller.
    pub(super) fn through(points: &[Point]) -> Self {
        let next = points.iter().cycle().skip(1);
        Self {
            edges: points
                .iter()
                .zip(next)
                .filter(|(from, to)| from != to)
                .map(|(&from, &to)| Edge::Straight { from, to })
                .collect(),
        }
    }

    /// The corners in order; along an arc, points so close that a chord spans at most 12 degrees.
    #[must_use]
    pub fn corners(&self) -> Vec<Point> {
        fn walk(edge: &Edge, halvings: u32, corners: &mut Vec<Point>) {
            match edge.split(edge.middle()) {
                (first, Some(second)) if halvings > 0 => {
                    walk(&first, halvings - 1, corners);
                    walk(&second, halvings - 1, corners);
                }
                _ => corners.push(edge.from()),
            }
        }
        let mut corners = Vec::new();
        for edge in &self.edges {
            // Five halvings leave less than 12 degrees of the longest arc.
            let halvings = if edge.radius().is_some() { 5 } else { 0 };
            walk(edge, halvings, &mut corners);
        }
        corners
    }

    /// The edges in order.
    #[must_use]
    pub fn edges(&self) -> &[Edge] {
        &self.edges
    }

    /// The area in m2 within the loop: positive if it runs counter-clockwise, else negative.
    #[must_use]
    pub fn signed_area(&self) -> f64 {
        integrals::signed_area(&self.edges)
    }

    /// The same loop in the other direction.
    #[must_use]
    pub fn reversed(&self) -> Self {
        Self {
            edges: self.edges.iter().rev().map(|e| e.reversed()).collect(),
        }
    }

    /// The same loop at another place.
    #[must_use]
    pub fn moved(&self, by: Point) -> Self {
        Self {
            edges: self.edges.iter().map(|e| e.moved(by)).collect(),
        }
    }

    /// The same loop, counter-clockwise or clockwise.
    pub(super) fn turned_to(self, turn: Turn) -> Self {
        if turn.sign() * self.signed_area() < 0.0 {
            self.reversed()
        } else {
            self
        }
    }
}
