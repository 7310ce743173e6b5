//! Names that are asked for and may not be there.

use crate::error::{ErrorKind, Problem};

/// The problem of a result that is asked for under a name that nothing bears.
pub(crate) fn unknown(what: &str, name: &str, known: &[&str]) -> Problem {
    Problem::new(
        ErrorKind::Lookup,
        what,
        format!("the unknown {what} \"{name}\""),
        format!("one of {}", listed(known)),
    )
}

/// Names in quotation marks, parted by commas.
pub(crate) fn listed(names: &[&str]) -> String {
    names
        .iter()
        .map(|name| format!("\"{name}\""))
        .collect::<Vec<_>>()
        .join(", ")
}
