//! Where a part stands in the section: by coordinates, or beside another part.

use super::part::Part;
use super::placed::PlacedPart;
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

/// An axis of the section about which a part is mirrored.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub enum MirrorAxis {
    /// The upright axis y = 0: left and right change.
    Upright,
    /// The level axis z = 0: top and bottom change.
    Level,
}

impl MirrorAxis {
    /// The word used in documents.
    #[must_use]
    pub const fn name(self) -> &'static str {
        match self {
            Self::Upright => "upright",
            Self::Level => "level",
        }
    }
}

/// The place of a part.
#[derive(Clone, Debug, PartialEq)]
pub enum Placement {
    /// With the point by which its outline is placed (the middle of its bounding box; of a polygon,
    /// the origin of its coordinates) here: y to the right, z upward, seen against the direction of
    /// x.
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
    /// The mirror image of the place of another part; the part's own outline is mirrored too.
    MirrorOf {
        /// The name of the other part.
        of: String,
        /// The axis.
        axis: MirrorAxis,
    },
    /// Set into another part, its host, which it displaces; it must lie wholly within it.
    SetInto {
        /// The name of the host.
        host: String,
        /// Coordinate to the right.
        y: Length,
        /// Coordinate upward.
        z: Length,
    },
}

impl Placement {
    /// The part that this place refers to, with the key of the document that names it.
    pub(super) fn refers_to(&self) -> Option<(&'static str, &str)> {
        match self {
            Self::At { .. } => None,
            Self::Beside { side, of } => Some((side.name(), of)),
            Self::MirrorOf { of, .. } => Some(("mirror_of", of)),
            Self::SetInto { host, .. } => Some(("set_into", host)),
        }
    }
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
            let neighbour = part.placement().refers_to().map(|(_, name)| {
                let index = parts.iter().position(|other| other.name() == name);
                index.and_then(|other| placed[other].as_ref())
            });
            let next = match (part.placement(), neighbour.flatten()) {
                (Placement::At { y, z }, _) => Some(PlacedPart::at(part, *y, *z)),
                (Placement::Beside { side, .. }, Some(other)) => {
                    Some(PlacedPart::beside(part, *side, other))
                }
                (Placement::MirrorOf { axis, .. }, Some(other)) => {
                    Some(PlacedPart::mirror_of(part, *axis, other))
                }
                (Placement::SetInto { y, z, .. }, Some(_)) => Some(PlacedPart::at(part, *y, *z)),
                (
                    Placement::Beside { .. }
                    | Placement::MirrorOf { .. }
                    | Placement::SetInto { .. },
                    None,
                ) => None,
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
    let (key, of) = part
        .placement()
        .refers_to()
        .expect("a part placed by coordinates always has a place");
    let base = path::key(&path::named("section.parts", part.name()), "place");
    let at = path::key(&base, key);
    let others: Vec<_> = parts
        .iter()
        .map(Part::name)
        .filter(|name| *name != part.name())
        .collect();
    if !others.contains(&of) {
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
