//! What can be wrong with the sizes of a shape.

use super::polygon_problems;
use super::shape::Outline;
use crate::error::{ErrorKind, Problem};
use crate::units::Length;
use crate::{check, path};

impl Outline {
    /// All that is wrong with the outline, under paths such as `{base}.tee.web_thickness`: sizes
    /// that are not greater than zero, walls that leave nothing inside, flanges that leave no
    /// height for the web, a web wider than its flange, a polygon that is no loop, sizes too great
    /// or too small for second moments to be calculated.
    ///
    /// # Examples
    /// ```
    /// use beamcore::outline::ring;
    /// use beamcore::units::Number;
    /// let problems = ring(60.mm(), 30.mm()).problems("outline");
    /// assert_eq!(
    ///     problems[0].to_string(),
    ///     "outline.ring.wall_thickness: found 30 mm, which leaves nothing inside; \
    ///      expected less than half of the diameter, 60 mm"
    /// );
    /// ```
    #[must_use]
    pub fn problems(&self, base: &str) -> Vec<Problem> {
        let base = path::key(base, self.name());
        let mut problems = Vec::new();
        if let Self::Polygon { points, holes } = self {
            problems.extend(polygon_problems::problems(points, holes, &base));
        } else {
            for (key, size) in self.sizes() {
                check::positive(&mut problems, size, &path::key(&base, key));
            }
            if problems.is_empty() {
                problems.extend(self.misfits().into_iter().map(|misfit| {
                    Problem::new(
                        ErrorKind::Geometry,
                        path::key(&base, misfit.key),
                        misfit.found,
                        misfit.expected,
                    )
                }));
            }
        }
        if problems.is_empty() {
            problems.extend(self.beyond_numbers(&base));
        }
        problems
    }

    /// The sizes with their keys.
    fn sizes(&self) -> Vec<(&'static str, Length)> {
        match *self {
            Self::Rectangle { width, height } => vec![("width", width), ("height", height)],
            Self::Polygon { .. } => Vec::new(),
            Self::Disc { diameter } => vec![("diameter", diameter)],
            Self::Ring {
                diameter,
                wall_thickness,
            } => vec![("diameter", diameter), ("wall_thickness", wall_thickness)],
            Self::IShape {
                height,
                top_width,
                top_thickness,
                bottom_width,
                bottom_thickness,
                web_thickness,
            } => vec![
                ("height", height),
                ("top_width", top_width),
                ("top_thickness", top_thickness),
                ("bottom_width", bottom_width),
                ("bottom_thickness", bottom_thickness),
                ("web_thickness", web_thickness),
            ],
            Self::Tee {
                height,
                width,
                flange_thickness,
                web_thickness,
            }
            | Self::Channel {
                height,
                width,
                flange_thickness,
                web_thickness,
            } => vec![
                ("height", height),
                ("width", width),
                ("flange_thickness", flange_thickness),
                ("web_thickness", web_thickness),
            ],
            Self::Angle {
                height,
                width,
                thickness,
            } => vec![
                ("height", height),
                ("width", width),
                ("thickness", thickness),
            ],
            Self::HollowBox {
                width,
                height,
                side_thickness,
                plate_thickness,
            } => vec![
                ("width", width),
                ("height", height),
                ("side_thickness", side_thickness),
                ("plate_thickness", plate_thickness),
            ],
        }
    }

    /// Sizes, each greater than zero, that do not fit together.
    fn misfits(&self) -> Vec<Misfit> {
        let found = match *self {
            Self::Rectangle { .. } | Self::Polygon { .. } | Self::Disc { .. } => Vec::new(),
            Self::Ring {
                diameter,
                wall_thickness,
            } => vec![wall("wall_thickness", wall_thickness, "diameter", diameter)],
            Self::HollowBox {
                width,
                height,
                side_thickness,
                plate_thickness,
            } => vec![
                wall("side_thickness", side_thickness, "width", width),
                wall("plate_thickness", plate_thickness, "height", height),
            ],
            Self::IShape {
                height,
                top_width,
                top_thickness,
                bottom_width,
                bottom_thickness,
                web_thickness,
            } => {
                let flanges = top_thickness + bottom_thickness;
                vec![
                    (flanges >= height).then(|| Misfit {
                        key: "height",
                        found: format!("{height}, of which the two flanges take {flanges}"),
                        expected: "a height that leaves some for the web between them".into(),
                    }),
                    web(web_thickness, "top_width", top_width),
                    web(web_thickness, "bottom_width", bottom_width),
                ]
            }
            Self::Tee {
                height,
                width,
                flange_thickness,
                web_thickness,
            } => vec![
                (flange_thickness >= height).then(|| Misfit {
                    key: "flange_thickness",
                    found: format!("{flange_thickness}, which leaves no height for the web"),
                    expected: format!("less than the height, {height}"),
                }),
                web(web_thickness, "width", width),
            ],
            Self::Channel {
                height,
                width,
                flange_thickness,
                web_thickness,
            } => vec![
                wall("flange_thickness", flange_thickness, "height", height),
                web(web_thickness, "width", width),
            ],
            Self::Angle {
                height,
                width,
                thickness,
            } => vec![
                leg(thickness, "height", height),
                leg(thickness, "width", width),
            ],
        };
        found.into_iter().flatten().collect()
    }

    /// Sizes with which area or second moments leave the range of numbers.
    fn beyond_numbers(&self, base: &str) -> Option<Problem> {
        let found = self.integrals();
        let ordinary = [found.area, found.iyy, found.izz]
            .iter()
            .all(|value| value.is_normal() && *value > 0.0);
        (!ordinary).then(|| {
            Problem::new(
                ErrorKind::Value,
                base,
                format!("a size of {} by {}", self.width(), self.height()),
                "sizes with which area and second moments are ordinary numbers greater than zero",
            )
        })
    }
}

/// A size that does not fit another.
struct Misfit {
    key: &'static str,
    found: String,
    expected: String,
}

/// A wall that stands on two opposite sides.
fn wall(key: &'static str, thickness: Length, across: &str, size: Length) -> Option<Misfit> {
    (2.0 * thickness >= size).then(|| Misfit {
        key,
        found: format!("{thickness}, which leaves nothing inside"),
        expected: format!("less than half of the {across}, {size}"),
    })
}

/// A web under a flange.
fn web(thickness: Length, across: &str, width: Length) -> Option<Misfit> {
    (thickness > width).then(|| Misfit {
        key: "web_thickness",
        found: format!("{thickness}, which is wider than the flange"),
        expected: format!("at most the {across}, {width}"),
    })
}

/// A leg of an angle.
fn leg(thickness: Length, along: &str, length: Length) -> Option<Misfit> {
    (thickness > length).then(|| Misfit {
        key: "thickness",
        found: format!("{thickness}, which is more than the leg is long"),
        expected: format!("at most the {along}, {length}"),
    })
}
