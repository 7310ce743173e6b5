//! Whether two regions share a stretch of boundary.

use super::edge::Edge;
use super::region::Region;

/// Whether two regions have a stretch of boundary in common that is longer than `slack` (in m), to
/// within `slack`. A common corner and a round bar on a flat share a point only, which is not
/// enough.
///
/// # Examples
/// ```
/// use beamcore::outline::{Point, disc, rectangle, touches};
/// use beamcore::units::Number;
/// let plate = rectangle(4.m(), 2.m()).region();
/// assert!(touches(&plate, &plate.moved(Point::new(4.0, 1.0)), 1e-9));
/// assert!(!touches(&plate, &plate.moved(Point::new(4.0, 2.0)), 1e-9));
/// assert!(!touches(&plate, &disc(2.m()).region().moved(Point::new(0.0, 2.0)), 1e-9));
/// ```
#[must_use]
pub fn touches(a: &Region, b: &Region, slack: f64) -> bool {
    a.bounds().meets(&b.bounds(), slack)
        && a.edges()
            .any(|one| b.edges().any(|other| share(one, other, slack)))
}

/// The stretches of the boundary of `a` that are also boundary of `b`, to within `slack` (in m), as
/// [`touches`] looks for them.
///
/// # Examples
/// ```
/// use beamcore::outline::{Point, common_boundary, rectangle};
/// use beamcore::units::Number;
/// let plate = rectangle(4.m(), 2.m()).region();
/// let shared = common_boundary(&plate, &plate.moved(Point::new(4.0, 1.0)), 1e-9);
/// assert_eq!(shared.iter().map(|edge| edge.length()).sum::<f64>(), 1.0);
/// ```
#[must_use]
pub fn common_boundary(a: &Region, b: &Region, slack: f64) -> Vec<Edge> {
    if !a.bounds().meets(&b.bounds(), slack) {
        return Vec::new();
    }
    a.edges()
        .flat_map(|one| b.edges().flat_map(|other| shared(one, other, slack)))
        .collect()
}

/// Whether two edges have a stretch in common.
fn share(one: &Edge, other: &Edge, slack: f64) -> bool {
    !shared(one, other, slack).is_empty()
}

/// The stretches of one edge, cut beside the ends of the other, that run along the other: a
/// stretch with both ends and its middle on the other edge lies on it, since two lines or circles
/// that are not the same meet at two points at the most.
fn shared(one: &Edge, other: &Edge, slack: f64) -> Vec<Edge> {
    let mut stretches = vec![*one];
    for end in [other.from(), other.to()] {
        let cut = one.nearest(end);
        stretches = stretches
            .into_iter()
            .flat_map(|stretch| {
                // What a cut this near to an end leaves is too short to count.
                if (cut - stretch.from()).norm() <= slack || (cut - stretch.to()).norm() <= slack {
                    [Some(stretch), None]
                } else {
                    let (first, second) = stretch.split(cut);
                    [Some(first), second]
                }
            })
            .flatten()
            .collect();
    }
    stretches.retain(|stretch| {
        (stretch.to() - stretch.from()).norm() > slack
            && [stretch.from(), stretch.middle(), stretch.to()]
                .into_iter()
                .all(|p| other.distance(p) <= slack)
    });
    stretches
}
