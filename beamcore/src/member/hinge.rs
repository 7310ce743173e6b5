//! Hinges: where a member is cut in one way.

use crate::path;
use crate::units::Length;

/// What a hinge releases.
#[derive(Clone, Debug, PartialEq, Eq, Hash)]
pub enum Release {
    /// The rotation: no moment about the elastic centroid of the section just right of it passes (of
    /// a layer with a deflection of its own, if one is named, about that layer's centroid).
    Moment(Option<String>),
    /// The deflection: no shear force passes.
    Shear,
    /// The layer of this name is butted: no axial force of its own passes. Its curvature goes on
    /// with that of the others.
    Butt(String),
}

impl Release {
    /// The word used in documents.
    #[must_use]
    pub const fn name(&self) -> &'static str {
        match self {
            Self::Moment(_) => "moment",
            Self::Shear => "shear",
            Self::Butt(_) => "butt",
        }
    }
}

/// An internal hinge of a member.
#[derive(Clone, Debug, PartialEq)]
pub struct Hinge {
    at: Length,
    release: Release,
}

impl Hinge {
    /// A hinge that releases what is given.
    #[must_use]
    pub const fn new(at: Length, release: Release) -> Self {
        Self { at, release }
    }

    /// A hinge through all layers: no moment passes.
    #[must_use]
    pub const fn moment(at: Length) -> Self {
        Self::new(at, Release::Moment(None))
    }

    /// A hinge in the strand of one layer, which must have a deflection of its own.
    #[must_use]
    pub fn moment_of(layer: impl Into<String>, at: Length) -> Self {
        Self::new(at, Release::Moment(Some(layer.into())))
    }

    /// A shear release: no shear force passes.
    #[must_use]
    pub const fn shear(at: Length) -> Self {
        Self::new(at, Release::Shear)
    }

    /// A butt joint of one layer: no axial force of that layer passes.
    #[must_use]
    pub fn butt(layer: impl Into<String>, at: Length) -> Self {
        Self::new(at, Release::Butt(layer.into()))
    }

    /// Its place, from the left end.
    #[must_use]
    pub const fn at(&self) -> Length {
        self.at
    }

    /// Its path, given its position among the hinges.
    pub(super) fn path(&self, index: usize) -> String {
        path::key(&path::indexed("member.hinges", index), self.release.name())
    }

    /// What it releases.
    #[must_use]
    pub const fn release(&self) -> &Release {
        &self.release
    }
}

/// What stops the slip of a joint at a place, as an end plate or a notch does.
#[derive(Clone, Debug, PartialEq)]
pub struct Anchor {
    /// The name by which its force is asked for.
    pub name: String,
    /// The name of the joint.
    pub joint: String,
    /// The place, from the left end.
    pub at: Length,
    /// Force per slip; `None` where it lets no slip at all.
    pub stiffness: Option<crate::units::FastenerStiffness>,
}
