//! The class `Member`.

use crate::action::Action;
use crate::convert;
use crate::made::{Made, Recipe, Reduced};
use crate::quantity::Quantity;
use crate::response::Response;
use crate::run::run;
use crate::section::Section;
use crate::support::Support;
use beamcore::member::{self, Combination, MemberPlan};
use pyo3::prelude::*;
use pyo3::types::PyTuple;

/// A section along a length, on supports, under actions.
///
/// It is checked when it is made; all that is wrong is raised at once.
///
/// >>> joist = Part("joist", rectangle(80*mm, 220*mm), timber("C24", service_class=1))
/// >>> member = Member(Section([joist]), 4*m,
/// ...                 supports=[fixed("wall", 0*m), roller("post", 4*m)],
/// ...                 actions=[permanent("floor", uniform(1.2*kN/m))])
/// >>> member.combinations
/// ('permanent', 'quasi-permanent', 'characteristic', 'fundamental')
#[pyclass(frozen, module = "beamcore")]
#[derive(Debug)]
pub(crate) struct Member(Made<member::Member>);

/// Checks a plan with its actions, without the interpreter's lock.
fn checked(py: Python<'_>, plan: MemberPlan, actions: &[Py<Action>]) -> PyResult<member::Member> {
    let actions = actions.iter().map(|action| action.get().0.inner.clone());
    let plan = actions.fold(plan, MemberPlan::action);
    run(py, || plan.check())
}

#[pymethods]
impl Member {
    #[new]
    fn new<'py>(
        section: &Bound<'py, Section>,
        length: &Bound<'py, PyAny>,
        supports: Vec<Py<Support>>,
        actions: Vec<Py<Action>>,
    ) -> PyResult<Self> {
        let py = section.py();
        let core = section.get().0.inner.clone();
        let plan = member::Member::of_length(core, convert::read(length, "member.length")?);
        let held = supports.iter().map(|support| support.get().0.clone());
        let member = checked(py, held.fold(plan, MemberPlan::support), &actions)?;
        let recipe = Recipe::call(py, "Member", (section, length, supports, actions))?;
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
    fn simple_span<'py>(
        section: &Bound<'py, Section>,
        span: &Bound<'py, PyAny>,
        actions: Vec<Py<Action>>,
    ) -> PyResult<Self> {
        let py = section.py();
        let core = section.get().0.inner.clone();
        let plan = member::Member::simple_span(core, convert::read(span, "member.length")?);
        let member = checked(py, plan, &actions)?;
        let recipe = Recipe::call(py, "Member.simple_span", (section, span, actions))?;
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

    /// The names of the combinations of the actions (EN 1990:2002).
    #[getter]
    fn combinations<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        PyTuple::new(py, self.0.combinations().iter().map(Combination::name))
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
