//! A member as a chain of pieces on stations, solved for any number of load cases.

use super::law::Law;
use super::load::LoadCase;
use super::mechanism::Motion;
use super::modes::Modes;
use super::piece::{Piece, PieceLaw};
use super::relation::Relation;
use super::scaling::scale;
use super::states::{Scale, States};
use super::station::{Conditions, Station};
use super::sweep::{ChainLoad, Sweep};
use std::sync::Arc;

/// A member ready to be solved: its equations are factored once.
#[derive(Clone, Debug)]
pub(crate) struct Beam {
    pub(super) states: States,
    pub(super) places: Arc<[f64]>,
    pub(super) pieces: Vec<Piece>,
    pub(super) conditions: Vec<Conditions>,
    /// Per station the number of its first hold.
    first_hold: Vec<usize>,
    /// Per inner station how it is tied into the chain.
    pub(super) ties: Vec<Tie>,
    pub(super) units: Vec<f64>,
    pub(super) scale: Scale,
    divisors: Vec<Vec<f64>>,
    /// Where joints slip, the right half of the relation of each piece.
    rights: Vec<Vec<f64>>,
    sweep: Sweep,
    /// The number of polynomial coefficients of a field over a piece.
    pub(super) terms: usize,
    /// The decay over each piece of each mode of slip.
    decays: Arc<[f64]>,
    /// Joints whose slip nothing holds: they are held at zero mean slip.
    pub(super) loose: Vec<usize>,
}

/// Below this (lambda L)^2 a joint is loose: its forces are lost in the rounding of all others.
const LOOSE: f64 = 1e-11;

/// How an inner station is tied into the chain.
#[derive(Clone, Debug, PartialEq)]
pub(super) enum Tie {
    /// One node; these displacements are held rigidly.
    Shared(Vec<usize>),
    /// Two nodes with equations between them.
    Parted,
}

/// Why a member cannot be solved.
#[derive(Clone, Copy, Debug, PartialEq)]
pub(crate) enum Unsolvable {
    /// Something is free to move.
    Free(Motion),
    /// The station of this number is held twice in one direction.
    HeldTwice(usize),
}

/// The fields over all pieces and the forces of all holds, under one load case.
#[derive(Clone, Debug)]
pub(crate) struct Solved {
    /// Per piece and field (the states, then the curvature of each strand) its coefficients.
    pub(crate) coefficients: Vec<f64>,
    /// Per hold the force with which it resists its direction.
    pub(crate) reactions: Vec<f64>,
    /// The error estimate, relative to the peak of each field.
    pub(crate) residual: f64,
}

impl Beam {
    /// Factors the equations of a member: `places` rise from the left end to the right end,
    /// `stations` has one entry per place and `laws` one per piece between them.
    pub(crate) fn new(
        states: States,
        places: Vec<f64>,
        mut stations: Vec<Station>,
        laws: &[PieceLaw],
    ) -> Result<Self, Unsolvable> {
        let half = states.half();
        let scale = scale(states, &places, &stations, laws);
        let units: Vec<f64> = (0..2 * half).map(|i| scale.unit(i)).collect();
        let length = places[places.len() - 1] - places[0];
        let loose = loose(states, length, &stations, laws);
        for &joint in &loose {
            let mut direction = vec![0.0; half];
            direction[states.slip(joint)] = 1.0;
            let last = stations.len() - 1;
            stations[last].holds.push(super::station::Hold {
                direction,
                stiffness: f64::INFINITY,
            });
        }
        let mut modes: Vec<(*const Law, Arc<Modes>)> = Vec::new();
        let pieces: Vec<Piece> = places
            .windows(2)
            .zip(laws)
            .map(|(ends, law)| Piece::new(states, ends[1] - ends[0], law, &units, &mut modes))
            .collect();
        let mut conditions = Vec::with_capacity(stations.len());
        let mut first_hold = Vec::with_capacity(stations.len());
        let mut holds = 0;
        for (k, station) in stations.iter().enumerate() {
            let made = Conditions::new(station, states, &scale);
            conditions.push(made.map_err(|_| Unsolvable::HeldTwice(k))?);
            first_hold.push(holds);
            holds += station.holds.len();
        }
        let last = pieces.len();
        let mut relations = Vec::with_capacity(last);
        let mut ties = Vec::with_capacity(last - 1);
        let mut rights = Vec::new();
        let mut node_places = vec![places[0]];
        for (k, piece) in pieces.iter().enumerate() {
            let mut relation = piece.relation();
            relation.scale(&units);
            if states.slips > 0 {
                rights.push(relation.right.clone());
            }
            if k + 1 == last {
                relations.push(relation);
                break;
            }
            // Only these forces have an equation of their own in the relation of a piece.
            let axes = if piece.is_prismatic() {
                half - states.slips
            } else {
                0
            };
            node_places.push(places[k + 1]);
            match conditions[k + 1].simple(axes) {
                Some(held) => {
                    for &displacement in &held {
                        hold_in(&mut relation, half, displacement);
                    }
                    relations.push(relation);
                    ties.push(Tie::Shared(held));
                }
                None => {
                    node_places.push(places[k + 1]);
                    relations.push(relation);
                    relations.push(conditions[k + 1].relation());
                    ties.push(Tie::Parted);
                }
            }
        }
        node_places.push(places[last]);
        let (left, right) = (conditions[0].end(1.0), conditions[last].end(-1.0));
        let sweep = Sweep::factor(half, &left, &relations, &right).map_err(|singular| {
            let motion = Motion::new(&node_places, &singular.motion, states, &scale);
            Unsolvable::Free(motion)
        })?;
        Ok(Self {
            states,
            terms: pieces.iter().map(Piece::terms).max().unwrap_or_default(),
            decays: pieces.iter().flat_map(|p| p.decays(states.slips)).collect(),
            divisors: relations.into_iter().map(|r| r.divisors).collect(),
            rights,
            places: places.into(),
            pieces,
            conditions,
            first_hold,
            ties,
            units,
            scale,
            sweep,
            loose,
        })
    }

    /// The states that the member has.
    #[cfg(test)]
    pub(crate) const fn states(&self) -> States {
        self.states
    }

    /// The places of the stations in m.
    pub(crate) fn stations(&self) -> &Arc<[f64]> {
        &self.places
    }

    /// The number of polynomial coefficients of each field over each piece.
    pub(crate) const fn terms(&self) -> usize {
        self.terms
    }

    /// The decay over each piece of each mode of slip.
    pub(crate) const fn decays(&self) -> &Arc<[f64]> {
        &self.decays
    }

    /// The number of the first hold of a station.
    pub(crate) fn first_hold(&self, station: usize) -> usize {
        self.first_hold[station]
    }

    /// No load.
    pub(crate) fn no_load(&self) -> LoadCase {
        let holds: usize = self.conditions.iter().map(Conditions::count).sum();
        LoadCase::none(self.states, self.pieces.len(), holds)
    }

    /// The number of fields: the states and the curvature of each strand.
    pub(super) const fn fields(&self) -> usize {
        self.states.all() + self.states.strands
    }

    pub(super) const fn width(&self) -> usize {
        self.terms + 2 * self.states.slips
    }

    /// The coefficients of a field over a piece.
    pub(crate) fn field<'a>(&self, solved: &'a Solved, piece: usize, field: usize) -> &'a [f64] {
        let first = (piece * self.fields() + field) * self.width();
        &solved.coefficients[first..first + self.width()]
    }

    /// The fields and the forces of the holds under one load case.
    pub(crate) fn solve(&self, load: &LoadCase) -> Solved {
        let half = self.states.half();
        let all = 2 * half;
        let last = self.pieces.len();
        let in_units = |k: usize, outside: &mut Vec<f64>| {
            outside.clear();
            let forces = load.at_station(k).iter().zip(&self.units[half..]);
            outside.extend(forces.map(|(force, unit)| force / unit));
        };
        let mut outside = Vec::with_capacity(half);
        let moved = |k: usize| &load.moved[self.first_hold[k]..];
        let mut relations = Vec::with_capacity(self.divisors.len() * all);
        for (k, piece) in self.pieces.iter().enumerate() {
            let divisors = &self.divisors[relations.len() / all];
            let first = relations.len();
            relations.resize(first + all, 0.0);
            let side = &mut relations[first..];
            piece.load_side(&load.piece(k), side);
            for (number, divisor) in side.iter_mut().zip(divisors) {
                *number /= divisor;
            }
            if k + 1 == last {
                break;
            }
            in_units(k + 1, &mut outside);
            match &self.ties[k] {
                Tie::Shared(held) => {
                    // The relation ends right of the station: y- = y+ + F.
                    if outside.iter().any(|force| *force != 0.0) {
                        self.take_jump(k, &outside, divisors, side);
                    }
                    for &displacement in held {
                        let index = held_index(&self.conditions[k + 1], displacement);
                        side[half + displacement] = moved(k + 1)[index] / self.units[displacement];
                    }
                }
                Tie::Parted => {
                    let condition = &self.conditions[k + 1];
                    relations.extend(condition.relation_side(&outside, moved(k + 1)));
                }
            }
        }
        in_units(0, &mut outside);
        let left = self.conditions[0].end_side(&outside, moved(0));
        in_units(last, &mut outside);
        let right = self.conditions[last].end_side(&outside, moved(last));
        let chain = ChainLoad {
            left,
            right,
            relations,
        };
        let mut states = self.sweep.solve(chain);
        for state in states.chunks_exact_mut(all) {
            for (number, unit) in state.iter_mut().zip(&self.units) {
                *number *= unit;
            }
        }
        self.fields_of(load, &states)
    }

    /// Takes what a jump of the forces at the right end of a piece brings off its load side.
    fn take_jump(&self, k: usize, outside: &[f64], divisors: &[f64], side: &mut [f64]) {
        let half = self.states.half();
        let all = 2 * half;
        match self.rights.get(k) {
            Some(right) => {
                for (number, row) in side.iter_mut().zip(right.chunks_exact(all)) {
                    for (factor, force) in row[half..].iter().zip(outside) {
                        *number -= factor * force;
                    }
                }
            }
            // Without slip each force at the right end stands alone in its own equation.
            None => {
                for (i, force) in outside.iter().enumerate() {
                    let force = force * self.units[half + i];
                    side[half + i] -= force / divisors[half + i];
                }
            }
        }
    }
}

/// The position among the holds of a station of the one along a displacement.
fn held_index(conditions: &Conditions, displacement: usize) -> usize {
    conditions
        .axis_holds()
        .position(|axis| axis == displacement)
        .expect("a displacement that was found held")
}

/// Replaces the equation of a force by the condition that its displacement is held.
fn hold_in(relation: &mut Relation, half: usize, displacement: usize) {
    let all = 2 * half;
    let row = half + displacement;
    relation.left[row * all..(row + 1) * all].fill(0.0);
    relation.right[row * all..(row + 1) * all].fill(0.0);
    relation.right[row * all + displacement] = 1.0;
}

/// Joints that carry nothing that could be told from nothing, and whose slip no hold touches.
fn loose(states: States, length: f64, stations: &[Station], laws: &[PieceLaw]) -> Vec<usize> {
    let touched = |slip: usize| {
        let mut holds = stations.iter().flat_map(|station| &station.holds);
        holds.any(|hold| hold.direction[slip] != 0.0 && hold.stiffness > 0.0)
    };
    let carries = |slip: usize| {
        laws.iter().flat_map(PieceLaw::laws).any(|law| {
            let modulus = law.joints[(slip, slip)];
            let gradient = slip - states.strands;
            // S of the joint alone: with it (lambda L)^2 = k L^2/S.
            let own = law.stiffness[(gradient, gradient)];
            modulus * length * length > LOOSE * own
        })
    };
    (0..states.slips)
        .filter(|&j| !touched(states.slip(j)) && !carries(states.slip(j)))
        .collect()
}
