//! The outlines of a transformed section, for drawing.

use crate::choice;
use crate::fault::Fault;
use crate::guard;
use crate::handle::{self, Slot, Slots};
use crate::section::{BcSection, position};
use crate::text;
use beamcore::section::TransformedPart;
use std::ffi::c_char;

/// A part of a transformed section as the parameters of the ABI name it.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn transformed(
    section: *const BcSection,
    time: i32,
    material: *const c_char,
    part: *const c_char,
) -> Result<TransformedPart, Fault> {
    // SAFETY: by this function's own contract.
    let (section, material, part) = unsafe {
        (
            &handle::shared(section, "section")?.0,
            text::read(material, "material")?,
            text::read(part, "part")?,
        )
    };
    let whole = section.transformed_to(material, choice::time(time)?)?;
    Ok(whole.parts()[position(section, part)?].clone())
}

/// The number of loops of the outline of a part of the transformed section.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_transformed_loop_count(
    section: *const BcSection,
    time: i32,
    material: *const c_char,
    part: *const c_char,
    count_out: *mut i32,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (part, out) = unsafe {
            (
                transformed(section, time, material, part)?,
                Slot::new(count_out, "count_out")?,
            )
        };
        out.put(handle::count(part.loops.len())?);
        Ok(())
    })
}

/// The number of corners of a loop. Loops are counted from 0.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_transformed_corner_count(
    section: *const BcSection,
    time: i32,
    material: *const c_char,
    part: *const c_char,
    index: i32,
    count_out: *mut i32,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (part, out) = unsafe {
            (
                transformed(section, time, material, part)?,
                Slot::new(count_out, "count_out")?,
            )
        };
        out.put(handle::count(handle::element(&part.loops, index)?.len())?);
        Ok(())
    })
}

/// The corners (y, z) of a loop: widths are multiplied about the part's own centroid, arcs are given
/// by chords of at most 12 degrees. The places must have room for capacity numbers each; less room
/// than there are corners is BC_ERROR_COUNT.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_transformed_corners(
    section: *const BcSection,
    time: i32,
    material: *const c_char,
    part: *const c_char,
    index: i32,
    capacity: i32,
    y_m_out: *mut f64,
    z_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let part = unsafe { transformed(section, time, material, part)? };
        let corners = handle::element(&part.loops, index)?;
        if usize::try_from(capacity).is_ok_and(|room| room >= corners.len()) {
            // SAFETY: there is room for all corners, by the caller's word.
            let (y_out, z_out) = unsafe {
                (
                    Slots::new(y_m_out, corners.len(), "y_m_out")?,
                    Slots::new(z_m_out, corners.len(), "z_m_out")?,
                )
            };
            let (y, z): (Vec<_>, Vec<_>) = corners.iter().map(|(y, z)| (y.si(), z.si())).unzip();
            y_out.put(&y);
            z_out.put(&z);
            return Ok(());
        }
        let expected = format!("at least {}, the number of corners", corners.len());
        Err(Fault::count("capacity", i64::from(capacity), &expected))
    })
}
