//! The class `ConcreteShrinkage`.

use crate::convert::Inputs;
use crate::error::OrRaise;
use crate::made::{Recipe, Reduced};
use crate::operand::Number;
use crate::quantity::Quantity;
use beamcore::material::concrete::{Cement, ConcreteShrinkage as CoreShrinkage};
use beamcore::units::Strain;
use pyo3::prelude::*;

/// What the shrinkage of a concrete depends on, by EN 1992-1-1:2004 3.1.4 and Annex B, from memory.
/// Shrinkage is a positive strain that shortens.
///
/// - mean_strength: mean compressive strength f_cm at 28 days, at least 18 MPa
/// - relative_humidity_percent: 50 means 50 %
/// - notional_size: h0 = 2 A_c/u
/// - age_at_drying, age_at_end: ages t_s and t of the concrete
/// - cement: hardening class "S" (slow), "N" (normal) or "R" (rapid)
///
/// >>> slab = ConcreteShrinkage(mean_strength=38*MPa, relative_humidity_percent=50,
/// ...                          notional_size=150*mm, age_at_drying=3*day,
/// ...                          age_at_end=50*year, cement="N")
/// >>> round(slab.total.to(permille), 2)
/// 0.49
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct ConcreteShrinkage {
    inner: CoreShrinkage,
    basic_drying: Strain,
    drying: Strain,
    autogenous: Strain,
    total: Strain,
}

#[pymethods]
impl ConcreteShrinkage {
    #[new]
    fn new(
        py: Python<'_>,
        mean_strength: &Bound<'_, PyAny>,
        relative_humidity_percent: Number,
        notional_size: &Bound<'_, PyAny>,
        age_at_drying: &Bound<'_, PyAny>,
        age_at_end: &Bound<'_, PyAny>,
        cement: &str,
    ) -> PyResult<Self> {
        let mut inputs = Inputs::default();
        let mean_strength = inputs.read(mean_strength, "mean_strength")?;
        let notional_size = inputs.read(notional_size, "notional_size")?;
        let age_at_drying = inputs.read(age_at_drying, "age_at_drying")?;
        let age_at_end = inputs.read(age_at_end, "age_at_end")?;
        let cement = inputs.checked(Cement::from_letter(cement));
        let inner = || {
            Some(CoreShrinkage {
                mean_strength: mean_strength?,
                relative_humidity_percent: relative_humidity_percent.0,
                notional_size: notional_size?,
                age_at_drying: age_at_drying?,
                age_at_end: age_at_end?,
                cement: cement?,
            })
        };
        let inner = inputs.done(py, inner())?;
        Ok(Self {
            basic_drying: inner.basic_drying().or_raise(py)?,
            drying: inner.drying().or_raise(py)?,
            autogenous: inner.autogenous().or_raise(py)?,
            total: inner.total().or_raise(py)?,
            inner,
        })
    }

    /// The basic drying shrinkage, eps_cd,0 = 0.85 (220 + 110 a_ds1) exp(-a_ds2 f_cm/10) 1e-6
    /// 1.55 (1 - (RH/100)^3), with a_ds1 and a_ds2 of the cement and f_cm in MPa (eq. B.11, B.12).
    #[getter]
    fn basic_drying(&self) -> Quantity {
        Quantity::of(self.basic_drying)
    }

    /// The drying shrinkage at the end, eps_cd = b_ds k_h eps_cd,0, with
    /// b_ds = (t - t_s)/(t - t_s + 0.04 h0^1.5), h0 in mm, and k_h of Table 3.3 (eq. 3.9, 3.10).
    #[getter]
    fn drying(&self) -> Quantity {
        Quantity::of(self.drying)
    }

    /// The autogenous shrinkage at the end,
    /// eps_ca = 2.5 (f_ck - 10) 1e-6 (1 - exp(-0.2 sqrt(t))), f_ck in MPa (eq. 3.11 to 3.13).
    #[getter]
    fn autogenous(&self) -> Quantity {
        Quantity::of(self.autogenous)
    }

    /// The whole shrinkage at the end, drying + autogenous (eq. 3.8).
    #[getter]
    fn total(&self) -> Quantity {
        Quantity::of(self.total)
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

    /// The age t_s at which drying begins.
    #[getter]
    fn age_at_drying(&self) -> Quantity {
        Quantity::of(self.inner.age_at_drying)
    }

    /// The age t at which the shrinkage is asked for.
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
            self.age_at_drying(),
            self.age_at_end(),
            self.cement(),
        );
        Recipe::call(py, "ConcreteShrinkage", values)?.reduce(py)
    }
}
