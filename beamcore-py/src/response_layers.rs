//! What the class `Response` tells of layers, joints and supports.

use crate::error::OrRaise;
use crate::field::{Field, Line};
use crate::joint::JointOrName;
use crate::layer::LayerOrName;
use crate::layer_response::{CompositeAction, JointResponse, LayerForces};
use crate::made::{Made, Recipe};
use crate::quantity::Quantity;
use crate::reaction::Reaction;
use crate::response::Response;
use crate::run::run;
use crate::support::SupportOrName;
use crate::time::TimeText;
use beamcore::time::Time;
use pyo3::prelude::*;
use pyo3::types::PyTuple;

#[pymethods]
impl Response {
    /// The deflection of a layer, or of the layer of a name; that of the member unless a transverse
    /// modulus gives the layer one of its own.
    fn layer_deflection(
        slf: &Bound<'_, Self>,
        combination: &str,
        time: TimeText,
        layer: LayerOrName,
    ) -> PyResult<Field> {
        let (time, layer): (Time, _) = (time.into(), layer.into_name());
        let response = &slf.get().0;
        let line = response
            .layer_deflection(combination, time, &layer)
            .or_raise(slf.py())?;
        let args = (combination, time.name(), layer);
        let recipe = Recipe::method(slf, "layer_deflection", args)?;
        Ok(Field(Made::new(Line::Movement(line), recipe)))
    }

    /// Slip, flow and contact pressure of a joint, or of the joint of a name, that is not rigid.
    ///
    /// The pressure follows from the vertical equilibrium of the layers above the joint; loads that
    /// name no layer are taken to enter from above.
    fn joint(
        slf: &Bound<'_, Self>,
        combination: &str,
        time: TimeText,
        joint: JointOrName,
    ) -> PyResult<JointResponse> {
        let (time, joint): (Time, _) = (time.into(), joint.into_name());
        let response = &slf.get().0;
        let found = response
            .joint(combination, time, &joint)
            .or_raise(slf.py())?;
        let recipe = Recipe::method(slf, "joint", (combination, time.name(), joint))?;
        Ok(JointResponse(Made::new(found, recipe)))
    }

    /// Axial force and moment of a layer, or of the layer of a name, with the layers that rigid
    /// joints hold to it.
    ///
    /// The sum of the axial forces is N, and the sum of the moments with the axial forces times
    /// their arms is M.
    fn layer(
        slf: &Bound<'_, Self>,
        combination: &str,
        time: TimeText,
        layer: LayerOrName,
    ) -> PyResult<LayerForces> {
        let (time, layer): (Time, _) = (time.into(), layer.into_name());
        let response = &slf.get().0;
        let found = response
            .layer(combination, time, &layer)
            .or_raise(slf.py())?;
        let recipe = Recipe::method(slf, "layer", (combination, time.name(), layer))?;
        Ok(LayerForces(Made::new(found, recipe)))
    }

    /// The degree of composite action and the effective bending stiffness, from the same member
    /// with all its joints loose and with all of them rigid (without anchors).
    fn composite_action(
        &self,
        py: Python<'_>,
        combination: &str,
        time: TimeText,
    ) -> PyResult<CompositeAction> {
        let (time, response) = (time.into(), &self.0.inner);
        let found = run(py, || response.composite_action(combination, time))?;
        Ok(CompositeAction::of(&found))
    }

    /// The reaction of a support, or of the support of a name.
    fn reaction(
        &self,
        py: Python<'_>,
        combination: &str,
        time: TimeText,
        support: SupportOrName,
    ) -> PyResult<Reaction> {
        let name = support.into_name();
        let found = self.0.reaction(combination, time.into(), &name);
        Ok(Reaction::of(&found.or_raise(py)?))
    }

    /// The force with which a support holds a layer along the member by itself, positive to the
    /// right.
    fn layer_reaction(
        &self,
        py: Python<'_>,
        combination: &str,
        time: TimeText,
        support: SupportOrName,
        layer: LayerOrName,
    ) -> PyResult<Quantity> {
        let (support, layer) = (support.into_name(), layer.into_name());
        let found = self
            .0
            .layer_reaction(combination, time.into(), &support, &layer);
        Ok(Quantity::of(found.or_raise(py)?))
    }

    /// The force of the anchor of a name: with which it pulls the upper layer of its joint to the
    /// left; it bears the sign of the slip that it stops.
    fn anchor_force(
        &self,
        py: Python<'_>,
        combination: &str,
        time: TimeText,
        anchor: &str,
    ) -> PyResult<Quantity> {
        let found = self.0.anchor_force(combination, time.into(), anchor);
        Ok(Quantity::of(found.or_raise(py)?))
    }

    /// The names of the one-way supports that the member leaves under a combination.
    fn lifted<'py>(
        &self,
        py: Python<'py>,
        combination: &str,
        time: TimeText,
    ) -> PyResult<Bound<'py, PyTuple>> {
        let lifted = self.0.lifted(combination, time.into());
        PyTuple::new(py, lifted.or_raise(py)?)
    }

    /// How many linear solutions a combination took: one, unless the member may lift off supports
    /// or its joints have clearance.
    fn steps(&self, py: Python<'_>, combination: &str, time: TimeText) -> PyResult<usize> {
        self.0.steps(combination, time.into()).or_raise(py)
    }
}
