//! The class `Reading`: what a tape shows in the shop.

use crate::camber::Camber;
use crate::convert::Inputs;
use crate::part::PartOrName;
use crate::quantity::Quantity;
use crate::run::run;
use beamcore::camber::Trestles;
use beamcore::response::Response;
use pyo3::prelude::*;
use pyo3::types::PyTuple;

record! {
    /// What a tape shows at one station, from the chord through the ends of the design chord;
    /// positive upward.
    Reading {
        /// Distance from the left end of the chord.
        station: Quantity,
        /// With the member lying on its side: its weight does not act in the plane of the camber.
        lying: Quantity,
        /// With the member standing on the trestles under its own weight.
        standing: Quantity,
    }
}

/// The readings to expect at the stations of a camber.
pub(crate) fn readings<'py>(
    response: &Response,
    camber: &Bound<'py, Camber>,
    left: &Bound<'py, PyAny>,
    right: &Bound<'py, PyAny>,
    parts: Vec<PartOrName>,
) -> PyResult<Bound<'py, PyTuple>> {
    let py = camber.py();
    let mut inputs = Inputs::default();
    let left = inputs.read(left, "camber.trestles.left")?;
    let right = inputs.read(right, "camber.trestles.right")?;
    let trestles = left.zip(right).map(|(left, right)| Trestles {
        left,
        right,
        parts: parts.into_iter().map(PartOrName::into_name).collect(),
    });
    let trestles = inputs.done(py, trestles)?;
    let camber = &camber.get().0.inner;
    let readings = run(py, || response.readings(camber, &trestles))?;
    let readings = readings.into_iter().map(|reading| Reading {
        station: Quantity::of(reading.station),
        lying: Quantity::of(reading.lying),
        standing: Quantity::of(reading.standing),
    });
    PyTuple::new(py, readings.collect::<Vec<_>>())
}
