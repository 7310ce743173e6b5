//! Outlines by their corners.

use crate::fault::Fault;
use crate::guard;
use crate::handle::{self, Slot};
use crate::outline::BcOutline;
use beamcore::section::polygon;
use beamcore::units::Length;

/// The corners that two lists of one length hold.
///
/// # Safety
/// Each pointer is NULL or points to `count` numbers.
unsafe fn corners(
    y_m: *const f64,
    z_m: *const f64,
    count: i32,
) -> Result<Vec<(Length, Length)>, Fault> {
    // SAFETY: by this function's own contract.
    let (y, z) = unsafe {
        (
            handle::list(y_m, count, "y_m")?,
            handle::list(z_m, count, "z_m")?,
        )
    };
    let corner = |(y, z): (&f64, &f64)| (Length::from_m(*y), Length::from_m(*z));
    Ok(y.iter().zip(z).map(corner).collect())
}

/// A polygon through points (y, z), in its own coordinates: y to the right, z up. The loop closes
/// by itself and may be given in either direction.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_outline_polygon(
    y_m: *const f64,
    z_m: *const f64,
    point_count: i32,
    outline_out: *mut *mut BcOutline,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (points, out) = unsafe {
            (
                corners(y_m, z_m, point_count)?,
                Slot::new(outline_out, "outline_out")?,
            )
        };
        out.give(BcOutline(polygon(points, Vec::new())));
        Ok(())
    })
}

/// The same polygon with one more hole, given by its points as the polygon is. Other outlines than
/// polygons have no holes: they are BC_ERROR_GEOMETRY.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_outline_with_hole(
    outline: *const BcOutline,
    y_m: *const f64,
    z_m: *const f64,
    point_count: i32,
    outline_out: *mut *mut BcOutline,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (outline, hole, out) = unsafe {
            (
                &handle::shared(outline, "outline")?.0,
                corners(y_m, z_m, point_count)?,
                Slot::new(outline_out, "outline_out")?,
            )
        };
        out.give(BcOutline(outline.clone().with_hole(hole)?));
        Ok(())
    })
}
