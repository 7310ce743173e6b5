//! Area, centroid and second moments, exact for straight and circular edges.

use super::edge::Edge;
use super::extent::Bounds;
use super::point::Point;
use super::region::Region;

/// What a region integrates to. Lengths in m.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Integrals {
    /// Area A = int dA, in m2.
    pub area: f64,
    /// The y of the centroid, int y dA/A, in m.
    pub y: f64,
    /// The z of the centroid, int z dA/A, in m.
    pub z: f64,
    /// int (z - `z_c`)^2 dA about the horizontal axis through the centroid, in m4.
    pub iyy: f64,
    /// int (y - `y_c`)^2 dA about the upright axis through the centroid, in m4.
    pub izz: f64,
    /// int (y - `y_c`)(z - `z_c`) dA, in m4.
    pub iyz: f64,
    /// Length of all edges, those of holes too, in m.
    pub perimeter: f64,
}

impl Region {
    /// Area, centroid, second moments and perimeter by Green's theorem: each edge gives the
    /// triangle that it spans with a near origin, and an arc its circular segment too.
    ///
    /// First moments are taken about the middle of the bounding box and second moments about the
    /// centroid, so that a region far from the origin keeps its digits. A region without area has
    /// no centroid: its y and z are not numbers.
    ///
    /// Source: Green's theorem, derived at each term below.
    #[must_use]
    pub fn integrals(&self) -> Integrals {
        let middle = self.bounds().middle();
        let first = sums(self.edges(), middle);
        let centroid = middle + Point::new(first.y, first.z) * (1.0 / first.area);
        let second = sums(self.edges(), centroid);
        Integrals {
            area: first.area,
            y: centroid.y,
            z: centroid.z,
            iyy: second.zz,
            izz: second.yy,
            iyz: second.yz,
            perimeter: self.edges().map(Edge::length).sum(),
        }
    }
}

/// The area within a loop, positive if it runs counter-clockwise.
pub(super) fn signed_area(edges: &[Edge]) -> f64 {
    sums(edges.iter(), Bounds::around(edges).middle()).area
}

/// int dA, int y dA, int z dA, int y^2 dA, int z^2 dA and int yz dA about an origin.
#[derive(Default)]
struct Sums {
    area: f64,
    y: f64,
    z: f64,
    yy: f64,
    zz: f64,
    yz: f64,
}

fn sums<'a>(edges: impl Iterator<Item = &'a Edge>, origin: Point) -> Sums {
    let mut sums = Sums::default();
    for edge in edges {
        sums.triangle(edge.from() - origin, edge.to() - origin);
        sums.segment(edge, origin);
    }
    sums
}

impl Sums {
    /// The triangle from the origin to a and b: the integral of a polynomial over a triangle, from
    /// its vertices; negative if it runs clockwise.
    fn triangle(&mut self, a: Point, b: Point) {
        let cross = a.cross(b);
        self.area += cross / 2.0;
        self.y += cross * (a.y + b.y) / 6.0;
        self.z += cross * (a.z + b.z) / 6.0;
        self.yy += cross * (a.y * a.y + a.y * b.y + b.y * b.y) / 12.0;
        self.zz += cross * (a.z * a.z + a.z * b.z + b.z * b.z) / 12.0;
        self.yz += cross * (a.y * (2.0 * a.z + b.z) + b.y * (2.0 * b.z + a.z)) / 24.0;
    }

    /// The circular segment of an arc, if the edge is one: its moments about the middle m of the
    /// chord, turned into y and z and moved from m to the origin.
    fn segment(&mut self, edge: &Edge, origin: Point) {
        let Some(bow) = edge.bow() else { return };
        let s = bow.segment.moments();
        let (m, n, t) = (bow.middle - origin, bow.outward, bow.along);
        let product = |mp: f64, np: f64, tp: f64, mq: f64, nq: f64, tq: f64| {
            s.area * mp * mq + s.n * (mp * nq + np * mq) + s.nn * np * nq + s.tt * tp * tq
        };
        self.area += bow.sign * s.area;
        self.y += bow.sign * (s.area * m.y + s.n * n.y);
        self.z += bow.sign * (s.area * m.z + s.n * n.z);
        self.yy += bow.sign * product(m.y, n.y, t.y, m.y, n.y, t.y);
        self.zz += bow.sign * product(m.z, n.z, t.z, m.z, n.z, t.z);
        self.yz += bow.sign * product(m.y, n.y, t.y, m.z, n.z, t.z);
    }
}
