//! Whether a member yields in shear.

use crate::units::ShearStiffness;

/// How the shear deformation of a member is taken.
#[derive(Clone, Copy, Debug, Default, PartialEq)]
pub enum ShearModel {
    /// Left out: sections stay square to the axis.
    #[default]
    Rigid,
    /// With kGA of each section, from the energy of its shear stress.
    Flexible,
    /// With the kGA that is given, the same all along the member and its life.
    Given(ShearStiffness),
}

impl ShearModel {
    /// The word used in documents.
    #[must_use]
    pub const fn name(self) -> &'static str {
        match self {
            Self::Rigid => "rigid",
            Self::Flexible => "flexible",
            Self::Given(_) => "given",
        }
    }
}
