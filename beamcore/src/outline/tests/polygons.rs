//! What is told about polygons that are none.

use super::*;

type Points = &'static [(f64, f64)];

const SQUARE: Points = &[(0.0, 0.0), (100.0, 0.0), (100.0, 100.0), (0.0, 100.0)];

fn told(points: Points, holes: &[Points]) -> Vec<String> {
    polygon(mm(points), holes.iter().map(|hole| mm(hole)).collect())
        .problems("o")
        .iter()
        .map(ToString::to_string)
        .collect()
}

#[test]
fn loops_that_are_none_are_told() {
    let cases: [(Points, &str); 7] = [
        (&[], "found 0 points; expected at least 3 points"),
        (&[(0.0, 0.0)], "found 1 point; expected at least 3 points"),
        (
            &[
                (0.0, 0.0),
                (50.0, 0.0),
                (50.0, 50.0),
                (50.0, 50.0),
                (0.0, 50.0),
            ],
            "found edge 3 from point 3 to point 4 without length; \
             expected points that differ, without the first again at the end",
        ),
        (
            &[(0.0, 0.0), (50.0, 0.0), (50.0, 50.0), (0.0, 0.0)],
            "found edge 4 from point 4 to point 1 without length; \
             expected points that differ, without the first again at the end",
        ),
        (
            &[(0.0, 0.0), (50.0, 50.0), (50.0, 0.0), (0.0, 50.0)],
            "found edge 1 from point 1 to point 2 and edge 3 from point 3 to point 4, which cross \
             or touch; expected edges that meet only where one ends and the next begins",
        ),
        // A point on another edge.
        (
            &[
                (0.0, 0.0),
                (50.0, 0.0),
                (50.0, 50.0),
                (25.0, 0.0),
                (0.0, 50.0),
            ],
            "found edge 1 from point 1 to point 2 and edge 3 from point 3 to point 4, which cross \
             or touch, and one more pair; \
             expected edges that meet only where one ends and the next begins",
        ),
        // All points on one line: the second and third edge go back over the first.
        (
            &[(0.0, 0.0), (10.0, 10.0), (20.0, 20.0)],
            "found edge 1 from point 1 to point 2 and edge 3 from point 3 to point 1, which cross \
             or touch, and one more pair; \
             expected edges that meet only where one ends and the next begins",
        ),
    ];
    for (points, expected) in cases {
        assert_eq!(told(points, &[]), [format!("o.polygon.points: {expected}")]);
    }
    let mut points = mm(SQUARE);
    points[2].1 = Length::from_m(f64::INFINITY);
    let found = polygon(points, vec![]).problems("o");
    assert_eq!(
        found[0].to_string(),
        "o.polygon.points[2]: found the point (100 mm, inf m); expected finite lengths"
    );
}

#[test]
fn misplaced_holes_are_told() {
    let inside = "expected a hole inside the outer loop that does not touch it";
    let cases: [(&[Points], String); 6] = [
        (
            &[&[(110.0, 0.0), (120.0, 0.0), (120.0, 10.0)]],
            format!(
                "o.polygon.holes[0]: found hole 1, which does not lie in the outer loop; {inside}"
            ),
        ),
        (
            &[&[
                (-10.0, -10.0),
                (110.0, -10.0),
                (110.0, 110.0),
                (-10.0, 110.0),
            ]],
            format!(
                "o.polygon.holes[0]: found hole 1, which does not lie in the outer loop; {inside}"
            ),
        ),
        (
            &[&[(50.0, 50.0), (120.0, 50.0), (120.0, 70.0)]],
            format!(
                "o.polygon.holes[0]: found edge 1 from point 1 to point 2 and edge 2 from point 2 \
                 to point 3 of the outer loop, which cross or touch; {inside}"
            ),
        ),
        (
            &[
                &[(10.0, 10.0), (40.0, 10.0), (40.0, 40.0), (10.0, 40.0)],
                &[(30.0, 30.0), (60.0, 30.0), (60.0, 60.0), (30.0, 60.0)],
            ],
            "o.polygon.holes[1]: found hole 1 and hole 2, which overlap or touch; \
             expected holes apart from each other"
                .into(),
        ),
        (
            &[
                &[(20.0, 20.0), (30.0, 20.0), (30.0, 30.0)],
                &[(10.0, 10.0), (60.0, 10.0), (60.0, 60.0), (10.0, 60.0)],
            ],
            "o.polygon.holes[1]: found hole 1 and hole 2, which overlap or touch; \
             expected holes apart from each other"
                .into(),
        ),
        (
            &[&[(20.0, 20.0), (30.0, 20.0)]],
            "o.polygon.holes[0]: found 2 points; expected at least 3 points".into(),
        ),
    ];
    for (holes, expected) in cases {
        assert_eq!(told(SQUARE, holes), [expected]);
    }
}

/// All loops are looked at, also where several are wrong.
#[test]
fn mistakes_of_several_loops_are_told_at_once() {
    let found = told(
        &[(0.0, 0.0), (50.0, 50.0), (50.0, 0.0), (0.0, 50.0)],
        &[&[(1.0, 1.0)], &[]],
    );
    assert_eq!(found.len(), 3);
    assert!(found[0].starts_with("o.polygon.points: found edge 1"));
    assert!(found[1].starts_with("o.polygon.holes[0]: found 1 point;"));
    assert!(found[2].starts_with("o.polygon.holes[1]: found 0 points;"));
}
