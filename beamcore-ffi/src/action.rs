//! Actions and their loads.

use crate::choice_member;
use crate::guard;
use crate::handle::{self, Slot};
use crate::text::{self, TextOut};
use beamcore::member::{Action, CombinationFactors, Effect, Load};
use beamcore::units::{AreaLoad, Force, Length, LineLoad, Moment};
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

/// A variable action of a category (BC_CATEGORY_...), with the recommended combination factors of
/// the category, without loads yet.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_variable_of_category(
    name: *const c_char,
    category: i32,
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
        let factors = choice_member::category(category)?.factors();
        out.give(BcAction(Action::variable(name, factors)));
        Ok(())
    })
}

/// The same action, known to relieve what is being checked: a permanent action gets its smaller
/// partial factor, a variable one is left out. Without this, an action is taken as unfavourable.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_favourable(
    action: *const BcAction,
    action_out: *mut *mut BcAction,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(action, action_out, Action::favourable) }
}

/// A new action with one change to the given one, made by `change`.
///
/// # Safety
/// As for the functions of the ABI.
pub(crate) unsafe fn changed(
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

/// The same action with a line load that changes linearly between two places, positive downward;
/// a triangular load where one of its ends is zero.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_with_trapezoidal(
    action: *const BcAction,
    load_from_N_per_m: f64,
    load_to_N_per_m: f64,
    from_m: f64,
    to_m: f64,
    action_out: *mut *mut BcAction,
) -> i32 {
    let load_from = LineLoad::from_N_per_m(load_from_N_per_m);
    let load_to = LineLoad::from_N_per_m(load_to_N_per_m);
    let (from, to) = (Length::from_m(from_m), Length::from_m(to_m));
    let change = |action: Action| action.trapezoidal(load_from, load_to, from, to);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(action, action_out, change) }
}

/// The same action with a load per area of floor or roof over the whole member, positive downward:
/// line load = load x tributary width.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_with_area(
    action: *const BcAction,
    load_N_per_m2: f64,
    tributary_width_m: f64,
    action_out: *mut *mut BcAction,
) -> i32 {
    let load = AreaLoad::from_N_per_m2(load_N_per_m2);
    let width = Length::from_m(tributary_width_m);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(action, action_out, |action| action.area(load, width)) }
}

/// The same action with a load per area of floor or roof between two places, positive downward.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_with_partial_area(
    action: *const BcAction,
    load_N_per_m2: f64,
    tributary_width_m: f64,
    from_m: f64,
    to_m: f64,
    action_out: *mut *mut BcAction,
) -> i32 {
    let load = Load::Area {
        load: AreaLoad::from_N_per_m2(load_N_per_m2),
        tributary_width: Length::from_m(tributary_width_m),
        stretch: Some((Length::from_m(from_m), Length::from_m(to_m))),
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(action, action_out, |action| action.load(load)) }
}

/// The same action with a couple, positive clockwise with x to the right and z up.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_with_couple(
    action: *const BcAction,
    couple_Nm: f64,
    at_m: f64,
    action_out: *mut *mut BcAction,
) -> i32 {
    let (couple, at) = (Moment::from_N_m(couple_Nm), Length::from_m(at_m));
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(action, action_out, |action| action.couple(couple, at)) }
}

/// Whether an action is favourable (1) or not (0).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_is_favourable(
    action: *const BcAction,
    is_favourable_out: *mut i32,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (action, out) = unsafe {
            (
                handle::shared(action, "action")?,
                Slot::new(is_favourable_out, "is_favourable_out")?,
            )
        };
        out.put(match action.0.effect() {
            Effect::Favourable => 1,
            Effect::Unfavourable => 0,
        });
        Ok(())
    })
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
