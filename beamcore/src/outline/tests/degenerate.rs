//! Outlines that are no outlines, and regions that nearly coincide.

use super::*;
use proptest::prelude::*;

/// Numbers as they come from broken input, beside ordinary ones.
fn any_size() -> impl Strategy<Value = Length> {
    prop_oneof![
        4 => 0.0..1.0f64,
        1 => -1.0..0.0f64,
        1 => Just(0.0),
        1 => Just(f64::NAN),
        1 => Just(f64::INFINITY),
        1 => Just(f64::NEG_INFINITY),
        1 => Just(1e300),
        1 => Just(1e-300),
        1 => any::<f64>(),
    ]
    .prop_map(Length::from_si)
}

fn any_points() -> impl Strategy<Value = Vec<(Length, Length)>> {
    prop::collection::vec((any_size(), any_size()), 0..6)
}

fn any_outline() -> impl Strategy<Value = Outline> {
    let s = || any_size().boxed();
    prop_oneof![
        (s(), s()).prop_map(|(a, b)| rectangle(a, b)),
        (
            any_points().boxed(),
            prop::collection::vec(any_points().boxed(), 0..3)
        )
            .prop_map(|(points, holes)| polygon(points, holes)),
        s().prop_map(disc),
        (s(), s()).prop_map(|(a, b)| ring(a, b)),
        (s(), s(), s(), s(), s(), s()).prop_map(|(a, b, c, d, e, f)| i_shape(a, b, c, d, e, f)),
        (s(), s(), s(), s()).prop_map(|(a, b, c, d)| tee(a, b, c, d)),
        (s(), s(), s(), s()).prop_map(|(a, b, c, d)| channel(a, b, c, d)),
        (s(), s(), s()).prop_map(|(a, b, c)| angle(a, b, c)),
        (s(), s(), s(), s()).prop_map(|(a, b, c, d)| hollow_box(a, b, c, d)),
    ]
}

proptest! {
    #![proptest_config(ProptestConfig::with_cases(512))]

    /// Nothing panics, and an outline without problems has ordinary integrals.
    #[test]
    fn any_input_is_answered(a in any_outline(), b in any_outline()) {
        let (one, other) = (a.region(), b.region());
        let common = overlap_area(&one, &other);
        let contact = (touches(&one, &other, 1e-9), contains(&one, &other));
        let place = point_in_region(&one, Point::new(0.1, 0.1), 1e-9);
        let reach = one.greatest(1.0, 2.0);
        let problems = a.problems("outline");
        if problems.is_empty() {
            let found = a.integrals();
            prop_assert!(found.area > 0.0 && found.iyy > 0.0 && found.izz > 0.0, "{:?}", found);
            prop_assert!(found.iyz * found.iyz <= found.iyy * found.izz, "{:?}", found);
            prop_assert!(reach.value.is_finite());
        }
        if problems.is_empty() && b.problems("outline").is_empty() {
            let least = a.area().min(b.area()).si();
            prop_assert!(common <= least * (1.0 + 1e-9), "{} {:?} {:?}", common, contact, place);
        }
    }

    /// A region and itself, moved and turned by roundings.
    #[test]
    fn nearly_identical_regions_overlap_nearly_wholly(
        dy in -1e-15..1e-15f64, dz in -1e-15..1e-15f64, turn in -1e-15..1e-15f64,
        slant in 0.0..6.3f64,
    ) {
        let length = Length::from_m;
        for shape in [
            channel(length(0.3), length(0.1), length(0.015), length(0.01)),
            ring(length(0.3), length(0.01)),
        ] {
            let shape = rotated(&shape.region(), slant);
            let other = rotated(&shape, turn).moved(Point::new(dy, dz));
            let area = shape.integrals().area;
            close(overlap_area(&shape, &other), area, area, 1e-11);
            prop_assert!(touches(&shape, &other, 1e-12));
        }
    }
}
