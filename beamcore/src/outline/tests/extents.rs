//! How far regions reach, and where points lie.

use super::*;
use crate::units::Number;

#[test]
fn a_box_around_arcs_is_exact() {
    let bounds = round(3.0, -1.0, 0.5).bounds();
    assert_eq!(bounds.least, Point::new(2.5, -1.5));
    assert_eq!(bounds.greatest, Point::new(3.5, -0.5));
    // A flat arc over a chord of 6 m on a radius of 5 m rises 1 m.
    let (left, right) = (Point::new(-3.0, 0.0), Point::new(3.0, 0.0));
    let crown = Contour::closed(vec![
        Edge::Straight {
            from: left,
            to: right,
        },
        Edge::Arc {
            from: right,
            to: left,
            centre: Point::new(0.0, -4.0),
            turn: Turn::CounterClockwise,
        },
    ])
    .unwrap();
    let bounds = Region::of(crown, vec![]).bounds();
    assert_eq!(bounds.least, left);
    assert_eq!(bounds.greatest, Point::new(3.0, 1.0));
}

#[test]
fn the_greatest_of_a_slanted_form_stands_square_on_the_arc() {
    let found = round(1.0, 2.0, 5.0).greatest(3.0, 4.0);
    close(found.value, 3.0 + 8.0 + 25.0, 36.0, 1e-15);
    close(found.at.y, 4.0, 5.0, 1e-15);
    close(found.at.z, 6.0, 5.0, 1e-15);
    let found = round(1.0, 2.0, 5.0).least(3.0, 4.0);
    close(found.value, 11.0 - 25.0, 36.0, 1e-15);
    close(found.at.y, -2.0, 5.0, 1e-15);
}

#[test]
fn the_leftmost_of_equals_is_told() {
    let plate = upright(-1.0, -2.0, 1.0, 2.0);
    assert_eq!(plate.greatest(0.0, 1.0).at, Point::new(-1.0, 2.0));
    assert_eq!(plate.least(0.0, 1.0).at, Point::new(-1.0, -2.0));
    assert_eq!(plate.greatest(1.0, 0.0).at, Point::new(1.0, -2.0));
    assert_eq!(plate.greatest(0.0, 0.0).value, 0.0);
}

#[test]
fn points_are_located() {
    let tube = ring(2.m(), 500.mm()).region();
    let cases = [
        ((0.75, 0.0), Location::Inside),
        ((-0.6, 0.5), Location::Inside),
        ((0.0, -0.75), Location::Inside),
        ((0.0, 0.0), Location::Outside),
        ((0.4, 0.2), Location::Outside),
        ((0.8, 0.8), Location::Outside),
        ((-3.0, 0.0), Location::Outside),
        ((0.0, 0.5), Location::Boundary),
        ((0.6, 0.8), Location::Boundary),
        ((0.0, -1.0), Location::Boundary),
        ((1.0, 0.0), Location::Boundary),
    ];
    for ((y, z), expected) in cases {
        let found = point_in_region(&tube, Point::new(y, z), 1e-12);
        assert_eq!(found, expected, "{y} {z}");
    }
}

/// Level lines through vertices, also through those at which the boundary turns back.
#[test]
fn points_level_with_vertices_are_located() {
    let crown = region(&[
        (0.0, 0.0),
        (4.0, 0.0),
        (4.0, 2.0),
        (3.0, 1.0),
        (2.0, 2.0),
        (1.0, 1.0),
        (0.0, 2.0),
    ]);
    let cases = [
        ((0.5, 1.0), Location::Inside),
        ((2.0, 1.0), Location::Inside),
        ((-1.0, 1.0), Location::Outside),
        ((-1.0, 2.0), Location::Outside),
        ((1.0, 2.0), Location::Outside),
        ((-1.0, 0.0), Location::Outside),
        ((3.0, 1.0), Location::Boundary),
        ((2.0, 0.0), Location::Boundary),
    ];
    for ((y, z), expected) in cases {
        let found = point_in_region(&crown, Point::new(y, z), 1e-12);
        assert_eq!(found, expected, "{y} {z}");
    }
}

/// A level line through a vertex at which the boundary goes on upward meets it once.
#[test]
fn a_vertex_on_the_way_counts_once() {
    let wedge = region(&[(0.0, -1.0), (1.0, 0.0), (0.0, 1.0)]);
    for (y, expected) in [
        (-1.0, Location::Outside),
        (0.5, Location::Inside),
        (2.0, Location::Outside),
    ] {
        let found = point_in_region(&wedge, Point::new(y, 0.0), 1e-12);
        assert_eq!(found, expected, "{y}");
    }
}

#[test]
fn broken_loops_are_refused() {
    let line = |a: (f64, f64), b: (f64, f64)| Edge::Straight {
        from: Point::new(a.0, a.1),
        to: Point::new(b.0, b.1),
    };
    let arc = |a: (f64, f64), b: (f64, f64), c: (f64, f64)| Edge::Arc {
        from: Point::new(a.0, a.1),
        to: Point::new(b.0, b.1),
        centre: Point::new(c.0, c.1),
        turn: Turn::CounterClockwise,
    };
    let cases = [
        (
            vec![],
            "edges: found 0 edges; expected a loop of at least two edges",
        ),
        (
            vec![
                line((0.0, 0.0), (1.0, 0.0)),
                line((1.0, 1.0), (0.0, 1.0)),
                line((0.0, 1.0), (0.0, 0.0)),
            ],
            "edges[1]: found an edge that begins 1 m from the end of the one before; \
             expected an edge that begins exactly where the one before ends",
        ),
        (
            vec![
                line((0.0, 0.0), (1.0, 0.0)),
                arc((1.0, 0.0), (1.0, 0.0), (0.0, 0.0)),
                line((1.0, 0.0), (0.0, 0.0)),
            ],
            "edges[1]: found an edge that ends where it begins; \
             expected an edge with length; a full circle is two half circles",
        ),
        (
            vec![
                line((-1.0, 0.0), (2.0, 0.0)),
                arc((2.0, 0.0), (-1.0, 0.0), (0.0, 0.0)),
            ],
            "edges[1]: found an arc that begins 2 m and ends 1 m from its centre; \
             expected an arc whose ends are at the same distance from its centre",
        ),
        (
            vec![
                line((-1.0, 0.0), (f64::NAN, 0.0)),
                line((1.0, 0.0), (-1.0, 0.0)),
            ],
            "edges[0]: found a coordinate that is not finite; expected finite coordinates",
        ),
    ];
    for (edges, expected) in cases {
        let error = Contour::closed(edges).unwrap_err();
        assert_eq!(error.problems()[0].to_string(), expected);
    }
}
