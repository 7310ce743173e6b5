//! Simplified methods for layers that slip on each other: hand formulas, without a member.
//!
//! [`Gamma`] is the method of EN 1995-1-1:2004 Annex B for two or three layers, [`SineLayers`] the
//! same idea for any number. Both suppose a load in the form of half a sine wave on a single span,
//! for which they are exact; what that leaves out is told as [`Warning`]s.
//!
//! Layers are listed from the lowest upward, z counts upward. A positive (sagging) moment stretches
//! the bottom, tension is positive, V = dM/dx. The flow of a joint is positive where the tension of
//! all that lies below it grows along x, as it does under a positive V.

mod effect;
mod gamma;
mod layer;
mod length;
mod sine;
mod spacing;
#[cfg(test)]
mod tests;
mod warning;

pub use gamma::Gamma;
pub use layer::{LayerInput, LayerStress, ShearStress};
pub use length::ReferenceLength;
pub use sine::SineLayers;
pub use spacing::{EffectiveSpacing, effective_spacing};
pub use warning::Warning;
