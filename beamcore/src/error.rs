//! The one error type: what is wrong, where, what was found and what would be right.

use std::fmt;

/// The kind of a [`Problem`], with a number that never changes once released.
///
/// The C status codes and the Python exception classes are made from this list.
#[non_exhaustive]
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
#[repr(i32)]
pub enum ErrorKind {
    /// A number outside what is possible: negative size, NaN, infinity.
    Value = 1,
    /// A name that nothing bears: a part, material, support, strength class.
    Name = 2,
    /// A key that the document does not know.
    Key = 3,
    /// A unit that is missing, unknown or of another kind of quantity.
    Unit = 4,
    /// Two things of one name, or two supports at one place.
    Duplicate = 5,
    /// Parts that overlap, or places that refer to each other in a circle.
    Geometry = 6,
    /// Something that must be given is not.
    Missing = 7,
    /// A member, or a piece of it, that is free to move.
    Mechanism = 8,
    /// A support or load that lies outside the member, or a stretch without length.
    Position = 9,
    /// A text that is not a document: broken or truncated TOML or JSON, a value of a wrong type.
    Syntax = 10,
    /// A document of a version that this library does not read.
    Version = 11,
    /// A file that cannot be read.
    File = 12,
    /// A result that was asked for and that does not exist.
    Lookup = 13,
    /// A calculation that did not reach its accuracy.
    Numerical = 14,
}

impl ErrorKind {
    /// Every kind, in the order of their numbers.
    pub const ALL: [Self; 14] = [
        Self::Value,
        Self::Name,
        Self::Key,
        Self::Unit,
        Self::Duplicate,
        Self::Geometry,
        Self::Missing,
        Self::Mechanism,
        Self::Position,
        Self::Syntax,
        Self::Version,
        Self::File,
        Self::Lookup,
        Self::Numerical,
    ];

    /// The stable number of this kind; the C binding returns it as its status.
    #[must_use]
    pub const fn number(self) -> i32 {
        self as i32
    }

    /// The name of this kind as one word, as in the Rust source.
    #[must_use]
    pub const fn name(self) -> &'static str {
        match self {
            Self::Value => "Value",
            Self::Name => "Name",
            Self::Key => "Key",
            Self::Unit => "Unit",
            Self::Duplicate => "Duplicate",
            Self::Geometry => "Geometry",
            Self::Missing => "Missing",
            Self::Mechanism => "Mechanism",
            Self::Position => "Position",
            Self::Syntax => "Syntax",
            Self::Version => "Version",
            Self::File => "File",
            Self::Lookup => "Lookup",
            Self::Numerical => "Numerical",
        }
    }

    /// Whether the input is at fault (and not a file, a look-up or the calculation itself).
    #[must_use]
    pub const fn is_input(self) -> bool {
        !matches!(self, Self::File | Self::Lookup | Self::Numerical)
    }
}

/// One thing that is wrong.
#[derive(Clone, Debug, PartialEq, Eq, thiserror::Error)]
#[error("{path}{}: found {found}; expected {expected}", At(*.line))]
pub struct Problem {
    kind: ErrorKind,
    path: String,
    line: Option<usize>,
    found: String,
    expected: String,
}

struct At(Option<usize>);

impl fmt::Display for At {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        match self.0 {
            Some(line) => write!(f, " (line {line})"),
            None => Ok(()),
        }
    }
}

impl Problem {
    /// A problem at the field `path`: what was `found` there and what was `expected`.
    ///
    /// Both are noun phrases without a full stop, for they are printed as
    /// "path: found ...; expected ...".
    pub fn new(
        kind: ErrorKind,
        path: impl Into<String>,
        found: impl Into<String>,
        expected: impl Into<String>,
    ) -> Self {
        Self {
            kind,
            path: path.into(),
            line: None,
            found: found.into(),
            expected: expected.into(),
        }
    }

    /// The same problem, with the line of the document (counted from 1) that it stands on.
    #[must_use]
    pub fn on_line(mut self, line: usize) -> Self {
        self.line = Some(line);
        self
    }

    /// The kind of the problem.
    #[must_use]
    pub const fn kind(&self) -> ErrorKind {
        self.kind
    }

    /// The field at fault, for example `section.parts["plate"].rectangle.width`.
    #[must_use]
    pub fn path(&self) -> &str {
        &self.path
    }

    /// The line of the document, where there is a document.
    #[must_use]
    pub const fn line(&self) -> Option<usize> {
        self.line
    }

    /// What was found, with its unit.
    #[must_use]
    pub fn found(&self) -> &str {
        &self.found
    }

    /// What would be right.
    #[must_use]
    pub fn expected(&self) -> &str {
        &self.expected
    }
}

/// Everything that is wrong with an input, at least one [`Problem`].
///
/// # Examples
/// ```
/// use beamcore::ErrorKind;
/// use beamcore::units::Length;
/// let error = "4.2".parse::<Length>().unwrap_err();
/// assert_eq!(error.kind(), ErrorKind::Unit);
/// assert_eq!(error.problems().len(), 1);
/// ```
#[derive(Clone, Debug, PartialEq, Eq, thiserror::Error)]
pub struct Error(Box<[Problem]>);

impl Error {
    /// The kind of the first problem.
    #[must_use]
    pub fn kind(&self) -> ErrorKind {
        self.first().kind
    }

    /// The path of the first problem.
    #[must_use]
    pub fn path(&self) -> &str {
        &self.first().path
    }

    /// All problems, in the order in which the input was read; never empty.
    #[must_use]
    pub fn problems(&self) -> &[Problem] {
        &self.0
    }

    /// An error out of all the problems that were found, or `None` if there are none.
    #[must_use]
    pub fn from_problems(problems: Vec<Problem>) -> Option<Self> {
        if problems.is_empty() {
            None
        } else {
            Some(Self(problems.into_boxed_slice()))
        }
    }

    /// `Ok(())` if there are no problems, else all of them as one error.
    pub(crate) fn check(problems: Vec<Problem>) -> Result<()> {
        Self::from_problems(problems).map_or(Ok(()), Err)
    }

    fn first(&self) -> &Problem {
        self.0.first().expect("an error holds at least one problem")
    }
}

impl From<Problem> for Error {
    fn from(problem: Problem) -> Self {
        Self(Box::new([problem]))
    }
}

impl fmt::Display for Error {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        if let [only] = &*self.0 {
            return write!(f, "{only}");
        }
        write!(f, "{} problems:", self.0.len())?;
        for problem in self.0.iter() {
            write!(f, "\n- {problem}")?;
        }
        Ok(())
    }
}

/// What every fallible function of this library returns.
pub type Result<T, E = Error> = std::result::Result<T, E>;
