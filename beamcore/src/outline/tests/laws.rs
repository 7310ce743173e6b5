//! Laws that hold for every region.

use super::*;
use proptest::prelude::*;
use std::f64::consts::PI;

/// A polygon that a lamp at the origin lights wholly: radii at angles in order.
fn star() -> impl Strategy<Value = Vec<(f64, f64)>> {
    prop::collection::vec((0.3..1.0f64, 0.05..0.95f64), 3..12).prop_map(|corners| {
        let step = 2.0 * PI / corners.len() as f64;
        corners
            .iter()
            .enumerate()
            .map(|(i, (radius, share))| {
                let angle = (i as f64 + share) * step;
                (radius * libm::cos(angle), radius * libm::sin(angle))
            })
            .collect()
    })
}

/// A slot with round ends and a round hole, at a slant: lines, convex and concave arcs.
fn slotted() -> impl Strategy<Value = Region> {
    (0.1..1.0f64, 0.1..0.5f64, 0.1..0.9f64, 0.0..6.3f64).prop_map(|(half, r, bore, angle)| {
        let p = Point::new;
        let arc = |from, to, centre| Edge::Arc {
            from,
            to,
            centre,
            turn: Turn::CounterClockwise,
        };
        let line = |from, to| Edge::Straight { from, to };
        let (a, b, c, d) = (p(-half, -r), p(half, -r), p(half, r), p(-half, r));
        let rim = Contour::closed(vec![
            line(a, b),
            arc(b, c, p(half, 0.0)),
            line(c, d),
            arc(d, a, p(-half, 0.0)),
        ]);
        let hole = Contour::circle(p(half / 2.0, 0.0), bore * r);
        rotated(&Region::of(rim.unwrap(), vec![hole]), angle)
    })
}

fn rectangle_at() -> impl Strategy<Value = Region> {
    (
        -1.0..1.0f64,
        -1.0..1.0f64,
        0.05..1.5f64,
        0.05..1.5f64,
        0.0..6.3f64,
    )
        .prop_map(|(y, z, w, h, angle)| {
            rotated(&upright(-w / 2.0, -h / 2.0, w / 2.0, h / 2.0), angle).moved(Point::new(y, z))
        })
}

fn any_region() -> impl Strategy<Value = Region> {
    prop_oneof![star().prop_map(|points| region(&points)), slotted()]
}

/// Area, first and second moments about the origin of a fan of triangles from the origin, each by
/// the rule of its mid-sides, which is exact for squares: int f = A/3 times the sum of f.
fn fan(points: &[(f64, f64)]) -> [f64; 6] {
    let mut sums = [0.0; 6];
    for (i, &(a, b)) in points.iter().enumerate() {
        let (c, d) = points[(i + 1) % points.len()];
        let area = (a * d - b * c) / 2.0;
        for (y, z) in [
            (a / 2.0, b / 2.0),
            (c / 2.0, d / 2.0),
            ((a + c) / 2.0, (b + d) / 2.0),
        ] {
            for (sum, f) in sums.iter_mut().zip([1.0, y, z, z * z, y * y, y * z]) {
                *sum += area / 3.0 * f;
            }
        }
    }
    sums
}

proptest! {
    #[test]
    fn a_polygon_is_its_triangles(points in star()) {
        let [area, y, z, yy, zz, yz] = fan(&points);
        let found = region(&points).integrals();
        close(found.area, area, area, 1e-13);
        close(found.y, y / area, 1.0, 1e-13);
        close(found.z, z / area, 1.0, 1e-13);
        close(found.iyy, yy - z * z / area, yy + zz, 1e-13);
        close(found.izz, zz - y * y / area, yy + zz, 1e-13);
        close(found.iyz, yz - y * z / area, yy + zz, 1e-13);
    }

    /// Centroid moves along; everything else stays, and turns like a tensor.
    #[test]
    fn integrals_move_turn_and_mirror(region in any_region(), y in -9.0..9.0f64,
                                      z in -9.0..9.0f64, angle in 0.0..6.3f64) {
        let old = region.integrals();
        let moved = region.moved(Point::new(y, z)).integrals();
        same(&moved, &Integrals { y: old.y + y, z: old.z + z, ..old }, 10.0, 1e-12);
        let (s, c) = (libm::sin(angle), libm::cos(angle));
        let turned = Integrals {
            y: c * old.y - s * old.z,
            z: s * old.y + c * old.z,
            iyy: s * s * old.izz + 2.0 * s * c * old.iyz + c * c * old.iyy,
            izz: c * c * old.izz - 2.0 * s * c * old.iyz + s * s * old.iyy,
            iyz: s * c * (old.izz - old.iyy) + (c * c - s * s) * old.iyz,
            ..old
        };
        same(&rotated(&region, angle).integrals(), &turned, 1.0, 1e-12);
        let image = Integrals { y: -old.y, iyz: -old.iyz, ..old };
        same(&mirrored(&region).integrals(), &image, 1.0, 1e-13);
    }

    /// The common area is the same both ways, moved, turned and mirrored, and no more than either.
    #[test]
    fn overlap_moves_turns_and_mirrors(a in any_region(), b in any_region(), y in -1.0..1.0f64,
                                       z in -1.0..1.0f64, angle in 0.0..6.3f64) {
        let b = b.moved(Point::new(y, z));
        let common = overlap_area(&a, &b);
        prop_assert!(common <= a.integrals().area.min(b.integrals().area) * (1.0 + 1e-13));
        let by = Point::new(7.0 * z, 5.0 * y);
        for (one, other) in [
            (b.clone(), a.clone()),
            (a.moved(by), b.moved(by)),
            (rotated(&a, angle), rotated(&b, angle)),
            (mirrored(&a), mirrored(&b)),
        ] {
            close(overlap_area(&one, &other), common, 1.0, 1e-12);
        }
    }

    /// What lies in a region and what lies outside of it add up to the whole.
    #[test]
    fn inside_and_outside_add_up(a in any_region(), b in rectangle_at()) {
        let frame = Region::of(
            upright_loop(-9.0, -9.0, 9.0, 9.0),
            vec![b.contours()[0].clone()],
        );
        let area = a.integrals().area;
        close(overlap_area(&a, &b) + overlap_area(&a, &frame), area, area, 1e-12);
    }

    /// A region that is cut in two by a slanted line is the sum of both pieces.
    #[test]
    fn both_sides_of_a_cut_add_up(a in any_region(), angle in 0.0..6.3f64, z in -1.0..1.0f64) {
        let above = rotated(&upright(-9.0, z, 9.0, 9.0), angle);
        let below = rotated(&upright(-9.0, -9.0, 9.0, z), angle);
        let area = a.integrals().area;
        close(overlap_area(&a, &above) + overlap_area(&a, &below), area, area, 1e-12);
        prop_assert!(overlap_area(&above, &below) < 1e-12);
        prop_assert!(touches(&above, &below, 1e-12));
    }

    /// Upright rectangles: the product of the common width and height.
    #[test]
    fn rectangles_overlap_by_width_times_height(
        [a, b, c, d, e, f, g, h] in prop::array::uniform8(0.0..1.0f64)
    ) {
        let (one, other) = (upright(a, b, a + c, b + d), upright(e, f, e + g, f + h));
        let width = ((a + c).min(e + g) - a.max(e)).max(0.0);
        let height = ((b + d).min(f + h) - b.max(f)).max(0.0);
        close(overlap_area(&one, &other), width * height, 1.0, 1e-14);
    }

    /// A disc cut by a line at the distance d from its centre: r^2 acos(d/r) - d sqrt(r^2 - d^2).
    #[test]
    fn a_line_cuts_a_segment_off(r in 0.1..2.0f64, share in -0.99..0.99f64, angle in 0.0..6.3f64) {
        let d = share * r;
        let cut = r * r * libm::acos(share) - d * libm::sqrt(r * r - d * d);
        let beyond = rotated(&upright(-9.0, d, 9.0, 9.0), angle);
        close(overlap_area(&round(0.0, 0.0, r), &beyond), cut, PI * r * r, 1e-13);
    }

    /// No point of the boundary goes beyond the greatest value, which is itself on the boundary.
    #[test]
    fn the_greatest_is_not_passed(region in any_region(), a in -2.0..2.0f64, b in -2.0..2.0f64) {
        let (greatest, least) = (region.greatest(a, b), region.least(a, b));
        for extreme in [greatest, least] {
            let place = point_in_region(&region, extreme.at, 1e-14);
            prop_assert_eq!(place, Location::Boundary);
            close(a * extreme.at.y + b * extreme.at.z, extreme.value, 1.0, 1e-15);
        }
        for edge in region.edges() {
            for p in [edge.from(), edge.middle()] {
                let value = a * p.y + b * p.z;
                prop_assert!(value <= greatest.value + 1e-14 && value >= least.value - 1e-14);
            }
        }
    }

    /// A point is inside just if a small disc about it overlaps with all of itself.
    #[test]
    fn location_agrees_with_overlap(region in any_region(), y in -1.0..1.0f64, z in -1.0..1.0f64) {
        let radius = 1e-3;
        let spot = round(y, z, radius);
        let share = overlap_area(&region, &spot) / spot.integrals().area;
        match point_in_region(&region, Point::new(y, z), radius) {
            Location::Inside => close(share, 1.0, 1.0, 1e-12),
            Location::Outside => close(share, 0.0, 1.0, 1e-12),
            Location::Boundary => prop_assert!((-1e-12..=1.0 + 1e-12).contains(&share)),
        }
    }
}

fn upright_loop(left: f64, bottom: f64, right: f64, top: f64) -> Contour {
    upright(left, bottom, right, top).contours()[0].clone()
}
