//! Outcomes: all results as one document.

use crate::guard;
use crate::handle::{self, Slot};
use crate::text::{self, TextOut};
use beamcore::outcome::{self, Outcome};
use std::ffi::c_char;

/// An outcome: all results of a job, with its inputs, what was assumed and what was not checked.
pub struct BcOutcome(pub(crate) Outcome);

/// The number at a path, in the SI unit that the path ends with, for example
/// combinations["quasi-permanent"].final.deflection.greatest.value_m
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_outcome_number(
    outcome: *const BcOutcome,
    path: *const c_char,
    value_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (outcome, path, out) = unsafe {
            (
                handle::shared(outcome, "outcome")?,
                text::read(path, "path")?,
                Slot::new(value_out, "value_out")?,
            )
        };
        out.put(outcome.0.number(path)?);
        Ok(())
    })
}

/// The text at a path, for example job.mark
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_outcome_text(
    outcome: *const BcOutcome,
    path: *const c_char,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (outcome, path, out) = unsafe {
            (
                handle::shared(outcome, "outcome")?,
                text::read(path, "path")?,
                TextOut::new(buffer, capacity, length_out)?,
            )
        };
        out.put(&outcome.0.text(path)?)
    })
}

/// The outcome as JSON.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_outcome_json(
    outcome: *const BcOutcome,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (outcome, out) = unsafe {
            (
                handle::shared(outcome, "outcome")?,
                TextOut::new(buffer, capacity, length_out)?,
            )
        };
        out.put(&outcome.0.to_json())
    })
}

/// The outcome as a plain text of 80 columns, for reading.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_outcome_summary(
    outcome: *const BcOutcome,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (outcome, out) = unsafe {
            (
                handle::shared(outcome, "outcome")?,
                TextOut::new(buffer, capacity, length_out)?,
            )
        };
        out.put(&outcome.0.summary())
    })
}

/// The JSON schema of the outcome document.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_outcome_schema(
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let out = unsafe { TextOut::new(buffer, capacity, length_out)? };
        out.put(&outcome::schema())
    })
}

/// Frees an outcome; NULL is allowed.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_outcome_free(outcome: *mut BcOutcome) {
    // SAFETY: the caller keeps the header's contract for this pointer.
    guard::free(|| unsafe { handle::free(outcome) });
}
