//! The classes `Layer` and `MergedLayer`.

use crate::convert::Inputs;
use crate::made::{Recipe, Reduced};
use crate::part::PartOrName;
use crate::quantity::Quantity;
use beamcore::section;
use beamcore::units::Length;
use pyo3::exceptions::PyTypeError;
use pyo3::prelude::*;
use pyo3::types::{PyDict, PyTuple};

record! {
    /// Layers that rigid joints hold together: they act as one piece.
    MergedLayer {
        /// The names of the layers as given, in their order.
        layers: Vec<String>,
        /// The names of its parts.
        parts: Vec<String>,
    }
}

/// The parts that act as one piece, without slip between them.
///
/// It is there over the whole length of the member, or from from_ to to, which are given together
/// and measured from the left end. What is set into a host displaces it over the whole length all
/// the same.
///
/// >>> Layer("plates", ["left plate", "right plate"], from_=1.2*m, to=4.2*m).extent
/// (1.2 m, 4.2 m)
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct Layer(pub(crate) section::Layer);

/// A layer, or the name of one.
#[derive(FromPyObject)]
pub(crate) enum LayerOrName {
    Layer(Py<Layer>),
    Name(String),
}

impl LayerOrName {
    /// The name.
    pub(crate) fn into_name(self) -> String {
        match self {
            Self::Layer(layer) => layer.get().0.name().to_owned(),
            Self::Name(name) => name,
        }
    }
}

/// The two ends of a stretch along the member, which are given together or not at all.
pub(crate) fn stretch(
    inputs: &mut Inputs,
    of: &str,
    from: Option<&Bound<'_, PyAny>>,
    to: Option<&Bound<'_, PyAny>>,
) -> PyResult<Option<Option<(Length, Length)>>> {
    match (from, to) {
        (None, None) => Ok(Some(None)),
        (Some(from), Some(to)) => {
            let from = inputs.read(from, &format!("{of}.from"))?;
            Ok(from.zip(inputs.read(to, &format!("{of}.to"))?).map(Some))
        }
        _ => Err(PyTypeError::new_err(format!(
            "{of}: only one of from_ and to was given; both are needed, or neither for the whole \
             member"
        ))),
    }
}

#[pymethods]
impl Layer {
    #[new]
    #[pyo3(signature = (name, parts, *, from_=None, to=None))]
    fn new(
        py: Python<'_>,
        name: &str,
        parts: Vec<PartOrName>,
        from_: Option<&Bound<'_, PyAny>>,
        to: Option<&Bound<'_, PyAny>>,
    ) -> PyResult<Self> {
        let layer = section::Layer::new(name, parts.into_iter().map(PartOrName::into_name));
        let mut inputs = Inputs::default();
        let extent = stretch(&mut inputs, "layer", from_, to)?;
        Ok(Self(match inputs.done(py, extent)? {
            Some((from, to)) => layer.between(from, to),
            None => layer,
        }))
    }

    /// The name.
    #[getter]
    fn name(&self) -> &str {
        self.0.name()
    }

    /// The names of the parts.
    #[getter]
    fn parts<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        PyTuple::new(py, self.0.parts())
    }

    /// From where to where along the member the layer is there; None for the whole length.
    #[getter]
    fn extent(&self) -> Option<(Quantity, Quantity)> {
        let extent = self.0.extent();
        extent.map(|(from, to)| (Quantity::of(from), Quantity::of(to)))
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        let keywords = PyDict::new(py);
        if let Some((from, to)) = self.extent() {
            keywords.set_item("from_", from)?;
            keywords.set_item("to", to)?;
        }
        let recipe = Recipe::call(py, "Layer", (self.name(), self.parts(py)?))?;
        recipe.with(&keywords).reduce(py)
    }

    fn __repr__(&self) -> String {
        format!("<Layer {:?} of {:?}>", self.0.name(), self.0.parts())
    }
}
