//! What was given with a support.

use crate::choice;
use crate::get;
use crate::handle;
use crate::support::BcSupport;
use beamcore::units::{Length, RotationalStiffness, SpringStiffness};
use std::ffi::c_char;

/// The name of a support.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_support_name(
    support: *const BcSupport,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::text(
            (support, "support"),
            buffer,
            capacity,
            length_out,
            |support| Ok(support.0.name()),
        )
    }
}

/// The kind of a support (BC_SUPPORT_...).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_support_kind(support: *const BcSupport, kind_out: *mut i32) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::value((support, "support"), (kind_out, "kind_out"), |support| {
            Ok(choice::support_number(support.0.kind()))
        })
    }
}

/// The place of a support, from the left end.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_support_place(support: *const BcSupport, at_m_out: *mut f64) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::value((support, "support"), (at_m_out, "at_m_out"), |support| {
            Ok(support.0.at().si())
        })
    }
}

/// The spring under a support. Where none was given, has_value_out is 0 and the stiffness is left
/// as it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_support_spring(
    support: *const BcSupport,
    has_value_out: *mut i32,
    stiffness_N_per_m_out: *mut f64,
) -> i32 {
    let out = (stiffness_N_per_m_out, "stiffness_N_per_m_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::optional((support, "support"), has_value_out, out, |support| {
            Ok(support.0.given_spring().map(SpringStiffness::si))
        })
    }
}

/// The spring of a support along the axis. Where none was given, has_value_out is 0 and the
/// stiffness is left as it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_support_axial_spring(
    support: *const BcSupport,
    has_value_out: *mut i32,
    stiffness_N_per_m_out: *mut f64,
) -> i32 {
    let out = (stiffness_N_per_m_out, "stiffness_N_per_m_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::optional((support, "support"), has_value_out, out, |support| {
            Ok(support.0.given_axial_spring().map(SpringStiffness::si))
        })
    }
}

/// The spring of a support against rotation. Where none was given, has_value_out is 0 and the
/// stiffness is left as it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_support_rotational_spring(
    support: *const BcSupport,
    has_value_out: *mut i32,
    stiffness_Nm_per_rad_out: *mut f64,
) -> i32 {
    let out = (stiffness_Nm_per_rad_out, "stiffness_Nm_per_rad_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::optional((support, "support"), has_value_out, out, |support| {
            let spring = support.0.given_rotational_spring();
            Ok(spring.map(RotationalStiffness::si))
        })
    }
}

/// Whether the member may lift off a support (1) or not (0).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_support_is_one_way(
    support: *const BcSupport,
    is_one_way_out: *mut i32,
) -> i32 {
    let out = (is_one_way_out, "is_one_way_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::value((support, "support"), out, |support| {
            Ok(i32::from(support.0.is_one_way()))
        })
    }
}

/// The height of the hold of a support along the axis. Where none was given, has_value_out is 0 and
/// the height is left as it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_support_height(
    support: *const BcSupport,
    has_value_out: *mut i32,
    z_m_out: *mut f64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::optional(
            (support, "support"),
            has_value_out,
            (z_m_out, "z_m_out"),
            |support| Ok(support.0.given_height().map(Length::si)),
        )
    }
}

/// The number of layers that bear on a support by name; none means all.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_support_layer_count(
    support: *const BcSupport,
    count_out: *mut i32,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::count((support, "support"), count_out, |support| {
            Ok(support.0.layers().len())
        })
    }
}

/// The name of a layer that bears on a support. Layers are counted from 0.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_support_layer_name(
    support: *const BcSupport,
    index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::text(
            (support, "support"),
            buffer,
            capacity,
            length_out,
            |support| Ok(handle::element(support.0.layers(), index)?.as_str()),
        )
    }
}

/// The number of layers that a support holds along the member by themselves.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_support_held_layer_count(
    support: *const BcSupport,
    count_out: *mut i32,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::count((support, "support"), count_out, |support| {
            Ok(support.0.held_layers().len())
        })
    }
}

/// The name of a layer that a support holds by itself. Layers are counted from 0.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_support_held_layer_name(
    support: *const BcSupport,
    index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::text(
            (support, "support"),
            buffer,
            capacity,
            length_out,
            |support| Ok(&handle::element(support.0.held_layers(), index)?.layer),
        )
    }
}

/// The height at which a support holds a layer by itself. Layers are counted from 0.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_support_held_layer_height(
    support: *const BcSupport,
    index: i32,
    height_m_out: *mut f64,
) -> i32 {
    let out = (height_m_out, "height_m_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::value((support, "support"), out, |support| {
            let hold = handle::element(support.0.held_layers(), index)?;
            Ok(hold.height.si())
        })
    }
}
