//! The equivalent forces of a tendon.

use super::load::Tendon;
use super::load_case::Builder;
use super::places::nearest;

impl Builder<'_> {
    /// Equivalent forces of a tendon: P along it on each anchor, P times each change of its slope.
    /// Slopes are small: the force along the member is P everywhere.
    pub(super) fn prestress(&mut self, layer: usize, force: f64, tendon: &Tendon) {
        let points: Vec<(f64, f64)> = tendon
            .points()
            .iter()
            .map(|(x, z)| (x.si(), z.si()))
            .collect();
        let last = points.len() - 1;
        let slope = |i: usize| {
            let ((x, z), (u, v)) = (points[i], points[i + 1]);
            (v - z) / (u - x)
        };
        let w = self.layout.states.deflection(self.layout.strands[layer]);
        let (start, end) = match tendon {
            Tendon::Draped(_) => {
                for (i, point) in points.iter().enumerate().take(last).skip(1) {
                    let station = nearest(&self.layout.places, point.0);
                    self.outside(station, w, -force * (slope(i) - slope(i - 1)));
                }
                (slope(0), slope(last - 1))
            }
            Tendon::Parabolic(_) => {
                // z'' by divided differences.
                let bend = 2.0 * (slope(1) - slope(0)) / (points[2].0 - points[0].0);
                let ends = [points[0].0, points[2].0];
                let [first, to] = ends.map(|x| nearest(&self.layout.places, x));
                for piece in first..to {
                    self.line(piece, w, [-force * bend; 2]);
                    self.enter(piece, layer, [-force * bend; 2]);
                }
                let half = bend / 2.0;
                (
                    slope(0) - half * (points[1].0 - points[0].0),
                    slope(1) + half * (points[2].0 - points[1].0),
                )
            }
        };
        let [left, right] = [points[0].0, points[last].0].map(|x| nearest(&self.layout.places, x));
        self.push(left, layer, points[0].1, force);
        self.outside(left, w, -force * start);
        self.push(right, layer, points[last].1, -force);
        self.outside(right, w, force * end);
    }
}
