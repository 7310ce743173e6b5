//! A quantity whose type is only known when the program runs, for documents and bindings.

use super::print::six_digits;
use super::unit::{TypeRow, find, meaning};
use super::{AnyUnit, Dimension, Quantity, text};
use crate::error::{ErrorKind, Problem};
use std::fmt;

/// A quantity of any dimension, by its SI number.
///
/// # Examples
/// ```
/// use beamcore::units::{AnyQuantity, Length, Moment};
/// let arm = AnyQuantity::parse("4.2 m")?;
/// let force = AnyQuantity::parse("2 kN")?;
/// assert_eq!(force.times(arm)?.to::<Moment>("moment")?, Moment::from_kN_m(8.4));
///
/// let problem = force.to::<Length>("span").unwrap_err();
/// assert_eq!(
///     problem.to_string(),
///     "span: found a force of 2000 N; expected a length (m, mm, cm, in, ft)"
/// );
/// # Ok::<(), beamcore::Problem>(())
/// ```
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct AnyQuantity {
    si: f64,
    dimension: Dimension,
}

impl AnyQuantity {
    /// The quantity of this SI number and dimension.
    #[must_use]
    pub const fn new(si: f64, dimension: Dimension) -> Self {
        Self { si, dimension }
    }

    /// The quantity that `text` means, in any unit of the table.
    ///
    /// # Errors
    /// [`ErrorKind::Value`] if there is no finite decimal number, [`ErrorKind::Unit`] if the unit
    /// is missing or unknown.
    pub fn parse(text: &str) -> Result<Self, Problem> {
        let text = text.trim();
        let problem = |kind, found: String| {
            let expected = "a finite decimal number with a unit, for example \"225 mm\"";
            Problem::new(kind, "quantity", found, expected)
        };
        let no_number = || problem(ErrorKind::Value, format!("{text:?}"));
        let (value, symbol) = text::split(text).ok_or_else(no_number)?;
        if symbol.is_empty() {
            return Err(problem(ErrorKind::Unit, format!("{text:?} without a unit")));
        }
        let (row, unit) = find(symbol).ok_or_else(|| {
            problem(
                ErrorKind::Unit,
                format!("{text:?} with the unknown unit {symbol:?}"),
            )
        })?;
        Ok(Self {
            si: text::si(value, unit).ok_or_else(no_number)?,
            dimension: row.dimension,
        })
    }

    /// The SI number.
    #[must_use]
    pub const fn si(self) -> f64 {
        self.si
    }

    /// The dimension.
    #[must_use]
    pub const fn dimension(self) -> Dimension {
        self.dimension
    }

    /// The sum with a quantity of the same dimension.
    ///
    /// # Errors
    /// [`ErrorKind::Unit`] if the dimensions differ.
    pub fn plus(self, other: Self) -> Result<Self, Problem> {
        Ok(Self {
            si: self.si + other.alike(self.dimension)?.si,
            ..self
        })
    }

    /// The difference from a quantity of the same dimension.
    ///
    /// # Errors
    /// [`ErrorKind::Unit`] if the dimensions differ.
    pub fn minus(self, other: Self) -> Result<Self, Problem> {
        Ok(Self {
            si: self.si - other.alike(self.dimension)?.si,
            ..self
        })
    }

    /// The product of two quantities.
    ///
    /// # Errors
    /// [`ErrorKind::Value`] if a power of the dimension leaves -128 to 127.
    pub fn times(self, other: Self) -> Result<Self, Problem> {
        Self::with_powers(self.si * other.si, self.dimension.times(other.dimension))
    }

    /// The quotient of two quantities.
    ///
    /// # Errors
    /// [`ErrorKind::Value`] if a power of the dimension leaves -128 to 127.
    pub fn per(self, other: Self) -> Result<Self, Problem> {
        Self::with_powers(self.si / other.si, self.dimension.per(other.dimension))
    }

    fn with_powers(si: f64, dimension: Option<Dimension>) -> Result<Self, Problem> {
        dimension
            .map(|dimension| Self { si, dimension })
            .ok_or_else(|| {
                Problem::new(
                    ErrorKind::Value,
                    "quantity",
                    "a quantity with a power that is too large",
                    "powers from -128 to 127",
                )
            })
    }

    /// How many of `unit` this quantity is, si * den / num.
    ///
    /// # Errors
    /// [`ErrorKind::Unit`] if the dimensions differ.
    pub fn number_in(self, unit: AnyUnit) -> Result<f64, Problem> {
        Ok(self.alike(unit.dimension())?.si * unit.den() / unit.num())
    }

    /// This quantity as one of the type `Q`; a problem bears the `path` of the field.
    ///
    /// # Errors
    /// [`ErrorKind::Unit`] if the dimension is not that of `Q`, [`ErrorKind::Value`] if the number
    /// is NaN or infinite.
    pub fn to<Q: Quantity>(self, path: &str) -> Result<Q, Problem> {
        let kind = match self.dimension == Q::DIMENSION {
            true if self.si.is_finite() => return Ok(Q::from_si(self.si)),
            true => ErrorKind::Value,
            false => ErrorKind::Unit,
        };
        Err(Problem::new(
            kind,
            path,
            self.described(),
            TypeRow::of::<Q>().expected(),
        ))
    }

    /// This quantity, if it is of the `dimension`.
    fn alike(self, dimension: Dimension) -> Result<Self, Problem> {
        if self.dimension == dimension {
            return Ok(self);
        }
        let expected = match meaning(dimension) {
            Some(row) => row.expected(),
            None if dimension == Dimension::NONE => "a plain number".to_owned(),
            None => format!("a quantity in {dimension}"),
        };
        Err(Problem::new(
            ErrorKind::Unit,
            "quantity",
            self.described(),
            expected,
        ))
    }

    /// What this quantity is, as in "a force of 4200 N".
    fn described(self) -> String {
        match meaning(self.dimension) {
            Some(row) => format!("{} of {self}", row.one()),
            None if self.dimension == Dimension::NONE => format!("the plain number {self}"),
            None => format!("a quantity of {self}"),
        }
    }
}

impl<Q: Quantity> From<Q> for AnyQuantity {
    fn from(quantity: Q) -> Self {
        Self {
            si: quantity.si(),
            dimension: Q::DIMENSION,
        }
    }
}

/// The SI number and unit, with at most six significant digits.
impl fmt::Display for AnyQuantity {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        f.write_str(&six_digits(self.si))?;
        match meaning(self.dimension) {
            Some(row) => write!(f, " {}", row.si_symbol),
            None if self.dimension == Dimension::NONE => Ok(()),
            None => write!(f, " {}", self.dimension),
        }
    }
}
