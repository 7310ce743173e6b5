//! Flanks: edges cut so that each rises or falls steadily and is a function y(z).

use super::edge::Edge;
use super::point::Point;
use super::region::Region;
use super::segment::Segment;

/// A stretch of an edge along which z only rises or only falls.
#[derive(Clone, Copy, Debug)]
pub(super) struct Flank {
    /// Its lower end.
    pub lower: Point,
    /// Its upper end.
    pub upper: Point,
    /// Whether the edge runs upward; the material then lies at smaller y.
    pub rises: bool,
    /// The circle, if the edge is an arc.
    pub circle: Option<Circle>,
}

/// The right or left half of a circle.
#[derive(Clone, Copy, Debug)]
pub(super) struct Circle {
    pub centre: Point,
    pub radius: f64,
    /// 1 for the right half, -1 for the left.
    side: f64,
}

/// All flanks of a region; level edges are none.
pub(super) fn flanks(region: &Region) -> Vec<Flank> {
    let mut flanks = Vec::new();
    for edge in region.edges() {
        // Two stretches that join get the same point, so that their heights join exactly.
        let mut from = edge.from();
        for to in turning_points(edge)
            .into_iter()
            .flatten()
            .chain([edge.to()])
        {
            flanks.extend(Flank::of(edge, from, to));
            from = to;
        }
    }
    flanks
}

/// The top and bottom of the circle of an arc, where it passes them, in its direction.
fn turning_points(edge: &Edge) -> [Option<Point>; 2] {
    let Edge::Arc {
        from, centre, turn, ..
    } = *edge
    else {
        return [None; 2];
    };
    let up = Point::new(0.0, 1.0);
    let (top, bottom) = (edge.outermost(up), edge.outermost(up * -1.0));
    let way = (from - centre) * turn.sign();
    // A counter-clockwise arc comes to the top first if it begins on the right. One that begins at
    // the top or bottom itself, but for a rounding, comes to that first.
    let top_first = if way.y == 0.0 {
        from.z > centre.z
    } else {
        way.y > 0.0
    };
    if top_first {
        [top, bottom]
    } else {
        [bottom, top]
    }
}

impl Flank {
    fn of(edge: &Edge, from: Point, to: Point) -> Option<Self> {
        let (rises, falls) = (from.z < to.z, to.z < from.z);
        if !rises && !falls {
            return None;
        }
        let (lower, upper) = if rises { (from, to) } else { (to, from) };
        let circle = match (*edge, edge.radius()) {
            (Edge::Arc { centre, turn, .. }, Some(radius)) => Some(Circle {
                centre,
                radius,
                // The right half rises counter-clockwise.
                side: if rises { turn.sign() } else { -turn.sign() },
            }),
            _ => None,
        };
        Some(Self {
            lower,
            upper,
            rises,
            circle,
        })
    }

    /// Whether the flank has a point at every height from `below` to `above`.
    pub fn spans(&self, below: f64, above: f64) -> bool {
        self.lower.z <= below && above <= self.upper.z
    }

    /// The y at a height between its ends.
    pub fn y(&self, z: f64) -> f64 {
        match self.circle {
            None => {
                let share = (z - self.lower.z) / (self.upper.z - self.lower.z);
                self.lower.y + share * (self.upper.y - self.lower.y)
            }
            Some(Circle {
                centre,
                radius,
                side,
            }) => {
                let dz = z - centre.z;
                // An end of the arc may lie past the top of the circle by a rounding.
                centre.y + side * ((radius - dz) * (radius + dz)).max(0.0).sqrt()
            }
        }
    }

    /// int y dz between two heights: the chord's mean y times the height, with the circular segment
    /// on the outer side of an arc.
    pub fn area_to_the_left(&self, below: f64, above: f64) -> f64 {
        let (low, high) = (self.y(below), self.y(above));
        let height = above - below;
        let chord = (low + high) / 2.0 * height;
        match self.circle {
            None => chord,
            Some(Circle { radius, side, .. }) => {
                let half = Point::new(high - low, height).norm() / 2.0;
                // Half a circle at the most, so the chord never passes beyond the centre.
                let offset = ((radius - half) * (radius + half)).max(0.0).sqrt();
                chord + side * Segment::new(half, offset).moments().area
            }
        }
    }
}
