//! A polynomial of t with exponentials that decay from both ends of the unit interval: values and
//! sign changes.

use super::exp;
use super::polynomial::{self, TERMS};

/// An exponential pair: `from_left` e^(-decay t) + `from_right` e^(-decay (1 - t)).
#[derive(Clone, Copy, Debug, PartialEq)]
pub(crate) struct Decaying {
    pub(crate) decay: f64,
    pub(crate) from_left: f64,
    pub(crate) from_right: f64,
}

/// c0 + c1 t + ... plus exponential pairs.
#[derive(Clone, Debug, Default, PartialEq)]
pub(crate) struct Curve {
    pub(crate) polynomial: Vec<f64>,
    pub(crate) decaying: Vec<Decaying>,
}

impl Curve {
    /// The value at `t`.
    pub(crate) fn value(&self, t: f64) -> f64 {
        let polynomial = self
            .polynomial
            .iter()
            .rev()
            .fold(0.0, |sum, &term| sum * t + term);
        self.decaying.iter().fold(polynomial, |sum, pair| {
            let left = pair.from_left * exp(-pair.decay * t);
            let right = pair.from_right * exp(-pair.decay * (1.0 - t));
            sum + left + right
        })
    }

    /// The value and df/dt at `t`, with each exponential once.
    fn value_and_slope(&self, t: f64) -> (f64, f64) {
        let polynomial = self.polynomial.iter().rev();
        let polynomial = polynomial.fold((0.0, 0.0), |(value, slope), &term| {
            (value * t + term, slope * t + value)
        });
        self.decaying
            .iter()
            .fold(polynomial, |(value, slope), pair| {
                let left = pair.from_left * exp(-pair.decay * t);
                let right = pair.from_right * exp(-pair.decay * (1.0 - t));
                (value + left + right, slope + pair.decay * (right - left))
            })
    }

    /// df/dt + `factor` f.
    fn derivative_plus(&self, factor: f64) -> Self {
        let n = self.polynomial.len();
        let term = |i: usize| {
            let next = self
                .polynomial
                .get(i + 1)
                .map_or(0.0, |c| c * (i + 1) as f64);
            next + factor * self.polynomial[i]
        };
        let mut polynomial: Vec<f64> = (0..n).map(term).collect();
        trim(&mut polynomial);
        let decaying = self.decaying.iter().map(|pair| Decaying {
            decay: pair.decay,
            from_left: pair.from_left * (factor - pair.decay),
            from_right: pair.from_right * (factor + pair.decay),
        });
        let decaying = decaying.filter(|p| p.from_left != 0.0 || p.from_right != 0.0);
        Self {
            polynomial,
            decaying: decaying.collect(),
        }
    }

    /// df/dt.
    pub(crate) fn derivative(&self) -> Self {
        self.derivative_plus(0.0)
    }

    /// All places strictly inside (0, 1) where the curve changes its sign.
    ///
    /// Between two neighbouring sign changes of f' + r f the curve e^(r t) f is monotone, so f has
    /// at most one sign change there. With r the rate of an exponential this takes the exponential
    /// out; step by step only a constant is left.
    pub(crate) fn sign_changes(&self) -> Vec<f64> {
        if self.decaying.is_empty() && self.polynomial.len() <= TERMS {
            let mut c = [0.0; TERMS];
            c[..self.polynomial.len()].copy_from_slice(&self.polynomial);
            return polynomial::sign_changes(&c).as_slice().to_vec();
        }
        if self.keeps_its_sign() {
            return Vec::new();
        }
        let factor = self.decaying.first().map_or(0.0, |pair| {
            if pair.from_left != 0.0 {
                pair.decay
            } else {
                -pair.decay
            }
        });
        let turning = self.derivative_plus(factor).sign_changes();
        let mut roots = Vec::new();
        let (mut left, mut at_left) = (0.0, self.value(0.0));
        for &right in turning.iter().chain(std::iter::once(&1.0)) {
            let at_right = self.value(right);
            let both = |t| self.value_and_slope(t);
            let root = polynomial::enclosed_root(both, [left, right], [at_left, at_right]);
            roots.extend(root);
            (left, at_left) = (right, at_right);
        }
        roots
    }

    /// Whether the Bernstein coefficients of the polynomial, against the sizes of the exponentials,
    /// prove that the sign does not change.
    fn keeps_its_sign(&self) -> bool {
        let (mut high, mut low) = (0.0_f64, 0.0_f64);
        for pair in &self.decaying {
            for factor in [pair.from_left, pair.from_right] {
                high += factor.max(0.0);
                low += factor.min(0.0);
            }
        }
        let (least, greatest) = bounds(&self.polynomial);
        least + low >= 0.0 || greatest + high <= 0.0
    }
}

/// Bounds of a polynomial on the unit interval: its least and greatest Bernstein coefficient.
pub(crate) fn bounds(c: &[f64]) -> (f64, f64) {
    let n = c.len();
    let (mut least, mut greatest) = match c.first() {
        Some(&c0) => (c0, c0),
        None => return (0.0, 0.0),
    };
    for j in 1..n {
        // b_j = sum over i <= j of C(j, i)/C(n - 1, i) c_i.
        let (mut ratio, mut sum) = (1.0, 0.0);
        for (i, term) in c[..=j].iter().enumerate() {
            sum += ratio * term;
            ratio *= (j - i) as f64 / (n - 1 - i).max(1) as f64;
        }
        least = least.min(sum);
        greatest = greatest.max(sum);
    }
    (least, greatest)
}

/// Takes highest terms away that are nothing beside the others.
fn trim(polynomial: &mut Vec<f64>) {
    let size: f64 = polynomial.iter().map(|c| c.abs()).fold(0.0, f64::max);
    while polynomial.last().is_some_and(|c| c.abs() <= 1e-18 * size) {
        polynomial.pop();
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn sign_changes_beside_a_boundary_layer() {
        // e^(-1000 t) - 0.5 and a slow line: one change in the layer, one behind it.
        let curve = Curve {
            polynomial: vec![-0.5, 1.0],
            decaying: vec![Decaying {
                decay: 1000.0,
                from_left: 1.0,
                from_right: 0.0,
            }],
        };
        let roots = curve.sign_changes();
        assert_eq!(roots.len(), 2, "{roots:?}");
        for root in roots {
            assert!(curve.value(root).abs() < 1e-13);
        }
    }

    #[test]
    fn a_hyperbolic_cosine_turns_in_the_middle() {
        let curve = Curve {
            polynomial: vec![0.0],
            decaying: vec![Decaying {
                decay: 7.0,
                from_left: 1.0,
                from_right: 1.0,
            }],
        };
        let roots = curve.derivative().sign_changes();
        assert_eq!(roots.len(), 1);
        assert!((roots[0] - 0.5).abs() < 1e-14);
    }

    #[test]
    fn long_polynomials_have_all_their_sign_changes() {
        // The Chebyshev polynomial of degree 8 on the unit interval: cos(8 acos(2 t - 1)).
        let curve = Curve {
            polynomial: vec![
                1.0, -128.0, 2688.0, -21504.0, 84480.0, -180_224.0, 212_992.0, -131_072.0, 32768.0,
            ],
            decaying: vec![],
        };
        assert_eq!(curve.sign_changes().len(), 8);
    }
}
