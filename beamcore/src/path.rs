//! Paths of fields in a document: `member.supports["left"].at`.
//!
//! One spelling for the whole core, so that a check of meaning and the reader of the document
//! speak of a field by the same address, and the line of a field can be found from its path.

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

/// The path of `key` in the table at `base`; `base` is empty for the document itself.
///
/// A key that is not made of letters, digits, `_` and `-` alone is put in quotes and brackets.
pub(crate) fn key(base: &str, key: &str) -> String {
    if !is_plain(key) {
        named(base, key)
    } else if base.is_empty() {
        key.to_owned()
    } else {
        format!("{base}.{key}")
    }
}

/// The path of the thing called `name` in the list or table at `base`.
pub(crate) fn named(base: &str, name: &str) -> String {
    format!("{base}[{}]", quoted(name))
}

/// The path of the element `index`, counted from 0, of the list at `base`.
pub(crate) fn indexed(base: &str, index: usize) -> String {
    format!("{base}[{index}]")
}

/// The path as it is shown: [`DOCUMENT`] where it is empty.
pub(crate) fn shown(path: &str) -> &str {
    if path.is_empty() { DOCUMENT } else { path }
}

/// The text in double quotes, on one line: quotes, backslashes and control characters escaped.
pub(crate) fn quoted(text: &str) -> String {
    let mut out = String::with_capacity(text.len() + 2);
    out.push('"');
    for c in text.chars() {
        match c {
            '"' | '\\' => out.extend(['\\', c]),
            c if c.is_control() => out.extend(c.escape_unicode()),
            c => out.push(c),
        }
    }
    out.push('"');
    out
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

/// Whether a key needs no quotes in a path.
fn is_plain(key: &str) -> bool {
    !key.is_empty()
        && key
            .chars()
            .all(|c| c.is_alphanumeric() || matches!(c, '_' | '-'))
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn a_path_reads_like_an_address() {
        let supports = key(&key("", "member"), "supports");
        assert_eq!(
            key(&named(&supports, "left"), "at"),
            "member.supports[\"left\"].at"
        );
        assert_eq!(key(&indexed(&supports, 2), "at"), "member.supports[2].at");
        assert_eq!(key("member", "live load"), "member[\"live load\"]");
        assert_eq!(key("", ""), "[\"\"]");
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
