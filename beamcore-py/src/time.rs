//! Times as texts.

use crate::error::OrRaise;
use beamcore::time::Time;
use pyo3::prelude::*;

/// "initial" or "final".
pub(crate) struct TimeText(Time);

impl From<TimeText> for Time {
    fn from(text: TimeText) -> Self {
        text.0
    }
}

impl<'a, 'py> FromPyObject<'a, 'py> for TimeText {
    type Error = PyErr;

    fn extract(object: Borrowed<'a, 'py, PyAny>) -> PyResult<Self> {
        let text: String = object.extract()?;
        Ok(Self(text.parse::<Time>().or_raise(object.py())?))
    }
}
