//! Checks of single values, shared by every room that takes input.

use crate::error::{ErrorKind, Problem};
use crate::units::Quantity;
use std::collections::BTreeSet;

/// A problem unless the quantity is finite and greater than zero.
pub(crate) fn positive<Q: Quantity>(problems: &mut Vec<Problem>, value: Q, path: &str) {
    if !(value.si() > 0.0 && value.si().is_finite()) {
        problems.push(Problem::new(
            ErrorKind::Value,
            path,
            value.to_string(),
            format!("a {} greater than zero", Q::NOUN),
        ));
    }
}

/// A problem unless the quantity is finite and zero or greater.
pub(crate) fn not_negative<Q: Quantity>(problems: &mut Vec<Problem>, value: Q, path: &str) {
    if !(value.si() >= 0.0 && value.si().is_finite()) {
        problems.push(Problem::new(
            ErrorKind::Value,
            path,
            value.to_string(),
            format!("a {} of zero or more", Q::NOUN),
        ));
    }
}

/// A problem unless the quantity is finite.
pub(crate) fn finite<Q: Quantity>(problems: &mut Vec<Problem>, value: Q, path: &str) {
    if !value.si().is_finite() {
        problems.push(Problem::new(
            ErrorKind::Value,
            path,
            value.to_string(),
            format!("a finite {}", Q::NOUN),
        ));
    }
}

/// A problem unless the number lies between two limits, both allowed.
pub(crate) fn between(problems: &mut Vec<Problem>, value: f64, least: f64, most: f64, path: &str) {
    if !(value >= least && value <= most) {
        problems.push(Problem::new(
            ErrorKind::Value,
            path,
            value.to_string(),
            format!("a number from {least} to {most}"),
        ));
    }
}

/// A problem unless the text is a usable name: some text, without quotation marks or line breaks
/// (names stand in quotation marks in the paths of results).
pub(crate) fn name(problems: &mut Vec<Problem>, name: &str, path: &str) {
    if name.trim().is_empty() {
        problems.push(Problem::new(
            ErrorKind::Missing,
            path,
            "an empty name",
            "a name",
        ));
    } else if name.contains(['"', '\n', '\r']) {
        problems.push(Problem::new(
            ErrorKind::Value,
            path,
            format!("the name {name:?}"),
            "a name without quotation marks or line breaks",
        ));
    }
}

/// A problem for each name that stands more than once.
pub(crate) fn unique<'a>(
    problems: &mut Vec<Problem>,
    names: impl IntoIterator<Item = &'a str>,
    what: &str,
    path: &str,
) {
    let mut seen = BTreeSet::new();
    for name in names {
        if !seen.insert(name) {
            problems.push(Problem::new(
                ErrorKind::Duplicate,
                path,
                format!("two {what} named \"{name}\""),
                format!("a different name for each of the {what}"),
            ));
        }
    }
}
