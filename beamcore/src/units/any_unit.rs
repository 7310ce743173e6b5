//! A unit whose type is only known when the program runs, for documents and bindings.

use super::unit::{TypeRow, Unit, find};
use super::{AnyQuantity, Dimension};
use crate::error::{ErrorKind, Problem};

/// A unit of any dimension: `si = x * num / den`.
///
/// Products and quotients keep the fraction in lowest terms, so that kN/m and N/mm are exactly
/// 1000/1 N/m.
///
/// # Examples
/// ```
/// use beamcore::units::{AnyUnit, LineLoad};
/// let unit = AnyUnit::named("kN")?.per(AnyUnit::named("m")?)?;
/// assert_eq!(unit.of(6.5).to::<LineLoad>("load")?, LineLoad::from_kN_per_m(6.5));
/// # Ok::<(), beamcore::Problem>(())
/// ```
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct AnyUnit {
    num: f64,
    den: f64,
    dimension: Dimension,
}

impl AnyUnit {
    /// The unit one, of plain numbers.
    pub const ONE: Self = Self {
        num: 1.0,
        den: 1.0,
        dimension: Dimension::NONE,
    };

    /// The unit of the table with this symbol, as in "mm" or "kN/m".
    ///
    /// # Errors
    /// [`ErrorKind::Unit`] if no type has such a unit.
    pub fn named(symbol: &str) -> Result<Self, Problem> {
        let (row, unit) = find(symbol).ok_or_else(|| {
            Problem::new(
                ErrorKind::Unit,
                "unit",
                format!("the unknown unit {symbol:?}"),
                "the symbol of a unit, for example \"mm\", \"kN\" or \"kN/m\"",
            )
        })?;
        Ok(Self::in_table(row, unit))
    }

    fn in_table(row: &TypeRow, unit: &Unit) -> Self {
        Self {
            num: unit.num,
            den: unit.den,
            dimension: row.dimension,
        }
    }

    /// The numerator of the factor to SI.
    #[must_use]
    pub const fn num(self) -> f64 {
        self.num
    }

    /// The denominator of the factor to SI.
    #[must_use]
    pub const fn den(self) -> f64 {
        self.den
    }

    /// The dimension.
    #[must_use]
    pub const fn dimension(self) -> Dimension {
        self.dimension
    }

    /// The product of two units.
    ///
    /// # Errors
    /// [`ErrorKind::Value`] if a power leaves -128 to 127 or the factor the range of a double.
    pub fn times(self, other: Self) -> Result<Self, Problem> {
        self.joined(other.num, other.den, self.dimension.times(other.dimension))
    }

    /// The quotient of two units.
    ///
    /// # Errors
    /// As for [`AnyUnit::times`].
    pub fn per(self, other: Self) -> Result<Self, Problem> {
        self.joined(other.den, other.num, self.dimension.per(other.dimension))
    }

    /// The unit to a whole power, as in mm^2.
    ///
    /// # Errors
    /// As for [`AnyUnit::times`].
    pub fn power(self, exponent: i8) -> Result<Self, Problem> {
        let join = if exponent < 0 { Self::per } else { Self::times };
        (0..exponent.unsigned_abs()).try_fold(Self::ONE, |power, _| join(power, self))
    }

    fn joined(self, num: f64, den: f64, dimension: Option<Dimension>) -> Result<Self, Problem> {
        let (num1, den2) = cancelled(self.num, den);
        let (num2, den1) = cancelled(num, self.den);
        let (num, den) = (num1 * num2, den1 * den2);
        match dimension {
            Some(dimension) if num.is_normal() && den.is_normal() => Ok(Self {
                num,
                den,
                dimension,
            }),
            _ => Err(Problem::new(
                ErrorKind::Value,
                "unit",
                "a unit with a power or a factor that is too large",
                "powers from -128 to 127 and a factor that a double can hold",
            )),
        }
    }

    /// The quantity of `x` of this unit, x * num / den in SI.
    #[must_use]
    pub const fn of(self, x: f64) -> AnyQuantity {
        AnyQuantity::new(x * self.num / self.den, self.dimension)
    }
}

/// The two numbers divided by their greatest common divisor, if both are whole numbers.
fn cancelled(a: f64, b: f64) -> (f64, f64) {
    const LIMIT: f64 = (1u64 << 63) as f64;
    if a == b {
        return (1.0, 1.0);
    }
    let whole = |x: f64| x.fract() == 0.0 && (1.0..LIMIT).contains(&x);
    if !whole(a) || !whole(b) {
        return (a, b);
    }
    let (mut divisor, mut rest) = (a as u64, b as u64);
    while rest != 0 {
        (divisor, rest) = (rest, divisor % rest);
    }
    (a / divisor as f64, b / divisor as f64)
}
