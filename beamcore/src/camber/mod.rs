//! Camber: the rise to build in, with its ordinates from a stated chord.

mod rounding;

pub use rounding::Rounding;

use crate::check;
use crate::error::{Error, ErrorKind, Problem, Result};
use crate::lookup;
use crate::member::{Combination, Support};
use crate::path;
use crate::response::Response;
use crate::time::Time;
use crate::units::Length;

/// A wish for camber: which deflection to build against, how much of it, in which steps.
///
/// The camber is a parabola over the chord between two supports. Its rise is `fraction` times the
/// deflection at the middle of the chord, rounded.
#[derive(Clone, Debug, PartialEq)]
pub struct CamberPlan {
    /// The combination whose deflection is built against.
    pub combination: String,
    /// The time of that deflection.
    pub time: Time,
    /// The share of the deflection that is built in; 1 is all of it.
    pub fraction: f64,
    /// The support at the left end of the chord.
    pub from: String,
    /// The support at the right end of the chord.
    pub to: String,
    /// The step to which the rise is rounded.
    pub step: Length,
    /// The direction in which it is rounded.
    pub rounding: Rounding,
    /// The number of equal divisions of the chord; ordinates are given at their ends.
    pub divisions: u32,
}

impl CamberPlan {
    /// Everything that is wrong with the plan for a member of these supports and combinations.
    pub(crate) fn problems(
        &self,
        supports: &[Support],
        combinations: &[Combination],
    ) -> Vec<Problem> {
        let mut problems = Vec::new();
        let names: Vec<_> = combinations.iter().map(Combination::name).collect();
        known(&mut problems, "combination", &self.combination, &names);
        check::between(&mut problems, self.fraction, 0.0, 2.0, "camber.fraction");
        let names: Vec<_> = supports.iter().map(Support::name).collect();
        let chord = [("from", &self.from), ("to", &self.to)]
            .map(|(key, end)| known(&mut problems, key, end, &names).map(|i| supports[i].at()));
        if let [Some(from), Some(to)] = chord
            && to <= from
        {
            problems.push(Problem::new(
                ErrorKind::Position,
                "camber.to",
                format!("\"{}\" at {to}", self.to),
                format!("a support to the right of \"{}\" at {from}", self.from),
            ));
        }
        check::positive(&mut problems, self.step, "camber.step");
        if !(1..=MOST_DIVISIONS).contains(&self.divisions) {
            problems.push(Problem::new(
                ErrorKind::Value,
                "camber.divisions",
                self.divisions.to_string(),
                format!("a number from 1 to {MOST_DIVISIONS}"),
            ));
        }
        problems
    }
}

/// The position of a name among those that can be meant; a problem if it is not there.
fn known(problems: &mut Vec<Problem>, key: &str, name: &str, names: &[&str]) -> Option<usize> {
    let found = names.iter().position(|known| *known == name);
    if found.is_none() {
        problems.push(Problem::new(
            ErrorKind::Name,
            path::key("camber", key),
            format!("the unknown name \"{name}\""),
            format!("one of {}", lookup::listed(names)),
        ));
    }
    found
}

/// One ordinate of a camber.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Ordinate {
    /// Distance from the left end of the chord.
    pub station: Length,
    /// Height above the chord, positive upward, with the member unloaded.
    pub ordinate: Length,
}

/// The camber to build.
#[derive(Clone, Debug, PartialEq)]
pub struct Camber {
    target: Length,
    rise: Length,
    chord: (Length, Length),
    ordinates: Vec<Ordinate>,
}

/// More divisions than this are a slip of the pen, not a shop drawing.
const MOST_DIVISIONS: u32 = 1000;

impl Response {
    /// The camber for a plan.
    ///
    /// # Errors
    /// All of: an unknown combination or support, a chord that does not run from left to right, a
    /// fraction outside 0 to 2, a step that is not positive, no division or more than 1000.
    pub fn camber(&self, plan: &CamberPlan) -> Result<Camber> {
        let supports = self.member().supports();
        Error::check(plan.problems(supports, self.member().combinations()))?;
        let end = |name: &str| supports.iter().find(|s| s.name() == name).map(Support::at);
        let (from, to) = (end(&plan.from), end(&plan.to));
        let (from, to) = (from.expect("checked above"), to.expect("checked above"));
        let line = self.deflection(&plan.combination, plan.time)?;
        // The chord's ends are supports, whose deflection is zero.
        let sag = line.value(from + (to - from) / 2.0)?;
        let target = sag * plan.fraction;
        let rise = plan.rounding.apply(target, plan.step);
        let ordinates = (0..=plan.divisions)
            .map(|i| {
                let share = f64::from(i) / f64::from(plan.divisions);
                Ordinate {
                    station: (to - from) * share,
                    ordinate: parabola(rise, share),
                }
            })
            .collect();
        Ok(Camber {
            target,
            rise,
            chord: (from, to),
            ordinates,
        })
    }
}

/// The parabola of a rise c over a chord, at a share s of its length: 4 c s (1 - s).
fn parabola(rise: Length, share: f64) -> Length {
    rise * (4.0 * share * (1.0 - share))
}

impl Camber {
    /// The deflection to be built in before rounding: fraction x deflection at the chord's middle.
    #[must_use]
    pub const fn target(&self) -> Length {
        self.target
    }

    /// The rise at the middle of the chord, rounded; positive upward.
    #[must_use]
    pub const fn rise(&self) -> Length {
        self.rise
    }

    /// The places of the chord's ends, from the left end of the member.
    #[must_use]
    pub const fn chord(&self) -> (Length, Length) {
        self.chord
    }

    /// The ordinates from the left end of the chord to the right end.
    #[must_use]
    pub fn ordinates(&self) -> &[Ordinate] {
        &self.ordinates
    }

    /// The height above the chord at a place of the member, positive upward.
    ///
    /// # Errors
    /// [`ErrorKind::Position`] if the place is not on the chord.
    pub fn ordinate(&self, at: Length) -> Result<Length> {
        let (from, to) = self.chord;
        if !(at >= from && at <= to) {
            return Err(Problem::new(
                ErrorKind::Position,
                "at",
                at.to_string(),
                format!("a place on the chord, from {from} to {to}"),
            )
            .into());
        }
        Ok(parabola(self.rise, (at - from) / (to - from)))
    }
}
