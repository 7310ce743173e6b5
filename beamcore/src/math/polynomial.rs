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
    if c[3..].iter().all(|term| *term == 0.0) {
        return quadratic(c);
    }
    let slope = derivative(c);
    let turning = sign_changes(&slope);
    let (mut left, mut at_left) = (0.0, c[0]);
    for &right in turning.as_slice().iter().chain(std::iter::once(&1.0)) {
        let at_right = value(c, right);
        let both = |t| (value(c, t), value(&slope, t));
        if let Some(root) = enclosed_root(both, [left, right], [at_left, at_right]) {
            roots.push(root);
        }
        (left, at_left) = (right, at_right);
    }
    roots
}

/// Whether the Bernstein coefficients on \[0, 1\] prove that the sign does not change.
fn keeps_its_sign(c: &Coefficients) -> bool {
    let (least, greatest) = bounds(c);
    least >= 0.0 || greatest <= 0.0
}

/// Bounds of the values on \[0, 1\]: the least and the greatest Bernstein coefficient.
#[inline]
pub(crate) fn bounds(c: &Coefficients) -> (f64, f64) {
    // b_j = sum over i <= j of C(j, i)/C(5, i) c_i.
    let b = [
        c[0],
        c[0] + c[1] / 5.0,
        c[0] + c[1] * (2.0 / 5.0) + c[2] / 10.0,
        c[0] + c[1] * (3.0 / 5.0) + c[2] * (3.0 / 10.0) + c[3] / 10.0,
        c[0] + c[1] * (4.0 / 5.0) + c[2] * (6.0 / 10.0) + c[3] * (4.0 / 10.0) + c[4] / 5.0,
        c[0] + c[1] + c[2] + c[3] + c[4] + c[5],
    ];
    b.iter().fold((b[0], b[0]), |(least, greatest), &b| {
        (f64::min(least, b), f64::max(greatest, b))
    })
}

/// The places inside (0, 1) where c0 + c1 t + c2 t^2 changes its sign.
fn quadratic(c: &Coefficients) -> Roots {
    let mut roots = Roots::default();
    let inside = |t: f64| t > 0.0 && t < 1.0;
    if c[2] == 0.0 {
        let t = -c[0] / c[1];
        if inside(t) {
            roots.push(t);
        }
        return roots;
    }
    let half = -c[1] / 2.0;
    let square = half * half - c[2] * c[0];
    if square <= 0.0 {
        return roots;
    }
    // The root that does not cancel, then the other by their product.
    let sum = half + half.signum() * square.sqrt();
    let (a, b) = (sum / c[2], c[0] / sum);
    for t in [a.min(b), a.max(b)] {
        if inside(t) {
            roots.push(t);
        }
    }
    roots
}

/// A step of Newton's method so small that the next one would not change the place any more.
const LAST_STEP: f64 = 1e-10;

/// The sign change of a function that is monotone on the interval, if it has one inside;
/// `function` gives the value and the slope, `ends` the values at both ends of the interval.
pub(super) fn enclosed_root(
    function: impl Fn(f64) -> (f64, f64),
    [left, right]: [f64; 2],
    [at_left, at_right]: [f64; 2],
) -> Option<f64> {
    // A root at an end belongs to the end, where the caller looks anyway.
    if at_left == 0.0 || at_right == 0.0 || (at_left > 0.0) == (at_right > 0.0) {
        return None;
    }
    let (mut low, mut high) = (left, right);
    let mut t = left + (right - left) * (at_left / (at_left - at_right));
    // Newton steps, kept inside the enclosure; halving where they would leave it.
    for _ in 0..200 {
        let (v, slope) = function(t);
        if v == 0.0 {
            return Some(t);
        }
        if (v > 0.0) == (at_left > 0.0) {
            low = t;
        } else {
            high = t;
        }
        let newton = t - v / slope;
        let is_inside = newton > low && newton < high;
        let next = if is_inside {
            newton
        } else {
            low + (high - low) / 2.0
        };
        if next == t || next <= low || next >= high {
            return Some(t);
        }
        if is_inside && (next - t).abs() <= LAST_STEP * t.abs() {
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
