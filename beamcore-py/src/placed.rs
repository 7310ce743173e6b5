//! The class `PlacedPart`.

use crate::initial_strain::InitialStrain;
use crate::made::{Made, Recipe, Reduced};
use crate::material::Material;
use crate::outline::Outline;
use crate::quantity::Quantity;
use crate::section::Section;
use beamcore::section;
use pyo3::prelude::*;

/// A part at its place in a section: y to the right, z up, seen against the direction of x.
///
/// Its area and centroid are without what is set into it; its sides are those of the whole outline.
///
/// >>> joist = Part("joist", rectangle(80*mm, 200*mm), timber("C24", service_class=1))
/// >>> plate = Part("plate", rectangle(8*mm, 200*mm), steel("S275")).right_of(joist)
/// >>> Section([joist, plate]).part("plate").centroid_y
/// 44 mm
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct PlacedPart(Made<section::PlacedPart>);

impl PlacedPart {
    /// A part of a section.
    pub(crate) fn of(section: &Bound<'_, Section>, part: &section::PlacedPart) -> PyResult<Self> {
        let recipe = Recipe::method(section, "part", (part.name(),))?;
        Ok(Self(Made::new(part.clone(), recipe)))
    }
}

#[pymethods]
impl PlacedPart {
    /// The name.
    #[getter]
    fn name(&self) -> &str {
        self.0.name()
    }

    /// The outline, as given.
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

    /// The initial strain that the part bears; of a mirror image it is mirrored too.
    #[getter]
    fn initial_strain(&self) -> InitialStrain {
        InitialStrain(self.0.initial_strain())
    }

    /// The name of the host that the part is set into; None if it is set into none.
    #[getter]
    fn host(&self) -> Option<&str> {
        self.0.host()
    }

    /// The least y of the outline.
    #[getter]
    fn left(&self) -> Quantity {
        Quantity::of(self.0.left())
    }

    /// The greatest y of the outline.
    #[getter]
    fn right(&self) -> Quantity {
        Quantity::of(self.0.right())
    }

    /// The least z of the outline.
    #[getter]
    fn bottom(&self) -> Quantity {
        Quantity::of(self.0.bottom())
    }

    /// The greatest z of the outline.
    #[getter]
    fn top(&self) -> Quantity {
        Quantity::of(self.0.top())
    }

    /// The y of the part's own centroid, without what is set into it.
    #[getter]
    fn centroid_y(&self) -> Quantity {
        Quantity::of(self.0.centroid_y())
    }

    /// The z of the part's own centroid, without what is set into it.
    #[getter]
    fn centroid_z(&self) -> Quantity {
        Quantity::of(self.0.centroid_z())
    }

    /// The area, without what is set into it.
    #[getter]
    fn area(&self) -> Quantity {
        Quantity::of(self.0.area())
    }

    /// Mass per length: as given, or density x area; None if the material has no density.
    #[getter]
    fn line_mass(&self) -> Option<Quantity> {
        self.0.line_mass().map(Quantity::of)
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }

    fn __repr__(&self) -> String {
        format!(
            "<PlacedPart {:?}, y from {} to {}, z from {} to {}>",
            self.name(),
            self.left(),
            self.right(),
            self.bottom(),
            self.top()
        )
    }
}
