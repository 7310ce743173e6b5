//! Heights at which edges cross.

use super::flank::{Circle, Flank};
use super::point::Point;

/// Adds the heights at which two flanks cross.
///
/// Each is a point of the whole lines or circles that lies at a height which both flanks have. One
/// that lies on neither flank does no harm to what the heights are for: they only cut the region
/// into slabs within which the order of the flanks from left to right cannot change.
pub(super) fn heights(a: &Flank, b: &Flank, heights: &mut Vec<f64>) {
    let (bottom, top) = (a.lower.z.max(b.lower.z), a.upper.z.min(b.upper.z));
    if bottom >= top {
        return;
    }
    let found = match (a.circle, b.circle) {
        (None, None) => [line_line(a, b), None],
        (None, Some(circle)) => line_circle(a, circle),
        (Some(circle), None) => line_circle(b, circle),
        (Some(one), Some(other)) => circle_circle(one, other),
    };
    heights.extend(
        found
            .into_iter()
            .flatten()
            .filter(|&z| bottom < z && z < top),
    );
}

/// Where two lines p + t u and q + s v meet: t = (q - p) x v / (u x v). Parallel lines do not.
fn line_line(a: &Flank, b: &Flank) -> Option<f64> {
    let (u, v) = (a.upper - a.lower, b.upper - b.lower);
    let slant = u.cross(v);
    (slant != 0.0).then(|| a.lower.z + (b.lower - a.lower).cross(v) / slant * u.z)
}

/// Where a line meets a circle: half a chord to both sides of the foot of the centre. A line that
/// only touches cuts nothing off and may be missed.
fn line_circle(line: &Flank, circle: Circle) -> [Option<f64>; 2] {
    let way = line.upper - line.lower;
    let way = way * (1.0 / way.norm());
    let to_centre = circle.centre - line.lower;
    let foot = line.lower + way * to_centre.dot(way);
    both_sides(foot, way, circle.radius, to_centre.cross(way))
}

/// Where two circles meet: on the line square to that of the centres, at the distance
/// (d^2 + r1^2 - r2^2)/(2 d) from the first centre. Circles of one centre do not.
fn circle_circle(one: Circle, other: Circle) -> [Option<f64>; 2] {
    let way = other.centre - one.centre;
    let distance = way.norm();
    if distance == 0.0 {
        return [None; 2];
    }
    let way = way * (1.0 / distance);
    let to_chord =
        (distance + (one.radius - other.radius) / distance * (one.radius + other.radius)) / 2.0;
    both_sides(
        one.centre + way * to_chord,
        way.to_the_right(),
        one.radius,
        to_chord,
    )
}

/// The heights half a chord, sqrt(r^2 - offset^2), to both sides of its middle.
fn both_sides(middle: Point, way: Point, radius: f64, offset: f64) -> [Option<f64>; 2] {
    let square = (radius - offset) * (radius + offset);
    if square > 0.0 {
        let rise = way.z * square.sqrt();
        [Some(middle.z - rise), Some(middle.z + rise)]
    } else {
        [None; 2]
    }
}
