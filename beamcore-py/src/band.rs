//! The class `Band`.

use crate::convert::Inputs;
use crate::made::{Recipe, Reduced};
use crate::quantity::Quantity;
use beamcore::section;
use pyo3::prelude::*;

/// A length of the member with one spacing of fasteners.
///
/// - from_, to: where it begins and ends, from the left end of the member
/// - spacing: that of the fasteners of a row
///
/// >>> Band(from_=0*m, to="1.5 m", spacing=100*mm)
/// Band(from_=0 m, to=1.5 m, spacing=100 mm)
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct Band(pub(crate) section::Band);

#[pymethods]
impl Band {
    #[new]
    fn new(
        from_: &Bound<'_, PyAny>,
        to: &Bound<'_, PyAny>,
        spacing: &Bound<'_, PyAny>,
    ) -> PyResult<Self> {
        let mut inputs = Inputs::default();
        let from = inputs.read(from_, "band.from")?;
        let end = inputs.read(to, "band.to")?;
        let apart = inputs.read(spacing, "band.spacing")?;
        let band = || {
            Some(section::Band {
                from: from?,
                to: end?,
                spacing: apart?,
            })
        };
        Ok(Self(inputs.done(from_.py(), band())?))
    }

    /// Where it begins, from the left end of the member.
    #[getter]
    fn from_(&self) -> Quantity {
        Quantity::of(self.0.from)
    }

    /// Where it ends.
    #[getter]
    fn to(&self) -> Quantity {
        Quantity::of(self.0.to)
    }

    /// The spacing of the fasteners of a row.
    #[getter]
    fn spacing(&self) -> Quantity {
        Quantity::of(self.0.spacing)
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        let fields = (self.from_(), self.to(), self.spacing());
        Recipe::call(py, "Band", fields)?.reduce(py)
    }

    fn __repr__(&self) -> String {
        format!(
            "Band(from_={}, to={}, spacing={})",
            self.from_(),
            self.to(),
            self.spacing()
        )
    }
}
