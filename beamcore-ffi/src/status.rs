//! The numbers that functions return.

use crate::guard;
use crate::handle::Slot;
use crate::text::TextOut;
use beamcore::ErrorKind;
use std::ffi::c_char;

/// Done.
pub const BC_OK: i32 = 0;
/// A number outside what is possible: negative size, NaN, infinity.
pub const BC_ERROR_VALUE: i32 = 1;
/// A name that nothing bears: a part, material, support, strength class.
pub const BC_ERROR_NAME: i32 = 2;
/// A key that the document does not know.
pub const BC_ERROR_KEY: i32 = 3;
/// A unit that is missing, unknown or of another kind of quantity.
pub const BC_ERROR_UNIT: i32 = 4;
/// Two things of one name, or two supports at one place.
pub const BC_ERROR_DUPLICATE: i32 = 5;
/// Parts that overlap, or places that refer to each other in a circle.
pub const BC_ERROR_GEOMETRY: i32 = 6;
/// Something that must be given is not.
pub const BC_ERROR_MISSING: i32 = 7;
/// A member, or a piece of it, that is free to move.
pub const BC_ERROR_MECHANISM: i32 = 8;
/// A support or load that lies outside the member, or a stretch without length.
pub const BC_ERROR_POSITION: i32 = 9;
/// A text that is not a document: broken or truncated TOML or JSON, a value of a wrong type.
pub const BC_ERROR_SYNTAX: i32 = 10;
/// A document of a version that this library does not read.
pub const BC_ERROR_VERSION: i32 = 11;
/// A file that cannot be read.
pub const BC_ERROR_FILE: i32 = 12;
/// A result that was asked for and that does not exist.
pub const BC_ERROR_LOOKUP: i32 = 13;
/// A calculation that did not reach its accuracy.
pub const BC_ERROR_NUMERICAL: i32 = 14;
/// A pointer that must not be NULL is NULL.
pub const BC_ERROR_NULL: i32 = 100;
/// A text is not UTF-8.
pub const BC_ERROR_UTF8: i32 = 101;
/// The library itself failed; the call had no effect. Please report the text of the error.
pub const BC_ERROR_PANIC: i32 = 102;
/// The buffer is too small; the length that is needed was written to length_out.
pub const BC_ERROR_BUFFER: i32 = 103;
/// An int32_t that stands for a choice is none of its constants.
pub const BC_ERROR_CHOICE: i32 = 104;
/// A count that is negative, or zero where something must be there, or an index past the end.
pub const BC_ERROR_COUNT: i32 = 105;

/// Statuses of this binding with their names; those of the core are named by the core.
const OWN: [(i32, &str); 7] = [
    (BC_OK, "Ok"),
    (BC_ERROR_NULL, "Null"),
    (BC_ERROR_UTF8, "Utf8"),
    (BC_ERROR_PANIC, "Panic"),
    (BC_ERROR_BUFFER, "Buffer"),
    (BC_ERROR_CHOICE, "Choice"),
    (BC_ERROR_COUNT, "Count"),
];

fn kind(status: i32) -> Option<ErrorKind> {
    ErrorKind::ALL
        .into_iter()
        .find(|kind| kind.number() == status)
}

/// The name of a status in one word, for example "Value"; an empty text for an unknown number.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_status_name(
    status: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let out = unsafe { TextOut::new(buffer, capacity, length_out)? };
        let own = || OWN.iter().find(|row| row.0 == status).map(|row| row.1);
        out.put(kind(status).map(ErrorKind::name).or_else(own).unwrap_or(""))
    })
}

/// Whether a status says that the input is at fault (1) or not (0: done, a file, a look-up, the
/// calculation itself, or a wrong use of this binding).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_status_is_input(status: i32, is_input_out: *mut i32) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for this pointer.
        let out = unsafe { Slot::new(is_input_out, "is_input_out")? };
        out.put(i32::from(kind(status).is_some_and(ErrorKind::is_input)));
        Ok(())
    })
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn statuses_are_the_numbers_of_the_kinds() {
        let written = [
            BC_ERROR_VALUE,
            BC_ERROR_NAME,
            BC_ERROR_KEY,
            BC_ERROR_UNIT,
            BC_ERROR_DUPLICATE,
            BC_ERROR_GEOMETRY,
            BC_ERROR_MISSING,
            BC_ERROR_MECHANISM,
            BC_ERROR_POSITION,
            BC_ERROR_SYNTAX,
            BC_ERROR_VERSION,
            BC_ERROR_FILE,
            BC_ERROR_LOOKUP,
            BC_ERROR_NUMERICAL,
        ];
        assert_eq!(written, ErrorKind::ALL.map(ErrorKind::number));
        assert!(OWN.iter().all(|&(status, _)| kind(status).is_none()));
    }
}
