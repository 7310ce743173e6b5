//! Directions over the displacements: unit ones, their complement, their duals.

/// Numbers over the displacements.
type Direction = Vec<f64>;

pub(super) fn dot(a: &[f64], b: &[f64]) -> f64 {
    a.iter().zip(b).map(|(a, b)| a * b).sum()
}

pub(super) fn scaled(direction: &[f64], factor: f64) -> Vec<f64> {
    direction.iter().map(|c| c * factor).collect()
}

/// Unit directions along the given ones, and an orthonormal set of all that is perpendicular to
/// them; `None` if one of the given ones is the sum of others.
pub(super) fn split(half: usize, given: &[Direction]) -> Option<(Vec<Direction>, Vec<Direction>)> {
    let mut units = Vec::new();
    let mut basis: Vec<Vec<f64>> = Vec::new();
    for direction in given {
        let unit = scaled(direction, 1.0 / dot(direction, direction).sqrt());
        let rest = perpendicular(&unit, &basis);
        let size = dot(&rest, &rest).sqrt();
        if size < 1e-9 {
            return None;
        }
        basis.push(scaled(&rest, 1.0 / size));
        units.push(unit);
    }
    let first = basis.len();
    while basis.len() < half {
        let mut best = Vec::new();
        let mut size = -1.0;
        for i in 0..half {
            let mut axis = vec![0.0; half];
            axis[i] = 1.0;
            let rest = perpendicular(&axis, &basis);
            if dot(&rest, &rest) > size + 1e-9 {
                size = dot(&rest, &rest);
                best = rest;
            }
        }
        basis.push(scaled(&best, 1.0 / size.sqrt()));
    }
    Some((units, basis.split_off(first)))
}

/// What is left of a direction beside an orthonormal set.
fn perpendicular(direction: &[f64], basis: &[Vec<f64>]) -> Vec<f64> {
    let mut rest = direction.to_vec();
    // Twice, so that rounding of the first time is taken off too.
    for _ in 0..2 {
        for axis in basis {
            let along = dot(&rest, axis);
            for (c, a) in rest.iter_mut().zip(axis) {
                *c -= along * a;
            }
        }
    }
    rest
}

/// Directions b within the span of unit directions c, with b_i . c_i = 1 and b_i . c_j = 0.
pub(super) fn duals(units: &[Direction]) -> Vec<Direction> {
    (0..units.len())
        .map(|i| {
            let mut basis = Vec::new();
            for unit in units
                .iter()
                .enumerate()
                .filter(|(j, _)| *j != i)
                .map(|(_, u)| u)
            {
                let rest = perpendicular(unit, &basis);
                let size = dot(&rest, &rest).sqrt();
                basis.push(scaled(&rest, 1.0 / size));
            }
            let rest = perpendicular(&units[i], &basis);
            let length = dot(&rest, &units[i]);
            scaled(&rest, 1.0 / length)
        })
        .collect()
}
