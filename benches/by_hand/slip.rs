//! Layers that slip, as a user would write them by hand.

/// Deflection at midspan, axial force at midspan, end slip and end flow of two layers on a simple
/// span under a uniform load: the closed form of Newmark, Siess and Viest (1951).
#[expect(clippy::disallowed_methods, reason = "what a user would write")]
pub fn two_layers(q: f64, l: f64, k: f64, ea: [f64; 2], ei: [f64; 2], r: f64) -> [f64; 4] {
    let ei0 = ei[0] + ei[1];
    let eas = ea[0] * ea[1] / (ea[0] + ea[1]);
    let rigid = ei0 + eas * r * r;
    let alpha = (k * (1.0 / eas + r * r / ei0)).sqrt();
    let (a, c) = (q / (alpha * alpha), 1.0 / ei0 - 1.0 / rigid);
    let cosh = (alpha * l / 2.0).cosh();
    let w = 5.0 * q * l * l * l * l / (384.0 * rigid)
        + c * a * (l * l / 8.0 - (1.0 - 1.0 / cosh) / (alpha * alpha));
    let share = eas * r / rigid;
    let n = share * (q * l * l / 8.0 - a * (1.0 - 1.0 / cosh));
    let flow = share * (q * l / 2.0 - q / alpha * (alpha * l / 2.0).tanh());
    [w, n, flow / k, flow]
}

/// Greatest deflection of equal layers on equal spans under a uniform load by central differences
/// on a grid of `per_span` steps: unknowns w and one displacement per layer at each node, solved
/// with a banded elimination without pivots.
pub fn equal_layers(
    spans: usize,
    per_span: usize,
    l: f64,
    q: f64,
    (ea, ei, depth): (f64, f64, f64),
    k: &[f64],
) -> f64 {
    let n = k.len() + 1;
    let nodes = spans * per_span + 1;
    let h = l / per_span as f64;
    let m = n + 1;
    // One node beyond each end for w; layers end with no strain.
    let size = (nodes + 2) * m;
    let band = 3 * m;
    let width = 2 * band + 1;
    let mut a = vec![0.0; size * width];
    let mut b = vec![0.0; size];
    let mut add =
        |row: usize, column: usize, value: f64| a[row * width + column + band - row] += value;
    let w = |node: usize| node * m;
    let u = |node: usize, layer: usize| node * m + 1 + layer;
    for node in 1..=nodes {
        // n EI w'''' = q + sum of depth (slip flow)', flow = k (u_above - u_below + depth w').
        let row = w(node);
        if (node - 1) % per_span == 0 {
            add(row, row, 1.0);
        } else {
            let stiffness = n as f64 * ei / (h * h * h * h);
            for (offset, c) in [(0, 1.0), (1, -4.0), (2, 6.0), (3, -4.0), (4, 1.0)] {
                add(row, w(node + offset - 2), stiffness * c);
            }
            for (j, k) in k.iter().enumerate() {
                let along = k * depth / (2.0 * h);
                for (layer, sign) in [(j + 1, 1.0), (j, -1.0)] {
                    add(row, u(node + 1, layer), -along * sign);
                    add(row, u(node - 1, layer), along * sign);
                }
                for (offset, c) in [(0, 1.0), (1, -2.0), (2, 1.0)] {
                    add(row, w(node + offset - 1), -k * depth * depth * c / (h * h));
                }
            }
            b[row] = q;
        }
        for layer in 0..n {
            let row = u(node, layer);
            for (offset, c) in [(0, 1.0), (1, -2.0), (2, 1.0)] {
                add(row, u(node + offset - 1, layer), ea * c / (h * h));
            }
            for (j, k) in k.iter().enumerate() {
                let sign = f64::from(layer == j) - f64::from(layer == j + 1);
                add(row, u(node, j + 1), k * sign);
                add(row, u(node, j), -k * sign);
                add(row, w(node + 1), k * sign * depth / (2.0 * h));
                add(row, w(node - 1), -k * sign * depth / (2.0 * h));
            }
        }
        // One layer is held at one place along the member.
        if node == 1 {
            add(u(1, 0), u(1, 0), -1e3 * ea / (h * h));
        }
    }
    for (outside, inside, two_inside) in [(0, 1, 2), (nodes + 1, nodes, nodes - 1)] {
        // w'' = 0 and u' = 0 at the ends.
        add(w(outside), w(outside), 1.0);
        add(w(outside), w(inside), -2.0);
        add(w(outside), w(two_inside), 1.0);
        for layer in 0..n {
            add(u(outside, layer), u(outside, layer), 1.0);
            add(u(outside, layer), u(two_inside, layer), -1.0);
        }
    }
    for p in 0..size {
        for r in p + 1..size.min(p + band + 1) {
            let factor = a[r * width + p + band - r] / a[p * width + band];
            if factor != 0.0 {
                for c in p..size.min(p + band + 1) {
                    a[r * width + c + band - r] -= factor * a[p * width + c + band - p];
                }
                b[r] -= factor * b[p];
            }
        }
    }
    for p in (0..size).rev() {
        for c in p + 1..size.min(p + band + 1) {
            b[p] -= a[p * width + c + band - p] * b[c];
        }
        b[p] /= a[p * width + band];
    }
    (1..=nodes).map(|node| b[w(node)]).fold(0.0, f64::max)
}
