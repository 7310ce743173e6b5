//! Parts of a section.

use crate::choice;
use crate::guard;
use crate::handle::{self, Slot};
use crate::material::BcMaterial;
use crate::outline::BcOutline;
use crate::text::{self, TextOut};
use beamcore::section::{Part, rectangle};
use beamcore::units::Length;
use std::ffi::c_char;

/// A part: one piece of one material, with a name that addresses its results.
pub struct BcPart(pub(crate) Part);

/// A part of an outline, the point by which the outline is placed at y = 0, z = 0. The values are
/// checked when the part is used in a section.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_part_new(
    name: *const c_char,
    outline: *const BcOutline,
    material: *const BcMaterial,
    part_out: *mut *mut BcPart,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (name, outline, material, out) = unsafe {
            (
                text::read(name, "name")?,
                handle::shared(outline, "outline")?,
                handle::shared(material, "material")?,
                Slot::new(part_out, "part_out")?,
            )
        };
        let (outline, material) = (outline.0.clone(), material.0.clone());
        out.give(BcPart(Part::new(name, outline, material)));
        Ok(())
    })
}

/// A rectangular part, width along y and height along z, with its middle at y = 0, z = 0. The
/// values are checked when the part is used in a section.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_part_rectangle(
    name: *const c_char,
    width_m: f64,
    height_m: f64,
    material: *const BcMaterial,
    part_out: *mut *mut BcPart,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (name, material, out) = unsafe {
            (
                text::read(name, "name")?,
                handle::shared(material, "material")?,
                Slot::new(part_out, "part_out")?,
            )
        };
        let outline = rectangle(Length::from_m(width_m), Length::from_m(height_m));
        out.give(BcPart(Part::new(name, outline, material.0.clone())));
        Ok(())
    })
}

/// The same part with the point by which its outline is placed at (y, z): the middle of its bounding
/// box, or the origin of the coordinates of a polygon.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_part_at(
    part: *const BcPart,
    y_m: f64,
    z_m: f64,
    part_out: *mut *mut BcPart,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (part, out) = unsafe {
            (
                handle::shared(part, "part")?,
                Slot::new(part_out, "part_out")?,
            )
        };
        let (y, z) = (Length::from_m(y_m), Length::from_m(z_m));
        out.give(BcPart(part.0.clone().at(y, z)));
        Ok(())
    })
}

/// The same part touching another one of the section: place is BC_PLACE_...
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_part_beside(
    part: *const BcPart,
    place: i32,
    other_name: *const c_char,
    part_out: *mut *mut BcPart,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (part, other, out) = unsafe {
            (
                handle::shared(part, "part")?,
                text::read(other_name, "other_name")?,
                Slot::new(part_out, "part_out")?,
            )
        };
        let side = choice::place(place)?;
        out.give(BcPart(part.0.clone().beside(side, other)));
        Ok(())
    })
}

/// The name of a part.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_part_name(
    part: *const BcPart,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (part, out) = unsafe {
            (
                handle::shared(part, "part")?,
                TextOut::new(buffer, capacity, length_out)?,
            )
        };
        out.put(part.0.name())
    })
}

/// Frees a part; NULL is allowed.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_part_free(part: *mut BcPart) {
    // SAFETY: the caller keeps the header's contract for this pointer.
    guard::free(|| unsafe { handle::free(part) });
}
