//! Parts that are mirror images or set into others, and masses of their own.

use crate::choice_section;
use crate::fault::Fault;
use crate::guard;
use crate::handle::{self, Slot};
use crate::part::BcPart;
use crate::text;
use beamcore::section::Part;
use beamcore::units::{Length, LineMass};
use std::ffi::c_char;

/// A new part with one change to the given one, made by `change`.
///
/// # Safety
/// As for the functions of the ABI.
pub(crate) unsafe fn changed(
    part: *const BcPart,
    part_out: *mut *mut BcPart,
    change: impl FnOnce(Part) -> Result<Part, Fault>,
) -> i32 {
    guard::status(|| {
        // SAFETY: by this function's own contract.
        let (part, out) = unsafe {
            (
                handle::shared(part, "part")?,
                Slot::new(part_out, "part_out")?,
            )
        };
        out.give(BcPart(change(part.0.clone())?));
        Ok(())
    })
}

/// The same part as the mirror image of another one about an axis (BC_MIRROR_...): at the mirrored
/// place, with its own outline mirrored.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_part_mirror_of(
    part: *const BcPart,
    other_name: *const c_char,
    axis: i32,
    part_out: *mut *mut BcPart,
) -> i32 {
    let change = |part: Part| {
        // SAFETY: the caller keeps the header's contract for the name.
        let other = unsafe { text::read(other_name, "other_name")? };
        Ok(part.mirror_of(other, choice_section::mirror(axis)?))
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(part, part_out, change) }
}

/// The same part set into another one, its host, at (y, z): it displaces the host exactly, and must
/// lie wholly within it.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_part_set_into(
    part: *const BcPart,
    host_name: *const c_char,
    y_m: f64,
    z_m: f64,
    part_out: *mut *mut BcPart,
) -> i32 {
    let change = |part: Part| {
        // SAFETY: the caller keeps the header's contract for the name.
        let host = unsafe { text::read(host_name, "host_name")? };
        Ok(part.set_into(host, Length::from_m(y_m), Length::from_m(z_m)))
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(part, part_out, change) }
}

/// The same part with a mass per length of its own, instead of density x area.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_part_with_line_mass(
    part: *const BcPart,
    line_mass_kg_per_m: f64,
    part_out: *mut *mut BcPart,
) -> i32 {
    let mass = LineMass::from_kg_per_m(line_mass_kg_per_m);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(part, part_out, |part| Ok(part.line_mass(mass))) }
}
