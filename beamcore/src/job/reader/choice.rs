//! Checking a value that may be one of several: fixed texts, tables of one key, other values.

use serde_json::{Map, Value};

use super::nearest::nearest;
use super::shape::{Choice, Shape};
use super::steps;
use super::strict::{Walk, plain, unknown_key};
use super::tree::{Key, Node, NodeValue, shortened};
use super::words::{alternatives, one_key_of};
use crate::error::{ErrorKind, Problem};
use crate::path;

impl Walk<'_> {
    /// The value of a node that may be one of several; of other values the first whose type fits
    /// is taken.
    pub(super) fn choice(&mut self, node: &Node, shape: &Choice<'_>, path: &str) -> Value {
        if let NodeValue::Text(text) = &node.value
            && shape.words.contains(&&**text)
        {
            return plain(node);
        }
        let other = shape
            .others
            .iter()
            .find(|schema| takes(&schema.shape(), node));
        if let NodeValue::Table(entries) = &node.value
            && shape
                .variants
                .iter()
                .any(|(name, _)| other.is_none() || node.get(name).is_some())
        {
            return self.variant(node, entries, shape, path);
        }
        if let Some(schema) = other {
            return self.value(node, *schema, path);
        }
        match &node.value {
            NodeValue::Text(text) if !shape.words.is_empty() => {
                let found = format!("the name {}", shortened(text));
                // The key of a table, given as a text, is not a slip of the pen.
                let near = nearest(text, shape.words.iter().copied())
                    .filter(|_| shape.variants.iter().all(|(name, _)| name != text));
                let expected = near.map_or_else(|| alternatives(shape), path::quoted);
                let path = steps::shown(path);
                self.note(
                    node.line,
                    Problem::new(ErrorKind::Name, path, found, expected),
                );
                plain(node)
            }
            _ => self.wrong_type(node, &alternatives(shape), path),
        }
    }

    /// A table of exactly one key, which says what its value is.
    fn variant(
        &mut self,
        node: &Node,
        entries: &[(Key, Node)],
        shape: &Choice<'_>,
        path: &str,
    ) -> Value {
        let names: Vec<&str> = shape.variants.iter().map(|(name, _)| *name).collect();
        let given: Vec<&str> = entries
            .iter()
            .map(|(key, _)| &*key.name)
            .filter(|name| names.contains(name))
            .collect();
        if given.len() != 1 {
            self.complete = false;
        }
        if entries.is_empty() || given.len() > 1 {
            let (kind, found) = match &*given {
                [] => (ErrorKind::Missing, "a table without a key".to_owned()),
                given => (ErrorKind::Key, format!("the keys {}", given.join(", "))),
            };
            let problem = Problem::new(kind, steps::shown(path), found, one_key_of(&names));
            self.problems.push(problem.on_line(node.line));
        }
        let mut map = Map::new();
        for (key, node) in entries {
            match shape.variants.iter().find(|(name, _)| *name == key.name) {
                Some((name, schema)) => {
                    let value = self.value(node, *schema, &path::key(path, name));
                    map.insert(key.name.clone(), value);
                }
                None => {
                    // Beside a key that is known this one is too much; alone it is a wrong name.
                    let kind = if given.is_empty() {
                        ErrorKind::Name
                    } else {
                        ErrorKind::Key
                    };
                    self.problems.push(unknown_key(kind, key, &names, path));
                }
            }
        }
        Value::Object(map)
    }
}

/// Whether a value is of the type that a shape asks for.
fn takes(shape: &Shape<'_>, node: &Node) -> bool {
    match (shape, &node.value) {
        (Shape::Any, _)
        | (Shape::Text | Shape::Quantity(_), NodeValue::Text(_))
        | (Shape::Number, NodeValue::Number(_) | NodeValue::Integer(_))
        | (Shape::Integer, NodeValue::Integer(_))
        | (Shape::Bool, NodeValue::Bool(_))
        | (Shape::List(_), NodeValue::Array(_))
        | (Shape::Table(_), NodeValue::Table(_)) => true,
        // A bare number is meant for a quantity, and is told so.
        (Shape::Quantity(_), NodeValue::Number(_) | NodeValue::Integer(_)) => true,
        _ => false,
    }
}

#[cfg(test)]
#[path = "choice_tests.rs"]
mod tests;
