//! Which parts touch, and which overlap.

use super::placed::PlacedPart;
use crate::error::{ErrorKind, Problem};
use crate::lookup;
use crate::outline::{CONTACT, Outline, contains, overlap_area, touches};
use crate::path;
use crate::units::{Area, Length};

/// A problem for each pair of parts that overlap, and for each insert that is not within its host.
pub(super) fn overlaps(parts: &[PlacedPart]) -> Vec<Problem> {
    let mut problems = Vec::new();
    for (i, a) in parts.iter().enumerate() {
        for b in &parts[i + 1..] {
            let (across, upright) = common(a, b);
            if is_within(a, b)
                || is_within(b, a)
                || across <= Length::ZERO
                || upright <= Length::ZERO
            {
                continue;
            }
            let area = common_area(a, b, across * upright);
            if area > whole_area(a).min(whole_area(b)) * CONTACT {
                problems.push(overlap(a, b, area));
            }
        }
        let host = parts.iter().find(|host| is_within(a, host));
        if let Some(host) = host
            && !contains(&host.region(), &a.region())
        {
            problems.push(Problem::new(
                ErrorKind::Geometry,
                path::key(
                    &path::key(&path::named("section.parts", a.name()), "place"),
                    "set_into",
                ),
                format!("a part that reaches out of its host \"{}\"", host.name()),
                "a place wholly within the host",
            ));
        }
    }
    problems
}

/// Whether `insert` is set into `host`.
pub(super) fn is_within(insert: &PlacedPart, host: &PlacedPart) -> bool {
    insert.host() == Some(host.name())
}

fn whole_area(part: &PlacedPart) -> Area {
    Area::from_si(part.whole().area)
}

/// The area that two parts have in common; rectangles fill the common part of their boxes.
fn common_area(a: &PlacedPart, b: &PlacedPart, of_boxes: Area) -> Area {
    match (a.outline(), b.outline()) {
        (Outline::Rectangle { .. }, Outline::Rectangle { .. }) => of_boxes,
        _ => Area::from_si(overlap_area(&a.region(), &b.region())),
    }
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
    if is_within(a, b) || is_within(b, a) {
        return true;
    }
    let (across, upright) = common(a, b);
    let size = a.outline().width().max(a.outline().height());
    let slack = size * CONTACT;
    let boxes = across >= -slack && upright >= -slack && (across > slack || upright > slack);
    match (a.outline(), b.outline()) {
        (Outline::Rectangle { .. }, Outline::Rectangle { .. }) => boxes,
        _ => boxes && touches(&a.region(), &b.region(), slack.si()),
    }
}

/// A note that names the parts of one layer which no chain of contacts joins to its first part.
pub(super) fn notes(parts: &[&PlacedPart]) -> Vec<String> {
    let mut joined = vec![false; parts.len()];
    let mut waiting = vec![0];
    while let Some(i) = waiting.pop() {
        if std::mem::replace(&mut joined[i], true) {
            continue;
        }
        waiting.extend((0..parts.len()).filter(|&j| !joined[j] && touch(parts[i], parts[j])));
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
