//! What the simplified methods share: the length of the wave, and the effective spacing.

use crate::convert::{self, Inputs};
use crate::error::OrRaise;
use crate::gamma::Gamma;
use crate::made::{Recipe, Reduced};
use crate::quantity::Quantity;
use crate::simplified_layer::{LayerInput, LayerStress, ShearStress};
use crate::sine_layers::SineLayers;
use beamcore::simplified::{self, Warning};
use beamcore::units::{self, Force};
use pyo3::prelude::*;
use pyo3::types::PyTuple;

/// What the length l of the simplified methods is taken from: see its ways to be made, span,
/// continuous and cantilever (EN 1995-1-1:2004 Annex B, from memory).
///
/// >>> ReferenceLength.continuous(5*m).length
/// 4 m
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct ReferenceLength(pub(crate) simplified::ReferenceLength);

#[pymethods]
impl ReferenceLength {
    /// A single span L: l = L.
    #[staticmethod]
    fn span(length: &Bound<'_, PyAny>) -> PyResult<Self> {
        let length = convert::read(length, "length")?;
        Ok(Self(simplified::ReferenceLength::Span(length)))
    }

    /// A span L of a member of several spans: l = 0.8 L.
    #[staticmethod]
    fn continuous(length: &Bound<'_, PyAny>) -> PyResult<Self> {
        let length = convert::read(length, "length")?;
        Ok(Self(simplified::ReferenceLength::Continuous(length)))
    }

    /// A cantilever of length L: l = 2 L.
    #[staticmethod]
    fn cantilever(length: &Bound<'_, PyAny>) -> PyResult<Self> {
        let length = convert::read(length, "length")?;
        Ok(Self(simplified::ReferenceLength::Cantilever(length)))
    }

    /// How it was made: "span", "continuous" or "cantilever".
    #[getter]
    const fn kind(&self) -> &'static str {
        match self.0 {
            simplified::ReferenceLength::Span(_) => "span",
            simplified::ReferenceLength::Continuous(_) => "continuous",
            simplified::ReferenceLength::Cantilever(_) => "cantilever",
        }
    }

    /// The length L as given.
    #[getter]
    fn given(&self) -> Quantity {
        use simplified::ReferenceLength as Core;
        let (Core::Span(length) | Core::Continuous(length) | Core::Cantilever(length)) = self.0;
        Quantity::of(length)
    }

    /// The length l of the half sine wave.
    #[getter]
    fn length(&self) -> Quantity {
        Quantity::of(self.0.length())
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        let function = match self.0 {
            simplified::ReferenceLength::Span(_) => "ReferenceLength.span",
            simplified::ReferenceLength::Continuous(_) => "ReferenceLength.continuous",
            simplified::ReferenceLength::Cantilever(_) => "ReferenceLength.cantilever",
        };
        Recipe::call(py, function, (self.given(),))?.reduce(py)
    }

    fn __repr__(&self) -> String {
        format!("ReferenceLength.{}({})", self.kind(), self.given())
    }
}

record! {
    /// An effective spacing, with what is to be known of it.
    EffectiveSpacing {
        /// The spacing s_ef.
        spacing: Quantity,
        /// Where it does not hold, or only nearly.
        warnings: Vec<String>,
    }
}

/// The effective spacing of fasteners that stand closer where the shear force is greater:
/// s_ef = 0.75 s_min + 0.25 s_max, for s_max of 4 s_min at most; beyond that it is given with a
/// warning (EN 1995-1-1:2004 9.1.3 and Annex B, from memory).
///
/// >>> effective_spacing(least=100*mm, greatest=400*mm).spacing
/// 175 mm
#[pyfunction]
fn effective_spacing<'py>(
    least: &Bound<'py, PyAny>,
    greatest: &Bound<'py, PyAny>,
) -> PyResult<EffectiveSpacing> {
    let py = least.py();
    let mut inputs = Inputs::default();
    let ends = inputs
        .read(least, "least")?
        .zip(inputs.read(greatest, "greatest")?);
    let (least, greatest) = inputs.done(py, ends)?;
    let found = simplified::effective_spacing(least, greatest).or_raise(py)?;
    Ok(EffectiveSpacing {
        spacing: Quantity::of(found.spacing),
        warnings: found.warnings.iter().map(ToString::to_string).collect(),
    })
}

/// Layers and the joints between them, as the simplified methods take them.
pub(crate) fn layers_and_joints(
    py: Python<'_>,
    layers: &[Py<LayerInput>],
    joints: &[Bound<'_, PyAny>],
) -> PyResult<(Vec<simplified::LayerInput>, Vec<units::SlipModulus>)> {
    let moduli = read_all(py, joints, "joints")?;
    Ok((layers.iter().map(|layer| layer.get().0).collect(), moduli))
}

/// A list of quantities.
fn read_all<Q: units::Quantity>(
    py: Python<'_>,
    values: &[Bound<'_, PyAny>],
    path: &str,
) -> PyResult<Vec<Q>> {
    let mut inputs = Inputs::default();
    let mut found = Some(Vec::with_capacity(values.len()));
    for (i, value) in values.iter().enumerate() {
        let value = inputs.read(value, &format!("{path}[{i}]"))?;
        found = found.zip(value).map(|(mut found, value)| {
            found.push(value);
            found
        });
    }
    inputs.done(py, found)
}

/// Quantities of the core as a tuple.
pub(crate) fn quantities<'py, Q: units::Quantity>(
    py: Python<'py>,
    found: &[Q],
) -> PyResult<Bound<'py, PyTuple>> {
    let found: Vec<_> = found.iter().copied().map(Quantity::of).collect();
    PyTuple::new(py, found)
}

/// What is to be known of a method, as texts.
pub(crate) fn texts<'py>(py: Python<'py>, warnings: &[Warning]) -> PyResult<Bound<'py, PyTuple>> {
    PyTuple::new(py, warnings.iter().map(|warning| warning.text()))
}

/// The stresses of layers as a tuple.
pub(crate) fn stresses<'py>(
    py: Python<'py>,
    found: beamcore::Result<Vec<simplified::LayerStress>>,
) -> PyResult<Bound<'py, PyTuple>> {
    let found: Vec<_> = found.or_raise(py)?.into_iter().map(LayerStress).collect();
    PyTuple::new(py, found)
}

/// The shear stresses of layers as a tuple.
pub(crate) fn shear_stresses<'py>(
    py: Python<'py>,
    found: beamcore::Result<Vec<simplified::ShearStress>>,
) -> PyResult<Bound<'py, PyTuple>> {
    let found: Vec<_> = found.or_raise(py)?.iter().map(ShearStress::of).collect();
    PyTuple::new(py, found)
}

/// The forces of fasteners as a tuple, under a shear force at given spacings.
pub(crate) fn fastener_forces<'py>(
    shear: &Bound<'py, PyAny>,
    spacings: &[Bound<'py, PyAny>],
    of: impl FnOnce(Force, &[units::Length]) -> beamcore::Result<Vec<Force>>,
) -> PyResult<Bound<'py, PyTuple>> {
    let py = shear.py();
    let force = convert::read(shear, "shear")?;
    let spacings = read_all(py, spacings, "spacings")?;
    quantities(py, &of(force, &spacings).or_raise(py)?)
}

/// Adds the classes and the function to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_class::<ReferenceLength>()?;
    module.add_class::<LayerInput>()?;
    module.add_class::<LayerStress>()?;
    module.add_class::<ShearStress>()?;
    module.add_class::<EffectiveSpacing>()?;
    module.add_class::<Gamma>()?;
    module.add_class::<SineLayers>()?;
    module.add_function(wrap_pyfunction!(effective_spacing, module)?)
}
