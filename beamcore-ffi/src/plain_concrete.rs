//! Plain functions of concrete beside its creep.

use crate::choice;
use crate::guard;
use beamcore::plain;

/// The mean modulus E_cm in Pa of concrete at 28 days of a mean compressive strength f_cm.
#[unsafe(no_mangle)]
pub extern "C" fn bc_plain_concrete_mean_modulus(mean_strength_Pa: f64) -> f64 {
    guard::number(|| Ok(plain::concrete_mean_modulus(mean_strength_Pa)?))
}

/// The share of its strength at 28 days that concrete has at an age, by its cement
/// (BC_CEMENT_...).
#[unsafe(no_mangle)]
pub extern "C" fn bc_plain_concrete_strength_share(age_s: f64, cement: i32) -> f64 {
    guard::number(|| {
        let share = plain::concrete_strength_share(age_s, choice::cement(cement)?);
        Ok(share?)
    })
}

/// The mean modulus in Pa of concrete at an age, from the one at 28 days.
#[unsafe(no_mangle)]
pub extern "C" fn bc_plain_concrete_modulus_at_age(
    mean_modulus_Pa: f64,
    age_s: f64,
    cement: i32,
) -> f64 {
    guard::number(|| {
        let cement = choice::cement(cement)?;
        Ok(plain::concrete_modulus_at_age(
            mean_modulus_Pa,
            age_s,
            cement,
        )?)
    })
}

/// The whole shrinkage of concrete at an age, drying and autogenous, as a strain that is positive
/// where it shortens: mean strength f_cm, relative humidity in percent (50 means 50 %), notional
/// size h0 = 2 A/u, the ages at which drying begins and at which the shrinkage is asked for.
#[unsafe(no_mangle)]
pub extern "C" fn bc_plain_concrete_shrinkage(
    mean_strength_Pa: f64,
    relative_humidity_percent: f64,
    notional_size_m: f64,
    age_at_drying_s: f64,
    age_at_end_s: f64,
    cement: i32,
) -> f64 {
    guard::number(|| {
        let shrinkage = plain::concrete_shrinkage(
            mean_strength_Pa,
            relative_humidity_percent,
            notional_size_m,
            age_at_drying_s,
            age_at_end_s,
            choice::cement(cement)?,
        );
        Ok(shrinkage?)
    })
}
