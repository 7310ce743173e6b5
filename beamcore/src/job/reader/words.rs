//! The words in which a problem of a document says what would be right.

use super::shape::{Choice, List, Shape};
use crate::path::quoted;

/// What is asked where a number with its unit must be.
pub(super) const QUANTITY: &str = "a text with a number and its unit";

/// What a shape asks for.
pub(super) fn asked(shape: &Shape<'_>) -> String {
    let words = match shape {
        Shape::Any => "a value",
        Shape::Quantity(_) => QUANTITY,
        Shape::Text => "a text",
        Shape::Number => "a number",
        Shape::Integer => "a whole number",
        Shape::Bool => "true or false",
        Shape::List(_) => "a list",
        Shape::Table(_) => "a table",
        Shape::Choice(choice) => return alternatives(choice),
    };
    words.to_owned()
}

/// How many elements a list must have.
pub(super) fn asked_length(list: &List<'_>) -> String {
    match (list.least, list.most) {
        (Some(least), Some(most)) if least == most => format!("a list of {least}"),
        (Some(least), Some(most)) => format!("a list of {least} to {most}"),
        (Some(least), None) => format!("a list of at least {least}"),
        (None, Some(most)) => format!("a list of at most {most}"),
        (None, None) => "a list".to_owned(),
    }
}

/// All that a choice offers.
pub(super) fn alternatives(choice: &Choice<'_>) -> String {
    let mut offers = Vec::new();
    match &*choice.words {
        [] => {}
        [word] => offers.push(quoted(word)),
        words => {
            let words: Vec<_> = words.iter().map(|word| quoted(word)).collect();
            offers.push(format!("one of {}", words.join(", ")));
        }
    }
    if !choice.variants.is_empty() {
        let names: Vec<_> = choice.variants.iter().map(|(name, _)| *name).collect();
        offers.push(format!("a table with {}", one_key_of(&names)));
    }
    offers.extend(choice.others.iter().map(|schema| asked(&schema.shape())));
    offers.join(" or ")
}

/// That a key must be one of the known ones.
pub(super) fn key_of(known: &[&str]) -> String {
    match known {
        [] => "no key".to_owned(),
        [key] => format!("the key {key}"),
        keys => format!("one of the keys {}", keys.join(", ")),
    }
}

/// That exactly one of the known keys must be there.
pub(super) fn one_key_of(known: &[&str]) -> String {
    match known {
        [_, _, ..] => format!("exactly {}", key_of(known)),
        _ => key_of(known),
    }
}

/// The first sentence of a description, to follow after "expected"; `None` of an empty one.
pub(super) fn first_sentence(text: &str) -> Option<String> {
    let text = text
        .split("\n\n")
        .next()?
        .split_whitespace()
        .collect::<Vec<_>>()
        .join(" ");
    // A full stop before a small letter ends an abbreviation, not the sentence.
    let ends = |at: &usize| text[at + 2..].starts_with(char::is_uppercase);
    let end = text
        .match_indices(". ")
        .map(|(at, _)| at)
        .find(ends)
        .unwrap_or(text.len());
    let sentence = text[..end].trim_end_matches('.');
    let mut letters = sentence.chars();
    let first = letters.next()?;
    // A symbol or an abbreviation keeps its capital: "E modulus", "EN 338 class".
    let word = letters.as_str().starts_with(char::is_lowercase) || sentence.starts_with("A ");
    let first = if word {
        first.to_lowercase().collect()
    } else {
        first.to_string()
    };
    Some(first + letters.as_str())
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn a_description_gives_its_first_sentence() {
        for (text, sentence) in [
            ("The span. It is measured\nbetween supports.", "the span"),
            ("A part of\nthe section", "a part of the section"),
            (
                "E modulus, e.g. of timber. Mean value.",
                "E modulus, e.g. of timber",
            ),
            ("EN 338 class.\n\nMore.", "EN 338 class"),
            ("\u{c4}hnlich. Mehr", "\u{e4}hnlich"),
        ] {
            assert_eq!(first_sentence(text).as_deref(), Some(sentence));
        }
        assert_eq!(first_sentence(""), None);
    }
}
