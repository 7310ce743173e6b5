//! The last error of the thread.

use crate::fault::{Entry, Fault};
use crate::guard;
use crate::handle::{Slot, count, element};
use crate::status::BC_OK;
use crate::text::TextOut;
use std::cell::RefCell;
use std::ffi::c_char;

thread_local! {
    static LAST: RefCell<Option<Fault>> = const { RefCell::new(None) };
}

/// Keeps a fault as the last error of this thread.
pub(crate) fn remember(fault: Fault) {
    // A thread that is ending may have lost its place for the error; the status is all it gets.
    let _ = LAST.try_with(|last| last.replace(Some(fault)));
}

/// Looks at the last error of this thread.
pub(crate) fn last<T>(look: impl FnOnce(Option<&Fault>) -> T) -> T {
    LAST.with_borrow(|last| look(last.as_ref()))
}

fn entry<T>(index: i32, look: impl FnOnce(&Entry) -> Result<T, Fault>) -> Result<T, Fault> {
    last(|fault| {
        let entries = fault.map_or(&[][..], |fault| &fault.entries);
        look(element(entries, index)?)
    })
}

/// The status of the last call that failed in this thread; BC_OK if none did.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_error_status(status_out: *mut i32) -> i32 {
    guard::reading_status(|| {
        // SAFETY: the caller keeps the header's contract for this pointer.
        let out = unsafe { Slot::new(status_out, "status_out")? };
        out.put(last(|fault| fault.map_or(BC_OK, |fault| fault.status)));
        Ok(())
    })
}

/// The whole text of the last error of this thread: a line for each problem, in the form
/// "path: found ...; expected ...". Empty if no call failed in this thread.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_error_text(
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::reading_status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let out = unsafe { TextOut::new(buffer, capacity, length_out)? };
        last(|fault| out.put(fault.map_or("", |fault| &fault.text)))
    })
}

/// The path of the field, or the name of the parameter, at which the first problem stands. Empty
/// if no call failed in this thread.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_error_path(
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::reading_status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let out = unsafe { TextOut::new(buffer, capacity, length_out)? };
        last(|fault| {
            let first = fault.and_then(|fault| fault.entries.first());
            out.put(first.map_or("", |entry| &entry.path))
        })
    })
}

/// The number of problems in the last error of this thread; 0 if no call failed.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_error_problem_count(count_out: *mut i32) -> i32 {
    guard::reading_status(|| {
        // SAFETY: the caller keeps the header's contract for this pointer.
        let out = unsafe { Slot::new(count_out, "count_out")? };
        out.put(count(last(|fault| {
            fault.map_or(0, |fault| fault.entries.len())
        }))?);
        Ok(())
    })
}

/// The kind of a problem, as a status. Problems are counted from 0.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_error_problem_kind(index: i32, kind_out: *mut i32) -> i32 {
    guard::reading_status(|| {
        // SAFETY: the caller keeps the header's contract for this pointer.
        let out = unsafe { Slot::new(kind_out, "kind_out")? };
        out.put(entry(index, |entry| Ok(entry.kind))?);
        Ok(())
    })
}

/// The line of the document, counted from 1, at which a problem stands; 0 where there is no
/// document or no single line.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_error_problem_line(index: i32, line_out: *mut i64) -> i32 {
    guard::reading_status(|| {
        // SAFETY: the caller keeps the header's contract for this pointer.
        let out = unsafe { Slot::new(line_out, "line_out")? };
        let line = entry(index, |entry| Ok(entry.line))?;
        out.put(line.map_or(0, |line| i64::try_from(line).unwrap_or(i64::MAX)));
        Ok(())
    })
}

/// The path of the field, or the name of the parameter, of a problem.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_error_problem_path(
    index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::reading_status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let out = unsafe { TextOut::new(buffer, capacity, length_out)? };
        entry(index, |entry| out.put(&entry.path))
    })
}

/// What was found at the place of a problem.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_error_problem_found(
    index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::reading_status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let out = unsafe { TextOut::new(buffer, capacity, length_out)? };
        entry(index, |entry| out.put(&entry.found))
    })
}

/// What would be right at the place of a problem.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_error_problem_expected(
    index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::reading_status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let out = unsafe { TextOut::new(buffer, capacity, length_out)? };
        entry(index, |entry| out.put(&entry.expected))
    })
}
