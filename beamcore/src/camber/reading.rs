//! The reading to expect when a cambered member is measured in the shop.

use super::Camber;
use crate::error::{ErrorKind, Problem, Result};
use crate::lookup;
use crate::member::{Action, Member, Support};
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
        let section = present(self.member().section(), &trestles.parts)?;
        let standing = Member::of_length(section, self.member().length())
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

/// The section of the parts that are present, at the places they have in the whole section.
fn present(section: &Section, names: &[String]) -> Result<Section> {
    let known: Vec<_> = section.placed().iter().map(PlacedPart::name).collect();
    let unknown = names.iter().find(|name| !known.contains(&name.as_str()));
    if let Some(name) = unknown {
        return Err(Problem::new(
            ErrorKind::Name,
            "camber.trestles.parts",
            format!("the unknown part \"{name}\""),
            format!("one of {}", lookup::listed(&known)),
        )
        .into());
    }
    section.only(names)
}
