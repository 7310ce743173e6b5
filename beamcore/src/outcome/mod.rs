//! The outcome: all results of a job as one document, addressed by path.

mod assumptions;
mod assumptions_layers;
mod assumptions_loads;
mod build;
mod build_deflection;
mod build_forces;
mod build_layers;
mod build_section;
mod build_simplified;
mod document;
mod document_deflection;
mod document_forces;
mod document_layers;
mod document_member;
mod document_section;
mod document_simplified;
mod extremes;
mod figure;
mod mass;
mod notes;
mod page;
mod summary;
mod summary_deflection;
mod summary_layers;
mod summary_member;
mod summary_reactions;
mod summary_simplified;
mod warnings;
mod warnings_layers;

use crate::error::{ErrorKind, Problem, Result};
use crate::job::{Job, Step, steps};
use crate::path;
use document::OutcomeDocument;
use serde_json::Value;

/// The version of the outcome document that this library writes.
pub const VERSION: u32 = 1;

/// All results of a job, with its inputs, what was assumed and what was not checked.
#[derive(Clone, Debug)]
pub struct Outcome {
    document: OutcomeDocument,
    value: Value,
}

impl Job {
    /// Solves the job.
    ///
    /// # Errors
    /// [`ErrorKind::Numerical`] if a result is not a finite number, as when loads are beyond all
    /// measure.
    pub fn solve(&self) -> Result<Outcome> {
        Outcome::of(self)
    }
}

impl Outcome {
    fn of(job: &Job) -> Result<Self> {
        let document = build::outcome(job)?;
        let value = serde_json::to_value(&document).expect("an outcome is plain data");
        if let Some(at) = not_finite(&value, "") {
            return Err(Problem::new(
                ErrorKind::Numerical,
                at,
                "a result that is not a finite number",
                "loads and sizes within the range of the arithmetic",
            )
            .into());
        }
        Ok(Self { document, value })
    }

    /// The outcome as JSON.
    #[must_use]
    pub fn to_json(&self) -> String {
        serde_json::to_string_pretty(&self.document).expect("an outcome is plain data")
    }

    /// The outcome as a plain text of 80 columns, for reading.
    #[must_use]
    pub fn summary(&self) -> String {
        summary::text(&self.document)
    }

    /// The number at a path, in the SI unit that the path ends with, for example
    /// `combinations["quasi-permanent"].final.deflection.greatest.value_m`.
    ///
    /// # Errors
    /// [`ErrorKind::Lookup`] if there is nothing at the path, or something else than a number.
    pub fn number(&self, path: &str) -> Result<f64> {
        self.at(path)?.as_f64().ok_or_else(|| {
            Problem::new(ErrorKind::Lookup, path, "no number", "the path of a number").into()
        })
    }

    /// The text at a path, for example `job.mark` or `warnings[0]`.
    ///
    /// # Errors
    /// [`ErrorKind::Lookup`] if there is nothing at the path, or something else than a text.
    pub fn text(&self, path: &str) -> Result<String> {
        self.at(path)?.as_str().map(Into::into).ok_or_else(|| {
            Problem::new(ErrorKind::Lookup, path, "no text", "the path of a text").into()
        })
    }

    /// Follows a path; the error tells how far it leads and what is there.
    fn at(&self, path: &str) -> Result<&Value> {
        let mut value = &self.value;
        let mut reached = String::new();
        for step in steps(path) {
            let (next, longer) = match &step {
                Step::Key(key) => (value.get(key), path::key(&reached, key)),
                Step::Named(name) => (named(value, name), path::named(&reached, name)),
                Step::Index(i) => (value.get(i), path::indexed(&reached, *i)),
            };
            let Some(next) = next else {
                return Err(missing(path, &reached, value));
            };
            (value, reached) = (next, longer);
        }
        if reached == path {
            Ok(value)
        } else {
            Err(missing(path, &reached, value))
        }
    }
}

/// The thing of a name: the value of a key, or the element of a list that bears the name.
fn named<'a>(value: &'a Value, name: &str) -> Option<&'a Value> {
    match value {
        Value::Array(list) => list
            .iter()
            .find(|item| item.get("name").and_then(Value::as_str) == Some(name)),
        other => other.get(name),
    }
}

fn missing(path: &str, reached: &str, value: &Value) -> crate::Error {
    let here = if reached.is_empty() {
        "at the root"
    } else {
        reached
    };
    let known: Vec<String> = match value {
        Value::Object(map) => map.keys().cloned().collect(),
        Value::Array(list) => list
            .iter()
            .enumerate()
            .map(|(i, item)| {
                let name = item.get("name").and_then(Value::as_str);
                name.map_or_else(|| format!("[{i}]"), |name| path::named("", name))
            })
            .collect(),
        _ => Vec::new(),
    };
    let expected = if known.is_empty() {
        format!("the path to end at {here}")
    } else {
        format!("after {here} one of {}", known.join(", "))
    };
    Problem::new(ErrorKind::Lookup, path, "no result", expected).into()
}

/// The path of the first number that JSON cannot hold (it becomes null). Paths are made only on the
/// way to it: an outcome has a thousand numbers, and next to always all of them are finite.
fn not_finite(value: &Value, base: &str) -> Option<String> {
    if !holds_null(value) {
        return None;
    }
    match value {
        Value::Null => Some(base.to_owned()),
        Value::Array(list) => list
            .iter()
            .enumerate()
            .find_map(|(i, item)| not_finite(item, &path::indexed(base, i))),
        Value::Object(map) => map
            .iter()
            .find_map(|(key, item)| not_finite(item, &path::key(base, key))),
        Value::Bool(_) | Value::Number(_) | Value::String(_) => None,
    }
}

fn holds_null(value: &Value) -> bool {
    match value {
        Value::Null => true,
        Value::Array(list) => list.iter().any(holds_null),
        Value::Object(map) => map.values().any(holds_null),
        Value::Bool(_) | Value::Number(_) | Value::String(_) => false,
    }
}

/// The JSON schema of the outcome document.
#[must_use]
pub fn schema() -> String {
    serde_json::to_string_pretty(&schemars::schema_for!(OutcomeDocument))
        .expect("a schema is plain data")
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn a_number_that_json_cannot_hold_is_found_by_its_path() {
        let whole = serde_json::json!({"a": [1.0, {"b": 2.0}]});
        assert_eq!(not_finite(&whole, ""), None);
        let broken = serde_json::json!({"a": [1.0, {"b": null}], "c": null});
        assert_eq!(not_finite(&broken, "").as_deref(), Some("a[1].b"));
    }
}
