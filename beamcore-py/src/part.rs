//! The class `Part`.

use crate::convert::{self, Inputs};
use crate::initial_strain::InitialStrain;
use crate::made::{Made, Recipe, Reduced};
use crate::material::Material;
use crate::outline::Outline;
use crate::quantity::Quantity;
use crate::word::MirrorAxis;
use beamcore::section::{self, Side};
use pyo3::prelude::*;

/// One piece of one material in a section, with a name that addresses its results.
///
/// Its place is one of: the middle of its outline (of a polygon, the origin of its coordinates) at
/// (y, z), with y to the right and z upward in a drawing that is seen against the direction of x;
/// touching another part, centred on it; the mirror image of another; or set into another. A part
/// that is given no place stands at y = 0, z = 0.
///
/// >>> joist = Part("joist", rectangle(75*mm, 220*mm), timber("C24", service_class=1))
/// >>> plate = Part("plate", rectangle(10*mm, 200*mm), steel("S275")).right_of(joist)
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct Part(pub(crate) Made<section::Part>);

/// A part, or the name of one.
#[derive(FromPyObject)]
pub(crate) enum PartOrName {
    Part(Py<Part>),
    Name(String),
}

impl PartOrName {
    /// The name.
    pub(crate) fn into_name(self) -> String {
        match self {
            Self::Part(part) => part.get().0.name().to_owned(),
            Self::Name(name) => name,
        }
    }
}

impl Part {
    fn beside(slf: &Bound<'_, Self>, side: Side, of: PartOrName) -> PyResult<Self> {
        let of = of.into_name();
        let recipe = Recipe::method(slf, side.name(), (&of,))?;
        let part = slf.get().0.inner.clone().beside(side, of);
        Ok(Self(Made::new(part, recipe)))
    }
}

#[pymethods]
impl Part {
    #[new]
    fn new(
        name: &str,
        outline: &Bound<'_, Outline>,
        material: &Bound<'_, Material>,
    ) -> PyResult<Self> {
        let core = material.get().0.inner.clone();
        let part = section::Part::new(name, outline.get().0.clone(), core);
        let recipe = Recipe::call(outline.py(), "Part", (name, outline, material))?;
        Ok(Self(Made::new(part, recipe)))
    }

    /// The name.
    #[getter]
    fn name(&self) -> &str {
        self.0.name()
    }

    /// The outline.
    #[getter]
    fn outline(&self) -> Outline {
        Outline(self.0.outline().clone())
    }

    /// The material.
    #[getter]
    fn material(slf: &Bound<'_, Self>) -> PyResult<Material> {
        let material = slf.get().0.material().clone();
        Ok(Material(Made::new(
            material,
            Recipe::property(slf, "material")?,
        )))
    }

    /// The mass per length, if it was given instead of density x area; else None.
    #[getter]
    fn given_line_mass(&self) -> Option<Quantity> {
        self.0.given_line_mass().map(Quantity::of)
    }

    /// The initial strain; zero unless it was given.
    #[getter]
    fn given_initial_strain(&self) -> InitialStrain {
        InitialStrain(self.0.given_initial_strain())
    }

    /// The same part with the middle of its outline (of a polygon, the origin of its coordinates)
    /// at (y, z).
    fn at<'py>(
        slf: &Bound<'py, Self>,
        y: &Bound<'py, PyAny>,
        z: &Bound<'py, PyAny>,
    ) -> PyResult<Self> {
        let mut inputs = Inputs::default();
        let place = inputs
            .read(y, "place.at.y")?
            .zip(inputs.read(z, "place.at.z")?);
        let (y_core, z_core) = inputs.done(slf.py(), place)?;
        let part = slf.get().0.inner.clone().at(y_core, z_core);
        Ok(Self(Made::new(part, Recipe::method(slf, "at", (y, z))?)))
    }

    /// The same part touching the left side of another, centred on its height.
    fn left_of(slf: &Bound<'_, Self>, other: PartOrName) -> PyResult<Self> {
        Self::beside(slf, Side::Left, other)
    }

    /// The same part touching the right side of another, centred on its height.
    fn right_of(slf: &Bound<'_, Self>, other: PartOrName) -> PyResult<Self> {
        Self::beside(slf, Side::Right, other)
    }

    /// The same part standing on another, centred on its width.
    fn above(slf: &Bound<'_, Self>, other: PartOrName) -> PyResult<Self> {
        Self::beside(slf, Side::Above, other)
    }

    /// The same part under another, touching it, centred on its width.
    fn below(slf: &Bound<'_, Self>, other: PartOrName) -> PyResult<Self> {
        Self::beside(slf, Side::Below, other)
    }

    /// The same part as the mirror image of another, at the mirrored place, with its own outline
    /// mirrored: about the "upright" axis y = 0 (left and right change) or the "level" axis z = 0
    /// (top and bottom change).
    ///
    /// >>> foot = Part("foot", rectangle(90*mm, 30*mm), steel("S275")).at(0*mm, -150*mm)
    /// >>> head = Part("head", rectangle(90*mm, 30*mm), steel("S275")).mirror_of(foot, "level")
    /// >>> Section([foot, head]).part("head").top
    /// 165 mm
    fn mirror_of(slf: &Bound<'_, Self>, other: PartOrName, axis: MirrorAxis) -> PyResult<Self> {
        let (of, axis) = (other.into_name(), axis.0);
        let recipe = Recipe::method(slf, "mirror_of", (&of, axis.name()))?;
        let part = slf.get().0.inner.clone().mirror_of(of, axis);
        Ok(Self(Made::new(part, recipe)))
    }

    /// The same part set into another, its host, with the middle of its outline at (y, z): it
    /// displaces the host exactly, whose area and moments become smaller by its own.
    ///
    /// >>> beam = Part("beam", rectangle(120*mm, 300*mm), timber("C24", service_class=1))
    /// >>> bar = Part("bar", rectangle(20*mm, 20*mm), steel("S275")).set_into(beam, 0*mm, -120*mm)
    /// >>> Section([beam, bar]).part("beam").area.to("mm2")
    /// 35600.0
    fn set_into<'py>(
        slf: &Bound<'py, Self>,
        host: PartOrName,
        y: &Bound<'py, PyAny>,
        z: &Bound<'py, PyAny>,
    ) -> PyResult<Self> {
        let mut inputs = Inputs::default();
        let place = inputs
            .read(y, "place.set_into.y")?
            .zip(inputs.read(z, "place.set_into.z")?);
        let (y_core, z_core) = inputs.done(slf.py(), place)?;
        let host = host.into_name();
        let recipe = Recipe::method(slf, "set_into", (&host, y, z))?;
        let part = slf.get().0.inner.clone().set_into(host, y_core, z_core);
        Ok(Self(Made::new(part, recipe)))
    }

    /// The same part with a mass per length of its own, instead of density x area.
    fn with_line_mass<'py>(slf: &Bound<'py, Self>, mass: &Bound<'py, PyAny>) -> PyResult<Self> {
        let value = convert::read(mass, "line_mass")?;
        let recipe = Recipe::method(slf, "with_line_mass", (mass,))?;
        let part = slf.get().0.inner.clone().line_mass(value);
        Ok(Self(Made::new(part, recipe)))
    }

    /// The same part with an initial strain from the first day, which makes the section bend and
    /// its parts press on each other. A member with one must be held sideways.
    ///
    /// >>> slab = Part("slab", rectangle(500*mm, 60*mm), concrete("C25/30", creep=2.5))
    /// >>> slab.with_initial_strain(InitialStrain("-0.3 permille")).given_initial_strain.axial
    /// -0.3 permille
    fn with_initial_strain(
        slf: &Bound<'_, Self>,
        strain: &Bound<'_, InitialStrain>,
    ) -> PyResult<Self> {
        let recipe = Recipe::method(slf, "with_initial_strain", (strain,))?;
        let part = slf.get().0.inner.clone().initial_strain(strain.get().0);
        Ok(Self(Made::new(part, recipe)))
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }

    fn __repr__(&self) -> String {
        format!("<Part {:?} of {}>", self.0.name(), self.0.material().name())
    }
}
