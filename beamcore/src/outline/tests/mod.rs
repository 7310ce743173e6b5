//! Checks of the room against values from outside of it, and its laws.

mod arcs;
mod degenerate;
mod exact;
mod extents;
mod laws;
mod overlaps;
mod polygons;
mod shapes;

use super::*;
use crate::units::Length;

/// Asserts that two numbers differ by no more than `tolerance` of `peak`.
#[track_caller]
fn close(found: f64, expected: f64, peak: f64, tolerance: f64) {
    assert!(
        (found - expected).abs() <= tolerance * peak.abs(),
        "found {found:?}, expected {expected:?}"
    );
}

/// Asserts that two results of [`Region::integrals`] are the same, centroids relative to `size`.
#[track_caller]
fn same(found: &Integrals, expected: &Integrals, size: f64, tolerance: f64) {
    let polar = expected.iyy + expected.izz;
    close(found.area, expected.area, expected.area, tolerance);
    close(found.y, expected.y, size, tolerance);
    close(found.z, expected.z, size, tolerance);
    close(found.iyy, expected.iyy, polar, tolerance);
    close(found.izz, expected.izz, polar, tolerance);
    close(found.iyz, expected.iyz, polar, tolerance);
    close(found.perimeter, expected.perimeter, size, tolerance);
}

/// A region of straight edges; coordinates in m.
fn region(points: &[(f64, f64)]) -> Region {
    Region::of(loop_of(points), vec![])
}

fn loop_of(points: &[(f64, f64)]) -> Contour {
    let points: Vec<_> = points.iter().map(|&(y, z)| Point::new(y, z)).collect();
    Contour::through(&points)
}

/// An upright rectangle from its lower left to its upper right corner.
fn upright(left: f64, bottom: f64, right: f64, top: f64) -> Region {
    region(&[(left, bottom), (right, bottom), (right, top), (left, top)])
}

fn round(y: f64, z: f64, radius: f64) -> Region {
    Region::of(Contour::circle(Point::new(y, z), radius), vec![])
}

/// The region with every point moved by `f`; `turn` tells whether `f` keeps the way round.
fn mapped(region: &Region, f: impl Fn(Point) -> Point, keeps: bool) -> Region {
    let edge = |edge: &Edge| match *edge {
        Edge::Straight { from, to } => Edge::Straight {
            from: f(from),
            to: f(to),
        },
        Edge::Arc {
            from,
            to,
            centre,
            turn,
        } => Edge::Arc {
            from: f(from),
            to: f(to),
            centre: f(centre),
            turn: if keeps { turn } else { turn.reversed() },
        },
    };
    let mut contours = region
        .contours()
        .iter()
        .map(|c| Contour::closed(c.edges().iter().map(edge).collect()).unwrap());
    let outer = contours.next().unwrap();
    Region::of(outer, contours.collect())
}

/// The region turned counter-clockwise about the origin.
fn rotated(region: &Region, angle: f64) -> Region {
    let (sin, cos) = (libm::sin(angle), libm::cos(angle));
    let turn = |p: Point| Point::new(cos * p.y - sin * p.z, sin * p.y + cos * p.z);
    mapped(region, turn, true)
}

/// The region with left and right exchanged.
fn mirrored(region: &Region) -> Region {
    mapped(region, |p| Point::new(-p.y, p.z), false)
}

fn mm(points: &[(f64, f64)]) -> Vec<(Length, Length)> {
    points
        .iter()
        .map(|&(y, z)| (Length::from_mm(y), Length::from_mm(z)))
        .collect()
}
