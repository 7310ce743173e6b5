//! The plan of a member: everything given, nothing checked yet.

use super::{Action, Member, OwnCombination, PartialFactors, Support, checks, combination};
use crate::error::{Error, Result};
use crate::section::{Section, Sideways};
use crate::units::Length;

/// A member as it is being described. [`MemberPlan::check`] makes a [`Member`] of it.
#[derive(Clone, Debug, PartialEq)]
pub struct MemberPlan {
    section: Section,
    length: Length,
    supports: Vec<Support>,
    actions: Vec<Action>,
    factors: PartialFactors,
    own: Vec<OwnCombination>,
    sideways: Sideways,
}

impl MemberPlan {
    pub(super) fn new(section: Section, length: Length) -> Self {
        Self {
            section,
            length,
            supports: Vec::new(),
            actions: Vec::new(),
            factors: PartialFactors::default(),
            own: Vec::new(),
            sideways: Sideways::Held,
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

    /// The same plan with other partial factors for the fundamental combination than the
    /// recommended ones.
    #[must_use]
    pub const fn partial_factors(mut self, factors: PartialFactors) -> Self {
        self.factors = factors;
        self
    }

    /// The same plan with one more combination, of one's own.
    #[must_use]
    pub fn combination(mut self, combination: OwnCombination) -> Self {
        self.own.push(combination);
        self
    }

    /// The same plan of a member that is free to move sideways between its supports: where its
    /// section has no axis of symmetry it bends sideways too. Without this it is held.
    #[must_use]
    pub const fn sideways(mut self, sideways: Sideways) -> Self {
        self.sideways = sideways;
        self
    }

    /// Checks the plan and prepares the member for solving.
    ///
    /// # Errors
    /// All of: an impossible length, no support, no action, names that stand twice, supports or
    /// loads outside the member, two supports at one place, a stretch that ends before it begins,
    /// self-weight of a material without density, initial strains
    /// of a member that is free sideways, combination factors outside 0 to 1, partial
    /// factors outside 0 to 3, an own combination of unknown actions or of a name that is taken; and a member
    /// that is free to move, with the motion that nothing resists.
    pub fn check(self) -> Result<Member> {
        let mut problems = checks::problems_of(
            Some(&self.section),
            Some(self.length),
            &self.supports.as_slice().into(),
            &self.actions.as_slice().into(),
        );
        problems.extend(checks::strains_held(&self.section, self.sideways));
        problems.extend(combination::problems(
            &self.actions,
            &self.factors,
            &self.own,
        ));
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

    pub(super) const fn factors(&self) -> &PartialFactors {
        &self.factors
    }

    pub(super) fn own_combinations(&self) -> &[OwnCombination] {
        &self.own
    }

    pub(super) const fn is_held(&self) -> Sideways {
        self.sideways
    }
}
