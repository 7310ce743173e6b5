//! The classes `JointResponse`, `LayerForces` and `CompositeAction`.

use crate::field::{Field, Line};
use crate::made::{Made, Recipe, Reduced};
use crate::quantity::Quantity;
use beamcore::response;
use pyo3::prelude::*;

/// What happens in a joint that is not rigid.
#[pyclass(frozen, module = "beamcore")]
#[derive(Debug)]
pub(crate) struct JointResponse(pub(crate) Made<response::JointResponse>);

#[pymethods]
impl JointResponse {
    /// The slip, displacement along x of the upper layer minus that of the lower one.
    #[getter]
    fn slip(slf: &Bound<'_, Self>) -> PyResult<Field> {
        let line = Line::Movement(slf.get().0.slip.clone());
        Ok(Field(Made::new(line, Recipe::property(slf, "slip")?)))
    }

    /// The flow, force per length with which the joint pulls the upper layer to the left and the
    /// lower one to the right; it bears the sign of the slip.
    #[getter]
    fn flow(slf: &Bound<'_, Self>) -> PyResult<Field> {
        let line = Line::Flow(slf.get().0.flow.clone());
        Ok(Field(Made::new(line, Recipe::property(slf, "flow")?)))
    }

    /// What the layers above press with on those below, per length, positive where they press;
    /// negative where they would part. Point loads and supports pass at their places besides.
    #[getter]
    fn pressure(slf: &Bound<'_, Self>) -> PyResult<Field> {
        let line = Line::Pressure(slf.get().0.pressure.clone());
        Ok(Field(Made::new(line, Recipe::property(slf, "pressure")?)))
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }
}

/// The forces of one layer.
#[pyclass(frozen, module = "beamcore")]
#[derive(Debug)]
pub(crate) struct LayerForces(pub(crate) Made<response::LayerForces>);

#[pymethods]
impl LayerForces {
    /// The axial force, tension positive.
    #[getter]
    fn axial(slf: &Bound<'_, Self>) -> PyResult<Field> {
        let line = Line::Force(slf.get().0.axial.clone());
        Ok(Field(Made::new(line, Recipe::property(slf, "axial")?)))
    }

    /// The moment about the layer's own centroid, positive sagging.
    #[getter]
    fn moment(slf: &Bound<'_, Self>) -> PyResult<Field> {
        let line = Line::Moment(slf.get().0.moment.clone());
        Ok(Field(Made::new(line, Recipe::property(slf, "moment")?)))
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }
}

record! {
    /// The composite action of a member of layers under one combination, seen at the place of its
    /// greatest deflection.
    CompositeAction {
        /// (w loose - w)/(w loose - w rigid): 0 where the joints do nothing, 1 where they do not
        /// slip.
        degree: f64,
        /// EI of the rigidly joined section there, times w rigid/w: the bending stiffness with
        /// which a member without slip would deflect as much.
        effective_stiffness: Quantity,
        /// The place.
        at: Quantity,
        /// The deflection there.
        deflection: Quantity,
        /// The deflection there with all joints loose.
        loose: Quantity,
        /// The deflection there with all joints rigid.
        rigid: Quantity,
    }
}

impl CompositeAction {
    pub(crate) fn of(found: &response::CompositeAction) -> Self {
        Self {
            degree: found.degree,
            effective_stiffness: Quantity::of(found.effective_stiffness),
            at: Quantity::of(found.at),
            deflection: Quantity::of(found.deflection),
            loose: Quantity::of(found.loose),
            rigid: Quantity::of(found.rigid),
        }
    }
}

/// Adds the classes to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_class::<JointResponse>()?;
    module.add_class::<LayerForces>()?;
    module.add_class::<CompositeAction>()
}
