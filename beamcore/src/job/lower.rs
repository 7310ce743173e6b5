//! From the document to the core's own types, through their public constructors.
//!
//! Texts of quantities that are wrong were told by the check against the schema; here they make
//! the thing they belong to unknown (`None`), so that all other mistakes can still be found.

use super::document::JobDocument;
use super::{lower_action, lower_camber, lower_material, lower_member, lower_section};
use crate::camber::{CamberPlan, Trestles};
use crate::error::{ErrorKind, Problem};
use crate::limits::Limit;
use crate::member::{
    self, Action, Known, Member, MemberPlan, OwnCombination, PartialFactors, SectionChange, Support,
};
use crate::section::{Section, SectionForces};
use crate::units::Length;

/// What a document asks for, in the core's own types.
#[derive(Clone, Debug)]
pub(super) struct Lowered {
    pub(super) member: Member,
    pub(super) camber: Option<CamberPlan>,
    pub(super) trestles: Option<Trestles>,
    pub(super) limits: Vec<Limit>,
    pub(super) forces: Vec<(String, SectionForces)>,
}

/// The core's own types of a document, or all mistakes of meaning in it.
pub(super) fn lower(document: &JobDocument) -> Result<Lowered, Vec<Problem>> {
    let mut problems = Vec::new();
    check_quantity(&mut problems, document.quantity);
    let materials = lower_material::all(&document.materials, &mut problems);
    let section = lower_section::section(&document.section, &materials, &mut problems);
    let sections = lower_section::all(
        section.as_ref(),
        &document.sections,
        &materials,
        &mut problems,
    );
    let forces = lower_section::forces(&document.section, &mut problems);
    let supports: Vec<_> = document
        .member
        .supports
        .iter()
        .filter_map(lower_member::support)
        .collect();
    let actions = lower_action::actions(&document.actions, &mut problems);
    let given = Given {
        section,
        length: document.member.length.value(),
        supports,
        actions,
        factors: lower_action::partial_factors(document.partial_factors.as_ref()),
        own: lower_action::combinations(&document.combinations),
    };
    let changes = lower_member::changes(&document.member.changes, &sections, &mut problems);
    let plan = changes.and_then(|changes| given.plan(document, changes));
    problems.extend(match &plan {
        Some(plan) => plan.problems(),
        None => given.problems(document),
    });
    let camber = document.camber.as_ref().map(lower_camber::plan);
    let trestles = document.camber.as_ref().and_then(lower_camber::trestles);
    let limits = lower_camber::limits(&document.limits, &mut problems);
    if given.has_all(document) {
        problems.extend(given.wish_problems(camber.as_ref(), &limits));
    }
    if let (Some(Some(trestles)), Some(section), Some(length)) =
        (&trestles, &given.section, given.length)
    {
        problems.extend(trestles.problems(section, length));
    }
    // Whatever is still unknown was told by the check against the schema.
    let (true, Some(plan)) = (problems.is_empty(), plan) else {
        return Err(problems);
    };
    let member = plan.check().map_err(|error| error.problems().to_vec())?;
    Ok(Lowered {
        member,
        camber: camber.flatten(),
        trestles: trestles.flatten(),
        limits,
        forces,
    })
}

/// What the member is made of, as far as it is known.
struct Given {
    section: Option<Section>,
    length: Option<Length>,
    supports: Vec<Support>,
    actions: Vec<Action>,
    factors: PartialFactors,
    own: Vec<OwnCombination>,
}

impl Given {
    /// Whether all supports and actions of the document are known.
    fn has_all(&self, document: &JobDocument) -> bool {
        self.supports.len() == document.member.supports.len()
            && self.actions.len() == document.actions.len()
    }

    /// The plan of the member, if everything is known.
    fn plan(&self, document: &JobDocument, changes: Vec<SectionChange>) -> Option<MemberPlan> {
        let written = &document.member;
        let (true, Some(section), Some(length)) =
            (self.has_all(document), &self.section, self.length)
        else {
            return None;
        };
        let plan = Member::of_length(section.clone(), length)
            .partial_factors(self.factors)
            .sideways(lower_member::sideways(written))
            .shear(lower_member::shear(written)?);
        let plan = match lower_member::known(written.pitch.as_ref())? {
            Some(pitch) => plan.pitch(pitch),
            None => plan,
        };
        let plan = self
            .supports
            .iter()
            .cloned()
            .fold(plan, MemberPlan::support);
        let plan = self.actions.iter().cloned().fold(plan, MemberPlan::action);
        let plan = self.own.iter().cloned().fold(plan, MemberPlan::combination);
        let plan = changes.into_iter().fold(plan, |plan, change| match change {
            SectionChange::Step { at, section } => plan.step(at, section),
            SectionChange::Taper { from, to, section } => plan.taper(from, to, section),
        });
        let hinges = lower_member::hinges(&written.hinges)?;
        let plan = hinges.into_iter().fold(plan, MemberPlan::hinge);
        let anchors = lower_member::anchors(&written.anchors)?;
        Some(anchors.into_iter().fold(plan, MemberPlan::anchor))
    }

    /// The problems of what is known, where something is not.
    fn problems(&self, document: &JobDocument) -> Vec<Problem> {
        let known_supports = Known {
            entries: &self.supports,
            is_complete: self.supports.len() == document.member.supports.len(),
        };
        let known_actions = Known {
            entries: &self.actions,
            is_complete: self.actions.len() == document.actions.len(),
        };
        let section = self.section.as_ref();
        let mut problems =
            member::problems_of(section, self.length, &known_supports, &known_actions);
        if known_supports.is_complete && known_actions.is_complete {
            let own = member::combination_problems(&self.actions, &self.factors, &self.own);
            problems.extend(own);
        }
        problems
    }

    /// The problems of a camber wish and of limits, where all supports and actions are known.
    fn wish_problems(&self, camber: Option<&Option<CamberPlan>>, limits: &[Limit]) -> Vec<Problem> {
        let combinations = member::combinations_of(&self.actions, &self.factors, &self.own);
        let mut problems = Vec::new();
        if let Some(Some(plan)) = camber {
            problems.extend(plan.problems(&self.supports, &combinations));
        }
        if let (Some(length), false) = (self.length, self.supports.is_empty()) {
            let spans = member::spans_of(length, &self.supports);
            let names: Vec<_> = spans.iter().map(member::Span::name).collect();
            for (i, limit) in limits.iter().enumerate() {
                problems.extend(limit.problems(i, &names, &combinations));
            }
        }
        problems
    }
}

fn check_quantity(problems: &mut Vec<Problem>, quantity: Option<u32>) {
    if quantity == Some(0) {
        problems.push(Problem::new(
            ErrorKind::Value,
            "quantity",
            "0",
            "a number from 1",
        ));
    }
}
