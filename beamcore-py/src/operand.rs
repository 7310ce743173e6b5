//! Products and quotients of numbers, units and quantities.

use crate::error::OrRaise;
use crate::quantity::Quantity;
use crate::unit::Unit;
use beamcore::Problem;
use beamcore::units::{AnyQuantity, Dimension};
use pyo3::exceptions::PyTypeError;
use pyo3::prelude::*;
use pyo3::types::{PyBool, PyFloat, PyInt, PyList, PyTuple};

/// What an operator returns: a value, or `NotImplemented`.
pub(crate) type Answer<'py> = PyResult<Bound<'py, PyAny>>;

/// What stands on one side of an operator.
pub(crate) enum Operand {
    Number(f64),
    Unit(Unit),
    Quantity(Quantity),
}

impl Operand {
    /// The operand that a Python object is; `None` if it is none.
    ///
    /// Arrays and lists are a `TypeError`, so that a unit is never silently spread over them.
    pub(crate) fn of<T>(value: &Bound<'_, T>) -> PyResult<Option<Self>> {
        let value = value.as_any();
        if let Ok(quantity) = value.cast::<Quantity>() {
            return Ok(Some(Self::Quantity(quantity.get().clone())));
        }
        if let Ok(unit) = value.cast::<Unit>() {
            return Ok(Some(Self::Unit(unit.get().clone())));
        }
        if let Some(number) = number(value)? {
            return Ok(Some(Self::Number(number)));
        }
        if is_array(value)? {
            return Err(PyTypeError::new_err(format!(
                "units and quantities do not go with {}: give an array as plain SI numbers, with \
                 the unit in its name (x_m), or write a quantity for each value",
                value.get_type().name()?
            )));
        }
        Ok(None)
    }

    fn into_object(self, py: Python<'_>) -> Answer<'_> {
        Ok(match self {
            Self::Number(number) => PyFloat::new(py, number).into_any(),
            Self::Unit(unit) => Bound::new(py, unit)?.into_any(),
            Self::Quantity(quantity) => Bound::new(py, quantity)?.into_any(),
        })
    }
}

/// A plain number as an input; neither a truth value nor an array.
#[derive(Clone, Copy)]
pub(crate) struct Number(pub(crate) f64);

impl<'a, 'py> FromPyObject<'a, 'py> for Number {
    type Error = PyErr;

    fn extract(object: Borrowed<'a, 'py, PyAny>) -> PyResult<Self> {
        number(&object)?.map(Self).ok_or_else(|| {
            let found = object.get_type();
            PyTypeError::new_err(format!("a number is needed, not {found}"))
        })
    }
}

/// The value of a number, of Python's own or registered as `numbers.Real`; not of a truth value.
pub(crate) fn number(value: &Bound<'_, PyAny>) -> PyResult<Option<f64>> {
    if value.is_instance_of::<PyBool>() {
        return Ok(None);
    }
    let real = value.is_instance_of::<PyFloat>() || value.is_instance_of::<PyInt>() || {
        let class = value.py().import("numbers")?.getattr("Real")?;
        value.is_instance(&class)?
    };
    real.then(|| value.extract()).transpose()
}

/// Whether a value holds several numbers.
pub(crate) fn is_array(value: &Bound<'_, PyAny>) -> PyResult<bool> {
    Ok(value.is_instance_of::<PyList>()
        || value.is_instance_of::<PyTuple>()
        || value.hasattr("__array__")?)
}

/// `a * b`.
pub(crate) fn product(py: Python<'_>, a: Option<Operand>, b: Option<Operand>) -> Answer<'_> {
    answer(py, a, b, times)
}

/// `a / b`.
pub(crate) fn quotient(py: Python<'_>, a: Option<Operand>, b: Option<Operand>) -> Answer<'_> {
    answer(py, a, b, per)
}

fn answer(
    py: Python<'_>,
    a: Option<Operand>,
    b: Option<Operand>,
    join: fn(Operand, Operand) -> Result<Operand, Problem>,
) -> Answer<'_> {
    match (a, b) {
        (Some(a), Some(b)) => join(a, b).or_raise(py)?.into_object(py),
        _ => Ok(py.NotImplemented().into_bound(py)),
    }
}

fn times(a: Operand, b: Operand) -> Result<Operand, Problem> {
    use Operand::{Number, Quantity as Q, Unit as U};
    Ok(match (a, b) {
        (Number(a), Number(b)) => Number(a * b),
        (Number(x), U(unit)) | (U(unit), Number(x)) => Q(Quantity::written(x, unit)),
        (U(a), U(b)) => U(a.times(&b)?),
        (Q(q), Number(x)) | (Number(x), Q(q)) => {
            let any = q.any().times(plain(x))?;
            Q(Quantity::calculated(any, q.unit().clone()))
        }
        (Q(q), U(unit)) | (U(unit), Q(q)) => joined(&q, &unit, Unit::times)?,
        (Q(a), Q(b)) => pure(a.any().times(b.any())?, a.unit().times(b.unit())?),
    })
}

fn per(a: Operand, b: Operand) -> Result<Operand, Problem> {
    use Operand::{Number, Quantity as Q, Unit as U};
    Ok(match (a, b) {
        (Number(a), Number(b)) => Number(a / b),
        (Number(x), U(unit)) => Q(Quantity::written(x, Unit::ONE.per(&unit)?)),
        (U(unit), Number(x)) => {
            let any = unit.any().of(1.0).per(plain(x))?;
            Q(Quantity::calculated(any, unit))
        }
        (U(a), U(b)) => U(a.per(&b)?),
        (Q(q), Number(x)) => Q(Quantity::calculated(
            q.any().per(plain(x))?,
            q.unit().clone(),
        )),
        (Number(x), Q(q)) => {
            let any = plain(x).per(q.any())?;
            Q(Quantity::calculated(any, Unit::ONE.per(q.unit())?))
        }
        (Q(q), U(unit)) => joined(&q, &unit, Unit::per)?,
        (U(unit), Q(q)) => {
            let any = unit.any().of(1.0).per(q.any())?;
            pure(any, unit.per(q.unit())?)
        }
        (Q(a), Q(b)) => pure(a.any().per(b.any())?, a.unit().per(b.unit())?),
    })
}

/// A quantity times or by a unit. As long as a quantity is a number as written, its units are
/// joined first, so that 1.3*kip/ft has the bits of "1.3 kip/ft".
fn joined(
    quantity: &Quantity,
    unit: &Unit,
    join: fn(&Unit, &Unit) -> Result<Unit, Problem>,
) -> Result<Operand, Problem> {
    let joined = join(quantity.unit(), unit)?;
    Ok(Operand::Quantity(match quantity.number() {
        Some(number) => Quantity::written(number, joined),
        None => {
            let factor = join(&Unit::ONE, unit)?.any().of(1.0);
            Quantity::calculated(quantity.any().times(factor)?, joined)
        }
    }))
}

const fn plain(x: f64) -> AnyQuantity {
    AnyQuantity::new(x, Dimension::NONE)
}

/// A quantity, or the number where all units have gone.
fn pure(any: AnyQuantity, unit: Unit) -> Operand {
    if any.dimension() == Dimension::NONE {
        Operand::Number(any.si())
    } else {
        Operand::Quantity(Quantity::calculated(any, unit))
    }
}

/// Powers with a modulus do not exist for units.
pub(crate) fn no_modulo(modulo: Option<i64>) -> PyResult<()> {
    match modulo {
        None => Ok(()),
        Some(_) => Err(PyTypeError::new_err("a power of a unit takes no modulus")),
    }
}
