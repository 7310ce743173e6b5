//! What was given with a joint.

use crate::get;
use crate::joint::BcJoint;
use beamcore::section::Joint;
use beamcore::units::{Length, SlipModulus};
use std::ffi::c_char;

/// A text of a joint, which `of` picks.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn text_of(
    joint: *const BcJoint,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
    of: fn(&Joint) -> &str,
) -> i32 {
    // SAFETY: by this function's own contract.
    unsafe {
        get::text((joint, "joint"), buffer, capacity, length_out, |joint| {
            Ok(of(&joint.0))
        })
    }
}

/// The name of a joint.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_joint_name(
    joint: *const BcJoint,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { text_of(joint, buffer, capacity, length_out, Joint::name) }
}

/// The name of the lower layer of a joint.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_joint_lower(
    joint: *const BcJoint,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { text_of(joint, buffer, capacity, length_out, Joint::lower) }
}

/// The name of the upper layer of a joint.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_joint_upper(
    joint: *const BcJoint,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { text_of(joint, buffer, capacity, length_out, Joint::upper) }
}

/// The gap that was stated. Where none was, has_value_out is 0 and the gap is left as it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_joint_gap(
    joint: *const BcJoint,
    has_value_out: *mut i32,
    gap_m_out: *mut f64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::optional(
            (joint, "joint"),
            has_value_out,
            (gap_m_out, "gap_m_out"),
            |joint| Ok(joint.0.stated_gap().map(Length::si)),
        )
    }
}

/// The modulus square to the member that was given. Where none was, has_value_out is 0 and the
/// modulus is left as it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_joint_transverse(
    joint: *const BcJoint,
    has_value_out: *mut i32,
    modulus_N_per_m2_out: *mut f64,
) -> i32 {
    let out = (modulus_N_per_m2_out, "modulus_N_per_m2_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::optional((joint, "joint"), has_value_out, out, |joint| {
            Ok(joint.0.transverse_modulus().map(SlipModulus::si))
        })
    }
}

/// The clearance that was given. Where none was, has_value_out is 0 and the clearance is left as
/// it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_joint_clearance(
    joint: *const BcJoint,
    has_value_out: *mut i32,
    clearance_m_out: *mut f64,
) -> i32 {
    let out = (clearance_m_out, "clearance_m_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::optional((joint, "joint"), has_value_out, out, |joint| {
            Ok(joint.0.given_clearance().map(Length::si))
        })
    }
}

/// The creep factor that was given. Where none was, has_value_out is 0 and the factor is left as it
/// is; what follows then is told by bc_section_joint_creep_factor.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_joint_creep_factor(
    joint: *const BcJoint,
    has_value_out: *mut i32,
    creep_factor_out: *mut f64,
) -> i32 {
    let out = (creep_factor_out, "creep_factor_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::optional((joint, "joint"), has_value_out, out, |joint| {
            Ok(joint.0.given_creep())
        })
    }
}
