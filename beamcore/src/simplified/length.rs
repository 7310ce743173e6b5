//! The length of the half sine wave.

use super::warning::Warning;
use crate::check;
use crate::error::Problem;
use crate::units::Length;

/// What the length l of the simplified methods is taken from.
///
/// Source: EN 1995-1-1:2004 Annex B (from memory).
#[derive(Clone, Copy, Debug, PartialEq)]
pub enum ReferenceLength {
    /// A single span L: l = L.
    Span(Length),
    /// A span L of a member of several spans: l = 0.8 L.
    Continuous(Length),
    /// A cantilever of length L: l = 2 L.
    Cantilever(Length),
}

impl ReferenceLength {
    /// l.
    #[must_use]
    pub fn length(self) -> Length {
        match self {
            Self::Span(length) => length,
            Self::Continuous(length) => length * 4.0 / 5.0,
            Self::Cantilever(length) => 2.0 * length,
        }
    }

    /// What is to be known of a method that rests on this length.
    pub(super) fn warnings(self) -> Vec<Warning> {
        let mut warnings = vec![Warning::SineLoad];
        match self {
            Self::Span(_) => {}
            Self::Continuous(_) => warnings.push(Warning::ContinuousSpan),
            Self::Cantilever(_) => warnings.push(Warning::Cantilever),
        }
        warnings
    }

    pub(super) fn check(self, problems: &mut Vec<Problem>) {
        let (Self::Span(length) | Self::Continuous(length) | Self::Cantilever(length)) = self;
        check::positive(problems, length, "length");
    }

    /// (pi/l)^2, in 1/m2.
    pub(super) fn wave(self) -> f64 {
        let number = std::f64::consts::PI / self.length().si();
        number * number
    }
}
