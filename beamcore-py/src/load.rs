//! The class `Load`.

use crate::convert::{self, Inputs};
use crate::layer::stretch;
use crate::made::{Made, Recipe, Reduced};
use beamcore::member;
use pyo3::prelude::*;
use pyo3::types::PyTuple;

/// One load of an action, positive downward; a couple positive clockwise.
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct Load(pub(crate) Made<member::Load>);

#[pymethods]
impl Load {
    /// What it is: the name of the function that made it, as "uniform" or "temperature".
    #[getter]
    fn kind(&self) -> &'static str {
        self.0.name()
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }
}

/// The weight of the section over the whole member: sum of density x area x g.
#[pyfunction]
fn self_weight(py: Python<'_>) -> PyResult<Load> {
    let recipe = Recipe::call(py, "self_weight", PyTuple::empty(py))?;
    Ok(Load(Made::new(member::Load::SelfWeight, recipe)))
}

/// A constant line load over the whole member, positive downward.
///
/// >>> uniform(5*kN/m) == uniform("5 N/mm")
/// True
#[pyfunction]
fn uniform(load: &Bound<'_, PyAny>) -> PyResult<Load> {
    let core = member::Load::Uniform {
        load: convert::read(load, "uniform.load")?,
    };
    let recipe = Recipe::call(load.py(), "uniform", (load,))?;
    Ok(Load(Made::new(core, recipe)))
}

/// A constant line load from one place to another, positive downward.
#[pyfunction]
#[pyo3(signature = (load, from_, to))]
fn partial<'py>(
    load: &Bound<'py, PyAny>,
    from_: &Bound<'py, PyAny>,
    to: &Bound<'py, PyAny>,
) -> PyResult<Load> {
    let mut inputs = Inputs::default();
    let q = inputs.read(load, "partial.load")?;
    let from = inputs.read(from_, "partial.from")?;
    let end = inputs.read(to, "partial.to")?;
    let core = || {
        Some(member::Load::Partial {
            load: q?,
            from: from?,
            to: end?,
        })
    };
    let core = inputs.done(load.py(), core())?;
    let recipe = Recipe::call(load.py(), "partial", (load, from_, to))?;
    Ok(Load(Made::new(core, recipe)))
}

/// A point load at a place, positive downward.
#[pyfunction]
fn point<'py>(load: &Bound<'py, PyAny>, at: &Bound<'py, PyAny>) -> PyResult<Load> {
    let mut inputs = Inputs::default();
    let force = inputs.read(load, "point.load")?;
    let place = inputs.read(at, "point.at")?;
    let core = force
        .zip(place)
        .map(|(load, at)| member::Load::Point { load, at });
    let core = inputs.done(load.py(), core)?;
    let recipe = Recipe::call(load.py(), "point", (load, at))?;
    Ok(Load(Made::new(core, recipe)))
}

/// A line load that changes linearly from one place to another, positive downward.
///
/// q(x) = load_from + (load_to - load_from) (x - from_)/(to - from_); triangular where one end is
/// zero.
///
/// >>> trapezoidal(0*kN/m, "5.6 kN/m", from_=1.2*m, to=10*m).kind
/// 'trapezoidal'
#[pyfunction]
#[pyo3(signature = (load_from, load_to, from_, to))]
fn trapezoidal<'py>(
    load_from: &Bound<'py, PyAny>,
    load_to: &Bound<'py, PyAny>,
    from_: &Bound<'py, PyAny>,
    to: &Bound<'py, PyAny>,
) -> PyResult<Load> {
    let mut inputs = Inputs::default();
    let first = inputs.read(load_from, "trapezoidal.load_from")?;
    let last = inputs.read(load_to, "trapezoidal.load_to")?;
    let from = inputs.read(from_, "trapezoidal.from")?;
    let end = inputs.read(to, "trapezoidal.to")?;
    let core = || {
        Some(member::Load::Trapezoidal {
            load_from: first?,
            load_to: last?,
            from: from?,
            to: end?,
        })
    };
    let core = inputs.done(load_from.py(), core())?;
    let args = (load_from, load_to, from_, to);
    let recipe = Recipe::call(load_from.py(), "trapezoidal", args)?;
    Ok(Load(Made::new(core, recipe)))
}

/// A load per area of floor or roof, positive downward: line load = load x tributary width.
///
/// tributary_width: the width of floor that the member carries. It acts from from_ to to, which
/// are given together, or over the whole member.
///
/// >>> area(0.62*kN/m**2, tributary_width="3.2 m").kind
/// 'area'
#[pyfunction]
#[pyo3(signature = (load, tributary_width, from_=None, to=None))]
fn area<'py>(
    load: &Bound<'py, PyAny>,
    tributary_width: &Bound<'py, PyAny>,
    from_: Option<&Bound<'py, PyAny>>,
    to: Option<&Bound<'py, PyAny>>,
) -> PyResult<Load> {
    let mut inputs = Inputs::default();
    let pressure = inputs.read(load, "area.load")?;
    let width = inputs.read(tributary_width, "area.tributary_width")?;
    let stretch = stretch(&mut inputs, "area", from_, to)?;
    let core = || {
        Some(member::Load::Area {
            load: pressure?,
            tributary_width: width?,
            stretch: stretch?,
        })
    };
    let core = inputs.done(load.py(), core())?;
    let recipe = Recipe::call(load.py(), "area", (load, tributary_width, from_, to))?;
    Ok(Load(Made::new(core, recipe)))
}

/// A couple at a place, positive clockwise with x to the right and z up.
///
/// >>> couple(2.5*kN*m, at=10*m).kind
/// 'couple'
#[pyfunction]
fn couple<'py>(couple: &Bound<'py, PyAny>, at: &Bound<'py, PyAny>) -> PyResult<Load> {
    let mut inputs = Inputs::default();
    let turning = inputs.read(couple, "couple.couple")?;
    let place = inputs.read(at, "couple.at")?;
    let core = turning
        .zip(place)
        .map(|(couple, at)| member::Load::Couple { couple, at });
    let core = inputs.done(couple.py(), core)?;
    let recipe = Recipe::call(couple.py(), "couple", (couple, at))?;
    Ok(Load(Made::new(core, recipe)))
}

/// Adds the class and functions to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_class::<Load>()?;
    module.add_function(wrap_pyfunction!(self_weight, module)?)?;
    module.add_function(wrap_pyfunction!(uniform, module)?)?;
    module.add_function(wrap_pyfunction!(partial, module)?)?;
    module.add_function(wrap_pyfunction!(trapezoidal, module)?)?;
    module.add_function(wrap_pyfunction!(area, module)?)?;
    module.add_function(wrap_pyfunction!(point, module)?)?;
    module.add_function(wrap_pyfunction!(couple, module)?)
}
