//! Reactions in the summary.

use super::document::{OutcomeDocument, ResultsOutcome};
use super::figure::figure;
use super::page::Page;
use super::summary::short_to;

/// The reactions of all supports.
pub(super) fn reactions(page: &mut Page, outcome: &OutcomeDocument) {
    page.heading("REACTIONS (force upward positive, couple clockwise positive)");
    if outcome.member.axial_force {
        page.line("kN ->: the level force, positive to the right");
    }
    page.line("Support         Combination                       instant        final");
    for support in outcome
        .job
        .member
        .supports
        .iter()
        .map(|support| &support.name)
    {
        for combination in &outcome.combinations {
            let of = |results: &ResultsOutcome| {
                let found = results
                    .reactions
                    .iter()
                    .find(|reaction| reaction.name == *support);
                found.map_or((0.0, 0.0, 0.0), |reaction| {
                    (reaction.force_N, reaction.couple_Nm, reaction.along_N)
                })
            };
            let (now, end) = (of(&combination.initial), of(&combination.end));
            let mut row = |now: f64, end: f64, unit: &str| {
                page.line(&format!(
                    "{:<15} {:<28} {:>9} {unit} {:>9} {unit}",
                    short_to(support, 15),
                    short_to(&combination.name, 28),
                    figure(now / 1e3, 2),
                    figure(end / 1e3, 2),
                ));
            };
            row(now.0, end.0, "kN  ");
            if now.1 != 0.0 || end.1 != 0.0 {
                row(now.1, end.1, "kN m");
            }
            if outcome.member.axial_force {
                row(now.2, end.2, "kN ->");
            }
        }
    }
}
