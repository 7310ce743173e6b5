//! The quantity types, made from the table, and the trait they share.

use super::unit::{TypeRow, Unit};
use super::{Dimension, print, text};
use crate::error::{Error, Problem};
use std::fmt::{self, Debug, Display};
use std::iter::Sum;
use std::ops::{Add, AddAssign, Div, Mul, Neg, Sub, SubAssign};
use std::str::FromStr;

mod sealed {
    /// Keeps [`Quantity`](super::Quantity) to the types of the table.
    pub trait Sealed {}
}

/// A physical quantity of one meaning, over one SI number.
///
/// As a text it is a decimal number and a unit, as in "225 mm" or "6.5 kN/m". It prints with at
/// most six significant digits in the first of a few units in which it is at least 1; a given
/// precision (`{:.1}`) is the number of decimals instead.
pub trait Quantity:
    Copy
    + Clone
    + PartialEq
    + PartialOrd
    + Debug
    + Display
    + FromStr<Err = Error>
    + Send
    + Sync
    + sealed::Sealed
    + 'static
{
    /// The name of the type: "LineLoad".
    const NAME: &'static str;
    /// The name in a sentence: "line load".
    const NOUN: &'static str;
    /// The dimension.
    const DIMENSION: Dimension;
    /// All units, the SI unit first.
    const UNITS: &'static [Unit];

    /// The quantity of this SI number.
    fn from_si(si: f64) -> Self;

    /// The SI number.
    fn si(self) -> f64;

    /// Whether the number is neither NaN nor infinite.
    fn is_finite(self) -> bool;

    /// The quantity that `text` means; a problem bears the `path` of the field.
    ///
    /// # Errors
    /// [`ErrorKind::Value`](crate::ErrorKind::Value) if there is no finite decimal number,
    /// [`ErrorKind::Unit`](crate::ErrorKind::Unit) if the unit is missing, unknown or of another
    /// quantity.
    fn parse_at(text: &str, path: &str) -> Result<Self, Problem> {
        text::read(text, path, &TypeRow::of::<Self>()).map(Self::from_si)
    }
}

macro_rules! types {
    ($(
        $(#[$doc:meta])*
        $Name:ident $noun:literal [$mass:expr, $length:expr, $time:expr $(, $temperature:expr)?]
        prints [$($print:literal),+] {
            $($symbol:literal ($num:expr, $den:expr) $from:ident $to:ident $($literal:ident)?;)+
        }
    )+) => {
        $(
            $(#[$doc])*
            #[repr(transparent)]
            #[derive(Clone, Copy, Debug, PartialEq, PartialOrd)]
            pub struct $Name(f64);

            impl sealed::Sealed for $Name {}

            impl Quantity for $Name {
                const NAME: &'static str = stringify!($Name);
                const NOUN: &'static str = $noun;
                const DIMENSION: Dimension = Dimension::mechanical($mass, $length, $time)
                    $(.with_temperature($temperature))?;
                const UNITS: &'static [Unit] = &[$(Unit {
                    symbol: $symbol,
                    name: stringify!($from).split_at("from_".len()).1,
                    num: $num,
                    den: $den,
                    literal: !stringify!($($literal)?).is_empty(),
                }),+];

                fn from_si(si: f64) -> Self {
                    Self(si)
                }

                fn si(self) -> f64 {
                    self.0
                }

                fn is_finite(self) -> bool {
                    self.0.is_finite()
                }
            }

            impl $Name {
                #[doc = concat!("No ", $noun, ".")]
                pub const ZERO: Self = Self(0.0);

                const PRINTED: &[Unit] = &[$(Unit::of(Self::UNITS, $print)),+];

                #[doc = concat!("The ", $noun, " of this SI number.")]
                #[must_use]
                pub const fn from_si(si: f64) -> Self {
                    Self(si)
                }

                /// The SI number.
                #[must_use]
                pub const fn si(self) -> f64 {
                    self.0
                }

                /// Whether the number is neither NaN nor infinite.
                #[must_use]
                pub const fn is_finite(self) -> bool {
                    self.0.is_finite()
                }

                /// The magnitude.
                #[must_use]
                pub const fn abs(self) -> Self {
                    Self(self.0.abs())
                }

                /// The greater of the two; where one is NaN, the other.
                #[must_use]
                pub const fn max(self, other: Self) -> Self {
                    Self(self.0.max(other.0))
                }

                /// The lesser of the two; where one is NaN, the other.
                #[must_use]
                pub const fn min(self, other: Self) -> Self {
                    Self(self.0.min(other.0))
                }

                $(
                    #[doc = concat!("The ", $noun, " `x` in the unit ", $symbol, ".")]
                    #[allow(non_snake_case)]
                    #[must_use]
                    pub const fn $from(x: f64) -> Self {
                        Self(x * $num / $den)
                    }

                    #[doc = concat!("The number in the unit ", $symbol, ".")]
                    #[allow(non_snake_case)]
                    #[must_use]
                    pub const fn $to(self) -> f64 {
                        self.0 * $den / $num
                    }
                )+
            }

            impl FromStr for $Name {
                type Err = Error;

                fn from_str(text: &str) -> Result<Self, Error> {
                    Ok(Self::parse_at(text, Self::NOUN)?)
                }
            }

            impl Display for $Name {
                fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
                    print::quantity(f, self.0, Self::PRINTED)
                }
            }

            impl Add for $Name {
                type Output = Self;
                fn add(self, other: Self) -> Self {
                    Self(self.0 + other.0)
                }
            }

            impl Sub for $Name {
                type Output = Self;
                fn sub(self, other: Self) -> Self {
                    Self(self.0 - other.0)
                }
            }

            impl Neg for $Name {
                type Output = Self;
                fn neg(self) -> Self {
                    Self(-self.0)
                }
            }

            impl AddAssign for $Name {
                fn add_assign(&mut self, other: Self) {
                    self.0 += other.0;
                }
            }

            impl SubAssign for $Name {
                fn sub_assign(&mut self, other: Self) {
                    self.0 -= other.0;
                }
            }

            impl Mul<f64> for $Name {
                type Output = Self;
                fn mul(self, factor: f64) -> Self {
                    Self(self.0 * factor)
                }
            }

            impl Mul<$Name> for f64 {
                type Output = $Name;
                fn mul(self, quantity: $Name) -> $Name {
                    $Name(self * quantity.0)
                }
            }

            impl Div<f64> for $Name {
                type Output = Self;
                fn div(self, divisor: f64) -> Self {
                    Self(self.0 / divisor)
                }
            }

            impl Div for $Name {
                type Output = f64;
                fn div(self, other: Self) -> f64 {
                    self.0 / other.0
                }
            }

            impl Sum for $Name {
                fn sum<I: Iterator<Item = Self>>(quantities: I) -> Self {
                    quantities.fold(Self::ZERO, Add::add)
                }
            }

            impl<'a> Sum<&'a Self> for $Name {
                fn sum<I: Iterator<Item = &'a Self>>(quantities: I) -> Self {
                    quantities.copied().sum()
                }
            }
        )+

        static TABLE: &[TypeRow] = &[$(TypeRow::of::<$Name>()),+];
    };
}

with_table!(types);

/// All types of quantity with their units.
///
/// # Examples
/// ```
/// let row = beamcore::units::table().iter().find(|row| row.name == "LineLoad").unwrap();
/// assert_eq!((row.noun, row.si_symbol), ("line load", "N/m"));
/// assert_eq!((row.units[1].symbol, row.units[1].name), ("kN/m", "kN_per_m"));
/// ```
#[must_use]
pub fn table() -> &'static [TypeRow] {
    TABLE
}
