//! Shapes of a camber line over its chord.

use crate::field::Piecewise;
use crate::math::polynomial::Coefficients;

/// The shape of a camber.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub enum Shape {
    /// A parabola whose rise at the middle of the chord is that of the deflection line there.
    Parabola,
    /// The mirror image of the deflection line, scaled to the rounded rise.
    Mirror,
    /// A circular arc with the rise of the deflection line at the middle of the chord.
    ArcThroughMiddle,
    /// The circular arc whose greatest gap to the deflection line is least.
    ArcLeastGap,
}

impl Shape {
    /// All shapes.
    pub const ALL: [Self; 4] = [
        Self::Parabola,
        Self::Mirror,
        Self::ArcThroughMiddle,
        Self::ArcLeastGap,
    ];

    /// The word used in documents.
    #[must_use]
    pub const fn name(self) -> &'static str {
        match self {
            Self::Parabola => "parabola",
            Self::Mirror => "mirror",
            Self::ArcThroughMiddle => "arc_through_middle",
            Self::ArcLeastGap => "arc_least_gap",
        }
    }

    /// The shape in words.
    #[must_use]
    pub const fn described(self) -> &'static str {
        match self {
            Self::Parabola => "a parabola with the rise at the middle of the chord",
            Self::Mirror => "the mirror image of the deflection line",
            Self::ArcThroughMiddle => "a circular arc with the rise at the middle of the chord",
            Self::ArcLeastGap => "the circular arc with the least greatest gap",
        }
    }
}

/// A camber line: heights above the chord, positive upward, in m.
#[derive(Clone, Debug, PartialEq)]
pub(crate) enum Line {
    /// y = 4 c s (1 - s) with s the share of the chord; tangents beyond its ends.
    Parabola { from: f64, length: f64, rise: f64 },
    /// y = c - u^2/(R + sqrt(R^2 - u^2)) with u from the middle and R = (l^2/4 + c^2)/(2 c).
    Arc { from: f64, length: f64, rise: f64 },
    /// `factor` times the deflection line.
    Mirror { line: Piecewise, factor: f64 },
}

impl Line {
    /// The height at a place.
    pub(super) fn height(&self, x: f64) -> f64 {
        match self {
            Self::Parabola { from, length, rise } => {
                let share = ((x - from) / length).clamp(0.0, 1.0);
                let beyond = x - (from + share * length);
                rise * (4.0 * share * (1.0 - share)) + beyond * slope_at_end(beyond, *rise, *length)
            }
            Self::Arc { from, length, rise } => {
                let half = length / 2.0;
                let inside = (x - from - half).clamp(-half, half);
                let beyond = x - from - half - inside;
                if *rise == 0.0 {
                    return 0.0;
                }
                let radius = radius(*length, *rise);
                let root = (radius * radius - inside * inside).sqrt();
                let sign = radius.signum();
                let drop = inside * inside / (radius.abs() + root) * sign;
                // The tangent at an end of the arc: dy/du = -u/sqrt(R^2 - u^2).
                rise - drop - beyond * sign * inside / root
            }
            Self::Mirror { line, factor } => factor * line.sides(x).map_or(0.0, |(_, right)| right),
        }
    }

    /// The line as a field over the pieces of another, to be taken off a deflection line.
    ///
    /// A parabola is a polynomial; the arc is one but for terms of the sixth order, some nanometres
    /// for arcs as flat as cambers are. A mirror image keeps the pieces of its own line.
    pub(super) fn over(&self, pieces_of: &Piecewise) -> Piecewise {
        match self {
            Self::Mirror { line, factor } => {
                let mut image = line.zeroed();
                image.add(line, *factor);
                image
            }
            Self::Parabola { .. } | Self::Arc { .. } => {
                let mut field = pieces_of.zeroed();
                for (k, ends) in pieces_of.stations().windows(2).enumerate() {
                    field.add_to_piece(k, &self.interpolated(ends[0], ends[1]));
                }
                field
            }
        }
    }

    /// The polynomial of degree five through six points of the line, at t = 0, 0.2 ... 1.
    fn interpolated(&self, from: f64, to: f64) -> Coefficients {
        let mut table: [f64; 6] = std::array::from_fn(|i| {
            let share = [0.0, 0.2, 0.4, 0.6, 0.8, 1.0][i];
            self.height(from + (to - from) * share)
        });
        // Newton's divided differences on the nodes i/5, then Horner's scheme to powers of t.
        for (order, width) in FIFTHS.iter().enumerate().skip(1) {
            for i in (order..6).rev() {
                table[i] = (table[i] - table[i - 1]) / width;
            }
        }
        let mut c: Coefficients = [0.0; 6];
        for i in (0..6).rev() {
            for power in (1..6).rev() {
                c[power] = c[power - 1] - FIFTHS[i] * c[power];
            }
            c[0] = table[i] - FIFTHS[i] * c[0];
        }
        c
    }
}

const FIFTHS: [f64; 6] = [0.0, 0.2, 0.4, 0.6, 0.8, 1.0];

/// The radius of an arc over a chord: R = (l^2/4 + c^2)/(2 c), negative for a hanging arc.
pub(super) fn radius(length: f64, rise: f64) -> f64 {
    (length * length / 4.0 + rise * rise) / (2.0 * rise)
}

/// The slope of a parabola at the end on the side of `beyond`: +-4 c/l.
fn slope_at_end(beyond: f64, rise: f64, length: f64) -> f64 {
    -beyond.signum() * 4.0 * rise / length
}

#[cfg(test)]
mod tests {
    use super::*;

    const FOOT: f64 = 0.3048;

    #[test]
    fn radii_of_laminators_give_the_known_rises() {
        // 20 ft at R 3500, 2000, 1600 ft: .171, .300, .375 in; values of an independent script.
        for (feet, inches) in [(3500.0, 0.171), (2000.0, 0.300), (1600.0, 0.375)] {
            let rise = inches * FOOT / 12.0;
            let found = radius(20.0 * FOOT, rise) / FOOT;
            // The rise is printed to a thousandth of an inch.
            assert!(
                (found - feet).abs() <= feet * 0.0005 / inches * 1.01,
                "{found} {feet}"
            );
        }
    }

    #[test]
    fn an_arc_is_near_the_parabola_of_its_rise() {
        // 12 m, 60 mm: the two differ by 0.001 mm at the quarter point.
        let arc = Line::Arc {
            from: 0.0,
            length: 12.0,
            rise: 0.06,
        };
        let parabola = Line::Parabola {
            from: 0.0,
            length: 12.0,
            rise: 0.06,
        };
        let gap = arc.height(3.0) - parabola.height(3.0);
        assert!((gap - 1e-6).abs() < 0.5e-6, "{gap}");
        assert!((arc.height(6.0) - 0.06).abs() < 1e-15);
        assert!(arc.height(0.0).abs() < 1e-15 && arc.height(12.0).abs() < 1e-15);
        assert!((parabola.height(3.0) - 0.045).abs() < 1e-15);
    }

    #[test]
    fn polynomials_follow_the_line() {
        for line in [
            Line::Arc {
                from: 1.0,
                length: 10.0,
                rise: 0.05,
            },
            Line::Parabola {
                from: 1.0,
                length: 10.0,
                rise: -0.05,
            },
        ] {
            let pieces = Piecewise::zero(std::sync::Arc::from([0.0, 1.0, 4.0, 11.0, 12.5]));
            let field = line.over(&pieces);
            for i in 0..=100 {
                let x = 0.125 * f64::from(i);
                let (left, right) = field.sides(x).unwrap();
                assert!((left - line.height(x)).abs() < 1e-10, "{x}");
                assert!((right - line.height(x)).abs() < 1e-10, "{x}");
            }
        }
    }
}
