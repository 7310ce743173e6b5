//! The error estimate of polynomial pieces: what is left of equilibrium and continuity.

use super::beam::{LoadCase, Solved};
use crate::math::polynomial::value_at_one;

/// The greatest of three remainders, each relative to the sum of the magnitudes in it:
/// vertical forces, moments about the left end, and jumps of deflection and slope between pieces
/// (relative to the peak of the field).
pub(super) fn of(stations: &[f64], load: &LoadCase, solved: &Solved) -> f64 {
    let mut forces = Sum::default();
    let mut moments = Sum::default();
    for (k, &x) in stations.iter().enumerate() {
        let arm = x - stations[0];
        let reaction = solved.reactions[k];
        forces.add(load.point[k] - reaction.force);
        moments.add(arm * load.point[k]);
        moments.add(-arm * reaction.force);
        moments.add(reaction.couple);
        moments.add(load.couple[k]);
    }
    for (ends, piece) in stations.windows(2).zip(&load.pieces) {
        let [left, right] = piece.line;
        // A line load is two triangles, each with its force at a third of the length.
        let third = (ends[1] - ends[0]) / 3.0;
        for (line, arm) in [(left, third), (right, 2.0 * third)] {
            let force = line * 1.5 * third;
            forces.add(force);
            moments.add(force * (ends[0] + arm - stations[0]));
        }
    }
    let (mut w_jump, mut w_peak) = (0.0_f64, 0.0_f64);
    let (mut slope_jump, mut slope_peak) = (0.0_f64, 0.0_f64);
    for (k, piece) in solved.fields.iter().enumerate() {
        w_peak = w_peak
            .max(piece.deflection[0].abs())
            .max(value_at_one(&piece.deflection).abs());
        // Over a span on two supports the deflection is zero at both ends: its slope measures it.
        w_peak = w_peak.max(piece.deflection[1].abs());
        slope_peak = slope_peak.max(piece.slope[0].abs());
        if let Some(next) = solved.fields.get(k + 1) {
            w_jump = w_jump.max((value_at_one(&piece.deflection) - next.deflection[0]).abs());
            slope_jump = slope_jump.max((value_at_one(&piece.slope) - next.slope[0]).abs());
        }
    }
    let relative = |jump: f64, peak: f64| if peak > 0.0 { jump / peak } else { 0.0 };
    forces
        .relative()
        .max(moments.relative())
        .max(relative(w_jump, w_peak))
        .max(relative(slope_jump, slope_peak))
}

#[derive(Default)]
struct Sum {
    sum: f64,
    size: f64,
}

impl Sum {
    fn add(&mut self, term: f64) {
        self.sum += term;
        self.size += term.abs();
    }

    fn relative(&self) -> f64 {
        if self.size > 0.0 {
            self.sum.abs() / self.size
        } else {
            0.0
        }
    }
}
