//! A piece whose section changes along it, or whose layers part across it: collocation at Gauss
//! points.
//!
//! y' = A(x) y + b(x) holds at the points; between them y' is the polynomial through them. Without
//! slip and with one strand this is Gauss quadrature of the statics. The caller cuts the member
//! short enough (see the layout of a member); what is left is told by [`VaryingPiece::defect`].

use super::gauss::{POINTS, RULE};
use super::law::Law;
use super::load::PieceLoad;
use super::modes::inverse;
use super::relation::Relation;
use super::states::States;
use nalgebra::{DMatrix, DVector, Dyn, LU};
use std::sync::Arc;

/// The laws of a piece at its Gauss points, and at both ends, where what is left is looked at.
#[derive(Clone, Debug)]
pub(crate) struct VaryingLaws {
    pub(crate) points: [Law; POINTS],
    pub(crate) ends: [Law; 2],
}

/// A piece of varying section.
#[derive(Clone, Debug)]
pub(crate) struct VaryingPiece {
    states: States,
    length: f64,
    matrices: Vec<DMatrix<f64>>,
    end_matrices: [DMatrix<f64>; 2],
    units: Vec<f64>,
    factors: LU<f64, Dyn, Dyn>,
}

/// The number of polynomial coefficients of its fields.
pub(crate) const VARYING_TERMS: usize = POINTS + 1;

impl VaryingLaws {
    /// The laws at the points, then at both ends.
    pub(crate) fn new(laws: Vec<Law>) -> Self {
        let mut laws = laws.into_iter();
        let mut next = || laws.next().expect("as many laws as points and ends");
        Self {
            points: std::array::from_fn(|_| next()),
            ends: std::array::from_fn(|_| next()),
        }
    }
}

impl VaryingPiece {
    /// A piece of the given length in m; `units` are those of the states, in which the equations
    /// are solved.
    pub(crate) fn new(
        states: States,
        length: f64,
        laws: Arc<VaryingLaws>,
        units: Vec<f64>,
    ) -> Self {
        let all = states.all();
        let matrices: Vec<_> = laws.points.iter().map(|law| matrix(law, &units)).collect();
        let end_matrices = [0, 1].map(|end| matrix(&laws.ends[end], &units));
        let mut system = DMatrix::identity(POINTS * all, POINTS * all);
        for i in 0..POINTS {
            for (j, a) in matrices.iter().enumerate() {
                let factor = length * RULE.integrals[i][j];
                let mut block = system.view_mut((i * all, j * all), (all, all));
                block -= a * factor;
            }
        }
        Self {
            states,
            length,
            matrices,
            end_matrices,
            units,
            factors: system.lu(),
        }
    }

    /// y at the points, in units, from y at the left end and the load.
    fn at_points(&self, start: &DVector<f64>, load: Option<&PieceLoad<'_>>) -> DVector<f64> {
        let all = self.states.all();
        let mut side = DVector::zeros(POINTS * all);
        let loads: Option<Vec<_>> =
            load.map(|load| (0..POINTS).map(|j| self.load_at_point(load, j)).collect());
        for i in 0..POINTS {
            let mut part = side.rows_mut(i * all, all);
            part += start;
            if let Some(loads) = &loads {
                for (j, b) in loads.iter().enumerate() {
                    part += b * (self.length * RULE.integrals[i][j]);
                }
            }
        }
        self.factors
            .solve(&side)
            .expect("pieces are cut so short that the points determine them")
    }

    /// y' at the points, in units per metre.
    fn slopes(&self, values: &DVector<f64>, load: Option<&PieceLoad<'_>>) -> Vec<DVector<f64>> {
        let all = self.states.all();
        (0..POINTS)
            .map(|j| {
                let slope = &self.matrices[j] * values.rows(j * all, all);
                match load {
                    Some(load) => slope + self.load_at_point(load, j),
                    None => slope,
                }
            })
            .collect()
    }

    fn load_at_point(&self, load: &PieceLoad<'_>, j: usize) -> DVector<f64> {
        let per_point = load.at_nodes.len() / (POINTS + 2);
        let more = &load.at_nodes[j * per_point..(j + 1) * per_point];
        self.load_at(load, RULE.points[j], more)
    }

    /// b at a place: free gradients, and loads with their sign reversed.
    fn load_at(&self, load: &PieceLoad<'_>, t: f64, more: &[f64]) -> DVector<f64> {
        let (half, strands) = (self.states.half(), self.states.strands);
        let mut b = DVector::zeros(2 * half);
        for i in 0..half {
            let line = load.line[i] + (load.line[half + i] - load.line[i]) * t;
            b[half + i] = -(line + more.get(i).copied().unwrap_or(0.0));
        }
        for (i, gradient) in load.free.iter().enumerate() {
            b[strands + i] = gradient + more.get(half + i).copied().unwrap_or(0.0);
        }
        for (number, unit) in b.iter_mut().zip(&self.units) {
            *number /= unit;
        }
        b
    }

    /// y at the right end from y at the left end.
    fn end(&self, start: &DVector<f64>, load: Option<&PieceLoad<'_>>) -> DVector<f64> {
        let values = self.at_points(start, load);
        let mut end = start.clone();
        for (slope, weight) in self.slopes(&values, load).iter().zip(&RULE.weights) {
            end += slope * (self.length * weight);
        }
        end
    }

    /// The relation between the states at its ends, in SI units.
    pub(crate) fn relation(&self) -> Relation {
        let all = self.states.all();
        let mut relation = Relation::zero(all);
        for column in 0..all {
            let mut start = DVector::zeros(all);
            start[column] = 1.0;
            let end = self.end(&start, None);
            for row in 0..all {
                relation.left[row * all + column] =
                    -end[row] * self.units[row] / self.units[column];
            }
            relation.right[column * all + column] = 1.0;
        }
        relation
    }

    /// The load side of the relation, in SI units.
    pub(crate) fn load_side(&self, load: &PieceLoad<'_>, side: &mut [f64]) {
        let end = self.end(&DVector::zeros(self.states.all()), Some(load));
        for (row, number) in side.iter_mut().enumerate() {
            *number = end[row] * self.units[row];
        }
    }

    /// The fields, as those of a prismatic piece; gives what is left of the equations besides.
    pub(crate) fn fields(
        &self,
        start: &[f64],
        load: &PieceLoad<'_>,
        width: usize,
        out: &mut [f64],
    ) -> Vec<f64> {
        let (all, strands) = (self.states.all(), self.states.strands);
        let scaled = start.iter().zip(&self.units).map(|(y, unit)| y / unit);
        let start = DVector::from_iterator(all, scaled);
        let values = self.at_points(&start, Some(load));
        let slopes = self.slopes(&values, Some(load));
        for i in 0..all {
            let line = &mut out[i * width..(i + 1) * width];
            line[0] = start[i] * self.units[i];
            for (slope, lagrange) in slopes.iter().zip(&RULE.lagrange) {
                let size = slope[i] * self.units[i];
                for (power, c) in lagrange.iter().enumerate() {
                    line[power + 1] += self.length * size * c / (power as f64 + 1.0);
                }
            }
        }
        for strand in 0..strands {
            let rotation = self.states.rotation(strand);
            let line = &mut out[(all + strand) * width..(all + strand + 1) * width];
            for (slope, lagrange) in slopes.iter().zip(&RULE.lagrange) {
                for (power, c) in lagrange.iter().enumerate() {
                    line[power] -= slope[rotation] * self.units[rotation] * c;
                }
            }
        }
        self.defect(&start, &slopes, load)
    }

    /// What is left of the equations at the two ends of the piece, where no point lies, times its
    /// length: a bound of what the piece can add to each state, in SI units.
    fn defect(
        &self,
        start: &DVector<f64>,
        slopes: &[DVector<f64>],
        load: &PieceLoad<'_>,
    ) -> Vec<f64> {
        let all = self.states.all();
        let mut defect = vec![0.0; all];
        let per_point = load.at_nodes.len() / (POINTS + 2);
        let mut end = start.clone();
        for (slope, weight) in slopes.iter().zip(&RULE.weights) {
            end += slope * (self.length * weight);
        }
        for (which, y) in [start, &end].into_iter().enumerate() {
            let t = which as f64;
            let first = (POINTS + which) * per_point;
            let more = &load.at_nodes[first..first + per_point];
            let wanted = &self.end_matrices[which] * y + self.load_at(load, t, more);
            for i in 0..all {
                let at_end = |c: &[f64; POINTS]| if which == 0 { c[0] } else { c.iter().sum() };
                let slope: f64 = slopes
                    .iter()
                    .zip(&RULE.lagrange)
                    .map(|(slope, c)| slope[i] * at_end(c))
                    .sum();
                let left = (slope - wanted[i]).abs() * self.length * self.units[i];
                defect[i] = f64::max(defect[i], left);
            }
        }
        defect
    }
}

/// A of y' = A y + b, for states in their units.
fn matrix(law: &Law, units: &[f64]) -> DMatrix<f64> {
    let states = law.states;
    let (half, strands) = (states.half(), states.strands);
    let mut a = DMatrix::zeros(2 * half, 2 * half);
    for strand in 0..strands {
        let (w, theta) = (states.deflection(strand), states.rotation(strand));
        a[(w, theta)] = 1.0;
        a[(w, half + w)] = law.shear_flexibility[strand];
        a[(half + theta, half + w)] = -1.0;
    }
    let flexibility = inverse(&law.stiffness);
    for i in strands..half {
        for j in strands..half {
            a[(i, half + j)] += flexibility[(i - strands, j - strands)];
        }
    }
    for i in 0..half {
        for j in 0..half {
            a[(half + i, j)] += law.joints[(i, j)];
        }
    }
    for i in 0..2 * half {
        for j in 0..2 * half {
            a[(i, j)] *= units[j] / units[i];
        }
    }
    a
}
