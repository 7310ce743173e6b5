//! The classes `TimberFactors` and `MetalFactors`: from characteristic to design strengths.

use crate::made::{Recipe, Reduced};
use crate::operand::Number;
use beamcore::material::{self, DesignFactors};
use pyo3::prelude::*;

/// Factors by which design strengths of timber follow from characteristic ones.
///
/// f_d = k_mod k_sys f_k/gamma_m, bending and tension along the grain also times k_h
/// (EN 1995-1-1:2004 eq. 2.14, 3.2, 6.6, from memory). All four are the engineer's to choose.
///
/// - k_mod: for the duration of the load and the climate; gamma_m: the partial factor
/// - k_h: the size factor; k_sys: for members that share their load
///
/// >>> joist = timber("C24", service_class=1).with_design_factors(TimberFactors(0.8, 1.25))
/// >>> joist.design_strength.bending
/// 15.36 MPa
#[pyclass(frozen, eq, module = "beamcore", from_py_object)]
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct TimberFactors(material::TimberFactors);

#[pymethods]
impl TimberFactors {
    #[new]
    #[pyo3(signature = (k_mod, gamma_m, k_h=None, k_sys=None))]
    fn new(k_mod: Number, gamma_m: Number, k_h: Option<Number>, k_sys: Option<Number>) -> Self {
        let factors = material::TimberFactors::new(k_mod.0, gamma_m.0);
        let factors = k_h.map_or(factors, |k_h| factors.size(k_h.0));
        Self(k_sys.map_or(factors, |k_sys| factors.sharing(k_sys.0)))
    }

    /// The factor of the duration of the load and the climate.
    #[getter]
    const fn k_mod(&self) -> f64 {
        self.0.k_mod()
    }

    /// The partial factor gamma_M.
    #[getter]
    const fn gamma_m(&self) -> f64 {
        self.0.gamma_m()
    }

    /// The size factor; None if it is not given.
    #[getter]
    const fn k_h(&self) -> Option<f64> {
        self.0.k_h()
    }

    /// The factor of load sharing; None if it is not given.
    #[getter]
    const fn k_sys(&self) -> Option<f64> {
        self.0.k_sys()
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        let factors = (self.k_mod(), self.gamma_m(), self.k_h(), self.k_sys());
        Recipe::call(py, "TimberFactors", factors)?.reduce(py)
    }
}

/// The partial factor by which the design strength of metal follows from the characteristic one.
///
/// f_d = f_y/gamma_m; gamma_m: gamma_M0 of steel (EN 1993-1-1:2005 6.1), gamma_M1 of aluminium
/// (EN 1999-1-1:2007 6.1.3), from memory.
#[pyclass(frozen, eq, module = "beamcore", from_py_object)]
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct MetalFactors {
    gamma_m: f64,
}

#[pymethods]
impl MetalFactors {
    #[new]
    const fn new(gamma_m: Number) -> Self {
        Self { gamma_m: gamma_m.0 }
    }

    /// The partial factor gamma_M0 or gamma_M1.
    #[getter]
    const fn gamma_m(&self) -> f64 {
        self.gamma_m
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        Recipe::call(py, "MetalFactors", (self.gamma_m,))?.reduce(py)
    }
}

/// Factors of either kind.
#[derive(Clone, FromPyObject, IntoPyObject)]
pub(crate) enum Factors {
    Timber(TimberFactors),
    Metal(MetalFactors),
}

impl Factors {
    /// The factors as the core has them.
    pub(crate) const fn into_core(self) -> DesignFactors {
        match self {
            Self::Timber(timber) => DesignFactors::Timber(timber.0),
            Self::Metal(metal) => DesignFactors::metal(metal.gamma_m),
        }
    }

    /// The class for factors of the core; `None` for a kind that has no class yet.
    pub(crate) const fn of(factors: &DesignFactors) -> Option<Self> {
        Some(match *factors {
            DesignFactors::Timber(timber) => Self::Timber(TimberFactors(timber)),
            DesignFactors::Metal { gamma_m } => Self::Metal(MetalFactors { gamma_m }),
            _ => return None,
        })
    }
}

/// Adds the classes to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_class::<TimberFactors>()?;
    module.add_class::<MetalFactors>()
}
