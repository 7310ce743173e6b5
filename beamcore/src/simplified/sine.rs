//! Any number of slipping layers under a load in the form of half a sine wave.

use super::effect::Effect;
use super::layer::{self, LayerInput, LayerStress, ShearStress};
use super::length::ReferenceLength;
use super::warning::Warning;
use crate::error::{Error, ErrorKind, Problem, Result};
use crate::units::{BendingStiffness, Force, Length, Moment, ShearFlow, SlipModulus};

/// Any number of layers that slip on each other, under a load in the form of half a sine wave.
///
/// The layers bend alike, and each moves along x by a displacement of its own, in the form of a
/// cosine. With p = pi/l, effective arms `e_i` (so that `N_i` = -`EA_i` `e_i` M/`EI_ef`) and joints
/// j between the layers j and j + 1, `d_j` apart: `t_j` = `k_j` (`e_(j+1)` - `e_j` - `d_j`) and
/// p^2 `EA_i` `e_i` = `t_i` - `t_(i-1)`, with nothing beyond the outer layers;
/// `EI_ef` = sum of (`EI_i` + `EA_i` `e_i` `z_i`). Of two or three layers `e_i` is
/// `gamma_i` `a_i` of [`super::Gamma`].
///
/// Source: idea of Schelling 1982 (from memory); it is the exact solution for the sine load.
///
/// # Examples
/// Four boards on each other, joined alike:
/// ```
/// use beamcore::simplified::{LayerInput, ReferenceLength, SineLayers};
/// use beamcore::units::{Number, SlipModulus};
/// let board = |z: f64| LayerInput::rectangle(11.GPa(), 200.mm(), 40.mm(), z.mm());
/// let boards = [20.0, 60.0, 100.0, 140.0].map(board);
/// let joints = [SlipModulus::from_N_per_mm2(5.0); 3];
/// let beam = SineLayers::of(&boards, &joints, ReferenceLength::Span(4.m()))?;
/// let flows = beam.flows(2.kN())?;
/// assert!(flows[1] > flows[0]);
/// # Ok::<(), beamcore::Error>(())
/// ```
#[derive(Clone, Debug, PartialEq)]
pub struct SineLayers {
    effect: Effect,
    warnings: Vec<Warning>,
}

impl SineLayers {
    /// Layers from the lowest upward, the slip modulus per length of each joint between two of
    /// them, and the length of the wave.
    ///
    /// # Errors
    /// All of: no layer, another number of joints than layers less one, sizes and stiffnesses that
    /// are not positive, slip moduli below zero, layers that are not in order.
    pub fn of(
        layers: &[LayerInput],
        joints: &[SlipModulus],
        length: ReferenceLength,
    ) -> Result<Self> {
        let mut problems = Vec::new();
        if layers.is_empty() {
            problems.push(Problem::new(
                ErrorKind::Missing,
                "layers",
                "no layer",
                "at least one layer",
            ));
        } else {
            layer::check(&mut problems, layers, joints);
        }
        length.check(&mut problems);
        Error::check(problems)?;
        Ok(Self {
            effect: Effect::new(layers, arms(layers, joints, length))?,
            warnings: length.warnings(),
        })
    }

    /// The layers, from the lowest upward.
    #[must_use]
    pub fn layers(&self) -> &[LayerInput] {
        &self.effect.layers
    }

    /// The effective arm `e_i` of each layer, positive upward.
    #[must_use]
    pub fn arms(&self) -> &[Length] {
        &self.effect.arms
    }

    /// `EI_ef` = sum of (`EI_i` + `EA_i` `e_i` `z_i`).
    #[must_use]
    pub const fn bending_stiffness(&self) -> BendingStiffness {
        self.effect.bending
    }

    /// `N_i` = -`EA_i` `e_i` M/`EI_ef` of each layer under a moment.
    ///
    /// # Errors
    /// [`ErrorKind::Value`] for a moment that is not finite.
    pub fn axial_forces(&self, moment: Moment) -> Result<Vec<Force>> {
        self.effect.axial_forces(moment)
    }

    /// The normal stresses of each layer under a moment: `sigma_i` = `E_i` `N_i`/`EA_i` and
    /// `sigma_m,i` = 0.5 `E_i` `h_i` M/`EI_ef`.
    ///
    /// # Errors
    /// [`ErrorKind::Value`] for a moment that is not finite.
    pub fn stresses(&self, moment: Moment) -> Result<Vec<LayerStress>> {
        self.effect.stresses(moment)
    }

    /// The flow of each joint under a shear force: the sum of `EA_i` `e_i` of the layers above it
    /// times V/`EI_ef`.
    ///
    /// # Errors
    /// [`ErrorKind::Value`] for a shear force that is not finite.
    pub fn flows(&self, shear: Force) -> Result<Vec<ShearFlow>> {
        self.effect.flows(shear)
    }

    /// The force of a fastener of each joint under a shear force: flow x spacing, the spacing as of
    /// one row: with n rows, the spacing along the member over n.
    ///
    /// # Errors
    /// [`ErrorKind::Value`] for a shear force that is not finite, another number of spacings than
    /// joints, a spacing that is not positive.
    pub fn fastener_forces(&self, shear: Force, spacings: &[Length]) -> Result<Vec<Force>> {
        self.effect.fastener_forces(shear, spacings)
    }

    /// The greatest shear stress of each layer under a shear force: see [`ShearStress`].
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

/// The effective arms, from the forces between the layers: with s = -t, for each joint
/// (1/k + 1/c below + 1/c above) `s_j` - `s_(j-1)`/c below - `s_(j+1)`/c above = `d_j`, c = p^2 EA.
///
/// In this form with flexibilities neither soft nor stiff joints lose digits, and a loose joint
/// passes on nothing. The elimination needs no pivots and no differences: what is kept of a
/// diagonal term beside the next joint's is carried along as it is.
fn arms(layers: &[LayerInput], joints: &[SlipModulus], length: ReferenceLength) -> Vec<Length> {
    let wave = length.wave();
    let soft: Vec<f64> = layers
        .iter()
        .map(|layer| 1.0 / (wave * layer.axial.si()))
        .collect();
    // Forward: each row becomes s_j = share s_(j+1) + part; 1 - share is kept.
    let mut rows = Vec::with_capacity(joints.len());
    let (mut kept, mut part) = (1.0, 0.0);
    for (j, joint) in joints.iter().enumerate() {
        let distance = (layers[j + 1].centroid_z - layers[j].centroid_z).si();
        let beside = 1.0 / joint.si() + soft[j] * kept;
        let whole = beside + soft[j + 1];
        // A loose joint has an infinite flexibility, of which the other terms are no part.
        kept = if joint.si() == 0.0 {
            1.0
        } else {
            beside / whole
        };
        part = (distance + soft[j] * part) / whole;
        rows.push((soft[j + 1] / whole, part));
    }
    // Backward, with no force beyond the uppermost layer.
    let mut forces = vec![0.0; layers.len()];
    for (j, (share, part)) in rows.into_iter().enumerate().rev() {
        forces[j] = share * forces[j + 1] + part;
    }
    let mut below = 0.0;
    let mut arms = Vec::with_capacity(layers.len());
    for (soft, above) in soft.iter().zip(forces) {
        arms.push(Length::from_si(soft * (below - above)));
        below = above;
    }
    arms
}
