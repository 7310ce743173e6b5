//! Equilibrium of layers, joints and supports.

use super::drawn::{ALL, Drawn, FIRST, drawn};
use super::lines::{axial_of, flow_of, lines, moment, moment_of, places};
use beamcore::member::Load;
use proptest::prelude::*;

/// Points and weights of Gauss's rule of five points on the unit interval.
const GAUSS: [(f64, f64); 5] = [
    (0.046_910_077_030_668, 0.118_463_442_528_094_54),
    (0.230_765_344_947_158_45, 0.239_314_335_249_683_24),
    (0.5, 0.284_444_444_444_444_44),
    (0.769_234_655_052_841_5, 0.239_314_335_249_683_24),
    (0.953_089_922_969_332, 0.118_463_442_528_094_54),
];

/// The integral of a function between places, each stretch of which is cut in 24.
pub fn integral(stations: &[f64], f: impl Fn(f64) -> f64) -> f64 {
    let mut sum = 0.0;
    for ends in stations.windows(2) {
        let step = (ends[1] - ends[0]) / 24.0;
        for i in 0..24 {
            let left = ends[0] + f64::from(i) * step;
            let at = |&(t, weight): &(f64, f64)| weight * f(left + t * step);
            sum += step * GAUSS.iter().map(at).sum::<f64>();
        }
    }
    sum
}

proptest! {
    #![proptest_config(ProptestConfig::with_cases(40))]

    /// Without axial load the axial forces of the layers add up to nothing, and the moments of the
    /// layers with the axial forces times their arms make M.
    #[test]
    fn forces_of_layers_add_up(
        member in prop_oneof![drawn(2.0..13.0, false), drawn(4.0..9.0, true)],
    ) {
        let r = member.response();
        let m = moment(&r);
        let names: Vec<_> = (0..member.layers.len()).map(Drawn::layer_name).collect();
        let axial: Vec<_> = names.iter().map(|name| axial_of(&r, name)).collect();
        let own: Vec<_> = names.iter().map(|name| moment_of(&r, name)).collect();
        for x in places(member.length()) {
            let section = r.member().section_at(beamcore::units::Length::from_m(x)).unwrap();
            let whole = section.stiffness(FIRST).centroid_z().to_m();
            let (mut force, mut couple) = (0.0, 0.0);
            for (i, part) in section.placed().iter().enumerate() {
                let n = axial[i].at(x);
                force += n;
                couple += own[i].at(x) - n * (part.centroid_z().to_m() - whole);
            }
            let scale: f64 = axial.iter().map(|line| line.peak).fold(0.0, f64::max);
            prop_assert!(force.abs() <= 1e-11 * scale, "{force} {scale}");
            let slack = (1e-11 + r.residual()) * m.peak;
            prop_assert!((couple - m.at(x)).abs() <= slack, "{couple} {} at {x}", m.at(x));
        }
    }

    /// The flow of the uppermost joint is what the axial force of the uppermost layer grows by.
    #[test]
    fn flow_is_the_change_of_axial_force(
        member in prop_oneof![drawn(4.0..8.0, false), drawn(4.0..7.0, true)],
    ) {
        let r = member.response();
        let Some(last) = member.moduli.len().checked_sub(1) else { return Ok(()) };
        let flow = flow_of(&r, &Drawn::joint_name(last));
        let axial = axial_of(&r, &Drawn::layer_name(last + 1));
        let field = r.joint(ALL, FIRST, &Drawn::joint_name(last)).unwrap().flow;
        let stations: Vec<_> = field.stations().iter().map(|x| x.to_m()).collect();
        for ends in stations.windows(2) {
            let change = axial.left_of(ends[1]) - axial.at(ends[0]);
            let sum = integral(ends, |x| flow.at(x));
            let slack = (1e-10 + r.residual()) * axial.peak;
            prop_assert!((change - sum).abs() <= slack, "{change} {sum}");
        }
    }

    /// Reactions carry the loads, as forces and as moments about the left end.
    #[test]
    fn reactions_balance_the_loads(
        member in prop_oneof![drawn(2.0..13.0, false), drawn(4.0..9.0, true)],
    ) {
        let r = member.response();
        let (mut force, mut couple, mut size) = (0.0, 0.0, 0.0);
        for load in &member.loads {
            let (p, x, c) = match *load {
                Load::Point { load, at } => (load.to_N(), at.to_m(), 0.0),
                Load::Couple { couple, at } => (0.0, at.to_m(), couple.to_N_m()),
                Load::Trapezoidal { load_from, load_to, from, to } => {
                    let (a, b) = (load_from.to_N_per_m(), load_to.to_N_per_m());
                    let length = (to - from).to_m();
                    // The mean and the middle of a trapezoid, by the rule of Simpson.
                    let p = (a + b) / 2.0 * length;
                    let middle = (from + to).to_m() / 2.0;
                    (p, 0.0, p * middle + (b - a) * length * length / 12.0)
                }
                _ => unreachable!("no other loads are drawn"),
            };
            force += p;
            couple += p * x + c;
            size += p.abs() + c.abs() + 9e3;
        }
        for (i, x) in member.supports().iter().enumerate() {
            let reaction = r.reaction(ALL, FIRST, &format!("support {i}")).unwrap();
            force -= reaction.force.to_N();
            couple -= reaction.force.to_N() * x - reaction.couple.to_N_m();
            size += reaction.force.to_N().abs();
        }
        prop_assert!(force.abs() <= 1e-11 * size, "{force} of {size}");
        let length = member.length();
        prop_assert!(couple.abs() <= 1e-11 * size * length, "{couple} of {size}");
    }

    /// Nothing is lost in a member of many layers and joints of all stiffnesses: all fields are
    /// finite, and the estimate is small where the section does not vary.
    #[test]
    fn every_joint_is_solved(member in drawn(0.0..18.0, false)) {
        let r = member.response();
        prop_assert!(r.residual() <= 2e-12, "{}", r.residual());
        for line in lines(&r, &member) {
            for x in places(member.length()) {
                let value = line.at(x);
                prop_assert!(value.is_finite() && value.abs() <= line.peak * (1.0 + 1e-9));
            }
        }
    }
}
