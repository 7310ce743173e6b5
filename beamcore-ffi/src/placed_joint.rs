//! Joints at their places in a section.

use crate::choice;
use crate::get;
use crate::guard;
use crate::handle::{self, Slot};
use crate::section::BcSection;
use crate::text;
use beamcore::section::PlacedJoint;
use beamcore::time::Time;
use beamcore::units::{Length, SlipModulus};
use std::ffi::c_char;

/// Where a joint lies in its section: the clear distance of its two layers (zero where they touch),
/// the z of the middle of the contact or gap, and the length of the contact line in the section, or
/// of what faces across the gap.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_joint_place(
    section: *const BcSection,
    joint: *const c_char,
    distance_m_out: *mut f64,
    z_m_out: *mut f64,
    width_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (section, joint, distance_out, z_out, width_out) = unsafe {
            (
                handle::shared(section, "section")?,
                text::read(joint, "joint")?,
                Slot::new(distance_m_out, "distance_m_out")?,
                Slot::new(z_m_out, "z_m_out")?,
                Slot::new(width_m_out, "width_m_out")?,
            )
        };
        let placed = section.0.joint(joint)?;
        distance_out.put(placed.distance().si());
        z_out.put(placed.z().si());
        width_out.put(placed.width().si());
        Ok(())
    })
}

/// A modulus of a joint at a place and a time, which `of` finds.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn modulus(
    section: *const BcSection,
    (joint, at_m, time): (*const c_char, f64, i32),
    has_value_out: *mut i32,
    modulus_N_per_m2_out: *mut f64,
    of: fn(&PlacedJoint, Length, Time) -> Option<SlipModulus>,
) -> i32 {
    let out = (modulus_N_per_m2_out, "modulus_N_per_m2_out");
    // SAFETY: by this function's own contract.
    unsafe {
        get::optional((section, "section"), has_value_out, out, |section| {
            let placed = section.0.joint(text::read(joint, "joint")?)?;
            let modulus = of(placed, Length::from_m(at_m), choice::time(time)?);
            Ok(modulus.map(SlipModulus::si))
        })
    }
}

/// The slip modulus of a joint at a place along the member and a time: k on the first day and
/// k/(1 + creep factor) at the end; zero of a loose joint, outside of all bands and where one of
/// the layers is not there. Of a rigid joint has_value_out is 0 and the modulus is left as it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_joint_slip_modulus(
    section: *const BcSection,
    joint: *const c_char,
    at_m: f64,
    time: i32,
    has_value_out: *mut i32,
    modulus_N_per_m2_out: *mut f64,
) -> i32 {
    let of = PlacedJoint::slip_modulus_at;
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        modulus(
            section,
            (joint, at_m, time),
            has_value_out,
            modulus_N_per_m2_out,
            of,
        )
    }
}

/// The modulus of a joint square to the member at a place along it and a time. Where the two layers
/// share their deflection, has_value_out is 0 and the modulus is left as it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_joint_transverse_modulus(
    section: *const BcSection,
    joint: *const c_char,
    at_m: f64,
    time: i32,
    has_value_out: *mut i32,
    modulus_N_per_m2_out: *mut f64,
) -> i32 {
    let of = PlacedJoint::transverse_modulus_at;
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        modulus(
            section,
            (joint, at_m, time),
            has_value_out,
            modulus_N_per_m2_out,
            of,
        )
    }
}

/// The creep factor of a joint, given or found: at the end its moduli are divided by (1 + factor).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_joint_creep_factor(
    section: *const BcSection,
    joint: *const c_char,
    creep_factor_out: *mut f64,
) -> i32 {
    let out = (creep_factor_out, "creep_factor_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::value((section, "section"), out, |section| {
            Ok(section.0.joint(text::read(joint, "joint")?)?.creep())
        })
    }
}

/// Where the creep factor of a joint comes from, in words.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_joint_creep_basis(
    section: *const BcSection,
    joint: *const c_char,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::text(
            (section, "section"),
            buffer,
            capacity,
            length_out,
            |section| Ok(section.0.joint(text::read(joint, "joint")?)?.creep_basis()),
        )
    }
}

/// The clearance of a joint; zero unless it was given.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_joint_clearance(
    section: *const BcSection,
    joint: *const c_char,
    clearance_m_out: *mut f64,
) -> i32 {
    let out = (clearance_m_out, "clearance_m_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::value((section, "section"), out, |section| {
            Ok(section
                .0
                .joint(text::read(joint, "joint")?)?
                .clearance()
                .si())
        })
    }
}

/// The number of stations of a joint: places along the member where one of its moduli changes, the
/// ends of its bands and of its layers.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_joint_station_count(
    section: *const BcSection,
    joint: *const c_char,
    count_out: *mut i32,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::count((section, "section"), count_out, |section| {
            Ok(section.0.joint(text::read(joint, "joint")?)?.places().len())
        })
    }
}

/// A station of a joint. Stations are counted from 0, from the left.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_joint_station(
    section: *const BcSection,
    joint: *const c_char,
    index: i32,
    at_m_out: *mut f64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::value((section, "section"), (at_m_out, "at_m_out"), |section| {
            let places = section.0.joint(text::read(joint, "joint")?)?.places();
            Ok(handle::element(&places, index)?.si())
        })
    }
}
