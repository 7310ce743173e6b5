//! The block-banded sweep: elimination along a chain of two-ended relations.
//!
//! The unknowns are the states y_0 ... y_n at the nodes, 2 h numbers each. h conditions stand on
//! y_0, 2 h relations between each pair of neighbours, h conditions on y_n. Going from left to
//! right, the h conditions carried to a node and the relations behind it are reduced: first the
//! carried conditions, by column pivots, which creates no fill; then the relations, by row pivots.
//! h conditions on the next node remain. Alternate row and column elimination of this kind is
//! stable without any condition on the order of the equations (Varah, SIAM J. Numer. Anal. 13,
//! 1976, 71, from memory; Diaz, Fairweather, Keast, ACM Trans. Math. Softw. 9, 1983, 358, from memory).
//! The factors are kept and serve any number of load cases.

use super::last::Last;
use super::link::{Link, Room};
use super::relation::Relation;

/// A pivot smaller than this, against the greatest number in its equations, is a zero.
pub(super) const SMALLEST_PIVOT: f64 = 1e-13;

/// The equations do not determine the states; holds a motion that nothing resists: the scaled
/// states of all nodes, one after the other.
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct Singular {
    pub(crate) motion: Vec<f64>,
}

/// The factors of a chain of relations.
#[derive(Clone, Debug)]
pub(crate) struct Sweep {
    half: usize,
    links: Vec<Link>,
    last: Last,
}

/// The load side of a whole chain, for one load case: h numbers of the left end, 2 h of each
/// relation, h of the right end.
#[derive(Clone, Debug)]
pub(crate) struct ChainLoad {
    pub(crate) left: Vec<f64>,
    pub(crate) relations: Vec<f64>,
    pub(crate) right: Vec<f64>,
}

impl Sweep {
    /// Reduces a chain: conditions on the first state (h rows), relations, conditions on the last
    /// state. All numbers are those of scaled states.
    pub(crate) fn factor(
        half: usize,
        left: &[f64],
        relations: &[Relation],
        right: &[f64],
    ) -> Result<Self, Singular> {
        let mut carried = left.to_vec();
        let mut links = Vec::with_capacity(relations.len());
        let mut room = Room::new(half);
        for relation in relations {
            let (link, free) = Link::reduce(half, &mut carried, relation, &mut room);
            if let Some(state) = free {
                return Err(Singular {
                    motion: back(half, &links, state, None),
                });
            }
            links.push(link);
        }
        let (last, free) = Last::reduce(half, &carried, right);
        match free {
            None => Ok(Self { half, links, last }),
            Some(state) => Err(Singular {
                motion: back(half, &links, state, None),
            }),
        }
    }

    /// The states at all nodes under one load case, one node after the other.
    pub(crate) fn solve(&self, load: ChainLoad) -> Vec<f64> {
        let (half, all) = (self.half, 2 * self.half);
        let (mut carried, mut reduced) = (load.left, load.relations);
        for (link, side) in self.links.iter().zip(reduced.chunks_exact_mut(all)) {
            link.reduce_side(half, &mut carried, side);
        }
        carried.extend_from_slice(&load.right);
        let end = self.last.solve(carried);
        back(half, &self.links, end, Some(&reduced))
    }
}

/// Goes back from the last state to the first; without load sides, along a free motion.
fn back(half: usize, links: &[Link], end: Vec<f64>, sides: Option<&[f64]>) -> Vec<f64> {
    let all = 2 * half;
    let mut states = vec![0.0; links.len() * all];
    states.extend_from_slice(&end);
    for (k, link) in links.iter().enumerate().rev() {
        let (before, after) = states.split_at_mut((k + 1) * all);
        let side = sides.map(|sides| &sides[k * all..(k + 1) * all]);
        link.back(half, side, &after[..all], &mut before[k * all..]);
    }
    states
}
