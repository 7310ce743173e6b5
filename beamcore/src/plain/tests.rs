//! Tests of the plain functions.

use super::*;

/// Common textbook forms, no source: P L^3/(48 EI) at midspan; off midspan, with b the shorter
/// distance to a support, P b (L^2 - b^2)^1.5/(9 sqrt(3) L EI).
#[test]
fn point_loads_give_the_textbook_deflections() {
    let (span, stiffness, load) = (5.0, 2.5e6, 8e3);
    let near = |found: f64, expected: f64| {
        assert!(
            (found - expected).abs() <= 1e-12 * expected,
            "{found} {expected}"
        );
    };
    let at = |x: f64| simple_span_point_deflection(span, stiffness, load, x).unwrap();
    near(at(2.5), load * 125.0 / (48.0 * stiffness));
    let b: f64 = 1.25;
    let short = span * span - b * b;
    let expected = load * b * short * short.sqrt() / (9.0 * 3f64.sqrt() * span * stiffness);
    near(at(1.25), expected);
    near(at(3.75), expected);
    near(
        -simple_span_point_deflection(span, stiffness, -load, b).unwrap(),
        expected,
    );
    for support in [0.0, 1e-12, span - 1e-12, span] {
        assert_eq!(at(support), 0.0);
    }
}

#[test]
fn a_stack_has_the_stiffness_of_its_section() {
    // Two layers of one stuff are one piece: EA = E b 2h, centroid at h, EI = E b (2h)^3/12.
    let (e, b, h) = ([11e9; 2], [0.08; 2], [0.1; 2]);
    assert_eq!(stack_centroid(&e, &b, &h).unwrap(), 0.1);
    let axial = stack_axial_stiffness(&e, &b, &h).unwrap();
    assert!((axial - 11e9 * 0.016).abs() <= 1e-15 * axial);
    // A layer of triple modulus draws the centroid toward itself: (3 * 0.5 + 1 * 1.5)/4 of h.
    let centroid = stack_centroid(&[3.0, 1.0], &[1.0; 2], &[1.0; 2]).unwrap();
    assert_eq!(centroid, 0.75);
}

#[test]
fn bad_numbers_are_named() {
    let path = |result: Result<f64>| result.unwrap_err().path().to_owned();
    assert_eq!(path(stack_centroid(&[1.0], &[1.0, 2.0], &[1.0])), "width_m");
    assert_eq!(path(stack_centroid(&[], &[], &[])), "section.parts");
    assert_eq!(
        path(stack_centroid(&[1.0, 1.0], &[1.0, -1.0], &[1.0, 1.0])),
        "section.parts[\"layer 2\"].outline.rectangle.width"
    );
    assert_eq!(
        path(simple_span_uniform_deflection(0.0, 1.0, 1.0)),
        "span_m"
    );
    let wrong = simple_span_uniform_deflection(f64::NAN, -1.0, f64::INFINITY);
    assert_eq!(wrong.unwrap_err().problems().len(), 3);
    let at = |x| path(simple_span_point_deflection(4.0, 1.0, 1.0, x));
    assert_eq!(at(4.1), "at_m");
    assert_eq!(at(f64::NAN), "at_m");
    assert_eq!(
        path(effective_modulus(11e9, -0.1)),
        "materials[\"material\"].creep_factor"
    );
    assert_eq!(path(convert(1.0, "mm", "kN")), "quantity");
    assert_eq!(path(convert(1.0, "mile", "m")), "unit");
    assert_eq!(path(convert(f64::NAN, "mm", "m")), "value");
    assert_eq!(path(convert(1e308, "m", "mm")), "value");
}

#[test]
fn the_rest_forwards() {
    assert_eq!(effective_modulus(12e9, 0.6).unwrap(), 12e9 / 1.6);
    assert_eq!(convert(6.5, "kN/m", "N/mm").unwrap(), 6.5);
    let day = 86_400.0;
    // As in the tests of the concrete room.
    let phi = concrete_creep(38e6, 50.0, 0.15, 28.0 * day, 18250.0 * day, Cement::N).unwrap();
    assert!((phi - 2.4542).abs() <= 0.5e-4);
    let modulus = concrete_mean_modulus(33e6).unwrap();
    assert!((modulus - 31.476e9).abs() < 0.5e6);
    let young = concrete_modulus_at_age(33e9, 3.0 * day, Cement::N).unwrap();
    assert!((young - 28.286e9).abs() < 0.5e6);
    let share = concrete_strength_share(3.0 * day, Cement::N).unwrap();
    assert!((33e9 * libm::pow(share, 0.3) - young).abs() <= 1e-12 * young);
    let years = 50.0 * 365.25 * day;
    let shrinkage = concrete_shrinkage(38e6, 50.0, 0.15, 3.0 * day, years, Cement::N).unwrap();
    assert!((shrinkage - 0.49e-3).abs() < 0.005e-3);
}
