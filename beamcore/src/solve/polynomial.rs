//! A prismatic, shear-rigid piece under a constant line load: polynomials, exactly.

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

/// The four fields over one piece, each a polynomial of t from 0 (left end) to 1 (right end).
#[derive(Clone, Copy, Debug, PartialEq)]
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

    /// The fields, in SI units, from the scaled state at the left end and the line load in N/m:
    ///
    /// V = V0 - q x, M = M0 + V0 x - q x^2/2,
    /// theta = theta0 - (M0 x + V0 x^2/2 - q x^3/6)/EI,
    /// w = w0 + theta0 x - (M0 x^2/2 + V0 x^3/6 - q x^4/24)/EI.
    pub(crate) fn fields(&self, start: &SVector<f64, STATES>, line_load: f64) -> PieceFields {
        let (h, f) = (self.length, self.flexibility);
        let (h2, q) = (h * h, self.scaled(line_load));
        let (h3, h4) = (h2 * h, h2 * h2);
        let (w, theta, v, m) = (start[W], start[THETA], start[V], start[M]);
        let units = self.scale.units();
        let field = |unit: f64, c: [f64; 5]| {
            [
                c[0] * unit,
                c[1] * unit,
                c[2] * unit,
                c[3] * unit,
                c[4] * unit,
                0.0,
            ]
        };
        PieceFields {
            deflection: field(
                units[W],
                [
                    w,
                    theta * h,
                    -f * m * h2 / 2.0,
                    -f * v * h3 / 6.0,
                    f * q * h4 / 24.0,
                ],
            ),
            slope: field(
                units[THETA],
                [theta, -f * m * h, -f * v * h2 / 2.0, f * q * h3 / 6.0, 0.0],
            ),
            shear: field(units[V], [v, -q * h, 0.0, 0.0, 0.0]),
            moment: field(units[M], [m, v * h, -q * h2 / 2.0, 0.0, 0.0]),
        }
    }
}

impl Piece<STATES> for PolynomialPiece {
    /// The constant line load in N/m, positive downward.
    type Load = f64;

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

    fn load_side(&self, line_load: &f64) -> LoadSide<STATES> {
        let (h, f, q) = (self.length, self.flexibility, self.scaled(*line_load));
        let h2 = h * h;
        SVector::<f64, STATES>::new(
            f * q * h2 * h2 / 24.0,
            f * q * h2 * h / 6.0,
            -q * h,
            -q * h2 / 2.0,
        )
    }
}
