//! Warnings, and input that is refused.

use super::{joint, three};
use crate::ErrorKind;
use crate::simplified::*;
use crate::units::{Force, Length, Moment, Number};

#[test]
fn lengths_and_spacings_carry_their_warnings() {
    let (layers, joints) = three(false);
    let of = |length| Gamma::of(&layers, &joints, length).unwrap();
    let inner = of(ReferenceLength::Continuous(6.25.m()));
    let span = of(ReferenceLength::Span(5.m()));
    let free = of(ReferenceLength::Cantilever(2.5.m()));
    assert_eq!(inner.bending_stiffness(), span.bending_stiffness());
    assert_eq!(free.bending_stiffness(), span.bending_stiffness());
    assert_eq!(
        inner.warnings(),
        [Warning::SineLoad, Warning::ContinuousSpan]
    );
    assert_eq!(free.warnings(), [Warning::SineLoad, Warning::Cantilever]);
    assert!(Warning::SineLoad.to_string().contains("half a sine wave"));

    let even = effective_spacing(80.mm(), 80.mm()).unwrap();
    assert_eq!((even.spacing, even.warnings), (80.mm(), vec![]));
    let wide = effective_spacing(100.mm(), 401.mm()).unwrap();
    assert_eq!(
        wide.warnings,
        [Warning::SteppedSpacing, Warning::SpacingRatio]
    );
}

#[test]
fn bad_input_is_named() {
    let (layers, joints) = three(false);
    let span = ReferenceLength::Span(5.m());
    let paths = |error: crate::Error| -> Vec<String> {
        error
            .problems()
            .iter()
            .map(|p| p.path().to_owned())
            .collect()
    };
    let mut wrong = layers;
    wrong[0].axial = wrong[0].axial * -1.0;
    wrong[1].height = Length::ZERO;
    wrong[2].centroid_z = wrong[1].centroid_z;
    let error = Gamma::of(&wrong, &[joint(-1.0)], ReferenceLength::Span(Length::ZERO));
    assert_eq!(
        paths(error.unwrap_err()),
        [
            "layers[0].axial",
            "layers[1].height",
            "layers[2].centroid_z",
            "joints",
            "joints[0]",
            "length"
        ]
    );
    let error = Gamma::of(&layers[..1], &[], span).unwrap_err();
    assert_eq!(error.problems()[0].expected(), "two or three layers");
    let error = SineLayers::of(&[], &[], span).unwrap_err();
    assert_eq!((error.kind(), error.path()), (ErrorKind::Missing, "layers"));
    let mut huge = layers;
    huge[0].axial = huge[0].axial * 1e300;
    huge[0].centroid_z = Length::from_m(-1e300);
    let error = SineLayers::of(&huge, &joints, span).unwrap_err();
    assert_eq!(error.kind(), ErrorKind::Numerical);

    let gamma = Gamma::of(&layers, &joints, span).unwrap();
    let infinite = Force::from_N(f64::INFINITY);
    assert_eq!(paths(gamma.flows(infinite).unwrap_err()), ["shear"]);
    assert_eq!(
        paths(gamma.shear_stresses(infinite).unwrap_err()),
        ["shear"]
    );
    let moment = Moment::from_N_m(f64::NAN);
    assert_eq!(paths(gamma.stresses(moment).unwrap_err()), ["moment"]);
    let error = gamma.fastener_forces(1.kN(), &[Length::ZERO]).unwrap_err();
    assert_eq!(paths(error), ["spacings", "spacings[0]"]);
    assert_eq!(
        paths(effective_spacing(2.mm(), 1.mm()).unwrap_err()),
        ["greatest"]
    );
    let error = effective_spacing(Length::ZERO, Length::from_m(f64::NAN));
    assert_eq!(paths(error.unwrap_err()), ["least", "greatest"]);
}
