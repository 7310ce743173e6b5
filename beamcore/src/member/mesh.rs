//! Where pieces of varying section, or of layers that part, are cut, so that their points see every
//! change. The caller of the library never chooses this.

use crate::solve::gauss::RULE;
use crate::solve::law::Law;
use crate::solve::modes::inverse;

/// A disturbance may decay by this much over one piece where it lives.
const DECAY: f64 = 1.0;

/// What a disturbance has decayed by when it is nothing beside its beginning: e^-40 = 4e-18.
const GONE: f64 = 40.0;

/// How much a depth may grow over one piece.
const GROWTH: f64 = 0.08;

/// The places of the cuts of a stretch, with its ends, given the laws at both ends and times.
pub(super) fn cuts([from, to]: [f64; 2], laws: &[Law]) -> Vec<f64> {
    let flexibilities: Vec<_> = laws.iter().map(|law| inverse(&law.stiffness)).collect();
    let decay = laws
        .iter()
        .zip(&flexibilities)
        .map(|(law, flexibility)| law.decay_rate(flexibility))
        .fold(0.0, f64::max);
    let bending = |k: usize| flexibilities[k][(0, 0)];
    // The laws are those of the left end at both times, then of the right end. EI goes with the
    // third power of a depth.
    let half = laws.len() / 2;
    let growth = (0..half)
        .map(|k| {
            let ratio = bending(k) / bending(half + k);
            crate::math::cbrt(ratio.max(1.0 / ratio)) - 1.0
        })
        .fold(0.0, f64::max);
    let length = to - from;
    let greatest = length / (growth / GROWTH).ceil().max(1.0);
    let mut steps = vec![0.0];
    // From the left end to the middle: short pieces while a disturbance lives, then longer ones.
    let mut x = 0.0;
    while x < length / 2.0 {
        let lives = decay * x < GONE;
        let step = if decay == 0.0 {
            greatest
        } else if lives {
            DECAY / decay
        } else {
            x
        };
        x += step.min(greatest);
        steps.push(x);
    }
    let scale = length / 2.0 / x;
    let left: Vec<f64> = steps.iter().map(|s| s * scale).collect();
    if decay == 0.0 && greatest >= length {
        return vec![from, to];
    }
    let mut cuts: Vec<f64> = left.iter().map(|s| from + s).collect();
    cuts.extend(left.iter().rev().skip(1).map(|s| to - s));
    let last = cuts.len() - 1;
    cuts[last] = to;
    cuts
}

/// The places at which the section of a piece is looked at: the points, then both ends.
pub(super) fn points([from, to]: [f64; 2]) -> impl Iterator<Item = f64> {
    let inner = RULE.points.iter().map(move |t| from + (to - from) * t);
    inner.chain([from, to])
}
