//! Components, limits and camber of the outcome.

use super::document_deflection::{
    CamberOutcome, ComponentsOutcome, LimitOutcome, OrdinateOutcome, ReadingOutcome,
    RemainingOutcome, SpanComponentsOutcome,
};
use super::extremes::LengthExtreme;
use crate::camber::{Camber, Reading, Trestles};
use crate::error::Result;
use crate::limits::{Component, Limit, LimitCheck};
use crate::member::{Combination, CombinationKind, Span};
use crate::response::Response;
use crate::time::Time;
use crate::units::Length;

/// The components under each characteristic combination, span by span.
pub(super) fn components(
    response: &Response,
    camber: Option<&Camber>,
) -> Result<Vec<ComponentsOutcome>> {
    let member = response.member();
    let is_characteristic = |c: &&Combination| c.kind() == CombinationKind::Characteristic;
    member
        .combinations()
        .iter()
        .filter(is_characteristic)
        .map(|combination| {
            let spans = member.spans().iter();
            Ok(ComponentsOutcome {
                name: combination.name().into(),
                spans: spans
                    .map(|span| span_components(response, combination.name(), span, camber))
                    .collect::<Result<_>>()?,
            })
        })
        .collect()
}

fn span_components(
    response: &Response,
    combination: &str,
    span: &Span,
    camber: Option<&Camber>,
) -> Result<SpanComponentsOutcome> {
    let greatest = |component: Component| -> Result<LengthExtreme> {
        let line = response.deflection_component(component, combination, span.name(), camber)?;
        Ok(line.greatest().into())
    };
    Ok(SpanComponentsOutcome {
        name: span.name().into(),
        w_c: response
            .camber_of_span(camber, span.name())?
            .greatest()
            .into(),
        w_inst: greatest(Component::Instant)?,
        w_1: greatest(Component::Permanent)?,
        w_2: greatest(Component::Creep)?,
        w_3: greatest(Component::Variable)?,
        w_tot: greatest(Component::Total)?,
        w_max: greatest(Component::Remaining)?,
    })
}

/// The limits, compared.
pub(super) fn limits(
    response: &Response,
    limits: &[Limit],
    camber: Option<&Camber>,
) -> Result<Vec<LimitOutcome>> {
    let outcome = |check: LimitCheck| LimitOutcome {
        component: check.component.symbol().into(),
        utilisation: check.utilisation(),
        span: check.span,
        combination: check.combination,
        value_m: check.found.value.to_m(),
        at_m: check.found.at.to_m(),
        allowed_m: check.allowed.to_m(),
    };
    let checks = response.check_limits(limits, camber)?;
    Ok(checks.into_iter().map(outcome).collect())
}

/// The camber, what remains after it, and the readings to expect.
pub(super) fn camber(
    response: &Response,
    camber: &Camber,
    trestles: Option<&Trestles>,
) -> Result<CamberOutcome> {
    let remaining = response.member().combinations().iter().map(|combination| {
        let name = combination.name();
        Ok(RemainingOutcome {
            name: name.into(),
            initial: (&response.remaining(name, Time::Initial, camber)?).into(),
            end: (&response.remaining(name, Time::Final, camber)?).into(),
        })
    });
    let readings = match trestles {
        Some(trestles) => response.readings(camber, trestles)?,
        None => Vec::new(),
    };
    let reading = |reading: &Reading| ReadingOutcome {
        station_m: reading.station.to_m(),
        lying_m: reading.lying.to_m(),
        standing_m: reading.standing.to_m(),
    };
    let ordinates = camber.ordinates().iter().map(|ordinate| OrdinateOutcome {
        station_m: ordinate.station.to_m(),
        ordinate_m: ordinate.ordinate.to_m(),
    });
    Ok(CamberOutcome {
        shape: camber.shape().name().into(),
        radius_m: camber.radius().map(|radius| radius.to_m()),
        target_m: camber.target().to_m(),
        rise_m: camber.rise().to_m(),
        chord_from_m: camber.chord().0.to_m(),
        chord_to_m: camber.chord().1.to_m(),
        left_end_m: camber.ordinate(Length::ZERO)?.to_m(),
        right_end_m: camber.ordinate(response.member().length())?.to_m(),
        ordinates: ordinates.collect(),
        remaining: remaining.collect::<Result<_>>()?,
        readings: readings.iter().map(reading).collect(),
    })
}
