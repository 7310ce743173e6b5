//! The class `Camber`, and the wish for one.

use crate::convert::{self, Inputs};
use crate::error::OrRaise;
use crate::made::{Made, Recipe, Reduced};
use crate::quantity::Quantity;
use crate::response::Response;
use crate::run::run;
use beamcore::camber::{self, CamberPlan, Shape};
use beamcore::choice::chosen;
use beamcore::time::Time;
use beamcore::units::Length;
use pyo3::prelude::*;
use pyo3::types::{PyDict, PyTuple};

record! {
    /// One ordinate of a camber.
    Ordinate {
        /// Distance from the left end of the chord.
        station: Quantity,
        /// Height above the chord, positive upward, with the member unloaded.
        ordinate: Quantity,
    }
}

/// The camber to build, over the chord between two supports.
///
/// Beyond the chord the member goes on straight (mirrored, if it mirrors the deflection line).
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct Camber(pub(crate) Made<camber::Camber>);

#[pymethods]
impl Camber {
    /// The shape: "parabola", "mirror", "arc_through_middle" or "arc_least_gap".
    #[getter]
    fn shape(&self) -> &'static str {
        self.0.shape().name()
    }

    /// The rise before rounding: fraction x deflection at the chord's middle, or, of an arc of
    /// least gap, the rise that fits best.
    #[getter]
    fn target(&self) -> Quantity {
        Quantity::of(self.0.target())
    }

    /// The rise at the middle of the chord, rounded; positive upward; zero where it would be less
    /// than the least worth building.
    #[getter]
    fn rise(&self) -> Quantity {
        Quantity::of(self.0.rise())
    }

    /// The radius of an arc, (l^2/4 + c^2)/(2 c) for a rise c over a chord l, negative for a
    /// hanging arc; None for other shapes and for no rise.
    #[getter]
    fn radius(&self) -> Option<Quantity> {
        self.0.radius().map(Quantity::of)
    }

    /// The places of the chord's ends, from the left end of the member.
    #[getter]
    fn chord(&self) -> (Quantity, Quantity) {
        let (from, to) = self.0.chord();
        (Quantity::of(from), Quantity::of(to))
    }

    /// The ordinates from the left end of the chord to the right end.
    #[getter]
    fn ordinates<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        let ordinates = self.0.ordinates().iter().map(|ordinate| Ordinate {
            station: Quantity::of(ordinate.station),
            ordinate: Quantity::of(ordinate.ordinate),
        });
        PyTuple::new(py, ordinates.collect::<Vec<_>>())
    }

    /// The height above the chord at a place of the member, positive upward.
    ///
    /// For a rise c over a chord l: 4 c s (1 - s) of a parabola at a share s of the chord;
    /// c - u^2/(R + sqrt(R^2 - u^2)) of an arc of radius R at u from its middle.
    fn ordinate(&self, at: &Bound<'_, PyAny>) -> PyResult<Quantity> {
        let place = convert::read(at, "at")?;
        Ok(Quantity::of(self.0.ordinate(place).or_raise(at.py())?))
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }
}

/// What is wished for, as it was given.
pub(crate) struct Wish<'a, 'py> {
    pub(crate) shape: &'a str,
    pub(crate) combination: &'a str,
    pub(crate) time: Time,
    pub(crate) fraction: f64,
    pub(crate) from: &'a str,
    pub(crate) to: &'a str,
    pub(crate) step: &'a Bound<'py, PyAny>,
    pub(crate) rounding: &'a str,
    pub(crate) least: Option<&'a Bound<'py, PyAny>>,
    pub(crate) divisions: u32,
}

impl Wish<'_, '_> {
    /// The camber of this wish for a solved member.
    pub(crate) fn made(&self, response: &Bound<'_, Response>) -> PyResult<Camber> {
        let py = response.py();
        let plan = self.plan(py)?;
        let core = &response.get().0.inner;
        let camber = run(py, || core.camber(&plan))?;
        let recipe = Recipe::method(response, "camber", PyTuple::empty(py))?;
        Ok(Camber(Made::new(camber, recipe.with(&self.keywords(py)?))))
    }

    fn plan(&self, py: Python<'_>) -> PyResult<CamberPlan> {
        let mut inputs = Inputs::default();
        let shape = chosen(self.shape, "camber.shape", &Shape::ALL, Shape::name);
        let shape = inputs.checked(shape);
        let step = inputs.read(self.step, "camber.step")?;
        let rounding = inputs.checked(self.rounding.parse());
        let least = match self.least {
            Some(least) => inputs.read(least, "camber.least")?,
            None => Some(Length::ZERO),
        };
        let plan = || {
            Some(CamberPlan {
                shape: shape?,
                combination: self.combination.to_owned(),
                time: self.time,
                fraction: self.fraction,
                from: self.from.to_owned(),
                to: self.to.to_owned(),
                step: step?,
                rounding: rounding?,
                least: least?,
                divisions: self.divisions,
            })
        };
        inputs.done(py, plan())
    }

    fn keywords<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyDict>> {
        let keywords = PyDict::new(py);
        keywords.set_item("shape", self.shape)?;
        keywords.set_item("combination", self.combination)?;
        keywords.set_item("time", self.time.name())?;
        keywords.set_item("fraction", self.fraction)?;
        keywords.set_item("from_", self.from)?;
        keywords.set_item("to", self.to)?;
        keywords.set_item("step", self.step)?;
        keywords.set_item("rounding", self.rounding)?;
        keywords.set_item("least", self.least)?;
        keywords.set_item("divisions", self.divisions)?;
        Ok(keywords)
    }
}

/// Adds the classes to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_class::<Ordinate>()?;
    module.add_class::<Camber>()
}
