//! A prismatic section of one strand, in the modes in which its joints slip.
//!
//! With e* the gradients that the layers take freely, b the gradients theta' and u', s' the slips'
//! and C in blocks: e_b - e_b* = C_bb^-1 f_b + R (s' - s*'), R = -C_bb^-1 C_bs: without slip the
//! section is rigidly joined; S (s' - s*') = T + R^T f_b, S = C_ss - C_sb C_bb^-1 C_bs. With K the
//! slip moduli, K Q = S Q L^2 and Q^T S Q = 1 the slips s = Q x fall apart into modes:
//!
//! x' - x*' = y + g, y' = L^2 x - p, where y = Q^T T, g = Q^T R^T f_b, p = Q^T n and n the axial
//! load per length on the layers above each joint.

use super::law::Law;
use crate::math::eigen;
use nalgebra::DMatrix;

/// A section law prepared for prismatic pieces; matrices row by row.
#[derive(Clone, Debug)]
pub(crate) struct Modes {
    /// The number of base gradients: theta', and u' where axial force takes part.
    pub(crate) base: usize,
    /// The number of slips.
    pub(crate) slips: usize,
    /// C_bb^-1, base x base.
    pub(crate) flexibility: Vec<f64>,
    /// R, base x slips.
    pub(crate) coupling: Vec<f64>,
    /// Q, slips x modes.
    pub(crate) shapes: Vec<f64>,
    /// S Q, slips x modes: T = S Q y and x = (S Q)^T s.
    pub(crate) duals: Vec<f64>,
    /// Q^T R^T, modes x base.
    pub(crate) drive: Vec<f64>,
    /// The rates L in 1/m.
    pub(crate) rates: Vec<f64>,
    /// 1/kGA.
    pub(crate) shear_flexibility: f64,
}

impl Modes {
    /// The modes of a law of one strand.
    pub(crate) fn new(law: &Law) -> Self {
        let base = law.states.half() - law.states.strands - law.states.slips;
        let slips = law.states.slips;
        let c = &law.stiffness;
        let flexibility = inverse(&c.view((0, 0), (base, base)).into_owned());
        let (coupling, shapes, duals, rates) = if slips == 0 {
            let none = DMatrix::zeros(0, 0);
            (DMatrix::zeros(base, 0), none.clone(), none, Vec::new())
        } else {
            slip_modes(law, &flexibility)
        };
        let drive = shapes.transpose() * coupling.transpose();
        Self {
            base,
            slips,
            flexibility: rows(&flexibility),
            coupling: rows(&coupling),
            shapes: rows(&shapes),
            duals: rows(&duals),
            drive: rows(&drive),
            rates,
            shear_flexibility: law.shear_flexibility[0],
        }
    }
}

/// R, Q, S Q and the rates.
fn slip_modes(
    law: &Law,
    flexibility: &DMatrix<f64>,
) -> (DMatrix<f64>, DMatrix<f64>, DMatrix<f64>, Vec<f64>) {
    let (base, slips) = (flexibility.nrows(), law.states.slips);
    let c = &law.stiffness;
    let c_bs = c.view((0, base), (base, slips)).into_owned();
    let coupling = -(flexibility * &c_bs);
    let s = c.view((base, base), (slips, slips)) + c_bs.transpose() * &coupling;
    let first = law.states.slip(0);
    let k = law.joints.view((first, first), (slips, slips)).into_owned();
    // The stiffest joint comes last: then no soft one is added to it before the factors part them.
    let mut order: Vec<usize> = (0..slips).collect();
    order.sort_by(|&a, &b| k[(a, a)].total_cmp(&k[(b, b)]));
    let sorted = |m: &DMatrix<f64>| DMatrix::from_fn(slips, slips, |i, j| m[(order[i], order[j])]);
    let lower = sorted(&s)
        .cholesky()
        .expect("layers have a positive axial stiffness")
        .unpack();
    let half = lower
        .solve_lower_triangular(&sorted(&k))
        .expect("a Cholesky factor is regular");
    let symmetric = lower
        .solve_lower_triangular(&half.transpose())
        .expect("a Cholesky factor is regular");
    let (squares, vectors) = eigen::symmetric(symmetric);
    let shapes = lower
        .transpose()
        .solve_upper_triangular(&vectors)
        .expect("a Cholesky factor is regular");
    let duals = &lower * &vectors;
    let mut place = vec![0; slips];
    for (p, &joint) in order.iter().enumerate() {
        place[joint] = p;
    }
    let unsorted = |m: &DMatrix<f64>| DMatrix::from_fn(slips, slips, |i, j| m[(place[i], j)]);
    let rates = squares
        .iter()
        .map(|&square| square.max(0.0).sqrt())
        .collect();
    (coupling, unsorted(&shapes), unsorted(&duals), rates)
}

/// The inverse of a positive definite matrix.
pub(crate) fn inverse(matrix: &DMatrix<f64>) -> DMatrix<f64> {
    if matrix.nrows() == 1 {
        return DMatrix::from_element(1, 1, 1.0 / matrix[(0, 0)]);
    }
    matrix
        .clone()
        .cholesky()
        .expect("the stiffness of a section is positive definite")
        .inverse()
}

/// A matrix row by row.
fn rows(matrix: &DMatrix<f64>) -> Vec<f64> {
    matrix.transpose().as_slice().to_vec()
}
