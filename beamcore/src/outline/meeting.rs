//! Whether straight edges meet.

use super::edge::Edge;
use super::extent::Bounds;

/// Whether two straight edges cross, or come within `slack` (in m) of each other.
pub(super) fn meet(a: &Edge, b: &Edge, slack: f64) -> bool {
    if !Bounds::around([a]).meets(&Bounds::around([b]), slack) {
        return false;
    }
    // Edges that do not cross are nearest to each other at an end of one of them.
    cross(a, b)
        || [b.from(), b.to()].iter().any(|&p| a.distance(p) <= slack)
        || [a.from(), a.to()].iter().any(|&p| b.distance(p) <= slack)
}

/// Whether each of two straight edges has its ends on both sides of the other.
fn cross(a: &Edge, b: &Edge) -> bool {
    let parts = |one: &Edge, other: &Edge| {
        let way = one.to() - one.from();
        let side = |p| way.cross(p - one.from());
        side(other.from()) * side(other.to()) < 0.0
    };
    parts(a, b) && parts(b, a)
}
