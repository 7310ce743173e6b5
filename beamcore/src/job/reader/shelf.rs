//! A small job of the tests' own: a shelf, its schema, and what stands for the room of units.

use std::collections::BTreeMap;

use schemars::JsonSchema;
use serde::{Deserialize, Serialize};
use serde_json::Value;

use super::strict::{Checked, check};
use super::tree::{Format, read};
use crate::error::{ErrorKind, Problem};

/// A length as it is written.
#[derive(Debug, Clone, PartialEq, Deserialize, Serialize, JsonSchema)]
#[serde(transparent)]
#[schemars(extend("x-quantity" = "Length"))]
pub(super) struct Written(String);

#[derive(Debug, PartialEq, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct Shelf {
    /// The title of the shelf. It is printed on the label.
    title: String,
    /// The length of the board.
    length: Written,
    depth: Option<Written>,
    /// How many boards there are.
    #[serde(default)]
    pub(super) boards: Option<u8>,
    pub(super) share: Option<f64>,
    polished: Option<bool>,
    edge: Option<Edge>,
    #[serde(default)]
    brackets: Vec<Bracket>,
    #[serde(default)]
    woods: BTreeMap<String, Wood>,
    corner: Option<[Written; 2]>,
    /// E modulus of the board
    modulus: Option<Grade>,
}

#[derive(Debug, PartialEq, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case")]
pub(super) enum Edge {
    Sharp,
    /// With a bevel.
    Bevelled,
}

#[derive(Debug, PartialEq, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case", deny_unknown_fields)]
pub(super) enum Grade {
    Unknown,
    Tested { value: f64 },
    Listed(Wood),
}

#[derive(Debug, PartialEq, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct Bracket {
    name: Option<String>,
    /// The place of the bracket from the left end.
    at: Written,
    outline: Outline,
}

#[derive(Debug, PartialEq, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case", deny_unknown_fields)]
pub(super) enum Outline {
    Circle { diameter: Written },
    Rectangle { width: Written, height: Written },
}

#[derive(Debug, PartialEq, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(super) struct Wood {
    density: f64,
}

/// Stands for the room of units: a number, a space and mm or m.
pub(super) fn quantity(kind: &str, text: &str, path: &str) -> Option<Problem> {
    let good = text
        .split_once(' ')
        .is_some_and(|(number, unit)| number.parse::<f64>().is_ok() && ["mm", "m"].contains(&unit));
    let expected = format!("a {} with mm or m", kind.to_lowercase());
    (!good).then(|| Problem::new(ErrorKind::Unit, path, format!("{text:?}"), expected))
}

pub(super) fn schema() -> Value {
    schemars::schema_for!(Shelf).to_value()
}

pub(super) fn checked(text: &str, format: Format) -> Checked {
    let node = read(text, format).unwrap_or_else(|error| panic!("{error}\nin\n{text}"));
    check(&node, &schema(), &quantity)
}

/// Asserts the problems of a TOML text, word for word, and whether it is complete.
#[track_caller]
pub(super) fn assert_problems(text: &str, complete: bool, expected: &[(ErrorKind, &str)]) {
    let checked = checked(text, Format::Toml);
    let found: Vec<_> = checked
        .problems
        .iter()
        .map(|problem| (problem.kind(), problem.to_string()))
        .collect();
    let expected: Vec<_> = expected
        .iter()
        .map(|(kind, words)| (*kind, (*words).to_owned()))
        .collect();
    assert_eq!(found, expected);
    assert_eq!(checked.complete, complete);
    let shelf = serde_json::from_value::<Shelf>(checked.value);
    assert_eq!(shelf.is_ok(), complete, "{shelf:?}");
}

/// What every shelf needs; other keys follow from line 3.
pub(super) const HEAD: &str = "title = \"Books\"\nlength = \"900 mm\"\n";

pub(super) const WHOLE: &str = r#"{
 "title": "Books", "length": "900 mm", "depth": "0.3 m", "boards": 4, "share": 1,
 "polished": true, "edge": "bevelled",
 "brackets": [
  {"name": "left", "at": "0 mm", "outline": {"circle": {"diameter": "9 mm"}}},
  {"at": "900 mm", "outline": {"rectangle": {"width": "9 mm", "height": "20 mm"}}}
 ],
 "woods": {"oak": {"density": 700.5}}, "corner": ["1 mm", "2 mm"],
 "modulus": {"tested": {"value": 1e3}}
}"#;
