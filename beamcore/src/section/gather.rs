//! Parts gathered to a section: their checks and their places.

use super::part::Part;
use super::placed::PlacedPart;
use super::{contact, place};
use crate::error::{ErrorKind, Problem};
use crate::{check, path};

/// The parts at their places, as far as they are known; everything that is wrong with them.
pub(super) fn placed(parts: &[Part], problems: &mut Vec<Problem>) -> Vec<PlacedPart> {
    if parts.is_empty() {
        problems.push(no_parts());
    }
    for part in parts {
        problems.extend(part.problems());
    }
    check::unique(
        problems,
        parts.iter().map(Part::name),
        "parts",
        "section.parts",
    );
    problems.extend(materials(parts));
    let placed = place::resolve(parts, problems);
    // Outlines that are not whole have no region to compare.
    if problems.is_empty() {
        problems.extend(contact::overlaps(&placed));
    }
    placed
}

pub(super) fn no_parts() -> Problem {
    Problem::new(
        ErrorKind::Missing,
        "section.parts",
        "an empty section",
        "at least one part",
    )
}

/// The hosts without what is set into them.
pub(super) fn displaced(mut placed: Vec<PlacedPart>) -> Vec<PlacedPart> {
    for i in 0..placed.len() {
        let name = placed[i].name().to_owned();
        let inserts = placed
            .iter()
            .filter(|part| part.host() == Some(name.as_str()));
        let inserts: Vec<_> = inserts.map(|insert| *insert.whole()).collect();
        placed[i].displace(&inserts);
    }
    placed
}

/// Problems of the materials, each material once; one name must mean one material.
fn materials(parts: &[Part]) -> Vec<Problem> {
    let mut problems = Vec::new();
    for (i, part) in parts.iter().enumerate() {
        let material = part.material();
        let earlier = parts[..i]
            .iter()
            .find(|p| p.material().name() == material.name());
        match earlier {
            None => problems.extend(material.problems()),
            Some(other) if other.material() != material => problems.push(Problem::new(
                ErrorKind::Duplicate,
                path::named("materials", material.name()),
                format!(
                    "two materials named \"{}\" with different values",
                    material.name()
                ),
                "a different name for each material",
            )),
            Some(_) => {}
        }
    }
    problems
}
