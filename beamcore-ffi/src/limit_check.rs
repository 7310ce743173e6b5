//! Limits compared with the results.

use crate::camber::BcCamber;
use crate::choice_member;
use crate::guard;
use crate::handle::{self, Slot};
use crate::limit::BcLimit;
use crate::response::BcResponse;
use crate::text::TextOut;
use beamcore::limits::{Limit, LimitCheck};
use std::ffi::c_char;

/// Checks: limits compared with the results of a member.
pub struct BcChecks(Vec<LimitCheck>);

/// Compares limits with the results, one check per limit and span, each under the combination that
/// uses it most. The camber counts for BC_COMPONENT_REMAINING, and is NULL where there is none.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_check_limits(
    response: *const BcResponse,
    limits: *const *const BcLimit,
    limit_count: i32,
    camber: *const BcCamber,
    checks_out: *mut *mut BcChecks,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (response, limits, camber, out) = unsafe {
            (
                handle::shared(response, "response")?,
                handle::handles(limits, limit_count, "limits")?,
                camber.as_ref(),
                Slot::new(checks_out, "checks_out")?,
            )
        };
        let limits: Vec<Limit> = limits.into_iter().map(|limit| limit.0.clone()).collect();
        let camber = camber.map(|camber| &camber.0);
        out.give(BcChecks(response.0.check_limits(&limits, camber)?));
        Ok(())
    })
}

/// The number of checks.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_checks_count(checks: *const BcChecks, count_out: *mut i32) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (checks, out) = unsafe {
            (
                handle::shared(checks, "checks")?,
                Slot::new(count_out, "count_out")?,
            )
        };
        out.put(handle::count(checks.0.len())?);
        Ok(())
    })
}

/// The component (BC_COMPONENT_...) of a check. Checks are counted from 0, limit by limit and
/// within each from the left.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_checks_component(
    checks: *const BcChecks,
    index: i32,
    component_out: *mut i32,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (checks, out) = unsafe {
            (
                handle::shared(checks, "checks")?,
                Slot::new(component_out, "component_out")?,
            )
        };
        let check = handle::element(&checks.0, index)?;
        out.put(choice_member::component_number(check.component));
        Ok(())
    })
}

/// A text of a check, which `of` picks.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn text_of(
    checks: *const BcChecks,
    index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
    of: fn(&LimitCheck) -> &str,
) -> i32 {
    guard::status(|| {
        // SAFETY: by this function's own contract.
        let (checks, out) = unsafe {
            (
                handle::shared(checks, "checks")?,
                TextOut::new(buffer, capacity, length_out)?,
            )
        };
        out.put(of(handle::element(&checks.0, index)?))
    })
}

/// The name of the span of a check.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_checks_span(
    checks: *const BcChecks,
    index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        text_of(checks, index, buffer, capacity, length_out, |check| {
            &check.span
        })
    }
}

/// The name of the combination of a check: the one that gives the greatest value.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_checks_combination(
    checks: *const BcChecks,
    index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        text_of(checks, index, buffer, capacity, length_out, |check| {
            &check.combination
        })
    }
}

/// The numbers of a check: the value of greatest magnitude of the component with its sign, its
/// place, the allowed magnitude, and the utilisation |value| / allowed; above 1 the limit is not
/// kept.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_checks_values(
    checks: *const BcChecks,
    index: i32,
    value_m_out: *mut f64,
    at_m_out: *mut f64,
    allowed_m_out: *mut f64,
    utilisation_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (checks, value_out, at_out, allowed_out, utilisation_out) = unsafe {
            (
                handle::shared(checks, "checks")?,
                Slot::new(value_m_out, "value_m_out")?,
                Slot::new(at_m_out, "at_m_out")?,
                Slot::new(allowed_m_out, "allowed_m_out")?,
                Slot::new(utilisation_out, "utilisation_out")?,
            )
        };
        let check = handle::element(&checks.0, index)?;
        value_out.put(check.found.value.si());
        at_out.put(check.found.at.si());
        allowed_out.put(check.allowed.si());
        utilisation_out.put(check.utilisation());
        Ok(())
    })
}

/// Frees checks; NULL is allowed.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_checks_free(checks: *mut BcChecks) {
    // SAFETY: the caller keeps the header's contract for this pointer.
    guard::free(|| unsafe { handle::free(checks) });
}
