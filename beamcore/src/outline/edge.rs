//! Straight and circular edges.

use super::point::Point;
use super::segment::Segment;

/// The way round of an arc, as seen in the drawing.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub enum Turn {
    /// From y towards z.
    CounterClockwise,
    /// From z towards y.
    Clockwise,
}

impl Turn {
    /// The other way round.
    #[must_use]
    pub const fn reversed(self) -> Self {
        match self {
            Self::CounterClockwise => Self::Clockwise,
            Self::Clockwise => Self::CounterClockwise,
        }
    }

    /// 1 counter-clockwise, -1 clockwise.
    pub(super) const fn sign(self) -> f64 {
        match self {
            Self::CounterClockwise => 1.0,
            Self::Clockwise => -1.0,
        }
    }
}

/// One edge of a contour, with a direction. The material lies to its left.
#[derive(Clone, Copy, Debug, PartialEq)]
pub enum Edge {
    /// A straight edge.
    Straight {
        /// Where it begins.
        from: Point,
        /// Where it ends.
        to: Point,
    },
    /// A circular edge of less than a full turn; a full circle is two half circles.
    Arc {
        /// Where it begins.
        from: Point,
        /// Where it ends.
        to: Point,
        /// The centre, as far from one end as from the other.
        centre: Point,
        /// The way round.
        turn: Turn,
    },
}

/// An arc seen from its chord.
#[derive(Clone, Copy, Debug)]
pub(super) struct Bow {
    pub segment: Segment,
    /// The middle of the chord.
    pub middle: Point,
    /// Unit vector along the chord.
    pub along: Point,
    /// Unit vector across the chord, towards the arc.
    pub outward: Point,
    /// 1 if the circular segment adds to what the chord bounds, -1 if it is cut off.
    pub sign: f64,
}

impl Edge {
    /// Where the edge begins.
    #[must_use]
    pub const fn from(&self) -> Point {
        let (Self::Straight { from, .. } | Self::Arc { from, .. }) = *self;
        from
    }

    /// Where the edge ends.
    #[must_use]
    pub const fn to(&self) -> Point {
        let (Self::Straight { to, .. } | Self::Arc { to, .. }) = *self;
        to
    }

    /// The length in m: of an arc r times its angle.
    #[must_use]
    pub fn length(&self) -> f64 {
        match self.bow() {
            None => (self.to() - self.from()).norm(),
            Some(bow) => bow.segment.arc_length(),
        }
    }

    /// The radius of an arc in m.
    #[must_use]
    pub fn radius(&self) -> Option<f64> {
        self.bow().map(|bow| bow.segment.radius())
    }

    /// The point half way along the edge.
    #[must_use]
    pub fn middle(&self) -> Point {
        match self.bow() {
            None => self.from().middle(self.to()),
            Some(bow) => bow.middle + bow.outward * bow.segment.rise(),
        }
    }

    /// The same edge in the other direction.
    #[must_use]
    pub const fn reversed(self) -> Self {
        match self {
            Self::Straight { from, to } => Self::Straight { from: to, to: from },
            Self::Arc {
                from,
                to,
                centre,
                turn,
            } => Self::Arc {
                from: to,
                to: from,
                centre,
                turn: turn.reversed(),
            },
        }
    }

    /// The same edge at another place.
    #[must_use]
    pub fn moved(self, by: Point) -> Self {
        match self {
            Self::Straight { from, to } => Self::Straight {
                from: from + by,
                to: to + by,
            },
            Self::Arc {
                from,
                to,
                centre,
                turn,
            } => Self::Arc {
                from: from + by,
                to: to + by,
                centre: centre + by,
                turn,
            },
        }
    }

    /// The point of the edge that is nearest to `p`.
    pub(super) fn nearest(&self, p: Point) -> Point {
        match *self {
            Self::Straight { from, to } => {
                let way = to - from;
                let share = (p - from).dot(way) / way.dot(way);
                if share <= 0.0 {
                    from
                } else if share >= 1.0 {
                    to
                } else {
                    from + way * share
                }
            }
            Self::Arc { from, to, .. } => {
                let foot = self.beneath(p).unwrap_or(from);
                if self.passes(foot) {
                    foot
                } else if (p - from).norm() <= (p - to).norm() {
                    from
                } else {
                    to
                }
            }
        }
    }

    /// The distance of a point from the edge.
    pub(super) fn distance(&self, p: Point) -> f64 {
        (p - self.nearest(p)).norm()
    }

    /// The point of the whole circle of an arc that lies in the direction of `p`.
    fn beneath(&self, p: Point) -> Option<Point> {
        let Self::Arc { centre, .. } = *self else {
            return None;
        };
        let way = p - centre;
        let distance = way.norm();
        (distance > 0.0).then_some(centre + way * (self.radius()? / distance))
    }

    /// Whether a point of the whole circle lies between the ends of the arc.
    ///
    /// The arc lies on one side of its chord and the rest of the circle on the other, whatever
    /// its angle, so that no angle is needed.
    pub(super) fn passes(&self, p: Point) -> bool {
        match *self {
            Self::Straight { .. } => false,
            Self::Arc { from, to, turn, .. } => turn.sign() * (to - from).cross(p - from) < 0.0,
        }
    }

    /// The edge up to a point of it and from there on, or the whole edge if the point is no inner
    /// point of it.
    pub(super) fn split(self, at: Point) -> (Self, Option<Self>) {
        match self {
            Self::Straight { from, to } => {
                let (way, part) = (to - from, at - from);
                let along = part.dot(way);
                if 0.0 < along && along < way.dot(way) {
                    (
                        Self::Straight { from, to: at },
                        Some(Self::Straight { from: at, to }),
                    )
                } else {
                    (self, None)
                }
            }
            Self::Arc {
                from,
                to,
                centre,
                turn,
            } if self.passes(at) => {
                let arc = |from, to| Self::Arc {
                    from,
                    to,
                    centre,
                    turn,
                };
                (arc(from, at), Some(arc(at, to)))
            }
            Self::Arc { .. } => (self, None),
        }
    }

    /// An arc seen from its chord; `None` for a straight edge.
    pub(super) fn bow(&self) -> Option<Bow> {
        let Self::Arc {
            from,
            to,
            centre,
            turn,
        } = *self
        else {
            return None;
        };
        let chord = to - from;
        let length = chord.norm();
        let along = chord * (1.0 / length);
        // A counter-clockwise arc bulges to the right of its chord, seen from where it begins.
        let outward = along.to_the_right() * turn.sign();
        let middle = from.middle(to);
        Some(Bow {
            segment: Segment::new(0.5 * length, (middle - centre).dot(outward)),
            middle,
            along,
            outward,
            sign: turn.sign(),
        })
    }
}
