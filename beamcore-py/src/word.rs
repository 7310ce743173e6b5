//! Words: whether a member is held sideways, axes of mirroring, durations of actions.

use crate::error::OrRaise;
use beamcore::choice::chosen;
use beamcore::{member, section};
use pyo3::prelude::*;

/// "held" or "free".
pub(crate) struct Sideways(pub(crate) section::Sideways);

impl<'a, 'py> FromPyObject<'a, 'py> for Sideways {
    type Error = PyErr;

    fn extract(object: Borrowed<'a, 'py, PyAny>) -> PyResult<Self> {
        use section::Sideways as Core;
        let word: String = object.extract()?;
        let all = [Core::Held, Core::Free];
        let choice = chosen(&word, "sideways", &all, Core::name);
        Ok(Self(choice.or_raise(object.py())?))
    }
}

/// "upright" or "level".
pub(crate) struct MirrorAxis(pub(crate) section::MirrorAxis);

impl<'a, 'py> FromPyObject<'a, 'py> for MirrorAxis {
    type Error = PyErr;

    fn extract(object: Borrowed<'a, 'py, PyAny>) -> PyResult<Self> {
        use section::MirrorAxis as Core;
        let word: String = object.extract()?;
        let all = [Core::Upright, Core::Level];
        let choice = chosen(&word, "place.mirror_of.axis", &all, Core::name);
        Ok(Self(choice.or_raise(object.py())?))
    }
}

/// "permanent", "long", "medium", "short" or "instantaneous".
pub(crate) struct LoadDuration(pub(crate) member::LoadDuration);

impl<'a, 'py> FromPyObject<'a, 'py> for LoadDuration {
    type Error = PyErr;

    fn extract(object: Borrowed<'a, 'py, PyAny>) -> PyResult<Self> {
        use member::LoadDuration as Core;
        let word: String = object.extract()?;
        let choice = chosen(&word, "duration", &Core::ALL, Core::name);
        Ok(Self(choice.or_raise(object.py())?))
    }
}
