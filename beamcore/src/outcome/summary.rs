//! The outcome as a plain text of 80 columns, the governing results first.

#![allow(
    non_snake_case,
    reason = "the units in the names keep their case: N is not n"
)]

use super::document::{OutcomeDocument, ResultsOutcome, StrengthOutcome};
use super::figure::figure;
use super::notes::each;
use super::page::Page;
use super::{
    summary_deflection as deflection, summary_layers as layers, summary_member as member,
    summary_reactions as reactions,
};
use crate::time::Time;

/// The summary of an outcome.
pub(super) fn text(outcome: &OutcomeDocument) -> String {
    let mut page = Page::default();
    page.title(&format!("{} - {}", outcome.job.mark, outcome.job.title));
    page.line(&format!(
        "Calculated by beamcore {}. All results are the engineer's responsibility.",
        outcome.beamcore
    ));
    governing(&mut page, outcome);
    member::description(&mut page, outcome);
    deflection::greatest(&mut page, outcome);
    deflection::components(&mut page, outcome);
    deflection::limits(&mut page, outcome);
    stresses(&mut page, outcome);
    strengths(&mut page, outcome);
    layers::results(&mut page, outcome);
    axial(&mut page, outcome);
    reactions::reactions(&mut page, outcome);
    super::summary_simplified::table(&mut page, outcome);
    deflection::camber(&mut page, outcome);
    page.list("ASSUMED", &outcome.assumptions);
    page.list("RULES", &outcome.rules);
    page.list("LOOK AT", &outcome.warnings);
    page.list("NOT CHECKED", &outcome.not_checked);
    page.text()
}

fn governing(page: &mut Page, outcome: &OutcomeDocument) {
    page.heading("GOVERNING");
    let mut worst: Option<(f64, String)> = None;
    for (combination, time, results) in each(outcome) {
        for stress in &results.stresses {
            let Some(utilisation) = &stress.utilisation else {
                continue;
            };
            if worst
                .as_ref()
                .is_none_or(|(value, _)| utilisation.value > *value)
            {
                let place = format!(
                    "{} of \"{}\" at {} m, {} combination, {time}",
                    figure(utilisation.value, 2),
                    stress.name,
                    figure(utilisation.at_m, 3),
                    combination.name
                );
                worst = Some((utilisation.value, place));
            }
        }
    }
    match worst {
        Some((value, place)) => {
            let verdict = if value > 1.0 {
                "OVERSTRESSED"
            } else {
                "within its strength"
            };
            page.line(&format!("Strength used to {place}: {verdict}"));
        }
        None => page.line("Strength: no design strengths were given, none was checked"),
    }
    let worst = outcome
        .limits
        .iter()
        .max_by(|a, b| a.utilisation.total_cmp(&b.utilisation));
    if let Some(limit) = worst {
        let verdict = if limit.utilisation > 1.0 {
            "LIMIT NOT KEPT"
        } else {
            "within the limit"
        };
        page.line(&format!(
            "Deflection {} of \"{}\" {} mm of {} mm allowed, used to {}: {verdict}",
            limit.component,
            limit.span,
            figure(limit.value_m * 1e3, 1),
            figure(limit.allowed_m * 1e3, 1),
            figure(limit.utilisation, 2)
        ));
    }
    for (combination, time, results) in each(outcome) {
        if combination.name == "quasi-permanent" && time == Time::Final {
            let greatest = &results.deflection.greatest;
            page.line(&format!(
                "Lasting deflection {} mm at {} m, quasi-permanent combination, final",
                figure(greatest.value_m * 1e3, 1),
                figure(greatest.at_m, 3)
            ));
        }
    }
}

fn stresses(page: &mut Page, outcome: &OutcomeDocument) {
    page.heading("GREATEST NORMAL STRESS, N/mm2 (tension positive)");
    page.line("Part            Combination                Time      Tension Compression   Used");
    // All parts along the member, those of other sections too.
    let parts = each(outcome).next().map(|(.., results)| &results.stresses);
    for name in parts.into_iter().flatten().map(|stress| &stress.name) {
        for (combination, time, results) in each(outcome) {
            if matches!(combination.name.as_str(), "permanent" | "frequent") {
                continue;
            }
            let Some(stress) = results.stresses.iter().find(|stress| stress.name == *name) else {
                continue;
            };
            let used = stress
                .utilisation
                .as_ref()
                .map_or_else(String::new, |u| figure(u.value, 2));
            page.line(&format!(
                "{:<15} {:<26} {:<8} {:>8} {:>11} {used:>6}",
                short_to(name, 15),
                short_to(&combination.name, 26),
                time.name(),
                figure(stress.tension.value_Pa / 1e6, 2),
                figure(stress.compression.value_Pa / 1e6, 2),
            ));
        }
    }
}

/// The greatest axial force, where it takes part.
fn axial(page: &mut Page, outcome: &OutcomeDocument) {
    if !outcome.member.axial_force {
        return;
    }
    page.heading("GREATEST AXIAL FORCE, kN (tension positive)");
    page.line("Combination                           instant             final");
    for combination in &outcome.combinations {
        let cell = |results: &ResultsOutcome| {
            let greatest = &results.axial.greatest;
            let (value, at) = (figure(greatest.value_N / 1e3, 2), figure(greatest.at_m, 2));
            format!("{value:>7} at {at} m")
        };
        page.line(&format!(
            "{:<30} {:>20} {:>20}",
            short_to(&combination.name, 30),
            cell(&combination.initial),
            cell(&combination.end)
        ));
    }
}

/// The design strengths that the stresses were compared with.
fn strengths(page: &mut Page, outcome: &OutcomeDocument) {
    for material in &outcome.materials {
        let Some(strength) = &material.design_strength else {
            continue;
        };
        let mpa = |value: f64| figure(value / 1e6, 2);
        let values = match strength {
            StrengthOutcome::Timber {
                bending_Pa,
                tension_Pa,
                compression_Pa,
            } => format!(
                "bending {}, tension {}, compression {}",
                mpa(*bending_Pa),
                mpa(*tension_Pa),
                mpa(*compression_Pa)
            ),
            StrengthOutcome::Metal { yield_Pa } => format!("yield {}", mpa(*yield_Pa)),
        };
        page.line(&format!(
            "Design strength of \"{}\": {values} N/mm2",
            material.name
        ));
    }
}

/// A name cut to a width in its middle, with a mark there: what tells names apart is often their
/// end.
pub(super) fn short_to(name: &str, width: usize) -> String {
    let count = name.chars().count();
    if count <= width {
        return name.into();
    }
    let head = (width - 2) / 2;
    let tail = width - 2 - head;
    let start: String = name.chars().take(head).collect();
    let end: String = name.chars().skip(count - tail).collect();
    format!("{start}..{end}")
}
