//! Members: a section along a length, on supports, under actions.

use crate::action::BcAction;
use crate::choice;
use crate::fault::Fault;
use crate::guard;
use crate::handle::{self, Slot};
use crate::response::BcResponse;
use crate::section::BcSection;
use crate::text::{self, TextOut};
use beamcore::member::{Combination, Member, MemberPlan, Support};
use beamcore::units::Length;
use std::ffi::c_char;

/// A member that has passed all checks and is ready to be solved.
pub struct BcMember(pub(crate) Member);

/// A member of the given length. Each support has a name, a kind (BC_SUPPORT_...) and a place
/// from the left end; the three lists are of one length. All that is wrong is reported at once.
/// Partial factors and combinations of one's own need a plan (bc_plan_of_length).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_new(
    section: *const BcSection,
    length_m: f64,
    support_names: *const *const c_char,
    support_kinds: *const i32,
    support_at_m: *const f64,
    support_count: i32,
    actions: *const *const BcAction,
    action_count: i32,
    member_out: *mut *mut BcMember,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (section, names, kinds, places, actions, out) = unsafe {
            (
                handle::shared(section, "section")?,
                handle::list(support_names, support_count, "support_names")?,
                handle::list(support_kinds, support_count, "support_kinds")?,
                handle::list(support_at_m, support_count, "support_at_m")?,
                handle::handles(actions, action_count, "actions")?,
                Slot::new(member_out, "member_out")?,
            )
        };
        let mut plan = Member::of_length(section.0.clone(), Length::from_m(length_m));
        for (index, ((name, kind), at)) in names.iter().zip(kinds).zip(places).enumerate() {
            // SAFETY: the caller keeps the header's contract for the names.
            let name = unsafe { text::read(*name, &format!("support_names[{index}]"))? };
            let kind = choice::support(*kind)?;
            plan = plan.support(Support::new(name, kind, Length::from_m(*at)));
        }
        out.give(BcMember(checked(plan, &actions)?));
        Ok(())
    })
}

/// A member on two supports at its ends: a pin "left" and a roller "right".
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_simple_span(
    section: *const BcSection,
    span_m: f64,
    actions: *const *const BcAction,
    action_count: i32,
    member_out: *mut *mut BcMember,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (section, actions, out) = unsafe {
            (
                handle::shared(section, "section")?,
                handle::handles(actions, action_count, "actions")?,
                Slot::new(member_out, "member_out")?,
            )
        };
        let plan = Member::simple_span(section.0.clone(), Length::from_m(span_m));
        out.give(BcMember(checked(plan, &actions)?));
        Ok(())
    })
}

fn checked(plan: MemberPlan, actions: &[&BcAction]) -> Result<Member, Fault> {
    let plan = actions
        .iter()
        .fold(plan, |plan, action| plan.action(action.0.clone()));
    Ok(plan.check()?)
}

/// Solves a member for each action at each time.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_solve(
    member: *const BcMember,
    response_out: *mut *mut BcResponse,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (member, out) = unsafe {
            (
                handle::shared(member, "member")?,
                Slot::new(response_out, "response_out")?,
            )
        };
        out.give(BcResponse(member.0.solve()));
        Ok(())
    })
}

/// The length of a member.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_length(member: *const BcMember, length_m_out: *mut f64) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (member, out) = unsafe {
            (
                handle::shared(member, "member")?,
                Slot::new(length_m_out, "length_m_out")?,
            )
        };
        out.put(member.0.length().si());
        Ok(())
    })
}

/// The number of combinations of the actions of a member.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_combination_count(
    member: *const BcMember,
    count_out: *mut i32,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (member, out) = unsafe {
            (
                handle::shared(member, "member")?,
                Slot::new(count_out, "count_out")?,
            )
        };
        out.put(handle::count(member.0.combinations().len())?);
        Ok(())
    })
}

/// The name of a combination, by which results are addressed. Combinations are counted from 0.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_combination_name(
    member: *const BcMember,
    index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (member, out) = unsafe {
            (
                handle::shared(member, "member")?,
                TextOut::new(buffer, capacity, length_out)?,
            )
        };
        let combinations: &[Combination] = member.0.combinations();
        out.put(handle::element(combinations, index)?.name())
    })
}

/// The number of notes on a member, for example on places that were merged.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_note_count(member: *const BcMember, count_out: *mut i32) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (member, out) = unsafe {
            (
                handle::shared(member, "member")?,
                Slot::new(count_out, "count_out")?,
            )
        };
        out.put(handle::count(member.0.notes().len())?);
        Ok(())
    })
}

/// A note on a member. Notes are counted from 0.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_note(
    member: *const BcMember,
    index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (member, out) = unsafe {
            (
                handle::shared(member, "member")?,
                TextOut::new(buffer, capacity, length_out)?,
            )
        };
        out.put(handle::element(member.0.notes(), index)?)
    })
}

/// Frees a member; NULL is allowed.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_free(member: *mut BcMember) {
    // SAFETY: the caller keeps the header's contract for this pointer.
    guard::free(|| unsafe { handle::free(member) });
}
