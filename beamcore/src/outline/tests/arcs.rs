//! Circular edges against the closed forms of textbooks.

use super::*;
use crate::outline::segment::Segment;
use crate::units::Number;
use std::f64::consts::PI;

fn straight(from: (f64, f64), to: (f64, f64)) -> Edge {
    Edge::Straight {
        from: Point::new(from.0, from.1),
        to: Point::new(to.0, to.1),
    }
}

fn arc(from: (f64, f64), to: (f64, f64), centre: (f64, f64), turn: Turn) -> Edge {
    Edge::Arc {
        from: Point::new(from.0, from.1),
        to: Point::new(to.0, to.1),
        centre: Point::new(centre.0, centre.1),
        turn,
    }
}

/// A = pi d^2/4, I = pi d^4/64, perimeter pi d. Source: any table of sections, e.g. Gere and
/// Goodno, Mechanics of Materials, appendix on plane areas (from memory).
#[test]
fn a_disc_and_a_ring() {
    let (d, inner) = (0.06, 0.05);
    let bar = disc(60.mm()).integrals();
    close(bar.area, PI * d * d / 4.0, bar.area, 1e-15);
    close(bar.iyy, PI * d * d * d * d / 64.0, bar.iyy, 1e-15);
    close(bar.izz, bar.iyy, bar.iyy, 1e-15);
    close(bar.perimeter, PI * d, bar.perimeter, 1e-15);
    assert_eq!((bar.y, bar.z, bar.iyz), (0.0, 0.0, 0.0));
    let tube = ring(60.mm(), 5.mm()).integrals();
    let area = PI * (d * d - inner * inner) / 4.0;
    let second = PI * (d * d * d * d - inner * inner * inner * inner) / 64.0;
    close(tube.area, area, area, 1e-14);
    close(tube.iyy, second, second, 1e-14);
    close(tube.izz, second, second, 1e-14);
    close(tube.perimeter, PI * (d + inner), d, 1e-14);
}

/// Half disc: A = pi r^2/2, centroid 4 r/(3 pi) above the diameter, I = pi r^4/8 about the diameter
/// and about the axis of symmetry. Source: as above (from memory).
#[test]
fn a_half_disc() {
    let r = 0.3;
    let half = Contour::closed(vec![
        straight((-r, 0.0), (r, 0.0)),
        arc((r, 0.0), (-r, 0.0), (0.0, 0.0), Turn::CounterClockwise),
    ])
    .unwrap();
    let found = Region::of(half.reversed(), vec![]).integrals();
    let (area, z) = (PI * r * r / 2.0, 4.0 * r / (3.0 * PI));
    let diameter = PI * r * r * r * r / 8.0;
    close(found.area, area, area, 1e-15);
    close(found.y, 0.0, r, 1e-15);
    close(found.z, z, r, 1e-15);
    close(found.iyy, diameter - area * z * z, diameter, 1e-15);
    close(found.izz, diameter, diameter, 1e-15);
    close(found.iyz, 0.0, diameter, 1e-15);
    close(found.perimeter, r * (PI + 2.0), r, 1e-14);
}

/// Quarter disc: centroid 4 r/(3 pi) from both sides; about its sides I = pi r^4/16 and
/// int yz dA = r^4/8. Source: as above (from memory). A rounded corner is a square less a spandrel.
#[test]
fn a_square_with_one_rounded_corner() {
    let r = 2.0;
    let rounded = Contour::closed(vec![
        straight((0.0, 0.0), (r, 0.0)),
        arc((r, 0.0), (0.0, r), (0.0, 0.0), Turn::CounterClockwise),
        straight((0.0, r), (0.0, 0.0)),
    ])
    .unwrap();
    let found = Region::of(rounded, vec![]).integrals();
    let (area, c) = (PI * r * r / 4.0, 4.0 * r / (3.0 * PI));
    let (side, product) = (PI * 16.0 / 16.0, 16.0 / 8.0);
    close(found.area, area, area, 1e-15);
    close(found.y, c, r, 1e-15);
    close(found.iyy, side - area * c * c, side, 1e-15);
    close(found.iyz, product - area * c * c, side, 1e-15);
    // A clockwise arc, about the opposite corner, cuts the rest of the square off.
    let hollow = Contour::closed(vec![
        straight((0.0, 0.0), (r, 0.0)),
        arc((r, 0.0), (0.0, r), (r, r), Turn::Clockwise),
        straight((0.0, r), (0.0, 0.0)),
    ])
    .unwrap();
    let spandrel = Region::of(hollow, vec![]).integrals();
    close(spandrel.area, r * r - area, r * r, 1e-15);
    // The first moment about the side y = 0 is that of the square less the quarter's.
    let first = r * r * r / 2.0 - area * (r - c);
    close(spandrel.y * spandrel.area, first, r * r * r, 1e-15);
}

/// More than half a circle, and one circle as three unequal arcs.
#[test]
fn arcs_of_any_angle_add_up() {
    let at = |degrees: f64| {
        let angle = degrees * PI / 180.0;
        (1.0 + 3.0 * libm::cos(angle), 2.0 + 3.0 * libm::sin(angle))
    };
    let full = round(1.0, 2.0, 3.0);
    for cuts in [
        [10.0, 290.0, 300.0],
        [0.0, 90.0, 180.0],
        [45.0, 46.0, 359.0],
        [-10.0, 90.0, 270.0],
    ] {
        let edges = (0..3)
            .map(|i| {
                let (from, to) = (at(cuts[i]), at(cuts[(i + 1) % 3]));
                arc(from, to, (1.0, 2.0), Turn::CounterClockwise)
            })
            .collect();
        let pieced = Region::of(Contour::closed(edges).unwrap(), vec![]);
        same(&pieced.integrals(), &full.integrals(), 3.0, 1e-14);
        close(overlap_area(&pieced, &full), 9.0 * PI, 9.0 * PI, 1e-13);
    }
}

/// Sectors of more than half a disc, r^2 times half their angle, wherever they begin: the arc
/// passes the top and the bottom of its circle in either order.
#[test]
fn great_sectors_overlap_as_they_should() {
    let degrees = [
        0.0, 80.0, 90.0, 100.0, 170.0, 190.0, 260.0, 270.0, 280.0, 350.0,
    ];
    let disc = round(0.0, 0.0, 2.0);
    for begin in degrees {
        let at = |degrees: f64| {
            let angle = degrees * PI / 180.0;
            (2.0 * libm::cos(angle), 2.0 * libm::sin(angle))
        };
        let (from, to) = (at(begin), at(begin + 280.0));
        let contour = Contour::closed(vec![
            straight((0.0, 0.0), from),
            arc(from, to, (0.0, 0.0), Turn::CounterClockwise),
            straight(to, (0.0, 0.0)),
        ]);
        let sector = Region::of(contour.unwrap(), vec![]);
        let area = 4.0 * 280.0 / 360.0 * PI;
        close(sector.integrals().area, area, area, 1e-14);
        close(overlap_area(&sector, &disc), area, area, 1e-14);
        close(overlap_area(&mirrored(&sector), &disc), area, area, 1e-14);
        // The gap lies between the ends; everything else is inside.
        for step in 0..36 {
            let turn = f64::from(10 * step + 5);
            let (y, z) = at(begin + turn);
            let found = point_in_region(&sector, Point::new(0.7 * y, 0.7 * z), 1e-9);
            let expected = if turn < 280.0 {
                Location::Inside
            } else {
                Location::Outside
            };
            assert_eq!(found, expected, "{begin} {turn}");
        }
    }
}

/// Both ways of integrating a segment agree where one takes over from the other.
#[test]
fn flat_and_closed_forms_agree() {
    // h/r just below and above the limit; r = 1.
    let of = |h: f64| Segment::new(h, (1.0 - h * h).sqrt()).moments();
    let (below, above) = (of(0.25 - 1e-12), of(0.25 + 1e-12));
    for (a, b) in [
        (below.area, above.area),
        (below.n, above.n),
        (below.nn, above.nn),
        (below.tt, above.tt),
    ] {
        close(a, b, b, 1e-9);
    }
}

/// A very flat arc over a chord of 2 h is a parabola of the rise s = h^2/(2 r), to the order
/// (h/r)^2.
#[test]
fn a_very_flat_arc_keeps_its_digits() {
    let (h, r) = (0.05_f64, 5000.0_f64);
    let segment = Segment::new(h, ((r - h) * (r + h)).sqrt());
    let (found, rise) = (segment.moments(), h * h / (2.0 * r));
    // Integrals of s (1 - t^2/h^2): 4 h s/3, 8 h s^2/15, 32 h s^3/105, 4 h^3 s/15.
    close(segment.rise(), rise, rise, 1e-9);
    close(found.area, 4.0 * h * rise / 3.0, found.area, 1e-9);
    close(found.n, 8.0 * h * rise * rise / 15.0, found.n, 1e-9);
    close(
        found.nn,
        32.0 * h * rise * rise * rise / 105.0,
        found.nn,
        1e-9,
    );
    close(found.tt, 4.0 * h * h * h * rise / 15.0, found.tt, 1e-9);
}
