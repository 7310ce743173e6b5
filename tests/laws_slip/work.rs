//! Work: reciprocity, virtual work, superposition.

use super::drawn::{ALL, Drawn, FIRST, drawn, point, solved};
use super::lines::{axial_of, deflection, flow_of, lines, moment_of, places, rotation, shear};
use super::statics::integral;
use beamcore::member::Load;
use beamcore::units::{Length, Moment};
use proptest::prelude::*;

/// Prismatic and varying members.
fn any_member() -> impl Strategy<Value = Drawn> {
    prop_oneof![drawn(2.0..13.0, false), drawn(4.0..9.0, true)]
}

proptest! {
    #![proptest_config(ProptestConfig::with_cases(40))]

    /// Maxwell-Betti: a force at i moves j as much as the same force at j moves i.
    #[test]
    fn deflections_are_reciprocal(member in any_member(), i in 0.0..1.0f64, j in 0.0..1.0f64) {
        let [i, j] = [i, j].map(|share| share * member.length());
        let [of_i, of_j] = [i, j].map(|at| member.under(&[point(5e3, at)]));
        let (a, b) = (deflection(&of_i), deflection(&of_j));
        let slack = (1e-9 + of_i.residual() + of_j.residual()) * a.peak.max(b.peak);
        prop_assert!((a.at(j) - b.at(i)).abs() <= slack, "{} {}", a.at(j), b.at(i));
    }

    /// Maxwell-Betti: a force at i turns j as a couple at j moves i.
    #[test]
    fn rotations_are_reciprocal(member in any_member(), i in 0.0..1.0f64, j in 0.0..1.0f64) {
        let [i, j] = [i, j].map(|share| share * member.length());
        let of_i = member.under(&[point(1e3, i)]);
        let couple = Load::Couple { couple: Moment::from_N_m(1e3), at: Length::from_m(j) };
        let of_j = member.under(&[couple]);
        let (a, b) = (rotation(&of_i), deflection(&of_j));
        let slack = (1e-9 + of_i.residual() + of_j.residual()) * a.peak.max(b.peak);
        prop_assert!((a.at(j) - b.at(i)).abs() <= slack, "{} {}", a.at(j), b.at(i));
    }

    /// Mueller-Breslau: the deflection line where a support sinks by 1 is the line of influence of
    /// its reaction.
    #[test]
    fn settlements_are_lines_of_influence(
        member in any_member(), x in 0.0..1.0f64, which in 0usize..4,
    ) {
        let x = x * member.length();
        let support = format!("support {}", which % member.supports().len());
        let settlement = Length::from_m(1.0);
        let sunk = member.under(&[Load::Settlement { support: support.clone(), settlement }]);
        let loaded = member.under(&[point(1e3, x)]);
        let force = loaded.reaction(ALL, FIRST, &support).unwrap().force.to_N();
        let w = deflection(&sunk);
        let slack = (1e-9 + sunk.residual() + loaded.residual()) * w.peak;
        prop_assert!((force / 1e3 - w.at(x)).abs() <= slack, "{force} {}", w.at(x));
    }

    /// Virtual work: the deflection at x is the integral of the strains under the loads times the
    /// forces under a unit load at x, over layers, joints and shear.
    #[test]
    fn virtual_work_is_the_deflection(mut member in drawn(3.0..8.0, false), x in 0.0..1.0f64) {
        // With shear the member shares V by its own rule: left to the reciprocity of the others.
        if member.layers.len() > 1 {
            member.shear = None;
        }
        let x = x * member.length();
        let (real, unit) = (member.response(), member.under(&[point(1.0, x)]));
        let mut stations: Vec<f64> = Vec::new();
        for r in [&real, &unit] {
            let field = r.moment(ALL, FIRST).unwrap();
            stations.extend(field.stations().iter().map(|x| x.to_m()));
        }
        stations.sort_by(f64::total_cmp);
        stations.dedup();
        let mut work = 0.0;
        for (i, [width, height, modulus]) in member.layers.iter().enumerate() {
            let name = Drawn::layer_name(i);
            let area = width * height;
            let (ea, ei) = (modulus * area, modulus * area * height * height / 12.0);
            let [n, dn] = [&real, &unit].map(|r| axial_of(r, &name));
            let [m, dm] = [&real, &unit].map(|r| moment_of(r, &name));
            work += integral(&stations, |x| {
                n.at(x) * dn.at(x) / ea + m.at(x) * dm.at(x) / ei
            });
            if let Some(ratio) = member.shear {
                let kga = 5.0 / 6.0 * ratio * ea;
                let [v, dv] = [&real, &unit].map(shear);
                work += integral(&stations, |x| v.at(x) * dv.at(x) / kga);
            }
        }
        for (j, k) in member.moduli.iter().enumerate() {
            let [t, dt] = [&real, &unit].map(|r| flow_of(r, &Drawn::joint_name(j)));
            work += integral(&stations, |x| t.at(x) * dt.at(x) / k);
        }
        let w = deflection(&real);
        prop_assert!((work - w.at(x)).abs() <= 1e-9 * w.peak, "{work} {}", w.at(x));
    }

    /// The response to loads together is the sum of the responses to each.
    #[test]
    fn loads_superpose(member in any_member()) {
        let together = member.response();
        let alone: Vec<_> = member.loads.iter()
            .map(|load| member.under(std::slice::from_ref(load)))
            .collect();
        // Each load cuts a varying member at its own places.
        let told = together.residual() + alone.iter().map(|r| r.residual()).sum::<f64>();
        let alone: Vec<_> = alone.iter().map(|r| lines(r, &member)).collect();
        for (i, line) in lines(&together, &member).iter().enumerate() {
            let peak = alone.iter().map(|lines| lines[i].peak).fold(line.peak, f64::max);
            for x in places(member.length()) {
                let sum: f64 = alone.iter().map(|lines| lines[i].at(x)).sum();
                let slack = (1e-10 + told) * peak;
                prop_assert!((sum - line.at(x)).abs() <= slack, "{} {sum} {}", line.name, line.at(x));
            }
        }
    }

    /// A second action of the same loads doubles everything.
    #[test]
    fn twice_the_loads_is_twice_the_response(member in any_member()) {
        let once = lines(&member.response(), &member);
        let loads = [member.loads.clone(), member.loads.clone()].concat();
        let twice = solved(member.plan(), &loads);
        for (one, two) in once.iter().zip(lines(&twice, &member)) {
            for x in places(member.length()) {
                let slack = 1e-11 * two.peak;
                let off = (2.0 * one.at(x) - two.at(x)).abs();
                prop_assert!(off <= slack, "{} {off} {slack}", one.name);
            }
        }
    }
}
