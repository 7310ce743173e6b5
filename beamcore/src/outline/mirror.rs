//! Mirror images of regions.

use super::contour::Contour;
use super::edge::Edge;
use super::point::Point;
use super::region::Region;

impl Region {
    /// The mirror image about the axes through the origin: about the upright one (y changes its
    /// sign), about the level one (z changes its sign), or both.
    #[must_use]
    pub fn mirrored(&self, upright: bool, level: bool) -> Self {
        let point = |p: Point| {
            Point::new(
                if upright { -p.y } else { p.y },
                if level { -p.z } else { p.z },
            )
        };
        let image = |edge: &Edge| match *edge {
            Edge::Straight { from, to } => Edge::Straight {
                from: point(from),
                to: point(to),
            },
            Edge::Arc {
                from,
                to,
                centre,
                turn,
            } => Edge::Arc {
                from: point(from),
                to: point(to),
                centre: point(centre),
                turn: if upright == level {
                    turn
                } else {
                    turn.reversed()
                },
            },
        };
        let contour = |contour: &Contour| Contour::of(contour.edges().iter().map(image).collect());
        let mut contours = self.contours().iter().map(contour);
        let outer = contours.next().expect("a region has an outer loop");
        Self::of(outer, contours.collect())
    }
}

#[cfg(test)]
mod tests {
    use crate::outline::{angle, disc, overlap_area};
    use crate::units::Number;

    #[test]
    fn a_mirror_image_has_mirrored_integrals() {
        let region = angle(120.mm(), 80.mm(), 10.mm()).region();
        let plain = region.integrals();
        for (upright, level) in [(true, false), (false, true), (true, true)] {
            let image = region.mirrored(upright, level).integrals();
            let sign = |flip: bool| if flip { -1.0 } else { 1.0 };
            let near = |a: f64, b: f64, size: f64| assert!((a - b).abs() <= 1e-13 * size);
            near(image.area, plain.area, plain.area);
            near(image.y, sign(upright) * plain.y, 0.1);
            near(image.z, sign(level) * plain.z, 0.1);
            near(image.iyy, plain.iyy, plain.iyy);
            near(
                image.iyz,
                sign(upright) * sign(level) * plain.iyz,
                plain.iyy,
            );
        }
        let round = disc(50.mm()).region();
        let overlap = overlap_area(&round, &round.mirrored(true, false));
        assert!((overlap - round.integrals().area).abs() < 1e-15);
    }
}
