//! A quantity along the member as one curve per piece.

use super::recut::merged;
use crate::math::curve::Decaying;
use crate::math::polynomial::TERMS;
use std::sync::Arc;

/// Curves over the pieces between `stations`; a station may have two values.
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct Piecewise {
    pub(super) stations: Arc<[f64]>,
    /// The number of polynomial coefficients per piece, at least [`TERMS`].
    pub(super) terms: usize,
    pub(super) polynomials: Vec<f64>,
    pub(super) tails: Vec<Tail>,
}

/// Exponentials that decay from the ends of the pieces.
#[derive(Clone, Debug, PartialEq)]
pub(super) struct Tail {
    /// Per piece and mode.
    pub(super) decays: Arc<[f64]>,
    /// Per piece and mode: the factors from the left and from the right.
    pub(super) factors: Vec<f64>,
}

/// A value and the place where it stands.
#[derive(Clone, Copy, Debug, PartialEq)]
pub(crate) struct Peak {
    pub(crate) value: f64,
    pub(crate) at: f64,
}

impl Peak {
    /// The same peak with its value multiplied.
    pub(crate) fn scaled(self, factor: f64) -> Self {
        Self {
            value: self.value * factor,
            at: self.at,
        }
    }
}

impl Piecewise {
    /// A field of zeros over the pieces between the stations.
    pub(crate) fn zero(stations: Arc<[f64]>) -> Self {
        let polynomials = vec![0.0; (stations.len() - 1) * TERMS];
        Self {
            stations,
            terms: TERMS,
            polynomials,
            tails: Vec::new(),
        }
    }

    /// A field of zeros over the same pieces.
    pub(crate) fn zeroed(&self) -> Self {
        Self::zero(Arc::clone(&self.stations))
    }

    /// The number of pieces.
    pub(crate) fn len(&self) -> usize {
        self.stations.len() - 1
    }

    /// Makes room for so many polynomial coefficients per piece.
    fn widen(&mut self, terms: usize) {
        if terms > self.terms {
            let mut wide = vec![0.0; self.len() * terms];
            for (new, old) in wide
                .chunks_exact_mut(terms)
                .zip(self.polynomials.chunks_exact(self.terms))
            {
                new[..self.terms].copy_from_slice(old);
            }
            self.polynomials = wide;
            self.terms = terms;
        }
    }

    /// Adds polynomials, one per piece with `terms` coefficients each, times the factor of the
    /// piece.
    fn add_polynomials<'a>(
        &mut self,
        terms: usize,
        pieces: impl Iterator<Item = &'a [f64]>,
        factor: impl Fn(usize) -> f64,
    ) {
        self.widen(terms);
        for (k, (mine, theirs)) in self
            .polynomials
            .chunks_exact_mut(self.terms)
            .zip(pieces)
            .enumerate()
        {
            let factor = factor(k);
            for (a, b) in mine.iter_mut().zip(theirs) {
                *a += factor * b;
            }
        }
    }

    /// The factors of the exponentials with these decays, which are made if they are not there.
    fn tail(&mut self, decays: &Arc<[f64]>) -> &mut Vec<f64> {
        let known = self
            .tails
            .iter()
            .position(|tail| Arc::ptr_eq(&tail.decays, decays));
        let at = known.unwrap_or_else(|| {
            self.tails.push(Tail {
                decays: Arc::clone(decays),
                factors: vec![0.0; 2 * decays.len()],
            });
            self.tails.len() - 1
        });
        &mut self.tails[at].factors
    }

    /// Adds coefficients as the solver gives them: per piece `terms` of the polynomial and a pair
    /// for each decay.
    pub(crate) fn add_coefficients<'a>(
        &mut self,
        terms: usize,
        decays: &Arc<[f64]>,
        pieces: impl Iterator<Item = &'a [f64]> + Clone,
        factor: f64,
    ) {
        self.add_polynomials(terms, pieces.clone().map(|c| &c[..terms]), |_| factor);
        if !decays.is_empty() {
            let pairs = 2 * decays.len() / self.len();
            for (mine, theirs) in self.tail(decays).chunks_exact_mut(pairs).zip(pieces) {
                for (a, b) in mine.iter_mut().zip(&theirs[terms..]) {
                    *a += factor * b;
                }
            }
        }
    }

    /// Adds `factor` times another field. Both are cut at the stations of both, if they differ.
    pub(crate) fn add(&mut self, other: &Self, factor: f64) {
        self.add_by_piece(other, |_| factor);
    }

    /// Adds another field times a factor that each piece has for itself; both fields must then
    /// have the same stations.
    pub(crate) fn add_by_piece(&mut self, other: &Self, factor: impl Fn(usize) -> f64) {
        if !Arc::ptr_eq(&self.stations, &other.stations) && self.stations != other.stations {
            let both = merged(&self.stations, &other.stations);
            *self = self.recut(&both);
            self.add_by_piece(&other.recut(&both), factor);
            return;
        }
        self.add_polynomials(
            other.terms,
            other.polynomials.chunks_exact(other.terms),
            &factor,
        );
        for tail in &other.tails {
            let pairs = 2 * tail.decays.len() / self.len();
            let mine = self.tail(&tail.decays);
            let pieces = mine
                .chunks_exact_mut(pairs)
                .zip(tail.factors.chunks_exact(pairs));
            for (k, (mine, theirs)) in pieces.enumerate() {
                let factor = factor(k);
                for (a, b) in mine.iter_mut().zip(theirs) {
                    *a += factor * b;
                }
            }
        }
    }

    /// Adds a value to each piece.
    pub(crate) fn shift_by_piece(&mut self, value: impl Fn(usize) -> f64) {
        for (k, piece) in self.polynomials.chunks_exact_mut(self.terms).enumerate() {
            piece[0] += value(k);
        }
    }

    /// Adds a polynomial to a piece.
    pub(crate) fn add_to_piece(&mut self, k: usize, polynomial: &[f64]) {
        self.widen(polynomial.len());
        let piece = &mut self.polynomials[k * self.terms..(k + 1) * self.terms];
        for (sum, term) in piece.iter_mut().zip(polynomial) {
            *sum += term;
        }
    }

    /// The same field over the pieces between two stations only.
    pub(crate) fn between(&self, from: f64, to: f64) -> Self {
        let first = self.stations.partition_point(|&x| x < from);
        let last = self.stations.partition_point(|&x| x < to);
        let tails = self.tails.iter().map(|tail| {
            let modes = tail.decays.len() / self.len();
            Tail {
                decays: Arc::from(&tail.decays[first * modes..last * modes]),
                factors: tail.factors[2 * first * modes..2 * last * modes].to_vec(),
            }
        });
        Self {
            stations: Arc::from(&self.stations[first..=last]),
            terms: self.terms,
            polynomials: self.polynomials[first * self.terms..last * self.terms].to_vec(),
            tails: tails.collect(),
        }
    }

    /// The derivative along x.
    pub(crate) fn derivative(&self) -> Self {
        let mut new = self.clone();
        for (k, ends) in self.stations.windows(2).enumerate() {
            let length = ends[1] - ends[0];
            let piece = &mut new.polynomials[k * self.terms..(k + 1) * self.terms];
            for i in 1..self.terms {
                piece[i - 1] = piece[i] * i as f64 / length;
            }
            piece[self.terms - 1] = 0.0;
            for tail in &mut new.tails {
                let modes = tail.decays.len() / (self.stations.len() - 1);
                for mode in k * modes..(k + 1) * modes {
                    let rate = tail.decays[mode] / length;
                    tail.factors[2 * mode] *= -rate;
                    tail.factors[2 * mode + 1] *= rate;
                }
            }
        }
        new
    }

    /// The stations, from the left end to the right end.
    pub(crate) fn stations(&self) -> &[f64] {
        &self.stations
    }

    /// The values just left and just right of `x`; `None` outside the member.
    ///
    /// At the ends both are the value inside the member.
    pub(crate) fn sides(&self, x: f64) -> Option<(f64, f64)> {
        let last = self.stations.len() - 1;
        if !(x >= self.stations[0] && x <= self.stations[last]) {
            return None;
        }
        let right = self
            .stations
            .partition_point(|&s| s <= x)
            .saturating_sub(1)
            .min(last - 1);
        let left = if x == self.stations[right] && right > 0 {
            right - 1
        } else {
            right
        };
        Some((self.value_on(left, x), self.value_on(right, x)))
    }

    /// The value at `x`, which lies on the piece.
    pub(crate) fn value_on(&self, piece: usize, x: f64) -> f64 {
        let (from, to) = (self.stations[piece], self.stations[piece + 1]);
        let t = if x == to {
            1.0
        } else {
            (x - from) / (to - from)
        };
        let c = &self.polynomials[piece * self.terms..(piece + 1) * self.terms];
        let polynomial = c.iter().rev().fold(0.0, |sum, &term| sum * t + term);
        self.pairs(piece).fold(polynomial, |sum, pair| {
            sum + pair.from_left * crate::math::exp(-pair.decay * t)
                + pair.from_right * crate::math::exp(-pair.decay * (1.0 - t))
        })
    }

    /// The exponentials of a piece that are there.
    pub(super) fn pairs(&self, piece: usize) -> impl Iterator<Item = Decaying> {
        self.tails.iter().flat_map(move |tail| {
            let modes = tail.decays.len() / self.len();
            (piece * modes..(piece + 1) * modes).filter_map(|mode| {
                let [from_left, from_right] = [tail.factors[2 * mode], tail.factors[2 * mode + 1]];
                (from_left != 0.0 || from_right != 0.0).then(|| Decaying {
                    decay: tail.decays[mode],
                    from_left,
                    from_right,
                })
            })
        })
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    fn two_pieces() -> Piecewise {
        let mut field = Piecewise::zero(Arc::from([0.0, 1.0, 3.0]));
        // t - t^2 on the first piece, then 5 falling to -5.
        field.add_to_piece(0, &[0.0, 1.0, -1.0]);
        field.add_to_piece(1, &[5.0, -10.0]);
        field
    }

    #[test]
    fn both_sides_of_a_jump_are_told_apart() {
        let field = two_pieces();
        assert_eq!(field.sides(1.0), Some((0.0, 5.0)));
        assert_eq!(field.sides(0.0), Some((0.0, 0.0)));
        assert_eq!(field.sides(3.0), Some((-5.0, -5.0)));
        assert_eq!(field.sides(0.5), Some((0.25, 0.25)));
        assert_eq!(field.sides(3.1), None);
        assert_eq!(field.sides(f64::NAN), None);
    }

    #[test]
    fn a_stretch_keeps_its_places() {
        let right = two_pieces().between(1.0, 3.0);
        assert_eq!(
            right.maximum(),
            Peak {
                value: 5.0,
                at: 1.0
            }
        );
        assert_eq!(right.sides(0.5), None);
        assert_eq!(two_pieces().between(0.0, 1.0).greatest().value, 0.25);
    }

    #[test]
    fn extremes_come_with_place_and_the_leftmost_wins() {
        let field = two_pieces();
        assert_eq!(
            field.maximum(),
            Peak {
                value: 5.0,
                at: 1.0
            }
        );
        assert_eq!(
            field.minimum(),
            Peak {
                value: -5.0,
                at: 3.0
            }
        );
        assert_eq!(
            field.greatest(),
            Peak {
                value: 5.0,
                at: 1.0
            }
        );
    }

    #[test]
    fn fields_of_different_stations_add_up() {
        let mut field = two_pieces();
        let mut other = Piecewise::zero(Arc::from([0.0, 0.5, 3.0]));
        other.add_to_piece(0, &[1.0, 1.0]);
        other.add_to_piece(1, &[2.0, -2.0]);
        let decays: Arc<[f64]> = Arc::from([3.0, 4.0]);
        let zeros = [0.0; TERMS];
        let coefficients = |pair: [f64; 2]| [zeros.as_slice(), &pair].concat();
        let (a, b) = (coefficients([1.0, 0.5]), coefficients([0.25, 2.0]));
        other.add_coefficients(TERMS, &decays, [&a[..], &b[..]].into_iter(), 1.0);
        let expected: Vec<f64> = [0.3, 0.7, 1.9]
            .iter()
            .map(|&x| field.sides(x).unwrap().1 - 2.0 * other.sides(x).unwrap().1)
            .collect();
        field.add(&other, -2.0);
        assert_eq!(field.stations(), [0.0, 0.5, 1.0, 3.0]);
        for (x, expected) in [0.3, 0.7, 1.9].into_iter().zip(expected) {
            let found = field.sides(x).unwrap().1;
            assert!((found - expected).abs() < 1e-14, "{x}: {found} {expected}");
        }
    }

    #[test]
    fn a_derivative_follows_the_chain_rule() {
        let slope = two_pieces().derivative();
        assert_eq!(slope.sides(0.25), Some((0.5, 0.5)));
        assert_eq!(slope.sides(2.0), Some((-5.0, -5.0)));
    }
}
