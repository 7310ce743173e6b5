//! What a member is given beside its section, length and supports.

use crate::action::Action;
use crate::change::SectionChange;
use crate::combination::{OwnCombination, PartialFactors};
use crate::convert;
use crate::error::OrRaise;
use crate::hinge::{Anchor, Hinge};
use crate::run::run;
use crate::word::Sideways;
use beamcore::choice::chosen;
use beamcore::member::{self, MemberPlan, SectionChange as CoreChange, ShearModel};
use pyo3::prelude::*;
use pyo3::types::{PyDict, PyString};

/// The keywords of a member, as they are given.
pub(crate) struct Given<'a, 'py> {
    pub(crate) actions: Vec<Py<Action>>,
    pub(crate) partial_factors: Option<PartialFactors>,
    pub(crate) own_combinations: Vec<Py<OwnCombination>>,
    pub(crate) sideways: Option<Sideways>,
    pub(crate) changes: Vec<Py<SectionChange>>,
    pub(crate) hinges: Vec<Py<Hinge>>,
    pub(crate) anchors: Vec<Py<Anchor>>,
    pub(crate) shear: Option<&'a Bound<'py, PyAny>>,
    pub(crate) pitch: Option<&'a Bound<'py, PyAny>>,
}

impl Given<'_, '_> {
    /// Checks a plan with all that is given, without the interpreter's lock.
    pub(crate) fn checked(&self, py: Python<'_>, plan: MemberPlan) -> PyResult<member::Member> {
        let actions = self.actions.iter();
        let actions = actions.map(|action| action.get().0.inner.clone());
        let mut plan = actions.fold(plan, MemberPlan::action);
        if let Some(factors) = &self.partial_factors {
            plan = plan.partial_factors(factors.0);
        }
        let own = self.own_combinations.iter().map(|own| own.get().0.clone());
        plan = own.fold(plan, MemberPlan::combination);
        if let Some(sideways) = &self.sideways {
            plan = plan.sideways(sideways.0);
        }
        for change in &self.changes {
            plan = match change.get().0.inner.clone() {
                CoreChange::Step { at, section } => plan.step(at, section),
                CoreChange::Taper { from, to, section } => plan.taper(from, to, section),
            };
        }
        let hinges = self.hinges.iter().map(|hinge| hinge.get().0.clone());
        plan = hinges.fold(plan, MemberPlan::hinge);
        let anchors = self.anchors.iter().map(|anchor| anchor.get().0.clone());
        plan = anchors.fold(plan, MemberPlan::anchor);
        if let Some(given) = self.shear {
            plan = plan.shear(shear(given)?);
        }
        if let Some(pitch) = self.pitch {
            plan = plan.pitch(convert::read(pitch, "member.pitch")?);
        }
        run(py, || plan.check())
    }

    /// The keywords that give the same again.
    pub(crate) fn keywords<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyDict>> {
        let keywords = PyDict::new(py);
        keywords.set_item("actions", &self.actions)?;
        keywords.set_item("partial_factors", self.partial_factors.clone())?;
        keywords.set_item("own_combinations", &self.own_combinations)?;
        if let Some(sideways) = &self.sideways {
            keywords.set_item("sideways", sideways.0.name())?;
        }
        keywords.set_item("changes", &self.changes)?;
        keywords.set_item("hinges", &self.hinges)?;
        keywords.set_item("anchors", &self.anchors)?;
        keywords.set_item("shear", self.shear)?;
        keywords.set_item("pitch", self.pitch)?;
        Ok(keywords)
    }
}

/// "rigid", "flexible", or a shear stiffness; a text with a digit is one.
fn shear(given: &Bound<'_, PyAny>) -> PyResult<ShearModel> {
    if let Ok(text) = given.cast::<PyString>() {
        let word = text.to_cow()?;
        if !word.contains(|c: char| c.is_ascii_digit()) {
            let words = [ShearModel::Rigid, ShearModel::Flexible];
            let model = chosen(&word, "member.shear", &words, ShearModel::name);
            return model.or_raise(given.py());
        }
    }
    convert::read(given, "member.shear").map(ShearModel::Given)
}
