//! Principal stiffnesses of sections, and stresses at their points.

use crate::choice::{self, StressSign};
use crate::choice_section;
use crate::guard;
use crate::handle::{self, Slot};
use crate::section::BcSection;
use crate::text;
use beamcore::section::SectionForces;
use beamcore::units::{Force, Length, Moment};
use std::ffi::c_char;

/// The principal bending stiffnesses at a time, the greater and the smaller one, and the angle from
/// the level axis to the axis of the greater one, positive from y towards z.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_principal(
    section: *const BcSection,
    time: i32,
    greater_Nm2_out: *mut f64,
    smaller_Nm2_out: *mut f64,
    angle_rad_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (section, greater_out, smaller_out, angle_out) = unsafe {
            (
                handle::shared(section, "section")?,
                Slot::new(greater_Nm2_out, "greater_Nm2_out")?,
                Slot::new(smaller_Nm2_out, "smaller_Nm2_out")?,
                Slot::new(angle_rad_out, "angle_rad_out")?,
            )
        };
        let principal = section.0.stiffness(choice::time(time)?).principal();
        greater_out.put(principal.greater.si());
        smaller_out.put(principal.smaller.si());
        angle_out.put(principal.angle.si());
        Ok(())
    })
}

fn forces(axial_N: f64, moment_y_Nm: f64, moment_z_Nm: f64) -> SectionForces {
    SectionForces {
        axial: Force::from_N(axial_N),
        moment_y: Moment::from_N_m(moment_y_Nm),
        moment_z: Moment::from_N_m(moment_z_Nm),
    }
}

/// The stress in a part at a point (y, z) under section forces, tension positive: an axial force
/// (tension positive), a moment about the level axis (positive where it stretches the bottom) and
/// one about the upright axis (positive where it stretches the side of negative y). A section that
/// is held sideways (BC_SIDEWAYS_...) bends about the level axis only.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_stress_at(
    section: *const BcSection,
    time: i32,
    sideways: i32,
    part: *const c_char,
    y_m: f64,
    z_m: f64,
    axial_N: f64,
    moment_y_Nm: f64,
    moment_z_Nm: f64,
    stress_Pa_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (section, part, out) = unsafe {
            (
                handle::shared(section, "section")?,
                text::read(part, "part")?,
                Slot::new(stress_Pa_out, "stress_Pa_out")?,
            )
        };
        let stress = section.0.stress_at(
            part,
            (Length::from_m(y_m), Length::from_m(z_m)),
            &forces(axial_N, moment_y_Nm, moment_z_Nm),
            choice_section::sideways(sideways)?,
            choice::time(time)?,
        )?;
        out.put(stress.si());
        Ok(())
    })
}

/// The algebraically greatest (BC_STRESS_TENSION) or least (BC_STRESS_COMPRESSION) stress in a part
/// under section forces, tension positive, with its point; forces as for bc_section_stress_at.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_stress_extreme(
    section: *const BcSection,
    time: i32,
    sideways: i32,
    part: *const c_char,
    axial_N: f64,
    moment_y_Nm: f64,
    moment_z_Nm: f64,
    sign: i32,
    value_Pa_out: *mut f64,
    y_m_out: *mut f64,
    z_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (section, part, value_out, y_out, z_out) = unsafe {
            (
                handle::shared(section, "section")?,
                text::read(part, "part")?,
                Slot::new(value_Pa_out, "value_Pa_out")?,
                Slot::new(y_m_out, "y_m_out")?,
                Slot::new(z_m_out, "z_m_out")?,
            )
        };
        let [greatest, least] = section.0.stress_extremes(
            part,
            &forces(axial_N, moment_y_Nm, moment_z_Nm),
            choice_section::sideways(sideways)?,
            choice::time(time)?,
        )?;
        let extreme = match choice::stress_sign(sign)? {
            StressSign::Tension => greatest,
            StressSign::Compression => least,
        };
        value_out.put(extreme.value.si());
        y_out.put(extreme.y.si());
        z_out.put(extreme.z.si());
        Ok(())
    })
}
