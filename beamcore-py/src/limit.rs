//! The classes `Limit` and `LimitCheck`, and components of a deflection as texts.

use crate::camber::Camber;
use crate::convert::Inputs;
use crate::made::{Made, Recipe, Reduced};
use crate::operand::Number;
use crate::quantity::Quantity;
use crate::run::run;
use beamcore::Result;
use beamcore::choice::chosen;
use beamcore::limits::{self, Allowed, Component};
use pyo3::exceptions::PyTypeError;
use pyo3::prelude::*;
use pyo3::types::{PyDict, PyTuple};

/// The component of a symbol, for example "w_tot".
pub(crate) fn component(symbol: &str) -> Result<Component> {
    chosen(symbol, "component", &Component::ALL, Component::symbol)
}

/// A limit of a component of the deflection, by EN 1990:2002 A1.4.3.
///
/// - component: "w_inst" (characteristic combination, initial), "w_1" (permanent actions, initial),
///   "w_2" (what creep adds under permanent actions), "w_3" (what variable actions add, with the
///   creep under their quasi-permanent part), "w_tot" = w_1 + w_2 + w_3, or "w_max" = w_tot - w_c,
///   what is left after the camber w_c
/// - span_over: the length of the span over this number is allowed; or value: this length is
/// - span: the name of the span it holds for; all spans where there is none. The length of an
///   overhang is that of the overhang itself: where a code counts it twice, give it one of
///   its own
/// - combination: the combination it holds for; where there is none, every characteristic one
///
/// >>> Limit("w_max", span_over=300).span_over
/// 300.0
/// >>> Limit("w_inst", value=35*mm, span="left to right").value
/// 35 mm
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct Limit(Made<limits::Limit>);

#[pymethods]
impl Limit {
    #[new]
    #[pyo3(signature = (component, *, span_over=None, value=None, span=None, combination=None))]
    fn new<'py>(
        py: Python<'py>,
        component: &str,
        span_over: Option<Number>,
        value: Option<&Bound<'py, PyAny>>,
        span: Option<String>,
        combination: Option<String>,
    ) -> PyResult<Self> {
        let keywords = PyDict::new(py);
        let mut inputs = Inputs::default();
        let allowed = match (span_over, value) {
            (Some(number), None) => {
                keywords.set_item("span_over", number.0)?;
                Some(Allowed::SpanOver(number.0))
            }
            (None, Some(value)) => {
                keywords.set_item("value", value)?;
                inputs.read(value, "limit.value")?.map(Allowed::Value)
            }
            _ => {
                return Err(PyTypeError::new_err(
                    "Limit: not exactly one of span_over and value was given; the allowed \
                     deflection is needed by one of them, for example span_over=300",
                ));
            }
        };
        keywords.set_item("span", &span)?;
        keywords.set_item("combination", &combination)?;
        let recipe = Recipe::call(py, "Limit", (component,))?.with(&keywords);
        let part = inputs.checked(self::component(component));
        let limit = part.zip(allowed).map(|(component, allowed)| limits::Limit {
            component,
            allowed,
            span,
            combination,
        });
        Ok(Self(Made::new(inputs.done(py, limit)?, recipe)))
    }

    /// The symbol of the component it holds for.
    #[getter]
    fn component(&self) -> &'static str {
        self.0.component.symbol()
    }

    /// The number by which the length of the span is divided; None if a value is allowed.
    #[getter]
    fn span_over(&self) -> Option<f64> {
        match self.0.allowed {
            Allowed::SpanOver(number) => Some(number),
            Allowed::Value(_) => None,
        }
    }

    /// The allowed deflection; None if it depends on the span.
    #[getter]
    fn value(&self) -> Option<Quantity> {
        match self.0.allowed {
            Allowed::SpanOver(_) => None,
            Allowed::Value(value) => Some(Quantity::of(value)),
        }
    }

    /// The name of the span it holds for; None if it holds for all.
    #[getter]
    fn span(&self) -> Option<&str> {
        self.0.span.as_deref()
    }

    /// The name of the combination it holds for; None if it holds for every characteristic one.
    #[getter]
    fn combination(&self) -> Option<&str> {
        self.0.combination.as_deref()
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }
}

record! {
    /// A limit compared with the result in one span.
    LimitCheck {
        /// The symbol of the component.
        component: String,
        /// The name of the combination that gives the greatest value.
        combination: String,
        /// The name of the span.
        span: String,
        /// The greatest magnitude of the component, with its sign; positive downward.
        value: Quantity,
        /// The place of that value, from the left end of the member.
        at: Quantity,
        /// The allowed magnitude.
        allowed: Quantity,
        /// The ratio |value| / allowed; above 1 the limit is not kept.
        utilisation: f64,
    }
}

/// The limits compared with the results of a response.
pub(crate) fn checks<'py>(
    py: Python<'py>,
    response: &beamcore::response::Response,
    limits: &[Py<Limit>],
    camber: Option<&Bound<'py, Camber>>,
) -> PyResult<Bound<'py, PyTuple>> {
    let limits = limits.iter().map(|limit| limit.get().0.inner.clone());
    let limits: Vec<_> = limits.collect();
    let camber = camber.map(|camber| &camber.get().0.inner);
    let checks = run(py, || response.check_limits(&limits, camber))?;
    let checks = checks.into_iter().map(|check| LimitCheck {
        component: check.component.symbol().to_owned(),
        value: Quantity::of(check.found.value),
        at: Quantity::of(check.found.at),
        allowed: Quantity::of(check.allowed),
        utilisation: check.utilisation(),
        combination: check.combination,
        span: check.span,
    });
    PyTuple::new(py, checks.collect::<Vec<_>>())
}

/// Adds the classes to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_class::<Limit>()?;
    module.add_class::<LimitCheck>()
}
