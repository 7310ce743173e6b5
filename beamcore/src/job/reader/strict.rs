//! Checking a document against the schema of the job: every mistake at once, each with its line.

use serde_json::{Map, Value};

use super::nearest::nearest;
use super::shape::{List, Others, Schema, Shape, Table};
use super::steps;
use super::tree::{Key, Node, NodeValue, describe, shortened};
use super::words::{QUANTITY, asked, asked_length, key_of};
use crate::error::{ErrorKind, Problem};
use crate::path;

/// Says what is wrong with the text of a quantity, given the name of its type, the text as it is
/// written and its path; a bare number comes as its text.
pub(crate) type Quantity<'a> = dyn Fn(&str, &str, &str) -> Option<Problem> + 'a;

/// A document that was checked.
pub(crate) struct Checked {
    /// The document without its unknown keys; a bare number in place of a quantity is a text here.
    pub(crate) value: Value,
    /// Everything that is wrong, in the order of the lines.
    pub(crate) problems: Vec<Problem>,
    /// Whether [`Self::value`] has the shape of the schema, for all its problems: they are unknown
    /// keys and quantities only, so that it can be deserialised and its meaning be checked.
    pub(crate) complete: bool,
}

/// Checks a document against a JSON schema.
///
/// Problems are [`ErrorKind::Key`] (unknown key, or two keys where one must be),
/// [`ErrorKind::Missing`], [`ErrorKind::Syntax`] (a value of another type),
/// [`ErrorKind::Name`] (none of the fixed texts or keys), [`ErrorKind::Value`] (a number out of its
/// bounds), [`ErrorKind::Unit`] (a bare number where a quantity must be) and what `quantity` finds.
pub(crate) fn check(node: &Node, schema: &Value, quantity: &Quantity<'_>) -> Checked {
    let mut walk = Walk {
        quantity,
        problems: Vec::new(),
        complete: true,
    };
    let value = walk.value(node, Schema::new(schema), "");
    let Walk {
        mut problems,
        complete,
        ..
    } = walk;
    // A TOML table may be continued below others, so that the walk is not quite in order.
    problems.sort_by_key(Problem::line);
    Checked {
        value,
        problems,
        complete,
    }
}

/// A walk through a document, in step with its schema.
pub(super) struct Walk<'a> {
    quantity: &'a Quantity<'a>,
    pub(super) problems: Vec<Problem>,
    pub(super) complete: bool,
}

impl Walk<'_> {
    /// The value of a node, its problems noted.
    pub(super) fn value(&mut self, node: &Node, schema: Schema<'_>, path: &str) -> Value {
        match (schema.shape(), &node.value) {
            (Shape::Quantity(kind), NodeValue::Text(text)) => {
                let problem = (self.quantity)(kind, text, path);
                self.problems
                    .extend(problem.map(|problem| problem.on_line(node.line)));
                plain(node)
            }
            (Shape::Quantity(kind), NodeValue::Number(number)) => {
                self.bare(node, kind, format!("{number:?}"), path)
            }
            (Shape::Quantity(kind), NodeValue::Integer(number)) => {
                self.bare(node, kind, number.to_string(), path)
            }
            (Shape::Any, _)
            | (Shape::Text, NodeValue::Text(_))
            | (Shape::Bool, NodeValue::Bool(_)) => plain(node),
            (Shape::Number, NodeValue::Number(number)) => {
                self.bounded(node, schema, path, *number, "a number")
            }
            (Shape::Number, NodeValue::Integer(number)) => {
                self.bounded(node, schema, path, *number as f64, "a number")
            }
            (Shape::Integer, NodeValue::Integer(number)) => {
                self.bounded(node, schema, path, *number as f64, "a whole number")
            }
            (Shape::List(shape), NodeValue::Array(list)) => self.list(node, list, &shape, path),
            (Shape::Table(shape), NodeValue::Table(entries)) => {
                self.table(node, entries, &shape, path)
            }
            (Shape::Choice(shape), _) => self.choice(node, &shape, path),
            (shape, _) => self.wrong_type(node, &asked(&shape), path),
        }
    }

    /// Notes a problem after which the document cannot be deserialised.
    pub(super) fn note(&mut self, line: usize, problem: Problem) {
        self.complete = false;
        self.problems.push(problem.on_line(line));
    }

    /// Notes a value of another type than expected.
    pub(super) fn wrong_type(&mut self, node: &Node, expected: &str, path: &str) -> Value {
        let (path, found) = (steps::shown(path), describe(&node.value));
        self.note(
            node.line,
            Problem::new(ErrorKind::Syntax, path, found, expected),
        );
        plain(node)
    }

    /// A bare number in place of a quantity.
    fn bare(&mut self, node: &Node, kind: &str, number: String, path: &str) -> Value {
        let answer = (self.quantity)(kind, &number, path);
        let expected = answer.as_ref().map_or(QUANTITY, Problem::expected);
        let found = format!("{number} without a unit");
        let problem = Problem::new(ErrorKind::Unit, steps::shown(path), found, expected);
        self.problems.push(problem.on_line(node.line));
        Value::String(number)
    }

    fn bounded(
        &mut self,
        node: &Node,
        schema: Schema<'_>,
        path: &str,
        number: f64,
        what: &str,
    ) -> Value {
        if let Some(bound) = schema.broken_bound(number) {
            let (path, found) = (steps::shown(path), describe(&node.value));
            let expected = format!("{what} {bound}");
            self.note(
                node.line,
                Problem::new(ErrorKind::Value, path, found, expected),
            );
        }
        plain(node)
    }

    fn list(&mut self, node: &Node, list: &[Node], shape: &List<'_>, path: &str) -> Value {
        let count = list.len() as u64;
        let short = shape.least.is_some_and(|least| count < least);
        if short || shape.most.is_some_and(|most| count > most) {
            let (path, found) = (steps::shown(path), format!("a list of {count}"));
            let expected = asked_length(shape);
            self.note(
                node.line,
                Problem::new(ErrorKind::Syntax, path, found, expected),
            );
        }
        let elements = list.iter().enumerate().map(|(index, element)| {
            let path = match element.name() {
                Some(name) => path::named(path, name),
                None => path::indexed(path, index),
            };
            match shape.element(index) {
                Some(schema) => self.value(element, schema, &path),
                None => plain(element),
            }
        });
        Value::Array(elements.collect())
    }

    fn table(
        &mut self,
        node: &Node,
        entries: &[(Key, Node)],
        shape: &Table<'_>,
        path: &str,
    ) -> Value {
        let mut map = Map::new();
        for &required in &shape.required {
            if node.get(required).is_none() {
                let schema = shape.keys.iter().find(|(key, _)| *key == required);
                let expected = schema.map_or_else(
                    || "a value".to_owned(),
                    |(_, schema)| schema.sentence().unwrap_or_else(|| asked(&schema.shape())),
                );
                let path = path::key(path, required);
                self.note(
                    node.line,
                    Problem::new(ErrorKind::Missing, path, "nothing", expected),
                );
            }
        }
        for (key, node) in entries {
            let known = shape.keys.iter().find(|(known, _)| *known == key.name);
            let value = match (known, &shape.others) {
                (Some((_, schema)), _) => self.value(node, *schema, &path::key(path, &key.name)),
                (None, Others::Named(schema)) => {
                    self.value(node, *schema, &path::named(path, &key.name))
                }
                (None, Others::Free) => plain(node),
                (None, Others::Refused) => {
                    let names: Vec<&str> = shape.keys.iter().map(|(name, _)| *name).collect();
                    self.problems
                        .push(unknown_key(ErrorKind::Key, key, &names, path));
                    continue;
                }
            };
            map.insert(key.name.clone(), value);
        }
        Value::Object(map)
    }
}

/// The value of a node as it stands.
pub(super) fn plain(node: &Node) -> Value {
    match &node.value {
        NodeValue::Table(entries) => entries
            .iter()
            .map(|(key, node)| (key.name.clone(), plain(node)))
            .collect(),
        NodeValue::Array(list) => list.iter().map(plain).collect(),
        NodeValue::Text(text) => Value::from(&**text),
        NodeValue::Number(number) => Value::from(*number),
        NodeValue::Integer(number) => Value::from(*number),
        NodeValue::Bool(value) => Value::from(*value),
    }
}

/// The problem of a key that is none of the known ones.
pub(super) fn unknown_key(kind: ErrorKind, key: &Key, known: &[&str], path: &str) -> Problem {
    let found = format!("the unknown key {}", shortened(&key.name));
    let expected = match nearest(&key.name, known.iter().copied()) {
        Some(near) => format!("the key {}", path::quoted(near)),
        None => key_of(known),
    };
    Problem::new(kind, path::key(path, &key.name), found, expected).on_line(key.line)
}

#[cfg(test)]
#[path = "strict_tests.rs"]
mod tests;

#[cfg(test)]
#[path = "whole_tests.rs"]
mod whole_tests;
