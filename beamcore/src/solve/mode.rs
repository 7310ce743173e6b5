//! One mode of slip over one piece: x' = x*' + y + g, y' = r^2 x - p, with the rate r and the free
//! gradient x*'. What turns and lengthens the section is the slip gained against that: the integral
//! of x' - x*' = y + g.
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
    /// x*'.
    pub(crate) free: f64,
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

/// How x and y at the ends enter the two equations of a mode, and the slip gained over the piece.
#[derive(Clone, Copy, Debug, Default)]
pub(crate) struct ModeEnds {
    /// Of each equation, the factors of x and y at the left end.
    pub(crate) left: [[f64; 2]; 2],
    /// At the right end.
    pub(crate) right: [[f64; 2]; 2],
    /// The slip gained, then the integral of the slip gained: factors at the left end.
    pub(crate) gained_left: [[f64; 2]; 2],
    /// And at the right end.
    pub(crate) gained_right: [[f64; 2]; 2],
}

/// The load side of the two equations, and the load's share in the slip gained and its integral.
#[derive(Clone, Copy, Debug)]
pub(crate) struct ModeSide {
    pub(crate) rows: [f64; 2],
    pub(crate) gained: [f64; 2],
}

/// The series of a soft mode.
struct Series {
    x: [f64; TAYLOR],
    y: [f64; TAYLOR],
    /// The slip gained from the left end.
    gained: [f64; TAYLOR],
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
    /// x' - x*'.
    pub(crate) gain: ModeLine,
    /// The slip gained from the left end.
    pub(crate) gained: ModeLine,
    /// Its integral from the left end.
    pub(crate) gained_integral: ModeLine,
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
        let (r, e, h) = (self.rate, self.decayed, self.length);
        if self.is_stiff() {
            let flexibility = 1.0 / (r * r);
            ModeEnds {
                left: [[e * r, -e], [r, 1.0]],
                right: [[-r, 1.0], [-e * r, -e]],
                gained_left: [[-1.0, 0.0], [-h, -flexibility]],
                gained_right: [[1.0, 0.0], [0.0, flexibility]],
            }
        } else {
            let none = Drive::default();
            let (by_x, by_y) = (
                self.series([1.0, 0.0], &none),
                self.series([0.0, 1.0], &none),
            );
            ModeEnds {
                left: [
                    [-at_end(&by_x.x), -at_end(&by_y.x)],
                    [-at_end(&by_x.y), -at_end(&by_y.y)],
                ],
                right: [[1.0, 0.0], [0.0, 1.0]],
                gained_left: [
                    [at_end(&by_x.gained), at_end(&by_y.gained)],
                    [self.integral(&by_x.gained), self.integral(&by_y.gained)],
                ],
                gained_right: [[0.0; 2]; 2],
            }
        }
    }

    /// The load side that belongs to [`ModePiece::ends`].
    pub(crate) fn side(&self, drive: &Drive) -> ModeSide {
        if self.is_stiff() {
            let (r, e, h) = (self.rate, self.decayed, self.length);
            let particular = self.particular(drive);
            let both = |line: &ModeLine| (line.polynomial[0], at_end(&line.polynomial));
            let ((x0, x1), (y0, y1)) = (both(&particular.slip), both(&particular.force));
            let [p, dp] = drive.axial;
            ModeSide {
                rows: [
                    (y1 - r * x1) - e * (y0 - r * x0),
                    (y0 + r * x0) - e * (y1 + r * x1),
                ],
                gained: [
                    -h * drive.free,
                    h * (p + dp / 2.0) / (r * r) - h * h * drive.free / 2.0,
                ],
            }
        } else {
            let series = self.series([0.0, 0.0], drive);
            ModeSide {
                rows: [at_end(&series.x), at_end(&series.y)],
                gained: [at_end(&series.gained), self.integral(&series.gained)],
            }
        }
    }

    /// The lines from (x, y) at the two ends.
    pub(crate) fn lines(&self, start: (f64, f64), end: (f64, f64), drive: &Drive) -> ModeLines {
        if self.is_stiff() {
            self.stiff_lines(start, end, drive)
        } else {
            self.soft_lines(start, drive)
        }
    }

    fn soft_lines(&self, start: (f64, f64), drive: &Drive) -> ModeLines {
        let series = self.series([start.0, start.1], drive);
        let mut lines = ModeLines::default();
        lines.slip.polynomial = series.x;
        lines.force.polynomial = series.y;
        lines.gain.polynomial = series.y;
        for (sum, term) in lines.gain.polynomial.iter_mut().zip(&drive.strain) {
            *sum += term;
        }
        lines.gained.polynomial = series.gained;
        let integral = &mut lines.gained_integral.polynomial;
        for i in 1..TAYLOR {
            integral[i] = self.length * series.gained[i - 1] / count(i);
        }
        lines
    }

    fn stiff_lines(&self, start: (f64, f64), end: (f64, f64), drive: &Drive) -> ModeLines {
        let (r, h) = (self.rate, self.length);
        let mut lines = self.particular(drive);
        let both = |line: &ModeLine| (line.polynomial[0], at_end(&line.polynomial));
        let ((x0, x1), (y0, y1)) = (both(&lines.slip), both(&lines.force));
        let from_left = ((start.1 - r * start.0) - (y0 - r * x0)) / 2.0;
        let from_right = ((end.1 + r * end.0) - (y1 + r * x1)) / 2.0;
        lines.force.decaying = [from_left, from_right];
        lines.slip.decaying = [-from_left / r, from_right / r];
        lines.gain.decaying = [from_left, from_right];
        lines.gained = lines.slip;
        lines.gained.polynomial[0] -= start.0;
        lines.gained.polynomial[1] -= h * drive.free;
        // The integral of x is (y - y(0) + integral of p)/r^2.
        let squared = r * r;
        let integral = &mut lines.gained_integral;
        integral.polynomial = lines.force.polynomial.map(|term| term / squared);
        integral.polynomial[0] -= start.1 / squared;
        integral.polynomial[1] += h * (drive.axial[0] / squared - start.0);
        integral.polynomial[2] += h * drive.axial[1] / (2.0 * squared) - h * h * drive.free / 2.0;
        integral.decaying = lines.force.decaying.map(|factor| factor / squared);
        lines
    }

    /// The particular polynomial of a stiff mode: y = -G + (p' - G'')/r^2, x = (y' + p)/r^2, with
    /// G = x*' + g.
    fn particular(&self, drive: &Drive) -> ModeLines {
        let (h, squared) = (self.length, self.rate * self.rate);
        let mut lines = ModeLines::default();
        // y + G.
        let mut rest = [0.0; TAYLOR];
        for (i, (term, g)) in rest.iter_mut().zip(&drive.strain[2..]).enumerate() {
            *term = -g * count(i + 2) * count(i + 1) / (h * h) / squared;
        }
        rest[0] += drive.axial[1] / h / squared;
        let force = &mut lines.force.polynomial;
        for i in 0..TERMS {
            force[i] = rest[i] - drive.strain[i];
        }
        force[0] -= drive.free;
        lines.gain.polynomial = rest;
        lines.gain.polynomial[0] -= drive.free;
        let slip = &mut lines.slip.polynomial;
        for i in 0..TERMS - 1 {
            slip[i] = force[i + 1] * count(i + 1) / h / squared;
        }
        slip[0] += drive.axial[0] / squared;
        slip[1] += drive.axial[1] / squared;
        lines
    }

    /// The Taylor series from the left end.
    fn series(&self, [x, y]: [f64; 2], drive: &Drive) -> Series {
        let (h, squared) = (self.length, self.rate * self.rate);
        let mut series = Series {
            x: [0.0; TAYLOR],
            y: [0.0; TAYLOR],
            gained: [0.0; TAYLOR],
        };
        series.x[0] = x;
        series.y[0] = y;
        for n in 0..TAYLOR - 1 {
            let g = drive.strain.get(n).copied().unwrap_or(0.0);
            let p = drive.axial.get(n).copied().unwrap_or(0.0);
            let gain = h * (series.y[n] + g) / count(n + 1);
            series.gained[n + 1] = gain;
            series.x[n + 1] = gain;
            series.y[n + 1] = h * (squared * series.x[n] - p) / count(n + 1);
            if n == 0 {
                series.x[1] += h * drive.free;
            }
        }
        series
    }

    /// The integral over the piece of a polynomial of t.
    fn integral(&self, line: &[f64; TAYLOR]) -> f64 {
        let terms = line.iter().enumerate().rev();
        self.length * terms.map(|(i, term)| term / count(i + 1)).sum::<f64>()
    }
}

/// The value of a polynomial of t at the right end.
fn at_end(line: &[f64; TAYLOR]) -> f64 {
    line.iter().rev().sum()
}

/// A small count as a number.
fn count(n: usize) -> f64 {
    f64::from(n as u8)
}
