//! The dimension of a quantity: its powers of mass, length, time and temperature.

use std::fmt;

/// The powers of mass, length, time and temperature that make up a quantity.
///
/// An angle and a strain are plain numbers, [`Dimension::NONE`].
///
/// # Examples
/// ```
/// use beamcore::units::{Dimension, Force, Length, Moment, Quantity};
/// assert_eq!(Force::DIMENSION.times(Length::DIMENSION), Some(Moment::DIMENSION));
/// assert_eq!(Force::DIMENSION, Dimension { mass: 1, length: 1, time: -2, temperature: 0 });
/// assert_eq!(Force::DIMENSION.to_string(), "kg m/s2");
/// ```
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub struct Dimension {
    /// The power of mass (kg).
    pub mass: i8,
    /// The power of length (m).
    pub length: i8,
    /// The power of time (s).
    pub time: i8,
    /// The power of temperature (K).
    pub temperature: i8,
}

impl Dimension {
    /// The dimension of a plain number.
    pub const NONE: Self = Self::mechanical(0, 0, 0);

    /// A dimension without temperature.
    pub(super) const fn mechanical(mass: i8, length: i8, time: i8) -> Self {
        Self {
            mass,
            length,
            time,
            temperature: 0,
        }
    }

    /// The same dimension with this power of temperature.
    pub(super) const fn with_temperature(self, temperature: i8) -> Self {
        Self {
            temperature,
            ..self
        }
    }

    /// The dimension of a product, or `None` if a power leaves -128 to 127.
    #[must_use]
    pub fn times(self, other: Self) -> Option<Self> {
        self.joined(other, i8::checked_add)
    }

    /// The dimension of a quotient, or `None` if a power leaves -128 to 127.
    #[must_use]
    pub fn per(self, other: Self) -> Option<Self> {
        self.joined(other, i8::checked_sub)
    }

    fn joined(self, other: Self, join: impl Fn(i8, i8) -> Option<i8>) -> Option<Self> {
        Some(Self {
            mass: join(self.mass, other.mass)?,
            length: join(self.length, other.length)?,
            time: join(self.time, other.time)?,
            temperature: join(self.temperature, other.temperature)?,
        })
    }
}

/// The SI base units with their powers, as in "kg m/s2"; "1" for a plain number.
impl fmt::Display for Dimension {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        let powers = [
            ("kg", self.mass),
            ("m", self.length),
            ("K", self.temperature),
            ("s", self.time),
        ];
        let side = |sign: i8| {
            let factors = powers.iter().filter(|(_, power)| power.signum() == sign);
            let factors = factors.map(|(base, power)| match power.unsigned_abs() {
                1 => (*base).to_owned(),
                size => format!("{base}{size}"),
            });
            factors.collect::<Vec<_>>()
        };
        let (above, below) = (side(1), side(-1));
        f.write_str(if above.is_empty() && below.is_empty() {
            "1"
        } else {
            ""
        })?;
        f.write_str(&above.join(" "))?;
        below.iter().try_for_each(|factor| write!(f, "/{factor}"))
    }
}
