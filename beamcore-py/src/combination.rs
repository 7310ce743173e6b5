//! The classes `PartialFactors`, `OwnCombination` and `Combination`.

use crate::made::{Recipe, Reduced};
use crate::operand::Number;
use beamcore::member::{self, CombinationKind};
use pyo3::prelude::*;
use pyo3::types::{PyDict, PyMapping, PyTuple};

/// Partial factors of the fundamental combination.
///
/// What is not given has the recommended value of EN 1990:2002 Table A1.2(B), from memory; the
/// local annex decides.
///
/// - permanent: gamma_G,sup of permanent actions that are unfavourable, 1.35
/// - permanent_favourable: gamma_G,inf of permanent actions that are favourable, 1.0
/// - variable: gamma_Q of variable actions that are unfavourable, 1.5
///
/// >>> PartialFactors(permanent=1.2)
/// PartialFactors(permanent=1.2, permanent_favourable=1.0, variable=1.5)
#[pyclass(frozen, eq, module = "beamcore", from_py_object)]
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct PartialFactors(pub(crate) member::PartialFactors);

#[pymethods]
impl PartialFactors {
    #[new]
    #[pyo3(signature = (*, permanent=None, permanent_favourable=None, variable=None))]
    fn new(
        permanent: Option<Number>,
        permanent_favourable: Option<Number>,
        variable: Option<Number>,
    ) -> Self {
        let recommended = member::PartialFactors::default();
        let or = |given: Option<Number>, default| given.map_or(default, |given| given.0);
        Self(member::PartialFactors {
            permanent: or(permanent, recommended.permanent),
            permanent_favourable: or(permanent_favourable, recommended.permanent_favourable),
            variable: or(variable, recommended.variable),
        })
    }

    /// The factor gamma_G,sup of permanent actions that are unfavourable.
    #[getter]
    const fn permanent(&self) -> f64 {
        self.0.permanent
    }

    /// The factor gamma_G,inf of permanent actions that are favourable.
    #[getter]
    const fn permanent_favourable(&self) -> f64 {
        self.0.permanent_favourable
    }

    /// The factor gamma_Q of variable actions that are unfavourable.
    #[getter]
    const fn variable(&self) -> f64 {
        self.0.variable
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        let keywords = PyDict::new(py);
        keywords.set_item("permanent", self.0.permanent)?;
        keywords.set_item("permanent_favourable", self.0.permanent_favourable)?;
        keywords.set_item("variable", self.0.variable)?;
        let recipe = Recipe::call(py, "PartialFactors", PyTuple::empty(py))?;
        recipe.with(&keywords).reduce(py)
    }

    fn __repr__(&self) -> String {
        format!(
            "PartialFactors(permanent={:?}, permanent_favourable={:?}, variable={:?})",
            self.0.permanent, self.0.permanent_favourable, self.0.variable
        )
    }
}

/// A combination of one's own: a factor for each action that takes part.
///
/// - name: the name by which its results are addressed
/// - factors: names of actions with their factors; an action that is not named has the factor 0
/// - ultimate: whether design strengths are compared under it
///
/// >>> OwnCombination("erection", {"roof": 1, "men": 1.5}, ultimate=False).factors
/// {'roof': 1.0, 'men': 1.5}
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct OwnCombination(pub(crate) member::OwnCombination);

#[pymethods]
impl OwnCombination {
    #[new]
    #[pyo3(signature = (name, factors, *, ultimate))]
    fn new(name: String, factors: &Bound<'_, PyMapping>, ultimate: bool) -> PyResult<Self> {
        let mut read = Vec::new();
        for item in factors.items()? {
            let (action, factor): (String, Number) = item.extract()?;
            read.push((action, factor.0));
        }
        Ok(Self(member::OwnCombination {
            name,
            factors: read,
            is_ultimate: ultimate,
        }))
    }

    /// The name.
    #[getter]
    fn name(&self) -> &str {
        &self.0.name
    }

    /// The factors by the names of their actions, in the order given.
    #[getter]
    fn factors<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyDict>> {
        let factors = PyDict::new(py);
        for (action, factor) in &self.0.factors {
            factors.set_item(action, factor)?;
        }
        Ok(factors)
    }

    /// Whether design strengths are compared under it.
    #[getter]
    const fn ultimate(&self) -> bool {
        self.0.is_ultimate
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        let keywords = PyDict::new(py);
        keywords.set_item("ultimate", self.0.is_ultimate)?;
        let args = (&self.0.name, self.factors(py)?);
        let recipe = Recipe::call(py, "OwnCombination", args)?;
        recipe.with(&keywords).reduce(py)
    }
}

record! {
    /// A sum of factored actions.
    Combination {
        /// The name by which results are addressed.
        name: String,
        /// The kind: "permanent", "quasi-permanent" (EN 1990:2002 eq. 6.16b), "characteristic"
        /// (eq. 6.14b), "frequent" (eq. 6.15b), "fundamental" (eq. 6.10), or "own".
        kind: String,
        /// One factor per action, in the order of the actions of the member.
        factors: Vec<f64>,
        /// Whether design strengths are compared under it.
        ultimate: bool,
    }
}

impl Combination {
    pub(crate) fn of(combination: &member::Combination) -> Self {
        let kind = match combination.kind() {
            CombinationKind::Permanent => "permanent",
            CombinationKind::QuasiPermanent => "quasi-permanent",
            CombinationKind::Characteristic => "characteristic",
            CombinationKind::Frequent => "frequent",
            CombinationKind::Fundamental => "fundamental",
            CombinationKind::Own | CombinationKind::OwnUltimate => "own",
        };
        Self {
            name: combination.name().to_owned(),
            kind: kind.to_owned(),
            factors: combination.factors().to_vec(),
            ultimate: combination.is_ultimate(),
        }
    }
}

/// Adds the classes to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_class::<PartialFactors>()?;
    module.add_class::<OwnCombination>()?;
    module.add_class::<Combination>()
}
