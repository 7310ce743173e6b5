//! The sections along a member: steps and tapers.

use crate::error::{Error, Problem, Result};
use crate::path;
use crate::section::Section;
use crate::units::Length;
use std::sync::Arc;

/// A change of the section along a member.
#[derive(Clone, Debug, PartialEq)]
pub enum SectionChange {
    /// From this place on the member has another section.
    Step {
        /// The place, from the left end.
        at: Length,
        /// The section to the right of it.
        section: Section,
    },
    /// Between two places every size of the section changes linearly to that of a like section,
    /// with which the member goes on.
    Taper {
        /// Where it begins.
        from: Length,
        /// Where it ends.
        to: Length,
        /// The section at its end and to the right of it.
        section: Section,
    },
}

/// The section over a stretch of the member.
#[derive(Clone, Debug)]
pub(crate) struct Stretch {
    pub(crate) from: f64,
    pub(crate) to: f64,
    start: Arc<Section>,
    /// The section at the end, where it is another one.
    end: Option<Arc<Section>>,
}

impl Stretch {
    /// The section, if it is the same all along.
    pub(crate) fn constant(&self) -> Option<&Arc<Section>> {
        self.end.is_none().then_some(&self.start)
    }

    /// The section at a place of the stretch.
    pub(crate) fn at(&self, x: f64) -> Result<Arc<Section>> {
        match &self.end {
            None => Ok(Arc::clone(&self.start)),
            Some(end) => {
                let share = (x - self.from) / (self.to - self.from);
                Ok(Arc::new(self.start.between(end, share)?))
            }
        }
    }

    /// The section at its left end.
    pub(crate) const fn start(&self) -> &Arc<Section> {
        &self.start
    }
}

/// The stretches from the left end to the right end; the changes must be in order.
pub(super) fn stretches(
    first: &Section,
    length: Length,
    changes: &[SectionChange],
) -> Result<Vec<Stretch>, Error> {
    let mut current = Arc::new(first.clone());
    let mut reached = 0.0;
    let mut stretches = Vec::new();
    let mut push = |from: f64, to: f64, start: &Arc<Section>, end: Option<Arc<Section>>| {
        if to > from {
            stretches.push(Stretch {
                from,
                to,
                start: Arc::clone(start),
                end,
            });
        }
    };
    for (i, change) in changes.iter().enumerate() {
        match change {
            SectionChange::Step { at, section } => {
                push(reached, at.si(), &current, None);
                current = Arc::new(section.clone());
                reached = at.si();
            }
            SectionChange::Taper { from, to, section } => {
                push(reached, from.si(), &current, None);
                let end = Arc::new(section.clone());
                // The two ends must be alike.
                if let Err(error) = current.between(&end, 0.5) {
                    return Err(unlike(&error, i));
                }
                push(from.si(), to.si(), &current, Some(Arc::clone(&end)));
                current = end;
                reached = to.si();
            }
        }
    }
    push(reached, length.si(), &current, None);
    Ok(stretches)
}

/// What keeps two sections from being the ends of a taper, told at that change.
fn unlike(error: &Error, index: usize) -> Error {
    let base = path::indexed("member.changes", index);
    let at = path::key(&path::key(&base, "taper"), "section");
    let told = |p: &Problem| {
        let found = format!("{} ({})", p.found(), p.path());
        Problem::new(p.kind(), &at, found, p.expected())
    };
    let problems = error.problems().iter().map(told).collect();
    Error::from_problems(problems).unwrap_or_else(|| error.clone())
}

impl SectionChange {
    /// The word used in documents.
    #[must_use]
    pub const fn name(&self) -> &'static str {
        match self {
            Self::Step { .. } => "step",
            Self::Taper { .. } => "taper",
        }
    }

    /// The key of the place where it begins.
    pub(super) const fn first_key(&self) -> &'static str {
        match self {
            Self::Step { .. } => "at",
            Self::Taper { .. } => "from",
        }
    }

    /// Where it begins.
    #[must_use]
    pub const fn from(&self) -> Length {
        match self {
            Self::Step { at, .. } => *at,
            Self::Taper { from, .. } => *from,
        }
    }

    /// Where it ends.
    #[must_use]
    pub const fn to(&self) -> Length {
        match self {
            Self::Step { at, .. } => *at,
            Self::Taper { to, .. } => *to,
        }
    }

    /// The section after it.
    #[must_use]
    pub const fn section(&self) -> &Section {
        match self {
            Self::Step { section, .. } | Self::Taper { section, .. } => section,
        }
    }
}
