//! How much of each action is met with short-term moduli and how much with effective ones.

use crate::member::{Action, Combination};
use crate::time::Time;

/// The two shares of one action in a combination.
#[derive(Clone, Copy, Debug, PartialEq)]
pub(super) struct Share {
    /// Factor of the solution with short-term moduli.
    pub(super) short_term: f64,
    /// Factor of the solution with effective moduli.
    pub(super) effective: f64,
}

/// The shares of all actions, and last of the initial strains of the parts, which last from the
/// first day.
///
/// At the end the lasting share of an action, its quasi-permanent value (or all of it where the
/// combination holds less), is met with effective moduli; what comes on top of it is met with
/// short-term moduli.
pub(super) fn of(combination: &Combination, actions: &[Action], time: Time) -> Vec<Share> {
    let share = |(factor, action): (&f64, &Action)| match time {
        Time::Initial => Share {
            short_term: *factor,
            effective: 0.0,
        },
        Time::Final => {
            let effective = factor.min(action.quasi_permanent());
            Share {
                short_term: factor - effective,
                effective,
            }
        }
    };
    let strains = match time {
        Time::Initial => Share {
            short_term: 1.0,
            effective: 0.0,
        },
        Time::Final => Share {
            short_term: 0.0,
            effective: 1.0,
        },
    };
    let actions = combination.factors().iter().zip(actions).map(share);
    actions.chain(std::iter::once(strains)).collect()
}
