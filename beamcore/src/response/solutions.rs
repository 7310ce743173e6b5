//! The solutions of a member, and how a combination is put together from them.

use super::share::{self, Share};
use crate::error::Result;
use crate::field::Piecewise;
use crate::member::{
    Case, Combination, Layout, Member, Node, Settled, initial_strains, load_case, settle,
};
use crate::section::InitialStrain;
use crate::solve::beam::{Beam, Solved};
use crate::solve::gauss::RULE;
use crate::time::Time;
use std::sync::Arc;

/// The linear solutions at one time: one per action, and last that of the parts' initial strains,
/// if there are any.
#[derive(Debug)]
pub(super) struct Linear {
    pub(super) solved: Vec<Solved>,
    pub(super) cases: Vec<Case>,
}

impl Linear {
    pub(super) fn of(member: &Member, time: Time) -> Self {
        let (layout, beam) = (member.layout(), member.beam(time));
        let actions = member.actions().iter();
        let cases: Vec<Case> = actions
            .map(|action| load_case(layout, member.plan(), beam, action, time))
            .chain(initial_strains(layout, member.plan(), beam, time))
            .collect();
        Self {
            solved: cases.iter().map(|case| beam.solve(&case.loads)).collect(),
            cases,
        }
    }
}

/// The solutions of one combination at one time, where superposition fails: each with its time and
/// factor.
pub(super) type OneWay = Vec<(Time, Settled, f64)>;

/// Solves one combination of a member that may lift off its supports, or whose joints have
/// clearance. At the end it is the quasi-permanent share with effective moduli, and what the whole
/// combination adds to it with short-term ones.
pub(super) fn one_way(member: &Member, combination: &Combination, time: Time) -> Result<OneWay> {
    let shares = share::of(combination, member.actions(), Time::Final);
    let all: Vec<f64> = shares.iter().map(|s| s.short_term + s.effective).collect();
    let lasting: Vec<f64> = shares.iter().map(|s| s.effective).collect();
    let solve = |time: Time, factors: &[f64]| {
        settle(member, time, &|layout, beam| {
            summed(member, layout, beam, time, factors)
        })
    };
    Ok(match time {
        Time::Initial => vec![(Time::Initial, solve(Time::Initial, &all)?, 1.0)],
        Time::Final => vec![
            (Time::Initial, solve(Time::Initial, &all)?, 1.0),
            (Time::Initial, solve(Time::Initial, &lasting)?, -1.0),
            (Time::Final, solve(Time::Final, &lasting)?, 1.0),
        ],
    })
}

/// All actions and initial strains with their factors as one case.
fn summed(member: &Member, layout: &Layout, beam: &Beam, time: Time, factors: &[f64]) -> Case {
    let mut sum = Case::none(beam);
    let actions = member.actions().iter();
    let cases = actions
        .map(|action| load_case(layout, member.plan(), beam, action, time))
        .chain(initial_strains(layout, member.plan(), beam, time));
    for (case, &factor) in cases.zip(factors) {
        sum.add(&case, factor);
    }
    sum
}

/// One solution that takes part in a combination.
pub(super) struct Term<'a> {
    pub(super) time: Time,
    pub(super) layout: &'a Arc<Layout>,
    pub(super) beam: &'a Arc<Beam>,
    pub(super) solved: &'a Solved,
    pub(super) case: &'a Case,
    pub(super) factor: f64,
    /// Of a joint with clearance, the sign of the slip with which it carries.
    pub(super) settled: Option<&'a Settled>,
}

impl Term<'_> {
    /// A field of the solver times the factor of the term.
    pub(super) fn field(&self, index: usize) -> Piecewise {
        let mut line = Piecewise::zero(Arc::clone(self.beam.stations()));
        self.add_field(index, self.factor, &mut line);
        line
    }

    /// Adds a field of the solver times a factor.
    pub(super) fn add_field(&self, index: usize, factor: f64, line: &mut Piecewise) {
        let pieces = (0..self.layout.pieces.len()).map(|k| self.beam.field(self.solved, k, index));
        line.add_coefficients(self.beam.terms(), self.beam.decays(), pieces, factor);
    }

    /// Whether parts strain freely.
    pub(super) fn has_strains(&self) -> bool {
        !self.case.strains.is_empty()
    }

    /// Whether no load acts: only free strains, or movements of supports.
    pub(super) fn is_without_load(&self) -> bool {
        !self.case.has_loads()
    }

    /// The free strains of the parts at a node of a piece; empty where there are none.
    fn strains(&self, piece: usize, node: usize) -> &[InitialStrain] {
        self.case
            .strains
            .get(piece)
            .map_or(&[], |nodes| &nodes[node])
    }

    /// The sum of fields, each times a weight that goes with the section, and of a constant that
    /// does so too: exact where the section does not change along a piece, else the polynomial
    /// through the values at the points of the piece.
    pub(super) fn mixed<const N: usize>(
        &self,
        fields: [&Piecewise; N],
        weight: impl Fn(&Node, &[InitialStrain]) -> ([f64; N], f64),
    ) -> Piecewise {
        let pieces = &self.layout.pieces;
        let weights: Vec<Option<([f64; N], f64)>> = pieces
            .iter()
            .enumerate()
            .map(|(k, piece)| {
                piece
                    .is_prismatic()
                    .then(|| weight(&piece.nodes[0], self.strains(k, 0)))
            })
            .collect();
        let mut line = Piecewise::zero(Arc::clone(self.beam.stations()));
        for (i, field) in fields.into_iter().enumerate() {
            line.add_by_piece(field, |k| weights[k].map_or(0.0, |(factors, _)| factors[i]));
        }
        line.shift_by_piece(|k| weights[k].map_or(0.0, |(_, constant)| self.factor * constant));
        let stations = self.beam.stations();
        for (k, piece) in pieces.iter().enumerate().filter(|(_, p)| !p.is_prismatic()) {
            let mut polynomial = [0.0; RULE_TERMS];
            for (n, (t, lagrange)) in RULE.points.iter().zip(&RULE.lagrange).enumerate() {
                let x = stations[k] + (stations[k + 1] - stations[k]) * t;
                let (factors, constant) = weight(&piece.nodes[n], self.strains(k, n));
                let mut value = self.factor * constant;
                for (field, factor) in fields.iter().zip(factors) {
                    value += factor * field.value_on(k, x);
                }
                for (sum, c) in polynomial.iter_mut().zip(lagrange) {
                    *sum += value * c;
                }
            }
            line.add_to_piece(k, &polynomial);
        }
        line
    }
}

const RULE_TERMS: usize = crate::solve::gauss::POINTS;

/// The terms of a combination from the linear solutions.
pub(super) fn linear_terms<'a>(
    member: &'a Member,
    linear: &'a [Arc<Linear>; 2],
    combination: &Combination,
    time: Time,
) -> Vec<Term<'a>> {
    let shares = share::of(combination, member.actions(), time);
    let mut terms = Vec::new();
    for (
        i,
        Share {
            short_term,
            effective,
        },
    ) in shares.into_iter().enumerate()
    {
        for (time, factor) in [(Time::Initial, short_term), (Time::Final, effective)] {
            let solutions = &linear[time.index()];
            if factor != 0.0 && i < solutions.solved.len() {
                terms.push(Term {
                    time,
                    layout: member.layout(),
                    beam: member.beam(time),
                    solved: &solutions.solved[i],
                    case: &solutions.cases[i],
                    factor,
                    settled: None,
                });
            }
        }
    }
    terms
}

/// The terms of a combination that was solved by itself.
pub(super) fn one_way_terms(solutions: &OneWay) -> Vec<Term<'_>> {
    solutions
        .iter()
        .map(|(time, settled, factor)| Term {
            time: *time,
            layout: &settled.layout,
            beam: &settled.beam,
            solved: &settled.solved,
            case: &settled.case,
            factor: *factor,
            settled: Some(settled),
        })
        .collect()
}
