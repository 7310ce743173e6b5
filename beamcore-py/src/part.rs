//! The classes `Outline` and `Part`.

use crate::convert::Inputs;
use crate::made::{Made, Recipe, Reduced};
use crate::material::Material;
use crate::quantity::Quantity;
use beamcore::section::{self, Side};
use pyo3::prelude::*;

/// The outline of a part, without its place.
#[pyclass(frozen, eq, module = "beamcore", from_py_object)]
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct Outline(section::Outline);

#[pymethods]
impl Outline {
    /// Size along y, across the section.
    #[getter]
    fn width(&self) -> Quantity {
        Quantity::of(self.0.width())
    }

    /// Size along z, upright.
    #[getter]
    fn height(&self) -> Quantity {
        Quantity::of(self.0.height())
    }

    /// Area, b h for a rectangle.
    #[getter]
    fn area(&self) -> Quantity {
        Quantity::of(self.0.area())
    }

    /// Second moment of area about the horizontal axis through its own centroid, b h^3/12.
    #[getter]
    fn second_moment_yy(&self) -> Quantity {
        Quantity::of(self.0.second_moment_yy())
    }

    /// Second moment of area about the upright axis through its own centroid, h b^3/12.
    #[getter]
    fn second_moment_zz(&self) -> Quantity {
        Quantity::of(self.0.second_moment_zz())
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        Recipe::call(py, "rectangle", (self.width(), self.height()))?.reduce(py)
    }

    fn __repr__(&self) -> String {
        format!("<rectangle {} x {}>", self.width(), self.height())
    }
}

/// A rectangle of a width (along y) and a height (along z).
///
/// >>> rectangle(75*mm, "220 mm").area.to("mm2")
/// 16500.0
#[pyfunction]
fn rectangle(width: &Bound<'_, PyAny>, height: &Bound<'_, PyAny>) -> PyResult<Outline> {
    let mut inputs = Inputs::default();
    let w = inputs.read(width, "rectangle.width")?;
    let h = inputs.read(height, "rectangle.height")?;
    let outline = w.zip(h).map(|(w, h)| section::rectangle(w, h));
    Ok(Outline(inputs.done(width.py(), outline)?))
}

/// One piece of one material in a section, with a name that addresses its results.
///
/// Its place is one of: the middle of its outline at (y, z), with y to the right and z upward in a
/// drawing that is seen against the direction of x; or touching another part, centred on it. A part
/// that is given no place stands with its middle at y = 0, z = 0.
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

    /// The same part with the middle of its outline at (y, z).
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

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }

    fn __repr__(&self) -> String {
        format!("<Part {:?} of {}>", self.0.name(), self.0.material().name())
    }
}

/// Adds the classes and functions to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_class::<Outline>()?;
    module.add_class::<Part>()?;
    module.add_function(wrap_pyfunction!(rectangle, module)?)
}
