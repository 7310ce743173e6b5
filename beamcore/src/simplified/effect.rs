//! What follows from the effective arms of layers, however they were found.

use super::layer::{LayerInput, LayerStress, ShearStress};
use crate::check;
use crate::error::{Error, ErrorKind, Problem, Result};
use crate::path;
use crate::units::{BendingStiffness, Force, Length, Moment, ShearFlow, Stress};

/// Layers with their effective arms e: the axial force of a layer is -EA e M/`EI_ef`.
#[derive(Clone, Debug, PartialEq)]
pub(super) struct Effect {
    pub layers: Vec<LayerInput>,
    pub arms: Vec<Length>,
    pub bending: BendingStiffness,
}

impl Effect {
    /// `EI_ef` = sum of (`EI_i` + `EA_i` `e_i` `z_i`). The sum of `EA_i` `e_i` is zero, so that the
    /// level from which z counts is free; it is here that of the lowest layer.
    pub fn new(layers: &[LayerInput], arms: Vec<Length>) -> Result<Self> {
        let level = layers[0].centroid_z;
        let stiffness = |(layer, arm): (&LayerInput, &Length)| {
            layer.bending.si() + layer.axial.si() * arm.si() * (layer.centroid_z - level).si()
        };
        let bending: f64 = layers.iter().zip(&arms).map(stiffness).sum();
        if !(bending.is_finite() && bending > 0.0) {
            return Err(Problem::new(
                ErrorKind::Numerical,
                "layers",
                format!("an effective bending stiffness of {bending} N m2"),
                "numbers whose products can be held in 64 bits",
            )
            .into());
        }
        Ok(Self {
            layers: layers.to_vec(),
            arms,
            bending: BendingStiffness::from_si(bending),
        })
    }

    pub fn axial_forces(&self, moment: Moment) -> Result<Vec<Force>> {
        let mut problems = Vec::new();
        check::finite(&mut problems, moment, "moment");
        Error::check(problems)?;
        let curvature = moment / self.bending;
        let force = |(layer, arm): (&LayerInput, &Length)| layer.axial * -(curvature * *arm);
        Ok(self.layers.iter().zip(&self.arms).map(force).collect())
    }

    pub fn stresses(&self, moment: Moment) -> Result<Vec<LayerStress>> {
        let forces = self.axial_forces(moment)?;
        let curvature = moment / self.bending;
        let stress = |(layer, force): (&LayerInput, Force)| LayerStress {
            axial: layer.modulus * (force / layer.axial),
            bending: layer.modulus * (curvature * (layer.height / 2.0)),
        };
        Ok(self.layers.iter().zip(forces).map(stress).collect())
    }

    /// The flow of each joint: V/`EI_ef` times the sum of EA e of the layers above it, or less that
    /// of the layers below it, whichever is the sum of smaller terms.
    pub fn flows(&self, shear: Force) -> Result<Vec<ShearFlow>> {
        let mut problems = Vec::new();
        check::finite(&mut problems, shear, "shear");
        Error::check(problems)?;
        let rate = shear.si() / self.bending.si();
        let pull = |(layer, arm): (&LayerInput, &Length)| layer.axial.si() * arm.si();
        let pulls: Vec<f64> = self.layers.iter().zip(&self.arms).map(pull).collect();
        let size = |pulls: &[f64]| pulls.iter().map(|pull| pull.abs()).sum::<f64>();
        let flow = |joint: usize| {
            let (below, above) = pulls.split_at(joint + 1);
            let sum = if size(above) <= size(below) {
                above.iter().sum::<f64>()
            } else {
                -below.iter().sum::<f64>()
            };
            ShearFlow::from_si(rate * sum)
        };
        Ok((0..pulls.len() - 1).map(flow).collect())
    }

    pub fn shear_stresses(&self, shear: Force) -> Result<Vec<ShearStress>> {
        let flows = self.flows(shear)?;
        let rate = shear.si() / self.bending.si();
        let below = std::iter::once(ShearFlow::ZERO).chain(flows);
        let stress = |((layer, arm), below): ((&LayerInput, &Length), ShearFlow)| {
            let (half, turn) = (layer.height / 2.0, -*arm);
            let place = turn.max(-half).min(half);
            let (from, to) = ((turn + half).si(), (turn - place).si());
            let own = layer.modulus.si() * (from - to) * (from + to) / 2.0 * rate;
            ShearStress {
                value: Stress::from_si(below.si() / layer.width.si() + own),
                z: layer.centroid_z + place,
            }
        };
        Ok(self
            .layers
            .iter()
            .zip(&self.arms)
            .zip(below)
            .map(stress)
            .collect())
    }

    /// F = flow x spacing of each joint.
    pub fn fastener_forces(&self, shear: Force, spacings: &[Length]) -> Result<Vec<Force>> {
        let flows = self.flows(shear)?;
        let mut problems = Vec::new();
        if spacings.len() != flows.len() {
            problems.push(Problem::new(
                ErrorKind::Value,
                "spacings",
                format!("{} spacings", spacings.len()),
                format!("as many as there are joints, which are {}", flows.len()),
            ));
        }
        for (j, spacing) in spacings.iter().enumerate() {
            check::positive(&mut problems, *spacing, &path::indexed("spacings", j));
        }
        Error::check(problems)?;
        let force = |(flow, spacing): (ShearFlow, &Length)| flow * *spacing;
        Ok(flows.into_iter().zip(spacings).map(force).collect())
    }
}
