//! The outline between two like ones, as along a taper.

use super::shape::{Outline, Vertex};
use crate::units::Length;

impl Outline {
    /// The outline whose every size lies at the given share of the way from this one's to the
    /// other's; `None` if the two are of different shapes.
    #[must_use]
    pub fn between(&self, other: &Self, share: f64) -> Option<Self> {
        let mid = |a: Length, b: Length| a + (b - a) * share;
        Some(match (self, other) {
            (
                Self::Rectangle { width, height },
                Self::Rectangle {
                    width: w,
                    height: h,
                },
            ) => Self::Rectangle {
                width: mid(*width, *w),
                height: mid(*height, *h),
            },
            (
                Self::Polygon { points, holes },
                Self::Polygon {
                    points: p,
                    holes: h,
                },
            ) => Self::Polygon {
                points: loop_between(points, p, mid)?,
                holes: (holes.len() == h.len())
                    .then(|| holes.iter().zip(h))?
                    .map(|(a, b)| loop_between(a, b, mid))
                    .collect::<Option<_>>()?,
            },
            (Self::Disc { diameter }, Self::Disc { diameter: d }) => Self::Disc {
                diameter: mid(*diameter, *d),
            },
            (
                Self::Ring {
                    diameter,
                    wall_thickness,
                },
                Self::Ring {
                    diameter: d,
                    wall_thickness: t,
                },
            ) => Self::Ring {
                diameter: mid(*diameter, *d),
                wall_thickness: mid(*wall_thickness, *t),
            },
            (Self::IShape { .. }, Self::IShape { .. }) => {
                let [h, tw, tt, bw, bt, w] = mixed(i_sizes(self)?, i_sizes(other)?, mid);
                Self::IShape {
                    height: h,
                    top_width: tw,
                    top_thickness: tt,
                    bottom_width: bw,
                    bottom_thickness: bt,
                    web_thickness: w,
                }
            }
            (Self::Tee { .. }, Self::Tee { .. }) => {
                let [height, width, flange_thickness, web_thickness] =
                    mixed(flanged(self)?, flanged(other)?, mid);
                Self::Tee {
                    height,
                    width,
                    flange_thickness,
                    web_thickness,
                }
            }
            (Self::Channel { .. }, Self::Channel { .. }) => {
                let [height, width, flange_thickness, web_thickness] =
                    mixed(flanged(self)?, flanged(other)?, mid);
                Self::Channel {
                    height,
                    width,
                    flange_thickness,
                    web_thickness,
                }
            }
            (
                Self::Angle {
                    height,
                    width,
                    thickness,
                },
                Self::Angle {
                    height: h,
                    width: w,
                    thickness: t,
                },
            ) => Self::Angle {
                height: mid(*height, *h),
                width: mid(*width, *w),
                thickness: mid(*thickness, *t),
            },
            (Self::HollowBox { .. }, Self::HollowBox { .. }) => {
                let [height, width, plate_thickness, side_thickness] =
                    mixed(flanged(self)?, flanged(other)?, mid);
                Self::HollowBox {
                    width,
                    height,
                    side_thickness,
                    plate_thickness,
                }
            }
            _ => return None,
        })
    }
}

/// The sizes of an I shape.
const fn i_sizes(outline: &Outline) -> Option<[Length; 6]> {
    match *outline {
        Outline::IShape {
            height,
            top_width,
            top_thickness,
            bottom_width,
            bottom_thickness,
            web_thickness,
        } => Some([
            height,
            top_width,
            top_thickness,
            bottom_width,
            bottom_thickness,
            web_thickness,
        ]),
        _ => None,
    }
}

/// Height, width, thickness of level plates, thickness of upright ones.
const fn flanged(outline: &Outline) -> Option<[Length; 4]> {
    match *outline {
        Outline::Tee {
            height,
            width,
            flange_thickness,
            web_thickness,
        }
        | Outline::Channel {
            height,
            width,
            flange_thickness,
            web_thickness,
        } => Some([height, width, flange_thickness, web_thickness]),
        Outline::HollowBox {
            width,
            height,
            side_thickness,
            plate_thickness,
        } => Some([height, width, plate_thickness, side_thickness]),
        _ => None,
    }
}

fn mixed<const N: usize>(
    a: [Length; N],
    b: [Length; N],
    mid: impl Fn(Length, Length) -> Length,
) -> [Length; N] {
    std::array::from_fn(|i| mid(a[i], b[i]))
}

fn loop_between(
    a: &[Vertex],
    b: &[Vertex],
    mid: impl Fn(Length, Length) -> Length,
) -> Option<Vec<Vertex>> {
    let pairs = (a.len() == b.len()).then(|| a.iter().zip(b))?;
    Some(pairs.map(|(p, q)| (mid(p.0, q.0), mid(p.1, q.1))).collect())
}

#[cfg(test)]
mod tests {
    use super::super::{disc, i_shape, rectangle};
    use crate::units::Number;

    #[test]
    fn sizes_lie_between() {
        let (low, high) = (rectangle(80.mm(), 200.mm()), rectangle(100.mm(), 400.mm()));
        assert_eq!(low.between(&high, 0.25), Some(rectangle(85.mm(), 250.mm())));
        assert_eq!(low.between(&disc(100.mm()), 0.5), None);
        let i = |h: i32| i_shape(h.mm(), 100.mm(), 10.mm(), 120.mm(), 12.mm(), 8.mm());
        assert_eq!(i(300).between(&i(500), 0.5), Some(i(400)));
    }
}
