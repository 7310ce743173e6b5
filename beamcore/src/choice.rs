//! Words that stand for a choice, read back.

use crate::error::{ErrorKind, Problem, Result};
use crate::lookup;

/// The choice that a word stands for, among all that there are.
///
/// For callers that take choices as words: `name` gives the word of each choice, and `path` the
/// field that an error names.
///
/// # Errors
/// [`ErrorKind::Name`] at `path` for a word that stands for none of them.
///
/// # Examples
/// ```
/// use beamcore::camber::Shape;
/// use beamcore::choice::chosen;
/// assert_eq!(chosen("mirror", "camber.shape", &Shape::ALL, Shape::name)?, Shape::Mirror);
/// let error = chosen("arch", "camber.shape", &Shape::ALL, Shape::name).unwrap_err();
/// assert!(error.to_string().starts_with("camber.shape: found \"arch\"; expected one of "));
/// # Ok::<(), beamcore::Error>(())
/// ```
pub fn chosen<T: Copy>(
    word: &str,
    path: &str,
    all: &[T],
    name: fn(T) -> &'static str,
) -> Result<T> {
    let found = all.iter().copied().find(|choice| name(*choice) == word);
    found.ok_or_else(|| {
        let words: Vec<_> = all.iter().map(|choice| name(*choice)).collect();
        let expected = format!("one of {}", lookup::listed(&words));
        Problem::new(ErrorKind::Name, path, format!("\"{word}\""), expected).into()
    })
}
