//! Joints: what holds two layers together along the member.

use super::slip::Slip;
use crate::path;
use crate::units::{Length, SlipModulus};

/// How a joint holds its two layers along the member.
#[derive(Clone, Debug, PartialEq)]
pub enum JointKind {
    /// Without slip: the two layers are one piece.
    Rigid,
    /// With slip in proportion to the flow.
    Slipping(Slip),
    /// Not at all: the layers slip freely and share their deflection only.
    Loose,
}

impl JointKind {
    /// The word used in documents.
    #[must_use]
    pub const fn name(&self) -> &'static str {
        match self {
            Self::Rigid => "rigid",
            Self::Slipping(Slip::Modulus(_)) => "slipping",
            Self::Slipping(Slip::Fasteners { .. }) => "fasteners",
            Self::Slipping(Slip::Glue { .. }) => "glue",
            Self::Loose => "loose",
        }
    }
}

/// What holds two layers together along the member.
///
/// The slip of a joint is the displacement along x of its upper layer minus that of its lower
/// one. Of layers that stand side by side either may be called the upper one; that name only
/// fixes the sign of the slip and of the flow.
///
/// # Examples
/// ```
/// use beamcore::section::{Joint, JointKind, Slip};
/// use beamcore::units::{Number, SlipModulus};
/// let modulus = SlipModulus::from_N_per_mm2(133.0);
/// let screws = Joint::slipping("screws", "joist", "slab", Slip::Modulus(modulus))
///     .gap(20.mm())
///     .creep(1.2);
/// assert_eq!((screws.lower(), screws.upper()), ("joist", "slab"));
/// assert_eq!(screws.stated_gap(), Some(20.mm()));
/// ```
#[derive(Clone, Debug, PartialEq)]
pub struct Joint {
    name: String,
    lower: String,
    upper: String,
    kind: JointKind,
    gap: Option<Length>,
    transverse: Option<SlipModulus>,
    clearance: Option<Length>,
    creep: Option<f64>,
}

impl Joint {
    /// A joint of two layers, by their names.
    pub fn new(
        name: impl Into<String>,
        lower: impl Into<String>,
        upper: impl Into<String>,
        kind: JointKind,
    ) -> Self {
        Self {
            name: name.into(),
            lower: lower.into(),
            upper: upper.into(),
            kind,
            gap: None,
            transverse: None,
            clearance: None,
            creep: None,
        }
    }

    /// A joint without slip.
    pub fn rigid(
        name: impl Into<String>,
        lower: impl Into<String>,
        upper: impl Into<String>,
    ) -> Self {
        Self::new(name, lower, upper, JointKind::Rigid)
    }

    /// A joint in which the layers slip freely.
    pub fn loose(
        name: impl Into<String>,
        lower: impl Into<String>,
        upper: impl Into<String>,
    ) -> Self {
        Self::new(name, lower, upper, JointKind::Loose)
    }

    /// A joint that slips in proportion to the flow.
    pub fn slipping(
        name: impl Into<String>,
        lower: impl Into<String>,
        upper: impl Into<String>,
        slip: Slip,
    ) -> Self {
        Self::new(name, lower, upper, JointKind::Slipping(slip))
    }

    /// The same joint across a gap: the clear distance between the two layers, which must agree
    /// with their places to 0.1 mm. It must be stated where the layers do not touch.
    #[must_use]
    pub const fn gap(mut self, gap: Length) -> Self {
        self.gap = Some(gap);
        self
    }

    /// The same joint with a modulus square to the member, force per length that one length of
    /// difference between the deflections makes: the two layers then have a deflection each.
    #[must_use]
    pub const fn transverse(mut self, modulus: SlipModulus) -> Self {
        self.transverse = Some(modulus);
        self
    }

    /// The same slipping joint with a clearance, as of bolts in wider holes: it carries nothing
    /// until the slip, in either sense, has used it up.
    #[must_use]
    pub const fn clearance(mut self, clearance: Length) -> Self {
        self.clearance = Some(clearance);
        self
    }

    /// The same joint with a creep factor of its own: at the end its moduli are divided by
    /// (1 + factor). Without it, the factor follows from wood-based layers; beside any other
    /// material it must be given.
    #[must_use]
    pub const fn creep(mut self, factor: f64) -> Self {
        self.creep = Some(factor);
        self
    }

    /// The name.
    #[must_use]
    pub fn name(&self) -> &str {
        &self.name
    }

    /// The name of the lower layer.
    #[must_use]
    pub fn lower(&self) -> &str {
        &self.lower
    }

    /// The name of the upper layer.
    #[must_use]
    pub fn upper(&self) -> &str {
        &self.upper
    }

    /// How the joint holds its layers along the member.
    #[must_use]
    pub const fn kind(&self) -> &JointKind {
        &self.kind
    }

    /// The clear distance between the layers, if it was stated.
    #[must_use]
    pub const fn stated_gap(&self) -> Option<Length> {
        self.gap
    }

    /// The modulus square to the member, if it was given.
    #[must_use]
    pub const fn transverse_modulus(&self) -> Option<SlipModulus> {
        self.transverse
    }

    /// The clearance, if it was given.
    #[must_use]
    pub const fn given_clearance(&self) -> Option<Length> {
        self.clearance
    }

    /// The creep factor, if it was given.
    #[must_use]
    pub const fn given_creep(&self) -> Option<f64> {
        self.creep
    }

    /// The same joint of another kind, with nothing but its gap kept.
    pub(super) fn of_kind(&self, kind: JointKind) -> Self {
        let joint = Self::new(&self.name, &self.lower, &self.upper, kind);
        Self {
            gap: self.gap,
            ..joint
        }
    }

    /// Whether the joint has any stiffness that can creep.
    pub(super) const fn has_modulus(&self) -> bool {
        matches!(self.kind, JointKind::Slipping(_)) || self.transverse.is_some()
    }

    /// The path of a joint.
    pub(super) fn path(name: &str) -> String {
        path::named("section.joints", name)
    }
}
