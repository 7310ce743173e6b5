//! Joints: what holds two layers together along the member.

use crate::choice_layers;
use crate::fault::Fault;
use crate::get;
use crate::guard;
use crate::handle::{self, Slot};
use crate::text;
use beamcore::section::{Band, Joint, JointKind, Slip, Spacing};
use beamcore::units::{FastenerStiffness, Length, Modulus, SlipModulus};
use std::ffi::c_char;

/// A joint: what holds two layers together along the member.
pub struct BcJoint(pub(crate) Joint);

/// A new joint of two layers, of a kind that `kind` makes.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn joint(
    name: *const c_char,
    lower: *const c_char,
    upper: *const c_char,
    joint_out: *mut *mut BcJoint,
    kind: impl FnOnce() -> Result<JointKind, Fault>,
) -> i32 {
    guard::status(|| {
        // SAFETY: by this function's own contract.
        let (name, lower, upper, out) = unsafe {
            (
                text::read(name, "name")?,
                text::read(lower, "lower")?,
                text::read(upper, "upper")?,
                Slot::new(joint_out, "joint_out")?,
            )
        };
        out.give(BcJoint(Joint::new(name, lower, upper, kind()?)));
        Ok(())
    })
}

/// A joint without slip between two layers, given by their names. The slip of a joint is the
/// displacement along x of its upper layer minus that of its lower one; of layers side by side
/// either may be called the upper one, which only fixes that sign. Joints are checked when they are
/// used in a section.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_joint_rigid(
    name: *const c_char,
    lower: *const c_char,
    upper: *const c_char,
    joint_out: *mut *mut BcJoint,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { joint(name, lower, upper, joint_out, || Ok(JointKind::Rigid)) }
}

/// A joint in which the two layers slip freely; they share their deflection only.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_joint_loose(
    name: *const c_char,
    lower: *const c_char,
    upper: *const c_char,
    joint_out: *mut *mut BcJoint,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { joint(name, lower, upper, joint_out, || Ok(JointKind::Loose)) }
}

/// A joint that slips in proportion to the flow, with its slip modulus k: force per length of the
/// joint and slip.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_joint_slipping(
    name: *const c_char,
    lower: *const c_char,
    upper: *const c_char,
    slip_modulus_N_per_m2: f64,
    joint_out: *mut *mut BcJoint,
) -> i32 {
    let slip = Slip::Modulus(SlipModulus::from_N_per_m2(slip_modulus_N_per_m2));
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        joint(name, lower, upper, joint_out, || {
            Ok(JointKind::Slipping(slip))
        })
    }
}

/// Fasteners as the parameters of the ABI give them.
fn fasteners(
    stiffness_N_per_m: f64,
    rows: i32,
    planes: i32,
    spacing: Spacing,
) -> Result<JointKind, Fault> {
    let number = |count: i32, parameter: &str| {
        u32::try_from(count)
            .map_err(|_| Fault::count(parameter, i64::from(count), "a count above zero"))
    };
    Ok(JointKind::Slipping(Slip::Fasteners {
        stiffness: FastenerStiffness::from_N_per_m(stiffness_N_per_m),
        rows: number(rows, "rows")?,
        planes: number(planes, "planes")?,
        spacing,
    }))
}

/// A joint of fasteners in rows along the member, at one spacing: k = rows planes K/spacing, with K
/// the slip modulus of one fastener in one shear plane, force per slip.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_joint_of_fasteners(
    name: *const c_char,
    lower: *const c_char,
    upper: *const c_char,
    stiffness_N_per_m: f64,
    rows: i32,
    planes: i32,
    spacing_m: f64,
    joint_out: *mut *mut BcJoint,
) -> i32 {
    let spacing = Spacing::Uniform(Length::from_m(spacing_m));
    let kind = || fasteners(stiffness_N_per_m, rows, planes, spacing);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { joint(name, lower, upper, joint_out, kind) }
}

/// A joint of fasteners as bc_joint_of_fasteners, with a spacing of its own in each band along the
/// member (three lists of one length: where a band begins and ends, from the left end, and its
/// spacing). There are no fasteners outside of the bands.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_joint_of_fasteners_in_bands(
    name: *const c_char,
    lower: *const c_char,
    upper: *const c_char,
    stiffness_N_per_m: f64,
    rows: i32,
    planes: i32,
    band_from_m: *const f64,
    band_to_m: *const f64,
    band_spacing_m: *const f64,
    band_count: i32,
    joint_out: *mut *mut BcJoint,
) -> i32 {
    let kind = || {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (from, to, spacing) = unsafe {
            (
                handle::list(band_from_m, band_count, "band_from_m")?,
                handle::list(band_to_m, band_count, "band_to_m")?,
                handle::list(band_spacing_m, band_count, "band_spacing_m")?,
            )
        };
        let band = |((from, to), spacing): ((&f64, &f64), &f64)| Band {
            from: Length::from_m(*from),
            to: Length::from_m(*to),
            spacing: Length::from_m(*spacing),
        };
        let bands = from.iter().zip(to).zip(spacing).map(band).collect();
        fasteners(stiffness_N_per_m, rows, planes, Spacing::Bands(bands))
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { joint(name, lower, upper, joint_out, kind) }
}

/// A joint of a soft layer of glue: k = G width/thickness, with its shear modulus G, the width of
/// the glue line across the member and the thickness of the glue.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_joint_of_glue(
    name: *const c_char,
    lower: *const c_char,
    upper: *const c_char,
    shear_modulus_Pa: f64,
    width_m: f64,
    thickness_m: f64,
    joint_out: *mut *mut BcJoint,
) -> i32 {
    let slip = Slip::Glue {
        shear_modulus: Modulus::from_Pa(shear_modulus_Pa),
        width: Length::from_m(width_m),
        thickness: Length::from_m(thickness_m),
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        joint(name, lower, upper, joint_out, || {
            Ok(JointKind::Slipping(slip))
        })
    }
}

/// A new joint with one change to the given one, made by `change`.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn changed(
    joint: *const BcJoint,
    joint_out: *mut *mut BcJoint,
    change: impl FnOnce(Joint) -> Joint,
) -> i32 {
    // SAFETY: by this function's own contract.
    unsafe {
        get::made((joint, "joint"), (joint_out, "joint_out"), |joint| {
            Ok(BcJoint(change(joint.0.clone())))
        })
    }
}

/// The same joint across a gap: the clear distance between the two layers, which must agree with
/// their places to 0.1 mm. It must be stated where the layers do not touch.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_joint_with_gap(
    joint: *const BcJoint,
    gap_m: f64,
    joint_out: *mut *mut BcJoint,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(joint, joint_out, |joint| joint.gap(Length::from_m(gap_m))) }
}

/// The same joint with a modulus square to the member, force per length that one length of
/// difference between the deflections makes: the two layers then have a deflection each.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_joint_with_transverse(
    joint: *const BcJoint,
    modulus_N_per_m2: f64,
    joint_out: *mut *mut BcJoint,
) -> i32 {
    let modulus = SlipModulus::from_N_per_m2(modulus_N_per_m2);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(joint, joint_out, |joint| joint.transverse(modulus)) }
}

/// The same slipping joint with a clearance, as of bolts in wider holes: it carries nothing until
/// the slip, in either sense, has used it up.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_joint_with_clearance(
    joint: *const BcJoint,
    clearance_m: f64,
    joint_out: *mut *mut BcJoint,
) -> i32 {
    let clearance = Length::from_m(clearance_m);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(joint, joint_out, |joint| joint.clearance(clearance)) }
}

/// The same joint with a creep factor of its own: at the end its moduli are divided by
/// (1 + factor). Without it, the factor follows from wood-based layers; beside any other material
/// it must be given.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_joint_with_creep_factor(
    joint: *const BcJoint,
    creep_factor: f64,
    joint_out: *mut *mut BcJoint,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(joint, joint_out, |joint| joint.creep(creep_factor)) }
}

/// The kind of a joint (BC_JOINT_...).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_joint_kind(joint: *const BcJoint, kind_out: *mut i32) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::value((joint, "joint"), (kind_out, "kind_out"), |joint| {
            Ok(choice_layers::joint_number(joint.0.kind()))
        })
    }
}

/// Frees a joint; NULL is allowed.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_joint_free(joint: *mut BcJoint) {
    // SAFETY: the caller keeps the header's contract for this pointer.
    guard::free(|| unsafe { handle::free(joint) });
}
