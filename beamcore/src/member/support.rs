//! Supports: where a member is held.

use crate::units::Length;

/// What a support holds.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub enum SupportKind {
    /// Holds the deflection and the displacement along the axis; the member may turn.
    Pin,
    /// Holds the deflection; the member may turn and slide along its axis.
    Roller,
    /// Holds the deflection, the displacement along the axis and the rotation.
    Fixed,
}

impl SupportKind {
    /// All kinds.
    pub const ALL: [Self; 3] = [Self::Pin, Self::Roller, Self::Fixed];

    /// The word used in documents.
    #[must_use]
    pub const fn name(self) -> &'static str {
        match self {
            Self::Pin => "pin",
            Self::Roller => "roller",
            Self::Fixed => "fixed",
        }
    }
}

/// A lasting support of a member, with a name that addresses its reactions.
#[derive(Clone, Debug, PartialEq)]
pub struct Support {
    name: String,
    kind: SupportKind,
    at: Length,
}

impl Support {
    /// A support of the given kind at a distance from the left end of the member.
    pub fn new(name: impl Into<String>, kind: SupportKind, at: Length) -> Self {
        Self {
            name: name.into(),
            kind,
            at,
        }
    }

    /// A pin: holds deflection and axis.
    pub fn pin(name: impl Into<String>, at: Length) -> Self {
        Self::new(name, SupportKind::Pin, at)
    }

    /// A roller: holds the deflection only.
    pub fn roller(name: impl Into<String>, at: Length) -> Self {
        Self::new(name, SupportKind::Roller, at)
    }

    /// A fixed support: holds deflection, axis and rotation.
    pub fn fixed(name: impl Into<String>, at: Length) -> Self {
        Self::new(name, SupportKind::Fixed, at)
    }

    /// The name.
    #[must_use]
    pub fn name(&self) -> &str {
        &self.name
    }

    /// What it holds.
    #[must_use]
    pub const fn kind(&self) -> SupportKind {
        self.kind
    }

    /// Its distance from the left end of the member.
    #[must_use]
    pub const fn at(&self) -> Length {
        self.at
    }
}
