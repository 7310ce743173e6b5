//! The class `Unit`.

use crate::error::OrRaise;
use crate::made::{Recipe, Reduced};
use crate::operand::{self, Answer, Operand};
use beamcore::Problem;
use beamcore::units::AnyUnit;
use pyo3::prelude::*;
use std::fmt;
use std::hash::{DefaultHasher, Hash, Hasher};

/// A unit, or a product of powers of units.
///
/// A number times a unit is a quantity: x * num / den in SI, with whole numbers num and den. Arrays
/// are refused: they stay plain SI numbers, with the unit in their name (`width_m`).
///
/// >>> 6.5 * kN/m == 6.5 * Unit("kN/m")
/// True
/// >>> (8e6 * mm**4).to("cm4")
/// 800.0
#[pyclass(frozen, from_py_object, module = "beamcore")]
#[derive(Clone, Debug)]
pub(crate) struct Unit {
    any: AnyUnit,
    /// The symbols with their powers, none of them zero.
    factors: Vec<(String, i8)>,
}

impl Unit {
    /// The unit one.
    pub(crate) const ONE: Self = Self {
        any: AnyUnit::ONE,
        factors: Vec::new(),
    };

    /// The unit of a symbol of the core, or of a product such as "kg*m/s**2".
    pub(crate) fn read(text: &str) -> Result<Self, Problem> {
        Self::product(text).map_or_else(|| Self::named(text), Ok)
    }

    fn named(symbol: &str) -> Result<Self, Problem> {
        Ok(Self {
            any: AnyUnit::named(symbol)?,
            factors: vec![(symbol.to_owned(), 1)],
        })
    }

    /// The product of the factors of a text, if each of them is known; as in Python, only the
    /// factor right behind a stroke divides.
    fn product(text: &str) -> Option<Self> {
        let text = text.replace("**", "^");
        let mut unit = Self::ONE;
        for (i, quotient) in text.split('/').enumerate() {
            for (j, factor) in quotient.trim().split(['*', ' ']).enumerate() {
                let leading = (i, j) == (0, 0);
                unit = match factor.trim() {
                    // "" and "/m" have no factor at their beginning.
                    "" if leading => Ok(unit),
                    factor if i > 0 && j == 0 => unit.per(&Self::factor(factor)?),
                    factor => unit.times(&Self::factor(factor)?),
                }
                .ok()?;
            }
        }
        Some(unit)
    }

    /// A symbol with its power: "mm", "mm2", "mm^2", "m^-1"; or "1".
    fn factor(text: &str) -> Option<Self> {
        if text == "1" {
            return Some(Self::ONE);
        }
        let digits = |c: char| c.is_ascii_digit();
        let (symbol, power) = match text.split_once('^') {
            Some(parts) => parts,
            None => text.split_at(text.trim_end_matches(digits).len()),
        };
        let power = if power.is_empty() {
            Ok(1)
        } else {
            power.parse()
        };
        Self::named(symbol).ok()?.power(power.ok()?).ok()
    }

    /// The unit of the core.
    pub(crate) const fn any(&self) -> AnyUnit {
        self.any
    }

    /// Whether there is no symbol to print.
    pub(crate) const fn is_blank(&self) -> bool {
        self.factors.is_empty()
    }

    pub(crate) fn times(&self, other: &Self) -> Result<Self, Problem> {
        Ok(Self {
            any: self.any.times(other.any)?,
            factors: joined(&self.factors, &other.factors, i8::checked_add),
        })
    }

    pub(crate) fn per(&self, other: &Self) -> Result<Self, Problem> {
        Ok(Self {
            any: self.any.per(other.any)?,
            factors: joined(&self.factors, &other.factors, i8::checked_sub),
        })
    }

    pub(crate) fn power(&self, exponent: i8) -> Result<Self, Problem> {
        let join = if exponent < 0 { Self::per } else { Self::times };
        (0..exponent.unsigned_abs()).try_fold(Self::ONE, |power, _| join(&power, self))
    }
}

/// The powers of a product or a quotient. The core has refused powers that are too large.
fn joined(
    left: &[(String, i8)],
    right: &[(String, i8)],
    join: fn(i8, i8) -> Option<i8>,
) -> Vec<(String, i8)> {
    let mut all = left.to_vec();
    for (symbol, power) in right {
        let place = all.iter().position(|(known, _)| known == symbol);
        let place = place.unwrap_or_else(|| {
            all.push((symbol.clone(), 0));
            all.len() - 1
        });
        all[place].1 = join(all[place].1, *power).unwrap_or(all[place].1);
    }
    all.retain(|(_, power)| *power != 0);
    all
}

/// "kg*m/s**2", "1/m", "1".
impl fmt::Display for Unit {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        let factor = |(symbol, power): &(String, i8)| match power.unsigned_abs() {
            1 => symbol.clone(),
            size => format!("{symbol}**{size}"),
        };
        let above = self.factors.iter().filter(|(_, power)| *power > 0);
        let above: Vec<_> = above.map(factor).collect();
        f.write_str(if above.is_empty() { "1" } else { "" })?;
        f.write_str(&above.join("*"))?;
        let mut below = self.factors.iter().filter(|(_, power)| *power < 0);
        below.try_for_each(|below| write!(f, "/{}", factor(below)))
    }
}

/// A unit, or its symbol as a text.
#[derive(FromPyObject)]
pub(crate) enum UnitOrText {
    Unit(Unit),
    Text(String),
}

impl UnitOrText {
    /// The unit, or the core's error for a symbol that is unknown.
    pub(crate) fn read(self, py: Python<'_>) -> PyResult<Unit> {
        match self {
            Self::Unit(unit) => Ok(unit),
            Self::Text(symbol) => Unit::read(&symbol).or_raise(py),
        }
    }
}

#[pymethods]
impl Unit {
    /// NumPy leaves products to this class, which refuses arrays.
    #[classattr]
    const fn __array_ufunc__() -> Option<f64> {
        None
    }

    #[new]
    fn new(py: Python<'_>, symbol: &str) -> PyResult<Self> {
        Self::read(symbol).or_raise(py)
    }

    fn __mul__<'py>(slf: &Bound<'py, Self>, other: &Bound<'py, PyAny>) -> Answer<'py> {
        operand::product(slf.py(), Operand::of(slf)?, Operand::of(other)?)
    }

    fn __rmul__<'py>(slf: &Bound<'py, Self>, other: &Bound<'py, PyAny>) -> Answer<'py> {
        operand::product(slf.py(), Operand::of(other)?, Operand::of(slf)?)
    }

    fn __truediv__<'py>(slf: &Bound<'py, Self>, other: &Bound<'py, PyAny>) -> Answer<'py> {
        operand::quotient(slf.py(), Operand::of(slf)?, Operand::of(other)?)
    }

    fn __rtruediv__<'py>(slf: &Bound<'py, Self>, other: &Bound<'py, PyAny>) -> Answer<'py> {
        operand::quotient(slf.py(), Operand::of(other)?, Operand::of(slf)?)
    }

    fn __pow__(&self, py: Python<'_>, exponent: i8, modulo: Option<i64>) -> PyResult<Self> {
        operand::no_modulo(modulo)?;
        self.power(exponent).or_raise(py)
    }

    fn __eq__(&self, other: &Bound<'_, PyAny>) -> bool {
        other
            .cast::<Self>()
            .is_ok_and(|other| other.get().any == self.any)
    }

    fn __hash__(&self) -> u64 {
        let mut hasher = DefaultHasher::new();
        (
            self.any.num().to_bits(),
            self.any.den().to_bits(),
            self.any.dimension(),
        )
            .hash(&mut hasher);
        hasher.finish()
    }

    fn __str__(&self) -> String {
        self.to_string()
    }

    fn __repr__(&self) -> String {
        format!("Unit(\"{self}\")")
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        Recipe::call(py, "Unit", (self.to_string(),))?.reduce(py)
    }
}
