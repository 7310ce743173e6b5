//! Combinations of actions by EN 1990.

use super::action::{Action, ActionKind};

/// gamma_G of an unfavourable permanent action, EN 1990:2002 Table A1.2(B), recommended value,
/// from memory.
pub(crate) const GAMMA_PERMANENT: f64 = 1.35;
/// gamma_Q of an unfavourable variable action, EN 1990:2002 Table A1.2(B), recommended value,
/// from memory.
pub(crate) const GAMMA_VARIABLE: f64 = 1.5;

/// A sum of factored actions.
#[derive(Clone, Debug, PartialEq)]
pub struct Combination {
    name: String,
    factors: Vec<f64>,
    is_ultimate: bool,
}

impl Combination {
    /// The name by which results are addressed, for example `quasi-permanent`. Where several
    /// variable actions can lead, the name says which one does.
    #[must_use]
    pub fn name(&self) -> &str {
        &self.name
    }

    /// One factor per action, in the order of the actions of the member.
    #[must_use]
    pub fn factors(&self) -> &[f64] {
        &self.factors
    }

    /// Whether design strengths are compared under this combination (the fundamental one).
    #[must_use]
    pub const fn is_ultimate(&self) -> bool {
        self.is_ultimate
    }
}

/// All combinations of the actions, EN 1990:2002 6.4.3.2 eq. 6.10 and 6.5.3, from memory:
///
/// - permanent: sum of G
/// - quasi-permanent: sum of G + psi_2 Q
/// - characteristic: sum of G + leading Q + sum of psi_0 Q
/// - fundamental: 1.35 sum of G + 1.5 leading Q + 1.5 sum of psi_0 Q
pub(crate) fn all(actions: &[Action]) -> Vec<Combination> {
    let plain = |name: &str, factor: fn(&Action) -> f64| Combination {
        name: name.into(),
        factors: actions.iter().map(factor).collect(),
        is_ultimate: false,
    };
    let mut combinations = vec![
        plain("permanent", |action| match action.kind() {
            ActionKind::Permanent => 1.0,
            ActionKind::Variable(_) => 0.0,
        }),
        plain("quasi-permanent", Action::quasi_permanent),
    ];
    combinations.extend(led(actions, "characteristic", 1.0, 1.0, false));
    combinations.extend(led(
        actions,
        "fundamental",
        GAMMA_PERMANENT,
        GAMMA_VARIABLE,
        true,
    ));
    combinations
}

/// One combination per leading variable action; one in all where none or a single one can lead.
fn led(
    actions: &[Action],
    name: &str,
    permanent: f64,
    variable: f64,
    is_ultimate: bool,
) -> Vec<Combination> {
    let leaders: Vec<_> = (0..actions.len())
        .filter(|&i| matches!(actions[i].kind(), ActionKind::Variable(_)))
        .collect();
    let with_leader = |leader: Option<usize>| {
        actions
            .iter()
            .enumerate()
            .map(|(i, action)| match action.kind() {
                ActionKind::Permanent => permanent,
                ActionKind::Variable(_) if leader == Some(i) => variable,
                ActionKind::Variable(factors) => variable * factors.psi_0,
            })
            .collect()
    };
    match leaders.as_slice() {
        [] => vec![Combination {
            name: name.into(),
            factors: with_leader(None),
            is_ultimate,
        }],
        [only] => {
            vec![Combination {
                name: name.into(),
                factors: with_leader(Some(*only)),
                is_ultimate,
            }]
        }
        several => several
            .iter()
            .map(|&leader| Combination {
                name: format!("{name}, {} leading", actions[leader].name()),
                factors: with_leader(Some(leader)),
                is_ultimate,
            })
            .collect(),
    }
}
