//! The spans of a member: between neighbouring supports, and the overhangs beyond the outer ones.

use super::support::Support;
use crate::units::Length;

/// A stretch of a member whose deflection is looked at on its own.
#[derive(Clone, Debug, PartialEq)]
pub struct Span {
    name: String,
    from: Length,
    to: Length,
    is_cantilever: bool,
}

impl Span {
    /// The name: `A to B` between the supports A and B, `before A` and `beyond B` for overhangs.
    #[must_use]
    pub fn name(&self) -> &str {
        &self.name
    }

    /// Its left end.
    #[must_use]
    pub const fn from(&self) -> Length {
        self.from
    }

    /// Its right end.
    #[must_use]
    pub const fn to(&self) -> Length {
        self.to
    }

    /// Its length.
    #[must_use]
    pub fn length(&self) -> Length {
        self.to - self.from
    }

    /// Whether one of its ends is free: an overhang or a cantilever.
    #[must_use]
    pub const fn is_cantilever(&self) -> bool {
        self.is_cantilever
    }
}

/// The spans from left to right.
pub(crate) fn all(length: Length, supports: &[Support]) -> Vec<Span> {
    let mut sorted: Vec<_> = supports.iter().collect();
    sorted.sort_by(|a, b| a.at().si().total_cmp(&b.at().si()));
    let mut spans = Vec::new();
    let mut push = |name: String, from: Length, to: Length, is_cantilever: bool| {
        if to > from {
            spans.push(Span {
                name,
                from,
                to,
                is_cantilever,
            });
        }
    };
    let (first, last) = (sorted[0], sorted[sorted.len() - 1]);
    push(
        format!("before {}", first.name()),
        Length::ZERO,
        first.at(),
        true,
    );
    for pair in sorted.windows(2) {
        let name = format!("{} to {}", pair[0].name(), pair[1].name());
        push(name, pair[0].at(), pair[1].at(), false);
    }
    push(format!("beyond {}", last.name()), last.at(), length, true);
    spans
}
