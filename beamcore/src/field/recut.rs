//! A field cut at more stations.

use super::piecewise::{Piecewise, Tail};
use crate::math::{exp, polynomial};
use std::sync::Arc;

impl Piecewise {
    /// The same field over the pieces between these stations, all of its own among them.
    pub(super) fn recut(&self, stations: &Arc<[f64]>) -> Self {
        let pieces = stations.len() - 1;
        let mut new = Self {
            stations: Arc::clone(stations),
            terms: self.terms,
            polynomials: Vec::with_capacity(pieces * self.terms),
            tails: Vec::new(),
        };
        let mut cuts = Vec::with_capacity(pieces);
        for ends in stations.windows(2) {
            let own = self.stations.partition_point(|&s| s <= ends[0]) - 1;
            let (from, length) = (
                self.stations[own],
                self.stations[own + 1] - self.stations[own],
            );
            let (start, end) = ((ends[0] - from) / length, (ends[1] - from) / length);
            cuts.push((own, start, end));
            let c = &self.polynomials[own * self.terms..(own + 1) * self.terms];
            new.polynomials.extend(polynomial::stretch(c, start, end));
        }
        for tail in &self.tails {
            let modes = tail.decays.len() / self.len();
            let (mut decays, mut factors) = (Vec::new(), Vec::new());
            for &(own, start, end) in &cuts {
                for mode in own * modes..(own + 1) * modes {
                    let decay = tail.decays[mode];
                    decays.push(decay * (end - start));
                    factors.push(tail.factors[2 * mode] * exp(-decay * start));
                    let behind = decay * (1.0 - end);
                    factors.push(tail.factors[2 * mode + 1] * exp(-behind));
                }
            }
            new.tails.push(Tail {
                decays: decays.into(),
                factors,
            });
        }
        new
    }
}

/// All stations of two members of one length, each once.
pub(super) fn merged(a: &[f64], b: &[f64]) -> Arc<[f64]> {
    let mut both: Vec<f64> = a.iter().chain(b).copied().collect();
    both.sort_by(f64::total_cmp);
    both.dedup();
    both.into()
}
