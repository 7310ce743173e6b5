//! Quantities as inputs: with units, as texts, or of another units package.

use crate::error::{OrRaise, raised};
use crate::operand::number;
use crate::quantity::Quantity;
use crate::unit::Unit;
use beamcore::units::Quantity as CoreQuantity;
use beamcore::{Error, Problem};
use pyo3::exceptions::PyTypeError;
use pyo3::prelude::*;
use pyo3::types::PyString;

/// All that is wrong with the inputs of one object, gathered so that it is raised at once.
#[derive(Default)]
pub(crate) struct Inputs {
    problems: Vec<Problem>,
}

impl Inputs {
    /// The quantity of one field; `None` is a problem that was kept.
    pub(crate) fn read<Q: CoreQuantity>(
        &mut self,
        value: &Bound<'_, PyAny>,
        path: &str,
    ) -> PyResult<Option<Q>> {
        Ok(self.checked(quantity(value, path)?))
    }

    /// The value of a result of the core; `None` is an error that was kept.
    pub(crate) fn checked<T, E: Into<Error>>(&mut self, result: Result<T, E>) -> Option<T> {
        result
            .map_err(|error| self.problems.extend_from_slice(error.into().problems()))
            .ok()
    }

    /// The object made of all values, or the exception of everything that was kept.
    pub(crate) fn done<T>(self, py: Python<'_>, made: Option<T>) -> PyResult<T> {
        match Error::from_problems(self.problems) {
            Some(error) => Err(raised(py, &error)),
            None => Ok(made.expect("a value that is missing has left a problem")),
        }
    }
}

/// The quantity of a single field.
pub(crate) fn read<Q: CoreQuantity>(value: &Bound<'_, PyAny>, path: &str) -> PyResult<Q> {
    quantity(value, path)?.or_raise(value.py())
}

/// The quantity that a Python object means, or the core's problem with it.
fn quantity<Q: CoreQuantity>(value: &Bound<'_, PyAny>, path: &str) -> PyResult<Result<Q, Problem>> {
    if let Ok(quantity) = value.cast::<Quantity>() {
        return Ok(quantity.get().any().to(path));
    }
    if let Ok(text) = value.cast::<PyString>() {
        return Ok(Q::parse_at(&text.to_cow()?, path));
    }
    if let Some(number) = number(value)? {
        // Read as a text without a unit, it is the core that says which units fit.
        return Ok(Q::parse_at(&number.to_string(), path));
    }
    if let Some(found) = foreign(value, path)? {
        return Ok(found);
    }
    Err(PyTypeError::new_err(format!(
        "{path}: a quantity such as 225*mm or a text such as \"225 mm\" is needed, not {}",
        value.get_type().name()?
    )))
}

/// The quantity of another units package: a number `magnitude` in `units`.
///
/// Its units are read as they are if the core knows them, else in the package's base units.
fn foreign<Q: CoreQuantity>(
    value: &Bound<'_, PyAny>,
    path: &str,
) -> PyResult<Option<Result<Q, Problem>>> {
    if !value.hasattr("magnitude")? || !value.hasattr("units")? {
        return Ok(None);
    }
    if let Some((number, symbol)) = number_and_units(value)?
        && let Ok(unit) = Unit::read(&symbol)
    {
        return Ok(Some(unit.any().of(number).to(path)));
    }
    if !value.hasattr("to_base_units")? {
        return Ok(None);
    }
    let base = value.call_method0("to_base_units")?;
    let Some((number, symbol)) = number_and_units(&base)? else {
        return Ok(None);
    };
    Ok(Some(match Unit::read(&symbol) {
        Ok(unit) => unit.any().of(number).to(path),
        // The core has the words for a unit that is still unknown.
        Err(_) => Q::parse_at(&format!("{number} {symbol}"), path),
    }))
}

/// The number and the symbols of the units, in short form where the package has one.
fn number_and_units(value: &Bound<'_, PyAny>) -> PyResult<Option<(f64, String)>> {
    let Some(number) = number(&value.getattr("magnitude")?)? else {
        return Ok(None);
    };
    let units = value.getattr("units")?;
    let symbols = match units.call_method1("__format__", ("~C",)) {
        Ok(short) => short,
        Err(_) => units.str()?.into_any(),
    };
    Ok(Some((number, symbols.extract()?)))
}
