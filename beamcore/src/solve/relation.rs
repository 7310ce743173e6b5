//! The relation between the states at the two ends of a piece.

use nalgebra::{SMatrix, SVector};

/// `left` y(left end) + `right` y(right end) = load, as many equations as states.
///
/// Both ends appear, and neither is expressed by the other: for pieces whose solutions grow and
/// decay exponentially a transfer from end to end would overflow, this form does not.
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct Relation<const D: usize> {
    pub(crate) left: SMatrix<f64, D, D>,
    pub(crate) right: SMatrix<f64, D, D>,
}

/// The load side of a relation, for one load case.
pub(crate) type LoadSide<const D: usize> = SVector<f64, D>;

/// A piece of a member: the law between two neighbouring stations.
pub(crate) trait Piece<const D: usize> {
    /// The load that stands on the piece.
    type Load;

    /// The relation between the scaled states at its ends.
    fn relation(&self) -> Relation<D>;

    /// The load side of that relation.
    fn load_side(&self, load: &Self::Load) -> LoadSide<D>;
}
