//! Plain functions, one number each, for the cells of spreadsheets.

use crate::choice;
use crate::guard;
use crate::handle;
use crate::text;
use beamcore::plain;
use std::ffi::c_char;

/// EI of layers stacked upward and joined rigidly, about the horizontal axis through their elastic
/// centroid, in N m2. The three lists hold count numbers each, from the lowest layer upward.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plain_stack_bending_stiffness(
    modulus_Pa: *const f64,
    width_m: *const f64,
    height_m: *const f64,
    count: i32,
) -> f64 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        of_stack(
            plain::stack_bending_stiffness,
            modulus_Pa,
            width_m,
            height_m,
            count,
        )
    }
}

/// EA of layers stacked upward, in N; lists as for bc_plain_stack_bending_stiffness.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plain_stack_axial_stiffness(
    modulus_Pa: *const f64,
    width_m: *const f64,
    height_m: *const f64,
    count: i32,
) -> f64 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        of_stack(
            plain::stack_axial_stiffness,
            modulus_Pa,
            width_m,
            height_m,
            count,
        )
    }
}

/// Height of the elastic centroid of layers stacked upward above the lowest edge, in m; lists as
/// for bc_plain_stack_bending_stiffness.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plain_stack_centroid(
    modulus_Pa: *const f64,
    width_m: *const f64,
    height_m: *const f64,
    count: i32,
) -> f64 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { of_stack(plain::stack_centroid, modulus_Pa, width_m, height_m, count) }
}

/// A function of three lists of layers: modulus, width and height.
type OfStack = fn(&[f64], &[f64], &[f64]) -> beamcore::Result<f64>;

/// Calls a function of three lists of layers.
///
/// # Safety
/// Each pointer is NULL or points to `count` numbers.
unsafe fn of_stack(
    function: OfStack,
    modulus_Pa: *const f64,
    width_m: *const f64,
    height_m: *const f64,
    count: i32,
) -> f64 {
    guard::number(|| {
        // SAFETY: by this function's own contract.
        let (modulus, width, height) = unsafe {
            (
                handle::list(modulus_Pa, count, "modulus_Pa")?,
                handle::list(width_m, count, "width_m")?,
                handle::list(height_m, count, "height_m")?,
            )
        };
        Ok(function(modulus, width, height)?)
    })
}

/// The greatest deflection in m of a beam on two supports at its ends under a line load over its
/// whole length; positive downward, as the load.
#[unsafe(no_mangle)]
pub extern "C" fn bc_plain_simple_span_uniform_deflection(
    span_m: f64,
    bending_stiffness_Nm2: f64,
    load_N_per_m: f64,
) -> f64 {
    guard::number(|| {
        let deflection =
            plain::simple_span_uniform_deflection(span_m, bending_stiffness_Nm2, load_N_per_m);
        Ok(deflection?)
    })
}

/// The greatest deflection in m of a beam on two supports at its ends under a point load at a
/// distance from its left end; positive downward, as the load.
#[unsafe(no_mangle)]
pub extern "C" fn bc_plain_simple_span_point_deflection(
    span_m: f64,
    bending_stiffness_Nm2: f64,
    load_N: f64,
    at_m: f64,
) -> f64 {
    guard::number(|| {
        let deflection =
            plain::simple_span_point_deflection(span_m, bending_stiffness_Nm2, load_N, at_m);
        Ok(deflection?)
    })
}

/// The effective modulus in Pa of a material that creeps, E/(1 + creep factor).
#[unsafe(no_mangle)]
pub extern "C" fn bc_plain_effective_modulus(modulus_Pa: f64, creep_factor: f64) -> f64 {
    guard::number(|| Ok(plain::effective_modulus(modulus_Pa, creep_factor)?))
}

/// The creep factor phi of concrete between two ages; parameters as for
/// bc_material_concrete_with_creep.
#[unsafe(no_mangle)]
pub extern "C" fn bc_plain_concrete_creep(
    mean_strength_Pa: f64,
    relative_humidity_percent: f64,
    notional_size_m: f64,
    age_at_loading_s: f64,
    age_at_end_s: f64,
    cement: i32,
) -> f64 {
    guard::number(|| {
        let factor = plain::concrete_creep(
            mean_strength_Pa,
            relative_humidity_percent,
            notional_size_m,
            age_at_loading_s,
            age_at_end_s,
            choice::cement(cement)?,
        );
        Ok(factor?)
    })
}

/// A number of one unit as a number of another unit of the same kind: 50 from "mm" to "m" is 0.05.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plain_convert(
    value: f64,
    from_unit: *const c_char,
    to_unit: *const c_char,
) -> f64 {
    guard::number(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (from, to) = unsafe {
            (
                text::read(from_unit, "from_unit")?,
                text::read(to_unit, "to_unit")?,
            )
        };
        Ok(plain::convert(value, from, to)?)
    })
}
