//! The classes `Hinge` and `Anchor`.

use crate::convert::{self, Inputs};
use crate::joint::JointOrName;
use crate::layer::LayerOrName;
use crate::made::{Recipe, Reduced};
use crate::quantity::Quantity;
use beamcore::member::{self, Release};
use pyo3::prelude::*;

/// An internal hinge of a member: see its ways to be made, moment, shear and butt.
///
/// >>> Hinge.moment(2.4*m).kind
/// 'moment'
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct Hinge(pub(crate) member::Hinge);

#[pymethods]
impl Hinge {
    /// A hinge through all layers: no moment passes. With a layer, or its name: a hinge in that
    /// layer, which must have a deflection of its own.
    #[staticmethod]
    #[pyo3(signature = (at, layer=None))]
    fn moment(at: &Bound<'_, PyAny>, layer: Option<LayerOrName>) -> PyResult<Self> {
        let place = convert::read(at, "hinge.moment.at")?;
        let release = Release::Moment(layer.map(LayerOrName::into_name));
        Ok(Self(member::Hinge::new(place, release)))
    }

    /// A shear release: no shear force passes.
    #[staticmethod]
    fn shear(at: &Bound<'_, PyAny>) -> PyResult<Self> {
        let place = convert::read(at, "hinge.shear.at")?;
        Ok(Self(member::Hinge::shear(place)))
    }

    /// A butt joint of one layer: no axial force of that layer passes. Its curvature goes on with
    /// that of the others.
    #[staticmethod]
    fn butt(at: &Bound<'_, PyAny>, layer: LayerOrName) -> PyResult<Self> {
        let place = convert::read(at, "hinge.butt.at")?;
        Ok(Self(member::Hinge::butt(layer.into_name(), place)))
    }

    /// What it releases: "moment", "shear" or "butt".
    #[getter]
    const fn kind(&self) -> &'static str {
        self.0.release().name()
    }

    /// Its place, from the left end of the member.
    #[getter]
    fn at(&self) -> Quantity {
        Quantity::of(self.0.at())
    }

    /// The name of the layer that it is in; None where it is through all layers.
    #[getter]
    fn layer(&self) -> Option<&str> {
        match self.0.release() {
            Release::Moment(layer) => layer.as_deref(),
            Release::Shear => None,
            Release::Butt(layer) => Some(layer),
        }
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        let (at, layer) = (self.at(), self.layer());
        match self.0.release() {
            Release::Moment(_) => Recipe::call(py, "Hinge.moment", (at, layer)),
            Release::Shear => Recipe::call(py, "Hinge.shear", (at,)),
            Release::Butt(_) => Recipe::call(py, "Hinge.butt", (at, layer)),
        }?
        .reduce(py)
    }

    fn __repr__(&self) -> String {
        format!("<{} hinge at {}>", self.kind(), self.at())
    }
}

/// What stops the slip of a joint at a place, as an end plate or a notch does.
///
/// - name: the name by which its force is asked for
/// - joint: the joint, or its name
/// - at: its place, from the left end of the member
/// - stiffness: force per slip; without it, it lets no slip at all
///
/// >>> Anchor("notch", "screws", at=0.3*m, stiffness="200 kN/mm").stiffness
/// 200000 N/mm
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct Anchor(pub(crate) member::Anchor);

#[pymethods]
impl Anchor {
    #[new]
    #[pyo3(signature = (name, joint, at, stiffness=None))]
    fn new(
        name: String,
        joint: JointOrName,
        at: &Bound<'_, PyAny>,
        stiffness: Option<&Bound<'_, PyAny>>,
    ) -> PyResult<Self> {
        let mut inputs = Inputs::default();
        let place = inputs.read(at, "anchor.at")?;
        let held = match stiffness {
            Some(stiffness) => inputs.read(stiffness, "anchor.stiffness")?.map(Some),
            None => Some(None),
        };
        let (at, stiffness) = inputs.done(at.py(), place.zip(held))?;
        Ok(Self(member::Anchor {
            name,
            joint: joint.into_name(),
            at,
            stiffness,
        }))
    }

    /// The name by which its force is asked for.
    #[getter]
    fn name(&self) -> &str {
        &self.0.name
    }

    /// The name of the joint.
    #[getter]
    fn joint(&self) -> &str {
        &self.0.joint
    }

    /// Its place, from the left end of the member.
    #[getter]
    fn at(&self) -> Quantity {
        Quantity::of(self.0.at)
    }

    /// Force per slip; None where it lets no slip at all.
    #[getter]
    fn stiffness(&self) -> Option<Quantity> {
        self.0.stiffness.map(Quantity::of)
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        let fields = (self.name(), self.joint(), self.at(), self.stiffness());
        Recipe::call(py, "Anchor", fields)?.reduce(py)
    }

    fn __repr__(&self) -> String {
        format!(
            "<Anchor {:?} of {:?} at {}>",
            self.name(),
            self.joint(),
            self.at()
        )
    }
}
