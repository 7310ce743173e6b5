//! What most functions of the ABI do: one result out of one handle.

use crate::fault::Fault;
use crate::guard;
use crate::handle::{self, Slot};
use crate::text::TextOut;
use std::ffi::c_char;

/// Writes the one value that `of` finds in a handle.
///
/// # Safety
/// As for the functions of the ABI.
pub(crate) unsafe fn value<T, V>(
    (handle, parameter): (*const T, &str),
    (out, out_parameter): (*mut V, &str),
    of: impl FnOnce(&T) -> Result<V, Fault>,
) -> i32 {
    guard::status(|| {
        // SAFETY: by this function's own contract.
        let (handle, out) = unsafe {
            (
                handle::shared(handle, parameter)?,
                Slot::new(out, out_parameter)?,
            )
        };
        out.put(of(handle)?);
        Ok(())
    })
}

/// Writes the value that `of` finds in a handle, and whether there is one; where there is none, the
/// place for it is left as it is.
///
/// # Safety
/// As for the functions of the ABI.
pub(crate) unsafe fn optional<T>(
    (handle, parameter): (*const T, &str),
    has_value_out: *mut i32,
    (out, out_parameter): (*mut f64, &str),
    of: impl FnOnce(&T) -> Result<Option<f64>, Fault>,
) -> i32 {
    guard::status(|| {
        // SAFETY: by this function's own contract.
        let (handle, has_out, out) = unsafe {
            (
                handle::shared(handle, parameter)?,
                Slot::new(has_value_out, "has_value_out")?,
                Slot::new(out, out_parameter)?,
            )
        };
        let value = of(handle)?;
        has_out.put(i32::from(value.is_some()));
        if let Some(value) = value {
            out.put(value);
        }
        Ok(())
    })
}

/// Writes how many of something a handle has.
///
/// # Safety
/// As for the functions of the ABI.
pub(crate) unsafe fn count<T>(
    handle: (*const T, &str),
    count_out: *mut i32,
    of: impl FnOnce(&T) -> Result<usize, Fault>,
) -> i32 {
    // SAFETY: by this function's own contract.
    unsafe {
        value(handle, (count_out, "count_out"), |handle| {
            handle::count(of(handle)?)
        })
    }
}

/// Writes the text that `of` finds in a handle.
///
/// # Safety
/// As for the functions of the ABI.
pub(crate) unsafe fn text<T>(
    (handle, parameter): (*const T, &str),
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
    of: impl for<'a> FnOnce(&'a T) -> Result<&'a str, Fault>,
) -> i32 {
    guard::status(|| {
        // SAFETY: by this function's own contract.
        let (handle, out) = unsafe {
            (
                handle::shared(handle, parameter)?,
                TextOut::new(buffer, capacity, length_out)?,
            )
        };
        out.put(of(handle)?)
    })
}

/// Hands out a new handle that `make` makes of another one.
///
/// # Safety
/// As for the functions of the ABI.
pub(crate) unsafe fn made<T, U>(
    (handle, parameter): (*const T, &str),
    (out, out_parameter): (*mut *mut U, &str),
    make: impl FnOnce(&T) -> Result<U, Fault>,
) -> i32 {
    guard::status(|| {
        // SAFETY: by this function's own contract.
        let (handle, out) = unsafe {
            (
                handle::shared(handle, parameter)?,
                Slot::new(out, out_parameter)?,
            )
        };
        out.give(make(handle)?);
        Ok(())
    })
}
