//! The states at a place along a member, their order, and the units in which they are near one.
//!
//! Displacements: the deflection w and the rotation theta of each strand (a strand is a group of
//! layers with one deflection), the displacement u along x at the height z = 0 where axial force
//! takes part, and one slip s per joint that is not rigid. Forces, at the same positions: V,
//! B = -M, N, and T, the axial force of all layers above the joint. A positive B keeps the
//! equations symmetric; callers see M = -B.
//!
//! Signs: w and loads q positive downward, theta positive clockwise, u(z) = u + theta z + slips
//! below it, tension positive, s = displacement of the upper layer minus the lower one.

/// Which states a member has.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub(crate) struct States {
    pub(crate) strands: usize,
    pub(crate) has_axial: bool,
    pub(crate) slips: usize,
}

impl States {
    /// Plane bending of one strand without axial force and slip.
    pub(crate) const BENDING: Self = Self {
        strands: 1,
        has_axial: false,
        slips: 0,
    };

    /// The number of displacements, and of forces.
    pub(crate) const fn half(self) -> usize {
        2 * self.strands + self.has_axial as usize + self.slips
    }

    /// The number of all states.
    pub(crate) const fn all(self) -> usize {
        2 * self.half()
    }

    /// The position of the deflection of a strand.
    pub(crate) const fn deflection(self, strand: usize) -> usize {
        strand
    }

    /// The position of the rotation of a strand.
    pub(crate) const fn rotation(self, strand: usize) -> usize {
        self.strands + strand
    }

    /// The position of the axial displacement, which must be a state.
    pub(crate) const fn axial(self) -> usize {
        2 * self.strands
    }

    /// The position of the slip of a joint.
    pub(crate) const fn slip(self, joint: usize) -> usize {
        2 * self.strands + self.has_axial as usize + joint
    }

    /// The position of the force that does work on the displacement at the given position.
    pub(crate) const fn force(self, displacement: usize) -> usize {
        self.half() + displacement
    }
}

/// One unit of each displacement; the unit of its force is `energy` over it.
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct Scale {
    displacements: Vec<f64>,
    energy: f64,
}

impl Scale {
    /// Scales for displacements of the given size and the energy EI/L in N m.
    pub(crate) fn new(displacements: Vec<f64>, energy: f64) -> Self {
        Self {
            displacements,
            energy,
        }
    }

    /// The unit of the state at a position.
    pub(crate) fn unit(&self, state: usize) -> f64 {
        let half = self.displacements.len();
        if state < half {
            self.displacements[state]
        } else {
            self.energy / self.displacements[state - half]
        }
    }
}
