//! The simplified methods beside the exact solution, in the summary.

use super::document::OutcomeDocument;
use super::document_simplified::SimplifiedSpanOutcome;
use super::figure::figure;
use super::page::Page;

/// Per method, combination, time and span: deflection and flow by the method and exactly.
pub(super) fn table(page: &mut Page, outcome: &OutcomeDocument) {
    for method in &outcome.simplified {
        page.heading(&match method.name.as_str() {
            "gamma" => "GAMMA METHOD (EN 1995-1-1:2004 ANNEX B) BESIDE THE EXACT SOLUTION".into(),
            _ => format!(
                "{} METHOD BESIDE THE EXACT SOLUTION",
                method.name.to_uppercase()
            ),
        });
        for combination in &method.combinations {
            for (time, state) in [
                ("initial", &combination.initial),
                ("final", &combination.end),
            ] {
                for span in &state.spans {
                    page.line(&format!("{}, {time}, {}", combination.name, span.name));
                    lines(page, span);
                }
            }
        }
        page.list("LIMITS OF THE METHOD", &method.limits);
    }
}

fn lines(page: &mut Page, span: &SimplifiedSpanOutcome) {
    let factors: Vec<_> = span.factors.iter().map(|g| figure(*g, 4)).collect();
    let factors = if factors.is_empty() {
        String::new()
    } else {
        format!(", gamma {} (from the lowest layer)", factors.join(", "))
    };
    page.line(&format!(
        "  EI_ef {} kN m2 over {} m{factors}",
        figure(span.bending_stiffness_Nm2 / 1e3, 1),
        figure(span.length_m, 3)
    ));
    page.line(&format!(
        "  deflection {} mm, exact {} mm: {} %",
        figure(span.deflection.value_m * 1e3, 2),
        figure(span.exact_deflection.value_m * 1e3, 2),
        figure(span.difference * 100.0, 1)
    ));
    for joint in &span.joints {
        page.line(&format!(
            "  flow of \"{}\" {} kN/m, exact {} kN/m",
            joint.name,
            figure(joint.flow.value_N_per_m.abs() / 1e3, 2),
            figure(joint.exact_flow.value_N_per_m.abs() / 1e3, 2)
        ));
    }
}
