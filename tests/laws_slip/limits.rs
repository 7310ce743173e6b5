//! What soft and stiff joints, springs and shear tend to.

use super::drawn::{ALL, Drawn, FIRST, drawn, solved};
use super::lines::{deflection, moment, places};
use beamcore::member::{MemberPlan, Support};
use beamcore::response::Response;
use beamcore::section::JointKind;
use beamcore::units::{Length, SpringStiffness};
use proptest::prelude::*;

/// The greatest difference of deflections and of moments, each relative to its peak.
fn difference(a: &Response, b: &Response, member: &Drawn) -> f64 {
    let pairs = [[deflection(a), deflection(b)], [moment(a), moment(b)]];
    let mut greatest = 0.0;
    for [a, b] in pairs {
        for x in places(member.length()) {
            let peak = a.peak.max(b.peak).max(f64::MIN_POSITIVE);
            greatest = f64::max(greatest, (a.at(x) - b.at(x)).abs() / peak);
        }
    }
    greatest
}

/// The modulus of a joint with (lambda L)^2 = 1e-8.
fn soft(member: &Drawn, j: usize) -> f64 {
    let area = |[width, height, _]: [f64; 3]| width * height;
    let ea = |i: usize| member.layers[i][2] * area(member.layers[i]);
    let own = |i: usize| ea(i) * member.layers[i][1] * member.layers[i][1] / 12.0;
    let ei: f64 = (0..member.layers.len()).map(own).sum();
    let arm = (member.layers[j][1] + member.layers[j + 1][1]) / 2.0;
    let flexibility = 1.0 / ea(j) + 1.0 / ea(j + 1) + arm * arm / ei;
    1e-8 / (flexibility * member.length() * member.length())
}

/// The plan with one more support under the middle of the first span.
fn propped(member: &Drawn, spring: f64) -> MemberPlan {
    let at = Length::from_m(member.spans[0] * 0.45);
    let prop = Support::roller("prop", at).spring(SpringStiffness::from_N_per_m(spring));
    member.plan().support(prop)
}

proptest! {
    #![proptest_config(ProptestConfig::with_cases(30))]

    /// A joint without stiffness is a loose one.
    #[test]
    fn soft_joints_are_loose(mut member in prop_oneof![drawn(4.0..5.0, false), drawn(4.0..5.0, true)]) {
        for j in 0..member.moduli.len() {
            member.moduli[j] = soft(&member, j);
        }
        let loose = vec![JointKind::Loose; member.moduli.len()];
        let (soft, loose) = (member.response(), solved(member.plan_with(&loose), &member.loads));
        let off = difference(&soft, &loose, &member);
        prop_assert!(off <= 1e-6 + soft.residual() + loose.residual(), "{off}");
    }

    /// A joint that hardly yields is a rigid one.
    #[test]
    fn stiff_joints_are_rigid(mut member in drawn(4.0..5.0, false)) {
        // With slip each layer shears by itself, rigidly joined they shear as one.
        member.shear = None;
        // At a fixed end where the layers may slip they bend one by one over a length of 1/lambda.
        member.is_fixed = false;
        member.moduli.fill(1e18);
        let rigid = vec![JointKind::Rigid; member.moduli.len()];
        let (stiff, rigid) = (member.response(), solved(member.plan_with(&rigid), &member.loads));
        let off = difference(&stiff, &rigid, &member);
        prop_assert!(off <= 1e-6, "{off}");
    }

    /// A prop on a spring of no stiffness is no prop, on one of great stiffness a rigid one.
    #[test]
    fn springs_between_nothing_and_rigid(member in drawn(2.0..13.0, false)) {
        let without = member.response();
        let none = solved(propped(&member, 0.0), &member.loads);
        let soft = solved(propped(&member, 1e-6), &member.loads);
        prop_assert!(difference(&without, &none, &member) <= 1e-10);
        prop_assert!(difference(&without, &soft, &member) <= 1e-6);
        let at = Length::from_m(member.spans[0] * 0.45);
        let rigid = solved(member.plan().support(Support::roller("prop", at)), &member.loads);
        let stiff = solved(propped(&member, 1e18), &member.loads);
        let off = difference(&rigid, &stiff, &member);
        prop_assert!(off <= 1e-6, "{off}");
        let force = |r: &Response| r.reaction(ALL, FIRST, "prop").unwrap().force.to_N();
        prop_assert!(force(&none).abs() <= 1e-9);
    }

    /// A member that hardly yields in shear is one that does not.
    #[test]
    fn shear_rigid(mut member in drawn(4.0..9.0, false)) {
        member.shear = Some(1e12);
        let stiff = member.response();
        member.shear = None;
        let off = difference(&stiff, &member.response(), &member);
        prop_assert!(off <= 1e-6, "{off}");
    }
}
