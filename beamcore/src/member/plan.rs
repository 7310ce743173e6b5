//! The plan of a member: everything given, nothing checked yet.

use super::{Action, Member, Support, checks};
use crate::error::{Error, Result};
use crate::section::Section;
use crate::units::Length;

/// A member as it is being described. [`MemberPlan::check`] makes a [`Member`] of it.
#[derive(Clone, Debug, PartialEq)]
pub struct MemberPlan {
    section: Section,
    length: Length,
    supports: Vec<Support>,
    actions: Vec<Action>,
}

impl MemberPlan {
    pub(super) const fn new(section: Section, length: Length) -> Self {
        Self {
            section,
            length,
            supports: Vec::new(),
            actions: Vec::new(),
        }
    }

    /// The same plan with one more support.
    #[must_use]
    pub fn support(mut self, support: Support) -> Self {
        self.supports.push(support);
        self
    }

    /// The same plan with one more action.
    #[must_use]
    pub fn action(mut self, action: Action) -> Self {
        self.actions.push(action);
        self
    }

    /// Checks the plan and prepares the member for solving.
    ///
    /// # Errors
    /// All of: an impossible length, no support, no action, names that stand twice, supports or
    /// loads outside the member, two supports at one place, a stretch that ends before it begins,
    /// self-weight of a material without density, combination factors outside 0 to 1; and a member
    /// that is free to move, with the motion that nothing resists.
    pub fn check(self) -> Result<Member> {
        let problems = checks::problems_of(
            Some(&self.section),
            Some(self.length),
            &self.supports.as_slice().into(),
            &self.actions.as_slice().into(),
        );
        Error::check(problems)?;
        Member::from_plan(self)
    }

    pub(super) const fn section(&self) -> &Section {
        &self.section
    }

    pub(super) const fn length(&self) -> Length {
        self.length
    }

    pub(super) fn supports(&self) -> &[Support] {
        &self.supports
    }

    pub(super) fn actions(&self) -> &[Action] {
        &self.actions
    }
}
