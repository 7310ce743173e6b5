//! The plan of a member: everything given, nothing checked yet.

use super::{
    Action, Anchor, Hinge, Member, OwnCombination, PartialFactors, Release, SectionChange,
    ShearModel, Support, checks, checks_parts, checks_places, checks_sections, combination,
    sections,
};
use crate::error::{Error, Problem, Result};
use crate::section::{JointKind, Section, Sideways};
use crate::units::{Angle, Length};

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
    changes: Vec<SectionChange>,
    hinges: Vec<Hinge>,
    anchors: Vec<Anchor>,
    shear: ShearModel,
    pitch: Option<Angle>,
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
            changes: Vec::new(),
            hinges: Vec::new(),
            anchors: Vec::new(),
            shear: ShearModel::Rigid,
            pitch: None,
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

    /// The same plan with another section from a place on, to the right of all changes before.
    #[must_use]
    pub fn step(mut self, at: Length, section: Section) -> Self {
        self.changes.push(SectionChange::Step { at, section });
        self
    }

    /// The same plan with a section that changes linearly between two places, to the right of all
    /// changes before, to a like one: the same parts, shapes and materials with other sizes.
    #[must_use]
    pub fn taper(mut self, from: Length, to: Length, section: Section) -> Self {
        self.changes
            .push(SectionChange::Taper { from, to, section });
        self
    }

    /// The same plan with an internal hinge.
    #[must_use]
    pub fn hinge(mut self, hinge: Hinge) -> Self {
        self.hinges.push(hinge);
        self
    }

    /// The same plan with something that stops the slip of a joint at a place.
    #[must_use]
    pub fn anchor(mut self, anchor: Anchor) -> Self {
        self.anchors.push(anchor);
        self
    }

    /// The same plan with shear deformation taken as told; without this it is left out.
    #[must_use]
    pub const fn shear(mut self, shear: ShearModel) -> Self {
        self.shear = shear;
        self
    }

    /// The same plan of a member that rises to the right by an angle. Its length and all places are
    /// measured along it, gravity loads act downward, supports hold the vertical movement (a pin
    /// the level one too), and the deflection is square to the member.
    #[must_use]
    pub const fn pitch(mut self, angle: Angle) -> Self {
        self.pitch = Some(angle);
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
        Error::check(self.problems())?;
        Member::from_plan(self)
    }

    /// Everything that is wrong with the plan, but for a member that is free to move.
    pub(crate) fn problems(&self) -> Vec<Problem> {
        let mut problems = checks::problems_of(
            Some(&self.section),
            Some(self.length),
            &self.supports.as_slice().into(),
            &self.actions.as_slice().into(),
        );
        problems.extend(checks_parts::strains_held(&self.section, self.sideways));
        problems.extend(checks_places::places(self));
        problems.extend(combination::problems(
            &self.actions,
            &self.factors,
            &self.own,
        ));
        let order = checks_places::order_of_changes(self);
        // Sections can be looked at one after the other only where their places are in order.
        if order.is_empty() {
            match sections::stretches(&self.section, self.length, &self.changes) {
                Ok(stretches) => problems.extend(checks_sections::problems(self, &stretches)),
                Err(error) => problems.extend(error.problems().iter().cloned()),
            }
        }
        problems.extend(order);
        problems
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

    pub(super) fn changes(&self) -> &[SectionChange] {
        &self.changes
    }

    pub(super) fn hinges(&self) -> &[Hinge] {
        &self.hinges
    }

    pub(super) fn anchors(&self) -> &[Anchor] {
        &self.anchors
    }

    pub(super) const fn shear_model(&self) -> ShearModel {
        self.shear
    }

    pub(super) const fn pitch_angle(&self) -> Option<Angle> {
        self.pitch
    }

    /// The same plan with all joints of its sections of one kind, without anchors and hinges of
    /// single layers, gaps kept.
    pub(crate) fn with_joints(&self, kind: &JointKind) -> Result<Self> {
        let mut plan = self.clone();
        plan.section = self.section.with_joints(kind)?;
        plan.anchors = Vec::new();
        plan.hinges
            .retain(|hinge| matches!(hinge.release(), Release::Moment(None) | Release::Shear));
        for change in &mut plan.changes {
            let (SectionChange::Step { section, .. } | SectionChange::Taper { section, .. }) =
                change;
            *section = section.with_joints(kind)?;
        }
        Ok(plan)
    }
}
