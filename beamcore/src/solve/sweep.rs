//! The block-banded sweep: elimination along a chain of two-ended relations.
//!
//! The unknowns are the states y_0 ... y_n at the stations. H conditions stand on y_0, D relations
//! between each pair of neighbours, D - H = H conditions on y_n. Going from left to right, the H
//! conditions carried to a station and the D relations behind it are reduced: first the carried
//! conditions, by column pivots, which creates no fill; then the relations, by row pivots. H
//! conditions on the next station remain. Alternate row and column elimination of this kind is
//! stable without any condition on the order of the equations (Varah, SIAM J. Numer. Anal. 13,
//! 1976, 71, from memory; Diaz, Fairweather, Keast, ACM Trans. Math. Softw. 9, 1983, 358, from memory).
//! The factors are kept and serve any number of load cases.

use super::last::Last;
use super::link::Link;
use super::relation::Relation;
use nalgebra::{SMatrix, SVector};

/// A pivot smaller than this, against the greatest number in its equations, is a zero.
pub(super) const SMALLEST_PIVOT: f64 = 1e-11;

/// The equations do not determine the states; holds a motion that nothing resists, one scaled
/// state per station.
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct Singular<const D: usize> {
    pub(crate) motion: Vec<SVector<f64, D>>,
}

/// The factors of a chain of relations.
#[derive(Clone, Debug)]
pub(crate) struct Sweep<const D: usize, const H: usize> {
    links: Vec<Link<D, H>>,
    last: Last<D>,
}

/// The load side of a whole chain, for one load case.
#[derive(Clone, Debug)]
pub(crate) struct ChainLoad<const D: usize, const H: usize> {
    pub(crate) left: SVector<f64, H>,
    pub(crate) relations: Vec<SVector<f64, D>>,
    pub(crate) right: SVector<f64, H>,
}

impl<const D: usize, const H: usize> Sweep<D, H> {
    /// Reduces a chain: conditions on the first state, relations, conditions on the last state.
    pub(crate) fn factor(
        left: SMatrix<f64, H, D>,
        relations: &[Relation<D>],
        right: &SMatrix<f64, H, D>,
    ) -> Result<Self, Singular<D>> {
        let mut carried = left;
        let mut links = Vec::with_capacity(relations.len());
        for relation in relations {
            let (link, next, free) = Link::reduce(carried, relation);
            links.push(link);
            carried = next;
            if let Some(state) = free {
                return Err(Singular {
                    motion: back(&links[..links.len() - 1], state, |_| None),
                });
            }
        }
        let (last, free) = Last::reduce(&carried, right);
        match free {
            None => Ok(Self { links, last }),
            Some(state) => Err(Singular {
                motion: back(&links, state, |_| None),
            }),
        }
    }

    /// The states at all stations under one load case.
    pub(crate) fn solve(&self, load: &ChainLoad<D, H>) -> Vec<SVector<f64, D>> {
        let mut carried = load.left;
        let mut reduced = Vec::with_capacity(self.links.len());
        for (link, side) in self.links.iter().zip(&load.relations) {
            let (own, next) = link.reduce_side(carried, *side);
            reduced.push(own);
            carried = next;
        }
        let mut side = SVector::<f64, D>::zeros();
        for i in 0..H {
            side[i] = carried[i];
            side[H + i] = load.right[i];
        }
        back(&self.links, self.last.solve(side), |k| Some(&reduced[k]))
    }
}

/// Goes back from the last state to the first; without load sides, along a free motion.
fn back<'a, const D: usize, const H: usize>(
    links: &[Link<D, H>],
    end: SVector<f64, D>,
    side: impl Fn(usize) -> Option<&'a SVector<f64, D>>,
) -> Vec<SVector<f64, D>> {
    let mut states = vec![end; links.len() + 1];
    for k in (0..links.len()).rev() {
        states[k] = links[k].back(side(k), &states[k + 1]);
    }
    states
}
