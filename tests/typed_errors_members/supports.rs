//! Supports, hinges and anchors that cannot be.

use super::{error, floor, modulus, part, plan, says, section_with};
use beamcore::ErrorKind;
use beamcore::member::{Anchor, Hinge, Member, MemberPlan, Support};
use beamcore::section::Section;
use beamcore::units::{FastenerStiffness, Length, Number, RotationalStiffness, SpringStiffness};

fn on(left: Support) -> MemberPlan {
    Member::of_length(section_with(modulus()), 4.m())
        .support(left)
        .support(Support::roller("right", 4.m()))
        .action(floor())
}

fn left() -> Support {
    Support::pin("left", Length::ZERO)
}

#[test]
fn springs_that_are_not_springs() {
    for (stiffness, found) in [
        (-1.0, "-1 N/m"),
        (f64::NAN, "NaN N/m"),
        (f64::INFINITY, "inf kN/m"),
    ] {
        let spring = SpringStiffness::from_N_per_m(stiffness);
        for (key, support) in [
            ("spring", left().spring(spring)),
            ("axial_spring", left().axial_spring(spring)),
        ] {
            says(
                on(support),
                ErrorKind::Value,
                &format!(
                    "member.supports[\"left\"].{key}: found {found}; expected a spring stiffness \
                     of zero or more"
                ),
            );
        }
    }
    says(
        on(left().rotational_spring(RotationalStiffness::from_N_m_per_rad(-1.0))),
        ErrorKind::Value,
        "member.supports[\"left\"].rotational_spring: found -1 N m/rad; expected a rotational \
         stiffness of zero or more",
    );
}

#[test]
fn supports_of_what_is_not_there() {
    says(
        on(left().under(["middle"])),
        ErrorKind::Name,
        "member.supports[\"left\"].under: found the unknown layer \"middle\"; expected one of the \
         layers \"lower\", \"upper\"",
    );
    let held = error(on(left().holding("middle", Length::ZERO)));
    assert_eq!(held.kind(), ErrorKind::Name);
    let high = error(on(left().at_height(Length::from_m(f64::INFINITY))));
    assert_eq!(high.path(), "member.supports[\"left\"].height");
}

/// The axis and both layers beside it.
#[test]
fn movements_that_are_held_twice() {
    let fixed = Support::fixed("left", Length::ZERO)
        .holding("upper", 200.mm())
        .holding("lower", Length::ZERO);
    let error = error(on(fixed));
    assert_eq!(
        (error.kind(), error.path()),
        (ErrorKind::Duplicate, "member.supports[\"left\"]")
    );
}

#[test]
fn hinges_that_cannot_be() {
    for (at, found) in [(0.0, "0 m"), (4.0, "4 m"), (f64::NAN, "NaN mm")] {
        says(
            plan().hinge(Hinge::moment(Length::from_m(at))),
            ErrorKind::Position,
            &format!(
                "member.hinges[0].moment.at: found a hinge at {found}, at an end of the member or \
                 beyond it; expected a place between the ends, 0 m and 4 m"
            ),
        );
    }
    let twice = plan().hinge(Hinge::shear(1.m())).hinge(Hinge::shear(1.m()));
    assert_eq!(error(twice).kind(), ErrorKind::Duplicate);
    says(
        plan().hinge(Hinge::moment(1.m())),
        ErrorKind::Mechanism,
        "member.supports: found a member that is free to fold at the place 1 m; expected supports \
         that hold it, for example a second one",
    );
    says(
        plan().hinge(Hinge::moment_of("lower", 1.m())),
        ErrorKind::Value,
        "member.hinges[0].moment.layer: found a hinge in the layer \"lower\", which shares its \
         deflection with others; expected a layer whose joints have a transverse modulus, or a \
         hinge through all layers",
    );
    let butt = plan().hinge(Hinge::butt("middle", 1.m()));
    assert_eq!(error(butt).kind(), ErrorKind::Name);
    let single = Member::simple_span(Section::of([part("beam", 0.0)]).unwrap(), 4.m());
    let butt = single.action(floor()).hinge(Hinge::butt("section", 1.m()));
    assert_eq!(error(butt).kind(), ErrorKind::Value);
}

fn anchor(name: &str, joint: &str, at: f64, stiffness: Option<f64>) -> Anchor {
    Anchor {
        name: name.into(),
        joint: joint.into(),
        at: at.m(),
        stiffness: stiffness.map(FastenerStiffness::from_N_per_m),
    }
}

#[test]
fn anchors_that_cannot_be() {
    says(
        plan().anchor(anchor("plate", "nails", 0.0, None)),
        ErrorKind::Name,
        "member.anchors[\"plate\"].joint: found the joint \"nails\", which does not slip or is not \
         there; expected one of the joints that slip: \"screws\"",
    );
    says(
        plan().anchor(anchor("plate", "screws", 5.0, None)),
        ErrorKind::Position,
        "member.anchors[\"plate\"].at: found 5 m; expected a place on the member, from 0 m to 4 m",
    );
    says(
        plan().anchor(anchor("plate", "screws", 0.0, Some(-1.0))),
        ErrorKind::Value,
        "member.anchors[\"plate\"].stiffness: found -1 N/m; expected a slip modulus of a fastener \
         of zero or more",
    );
    let named_twice = [0.0, 4.0].map(|at| anchor("plate", "screws", at, None));
    let placed_twice = ["a", "b"].map(|name| anchor(name, "screws", 0.0, None));
    for anchors in [named_twice, placed_twice] {
        let plan = anchors.into_iter().fold(plan(), MemberPlan::anchor);
        assert_eq!(error(plan).kind(), ErrorKind::Duplicate);
    }
}
