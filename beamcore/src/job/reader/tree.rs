//! A document as a tree of values that remember their lines.

use super::steps::{self, Step};
use super::{tree_json, tree_toml};
use crate::error::{Error, ErrorKind, Problem, Result};
use crate::path;
use std::str::FromStr;

/// The notation that a document is written in.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub enum Format {
    /// TOML, for documents that are written by hand.
    Toml,
    /// JSON, for documents that are written by programs.
    Json,
}

impl Format {
    /// Both notations.
    pub const ALL: [Self; 2] = [Self::Toml, Self::Json];

    /// The word for the notation, which is also the ending of a file: `toml` or `json`.
    #[must_use]
    pub const fn name(self) -> &'static str {
        match self {
            Self::Toml => "toml",
            Self::Json => "json",
        }
    }
}

/// Reads the word for a notation; any other text is of the kind [`ErrorKind::Name`].
impl FromStr for Format {
    type Err = Error;

    fn from_str(text: &str) -> Result<Self> {
        Self::ALL
            .into_iter()
            .find(|format| format.name() == text)
            .ok_or_else(|| {
                let expected = "one of \"toml\", \"json\"";
                Problem::new(ErrorKind::Name, "format", format!("\"{text}\""), expected).into()
            })
    }
}

/// What a number has to be.
pub(super) const FINITE: &str = "a finite number";

/// What is found where the parsers give up on depth.
pub(super) const TOO_DEEP: &str = "tables and lists nested too deeply";

impl Format {
    /// What a text of this notation has to be.
    const fn complete(self) -> &'static str {
        match self {
            Self::Toml => "a complete TOML document",
            Self::Json => "a complete JSON document",
        }
    }
}

/// A value of the document, with the line (counted from 1) that it begins on.
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct Node {
    /// The line that the value begins on; for a TOML table with a header, the line of the header.
    pub(crate) line: usize,
    /// The value.
    pub(crate) value: NodeValue,
}

/// What a value is.
#[derive(Clone, Debug, PartialEq)]
pub(crate) enum NodeValue {
    /// Keys with their values, in the order of the document; no key is there twice.
    Table(Vec<(Key, Node)>),
    /// A list.
    Array(Vec<Node>),
    /// A text.
    Text(String),
    /// A finite number with a fraction or an exponent, or a whole one too large for an `i64`.
    Number(f64),
    /// A whole number.
    Integer(i64),
    /// True or false.
    Bool(bool),
}

/// A key of a table, with the line (counted from 1) that it stands on.
#[derive(Clone, Debug, PartialEq, Eq)]
pub(crate) struct Key {
    /// The key.
    pub(crate) name: String,
    /// The line of the key.
    pub(crate) line: usize,
}

impl Node {
    /// The value of a key, if this is a table that has it.
    pub(crate) fn get(&self, key: &str) -> Option<&Self> {
        match &self.value {
            NodeValue::Table(entries) => entries
                .iter()
                .find(|(known, _)| known.name == key)
                .map(|(_, node)| node),
            _ => None,
        }
    }

    /// The text under the key `name`, by which an element of a list is addressed.
    pub(crate) fn name(&self) -> Option<&str> {
        match &self.get("name")?.value {
            NodeValue::Text(name) => Some(name),
            _ => None,
        }
    }

    /// The node one step further on a path.
    fn step(&self, step: &Step) -> Option<&Self> {
        match (step, &self.value) {
            (Step::Named(name), NodeValue::Array(list)) => {
                list.iter().find(|element| element.name() == Some(name))
            }
            (Step::Index(index), NodeValue::Array(list)) => list.get(*index),
            (Step::Key(key) | Step::Named(key), _) => self.get(key),
            (Step::Index(_), _) => None,
        }
    }
}

/// Reads a document whose outermost value is a table.
///
/// # Errors
/// [`ErrorKind::Syntax`] if the text is empty, broken or truncated (one problem, with its line),
/// holds JSON's null or a TOML date, or is not a table; [`ErrorKind::Duplicate`] for a key that is
/// given twice; [`ErrorKind::Value`] for NaN, infinity and numbers too large to be held.
pub(crate) fn read(text: &str, format: Format) -> Result<Node> {
    if text.trim().is_empty() {
        return Err(refused(ErrorKind::Syntax, 1, "an empty text", format.complete()).into());
    }
    let node = match format {
        Format::Toml => tree_toml::read(text)?,
        Format::Json => tree_json::read(text)?,
    };
    match &node.value {
        NodeValue::Table(_) => Ok(node),
        other => Err(refused(ErrorKind::Syntax, node.line, &describe(other), "a table").into()),
    }
}

/// The line of the deepest node on a path that the document has.
///
/// A path may lead further than the document does, and an empty path or `document` is the document
/// itself. `None` if not even the first step of the path is in the document.
pub(crate) fn line_of(node: &Node, path: &str) -> Option<usize> {
    let steps = steps::steps(path);
    let mut deepest = node;
    for (done, step) in steps.iter().enumerate() {
        match deepest.step(step) {
            Some(next) => deepest = next,
            None if done == 0 && path != steps::DOCUMENT => return None,
            None => break,
        }
    }
    Some(deepest.line)
}

/// What was found where something else should be: `the number 3`, `a list`.
pub(crate) fn describe(value: &NodeValue) -> String {
    match value {
        NodeValue::Table(_) => "a table".to_owned(),
        NodeValue::Array(_) => "a list".to_owned(),
        NodeValue::Text(text) => format!("the text {}", shortened(text)),
        NodeValue::Number(number) => format!("the number {number:?}"),
        NodeValue::Integer(number) => format!("the number {number}"),
        NodeValue::Bool(value) => format!("the value {value}"),
    }
}

/// A text in quotes, on one line, cut after 60 characters so that a message stays readable.
pub(crate) fn shortened(text: &str) -> String {
    match text.char_indices().nth(60) {
        Some((end, _)) => path::quoted(&format!("{}...", &text[..end])),
        None => path::quoted(text),
    }
}

/// The problem of a text that is not of its format; `message` is what the parser says.
pub(crate) fn broken(format: Format, line: usize, message: &str) -> Problem {
    let message = message.split_whitespace().collect::<Vec<_>>().join(" ");
    refused(ErrorKind::Syntax, line, &message, format.complete())
}

/// The problem of a key that is given twice.
pub(crate) fn twice(path: &str, line: usize, key: &str) -> Problem {
    let found = format!("the key {} a second time", shortened(key));
    Problem::new(ErrorKind::Duplicate, path, found, "each key once").on_line(line)
}

/// A problem of the document as a whole.
fn refused(kind: ErrorKind, line: usize, found: &str, expected: &str) -> Problem {
    Problem::new(kind, steps::DOCUMENT, found, expected).on_line(line)
}

#[cfg(test)]
#[path = "tree_tests.rs"]
mod tests;

#[cfg(test)]
#[path = "refused_tests.rs"]
mod refused_tests;
