//! Supports described on their own.

use crate::choice;
use crate::fault::Fault;
use crate::get;
use crate::guard;
use crate::handle::{self, Slot};
use crate::text;
use beamcore::member::Support;
use beamcore::units::{Length, RotationalStiffness, SpringStiffness};
use std::ffi::c_char;

/// A support: where a member is held, and how. What it holds is rigid unless a spring is given.
pub struct BcSupport(pub(crate) Support);

/// A support of a kind (BC_SUPPORT_...) at a place from the left end. It is checked when it is used
/// in a member (bc_plan_on_support).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_support_new(
    name: *const c_char,
    support_kind: i32,
    at_m: f64,
    support_out: *mut *mut BcSupport,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (name, out) = unsafe {
            (
                text::read(name, "name")?,
                Slot::new(support_out, "support_out")?,
            )
        };
        let kind = choice::support(support_kind)?;
        out.give(BcSupport(Support::new(name, kind, Length::from_m(at_m))));
        Ok(())
    })
}

/// A new support with one change to the given one, made by `change`.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn changed(
    support: *const BcSupport,
    support_out: *mut *mut BcSupport,
    change: impl FnOnce(Support) -> Result<Support, Fault>,
) -> i32 {
    let out = (support_out, "support_out");
    // SAFETY: by this function's own contract.
    unsafe {
        get::made((support, "support"), out, |support| {
            Ok(BcSupport(change(support.0.clone())?))
        })
    }
}

/// The same support, holding the deflection by a spring instead of rigidly.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_support_with_spring(
    support: *const BcSupport,
    stiffness_N_per_m: f64,
    support_out: *mut *mut BcSupport,
) -> i32 {
    let stiffness = SpringStiffness::from_N_per_m(stiffness_N_per_m);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        changed(
            support,
            support_out,
            |support| Ok(support.spring(stiffness)),
        )
    }
}

/// The same support with a spring along the axis: of a pin or a fixed support in place of its rigid
/// hold, of a roller in addition.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_support_with_axial_spring(
    support: *const BcSupport,
    stiffness_N_per_m: f64,
    support_out: *mut *mut BcSupport,
) -> i32 {
    let stiffness = SpringStiffness::from_N_per_m(stiffness_N_per_m);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        changed(support, support_out, |support| {
            Ok(support.axial_spring(stiffness))
        })
    }
}

/// The same support with a spring against rotation: of a fixed support in place of its rigid hold,
/// of a pin or roller in addition.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_support_with_rotational_spring(
    support: *const BcSupport,
    stiffness_Nm_per_rad: f64,
    support_out: *mut *mut BcSupport,
) -> i32 {
    let stiffness = RotationalStiffness::from_N_m_per_rad(stiffness_Nm_per_rad);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        changed(support, support_out, |support| {
            Ok(support.rotational_spring(stiffness))
        })
    }
}

/// The same support, which can push up but not pull down: the member may lift off it.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_support_one_way(
    support: *const BcSupport,
    support_out: *mut *mut BcSupport,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(support, support_out, |support| Ok(support.one_way())) }
}

/// The same support with its hold along the axis at a height z of the section, on the first of the
/// layers that bear on it. Without it, all layers together are held at the elastic centroid of the
/// section at the left end.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_support_at_height(
    support: *const BcSupport,
    z_m: f64,
    support_out: *mut *mut BcSupport,
) -> i32 {
    let z = Length::from_m(z_m);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(support, support_out, |support| Ok(support.at_height(z))) }
}

/// The same support as a bearing of the layers of these names only; without it (or of none), of
/// all. Its hold along the axis, if it has one, is then on the first of them.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_support_under(
    support: *const BcSupport,
    layer_names: *const *const c_char,
    layer_count: i32,
    support_out: *mut *mut BcSupport,
) -> i32 {
    let change = |support: Support| {
        // SAFETY: the caller keeps the header's contract for the names.
        let layers = unsafe { text::list(layer_names, layer_count, "layer_names")? };
        Ok(support.under(layers))
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(support, support_out, change) }
}

/// The same support, holding a layer along the member by itself, at a height of the section.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_support_holding(
    support: *const BcSupport,
    layer: *const c_char,
    height_m: f64,
    support_out: *mut *mut BcSupport,
) -> i32 {
    let change = |support: Support| {
        // SAFETY: the caller keeps the header's contract for the name.
        let layer = unsafe { text::read(layer, "layer")? };
        Ok(support.holding(layer, Length::from_m(height_m)))
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(support, support_out, change) }
}

/// Frees a support; NULL is allowed.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_support_free(support: *mut BcSupport) {
    // SAFETY: the caller keeps the header's contract for this pointer.
    guard::free(|| unsafe { handle::free(support) });
}
