//! The classes `Stiffness` and `Principal`.

use crate::made::{Made, Reduced};
use crate::quantity::Quantity;
use beamcore::section;
use pyo3::prelude::*;
use pyo3::types::PyTuple;

record! {
    /// The principal bending stiffnesses of a section.
    Principal {
        /// The greater one.
        greater: Quantity,
        /// The smaller one.
        smaller: Quantity,
        /// From the level axis to the axis of the greater one, positive from y towards z, between
        /// -90 and 90 degrees.
        angle: Quantity,
    }
}

/// EA, elastic centroid and EI of a section at a time: sums weighted with the modulus of each part.
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct Stiffness(pub(crate) Made<section::Stiffness>);

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

    /// EI_yz = sum of E_i (I_yz,i + A_i dy_i dz_i); zero for a section with an axis of symmetry.
    #[getter]
    fn bending_yz(&self) -> Quantity {
        Quantity::of(self.0.bending_yz())
    }

    /// The principal bending stiffnesses, from Mohr's circle of EI_yy, EI_zz and EI_yz:
    /// (EI_yy + EI_zz)/2 +- sqrt(((EI_yy - EI_zz)/2)^2 + EI_yz^2), with
    /// tan 2a = -2 EI_yz/(EI_yy - EI_zz).
    #[getter]
    fn principal(&self) -> Principal {
        let principal = self.0.principal();
        Principal {
            greater: Quantity::of(principal.greater),
            smaller: Quantity::of(principal.smaller),
            angle: Quantity::of(principal.angle),
        }
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
