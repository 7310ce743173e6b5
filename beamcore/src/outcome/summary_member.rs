//! The member in the summary.

use super::document::OutcomeDocument;
use super::document_section::PartOutcome;
use super::figure::figure;
use super::page::Page;
use super::summary::short_to;
use super::summary_layers;

/// The member with its sections, supports and actions.
pub(super) fn description(page: &mut Page, outcome: &OutcomeDocument) {
    page.heading("MEMBER");
    let member = &outcome.member;
    let mass = member
        .mass_kg
        .map_or_else(String::new, |mass| format!(", {} kg", figure(mass, 0)));
    let pitch = outcome.job.member.pitch();
    let pitch = pitch.map_or_else(String::new, |pitch| {
        format!(", rising to the right by {pitch}")
    });
    let count = match member.quantity {
        1 => String::new(),
        many => format!(", {many} of them"),
    };
    page.line(&format!(
        "Length {} m{pitch}{mass}{count}",
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
    parts(page, &outcome.section.parts);
    let (now, end) = (&outcome.section.initial, &outcome.section.end);
    page.line(&format!(
        "Bending stiffness EI {} kN m2 now, {} kN m2 final{}",
        figure(now.bending_stiffness_yy_Nm2 / 1e3, 1),
        figure(end.bending_stiffness_yy_Nm2 / 1e3, 1),
        if outcome.section.joints.is_empty() {
            ""
        } else {
            ", with rigid joints"
        }
    ));
    if let (Some(now), Some(end)) = (now.shear_stiffness_N, end.shear_stiffness_N) {
        page.line(&format!(
            "Shear stiffness kGA {} kN now, {} kN final",
            figure(now / 1e3, 0),
            figure(end / 1e3, 0)
        ));
    }
    page.line(&format!(
        "Elastic centroid at z = {} mm now, {} mm final",
        figure(now.centroid_z_m * 1e3, 1),
        figure(end.centroid_z_m * 1e3, 1)
    ));
    for change in &outcome.member.changes {
        page.line(&format!(
            "Section \"{}\" from {} m on:",
            change.section,
            figure(change.to_m, 3)
        ));
        parts(page, &change.parts);
        page.line(&format!(
            "Bending stiffness EI {} kN m2 now, {} kN m2 final",
            figure(change.initial.bending_stiffness_yy_Nm2 / 1e3, 1),
            figure(change.end.bending_stiffness_yy_Nm2 / 1e3, 1)
        ));
    }
    summary_layers::joints(page, outcome);
    page.blank();
    for action in &outcome.job.actions {
        page.line(&format!(
            "Action \"{}\": {}",
            action.name,
            action.described()
        ));
    }
}

/// A row for each part.
fn parts(page: &mut Page, parts: &[PartOutcome]) {
    for part in parts {
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
}

/// A size in mm, with a decimal only where it has one.
fn trimmed(size: f64) -> String {
    let text = figure(size, 1);
    text.strip_suffix(".0")
        .map_or_else(|| text.clone(), Into::into)
}
