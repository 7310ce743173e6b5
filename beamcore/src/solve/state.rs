//! The state at a place along the member, and the scales that make it dimensionless.
//!
//! Signs: deflection w and loads q positive downward; slope theta = dw/dx; shear force V = dM/dx;
//! a positive moment M stretches the bottom. The state equations of a shear-rigid member are
//!
//! w' = theta, theta' = -M/EI, V' = -q, M' = V.

/// The number of states of plane bending: two displacements and their two forces.
pub(crate) const STATES: usize = 4;
/// Half of them: so many conditions stand at each end.
pub(crate) const HALF: usize = STATES / 2;

/// Index of the deflection w.
pub(crate) const W: usize = 0;
/// Index of the rotation theta.
pub(crate) const THETA: usize = 1;
/// Index of the shear force V.
pub(crate) const V: usize = 2;
/// Index of the moment M.
pub(crate) const M: usize = 3;

/// The displacements and, at the same position, the forces that do work on them.
pub(crate) const PAIRS: [(usize, usize); HALF] = [(W, V), (THETA, M)];

/// Units of length and bending stiffness in which the states are near one.
#[derive(Clone, Copy, Debug, PartialEq)]
pub(crate) struct Scale {
    /// A length of the member, in m: about one span.
    pub(crate) length: f64,
    /// A bending stiffness of the member, in N m2.
    pub(crate) stiffness: f64,
}

impl Scale {
    /// The size of one unit of each state: w in m, theta in rad, V in N, M in N m.
    pub(crate) fn units(self) -> [f64; STATES] {
        let Self { length, stiffness } = self;
        [
            length,
            1.0,
            stiffness / (length * length),
            stiffness / length,
        ]
    }
}
