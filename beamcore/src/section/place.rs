//! Where a part stands in the section: by coordinates, or beside another part.

use super::part::{Part, PlacedPart};
use crate::error::{ErrorKind, Problem};
use crate::units::Length;
use crate::{lookup, path};

/// The side of another part on which a part stands, touching it.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub enum Side {
    /// At smaller y, centred on the other's height.
    Left,
    /// At greater y, centred on the other's height.
    Right,
    /// At greater z, centred on the other's width.
    Above,
    /// At smaller z, centred on the other's width.
    Below,
}

impl Side {
    /// The word used in documents, for example `right_of`.
    #[must_use]
    pub const fn name(self) -> &'static str {
        match self {
            Self::Left => "left_of",
            Self::Right => "right_of",
            Self::Above => "above",
            Self::Below => "below",
        }
    }
}

/// The place of a part.
#[derive(Clone, Debug, PartialEq)]
pub enum Placement {
    /// With the middle of its outline at these coordinates: y to the right, z upward, seen against
    /// the direction of x.
    At {
        /// Coordinate to the right.
        y: Length,
        /// Coordinate upward.
        z: Length,
    },
    /// Touching another part.
    Beside {
        /// On which side of it.
        side: Side,
        /// The name of the other part.
        of: String,
    },
}

/// The name of a part, taken from the part itself or from a text.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct PartName(pub(super) String);

impl From<&Part> for PartName {
    fn from(part: &Part) -> Self {
        Self(part.name().into())
    }
}

impl From<&str> for PartName {
    fn from(name: &str) -> Self {
        Self(name.into())
    }
}

impl From<String> for PartName {
    fn from(name: String) -> Self {
        Self(name)
    }
}

/// Places every part whose place can be known; what cannot be placed is a problem.
pub(super) fn resolve(parts: &[Part], problems: &mut Vec<Problem>) -> Vec<PlacedPart> {
    let mut placed: Vec<Option<PlacedPart>> = vec![None; parts.len()];
    // Each round places the parts whose neighbour already has a place.
    loop {
        let mut progress = false;
        for (i, part) in parts.iter().enumerate() {
            if placed[i].is_some() {
                continue;
            }
            let next = match part.placement() {
                Placement::At { y, z } => Some(PlacedPart::centred(part, *y, *z)),
                Placement::Beside { side, of } => parts
                    .iter()
                    .position(|other| other.name() == of)
                    .and_then(|other| placed[other].as_ref())
                    .map(|other| PlacedPart::beside(part, *side, other)),
            };
            progress |= next.is_some();
            placed[i] = next;
        }
        if !progress {
            break;
        }
    }
    for (part, _) in parts
        .iter()
        .zip(&placed)
        .filter(|(_, place)| place.is_none())
    {
        problems.push(unplaced(part, parts));
    }
    placed.into_iter().flatten().collect()
}

/// Why a part has no place: its neighbour is not there, or waits for it in turn.
fn unplaced(part: &Part, parts: &[Part]) -> Problem {
    let Placement::Beside { side, of } = part.placement() else {
        unreachable!("a part placed by coordinates always has a place")
    };
    let at = path::key(
        &path::key(&path::named("section.parts", part.name()), "place"),
        side.name(),
    );
    let others: Vec<_> = parts
        .iter()
        .map(Part::name)
        .filter(|name| *name != part.name())
        .collect();
    if !others.contains(&of.as_str()) {
        let expected = if others.is_empty() {
            "another part of this section, or a place by coordinates".into()
        } else {
            format!("one of the other parts: {}", lookup::listed(&others))
        };
        return Problem::new(
            ErrorKind::Name,
            at,
            format!("the unknown part \"{of}\""),
            expected,
        );
    }
    Problem::new(
        ErrorKind::Geometry,
        at,
        format!("\"{of}\", whose place is not known without this one"),
        "at least one of them placed by coordinates",
    )
}
