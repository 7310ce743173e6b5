//! What a member is made of: sections and parts along it, supports, hinges, anchors, shear, pitch.

use crate::choice_layers::{
    BC_CHANGE_STEP, BC_CHANGE_TAPER, BC_HINGE_BUTT, BC_HINGE_MOMENT, BC_HINGE_SHEAR,
    BC_SHEAR_FLEXIBLE, BC_SHEAR_GIVEN, BC_SHEAR_RIGID,
};
use crate::get;
use crate::guard;
use crate::handle::{self, Slot};
use crate::member::BcMember;
use crate::section::BcSection;
use crate::support::BcSupport;
use crate::text::TextOut;
use beamcore::member::{Release, SectionChange, ShearModel};
use beamcore::units::{Angle, Length};
use std::ffi::c_char;

/// The section just right of a place (at the right end, just left of it).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_section_at(
    member: *const BcMember,
    at_m: f64,
    section_out: *mut *mut BcSection,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::made((member, "member"), (section_out, "section_out"), |member| {
            Ok(BcSection(member.0.section_at(Length::from_m(at_m))?))
        })
    }
}

/// The number of parts of all sections along a member, each name once.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_part_count(member: *const BcMember, count_out: *mut i32) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::count((member, "member"), count_out, |member| {
            Ok(member.0.parts().len())
        })
    }
}

/// The name of a part of a member. Parts are counted from 0, in the order in which they come first
/// from the left.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_part_name(
    member: *const BcMember,
    index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::text((member, "member"), buffer, capacity, length_out, |member| {
            Ok(handle::element(&member.0.parts(), index)?.name())
        })
    }
}

/// The number of supports of a member.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_support_count(
    member: *const BcMember,
    count_out: *mut i32,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::count((member, "member"), count_out, |member| {
            Ok(member.0.supports().len())
        })
    }
}

/// A support of a member. Supports are counted from 0, in the order given.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_support(
    member: *const BcMember,
    index: i32,
    support_out: *mut *mut BcSupport,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::made((member, "member"), (support_out, "support_out"), |member| {
            Ok(BcSupport(
                handle::element(member.0.supports(), index)?.clone(),
            ))
        })
    }
}

/// The number of changes of the section along a member.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_change_count(
    member: *const BcMember,
    count_out: *mut i32,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::count((member, "member"), count_out, |member| {
            Ok(member.0.changes().len())
        })
    }
}

/// A change of the section: its kind (BC_CHANGE_...) and where it begins and ends, which of a step
/// is one place. Changes are counted from 0, from the left; bc_member_section_at gives the section
/// after it.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_change(
    member: *const BcMember,
    index: i32,
    change_kind_out: *mut i32,
    from_m_out: *mut f64,
    to_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (member, kind_out, from_out, to_out) = unsafe {
            (
                handle::shared(member, "member")?,
                Slot::new(change_kind_out, "change_kind_out")?,
                Slot::new(from_m_out, "from_m_out")?,
                Slot::new(to_m_out, "to_m_out")?,
            )
        };
        let change = handle::element(member.0.changes(), index)?;
        kind_out.put(match change {
            SectionChange::Step { .. } => BC_CHANGE_STEP,
            SectionChange::Taper { .. } => BC_CHANGE_TAPER,
        });
        from_out.put(change.from().si());
        to_out.put(change.to().si());
        Ok(())
    })
}

/// The number of hinges of a member.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_hinge_count(
    member: *const BcMember,
    count_out: *mut i32,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::count((member, "member"), count_out, |member| {
            Ok(member.0.hinges().len())
        })
    }
}

/// What a hinge releases (BC_HINGE_...) and its place. Hinges are counted from 0, in the order
/// given.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_hinge(
    member: *const BcMember,
    index: i32,
    hinge_kind_out: *mut i32,
    at_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (member, kind_out, at_out) = unsafe {
            (
                handle::shared(member, "member")?,
                Slot::new(hinge_kind_out, "hinge_kind_out")?,
                Slot::new(at_m_out, "at_m_out")?,
            )
        };
        let hinge = handle::element(member.0.hinges(), index)?;
        kind_out.put(match hinge.release() {
            Release::Moment(_) => BC_HINGE_MOMENT,
            Release::Shear => BC_HINGE_SHEAR,
            Release::Butt(_) => BC_HINGE_BUTT,
        });
        at_out.put(hinge.at().si());
        Ok(())
    })
}

/// The layer that a hinge is in. Where it goes through all layers, has_value_out is 0 and the other
/// results are left as they are.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_hinge_layer(
    member: *const BcMember,
    index: i32,
    has_value_out: *mut i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (member, has_out, out) = unsafe {
            (
                handle::shared(member, "member")?,
                Slot::new(has_value_out, "has_value_out")?,
                TextOut::new(buffer, capacity, length_out)?,
            )
        };
        let layer = match handle::element(member.0.hinges(), index)?.release() {
            Release::Moment(layer) => layer.as_ref(),
            Release::Shear => None,
            Release::Butt(layer) => Some(layer),
        };
        if let Some(layer) = layer {
            out.put(layer)?;
        }
        has_out.put(i32::from(layer.is_some()));
        Ok(())
    })
}

/// How the shear deformation of a member is taken (BC_SHEAR_...).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_shear(
    member: *const BcMember,
    shear_model_out: *mut i32,
) -> i32 {
    let out = (shear_model_out, "shear_model_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::value((member, "member"), out, |member| {
            Ok(match member.0.shear_model() {
                ShearModel::Rigid => BC_SHEAR_RIGID,
                ShearModel::Flexible => BC_SHEAR_FLEXIBLE,
                ShearModel::Given(_) => BC_SHEAR_GIVEN,
            })
        })
    }
}

/// The kGA that was given. Where none was, has_value_out is 0 and the stiffness is left as it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_given_shear(
    member: *const BcMember,
    has_value_out: *mut i32,
    shear_stiffness_N_out: *mut f64,
) -> i32 {
    let out = (shear_stiffness_N_out, "shear_stiffness_N_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::optional((member, "member"), has_value_out, out, |member| {
            Ok(match member.0.shear_model() {
                ShearModel::Rigid | ShearModel::Flexible => None,
                ShearModel::Given(stiffness) => Some(stiffness.si()),
            })
        })
    }
}

/// The pitch of a member. Where it has none, has_value_out is 0 and the pitch is left as it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_pitch(
    member: *const BcMember,
    has_value_out: *mut i32,
    pitch_rad_out: *mut f64,
) -> i32 {
    let out = (pitch_rad_out, "pitch_rad_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::optional((member, "member"), has_value_out, out, |member| {
            Ok(member.0.pitch().map(Angle::si))
        })
    }
}
