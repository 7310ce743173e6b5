//! One node of the sweep: the conditions carried to it and the relation behind it, reduced.

use super::relation::Relation;
use super::sweep::SMALLEST_PIVOT;

/// One reduced link of the chain: the equations that give y_k once y_(k+1) is known. All matrices
/// are kept row by row; with h conditions and d = 2 h states:
#[derive(Clone, Debug)]
pub(super) struct Link {
    /// d: the order in which the columns were used as pivots; then h row exchanges among the
    /// carried conditions and h among the relations.
    order: Box<[u32]>,
    /// In one block: h x d pivot rows of the carried conditions, d x d pivot rows of the relations
    /// (h rows on y_k, then h rows on y_(k+1)), h x h and d x h multipliers below the carried
    /// pivots, d x h multipliers below the relations' pivots.
    numbers: Box<[f64]>,
}

/// Room for the matrices of one step.
pub(super) struct Room {
    left: Vec<f64>,
    right: Vec<f64>,
    below: Vec<f64>,
    cross: Vec<f64>,
    multipliers: Vec<f64>,
}

impl Room {
    pub(super) fn new(half: usize) -> Self {
        let all = 2 * half;
        Self {
            left: vec![0.0; all * all],
            right: vec![0.0; all * all],
            below: vec![0.0; half * half],
            cross: vec![0.0; all * half],
            multipliers: vec![0.0; all * half],
        }
    }
}

/// `target` -= `factor` x `source` in the columns given.
#[inline]
fn take_off(target: &mut [f64], source: &[f64], factor: f64, columns: &[u32]) {
    for &column in columns {
        target[column as usize] -= factor * source[column as usize];
    }
}

/// Two rows of a matrix of `all` columns, the second below the first.
#[inline]
fn two_rows(matrix: &mut [f64], all: usize, upper: usize, lower: usize) -> (&[f64], &mut [f64]) {
    let (head, tail) = matrix.split_at_mut(lower * all);
    (&head[upper * all..(upper + 1) * all], &mut tail[..all])
}

/// Exchanges two rows of a matrix of the given width.
fn swap_rows(matrix: &mut [f64], width: usize, a: usize, b: usize) {
    if a != b {
        for column in 0..width {
            matrix.swap(a * width + column, b * width + column);
        }
    }
}

impl Link {
    /// Reduces the conditions carried to a node and the relation behind it; leaves in `carried` the
    /// conditions on the next node and, if a pivot is missing, gives a state that is free to move
    /// while the next one is zero.
    pub(super) fn reduce(
        half: usize,
        carried: &mut [f64],
        relation: &Relation,
        room: &mut Room,
    ) -> (Self, Option<Vec<f64>>) {
        let all = 2 * half;
        room.left.copy_from_slice(&relation.left);
        room.right.copy_from_slice(&relation.right);
        room.below.fill(0.0);
        room.cross.fill(0.0);
        room.multipliers.fill(0.0);
        let (left, right) = (&mut room.left[..], &mut room.right[..]);
        let size = greatest_number(carried).max(greatest_number(left));
        let mut missing = None;
        let mut order: Box<[u32]> = (0..2 * all as u32).collect();
        for s in 0..half {
            let (row, position) = greatest(carried, all, s..half, &order[s..all]);
            order[all + s] = row as u32;
            order.swap(s, s + position);
            swap_rows(carried, all, s, row);
            swap_rows(&mut room.below, half, s, row);
            let c = order[s] as usize;
            let pivot = carried[s * all + c];
            if pivot.abs() < SMALLEST_PIVOT * size {
                missing = missing.or(Some(s));
                continue;
            }
            for r in s + 1..half {
                let factor = carried[r * all + c] / pivot;
                room.below[r * half + s] = factor;
                let (upper, lower) = two_rows(carried, all, s, r);
                take_off(lower, upper, factor, &order[s..all]);
            }
            let upper = &carried[s * all..(s + 1) * all];
            for r in 0..all {
                let lower = &mut left[r * all..(r + 1) * all];
                let factor = lower[c] / pivot;
                room.cross[r * half + s] = factor;
                if factor != 0.0 {
                    take_off(lower, upper, factor, &order[s..all]);
                }
            }
        }
        for s in 0..half {
            let (row, position) = greatest(left, all, s..all, &order[half + s..all]);
            order[all + half + s] = row as u32;
            order.swap(half + s, half + s + position);
            swap_rows(left, all, s, row);
            swap_rows(right, all, s, row);
            swap_rows(&mut room.multipliers, half, s, row);
            let c = order[half + s] as usize;
            let pivot = left[s * all + c];
            if pivot.abs() < SMALLEST_PIVOT * size {
                missing = missing.or(Some(half + s));
                continue;
            }
            for r in s + 1..all {
                let factor = left[r * all + c] / pivot;
                room.multipliers[r * half + s] = factor;
                if factor != 0.0 {
                    let (upper, lower) = two_rows(left, all, s, r);
                    take_off(lower, upper, factor, &order[half + s..all]);
                    let (upper, lower) = two_rows(right, all, s, r);
                    for (target, source) in lower.iter_mut().zip(upper) {
                        *target -= factor * source;
                    }
                }
            }
        }
        let mut numbers = Vec::with_capacity(3 * half * all + half * half + 2 * half * all);
        numbers.extend_from_slice(carried);
        numbers.extend_from_slice(&left[..half * all]);
        numbers.extend_from_slice(&right[..half * all]);
        numbers.extend_from_slice(&room.below);
        numbers.extend_from_slice(&room.cross);
        numbers.extend_from_slice(&room.multipliers);
        carried.copy_from_slice(&right[half * all..]);
        let link = Self {
            order,
            numbers: numbers.into(),
        };
        let free = missing.map(|rank| link.free_state(half, rank));
        (link, free)
    }

    /// The state that moves freely where the pivot of the given rank is missing.
    fn free_state(&self, half: usize, rank: usize) -> Vec<f64> {
        let all = 2 * half;
        let mut state = vec![0.0; all];
        state[self.order[rank] as usize] = 1.0;
        let next = vec![0.0; all];
        for s in (0..rank).rev() {
            self.eliminate_back(half, s, 0.0, &next, &mut state);
        }
        state
    }

    /// The same steps on a load side: leaves in `side` the right-hand sides of the pivot rows, and
    /// in `carried` those of the conditions on the next node.
    pub(super) fn reduce_side(&self, half: usize, carried: &mut [f64], side: &mut [f64]) {
        let all = 2 * half;
        let (carried_swaps, relation_swaps) = self.order[all..].split_at(half);
        let (below, rest) = self.numbers[3 * half * all..].split_at(half * half);
        let (cross, multipliers) = rest.split_at(all * half);
        for (s, &row) in carried_swaps.iter().enumerate() {
            carried.swap(s, row as usize);
        }
        for s in 0..half {
            for r in s + 1..half {
                carried[r] -= below[r * half + s] * carried[s];
            }
        }
        for (number, factors) in side.iter_mut().zip(cross.chunks_exact(half)) {
            for (factor, value) in factors.iter().zip(&*carried) {
                *number -= factor * value;
            }
        }
        for (s, &row) in relation_swaps.iter().enumerate() {
            side.swap(s, row as usize);
        }
        for s in 0..half {
            let pivot = side[s];
            for r in s + 1..all {
                side[r] -= multipliers[r * half + s] * pivot;
            }
        }
        // The reduced conditions go on; their place takes the right-hand sides of this node.
        for s in 0..half {
            let next = side[half + s];
            side[half + s] = side[s];
            side[s] = carried[s];
            carried[s] = next;
        }
    }

    /// The state at this node from the reduced load side (zero if there is none) and the next
    /// state.
    pub(super) fn back(&self, half: usize, side: Option<&[f64]>, next: &[f64], state: &mut [f64]) {
        for s in (0..2 * half).rev() {
            self.eliminate_back(half, s, side.map_or(0.0, |side| side[s]), next, state);
        }
    }

    /// One step back: the pivot equation of rank `s` gives the state in its pivot column.
    #[inline]
    fn eliminate_back(&self, half: usize, s: usize, side: f64, next: &[f64], state: &mut [f64]) {
        let all = 2 * half;
        let row = &self.numbers[s * all..(s + 1) * all];
        let mut sum = side;
        if s >= half {
            let behind = &self.numbers[(half + s) * all..(half + s + 1) * all];
            for (factor, value) in behind.iter().zip(next) {
                sum -= factor * value;
            }
        }
        for &j in &self.order[s + 1..all] {
            sum -= row[j as usize] * state[j as usize];
        }
        let c = self.order[s] as usize;
        state[c] = sum / row[c];
    }
}

fn greatest_number(matrix: &[f64]) -> f64 {
    matrix
        .iter()
        .fold(0.0, |size, number| number.abs().max(size))
}

/// The place of the greatest number among the given rows and columns: (row, position in
/// `columns`). The first of equals is taken.
pub(super) fn greatest(
    matrix: &[f64],
    all: usize,
    rows: std::ops::Range<usize>,
    columns: &[u32],
) -> (usize, usize) {
    let mut best = (rows.start, 0);
    let mut size = -1.0;
    for r in rows {
        let row = &matrix[r * all..(r + 1) * all];
        for (position, &c) in columns.iter().enumerate() {
            if row[c as usize].abs() > size {
                size = row[c as usize].abs();
                best = (r, position);
            }
        }
    }
    best
}
