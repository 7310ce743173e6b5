//! Movements of supports, warming and free strains as loads of an action.

use crate::action::BcAction;
use crate::fault::Fault;
use crate::get;
use crate::text;
use beamcore::member::Load;
use beamcore::section::InitialStrain;
use beamcore::units::{Angle, Curvature, Length, Strain, TemperatureChange};
use std::ffi::c_char;

/// A new action with one load more than the given one, made by `load`.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn with(
    action: *const BcAction,
    action_out: *mut *mut BcAction,
    load: impl FnOnce() -> Result<Load, Fault>,
) -> i32 {
    // SAFETY: by this function's own contract.
    unsafe {
        get::made((action, "action"), (action_out, "action_out"), |action| {
            Ok(BcAction(action.0.clone().load(load()?)))
        })
    }
}

/// The same action with a support that sinks, positive downward.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_with_settlement(
    action: *const BcAction,
    support: *const c_char,
    settlement_m: f64,
    action_out: *mut *mut BcAction,
) -> i32 {
    let load = || {
        // SAFETY: the caller keeps the header's contract for the name.
        let support = unsafe { text::read(support, "support")? };
        Ok(Load::Settlement {
            support: support.to_owned(),
            settlement: Length::from_m(settlement_m),
        })
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { with(action, action_out, load) }
}

/// The same action with a support that turns the section with it, positive clockwise.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_with_imposed_rotation(
    action: *const BcAction,
    support: *const c_char,
    rotation_rad: f64,
    action_out: *mut *mut BcAction,
) -> i32 {
    let load = || {
        // SAFETY: the caller keeps the header's contract for the name.
        let support = unsafe { text::read(support, "support")? };
        Ok(Load::ImposedRotation {
            support: support.to_owned(),
            rotation: Angle::from_rad(rotation_rad),
        })
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { with(action, action_out, load) }
}

/// The same action with a change of temperature, positive where warmer, of the parts of these
/// names; of none means of all. Each strains by its thermal expansion.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_with_temperature(
    action: *const BcAction,
    change_K: f64,
    part_names: *const *const c_char,
    part_count: i32,
    action_out: *mut *mut BcAction,
) -> i32 {
    let load = || {
        Ok(Load::Temperature {
            change: TemperatureChange::from_K(change_K),
            // SAFETY: the caller keeps the header's contract for the names.
            parts: unsafe { text::list(part_names, part_count, "part_names")? },
        })
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { with(action, action_out, load) }
}

/// The same action with a top of the section that is warmer than its bottom by a difference,
/// linearly between them, with the mean over the height unchanged.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_with_temperature_difference(
    action: *const BcAction,
    difference_K: f64,
    action_out: *mut *mut BcAction,
) -> i32 {
    let difference = TemperatureChange::from_K(difference_K);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        with(action, action_out, || {
            Ok(Load::TemperatureDifference { difference })
        })
    }
}

/// The same action with a free strain of a part: moisture, shrinkage, a built-in curvature, a
/// locked strain. Its numbers are those of bc_part_with_initial_strain.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_action_with_free_strain(
    action: *const BcAction,
    part: *const c_char,
    axial_strain: f64,
    curvature_y_per_m: f64,
    curvature_z_per_m: f64,
    action_out: *mut *mut BcAction,
) -> i32 {
    let load = || {
        // SAFETY: the caller keeps the header's contract for the name.
        let part = unsafe { text::read(part, "part")? };
        Ok(Load::Strain {
            part: part.to_owned(),
            strain: InitialStrain {
                axial: Strain::from_ratio(axial_strain),
                curvature_y: Curvature::from_per_m(curvature_y_per_m),
                curvature_z: Curvature::from_per_m(curvature_z_per_m),
            },
        })
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { with(action, action_out, load) }
}
