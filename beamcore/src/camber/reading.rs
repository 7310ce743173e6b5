//! The reading to expect when a cambered member is measured in the shop.

use super::Camber;
use crate::error::{Error, ErrorKind, Problem, Result};
use crate::lookup;
use crate::member::{Action, Member, SAME_PLACE, Support};
use crate::path;
use crate::response::Response;
use crate::section::{PlacedPart, Section};
use crate::time::Time;
use crate::units::Length;

/// How the member stands when it is measured.
#[derive(Clone, Debug, PartialEq)]
pub struct Trestles {
    /// The place of the left trestle, from the left end of the member.
    pub left: Length,
    /// The place of the right trestle.
    pub right: Length,
    /// The parts that are there: a slab cast on site is not.
    pub parts: Vec<String>,
}

/// What a tape shows at one station, from the chord through the ends of the design chord.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Reading {
    /// Distance from the left end of the chord.
    pub station: Length,
    /// With the member lying on its side: its weight does not act in the plane of the camber.
    pub lying: Length,
    /// With the member standing on the trestles under its own weight.
    pub standing: Length,
}

impl Trestles {
    /// Everything that is wrong with the trestles for a member of this section and length.
    pub(crate) fn problems(&self, section: &Section, length: Length) -> Vec<Problem> {
        let mut problems = Vec::new();
        let base = "camber.trestles";
        for (key, place) in [("left", self.left), ("right", self.right)] {
            if !(place >= Length::ZERO && place <= length) {
                problems.push(Problem::new(
                    ErrorKind::Position,
                    path::key(base, key),
                    place.to_string(),
                    format!("a place on the member, from 0 m to {length}"),
                ));
            }
        }
        if problems.is_empty() && self.right - self.left <= length * SAME_PLACE {
            problems.push(Problem::new(
                ErrorKind::Position,
                path::key(base, "right"),
                self.right.to_string(),
                format!("a place to the right of the left trestle at {}", self.left),
            ));
        }
        let parts = path::key(base, "parts");
        if self.parts.is_empty() {
            problems.push(Problem::new(
                ErrorKind::Missing,
                &parts,
                "no parts",
                "the parts that are there when the camber is measured",
            ));
        }
        let known: Vec<_> = section.placed().iter().map(PlacedPart::name).collect();
        for name in &self.parts {
            let Some(part) = section.placed().iter().find(|part| part.name() == name) else {
                problems.push(Problem::new(
                    ErrorKind::Name,
                    &parts,
                    format!("the unknown part \"{name}\""),
                    format!("one of {}", lookup::listed(&known)),
                ));
                continue;
            };
            if part.line_mass().is_none() {
                problems.push(Problem::new(
                    ErrorKind::Missing,
                    path::key(&path::named("materials", part.material().name()), "density"),
                    "no density",
                    format!("a density, since \"{name}\" stands on the trestles"),
                ));
            }
        }
        problems
    }
}

impl Response {
    /// The readings to expect at the stations of a camber: lying, and standing on two trestles
    /// with the parts present, their own weight and short-term moduli.
    ///
    /// standing = camber - w + (line through w at the ends of the chord), w the deflection on the
    /// trestles.
    ///
    /// # Errors
    /// All of: a part that is not there, no parts, a part without density, trestles outside the
    /// member or at one place.
    pub fn readings(&self, camber: &Camber, trestles: &Trestles) -> Result<Vec<Reading>> {
        let (section, length) = (self.member().section(), self.member().length());
        Error::check(trestles.problems(section, length))?;
        let section = section.only(&trestles.parts)?;
        let standing = Member::of_length(section, length)
            .support(Support::pin("left trestle", trestles.left))
            .support(Support::roller("right trestle", trestles.right))
            .action(Action::permanent("own weight").self_weight())
            .check()?
            .solve();
        let sag = standing.deflection("permanent", Time::Initial)?;
        let (from, to) = camber.chord();
        let (at_from, at_to) = (sag.value(from)?, sag.value(to)?);
        camber
            .ordinates()
            .iter()
            .map(|ordinate| {
                let share = ordinate.station / (to - from);
                let place = (from + ordinate.station).min(to);
                let chord = at_from * (1.0 - share) + at_to * share;
                Ok(Reading {
                    station: ordinate.station,
                    lying: ordinate.ordinate,
                    standing: ordinate.ordinate - sag.value(place)? + chord,
                })
            })
            .collect()
    }
}
