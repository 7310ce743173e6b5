//! The combinations of a member: kinds, factors and partial factors.

use crate::choice_member;
use crate::guard;
use crate::handle::{self, Slot};
use crate::member::BcMember;

/// The kind (BC_COMBINATION_...) of a combination. Combinations are counted from 0.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_combination_kind(
    member: *const BcMember,
    index: i32,
    kind_out: *mut i32,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (member, out) = unsafe {
            (
                handle::shared(member, "member")?,
                Slot::new(kind_out, "kind_out")?,
            )
        };
        let combination = handle::element(member.0.combinations(), index)?;
        out.put(choice_member::combination_number(combination.kind()));
        Ok(())
    })
}

/// Whether design strengths are compared under a combination (1) or not (0).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_combination_is_ultimate(
    member: *const BcMember,
    index: i32,
    is_ultimate_out: *mut i32,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (member, out) = unsafe {
            (
                handle::shared(member, "member")?,
                Slot::new(is_ultimate_out, "is_ultimate_out")?,
            )
        };
        let combination = handle::element(member.0.combinations(), index)?;
        out.put(i32::from(combination.is_ultimate()));
        Ok(())
    })
}

/// The number of actions of a member, which is the number of factors of each combination.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_action_count(
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
        out.put(handle::count(member.0.actions().len())?);
        Ok(())
    })
}

/// The factor of an action in a combination. Both are counted from 0, actions in the order given.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_combination_factor(
    member: *const BcMember,
    index: i32,
    action_index: i32,
    factor_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (member, out) = unsafe {
            (
                handle::shared(member, "member")?,
                Slot::new(factor_out, "factor_out")?,
            )
        };
        let combination = handle::element(member.0.combinations(), index)?;
        out.put(*handle::element(combination.factors(), action_index)?);
        Ok(())
    })
}

/// The partial factors of the fundamental combination: of permanent actions that are unfavourable
/// and favourable, and of variable actions.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_partial_factors(
    member: *const BcMember,
    permanent_out: *mut f64,
    permanent_favourable_out: *mut f64,
    variable_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (member, permanent, favourable, variable) = unsafe {
            (
                handle::shared(member, "member")?,
                Slot::new(permanent_out, "permanent_out")?,
                Slot::new(permanent_favourable_out, "permanent_favourable_out")?,
                Slot::new(variable_out, "variable_out")?,
            )
        };
        let factors = member.0.partial_factors();
        permanent.put(factors.permanent);
        favourable.put(factors.permanent_favourable);
        variable.put(factors.variable);
        Ok(())
    })
}
