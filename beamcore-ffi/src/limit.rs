//! Limits of the deflection.

use crate::choice_member;
use crate::guard;
use crate::handle::{self, Slot};
use crate::text;
use beamcore::limits::{Allowed, Limit};
use beamcore::units::Length;
use std::ffi::c_char;

/// A limit of a component of the deflection.
pub struct BcLimit(pub(crate) Limit);

/// A new limit for all spans and every characteristic combination.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn limit(component: i32, allowed: Allowed, limit_out: *mut *mut BcLimit) -> i32 {
    guard::status(|| {
        // SAFETY: by this function's own contract.
        let out = unsafe { Slot::new(limit_out, "limit_out")? };
        out.give(BcLimit(Limit {
            component: choice_member::component(component)?,
            allowed,
            span: None,
            combination: None,
        }));
        Ok(())
    })
}

/// A limit of a component (BC_COMPONENT_...): the length of each span over a number, under every
/// characteristic combination. The length of an overhang is its own.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_limit_span_over(
    component: i32,
    number: f64,
    limit_out: *mut *mut BcLimit,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for this pointer.
    unsafe { limit(component, Allowed::SpanOver(number), limit_out) }
}

/// A limit of a component (BC_COMPONENT_...): a length, whatever the span, under every
/// characteristic combination.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_limit_value(
    component: i32,
    value_m: f64,
    limit_out: *mut *mut BcLimit,
) -> i32 {
    let allowed = Allowed::Value(Length::from_m(value_m));
    // SAFETY: the caller keeps the header's contract for this pointer.
    unsafe { limit(component, allowed, limit_out) }
}

/// A new limit with one change to the given one, made by `change` with a name.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn changed(
    limit: *const BcLimit,
    name: *const c_char,
    parameter: &str,
    limit_out: *mut *mut BcLimit,
    change: fn(&mut Limit, String),
) -> i32 {
    guard::status(|| {
        // SAFETY: by this function's own contract.
        let (limit, name, out) = unsafe {
            (
                handle::shared(limit, "limit")?,
                text::read(name, parameter)?,
                Slot::new(limit_out, "limit_out")?,
            )
        };
        let mut limit = limit.0.clone();
        change(&mut limit, name.to_owned());
        out.give(BcLimit(limit));
        Ok(())
    })
}

/// The same limit for one span only.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_limit_in_span(
    limit: *const BcLimit,
    span: *const c_char,
    limit_out: *mut *mut BcLimit,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        changed(limit, span, "span", limit_out, |limit, name| {
            limit.span = Some(name);
        })
    }
}

/// The same limit under one combination only.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_limit_under(
    limit: *const BcLimit,
    combination: *const c_char,
    limit_out: *mut *mut BcLimit,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        changed(
            limit,
            combination,
            "combination",
            limit_out,
            |limit, name| {
                limit.combination = Some(name);
            },
        )
    }
}

/// Frees a limit; NULL is allowed.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_limit_free(limit: *mut BcLimit) {
    // SAFETY: the caller keeps the header's contract for this pointer.
    guard::free(|| unsafe { handle::free(limit) });
}
