//! One spacing for fasteners whose spacing changes along the member.

use crate::guard;
use crate::handle::{self, Slot};
use crate::text::TextOut;
use beamcore::simplified::{EffectiveSpacing, effective_spacing};
use beamcore::units::Length;
use std::ffi::c_char;

fn found(least_m: f64, greatest_m: f64) -> beamcore::Result<EffectiveSpacing> {
    effective_spacing(Length::from_m(least_m), Length::from_m(greatest_m))
}

/// The effective spacing of fasteners that stand closer where the shear force is greater:
/// 0.75 s_min + 0.25 s_max (EN 1995-1-1:2004 9.1.3 and Annex B, from memory).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_effective_spacing(
    least_m: f64,
    greatest_m: f64,
    spacing_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for this pointer.
        let out = unsafe { Slot::new(spacing_m_out, "spacing_m_out")? };
        out.put(found(least_m, greatest_m)?.spacing.si());
        Ok(())
    })
}

/// The number of warnings on an effective spacing: where it does not hold, or only nearly.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_effective_spacing_warning_count(
    least_m: f64,
    greatest_m: f64,
    count_out: *mut i32,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for this pointer.
        let out = unsafe { Slot::new(count_out, "count_out")? };
        out.put(handle::count(found(least_m, greatest_m)?.warnings.len())?);
        Ok(())
    })
}

/// A warning on an effective spacing, in words. Warnings are counted from 0.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_effective_spacing_warning(
    least_m: f64,
    greatest_m: f64,
    index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let out = unsafe { TextOut::new(buffer, capacity, length_out)? };
        let warnings = found(least_m, greatest_m)?.warnings;
        out.put(handle::element(&warnings, index)?.text())
    })
}
