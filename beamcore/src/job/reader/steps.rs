//! Reading the paths that `crate::path` writes.

use crate::path::is_plain;

/// The path that stands for the document as a whole, in place of an empty path.
pub(crate) const DOCUMENT: &str = "document";

/// One step of a path.
#[derive(Clone, Debug, PartialEq, Eq)]
pub(crate) enum Step {
    /// `.key`: the value of a key.
    Key(String),
    /// `["name"]`: the thing of this name in a list or in a table of named things.
    Named(String),
    /// `[3]`: an element of a list, counted from 0.
    Index(usize),
}

/// The path as it is shown: [`DOCUMENT`] where it is empty.
pub(crate) fn shown(path: &str) -> &str {
    if path.is_empty() { DOCUMENT } else { path }
}

/// The steps of a path; a path that breaks off gives the steps up to there.
pub(crate) fn steps(path: &str) -> Vec<Step> {
    let mut steps = Vec::new();
    let mut rest = path;
    while let Some((step, after)) = first_step(rest) {
        steps.push(step);
        rest = after;
    }
    steps
}

/// The first step of a path, and what comes after it.
fn first_step(path: &str) -> Option<(Step, &str)> {
    if let Some(rest) = path.strip_prefix("[\"") {
        let (name, rest) = unquoted(rest)?;
        return Some((Step::Named(name), rest.strip_prefix(']')?));
    }
    if let Some(rest) = path.strip_prefix('[') {
        let (index, rest) = rest.split_once(']')?;
        return Some((Step::Index(index.parse().ok()?), rest));
    }
    let path = path.strip_prefix('.').unwrap_or(path);
    let end = path.find(['.', '[']).unwrap_or(path.len());
    let (key, rest) = path.split_at(end);
    is_plain(key).then(|| (Step::Key(key.to_owned()), rest))
}

/// The text up to the closing quote, its escapes undone, and what comes after the quote.
fn unquoted(text: &str) -> Option<(String, &str)> {
    let mut out = String::new();
    let mut rest = text;
    loop {
        let c = rest.chars().next()?;
        rest = &rest[c.len_utf8()..];
        match c {
            '"' => return Some((out, rest)),
            '\\' => {
                if let Some(code) = rest.strip_prefix("u{") {
                    let (digits, after) = code.split_once('}')?;
                    out.push(char::from_u32(u32::from_str_radix(digits, 16).ok()?)?);
                    rest = after;
                } else {
                    let c = rest.chars().next()?;
                    out.push(c);
                    rest = &rest[c.len_utf8()..];
                }
            }
            c => out.push(c),
        }
    }
}

#[cfg(test)]
mod tests {
    use super::*;
    use crate::path::{indexed, key, named};

    #[test]
    fn the_document_itself_has_a_name() {
        assert_eq!(shown(""), "document");
        assert_eq!(shown("member"), "member");
    }

    #[test]
    fn a_path_comes_apart_into_the_steps_it_was_made_of() {
        for name in [
            "left",
            "",
            "a\"b\\c",
            "two\nlines",
            "a].b[\"c\"]",
            "\u{7f}u{41}",
            "länge",
        ] {
            let path = key(&indexed(&named(&key("", "list"), name), 12), "at");
            assert!(!path.contains('\n'), "{path}");
            let expected = [
                Step::Key("list".to_owned()),
                Step::Named(name.to_owned()),
                Step::Index(12),
                Step::Key("at".to_owned()),
            ];
            assert_eq!(steps(&path), expected, "{path}");
        }
    }

    #[test]
    fn a_path_that_breaks_off_gives_its_first_steps() {
        let member = [Step::Key("member".to_owned())];
        for path in [
            "member",
            "member[",
            "member[\"left",
            "member[x]",
            "member..at",
            "member[\"\\",
        ] {
            assert_eq!(steps(path), member, "{path}");
        }
        assert_eq!(steps(""), []);
    }
}
