//! Camber: the rise to build in, with its ordinates from a stated chord.

mod plan;
mod reading;
mod rounding;
mod shape;

pub use plan::CamberPlan;
pub use reading::{Reading, Trestles};
pub use rounding::Rounding;
pub use shape::Shape;

use crate::error::{Error, ErrorKind, Problem, Result};
use crate::field::{Field, Piecewise};
use crate::member::Support;
use crate::response::Response;
use crate::time::Time;
use crate::units::Length;
use shape::Line;

/// One ordinate of a camber.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Ordinate {
    /// Distance from the left end of the chord.
    pub station: Length,
    /// Height above the chord, positive upward, with the member unloaded.
    pub ordinate: Length,
}

/// The camber to build.
#[derive(Clone, Debug, PartialEq)]
pub struct Camber {
    shape: Shape,
    target: Length,
    rise: Length,
    chord: (Length, Length),
    length: Length,
    ordinates: Vec<Ordinate>,
    line: Line,
}

impl Response {
    /// The camber for a plan.
    ///
    /// # Errors
    /// All of: an unknown combination or support, a chord that does not run from left to right, a
    /// fraction outside 0 to 2, a step that is not positive, a least rise below zero, no division
    /// or more than 1000.
    pub fn camber(&self, plan: &CamberPlan) -> Result<Camber> {
        let supports = self.member().supports();
        Error::check(plan.problems(supports, self.member().combinations()))?;
        let end = |name: &str| supports.iter().find(|s| s.name() == name).map(Support::at);
        let (from, to) = (end(&plan.from), end(&plan.to));
        let (from, to) = (from.expect("checked above"), to.expect("checked above"));
        let line = self.deflection_line(&plan.combination, plan.time)?;
        let chord = (from.si(), (to - from).si());
        let target = target(plan, &line, chord);
        let rise = plan.rounding.apply(target, plan.step);
        let rise = if rise.abs() < plan.least {
            Length::ZERO
        } else {
            rise
        };
        let line = built(plan.shape, line, chord, rise.si());
        let ordinates = (0..=plan.divisions)
            .map(|i| {
                let share = f64::from(i) / f64::from(plan.divisions);
                let station = (to - from) * share;
                let place = if i == plan.divisions {
                    to
                } else {
                    from + station
                };
                Ordinate {
                    station,
                    ordinate: Length::from_si(line.height(place.si())),
                }
            })
            .collect();
        Ok(Camber {
            shape: plan.shape,
            target,
            rise,
            chord: (from, to),
            length: self.member().length(),
            ordinates,
            line,
        })
    }

    /// The line that remains after the camber: deflection - camber, positive where the member
    /// lies below the straight line, negative where it stays crowned.
    ///
    /// # Errors
    /// [`ErrorKind::Lookup`] if there is no such combination.
    pub fn remaining(
        &self,
        combination: &str,
        time: Time,
        camber: &Camber,
    ) -> Result<Field<Length>> {
        let mut line = self.deflection_line(combination, time)?;
        line.add(&camber.line(&line), -1.0);
        Ok(Field::new(line))
    }
}

/// The rise before rounding.
fn target(plan: &CamberPlan, line: &Piecewise, (from, length): (f64, f64)) -> Length {
    let middle = line
        .sides(from + length / 2.0)
        .map_or(0.0, |(_, right)| right);
    let through_middle = middle * plan.fraction;
    let rise = match plan.shape {
        Shape::Parabola | Shape::Mirror | Shape::ArcThroughMiddle => through_middle,
        Shape::ArcLeastGap => least_gap(plan.fraction, line, (from, length)),
    };
    Length::from_si(rise)
}

/// The rise of the arc whose greatest gap to the factored deflection line is least, by golden
/// section: the gap at each place grows with the distance of the rise from the one that fits
/// there, so that its greatest has one minimum.
fn least_gap(fraction: f64, line: &Piecewise, (from, length): (f64, f64)) -> f64 {
    const GOLDEN: f64 = 0.618_033_988_749_894_8;
    let stretch = line.between(from, from + length);
    let gap = |rise: f64| {
        let arc = Line::Arc { from, length, rise };
        let mut gap = stretch.zeroed();
        gap.add(&stretch, fraction);
        gap.add(&arc.over(&stretch), -1.0);
        gap.greatest().value.abs()
    };
    let size = stretch.greatest().value.abs() * fraction * 2.0;
    let (mut low, mut high) = (-size, size);
    let (mut a, mut b) = (high - GOLDEN * (high - low), low + GOLDEN * (high - low));
    let (mut gap_a, mut gap_b) = (gap(a), gap(b));
    // Each step keeps 0.618 of the interval: eighty leave less than 1e-16 of it.
    for _ in 0..80 {
        if gap_a <= gap_b {
            (high, b, gap_b) = (b, a, gap_a);
            a = high - GOLDEN * (high - low);
            gap_a = gap(a);
        } else {
            (low, a, gap_a) = (a, b, gap_b);
            b = low + GOLDEN * (high - low);
            gap_b = gap(b);
        }
    }
    f64::midpoint(low, high)
}

/// The line of a shape with its rounded rise.
fn built(shape: Shape, line: Piecewise, (from, length): (f64, f64), rise: f64) -> Line {
    match shape {
        Shape::Parabola => Line::Parabola { from, length, rise },
        Shape::ArcThroughMiddle | Shape::ArcLeastGap => Line::Arc { from, length, rise },
        Shape::Mirror => {
            let middle = line
                .sides(from + length / 2.0)
                .map_or(0.0, |(_, right)| right);
            let factor = if middle == 0.0 { 0.0 } else { rise / middle };
            Line::Mirror { line, factor }
        }
    }
}

impl Camber {
    /// The shape.
    #[must_use]
    pub const fn shape(&self) -> Shape {
        self.shape
    }

    /// The rise before rounding: fraction x deflection at the chord's middle, or the best fit.
    #[must_use]
    pub const fn target(&self) -> Length {
        self.target
    }

    /// The rise at the middle of the chord, rounded; positive upward; zero where it would be less
    /// than the least worth building.
    #[must_use]
    pub const fn rise(&self) -> Length {
        self.rise
    }

    /// The radius of an arc, (l^2/4 + c^2)/(2 c); `None` for other shapes and for no rise.
    #[must_use]
    pub fn radius(&self) -> Option<Length> {
        match self.line {
            Line::Arc { length, rise, .. } if rise != 0.0 => {
                Some(Length::from_si(shape::radius(length, rise)))
            }
            Line::Arc { .. } | Line::Parabola { .. } | Line::Mirror { .. } => None,
        }
    }

    /// The places of the chord's ends, from the left end of the member.
    #[must_use]
    pub const fn chord(&self) -> (Length, Length) {
        self.chord
    }

    /// The ordinates from the left end of the chord to the right end.
    #[must_use]
    pub fn ordinates(&self) -> &[Ordinate] {
        &self.ordinates
    }

    /// The height above the line of the chord at a place of the member, positive upward. Beyond the
    /// chord the member goes on along its tangent (a mirror image along the mirrored line), so that
    /// an overhang usually stands below it.
    ///
    /// # Errors
    /// [`ErrorKind::Position`] if the place is not on the member.
    pub fn ordinate(&self, at: Length) -> Result<Length> {
        if !(at >= Length::ZERO && at <= self.length) {
            return Err(Problem::new(
                ErrorKind::Position,
                "at",
                at.to_string(),
                format!("a place on the member, from 0 m to {}", self.length),
            )
            .into());
        }
        Ok(Length::from_si(self.line.height(at.si())))
    }

    /// The camber line as a field, over the pieces of another field where it has none of its own.
    pub(crate) fn line(&self, pieces_of: &Piecewise) -> Piecewise {
        self.line.over(pieces_of)
    }
}
