//! The class `Member`.

use crate::action::Action;
use crate::change::SectionChange;
use crate::combination::{OwnCombination, PartialFactors};
use crate::convert;
use crate::error::OrRaise;
use crate::hinge::{Anchor, Hinge};
use crate::made::{Made, Recipe, Reduced};
use crate::member_given::Given;
use crate::quantity::Quantity;
use crate::response::Response;
use crate::run::run;
use crate::section::Section;
use crate::span::Span;
use crate::support::Support;
use crate::word::Sideways;
use beamcore::member::{self, Combination, MemberPlan};
use pyo3::prelude::*;
use pyo3::types::PyTuple;

/// Sections along a length, on supports, under actions.
///
/// It is checked when it is made; all that is wrong is raised at once. Its combinations are those
/// of EN 1990:2002 with partial_factors (the recommended ones where none are given), and then
/// own_combinations.
///
/// - section: that at the left end; changes: steps and tapers to others, from left to right
/// - sideways: "held", as by a floor, so that it bends about the level axis only; or "free", so that
///   it also moves sideways between its supports where its section has no axis of symmetry. Without
///   it, the member is held
/// - hinges: internal ones; anchors: what stops the slip of joints
/// - shear: "rigid" leaves shear deformation out, as without it; "flexible" takes kGA of each
///   section; a quantity is kGA itself, the same all along the member and its life
/// - pitch: the angle by which it rises to the right. Its length and all places are measured along
///   it, gravity loads act downward, supports hold the vertical movement (a pin the level one too),
///   and the deflection is square to the member
///
/// >>> joist = Part("joist", rectangle(80*mm, 220*mm), timber("C24", service_class=1))
/// >>> member = Member(Section([joist]), 4*m,
/// ...                 supports=[fixed("wall", 0*m), roller("post", 4*m)],
/// ...                 actions=[permanent("floor", uniform(1.2*kN/m))], shear="flexible")
/// >>> member.combinations
/// ('permanent', 'quasi-permanent', 'characteristic', 'frequent', 'fundamental')
#[pyclass(frozen, module = "beamcore")]
#[derive(Debug)]
pub(crate) struct Member {
    pub(crate) made: Made<member::Member>,
    pub(crate) section: Py<Section>,
    pub(crate) changes: Vec<Py<SectionChange>>,
}

impl Member {
    /// The checked member of a plan.
    fn of(
        section: &Bound<'_, Section>,
        plan: MemberPlan,
        given: Given<'_, '_>,
        recipe: Recipe,
    ) -> PyResult<Self> {
        let py = section.py();
        let member = given.checked(py, plan)?;
        Ok(Self {
            made: Made::new(member, recipe.with(&given.keywords(py)?)),
            section: section.clone().unbind(),
            changes: given.changes,
        })
    }
}

#[pymethods]
impl Member {
    #[new]
    #[pyo3(signature = (
        section, length, supports, actions, *, partial_factors=None, own_combinations=vec![], sideways=None,
        changes=vec![], hinges=vec![], anchors=vec![], shear=None, pitch=None
    ))]
    #[expect(clippy::too_many_arguments, reason = "each is a keyword in Python")]
    fn new<'py>(
        section: &Bound<'py, Section>,
        length: &Bound<'py, PyAny>,
        supports: Vec<Py<Support>>,
        actions: Vec<Py<Action>>,
        partial_factors: Option<PartialFactors>,
        own_combinations: Vec<Py<OwnCombination>>,
        sideways: Option<Sideways>,
        changes: Vec<Py<SectionChange>>,
        hinges: Vec<Py<Hinge>>,
        anchors: Vec<Py<Anchor>>,
        shear: Option<&Bound<'py, PyAny>>,
        pitch: Option<&Bound<'py, PyAny>>,
    ) -> PyResult<Self> {
        let py = section.py();
        let given = Given {
            actions,
            partial_factors,
            own_combinations,
            sideways,
            changes,
            hinges,
            anchors,
            shear,
            pitch,
        };
        let core = section.get().0.inner.clone();
        let plan = member::Member::of_length(core, convert::read(length, "member.length")?);
        let held = supports.iter().map(|support| support.get().0.clone());
        let plan = held.fold(plan, MemberPlan::support);
        let recipe = Recipe::call(py, "Member", (section, length, supports))?;
        Self::of(section, plan, given, recipe)
    }

    /// A member on two supports at its ends: a pin "left" and a roller "right".
    ///
    /// >>> joist = Part("joist", rectangle(80*mm, 220*mm), timber("C24", service_class=1))
    /// >>> floor = permanent("floor", uniform(1.2*kN/m))
    /// >>> member = Member.simple_span(Section([joist]), "4 m", actions=[floor])
    /// >>> member.solve().deflection("quasi-permanent", "final").greatest.at
    /// 2 m
    #[staticmethod]
    #[pyo3(signature = (
        section, span, actions, *, partial_factors=None, own_combinations=vec![], sideways=None,
        changes=vec![], hinges=vec![], anchors=vec![], shear=None, pitch=None
    ))]
    #[expect(clippy::too_many_arguments, reason = "each is a keyword in Python")]
    fn simple_span<'py>(
        section: &Bound<'py, Section>,
        span: &Bound<'py, PyAny>,
        actions: Vec<Py<Action>>,
        partial_factors: Option<PartialFactors>,
        own_combinations: Vec<Py<OwnCombination>>,
        sideways: Option<Sideways>,
        changes: Vec<Py<SectionChange>>,
        hinges: Vec<Py<Hinge>>,
        anchors: Vec<Py<Anchor>>,
        shear: Option<&Bound<'py, PyAny>>,
        pitch: Option<&Bound<'py, PyAny>>,
    ) -> PyResult<Self> {
        let py = section.py();
        let given = Given {
            actions,
            partial_factors,
            own_combinations,
            sideways,
            changes,
            hinges,
            anchors,
            shear,
            pitch,
        };
        let core = section.get().0.inner.clone();
        let plan = member::Member::simple_span(core, convert::read(span, "member.length")?);
        let recipe = Recipe::call(py, "Member.simple_span", (section, span))?;
        Self::of(section, plan, given, recipe)
    }

    /// The length.
    #[getter]
    fn length(&self) -> Quantity {
        Quantity::of(self.made.length())
    }

    /// The names of the supports, in the order given.
    #[getter]
    fn support_names<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        PyTuple::new(py, self.made.supports().iter().map(member::Support::name))
    }

    /// The names of the combinations of the actions: those of EN 1990:2002, then one's own.
    #[getter]
    fn combinations<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        PyTuple::new(py, self.made.combinations().iter().map(Combination::name))
    }

    /// The partial factors of the fundamental combination.
    #[getter]
    fn partial_factors(&self) -> PartialFactors {
        PartialFactors(*self.made.partial_factors())
    }

    /// The spans and overhangs, from left to right.
    #[getter]
    fn spans<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        let spans: Vec<_> = self.made.spans().iter().map(Span::of).collect();
        PyTuple::new(py, spans)
    }

    /// The span of a name, as in "left to right", "before left" or "beyond right".
    fn span(&self, py: Python<'_>, name: &str) -> PyResult<Span> {
        Ok(Span::of(self.made.span(name).or_raise(py)?))
    }

    /// Whether the member may move sideways: "held" or "free".
    #[getter]
    fn sideways(&self) -> &'static str {
        self.made.sideways().name()
    }

    /// What was noticed while the member was laid out: for example stations that were merged.
    #[getter]
    fn notes<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        PyTuple::new(py, self.made.notes())
    }

    /// Solves the member for each action at each time.
    fn solve(slf: &Bound<'_, Self>) -> PyResult<Response> {
        let py = slf.py();
        let member = &slf.get().made.inner;
        let response = run(py, || Ok(member.solve()))?;
        let recipe = Recipe::method(slf, "solve", PyTuple::empty(py))?;
        Ok(Response(Made::new(response, recipe)))
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.made.reduce(py)
    }
}
