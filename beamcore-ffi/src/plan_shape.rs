//! Plans of members whose section changes, with hinges, anchors, shear deformation and pitch.

use crate::choice_layers::{self, ShearName};
use crate::fault::Fault;
use crate::handle;
use crate::plan::{BcPlan, changed};
use crate::section::BcSection;
use crate::support::BcSupport;
use crate::text;
use beamcore::member::{Anchor, Hinge, MemberPlan, ShearModel};
use beamcore::units::{Angle, FastenerStiffness, Length, ShearStiffness};
use std::ffi::c_char;

/// The same plan with one more support, described on its own (bc_support_new).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plan_on_support(
    plan: *const BcPlan,
    support: *const BcSupport,
    plan_out: *mut *mut BcPlan,
) -> i32 {
    let change = |plan: MemberPlan| {
        // SAFETY: the caller keeps the header's contract for the support.
        let support = unsafe { handle::shared(support, "support")? };
        Ok(plan.support(support.0.clone()))
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(plan, plan_out, change) }
}

/// The same plan with another section from a place on, to the right of all changes before.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plan_with_step(
    plan: *const BcPlan,
    at_m: f64,
    section: *const BcSection,
    plan_out: *mut *mut BcPlan,
) -> i32 {
    let change = |plan: MemberPlan| {
        // SAFETY: the caller keeps the header's contract for the section.
        let section = unsafe { handle::shared(section, "section")? };
        Ok(plan.step(Length::from_m(at_m), section.0.clone()))
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(plan, plan_out, change) }
}

/// The same plan with a section that changes linearly between two places, to the right of all
/// changes before, to a like one: the same parts, shapes and materials with other sizes.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plan_with_taper(
    plan: *const BcPlan,
    from_m: f64,
    to_m: f64,
    section: *const BcSection,
    plan_out: *mut *mut BcPlan,
) -> i32 {
    let change = |plan: MemberPlan| {
        // SAFETY: the caller keeps the header's contract for the section.
        let section = unsafe { handle::shared(section, "section")? };
        let (from, to) = (Length::from_m(from_m), Length::from_m(to_m));
        Ok(plan.taper(from, to, section.0.clone()))
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(plan, plan_out, change) }
}

/// The same plan with a hinge through all layers: no moment passes.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plan_with_moment_hinge(
    plan: *const BcPlan,
    at_m: f64,
    plan_out: *mut *mut BcPlan,
) -> i32 {
    let hinge = Hinge::moment(Length::from_m(at_m));
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(plan, plan_out, |plan| Ok(plan.hinge(hinge))) }
}

/// A new plan with one hinge of a layer more than the given one, made by `make`.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn hinged(
    plan: *const BcPlan,
    layer: *const c_char,
    at_m: f64,
    plan_out: *mut *mut BcPlan,
    make: fn(String, Length) -> Hinge,
) -> i32 {
    let change = |plan: MemberPlan| {
        // SAFETY: by this function's own contract.
        let layer = unsafe { text::read(layer, "layer")? };
        Ok(plan.hinge(make(layer.to_owned(), Length::from_m(at_m))))
    };
    // SAFETY: by this function's own contract.
    unsafe { changed(plan, plan_out, change) }
}

/// The same plan with a hinge in one layer, which must have a deflection of its own: no moment of
/// it passes.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plan_with_layer_hinge(
    plan: *const BcPlan,
    layer: *const c_char,
    at_m: f64,
    plan_out: *mut *mut BcPlan,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { hinged(plan, layer, at_m, plan_out, Hinge::moment_of) }
}

/// The same plan with a shear release: no shear force passes.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plan_with_shear_hinge(
    plan: *const BcPlan,
    at_m: f64,
    plan_out: *mut *mut BcPlan,
) -> i32 {
    let hinge = Hinge::shear(Length::from_m(at_m));
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(plan, plan_out, |plan| Ok(plan.hinge(hinge))) }
}

/// The same plan with a butt joint of one layer: no axial force of it passes; its curvature goes on
/// with that of the others.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plan_with_butt_joint(
    plan: *const BcPlan,
    layer: *const c_char,
    at_m: f64,
    plan_out: *mut *mut BcPlan,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { hinged(plan, layer, at_m, plan_out, Hinge::butt) }
}

/// A new plan with one anchor more than the given one.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn anchored(
    plan: *const BcPlan,
    (name, joint): (*const c_char, *const c_char),
    at_m: f64,
    stiffness: Option<FastenerStiffness>,
    plan_out: *mut *mut BcPlan,
) -> i32 {
    let change = |plan: MemberPlan| -> Result<MemberPlan, Fault> {
        // SAFETY: by this function's own contract.
        let (name, joint) = unsafe { (text::read(name, "name")?, text::read(joint, "joint")?) };
        Ok(plan.anchor(Anchor {
            name: name.to_owned(),
            joint: joint.to_owned(),
            at: Length::from_m(at_m),
            stiffness,
        }))
    };
    // SAFETY: by this function's own contract.
    unsafe { changed(plan, plan_out, change) }
}

/// The same plan with an anchor, which stops the slip of a joint at a place, as an end plate or a
/// notch does. Its name addresses its force.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plan_with_anchor(
    plan: *const BcPlan,
    name: *const c_char,
    joint: *const c_char,
    at_m: f64,
    plan_out: *mut *mut BcPlan,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { anchored(plan, (name, joint), at_m, None, plan_out) }
}

/// The same plan with an anchor that yields in proportion to its force: stiffness is force per
/// slip.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plan_with_elastic_anchor(
    plan: *const BcPlan,
    name: *const c_char,
    joint: *const c_char,
    at_m: f64,
    stiffness_N_per_m: f64,
    plan_out: *mut *mut BcPlan,
) -> i32 {
    let stiffness = FastenerStiffness::from_N_per_m(stiffness_N_per_m);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { anchored(plan, (name, joint), at_m, Some(stiffness), plan_out) }
}

/// The same plan with shear deformation left out (BC_SHEAR_RIGID, also without this) or taken with
/// kGA of each section (BC_SHEAR_FLEXIBLE).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plan_with_shear(
    plan: *const BcPlan,
    shear_model: i32,
    plan_out: *mut *mut BcPlan,
) -> i32 {
    let change = |plan: MemberPlan| {
        Ok(plan.shear(match choice_layers::shear(shear_model)? {
            ShearName::Rigid => ShearModel::Rigid,
            ShearName::Flexible => ShearModel::Flexible,
        }))
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(plan, plan_out, change) }
}

/// The same plan with shear deformation by the kGA that is given, the same all along the member and
/// its life.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plan_with_given_shear(
    plan: *const BcPlan,
    shear_stiffness_N: f64,
    plan_out: *mut *mut BcPlan,
) -> i32 {
    let shear = ShearModel::Given(ShearStiffness::from_N(shear_stiffness_N));
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(plan, plan_out, |plan| Ok(plan.shear(shear))) }
}

/// The same plan of a member that rises to the right by an angle. Its length and all places are
/// measured along it, gravity loads act downward, supports hold the vertical movement (a pin the
/// level one too), and the deflection is square to the member.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plan_with_pitch(
    plan: *const BcPlan,
    pitch_rad: f64,
    plan_out: *mut *mut BcPlan,
) -> i32 {
    let pitch = Angle::from_rad(pitch_rad);
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(plan, plan_out, |plan| Ok(plan.pitch(pitch))) }
}
