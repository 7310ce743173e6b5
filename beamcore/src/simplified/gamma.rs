//! The gamma method.

use super::effect::Effect;
use super::layer::{self, LayerInput, LayerStress, ShearStress};
use super::length::ReferenceLength;
use super::warning::Warning;
use crate::error::{Error, ErrorKind, Problem, Result};
use crate::units::{BendingStiffness, Force, Length, Moment, ShearFlow, SlipModulus};

/// Two or three layers that slip on each other, by the gamma method.
///
/// One layer has gamma = 1: the middle one of three, the lower one of two (forces, stresses and
/// `EI_ef` would be the same if the upper one had it). The others have
/// `gamma_i` = 1/(1 + pi^2 `EA_i`/(`k_i` l^2)), with `k_i` = `K_i`/`s_i` the slip modulus per length
/// of the joint to that layer. With `z_n` = sum of `gamma_i` `EA_i` `z_i` over sum of `gamma_i`
/// `EA_i` and `a_i` = `z_i` - `z_n` (Annex B writes them as distances),
/// `EI_ef` = sum of (`EI_i` + `gamma_i` `EA_i` `a_i`^2).
///
/// Source: EN 1995-1-1:2004 Annex B (from memory), after Moehler 1956; gaps between the layers are
/// in the places of the centroids. Huber and Deix, Materials 14, 2021, 7211, show its local errors
/// under point loads.
///
/// # Examples
/// A slab on a joist:
/// ```
/// use beamcore::simplified::{Gamma, LayerInput, ReferenceLength};
/// use beamcore::units::{Number, SlipModulus};
/// let joist = LayerInput::rectangle(11.GPa(), 100.mm(), 220.mm(), 110.mm());
/// let slab = LayerInput::rectangle(31.GPa(), 600.mm(), 70.mm(), 255.mm());
/// let joint = SlipModulus::from_N_per_mm2(133.333);
/// let gamma = Gamma::of(&[joist, slab], &[joint], ReferenceLength::Span(6.m()))?;
/// assert_eq!(format!("{:.5}", gamma.factors()[1]), "0.27195");
/// assert_eq!(format!("{:.4}", gamma.bending_stiffness()), "4.5301 MN m2");
/// assert_eq!(format!("{:.2}", gamma.flows(9.kN())?[0].to_N_per_mm()), "41.41");
/// # Ok::<(), beamcore::Error>(())
/// ```
#[derive(Clone, Debug, PartialEq)]
pub struct Gamma {
    effect: Effect,
    factors: Vec<f64>,
    arms: Vec<Length>,
    base: usize,
    warnings: Vec<Warning>,
}

impl Gamma {
    /// Layers from the lowest upward, the slip modulus per length of each joint between two of
    /// them, and the length of the wave.
    ///
    /// # Errors
    /// All of: fewer than two layers or more than three, another number of joints than layers less
    /// one, sizes and stiffnesses that are not positive, slip moduli below zero, layers that are
    /// not in order.
    pub fn of(
        layers: &[LayerInput],
        joints: &[SlipModulus],
        length: ReferenceLength,
    ) -> Result<Self> {
        let mut problems = Vec::new();
        if !(2..=3).contains(&layers.len()) {
            problems.push(Problem::new(
                ErrorKind::Value,
                "layers",
                format!("{} layers", layers.len()),
                "two or three layers",
            ));
        }
        layer::check(&mut problems, layers, joints);
        length.check(&mut problems);
        Error::check(problems)?;
        let base = layers.len() - 2;
        let factor = |(i, layer): (usize, &LayerInput)| {
            if i == base {
                return 1.0;
            }
            let joint = joints[i.min(base)];
            1.0 / (1.0 + layer.axial.si() * length.wave() / joint.si())
        };
        let factors: Vec<f64> = layers.iter().enumerate().map(factor).collect();
        // From the base, whose own arm is then free of the rounding of a distant origin.
        let level = layers[base].centroid_z;
        let (mut sum, mut first) = (0.0, 0.0);
        for (layer, factor) in layers.iter().zip(&factors) {
            let weight = factor * layer.axial.si();
            sum += weight;
            first += weight * (layer.centroid_z - level).si();
        }
        let axis = Length::from_si(first / sum);
        let arms: Vec<_> = layers
            .iter()
            .map(|layer| (layer.centroid_z - level) - axis)
            .collect();
        let effective = factors.iter().zip(&arms).map(|(f, arm)| *arm * *f);
        Ok(Self {
            effect: Effect::new(layers, effective.collect())?,
            factors,
            arms,
            base,
            warnings: length.warnings(),
        })
    }

    /// The layers, from the lowest upward.
    #[must_use]
    pub fn layers(&self) -> &[LayerInput] {
        &self.effect.layers
    }

    /// The position of the layer with gamma = 1.
    #[must_use]
    pub const fn base_layer(&self) -> usize {
        self.base
    }

    /// `gamma_i` of each layer: 1 for a rigid joint, 0 for a loose one.
    #[must_use]
    pub fn factors(&self) -> &[f64] {
        &self.factors
    }

    /// `a_i` = `z_i` - `z_n` of each layer, positive above the axis.
    #[must_use]
    pub fn arms(&self) -> &[Length] {
        &self.arms
    }

    /// `EI_ef` = sum of (`EI_i` + `gamma_i` `EA_i` `a_i`^2).
    #[must_use]
    pub const fn bending_stiffness(&self) -> BendingStiffness {
        self.effect.bending
    }

    /// `N_i` = -`gamma_i` `EA_i` `a_i` M/`EI_ef` of each layer under a moment.
    ///
    /// # Errors
    /// [`ErrorKind::Value`] for a moment that is not finite.
    pub fn axial_forces(&self, moment: Moment) -> Result<Vec<Force>> {
        self.effect.axial_forces(moment)
    }

    /// The normal stresses of each layer under a moment: `sigma_i` = -`gamma_i` `E_i` `a_i`
    /// M/`EI_ef` and `sigma_m,i` = 0.5 `E_i` `h_i` M/`EI_ef`.
    ///
    /// # Errors
    /// [`ErrorKind::Value`] for a moment that is not finite.
    pub fn stresses(&self, moment: Moment) -> Result<Vec<LayerStress>> {
        self.effect.stresses(moment)
    }

    /// The flow of each joint under a shear force: the sum of `gamma_i` `EA_i` `a_i` of the layers
    /// above it times V/`EI_ef`, which of an outer layer is its own gamma E A a V/`EI_ef`.
    ///
    /// # Errors
    /// [`ErrorKind::Value`] for a shear force that is not finite.
    pub fn flows(&self, shear: Force) -> Result<Vec<ShearFlow>> {
        self.effect.flows(shear)
    }

    /// The force of a fastener of each joint under a shear force: `F_i` = flow x `s_i`, with `s_i`
    /// the spacing as of one row: with n rows, the spacing along the member over n.
    ///
    /// # Errors
    /// [`ErrorKind::Value`] for a shear force that is not finite, another number of spacings than
    /// joints, a spacing that is not positive.
    pub fn fastener_forces(&self, shear: Force, spacings: &[Length]) -> Result<Vec<Force>> {
        self.effect.fastener_forces(shear, spacings)
    }

    /// The greatest shear stress of each layer under a shear force: see [`ShearStress`], with
    /// `e_i` = `gamma_i` `a_i`. Annex B gives that of the layer with gamma = 1 for `z_n` within it:
    /// `tau_2` = (`gamma_3` `E_3` `A_3` `a_3` + 0.5 `E_2` `b_2` h^2) V/(`b_2` `EI_ef`), h being the
    /// distance of its lower edge from `z_n`.
    ///
    /// # Errors
    /// [`ErrorKind::Value`] for a shear force that is not finite.
    pub fn shear_stresses(&self, shear: Force) -> Result<Vec<ShearStress>> {
        self.effect.shear_stresses(shear)
    }

    /// Where the method holds.
    #[must_use]
    pub fn warnings(&self) -> &[Warning] {
        &self.warnings
    }
}
