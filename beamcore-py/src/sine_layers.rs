//! The class `SineLayers`.

use crate::convert;
use crate::error::OrRaise;
use crate::made::{Made, Recipe, Reduced};
use crate::quantity::Quantity;
use crate::simplified::{
    ReferenceLength, fastener_forces, layers_and_joints, quantities, shear_stresses, stresses,
    texts,
};
use crate::simplified_layer::LayerInput;
use beamcore::simplified;
use pyo3::prelude::*;
use pyo3::types::PyTuple;

/// Any number of layers that slip on each other, under a load in the form of half a sine wave.
///
/// - layers: from the lowest upward
/// - joints: the slip modulus per length of each joint between two of them
/// - length: the length of the wave
///
/// The layers bend alike, and each moves along x by a displacement of its own, in the form of a
/// cosine. With p = pi/l, effective arms e_i (so that N_i = -EA_i e_i M/EI_ef) and joints j between
/// the layers j and j + 1, d_j apart: t_j = k_j (e_(j+1) - e_j - d_j) and
/// p^2 EA_i e_i = t_i - t_(i-1), with nothing beyond the outer layers;
/// EI_ef = sum of (EI_i + EA_i e_i z_i). Of two or three layers e_i is gamma_i a_i of Gamma.
///
/// Source: idea of Schelling 1982 (from memory); it is the exact solution for the sine load.
///
/// >>> boards = [LayerInput.rectangle(11*GPa, 200*mm, 40*mm, z*mm) for z in (20, 60, 100, 140)]
/// >>> beam = SineLayers(boards, ["5 N/mm2"] * 3, ReferenceLength.span(4*m))
/// >>> beam.flows(2*kN)[1] > beam.flows(2*kN)[0]
/// True
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct SineLayers(Made<simplified::SineLayers>);

#[pymethods]
impl SineLayers {
    #[new]
    fn new(
        layers: Vec<Py<LayerInput>>,
        joints: Vec<Bound<'_, PyAny>>,
        length: &Bound<'_, ReferenceLength>,
    ) -> PyResult<Self> {
        let py = length.py();
        let (cores, moduli) = layers_and_joints(py, &layers, &joints)?;
        let core = simplified::SineLayers::of(&cores, &moduli, length.get().0).or_raise(py)?;
        let recipe = Recipe::call(py, "SineLayers", (layers, joints, length))?;
        Ok(Self(Made::new(core, recipe)))
    }

    /// The layers, from the lowest upward.
    #[getter]
    fn layers<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        let layers: Vec<_> = self.0.layers().iter().copied().map(LayerInput).collect();
        PyTuple::new(py, layers)
    }

    /// The effective arm e_i of each layer, positive upward.
    #[getter]
    fn arms<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        quantities(py, self.0.arms())
    }

    /// EI_ef = sum of (EI_i + EA_i e_i z_i).
    #[getter]
    fn bending_stiffness(&self) -> Quantity {
        Quantity::of(self.0.bending_stiffness())
    }

    /// N_i = -EA_i e_i M/EI_ef of each layer under a moment.
    fn axial_forces<'py>(&self, moment: &Bound<'py, PyAny>) -> PyResult<Bound<'py, PyTuple>> {
        let (py, moment) = (moment.py(), convert::read(moment, "moment")?);
        quantities(py, &self.0.axial_forces(moment).or_raise(py)?)
    }

    /// The normal stresses of each layer under a moment: sigma_i = E_i N_i/EA_i and
    /// sigma_m,i = 0.5 E_i h_i M/EI_ef.
    fn stresses<'py>(&self, moment: &Bound<'py, PyAny>) -> PyResult<Bound<'py, PyTuple>> {
        let found = self.0.stresses(convert::read(moment, "moment")?);
        stresses(moment.py(), found)
    }

    /// The flow of each joint under a shear force: the sum of EA_i e_i of the layers above it
    /// times V/EI_ef.
    fn flows<'py>(&self, shear: &Bound<'py, PyAny>) -> PyResult<Bound<'py, PyTuple>> {
        let (py, shear) = (shear.py(), convert::read(shear, "shear")?);
        quantities(py, &self.0.flows(shear).or_raise(py)?)
    }

    /// The force of a fastener of each joint under a shear force: flow x spacing, the spacing
    /// as of one row: with n rows, the spacing along the member over n.
    #[expect(
        clippy::needless_pass_by_value,
        reason = "Python's arguments are taken as owned"
    )]
    fn fastener_forces<'py>(
        &self,
        shear: &Bound<'py, PyAny>,
        spacings: Vec<Bound<'py, PyAny>>,
    ) -> PyResult<Bound<'py, PyTuple>> {
        fastener_forces(shear, &spacings, |shear, spacings| {
            self.0.fastener_forces(shear, spacings)
        })
    }

    /// The greatest shear stress of each layer under a shear force: see ShearStress.
    fn shear_stresses<'py>(&self, shear: &Bound<'py, PyAny>) -> PyResult<Bound<'py, PyTuple>> {
        let found = self.0.shear_stresses(convert::read(shear, "shear")?);
        shear_stresses(shear.py(), found)
    }

    /// Where the method holds.
    #[getter]
    fn warnings<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        texts(py, self.0.warnings())
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }

    fn __repr__(&self) -> String {
        format!(
            "<SineLayers: {} layers, EI {}>",
            self.0.layers().len(),
            self.bending_stiffness()
        )
    }
}
