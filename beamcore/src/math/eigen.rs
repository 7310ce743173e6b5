//! Eigenvalues of symmetric matrices by Jacobi's rotations.
//!
//! Rotations keep the small eigenvalues of a graded matrix to their own relative precision (Demmel
//! and Veselic, SIAM J. Matrix Anal. Appl. 13, 1992, 1204, from memory), which methods that first
//! reduce the matrix to a band do not: a soft joint beside a stiff one needs this.

use nalgebra::DMatrix;

/// Sweeps are quadratic in the end; a handful is always enough.
const SWEEPS: usize = 60;

/// The eigenvalues of a positive semidefinite matrix and its eigenvectors, one per column.
pub(crate) fn symmetric(mut a: DMatrix<f64>) -> (Vec<f64>, DMatrix<f64>) {
    let n = a.nrows();
    let mut vectors = DMatrix::identity(n, n);
    for _ in 0..SWEEPS {
        let mut is_diagonal = true;
        for p in 0..n {
            for q in p + 1..n {
                let off = a[(p, q)];
                if off.abs() <= f64::EPSILON * (a[(p, p)].abs() * a[(q, q)].abs()).sqrt() {
                    continue;
                }
                is_diagonal = false;
                rotate(&mut a, &mut vectors, p, q);
            }
        }
        if is_diagonal {
            break;
        }
    }
    ((0..n).map(|i| a[(i, i)]).collect(), vectors)
}

/// One rotation that clears the place (p, q).
fn rotate(a: &mut DMatrix<f64>, vectors: &mut DMatrix<f64>, p: usize, q: usize) {
    let ratio = (a[(q, q)] - a[(p, p)]) / (2.0 * a[(p, q)]);
    let tangent = ratio.signum() / (ratio.abs() + (1.0 + ratio * ratio).sqrt());
    let cosine = 1.0 / (1.0 + tangent * tangent).sqrt();
    let sine = tangent * cosine;
    let shift = tangent * a[(p, q)];
    a[(p, p)] -= shift;
    a[(q, q)] += shift;
    a[(p, q)] = 0.0;
    a[(q, p)] = 0.0;
    for k in 0..a.nrows() {
        if k != p && k != q {
            let (kp, kq) = (a[(k, p)], a[(k, q)]);
            a[(k, p)] = cosine * kp - sine * kq;
            a[(k, q)] = sine * kp + cosine * kq;
            a[(p, k)] = a[(k, p)];
            a[(q, k)] = a[(k, q)];
        }
        let (kp, kq) = (vectors[(k, p)], vectors[(k, q)]);
        vectors[(k, p)] = cosine * kp - sine * kq;
        vectors[(k, q)] = sine * kp + cosine * kq;
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn a_graded_matrix_keeps_its_small_eigenvalue() {
        // [[1, 1], [1, 1e16]]: the small eigenvalue is 1 - 1e-16 to first order.
        let a = DMatrix::from_row_slice(2, 2, &[1.0, 1.0, 1.0, 1e16]);
        let (values, _) = symmetric(a);
        assert!((values[0] - 1.0).abs() < 1e-15, "{}", values[0]);
        assert!((values[1] - 1e16).abs() < 4.0);
    }

    #[test]
    fn vectors_diagonalise() {
        let a = DMatrix::from_row_slice(3, 3, &[4.0, 1.0, -2.0, 1.0, 3.0, 0.5, -2.0, 0.5, 5.0]);
        let (values, vectors) = symmetric(a.clone());
        for (i, value) in values.iter().enumerate() {
            let v = vectors.column(i).into_owned();
            assert!((&a * &v - &v * *value).amax() < 1e-14);
        }
        assert!((values.iter().sum::<f64>() - 12.0).abs() < 1e-14);
    }
}
