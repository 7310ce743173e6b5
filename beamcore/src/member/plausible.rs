//! Values far out of the usual range: no errors, but likely slips of a unit.

use super::load::Load;
use super::plan::MemberPlan;
use crate::path;
use crate::units::{AreaLoad, Density, Force, Length, LineLoad, Modulus, Moment, Quantity};

/// The usual range of a quantity for members of buildings and machines (common practice, no
/// source), with what is mixed up when a value lies far outside.
trait Usual: Quantity {
    const LEAST: f64;
    const MOST: f64;
    const SLIP: &'static str;
}

impl Usual for LineLoad {
    const LEAST: f64 = 20.0;
    const MOST: f64 = 1e6;
    const SLIP: &'static str = "N/m and kN/m";
}

impl Usual for AreaLoad {
    const LEAST: f64 = 20.0;
    const MOST: f64 = 2e5;
    const SLIP: &'static str = "N/m2 and kN/m2";
}

impl Usual for Force {
    const LEAST: f64 = 20.0;
    const MOST: f64 = 1e7;
    const SLIP: &'static str = "N and kN";
}

impl Usual for Moment {
    const LEAST: f64 = 10.0;
    const MOST: f64 = 1e7;
    const SLIP: &'static str = "N m and kN m";
}

impl Usual for Length {
    const LEAST: f64 = 1e-4;
    const MOST: f64 = 100.0;
    const SLIP: &'static str = "mm and m";
}

impl Usual for Modulus {
    const LEAST: f64 = 1e6;
    const MOST: f64 = 1e12;
    const SLIP: &'static str = "MPa and GPa";
}

impl Usual for Density {
    const LEAST: f64 = 10.0;
    const MOST: f64 = 25_000.0;
    const SLIP: &'static str = "kg/m3 and t/m3";
}

/// A note for each value of the plan that lies far out of the usual range.
pub(super) fn notes(plan: &MemberPlan) -> Vec<String> {
    let mut notes = Vec::new();
    look(&mut notes, plan.length(), "member.length");
    for part in plan.section().parts() {
        let base = path::named("section.parts", part.name());
        look(
            &mut notes,
            part.outline().width(),
            &format!("{base}: width"),
        );
        look(
            &mut notes,
            part.outline().height(),
            &format!("{base}: height"),
        );
        let material = part.material();
        let base = path::named("materials", material.name());
        look(&mut notes, material.modulus(), &path::key(&base, "modulus"));
        if let Some(density) = material.mean_density() {
            look(&mut notes, density, &path::key(&base, "density"));
        }
    }
    for action in plan.actions() {
        let loads = path::key(&path::named("actions", action.name()), "loads");
        for (i, load) in action.loads().iter().enumerate() {
            let at = path::key(&path::indexed(&loads, i), load.name());
            match load.clone() {
                Load::SelfWeight
                | Load::Settlement { .. }
                | Load::ImposedRotation { .. }
                | Load::Temperature { .. }
                | Load::TemperatureDifference { .. }
                | Load::Strain { .. } => {}
                Load::Plan { load, .. } => look(&mut notes, load, &at),
                Load::Axial { load, .. } | Load::Prestress { force: load, .. } => {
                    look(&mut notes, load, &at);
                }
                Load::Uniform { load } | Load::Partial { load, .. } => look(&mut notes, load, &at),
                Load::Trapezoidal {
                    load_from, load_to, ..
                } => look(&mut notes, load_from.abs().max(load_to.abs()), &at),
                Load::Area { load, .. } => look(&mut notes, load, &at),
                Load::Point { load, .. } => look(&mut notes, load, &at),
                Load::Couple { couple, .. } => look(&mut notes, couple, &at),
            }
        }
    }
    notes.dedup();
    notes
}

fn look<Q: Usual>(notes: &mut Vec<String>, value: Q, at: &str) {
    let size = value.si().abs();
    if size != 0.0 && !(Q::LEAST..=Q::MOST).contains(&size) {
        notes.push(format!(
            "UNUSUAL: {at} is {value}; were {} mixed up? (usual from {} to {})",
            Q::SLIP,
            Q::from_si(Q::LEAST),
            Q::from_si(Q::MOST)
        ));
    }
}

#[cfg(test)]
mod tests {
    use crate::material::{ServiceClass, timber};
    use crate::member::{Action, Member};
    use crate::section::{Part, Section, rectangle};
    use crate::units::Number;

    #[test]
    fn a_slip_of_the_unit_is_noted() {
        let timber = timber("C24", ServiceClass::One).unwrap();
        let joist = Part::new("joist", rectangle(75.mm(), 220.mm()), timber);
        let plan = Member::simple_span(Section::of([joist]).unwrap(), 4.m());
        let right = plan
            .clone()
            .action(Action::permanent("g").uniform(5.kN_per_m()));
        assert!(right.check().unwrap().notes().is_empty());
        let wrong = plan.action(Action::permanent("g").uniform(5.N_per_m()));
        assert_eq!(
            wrong.check().unwrap().notes(),
            [
                "UNUSUAL: actions[\"g\"].loads[0].uniform is 5 N/m; were N/m and kN/m mixed up? \
              (usual from 20 N/m to 1000 kN/m)"
            ]
        );
    }
}
