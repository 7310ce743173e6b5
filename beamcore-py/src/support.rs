//! The classes `Support` and `Reaction`.

use crate::convert;
use crate::made::{Recipe, Reduced};
use crate::quantity::Quantity;
use beamcore::member::{self, SupportKind};
use pyo3::prelude::*;

record! {
    /// The reaction of one support on the member.
    Reaction {
        /// The force, positive upward.
        force: Quantity,
        /// The couple, positive clockwise with x to the right and z up; zero unless the support
        /// holds the rotation.
        couple: Quantity,
    }
}

/// A lasting support of a member, with a name that addresses its reactions.
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct Support(pub(crate) member::Support);

impl Support {
    fn made(kind: SupportKind, name: &str, at: &Bound<'_, PyAny>) -> PyResult<Self> {
        let at = convert::read(at, &format!("{}.at", kind.name()))?;
        Ok(Self(member::Support::new(name, kind, at)))
    }
}

#[pymethods]
impl Support {
    /// The name.
    #[getter]
    fn name(&self) -> &str {
        self.0.name()
    }

    /// What it holds: "pin", "roller" or "fixed".
    #[getter]
    const fn kind(&self) -> &'static str {
        self.0.kind().name()
    }

    /// Its distance from the left end of the member.
    #[getter]
    fn at(&self) -> Quantity {
        Quantity::of(self.0.at())
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        Recipe::call(py, self.kind(), (self.name(), self.at()))?.reduce(py)
    }

    fn __repr__(&self) -> String {
        format!("<{} {:?} at {}>", self.kind(), self.name(), self.at())
    }
}

/// A pin at a distance from the left end: holds deflection and axis; the member may turn.
///
/// >>> pin("left", 0*m).kind
/// 'pin'
#[pyfunction]
fn pin(name: &str, at: &Bound<'_, PyAny>) -> PyResult<Support> {
    Support::made(SupportKind::Pin, name, at)
}

/// A roller at a distance from the left end: holds the deflection only.
#[pyfunction]
fn roller(name: &str, at: &Bound<'_, PyAny>) -> PyResult<Support> {
    Support::made(SupportKind::Roller, name, at)
}

/// A fixed support at a distance from the left end: holds deflection, axis and rotation.
#[pyfunction]
fn fixed(name: &str, at: &Bound<'_, PyAny>) -> PyResult<Support> {
    Support::made(SupportKind::Fixed, name, at)
}

/// Adds the class and functions to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_class::<Support>()?;
    module.add_class::<Reaction>()?;
    module.add_function(wrap_pyfunction!(pin, module)?)?;
    module.add_function(wrap_pyfunction!(roller, module)?)?;
    module.add_function(wrap_pyfunction!(fixed, module)?)
}
