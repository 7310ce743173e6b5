//! The class `Quantity`.

use crate::error::OrRaise;
use crate::made::{Recipe, Reduced};
use crate::operand::{self, Answer, Number, Operand};
use crate::unit::{Unit, UnitOrText};
use beamcore::units::{AnyQuantity, Dimension, Quantity as CoreQuantity};
use pyo3::basic::CompareOp;
use pyo3::prelude::*;
use pyo3::types::PyBool;
use std::fmt;
use std::hash::{DefaultHasher, Hash, Hasher};

/// A number with its unit: `Quantity(75, mm)`, or rather `75 * mm`.
///
/// It is one SI number, number * num / den, and a dimension; the unit serves for printing. Sums and
/// comparisons need one dimension. The quotient of two alike quantities is a plain number.
///
/// >>> (75 * mm).to("m")
/// 0.075
/// >>> 5 * kN/m * (4.2*m)**2 / 8
/// 11.025 kN*m
/// >>> 225 * mm / (4.5*m)
/// 0.05
/// >>> 75*mm + 2*kN
/// Traceback (most recent call last):
/// beamcore.UnitProblem: quantity: found a force of 2000 N; expected a length (m, mm, cm, in, ft)
#[pyclass(frozen, from_py_object, module = "beamcore")]
#[derive(Clone, Debug)]
pub(crate) struct Quantity {
    any: AnyQuantity,
    unit: Unit,
    /// The number as written, from which the SI number was made in one step.
    number: Option<f64>,
}

impl Quantity {
    /// A number as written, with its unit.
    pub(crate) const fn written(number: f64, unit: Unit) -> Self {
        Self {
            any: unit.any().of(number),
            unit,
            number: Some(number),
        }
    }

    /// A quantity that was calculated, and a unit of its dimension to show it in.
    pub(crate) const fn calculated(any: AnyQuantity, unit: Unit) -> Self {
        Self {
            any,
            unit,
            number: None,
        }
    }

    /// A quantity of the core, shown in the unit in which the core prints it.
    pub(crate) fn of<Q: CoreQuantity>(quantity: Q) -> Self {
        let printed = quantity.to_string();
        let symbol = printed.split_once(' ').map_or("", |(_, symbol)| symbol);
        let unit = Unit::read(symbol).unwrap_or(Unit::ONE);
        Self::calculated(AnyQuantity::from(quantity), unit)
    }

    pub(crate) const fn any(&self) -> AnyQuantity {
        self.any
    }

    pub(crate) const fn unit(&self) -> &Unit {
        &self.unit
    }

    pub(crate) const fn number(&self) -> Option<f64> {
        self.number
    }

    /// The quantity of another SI number in the same unit.
    fn with_si(&self, si: f64) -> Self {
        let any = AnyQuantity::new(si, self.any.dimension());
        Self::calculated(any, self.unit.clone())
    }

    /// The sum or difference with another quantity, shown in the unit of this one.
    fn summed<'py>(
        &self,
        other: &Bound<'py, PyAny>,
        join: fn(AnyQuantity, AnyQuantity) -> Result<AnyQuantity, beamcore::Problem>,
    ) -> Answer<'py> {
        let py = other.py();
        match Operand::of(other)? {
            Some(Operand::Quantity(other)) => {
                let any = join(self.any, other.any).or_raise(py)?;
                Ok(Bound::new(py, Self::calculated(any, self.unit.clone()))?.into_any())
            }
            _ => Ok(py.NotImplemented().into_bound(py)),
        }
    }
}

impl PartialEq for Quantity {
    fn eq(&self, other: &Self) -> bool {
        self.any == other.any
    }
}

/// At most six significant digits and the unit: "75 mm".
impl fmt::Display for Quantity {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        let number = match self.number {
            Some(number) => number,
            None => self
                .any
                .number_in(self.unit.any())
                .map_err(|_| fmt::Error)?,
        };
        // As a plain quantity it prints its number alone, with six digits.
        write!(f, "{}", AnyQuantity::new(number, Dimension::NONE))?;
        if self.unit.is_blank() {
            Ok(())
        } else {
            write!(f, " {}", self.unit)
        }
    }
}

#[pymethods]
impl Quantity {
    /// NumPy leaves products to this class, which refuses arrays.
    #[classattr]
    const fn __array_ufunc__() -> Option<f64> {
        None
    }

    #[new]
    fn new(py: Python<'_>, number: Number, unit: UnitOrText) -> PyResult<Self> {
        Ok(Self::written(number.0, unit.read(py)?))
    }

    /// The quantity of an SI number, to be shown in the unit.
    ///
    /// >>> Quantity.from_si(0.075, mm)
    /// 75 mm
    #[staticmethod]
    fn from_si(si: Number, unit: Unit) -> Self {
        Self::calculated(AnyQuantity::new(si.0, unit.any().dimension()), unit)
    }

    /// The number in SI units: m, N, N/m, N m, Pa, kg/m3, s, rad.
    #[getter]
    fn si(&self) -> f64 {
        self.any.si()
    }

    /// The number in a unit, si * den / num.
    ///
    /// >>> (1.5 * kN/m).to("N/m")
    /// 1500.0
    fn to(&self, py: Python<'_>, unit: UnitOrText) -> PyResult<f64> {
        self.any.number_in(unit.read(py)?.any()).or_raise(py)
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

    fn __add__<'py>(&self, other: &Bound<'py, PyAny>) -> Answer<'py> {
        self.summed(other, AnyQuantity::plus)
    }

    fn __sub__<'py>(&self, other: &Bound<'py, PyAny>) -> Answer<'py> {
        self.summed(other, AnyQuantity::minus)
    }

    fn __pow__(&self, py: Python<'_>, exponent: i8, modulo: Option<i64>) -> PyResult<Self> {
        operand::no_modulo(modulo)?;
        let join = if exponent < 0 {
            AnyQuantity::per
        } else {
            AnyQuantity::times
        };
        let one = AnyQuantity::new(1.0, Dimension::NONE);
        let any = (0..exponent.unsigned_abs()).try_fold(one, |power, _| join(power, self.any));
        let unit = self.unit.power(exponent).or_raise(py)?;
        Ok(Self::calculated(any.or_raise(py)?, unit))
    }

    fn __neg__(&self) -> Self {
        self.with_si(-self.any.si())
    }

    fn __pos__(&self) -> Self {
        self.clone()
    }

    fn __abs__(&self) -> Self {
        self.with_si(self.any.si().abs())
    }

    fn __richcmp__<'py>(&self, other: &Bound<'py, PyAny>, op: CompareOp) -> Answer<'py> {
        let py = other.py();
        let Ok(other) = other.cast::<Self>() else {
            return Ok(py.NotImplemented().into_bound(py));
        };
        let other = other.get().any;
        let alike = self.any.dimension() == other.dimension();
        let holds = match op {
            CompareOp::Eq => self.any == other,
            CompareOp::Ne => self.any != other,
            order => {
                if !alike {
                    // The difference of two dimensions is the core's error.
                    self.any.minus(other).or_raise(py)?;
                }
                self.any
                    .si()
                    .partial_cmp(&other.si())
                    .is_some_and(|found| order.matches(found))
            }
        };
        Ok(PyBool::new(py, holds).to_owned().into_any())
    }

    fn __hash__(&self) -> u64 {
        let mut hasher = DefaultHasher::new();
        // 0.0 and -0.0 are equal, so they have one hash.
        ((self.any.si() + 0.0).to_bits(), self.any.dimension()).hash(&mut hasher);
        hasher.finish()
    }

    fn __str__(&self) -> String {
        self.to_string()
    }

    fn __repr__(&self) -> String {
        self.to_string()
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        let unit = self.unit.clone();
        match self.number {
            Some(number) => Recipe::call(py, "Quantity", (number, unit)),
            None => Recipe::call(py, "Quantity.from_si", (self.any.si(), unit)),
        }?
        .reduce(py)
    }
}
