//! The end of the sweep: the square system that is left for the last state.

use super::link::greatest;
use super::sweep::SMALLEST_PIVOT;

/// The conditions on the last state, reduced with row and column pivots; matrices row by row.
#[derive(Clone, Debug)]
pub(super) struct Last {
    all: usize,
    /// One over the greatest number of each equation.
    row_scale: Vec<f64>,
    rows: Vec<f64>,
    factors: Vec<f64>,
    swaps: Vec<usize>,
    columns: Vec<u32>,
}

impl Last {
    /// Reduces the carried conditions and those of the right end together; also gives a state that
    /// is free to move, if there is one.
    pub(super) fn reduce(half: usize, carried: &[f64], end: &[f64]) -> (Self, Option<Vec<f64>>) {
        let all = 2 * half;
        let mut rows = carried.to_vec();
        rows.extend_from_slice(end);
        let mut row_scale = Vec::with_capacity(all);
        for row in rows.chunks_exact_mut(all) {
            let scale = 1.0 / row.iter().fold(0.0_f64, |size, n| size.max(n.abs()));
            row.iter_mut().for_each(|number| *number *= scale);
            row_scale.push(scale);
        }
        let mut last = Self {
            all,
            row_scale,
            rows,
            factors: vec![0.0; all * all],
            swaps: vec![0; all],
            columns: (0..all as u32).collect(),
        };
        let missing = (0..all).find(|&s| !last.eliminate(s));
        let free = missing.map(|rank| last.free_state(rank));
        (last, free)
    }

    /// One step of the elimination; whether there is a pivot.
    fn eliminate(&mut self, s: usize) -> bool {
        let all = self.all;
        let (row, position) = greatest(&self.rows, all, s..all, &self.columns[s..]);
        self.swaps[s] = row;
        self.columns.swap(s, s + position);
        for column in 0..all {
            self.rows.swap(s * all + column, row * all + column);
            self.factors.swap(s * all + column, row * all + column);
        }
        let c = self.columns[s] as usize;
        let pivot = self.rows[s * all + c];
        if pivot.abs() < SMALLEST_PIVOT {
            return false;
        }
        for r in s + 1..all {
            let factor = self.rows[r * all + c] / pivot;
            self.factors[r * all + s] = factor;
            for &j in &self.columns[s..] {
                self.rows[r * all + j as usize] -= factor * self.rows[s * all + j as usize];
            }
        }
        true
    }

    /// The state under a load side: the carried right-hand sides, then those of the right end.
    pub(super) fn solve(&self, mut side: Vec<f64>) -> Vec<f64> {
        let all = self.all;
        for (number, scale) in side.iter_mut().zip(&self.row_scale) {
            *number *= scale;
        }
        for s in 0..all {
            side.swap(s, self.swaps[s]);
        }
        for s in 0..all {
            for r in s + 1..all {
                side[r] -= self.factors[r * all + s] * side[s];
            }
        }
        let mut state = vec![0.0; all];
        for s in (0..all).rev() {
            self.eliminate_back(s, side[s], &mut state);
        }
        state
    }

    fn free_state(&self, rank: usize) -> Vec<f64> {
        let mut state = vec![0.0; self.all];
        state[self.columns[rank] as usize] = 1.0;
        for s in (0..rank).rev() {
            self.eliminate_back(s, 0.0, &mut state);
        }
        state
    }

    fn eliminate_back(&self, s: usize, side: f64, state: &mut [f64]) {
        let row = &self.rows[s * self.all..(s + 1) * self.all];
        let mut sum = side;
        for &j in &self.columns[s + 1..] {
            sum -= row[j as usize] * state[j as usize];
        }
        let c = self.columns[s] as usize;
        state[c] = sum / row[c];
    }
}
