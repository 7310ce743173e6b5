//! What a simplified method gives beside the exact solution.

use crate::field::Extreme;
use crate::simplified::{LayerStress, Warning};
use crate::units::{BendingStiffness, Force, Length, Moment, ShearFlow};

/// A simplified method for layers that slip.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub enum SimplifiedMethod {
    /// EN 1995-1-1:2004 Annex B, for two or three layers.
    Gamma,
    /// The sine-load method for any number of layers.
    SineLayers,
}

impl SimplifiedMethod {
    /// The word used in documents.
    #[must_use]
    pub const fn name(self) -> &'static str {
        match self {
            Self::Gamma => "gamma",
            Self::SineLayers => "sine_layers",
        }
    }
}

/// What a simplified method gives for one span, beside the exact solution.
#[derive(Clone, Debug, PartialEq)]
pub struct SimplifiedSpan {
    /// The name of the span.
    pub span: String,
    /// The length of the half sine wave.
    pub length: Length,
    /// gamma of each layer from the lowest upward; none for the sine-load method.
    pub factors: Vec<f64>,
    /// The effective bending stiffness with the moduli of the time.
    pub bending_stiffness: BendingStiffness,
    /// The greatest deflection of the span by the method.
    pub deflection: Extreme<Length>,
    /// The greatest deflection of the span by the exact solution.
    pub exact_deflection: Extreme<Length>,
    /// The flow of each joint.
    pub joints: Vec<SimplifiedJoint>,
    /// The stresses of each layer from the lowest upward at the place of the span's greatest
    /// moment.
    pub layers: Vec<SimplifiedLayer>,
    /// Whether the combination holds free strains, which are left out of both sides here.
    pub leaves_out_strains: bool,
    /// The limits of the method.
    pub warnings: Vec<Warning>,
}

impl SimplifiedSpan {
    /// Deflection by the method over the exact one, less one.
    #[must_use]
    pub fn difference(&self) -> f64 {
        self.deflection.value / self.exact_deflection.value - 1.0
    }
}

/// The greatest flow of a joint over a span, with the sign of the slip.
#[derive(Clone, Debug, PartialEq)]
pub struct SimplifiedJoint {
    /// The name of the joint.
    pub joint: String,
    /// By the method.
    pub flow: Extreme<ShearFlow>,
    /// By the exact solution.
    pub exact_flow: Extreme<ShearFlow>,
}

/// The stresses of a layer by the method.
#[derive(Clone, Debug, PartialEq)]
pub struct SimplifiedLayer {
    /// The name of the layer.
    pub layer: String,
    /// The place along the member.
    pub at: Length,
    /// Axial and bending stress by the method.
    pub stress: LayerStress,
    /// The axial force of the layer there by the exact solution.
    pub exact_axial: Force,
    /// The moment of the layer there by the exact solution.
    pub exact_moment: Moment,
}
