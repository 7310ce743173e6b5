//! The classes `LayerInput`, `LayerStress` and `ShearStress` of the simplified methods.

use crate::convert::Inputs;
use crate::made::{Recipe, Reduced};
use crate::quantity::Quantity;
use beamcore::simplified;
use pyo3::prelude::*;

/// One layer of a simplified method: parts that act as one piece.
///
/// Its stiffness may be that of any parts. Its height and modulus serve for stresses and its width
/// for the shear stress, which hold for a rectangular layer of one material.
///
/// - axial, bending: EA, and EI about the layer's own elastic centroid
/// - height: h, with the centroid at its middle; width: b
/// - centroid_z: z of the elastic centroid, upward from any level that is the same for all layers
/// - modulus: E of the material whose stresses are asked for
///
/// >>> LayerInput.rectangle(11*GPa, width=100*mm, height=220*mm, centroid_z=110*mm).axial
/// 242 MN
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct LayerInput(pub(crate) simplified::LayerInput);

#[pymethods]
impl LayerInput {
    #[new]
    #[pyo3(signature = (*, axial, bending, height, centroid_z, modulus, width))]
    fn new(
        axial: &Bound<'_, PyAny>,
        bending: &Bound<'_, PyAny>,
        height: &Bound<'_, PyAny>,
        centroid_z: &Bound<'_, PyAny>,
        modulus: &Bound<'_, PyAny>,
        width: &Bound<'_, PyAny>,
    ) -> PyResult<Self> {
        let py = axial.py();
        let mut inputs = Inputs::default();
        let axial = inputs.read(axial, "layer.axial")?;
        let bending = inputs.read(bending, "layer.bending")?;
        let height = inputs.read(height, "layer.height")?;
        let centroid_z = inputs.read(centroid_z, "layer.centroid_z")?;
        let modulus = inputs.read(modulus, "layer.modulus")?;
        let width = inputs.read(width, "layer.width")?;
        let layer = || {
            Some(simplified::LayerInput {
                axial: axial?,
                bending: bending?,
                height: height?,
                centroid_z: centroid_z?,
                modulus: modulus?,
                width: width?,
            })
        };
        Ok(Self(inputs.done(py, layer())?))
    }

    /// A rectangular layer of one material: EA = E b h, EI = E b h^3/12.
    #[staticmethod]
    fn rectangle(
        modulus: &Bound<'_, PyAny>,
        width: &Bound<'_, PyAny>,
        height: &Bound<'_, PyAny>,
        centroid_z: &Bound<'_, PyAny>,
    ) -> PyResult<Self> {
        let py = modulus.py();
        let mut inputs = Inputs::default();
        let modulus = inputs.read(modulus, "layer.modulus")?;
        let width = inputs.read(width, "layer.width")?;
        let height = inputs.read(height, "layer.height")?;
        let centroid_z = inputs.read(centroid_z, "layer.centroid_z")?;
        let layer = || {
            Some(simplified::LayerInput::rectangle(
                modulus?,
                width?,
                height?,
                centroid_z?,
            ))
        };
        Ok(Self(inputs.done(py, layer())?))
    }

    /// EA of the layer.
    #[getter]
    fn axial(&self) -> Quantity {
        Quantity::of(self.0.axial)
    }

    /// EI of the layer about its own elastic centroid.
    #[getter]
    fn bending(&self) -> Quantity {
        Quantity::of(self.0.bending)
    }

    /// The height h, with the centroid at its middle.
    #[getter]
    fn height(&self) -> Quantity {
        Quantity::of(self.0.height)
    }

    /// The z of the elastic centroid.
    #[getter]
    fn centroid_z(&self) -> Quantity {
        Quantity::of(self.0.centroid_z)
    }

    /// The modulus E of the material whose stresses are asked for.
    #[getter]
    fn modulus(&self) -> Quantity {
        Quantity::of(self.0.modulus)
    }

    /// The width b.
    #[getter]
    fn width(&self) -> Quantity {
        Quantity::of(self.0.width)
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        let keywords = pyo3::types::PyDict::new(py);
        keywords.set_item("axial", self.axial())?;
        keywords.set_item("bending", self.bending())?;
        keywords.set_item("height", self.height())?;
        keywords.set_item("centroid_z", self.centroid_z())?;
        keywords.set_item("modulus", self.modulus())?;
        keywords.set_item("width", self.width())?;
        let recipe = Recipe::call(py, "LayerInput", pyo3::types::PyTuple::empty(py))?;
        recipe.with(&keywords).reduce(py)
    }

    fn __repr__(&self) -> String {
        format!(
            "<LayerInput EA {}, EI {}, centroid at z = {}>",
            self.axial(),
            self.bending(),
            self.centroid_z()
        )
    }
}

/// The normal stresses of a layer under a moment, tension positive.
#[pyclass(frozen, eq, module = "beamcore", from_py_object)]
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct LayerStress(pub(crate) simplified::LayerStress);

#[pymethods]
impl LayerStress {
    #[new]
    fn new(axial: &Bound<'_, PyAny>, bending: &Bound<'_, PyAny>) -> PyResult<Self> {
        let mut inputs = Inputs::default();
        let stress = inputs
            .read(axial, "stress.axial")?
            .zip(inputs.read(bending, "stress.bending")?);
        let stress = stress.map(|(axial, bending)| simplified::LayerStress { axial, bending });
        Ok(Self(inputs.done(axial.py(), stress)?))
    }

    /// At the middle of the height: sigma_i = E_i N_i/EA_i.
    #[getter]
    fn axial(&self) -> Quantity {
        Quantity::of(self.0.axial)
    }

    /// What bending of the layer adds at its lower edge and takes off at its upper:
    /// sigma_m,i = 0.5 E_i h_i M/EI_ef.
    #[getter]
    fn bending(&self) -> Quantity {
        Quantity::of(self.0.bending)
    }

    /// At the lower edge: sigma_i + sigma_m,i.
    #[getter]
    fn bottom(&self) -> Quantity {
        Quantity::of(self.0.bottom())
    }

    /// At the upper edge: sigma_i - sigma_m,i.
    #[getter]
    fn top(&self) -> Quantity {
        Quantity::of(self.0.top())
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        Recipe::call(py, "LayerStress", (self.axial(), self.bending()))?.reduce(py)
    }

    fn __repr__(&self) -> String {
        format!(
            "LayerStress(axial={}, bending={})",
            self.axial(),
            self.bending()
        )
    }
}

record! {
    /// The greatest shear stress of a layer.
    ///
    /// Under V, tau = [flow of the joint below + E_i b_i V/EI_ef int (-e - t) dt]/b_i, with t the
    /// height over the centroid, from the lower edge on, and e the effective arm. It is greatest at
    /// t = -e_i, or where that lies outside of the layer, at the edge that is nearest to it.
    ShearStress {
        /// The stress, with the sign of the shear force.
        value: Quantity,
        /// Its place, in the z of the layers.
        z: Quantity,
    }
}

impl ShearStress {
    pub(crate) fn of(found: &simplified::ShearStress) -> Self {
        Self {
            value: Quantity::of(found.value),
            z: Quantity::of(found.z),
        }
    }
}
