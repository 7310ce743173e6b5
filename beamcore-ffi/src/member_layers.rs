//! How the layers of a member act in it.

use crate::get;
use crate::member::BcMember;
use beamcore::member::Member;
use std::ffi::c_char;

/// Writes whether something holds of a member.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn whether(
    member: *const BcMember,
    out: (*mut i32, &str),
    holds: fn(&Member) -> bool,
) -> i32 {
    // SAFETY: by this function's own contract.
    unsafe {
        get::value((member, "member"), out, |member| {
            Ok(i32::from(holds(&member.0)))
        })
    }
}

/// Whether layers have deflections of their own, by transverse moduli of their joints (1), or share
/// one (0).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_has_deflections_of_layers(
    member: *const BcMember,
    has_deflections_out: *mut i32,
) -> i32 {
    let out = (has_deflections_out, "has_deflections_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { whether(member, out, Member::has_deflections_of_layers) }
}

/// Whether axial force takes part (1) or not (0): more than one support holds the axis, something
/// acts along the member, or it is pitched.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_has_axial_force(
    member: *const BcMember,
    has_axial_force_out: *mut i32,
) -> i32 {
    let out = (has_axial_force_out, "has_axial_force_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { whether(member, out, Member::has_axial_force) }
}

/// The layer that loads of actions without a named layer enter: the highest one where all layers
/// share one deflection, else the first.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_entered_layer(
    member: *const BcMember,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::text((member, "member"), buffer, capacity, length_out, |member| {
            Ok(member.0.entered_layer())
        })
    }
}
