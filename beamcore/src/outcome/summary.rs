//! The outcome as a plain text of 80 columns, the governing results first.

#![allow(
    non_snake_case,
    reason = "the units in the names keep their case: N is not n"
)]

use super::document::{OutcomeDocument, ResultsOutcome, StrengthOutcome};
use super::figure::figure;
use super::notes::each;
use super::page::Page;
use super::summary_deflection as deflection;
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
    description(&mut page, outcome);
    deflection::greatest(&mut page, outcome);
    deflection::components(&mut page, outcome);
    deflection::limits(&mut page, outcome);
    stresses(&mut page, outcome);
    strengths(&mut page, outcome);
    reactions(&mut page, outcome);
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

fn description(page: &mut Page, outcome: &OutcomeDocument) {
    page.heading("MEMBER");
    let member = &outcome.member;
    let mass = member
        .mass_kg
        .map_or_else(String::new, |mass| format!(", {} kg", figure(mass, 0)));
    let count = match member.quantity {
        1 => String::new(),
        many => format!(", {many} of them"),
    };
    page.line(&format!(
        "Length {} m{mass}{count}",
        figure(member.length_m, 3)
    ));
    for support in &outcome.job.member.supports {
        page.line(&format!(
            "Support \"{}\": {}",
            support.name,
            support.described()
        ));
    }
    let lines = &outcome.job.member;
    for change in &lines.changes {
        page.line(&format!("Change of section: {}", change.described()));
    }
    for hinge in &lines.hinges {
        page.line(&format!("Hinge: {}", hinge.described()));
    }
    for anchor in &lines.anchors {
        page.line(&format!(
            "Anchor \"{}\": {}",
            anchor.name,
            anchor.described()
        ));
    }
    page.blank();
    page.line("Part             Material        Outline, width x height  E now E final Share");
    page.line("                                            mm           N/mm2   N/mm2 of EI");
    for part in &outcome.section.parts {
        let shape = match part.outline.as_str() {
            "rectangle" => String::new(),
            other => format!("{} ", other.replace('_', " ")),
        };
        let size = format!(
            "{shape}{} x {}",
            trimmed((part.right_m - part.left_m) * 1e3),
            trimmed((part.top_m - part.bottom_m) * 1e3)
        );
        page.line(&format!(
            "{:<16} {:<15} {size:<22} {:>7} {:>7} {:>3} %",
            short_to(&part.name, 16),
            short_to(&part.material, 15),
            figure(part.initial.modulus_Pa / 1e6, 0),
            figure(part.end.modulus_Pa / 1e6, 0),
            figure(part.initial.share * 100.0, 0),
        ));
    }
    let (now, end) = (&outcome.section.initial, &outcome.section.end);
    page.line(&format!(
        "Bending stiffness EI {} kN m2 now, {} kN m2 final",
        figure(now.bending_stiffness_yy_Nm2 / 1e3, 1),
        figure(end.bending_stiffness_yy_Nm2 / 1e3, 1)
    ));
    page.line(&format!(
        "Elastic centroid at z = {} mm now, {} mm final",
        figure(now.centroid_z_m * 1e3, 1),
        figure(end.centroid_z_m * 1e3, 1)
    ));
    page.blank();
    for action in &outcome.job.actions {
        page.line(&format!(
            "Action \"{}\": {}",
            action.name,
            action.described()
        ));
    }
}

fn stresses(page: &mut Page, outcome: &OutcomeDocument) {
    page.heading("GREATEST NORMAL STRESS, N/mm2 (tension positive)");
    page.line("Part            Combination                Time      Tension Compression   Used");
    for name in outcome.section.parts.iter().map(|part| &part.name) {
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

fn reactions(page: &mut Page, outcome: &OutcomeDocument) {
    page.heading("REACTIONS (force upward positive, couple clockwise positive)");
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
                found.map_or((0.0, 0.0), |reaction| {
                    (reaction.force_N, reaction.couple_Nm)
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
        }
    }
}

/// A size in mm, with a decimal only where it has one.
fn trimmed(size: f64) -> String {
    let text = figure(size, 1);
    text.strip_suffix(".0")
        .map_or_else(|| text.clone(), Into::into)
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
