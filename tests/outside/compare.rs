//! Compares a member with expected values, relative to the peak of each field.

use super::read::{layers, member, name, number, numbers, tables, text};
use beamcore::field::Field;
use beamcore::member::Member;
use beamcore::response::Response;
use beamcore::time::Time;
use beamcore::units::{Force, Length, Moment, Quantity};
use toml::Table;

/// What the rounding of a whole solution may come to, relative to the peak of a field.
const ROUNDING: f64 = 1e-11;

/// A solved member that is compared with a case.
pub struct Check<'a> {
    case: &'a str,
    pub response: Response,
    tolerance: f64,
}

impl<'a> Check<'a> {
    /// The member of a case, to be compared with a tolerance relative to each field's peak.
    pub fn new(case: &'a str, member: Member, tolerance: f64) -> Self {
        let response = member.solve();
        Self {
            case,
            response,
            tolerance,
        }
    }

    /// Compares a number with the one that is expected, relative to a peak; the error estimate of
    /// the response must tell of what it is off by more than rounding.
    pub fn near(&self, what: &str, value: f64, expected: f64, peak: f64) {
        let (off, peak) = ((value - expected).abs(), peak.abs());
        let told = self.response.residual() + ROUNDING;
        let seen = format!("{}: {what} is {value}, expected {expected}", self.case);
        assert!(
            off <= self.tolerance * peak,
            "{seen}, off by {}",
            off / peak
        );
        assert!(
            off <= told * peak,
            "{seen}, off by {}; told were {told}",
            off / peak
        );
    }

    /// Compares a field at a place with the number of a table under a key.
    pub fn at<Q: Quantity>(&self, key: &str, case: &Table, field: &Field<Q>, x: Length) {
        self.compare(key, field, &[x.to_m()], &[number(case, key)]);
    }

    /// Compares a field at places with the numbers that are expected there.
    pub fn compare<Q: Quantity>(&self, what: &str, field: &Field<Q>, x: &[f64], expected: &[f64]) {
        let peak = field.greatest().value.si();
        assert_eq!(x.len(), expected.len());
        for (x, expected) in x.iter().zip(expected) {
            let value = field.value(Length::from_m(*x)).unwrap().si();
            self.near(&format!("{what} at {x} m"), value, *expected, peak);
        }
    }

    /// Compares the deflection at a place.
    pub fn value(&self, quantity: &str, x: f64, expected: f64) {
        self.field(quantity, &[x], &[expected]);
    }

    fn field(&self, quantity: &str, x: &[f64], expected: &[f64]) {
        let (r, all, first) = (&self.response, "permanent", Time::Initial);
        match quantity {
            "w_m" => self.compare(quantity, &r.deflection(all, first).unwrap(), x, expected),
            "theta_rad" => self.compare(quantity, &r.rotation(all, first).unwrap(), x, expected),
            "V_N" => self.compare_forces(&r.shear(all, first).unwrap(), x, expected),
            "M_Nm" => {
                let expected: Vec<_> = x
                    .iter()
                    .zip(expected)
                    .map(|(x, m)| m + self.to_centroid(*x))
                    .collect();
                self.compare(quantity, &r.moment(all, first).unwrap(), x, &expected);
            }
            other => panic!("{}: unknown quantity {other}", self.case),
        }
    }

    /// What is added to a moment about z = 0 to have it about the elastic centroid.
    fn to_centroid(&self, x: f64) -> f64 {
        let x = Length::from_m(x);
        let axial = self.response.axial("permanent", Time::Initial).unwrap();
        let section = self.response.member().section_at(x).unwrap();
        let arm = section.stiffness(Time::Initial).centroid_z();
        (axial.value(x).unwrap() * arm).si()
    }

    /// The size of the forces: of the shear, and of the couple of forces that makes the moment.
    fn force_scale(&self) -> f64 {
        let peak = |m: &Field<Moment>| m.greatest().value.si().abs();
        let moment = self.response.moment("permanent", Time::Initial).unwrap();
        let shear = self.response.shear("permanent", Time::Initial).unwrap();
        let shear = shear.greatest().value.si().abs();
        shear.max(peak(&moment) / self.response.member().length().si())
    }

    fn compare_forces(&self, shear: &Field<Force>, x: &[f64], expected: &[f64]) {
        for (x, expected) in x.iter().zip(expected) {
            let value = shear.value(Length::from_m(*x)).unwrap().si();
            self.near(&format!("V at {x} m"), value, *expected, self.force_scale());
        }
    }

    /// Compares the upward reaction of a support.
    pub fn reaction(&self, support: &str, expected: f64) {
        let reaction = self.response.reaction("permanent", Time::Initial, support);
        let force = reaction.unwrap().force.si();
        let scale = self.force_scale();
        self.near(&format!("reaction of {support}"), force, expected, scale);
    }

    /// Compares all fields of a table, of a member of so many layers.
    pub fn fields(&self, table: &Table, layers: usize) {
        let x = numbers(table, "x_m");
        for quantity in ["w_m", "theta_rad", "V_N", "M_Nm"] {
            self.field(quantity, &x, &numbers(table, quantity));
        }
        if layers == 1 {
            return;
        }
        for i in 0..layers {
            let expected = numbers(table, &format!("N_{}_N", i + 1));
            let forces = self
                .response
                .layer("permanent", Time::Initial, &name("layer", i))
                .unwrap();
            self.compare(&name("N of layer", i), &forces.axial, &x, &expected);
        }
        for j in 0..layers - 1 {
            self.slips(j, &x, &numbers(table, &format!("slip_{}_m", j + 1)));
        }
    }

    /// Slips are compared where both layers of the joint are.
    fn slips(&self, j: usize, x: &[f64], expected: &[f64]) {
        let joint = self
            .response
            .joint("permanent", Time::Initial, &name("joint", j))
            .unwrap();
        let section = self.response.member().section();
        let upper = &section.layers()[j];
        let is_there = |x: f64| {
            upper
                .extent()
                .is_none_or(|(from, to)| from.to_m() <= x && x < to.to_m())
        };
        let both = x.iter().zip(expected).filter(|(x, _)| is_there(**x));
        let (x, expected): (Vec<_>, Vec<_>) = both.unzip();
        self.compare(&name("slip", j), &joint.slip, &x, &expected);
    }
}

/// Compares the fields and reactions of a result with those of its case.
pub fn compare_fields(case: &Table, tolerance: f64) {
    let check = Check::new(text(case, "name"), member(case), tolerance);
    let result = case["result"].as_table().unwrap();
    check.fields(result["field"].as_table().unwrap(), layers(case).len());
    let nodes: Vec<_> = tables(case, "node").map(|n| number(n, "x_m")).collect();
    for reaction in tables(result, "reaction") {
        let x = number(reaction, "x_m");
        let node = nodes.iter().position(|at| *at == x).unwrap();
        check.reaction(&name("node", node), number(reaction, "R_N"));
    }
}

/// Compares single values with those of a case.
pub fn compare_values(case: &Table, tolerance: f64) {
    let check = Check::new(text(case, "name"), member(case), tolerance);
    let nodes: Vec<_> = tables(case, "node").map(|n| number(n, "x_m")).collect();
    for value in tables(case, "value") {
        let (x, expected) = (number(value, "x_m"), number(value, "value"));
        match text(value, "quantity") {
            "R_N" => {
                let node = nodes.iter().position(|at| *at == x).unwrap();
                check.reaction(&name("node", node), expected);
            }
            quantity => check.value(quantity, x, expected),
        }
    }
    if let Some(lifts) = case.get("lifts") {
        let lifted = check.response.lifted("permanent", Time::Initial).unwrap();
        let last = name("node", nodes.len() - 1);
        let expected = if lifts.as_bool().unwrap() {
            vec![&*last]
        } else {
            vec![]
        };
        assert_eq!(lifted, expected);
    }
}
