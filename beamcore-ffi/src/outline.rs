//! Outlines of parts by their sizes.

use crate::guard;
use crate::handle::{self, Slot};
use crate::text::TextOut;
use beamcore::section::{self, Outline};
use beamcore::units::Length;
use std::ffi::c_char;

/// An outline: the shape of a part with its sizes, without a place. It has a point by which a part
/// is placed: the middle of its bounding box, or the origin of the coordinates of a polygon.
/// Corners are sharp. The sizes are checked when a part of the outline is used in a section.
pub struct BcOutline(pub(crate) Outline);

/// Hands an outline to the caller.
///
/// # Safety
/// `outline_out` is NULL or may be written to.
pub(crate) unsafe fn give(outline: Outline, outline_out: *mut *mut BcOutline) -> i32 {
    guard::status(|| {
        // SAFETY: by this function's own contract.
        let out = unsafe { Slot::new(outline_out, "outline_out")? };
        out.give(BcOutline(outline));
        Ok(())
    })
}

/// A rectangle, width along y and height along z.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_outline_rectangle(
    width_m: f64,
    height_m: f64,
    outline_out: *mut *mut BcOutline,
) -> i32 {
    let outline = section::rectangle(Length::from_m(width_m), Length::from_m(height_m));
    // SAFETY: the caller keeps the header's contract for this pointer.
    unsafe { give(outline, outline_out) }
}

/// A full disc: a round bar.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_outline_disc(diameter_m: f64, outline_out: *mut *mut BcOutline) -> i32 {
    let outline = section::disc(Length::from_m(diameter_m));
    // SAFETY: the caller keeps the header's contract for this pointer.
    unsafe { give(outline, outline_out) }
}

/// A round tube of an outer diameter, its wall thinner than half of it.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_outline_ring(
    diameter_m: f64,
    wall_thickness_m: f64,
    outline_out: *mut *mut BcOutline,
) -> i32 {
    let outline = section::ring(Length::from_m(diameter_m), Length::from_m(wall_thickness_m));
    // SAFETY: the caller keeps the header's contract for this pointer.
    unsafe { give(outline, outline_out) }
}

/// Two flanges joined by a web in their middle; the height is overall.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_outline_i_shape(
    height_m: f64,
    top_width_m: f64,
    top_thickness_m: f64,
    bottom_width_m: f64,
    bottom_thickness_m: f64,
    web_thickness_m: f64,
    outline_out: *mut *mut BcOutline,
) -> i32 {
    let outline = section::i_shape(
        Length::from_m(height_m),
        Length::from_m(top_width_m),
        Length::from_m(top_thickness_m),
        Length::from_m(bottom_width_m),
        Length::from_m(bottom_thickness_m),
        Length::from_m(web_thickness_m),
    );
    // SAFETY: the caller keeps the header's contract for this pointer.
    unsafe { give(outline, outline_out) }
}

/// A flange on top of a web in its middle; the height is overall.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_outline_tee(
    height_m: f64,
    width_m: f64,
    flange_thickness_m: f64,
    web_thickness_m: f64,
    outline_out: *mut *mut BcOutline,
) -> i32 {
    let outline = section::tee(
        Length::from_m(height_m),
        Length::from_m(width_m),
        Length::from_m(flange_thickness_m),
        Length::from_m(web_thickness_m),
    );
    // SAFETY: the caller keeps the header's contract for this pointer.
    unsafe { give(outline, outline_out) }
}

/// A web on the left with two equal flanges to the right; height and width are overall.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_outline_channel(
    height_m: f64,
    width_m: f64,
    flange_thickness_m: f64,
    web_thickness_m: f64,
    outline_out: *mut *mut BcOutline,
) -> i32 {
    let outline = section::channel(
        Length::from_m(height_m),
        Length::from_m(width_m),
        Length::from_m(flange_thickness_m),
        Length::from_m(web_thickness_m),
    );
    // SAFETY: the caller keeps the header's contract for this pointer.
    unsafe { give(outline, outline_out) }
}

/// An upright leg on the left and a level leg at the bottom, of one thickness, with the heel at the
/// bottom left; height and width are overall.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_outline_angle(
    height_m: f64,
    width_m: f64,
    thickness_m: f64,
    outline_out: *mut *mut BcOutline,
) -> i32 {
    let outline = section::angle(
        Length::from_m(height_m),
        Length::from_m(width_m),
        Length::from_m(thickness_m),
    );
    // SAFETY: the caller keeps the header's contract for this pointer.
    unsafe { give(outline, outline_out) }
}

/// A rectangular tube of two upright sides and two level plates; width and height are overall.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_outline_box(
    width_m: f64,
    height_m: f64,
    side_thickness_m: f64,
    plate_thickness_m: f64,
    outline_out: *mut *mut BcOutline,
) -> i32 {
    let outline = section::hollow_box(
        Length::from_m(width_m),
        Length::from_m(height_m),
        Length::from_m(side_thickness_m),
        Length::from_m(plate_thickness_m),
    );
    // SAFETY: the caller keeps the header's contract for this pointer.
    unsafe { give(outline, outline_out) }
}

/// The word for the shape in documents: rectangle, polygon, disc, ring, i_shape, tee, channel,
/// angle or box.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_outline_name(
    outline: *const BcOutline,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (outline, out) = unsafe {
            (
                handle::shared(outline, "outline")?,
                TextOut::new(buffer, capacity, length_out)?,
            )
        };
        out.put(outline.0.name())
    })
}

/// Frees an outline; NULL is allowed.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_outline_free(outline: *mut BcOutline) {
    // SAFETY: the caller keeps the header's contract for this pointer.
    guard::free(|| unsafe { handle::free(outline) });
}
