//! What supports and anchors bear.

use super::Response;
use crate::error::Result;
use crate::lookup;
use crate::member::{Held, HeldBy};
use crate::time::Time;
use crate::units::{Force, Moment};

/// The reaction of one support on the member.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Reaction {
    /// The force, positive upward.
    pub force: Force,
    /// The couple, positive clockwise with x to the right and z up; zero unless the support holds
    /// the rotation.
    pub couple: Moment,
    /// The level force, positive to the right; zero where no axial force takes part.
    pub along: Force,
}

impl Response {
    /// The reaction of a support.
    ///
    /// # Errors
    /// As for [`Response::deflection`]; [`crate::ErrorKind::Lookup`] if there is no such support.
    pub fn reaction(&self, combination: &str, time: Time, support: &str) -> Result<Reaction> {
        let index = self.support(support)?;
        let (mut up, mut couple, mut along) = (0.0, 0.0, 0.0);
        self.each_hold(combination, time, |by, force| match by {
            HeldBy::Support(i, held) if i == index => match held {
                // Each force is the one with which the hold resists its direction.
                Held::Deflection => up += force,
                Held::Rotation => couple -= force,
                Held::Axis | Held::Layer(_) => along -= force,
            },
            HeldBy::Support(..) | HeldBy::Anchor(_) => {}
        })?;
        Ok(Reaction {
            force: Force::from_si(up),
            couple: Moment::from_si(couple),
            along: Force::from_si(along),
        })
    }

    /// The force with which a support holds a layer along the member by itself, positive to the
    /// right.
    ///
    /// # Errors
    /// As for [`Response::reaction`]; [`crate::ErrorKind::Lookup`] if it does not hold this layer
    /// by itself.
    pub fn layer_reaction(
        &self,
        combination: &str,
        time: Time,
        support: &str,
        layer: &str,
    ) -> Result<Force> {
        let index = self.support(support)?;
        let held = self.member().supports()[index].held_layers();
        let names: Vec<_> = held.iter().map(|hold| hold.layer.as_str()).collect();
        let Some(wanted) = names.iter().position(|name| *name == layer) else {
            return Err(lookup::unknown("layer", layer, &names).into());
        };
        let mut total = 0.0;
        self.each_hold(combination, time, |by, force| {
            if by == HeldBy::Support(index, Held::Layer(wanted)) {
                total -= force;
            }
        })?;
        Ok(Force::from_si(total))
    }

    /// The force of an anchor: with which it pulls the upper layer of its joint to the left; it
    /// bears the sign of the slip that it stops.
    ///
    /// # Errors
    /// As for [`Response::deflection`]; [`crate::ErrorKind::Lookup`] if there is no such anchor.
    pub fn anchor_force(&self, combination: &str, time: Time, anchor: &str) -> Result<Force> {
        let anchors = self.member().anchors();
        let names: Vec<_> = anchors.iter().map(|anchor| anchor.name.as_str()).collect();
        let Some(wanted) = names.iter().position(|name| *name == anchor) else {
            return Err(lookup::unknown("anchor", anchor, &names).into());
        };
        let mut total = 0.0;
        self.each_hold(combination, time, |by, force| {
            if by == HeldBy::Anchor(wanted) {
                total += force;
            }
        })?;
        Ok(Force::from_si(total))
    }

    /// The names of the one-way supports that the member leaves under a combination.
    ///
    /// # Errors
    /// As for [`Response::deflection`].
    pub fn lifted(&self, combination: &str, time: Time) -> Result<Vec<&str>> {
        let terms = self.terms(combination, time)?;
        let whole = terms.first().and_then(|term| term.settled);
        let lifted = whole.map_or(&[][..], |settled| &settled.lifted);
        let supports = self.member().supports();
        Ok(lifted.iter().map(|&i| supports[i].name()).collect())
    }

    fn support(&self, name: &str) -> Result<usize> {
        let supports = self.member().supports();
        let found = supports.iter().position(|s| s.name() == name);
        found.ok_or_else(|| {
            let names: Vec<_> = supports.iter().map(|s| s.name()).collect();
            lookup::unknown("support", name, &names).into()
        })
    }

    fn each_hold(
        &self,
        combination: &str,
        time: Time,
        mut take: impl FnMut(HeldBy, f64),
    ) -> Result<()> {
        for term in self.terms(combination, time)? {
            for ((_, by), force) in term.layout.held_by().zip(&term.solved.reactions) {
                take(by, term.factor * force);
            }
        }
        Ok(())
    }
}
