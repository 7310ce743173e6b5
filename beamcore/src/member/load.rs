//! Loads: what stands on a member; positive downward, couples clockwise.

use crate::section::InitialStrain;
use crate::units::{Angle, AreaLoad, Force, Length, LineLoad, Moment, TemperatureChange};

/// One load; positive downward.
#[derive(Clone, Debug, PartialEq)]
#[non_exhaustive]
pub enum Load {
    /// The weight of the section: sum of density x area x g, over the whole member.
    SelfWeight,
    /// A constant line load over the whole member.
    Uniform {
        /// Load per length.
        load: LineLoad,
    },
    /// A constant line load over a stretch.
    Partial {
        /// Load per length.
        load: LineLoad,
        /// Left end of the stretch.
        from: Length,
        /// Right end of the stretch.
        to: Length,
    },
    /// A line load over a stretch that changes linearly; triangular where one end is zero.
    Trapezoidal {
        /// Load per length at the left end of the stretch.
        load_from: LineLoad,
        /// Load per length at its right end.
        load_to: LineLoad,
        /// Left end of the stretch.
        from: Length,
        /// Right end of the stretch.
        to: Length,
    },
    /// A load per area of floor or roof: line load = load x tributary width.
    Area {
        /// Load per area.
        load: AreaLoad,
        /// The width of floor that the member carries.
        tributary_width: Length,
        /// The two ends of the stretch; without it, the whole member.
        stretch: Option<(Length, Length)>,
    },
    /// A point load.
    Point {
        /// The force.
        load: Force,
        /// Its place.
        at: Length,
    },
    /// A couple, positive clockwise.
    Couple {
        /// The couple.
        couple: Moment,
        /// Its place.
        at: Length,
    },
    /// A line load over a stretch per length of the plan, as snow on a pitched member; positive
    /// downward. Other line loads count per length of the member.
    Plan {
        /// Load per length of the plan.
        load: LineLoad,
        /// The two ends of the stretch along the member; without it, the whole member.
        stretch: Option<(Length, Length)>,
    },
    /// A force along the member, positive to the right, at a height of the section.
    Axial {
        /// The force.
        load: Force,
        /// Its place.
        at: Length,
        /// The height at which it acts, in the section's coordinates.
        height: Length,
    },
    /// A tendon: it pulls its two anchors towards each other and presses on the member where it
    /// turns.
    Prestress {
        /// The force in the tendon, positive in tension.
        force: Force,
        /// How the tendon runs.
        tendon: Tendon,
    },
    /// A support that sinks.
    Settlement {
        /// The name of the support.
        support: String,
        /// How far, positive downward.
        settlement: Length,
    },
    /// A support that turns the member's end or section with it.
    ImposedRotation {
        /// The name of the support.
        support: String,
        /// By how much, positive clockwise.
        rotation: Angle,
    },
    /// All parts, or those named, become warmer; each strains by its thermal expansion.
    Temperature {
        /// The change, positive where warmer.
        change: TemperatureChange,
        /// The parts; none means all.
        parts: Vec<String>,
    },
    /// The top of the section becomes warmer than its bottom, linearly between them, with the mean
    /// over the height unchanged.
    TemperatureDifference {
        /// Top minus bottom.
        difference: TemperatureChange,
    },
    /// A free strain of a part: moisture, shrinkage, a built-in curvature, a locked strain.
    Strain {
        /// The part.
        part: String,
        /// What it would be strained by if it were alone.
        strain: InitialStrain,
    },
}

/// How a tendon runs along the member; heights are those of the section's coordinates.
#[derive(Clone, Debug, PartialEq)]
pub enum Tendon {
    /// Straight between its points, the first and last of which are the anchors: a straight tendon
    /// has two points, a draped one more.
    Draped(Vec<(Length, Length)>),
    /// The parabola through three points, the first and last of which are the anchors.
    Parabolic([(Length, Length); 3]),
}

impl Load {
    /// The word used in documents.
    #[must_use]
    pub const fn name(&self) -> &'static str {
        match self {
            Self::SelfWeight => "self_weight",
            Self::Uniform { .. } => "uniform",
            Self::Partial { .. } => "partial",
            Self::Trapezoidal { .. } => "trapezoidal",
            Self::Area { .. } => "area",
            Self::Point { .. } => "point",
            Self::Couple { .. } => "couple",
            Self::Plan { .. } => "plan",
            Self::Axial { .. } => "axial",
            Self::Prestress { .. } => "prestress",
            Self::Settlement { .. } => "settlement",
            Self::ImposedRotation { .. } => "imposed_rotation",
            Self::Temperature { .. } => "temperature",
            Self::TemperatureDifference { .. } => "temperature_difference",
            Self::Strain { .. } => "free_strain",
        }
    }

    /// Whether it acts along the member.
    pub(super) const fn is_axial(&self) -> bool {
        matches!(self, Self::Axial { .. } | Self::Prestress { .. })
    }

    /// Whether it is a free strain of parts.
    pub(super) const fn is_strain(&self) -> bool {
        matches!(
            self,
            Self::Temperature { .. } | Self::TemperatureDifference { .. } | Self::Strain { .. }
        )
    }

    /// The places where it begins, ends, stands or turns.
    pub(super) fn places(&self) -> Vec<Length> {
        match self {
            Self::SelfWeight
            | Self::Uniform { .. }
            | Self::Settlement { .. }
            | Self::ImposedRotation { .. }
            | Self::Temperature { .. }
            | Self::TemperatureDifference { .. }
            | Self::Strain { .. } => vec![],
            Self::Area { stretch, .. } | Self::Plan { stretch, .. } => {
                stretch.map_or_else(Vec::new, |(from, to)| vec![from, to])
            }
            Self::Partial { from, to, .. } | Self::Trapezoidal { from, to, .. } => {
                vec![*from, *to]
            }
            Self::Point { at, .. } | Self::Couple { at, .. } | Self::Axial { at, .. } => vec![*at],
            Self::Prestress { tendon, .. } => tendon.points().iter().map(|point| point.0).collect(),
        }
    }
}

impl Tendon {
    /// The word used in documents.
    #[must_use]
    pub const fn name(&self) -> &'static str {
        match self {
            Self::Draped(_) => "draped",
            Self::Parabolic(_) => "parabolic",
        }
    }

    /// Its points.
    #[must_use]
    pub fn points(&self) -> &[(Length, Length)] {
        match self {
            Self::Draped(points) => points,
            Self::Parabolic(points) => points,
        }
    }
}
