//! A quantity along the member as one polynomial per piece.

use crate::math::polynomial::{self, Coefficients, TERMS};
use std::sync::Arc;

/// Values closer than this, relative to the peak, count as a tie, and the leftmost of them wins.
const TIE: f64 = 1e-12;

/// Polynomials over the pieces between `stations`; a station may have two values.
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct Piecewise {
    stations: Arc<[f64]>,
    pieces: Vec<Coefficients>,
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
        let pieces = vec![[0.0; TERMS]; stations.len() - 1];
        Self { stations, pieces }
    }

    /// A field of zeros over the same pieces.
    pub(crate) fn zeroed(&self) -> Self {
        Self::zero(Arc::clone(&self.stations))
    }

    /// Adds `factor` times another set of polynomials over the same stations.
    pub(crate) fn add<'a>(
        &mut self,
        pieces: impl IntoIterator<Item = &'a Coefficients>,
        factor: f64,
    ) {
        for (mine, theirs) in self.pieces.iter_mut().zip(pieces) {
            for (a, b) in mine.iter_mut().zip(theirs) {
                *a += factor * b;
            }
        }
    }

    /// Adds the same value everywhere.
    pub(crate) fn shift(&mut self, value: f64) {
        for piece in &mut self.pieces {
            piece[0] += value;
        }
    }

    /// The same field over the pieces between two stations only.
    pub(crate) fn between(&self, from: f64, to: f64) -> Self {
        let first = self.stations.partition_point(|&x| x < from);
        let last = self.stations.partition_point(|&x| x < to);
        Self {
            stations: Arc::from(&self.stations[first..=last]),
            pieces: self.pieces[first..last].to_vec(),
        }
    }

    /// The polynomials, one per piece.
    pub(crate) fn pieces(&self) -> &[Coefficients] {
        &self.pieces
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

    fn value_on(&self, piece: usize, x: f64) -> f64 {
        let (from, to) = (self.stations[piece], self.stations[piece + 1]);
        let c = &self.pieces[piece];
        if x == to {
            polynomial::value_at_one(c)
        } else {
            polynomial::value(c, (x - from) / (to - from))
        }
    }

    /// The candidate for an extreme that `better(new, best)` prefers, leftmost first.
    fn find(&self, score: impl Fn(f64) -> f64) -> Peak {
        let mut best = Peak {
            value: self.pieces[0][0],
            at: self.stations[0],
        };
        let mut best_score = score(best.value);
        let mut consider = |value: f64, at: f64| {
            let s = score(value);
            if s - best_score > TIE * best_score.abs().max(s.abs()) {
                best = Peak { value, at };
                best_score = s;
            }
        };
        for (i, c) in self.pieces.iter().enumerate() {
            let (from, to) = (self.stations[i], self.stations[i + 1]);
            consider(c[0], from);
            for &t in polynomial::sign_changes(&polynomial::derivative(c)).as_slice() {
                consider(polynomial::value(c, t), from + (to - from) * t);
            }
            consider(polynomial::value_at_one(c), to);
        }
        best
    }

    /// The algebraically greatest value with its place.
    pub(crate) fn maximum(&self) -> Peak {
        self.find(|v| v)
    }

    /// The algebraically least value with its place.
    pub(crate) fn minimum(&self) -> Peak {
        self.find(|v| -v)
    }

    /// The value of greatest magnitude, with its sign and place.
    pub(crate) fn greatest(&self) -> Peak {
        self.find(f64::abs)
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    fn two_pieces() -> Piecewise {
        let mut field = Piecewise::zero(Arc::from([0.0, 1.0, 3.0]));
        // t - t^2 on the first piece, then 5 falling to -5.
        field.add(
            &[
                [0.0, 1.0, -1.0, 0.0, 0.0, 0.0],
                [5.0, -10.0, 0.0, 0.0, 0.0, 0.0],
            ],
            1.0,
        );
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
}
