//! Versions.

use crate::guard;
use crate::handle::Slot;
use crate::text::TextOut;
use std::ffi::c_char;

/// The version of this binding that the header describes; it grows with each incompatible change,
/// and is the number of the shared library's name.
pub const BC_ABI_VERSION: i32 = 0;

/// The version of the library, as in "0.1.0".
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_version(
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let out = unsafe { TextOut::new(buffer, capacity, length_out)? };
        out.put(beamcore::VERSION)
    })
}

/// The version of the binding in the library that is running; compare it with BC_ABI_VERSION.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_abi_version(version_out: *mut i32) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for this pointer.
        let out = unsafe { Slot::new(version_out, "version_out")? };
        out.put(BC_ABI_VERSION);
        Ok(())
    })
}
