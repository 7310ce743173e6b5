//! Limits of the deflection, and how far they are used.

use super::Component;
use crate::camber::Camber;
use crate::check;
use crate::error::{Error, ErrorKind, Problem, Result};
use crate::field::Extreme;
use crate::lookup;
use crate::member::{Combination, CombinationKind, Span};
use crate::path;
use crate::response::Response;
use crate::units::Length;

/// A limit of a component of the deflection.
#[derive(Clone, Debug, PartialEq)]
pub struct Limit {
    /// Which component it holds for.
    pub component: Component,
    /// The allowed value.
    pub allowed: Allowed,
    /// The span it holds for; all spans where there is none. The length of a span is that of the
    /// span itself, of an overhang too: where a code counts twice the overhang, give it a limit of
    /// its own.
    pub span: Option<String>,
    /// The combination it holds for; where there is none, every characteristic one.
    pub combination: Option<String>,
}

/// An allowed deflection.
#[derive(Clone, Copy, Debug, PartialEq)]
pub enum Allowed {
    /// The length of the span over this number.
    SpanOver(f64),
    /// A length, whatever the span.
    Value(Length),
}

/// A limit compared with the result.
#[derive(Clone, Debug, PartialEq)]
pub struct LimitCheck {
    /// The component.
    pub component: Component,
    /// The combination that gives the greatest value.
    pub combination: String,
    /// The span.
    pub span: String,
    /// The greatest magnitude of the component, with its sign and place.
    pub found: Extreme<Length>,
    /// The allowed magnitude.
    pub allowed: Length,
}

impl LimitCheck {
    /// |found| / allowed; above 1 the limit is not kept.
    #[must_use]
    pub fn utilisation(&self) -> f64 {
        self.found.value.abs() / self.allowed
    }
}

impl Limit {
    /// Everything that is wrong with the limit, the one at `index` of the document.
    pub(crate) fn problems(
        &self,
        index: usize,
        spans: &[&str],
        combinations: &[Combination],
    ) -> Vec<Problem> {
        let mut problems = Vec::new();
        let base = path::indexed("limits", index);
        match self.allowed {
            Allowed::SpanOver(number) => {
                let at = path::key(&base, "span_over");
                check::between(&mut problems, number, 1.0, 100_000.0, &at);
            }
            Allowed::Value(length) => {
                check::positive(&mut problems, length, &path::key(&base, "value"));
            }
        }
        let names: Vec<_> = combinations.iter().map(Combination::name).collect();
        for (key, name, known) in [
            ("span", &self.span, spans),
            ("combination", &self.combination, names.as_slice()),
        ] {
            if let Some(name) = name
                && !known.contains(&name.as_str())
            {
                problems.push(Problem::new(
                    ErrorKind::Name,
                    path::key(&base, key),
                    format!("the unknown {key} \"{name}\""),
                    format!("one of {}", lookup::listed(known)),
                ));
            }
        }
        problems
    }
}

impl Response {
    /// Compares the limits with the results, one check per limit and span, each under the
    /// combination that uses it most.
    ///
    /// # Errors
    /// All of: a span or combination that is not there, an allowed value that is not positive.
    pub fn check_limits(
        &self,
        limits: &[Limit],
        camber: Option<&Camber>,
    ) -> Result<Vec<LimitCheck>> {
        let member = self.member();
        let names: Vec<_> = member.spans().iter().map(Span::name).collect();
        let problems = limits
            .iter()
            .enumerate()
            .flat_map(|(i, limit)| limit.problems(i, &names, member.combinations()));
        Error::check(problems.collect())?;
        let mut checks = Vec::new();
        for limit in limits {
            for span in member.spans() {
                if limit.span.as_ref().is_none_or(|name| name == span.name()) {
                    checks.push(self.check_limit(limit, span, camber)?);
                }
            }
        }
        Ok(checks)
    }

    fn check_limit(
        &self,
        limit: &Limit,
        span: &Span,
        camber: Option<&Camber>,
    ) -> Result<LimitCheck> {
        let allowed = match limit.allowed {
            Allowed::SpanOver(number) => span.length() / number,
            Allowed::Value(length) => length,
        };
        let applies = |combination: &&Combination| match &limit.combination {
            Some(name) => combination.name() == name,
            None => combination.kind() == CombinationKind::Characteristic,
        };
        let mut worst: Option<LimitCheck> = None;
        for combination in self.member().combinations().iter().filter(applies) {
            let name = combination.name();
            let line = self.deflection_component(limit.component, name, span.name(), camber)?;
            let found = line.greatest();
            if worst
                .as_ref()
                .is_none_or(|worst| found.value.abs() > worst.found.value.abs())
            {
                worst = Some(LimitCheck {
                    component: limit.component,
                    combination: name.into(),
                    span: span.name().into(),
                    found,
                    allowed,
                });
            }
        }
        Ok(worst.expect("a member has a characteristic combination, and named ones are checked"))
    }
}
