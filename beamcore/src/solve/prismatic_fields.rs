//! The fields over a prismatic piece.

use super::load::PieceLoad;
use super::mode::ModeLine;
use super::prismatic::{PrismaticPiece, Statics, integral};

impl PrismaticPiece {
    /// The fields along the piece from the states at its ends: for each state, and last for the
    /// curvature -theta', `terms` coefficients of t and two of each mode.
    pub(crate) fn fields(
        &self,
        ends: [&[f64]; 2],
        load: &PieceLoad<'_>,
        terms: usize,
        out: &mut [f64],
    ) {
        let (states, half) = (self.states, self.states.half());
        let h = self.length;
        let width = terms + 2 * states.slips;
        let start = ends[0];
        let axial = if states.has_axial {
            start[half + states.axial()]
        } else {
            0.0
        };
        let statics = self.statics([start[half], start[half + 1], axial], Some(load.line));
        let strains = self.strains(&statics, &load.free[..self.modes.base]);
        let mut put = |field: usize, polynomial: &[f64]| {
            let place = &mut out[field * width..field * width + polynomial.len()];
            for (sum, term) in place.iter_mut().zip(polynomial) {
                *sum += term;
            }
        };
        put(half, &statics.shear);
        for i in 0..self.modes.base {
            put(half + 1 + i, &statics.forces[i]);
            let mut line = integral(&strains[i], h);
            line[0] += start[1 + i];
            put(1 + i, &line);
        }
        let mut deflection = integral(&integral(&strains[0], h), h);
        let shear = integral(&statics.shear, h);
        for (sum, term) in deflection.iter_mut().zip(&shear) {
            *sum += self.modes.shear_flexibility * term;
        }
        deflection[0] += start[0];
        deflection[1] += start[1] * h;
        put(0, &deflection);
        put(2 * half, &strains[0].map(|term| -term));
        for mode in 0..states.slips {
            self.add_mode(mode, ends, load, &statics, terms, out);
        }
    }

    /// Adds what a mode brings to all fields.
    fn add_mode(
        &self,
        mode: usize,
        ends: [&[f64]; 2],
        load: &PieceLoad<'_>,
        statics: &Statics,
        terms: usize,
        out: &mut [f64],
    ) {
        let (states, half) = (self.states, self.states.half());
        let slips = states.slips;
        let width = terms + 2 * slips;
        let in_mode = |end: &[f64]| {
            (0..slips).fold((0.0, 0.0), |(x, y), j| {
                let slip = states.slip(j);
                (
                    x + self.modes.duals[j * slips + mode] * end[slip],
                    y + self.modes.shapes[j * slips + mode] * end[half + slip],
                )
            })
        };
        let drive = self.drive(mode, statics, Some(load));
        let lines = self.slip[mode].lines(in_mode(ends[0]), in_mode(ends[1]), &drive);
        let mut put = |field: usize, factor: f64, line: &ModeLine| {
            let place = &mut out[field * width..(field + 1) * width];
            for (sum, term) in place[..terms].iter_mut().zip(&line.polynomial) {
                *sum += factor * term;
            }
            place[terms + 2 * mode] += factor * line.decaying[0];
            place[terms + 2 * mode + 1] += factor * line.decaying[1];
        };
        for j in 0..slips {
            let slip = states.slip(j);
            put(slip, self.modes.shapes[j * slips + mode], &lines.slip);
            put(
                half + slip,
                self.modes.duals[j * slips + mode],
                &lines.force,
            );
        }
        for i in 0..self.modes.base {
            let share = self.share_of_mode(i, mode);
            put(1 + i, share, &lines.gained);
            if i == 0 {
                put(0, share, &lines.gained_integral);
                put(2 * half, -share, &lines.gain);
            }
        }
    }
}
