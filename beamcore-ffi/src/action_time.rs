//! How long actions act, and when they start.

use crate::action::{BcAction, changed};
use crate::choice_member;
use crate::guard;
use crate::handle::{self, Slot};
use beamcore::units::Duration;

/// The same action with its duration (BC_DURATION_...), by which the engineer chooses k_mod. It is
/// kept with the action; no result depends on it.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_with_duration(
    action: *const BcAction,
    duration: i32,
    action_out: *mut *mut BcAction,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (action, out) = unsafe {
            (
                handle::shared(action, "action")?,
                Slot::new(action_out, "action_out")?,
            )
        };
        let duration = choice_member::duration(duration)?;
        out.give(BcAction(action.0.clone().duration(duration)));
        Ok(())
    })
}

/// The same action with its start, counted from the first day of the member. It is kept with the
/// action; the final state takes the creep of the whole life. The value is checked when the action
/// is used in a member.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_starting(
    action: *const BcAction,
    start_s: f64,
    action_out: *mut *mut BcAction,
) -> i32 {
    let start = Duration::from_si(start_s);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(action, action_out, |action| action.starting(start)) }
}

/// The duration of an action (BC_DURATION_...). Where it was not said, has_value_out is 0 and the
/// duration is left as it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_duration(
    action: *const BcAction,
    has_value_out: *mut i32,
    duration_out: *mut i32,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (action, has_out, duration_out) = unsafe {
            (
                handle::shared(action, "action")?,
                Slot::new(has_value_out, "has_value_out")?,
                Slot::new(duration_out, "duration_out")?,
            )
        };
        let duration = action.0.load_duration();
        has_out.put(i32::from(duration.is_some()));
        if let Some(duration) = duration {
            duration_out.put(choice_member::duration_number(duration));
        }
        Ok(())
    })
}

/// The start of an action, counted from the first day of the member. Where it was not said,
/// has_value_out is 0 and the start is left as it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_start(
    action: *const BcAction,
    has_value_out: *mut i32,
    start_s_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (action, has_out, start_out) = unsafe {
            (
                handle::shared(action, "action")?,
                Slot::new(has_value_out, "has_value_out")?,
                Slot::new(start_s_out, "start_s_out")?,
            )
        };
        let start = action.0.start();
        has_out.put(i32::from(start.is_some()));
        if let Some(start) = start {
            start_out.put(start.si());
        }
        Ok(())
    })
}
