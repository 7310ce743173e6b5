//! Jobs: all inputs as one document.

use crate::choice;
use crate::guard;
use crate::handle::{self, Slot};
use crate::outcome::BcOutcome;
use crate::text::{self, TextOut};
use beamcore::job::{self, Job};
use std::ffi::c_char;
use std::path::Path;

/// A job: all inputs of a calculation as one document, read and found without fault.
pub struct BcJob(Job);

/// Reads a job from a text in TOML or JSON (BC_FORMAT_...). All that is wrong is reported at once.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_job_read(
    document: *const c_char,
    format: i32,
    job_out: *mut *mut BcJob,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (document, out) = unsafe {
            (
                text::read(document, "document")?,
                Slot::new(job_out, "job_out")?,
            )
        };
        out.give(BcJob(Job::read(document, choice::format(format)?)?));
        Ok(())
    })
}

/// Reads a job from a file whose name ends in .toml or .json.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_job_open(file_name: *const c_char, job_out: *mut *mut BcJob) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (file_name, out) = unsafe {
            (
                text::read(file_name, "file_name")?,
                Slot::new(job_out, "job_out")?,
            )
        };
        out.give(BcJob(Job::open(Path::new(file_name))?));
        Ok(())
    })
}

/// A job written back as a text in TOML or JSON (BC_FORMAT_...).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_job_text(
    job: *const BcJob,
    format: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (job, out) = unsafe {
            (
                handle::shared(job, "job")?,
                TextOut::new(buffer, capacity, length_out)?,
            )
        };
        out.put(&job.0.to_text(choice::format(format)?))
    })
}

/// Solves a job.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_job_solve(job: *const BcJob, outcome_out: *mut *mut BcOutcome) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (job, out) = unsafe {
            (
                handle::shared(job, "job")?,
                Slot::new(outcome_out, "outcome_out")?,
            )
        };
        out.give(BcOutcome(job.0.solve()?));
        Ok(())
    })
}

/// Reads and solves a job in one call: the outcome as JSON.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_job_run(
    document: *const c_char,
    format: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (document, out) = unsafe {
            (
                text::read(document, "document")?,
                TextOut::new(buffer, capacity, length_out)?,
            )
        };
        let outcome = Job::read(document, choice::format(format)?)?.solve()?;
        out.put(&outcome.to_json())
    })
}

/// The JSON schema of the job document.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_job_schema(
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let out = unsafe { TextOut::new(buffer, capacity, length_out)? };
        out.put(&job::schema())
    })
}

/// Frees a job; NULL is allowed.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_job_free(job: *mut BcJob) {
    // SAFETY: the caller keeps the header's contract for this pointer.
    guard::free(|| unsafe { handle::free(job) });
}
