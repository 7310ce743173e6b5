//! Loads as they are written.

use super::written::Written;
use crate::units::{
    Angle, AreaLoad, Curvature, Force, Length, LineLoad, Moment, Strain, TemperatureChange,
};
use schemars::JsonSchema;
use serde::{Deserialize, Serialize};

/// A load, positive downward.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case", deny_unknown_fields)]
pub(crate) enum LoadDocument {
    /// The weight of the section.
    SelfWeight,
    /// A line load over the whole member.
    Uniform {
        /// The load per length.
        load: Written<LineLoad>,
    },
    /// A line load over a stretch.
    Partial {
        /// The load per length.
        load: Written<LineLoad>,
        /// The left end of the stretch.
        from: Written<Length>,
        /// The right end of the stretch.
        to: Written<Length>,
    },
    /// A line load over a stretch that changes linearly.
    Trapezoidal {
        /// The load per length at the left end of the stretch.
        load_from: Written<LineLoad>,
        /// The load per length at its right end.
        load_to: Written<LineLoad>,
        /// The left end of the stretch.
        from: Written<Length>,
        /// The right end of the stretch.
        to: Written<Length>,
    },
    /// A load per area of floor.
    Area {
        /// The load per area.
        load: Written<AreaLoad>,
        /// The width of floor that the member carries.
        tributary_width: Written<Length>,
        /// The left end of the stretch; without it, the whole member.
        #[serde(default, skip_serializing_if = "Option::is_none")]
        from: Option<Written<Length>>,
        /// The right end of the stretch.
        #[serde(default, skip_serializing_if = "Option::is_none")]
        to: Option<Written<Length>>,
    },
    /// A line load per length of the plan, as snow on a pitched member.
    Plan {
        /// The load per length of the plan.
        load: Written<LineLoad>,
        /// The left end of the stretch, along the member; without it, the whole member.
        #[serde(default, skip_serializing_if = "Option::is_none")]
        from: Option<Written<Length>>,
        /// The right end of the stretch.
        #[serde(default, skip_serializing_if = "Option::is_none")]
        to: Option<Written<Length>>,
    },
    /// A point load.
    Point {
        /// The force.
        load: Written<Force>,
        /// The place.
        at: Written<Length>,
    },
    /// A couple, positive clockwise.
    Couple {
        /// The couple.
        couple: Written<Moment>,
        /// The place.
        at: Written<Length>,
    },
    /// A force along the member, positive to the right.
    Axial {
        /// The force.
        load: Written<Force>,
        /// The place.
        at: Written<Length>,
        /// The height of the section at which it acts.
        height: Written<Length>,
    },
    /// A tendon that presses on the member.
    Prestress {
        /// The force in the tendon, positive in tension.
        force: Written<Force>,
        /// How the tendon runs.
        tendon: TendonDocument,
    },
    /// A support that sinks.
    Settlement {
        /// The name of the support.
        support: String,
        /// How far, positive downward.
        settlement: Written<Length>,
    },
    /// A support that turns.
    ImposedRotation {
        /// The name of the support.
        support: String,
        /// By how much, positive clockwise.
        rotation: Written<Angle>,
    },
    /// Parts that become warmer.
    Temperature {
        /// The change, positive where warmer.
        change: Written<TemperatureChange>,
        /// The names of the parts; without them, all.
        #[serde(default, skip_serializing_if = "Vec::is_empty")]
        parts: Vec<String>,
    },
    /// A top that becomes warmer than the bottom, linearly over the height of the section.
    TemperatureDifference {
        /// Top minus bottom.
        difference: Written<TemperatureChange>,
    },
    /// A free strain of a part, about its own centroid.
    FreeStrain {
        /// The name of the part.
        part: String,
        /// At the part's own centroid; shrinkage is negative.
        axial: Written<Strain>,
        /// About the level axis, positive where the bottom would grow longer.
        #[serde(default, skip_serializing_if = "Option::is_none")]
        curvature_y: Option<Written<Curvature>>,
        /// About the upright axis, positive where the side of negative y would grow longer.
        #[serde(default, skip_serializing_if = "Option::is_none")]
        curvature_z: Option<Written<Curvature>>,
    },
}

/// How a tendon runs along the member.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case", deny_unknown_fields)]
pub(crate) enum TendonDocument {
    /// Straight between its points, the first and last of which are the anchors.
    Draped(Vec<TendonPointDocument>),
    /// The parabola through three points, the first and last of which are the anchors.
    Parabolic([TendonPointDocument; 3]),
}

/// A point of a tendon.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct TendonPointDocument {
    /// The place, from the left end of the member.
    pub(crate) at: Written<Length>,
    /// The height of the section.
    pub(crate) height: Written<Length>,
}
