//! Extremes and sign changes of a quantity along the member.

use super::piecewise::{Peak, Piecewise};
use crate::math::curve::{self, Curve};
use crate::math::polynomial::{self, Coefficients, TERMS};

/// Values closer than this, relative to the peak, count as a tie, and the leftmost of them wins.
const TIE: f64 = 1e-12;

impl Piecewise {
    /// Bounds of the values over a piece.
    fn bounds(&self, piece: usize) -> (f64, f64) {
        let c = &self.polynomials[piece * self.terms..(piece + 1) * self.terms];
        let polynomial = match <&Coefficients>::try_from(c) {
            Ok(c) => polynomial::bounds(c),
            Err(_) => curve::bounds(c),
        };
        self.pairs(piece)
            .fold(polynomial, |(least, greatest), pair| {
                let [a, b] = [pair.from_left, pair.from_right];
                (
                    least + a.min(0.0) + b.min(0.0),
                    greatest + a.max(0.0) + b.max(0.0),
                )
            })
    }

    /// The places where a piece turns, with the values there and at its ends.
    fn turning(&self, piece: usize, mut consider: impl FnMut(f64, f64)) {
        let (from, to) = (self.stations[piece], self.stations[piece + 1]);
        let c = &self.polynomials[piece * self.terms..(piece + 1) * self.terms];
        if self.tails.is_empty() && self.terms == TERMS {
            let c: &Coefficients = c.try_into().expect("a piece of so many terms");
            consider(c[0], from);
            for &t in polynomial::sign_changes(&polynomial::derivative(c)).as_slice() {
                consider(polynomial::value(c, t), from + (to - from) * t);
            }
            consider(polynomial::value_at_one(c), to);
            return;
        }
        let curve = Curve {
            polynomial: c.to_vec(),
            decaying: self.pairs(piece).collect(),
        };
        consider(curve.value(0.0), from);
        for t in curve.derivative().sign_changes() {
            consider(curve.value(t), from + (to - from) * t);
        }
        consider(curve.value(1.0), to);
    }

    /// The places where the field changes its sign inside a piece.
    pub(crate) fn sign_changes(&self) -> Vec<f64> {
        let mut places = Vec::new();
        for (k, ends) in self.stations.windows(2).enumerate() {
            let curve = Curve {
                polynomial: self.polynomials[k * self.terms..(k + 1) * self.terms].to_vec(),
                decaying: self.pairs(k).collect(),
            };
            let changes = curve.sign_changes();
            places.extend(changes.iter().map(|t| ends[0] + (ends[1] - ends[0]) * t));
        }
        places
    }

    /// The value of the greatest score, the leftmost of equals. `most` gives a bound of the score
    /// from bounds of the values, by which most pieces are passed over.
    fn find(&self, score: impl Fn(f64) -> f64, most: impl Fn((f64, f64)) -> f64) -> Peak {
        let is_better = |new: f64, known: f64| new - known > TIE * f64::max(known.abs(), new.abs());
        let mut best: Option<(Peak, f64)> = None;
        for piece in 0..self.len() {
            if best.is_some_and(|(_, known)| !is_better(most(self.bounds(piece)), known)) {
                continue;
            }
            self.turning(piece, |value, at| {
                let s = score(value);
                if best.is_none_or(|(_, known)| is_better(s, known)) {
                    best = Some((Peak { value, at }, s));
                }
            });
        }
        best.expect("a field has at least one piece").0
    }

    /// The algebraically greatest value with its place.
    pub(crate) fn maximum(&self) -> Peak {
        self.find(|v| v, |(_, greatest)| greatest)
    }

    /// The algebraically least value with its place.
    pub(crate) fn minimum(&self) -> Peak {
        self.find(|v| -v, |(least, _)| -least)
    }

    /// The value of greatest magnitude, with its sign and place.
    pub(crate) fn greatest(&self) -> Peak {
        self.find(f64::abs, |(least, greatest)| f64::max(-least, greatest))
    }
}
