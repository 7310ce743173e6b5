//! Actions and their loads.

use crate::guard;
use crate::handle::{self, Slot};
use crate::text::{self, TextOut};
use beamcore::member::{Action, CombinationFactors};
use beamcore::units::{Force, Length, LineLoad};
use std::ffi::c_char;

/// An action: loads that act together, from one cause.
pub struct BcAction(pub(crate) Action);

/// A permanent action, without loads yet.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_permanent(
    name: *const c_char,
    action_out: *mut *mut BcAction,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (name, out) = unsafe {
            (
                text::read(name, "name")?,
                Slot::new(action_out, "action_out")?,
            )
        };
        out.give(BcAction(Action::permanent(name)));
        Ok(())
    })
}

/// A variable action with its combination factors, without loads yet.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_variable(
    name: *const c_char,
    psi_0: f64,
    psi_1: f64,
    psi_2: f64,
    action_out: *mut *mut BcAction,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (name, out) = unsafe {
            (
                text::read(name, "name")?,
                Slot::new(action_out, "action_out")?,
            )
        };
        let factors = CombinationFactors {
            psi_0,
            psi_1,
            psi_2,
        };
        out.give(BcAction(Action::variable(name, factors)));
        Ok(())
    })
}

/// A new action with one more load than the given one, made by `change`.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn changed(
    action: *const BcAction,
    action_out: *mut *mut BcAction,
    change: impl FnOnce(Action) -> Action,
) -> i32 {
    guard::status(|| {
        // SAFETY: by this function's own contract.
        let (action, out) = unsafe {
            (
                handle::shared(action, "action")?,
                Slot::new(action_out, "action_out")?,
            )
        };
        out.give(BcAction(change(action.0.clone())));
        Ok(())
    })
}

/// The same action with the weight of the section, over the whole member.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_with_self_weight(
    action: *const BcAction,
    action_out: *mut *mut BcAction,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(action, action_out, Action::self_weight) }
}

/// The same action with a line load over the whole member, positive downward.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_with_uniform(
    action: *const BcAction,
    load_N_per_m: f64,
    action_out: *mut *mut BcAction,
) -> i32 {
    let load = LineLoad::from_N_per_m(load_N_per_m);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(action, action_out, |action| action.uniform(load)) }
}

/// The same action with a line load between two places, positive downward.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_with_partial(
    action: *const BcAction,
    load_N_per_m: f64,
    from_m: f64,
    to_m: f64,
    action_out: *mut *mut BcAction,
) -> i32 {
    let load = LineLoad::from_N_per_m(load_N_per_m);
    let (from, to) = (Length::from_m(from_m), Length::from_m(to_m));
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(action, action_out, |action| action.partial(load, from, to)) }
}

/// The same action with a point load, positive downward.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_with_point(
    action: *const BcAction,
    load_N: f64,
    at_m: f64,
    action_out: *mut *mut BcAction,
) -> i32 {
    let (load, at) = (Force::from_N(load_N), Length::from_m(at_m));
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(action, action_out, |action| action.point(load, at)) }
}

/// The name of an action.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_name(
    action: *const BcAction,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (action, out) = unsafe {
            (
                handle::shared(action, "action")?,
                TextOut::new(buffer, capacity, length_out)?,
            )
        };
        out.put(action.0.name())
    })
}

/// Frees an action; NULL is allowed.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_free(action: *mut BcAction) {
    // SAFETY: the caller keeps the header's contract for this pointer.
    guard::free(|| unsafe { handle::free(action) });
}
