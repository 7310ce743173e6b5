//! Gauss points on the unit interval, and the polynomials through values at them.

use std::sync::LazyLock;

/// The number of points.
pub(crate) const POINTS: usize = 8;

/// The rule with what collocation needs.
pub(crate) struct Rule {
    /// The points, from left to right.
    pub(crate) points: [f64; POINTS],
    /// The weights; their sum is 1.
    pub(crate) weights: [f64; POINTS],
    /// The coefficients of the polynomial that is 1 at one point and 0 at the others.
    pub(crate) lagrange: [[f64; POINTS]; POINTS],
    /// The integrals of those from 0 to each point: `integrals[i][j]` of polynomial j to point i.
    pub(crate) integrals: [[f64; POINTS]; POINTS],
}

/// The rule of [`POINTS`] points.
pub(crate) static RULE: LazyLock<Rule> = LazyLock::new(rule);

fn rule() -> Rule {
    let mut points = [0.0; POINTS];
    let mut weights = [0.0; POINTS];
    for i in 0..POINTS {
        // Newton's method on the Legendre polynomial, from evenly spread starts in its angle.
        let n = POINTS as f64;
        let mut x = -crate::math::cos(std::f64::consts::PI * (i as f64 + 0.75) / (n + 0.5));
        let mut slope = 1.0;
        for _ in 0..50 {
            let (value, derivative) = legendre(x);
            slope = derivative;
            let step = value / derivative;
            x -= step;
            if step.abs() <= f64::EPSILON {
                break;
            }
        }
        points[i] = f64::midpoint(1.0, x);
        weights[i] = 1.0 / ((1.0 - x * x) * slope * slope);
    }
    let mut lagrange = [[0.0; POINTS]; POINTS];
    let mut integrals = [[0.0; POINTS]; POINTS];
    for j in 0..POINTS {
        lagrange[j] = basis(&points, j);
        for i in 0..POINTS {
            // The integral is the mean over [0, x], and the rule is exact for it.
            let mean: f64 = (0..POINTS)
                .map(|k| weights[k] * lagrange_at(&points, j, points[i] * points[k]))
                .sum();
            integrals[i][j] = points[i] * mean;
        }
    }
    Rule {
        points,
        weights,
        lagrange,
        integrals,
    }
}

/// The Legendre polynomial and its derivative.
fn legendre(x: f64) -> (f64, f64) {
    let (mut before, mut value) = (1.0, x);
    for k in 2..=POINTS {
        let k = k as f64;
        (before, value) = (
            value,
            ((2.0 * k - 1.0) * x * value - (k - 1.0) * before) / k,
        );
    }
    let n = POINTS as f64;
    (value, n * (x * value - before) / (x * x - 1.0))
}

fn basis(points: &[f64; POINTS], j: usize) -> [f64; POINTS] {
    let mut c = [0.0; POINTS];
    c[0] = 1.0;
    for (k, point) in points.iter().enumerate() {
        if k != j {
            let scale = 1.0 / (points[j] - point);
            for i in (0..POINTS).rev() {
                let lower = if i > 0 { c[i - 1] } else { 0.0 };
                c[i] = (lower - point * c[i]) * scale;
            }
        }
    }
    c
}

/// The polynomial that is 1 at point j and 0 at the others, at a place.
fn lagrange_at(points: &[f64; POINTS], j: usize, t: f64) -> f64 {
    let others = points.iter().enumerate().filter(|(k, _)| *k != j);
    others.fold(1.0, |product, (_, p)| product * (t - p) / (points[j] - p))
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn powers_are_integrated_exactly() {
        for power in 0..2 * POINTS {
            let sum: f64 = RULE
                .points
                .iter()
                .zip(&RULE.weights)
                .map(|(x, w)| w * (0..power).fold(1.0, |p, _| p * x))
                .sum();
            assert!((sum - 1.0 / (power as f64 + 1.0)).abs() < 1e-15, "{power}");
        }
    }

    #[test]
    fn integrals_to_the_points() {
        // The integral of t^3 to each point.
        for (i, x) in RULE.points.iter().enumerate() {
            let sum: f64 = (0..POINTS)
                .map(|j| RULE.integrals[i][j] * RULE.points[j] * RULE.points[j] * RULE.points[j])
                .sum();
            assert!((sum - x * x * x * x / 4.0).abs() < 1e-15);
        }
    }
}
