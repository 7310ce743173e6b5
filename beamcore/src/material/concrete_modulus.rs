//! The modulus of concrete from its strength and at its age, EN 1992-1-1:2004 3.1.

use super::concrete::Cement;
use crate::check;
use crate::error::{Error, Result};
use crate::math::{exp, pow};
use crate::units::{Duration, Modulus, Stress};

/// The mean modulus of concrete at 28 days, E_cm = 22 GPa (f_cm/10 MPa)^0.3, with aggregates of
/// quartzite.
///
/// The modulus of a class is this one as the table rounds it: 31 GPa for C25/30, not 31.476 GPa.
/// Source: EN 1992-1-1:2004 Table 3.1 and 3.1.3(2), from memory.
///
/// # Errors
/// [`ErrorKind::Value`](crate::ErrorKind::Value) if the mean strength f_cm is not greater than
/// zero.
///
/// # Examples
/// ```
/// use beamcore::material::concrete::mean_modulus;
/// use beamcore::units::Number;
/// assert_eq!(format!("{:.3}", mean_modulus(33.MPa())?), "31.476 GPa");
/// # Ok::<(), beamcore::Error>(())
/// ```
pub fn mean_modulus(mean_strength: Stress) -> Result<Modulus> {
    let mut problems = Vec::new();
    check::positive(&mut problems, mean_strength, "mean_strength");
    Error::check(problems)?;
    Ok(Modulus::from_GPa(
        22.0 * pow(mean_strength.to_MPa() / 10.0, 0.3),
    ))
}

/// The share of the strength at 28 days that concrete has at an age t,
/// beta_cc = exp(s (1 - sqrt(28 d/t))), s = 0.38, 0.25, 0.20 for the cements S, N, R, cured at
/// 20 degrees Celsius.
///
/// Source: EN 1992-1-1:2004 eq. 3.2, from memory.
///
/// # Errors
/// [`ErrorKind::Value`](crate::ErrorKind::Value) if the age is not greater than zero.
pub fn strength_share(age: Duration, cement: Cement) -> Result<f64> {
    let mut problems = Vec::new();
    check::positive(&mut problems, age, "age");
    Error::check(problems)?;
    let s = match cement {
        Cement::S => 0.38,
        Cement::N => 0.25,
        Cement::R => 0.20,
    };
    Ok(exp(s * (1.0 - (28.0 / age.to_d()).sqrt())))
}

/// The mean modulus of concrete at an age t, E_cm(t) = beta_cc^0.3 E_cm, with beta_cc of
/// [`strength_share`].
///
/// Source: EN 1992-1-1:2004 eq. 3.5, from memory.
///
/// # Errors
/// [`ErrorKind::Value`](crate::ErrorKind::Value) if the mean modulus E_cm or the age is not greater
/// than zero.
pub fn modulus_at_age(mean_modulus: Modulus, age: Duration, cement: Cement) -> Result<Modulus> {
    let mut problems = Vec::new();
    check::positive(&mut problems, mean_modulus, "mean_modulus");
    check::positive(&mut problems, age, "age");
    Error::check(problems)?;
    Ok(mean_modulus * pow(strength_share(age, cement)?, 0.3))
}

#[cfg(test)]
mod tests {
    use super::*;
    use crate::units::Number;

    /// Expected: computed from the formulas by an independent script.
    #[test]
    fn agrees_with_an_independent_calculation() {
        let young = modulus_at_age(33.GPa(), 3.d(), Cement::N).unwrap();
        assert!((young.to_MPa() - 28_286.0).abs() < 0.5, "{young}");
        let mean = mean_modulus(33.MPa()).unwrap();
        assert!((mean.to_MPa() - 31_476.0).abs() < 0.5, "{mean}");
    }

    #[test]
    fn at_28_days_nothing_changes() {
        for cement in Cement::ALL {
            assert_eq!(strength_share(28.d(), cement), Ok(1.0));
            assert_eq!(modulus_at_age(33.GPa(), 28.d(), cement), Ok(33.GPa()));
        }
    }

    #[test]
    fn rapid_cement_is_stiffer_before_and_softer_after() {
        let at = |age: f64, cement| modulus_at_age(33.GPa(), age.d(), cement).unwrap();
        assert!(at(3.0, Cement::R) > at(3.0, Cement::N) && at(3.0, Cement::N) > at(3.0, Cement::S));
        assert!(at(99.0, Cement::R) < at(99.0, Cement::N));
    }

    #[test]
    fn what_cannot_be_is_refused() {
        let error = modulus_at_age((-33).GPa(), 0.d(), Cement::N).unwrap_err();
        let paths: Vec<_> = error.problems().iter().map(|p| p.path()).collect();
        assert_eq!(paths, ["mean_modulus", "age"]);
        assert_eq!(
            mean_modulus(Stress::from_MPa(f64::NAN)).unwrap_err().path(),
            "mean_strength"
        );
    }
}
