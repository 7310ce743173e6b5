//! Loads: what stands on a member; positive downward, couples clockwise.

use crate::units::{AreaLoad, Force, Length, LineLoad, Moment};

/// One load; positive downward.
#[derive(Clone, Copy, Debug, PartialEq)]
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
        }
    }
}
