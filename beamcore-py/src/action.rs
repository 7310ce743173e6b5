//! The class `Action`.

use crate::convert;
use crate::error::OrRaise;
use crate::layer::LayerOrName;
use crate::load::Load;
use crate::made::{Made, Recipe, Reduced};
use crate::operand::Number;
use crate::quantity::Quantity;
use crate::word::LoadDuration;
use beamcore::member::{self, ActionKind, Category, Effect};
use beamcore::units::Duration;
use pyo3::exceptions::PyTypeError;
use pyo3::prelude::*;
use pyo3::types::{PyDict, PyTuple};

record! {
    /// The factors by which a variable action enters combinations (EN 1990:2002 Table A1.1).
    CombinationFactors {
        /// Beside another, leading variable action.
        psi_0: f64,
        /// The frequent value, as leading action.
        psi_1: f64,
        /// The quasi-permanent value, which makes creep.
        psi_2: f64,
    }
}

/// A named action: what acts together, from one cause.
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct Action(pub(crate) Made<member::Action>);

/// The name and the loads of an action, whether it relieves, and what else was said of it.
struct Given<'a> {
    name: &'a str,
    loads: &'a [Py<Load>],
    favourable: bool,
    duration: Option<member::LoadDuration>,
    start: Option<Duration>,
    on: Option<String>,
}

impl Given<'_> {
    /// The action of a kind, made again by a call of `function` with these keywords.
    fn made(
        &self,
        kind: ActionKind,
        function: &'static str,
        keywords: &Bound<'_, PyDict>,
    ) -> PyResult<Action> {
        let py = keywords.py();
        let mut arguments = vec![self.name.into_pyobject(py)?.into_any()];
        arguments.extend(
            self.loads
                .iter()
                .map(|load| load.bind(py).clone().into_any()),
        );
        keywords.set_item("favourable", self.favourable)?;
        let mut action = member::Action::new(self.name, kind);
        if self.favourable {
            action = action.favourable();
        }
        if let Some(duration) = self.duration {
            keywords.set_item("duration", duration.name())?;
            action = action.duration(duration);
        }
        if let Some(start) = self.start {
            keywords.set_item("start", Quantity::of(start))?;
            action = action.starting(start);
        }
        if let Some(layer) = &self.on {
            keywords.set_item("on", layer)?;
            action = action.on(layer);
        }
        let recipe = Recipe::call(py, function, PyTuple::new(py, arguments)?)?.with(keywords);
        let loads = self.loads.iter().map(|load| load.get().0.inner.clone());
        Ok(Action(Made::new(
            loads.fold(action, member::Action::load),
            recipe,
        )))
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

    /// Whether it relieves what is being checked.
    #[getter]
    fn favourable(&self) -> bool {
        self.0.effect() == Effect::Favourable
    }

    /// How long it acts at a time, from "permanent" to "instantaneous"; None if that was not said.
    #[getter]
    fn duration(&self) -> Option<&'static str> {
        self.0.load_duration().map(member::LoadDuration::name)
    }

    /// When it starts, counted from the first day of the member; None if that was not said.
    #[getter]
    fn start(&self) -> Option<Quantity> {
        self.0.start().map(Quantity::of)
    }

    /// The name of the layer that its loads enter; None if none was named.
    #[getter]
    fn on(&self) -> Option<&str> {
        self.0.layer()
    }

    /// The combination factors of a variable action; None for a permanent one.
    #[getter]
    fn factors(&self) -> Option<CombinationFactors> {
        match self.0.kind() {
            ActionKind::Permanent => None,
            ActionKind::Variable(factors) => Some(CombinationFactors {
                psi_0: factors.psi_0,
                psi_1: factors.psi_1,
                psi_2: factors.psi_2,
            }),
        }
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }

    fn __repr__(&self) -> String {
        format!("<{} action {:?}>", self.kind(), self.name())
    }
}

/// An action that acts from the first day to the last.
///
/// - favourable: it relieves what is being checked, so that the fundamental combination takes it
///   with the smaller partial factor permanent_favourable
/// - duration: how long it acts at a time, by which the engineer chooses k_mod (EN 1995-1-1:2004
///   2.3.1.2, from memory): "permanent" (more than ten years), "long" (from six months), "medium"
///   (from a week), "short" (less), "instantaneous"; no result depends on it
/// - start: when it starts, counted from the first day of the member; the final state takes the
///   creep of the whole life
/// - on: the layer, or its name, that all its loads enter; without it, transverse loads enter the
///   first layer. It matters where layers have deflections of their own, and where forces act along
///   the member
///
/// >>> permanent("floor", self_weight(), uniform(1.2*kN/m)).kind
/// 'permanent'
/// >>> permanent("floor", uniform(1.2*kN/m), duration="permanent", start=28*day).start
/// 28 d
#[pyfunction]
#[pyo3(signature = (name, *loads, favourable=false, duration=None, start=None, on=None))]
#[expect(
    clippy::needless_pass_by_value,
    reason = "Python's arguments are taken as owned"
)]
fn permanent(
    py: Python<'_>,
    name: &str,
    loads: Vec<Py<Load>>,
    favourable: bool,
    duration: Option<LoadDuration>,
    start: Option<&Bound<'_, PyAny>>,
    on: Option<LayerOrName>,
) -> PyResult<Action> {
    let given = Given {
        name,
        loads: &loads,
        favourable,
        duration: duration.map(|word| word.0),
        start: start
            .map(|start| convert::read(start, "start"))
            .transpose()?,
        on: on.map(LayerOrName::into_name),
    };
    given.made(ActionKind::Permanent, "permanent", &PyDict::new(py))
}

/// An action that comes and goes, with its combination factors (EN 1990:2002 Table A1.1).
///
/// They are given by a category with its recommended factors, from memory, or one by one.
///
/// - category: "A" (homes), "B" (offices), "C" (where people gather), "D" (shops), "E" (storage),
///   "F" (traffic of vehicles up to 30 kN), "G" (from 30 kN to 160 kN), "H" (roofs walked on for
///   upkeep), "snow" (1000 m above the sea or lower), "snow_high" (above, and in the north),
///   "wind", "temperature"
/// - psi_0: beside another, leading variable action; psi_1: the frequent value; psi_2: the
///   quasi-permanent value, which makes creep
/// - favourable: it relieves what is being checked, so that combinations leave it out
/// - duration: how long it acts at a time, by which the engineer chooses k_mod (EN 1995-1-1:2004
///   2.3.1.2, from memory): "permanent" (more than ten years), "long" (from six months), "medium"
///   (from a week), "short" (less), "instantaneous"; no result depends on it
/// - start: when it starts, counted from the first day of the member; the final state takes the
///   creep of the whole life
/// - on: the layer, or its name, that all its loads enter; without it, transverse loads enter the
///   first layer. It matters where layers have deflections of their own, and where forces act along
///   the member
///
/// >>> variable("store", uniform(3*kN/m), category="E").factors
/// CombinationFactors(psi_0=1.0, psi_1=0.9, psi_2=0.8)
/// >>> variable("store", uniform(3*kN/m), psi_0=1.0, psi_1=0.9, psi_2=0.8).kind
/// 'variable'
#[pyfunction]
#[pyo3(signature = (
    name, *loads, category=None, psi_0=None, psi_1=None, psi_2=None, favourable=false,
    duration=None, start=None, on=None
))]
#[expect(clippy::too_many_arguments, reason = "each is a keyword in Python")]
#[expect(
    clippy::needless_pass_by_value,
    reason = "Python's arguments are taken as owned"
)]
fn variable(
    py: Python<'_>,
    name: &str,
    loads: Vec<Py<Load>>,
    category: Option<&str>,
    psi_0: Option<Number>,
    psi_1: Option<Number>,
    psi_2: Option<Number>,
    favourable: bool,
    duration: Option<LoadDuration>,
    start: Option<&Bound<'_, PyAny>>,
    on: Option<LayerOrName>,
) -> PyResult<Action> {
    let keywords = PyDict::new(py);
    let factors = match (category, psi_0, psi_1, psi_2) {
        (Some(word), None, None, None) => {
            keywords.set_item("category", word)?;
            Category::from_name(word).or_raise(py)?.factors()
        }
        (None, Some(psi_0), Some(psi_1), Some(psi_2)) => {
            keywords.set_item("psi_0", psi_0.0)?;
            keywords.set_item("psi_1", psi_1.0)?;
            keywords.set_item("psi_2", psi_2.0)?;
            member::CombinationFactors {
                psi_0: psi_0.0,
                psi_1: psi_1.0,
                psi_2: psi_2.0,
            }
        }
        _ => {
            return Err(PyTypeError::new_err(
                "variable: neither a category alone nor psi_0, psi_1 and psi_2 alone were given; \
                 one or the other is needed, for example category=\"A\"",
            ));
        }
    };
    let given = Given {
        name,
        loads: &loads,
        favourable,
        duration: duration.map(|word| word.0),
        start: start
            .map(|start| convert::read(start, "start"))
            .transpose()?,
        on: on.map(LayerOrName::into_name),
    };
    given.made(ActionKind::Variable(factors), "variable", &keywords)
}

/// Adds the classes and functions to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_class::<CombinationFactors>()?;
    module.add_class::<Action>()?;
    module.add_function(wrap_pyfunction!(permanent, module)?)?;
    module.add_function(wrap_pyfunction!(variable, module)?)
}
