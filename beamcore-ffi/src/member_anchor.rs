//! The anchors of a member and their forces.

use crate::choice;
use crate::get;
use crate::guard;
use crate::handle::{self, Slot};
use crate::member::BcMember;
use crate::response::BcResponse;
use crate::text;
use beamcore::units::FastenerStiffness;
use std::ffi::c_char;

/// The number of anchors of a member.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_anchor_count(
    member: *const BcMember,
    count_out: *mut i32,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::count((member, "member"), count_out, |member| {
            Ok(member.0.anchors().len())
        })
    }
}

/// The name of an anchor. Anchors are counted from 0, in the order given.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_anchor_name(
    member: *const BcMember,
    index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::text((member, "member"), buffer, capacity, length_out, |member| {
            Ok(&handle::element(member.0.anchors(), index)?.name)
        })
    }
}

/// The name of the joint whose slip an anchor stops.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_anchor_joint(
    member: *const BcMember,
    index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::text((member, "member"), buffer, capacity, length_out, |member| {
            Ok(&handle::element(member.0.anchors(), index)?.joint)
        })
    }
}

/// The place of an anchor, and its stiffness. Where it lets no slip at all, has_value_out is 0 and
/// the stiffness is left as it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_anchor(
    member: *const BcMember,
    index: i32,
    at_m_out: *mut f64,
    has_value_out: *mut i32,
    stiffness_N_per_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (member, at_out, has_out, stiffness_out) = unsafe {
            (
                handle::shared(member, "member")?,
                Slot::new(at_m_out, "at_m_out")?,
                Slot::new(has_value_out, "has_value_out")?,
                Slot::new(stiffness_N_per_m_out, "stiffness_N_per_m_out")?,
            )
        };
        let anchor = handle::element(member.0.anchors(), index)?;
        at_out.put(anchor.at.si());
        has_out.put(i32::from(anchor.stiffness.is_some()));
        if let Some(stiffness) = anchor.stiffness.map(FastenerStiffness::si) {
            stiffness_out.put(stiffness);
        }
        Ok(())
    })
}

/// The force of an anchor: with which it pulls the upper layer of its joint to the left; it bears
/// the sign of the slip that it stops.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_anchor_force(
    response: *const BcResponse,
    combination: *const c_char,
    time: i32,
    anchor: *const c_char,
    force_N_out: *mut f64,
) -> i32 {
    let out = (force_N_out, "force_N_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::value((response, "response"), out, |response| {
            let (combination, anchor) = (
                text::read(combination, "combination")?,
                text::read(anchor, "anchor")?,
            );
            let time = choice::time(time)?;
            Ok(response.0.anchor_force(combination, time, anchor)?.si())
        })
    }
}
