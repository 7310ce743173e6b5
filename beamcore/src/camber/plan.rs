//! The wish for a camber.

use super::{Rounding, Shape};
use crate::check;
use crate::error::{ErrorKind, Problem};
use crate::lookup;
use crate::member::{Combination, Support};
use crate::path;
use crate::time::Time;
use crate::units::Length;

/// A wish for camber: which deflection to build against, how much of it, in which steps.
///
/// The camber lies over the chord between two supports; beyond them the member goes on straight
/// (mirrored, if it mirrors the deflection line).
#[derive(Clone, Debug, PartialEq)]
pub struct CamberPlan {
    /// The shape of the camber.
    pub shape: Shape,
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
    /// The least rise worth building; a smaller one becomes none.
    pub least: Length,
    /// The number of equal divisions of the chord; ordinates are given at their ends.
    pub divisions: u32,
}

/// More divisions than this are a slip of the pen, not a shop drawing.
const MOST_DIVISIONS: u32 = 1000;

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
        check::not_negative(&mut problems, self.least, "camber.least");
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
