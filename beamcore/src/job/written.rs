//! Quantities as they stand in a document: a text with a number and a unit.

use crate::error::Problem;
use crate::units::{
    Angle, AreaLoad, Curvature, Density, Duration, FastenerStiffness, Force, Length, LineLoad,
    LineMass, Modulus, Moment, Quantity, RotationalStiffness, ShearStiffness, SlipModulus,
    SpringStiffness, Strain, Stress, TemperatureChange, ThermalExpansion,
};
use schemars::{JsonSchema, Schema, SchemaGenerator};
use serde::{Deserialize, Serialize};
use std::borrow::Cow;
use std::marker::PhantomData;

/// The text of a quantity of one type; kept as written, so that the outcome can echo it.
#[derive(Clone, Debug, PartialEq, Eq, Serialize, Deserialize)]
#[serde(transparent)]
pub(crate) struct Written<Q> {
    text: String,
    #[serde(skip)]
    quantity: PhantomData<Q>,
}

impl<Q> Written<Q> {
    /// The text as it was written.
    pub(super) fn text(&self) -> &str {
        &self.text
    }
}

impl<Q: Quantity> Written<Q> {
    /// The quantity; `None` if the text is wrong, which the check against the schema has told.
    pub(super) fn value(&self) -> Option<Q> {
        Q::parse_at(&self.text, "").ok()
    }
}

impl<Q: Quantity> JsonSchema for Written<Q> {
    fn inline_schema() -> bool {
        true
    }

    fn schema_name() -> Cow<'static, str> {
        Cow::Borrowed(Q::NAME)
    }

    fn json_schema(_: &mut SchemaGenerator) -> Schema {
        let units: Vec<_> = Q::UNITS.iter().map(|unit| unit.symbol).collect();
        schemars::json_schema!({
            "type": "string",
            "x-quantity": Q::NAME,
            "description": format!("A {} with its unit: {}.", Q::NOUN, units.join(", ")),
        })
    }
}

/// What is wrong with the text of a quantity, given the name of its type.
pub(super) fn problem(name: &str, text: &str, path: &str) -> Option<Problem> {
    fn of<Q: Quantity>(text: &str, path: &str) -> Option<Problem> {
        Q::parse_at(text, path).err()
    }
    // The types of the job document; a new one must be added here, as the test below demands.
    let check = [
        (
            Length::NAME,
            of::<Length> as fn(&str, &str) -> Option<Problem>,
        ),
        (Force::NAME, of::<Force>),
        (LineLoad::NAME, of::<LineLoad>),
        (AreaLoad::NAME, of::<AreaLoad>),
        (LineMass::NAME, of::<LineMass>),
        (Strain::NAME, of::<Strain>),
        (Curvature::NAME, of::<Curvature>),
        (Moment::NAME, of::<Moment>),
        (Stress::NAME, of::<Stress>),
        (Modulus::NAME, of::<Modulus>),
        (Density::NAME, of::<Density>),
        (Duration::NAME, of::<Duration>),
        (ThermalExpansion::NAME, of::<ThermalExpansion>),
        (SlipModulus::NAME, of::<SlipModulus>),
        (FastenerStiffness::NAME, of::<FastenerStiffness>),
        (Angle::NAME, of::<Angle>),
        (SpringStiffness::NAME, of::<SpringStiffness>),
        (RotationalStiffness::NAME, of::<RotationalStiffness>),
        (ShearStiffness::NAME, of::<ShearStiffness>),
        (TemperatureChange::NAME, of::<TemperatureChange>),
    ]
    .into_iter()
    .find_map(|(type_name, check)| (type_name == name).then_some(check));
    check.expect("every quantity of the job document is listed")(text, path)
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn every_quantity_of_the_schema_can_be_checked() {
        let schema = crate::job::schema();
        let names: Vec<_> = schema
            .lines()
            .filter_map(|line| line.trim().strip_prefix("\"x-quantity\": \""))
            .map(|rest| rest.trim_end_matches([',', '"']))
            .collect();
        assert!(names.len() > 10);
        for name in names {
            let problem = problem(name, "1 furlong", "here").expect("furlongs are no unit of ours");
            assert_eq!(problem.path(), "here");
        }
    }
}
