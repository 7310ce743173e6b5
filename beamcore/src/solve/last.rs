//! The end of the sweep: the square system that is left for the last state.

use super::link::greatest;
use super::sweep::SMALLEST_PIVOT;
use nalgebra::{SMatrix, SVector};

/// The conditions on the last state, reduced with row and column pivots.
#[derive(Clone, Debug)]
pub(super) struct Last<const D: usize> {
    /// One over the greatest number of each equation.
    row_scale: SVector<f64, D>,
    rows: SMatrix<f64, D, D>,
    factors: SMatrix<f64, D, D>,
    swaps: [usize; D],
    columns: [usize; D],
}

impl<const D: usize> Last<D> {
    /// Reduces the carried conditions and those of the right end together; also gives a state that
    /// is free to move, if there is one.
    pub(super) fn reduce<const H: usize>(
        carried: &SMatrix<f64, H, D>,
        end: &SMatrix<f64, H, D>,
    ) -> (Self, Option<SVector<f64, D>>) {
        let mut rows = SMatrix::<f64, D, D>::from_fn(|i, j| {
            if i < H {
                carried[(i, j)]
            } else {
                end[(i - H, j)]
            }
        });
        let row_scale = SVector::<f64, D>::from_fn(|i, _| 1.0 / rows.row(i).amax());
        for i in 0..D {
            for j in 0..D {
                rows[(i, j)] *= row_scale[i];
            }
        }
        let mut factors = SMatrix::<f64, D, D>::zeros();
        let mut swaps = [0; D];
        let mut columns = std::array::from_fn(|c| c);
        let mut missing = None;
        for s in 0..D {
            let (row, column) = greatest(&rows, s, s, &columns);
            swaps[s] = row;
            columns.swap(s, column);
            rows.swap_rows(s, row);
            factors.swap_rows(s, row);
            let c = columns[s];
            let pivot = rows[(s, c)];
            if pivot.abs() < SMALLEST_PIVOT {
                missing = Some(s);
                break;
            }
            for r in s + 1..D {
                let factor = rows[(r, c)] / pivot;
                factors[(r, s)] = factor;
                for &j in &columns[s..] {
                    rows[(r, j)] -= factor * rows[(s, j)];
                }
            }
        }
        let last = Self {
            row_scale,
            rows,
            factors,
            swaps,
            columns,
        };
        let free = missing.map(|rank| last.free_state(rank));
        (last, free)
    }

    /// The state under a load side: the carried right-hand sides, then those of the right end.
    pub(super) fn solve(&self, mut side: SVector<f64, D>) -> SVector<f64, D> {
        for i in 0..D {
            side[i] *= self.row_scale[i];
        }
        for s in 0..D {
            side.swap_rows(s, self.swaps[s]);
        }
        for s in 0..D {
            for r in s + 1..D {
                side[r] -= self.factors[(r, s)] * side[s];
            }
        }
        let mut state = SVector::zeros();
        for s in (0..D).rev() {
            self.eliminate_back(s, side[s], &mut state);
        }
        state
    }

    fn free_state(&self, rank: usize) -> SVector<f64, D> {
        let mut state = SVector::zeros();
        state[self.columns[rank]] = 1.0;
        for s in (0..rank).rev() {
            self.eliminate_back(s, 0.0, &mut state);
        }
        state
    }

    fn eliminate_back(&self, s: usize, side: f64, state: &mut SVector<f64, D>) {
        let c = self.columns[s];
        let mut sum = side;
        for &j in &self.columns[s + 1..] {
            sum -= self.rows[(s, j)] * state[j];
        }
        state[c] = sum / self.rows[(s, c)];
    }
}
