//! The mirror image of a member bends as the mirror image of its line.

use super::drawn::{Drawn, drawn};
use super::lines::{lines, places};
use beamcore::member::{Load, Member, ShearModel, Support};
use beamcore::response::Response;
use beamcore::units::Length;
use proptest::prelude::*;

/// The member seen from the other side.
fn mirrored(member: &Drawn) -> Response {
    let (length, kinds) = (Length::from_m(member.length()), member.kinds());
    let right = member.taper.unwrap_or(1.0);
    let mut plan = Member::of_length(member.section_with(right, &kinds), length);
    if member.taper.is_some() {
        plan = plan.taper(Length::ZERO, length, member.section_with(1.0, &kinds));
    }
    if member.shear.is_some() {
        plan = plan.shear(ShearModel::Flexible);
    }
    for (i, x) in member.supports().iter().enumerate() {
        let (name, at) = (format!("support {i}"), length - Length::from_m(*x));
        plan = plan.support(match (i, member.is_fixed) {
            (0, true) => Support::fixed(name, at),
            (0, false) => Support::pin(name, at),
            _ => Support::roller(name, at),
        });
    }
    let turned = member.loads.iter().map(|load| match load.clone() {
        Load::Point { load, at } => Load::Point {
            load,
            at: length - at,
        },
        Load::Couple { couple, at } => Load::Couple {
            couple: -couple,
            at: length - at,
        },
        Load::Trapezoidal {
            load_from,
            load_to,
            from,
            to,
        } => Load::Trapezoidal {
            load_from: load_to,
            load_to: load_from,
            from: length - to,
            to: length - from,
        },
        _ => unreachable!("no other loads are drawn"),
    });
    super::drawn::solved(plan, &turned.collect::<Vec<_>>())
}

proptest! {
    #![proptest_config(ProptestConfig::with_cases(40))]

    /// Deflections, moments and axial forces are mirrored; rotations, shear, slips and flows change
    /// their sign besides.
    #[test]
    fn mirror_images_agree(
        member in prop_oneof![drawn(2.0..13.0, false), drawn(4.0..9.0, true)],
    ) {
        let (plain, image) = (member.response(), mirrored(&member));
        let (a, b) = (lines(&plain, &member), lines(&image, &member));
        let residual = plain.residual() + image.residual();
        for (a, b) in a.iter().zip(&b) {
            let odd = ["theta", "V", "slip", "flow"].iter().any(|name| a.name.starts_with(name));
            let sign = if odd { -1.0 } else { 1.0 };
            for x in places(member.length()) {
                let there = sign * b.left_of(member.length() - x);
                let slack = (1e-9 + residual) * a.peak;
                prop_assert!((a.at(x) - there).abs() <= slack, "{} {} {there}", a.name, a.at(x));
            }
        }
    }
}
