//! One station of the sweep: the conditions carried to it and the relation behind it, reduced.

use super::relation::Relation;
use super::sweep::SMALLEST_PIVOT;
use nalgebra::{SMatrix, SVector};

/// One reduced link of the chain: the equations that give y_k once y_(k+1) is known.
#[derive(Clone, Debug)]
pub(super) struct Link<const D: usize, const H: usize> {
    /// Order in which the columns were used as pivots.
    columns: [usize; D],
    /// Row exchanges among the carried conditions and among the relations.
    carried_swap: [usize; H],
    relation_swap: [usize; H],
    /// Pivot rows of the carried conditions, and the multipliers below them.
    carried: SMatrix<f64, H, D>,
    carried_factors: SMatrix<f64, H, H>,
    /// What was taken off each relation for each carried condition.
    cross_factors: SMatrix<f64, D, H>,
    /// Pivot rows of the relations (the first H rows), and the multipliers below them.
    left: SMatrix<f64, D, D>,
    right: SMatrix<f64, D, D>,
    relation_factors: SMatrix<f64, D, H>,
}

impl<const D: usize, const H: usize> Link<D, H> {
    /// Reduces the conditions carried to a station and the relation behind it; gives the link, the
    /// conditions on the next station and, if a pivot is missing, a state that is free to move
    /// while the next one is zero.
    pub(super) fn reduce(
        mut carried: SMatrix<f64, H, D>,
        relation: &Relation<D>,
    ) -> (Self, SMatrix<f64, H, D>, Option<SVector<f64, D>>) {
        let size = carried.amax().max(relation.left.amax());
        let mut missing = None;
        let (mut left, mut right) = (relation.left, relation.right);
        let mut columns = std::array::from_fn(|c| c);
        let mut carried_swap = [0; H];
        let mut carried_factors = SMatrix::<f64, H, H>::zeros();
        let mut cross_factors = SMatrix::<f64, D, H>::zeros();
        for s in 0..H {
            let (row, column) = greatest(&carried, s, s, &columns);
            carried_swap[s] = row;
            columns.swap(s, column);
            carried.swap_rows(s, row);
            carried_factors.swap_rows(s, row);
            let c = columns[s];
            let pivot = carried[(s, c)];
            if pivot.abs() < SMALLEST_PIVOT * size {
                missing = missing.or(Some(s));
                continue;
            }
            for r in s + 1..H {
                let factor = carried[(r, c)] / pivot;
                carried_factors[(r, s)] = factor;
                for &j in &columns[s..] {
                    carried[(r, j)] -= factor * carried[(s, j)];
                }
            }
            for r in 0..D {
                let factor = left[(r, c)] / pivot;
                cross_factors[(r, s)] = factor;
                for &j in &columns[s..] {
                    left[(r, j)] -= factor * carried[(s, j)];
                }
            }
        }
        let mut relation_swap = [0; H];
        let mut relation_factors = SMatrix::<f64, D, H>::zeros();
        for s in 0..H {
            let (row, column) = greatest(&left, s, H + s, &columns);
            relation_swap[s] = row;
            columns.swap(H + s, column);
            left.swap_rows(s, row);
            right.swap_rows(s, row);
            relation_factors.swap_rows(s, row);
            let c = columns[H + s];
            let pivot = left[(s, c)];
            if pivot.abs() < SMALLEST_PIVOT * size {
                missing = missing.or(Some(H + s));
                continue;
            }
            for r in s + 1..D {
                let factor = left[(r, c)] / pivot;
                relation_factors[(r, s)] = factor;
                if factor == 0.0 {
                    continue;
                }
                for &j in &columns[H + s..] {
                    left[(r, j)] -= factor * left[(s, j)];
                }
                for j in 0..D {
                    right[(r, j)] -= factor * right[(s, j)];
                }
            }
        }
        let next = SMatrix::<f64, H, D>::from_fn(|i, j| right[(H + i, j)]);
        let link = Self {
            columns,
            carried_swap,
            relation_swap,
            carried,
            carried_factors,
            cross_factors,
            left,
            right,
            relation_factors,
        };
        let free = missing.map(|rank| link.free_state(rank));
        (link, next, free)
    }

    /// The state that moves freely where the pivot of the given rank is missing.
    fn free_state(&self, rank: usize) -> SVector<f64, D> {
        let mut state = SVector::zeros();
        state[self.columns[rank]] = 1.0;
        for s in (0..rank).rev() {
            self.eliminate_back(s, 0.0, &SVector::zeros(), &mut state);
        }
        state
    }

    /// The same steps on a load side: the right-hand sides of the pivot rows, and of the
    /// conditions on the next station.
    pub(super) fn reduce_side(
        &self,
        mut carried: SVector<f64, H>,
        mut side: SVector<f64, D>,
    ) -> (SVector<f64, D>, SVector<f64, H>) {
        let mut own = SVector::<f64, D>::zeros();
        for s in 0..H {
            carried.swap_rows(s, self.carried_swap[s]);
        }
        for s in 0..H {
            for r in s + 1..H {
                carried[r] -= self.carried_factors[(r, s)] * carried[s];
            }
            for r in 0..D {
                side[r] -= self.cross_factors[(r, s)] * carried[s];
            }
            own[s] = carried[s];
        }
        for s in 0..H {
            side.swap_rows(s, self.relation_swap[s]);
        }
        for s in 0..H {
            for r in s + 1..D {
                side[r] -= self.relation_factors[(r, s)] * side[s];
            }
            own[H + s] = side[s];
        }
        (own, SVector::from_fn(|i, _| side[H + i]))
    }

    /// The state at this station from the reduced load side (zero if there is none) and the next
    /// state.
    pub(super) fn back(
        &self,
        side: Option<&SVector<f64, D>>,
        next: &SVector<f64, D>,
    ) -> SVector<f64, D> {
        let mut state = SVector::zeros();
        for s in (0..D).rev() {
            self.eliminate_back(s, side.map_or(0.0, |side| side[s]), next, &mut state);
        }
        state
    }

    /// One step back: the pivot equation of rank `s` gives the state in its pivot column.
    fn eliminate_back(
        &self,
        s: usize,
        side: f64,
        next: &SVector<f64, D>,
        state: &mut SVector<f64, D>,
    ) {
        let c = self.columns[s];
        let mut sum = side;
        let pivot = if s < H {
            for &j in &self.columns[s + 1..] {
                sum -= self.carried[(s, j)] * state[j];
            }
            self.carried[(s, c)]
        } else {
            let row = s - H;
            for j in 0..D {
                sum -= self.right[(row, j)] * next[j];
            }
            for &j in &self.columns[s + 1..] {
                sum -= self.left[(row, j)] * state[j];
            }
            self.left[(row, c)]
        };
        state[c] = sum / pivot;
    }
}

/// The place of the greatest number among the rows from `row` on and the columns that have not
/// been used: (row, position in `columns`). The first of equals is taken.
pub(super) fn greatest<const R: usize, const C: usize>(
    matrix: &SMatrix<f64, R, C>,
    row: usize,
    used: usize,
    columns: &[usize; C],
) -> (usize, usize) {
    let mut best = (row, used);
    let mut size = -1.0;
    for r in row..R {
        for (position, &c) in columns.iter().enumerate().skip(used) {
            if matrix[(r, c)].abs() > size {
                size = matrix[(r, c)].abs();
                best = (r, position);
            }
        }
    }
    best
}
