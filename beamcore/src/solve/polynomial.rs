//! A prismatic, shear-rigid piece under a linearly varying line load: polynomials, exactly.

use super::relation::{LoadSide, Piece, Relation};
use super::state::{M, STATES, Scale, THETA, V, W};
use crate::math::polynomial::{Coefficients, value_at_one};
use nalgebra::{SMatrix, SVector};

/// A piece of constant bending flexibility.
#[derive(Clone, Copy, Debug, PartialEq)]
pub(crate) struct PolynomialPiece {
    /// Length over the scale's length.
    length: f64,
    /// The scale's stiffness over EI.
    flexibility: f64,
    scale: Scale,
}

/// What acts on a piece.
#[derive(Clone, Copy, Debug, Default, PartialEq)]
pub(crate) struct PieceLoad {
    /// The line load at the two ends, linear between them; N/m, positive downward.
    pub(crate) line: [f64; 2],
    /// The curvature that the piece takes freely, without moment; 1/m, positive sagging.
    pub(crate) curvature: f64,
}

/// The four fields over one piece, each a polynomial of t from 0 (left end) to 1 (right end).
#[derive(Clone, Copy, Debug, Default, PartialEq)]
pub(crate) struct PieceFields {
    pub(crate) deflection: Coefficients,
    pub(crate) slope: Coefficients,
    pub(crate) shear: Coefficients,
    pub(crate) moment: Coefficients,
}

impl PieceFields {
    /// Shear force and moment just right of the left end.
    pub(crate) fn forces_at_start(&self) -> [f64; 2] {
        [self.shear[0], self.moment[0]]
    }

    /// Shear force and moment just left of the right end.
    pub(crate) fn forces_at_end(&self) -> [f64; 2] {
        [value_at_one(&self.shear), value_at_one(&self.moment)]
    }
}

impl PolynomialPiece {
    /// A piece of the given length in m with the bending stiffness EI in N m2.
    pub(crate) fn new(length: f64, bending_stiffness: f64, scale: Scale) -> Self {
        Self {
            length: length / scale.length,
            flexibility: scale.stiffness / bending_stiffness,
            scale,
        }
    }

    /// A line load in N/m, in the scale's unit.
    fn scaled(&self, line_load: f64) -> f64 {
        let l = self.scale.length;
        line_load * (l * l * l) / self.scale.stiffness
    }

    /// The line load at the left end and its growth to the right end, in the scale's unit.
    fn scaled_line(&self, [left, right]: [f64; 2]) -> (f64, f64) {
        (self.scaled(left), self.scaled(right - left))
    }

    /// A curvature in 1/m, in the scale's unit.
    fn scaled_curvature(&self, curvature: f64) -> f64 {
        curvature * self.scale.length
    }

    /// The fields, in SI units, from the scaled state at the left end and the line load q at the
    /// two ends in N/m, which grows by g over the length h; t = x/h, k the free curvature:
    ///
    /// V = V0 - q x - g x t/2, M = M0 + V0 x - q x^2/2 - g x^2 t/6,
    /// theta = theta0 - (M0 x + V0 x^2/2 - q x^3/6 - g x^3 t/24)/EI - k x,
    /// w = w0 + theta0 x - (M0 x^2/2 + V0 x^3/6 - q x^4/24 - g x^4 t/120)/EI - k x^2/2.
    pub(crate) fn fields(&self, start: &SVector<f64, STATES>, load: &PieceLoad) -> PieceFields {
        let (h, f) = (self.length, self.flexibility);
        let (q, g) = self.scaled_line(load.line);
        let k = self.scaled_curvature(load.curvature);
        let h2 = h * h;
        let (h3, h4) = (h2 * h, h2 * h2);
        let (w, theta, v, m) = (start[W], start[THETA], start[V], start[M]);
        let units = self.scale.units();
        let field = |unit: f64, c: Coefficients| c.map(|term| term * unit);
        PieceFields {
            deflection: field(
                units[W],
                [
                    w,
                    theta * h,
                    -(f * m + k) * h2 / 2.0,
                    -f * v * h3 / 6.0,
                    f * q * h4 / 24.0,
                    f * g * h4 / 120.0,
                ],
            ),
            slope: field(
                units[THETA],
                [
                    theta,
                    -(f * m + k) * h,
                    -f * v * h2 / 2.0,
                    f * q * h3 / 6.0,
                    f * g * h3 / 24.0,
                    0.0,
                ],
            ),
            shear: field(units[V], [v, -q * h, -g * h / 2.0, 0.0, 0.0, 0.0]),
            moment: field(units[M], [m, v * h, -q * h2 / 2.0, -g * h2 / 6.0, 0.0, 0.0]),
        }
    }
}

impl Piece<STATES> for PolynomialPiece {
    type Load = PieceLoad;

    fn relation(&self) -> Relation<STATES> {
        let (h, f) = (self.length, self.flexibility);
        #[rustfmt::skip]
        let left = SMatrix::<f64, STATES, STATES>::new(
            -1.0, -h,   f * h * h * h / 6.0, f * h * h / 2.0,
            0.0,  -1.0, f * h * h / 2.0,     f * h,
            0.0,  0.0,  -1.0,                0.0,
            0.0,  0.0,  -h,                  -1.0,
        );
        Relation {
            left,
            right: SMatrix::identity(),
        }
    }

    fn load_side(&self, load: &PieceLoad) -> LoadSide<STATES> {
        let (h, f) = (self.length, self.flexibility);
        let (q, g) = self.scaled_line(load.line);
        let k = self.scaled_curvature(load.curvature);
        let h2 = h * h;
        SVector::<f64, STATES>::new(
            f * h2 * h2 * (q / 24.0 + g / 120.0) - k * h2 / 2.0,
            f * h2 * h * (q / 6.0 + g / 24.0) - k * h,
            -h * (q + g / 2.0),
            -h2 * (q / 2.0 + g / 6.0),
        )
    }
}
