//! The class `SectionChange`: steps and tapers of the section along a member.

use crate::convert::{self, Inputs};
use crate::made::{Made, Recipe, Reduced};
use crate::quantity::Quantity;
use crate::section::Section;
use beamcore::member;
use pyo3::prelude::*;

/// A change of the section along a member: a step or a taper.
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct SectionChange(pub(crate) Made<member::SectionChange>);

#[pymethods]
impl SectionChange {
    /// What it is: "step" or "taper".
    #[getter]
    fn kind(&self) -> &'static str {
        self.0.name()
    }

    /// Where it begins, from the left end of the member.
    #[getter]
    fn from_(&self) -> Quantity {
        Quantity::of(self.0.from())
    }

    /// Where it ends; of a step, where it is.
    #[getter]
    fn to(&self) -> Quantity {
        Quantity::of(self.0.to())
    }

    /// The section after it.
    #[getter]
    pub(crate) fn section(slf: &Bound<'_, Self>) -> PyResult<Section> {
        let section = slf.get().0.section().clone();
        Ok(Section(Made::new(
            section,
            Recipe::property(slf, "section")?,
        )))
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }

    fn __repr__(&self) -> String {
        format!("<{} from {} to {}>", self.kind(), self.from_(), self.to())
    }
}

/// Another section from a place on.
///
/// >>> deep = Section([Part("beam", rectangle(120*mm, 400*mm), timber("GL24h", service_class=1))])
/// >>> step(1.2*m, deep).kind
/// 'step'
#[pyfunction]
fn step(at: &Bound<'_, PyAny>, section: &Bound<'_, Section>) -> PyResult<SectionChange> {
    let core = member::SectionChange::Step {
        at: convert::read(at, "step.at")?,
        section: section.get().0.inner.clone(),
    };
    let recipe = Recipe::call(at.py(), "step", (at, section))?;
    Ok(SectionChange(Made::new(core, recipe)))
}

/// A section that changes linearly between two places to a like one: the same parts, shapes and
/// materials with other sizes. The member goes on with that section.
#[pyfunction]
#[pyo3(signature = (from_, to, section))]
fn taper<'py>(
    from_: &Bound<'py, PyAny>,
    to: &Bound<'py, PyAny>,
    section: &Bound<'py, Section>,
) -> PyResult<SectionChange> {
    let mut inputs = Inputs::default();
    let from = inputs.read(from_, "taper.from")?;
    let ends = from.zip(inputs.read(to, "taper.to")?);
    let (from, end) = inputs.done(from_.py(), ends)?;
    let core = member::SectionChange::Taper {
        from,
        to: end,
        section: section.get().0.inner.clone(),
    };
    let recipe = Recipe::call(from_.py(), "taper", (from_, to, section))?;
    Ok(SectionChange(Made::new(core, recipe)))
}

/// Adds the class and functions to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_class::<SectionChange>()?;
    module.add_function(wrap_pyfunction!(step, module)?)?;
    module.add_function(wrap_pyfunction!(taper, module)?)
}
