//! Where the simplified methods hold.

use std::fmt;

/// Something that an engineer should know of a result of a simplified method.
#[non_exhaustive]
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub enum Warning {
    /// The method supposes a load in the form of half a sine wave on a single span.
    SineLoad,
    /// A span of several stands for a single span of 0.8 of its length.
    ContinuousSpan,
    /// A cantilever stands for a single span of twice its length.
    Cantilever,
    /// Fasteners at several spacings stand for fasteners at one.
    SteppedSpacing,
    /// The greatest spacing is more than four times the least.
    SpacingRatio,
}

impl Warning {
    /// The text for a reader.
    #[must_use]
    pub const fn text(self) -> &'static str {
        match self {
            Self::SineLoad => {
                "The method is exact for a load in the form of half a sine wave on a single span \
                 only; under a uniform load it gives too great a flow at the ends, and point loads \
                 bring local errors"
            }
            Self::ContinuousSpan => {
                "The span is one of several, for which a single span of 0.8 of its length is an \
                 approximation"
            }
            Self::Cantilever => {
                "A single span of twice the length of a cantilever is an approximation"
            }
            Self::SteppedSpacing => {
                "One effective spacing instead of several is an approximation, both for the \
                 deflection and for the forces of the fasteners"
            }
            Self::SpacingRatio => {
                "The greatest spacing is more than 4 times the least, for which the effective \
                 spacing does not hold"
            }
        }
    }
}

impl fmt::Display for Warning {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        f.write_str(self.text())
    }
}
