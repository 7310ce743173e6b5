//! The class `Camber`.

use crate::convert;
use crate::error::OrRaise;
use crate::made::{Made, Reduced};
use crate::quantity::Quantity;
use beamcore::camber;
use pyo3::prelude::*;
use pyo3::types::PyTuple;

record! {
    /// One ordinate of a camber.
    Ordinate {
        /// Distance from the left end of the chord.
        station: Quantity,
        /// Height above the chord, positive upward, with the member unloaded.
        ordinate: Quantity,
    }
}

/// The camber to build: a parabola over the chord between two supports.
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct Camber(pub(crate) Made<camber::Camber>);

#[pymethods]
impl Camber {
    /// The deflection to be built in before rounding: fraction x deflection at the chord's middle.
    #[getter]
    fn target(&self) -> Quantity {
        Quantity::of(self.0.target())
    }

    /// The rise at the middle of the chord, rounded; positive upward.
    #[getter]
    fn rise(&self) -> Quantity {
        Quantity::of(self.0.rise())
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

    /// The height above the chord at a place of the member, positive upward: 4 c s (1 - s) for a
    /// rise c at a share s of the chord.
    fn ordinate(&self, at: &Bound<'_, PyAny>) -> PyResult<Quantity> {
        let place = convert::read(at, "at")?;
        Ok(Quantity::of(self.0.ordinate(place).or_raise(at.py())?))
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }
}

/// Adds the classes to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_class::<Ordinate>()?;
    module.add_class::<Camber>()
}
