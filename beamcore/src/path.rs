//! Paths of fields in a document: `member.supports["left"].at`.
//!
//! One spelling for the whole core, so that a check of meaning and the reader of the document
//! speak of a field by the same address, and the line of a field can be found from its path.

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

/// Whether a key needs no quotes in a path.
pub(crate) fn is_plain(key: &str) -> bool {
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
    }
}
