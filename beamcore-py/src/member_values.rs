//! What the class `Member` tells of its sections, hinges, anchors, shear and pitch.

use crate::change::SectionChange;
use crate::convert;
use crate::error::OrRaise;
use crate::hinge::{Anchor, Hinge};
use crate::made::{Made, Recipe};
use crate::member::Member;
use crate::placed::PlacedPart;
use crate::quantity::Quantity;
use crate::section::Section;
use beamcore::member::ShearModel;
use pyo3::IntoPyObjectExt;
use pyo3::prelude::*;
use pyo3::types::PyTuple;

#[pymethods]
impl Member {
    /// The section at the left end.
    #[getter]
    fn section(&self, py: Python<'_>) -> Py<Section> {
        self.section.clone_ref(py)
    }

    /// The changes of the section along the member, from left to right.
    #[getter]
    fn changes<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        PyTuple::new(py, &self.changes)
    }

    /// The section just right of a place (at the right end, just left of it).
    fn section_at(slf: &Bound<'_, Self>, at: &Bound<'_, PyAny>) -> PyResult<Section> {
        let place = convert::read(at, "at")?;
        let section = slf.get().made.section_at(place).or_raise(slf.py())?;
        let recipe = Recipe::method(slf, "section_at", (at,))?;
        Ok(Section(Made::new(section, recipe)))
    }

    /// The parts of all sections along the member, each name once, at its place where it comes
    /// first from the left.
    #[getter]
    fn parts<'py>(slf: &Bound<'py, Self>) -> PyResult<Bound<'py, PyTuple>> {
        let (py, member) = (slf.py(), slf.get());
        let mut sections = vec![member.section.bind(py).clone()];
        for change in &member.changes {
            sections.push(Bound::new(py, SectionChange::section(change.bind(py))?)?);
        }
        let mut parts = Vec::new();
        for part in member.made.parts() {
            // Each comes from one of the sections that were given, by which it is made again.
            let own = |section: &&Bound<'py, Section>| {
                let known = section.get().0.part(part.name());
                known.is_ok_and(|known| known == part)
            };
            let section = sections.iter().find(own);
            let section = section.expect("a part of the member is one of its sections'");
            parts.push(PlacedPart::of(section, part)?);
        }
        PyTuple::new(py, parts)
    }

    /// The internal hinges.
    #[getter]
    fn hinges<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        let hinges: Vec<_> = self.made.hinges().iter().cloned().map(Hinge).collect();
        PyTuple::new(py, hinges)
    }

    /// What stops the slip of joints.
    #[getter]
    fn anchors<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        let anchors: Vec<_> = self.made.anchors().iter().cloned().map(Anchor).collect();
        PyTuple::new(py, anchors)
    }

    /// How shear deformation is taken: "rigid", "flexible", or kGA as given.
    #[getter]
    fn shear<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyAny>> {
        match self.made.shear_model() {
            ShearModel::Given(stiffness) => Quantity::of(stiffness).into_bound_py_any(py),
            model @ (ShearModel::Rigid | ShearModel::Flexible) => {
                model.name().into_bound_py_any(py)
            }
        }
    }

    /// The pitch; None if the member has none.
    #[getter]
    fn pitch(&self) -> Option<Quantity> {
        self.made.pitch().map(Quantity::of)
    }

    /// Whether layers have deflections of their own, by transverse moduli of their joints.
    #[getter]
    fn has_deflections_of_layers(&self) -> bool {
        self.made.has_deflections_of_layers()
    }

    /// Whether axial force takes part: more than one support holds the axis, something acts along
    /// the member, or it is pitched.
    #[getter]
    fn has_axial_force(&self) -> bool {
        self.made.has_axial_force()
    }
}
