//! What a function of the ABI fails with: an error of the core or a wrong use of this binding.

use crate::status::{
    BC_ERROR_BUFFER, BC_ERROR_CHOICE, BC_ERROR_COUNT, BC_ERROR_NULL, BC_ERROR_PANIC, BC_ERROR_UTF8,
};
use beamcore::{Error, Problem};
use std::any::Any;

/// One thing that is wrong.
#[derive(Clone, Debug)]
pub(crate) struct Entry {
    pub(crate) kind: i32,
    pub(crate) path: String,
    pub(crate) found: String,
    pub(crate) expected: String,
    pub(crate) line: Option<usize>,
}

/// Everything that is wrong, with the text that says so.
#[derive(Clone, Debug)]
pub(crate) struct Fault {
    /// The status: the kind of the first entry.
    pub(crate) status: i32,
    pub(crate) text: String,
    pub(crate) entries: Vec<Entry>,
}

impl Fault {
    fn own(kind: i32, parameter: &str, found: String, expected: String) -> Self {
        Self {
            status: kind,
            text: format!("{parameter}: found {found}; expected {expected}"),
            entries: vec![Entry {
                kind,
                path: parameter.to_owned(),
                found,
                expected,
                line: None,
            }],
        }
    }

    /// A pointer that is NULL.
    pub(crate) fn null(parameter: &str) -> Self {
        Self::own(
            BC_ERROR_NULL,
            parameter,
            "NULL".to_owned(),
            "a pointer that is not NULL".to_owned(),
        )
    }

    /// A text whose bytes from `place` on are not UTF-8.
    pub(crate) fn utf8(parameter: &str, place: usize) -> Self {
        Self::own(
            BC_ERROR_UTF8,
            parameter,
            format!("a text that is not UTF-8 at byte {place}"),
            "a UTF-8 text".to_owned(),
        )
    }

    /// A buffer without room for a text of `length` bytes and its closing NUL.
    pub(crate) fn buffer(capacity: i64, length: usize) -> Self {
        Self::own(
            BC_ERROR_BUFFER,
            "capacity",
            capacity.to_string(),
            format!("at least {}", length.saturating_add(1)),
        )
    }

    /// A number that is none of the constants listed in `constants`.
    pub(crate) fn choice(parameter: &str, number: i32, constants: &str) -> Self {
        Self::own(
            BC_ERROR_CHOICE,
            parameter,
            number.to_string(),
            format!("one of {constants}"),
        )
    }

    /// A count or an index that is out of its range.
    pub(crate) fn count(parameter: &str, number: i64, expected: &str) -> Self {
        Self::own(
            BC_ERROR_COUNT,
            parameter,
            number.to_string(),
            expected.to_owned(),
        )
    }

    /// A panic that was caught.
    pub(crate) fn panic(payload: &(dyn Any + Send)) -> Self {
        let message = payload
            .downcast_ref::<String>()
            .map(String::as_str)
            .or_else(|| payload.downcast_ref::<&str>().copied())
            .unwrap_or("no message");
        Self::own(
            BC_ERROR_PANIC,
            "beamcore",
            format!("a fault inside the library ({message})"),
            "none; please report it with the input that led to it".to_owned(),
        )
    }
}

impl From<Error> for Fault {
    fn from(error: Error) -> Self {
        let entry = |problem: &Problem| Entry {
            kind: problem.kind().number(),
            path: problem.path().to_owned(),
            found: problem.found().to_owned(),
            expected: problem.expected().to_owned(),
            line: problem.line(),
        };
        Self {
            status: error.kind().number(),
            text: error.to_string(),
            entries: error.problems().iter().map(entry).collect(),
        }
    }
}
