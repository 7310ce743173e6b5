//! The law of a section: what its layers and joints give back for displacements and forces.
//!
//! The gradients theta' (one per strand), u' and s' are energetic to B, N and T. Layer i has the
//! axial strain u' + theta' z_i + sum of s' of the joints below it at its centroid, so with a_i the
//! factors in this sum and eps_i*, kappa_i* its free strain and curvature,
//!
//! f = C (e - e*), C = sum EA_i a_i a_i^T + EI_i on theta'. The free gradients e* are those under
//! which no layer has an axial force and no strand a moment: a_i . e* = eps_i* and
//! theta'* = -sum EI_i kappa_i*/sum EI_i. They are kept instead of forces C e*, because of these
//! next to nothing is left where joints are soft.
//!
//! Where axial force takes no part, N = 0 takes u' out: each a_i is then counted from the mean
//! weighted with EA. Joints give forces per length: slip modulus times slip, transverse modulus
//! times the difference of the deflections.

use super::states::States;
use nalgebra::DMatrix;

/// One layer at a place.
#[derive(Clone, Copy, Debug, PartialEq)]
pub(crate) struct PlainLayer {
    /// EA in N.
    pub(crate) axial: f64,
    /// EI about its own centroid in N m2; 0 for a layer that is not there.
    pub(crate) bending: f64,
    /// Height of its centroid in m.
    pub(crate) z: f64,
    /// 1/kGA in 1/N; 0 for a shear-rigid layer.
    pub(crate) shear_flexibility: f64,
    /// The strand that it moves with.
    pub(crate) strand: usize,
}

/// One joint that is not rigid, at a place.
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct PlainJoint {
    /// For each layer, whether it lies on the upper side.
    pub(crate) above: Vec<bool>,
    /// The layers that it joins: lower, upper.
    pub(crate) layers: [usize; 2],
    /// Their strands.
    pub(crate) strands: [usize; 2],
    /// Slip modulus per length in N/m2.
    pub(crate) modulus: f64,
    /// Transverse modulus per length in N/m2; it counts between two strands only.
    pub(crate) transverse: f64,
    /// Its height in m.
    pub(crate) z: f64,
}

/// The law of a section.
#[derive(Clone, Debug)]
pub(crate) struct Law {
    pub(crate) states: States,
    pub(crate) layers: Vec<PlainLayer>,
    /// C over the gradients.
    pub(crate) stiffness: DMatrix<f64>,
    /// Forces per length for displacements, over all displacements.
    pub(crate) joints: DMatrix<f64>,
    /// 1/kGA of each strand.
    pub(crate) shear_flexibility: Vec<f64>,
    /// The layer that lies above no joint: its slip is none.
    reference: usize,
    /// The lower and the upper layer of each joint.
    joined: Vec<[usize; 2]>,
}

impl Law {
    /// The law of layers and joints.
    pub(crate) fn new(states: States, layers: Vec<PlainLayer>, joints: &[PlainJoint]) -> Self {
        let gradients = states.half() - states.strands;
        let mut factors: Vec<Vec<f64>> = layers
            .iter()
            .enumerate()
            .map(|(i, layer)| factors_of(states, i, layer, joints))
            .collect();
        if !states.has_axial {
            centre(&mut factors, &layers);
        }
        let mut stiffness = DMatrix::zeros(gradients, gradients);
        let mut shear = vec![0.0; states.strands];
        let mut bending = vec![0.0; states.strands];
        for (layer, a) in layers.iter().zip(&factors) {
            for (i, ai) in a.iter().enumerate() {
                for (j, aj) in a.iter().enumerate() {
                    stiffness[(i, j)] += layer.axial * ai * aj;
                }
            }
            stiffness[(layer.strand, layer.strand)] += layer.bending;
            bending[layer.strand] += layer.bending;
            shear[layer.strand] += layer.bending * layer.bending * layer.shear_flexibility;
        }
        // By energy: each layer of a strand bears the share EI_i/sum of EI of the shear force.
        let shear_flexibility = shear
            .into_iter()
            .zip(bending)
            .map(|(shear, bending)| shear / (bending * bending))
            .collect();
        Self {
            states,
            stiffness,
            joints: joint_stiffness(states, joints),
            shear_flexibility,
            reference: (0..layers.len())
                .find(|&i| joints.iter().all(|joint| !joint.above[i]))
                .unwrap_or(0),
            joined: joints.iter().map(|joint| joint.layers).collect(),
            layers,
        }
    }

    /// The free gradients e* of free strains and curvatures at the centroids of the layers.
    pub(crate) fn free_gradients(&self, free: &[(f64, f64)]) -> Vec<f64> {
        let states = self.states;
        let strands = states.strands;
        let mut gradients = vec![0.0; states.half() - strands];
        let mut bending = vec![0.0; strands];
        for (layer, (_, curvature)) in self.layers.iter().zip(free) {
            gradients[layer.strand] -= layer.bending * curvature;
            bending[layer.strand] += layer.bending;
        }
        for (gradient, bending) in gradients.iter_mut().zip(bending) {
            *gradient /= bending;
        }
        // What each layer strains by beyond the rotation of its strand.
        let own: Vec<f64> = self
            .layers
            .iter()
            .zip(free)
            .map(|(layer, (strain, _))| strain - layer.z * gradients[layer.strand])
            .collect();
        if states.has_axial {
            gradients[states.axial() - strands] = own[self.reference];
        }
        for (j, [lower, upper]) in self.joined.iter().enumerate() {
            gradients[states.slip(j) - strands] = own[*upper] - own[*lower];
        }
        gradients
    }

    /// The rate in 1/m at which the fastest disturbance decays along the member.
    pub(crate) fn decay_rate(&self, flexibility: &DMatrix<f64>) -> f64 {
        let strands = self.states.strands;
        let mut slip = 0.0;
        let mut deflection = 0.0_f64;
        for j in 0..self.states.half() {
            let stiffness = self.joints[(j, j)];
            if j < strands {
                let bending = flexibility[(j, j)];
                let shear = stiffness * self.shear_flexibility[j];
                // Twice the stiffness, for the strands move against each other.
                deflection = deflection.max((2.0 * stiffness * bending).sqrt() + 2.0 * shear);
            } else {
                slip += stiffness * flexibility[(j - strands, j - strands)];
            }
        }
        slip.max(deflection).sqrt()
    }
}

/// The factors a_i of a layer over the gradients.
fn factors_of(states: States, i: usize, layer: &PlainLayer, joints: &[PlainJoint]) -> Vec<f64> {
    let strands = states.strands;
    let mut a = vec![0.0; states.half() - strands];
    a[layer.strand] = layer.z;
    if states.has_axial {
        a[states.axial() - strands] = 1.0;
    }
    for (j, joint) in joints.iter().enumerate() {
        if joint.above[i] {
            a[states.slip(j) - strands] = 1.0;
        }
    }
    a
}

/// Counts the factors from their mean weighted with EA.
fn centre(factors: &mut [Vec<f64>], layers: &[PlainLayer]) {
    let total: f64 = layers.iter().map(|layer| layer.axial).sum();
    for j in 0..factors[0].len() {
        let sum: f64 = layers
            .iter()
            .zip(&*factors)
            .map(|(layer, a)| layer.axial * a[j])
            .sum();
        for a in factors.iter_mut() {
            a[j] -= sum / total;
        }
    }
}

/// Forces per length for displacements. The slip at the height z of a joint between two strands
/// also grows with the difference of their rotations.
fn joint_stiffness(states: States, joints: &[PlainJoint]) -> DMatrix<f64> {
    let half = states.half();
    let mut stiffness = DMatrix::zeros(half, half);
    let mut add = |direction: &[(usize, f64)], modulus: f64| {
        for &(i, a) in direction {
            for &(j, b) in direction {
                stiffness[(i, j)] += modulus * a * b;
            }
        }
    };
    for (j, joint) in joints.iter().enumerate() {
        let [lower, upper] = joint.strands;
        let slip = states.slip(j);
        if lower == upper {
            add(&[(slip, 1.0)], joint.modulus);
        } else {
            let turn = |strand, z| (states.rotation(strand), z);
            add(
                &[(slip, 1.0), turn(upper, joint.z), turn(lower, -joint.z)],
                joint.modulus,
            );
            let sink = |strand, sign| (states.deflection(strand), sign);
            add(&[sink(upper, 1.0), sink(lower, -1.0)], joint.transverse);
        }
    }
    stiffness
}
