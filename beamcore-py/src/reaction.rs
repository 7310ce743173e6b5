//! The class `Reaction`.

use crate::quantity::Quantity;
use beamcore::response;

record! {
    /// The reaction of one support on the member.
    Reaction {
        /// The force, positive upward.
        force: Quantity,
        /// The couple, positive clockwise with x to the right and z up; zero unless the support
        /// holds the rotation.
        couple: Quantity,
        /// The level force, positive to the right; zero where no axial force takes part.
        along: Quantity,
    }
}

impl Reaction {
    pub(crate) fn of(found: &response::Reaction) -> Self {
        Self {
            force: Quantity::of(found.force),
            couple: Quantity::of(found.couple),
            along: Quantity::of(found.along),
        }
    }
}
