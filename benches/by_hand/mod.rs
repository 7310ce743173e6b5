//! What a user would write by hand: plain arithmetic, no checks.

mod slip;

pub use slip::{equal_layers, two_layers};

/// EA, z of the centroid and EI of rectangles given as E, b, h, z of the middle.
pub fn stiffness(layers: &[[f64; 4]]) -> (f64, f64, f64) {
    let (mut ea, mut es) = (0.0, 0.0);
    for [e, b, h, z] in layers {
        ea += e * b * h;
        es += e * b * h * z;
    }
    let z0 = es / ea;
    let ei = layers
        .iter()
        .map(|[e, b, h, z]| e * b * h * (h * h / 12.0 + (z - z0) * (z - z0)))
        .sum();
    (ea, z0, ei)
}

/// Greatest moment, shear force, slope and deflection of a simple span under a uniform load.
pub fn simple_span(q: f64, l: f64, ei: f64) -> [f64; 4] {
    [
        q * l * l / 8.0,
        q * l / 2.0,
        q * l * l * l / (24.0 * ei),
        5.0 * q * l * l * l * l / (384.0 * ei),
    ]
}

/// Continuous beam of any spans under one uniform load by the three-moment equation (Clapeyron);
/// gives the greatest deflection found at the middles of the spans.
pub fn three_moments(spans: &[f64], q: f64, ei: f64) -> f64 {
    let n = spans.len();
    let mut diagonal = vec![0.0; n + 1];
    let mut side = vec![0.0; n + 1];
    // Forward elimination of the tridiagonal equations for the inner supports.
    for i in 1..n {
        let (a, b) = (spans[i - 1], spans[i]);
        diagonal[i] = 2.0 * (a + b);
        side[i] = -q * (a * a * a + b * b * b) / 4.0;
        if i > 1 {
            let factor = a / diagonal[i - 1];
            diagonal[i] -= factor * a;
            side[i] -= factor * side[i - 1];
        }
    }
    let mut moments = vec![0.0; n + 1];
    for i in (1..n).rev() {
        moments[i] = (side[i] - spans[i] * moments[i + 1]) / diagonal[i];
    }
    (0..n)
        .map(|i| {
            let l = spans[i];
            let free = 5.0 * q * l * l * l * l / (384.0 * ei);
            free + (moments[i] + moments[i + 1]) * l * l / (16.0 * ei)
        })
        .fold(0.0, f64::max)
}
