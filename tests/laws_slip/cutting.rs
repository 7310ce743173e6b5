//! Cutting a member, or a layer of it, changes nothing; what it does change is told.

use super::drawn::{Drawn, drawn, nothing, solved};
use super::lines::{deflection, lines, moment, places};
use beamcore::section::JointKind;
use proptest::prelude::*;

/// The loads with loads of nothing that cut the member in equal stretches.
fn cut(member: &Drawn, pieces: u32) -> Vec<beamcore::member::Load> {
    let length = member.length();
    let at = |i: u32| (length * f64::from(i) / f64::from(pieces)).min(length);
    let cuts = (0..pieces).map(|i| nothing(at(i), at(i + 1)));
    member.loads.iter().cloned().chain(cuts).collect()
}

proptest! {
    #![proptest_config(ProptestConfig::with_cases(40))]

    /// A member without varying depth is the same in one piece and in many.
    #[test]
    fn cutting_pieces_changes_nothing(member in drawn(2.0..13.0, false), pieces in 2u32..9) {
        let (whole, cut) = (member.response(), member.under(&cut(&member, pieces)));
        for (a, b) in lines(&whole, &member).iter().zip(lines(&cut, &member)) {
            for x in places(member.length()) {
                let slack = 1e-10 * a.peak;
                prop_assert!((a.at(x) - b.at(x)).abs() <= slack, "{} {} {}", a.name, a.at(x), b.at(x));
            }
        }
    }

    /// What another cut changes of a varying member is within the errors that were told of both.
    #[test]
    fn the_estimate_covers_the_error(member in drawn(2.0..11.0, true), pieces in 2u32..9) {
        let (whole, cut) = (member.response(), member.under(&cut(&member, pieces)));
        let told = whole.residual() + cut.residual();
        for (a, b) in lines(&whole, &member).iter().zip(lines(&cut, &member)) {
            for x in places(member.length()) {
                let off = (a.at(x) - b.at(x)).abs() / a.peak.max(f64::MIN_POSITIVE);
                prop_assert!(off <= told, "{} off {off}, told {told}", a.name);
            }
        }
    }

    /// A layer in two halves that are rigidly joined is one layer.
    #[test]
    fn cutting_a_layer_changes_nothing(
        member in prop_oneof![drawn(2.0..13.0, false), drawn(4.0..9.0, true)],
        which in 0usize..4,
        share in 0.1..0.9f64,
    ) {
        let which = which % member.layers.len();
        let mut halves = member.clone();
        let [width, height, modulus] = member.layers[which];
        halves.layers[which] = [width, share * height, modulus];
        halves.layers.insert(which + 1, [width, (1.0 - share) * height, modulus]);
        let mut kinds = member.kinds();
        kinds.insert(which, JointKind::Rigid);
        let whole = member.response();
        let halves = solved(halves.plan_with(&kinds), &member.loads);
        let slack = 1e-9 + whole.residual() + halves.residual();
        for [a, b] in [
            [deflection(&whole), deflection(&halves)],
            [moment(&whole), moment(&halves)],
        ] {
            for x in places(member.length()) {
                let off = (a.at(x) - b.at(x)).abs() / a.peak.max(f64::MIN_POSITIVE);
                prop_assert!(off <= slack, "{} {} {}", a.name, a.at(x), b.at(x));
            }
        }
    }
}
