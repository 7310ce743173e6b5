//! Rounding of a rise to steps that a shop can build.

use crate::error::{Error, ErrorKind, Problem};
use crate::units::Length;
use std::str::FromStr;

/// The direction of rounding; it works on the magnitude.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub enum Rounding {
    /// To the nearest step, halves away from zero.
    Nearest,
    /// To the step below, as for steel beams that shall not stay crowned.
    Down,
    /// To the step above.
    Up,
}

impl Rounding {
    /// All directions.
    pub const ALL: [Self; 3] = [Self::Nearest, Self::Down, Self::Up];

    /// The word used in documents.
    #[must_use]
    pub const fn name(self) -> &'static str {
        match self {
            Self::Nearest => "nearest",
            Self::Down => "down",
            Self::Up => "up",
        }
    }

    /// A length rounded to whole steps.
    #[must_use]
    pub fn apply(self, length: Length, step: Length) -> Length {
        let steps = length / step;
        // A length that is a whole number of steps but for rounding stays where it is.
        let whole = steps.round();
        let near = (steps - whole).abs() <= 1e-9 * whole.abs().max(1.0);
        let rounded = match self {
            _ if near => whole,
            Self::Nearest => whole,
            Self::Down => steps.trunc(),
            Self::Up => steps.trunc() + steps.signum(),
        };
        // Steps are whole numbers of the step's own unit: 12 steps of 1 mm are 12 mm exactly.
        Length::from_si(rounded * step.si())
    }
}

/// Reads the word used in documents; any other text is of the kind [`ErrorKind::Name`].
impl FromStr for Rounding {
    type Err = Error;

    fn from_str(text: &str) -> Result<Self, Error> {
        Self::ALL
            .into_iter()
            .find(|rounding| rounding.name() == text)
            .ok_or_else(|| {
                let expected = "one of \"nearest\", \"down\", \"up\"";
                Problem::new(
                    ErrorKind::Name,
                    "camber.rounding",
                    format!("\"{text}\""),
                    expected,
                )
                .into()
            })
    }
}

#[cfg(test)]
mod tests {
    use super::*;
    use crate::units::Number;

    #[test]
    fn every_word_is_read_back() {
        for rounding in Rounding::ALL {
            assert_eq!(rounding.name().parse(), Ok(rounding));
        }
        let error = "off".parse::<Rounding>().unwrap_err();
        assert_eq!(
            error.to_string(),
            "camber.rounding: found \"off\"; expected one of \"nearest\", \"down\", \"up\""
        );
    }

    #[test]
    fn each_direction_rounds_the_magnitude() {
        let round = |rounding: Rounding, mm: f64| rounding.apply(mm.mm(), 5.mm()).to_mm();
        let near = |a: f64, b: f64| assert!((a - b).abs() < 1e-9, "{a} {b}");
        near(round(Rounding::Nearest, 12.4), 10.0);
        near(round(Rounding::Nearest, 12.6), 15.0);
        near(round(Rounding::Down, 14.9), 10.0);
        near(round(Rounding::Up, 10.1), 15.0);
        near(round(Rounding::Down, -14.9), -10.0);
        near(round(Rounding::Up, 15.0), 15.0);
    }
}
