//! The class `Gamma`.

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

/// Two or three layers that slip on each other, by the gamma method.
///
/// - layers: from the lowest upward
/// - joints: the slip modulus per length of each joint between two of them
/// - length: the length of the wave
///
/// One layer has gamma = 1: the middle one of three, the lower one of two. The others have
/// gamma_i = 1/(1 + pi^2 EA_i/(k_i l^2)). With z_n = sum of gamma_i EA_i z_i over sum of
/// gamma_i EA_i and a_i = z_i - z_n (Annex B writes them as distances),
/// EI_ef = sum of (EI_i + gamma_i EA_i a_i^2).
///
/// Source: EN 1995-1-1:2004 Annex B (from memory), after Moehler 1956; gaps between the layers are
/// in the places of the centroids. Huber and Deix, Materials 14, 2021, 7211, show its local errors
/// under point loads.
///
/// >>> joist = LayerInput.rectangle(11*GPa, 100*mm, 220*mm, 110*mm)
/// >>> slab = LayerInput.rectangle(31*GPa, 600*mm, 70*mm, 255*mm)
/// >>> gamma = Gamma([joist, slab], ["133.333 N/mm2"], ReferenceLength.span(6*m))
/// >>> round(gamma.factors[1], 5)
/// 0.27195
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct Gamma(Made<simplified::Gamma>);

#[pymethods]
impl Gamma {
    #[new]
    fn new(
        layers: Vec<Py<LayerInput>>,
        joints: Vec<Bound<'_, PyAny>>,
        length: &Bound<'_, ReferenceLength>,
    ) -> PyResult<Self> {
        let py = length.py();
        let (cores, moduli) = layers_and_joints(py, &layers, &joints)?;
        let core = simplified::Gamma::of(&cores, &moduli, length.get().0).or_raise(py)?;
        let recipe = Recipe::call(py, "Gamma", (layers, joints, length))?;
        Ok(Self(Made::new(core, recipe)))
    }

    /// The layers, from the lowest upward.
    #[getter]
    fn layers<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        let layers: Vec<_> = self.0.layers().iter().copied().map(LayerInput).collect();
        PyTuple::new(py, layers)
    }

    /// The position of the layer with gamma = 1.
    #[getter]
    fn base_layer(&self) -> usize {
        self.0.base_layer()
    }

    /// gamma_i of each layer: 1 for a rigid joint, 0 for a loose one.
    #[getter]
    fn factors<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        PyTuple::new(py, self.0.factors())
    }

    /// a_i = z_i - z_n of each layer, positive above the axis.
    #[getter]
    fn arms<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        quantities(py, self.0.arms())
    }

    /// EI_ef = sum of (EI_i + gamma_i EA_i a_i^2).
    #[getter]
    fn bending_stiffness(&self) -> Quantity {
        Quantity::of(self.0.bending_stiffness())
    }

    /// N_i = -gamma_i EA_i a_i M/EI_ef of each layer under a moment.
    fn axial_forces<'py>(&self, moment: &Bound<'py, PyAny>) -> PyResult<Bound<'py, PyTuple>> {
        let (py, moment) = (moment.py(), convert::read(moment, "moment")?);
        quantities(py, &self.0.axial_forces(moment).or_raise(py)?)
    }

    /// The normal stresses of each layer under a moment: sigma_i = -gamma_i E_i a_i M/EI_ef and
    /// sigma_m,i = 0.5 E_i h_i M/EI_ef.
    fn stresses<'py>(&self, moment: &Bound<'py, PyAny>) -> PyResult<Bound<'py, PyTuple>> {
        let found = self.0.stresses(convert::read(moment, "moment")?);
        stresses(moment.py(), found)
    }

    /// The flow of each joint under a shear force: the sum of gamma_i EA_i a_i of the layers above
    /// it times V/EI_ef, which of an outer layer is its own gamma E A a V/EI_ef.
    fn flows<'py>(&self, shear: &Bound<'py, PyAny>) -> PyResult<Bound<'py, PyTuple>> {
        let (py, shear) = (shear.py(), convert::read(shear, "shear")?);
        quantities(py, &self.0.flows(shear).or_raise(py)?)
    }

    /// The force of a fastener of each joint under a shear force: F_i = flow x s_i, with s_i the
    /// spacing as of one row: with n rows, the spacing along the member over n.
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

    /// The greatest shear stress of each layer under a shear force: see ShearStress, with
    /// e_i = gamma_i a_i. Annex B gives that of the layer with gamma = 1 for z_n within it.
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
            "<Gamma of {} layers, EI {}>",
            self.0.layers().len(),
            self.bending_stiffness()
        )
    }
}
