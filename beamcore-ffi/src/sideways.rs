//! Members that are free to move sideways.

use crate::choice;
use crate::choice_section;
use crate::fault::Fault;
use crate::guard;
use crate::handle::{self, Slot};
use crate::member::BcMember;
use crate::response::{BcResponse, PlainField, write_extreme, write_line};
use crate::text;
use std::ffi::c_char;

/// Whether a member is held sideways or free (BC_SIDEWAYS_...).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_sideways(
    member: *const BcMember,
    sideways_out: *mut i32,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (member, out) = unsafe {
            (
                handle::shared(member, "member")?,
                Slot::new(sideways_out, "sideways_out")?,
            )
        };
        out.put(choice_section::sideways_number(member.0.sideways()));
        Ok(())
    })
}

/// The movement sideways as the parameters of the ABI name it.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn sideways(
    response: *const BcResponse,
    combination: *const c_char,
    time: i32,
) -> Result<Box<dyn PlainField>, Fault> {
    // SAFETY: by this function's own contract.
    let (response, combination) = unsafe {
        (
            handle::shared(response, "response")?,
            text::read(combination, "combination")?,
        )
    };
    let time = choice::time(time)?;
    Ok(Box::new(response.0.sideways(combination, time)?))
}

/// An extreme (BC_EXTREME_...) of the movement sideways, positive towards positive y, and its
/// place; zero unless the member is free sideways and its section has no axis of symmetry.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_sideways_extreme(
    response: *const BcResponse,
    combination: *const c_char,
    time: i32,
    extreme: i32,
    value_m_out: *mut f64,
    at_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        unsafe {
            let field = sideways(response, combination, time)?;
            write_extreme(&*field, extreme, value_m_out, at_m_out)
        }
    })
}

/// The movement sideways at count places, positive towards positive y.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_sideways_values(
    response: *const BcResponse,
    combination: *const c_char,
    time: i32,
    x_m: *const f64,
    count: i32,
    values_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        unsafe {
            let field = sideways(response, combination, time)?;
            write_line(field, x_m, count, values_m_out)
        }
    })
}
