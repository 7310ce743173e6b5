//! The classes `TimberStrength` and `MetalStrength`.

use crate::convert::{self, Inputs};
use crate::made::{Recipe, Reduced};
use crate::quantity::Quantity;
use beamcore::material::DesignStrength;
use beamcore::units::Stress;
use pyo3::prelude::*;

/// Design strengths of timber, with all factors of the code already in them.
///
/// Utilisation: |centroid stress| / tension or compression + |edge stress - centroid stress| /
/// bending.
///
/// >>> TimberStrength(bending=14.8*MPa, tension="8.9 MPa", compression=12.9*N/mm**2).bending
/// 14.8 MPa
#[pyclass(frozen, eq, module = "beamcore", from_py_object)]
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct TimberStrength {
    bending: Stress,
    tension: Stress,
    compression: Stress,
}

#[pymethods]
impl TimberStrength {
    #[new]
    fn new(
        bending: &Bound<'_, PyAny>,
        tension: &Bound<'_, PyAny>,
        compression: &Bound<'_, PyAny>,
    ) -> PyResult<Self> {
        let mut inputs = Inputs::default();
        let py = bending.py();
        let bending = inputs.read(bending, "design_strength.timber.bending")?;
        let tension = inputs.read(tension, "design_strength.timber.tension")?;
        let compression = inputs.read(compression, "design_strength.timber.compression")?;
        let strength = || {
            Some(Self {
                bending: bending?,
                tension: tension?,
                compression: compression?,
            })
        };
        inputs.done(py, strength())
    }

    /// The bending strength f_m,d.
    #[getter]
    fn bending(&self) -> Quantity {
        Quantity::of(self.bending)
    }

    /// The tensile strength along the grain, f_t,0,d.
    #[getter]
    fn tension(&self) -> Quantity {
        Quantity::of(self.tension)
    }

    /// The compressive strength along the grain, f_c,0,d.
    #[getter]
    fn compression(&self) -> Quantity {
        Quantity::of(self.compression)
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        let strengths = (self.bending(), self.tension(), self.compression());
        Recipe::call(py, "TimberStrength", strengths)?.reduce(py)
    }
}

/// The design yield strength of a metal, with all factors of the code already in it.
///
/// Utilisation: greatest |stress| / yield_stress.
///
/// >>> MetalStrength(yield_stress=275*MPa).yield_stress
/// 275 MPa
#[pyclass(frozen, eq, module = "beamcore", from_py_object)]
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct MetalStrength {
    yield_stress: Stress,
}

#[pymethods]
impl MetalStrength {
    #[new]
    fn new(yield_stress: &Bound<'_, PyAny>) -> PyResult<Self> {
        let yield_stress = convert::read(yield_stress, "design_strength.metal.yield")?;
        Ok(Self { yield_stress })
    }

    /// The design yield strength f_y,d.
    #[getter]
    fn yield_stress(&self) -> Quantity {
        Quantity::of(self.yield_stress)
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        Recipe::call(py, "MetalStrength", (self.yield_stress(),))?.reduce(py)
    }
}

/// Design strengths of either kind.
#[derive(Clone, FromPyObject, IntoPyObject)]
pub(crate) enum Strength {
    Timber(TimberStrength),
    Metal(MetalStrength),
}

impl Strength {
    /// The strengths as the core has them.
    pub(crate) const fn into_core(self) -> DesignStrength {
        match self {
            Self::Timber(TimberStrength {
                bending,
                tension,
                compression,
            }) => DesignStrength::Timber {
                bending,
                tension,
                compression,
            },
            Self::Metal(MetalStrength { yield_stress }) => DesignStrength::Metal { yield_stress },
        }
    }

    /// The class for strengths of the core; `None` for a kind that has no class yet.
    pub(crate) const fn of(strength: &DesignStrength) -> Option<Self> {
        match *strength {
            DesignStrength::Timber {
                bending,
                tension,
                compression,
            } => Some(Self::Timber(TimberStrength {
                bending,
                tension,
                compression,
            })),
            DesignStrength::Metal { yield_stress } => {
                Some(Self::Metal(MetalStrength { yield_stress }))
            }
            _ => None,
        }
    }
}
