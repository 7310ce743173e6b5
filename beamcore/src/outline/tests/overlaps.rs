//! Common areas and contact of particular regions.

use super::*;
use crate::units::Number;
use std::f64::consts::PI;

/// Lens of two circles of radius r at the distance d: 2 r^2 acos(d/(2 r)) - d/2 sqrt(4 r^2 - d^2).
/// Source: plane geometry, two circular segments.
#[test]
fn circles_overlap_in_a_lens() {
    let r = 0.7;
    for (y, z) in [(0.7, 0.0), (0.0, 0.7), (0.3, -0.4), (0.9, 0.9), (-1.2, 0.1)] {
        let d = libm::sqrt(y * y + z * z);
        let lens =
            2.0 * r * r * libm::acos(d / (2.0 * r)) - d / 2.0 * libm::sqrt(4.0 * r * r - d * d);
        let found = overlap_area(&round(0.0, 0.0, r), &round(y, z, r));
        close(found, lens, PI * r * r, 1e-14);
    }
    // Two circles of radius 1 through each other's centres: 2 pi/3 - sqrt(3)/2.
    let found = overlap_area(&round(5.0, 0.0, 1.0), &round(5.0, 1.0, 1.0));
    close(found, 2.0 * PI / 3.0 - 0.75_f64.sqrt(), 1.0, 1e-14);
}

#[test]
fn a_rectangle_covers_a_quarter_of_a_disc() {
    let quarter = overlap_area(&upright(1.0, 2.0, 9.0, 9.0), &round(1.0, 2.0, 3.0));
    close(quarter, 9.0 * PI / 4.0, quarter, 1e-15);
    // Half of a disc, with the edge through its centre at a slant.
    let half_plane = rotated(&upright(-50.0, 0.0, 50.0, 50.0), 0.6);
    let half = overlap_area(&round(0.0, 0.0, 2.0), &half_plane);
    close(half, 2.0 * PI, half, 1e-14);
}

#[test]
fn identical_and_nested_regions() {
    let shapes = [
        tee(0.2.m(), 0.15.m(), 0.02.m(), 0.01.m()).region(),
        ring(0.2.m(), 0.01.m()).region(),
        rotated(
            &channel(0.3.m(), 0.1.m(), 0.015.m(), 0.01.m()).region(),
            0.3,
        ),
        rotated(&ring(0.2.m(), 0.01.m()).region(), 0.3),
    ];
    for shape in &shapes {
        let area = shape.integrals().area;
        close(overlap_area(shape, shape), area, area, 1e-14);
        assert!(contains(shape, shape));
        assert!(touches(shape, shape, 1e-12));
        let host = round(0.0, 0.0, 1.0);
        close(overlap_area(&host, shape), area, area, 1e-13);
        assert!(contains(&host, shape) && !contains(shape, &host));
        assert!(!touches(&host, shape, 1e-12));
    }
}

/// A core in a tube, and the tube's wall beside it.
#[test]
fn a_core_fills_a_tube_without_overlap() {
    for angle in [0.0, 0.4] {
        let tube = rotated(&ring(200.mm(), 10.mm()).region(), angle);
        let core = disc(180.mm()).region();
        assert!(overlap_area(&tube, &core) <= 1e-14 * core.integrals().area);
        assert!(touches(&tube, &core, 1e-12));
        assert!(!contains(&tube, &core));
        // A core of 182 mm bites 1 mm into the wall.
        let bite = overlap_area(&tube, &disc(182.mm()).region());
        let expected = PI / 4.0 * (0.182 * 0.182 - 0.18 * 0.18);
        close(bite, expected, expected, 1e-12);
    }
}

/// Regions that touch, each pair turned to several slants: along an edge, with corners on edges,
/// at a corner only, a round bar on a flat, in a corner and on a round bar.
#[test]
fn touching_is_no_overlap() {
    let plate = upright(0.0, 0.0, 0.3, 0.02);
    let bar = 0.035;
    let pairs = [
        (plate.clone(), upright(0.0, 0.02, 0.3, 0.1), true),
        (plate.clone(), upright(0.1, 0.02, 0.2, 0.5), true),
        (plate.clone(), upright(0.3, -0.1, 0.31, 0.01), true),
        (plate.clone(), upright(0.3, 0.02, 0.4, 0.1), false),
        (
            plate.clone(),
            region(&[(0.15, 0.02), (0.2, 0.08), (0.1, 0.08)]),
            false,
        ),
        (plate.clone(), round(0.1, 0.02 + bar, bar), false),
        (plate.clone(), round(0.3 + bar, 0.01, bar), false),
        (
            region(&[
                (0.0, 0.0),
                (1.0, 0.0),
                (1.0, 0.1),
                (0.1, 0.1),
                (0.1, 1.0),
                (0.0, 1.0),
            ]),
            round(0.1 + bar, 0.1 + bar, bar),
            false,
        ),
        (round(0.0, 0.0, 0.05), round(0.06, 0.08, 0.05), false),
        (round(0.0, 0.0, 0.05), round(0.1, 0.0, 0.05), false),
    ];
    for (i, (a, b, shares)) in pairs.iter().enumerate() {
        for angle in [0.0, 0.1, 0.5, 1.0, 2.0, 3.0, PI / 2.0, PI / 4.0] {
            let (a, b) = (rotated(a, angle), rotated(b, angle));
            let least = a.integrals().area.min(b.integrals().area);
            assert!(overlap_area(&a, &b) <= 1e-13 * least, "pair {i} at {angle}");
            assert_eq!(touches(&a, &b, 1e-11), *shares, "pair {i} at {angle}");
            assert_eq!(touches(&b, &a, 1e-11), *shares, "pair {i} at {angle}");
        }
    }
}

/// Half circles side by side share their diameter, and arcs of one circle share what both have.
#[test]
fn arcs_share_a_stretch() {
    let half = |turn: f64| {
        let (left, right) = (Point::new(-1.0, 0.0), Point::new(1.0, 0.0));
        let dome = Contour::closed(vec![
            Edge::Straight {
                from: left,
                to: right,
            },
            Edge::Arc {
                from: right,
                to: left,
                centre: Point::ORIGIN,
                turn: Turn::CounterClockwise,
            },
        ]);
        rotated(&Region::of(dome.unwrap(), vec![]), turn)
    };
    let (upper, lower) = (half(0.0), half(PI));
    assert!(overlap_area(&upper, &lower) < 1e-15);
    assert!(touches(&upper, &lower, 1e-12));
    let quarter = overlap_area(&upper, &half(PI / 2.0));
    close(quarter, PI / 4.0, 1.0, 1e-14);
    // A disc has the arc in common with a half disc, but not with one of another radius.
    assert!(touches(&upper, &round(0.0, 0.0, 1.0), 1e-12));
    assert!(!touches(&upper, &round(0.0, 0.5, 1.0), 1e-12));
    assert!(!touches(&upper, &round(0.0, 0.0, 2.0), 1e-12));
}

/// An arch over a plate has both ends of its arc on the plate, but nothing between them.
#[test]
fn an_arch_stands_on_two_points() {
    let p = Point::new;
    let line = |from, to| Edge::Straight { from, to };
    let arch = Contour::closed(vec![
        Edge::Arc {
            from: p(-3.0, 0.0),
            to: p(3.0, 0.0),
            centre: p(0.0, -4.0),
            turn: Turn::Clockwise,
        },
        line(p(3.0, 0.0), p(3.0, 2.0)),
        line(p(3.0, 2.0), p(-3.0, 2.0)),
        line(p(-3.0, 2.0), p(-3.0, 0.0)),
    ]);
    let arch = Region::of(arch.unwrap(), vec![]);
    let plate = upright(-3.0, -1.0, 3.0, 0.0);
    assert!(overlap_area(&arch, &plate) < 1e-15);
    assert!(!touches(&arch, &plate, 1e-9) && !touches(&plate, &arch, 1e-9));
}

/// A gap or bite smaller than the slack is contact; a greater one is none.
#[test]
fn contact_has_a_slack() {
    let (a, b) = (upright(0.0, 0.0, 1.0, 1.0), upright(1.0, 0.5, 2.0, 1.5));
    for shift in [-1e-3, 1e-3] {
        let b = b.moved(Point::new(shift, 0.0));
        assert!(touches(&a, &b, 2e-3));
        assert!(!touches(&a, &b, 5e-4));
    }
    // Edges that cross, or meet at a slant, are not in contact.
    let slanted = rotated(&upright(0.0, 0.0, 1.0, 1.0), 1e-3).moved(Point::new(1.0, 0.0));
    assert!(!touches(&a, &slanted, 1e-9));
}
