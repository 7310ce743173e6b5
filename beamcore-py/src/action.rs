//! The classes `Load` and `Action`.

use crate::convert::{self, Inputs};
use crate::made::{Made, Recipe, Reduced};
use crate::operand::Number;
use beamcore::member::{self, ActionKind, CombinationFactors};
use pyo3::prelude::*;
use pyo3::types::{PyDict, PyTuple};

/// One load of an action, positive downward.
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct Load(Made<member::Load>);

#[pymethods]
impl Load {
    /// What it is: "self_weight", "uniform", "partial" or "point".
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

/// A named action: what acts together, from one cause.
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct Action(pub(crate) Made<member::Action>);

impl Action {
    fn made(name: &str, kind: ActionKind, loads: &[Py<Load>], recipe: Recipe) -> Self {
        let action = member::Action::new(name, kind);
        let action = loads
            .iter()
            .fold(action, |action, load| action.load(load.get().0.inner));
        Self(Made::new(action, recipe))
    }
}

#[pymethods]
impl Action {
    /// The name.
    #[getter]
    fn name(&self) -> &str {
        self.0.name()
    }

    /// What it is: "permanent" or "variable".
    #[getter]
    fn kind(&self) -> &'static str {
        match self.0.kind() {
            ActionKind::Permanent => "permanent",
            ActionKind::Variable(_) => "variable",
        }
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }

    fn __repr__(&self) -> String {
        format!("<{} action {:?}>", self.kind(), self.name())
    }
}

/// The name and the loads as the arguments of a call.
fn arguments<'py>(
    py: Python<'py>,
    name: &str,
    loads: &[Py<Load>],
) -> PyResult<Bound<'py, PyTuple>> {
    let mut arguments = vec![name.into_pyobject(py)?.into_any()];
    arguments.extend(loads.iter().map(|load| load.bind(py).clone().into_any()));
    PyTuple::new(py, arguments)
}

/// An action that acts from the first day to the last.
///
/// >>> permanent("floor", self_weight(), uniform(1.2*kN/m)).kind
/// 'permanent'
#[pyfunction]
#[pyo3(signature = (name, *loads))]
fn permanent(py: Python<'_>, name: &str, loads: Vec<Py<Load>>) -> PyResult<Action> {
    let recipe = Recipe::call(py, "permanent", arguments(py, name, &loads)?)?;
    Ok(Action::made(name, ActionKind::Permanent, &loads, recipe))
}

/// An action that comes and goes, with its combination factors (EN 1990:2002 Table A1.1).
///
/// psi_0: beside another, leading variable action; psi_1: the frequent value; psi_2: the
/// quasi-permanent value, which makes creep.
///
/// >>> variable("store", uniform(3*kN/m), psi_0=1.0, psi_1=0.9, psi_2=0.8).kind
/// 'variable'
#[pyfunction]
#[pyo3(signature = (name, *loads, psi_0, psi_1, psi_2))]
fn variable(
    py: Python<'_>,
    name: &str,
    loads: Vec<Py<Load>>,
    psi_0: Number,
    psi_1: Number,
    psi_2: Number,
) -> PyResult<Action> {
    let [psi_0, psi_1, psi_2] = [psi_0.0, psi_1.0, psi_2.0];
    let keywords = PyDict::new(py);
    keywords.set_item("psi_0", psi_0)?;
    keywords.set_item("psi_1", psi_1)?;
    keywords.set_item("psi_2", psi_2)?;
    let recipe = Recipe::call(py, "variable", arguments(py, name, &loads)?)?.with(&keywords);
    let factors = CombinationFactors {
        psi_0,
        psi_1,
        psi_2,
    };
    Ok(Action::made(
        name,
        ActionKind::Variable(factors),
        &loads,
        recipe,
    ))
}

/// Adds the classes and functions to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_class::<Load>()?;
    module.add_class::<Action>()?;
    module.add_function(wrap_pyfunction!(self_weight, module)?)?;
    module.add_function(wrap_pyfunction!(uniform, module)?)?;
    module.add_function(wrap_pyfunction!(partial, module)?)?;
    module.add_function(wrap_pyfunction!(point, module)?)?;
    module.add_function(wrap_pyfunction!(permanent, module)?)?;
    module.add_function(wrap_pyfunction!(variable, module)?)
}
