//! A prismatic piece of one strand under linearly varying loads: polynomials and, where joints
//! slip, exponentials that decay from both ends; exact.
//!
//! With t = x/h along the piece and s the slips:
//! V' = -q, B' = -V - m, N' = -n, e_b = (theta, u): e_b' = e_b*' + C_bb^-1 f_b + R (s' - s*'),
//! w' = theta + V/kGA; the slips in modes as told in [`super::modes`].

use super::load::PieceLoad;
use super::mode::{Drive, ModePiece, TAYLOR};
use super::modes::Modes;
use super::relation::Relation;
use super::states::States;
use crate::math::polynomial::{self, TERMS};
use std::sync::Arc;

/// A piece of constant section.
#[derive(Clone, Debug)]
pub(crate) struct PrismaticPiece {
    pub(super) states: States,
    pub(super) length: f64,
    pub(super) modes: Arc<Modes>,
    pub(super) slip: Vec<ModePiece>,
}

/// Polynomials of t.
pub(super) type Polynomial = [f64; TERMS];

/// Values over the base gradients: theta', and u' where axial force takes part.
pub(super) type Base<T> = [T; 2];

/// The forces of the base and their integrals over a piece.
#[derive(Clone, Copy, Default)]
pub(super) struct Statics {
    pub(super) shear: Polynomial,
    pub(super) forces: Base<Polynomial>,
}

impl PrismaticPiece {
    /// A piece of the given length in m.
    pub(crate) fn new(states: States, length: f64, modes: Arc<Modes>) -> Self {
        let slip = modes
            .rates
            .iter()
            .map(|&rate| ModePiece::new(rate, length))
            .collect();
        Self {
            states,
            length,
            modes,
            slip,
        }
    }

    /// The number of polynomial coefficients that its fields need.
    pub(crate) fn terms(&self) -> usize {
        if self.slip.iter().any(|mode| !mode.is_stiff()) {
            TAYLOR
        } else {
            TERMS
        }
    }

    /// The rates of its modes times its length.
    pub(crate) fn decays(&self) -> impl Iterator<Item = f64> {
        self.slip.iter().map(|mode| mode.decay())
    }

    /// V, B and N along the piece from their values at its left end and the loads on it.
    pub(super) fn statics(&self, start: [f64; 3], line: Option<&[f64]>) -> Statics {
        let h = self.length;
        let mut statics = Statics::default();
        let [v, b, n] = start;
        statics.shear[0] = v;
        statics.forces[0][..2].copy_from_slice(&[b, -v * h]);
        statics.forces[1][0] = n;
        if let Some(line) = line {
            let half = self.states.half();
            let along = |i: usize| (line[i], line[half + i] - line[i]);
            let (q, dq) = along(0);
            let (m, dm) = along(1);
            statics.shear[1] = -q * h;
            statics.shear[2] = -dq * h / 2.0;
            statics.forces[0][1] -= m * h;
            statics.forces[0][2] = q * h * h / 2.0 - dm * h / 2.0;
            statics.forces[0][3] = dq * h * h / 6.0;
            if self.states.has_axial {
                let (n, dn) = along(self.states.axial());
                statics.forces[1][1] = -n * h;
                statics.forces[1][2] = -dn * h / 2.0;
            }
        }
        statics
    }

    /// The gradients theta' and u' of the rigidly joined section along the piece, C_bb^-1 f_b, with
    /// the free ones.
    pub(super) fn strains(&self, statics: &Statics, free: &[f64]) -> Base<Polynomial> {
        let base = self.modes.base;
        let mut strains = [[0.0; TERMS]; 2];
        for (i, strain) in strains[..base].iter_mut().enumerate() {
            for (j, force) in statics.forces[..base].iter().enumerate() {
                let factor = self.modes.flexibility[i * base + j];
                for (sum, term) in strain.iter_mut().zip(force) {
                    *sum += factor * term;
                }
            }
            strain[0] += free.get(i).copied().unwrap_or(0.0);
        }
        strains
    }

    /// What drives a mode: g and p of [`super::modes`] along the piece.
    pub(super) fn drive(
        &self,
        mode: usize,
        statics: &Statics,
        load: Option<&PieceLoad<'_>>,
    ) -> Drive {
        let Modes { base, slips, .. } = *self.modes;
        let mut drive = Drive::default();
        for j in 0..base {
            let factor = self.modes.drive[mode * base + j];
            for (sum, term) in drive.strain.iter_mut().zip(&statics.forces[j]) {
                *sum += factor * term;
            }
        }
        if let Some(load) = load {
            let half = self.states.half();
            for j in 0..slips {
                let shape = self.modes.shapes[j * slips + mode];
                let slip = self.states.slip(j);
                drive.free += self.modes.duals[j * slips + mode] * load.free[base + j];
                drive.axial[0] += shape * load.line[slip];
                drive.axial[1] += shape * (load.line[half + slip] - load.line[slip]);
            }
        }
        drive
    }

    /// R times the shape of a mode: what each base displacement gains per slip gained in the mode.
    pub(super) fn share_of_mode(&self, i: usize, mode: usize) -> f64 {
        let slips = self.modes.slips;
        (0..slips)
            .map(|j| self.modes.coupling[i * slips + j] * self.modes.shapes[j * slips + mode])
            .sum()
    }

    /// The relation between the states at its ends, in SI units.
    pub(crate) fn relation(&self) -> Relation {
        let (states, half, all) = (self.states, self.states.half(), self.states.all());
        let h = self.length;
        let mut relation = Relation::zero(all);
        let slips = states.slips;
        // Every row is: right end - left end - what the left end causes = load.
        for row in 0..half {
            relation.right[row * all + row] = 1.0;
            relation.left[row * all + row] = -1.0;
            let force = half + row;
            relation.right[force * all + force] = 1.0;
            relation.left[force * all + force] = -1.0;
        }
        relation.left[1] = -h;
        for (input, column) in self.inputs() {
            let statics = self.statics(input, None);
            let strains = self.strains(&statics, &[]);
            let integrals = strains.map(|strain| integral(&strain, h));
            relation.left[column] -= polynomial::value_at_one(&integral(&integrals[0], h))
                + self.modes.shear_flexibility
                    * polynomial::value_at_one(&integral(&statics.shear, h));
            for (i, integral) in integrals[..self.modes.base].iter().enumerate() {
                relation.left[(1 + i) * all + column] -= polynomial::value_at_one(integral);
            }
            relation.left[(half + 1) * all + column] -=
                polynomial::value_at_one(&statics.forces[0]) - statics.forces[0][0];
        }
        for mode in 0..slips {
            self.mode_rows(mode, &mut relation);
        }
        relation
    }

    /// The two rows of a mode, and its share in the deflection and the base displacements.
    fn mode_rows(&self, mode: usize, relation: &mut Relation) {
        let (states, half, all) = (self.states, self.states.half(), self.states.all());
        let slips = states.slips;
        let rows = [states.slip(mode), half + states.slip(mode)];
        for row in rows {
            relation.left[row * all..(row + 1) * all].fill(0.0);
            relation.right[row * all..(row + 1) * all].fill(0.0);
        }
        let piece = &self.slip[mode];
        let ends = piece.ends();
        // Rows that grow with the slip gained (0) or its integral (1).
        let mut grown = vec![(0, 1, self.share_of_mode(0, mode))];
        grown.extend((0..self.modes.base).map(|i| (1 + i, 0, self.share_of_mode(i, mode))));
        for j in 0..slips {
            let slip = states.slip(j);
            let dual = self.modes.duals[j * slips + mode];
            let shape = self.modes.shapes[j * slips + mode];
            for (which, row) in rows.into_iter().enumerate() {
                relation.left[row * all + slip] += ends.left[which][0] * dual;
                relation.left[row * all + half + slip] += ends.left[which][1] * shape;
                relation.right[row * all + slip] += ends.right[which][0] * dual;
                relation.right[row * all + half + slip] += ends.right[which][1] * shape;
            }
            for &(row, which, share) in &grown {
                let (left, right) = (ends.gained_left[which], ends.gained_right[which]);
                relation.left[row * all + slip] -= share * left[0] * dual;
                relation.left[row * all + half + slip] -= share * left[1] * shape;
                relation.right[row * all + slip] -= share * right[0] * dual;
                relation.right[row * all + half + slip] -= share * right[1] * shape;
            }
        }
        for (input, column) in self.inputs() {
            let side = piece.side(&self.drive(mode, &self.statics(input, None), None));
            for (which, row) in rows.into_iter().enumerate() {
                relation.left[row * all + column] -= side.rows[which];
            }
            for &(row, which, share) in &grown {
                relation.left[row * all + column] -= share * side.gained[which];
            }
        }
    }

    /// Unit values of V, B and N at the left end, each with its column.
    fn inputs(&self) -> impl Iterator<Item = ([f64; 3], usize)> + use<> {
        let half = self.states.half();
        let count = 1 + self.modes.base;
        [[1.0, 0.0, 0.0], [0.0, 1.0, 0.0], [0.0, 0.0, 1.0]]
            .into_iter()
            .enumerate()
            .take(count)
            .map(move |(i, input)| (input, half + i))
    }

    /// The load side of the relation, in SI units.
    pub(crate) fn load_side(&self, load: &PieceLoad<'_>, side: &mut [f64]) {
        let (states, half) = (self.states, self.states.half());
        let h = self.length;
        let statics = self.statics([0.0; 3], Some(load.line));
        let strains = self.strains(&statics, &load.free[..self.modes.base]);
        let integrals = strains.map(|strain| integral(&strain, h));
        side[0] = polynomial::value_at_one(&integral(&integrals[0], h))
            + self.modes.shear_flexibility * polynomial::value_at_one(&integral(&statics.shear, h));
        side[half] = polynomial::value_at_one(&statics.shear);
        for i in 0..self.modes.base {
            side[1 + i] = polynomial::value_at_one(&integrals[i]);
            side[half + 1 + i] = polynomial::value_at_one(&statics.forces[i]);
        }
        for (mode, piece) in self.slip.iter().enumerate() {
            let own = piece.side(&self.drive(mode, &statics, Some(load)));
            side[states.slip(mode)] = own.rows[0];
            side[half + states.slip(mode)] = own.rows[1];
            side[0] += self.share_of_mode(0, mode) * own.gained[1];
            for i in 0..self.modes.base {
                side[1 + i] += self.share_of_mode(i, mode) * own.gained[0];
            }
        }
    }
}

/// h times the integral from 0 of a polynomial of t; its highest term is zero.
pub(super) fn integral(polynomial: &Polynomial, h: f64) -> Polynomial {
    let mut result = [0.0; TERMS];
    for i in 1..TERMS {
        result[i] = h * polynomial[i - 1] / f64::from(i as u8);
    }
    result
}
