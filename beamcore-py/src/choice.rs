//! Words for choices of the core that have a word for each but no way back from it.

use beamcore::{ErrorKind, Problem};

/// The choice of a word, or the problem at `path` with all words that there are.
pub(crate) fn chosen<T: Copy>(
    word: &str,
    path: &str,
    all: &[T],
    name: fn(T) -> &'static str,
) -> Result<T, Problem> {
    let found = all.iter().copied().find(|choice| name(*choice) == word);
    found.ok_or_else(|| {
        let words: Vec<_> = all
            .iter()
            .map(|choice| format!("\"{}\"", name(*choice)))
            .collect();
        let expected = format!("one of {}", words.join(", "));
        Problem::new(ErrorKind::Name, path, format!("\"{word}\""), expected)
    })
}
