//! The forces of the holds, and the error estimate: what is left of equilibrium and continuity at
//! the stations, and, over varying pieces, of the equations between the points.

use super::beam::{Beam, Solved};
use super::load::LoadCase;

/// What rounding may do to a field of polynomials, relative to its peak; ten times as much where
/// exponentials or collocation take part.
const ROUNDING: f64 = 1e-13;

/// What is left between the points tells the size of an error, not its bound.
const SAFETY: f64 = 8.0;

/// A field smaller than this share of the greatest of its kind is measured against that.
const SMALL_FIELD: f64 = 1e-4;

/// Completes a solution: the force of each hold, and the estimate relative to the peaks.
pub(super) fn complete(beam: &Beam, load: &LoadCase, solved: &mut Solved, defects: &[f64]) {
    let all = beam.states.all();
    let half = all / 2;
    let last = beam.pieces.len();
    let decays = beam.states.slips;
    let value = |solved: &Solved, piece: usize, state: usize, at_end: bool| {
        let line = beam.field(solved, piece, state);
        let (polynomial, exponentials) = line.split_at(beam.terms());
        let decay = &beam.decays()[piece * decays..(piece + 1) * decays];
        let near: f64 = if at_end {
            polynomial.iter().rev().sum()
        } else {
            polynomial[0]
        };
        exponentials
            .chunks_exact(2)
            .zip(decay)
            .fold(near, |sum, (pair, decay)| {
                let (near, far) = if at_end { (1, 0) } else { (0, 1) };
                if pair == [0.0, 0.0] {
                    sum
                } else {
                    sum + pair[near] + pair[far] * crate::math::exp(-decay)
                }
            })
    };
    let mut before = vec![0.0; all];
    let mut after = vec![0.0; all];
    let mut outside = vec![0.0; half];
    let mut jump = vec![0.0; half];
    let mut peaks = vec![0.0_f64; all];
    let mut left_over = (0.0_f64, 0.0_f64);
    let mut reactions = Vec::with_capacity(load.moved.len());
    for k in 0..=last {
        for i in 0..all {
            before[i] = if k > 0 {
                value(solved, k - 1, i, true) / beam.units[i]
            } else {
                0.0
            };
            after[i] = if k < last {
                value(solved, k, i, false) / beam.units[i]
            } else {
                0.0
            };
            peaks[i] = peaks[i].max(before[i].abs()).max(after[i].abs());
            if k < last && i < half {
                // A span on two supports has no deflection at its ends: its growth measures it.
                let line = beam.field(solved, k, i);
                peaks[i] = peaks[i].max((line[1] / beam.units[i]).abs());
            }
        }
        for (force, at) in outside.iter_mut().zip(0..half) {
            *force = load.at_station(k)[at] / beam.units[half + at];
        }
        let conditions = &beam.conditions[k];
        for (i, number) in jump.iter_mut().enumerate() {
            *number = after[half + i] - before[half + i] + outside[i];
        }
        reactions.extend(conditions.held_forces(&jump, &beam.scale));
        let is_end = k == 0 || k == last;
        let moved = &load.moved[beam.first_hold(k)..];
        let (left, right) = before.split_at(half);
        let displacements = if k == last { left } else { &after[..half] };
        let gap = (!is_end).then_some((left, right));
        let sides = conditions.left_over(displacements, gap, &jump, moved);
        left_over = (left_over.0.max(sides.0), left_over.1.max(sides.1));
    }
    solved.reactions = reactions;
    let greatest =
        |range: std::ops::Range<usize>| peaks[range].iter().fold(0.0, |a, b| f64::max(a, *b));
    let relative = |left: f64, peak: f64| if peak > 0.0 { left / peak } else { left };
    let group = [greatest(0..half), greatest(half..all)];
    let mut residual = relative(left_over.0, group[0]).max(relative(left_over.1, group[1]));
    let mut is_varying = false;
    for (i, defect) in defects.iter().enumerate() {
        // A field that all but vanishes beside the others of its kind is noise in itself.
        let peak = peaks[i].max(SMALL_FIELD * group[usize::from(i >= half)]);
        residual = residual.max(relative(SAFETY * defect / beam.units[i], peak));
        is_varying |= *defect > 0.0;
    }
    let is_exact = !is_varying && beam.states.slips == 0;
    solved.residual = residual + if is_exact { ROUNDING } else { 10.0 * ROUNDING };
}
