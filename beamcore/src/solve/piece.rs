//! A piece of a member: the law between two neighbouring stations.

use super::law::Law;
use super::load::PieceLoad;
use super::modes::Modes;
use super::prismatic::PrismaticPiece;
use super::relation::Relation;
use super::states::States;
use super::varying::{VARYING_TERMS, VaryingLaws, VaryingPiece};
use std::sync::Arc;

/// The law of the section over a piece.
#[derive(Clone, Debug)]
pub(crate) enum PieceLaw {
    /// One law, of one strand.
    Prismatic(Arc<Law>),
    /// A law that changes, or of more than one strand.
    Varying(Arc<VaryingLaws>),
}

impl PieceLaw {
    /// The laws along the piece.
    pub(crate) fn laws(&self) -> impl Iterator<Item = &Law> {
        let (one, many) = match self {
            Self::Prismatic(law) => (Some(&**law), None),
            Self::Varying(laws) => (None, Some(laws.ends.iter().chain(&laws.points))),
        };
        one.into_iter().chain(many.into_iter().flatten())
    }
}

/// A piece ready to be solved.
#[derive(Clone, Debug)]
pub(crate) enum Piece {
    Prismatic(PrismaticPiece),
    Varying(Box<VaryingPiece>),
}

impl Piece {
    /// A piece of the given length; `modes` keeps those of laws that were met before.
    pub(super) fn new(
        states: States,
        length: f64,
        law: &PieceLaw,
        units: &[f64],
        modes: &mut Vec<(*const Law, Arc<Modes>)>,
    ) -> Self {
        match law {
            PieceLaw::Prismatic(law) => {
                let known = modes.iter().rev().find(|(of, _)| *of == Arc::as_ptr(law));
                let known = known.map(|(_, modes)| Arc::clone(modes));
                let own = known.unwrap_or_else(|| {
                    let made = Arc::new(Modes::new(law));
                    modes.push((Arc::as_ptr(law), Arc::clone(&made)));
                    made
                });
                Self::Prismatic(PrismaticPiece::new(states, length, own))
            }
            PieceLaw::Varying(laws) => Self::Varying(Box::new(VaryingPiece::new(
                states,
                length,
                Arc::clone(laws),
                units.to_vec(),
            ))),
        }
    }

    pub(crate) const fn is_prismatic(&self) -> bool {
        matches!(self, Self::Prismatic(_))
    }

    pub(super) fn terms(&self) -> usize {
        match self {
            Self::Prismatic(piece) => piece.terms(),
            Self::Varying(_) => VARYING_TERMS,
        }
    }

    /// The decay of each mode of slip; none over a varying piece.
    pub(super) fn decays(&self, slips: usize) -> Vec<f64> {
        match self {
            Self::Prismatic(piece) => piece.decays().collect(),
            Self::Varying(_) => vec![0.0; slips],
        }
    }

    pub(super) fn relation(&self) -> Relation {
        match self {
            Self::Prismatic(piece) => piece.relation(),
            Self::Varying(piece) => piece.relation(),
        }
    }

    pub(super) fn load_side(&self, load: &PieceLoad<'_>, side: &mut [f64]) {
        match self {
            Self::Prismatic(piece) => piece.load_side(load, side),
            Self::Varying(piece) => piece.load_side(load, side),
        }
    }

    /// The fields, and what each state can be wrong by over this piece.
    pub(super) fn fields(
        &self,
        ends: [&[f64]; 2],
        load: &PieceLoad<'_>,
        terms: usize,
        width: usize,
        out: &mut [f64],
    ) -> Vec<f64> {
        match self {
            Self::Prismatic(piece) => {
                piece.fields(ends, load, terms, out);
                Vec::new()
            }
            Self::Varying(piece) => piece.fields(ends[0], load, width, out),
        }
    }
}
