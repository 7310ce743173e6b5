//! The classes `Section`, `Stiffness` and `TransformedSection`.

use crate::convert;
use crate::error::OrRaise;
use crate::made::{Made, Recipe, Reduced};
use crate::part::Part;
use crate::quantity::Quantity;
use crate::time::TimeText;
use beamcore::section;
use pyo3::prelude::*;
use pyo3::types::PyTuple;

/// Parts joined rigidly: at one place along the member all of them share one plane of strain.
///
/// >>> joist = Part("joist", rectangle(80*mm, 200*mm), timber("C24", service_class=1))
/// >>> plate = Part("plate", rectangle(8*mm, 200*mm), steel("S275")).right_of(joist)
/// >>> Section([joist, plate]).stiffness("initial").axial
/// 512 MN
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct Section(pub(crate) Made<section::Section>);

#[pymethods]
impl Section {
    #[new]
    fn new(py: Python<'_>, parts: Vec<Py<Part>>) -> PyResult<Self> {
        let core = section::Section::of(parts.iter().map(|part| part.get().0.inner.clone()));
        let recipe = Recipe::call(py, "Section", (parts,))?;
        Ok(Self(Made::new(core.or_raise(py)?, recipe)))
    }

    /// The names of the parts, in the order given.
    #[getter]
    fn part_names<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        PyTuple::new(py, self.0.parts().iter().map(section::Part::name))
    }

    /// Mass per length, sum of density x area; None if a part has no density.
    #[getter]
    fn line_mass(&self) -> Option<Quantity> {
        self.0.line_mass().map(Quantity::of)
    }

    /// What an engineer should know of this section: for example that parts do not touch.
    #[getter]
    fn notes<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        PyTuple::new(py, self.0.notes())
    }

    /// The stiffness at a time, "initial" or "final".
    fn stiffness(slf: &Bound<'_, Self>, time: TimeText) -> PyResult<Stiffness> {
        let time = time.into();
        let stiffness = slf.get().0.stiffness(time);
        let recipe = Recipe::method(slf, "stiffness", (time.name(),))?;
        Ok(Stiffness(Made::new(stiffness, recipe)))
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

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }
}

/// EA, elastic centroid and EI of a section at a time: sums weighted with the modulus of each part.
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct Stiffness(Made<section::Stiffness>);

#[pymethods]
impl Stiffness {
    /// EA = sum of E_i A_i.
    #[getter]
    fn axial(&self) -> Quantity {
        Quantity::of(self.0.axial())
    }

    /// y of the elastic centroid: sum of E_i A_i y_i over EA.
    #[getter]
    fn centroid_y(&self) -> Quantity {
        Quantity::of(self.0.centroid_y())
    }

    /// z of the elastic centroid: sum of E_i A_i z_i over EA.
    #[getter]
    fn centroid_z(&self) -> Quantity {
        Quantity::of(self.0.centroid_z())
    }

    /// EI_yy about the horizontal axis through the centroid: sum of E_i (I_i + A_i dz_i^2).
    #[getter]
    fn bending_yy(&self) -> Quantity {
        Quantity::of(self.0.bending_yy())
    }

    /// EI_zz about the upright axis through the centroid: sum of E_i (I_i + A_i dy_i^2).
    #[getter]
    fn bending_zz(&self) -> Quantity {
        Quantity::of(self.0.bending_zz())
    }

    /// EI_yz = sum of E_i A_i dy_i dz_i; zero for a section with an axis of symmetry.
    #[getter]
    fn bending_yz(&self) -> Quantity {
        Quantity::of(self.0.bending_yz())
    }

    /// The modulus of each part at this time, in the order of the parts.
    #[getter]
    fn moduli<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        let moduli: Vec<_> = self.0.moduli().iter().copied().map(Quantity::of).collect();
        PyTuple::new(py, moduli)
    }

    /// The share of each part in EI_yy, in the order of the parts; they sum to 1.
    #[getter]
    fn shares<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        PyTuple::new(py, self.0.shares())
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }
}

record! {
    /// One part of a transformed section: its width is multiplied by n = E/E_ref about its own
    /// centroid, its height is kept.
    TransformedPart {
        /// The name of the part.
        name: String,
        /// The modular ratio n = E/E_ref.
        ratio: f64,
        /// The transformed width, n b.
        width: Quantity,
        /// The least z of the outline.
        bottom: Quantity,
        /// The greatest z of the outline.
        top: Quantity,
    }
}

/// A section as if made of one chosen material; presentation only, no other result rests on it.
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct TransformedSection(Made<section::TransformedSection>);

#[pymethods]
impl TransformedSection {
    /// The modulus of the reference material at the time asked for.
    #[getter]
    fn reference_modulus(&self) -> Quantity {
        Quantity::of(self.0.reference_modulus())
    }

    /// Area: sum of n b h. Times the reference modulus it is EA.
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
    /// sum of n (b h^3/12 + b h dz^2). Times the reference modulus it is EI_yy.
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

/// Adds the classes to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_class::<Section>()?;
    module.add_class::<Stiffness>()?;
    module.add_class::<TransformedPart>()?;
    module.add_class::<TransformedSection>()
}
