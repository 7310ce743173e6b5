//! Joints at their places in a section.

use super::facing::{Facing, facing};
use super::joint::{Joint, JointKind};
use super::joint_creep::{self, JointCreep};
use super::layer::Layer;
use super::placed::PlacedPart;
use crate::error::{ErrorKind, Problem};
use crate::path;
use crate::time::Time;
use crate::units::{Length, SlipModulus};

/// How far a stated gap may be from the real one.
const GAP_TOLERANCE: Length = Length::from_mm(0.1);

/// A joint at its place in a section, with what follows from its two layers.
#[derive(Clone, Debug, PartialEq)]
pub struct PlacedJoint {
    joint: Joint,
    facing: Facing,
    creep: JointCreep,
    /// Where along the member both layers are there.
    stretch: Option<(Length, Length)>,
}

impl PlacedJoint {
    /// The joint between two layers of these parts.
    pub(super) fn new(
        joint: &Joint,
        (lower, lower_parts): (&Layer, &[&PlacedPart]),
        (upper, upper_parts): (&Layer, &[&PlacedPart]),
    ) -> Result<Self, Vec<Problem>> {
        let mut problems = Vec::new();
        let facing = facing(lower_parts, upper_parts);
        problems.extend(gap_problem(joint, Length::from_si(facing.distance)));
        let creep = joint_creep::of(joint, lower_parts, upper_parts);
        let stretch = common(lower.extent(), upper.extent());
        if let Some((from, to)) = stretch
            && to <= from
        {
            problems.push(nowhere(joint));
        }
        match creep {
            Ok(creep) if problems.is_empty() => Ok(Self {
                joint: joint.clone(),
                facing,
                creep,
                stretch,
            }),
            Ok(_) => Err(problems),
            Err(problem) => {
                problems.push(problem);
                Err(problems)
            }
        }
    }

    /// The joint as given.
    #[must_use]
    pub const fn joint(&self) -> &Joint {
        &self.joint
    }

    /// The clear distance of the two layers; zero where they touch.
    #[must_use]
    pub const fn distance(&self) -> Length {
        Length::from_si(self.facing.distance)
    }

    /// The z of the joint: the middle of the contact or of the gap between the two layers.
    #[must_use]
    pub const fn z(&self) -> Length {
        Length::from_si(self.facing.z)
    }

    /// The length of the contact line in the section, or of what faces across the gap: the common
    /// width of layers on each other, the common height of layers side by side, the outline of a
    /// part set into another; zero where round and flat meet in a point.
    #[must_use]
    pub const fn width(&self) -> Length {
        Length::from_si(self.facing.width)
    }

    /// The creep factor: at the end the moduli are divided by (1 + factor).
    #[must_use]
    pub const fn creep(&self) -> f64 {
        self.creep.factor
    }

    /// Where the creep factor comes from.
    #[must_use]
    pub fn creep_basis(&self) -> &str {
        &self.creep.basis
    }

    /// The clearance; zero unless it was given.
    #[must_use]
    pub fn clearance(&self) -> Length {
        self.joint.given_clearance().unwrap_or(Length::ZERO)
    }

    /// The slip modulus at x along the member, k on the first day and k/(1 + creep factor) at the
    /// end; zero of a loose joint, outside of all bands and where one of the layers is not there.
    /// `None` of a rigid joint.
    #[must_use]
    pub fn slip_modulus_at(&self, x: Length, time: Time) -> Option<SlipModulus> {
        let modulus = match self.joint.kind() {
            JointKind::Rigid => return None,
            JointKind::Loose => SlipModulus::ZERO,
            JointKind::Slipping(slip) => slip.modulus_at(x),
        };
        Some(self.lasting(modulus, x, time))
    }

    /// The modulus square to the member at x, as [`PlacedJoint::slip_modulus_at`]; `None` where the
    /// two layers share their deflection.
    #[must_use]
    pub fn transverse_modulus_at(&self, x: Length, time: Time) -> Option<SlipModulus> {
        let modulus = self.joint.transverse_modulus();
        modulus.map(|modulus| self.lasting(modulus, x, time))
    }

    /// Where along the member both layers are there; `None` for the whole length.
    #[must_use]
    pub const fn extent(&self) -> Option<(Length, Length)> {
        self.stretch
    }

    /// Where along the member a modulus of the joint changes: the ends of its bands and of its
    /// layers, from left to right, each once.
    #[must_use]
    pub fn places(&self) -> Vec<Length> {
        let bands = match self.joint.kind() {
            JointKind::Slipping(slip) => slip.places(),
            JointKind::Rigid | JointKind::Loose => Vec::new(),
        };
        let ends = self.stretch.into_iter().flat_map(|(from, to)| [from, to]);
        in_order(bands.into_iter().chain(ends))
    }

    fn lasting(&self, modulus: SlipModulus, x: Length, time: Time) -> SlipModulus {
        let is_there = self.stretch.is_none_or(|(from, to)| from <= x && x <= to);
        match time {
            _ if !is_there => SlipModulus::ZERO,
            Time::Initial => modulus,
            Time::Final => modulus / (1.0 + self.creep.factor),
        }
    }
}

/// The places from left to right, each once.
pub(super) fn in_order(places: impl IntoIterator<Item = Length>) -> Vec<Length> {
    let mut places: Vec<_> = places.into_iter().collect();
    places.sort_by(|a, b| a.si().total_cmp(&b.si()));
    places.dedup();
    places
}

/// Where both of two extents are; `None` for the whole length.
fn common(
    one: Option<(Length, Length)>,
    other: Option<(Length, Length)>,
) -> Option<(Length, Length)> {
    match (one, other) {
        (Some(a), Some(b)) => Some((a.0.max(b.0), a.1.min(b.1))),
        (one, other) => one.or(other),
    }
}

fn nowhere(joint: &Joint) -> Problem {
    Problem::new(
        ErrorKind::Position,
        Joint::path(joint.name()),
        format!(
            "the layers \"{}\" and \"{}\", of which one is only where the other is not",
            joint.lower(),
            joint.upper()
        ),
        "layers that are both there over some length",
    )
}

/// A gap that is not stated, or stated otherwise than it is.
fn gap_problem(joint: &Joint, distance: Length) -> Option<Problem> {
    let at = path::key(&Joint::path(joint.name()), "gap");
    let layers = format!(
        "between the layers \"{}\" and \"{}\"",
        joint.lower(),
        joint.upper()
    );
    match joint.stated_gap() {
        None if distance > Length::ZERO => Some(Problem::new(
            ErrorKind::Missing,
            at,
            format!("no gap, with a clear distance of {distance} {layers}"),
            format!("gap = \"{distance}\", or parts that touch"),
        )),
        Some(gap) if (gap - distance).abs() > GAP_TOLERANCE => Some(Problem::new(
            ErrorKind::Geometry,
            at,
            format!("a gap of {gap}, with a clear distance of {distance} {layers}"),
            format!("the clear distance to {GAP_TOLERANCE}, or other places of the parts"),
        )),
        _ => None,
    }
}
