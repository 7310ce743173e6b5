//! The class `PlacedJoint`.

use crate::convert;
use crate::joint::Joint;
use crate::made::{Made, Recipe, Reduced};
use crate::quantity::Quantity;
use crate::section::Section;
use crate::time::TimeText;
use beamcore::section;
use pyo3::prelude::*;
use pyo3::types::PyTuple;

/// A joint at its place in a section, with what follows from its two layers.
///
/// >>> joist = Part("joist", rectangle(100*mm, 220*mm), timber("C24", service_class=1))
/// >>> board = Part("board", rectangle(80*mm, 40*mm), timber("C24", service_class=1)).above(joist)
/// >>> section = Section(
/// ...     [joist, board], layers=[Layer("lower", [joist]), Layer("upper", [board])],
/// ...     joints=[Joint.slipping("nails", "lower", "upper", modulus="5 N/mm2")])
/// >>> nails = section.joint("nails")
/// >>> nails.z, nails.width, nails.slip_modulus_at(1*m, "final")
/// (110 mm, 80 mm, 2.27273 N/mm**2)
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct PlacedJoint(Made<section::PlacedJoint>);

impl PlacedJoint {
    /// A joint of a section.
    pub(crate) fn of(section: &Bound<'_, Section>, joint: &section::PlacedJoint) -> PyResult<Self> {
        let recipe = Recipe::method(section, "joint", (joint.joint().name(),))?;
        Ok(Self(Made::new(joint.clone(), recipe)))
    }
}

#[pymethods]
impl PlacedJoint {
    /// The joint as given.
    #[getter]
    fn joint(&self) -> Joint {
        Joint(self.0.joint().clone())
    }

    /// The clear distance of the two layers; zero where they touch.
    #[getter]
    fn distance(&self) -> Quantity {
        Quantity::of(self.0.distance())
    }

    /// The z of the joint: the middle of the contact or of the gap between the two layers.
    #[getter]
    fn z(&self) -> Quantity {
        Quantity::of(self.0.z())
    }

    /// Over which width the layers touch or face each other: the common width of layers on each
    /// other, the common height of layers side by side, the outline of a part set into another;
    /// zero where round and flat meet in a point.
    #[getter]
    fn width(&self) -> Quantity {
        Quantity::of(self.0.width())
    }

    /// The creep factor: at the end the moduli are divided by (1 + factor).
    #[getter]
    fn creep_factor(&self) -> f64 {
        self.0.creep()
    }

    /// Where the creep factor comes from.
    #[getter]
    fn creep_basis(&self) -> &str {
        self.0.creep_basis()
    }

    /// The clearance; zero unless it was given.
    #[getter]
    fn clearance(&self) -> Quantity {
        Quantity::of(self.0.clearance())
    }

    /// From where to where along the member both layers are there; None for the whole length.
    #[getter]
    fn extent(&self) -> Option<(Quantity, Quantity)> {
        let extent = self.0.extent();
        extent.map(|(from, to)| (Quantity::of(from), Quantity::of(to)))
    }

    /// Where along the member a modulus of the joint changes: the ends of its bands and of its
    /// layers, from left to right, each once.
    #[getter]
    fn places<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        let places: Vec<_> = self.0.places().into_iter().map(Quantity::of).collect();
        PyTuple::new(py, places)
    }

    /// The slip modulus at a place along the member, k at "initial" and k/(1 + creep factor) at
    /// "final"; zero of a loose joint, outside of all bands and where one of the layers is not
    /// there; None of a rigid joint.
    fn slip_modulus_at(&self, at: &Bound<'_, PyAny>, time: TimeText) -> PyResult<Option<Quantity>> {
        let modulus = self
            .0
            .slip_modulus_at(convert::read(at, "at")?, time.into());
        Ok(modulus.map(Quantity::of))
    }

    /// The modulus square to the member at a place, as slip_modulus_at; None where the two layers
    /// share their deflection.
    fn transverse_modulus_at(
        &self,
        at: &Bound<'_, PyAny>,
        time: TimeText,
    ) -> PyResult<Option<Quantity>> {
        let modulus = self
            .0
            .transverse_modulus_at(convert::read(at, "at")?, time.into());
        Ok(modulus.map(Quantity::of))
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }

    fn __repr__(&self) -> String {
        format!(
            "<PlacedJoint {:?} at z = {}, {} wide>",
            self.0.joint().name(),
            self.z(),
            self.width()
        )
    }
}
