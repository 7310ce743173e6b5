//! The classes `SectionForces` and `PointStress`.

use crate::convert::Inputs;
use crate::made::{Recipe, Reduced};
use crate::quantity::Quantity;
use beamcore::section;
use pyo3::prelude::*;

record! {
    /// A stress at a point of a section.
    PointStress {
        /// The stress, tension positive.
        value: Quantity,
        /// The y of the point.
        y: Quantity,
        /// The z of the point.
        z: Quantity,
    }
}

impl PointStress {
    pub(crate) fn of(found: section::PointStress) -> Self {
        Self {
            value: Quantity::of(found.value),
            y: Quantity::of(found.y),
            z: Quantity::of(found.z),
        }
    }
}

/// Forces on a section: axial force (tension positive) and moments about the two axes through the
/// elastic centroid.
///
/// M_y = -int sigma z dA, so that a positive moment_y (sagging) stretches the bottom;
/// M_z = -int sigma y dA, so that a positive moment_z stretches the side of negative y.
///
/// >>> SectionForces(axial="10 kN", moment_y=5*kN*m, moment_z=0*kN*m).axial
/// 10 kN
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct SectionForces(pub(crate) section::SectionForces);

#[pymethods]
impl SectionForces {
    #[new]
    fn new(
        axial: &Bound<'_, PyAny>,
        moment_y: &Bound<'_, PyAny>,
        moment_z: &Bound<'_, PyAny>,
    ) -> PyResult<Self> {
        let mut inputs = Inputs::default();
        let n = inputs.read(axial, "forces.axial")?;
        let m_y = inputs.read(moment_y, "forces.moment_y")?;
        let m_z = inputs.read(moment_z, "forces.moment_z")?;
        let forces = n.zip(m_y).zip(m_z);
        let forces = forces.map(|((axial, moment_y), moment_z)| section::SectionForces {
            axial,
            moment_y,
            moment_z,
        });
        Ok(Self(inputs.done(axial.py(), forces)?))
    }

    /// The axial force N, tension positive.
    #[getter]
    fn axial(&self) -> Quantity {
        Quantity::of(self.0.axial)
    }

    /// The moment M_y about the level axis, positive where it stretches the bottom.
    #[getter]
    fn moment_y(&self) -> Quantity {
        Quantity::of(self.0.moment_y)
    }

    /// The moment M_z about the upright axis, positive where it stretches the side of negative y.
    #[getter]
    fn moment_z(&self) -> Quantity {
        Quantity::of(self.0.moment_z)
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        let fields = (self.axial(), self.moment_y(), self.moment_z());
        Recipe::call(py, "SectionForces", fields)?.reduce(py)
    }

    fn __repr__(&self) -> String {
        format!(
            "SectionForces(axial={}, moment_y={}, moment_z={})",
            self.axial(),
            self.moment_y(),
            self.moment_z()
        )
    }
}
