//! Layers and joints in the summary.

use super::document::OutcomeDocument;
use super::document_layers::{JointOutcome, JointStretchOutcome};
use super::figure::figure;
use super::notes::each;
use super::page::Page;
use super::summary::short_to;

/// The joints of the section.
pub(super) fn joints(page: &mut Page, outcome: &OutcomeDocument) {
    if outcome.section.joints.is_empty() {
        return;
    }
    page.blank();
    for joint in &outcome.section.joints {
        page.line(&format!(
            "Joint \"{}\": {} between \"{}\" and \"{}\", at z = {} mm{}",
            joint.name,
            kind(joint),
            joint.lower,
            joint.upper,
            figure(height(joint.z_m) * 1e3, 1),
            match joint.clearance_m {
                Some(clearance) => format!(", clearance {} mm", figure(clearance * 1e3, 2)),
                None => String::new(),
            }
        ));
        for stretch in &joint.stretches {
            moduli(page, stretch);
        }
    }
}

/// A height without the rounding of coordinates: below a nanometre it is zero.
fn height(z: f64) -> f64 {
    if z.abs() < 1e-9 { 0.0 } else { z }
}

fn kind(joint: &JointOutcome) -> String {
    match &joint.fasteners {
        Some(fasteners) => format!(
            "fasteners of {} N/mm each, rows {}, shear planes {},",
            figure(fasteners.stiffness_N_per_m / 1e3, 0),
            fasteners.rows,
            fasteners.planes
        ),
        None => joint.kind.clone(),
    }
}

/// The moduli of a joint over one stretch.
fn moduli(page: &mut Page, stretch: &JointStretchOutcome) {
    let mpa = |value: f64| figure(value / 1e6, 2);
    let mut row = |what: &str, now: f64, end: f64| {
        page.line(&format!(
            "  {} m to {} m: {what} {} N/mm2 now, {} N/mm2 final",
            figure(stretch.from_m, 3),
            figure(stretch.to_m, 3),
            mpa(now),
            mpa(end)
        ));
    };
    row(
        "slip modulus",
        stretch.modulus_initial_N_per_m2,
        stretch.modulus_final_N_per_m2,
    );
    if let (Some(now), Some(end)) = (
        stretch.transverse_initial_N_per_m2,
        stretch.transverse_final_N_per_m2,
    ) {
        row("square to it", now, end);
    }
}

/// What happens in joints and layers under the combinations that are judged.
pub(super) fn results(page: &mut Page, outcome: &OutcomeDocument) {
    let is_shown = |name: &str| !matches!(name, "permanent" | "frequent");
    let shown = || each(outcome).filter(|(combination, ..)| is_shown(&combination.name));
    if shown().all(|(_, _, results)| results.layers.is_empty()) {
        return;
    }
    page.heading("JOINTS (slip and flow: upper layer against lower; pressure: pressing positive)");
    page.line("Joint       Combination            Time     Slip, mm  Flow, kN/m  Least pressure");
    for joint in &outcome.section.joints {
        for (combination, time, results) in shown() {
            let Some(found) = results.joints.iter().find(|j| j.name == joint.name) else {
                continue;
            };
            page.line(&format!(
                "{:<11} {:<22} {:<8} {:>8} {:>11} {:>10} kN/m",
                short_to(&joint.name, 11),
                short_to(&combination.name, 22),
                time.name(),
                figure(found.slip.greatest.value_m * 1e3, 3),
                figure(found.flow.greatest.value_N_per_m / 1e3, 2),
                figure(found.pressure.minimum.value_N_per_m / 1e3, 2)
            ));
        }
    }
    page.heading("LAYERS (axial force, tension positive; moment about the layer's own centroid)");
    let own = shown().any(|(_, _, results)| results.layers.iter().any(|l| l.deflection.is_some()));
    let head = if own { "  Deflection" } else { "" };
    page.line(&format!(
        "Layer       Combination            Time       N, kN     M, kN m{head}"
    ));
    for layer in &outcome.section.layers {
        for (combination, time, results) in shown() {
            let Some(found) = results.layers.iter().find(|l| l.name == layer.name) else {
                continue;
            };
            let own = found.deflection.as_ref().map_or_else(String::new, |line| {
                format!("{} mm", figure(line.greatest.value_m * 1e3, 1))
            });
            page.line(&format!(
                "{:<11} {:<22} {:<8} {:>8} {:>11} {own:>11}",
                short_to(&layer.name, 11),
                short_to(&combination.name, 22),
                time.name(),
                figure(found.axial.greatest.value_N / 1e3, 2),
                figure(found.moment.greatest.value_Nm / 1e3, 2)
            ));
        }
    }
    composite(page, outcome);
    for anchor in &outcome.job.member.anchors {
        for (combination, time, results) in shown() {
            if let Some(found) = results.anchors.iter().find(|a| a.name == anchor.name) {
                page.line(&format!(
                    "Anchor \"{}\": {} kN ({}, {time})",
                    anchor.name,
                    figure(found.force_N / 1e3, 2),
                    combination.name
                ));
            }
        }
    }
}

/// How far the joints make the layers act together.
fn composite(page: &mut Page, outcome: &OutcomeDocument) {
    let found = || {
        each(outcome).filter_map(|(combination, time, results)| {
            let action = results.composite_action.as_ref()?;
            Some((&combination.name, time, action))
        })
    };
    if found().next().is_none() {
        return;
    }
    page.heading("COMPOSITE ACTION UNDER LOADS (greatest w; with all joints loose; all rigid)");
    page.line("Combination            Time     Degree   w, mm   loose   rigid  Effective EI");
    for (combination, time, action) in found() {
        page.line(&format!(
            "{:<22} {:<8} {:>4} % {:>7} {:>7} {:>7} {:>8} kN m2",
            short_to(combination, 22),
            time.name(),
            figure(action.degree * 100.0, 0),
            figure(action.deflection_m * 1e3, 1),
            figure(action.loose_m * 1e3, 1),
            figure(action.rigid_m * 1e3, 1),
            figure(action.effective_stiffness_Nm2 / 1e3, 1)
        ));
    }
}
