//! The class `ConcreteCreep`, and creep as a number or as such an object.

use crate::convert::Inputs;
use crate::error::OrRaise;
use crate::made::{Recipe, Reduced};
use crate::operand::Number;
use crate::quantity::Quantity;
use beamcore::material::Creep;
use beamcore::material::concrete::{Cement, ConcreteCreep as CoreCreep};
use pyo3::prelude::*;

/// What the creep of a concrete depends on, by EN 1992-1-1:2004 Annex B.
///
/// - mean_strength: mean compressive strength f_cm at 28 days
/// - relative_humidity_percent: 50 means 50 %
/// - notional_size: h0 = 2 A_c/u
/// - age_at_loading, age_at_end: ages t0 and t of the concrete
/// - cement: hardening class "S" (slow), "N" (normal) or "R" (rapid)
///
/// >>> creep = ConcreteCreep(mean_strength=38*MPa, relative_humidity_percent=50,
/// ...                       notional_size=150*mm, age_at_loading=28*day,
/// ...                       age_at_end=18250*day, cement="N")
/// >>> round(creep.coefficient, 3)
/// 2.454
#[pyclass(frozen, eq, module = "beamcore", from_py_object)]
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct ConcreteCreep {
    inner: CoreCreep,
    coefficient: f64,
}

#[pymethods]
impl ConcreteCreep {
    #[new]
    fn new(
        py: Python<'_>,
        mean_strength: &Bound<'_, PyAny>,
        relative_humidity_percent: Number,
        notional_size: &Bound<'_, PyAny>,
        age_at_loading: &Bound<'_, PyAny>,
        age_at_end: &Bound<'_, PyAny>,
        cement: &str,
    ) -> PyResult<Self> {
        let mut inputs = Inputs::default();
        let mean_strength = inputs.read(mean_strength, "mean_strength")?;
        let notional_size = inputs.read(notional_size, "notional_size")?;
        let age_at_loading = inputs.read(age_at_loading, "age_at_loading")?;
        let age_at_end = inputs.read(age_at_end, "age_at_end")?;
        let cement = inputs.checked(Cement::from_letter(cement));
        let inner = || {
            Some(CoreCreep {
                mean_strength: mean_strength?,
                relative_humidity_percent: relative_humidity_percent.0,
                notional_size: notional_size?,
                age_at_loading: age_at_loading?,
                age_at_end: age_at_end?,
                cement: cement?,
            })
        };
        let inner = inputs.done(py, inner())?;
        let coefficient = inner.coefficient().or_raise(py)?;
        Ok(Self { inner, coefficient })
    }

    /// The creep coefficient phi(t, t0).
    ///
    /// phi = phi_RH 16.8/sqrt(f_cm) 1/(0.1 + t0^0.2) ((t - t0)/(b_H + t - t0))^0.3, with f_cm in
    /// MPa and ages in days; t0 is adjusted for the cement.
    #[getter]
    const fn coefficient(&self) -> f64 {
        self.coefficient
    }

    /// The mean compressive strength f_cm at 28 days.
    #[getter]
    fn mean_strength(&self) -> Quantity {
        Quantity::of(self.inner.mean_strength)
    }

    /// The relative humidity of the air in percent.
    #[getter]
    const fn relative_humidity_percent(&self) -> f64 {
        self.inner.relative_humidity_percent
    }

    /// The notional size h0 = 2 A_c/u.
    #[getter]
    fn notional_size(&self) -> Quantity {
        Quantity::of(self.inner.notional_size)
    }

    /// The age t0 at which the load comes on.
    #[getter]
    fn age_at_loading(&self) -> Quantity {
        Quantity::of(self.inner.age_at_loading)
    }

    /// The age t at which the creep is asked for.
    #[getter]
    fn age_at_end(&self) -> Quantity {
        Quantity::of(self.inner.age_at_end)
    }

    /// The hardening class of the cement: "S", "N" or "R".
    #[getter]
    const fn cement(&self) -> &'static str {
        self.inner.cement.letter()
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        let values = (
            self.mean_strength(),
            self.relative_humidity_percent(),
            self.notional_size(),
            self.age_at_loading(),
            self.age_at_end(),
            self.cement(),
        );
        Recipe::call(py, "ConcreteCreep", values)?.reduce(py)
    }
}

/// The creep of a concrete: a coefficient phi as given, or what it depends on.
#[derive(FromPyObject)]
pub(crate) enum ConcreteCreepOrNumber {
    Dependent(ConcreteCreep),
    Number(Number),
}

impl ConcreteCreepOrNumber {
    /// The creep as the core has it.
    pub(crate) fn into_core(self) -> beamcore::Result<Creep> {
        match self {
            Self::Dependent(creep) => Creep::concrete(&creep.inner),
            Self::Number(factor) => Ok(Creep::factor(factor.0)),
        }
    }
}
