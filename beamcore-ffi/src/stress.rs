//! Stresses and utilisation of the parts of a solved member.

use crate::choice::{self, Fibre, StressSign};
use crate::guard;
use crate::handle::{self, Slot};
use crate::response::{BcResponse, PlainField, write_values};
use crate::text;
use std::ffi::c_char;

/// The greatest tension or compression (BC_STRESS_...) in a part, tension positive, with its
/// place along the member and the point (y, z) of the section where it stands; where the member is
/// held sideways, y is the middle of the part, for then all points of one height are stressed alike.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_stress(
    response: *const BcResponse,
    combination: *const c_char,
    time: i32,
    part: *const c_char,
    sign: i32,
    value_Pa_out: *mut f64,
    at_m_out: *mut f64,
    y_m_out: *mut f64,
    z_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (response, combination, part, value_out, at_out, y_out, z_out) = unsafe {
            (
                handle::shared(response, "response")?,
                text::read(combination, "combination")?,
                text::read(part, "part")?,
                Slot::new(value_Pa_out, "value_Pa_out")?,
                Slot::new(at_m_out, "at_m_out")?,
                Slot::new(y_m_out, "y_m_out")?,
                Slot::new(z_m_out, "z_m_out")?,
            )
        };
        let (time, sign) = (choice::time(time)?, choice::stress_sign(sign)?);
        let stress = response.0.stress(combination, time, part)?;
        let extreme = match sign {
            StressSign::Tension => stress.greatest_tension(),
            StressSign::Compression => stress.greatest_compression(),
        };
        value_out.put(extreme.value.si());
        at_out.put(extreme.at.si());
        y_out.put(extreme.y.si());
        z_out.put(extreme.z.si());
        Ok(())
    })
}

/// The stresses at count places along a fibre (BC_FIBRE_...) of a part, tension positive; where
/// they jump, side (BC_SIDE_...) says which of the two values is meant.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_stress_values(
    response: *const BcResponse,
    combination: *const c_char,
    time: i32,
    part: *const c_char,
    fibre: i32,
    side: i32,
    x_m: *const f64,
    count: i32,
    values_Pa_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (response, combination, part) = unsafe {
            (
                handle::shared(response, "response")?,
                text::read(combination, "combination")?,
                text::read(part, "part")?,
            )
        };
        let (time, fibre) = (choice::time(time)?, choice::fibre(fibre)?);
        let field = || {
            let stress = response.0.stress(combination, time, part)?;
            let field: Box<dyn PlainField> = Box::new(match fibre {
                Fibre::Bottom => stress.bottom(),
                Fibre::Centroid => stress.centroid(),
                Fibre::Top => stress.top(),
            });
            Ok(field)
        };
        // SAFETY: the caller keeps the header's contract for these pointers.
        unsafe { write_values(field, side, x_m, count, values_Pa_out) }
    })
}

/// The greatest utilisation of a part, stress over design strength, and its place along the
/// member. Where the material has no design strengths, has_value_out is 0 and the other results
/// are left as they are.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_utilisation(
    response: *const BcResponse,
    combination: *const c_char,
    time: i32,
    part: *const c_char,
    has_value_out: *mut i32,
    value_out: *mut f64,
    at_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (response, combination, part, has_out, value_out, at_out) = unsafe {
            (
                handle::shared(response, "response")?,
                text::read(combination, "combination")?,
                text::read(part, "part")?,
                Slot::new(has_value_out, "has_value_out")?,
                Slot::new(value_out, "value_out")?,
                Slot::new(at_m_out, "at_m_out")?,
            )
        };
        let time = choice::time(time)?;
        let utilisation = response.0.utilisation(combination, time, part)?;
        has_out.put(i32::from(utilisation.is_some()));
        if let Some(utilisation) = utilisation {
            value_out.put(utilisation.value);
            at_out.put(utilisation.at.si());
        }
        Ok(())
    })
}
