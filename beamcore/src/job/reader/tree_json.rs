//! Reading JSON into a tree: the parser takes the text byte by byte from a source that counts lines.

use std::cell::{Cell, RefCell};
use std::fmt;

use serde::de::{DeserializeSeed, Deserializer, MapAccess, SeqAccess, Visitor};

use super::source::Source;
use super::steps;
use super::tree::{self, FINITE, Format, Key, Node, NodeValue};
use crate::error::{Error, ErrorKind, Problem, Result};
use crate::path;

/// Reads a JSON document.
///
/// # Errors
/// As [`tree::read`].
pub(super) fn read(text: &str) -> Result<Node> {
    let reading = Reading::default();
    let mut parser = serde_json::Deserializer::from_reader(Source::new(text, &reading.line));
    let seed = Seed {
        reading: &reading,
        path: String::new(),
        list: None,
    };
    let node = seed
        .deserialize(&mut parser)
        .and_then(|node| parser.end().map(|()| node));
    let problem = node
        .as_ref()
        .err()
        .map(|error| stopped(text, error, &reading.path.borrow()));
    let mut problems: Vec<_> = reading
        .noted
        .take()
        .into_iter()
        .map(Noted::problem)
        .collect();
    problems.sort_by_key(Problem::line);
    if let Some(problem) = problem {
        // What was noted before a text breaks may be due to the break: that is one problem.
        if problem.kind() == ErrorKind::Syntax {
            problems.clear();
        }
        problems.push(problem);
    }
    match node {
        Ok(node) if problems.is_empty() => Ok(node),
        _ => Err(Error::from_problems(problems).expect("a text that is refused has a problem")),
    }
}

/// The problem at which the parser stopped; `path` is that of the value it was reading.
fn stopped(text: &str, error: &serde_json::Error, path: &str) -> Problem {
    let before: usize = text
        .split_inclusive('\n')
        .take(error.line().max(1) - 1)
        .map(str::len)
        .sum();
    let read = &text.as_bytes()[..(before + error.column()).min(text.len())];
    // A break that shows only in the white space after a line is a break of that line.
    let line = 1 + read
        .trim_ascii_end()
        .iter()
        .filter(|&&byte| byte == b'\n')
        .count();
    let message = error.to_string();
    // The line is reported apart from the message.
    let message = message
        .rsplit_once(" at line ")
        .map_or(&*message, |(said, _)| said);
    if message == "number out of range" {
        let number = number_at(text, read.len());
        return Problem::new(ErrorKind::Value, steps::shown(path), number, FINITE).on_line(line);
    }
    let found = match message.strip_prefix("EOF while parsing ") {
        Some(inside) => format!("a text that ends within {inside}"),
        None => match message {
            "recursion limit exceeded" => tree::TOO_DEEP.to_owned(),
            "expected ident" => "broken text: expected true, false or null".to_owned(),
            _ => format!("broken text: {message}"),
        },
    };
    tree::broken(Format::Json, line, &found)
}

/// The number that the byte before `offset` belongs to, or that ends just before that byte.
fn number_at(text: &str, offset: usize) -> &str {
    let inside = |c: char| c.is_ascii_digit() || matches!(c, '+' | '-' | '.' | 'e' | 'E');
    let read = text.get(..offset).unwrap_or(text);
    let read = read.strip_suffix(|c| !inside(c)).unwrap_or(read);
    let number = &text[read.trim_end_matches(inside).len()..];
    &number[..number.find(|c| !inside(c)).unwrap_or(number.len())]
}

/// What is known while the text is read.
#[derive(Default)]
struct Reading {
    /// The line of the last byte that was not white space.
    line: Cell<usize>,
    /// The path of the value that was begun last.
    path: RefCell<String>,
    noted: RefCell<Vec<Noted>>,
}

impl Reading {
    fn note(&self, path: &str, line: usize, what: What) {
        self.noted.borrow_mut().push(Noted {
            path: path.to_owned(),
            line,
            what,
        });
    }
}

/// A problem of the text so far; its path may change when the name of its table is read.
struct Noted {
    path: String,
    line: usize,
    what: What,
}

/// What is wrong at a path.
enum What {
    Null,
    Twice(String),
}

impl Noted {
    fn problem(self) -> Problem {
        match self.what {
            What::Null => {
                let (path, found) = (steps::shown(&self.path), "nothing (null)");
                let expected = "a value, or that the key is left out";
                Problem::new(ErrorKind::Syntax, path, found, expected).on_line(self.line)
            }
            What::Twice(key) => tree::twice(&self.path, self.line, &key),
        }
    }
}

/// A value to be read at a path; `list` is the path of the list that it is an element of.
struct Seed<'a> {
    reading: &'a Reading,
    path: String,
    list: Option<&'a str>,
}

impl<'de> DeserializeSeed<'de> for Seed<'_> {
    type Value = Node;

    fn deserialize<D: Deserializer<'de>>(self, parser: D) -> Result<Node, D::Error> {
        self.reading.path.replace(self.path.clone());
        parser.deserialize_any(self)
    }
}

impl Seed<'_> {
    fn node<E>(&self, value: NodeValue) -> Result<Node, E> {
        Ok(Node {
            line: self.reading.line.get(),
            value,
        })
    }
}

impl<'de> Visitor<'de> for Seed<'_> {
    type Value = Node;

    fn expecting(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        f.write_str("a value")
    }

    fn visit_bool<E>(self, value: bool) -> Result<Node, E> {
        self.node(NodeValue::Bool(value))
    }

    fn visit_i64<E>(self, number: i64) -> Result<Node, E> {
        self.node(NodeValue::Integer(number))
    }

    fn visit_u64<E>(self, number: u64) -> Result<Node, E> {
        let whole = i64::try_from(number).map(NodeValue::Integer);
        self.node(whole.unwrap_or(NodeValue::Number(number as f64)))
    }

    fn visit_f64<E>(self, number: f64) -> Result<Node, E> {
        self.node(NodeValue::Number(number))
    }

    fn visit_str<E>(self, text: &str) -> Result<Node, E> {
        self.node(NodeValue::Text(text.to_owned()))
    }

    fn visit_unit<E>(self) -> Result<Node, E> {
        self.reading
            .note(&self.path, self.reading.line.get(), What::Null);
        // The text is refused in the end; this only stands for the value until then.
        self.node(NodeValue::Bool(false))
    }

    fn visit_seq<A: SeqAccess<'de>>(self, mut elements: A) -> Result<Node, A::Error> {
        let mut node = self.node(NodeValue::Bool(false))?;
        let mut list = Vec::new();
        loop {
            let path = path::indexed(&self.path, list.len());
            let seed = Seed {
                reading: self.reading,
                path,
                list: Some(&self.path),
            };
            match elements.next_element_seed(seed)? {
                Some(element) => list.push(element),
                None => break,
            }
        }
        node.value = NodeValue::Array(list);
        Ok(node)
    }

    fn visit_map<A: MapAccess<'de>>(mut self, mut map: A) -> Result<Node, A::Error> {
        let mut node = self.node(NodeValue::Bool(false))?;
        let before = self.reading.noted.borrow().len();
        let mut entries: Vec<(Key, Node)> = Vec::new();
        let mut known = std::collections::HashSet::new();
        while let Some(name) = map.next_key::<String>()? {
            let key = Key {
                line: self.reading.line.get(),
                name,
            };
            let path = path::key(&self.path, &key.name);
            let seed = Seed {
                reading: self.reading,
                path: path.clone(),
                list: None,
            };
            let value = map.next_value_seed(seed)?;
            if !known.insert(key.name.clone()) {
                self.reading.note(&path, key.line, What::Twice(key.name));
                continue;
            }
            if let ("name", NodeValue::Text(name), Some(list)) =
                (&*key.name, &value.value, self.list)
            {
                self.rename(path::named(list, name), before);
            }
            entries.push((key, value));
        }
        node.value = NodeValue::Table(entries);
        Ok(node)
    }
}

impl Seed<'_> {
    /// Addresses this table by its name from now on, and in the problems noted since `before`.
    fn rename(&mut self, path: String, before: usize) {
        for noted in &mut self.reading.noted.borrow_mut()[before..] {
            if let Some(rest) = noted.path.strip_prefix(&*self.path) {
                noted.path = format!("{path}{rest}");
            }
        }
        self.path = path;
    }
}
