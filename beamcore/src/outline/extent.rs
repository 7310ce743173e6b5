//! How far a region reaches, in any direction.

use super::edge::Edge;
use super::point::Point;
use super::region::Region;

/// The smallest upright rectangle around something.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Bounds {
    /// The lower left corner: least y and least z.
    pub least: Point,
    /// The upper right corner: greatest y and greatest z.
    pub greatest: Point,
}

/// The greatest or least value of a y + b z over a region, and where it is taken.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Extreme {
    /// a y + b z at the point.
    pub value: f64,
    /// The point; of several with exactly the same value the leftmost, of these the lowest.
    pub at: Point,
}

impl Bounds {
    pub(super) fn around<'a>(edges: impl IntoIterator<Item = &'a Edge>) -> Self {
        let mut bounds = Self {
            least: Point::new(f64::INFINITY, f64::INFINITY),
            greatest: Point::new(f64::NEG_INFINITY, f64::NEG_INFINITY),
        };
        for edge in edges {
            bounds.include(edge.from());
            bounds.include(edge.to());
            for direction in [
                Point::new(1.0, 0.0),
                Point::new(0.0, 1.0),
                Point::new(-1.0, 0.0),
                Point::new(0.0, -1.0),
            ] {
                if let Some(p) = edge.outermost(direction) {
                    bounds.include(p);
                }
            }
        }
        bounds
    }

    fn include(&mut self, p: Point) {
        self.least = Point::new(self.least.y.min(p.y), self.least.z.min(p.z));
        self.greatest = Point::new(self.greatest.y.max(p.y), self.greatest.z.max(p.z));
    }

    /// Size along y in m.
    #[must_use]
    pub fn width(&self) -> f64 {
        self.greatest.y - self.least.y
    }

    /// Size along z in m.
    #[must_use]
    pub fn height(&self) -> f64 {
        self.greatest.z - self.least.z
    }

    /// The middle.
    #[must_use]
    pub fn middle(&self) -> Point {
        self.least.middle(self.greatest)
    }

    /// The greater of width and height.
    pub(super) fn size(&self) -> f64 {
        self.width().max(self.height())
    }

    /// Whether two rectangles come within `slack` of each other.
    pub(super) fn meets(&self, other: &Self, slack: f64) -> bool {
        self.least.y <= other.greatest.y + slack
            && other.least.y <= self.greatest.y + slack
            && self.least.z <= other.greatest.z + slack
            && other.least.z <= self.greatest.z + slack
    }
}

impl Edge {
    /// The inner point of an arc that lies farthest in a direction given as a unit vector, if that
    /// is an inner point.
    pub(super) fn outermost(&self, direction: Point) -> Option<Point> {
        let Self::Arc { centre, .. } = *self else {
            return None;
        };
        let p = centre + direction * self.radius()?;
        self.passes(p).then_some(p)
    }
}

impl Region {
    /// The bounding box, exact for arcs.
    ///
    /// # Examples
    /// ```
    /// use beamcore::outline::disc;
    /// use beamcore::units::Number;
    /// let bounds = disc(2.m()).region().bounds();
    /// assert_eq!((bounds.width(), bounds.height()), (2.0, 2.0));
    /// ```
    #[must_use]
    pub fn bounds(&self) -> Bounds {
        Bounds::around(self.edges())
    }

    /// The greatest value of a y + b z over the region: it is taken at an end of an edge, or where
    /// the direction (a, b) stands square on an arc.
    ///
    /// # Examples
    /// ```
    /// use beamcore::outline::disc;
    /// use beamcore::units::Number;
    /// let top = disc(2.m()).region().greatest(0.0, 3.0);
    /// assert_eq!((top.value, top.at.y, top.at.z), (3.0, 0.0, 1.0));
    /// ```
    #[must_use]
    pub fn greatest(&self, a: f64, b: f64) -> Extreme {
        let form = Point::new(a, b);
        let norm = form.norm();
        let direction = form * (1.0 / norm);
        let mut best: Option<Extreme> = None;
        for edge in self.edges() {
            let tangent = if norm > 0.0 {
                edge.outermost(direction)
            } else {
                None
            };
            for at in [Some(edge.from()), tangent].into_iter().flatten() {
                let next = Extreme {
                    value: form.dot(at),
                    at,
                };
                if best.is_none_or(|old| next.beats(&old)) {
                    best = Some(next);
                }
            }
        }
        best.unwrap_or(Extreme {
            value: f64::NAN,
            at: Point::new(f64::NAN, f64::NAN),
        })
    }

    /// The least value of a y + b z over the region; see [`greatest`](Self::greatest).
    #[must_use]
    pub fn least(&self, a: f64, b: f64) -> Extreme {
        let found = self.greatest(-a, -b);
        Extreme {
            value: -found.value,
            at: found.at,
        }
    }
}

impl Extreme {
    fn beats(&self, old: &Self) -> bool {
        self.value > old.value
            || self.value == old.value && (self.at.y, self.at.z) < (old.at.y, old.at.z)
    }
}
