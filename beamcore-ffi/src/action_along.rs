//! Loads that act per length of the plan, along the member, or on one layer.

use crate::action::{BcAction, changed};
use crate::fault::Fault;
use crate::get;
use crate::guard;
use crate::handle::{self, Slot};
use crate::text::{self, TextOut};
use beamcore::member::{Action, Load, Tendon};
use beamcore::units::{Force, Length, LineLoad};
use std::ffi::c_char;

/// The same action with all its loads entering the layer of this name; without it, they enter the
/// layer that bc_member_entered_layer tells. It matters where layers have deflections of their own,
/// for the pressure in joints, and where forces act along the member.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_on(
    action: *const BcAction,
    layer: *const c_char,
    action_out: *mut *mut BcAction,
) -> i32 {
    let out = (action_out, "action_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::made((action, "action"), out, |action| {
            let layer = text::read(layer, "layer")?;
            Ok(BcAction(action.0.clone().on(layer)))
        })
    }
}

/// The layer that the loads of an action enter. Where none was named, has_value_out is 0 and the
/// other results are left as they are.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_layer(
    action: *const BcAction,
    has_value_out: *mut i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (action, has_out, out) = unsafe {
            (
                handle::shared(action, "action")?,
                Slot::new(has_value_out, "has_value_out")?,
                TextOut::new(buffer, capacity, length_out)?,
            )
        };
        let layer = action.0.layer();
        if let Some(layer) = layer {
            out.put(layer)?;
        }
        has_out.put(i32::from(layer.is_some()));
        Ok(())
    })
}

/// The same action with a line load per length of the plan, as snow on a pitched member, over the
/// whole member; positive downward. Other line loads count per length of the member.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_with_plan_load(
    action: *const BcAction,
    load_N_per_m: f64,
    action_out: *mut *mut BcAction,
) -> i32 {
    let load = Load::Plan {
        load: LineLoad::from_N_per_m(load_N_per_m),
        stretch: None,
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(action, action_out, |action| action.load(load)) }
}

/// The same action with a line load per length of the plan between two places along the member.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_with_partial_plan_load(
    action: *const BcAction,
    load_N_per_m: f64,
    from_m: f64,
    to_m: f64,
    action_out: *mut *mut BcAction,
) -> i32 {
    let load = Load::Plan {
        load: LineLoad::from_N_per_m(load_N_per_m),
        stretch: Some((Length::from_m(from_m), Length::from_m(to_m))),
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(action, action_out, |action| action.load(load)) }
}

/// The same action with a force along the member, positive to the right, at a height z of the
/// section.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_with_axial(
    action: *const BcAction,
    load_N: f64,
    at_m: f64,
    height_m: f64,
    action_out: *mut *mut BcAction,
) -> i32 {
    let load = Load::Axial {
        load: Force::from_N(load_N),
        at: Length::from_m(at_m),
        height: Length::from_m(height_m),
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(action, action_out, |action| action.load(load)) }
}

/// A new action with one tendon more than the given one, made of its points by `run`.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn with_tendon(
    action: *const BcAction,
    force_N: f64,
    (at_m, height_m, point_count): (*const f64, *const f64, i32),
    action_out: *mut *mut BcAction,
    run: impl FnOnce(Vec<(Length, Length)>) -> Result<Tendon, Fault>,
) -> i32 {
    let add = |action: &BcAction| {
        // SAFETY: by this function's own contract.
        let (at, height) = unsafe {
            (
                handle::list(at_m, point_count, "at_m")?,
                handle::list(height_m, point_count, "height_m")?,
            )
        };
        let point = |(at, height): (&f64, &f64)| (Length::from_m(*at), Length::from_m(*height));
        let load = Load::Prestress {
            force: Force::from_N(force_N),
            tendon: run(at.iter().zip(height).map(point).collect())?,
        };
        Ok(BcAction(Action::load(action.0.clone(), load)))
    };
    // SAFETY: by this function's own contract.
    unsafe { get::made((action, "action"), (action_out, "action_out"), add) }
}

/// The same action with a tendon that pulls its two anchors towards each other (a positive force is
/// tension) and presses on the member where it turns: straight between its points, the first and
/// last of which are the anchors; two points make a straight tendon. Places along the member and
/// heights z of the section are two lists of one length, from the left.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_with_draped_tendon(
    action: *const BcAction,
    force_N: f64,
    at_m: *const f64,
    height_m: *const f64,
    point_count: i32,
    action_out: *mut *mut BcAction,
) -> i32 {
    let points = (at_m, height_m, point_count);
    let run = |points| Ok(Tendon::Draped(points));
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { with_tendon(action, force_N, points, action_out, run) }
}

/// The same action with a tendon as bc_action_with_draped_tendon, along the parabola through three
/// points, the first and last of which are the anchors.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_with_parabolic_tendon(
    action: *const BcAction,
    force_N: f64,
    at_m: *const f64,
    height_m: *const f64,
    point_count: i32,
    action_out: *mut *mut BcAction,
) -> i32 {
    let points = (at_m, height_m, point_count);
    let run = |points: Vec<(Length, Length)>| {
        <[(Length, Length); 3]>::try_from(points)
            .map(Tendon::Parabolic)
            .map_err(|_| Fault::count("point_count", i64::from(point_count), "3"))
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { with_tendon(action, force_N, points, action_out, run) }
}
