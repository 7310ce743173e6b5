//! Outlines of the document.

use super::document_section::OutlineDocument;
use super::written::Written;
use crate::outline::{Outline, Vertex};
use crate::units::Length;

/// An outline, if all its sizes are known.
pub(super) fn outline(document: &OutlineDocument) -> Option<Outline> {
    Some(match document {
        OutlineDocument::Rectangle { width, height } => Outline::Rectangle {
            width: width.value()?,
            height: height.value()?,
        },
        OutlineDocument::Polygon { points, holes } => Outline::Polygon {
            points: vertices(points)?,
            holes: holes
                .iter()
                .map(|hole| vertices(hole))
                .collect::<Option<_>>()?,
        },
        OutlineDocument::Disc { diameter } => Outline::Disc {
            diameter: diameter.value()?,
        },
        OutlineDocument::Ring {
            diameter,
            wall_thickness,
        } => Outline::Ring {
            diameter: diameter.value()?,
            wall_thickness: wall_thickness.value()?,
        },
        OutlineDocument::IShape {
            height,
            top_width,
            top_thickness,
            bottom_width,
            bottom_thickness,
            web_thickness,
        } => Outline::IShape {
            height: height.value()?,
            top_width: top_width.value()?,
            top_thickness: top_thickness.value()?,
            bottom_width: bottom_width.value()?,
            bottom_thickness: bottom_thickness.value()?,
            web_thickness: web_thickness.value()?,
        },
        OutlineDocument::Tee {
            height,
            width,
            flange_thickness,
            web_thickness,
        } => Outline::Tee {
            height: height.value()?,
            width: width.value()?,
            flange_thickness: flange_thickness.value()?,
            web_thickness: web_thickness.value()?,
        },
        OutlineDocument::Channel {
            height,
            width,
            flange_thickness,
            web_thickness,
        } => Outline::Channel {
            height: height.value()?,
            width: width.value()?,
            flange_thickness: flange_thickness.value()?,
            web_thickness: web_thickness.value()?,
        },
        OutlineDocument::Angle {
            height,
            width,
            thickness,
        } => Outline::Angle {
            height: height.value()?,
            width: width.value()?,
            thickness: thickness.value()?,
        },
        OutlineDocument::Box {
            width,
            height,
            side_thickness,
            plate_thickness,
        } => Outline::HollowBox {
            width: width.value()?,
            height: height.value()?,
            side_thickness: side_thickness.value()?,
            plate_thickness: plate_thickness.value()?,
        },
    })
}

fn vertices(points: &[[Written<Length>; 2]]) -> Option<Vec<Vertex>> {
    points
        .iter()
        .map(|[y, z]| Some((y.value()?, z.value()?)))
        .collect()
}
