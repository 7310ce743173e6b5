//! Composite action, reactions along the member, supports that the member leaves.

use crate::choice;
use crate::get;
use crate::guard;
use crate::handle::{self, Slot};
use crate::response::BcResponse;
use crate::text::{self, TextOut};
use std::ffi::c_char;

/// The composite action of a member of layers, seen at the place of its greatest deflection: its
/// degree (w loose - w)/(w loose - w rigid), 0 where the joints do nothing and 1 where they do not
/// slip; the bending stiffness with which a member without slip would deflect as much; the place;
/// the deflection there, with all joints loose, and with all of them rigid.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_composite_action(
    response: *const BcResponse,
    combination: *const c_char,
    time: i32,
    degree_out: *mut f64,
    effective_stiffness_Nm2_out: *mut f64,
    at_m_out: *mut f64,
    deflection_m_out: *mut f64,
    loose_m_out: *mut f64,
    rigid_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (response, combination) = unsafe {
            (
                handle::shared(response, "response")?,
                text::read(combination, "combination")?,
            )
        };
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (degree, stiffness, at, deflection, loose, rigid) = unsafe {
            (
                Slot::new(degree_out, "degree_out")?,
                Slot::new(effective_stiffness_Nm2_out, "effective_stiffness_Nm2_out")?,
                Slot::new(at_m_out, "at_m_out")?,
                Slot::new(deflection_m_out, "deflection_m_out")?,
                Slot::new(loose_m_out, "loose_m_out")?,
                Slot::new(rigid_m_out, "rigid_m_out")?,
            )
        };
        let found = response
            .0
            .composite_action(combination, choice::time(time)?)?;
        degree.put(found.degree);
        stiffness.put(found.effective_stiffness.si());
        at.put(found.at.si());
        deflection.put(found.deflection.si());
        loose.put(found.loose.si());
        rigid.put(found.rigid.si());
        Ok(())
    })
}

/// The level force of a support on the member, positive to the right; zero where no axial force
/// takes part.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_reaction_along(
    response: *const BcResponse,
    combination: *const c_char,
    time: i32,
    support: *const c_char,
    force_N_out: *mut f64,
) -> i32 {
    let out = (force_N_out, "force_N_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::value((response, "response"), out, |response| {
            let (combination, support) = (
                text::read(combination, "combination")?,
                text::read(support, "support")?,
            );
            let time = choice::time(time)?;
            Ok(response.0.reaction(combination, time, support)?.along.si())
        })
    }
}

/// The force with which a support holds a layer along the member by itself, positive to the right.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_layer_reaction(
    response: *const BcResponse,
    combination: *const c_char,
    time: i32,
    support: *const c_char,
    layer: *const c_char,
    force_N_out: *mut f64,
) -> i32 {
    let out = (force_N_out, "force_N_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::value((response, "response"), out, |response| {
            let (combination, support, layer) = (
                text::read(combination, "combination")?,
                text::read(support, "support")?,
                text::read(layer, "layer")?,
            );
            let time = choice::time(time)?;
            let force = response
                .0
                .layer_reaction(combination, time, support, layer)?;
            Ok(force.si())
        })
    }
}

/// The number of one-way supports that the member leaves under a combination.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_lifted_count(
    response: *const BcResponse,
    combination: *const c_char,
    time: i32,
    count_out: *mut i32,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::count((response, "response"), count_out, |response| {
            let combination = text::read(combination, "combination")?;
            Ok(response.0.lifted(combination, choice::time(time)?)?.len())
        })
    }
}

/// The name of a support that the member leaves under a combination. They are counted from 0.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_lifted_name(
    response: *const BcResponse,
    combination: *const c_char,
    time: i32,
    index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (response, combination, out) = unsafe {
            (
                handle::shared(response, "response")?,
                text::read(combination, "combination")?,
                TextOut::new(buffer, capacity, length_out)?,
            )
        };
        let lifted = response.0.lifted(combination, choice::time(time)?)?;
        out.put(handle::element(&lifted, index)?)
    })
}

/// How many linear solutions a combination took: one, unless the member may lift off supports or
/// its joints have clearance.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_steps(
    response: *const BcResponse,
    combination: *const c_char,
    time: i32,
    count_out: *mut i32,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::count((response, "response"), count_out, |response| {
            let combination = text::read(combination, "combination")?;
            Ok(response.0.steps(combination, choice::time(time)?)?)
        })
    }
}
