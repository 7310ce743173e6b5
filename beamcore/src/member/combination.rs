//! Combinations of actions by EN 1990, and combinations of one's own.

use super::action::{Action, ActionKind, Effect};
use crate::check;
use crate::error::{ErrorKind, Problem};
use crate::lookup;
use crate::path;

/// Partial factors of the fundamental combination.
///
/// The default holds the recommended values of EN 1990:2002 Table A1.2(B), from memory; the local
/// annex decides.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct PartialFactors {
    /// gamma_G,sup of permanent actions that are unfavourable: 1.35.
    pub permanent: f64,
    /// gamma_G,inf of permanent actions that are favourable: 1.0.
    pub permanent_favourable: f64,
    /// gamma_Q of variable actions that are unfavourable: 1.5.
    pub variable: f64,
}

impl Default for PartialFactors {
    fn default() -> Self {
        Self {
            permanent: 1.35,
            permanent_favourable: 1.0,
            variable: 1.5,
        }
    }
}

/// A combination of one's own: a factor for each action that takes part.
#[derive(Clone, Debug, PartialEq)]
pub struct OwnCombination {
    /// The name by which its results are addressed.
    pub name: String,
    /// Action and factor; an action that is not named has the factor 0.
    pub factors: Vec<(String, f64)>,
    /// Whether design strengths are compared under it.
    pub is_ultimate: bool,
}

/// The kind of a combination.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub enum CombinationKind {
    /// Permanent actions only.
    Permanent,
    /// EN 1990:2002 eq. 6.16b.
    QuasiPermanent,
    /// EN 1990:2002 eq. 6.14b.
    Characteristic,
    /// EN 1990:2002 eq. 6.15b.
    Frequent,
    /// EN 1990:2002 eq. 6.10; design strengths are compared under it.
    Fundamental,
    /// A combination of one's own that looks at deflections.
    Own,
    /// A combination of one's own under which design strengths are compared.
    OwnUltimate,
}

/// A sum of factored actions.
#[derive(Clone, Debug, PartialEq)]
pub struct Combination {
    name: String,
    factors: Vec<f64>,
    kind: CombinationKind,
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

    /// The kind.
    #[must_use]
    pub const fn kind(&self) -> CombinationKind {
        self.kind
    }

    /// Whether design strengths are compared under this combination.
    #[must_use]
    pub const fn is_ultimate(&self) -> bool {
        matches!(
            self.kind,
            CombinationKind::Fundamental | CombinationKind::OwnUltimate
        )
    }
}

/// The three factors that make one kind of combination.
#[derive(Clone, Copy)]
struct Recipe {
    name: &'static str,
    kind: CombinationKind,
    permanent: fn(&PartialFactors, Effect) -> f64,
    leading: fn(&PartialFactors, &Action) -> f64,
    beside: fn(&PartialFactors, &Action) -> f64,
}

/// The combinations of EN 1990:2002 6.5.3 and 6.4.3.2 eq. 6.10, from memory, in the order in which
/// they are listed. A favourable variable action takes part in none of them.
const RECIPES: [Recipe; 3] = [
    // Characteristic: sum of G + leading Q + sum of psi_0 Q.
    Recipe {
        name: "characteristic",
        kind: CombinationKind::Characteristic,
        permanent: |_, _| 1.0,
        leading: |_, _| 1.0,
        beside: |_, action| action.psi().psi_0,
    },
    // Frequent: sum of G + psi_1 leading Q + sum of psi_2 Q.
    Recipe {
        name: "frequent",
        kind: CombinationKind::Frequent,
        permanent: |_, _| 1.0,
        leading: |_, action| action.psi().psi_1,
        beside: |_, action| action.psi().psi_2,
    },
    // Fundamental: gamma_G sum of G + gamma_Q leading Q + gamma_Q sum of psi_0 Q.
    Recipe {
        name: "fundamental",
        kind: CombinationKind::Fundamental,
        permanent: |factors, effect| match effect {
            Effect::Unfavourable => factors.permanent,
            Effect::Favourable => factors.permanent_favourable,
        },
        leading: |factors, _| factors.variable,
        beside: |factors, action| factors.variable * action.psi().psi_0,
    },
];

/// All combinations of the actions: permanent (sum of G), quasi-permanent (sum of G + psi_2 Q),
/// then each kind with every variable action leading in turn, then the ones of one's own.
pub(crate) fn all(
    actions: &[Action],
    factors: &PartialFactors,
    own: &[OwnCombination],
) -> Vec<Combination> {
    let plain = |name: &str, kind, factor: fn(&Action) -> f64| Combination {
        name: name.into(),
        factors: actions.iter().map(factor).collect(),
        kind,
    };
    let mut combinations = vec![
        plain(
            "permanent",
            CombinationKind::Permanent,
            |action| match action.kind() {
                ActionKind::Permanent => 1.0,
                ActionKind::Variable(_) => 0.0,
            },
        ),
        plain(
            "quasi-permanent",
            CombinationKind::QuasiPermanent,
            Action::quasi_permanent,
        ),
    ];
    for recipe in RECIPES {
        combinations.extend(led(actions, factors, recipe));
    }
    combinations.extend(own.iter().map(|own| {
        Combination {
            name: own.name.clone(),
            factors: actions
                .iter()
                .map(|action| {
                    let given = own.factors.iter().find(|(name, _)| name == action.name());
                    given.map_or(0.0, |(_, factor)| *factor)
                })
                .collect(),
            kind: if own.is_ultimate {
                CombinationKind::OwnUltimate
            } else {
                CombinationKind::Own
            },
        }
    }));
    combinations
}

/// One combination per leading variable action; one in all where none or a single one can lead.
fn led(actions: &[Action], factors: &PartialFactors, recipe: Recipe) -> Vec<Combination> {
    let leaders: Vec<_> = actions
        .iter()
        .filter(|action| action.is_variable() && action.effect() == Effect::Unfavourable)
        .map(Action::name)
        .collect();
    let combination = |name: String, leader: Option<&str>| {
        let factor = |action: &Action| match (action.kind(), action.effect()) {
            (ActionKind::Permanent, effect) => (recipe.permanent)(factors, effect),
            (ActionKind::Variable(_), Effect::Favourable) => 0.0,
            (ActionKind::Variable(_), Effect::Unfavourable) if leader == Some(action.name()) => {
                (recipe.leading)(factors, action)
            }
            (ActionKind::Variable(_), Effect::Unfavourable) => (recipe.beside)(factors, action),
        };
        Combination {
            name,
            factors: actions.iter().map(factor).collect(),
            kind: recipe.kind,
        }
    };
    match leaders.as_slice() {
        [] => vec![combination(recipe.name.into(), None)],
        [only] => vec![combination(recipe.name.into(), Some(only))],
        several => several
            .iter()
            .map(|leader| combination(format!("{}, {leader} leading", recipe.name), Some(leader)))
            .collect(),
    }
}

/// What is wrong with the partial factors and the combinations of one's own.
pub(crate) fn problems(
    actions: &[Action],
    factors: &PartialFactors,
    own: &[OwnCombination],
) -> Vec<Problem> {
    let mut problems = Vec::new();
    for (key, factor) in [
        ("permanent", factors.permanent),
        ("permanent_favourable", factors.permanent_favourable),
        ("variable", factors.variable),
    ] {
        check::between(
            &mut problems,
            factor,
            0.0,
            3.0,
            &path::key("partial_factors", key),
        );
    }
    let known: Vec<_> = actions.iter().map(Action::name).collect();
    let made = all(actions, factors, &[]);
    let names = made.iter().map(Combination::name);
    let names = names.chain(own.iter().map(|own| own.name.as_str()));
    check::unique(&mut problems, names, "combinations", "combinations");
    for own in own {
        check::name(&mut problems, &own.name, "combinations");
        let base = path::key(&path::named("combinations", &own.name), "factors");
        for (name, factor) in &own.factors {
            let at = path::named(&base, name);
            check::between(&mut problems, *factor, 0.0, 3.0, &at);
            if !known.contains(&name.as_str()) {
                problems.push(Problem::new(
                    ErrorKind::Name,
                    at,
                    format!("the unknown action \"{name}\""),
                    format!("one of the actions {}", lookup::listed(&known)),
                ));
            }
        }
    }
    problems
}
