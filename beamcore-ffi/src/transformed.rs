//! The transformed section: presentation only.

use crate::choice;
use crate::guard;
use crate::handle::{self, Slot};
use crate::section::{BcSection, position};
use crate::text;
use beamcore::units::{Length, Moment};
use std::ffi::c_char;

/// The section at a time as if made of one of its materials: the modulus of that material, and
/// area, centroid and second moment of area about the horizontal axis of the transformed section.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_transformed(
    section: *const BcSection,
    time: i32,
    material: *const c_char,
    reference_modulus_Pa_out: *mut f64,
    area_m2_out: *mut f64,
    centroid_z_m_out: *mut f64,
    second_moment_m4_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (section, material, reference_out, area_out, centroid_out, moment_out) = unsafe {
            (
                handle::shared(section, "section")?,
                text::read(material, "material")?,
                Slot::new(reference_modulus_Pa_out, "reference_modulus_Pa_out")?,
                Slot::new(area_m2_out, "area_m2_out")?,
                Slot::new(centroid_z_m_out, "centroid_z_m_out")?,
                Slot::new(second_moment_m4_out, "second_moment_m4_out")?,
            )
        };
        let transformed = section.0.transformed_to(material, choice::time(time)?)?;
        reference_out.put(transformed.reference_modulus().si());
        area_out.put(transformed.area().si());
        centroid_out.put(transformed.centroid_z().si());
        moment_out.put(transformed.second_moment().si());
        Ok(())
    })
}

/// One part of the transformed section: its modular ratio n = E/E_ref and its width n b.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_transformed_part(
    section: *const BcSection,
    time: i32,
    material: *const c_char,
    part: *const c_char,
    ratio_out: *mut f64,
    width_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (section, material, part, ratio_out, width_out) = unsafe {
            (
                &handle::shared(section, "section")?.0,
                text::read(material, "material")?,
                text::read(part, "part")?,
                Slot::new(ratio_out, "ratio_out")?,
                Slot::new(width_m_out, "width_m_out")?,
            )
        };
        let transformed = section.transformed_to(material, choice::time(time)?)?;
        let part = &transformed.parts()[position(section, part)?];
        ratio_out.put(part.ratio);
        width_out.put(part.width.si());
        Ok(())
    })
}

/// The stress in the real material of a part at height z under a moment (positive sagging),
/// tension positive.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_transformed_stress(
    section: *const BcSection,
    time: i32,
    material: *const c_char,
    part: *const c_char,
    z_m: f64,
    moment_Nm: f64,
    stress_Pa_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (section, material, part, out) = unsafe {
            (
                handle::shared(section, "section")?,
                text::read(material, "material")?,
                text::read(part, "part")?,
                Slot::new(stress_Pa_out, "stress_Pa_out")?,
            )
        };
        let transformed = section.0.transformed_to(material, choice::time(time)?)?;
        let (z, moment) = (Length::from_m(z_m), Moment::from_N_m(moment_Nm));
        out.put(transformed.stress(part, z, moment)?.si());
        Ok(())
    })
}
