//! Deflections, limits and camber in the summary.

use super::document::{OutcomeDocument, ResultsOutcome};
use super::extremes::LengthExtreme;
use super::figure::figure;
use super::page::Page;
use super::summary::short_to;

/// The greatest deflection under each combination.
pub(super) fn greatest(page: &mut Page, outcome: &OutcomeDocument) {
    page.heading("GREATEST DEFLECTION (downward positive)");
    page.line("Combination                           instant             final");
    for combination in &outcome.combinations {
        let cell = |results: &ResultsOutcome| at(&results.deflection.greatest);
        page.line(&format!(
            "{:<30} {:>20} {:>20}",
            short_to(&combination.name, 30),
            cell(&combination.initial),
            cell(&combination.end)
        ));
        // A member of several spans is looked at span by span.
        for (initial, end) in combination.initial.spans.iter().zip(&combination.end.spans) {
            if combination.initial.spans.len() > 1 {
                page.line(&format!(
                    "  {:<28} {:>20} {:>20}",
                    short_to(&initial.name, 28),
                    at(&initial.deflection.greatest),
                    at(&end.deflection.greatest)
                ));
            }
        }
    }
}

/// A deflection with its place.
fn at(greatest: &LengthExtreme) -> String {
    let (value, at) = (figure(greatest.value_m * 1e3, 1), figure(greatest.at_m, 2));
    format!("{value:>7} mm at {at} m")
}

/// The components of the deflection, span by span.
pub(super) fn components(page: &mut Page, outcome: &OutcomeDocument) {
    page.heading("COMPONENTS OF THE DEFLECTION, mm (EN 1990 A1.4.3)");
    page.line("w_c camber; w_inst instant; w_1 permanent, instant; w_2 creep under permanent");
    page.line("load; w_3 variable, with its creep; w_tot = w_1 + w_2 + w_3; w_max = w_tot - w_c");
    page.line("Span                             w_c w_inst    w_1    w_2    w_3  w_tot  w_max");
    for combination in &outcome.components {
        page.line(&format!("under the {} combination", combination.name));
        for span in &combination.spans {
            let cell = |extreme: &LengthExtreme| figure(extreme.value_m * 1e3, 1);
            page.line(&format!(
                "{:<29} {:>6} {:>6} {:>6} {:>6} {:>6} {:>6} {:>6}",
                short_to(&span.name, 29),
                cell(&span.w_c),
                cell(&span.w_inst),
                cell(&span.w_1),
                cell(&span.w_2),
                cell(&span.w_3),
                cell(&span.w_tot),
                cell(&span.w_max),
            ));
        }
    }
}

/// The limits and how far they are used.
pub(super) fn limits(page: &mut Page, outcome: &OutcomeDocument) {
    if outcome.limits.is_empty() {
        return;
    }
    page.heading("LIMITS OF THE DEFLECTION");
    page.line("Limit   Span                         Found, mm   Allowed, mm   Used");
    for limit in &outcome.limits {
        page.line(&format!(
            "{:<7} {:<27} {:>10} {:>13} {:>6}",
            limit.component,
            short_to(&limit.span, 27),
            figure(limit.value_m * 1e3, 1),
            figure(limit.allowed_m * 1e3, 1),
            figure(limit.utilisation, 2),
        ));
    }
}

/// The camber, what remains after it, and the readings to expect.
pub(super) fn camber(page: &mut Page, outcome: &OutcomeDocument) {
    let Some(camber) = &outcome.camber else {
        return;
    };
    page.heading("CAMBER TO BUILD IN");
    page.line(&format!(
        "Rise {} mm at the middle of the chord (wanted {} mm), {}",
        figure(camber.rise_m * 1e3, 1),
        figure(camber.target_m * 1e3, 1),
        camber.shape.replace('_', " ")
    ));
    if let Some(radius) = camber.radius_m {
        page.line(&format!("Radius {} m", figure(radius, 1)));
    }
    page.line(&format!(
        "Chord from {} m to {} m of the member; ordinates upward from the chord,",
        figure(camber.chord_from_m, 3),
        figure(camber.chord_to_m, 3)
    ));
    page.line("member unloaded, as when it lies on its side");
    page.blank();
    let standing = !camber.readings.is_empty();
    page.line(if standing {
        "Station from the left end of the chord, m   Ordinate, mm   On its trestles, mm"
    } else {
        "Station from the left end of the chord, m   Ordinate, mm"
    });
    for (i, ordinate) in camber.ordinates.iter().enumerate() {
        let reading = camber.readings.get(i);
        let reading = reading.map_or_else(String::new, |r| figure(r.standing_m * 1e3, 1));
        page.line(&format!(
            "{:>20} {:>35} {reading:>21}",
            figure(ordinate.station_m, 3),
            figure(ordinate.ordinate_m * 1e3, 1),
        ));
    }
    if camber.chord_from_m > 0.0 || camber.chord_to_m < outcome.member.length_m {
        page.line(&format!(
            "The member's ends stand at {} mm (left) and {} mm (right) from the chord",
            figure(camber.left_end_m * 1e3, 1),
            figure(camber.right_end_m * 1e3, 1)
        ));
    }
    page.blank();
    page.line("Greatest deflection that remains after the camber (negative: crowned)");
    for remaining in &camber.remaining {
        page.line(&format!(
            "{:<30} {:>9} mm instant {:>9} mm final",
            short_to(&remaining.name, 30),
            figure(remaining.initial.greatest.value_m * 1e3, 1),
            figure(remaining.end.greatest.value_m * 1e3, 1),
        ));
    }
}
