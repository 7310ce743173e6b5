//! The class `Section`.

use crate::convert::Inputs;
use crate::error::OrRaise;
use crate::forces::{PointStress, SectionForces};
use crate::initial_strain::StrainPlane;
use crate::joint::Joint;
use crate::layer::Layer;
use crate::made::{Made, Recipe, Reduced};
use crate::part::{Part, PartOrName};
use crate::placed::PlacedPart;
use crate::quantity::Quantity;
use crate::stiffness::Stiffness;
use crate::time::TimeText;
use crate::transformed::TransformedSection;
use crate::word::Sideways;
use beamcore::section;
use pyo3::prelude::*;
use pyo3::types::{PyDict, PyTuple};

/// The layers and joints at one place along the member.
///
/// The parts of a layer, and the layers that rigid joints hold together, share one plane of strain;
/// a section of parts alone is one layer, named "section".
///
/// >>> joist = Part("joist", rectangle(80*mm, 200*mm), timber("C24", service_class=1))
/// >>> plate = Part("plate", rectangle(8*mm, 200*mm), steel("S275")).right_of(joist)
/// >>> Section([joist, plate]).stiffness("initial").axial
/// 512 MN
/// >>> bolts = Joint.slipping("bolts", "wood", "steel", modulus="60 N/mm2", creep=0.6)
/// >>> section = Section([joist, plate], joints=[bolts],
/// ...                   layers=[Layer("wood", [joist]), Layer("steel", [plate])])
/// >>> section.joint("bolts").width
/// 200 mm
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct Section(pub(crate) Made<section::Section>);

#[pymethods]
impl Section {
    #[new]
    #[pyo3(signature = (parts, *, layers=None, joints=None))]
    fn new(
        py: Python<'_>,
        parts: Vec<Py<Part>>,
        layers: Option<Vec<Py<Layer>>>,
        joints: Option<Vec<Py<Joint>>>,
    ) -> PyResult<Self> {
        let cores = parts.iter().map(|part| part.get().0.inner.clone());
        let core = if layers.is_none() && joints.is_none() {
            section::Section::of(cores)
        } else {
            let layers = layers.iter().flatten().map(|layer| layer.get().0.clone());
            let joints = joints.iter().flatten().map(|joint| joint.get().0.clone());
            section::Section::layered(cores, layers, joints)
        };
        let keywords = PyDict::new(py);
        keywords.set_item("layers", layers)?;
        keywords.set_item("joints", joints)?;
        let recipe = Recipe::call(py, "Section", (parts,))?.with(&keywords);
        Ok(Self(Made::new(core.or_raise(py)?, recipe)))
    }

    /// The names of the parts, in the order given.
    #[getter]
    fn part_names<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        PyTuple::new(py, self.0.parts().iter().map(section::Part::name))
    }

    /// Mass per length: the sum of those of the parts, each as given or density x area; None if a
    /// part without one has no density.
    #[getter]
    fn line_mass(&self) -> Option<Quantity> {
        self.0.line_mass().map(Quantity::of)
    }

    /// What an engineer should know of this section: for example that parts do not touch.
    #[getter]
    fn notes<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        PyTuple::new(py, self.0.notes())
    }

    /// The parts at their places, in the order given.
    #[getter]
    fn placed<'py>(slf: &Bound<'py, Self>) -> PyResult<Bound<'py, PyTuple>> {
        let placed = slf.get().0.placed().iter();
        let placed = placed.map(|part| PlacedPart::of(slf, part));
        PyTuple::new(slf.py(), placed.collect::<PyResult<Vec<_>>>()?)
    }

    /// The part of a name, at its place.
    fn part(slf: &Bound<'_, Self>, name: &str) -> PyResult<PlacedPart> {
        PlacedPart::of(slf, slf.get().0.part(name).or_raise(slf.py())?)
    }

    /// The stiffness at a time, "initial" or "final", of all parts as one piece, as if every joint
    /// were rigid.
    fn stiffness(slf: &Bound<'_, Self>, time: TimeText) -> PyResult<Stiffness> {
        let time = time.into();
        let stiffness = slf.get().0.stiffness(time);
        let recipe = Recipe::method(slf, "stiffness", (time.name(),))?;
        Ok(Stiffness(Made::new(stiffness, recipe)))
    }

    /// The plane of strain that the section takes freely under the initial strains of its parts, at
    /// a time, "initial" or "final": EA axial = sum of E_i int eps_i dA, and for a section "held"
    /// sideways EI_yy curvature_y = -sum of E_i int z eps_i dA; one that is "free" also bends about
    /// the upright axis.
    ///
    /// >>> lower = Part("lower", rectangle(10*mm, 5*mm), steel("S275"))
    /// >>> upper = Part("upper", rectangle(10*mm, 5*mm), steel("S275")).above(lower)
    /// >>> wet = lower.with_initial_strain(InitialStrain("1 permille"))
    /// >>> Section([wet, upper]).free_plane("initial", "held").curvature_y   # 1.5 d/h
    /// 0.15 1/m
    fn free_plane(
        slf: &Bound<'_, Self>,
        time: TimeText,
        sideways: Sideways,
    ) -> PyResult<StrainPlane> {
        let (time, sideways) = (time.into(), sideways.0);
        let plane = slf.get().0.free_plane(time, sideways);
        let recipe = Recipe::method(slf, "free_plane", (time.name(), sideways.name()))?;
        Ok(StrainPlane(Made::new(plane, recipe)))
    }

    /// The section as if made of the material of one part, at a time, "initial" or "final".
    fn transformed_to(
        slf: &Bound<'_, Self>,
        material: &str,
        time: TimeText,
    ) -> PyResult<TransformedSection> {
        let time = time.into();
        let transformed = slf
            .get()
            .0
            .transformed_to(material, time)
            .or_raise(slf.py())?;
        let recipe = Recipe::method(slf, "transformed_to", (material, time.name()))?;
        Ok(TransformedSection(Made::new(transformed, recipe)))
    }

    /// The stress in a part at a point (y, z) of it under section forces, E x strain, tension
    /// positive, at a time, "initial" or "final". Initial strains of parts are not in it.
    ///
    /// Strain: N/EA - kappa_y (z - z_n) - kappa_z (y - y_n). A section "held" sideways bends about
    /// the level axis only: kappa_y = M_y/EI_yy, kappa_z = 0. One that is "free" bends
    /// about both: kappa_y = (M_y EI_zz - M_z EI_yz)/D, kappa_z = (M_z EI_yy - M_y EI_yz)/D, with
    /// D = EI_yy EI_zz - EI_yz^2 (unsymmetrical bending, derived from the plane of strain).
    ///
    /// >>> beam = Part("beam", rectangle(100*mm, 200*mm), steel("S275"))
    /// >>> forces = SectionForces(axial=0*kN, moment_y=20*kN*m, moment_z=0*kN*m)
    /// >>> stress = Section([beam]).stress_at(
    /// ...     "beam", 0*mm, -100*mm, forces, sideways="held", time="initial")
    /// >>> f"{stress.to(MPa):.3f} MPa"
    /// '30.000 MPa'
    #[pyo3(signature = (part, y, z, forces, *, sideways, time))]
    fn stress_at(
        &self,
        part: PartOrName,
        y: &Bound<'_, PyAny>,
        z: &Bound<'_, PyAny>,
        forces: &Bound<'_, SectionForces>,
        sideways: Sideways,
        time: TimeText,
    ) -> PyResult<Quantity> {
        let py = y.py();
        let mut inputs = Inputs::default();
        let point = inputs.read(y, "y")?.zip(inputs.read(z, "z")?);
        let point = inputs.done(py, point)?;
        let (part, forces) = (part.into_name(), &forces.get().0);
        let stress = self
            .0
            .stress_at(&part, point, forces, sideways.0, time.into());
        Ok(Quantity::of(stress.or_raise(py)?))
    }

    /// The greatest and the least stress in a part under section forces, as two PointStress; the
    /// formula is that of stress_at, without initial strains, and as the strain is linear they
    /// stand where the outline reaches farthest.
    #[pyo3(signature = (part, forces, *, sideways, time))]
    fn stress_extremes<'py>(
        &self,
        part: PartOrName,
        forces: &Bound<'py, SectionForces>,
        sideways: Sideways,
        time: TimeText,
    ) -> PyResult<Bound<'py, PyTuple>> {
        let (py, part) = (forces.py(), part.into_name());
        let forces = &forces.get().0;
        let found = self
            .0
            .stress_extremes(&part, forces, sideways.0, time.into());
        PyTuple::new(py, found.or_raise(py)?.map(PointStress::of))
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }
}
