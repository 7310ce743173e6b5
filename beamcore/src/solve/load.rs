//! What acts on a member in one load case, in plain SI numbers.
//!
//! Every load is an outside force (per length) that does work on one of the displacements of
//! [`super::states`]: q on w, a couple on theta, an axial load on u, and on the slip of each joint
//! that lies below the layer it acts on.

use super::states::States;

/// What acts on one piece.
#[derive(Clone, Copy, Debug)]
pub(crate) struct PieceLoad<'a> {
    /// Load per length on each displacement at the left end, then at the right end; linear between.
    pub(crate) line: &'a [f64],
    /// The free gradients, see [`super::law`].
    pub(crate) free: &'a [f64],
    /// Of a varying piece, more of both at each of its nodes; empty otherwise.
    pub(crate) at_nodes: &'a [f64],
}

/// The loads of one case.
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct LoadCase {
    pub(crate) states: States,
    /// Per piece as [`PieceLoad::line`].
    pub(crate) line: Vec<f64>,
    /// Per piece as [`PieceLoad::free`].
    pub(crate) free: Vec<f64>,
    /// Per piece as [`PieceLoad::at_nodes`].
    pub(crate) at_nodes: Vec<Vec<f64>>,
    /// Per station the force on each displacement.
    pub(crate) outside: Vec<f64>,
    /// By how much each hold moves, in the order of the stations.
    pub(crate) moved: Vec<f64>,
}

impl LoadCase {
    /// No load on a member with so many pieces and holds.
    pub(crate) fn none(states: States, pieces: usize, holds: usize) -> Self {
        let half = states.half();
        Self {
            states,
            line: vec![0.0; pieces * 2 * half],
            free: vec![0.0; pieces * (half - states.strands)],
            at_nodes: vec![Vec::new(); pieces],
            outside: vec![0.0; (pieces + 1) * half],
            moved: vec![0.0; holds],
        }
    }

    /// What acts on a piece.
    pub(crate) fn piece(&self, k: usize) -> PieceLoad<'_> {
        let half = self.states.half();
        let gradients = half - self.states.strands;
        PieceLoad {
            line: &self.line[2 * half * k..2 * half * (k + 1)],
            free: &self.free[gradients * k..gradients * (k + 1)],
            at_nodes: &self.at_nodes[k],
        }
    }

    /// The forces at a station.
    pub(crate) fn at_station(&self, k: usize) -> &[f64] {
        let half = self.states.half();
        &self.outside[half * k..half * (k + 1)]
    }

    /// Adds `factor` times another case on the same member.
    pub(crate) fn add(&mut self, other: &Self, factor: f64) {
        let add = |mine: &mut [f64], theirs: &[f64]| {
            for (a, b) in mine.iter_mut().zip(theirs) {
                *a += factor * b;
            }
        };
        add(&mut self.line, &other.line);
        add(&mut self.free, &other.free);
        add(&mut self.outside, &other.outside);
        add(&mut self.moved, &other.moved);
        for (mine, theirs) in self.at_nodes.iter_mut().zip(&other.at_nodes) {
            if mine.is_empty() {
                mine.resize(theirs.len(), 0.0);
            }
            add(mine, theirs);
        }
    }
}
