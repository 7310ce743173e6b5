//! Which parts touch, and which overlap.

use super::part::PlacedPart;
use crate::error::{ErrorKind, Problem};
use crate::lookup;
use crate::units::{Area, Length};

/// Overlap is area above this share of the smaller part; less is contact.
const CONTACT: f64 = 1e-9;

/// A problem for each pair of parts that overlap.
pub(super) fn overlaps(parts: &[PlacedPart]) -> Vec<Problem> {
    let mut problems = Vec::new();
    for (i, a) in parts.iter().enumerate() {
        for b in &parts[i + 1..] {
            let (across, upright) = common(a, b);
            if across <= Length::ZERO || upright <= Length::ZERO {
                continue;
            }
            let area = across * upright;
            if area > a.area().min(b.area()) * CONTACT {
                problems.push(overlap(a, b, area));
            }
        }
    }
    problems
}

fn overlap(a: &PlacedPart, b: &PlacedPart, area: Area) -> Problem {
    Problem::new(
        ErrorKind::Geometry,
        "section.parts",
        format!(
            "the parts \"{}\" and \"{}\", which overlap by {} mm2",
            a.name(),
            b.name(),
            // Rounded to what an engineer would write; the exact number has no use here.
            (area.to_mm2() * 100.0).round() / 100.0
        ),
        "parts that touch but do not overlap",
    )
}

/// The length over which two parts lie beside each other, along y and along z; negative for a gap.
fn common(a: &PlacedPart, b: &PlacedPart) -> (Length, Length) {
    (
        a.right().min(b.right()) - a.left().max(b.left()),
        a.top().min(b.top()) - a.bottom().max(b.bottom()),
    )
}

fn touch(a: &PlacedPart, b: &PlacedPart) -> bool {
    let (across, upright) = common(a, b);
    let size = a.outline().width().max(a.outline().height());
    let slack = size * CONTACT;
    across >= -slack && upright >= -slack && (across > slack || upright > slack)
}

/// A note that names the parts which no chain of contacts joins to the first part.
pub(super) fn notes(parts: &[PlacedPart]) -> Vec<String> {
    let mut joined = vec![false; parts.len()];
    let mut waiting = vec![0];
    while let Some(i) = waiting.pop() {
        if std::mem::replace(&mut joined[i], true) {
            continue;
        }
        waiting.extend((0..parts.len()).filter(|&j| !joined[j] && touch(&parts[i], &parts[j])));
    }
    let apart: Vec<_> = parts
        .iter()
        .zip(&joined)
        .filter(|(_, j)| !**j)
        .map(|(part, _)| part.name())
        .collect();
    if apart.is_empty() {
        return Vec::new();
    }
    vec![format!(
        "No chain of contacts joins {} to {}: they are taken as rigidly joined across the gap, \
         and what joins them must be designed for it",
        lookup::listed(&apart),
        lookup::listed(&[parts[0].name()])
    )]
}
