//! The one way into longer work of the core.

use crate::error::OrRaise;
use beamcore::Result;
use pyo3::prelude::*;

/// Releases the interpreter's lock, runs the work and raises its error.
pub(crate) fn run<T: Send>(py: Python<'_>, work: impl FnOnce() -> Result<T> + Send) -> PyResult<T> {
    py.detach(work).or_raise(py)
}
