//! Reading TOML into a tree: the parser's spans become lines.

use std::ops::Range;

use toml::Spanned;
use toml::de::{DeArray, DeInteger, DeTable, DeValue};

use super::depth::too_deep;
use super::tree::{self, FINITE, Format, Key, Node, NodeValue};
use crate::error::{Error, ErrorKind, Problem, Result};
use crate::path;

/// What the parser says of a key that is given twice.
const DUPLICATE: &str = "duplicate key";

/// Reads a TOML document.
///
/// # Errors
/// As [`tree::read`].
pub(super) fn read(text: &str) -> Result<Node> {
    if let Some(line) = too_deep(text) {
        return Err(tree::broken(Format::Toml, line, tree::TOO_DEEP).into());
    }
    let lines = Lines::of(text);
    let (table, errors) = DeTable::parse_recoverable(text);
    if let Some(error) = errors.iter().min_by_key(|error| rank(error)) {
        return Err(broken(text, &lines, error).into());
    }
    let mut reading = Reading {
        lines,
        problems: Vec::new(),
    };
    let value = NodeValue::Table(reading.table(table.get_ref(), ""));
    let mut problems = reading.problems;
    // A table may be continued below others, so that the walk is not quite in order.
    problems.sort_by_key(Problem::line);
    Error::check(problems)?;
    Ok(Node { line: 1, value })
}

/// The order in which the errors of a broken text are worth telling: the first in the text may be
/// the cause of the rest, but a clash of keys may itself be due to a break further on, for a header
/// that breaks off has only a part of its name.
fn rank(error: &toml::de::Error) -> (bool, usize) {
    let message = error.message();
    let clash = message == DUPLICATE || message.starts_with("cannot extend");
    (clash, error.span().map_or(usize::MAX, |span| span.start))
}

/// The problem of a text that the parser refuses.
fn broken(text: &str, lines: &Lines, error: &toml::de::Error) -> Problem {
    // What is missing at the end is missing on the last line that holds something.
    let end = text.trim_end().len();
    let span = error.span().unwrap_or(end..end);
    let line = lines.at(span.start.min(end));
    let at = text.get(span).unwrap_or_default();
    let found = match error.message() {
        DUPLICATE => {
            let name = key_name(at);
            return tree::twice(&path::key("", &name), line, &name);
        }
        "cannot recurse further; max recursion depth met" | "recursion limit" => {
            tree::TOO_DEEP.to_owned()
        }
        // The parser takes what is not there for a text without quotes.
        message if message.starts_with("string values must be quoted") && at.trim().is_empty() => {
            "broken text: a key without a value".to_owned()
        }
        message => {
            let message = message
                .strip_suffix(", expected nothing")
                .unwrap_or(message);
            format!("broken text: {message}")
        }
    };
    tree::broken(Format::Toml, line, &found)
}

/// The name that a key of the text, perhaps in quotes, stands for.
fn key_name(key: &str) -> String {
    match DeValue::parse(key).map(Spanned::into_inner) {
        Ok(DeValue::String(name)) => name.into_owned(),
        _ => key.to_owned(),
    }
}

/// Where the lines of a text begin.
struct Lines(Vec<usize>);

impl Lines {
    /// The lines of a text.
    fn of(text: &str) -> Self {
        Self(text.match_indices('\n').map(|(at, _)| at + 1).collect())
    }

    /// The line, counted from 1, of the byte at `offset`.
    fn at(&self, offset: usize) -> usize {
        1 + self.0.partition_point(|&start| start <= offset)
    }
}

/// A reading under way.
struct Reading {
    lines: Lines,
    problems: Vec<Problem>,
}

impl Reading {
    /// The entries of a table, in the order of the text (the parser sorts them by name).
    fn table(&mut self, table: &DeTable<'_>, path: &str) -> Vec<(Key, Node)> {
        let mut entries: Vec<_> = table.iter().collect();
        entries.sort_by_key(|(key, _)| key.span().start);
        let mut read = Vec::with_capacity(entries.len());
        for (key, value) in entries {
            let name: &str = key.get_ref();
            if let Some(node) = self.node(value, &path::key(path, name)) {
                let line = self.lines.at(key.span().start);
                read.push((
                    Key {
                        name: name.to_owned(),
                        line,
                    },
                    node,
                ));
            }
        }
        read
    }

    /// The elements of a list.
    fn array(&mut self, array: &DeArray<'_>, path: &str) -> Vec<Node> {
        let mut read = Vec::with_capacity(array.len());
        for (index, value) in array.iter().enumerate() {
            let name = value
                .get_ref()
                .get("name")
                .and_then(|name| name.get_ref().as_str());
            let path = match name {
                Some(name) => path::named(path, name),
                None => path::indexed(path, index),
            };
            read.extend(self.node(value, &path));
        }
        read
    }

    /// A value, or `None` with a problem noted.
    fn node(&mut self, value: &Spanned<DeValue<'_>>, path: &str) -> Option<Node> {
        let span = value.span();
        let value = match value.get_ref() {
            DeValue::Table(table) => NodeValue::Table(self.table(table, path)),
            DeValue::Array(array) => NodeValue::Array(self.array(array, path)),
            DeValue::String(text) => NodeValue::Text(text.clone().into_owned()),
            DeValue::Boolean(value) => NodeValue::Bool(*value),
            DeValue::Integer(number) => NodeValue::Integer(self.integer(number, path, &span)?),
            DeValue::Float(number) => {
                let written = number.as_str();
                match written.parse::<f64>() {
                    Ok(number) if number.is_finite() => NodeValue::Number(number),
                    _ => {
                        return self.refuse(ErrorKind::Value, path, &span, written, FINITE);
                    }
                }
            }
            DeValue::Datetime(date) => {
                let found = format!("the date {date}");
                return self.refuse(ErrorKind::Syntax, path, &span, found, "a text in quotes");
            }
        };
        Some(Node {
            line: self.lines.at(span.start),
            value,
        })
    }

    /// A whole number, or `None` with a problem noted.
    fn integer(&mut self, number: &DeInteger<'_>, path: &str, span: &Range<usize>) -> Option<i64> {
        i64::from_str_radix(number.as_str(), number.radix())
            .ok()
            .or_else(|| {
                let expected = format!("a whole number from {} to {}", i64::MIN, i64::MAX);
                self.refuse(ErrorKind::Value, path, span, number.to_string(), expected)
            })
    }

    /// Notes a problem at the beginning of `span`.
    fn refuse<T>(
        &mut self,
        kind: ErrorKind,
        path: &str,
        span: &Range<usize>,
        found: impl Into<String>,
        expected: impl Into<String>,
    ) -> Option<T> {
        let line = self.lines.at(span.start);
        self.problems
            .push(Problem::new(kind, path, found, expected).on_line(line));
        None
    }
}
