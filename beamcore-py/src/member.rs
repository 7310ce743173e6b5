//! The class `Member`.

use crate::action::Action;
use crate::combination::{OwnCombination, PartialFactors};
use crate::convert;
use crate::error::OrRaise;
use crate::made::{Made, Recipe, Reduced};
use crate::quantity::Quantity;
use crate::response::Response;
use crate::run::run;
use crate::section::Section;
use crate::span::Span;
use crate::support::Support;
use crate::word::Sideways;
use beamcore::member::{self, Combination, MemberPlan};
use beamcore::section;
use pyo3::prelude::*;
use pyo3::types::{PyDict, PyTuple};

/// A section along a length, on supports, under actions.
///
/// It is checked when it is made; all that is wrong is raised at once. Its combinations are those
/// of EN 1990:2002 with partial_factors (the recommended ones where none are given), and then
/// own_combinations.
///
/// sideways: "held", as by a floor, so that it bends about the level axis only; or "free", so that
/// it also moves sideways between its supports where its section has no axis of symmetry.
///
/// >>> joist = Part("joist", rectangle(80*mm, 220*mm), timber("C24", service_class=1))
/// >>> member = Member(Section([joist]), 4*m,
/// ...                 supports=[fixed("wall", 0*m), roller("post", 4*m)],
/// ...                 actions=[permanent("floor", uniform(1.2*kN/m))])
/// >>> member.combinations
/// ('permanent', 'quasi-permanent', 'characteristic', 'frequent', 'fundamental')
#[pyclass(frozen, module = "beamcore")]
#[derive(Debug)]
pub(crate) struct Member(Made<member::Member>);

/// What acts on a member, and how it is combined.
struct Combined {
    actions: Vec<Py<Action>>,
    factors: Option<PartialFactors>,
    own: Vec<Py<OwnCombination>>,
    sideways: section::Sideways,
}

impl Combined {
    /// Checks a plan with its actions and combinations, without the interpreter's lock.
    fn checked(&self, py: Python<'_>, plan: MemberPlan) -> PyResult<member::Member> {
        let actions = self.actions.iter();
        let actions = actions.map(|action| action.get().0.inner.clone());
        let plan = actions.fold(plan, MemberPlan::action);
        let plan = match &self.factors {
            Some(factors) => plan.partial_factors(factors.0),
            None => plan,
        };
        let own = self.own.iter().map(|own| own.get().0.clone());
        let plan = own
            .fold(plan, MemberPlan::combination)
            .sideways(self.sideways);
        run(py, || plan.check())
    }

    /// The keywords that give the same again.
    fn keywords(self, py: Python<'_>) -> PyResult<Bound<'_, PyDict>> {
        let keywords = PyDict::new(py);
        keywords.set_item("actions", self.actions)?;
        keywords.set_item("partial_factors", self.factors)?;
        keywords.set_item("own_combinations", self.own)?;
        keywords.set_item("sideways", self.sideways.name())?;
        Ok(keywords)
    }
}

#[pymethods]
impl Member {
    #[new]
    #[pyo3(signature = (
        section, length, supports, actions, *, partial_factors=None, own_combinations=vec![],
        sideways=Sideways(section::Sideways::Held)
    ))]
    fn new<'py>(
        section: &Bound<'py, Section>,
        length: &Bound<'py, PyAny>,
        supports: Vec<Py<Support>>,
        actions: Vec<Py<Action>>,
        partial_factors: Option<PartialFactors>,
        own_combinations: Vec<Py<OwnCombination>>,
        sideways: Sideways,
    ) -> PyResult<Self> {
        let py = section.py();
        let combined = Combined {
            actions,
            factors: partial_factors,
            own: own_combinations,
            sideways: sideways.0,
        };
        let core = section.get().0.inner.clone();
        let plan = member::Member::of_length(core, convert::read(length, "member.length")?);
        let held = supports.iter().map(|support| support.get().0.clone());
        let member = combined.checked(py, held.fold(plan, MemberPlan::support))?;
        let recipe = Recipe::call(py, "Member", (section, length, supports))?;
        let recipe = recipe.with(&combined.keywords(py)?);
        Ok(Self(Made::new(member, recipe)))
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
        section, span, actions, *, partial_factors=None, own_combinations=vec![],
        sideways=Sideways(section::Sideways::Held)
    ))]
    fn simple_span<'py>(
        section: &Bound<'py, Section>,
        span: &Bound<'py, PyAny>,
        actions: Vec<Py<Action>>,
        partial_factors: Option<PartialFactors>,
        own_combinations: Vec<Py<OwnCombination>>,
        sideways: Sideways,
    ) -> PyResult<Self> {
        let py = section.py();
        let combined = Combined {
            actions,
            factors: partial_factors,
            own: own_combinations,
            sideways: sideways.0,
        };
        let core = section.get().0.inner.clone();
        let plan = member::Member::simple_span(core, convert::read(span, "member.length")?);
        let member = combined.checked(py, plan)?;
        let recipe = Recipe::call(py, "Member.simple_span", (section, span))?;
        let recipe = recipe.with(&combined.keywords(py)?);
        Ok(Self(Made::new(member, recipe)))
    }

    /// The length.
    #[getter]
    fn length(&self) -> Quantity {
        Quantity::of(self.0.length())
    }

    /// The names of the supports, in the order given.
    #[getter]
    fn support_names<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        PyTuple::new(py, self.0.supports().iter().map(member::Support::name))
    }

    /// The names of the combinations of the actions: those of EN 1990:2002, then one's own.
    #[getter]
    fn combinations<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        PyTuple::new(py, self.0.combinations().iter().map(Combination::name))
    }

    /// The partial factors of the fundamental combination.
    #[getter]
    fn partial_factors(&self) -> PartialFactors {
        PartialFactors(*self.0.partial_factors())
    }

    /// The spans and overhangs, from left to right.
    #[getter]
    fn spans<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        let spans: Vec<_> = self.0.spans().iter().map(Span::of).collect();
        PyTuple::new(py, spans)
    }

    /// The span of a name, as in "left to right", "before left" or "beyond right".
    fn span(&self, py: Python<'_>, name: &str) -> PyResult<Span> {
        Ok(Span::of(self.0.span(name).or_raise(py)?))
    }

    /// Whether the member may move sideways: "held" or "free".
    #[getter]
    fn sideways(&self) -> &'static str {
        self.0.sideways().name()
    }

    /// What was noticed while the member was laid out: for example stations that were merged.
    #[getter]
    fn notes<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        PyTuple::new(py, self.0.notes())
    }

    /// Solves the member for each action at each time.
    fn solve(slf: &Bound<'_, Self>) -> PyResult<Response> {
        let py = slf.py();
        let member = &slf.get().0.inner;
        let response = run(py, || Ok(member.solve()))?;
        let recipe = Recipe::method(slf, "solve", PyTuple::empty(py))?;
        Ok(Response(Made::new(response, recipe)))
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }
}
