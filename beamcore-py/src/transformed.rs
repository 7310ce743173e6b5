//! The classes `TransformedSection` and `TransformedPart`.

use crate::convert;
use crate::error::OrRaise;
use crate::made::{Made, Reduced};
use crate::quantity::Quantity;
use beamcore::section;
use beamcore::units::Length;
use pyo3::prelude::*;
use pyo3::types::PyTuple;

record! {
    /// One part of a transformed section: its widths, parallel to the bending axis, are multiplied
    /// by n = E/E_ref about its own centroid, its heights are kept.
    TransformedPart {
        /// The name of the part.
        name: String,
        /// The modular ratio n = E/E_ref.
        ratio: f64,
        /// The transformed width of the bounding box, n b.
        width: Quantity,
        /// The least z of the outline.
        bottom: Quantity,
        /// The greatest z of the outline.
        top: Quantity,
        /// The corners (y, z) of the transformed outline, loop by loop, for drawing; arcs are given
        /// by chords of at most 12 degrees.
        loops: Vec<Vec<(Quantity, Quantity)>>,
    }
}

fn loop_of(corners: &[(Length, Length)]) -> Vec<(Quantity, Quantity)> {
    let corners = corners.iter();
    corners
        .map(|&(y, z)| (Quantity::of(y), Quantity::of(z)))
        .collect()
}

/// A section as if made of one chosen material; presentation only, no other result rests on it.
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct TransformedSection(pub(crate) Made<section::TransformedSection>);

#[pymethods]
impl TransformedSection {
    /// The modulus of the reference material at the time asked for.
    #[getter]
    fn reference_modulus(&self) -> Quantity {
        Quantity::of(self.0.reference_modulus())
    }

    /// Area: sum of n A. Times the reference modulus it is EA.
    #[getter]
    fn area(&self) -> Quantity {
        Quantity::of(self.0.area())
    }

    /// z of the centroid.
    #[getter]
    fn centroid_z(&self) -> Quantity {
        Quantity::of(self.0.centroid_z())
    }

    /// Second moment of area about the horizontal axis through the centroid:
    /// sum of n (I + A dz^2). Times the reference modulus it is EI_yy.
    #[getter]
    fn second_moment(&self) -> Quantity {
        Quantity::of(self.0.second_moment())
    }

    /// The transformed parts, in the order given.
    #[getter]
    fn parts<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        let parts = self.0.parts().iter().map(|part| TransformedPart {
            name: part.name.clone(),
            ratio: part.ratio,
            width: Quantity::of(part.width),
            bottom: Quantity::of(part.bottom),
            top: Quantity::of(part.top),
            loops: part.loops.iter().map(|corners| loop_of(corners)).collect(),
        });
        PyTuple::new(py, parts.collect::<Vec<_>>())
    }

    /// The stress in the real material of a part at height z under a moment (positive sagging):
    /// -n M (z - z_centroid)/I, tension positive.
    fn stress(
        &self,
        part: &str,
        z: &Bound<'_, PyAny>,
        moment: &Bound<'_, PyAny>,
    ) -> PyResult<Quantity> {
        let py = z.py();
        let mut inputs = convert::Inputs::default();
        let place = inputs.read(z, "z")?.zip(inputs.read(moment, "moment")?);
        let (z, moment) = inputs.done(py, place)?;
        Ok(Quantity::of(self.0.stress(part, z, moment).or_raise(py)?))
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }
}
