//! The section as it is written.

use super::document_joint::{JointDocument, LayerDocument};
use super::written::Written;
use crate::units::{Curvature, Force, Length, LineMass, Moment, Strain};
use schemars::JsonSchema;
use serde::{Deserialize, Serialize};

/// The section.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct SectionDocument {
    /// The parts.
    pub(crate) parts: Vec<PartDocument>,
    /// The layers; without them, all parts are one layer.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(crate) layers: Vec<LayerDocument>,
    /// The joints between the layers.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(crate) joints: Vec<JointDocument>,
    /// Forces under which the stresses of the section are asked for.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(crate) forces: Vec<ForcesDocument>,
}

/// A section with which the member goes on after a change.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct ChangedSectionDocument {
    /// The parts.
    pub(crate) parts: Vec<PartDocument>,
    /// The layers; without them, all parts are one layer.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(crate) layers: Vec<LayerDocument>,
    /// The joints between the layers.
    #[serde(default, skip_serializing_if = "Vec::is_empty")]
    pub(crate) joints: Vec<JointDocument>,
}

/// Forces on the section.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct ForcesDocument {
    /// The name under which the stresses are told.
    pub(crate) name: String,
    /// The axial force, tension positive.
    pub(crate) axial: Written<Force>,
    /// The moment about the level axis, positive where it stretches the bottom.
    pub(crate) moment_y: Written<Moment>,
    /// The moment about the upright axis, positive where it stretches the side of negative y.
    pub(crate) moment_z: Written<Moment>,
}

/// A part of the section.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct PartDocument {
    /// The name of the part.
    pub(crate) name: String,
    /// The name of its material.
    pub(crate) material: String,
    /// The outline of the part.
    pub(crate) outline: OutlineDocument,
    /// The place of the part; without it, the middle of its outline is at y = 0, z = 0.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) place: Option<PlaceDocument>,
    /// The mass per length of the part, instead of density x area.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) line_mass: Option<Written<LineMass>>,
    /// What the part would be strained by if it were alone.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) initial_strain: Option<InitialStrainDocument>,
}

/// The plane of strain that a part bears from the first day, about its own centroid.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(deny_unknown_fields)]
pub(crate) struct InitialStrainDocument {
    /// At the part's own centroid; shrinkage is negative.
    pub(crate) axial: Written<Strain>,
    /// About the level axis, positive where the bottom would grow longer.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) curvature_y: Option<Written<Curvature>>,
    /// About the upright axis, positive where the side of negative y would grow longer.
    #[serde(default, skip_serializing_if = "Option::is_none")]
    pub(crate) curvature_z: Option<Written<Curvature>>,
}

/// An outline, with sharp corners.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case", deny_unknown_fields)]
pub(crate) enum OutlineDocument {
    /// A rectangle.
    Rectangle {
        /// The size across the section.
        width: Written<Length>,
        /// The upright size.
        height: Written<Length>,
    },
    /// A polygon by its corners, with holes.
    Polygon {
        /// The corners as pairs of coordinates y and z.
        points: Vec<[Written<Length>; 2]>,
        /// The holes, each by its corners.
        #[serde(default, skip_serializing_if = "Vec::is_empty")]
        holes: Vec<Vec<[Written<Length>; 2]>>,
    },
    /// A disc.
    Disc {
        /// The diameter.
        diameter: Written<Length>,
    },
    /// A ring.
    Ring {
        /// The outer diameter.
        diameter: Written<Length>,
        /// The thickness of the wall.
        wall_thickness: Written<Length>,
    },
    /// An I with two flanges.
    IShape {
        /// The height.
        height: Written<Length>,
        /// The width of the top flange.
        top_width: Written<Length>,
        /// The thickness of the top flange.
        top_thickness: Written<Length>,
        /// The width of the bottom flange.
        bottom_width: Written<Length>,
        /// The thickness of the bottom flange.
        bottom_thickness: Written<Length>,
        /// The thickness of the web.
        web_thickness: Written<Length>,
    },
    /// A tee with its flange on top.
    Tee {
        /// The height.
        height: Written<Length>,
        /// The width of the flange.
        width: Written<Length>,
        /// The thickness of the flange.
        flange_thickness: Written<Length>,
        /// The thickness of the web.
        web_thickness: Written<Length>,
    },
    /// A channel with its web on the left.
    Channel {
        /// The height.
        height: Written<Length>,
        /// The width of the flanges.
        width: Written<Length>,
        /// The thickness of the flanges.
        flange_thickness: Written<Length>,
        /// The thickness of the web.
        web_thickness: Written<Length>,
    },
    /// An angle with its heel at the bottom left.
    Angle {
        /// The length of the upright leg.
        height: Written<Length>,
        /// The length of the level leg.
        width: Written<Length>,
        /// The thickness of both legs.
        thickness: Written<Length>,
    },
    /// A hollow box.
    Box {
        /// The size across the section.
        width: Written<Length>,
        /// The upright size.
        height: Written<Length>,
        /// The thickness of the upright walls.
        side_thickness: Written<Length>,
        /// The thickness of the top and bottom walls.
        plate_thickness: Written<Length>,
    },
}

/// A place in the section.
#[derive(Clone, Debug, PartialEq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case", deny_unknown_fields)]
pub(crate) enum PlaceDocument {
    /// The middle of the outline (of a polygon, the origin of its coordinates) by coordinates.
    At {
        /// The coordinate to the right.
        y: Written<Length>,
        /// The coordinate upward.
        z: Written<Length>,
    },
    /// Touching the left side of a part.
    LeftOf(String),
    /// Touching the right side of a part.
    RightOf(String),
    /// Standing on a part.
    Above(String),
    /// Under a part, touching it.
    Below(String),
    /// The mirror image of a part.
    MirrorOf {
        /// The name of the other part.
        part: String,
        /// The axis through the origin.
        axis: AxisDocument,
    },
    /// Set into a part, which it displaces.
    SetInto {
        /// The name of the host.
        host: String,
        /// The coordinate to the right.
        y: Written<Length>,
        /// The coordinate upward.
        z: Written<Length>,
    },
}

/// An axis of the section.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Serialize, Deserialize, JsonSchema)]
#[serde(rename_all = "snake_case")]
pub(crate) enum AxisDocument {
    Upright,
    Level,
}
