//! Texts of the caller, in and out.

use crate::fault::Fault;
use crate::handle::{self, Slot};
use std::ffi::{CStr, c_char};

/// A text that ends with a NUL.
///
/// # Safety
/// The pointer is NULL or points to a text that ends with a NUL.
pub(crate) unsafe fn read<'a>(pointer: *const c_char, parameter: &str) -> Result<&'a str, Fault> {
    if pointer.is_null() {
        return Err(Fault::null(parameter));
    }
    // SAFETY: the pointer is not NULL and the text ends with a NUL.
    let text = unsafe { CStr::from_ptr(pointer) };
    text.to_str()
        .map_err(|error| Fault::utf8(parameter, error.valid_up_to()))
}

/// A list of texts that end with a NUL each.
///
/// # Safety
/// The pointer is NULL or points to `count` pointers as [`read`] takes them.
pub(crate) unsafe fn list(
    pointer: *const *const c_char,
    count: i32,
    parameter: &str,
) -> Result<Vec<String>, Fault> {
    // SAFETY: by this function's own contract.
    let pointers = unsafe { handle::list(pointer, count, parameter)? };
    let text = |(index, pointer): (usize, &*const c_char)| {
        // SAFETY: by this function's own contract.
        let text = unsafe { read(*pointer, &format!("{parameter}[{index}]"))? };
        Ok(text.to_owned())
    };
    pointers.iter().enumerate().map(text).collect()
}

/// The caller's buffer for a text.
pub(crate) struct TextOut {
    buffer: *mut u8,
    capacity: i64,
    length: Slot<i64>,
}

impl TextOut {
    /// The buffer behind the three parameters that every function with a text result has.
    ///
    /// # Safety
    /// `buffer` is NULL or has room for `capacity` bytes; `length_out` is NULL or may be written to.
    pub(crate) unsafe fn new(
        buffer: *mut c_char,
        capacity: i64,
        length_out: *mut i64,
    ) -> Result<Self, Fault> {
        // SAFETY: by this function's own contract.
        let length = unsafe { Slot::new(length_out, "length_out")? };
        if capacity < 0 {
            return Err(Fault::count(
                "capacity",
                capacity,
                "a capacity that is not negative",
            ));
        }
        if buffer.is_null() && capacity > 0 {
            return Err(Fault::null("buffer"));
        }
        Ok(Self {
            buffer: buffer.cast(),
            capacity,
            length,
        })
    }

    /// Writes the text with a closing NUL if there is room for both, and its length in any case.
    pub(crate) fn put(self, text: &str) -> Result<(), Fault> {
        let length = i64::try_from(text.len()).unwrap_or(i64::MAX);
        self.length.put(length);
        if length >= self.capacity {
            return Err(Fault::buffer(self.capacity, text.len()));
        }
        // SAFETY: the buffer has room for more than `length` bytes, and it is the caller's own.
        unsafe {
            std::ptr::copy_nonoverlapping(text.as_ptr(), self.buffer, text.len());
            self.buffer.add(text.len()).write(0);
        }
        Ok(())
    }
}
