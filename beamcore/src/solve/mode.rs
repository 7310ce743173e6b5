//! One mode of slip over one piece: x' = y + g, y' = r^2 x - p, with the rate r.
//!
//! A stiff mode (r h above a half) is a particular polynomial and two exponentials, one decaying
//! from each end; a soft one is its Taylor series, because there the closed forms cancel (by
//! 1/(r h)^4). Both have full precision where they are used.

use crate::math;
use crate::math::polynomial::TERMS;

/// The number of terms of the Taylor series: 0.5^19/19! is nothing beside one.
pub(crate) const TAYLOR: usize = 20;

/// Below this r h a mode is soft.
const SOFT: f64 = 0.5;

/// What drives a mode, in powers of t = x/h.
#[derive(Clone, Copy, Debug, Default)]
pub(crate) struct Drive {
    /// g.
    pub(crate) strain: [f64; TERMS],
    /// p.
    pub(crate) axial: [f64; 2],
}

/// A mode over a piece.
#[derive(Clone, Copy, Debug)]
pub(crate) struct ModePiece {
    rate: f64,
    length: f64,
    /// e^(-r h).
    decayed: f64,
}

/// How x and y at the ends enter the two equations of a mode, and the integral of x.
#[derive(Clone, Copy, Debug, Default)]
pub(crate) struct ModeEnds {
    /// Of each equation, the factors of x and y at the left end.
    pub(crate) left: [[f64; 2]; 2],
    /// At the right end.
    pub(crate) right: [[f64; 2]; 2],
    /// The integral of x over the piece: factors of x and y at the left end.
    pub(crate) integral_left: [f64; 2],
    /// And of y at the right end.
    pub(crate) integral_right: f64,
}

/// The load side of the two equations, and the load's share in the integral of x.
#[derive(Clone, Copy, Debug)]
pub(crate) struct ModeSide {
    pub(crate) rows: [f64; 2],
    pub(crate) integral: f64,
}

/// A line along the piece: polynomial of t, and the factors of e^(-r h t) and e^(-r h (1-t)).
#[derive(Clone, Copy, Debug, Default)]
pub(crate) struct ModeLine {
    pub(crate) polynomial: [f64; TAYLOR],
    pub(crate) decaying: [f64; 2],
}

/// The lines of a mode.
#[derive(Clone, Copy, Debug, Default)]
pub(crate) struct ModeLines {
    /// x.
    pub(crate) slip: ModeLine,
    /// y.
    pub(crate) force: ModeLine,
    /// x'.
    pub(crate) slip_gradient: ModeLine,
    /// x - x(0).
    pub(crate) slip_gained: ModeLine,
    /// The integral of x - x(0) from the left end.
    pub(crate) slip_gained_integral: ModeLine,
}

impl ModePiece {
    pub(crate) fn new(rate: f64, length: f64) -> Self {
        Self {
            rate,
            length,
            decayed: math::exp(-rate * length),
        }
    }

    pub(crate) fn is_stiff(&self) -> bool {
        self.decay() > SOFT
    }

    /// r h.
    pub(crate) fn decay(&self) -> f64 {
        self.rate * self.length
    }

    /// How the ends enter. Stiff: y - r x decays to the right, y + r x to the left. Soft: the state
    /// at the right end from that at the left.
    pub(crate) fn ends(&self) -> ModeEnds {
        let (r, e) = (self.rate, self.decayed);
        if self.is_stiff() {
            ModeEnds {
                left: [[e * r, -e], [r, 1.0]],
                right: [[-r, 1.0], [-e * r, -e]],
                integral_left: [0.0, -1.0 / (r * r)],
                integral_right: 1.0 / (r * r),
            }
        } else {
            let none = Drive::default();
            let (by_x, by_y) = (
                self.series([1.0, 0.0], &none),
                self.series([0.0, 1.0], &none),
            );
            let at = |line: &[f64; TAYLOR]| line.iter().rev().sum::<f64>();
            ModeEnds {
                left: [[-at(&by_x.0), -at(&by_y.0)], [-at(&by_x.1), -at(&by_y.1)]],
                right: [[1.0, 0.0], [0.0, 1.0]],
                integral_left: [self.integral(&by_x.0), self.integral(&by_y.0)],
                integral_right: 0.0,
            }
        }
    }

    /// The load side that belongs to [`ModePiece::ends`].
    pub(crate) fn side(&self, drive: &Drive) -> ModeSide {
        if self.is_stiff() {
            let (r, e) = (self.rate, self.decayed);
            let particular = self.particular(drive);
            let at = |line: &[f64; TAYLOR]| (line[0], line.iter().rev().sum::<f64>());
            let (x0, x1) = at(&particular.slip.polynomial);
            let (y0, y1) = at(&particular.force.polynomial);
            let [p, dp] = drive.axial;
            ModeSide {
                rows: [
                    (y1 - r * x1) - e * (y0 - r * x0),
                    (y0 + r * x0) - e * (y1 + r * x1),
                ],
                integral: self.length * (p + dp / 2.0) / (r * r),
            }
        } else {
            let (x, y) = self.series([0.0, 0.0], drive);
            ModeSide {
                rows: [x.iter().rev().sum(), y.iter().rev().sum()],
                integral: self.integral(&x),
            }
        }
    }

    /// The lines from (x, y) at the two ends.
    pub(crate) fn lines(&self, start: (f64, f64), end: (f64, f64), drive: &Drive) -> ModeLines {
        let mut lines = if self.is_stiff() {
            self.stiff_lines(start, end, drive)
        } else {
            self.soft_lines(start, drive)
        };
        lines.slip_gained = lines.slip;
        lines.slip_gained.polynomial[0] -= start.0;
        lines
    }

    fn soft_lines(&self, start: (f64, f64), drive: &Drive) -> ModeLines {
        let (x, y) = self.series([start.0, start.1], drive);
        let mut lines = ModeLines::default();
        lines.slip.polynomial = x;
        lines.force.polynomial = y;
        lines.slip_gradient.polynomial = y;
        for (sum, term) in lines.slip_gradient.polynomial.iter_mut().zip(&drive.strain) {
            *sum += term;
        }
        // The start is taken off before the integral, not after.
        let integral = &mut lines.slip_gained_integral.polynomial;
        for i in 2..TAYLOR {
            integral[i] = self.length * x[i - 1] / count(i);
        }
        lines
    }

    fn stiff_lines(&self, start: (f64, f64), end: (f64, f64), drive: &Drive) -> ModeLines {
        let r = self.rate;
        let mut lines = self.particular(drive);
        let at = |line: &[f64; TAYLOR]| (line[0], line.iter().rev().sum::<f64>());
        let (x0, x1) = at(&lines.slip.polynomial);
        let (y0, y1) = at(&lines.force.polynomial);
        let from_left = ((start.1 - r * start.0) - (y0 - r * x0)) / 2.0;
        let from_right = ((end.1 + r * end.0) - (y1 + r * x1)) / 2.0;
        lines.force.decaying = [from_left, from_right];
        lines.slip.decaying = [-from_left / r, from_right / r];
        lines.slip_gradient.decaying = [from_left, from_right];
        // The integral of x is (y - y(0) + integral of p)/r^2.
        let squared = r * r;
        let h = self.length;
        let integral = &mut lines.slip_gained_integral;
        integral.polynomial = lines.force.polynomial.map(|term| term / squared);
        integral.polynomial[0] -= start.1 / squared;
        integral.polynomial[1] += h * (drive.axial[0] / squared - start.0);
        integral.polynomial[2] += h * drive.axial[1] / (2.0 * squared);
        integral.decaying = lines.force.decaying.map(|factor| factor / squared);
        lines
    }

    /// The particular polynomial of a stiff mode: y = -g + (p' - g'')/r^2, x = (y' + p)/r^2.
    fn particular(&self, drive: &Drive) -> ModeLines {
        let (h, squared) = (self.length, self.rate * self.rate);
        let mut lines = ModeLines::default();
        let gradient = &mut lines.slip_gradient.polynomial;
        for (i, (term, g)) in gradient.iter_mut().zip(&drive.strain[2..]).enumerate() {
            *term = -g * count(i + 2) * count(i + 1) / (h * h) / squared;
        }
        gradient[0] += drive.axial[1] / h / squared;
        let gradient = *gradient;
        let force = &mut lines.force.polynomial;
        for i in 0..TERMS {
            force[i] = gradient[i] - drive.strain[i];
        }
        let force = *force;
        let slip = &mut lines.slip.polynomial;
        for i in 0..TERMS - 1 {
            slip[i] = force[i + 1] * count(i + 1) / h / squared;
        }
        slip[0] += drive.axial[0] / squared;
        slip[1] += drive.axial[1] / squared;
        lines
    }

    /// The Taylor series of x and y from the left end.
    fn series(&self, [x, y]: [f64; 2], drive: &Drive) -> ([f64; TAYLOR], [f64; TAYLOR]) {
        let (h, squared) = (self.length, self.rate * self.rate);
        let (mut xs, mut ys) = ([0.0; TAYLOR], [0.0; TAYLOR]);
        xs[0] = x;
        ys[0] = y;
        for n in 0..TAYLOR - 1 {
            let g = drive.strain.get(n).copied().unwrap_or(0.0);
            let p = drive.axial.get(n).copied().unwrap_or(0.0);
            xs[n + 1] = h * (ys[n] + g) / count(n + 1);
            ys[n + 1] = h * (squared * xs[n] - p) / count(n + 1);
        }
        (xs, ys)
    }

    /// The integral over the piece of a polynomial of t.
    fn integral(&self, line: &[f64; TAYLOR]) -> f64 {
        let terms = line.iter().enumerate().rev();
        self.length * terms.map(|(i, term)| term / count(i + 1)).sum::<f64>()
    }
}

/// A small count as a number.
fn count(n: usize) -> f64 {
    f64::from(n as u8)
}
