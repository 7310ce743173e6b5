//! What a station demands of the states on its two sides.
//!
//! At a station the displacements are continuous; each force jumps by the outside force on it:
//! V+ = V- - P + R with a load P downward and a reaction R upward, M+ = M- + C + R_M with
//! couples clockwise. A displacement that is held trades its jump equation for the condition that
//! it is zero, and its reaction is what the jump then needs.

use super::relation::{LoadSide, Relation};
use super::state::{HALF, M, PAIRS, STATES, V};
use nalgebra::{SMatrix, SVector};

/// Which displacements a station holds at zero, in the order of [`PAIRS`].
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq)]
pub(crate) struct Holds(pub(crate) [bool; HALF]);

impl Holds {
    /// Nothing is held: a free end, or a station where only the load changes.
    pub(crate) const NOTHING: Self = Self([false, false]);
    /// The deflection is held, the rotation is free.
    pub(crate) const DEFLECTION: Self = Self([true, false]);
    /// Deflection and rotation are held.
    pub(crate) const BOTH: Self = Self([true, true]);
}

/// The jump of the forces at a station caused by a load P downward and a couple C clockwise,
/// without reactions.
pub(crate) fn jump(point_load: f64, couple: f64) -> SVector<f64, STATES> {
    let mut jump = SVector::zeros();
    jump[V] = -point_load;
    jump[M] = couple;
    jump
}

/// The conditions at an end of the member for the state inside it.
///
/// The forces outside the member are zero, so a force that is not a reaction equals the jump.
pub(crate) fn end(holds: Holds) -> SMatrix<f64, HALF, STATES> {
    let mut rows = SMatrix::zeros();
    for (i, &(displacement, force)) in PAIRS.iter().enumerate() {
        rows[(i, if holds.0[i] { displacement } else { force })] = 1.0;
    }
    rows
}

/// The right-hand sides of [`end`]; `force` is the value the free forces take.
pub(crate) fn end_side(holds: Holds, force: &SVector<f64, STATES>) -> SVector<f64, HALF> {
    let mut side = SVector::zeros();
    for (i, &(_, f)) in PAIRS.iter().enumerate() {
        if !holds.0[i] {
            side[i] = force[f];
        }
    }
    side
}

/// Extends the relation of a piece over the station at its right end, so that it ends on the
/// right side of that station: y- = y+ - jump - reactions.
///
/// A polynomial piece gives each force at its right end by one equation of its own, in the row of
/// that force; a held displacement replaces this row.
pub(crate) fn across(relation: &mut Relation<STATES>, holds: Holds) {
    for (i, &(displacement, force)) in PAIRS.iter().enumerate() {
        if holds.0[i] {
            relation.left.row_mut(force).fill(0.0);
            relation.right.row_mut(force).fill(0.0);
            relation.right[(force, displacement)] = 1.0;
        }
    }
}

/// The load side of [`across`].
pub(crate) fn across_side(
    side: &LoadSide<STATES>,
    holds: Holds,
    jump: &SVector<f64, STATES>,
) -> LoadSide<STATES> {
    let mut side = side + jump;
    for (i, &(_, force)) in PAIRS.iter().enumerate() {
        if holds.0[i] {
            side[force] = 0.0;
        }
    }
    side
}
