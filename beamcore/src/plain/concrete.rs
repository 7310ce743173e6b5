//! Plain functions of concrete beside its creep.

use crate::error::Result;
use crate::material::concrete::{self, Cement, ConcreteShrinkage};
use crate::units::{Duration, Length, Modulus, Stress};

/// The mean modulus `E_cm` in Pa of concrete at 28 days (see [`concrete::mean_modulus`]).
///
/// # Errors
/// A mean strength that is not positive.
///
/// # Examples
/// ```
/// use beamcore::plain::concrete_mean_modulus;
/// assert!((concrete_mean_modulus(33e6)? - 31.476e9).abs() < 0.5e6);
/// # Ok::<(), beamcore::Error>(())
/// ```
pub fn concrete_mean_modulus(mean_strength_Pa: f64) -> Result<f64> {
    Ok(concrete::mean_modulus(Stress::from_Pa(mean_strength_Pa))?.si())
}

/// The share of its strength at 28 days that concrete has at an age (see
/// [`concrete::strength_share`]).
///
/// # Errors
/// An age that is not positive.
pub fn concrete_strength_share(age_s: f64, cement: Cement) -> Result<f64> {
    concrete::strength_share(Duration::from_s(age_s), cement)
}

/// The mean modulus in Pa of concrete at an age (see [`concrete::modulus_at_age`]).
///
/// # Errors
/// A mean modulus or an age that is not positive; both are reported.
pub fn concrete_modulus_at_age(mean_modulus_Pa: f64, age_s: f64, cement: Cement) -> Result<f64> {
    let (modulus, age) = (Modulus::from_Pa(mean_modulus_Pa), Duration::from_s(age_s));
    Ok(concrete::modulus_at_age(modulus, age, cement)?.si())
}

/// The whole shrinkage of concrete at an age, drying and autogenous, as a strain that is positive
/// where it shortens (see [`ConcreteShrinkage::total`]).
///
/// # Errors
/// As for [`ConcreteShrinkage::basic_drying`].
pub fn concrete_shrinkage(
    mean_strength_Pa: f64,
    relative_humidity_percent: f64,
    notional_size_m: f64,
    age_at_drying_s: f64,
    age_at_end_s: f64,
    cement: Cement,
) -> Result<f64> {
    let shrinkage = ConcreteShrinkage {
        mean_strength: Stress::from_Pa(mean_strength_Pa),
        relative_humidity_percent,
        notional_size: Length::from_m(notional_size_m),
        age_at_drying: Duration::from_s(age_at_drying_s),
        age_at_end: Duration::from_s(age_at_end_s),
        cement,
    };
    Ok(shrinkage.total()?.si())
}
