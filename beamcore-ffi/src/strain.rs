//! Initial strains of parts, and what a section makes of them.

use crate::choice;
use crate::choice_section;
use crate::guard;
use crate::handle::{self, Slot};
use crate::part::BcPart;
use crate::part_place::changed;
use crate::section::BcSection;
use crate::text;
use beamcore::section::InitialStrain;
use beamcore::units::{Curvature, Strain};
use std::ffi::c_char;

/// The same part with an initial strain, which it bears from the first day: about its own centroid
/// (y_i, z_i), axial_strain - curvature_y (z - z_i) - curvature_z (y - y_i), positive where the part
/// alone would grow longer; shrinkage is negative. axial_strain is a ratio: 0.001 is 1 mm in 1 m.
/// The values are checked when the part is used in a section.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_part_with_initial_strain(
    part: *const BcPart,
    axial_strain: f64,
    curvature_y_per_m: f64,
    curvature_z_per_m: f64,
    part_out: *mut *mut BcPart,
) -> i32 {
    let strain = InitialStrain {
        axial: Strain::from_ratio(axial_strain),
        curvature_y: Curvature::from_per_m(curvature_y_per_m),
        curvature_z: Curvature::from_per_m(curvature_z_per_m),
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(part, part_out, |part| Ok(part.initial_strain(strain))) }
}

/// The initial strain that a part bears, as bc_part_with_initial_strain takes it; zeros where none
/// was given. Of a mirror image it is mirrored too.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_part_initial_strain(
    section: *const BcSection,
    part: *const c_char,
    axial_strain_out: *mut f64,
    curvature_y_per_m_out: *mut f64,
    curvature_z_per_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (section, part, axial_out, y_out, z_out) = unsafe {
            (
                handle::shared(section, "section")?,
                text::read(part, "part")?,
                Slot::new(axial_strain_out, "axial_strain_out")?,
                Slot::new(curvature_y_per_m_out, "curvature_y_per_m_out")?,
                Slot::new(curvature_z_per_m_out, "curvature_z_per_m_out")?,
            )
        };
        let strain = section.0.part(part)?.initial_strain();
        axial_out.put(strain.axial.si());
        y_out.put(strain.curvature_y.si());
        z_out.put(strain.curvature_z.si());
        Ok(())
    })
}

/// The plane of strain that a section takes freely at a time under the initial strains of its
/// parts: the strain at the elastic centroid (a ratio), the curvature about the level axis, positive
/// where the bottom grows longer than the top, and about the upright axis, positive where the side
/// of negative y grows longer. A section that is held sideways (BC_SIDEWAYS_...) bends about the
/// level axis only.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_free_plane(
    section: *const BcSection,
    time: i32,
    sideways: i32,
    axial_strain_out: *mut f64,
    curvature_y_per_m_out: *mut f64,
    curvature_z_per_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (section, axial_out, y_out, z_out) = unsafe {
            (
                handle::shared(section, "section")?,
                Slot::new(axial_strain_out, "axial_strain_out")?,
                Slot::new(curvature_y_per_m_out, "curvature_y_per_m_out")?,
                Slot::new(curvature_z_per_m_out, "curvature_z_per_m_out")?,
            )
        };
        let sideways = choice_section::sideways(sideways)?;
        let plane = section.0.free_plane(choice::time(time)?, sideways);
        axial_out.put(plane.axial.si());
        y_out.put(plane.curvature_y.si());
        z_out.put(plane.curvature_z.si());
        Ok(())
    })
}
