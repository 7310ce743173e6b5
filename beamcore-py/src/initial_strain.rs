//! The classes `InitialStrain` and `StrainPlane`.

use crate::convert::Inputs;
use crate::made::{Made, Recipe, Reduced};
use crate::quantity::Quantity;
use beamcore::section;
use beamcore::units::Curvature;
use pyo3::prelude::*;

/// The plane of strain that a part bears from the first day, about its own centroid (y_i, z_i):
/// axial - curvature_y (z - z_i) - curvature_z (y - y_i), positive where the part alone would grow
/// longer.
///
/// Shrinkage, warmth, a part joined under strain are all of this kind. A strain is a number,
/// `12e-6/K * (80*K)`, or has the unit permille.
///
/// - axial: at the part's own centroid; shrinkage is negative
/// - curvature_y: about the level axis, positive where the bottom would grow longer than the top;
///   zero if it is not given
/// - curvature_z: about the upright axis, positive where the side of negative y would grow longer;
///   zero if it is not given
///
/// >>> InitialStrain("-0.3 permille", curvature_y=0.0005/m)
/// InitialStrain(axial=-0.3 permille, curvature_y=0.0005 1/m, curvature_z=0 1/m)
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct InitialStrain(pub(crate) section::InitialStrain);

#[pymethods]
impl InitialStrain {
    #[new]
    #[pyo3(signature = (axial, curvature_y=None, curvature_z=None))]
    fn new(
        axial: &Bound<'_, PyAny>,
        curvature_y: Option<&Bound<'_, PyAny>>,
        curvature_z: Option<&Bound<'_, PyAny>>,
    ) -> PyResult<Self> {
        let mut inputs = Inputs::default();
        let strain = inputs.read(axial, "initial_strain.axial")?;
        let mut curvature = |given: Option<&Bound<'_, PyAny>>, path: &str| match given {
            Some(given) => inputs.read(given, path),
            None => Ok(Some(Curvature::ZERO)),
        };
        let by_y = curvature(curvature_y, "initial_strain.curvature_y")?;
        let by_z = curvature(curvature_z, "initial_strain.curvature_z")?;
        let strain = strain.zip(by_y).zip(by_z);
        let strain = strain.map(
            |((axial, curvature_y), curvature_z)| section::InitialStrain {
                axial,
                curvature_y,
                curvature_z,
            },
        );
        Ok(Self(inputs.done(axial.py(), strain)?))
    }

    /// The strain at the part's own centroid; shrinkage is negative.
    #[getter]
    fn axial(&self) -> Quantity {
        Quantity::of(self.0.axial)
    }

    /// About the level axis, positive where the bottom would grow longer than the top.
    #[getter]
    fn curvature_y(&self) -> Quantity {
        Quantity::of(self.0.curvature_y)
    }

    /// About the upright axis, positive where the side of negative y would grow longer.
    #[getter]
    fn curvature_z(&self) -> Quantity {
        Quantity::of(self.0.curvature_z)
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        let fields = (self.axial(), self.curvature_y(), self.curvature_z());
        Recipe::call(py, "InitialStrain", fields)?.reduce(py)
    }

    fn __repr__(&self) -> String {
        format!(
            "InitialStrain(axial={}, curvature_y={}, curvature_z={})",
            self.axial(),
            self.curvature_y(),
            self.curvature_z()
        )
    }
}

/// A plane of strain of a section: axial - curvature_y (z - z_n) - curvature_z (y - y_n), from the
/// elastic centroid (y_n, z_n).
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct StrainPlane(pub(crate) Made<section::StrainPlane>);

#[pymethods]
impl StrainPlane {
    /// The strain at the elastic centroid, tension positive.
    #[getter]
    fn axial(&self) -> Quantity {
        Quantity::of(self.0.axial)
    }

    /// About the level axis, positive where it stretches the bottom.
    #[getter]
    fn curvature_y(&self) -> Quantity {
        Quantity::of(self.0.curvature_y)
    }

    /// About the upright axis, positive where it stretches the side of negative y.
    #[getter]
    fn curvature_z(&self) -> Quantity {
        Quantity::of(self.0.curvature_z)
    }

    /// The strain at a point (y, z) of the section, tension positive.
    fn strain_at(&self, y: &Bound<'_, PyAny>, z: &Bound<'_, PyAny>) -> PyResult<Quantity> {
        let mut inputs = Inputs::default();
        let point = inputs.read(y, "y")?.zip(inputs.read(z, "z")?);
        let (y, z) = inputs.done(y.py(), point)?;
        Ok(Quantity::of(self.0.strain_at(y, z)))
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }

    fn __repr__(&self) -> String {
        format!(
            "<StrainPlane axial {}, curvature_y {}, curvature_z {}>",
            self.axial(),
            self.curvature_y(),
            self.curvature_z()
        )
    }
}
