//! Polynomials of degree five at most on the unit interval: values, derivatives, roots.
//!
//! A field over a piece of a member is such a polynomial of t, where t runs from 0 at the left
//! end of the piece to 1 at its right end.

/// The number of coefficients, lowest power first.
pub(crate) const TERMS: usize = 6;

/// Coefficients, lowest power first: p(t) = c0 + c1 t + ... + c5 t^5.
pub(crate) type Coefficients = [f64; TERMS];

/// The value at `t`, by Horner's rule.
pub(crate) fn value(c: &Coefficients, t: f64) -> f64 {
    c.iter().rev().fold(0.0, |sum, &term| sum * t + term)
}

/// The value at the right end, t = 1.
pub(crate) fn value_at_one(c: &Coefficients) -> f64 {
    c.iter().rev().sum()
}

/// The coefficients of dp/dt.
pub(crate) fn derivative(c: &Coefficients) -> Coefficients {
    [c[1], 2.0 * c[2], 3.0 * c[3], 4.0 * c[4], 5.0 * c[5], 0.0]
}

/// The polynomial of s with t = start + (end - start) s.
pub(crate) fn stretch(c: &[f64], start: f64, end: f64) -> Vec<f64> {
    let width = end - start;
    let mut result = vec![0.0; c.len()];
    // Horner's rule with the line in the place of t.
    for (n, &term) in c.iter().rev().enumerate() {
        for i in (0..=n.min(c.len() - 1)).rev() {
            let lower = if i > 0 { result[i - 1] } else { 0.0 };
            result[i] = result[i] * start + lower * width;
        }
        result[0] += term;
    }
    result
}

/// The roots inside an interval, in rising order.
#[derive(Clone, Copy, Debug, Default)]
pub(crate) struct Roots {
    places: [f64; TERMS],
    count: usize,
}

impl Roots {
    fn push(&mut self, t: f64) {
        self.places[self.count] = t;
        self.count += 1;
    }

    /// The roots found.
    pub(crate) fn as_slice(&self) -> &[f64] {
        &self.places[..self.count]
    }
}

/// All places strictly inside (0, 1) where the polynomial changes its sign.
///
/// Between two neighbouring roots of its derivative a polynomial is monotone and has at most one
/// sign change, which is enclosed and refined to the last bits. A polynomial whose Bernstein
/// coefficients all bear one sign has no root, which settles most pieces at once.
pub(crate) fn sign_changes(c: &Coefficients) -> Roots {
    let mut roots = Roots::default();
    if keeps_its_sign(c) {
        return roots;
    }
    let slope = derivative(c);
    let turning = sign_changes(&slope);
    let mut left = 0.0;
    for &right in turning.as_slice().iter().chain(std::iter::once(&1.0)) {
        if let Some(root) = enclosed_root(|t| value(c, t), |t| value(&slope, t), left, right) {
            roots.push(root);
        }
        left = right;
    }
    roots
}

/// Whether the Bernstein coefficients on \[0, 1\] prove that the sign does not change.
fn keeps_its_sign(c: &Coefficients) -> bool {
    // BINOMIAL[j][i] = C(j, i) / C(5, i): b_j = sum over i <= j of that times c_i.
    const BINOMIAL: [[f64; TERMS]; TERMS] = [
        [1.0, 0.0, 0.0, 0.0, 0.0, 0.0],
        [1.0, 1.0 / 5.0, 0.0, 0.0, 0.0, 0.0],
        [1.0, 2.0 / 5.0, 1.0 / 10.0, 0.0, 0.0, 0.0],
        [1.0, 3.0 / 5.0, 3.0 / 10.0, 1.0 / 10.0, 0.0, 0.0],
        [1.0, 4.0 / 5.0, 6.0 / 10.0, 4.0 / 10.0, 1.0 / 5.0, 0.0],
        [1.0, 1.0, 1.0, 1.0, 1.0, 1.0],
    ];
    let (mut above, mut below) = (true, true);
    for row in &BINOMIAL {
        let b: f64 = row.iter().zip(c).map(|(factor, term)| factor * term).sum();
        above &= b >= 0.0;
        below &= b <= 0.0;
    }
    above || below
}

/// The sign change of a function that is monotone on the interval, if it has one inside.
pub(super) fn enclosed_root(
    function: impl Fn(f64) -> f64,
    slope: impl Fn(f64) -> f64,
    left: f64,
    right: f64,
) -> Option<f64> {
    let at_left = function(left);
    let at_right = function(right);
    // A root at an end belongs to the end, where the caller looks anyway.
    if at_left == 0.0 || at_right == 0.0 || (at_left > 0.0) == (at_right > 0.0) {
        return None;
    }
    let (mut low, mut high) = (left, right);
    let mut t = left + (right - left) * (at_left / (at_left - at_right));
    // Newton steps, kept inside the enclosure; halving where they would leave it.
    for _ in 0..200 {
        let v = function(t);
        if v == 0.0 {
            return Some(t);
        }
        if (v > 0.0) == (at_left > 0.0) {
            low = t;
        } else {
            high = t;
        }
        let newton = t - v / slope(t);
        let next = if newton > low && newton < high {
            newton
        } else {
            low + (high - low) / 2.0
        };
        if next == t || next <= low || next >= high {
            return Some(t);
        }
        if (next - t).abs() <= f64::EPSILON * t.abs() {
            return Some(next);
        }
        t = next;
    }
    Some(t)
}

#[cfg(test)]
mod tests {
    use super::*;
    use proptest::prelude::*;

    fn from_roots(roots: &[f64]) -> Coefficients {
        let mut c = [1.0, 0.0, 0.0, 0.0, 0.0, 0.0];
        for &root in roots {
            let mut next = [0.0; TERMS];
            for i in 0..TERMS {
                next[i] -= root * c[i];
                if i + 1 < TERMS {
                    next[i + 1] += c[i];
                }
            }
            c = next;
        }
        c
    }

    #[test]
    fn known_roots_are_found() {
        let found = sign_changes(&from_roots(&[0.1, 0.35, 0.62, 0.9]));
        let expected = [0.1, 0.35, 0.62, 0.9];
        assert_eq!(found.as_slice().len(), 4);
        for (a, b) in found.as_slice().iter().zip(expected) {
            assert!((a - b).abs() < 1e-13, "{a} {b}");
        }
    }

    #[test]
    fn a_touching_root_is_no_sign_change() {
        assert!(
            sign_changes(&[1.0, 0.0, 0.0, 0.0, 0.0, 0.0])
                .as_slice()
                .is_empty()
        );
        assert!(sign_changes(&[0.0; TERMS]).as_slice().is_empty());
        assert!(sign_changes(&[0.5, -1.0, 0.0, 0.0, 0.0, 0.0]).as_slice() == [0.5]);
    }

    proptest! {
        #[test]
        fn separate_roots_are_all_found(a in 0.02..0.2f64, b in 0.25..0.45f64, c in 0.5..0.7f64,
                                        d in 0.75..0.98f64, far in 1.5..9.0f64) {
            let found = sign_changes(&from_roots(&[a, b, c, d, far]));
            prop_assert_eq!(found.as_slice().len(), 4);
            for (x, y) in found.as_slice().iter().zip([a, b, c, d]) {
                prop_assert!((x - y).abs() < 1e-10, "{} {}", x, y);
            }
        }
    }
}
