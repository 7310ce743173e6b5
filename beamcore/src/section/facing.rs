//! Where two layers face each other: their distance, the height and the width of the contact.

use super::contact;
use super::placed::PlacedPart;
use crate::outline::{CONTACT, Edge, Point, closest, common_boundary};

/// How two layers face each other, in m.
#[derive(Clone, Copy, Debug, PartialEq)]
pub(super) struct Facing {
    /// The clear distance of the two nearest parts; zero where they touch.
    pub(super) distance: f64,
    /// The height of the middle of the contact or of the gap.
    pub(super) z: f64,
    /// The length of the contact line, or of what faces across the gap, in the section: the
    /// common width of layers on each other, the common height of layers side by side, zero where
    /// round and flat meet in a point.
    pub(super) width: f64,
}

/// A stretch over which two parts face each other.
#[derive(Clone, Copy, Debug)]
struct Stretch {
    length: f64,
    z: f64,
}

/// How two layers of these parts, neither without parts, face each other.
pub(super) fn facing(lower: &[&PlacedPart], upper: &[&PlacedPart]) -> Facing {
    let pairs = || {
        lower
            .iter()
            .flat_map(|a| upper.iter().map(move |b| (*a, *b)))
    };
    let near = pairs().map(|(a, b)| nearest(a, b));
    let (distance, point_z) = near.fold((f64::INFINITY, 0.0), |best, next| {
        if next.0 < best.0 { next } else { best }
    });
    let slack = pairs().map(|(a, b)| slack(a, b)).fold(0.0, f64::max);
    let distance = if distance <= slack { 0.0 } else { distance };
    let stretches: Vec<_> = pairs()
        .flat_map(|(a, b)| stretches(a, b, distance, slack))
        .collect();
    let width: f64 = stretches.iter().map(|stretch| stretch.length).sum();
    let weighted: f64 = stretches
        .iter()
        .map(|stretch| stretch.length * stretch.z)
        .sum();
    Facing {
        distance,
        z: if width > 0.0 {
            weighted / width
        } else {
            point_z
        },
        width,
    }
}

fn slack(a: &PlacedPart, b: &PlacedPart) -> f64 {
    let sizes = [a, b].map(|part| part.outline().width().max(part.outline().height()));
    sizes[0].max(sizes[1]).si() * CONTACT
}

/// Of two parts, the one that is set into the other.
fn insert<'a>(a: &'a PlacedPart, b: &'a PlacedPart) -> Option<&'a PlacedPart> {
    if contact::is_within(a, b) {
        Some(a)
    } else if contact::is_within(b, a) {
        Some(b)
    } else {
        None
    }
}

/// The distance of two parts, and the height half way between the two nearest points.
fn nearest(a: &PlacedPart, b: &PlacedPart) -> (f64, f64) {
    if let Some(insert) = insert(a, b) {
        return (0.0, (insert.bottom() + insert.top()).si() / 2.0);
    }
    let found = closest(&a.region(), &b.region());
    (found.distance, f64::midpoint(found.from.z, found.to.z))
}

/// Where two parts face each other at the distance: of an insert its whole outline.
fn stretches(a: &PlacedPart, b: &PlacedPart, distance: f64, slack: f64) -> Vec<Stretch> {
    let along = |edge: &Edge| Stretch {
        length: edge.length(),
        z: edge.middle().z,
    };
    let (one, other) = (a.region(), b.region());
    match insert(a, b) {
        Some(insert) if distance == 0.0 => insert.region().edges().map(along).collect(),
        Some(_) => Vec::new(),
        None if distance == 0.0 => common_boundary(&one, &other, slack)
            .iter()
            .map(along)
            .collect(),
        None => one
            .edges()
            .flat_map(|edge| {
                other
                    .edges()
                    .filter_map(|e| across(edge, e, distance, slack))
            })
            .collect(),
    }
}

/// What two parallel straight edges at the distance of the gap have of each other.
fn across(one: &Edge, other: &Edge, gap: f64, slack: f64) -> Option<Stretch> {
    let (Edge::Straight { from, to }, Edge::Straight { from: p, to: q }) = (*one, *other) else {
        return None;
    };
    let run = to - from;
    let length = distance(from, to);
    let along = run * (1.0 / length);
    let place = |point: Point| (point.y - from.y) * along.y + (point.z - from.z) * along.z;
    let off = |point: Point| (point.z - from.z) * along.y - (point.y - from.y) * along.z;
    let is_beside = |point: Point| (off(point).abs() - gap).abs() <= slack;
    if !is_beside(p) || !is_beside(q) || (off(p) - off(q)).abs() > slack {
        return None;
    }
    let (first, last) = (place(p).min(place(q)), place(p).max(place(q)));
    let (first, last) = (first.max(0.0), last.min(length));
    (last - first > slack).then(|| {
        let middle = from + along * f64::midpoint(first, last);
        Stretch {
            length: last - first,
            // Half way across the gap, on the upright share of it.
            z: middle.z + off(p) * along.y / 2.0,
        }
    })
}

fn distance(a: Point, b: Point) -> f64 {
    let (dy, dz) = (b.y - a.y, b.z - a.z);
    (dy * dy + dz * dz).sqrt()
}
