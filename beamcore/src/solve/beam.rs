//! A member as a chain of pieces on supports, solved for any number of load cases.

use super::condition::{self, Holds};
use super::mechanism::Motion;
use super::polynomial::{PieceFields, PieceLoad, PolynomialPiece};
use super::relation::Piece;
use super::residual;
use super::state::{HALF, STATES, Scale};
use super::sweep::{ChainLoad, Sweep};
use nalgebra::SVector;

/// A member ready to be solved: its equations are factored once.
#[derive(Clone, Debug)]
pub(crate) struct Beam {
    stations: Vec<f64>,
    holds: Vec<Holds>,
    pieces: Vec<PolynomialPiece>,
    scale: Scale,
    sweep: Sweep<STATES, HALF>,
}

/// The loads of one case.
#[derive(Clone, Debug, Default, PartialEq)]
pub(crate) struct LoadCase {
    /// What acts on each piece.
    pub(crate) pieces: Vec<PieceLoad>,
    /// The point load at each station; N, positive downward.
    pub(crate) point: Vec<f64>,
    /// The couple at each station; N m, positive clockwise.
    pub(crate) couple: Vec<f64>,
}

/// The reaction at a station: force in N, positive upward; couple in N m, positive clockwise.
#[derive(Clone, Copy, Debug, Default, PartialEq)]
pub(crate) struct Reaction {
    pub(crate) force: f64,
    pub(crate) couple: f64,
}

/// The fields over all pieces and the reactions at all stations, under one load case.
#[derive(Clone, Debug)]
pub(crate) struct Solved {
    pub(crate) fields: Vec<PieceFields>,
    pub(crate) reactions: Vec<Reaction>,
    /// What is left of equilibrium and continuity, relative to the greatest terms.
    pub(crate) residual: f64,
}

impl Solved {
    /// The solution of a member with so many stations on which nothing acts.
    pub(crate) fn at_rest(stations: usize) -> Self {
        Self {
            fields: vec![PieceFields::default(); stations - 1],
            reactions: vec![Reaction::default(); stations],
            residual: 0.0,
        }
    }
}

impl LoadCase {
    /// No load on a member with so many stations.
    pub(crate) fn none(stations: usize) -> Self {
        Self {
            pieces: vec![PieceLoad::default(); stations - 1],
            point: vec![0.0; stations],
            couple: vec![0.0; stations],
        }
    }
}

impl Beam {
    /// Factors the equations of a member.
    ///
    /// `stations` rise from the left end to the right end, `holds` has one entry per station and
    /// `bending_stiffness` one per piece (N m2). A member that is free to move is an error that
    /// holds its motion.
    pub(crate) fn new(
        stations: Vec<f64>,
        holds: Vec<Holds>,
        bending_stiffness: &[f64],
    ) -> Result<Self, Motion> {
        let (first, last) = (stations[0], stations[stations.len() - 1]);
        let held = holds.iter().filter(|h| **h != Holds::NOTHING).count();
        let spans = u32::try_from(held.saturating_sub(1).max(1)).unwrap_or(u32::MAX);
        let scale = Scale {
            length: (last - first) / f64::from(spans),
            stiffness: bending_stiffness[0],
        };
        let pieces: Vec<_> = stations
            .windows(2)
            .zip(bending_stiffness)
            .map(|(ends, &stiffness)| PolynomialPiece::new(ends[1] - ends[0], stiffness, scale))
            .collect();
        let mut relations: Vec<_> = pieces.iter().map(Piece::relation).collect();
        let inner = relations.len() - 1;
        for (relation, &holds) in relations[..inner].iter_mut().zip(&holds[1..]) {
            condition::across(relation, holds);
        }
        let (left, right) = (
            condition::end(holds[0]),
            condition::end(holds[holds.len() - 1]),
        );
        match Sweep::factor(left, &relations, &right) {
            Ok(sweep) => Ok(Self {
                stations,
                holds,
                pieces,
                scale,
                sweep,
            }),
            Err(singular) => Err(Motion::new(&stations, &singular.motion, scale)),
        }
    }

    /// The places of the stations in m.
    pub(crate) fn stations(&self) -> &[f64] {
        &self.stations
    }

    /// The fields and reactions under one load case.
    pub(crate) fn solve(&self, load: &LoadCase) -> Solved {
        let units = self.scale.units();
        let jump = |k: usize| {
            let jump = condition::jump(load.point[k], load.couple[k]);
            SVector::<f64, STATES>::from_fn(|i, _| jump[i] / units[i])
        };
        let last = self.pieces.len();
        let sides: Vec<_> = self
            .pieces
            .iter()
            .zip(&load.pieces)
            .map(|(piece, load)| piece.load_side(load))
            .collect();
        let mut relations = sides;
        for (k, side) in relations.iter_mut().enumerate().take(last - 1) {
            *side = condition::across_side(side, self.holds[k + 1], &jump(k + 1));
        }
        let chain = ChainLoad {
            left: condition::end_side(self.holds[0], &jump(0)),
            relations,
            right: condition::end_side(self.holds[last], &-jump(last)),
        };
        let states = self.sweep.solve(&chain);
        let fields: Vec<_> = (0..last)
            .map(|k| self.pieces[k].fields(&states[k], &load.pieces[k]))
            .collect();
        let reactions = (0..=last)
            .map(|k| {
                let before = if k == 0 {
                    [0.0; 2]
                } else {
                    fields[k - 1].forces_at_end()
                };
                let after = if k == last {
                    [0.0; 2]
                } else {
                    fields[k].forces_at_start()
                };
                let Holds([deflection, rotation]) = self.holds[k];
                Reaction {
                    force: if deflection {
                        after[0] - before[0] + load.point[k]
                    } else {
                        0.0
                    },
                    couple: if rotation {
                        after[1] - before[1] - load.couple[k]
                    } else {
                        0.0
                    },
                }
            })
            .collect();
        let mut solved = Solved {
            fields,
            reactions,
            residual: 0.0,
        };
        solved.residual = residual::of(&self.stations, load, &solved);
        solved
    }
}
