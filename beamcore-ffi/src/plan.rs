//! Plans of members: everything given, nothing checked yet.

use crate::action::BcAction;
use crate::choice;
use crate::choice_section;
use crate::fault::Fault;
use crate::guard;
use crate::handle::{self, Slot};
use crate::member::BcMember;
use crate::section::BcSection;
use crate::text;
use beamcore::member::{Member, MemberPlan, OwnCombination, PartialFactors, Support};
use beamcore::units::Length;
use std::ffi::c_char;

/// A plan of a member: everything given, nothing checked yet. bc_plan_check makes a member of it.
pub struct BcPlan(MemberPlan);

/// A new plan of a section and a length.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn planned(
    section: *const BcSection,
    length_m: f64,
    plan_out: *mut *mut BcPlan,
    make: fn(beamcore::section::Section, Length) -> MemberPlan,
) -> i32 {
    guard::status(|| {
        // SAFETY: by this function's own contract.
        let (section, out) = unsafe {
            (
                handle::shared(section, "section")?,
                Slot::new(plan_out, "plan_out")?,
            )
        };
        out.give(BcPlan(make(section.0.clone(), Length::from_m(length_m))));
        Ok(())
    })
}

/// A plan of a member of the given length, without supports yet.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plan_of_length(
    section: *const BcSection,
    length_m: f64,
    plan_out: *mut *mut BcPlan,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { planned(section, length_m, plan_out, Member::of_length) }
}

/// A plan of a member on two supports at its ends: a pin "left" and a roller "right".
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plan_simple_span(
    section: *const BcSection,
    span_m: f64,
    plan_out: *mut *mut BcPlan,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { planned(section, span_m, plan_out, Member::simple_span) }
}

/// A new plan with one change to the given one, made by `change`.
///
/// # Safety
/// As for the functions of the ABI.
pub(crate) unsafe fn changed(
    plan: *const BcPlan,
    plan_out: *mut *mut BcPlan,
    change: impl FnOnce(MemberPlan) -> Result<MemberPlan, Fault>,
) -> i32 {
    guard::status(|| {
        // SAFETY: by this function's own contract.
        let (plan, out) = unsafe {
            (
                handle::shared(plan, "plan")?,
                Slot::new(plan_out, "plan_out")?,
            )
        };
        out.give(BcPlan(change(plan.0.clone())?));
        Ok(())
    })
}

/// The same plan with one more support: a name, a kind (BC_SUPPORT_...) and a place from the left
/// end.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plan_with_support(
    plan: *const BcPlan,
    name: *const c_char,
    support_kind: i32,
    at_m: f64,
    plan_out: *mut *mut BcPlan,
) -> i32 {
    let change = |plan: MemberPlan| {
        // SAFETY: the caller keeps the header's contract for the name.
        let name = unsafe { text::read(name, "name")? };
        let kind = choice::support(support_kind)?;
        Ok(plan.support(Support::new(name, kind, Length::from_m(at_m))))
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(plan, plan_out, change) }
}

/// The same plan with one more action.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plan_with_action(
    plan: *const BcPlan,
    action: *const BcAction,
    plan_out: *mut *mut BcPlan,
) -> i32 {
    let change = |plan: MemberPlan| {
        // SAFETY: the caller keeps the header's contract for the action.
        let action = unsafe { handle::shared(action, "action")? };
        Ok(plan.action(action.0.clone()))
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(plan, plan_out, change) }
}

/// The same plan with other partial factors for the fundamental combination than the recommended
/// ones: of permanent actions that are unfavourable and favourable, and of variable actions.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plan_with_partial_factors(
    plan: *const BcPlan,
    permanent: f64,
    permanent_favourable: f64,
    variable: f64,
    plan_out: *mut *mut BcPlan,
) -> i32 {
    let factors = PartialFactors {
        permanent,
        permanent_favourable,
        variable,
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(plan, plan_out, |plan| Ok(plan.partial_factors(factors))) }
}

/// The same plan with one more combination, of one's own: the names of actions and their factors
/// (two lists of one length; an action that is not named has the factor 0), and whether design
/// strengths are compared under it (1) or not (0).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plan_with_combination(
    plan: *const BcPlan,
    name: *const c_char,
    action_names: *const *const c_char,
    factors: *const f64,
    factor_count: i32,
    is_ultimate: i32,
    plan_out: *mut *mut BcPlan,
) -> i32 {
    let change = |plan: MemberPlan| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (name, actions, factors) = unsafe {
            (
                text::read(name, "name")?,
                text::list(action_names, factor_count, "action_names")?,
                handle::list(factors, factor_count, "factors")?,
            )
        };
        Ok(plan.combination(OwnCombination {
            name: name.to_owned(),
            factors: actions.into_iter().zip(factors.iter().copied()).collect(),
            is_ultimate: choice::yes(is_ultimate, "is_ultimate")?,
        }))
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(plan, plan_out, change) }
}

/// The same plan of a member that is held sideways or free to move (BC_SIDEWAYS_...); without this
/// it is held.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plan_with_sideways(
    plan: *const BcPlan,
    sideways: i32,
    plan_out: *mut *mut BcPlan,
) -> i32 {
    let change = |plan: MemberPlan| Ok(plan.sideways(choice_section::sideways(sideways)?));
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { changed(plan, plan_out, change) }
}

/// Checks a plan and makes the member; all that is wrong is reported at once.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plan_check(plan: *const BcPlan, member_out: *mut *mut BcMember) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (plan, out) = unsafe {
            (
                handle::shared(plan, "plan")?,
                Slot::new(member_out, "member_out")?,
            )
        };
        out.give(BcMember(plan.0.clone().check()?));
        Ok(())
    })
}

/// Frees a plan; NULL is allowed.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_plan_free(plan: *mut BcPlan) {
    // SAFETY: the caller keeps the header's contract for this pointer.
    guard::free(|| unsafe { handle::free(plan) });
}
