//! The classes of characteristic strengths.
//!
//! Their names are longer than those of the core, for `TimberStrength` and `MetalStrength` are
//! design strengths in Python.

use crate::convert::Inputs;
use crate::made::{Recipe, Reduced};
use crate::quantity::Quantity;
use beamcore::material;
use beamcore::units::Stress;
use pyo3::prelude::*;

/// A strength that need not be known; the outer `None` is a problem that was kept.
fn optional(
    inputs: &mut Inputs,
    strength: Option<&Bound<'_, PyAny>>,
    path: &str,
) -> PyResult<Option<Option<Stress>>> {
    match strength {
        Some(strength) => Ok(inputs.read(strength, path)?.map(Some)),
        None => Ok(Some(None)),
    }
}

/// Characteristic strengths of timber, 5 % fractiles; not yet the design strengths TimberStrength.
///
/// - bending f_m,k, tension f_t,0,k, compression f_c,0,k (along the grain), shear f_v,k
/// - tension_across f_t,90,k, compression_across f_c,90,k, where they are known
///
/// >>> timber("C24", service_class=1).characteristic_strength.bending
/// 24 MPa
#[pyclass(frozen, eq, module = "beamcore", from_py_object)]
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct CharacteristicTimberStrength(material::TimberStrength);

#[pymethods]
impl CharacteristicTimberStrength {
    #[new]
    #[pyo3(signature = (
        bending, tension, compression, shear, tension_across=None, compression_across=None
    ))]
    fn new(
        py: Python<'_>,
        bending: &Bound<'_, PyAny>,
        tension: &Bound<'_, PyAny>,
        compression: &Bound<'_, PyAny>,
        shear: &Bound<'_, PyAny>,
        tension_across: Option<&Bound<'_, PyAny>>,
        compression_across: Option<&Bound<'_, PyAny>>,
    ) -> PyResult<Self> {
        let mut inputs = Inputs::default();
        let bending = inputs.read(bending, "characteristic_strength.timber.bending")?;
        let tension = inputs.read(tension, "characteristic_strength.timber.tension")?;
        let compression = inputs.read(compression, "characteristic_strength.timber.compression")?;
        let shear = inputs.read(shear, "characteristic_strength.timber.shear")?;
        let tension_across = optional(
            &mut inputs,
            tension_across,
            "characteristic_strength.timber.tension_across",
        )?;
        let compression_across = optional(
            &mut inputs,
            compression_across,
            "characteristic_strength.timber.compression_across",
        )?;
        let strength = || {
            let mut strength =
                material::TimberStrength::new(bending?, tension?, compression?, shear?);
            strength.tension_across = tension_across?;
            strength.compression_across = compression_across?;
            Some(Self(strength))
        };
        inputs.done(py, strength())
    }

    /// The bending strength f_m,k.
    #[getter]
    fn bending(&self) -> Quantity {
        Quantity::of(self.0.bending)
    }

    /// The tensile strength along the grain, f_t,0,k.
    #[getter]
    fn tension(&self) -> Quantity {
        Quantity::of(self.0.tension)
    }

    /// The compressive strength along the grain, f_c,0,k.
    #[getter]
    fn compression(&self) -> Quantity {
        Quantity::of(self.0.compression)
    }

    /// The shear strength f_v,k.
    #[getter]
    fn shear(&self) -> Quantity {
        Quantity::of(self.0.shear)
    }

    /// The tensile strength across the grain, f_t,90,k; None if it is not known.
    #[getter]
    fn tension_across(&self) -> Option<Quantity> {
        self.0.tension_across.map(Quantity::of)
    }

    /// The compressive strength across the grain, f_c,90,k; None if it is not known.
    #[getter]
    fn compression_across(&self) -> Option<Quantity> {
        self.0.compression_across.map(Quantity::of)
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        let strengths = (
            self.bending(),
            self.tension(),
            self.compression(),
            self.shear(),
            self.tension_across(),
            self.compression_across(),
        );
        Recipe::call(py, "CharacteristicTimberStrength", strengths)?.reduce(py)
    }
}

/// Characteristic strengths of metal; not yet the design strength MetalStrength.
///
/// yield_stress: f_y of steel, the 0.2 % proof strength f_o of aluminium; ultimate: f_u, where it
/// is known.
///
/// >>> CharacteristicMetalStrength(275*MPa, ultimate="430 MPa").ultimate
/// 430 MPa
#[pyclass(frozen, eq, module = "beamcore", from_py_object)]
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct CharacteristicMetalStrength(material::MetalStrength);

#[pymethods]
impl CharacteristicMetalStrength {
    #[new]
    #[pyo3(signature = (yield_stress, ultimate=None))]
    fn new(
        py: Python<'_>,
        yield_stress: &Bound<'_, PyAny>,
        ultimate: Option<&Bound<'_, PyAny>>,
    ) -> PyResult<Self> {
        let mut inputs = Inputs::default();
        let yield_stress = inputs.read(yield_stress, "characteristic_strength.metal.yield")?;
        let ultimate = optional(
            &mut inputs,
            ultimate,
            "characteristic_strength.metal.ultimate",
        )?;
        let strength = || {
            let mut strength = material::MetalStrength::new(yield_stress?);
            strength.ultimate = ultimate?;
            Some(Self(strength))
        };
        inputs.done(py, strength())
    }

    /// The yield strength f_y, or the 0.2 % proof strength f_o.
    #[getter]
    fn yield_stress(&self) -> Quantity {
        Quantity::of(self.0.yield_stress)
    }

    /// The ultimate tensile strength f_u; None if it is not known.
    #[getter]
    fn ultimate(&self) -> Option<Quantity> {
        self.0.ultimate.map(Quantity::of)
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        let strengths = (self.yield_stress(), self.ultimate());
        Recipe::call(py, "CharacteristicMetalStrength", strengths)?.reduce(py)
    }
}

/// Characteristic and mean strengths of concrete, which has no design strengths here.
///
/// compression: f_ck of cylinders at 28 days; mean_compression: f_cm; mean_tension: f_ctm.
#[pyclass(frozen, eq, module = "beamcore", from_py_object)]
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct CharacteristicConcreteStrength(material::ConcreteStrength);

#[pymethods]
impl CharacteristicConcreteStrength {
    #[new]
    #[pyo3(signature = (compression, mean_compression, mean_tension))]
    fn new(
        py: Python<'_>,
        compression: &Bound<'_, PyAny>,
        mean_compression: &Bound<'_, PyAny>,
        mean_tension: &Bound<'_, PyAny>,
    ) -> PyResult<Self> {
        let mut inputs = Inputs::default();
        let compression =
            inputs.read(compression, "characteristic_strength.concrete.compression")?;
        let mean_compression = inputs.read(
            mean_compression,
            "characteristic_strength.concrete.mean_compression",
        )?;
        let mean_tension = inputs.read(
            mean_tension,
            "characteristic_strength.concrete.mean_tension",
        )?;
        let strength = || {
            Some(Self(material::ConcreteStrength::new(
                compression?,
                mean_compression?,
                mean_tension?,
            )))
        };
        inputs.done(py, strength())
    }

    /// The characteristic compressive strength f_ck.
    #[getter]
    fn compression(&self) -> Quantity {
        Quantity::of(self.0.compression)
    }

    /// The mean compressive strength f_cm.
    #[getter]
    fn mean_compression(&self) -> Quantity {
        Quantity::of(self.0.mean_compression)
    }

    /// The mean axial tensile strength f_ctm.
    #[getter]
    fn mean_tension(&self) -> Quantity {
        Quantity::of(self.0.mean_tension)
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        let strengths = (
            self.compression(),
            self.mean_compression(),
            self.mean_tension(),
        );
        Recipe::call(py, "CharacteristicConcreteStrength", strengths)?.reduce(py)
    }
}

/// Characteristic strengths of any kind.
#[derive(Clone, FromPyObject, IntoPyObject)]
pub(crate) enum CharacteristicStrength {
    Timber(CharacteristicTimberStrength),
    Metal(CharacteristicMetalStrength),
    Concrete(CharacteristicConcreteStrength),
}

impl CharacteristicStrength {
    /// The strengths as the core has them.
    pub(crate) const fn into_core(self) -> material::CharacteristicStrength {
        match self {
            Self::Timber(timber) => material::CharacteristicStrength::Timber(timber.0),
            Self::Metal(metal) => material::CharacteristicStrength::Metal(metal.0),
            Self::Concrete(concrete) => material::CharacteristicStrength::Concrete(concrete.0),
        }
    }

    /// The class for strengths of the core; `None` for a kind that has no class yet.
    pub(crate) const fn of(strength: &material::CharacteristicStrength) -> Option<Self> {
        Some(match *strength {
            material::CharacteristicStrength::Timber(timber) => {
                Self::Timber(CharacteristicTimberStrength(timber))
            }
            material::CharacteristicStrength::Metal(metal) => {
                Self::Metal(CharacteristicMetalStrength(metal))
            }
            material::CharacteristicStrength::Concrete(concrete) => {
                Self::Concrete(CharacteristicConcreteStrength(concrete))
            }
            _ => return None,
        })
    }
}

/// Adds the classes to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_class::<CharacteristicTimberStrength>()?;
    module.add_class::<CharacteristicMetalStrength>()?;
    module.add_class::<CharacteristicConcreteStrength>()
}
