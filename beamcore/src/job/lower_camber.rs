//! The camber wish and the limits of the document.

use super::document_camber::{
    CamberDocument, ComponentDocument, LimitDocument, RoundingDocument, ShapeDocument, TimeDocument,
};
use crate::camber::{CamberPlan, Rounding, Shape, Trestles};
use crate::error::{ErrorKind, Problem};
use crate::limits::{Allowed, Component, Limit};
use crate::path;
use crate::time::Time;
use crate::units::Length;

/// The camber wish; `None` if a quantity of it cannot be read.
pub(super) fn plan(camber: &CamberDocument) -> Option<CamberPlan> {
    Some(CamberPlan {
        shape: match camber.shape {
            ShapeDocument::Parabola => Shape::Parabola,
            ShapeDocument::Mirror => Shape::Mirror,
            ShapeDocument::ArcThroughMiddle => Shape::ArcThroughMiddle,
            ShapeDocument::ArcLeastGap => Shape::ArcLeastGap,
        },
        combination: camber.combination.clone(),
        time: match camber.time {
            TimeDocument::Initial => Time::Initial,
            TimeDocument::Final => Time::Final,
        },
        fraction: camber.fraction,
        from: camber.from.clone(),
        to: camber.to.clone(),
        step: camber.step.value()?,
        rounding: match camber.rounding {
            RoundingDocument::Nearest => Rounding::Nearest,
            RoundingDocument::Down => Rounding::Down,
            RoundingDocument::Up => Rounding::Up,
        },
        least: match &camber.least {
            Some(least) => least.value()?,
            None => Length::ZERO,
        },
        divisions: camber.divisions,
    })
}

/// How the member stands when it is measured, if that is asked for.
pub(super) fn trestles(camber: &CamberDocument) -> Option<Option<Trestles>> {
    let trestles = camber.trestles.as_ref()?;
    let (left, right) = (trestles.left.value(), trestles.right.value());
    Some(left.zip(right).map(|(left, right)| Trestles {
        left,
        right,
        parts: trestles.parts.clone(),
    }))
}

/// The limits that are known.
pub(super) fn limits(documents: &[LimitDocument], problems: &mut Vec<Problem>) -> Vec<Limit> {
    let limit = |(i, document): (usize, &LimitDocument)| {
        let allowed = match (document.span_over, &document.value) {
            (Some(number), None) => Allowed::SpanOver(number),
            (None, Some(value)) => Allowed::Value(value.value()?),
            (Some(_), Some(_)) | (None, None) => {
                problems.push(Problem::new(
                    ErrorKind::Missing,
                    path::indexed("limits", i),
                    "not exactly one of span_over and value",
                    "the allowed deflection by one of them, for example span_over = 300",
                ));
                return None;
            }
        };
        Some(Limit {
            component: match document.component {
                ComponentDocument::WInst => Component::Instant,
                ComponentDocument::W1 => Component::Permanent,
                ComponentDocument::W2 => Component::Creep,
                ComponentDocument::W3 => Component::Variable,
                ComponentDocument::WTot => Component::Total,
                ComponentDocument::WMax => Component::Remaining,
            },
            allowed,
            span: document.span.clone(),
            combination: document.combination.clone(),
        })
    };
    documents.iter().enumerate().filter_map(limit).collect()
}
