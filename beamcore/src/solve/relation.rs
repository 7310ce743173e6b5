//! The relation between the states at two neighbouring nodes.

/// `left` y(left) + `right` y(right) = load, as many equations as states; row by row.
///
/// Both ends appear, and neither is expressed by the other: for pieces whose solutions grow and
/// decay exponentially a transfer from end to end would overflow, this form does not.
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct Relation {
    pub(crate) left: Vec<f64>,
    pub(crate) right: Vec<f64>,
    /// What each equation was divided by; load sides are divided by the same.
    pub(crate) divisors: Vec<f64>,
}

impl Relation {
    /// No equations yet, for so many states.
    pub(crate) fn zero(all: usize) -> Self {
        Self {
            left: vec![0.0; all * all],
            right: vec![0.0; all * all],
            divisors: vec![1.0; all],
        }
    }

    /// From states in SI units to scaled ones: columns are multiplied by the units, and each
    /// equation is divided by its greatest number.
    pub(crate) fn scale(&mut self, units: &[f64]) {
        let all = units.len();
        for row in 0..all {
            let range = row * all..(row + 1) * all;
            let (left, right) = (&mut self.left[range.clone()], &mut self.right[range]);
            let mut greatest = 0.0_f64;
            for (column, unit) in units.iter().enumerate() {
                left[column] *= unit;
                right[column] *= unit;
                greatest = greatest.max(left[column].abs()).max(right[column].abs());
            }
            for number in left.iter_mut().chain(right.iter_mut()) {
                *number /= greatest;
            }
            self.divisors[row] = greatest;
        }
    }
}
