//! Laws that hold for every member and section, tried on random ones.

use beamcore::material::{Creep, Material};
use beamcore::member::{Action, CombinationFactors, Load, Member, Support};
use beamcore::response::Response;
use beamcore::section::{Part, Section, rectangle};
use beamcore::time::Time;
use beamcore::units::{Length, LineLoad, Modulus, Moment, Number, Stress};
use proptest::prelude::*;

/// Sizes of a stack of three parts, in mm, with their moduli in GPa and creep factors.
#[derive(Clone, Debug)]
struct Stack {
    widths: [f64; 3],
    heights: [f64; 3],
    moduli: [f64; 3],
    creep: [f64; 3],
}

prop_compose! {
    fn stack()(
        widths in prop::array::uniform3(20.0..400.0f64),
        heights in prop::array::uniform3(5.0..300.0f64),
        moduli in prop::array::uniform3(0.3..210.0f64),
        creep in prop::array::uniform3(0.0..3.0f64),
    ) -> Stack {
        Stack { widths, heights, moduli, creep }
    }
}

impl Stack {
    fn material(&self, i: usize) -> Material {
        Material::new(
            format!("m{i}"),
            Modulus::from_GPa(self.moduli[i]),
            Creep::factor(self.creep[i]),
        )
    }

    fn part(&self, i: usize) -> Part {
        let outline = rectangle(self.widths[i].mm(), self.heights[i].mm());
        Part::new(format!("p{i}"), outline, self.material(i))
    }

    fn section(&self) -> Section {
        let parts = [
            self.part(0),
            self.part(1).above("p0"),
            self.part(2).above("p1"),
        ];
        Section::of(parts).unwrap()
    }
}

fn close(a: f64, b: f64, peak: f64, tolerance: f64) -> bool {
    (a - b).abs() <= tolerance * peak.abs()
}

fn member(section: Section, actions: &[Action]) -> Member {
    let plan = Member::of_length(section, 6.m())
        .support(Support::pin("a", 0.3.m()))
        .support(Support::roller("b", 2.9.m()))
        .support(Support::roller("c", 5.6.m()));
    actions
        .iter()
        .cloned()
        .fold(plan, |plan, action| plan.action(action))
        .check()
        .unwrap()
}

fn loads() -> impl Strategy<Value = Vec<Load>> {
    let point = (-9.0..9.0f64, 0.0..6.0f64).prop_map(|(p, x)| Load::Point {
        load: p.kN(),
        at: x.m(),
    });
    let partial =
        (-9.0..9.0f64, 0.0..2.9f64, 0.1..3.0f64).prop_map(|(q, x, length)| Load::Partial {
            load: q.kN_per_m(),
            from: x.m(),
            to: (x + length).m(),
        });
    let trapezoidal = (-9.0..9.0f64, -9.0..9.0f64, 0.0..2.9f64, 0.1..3.0f64).prop_map(
        |(left, right, x, length)| Load::Trapezoidal {
            load_from: left.kN_per_m(),
            load_to: right.kN_per_m(),
            from: x.m(),
            to: (x + length).m(),
        },
    );
    let couple = (-9.0..9.0f64, 0.0..6.0f64).prop_map(|(c, x)| Load::Couple {
        couple: c.kN_m(),
        at: x.m(),
    });
    let uniform = (-9.0..9.0f64).prop_map(|q| Load::Uniform { load: q.kN_per_m() });
    let load = prop_oneof![point, partial, trapezoidal, couple, uniform];
    prop::collection::vec(load, 1..5)
}

fn permanent(name: &str, loads: &[Load]) -> Action {
    loads.iter().fold(Action::permanent(name), |action, load| {
        action.load(load.clone())
    })
}

fn deflection_at(response: &Response, time: Time, x: Length) -> f64 {
    response
        .deflection("permanent", time)
        .unwrap()
        .value(x)
        .unwrap()
        .to_m()
}

proptest! {
    /// E_ref x I of the transformed section is EI, whatever the reference; stresses worked out in
    /// it and taken back to the part's own material are those of the E-weighted sums.
    #[test]
    fn the_reference_material_is_presentation_only(stack in stack(), m in -50.0..50.0f64) {
        let section = stack.section();
        let moment = Moment::from_kN_m(m);
        for time in Time::ALL {
            let stiffness = section.stiffness(time);
            let ei = stiffness.bending_yy().to_N_m2();
            for reference in ["m0", "m1", "m2"] {
                let t = section.transformed_to(reference, time).unwrap();
                let e_ref = t.reference_modulus().to_Pa();
                prop_assert!(close(e_ref * t.second_moment().to_m4(), ei, ei, 1e-12));
                let ea = stiffness.axial().to_N();
                prop_assert!(close(e_ref * t.area().to_m2(), ea, ea, 1e-12));
                for (i, part) in section.placed().iter().enumerate() {
                    let e = stiffness.moduli()[i].to_Pa();
                    let top = part.top();
                    let arm = (top - stiffness.centroid_z()).to_m();
                    let own = -e * moment.to_N_m() * arm / ei;
                    let peak = e * moment.to_N_m() * 0.9 / ei;
                    let back: Stress = t.stress(part.name(), top, moment).unwrap();
                    prop_assert!(close(back.to_Pa(), own, peak, 1e-12));
                }
            }
        }
    }

    /// The stresses of all parts add up to no axial force and to the moment.
    #[test]
    fn stresses_are_in_equilibrium(stack in stack(), q in 1.0..20.0f64) {
        let section = stack.section();
        let placed = section.placed().to_vec();
        let member = Member::simple_span(section, 5.m())
            .action(Action::permanent("g").uniform(q.kN_per_m()))
            .action(Action::variable("q", CombinationFactors { psi_0: 0.7, psi_1: 0.5, psi_2: 0.3 })
                .point(q.kN(), 2.m()))
            .check().unwrap();
        let response = member.solve();
        for time in Time::ALL {
            let x = 2.2.m();
            let moment = response.moment("characteristic", time).unwrap().value(x).unwrap();
            let (mut force, mut couple, mut size) = (0.0, 0.0, 0.0);
            for part in &placed {
                let stress = response.stress("characteristic", time, part.name()).unwrap();
                let at = |field: beamcore::field::Field<Stress>| field.value(x).unwrap().to_Pa();
                let (bottom, middle, top) = (at(stress.bottom()), at(stress.centroid()), at(stress.top()));
                let (b, h) = (part.outline().width().to_m(), part.outline().height().to_m());
                prop_assert!(close((bottom + top) / 2.0, middle, bottom.abs().max(top.abs()), 1e-9));
                let n = middle * b * h;
                force += n;
                couple -= n * part.centroid_z().to_m() + (top - bottom) * b * h * h / 12.0;
                size += n.abs();
            }
            prop_assert!(close(force, 0.0, size, 1e-9), "{} {}", force, size);
            prop_assert!(close(couple, moment.to_N_m(), moment.to_N_m(), 1e-9));
        }
    }

    /// Cutting a part in two parts of the same material changes nothing.
    #[test]
    fn splitting_a_part_changes_nothing(stack in stack(), cut in 0.1..0.9f64) {
        let whole = stack.section();
        let lower = rectangle(stack.widths[1].mm(), (stack.heights[1] * cut).mm());
        let upper = rectangle(stack.widths[1].mm(), (stack.heights[1] * (1.0 - cut)).mm());
        let parts = [
            stack.part(0),
            Part::new("lower", lower, stack.material(1)).above("p0"),
            Part::new("upper", upper, stack.material(1)).above("lower"),
            stack.part(2).above("upper"),
        ];
        let split = Section::of(parts).unwrap();
        for time in Time::ALL {
            let (a, b) = (whole.stiffness(time), split.stiffness(time));
            let ei = a.bending_yy().to_N_m2();
            prop_assert!(close(b.bending_yy().to_N_m2(), ei, ei, 1e-12));
            prop_assert!(close(b.axial().to_N(), a.axial().to_N(), a.axial().to_N(), 1e-12));
        }
    }

    /// Without creep the final state is the initial one, and with it nothing gets stiffer.
    #[test]
    fn creep_only_softens(stack in stack(), loads in loads()) {
        let mut rigid = stack.clone();
        rigid.creep = [0.0; 3];
        let action = [permanent("g", &loads)];
        let response = member(rigid.section(), &action).solve();
        let w = |time| response.deflection("permanent", time).unwrap().greatest();
        prop_assert_eq!(w(Time::Initial), w(Time::Final));
        let soft = member(stack.section(), &action).solve();
        let w = |time| soft.deflection("permanent", time).unwrap().greatest().value.abs();
        prop_assert!(w(Time::Final) >= w(Time::Initial) * (1.0 - 1e-12));
    }

    /// The response to two actions together is the sum of the responses to each.
    #[test]
    fn actions_superpose(stack in stack(), a in loads(), b in loads(), x in 0.0..6.0f64) {
        let both: Vec<_> = a.iter().chain(&b).cloned().collect();
        let solve = |loads: &[Load]| member(stack.section(), &[permanent("g", loads)]).solve();
        let (ra, rb, rc) = (solve(&a), solve(&b), solve(&both));
        for time in Time::ALL {
            let at = |r| deflection_at(r, time, x.m());
            let peak = [&ra, &rb, &rc].iter()
                .map(|r| r.deflection("permanent", time).unwrap().greatest().value.to_m().abs())
                .fold(0.0, f64::max);
            prop_assert!(close(at(&ra) + at(&rb), at(&rc), peak, 1e-10));
        }
    }

    /// Maxwell-Betti: a force at i moves j as much as the same force at j moves i.
    #[test]
    fn deflections_are_reciprocal(stack in stack(), i in 0.0..6.0f64, j in 0.0..6.0f64) {
        let solve = |at: f64| {
            member(stack.section(), &[permanent("g", &[Load::Point { load: 5.kN(), at: at.m() }])]).solve()
        };
        let (ri, rj) = (solve(i), solve(j));
        let peak = ri.deflection("permanent", Time::Initial).unwrap().greatest().value.to_m();
        let (a, b) = (deflection_at(&ri, Time::Initial, j.m()), deflection_at(&rj, Time::Initial, i.m()));
        prop_assert!(close(a, b, peak, 1e-9), "{} {}", a, b);
    }

    /// The mirror image of a member bends as the mirror image of its line.
    #[test]
    fn the_mirror_image_bends_alike(stack in stack(), p in 1.0..9.0f64, at in 0.0..6.0f64, x in 0.0..6.0f64) {
        let build = |mirror: bool| {
            let place = |x: f64| if mirror { (6.0 - x).m() } else { x.m() };
            Member::of_length(stack.section(), 6.m())
                .support(Support::fixed("a", place(0.0)))
                .support(Support::roller("b", place(4.1)))
                .action(Action::permanent("g").point(p.kN(), place(at)))
                .check().unwrap().solve()
        };
        let (plain, mirrored) = (build(false), build(true));
        let peak = plain.deflection("permanent", Time::Final).unwrap().greatest().value.to_m();
        let a = deflection_at(&plain, Time::Final, x.m());
        let b = deflection_at(&mirrored, Time::Final, (6.0 - x).m());
        // A load that all but stands on the fixed support bends nothing: there the deflection is a
        // difference of forces, known to the rounding of P L^3/EI.
        let stiffness = plain.member().section().stiffness(Time::Final).bending_yy();
        let scale = p.kN().to_N() * 216.0 / stiffness.to_N_m2();
        let slack = 1e-9 * peak.abs() + 1e-14 * scale;
        prop_assert!((a - b).abs() <= slack, "{} {}", a, b);
    }

    /// Reactions carry the loads, and the extremes are not exceeded anywhere on a fine grid.
    #[test]
    fn reactions_balance_and_extremes_hold(stack in stack(), loads in loads()) {
        let response = member(stack.section(), &[permanent("g", &loads)]).solve();
        let total: f64 = loads.iter().map(|load| match *load {
            Load::Point { load, .. } => load.to_N(),
            Load::Partial { load, from, to } => (load * (to - from)).to_N(),
            Load::Trapezoidal { load_from, load_to, from, to } => {
                ((load_from + load_to) / 2.0 * (to - from)).to_N()
            }
            Load::Couple { .. } => 0.0,
            Load::Uniform { load } => (load * 6.m()).to_N(),
            _ => unreachable!("no other loads are drawn"),
        }).sum();
        let size: f64 = loads.len() as f64 * 60e3;
        let sum: f64 = ["a", "b", "c"].iter()
            .map(|s| response.reaction("permanent", Time::Initial, s).unwrap().force.to_N()).sum();
        prop_assert!(close(sum, total, size, 1e-12));
        prop_assert!(response.residual() < 1e-10, "{}", response.residual());
        let field = response.deflection("permanent", Time::Initial).unwrap();
        let (top, bottom) = (field.maximum().value.to_m(), field.minimum().value.to_m());
        let peak = field.greatest().value.to_m().abs();
        for i in 0..=600 {
            let w = field.value((f64::from(i) / 100.0).m()).unwrap().to_m();
            prop_assert!(w <= top + 1e-12 * peak && w >= bottom - 1e-12 * peak);
        }
    }

    /// The numbers do not depend on the unit in which the input was written.
    #[test]
    fn units_do_not_matter(q in 1_u32..40) {
        let metric = LineLoad::from_kN_per_m(f64::from(q));
        let same = LineLoad::from_N_per_mm(f64::from(q));
        prop_assert_eq!(metric, same);
    }
}
