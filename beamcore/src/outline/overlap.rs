//! The common area of two regions.
//!
//! Both regions are cut into slabs at every height where an edge begins, ends, is at its highest
//! or lowest, or crosses an edge of the other region. Within a slab the edges stand in one order
//! from left to right, and what lies between two of them is integrated in closed form. Edges that
//! coincide have nothing between them, in whichever order they are taken; so regions that are
//! identical, touch, share corners or are tangent need no rule of their own, and a crossing that
//! is misplaced by a rounding changes the area by the square of that rounding.

use super::CONTACT;
use super::crossing;
use super::flank::{Flank, flanks};
use super::point::Point;
use super::region::Region;

/// The area in m2 that two regions have in common. Regions that only touch have none, up to
/// roundings far below [`CONTACT`] of the smaller.
///
/// # Examples
/// ```
/// use beamcore::outline::{Point, overlap_area, rectangle};
/// use beamcore::units::Number;
/// let plate = rectangle(4.m(), 2.m()).region();
/// assert_eq!(overlap_area(&plate, &plate.moved(Point::new(3.0, 1.0))), 1.0);
/// assert_eq!(overlap_area(&plate, &plate.moved(Point::new(4.0, 0.0))), 0.0);
/// ```
#[must_use]
pub fn overlap_area(a: &Region, b: &Region) -> f64 {
    let (around_a, around_b) = (a.bounds(), b.bounds());
    if !around_a.meets(&around_b, 0.0) {
        return 0.0;
    }
    // Near the origin, so that regions far from it lose no digits in products.
    let to_origin = Point::ORIGIN - around_a.middle();
    let (a, b) = (flanks(&a.moved(to_origin)), flanks(&b.moved(to_origin)));
    let sum: f64 = heights(&a, &b)
        .windows(2)
        .map(|slab| common(&a, &b, slab[0], slab[1]))
        .sum();
    // Roundings of what only touches may sum to less than nothing.
    sum.max(0.0)
}

/// Whether `insert` lies within `host`: no more than [`CONTACT`] of its area lies outside.
///
/// # Examples
/// ```
/// use beamcore::outline::{contains, disc, rectangle};
/// use beamcore::units::Number;
/// let host = rectangle(100.mm(), 200.mm()).region();
/// assert!(contains(&host, &disc(100.mm()).region()));
/// assert!(!contains(&host, &disc(101.mm()).region()));
/// ```
#[must_use]
pub fn contains(host: &Region, insert: &Region) -> bool {
    let area = insert.integrals().area;
    area - overlap_area(host, insert) <= CONTACT * area
}

fn heights(a: &[Flank], b: &[Flank]) -> Vec<f64> {
    let mut heights: Vec<f64> = a
        .iter()
        .chain(b)
        .flat_map(|flank| [flank.lower.z, flank.upper.z])
        .collect();
    for one in a {
        for other in b {
            crossing::heights(one, other, &mut heights);
        }
    }
    heights.sort_by(f64::total_cmp);
    heights.dedup();
    heights
}

/// The common area within one slab, walked from left to right.
fn common(a: &[Flank], b: &[Flank], below: f64, above: f64) -> f64 {
    let middle = below.midpoint(above);
    let mut order: Vec<(f64, usize, &Flank)> = [a, b]
        .iter()
        .enumerate()
        .flat_map(|(owner, flanks)| flanks.iter().map(move |flank| (owner, flank)))
        .filter(|(_, flank)| flank.spans(below, above))
        .map(|(owner, flank)| (flank.y(middle), owner, flank))
        .collect();
    order.sort_by(|one, other| one.0.total_cmp(&other.0));
    // How many times the walk is inside each region, and the flank where it entered both.
    let (mut inside, mut entry) = ([0_i32; 2], None::<&Flank>);
    let mut area = 0.0;
    for (_, owner, flank) in order {
        inside[owner] += if flank.rises { -1 } else { 1 };
        match entry {
            None if inside.iter().all(|&times| times > 0) => entry = Some(flank),
            Some(left) if inside[owner] <= 0 => {
                area += flank.area_to_the_left(below, above) - left.area_to_the_left(below, above);
                entry = None;
            }
            _ => {}
        }
    }
    area
}
