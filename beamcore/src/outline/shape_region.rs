//! Shapes as regions of edges.

use super::contour::Contour;
use super::point::Point;
use super::region::Region;
use super::shape::{Outline, Vertex};
use crate::units::Length;

impl Outline {
    /// The region that the outline bounds, about the point by which it is placed, in m.
    ///
    /// For an outline with [`problems`](Self::problems) it is of no use, but no panic.
    #[must_use]
    pub fn region(&self) -> Region {
        match self {
            Self::Rectangle { width, height } => solid(box_points(*width, *height)),
            Self::Polygon { points, holes } => Region::of(
                through(points),
                holes.iter().map(|hole| through(hole)).collect(),
            ),
            Self::Disc { diameter } => Region::of(circle(*diameter), vec![]),
            Self::Ring {
                diameter,
                wall_thickness,
            } => Region::of(
                circle(*diameter),
                vec![circle(*diameter - 2.0 * *wall_thickness)],
            ),
            Self::HollowBox {
                width,
                height,
                side_thickness,
                plate_thickness,
            } => {
                let inner = box_points(
                    *width - 2.0 * *side_thickness,
                    *height - 2.0 * *plate_thickness,
                );
                Region::of(through(&box_points(*width, *height)), vec![through(&inner)])
            }
            Self::IShape { .. } | Self::Tee { .. } | Self::Channel { .. } | Self::Angle { .. } => {
                solid(self.corners())
            }
        }
    }

    /// The corners of the open shapes, counter-clockwise from the bottom; none for other shapes.
    fn corners(&self) -> Vec<Vertex> {
        match *self {
            Self::IShape {
                height,
                top_width,
                top_thickness,
                bottom_width,
                bottom_thickness,
                web_thickness,
            } => {
                let (top, bottom) = (height / 2.0, -height / 2.0);
                mirrored(&[
                    (bottom_width / 2.0, bottom),
                    (bottom_width / 2.0, bottom + bottom_thickness),
                    (web_thickness / 2.0, bottom + bottom_thickness),
                    (web_thickness / 2.0, top - top_thickness),
                    (top_width / 2.0, top - top_thickness),
                    (top_width / 2.0, top),
                ])
            }
            Self::Tee {
                height,
                width,
                flange_thickness,
                web_thickness,
            } => {
                let top = height / 2.0;
                mirrored(&[
                    (web_thickness / 2.0, -top),
                    (web_thickness / 2.0, top - flange_thickness),
                    (width / 2.0, top - flange_thickness),
                    (width / 2.0, top),
                ])
            }
            Self::Channel {
                height,
                width,
                flange_thickness,
                web_thickness,
            } => {
                let (right, top) = (width / 2.0, height / 2.0);
                let (web, flange) = (-right + web_thickness, top - flange_thickness);
                vec![
                    (-right, -top),
                    (right, -top),
                    (right, -flange),
                    (web, -flange),
                    (web, flange),
                    (right, flange),
                    (right, top),
                    (-right, top),
                ]
            }
            Self::Angle {
                height,
                width,
                thickness,
            } => {
                let (right, top) = (width / 2.0, height / 2.0);
                vec![
                    (-right, -top),
                    (right, -top),
                    (right, -top + thickness),
                    (-right + thickness, -top + thickness),
                    (-right + thickness, top),
                    (-right, top),
                ]
            }
            Self::Rectangle { .. }
            | Self::Polygon { .. }
            | Self::Disc { .. }
            | Self::Ring { .. }
            | Self::HollowBox { .. } => Vec::new(),
        }
    }
}

/// The corners of the right half from bottom to top, with their mirror images from top to bottom.
fn mirrored(right: &[Vertex]) -> Vec<Vertex> {
    let left = right.iter().rev().map(|&(y, z)| (-y, z));
    right.iter().copied().chain(left).collect()
}

fn box_points(width: Length, height: Length) -> Vec<Vertex> {
    mirrored(&[(width / 2.0, -height / 2.0), (width / 2.0, height / 2.0)])
}

fn solid(points: Vec<Vertex>) -> Region {
    Region::of(through(&points), vec![])
}

/// The loop through points given as lengths.
pub(super) fn through(points: &[Vertex]) -> Contour {
    let points: Vec<_> = points.iter().copied().map(point).collect();
    Contour::through(&points)
}

/// The point of two lengths, in m.
pub(super) fn point((y, z): Vertex) -> Point {
    Point::new(y.si(), z.si())
}

fn circle(diameter: Length) -> Contour {
    Contour::circle(Point::ORIGIN, diameter.si() / 2.0)
}
