//! The modulus of concrete from its strength and at its age.

use crate::convert::{self, Inputs};
use crate::error::OrRaise;
use crate::quantity::Quantity;
use beamcore::material::concrete::{self, Cement};
use pyo3::prelude::*;

/// The mean modulus of concrete at 28 days, E_cm = 22 GPa (f_cm/10 MPa)^0.3.
///
/// mean_strength: f_cm (EN 1992-1-1:2004 Table 3.1 and 3.1.3(2), from memory). The modulus of a
/// class is this one as the table rounds it.
///
/// >>> round(concrete_mean_modulus(33*MPa).to(GPa), 3)
/// 31.476
#[pyfunction]
fn concrete_mean_modulus(mean_strength: &Bound<'_, PyAny>) -> PyResult<Quantity> {
    let strength = convert::read(mean_strength, "mean_strength")?;
    let modulus = concrete::mean_modulus(strength).or_raise(mean_strength.py())?;
    Ok(Quantity::of(modulus))
}

/// The share of the strength at 28 days that concrete has at an age t.
///
/// beta_cc = exp(s (1 - sqrt(28 d/t))), s = 0.38, 0.25, 0.20 for the cements "S", "N", "R"
/// (EN 1992-1-1:2004 eq. 3.2, from memory).
///
/// >>> concrete_strength_share(28*day, cement="N")
/// 1.0
#[pyfunction]
fn concrete_strength_share(age: &Bound<'_, PyAny>, cement: &str) -> PyResult<f64> {
    let py = age.py();
    let mut inputs = Inputs::default();
    let age = inputs.read(age, "age")?;
    let given = age.zip(inputs.checked(Cement::from_letter(cement)));
    let (age, cement) = inputs.done(py, given)?;
    concrete::strength_share(age, cement).or_raise(py)
}

/// The mean modulus of concrete at an age t, E_cm(t) = beta_cc^0.3 E_cm.
///
/// beta_cc is the concrete_strength_share (EN 1992-1-1:2004 eq. 3.5, from memory).
///
/// >>> round(concrete_modulus_at_age(33*GPa, 3*day, cement="N").to(MPa))
/// 28286
#[pyfunction]
fn concrete_modulus_at_age(
    mean_modulus: &Bound<'_, PyAny>,
    age: &Bound<'_, PyAny>,
    cement: &str,
) -> PyResult<Quantity> {
    let py = age.py();
    let mut inputs = Inputs::default();
    let modulus = inputs.read(mean_modulus, "mean_modulus")?;
    let age = inputs.read(age, "age")?;
    let cement = inputs.checked(Cement::from_letter(cement));
    let given = modulus.zip(age).zip(cement);
    let ((modulus, age), cement) = inputs.done(py, given)?;
    let modulus = concrete::modulus_at_age(modulus, age, cement).or_raise(py)?;
    Ok(Quantity::of(modulus))
}

/// Adds the functions to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_function(wrap_pyfunction!(concrete_mean_modulus, module)?)?;
    module.add_function(wrap_pyfunction!(concrete_strength_share, module)?)?;
    module.add_function(wrap_pyfunction!(concrete_modulus_at_age, module)?)
}
