//! The times at which results are given.

use crate::choice::chosen;
use std::fmt;
use std::str::FromStr;

/// When a result holds.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub enum Time {
    /// The day the load comes on: every material with its short-term modulus.
    Initial,
    /// The end of the life: the quasi-permanent share of the load with effective moduli, the rest
    /// with short-term moduli.
    Final,
}

impl Time {
    /// Both times, in order.
    pub const ALL: [Self; 2] = [Self::Initial, Self::Final];

    /// Its position in [`Time::ALL`].
    pub(crate) const fn index(self) -> usize {
        match self {
            Self::Initial => 0,
            Self::Final => 1,
        }
    }

    /// The word used in documents: `initial` or `final`.
    #[must_use]
    pub const fn name(self) -> &'static str {
        match self {
            Self::Initial => "initial",
            Self::Final => "final",
        }
    }
}

impl fmt::Display for Time {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        f.write_str(self.name())
    }
}

impl FromStr for Time {
    type Err = crate::Error;

    fn from_str(text: &str) -> Result<Self, Self::Err> {
        chosen(text, "time", &Self::ALL, Self::name)
    }
}
