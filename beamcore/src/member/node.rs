//! The section at one place along a member, as the solver needs it.

use super::shear::ShearModel;
use crate::error::{ErrorKind, Problem, Result};
use crate::path;
use crate::section::{
    InitialStrain, PlacedPart, Section, Sideways, layer_shear_stiffness, side_by_side,
};
use crate::solve::law::{PlainJoint, PlainLayer};
use crate::time::Time;
#[cfg(feature = "document")]
use crate::units::{Length, ShearStiffness};
use std::sync::Arc;

/// A merged layer at a place and time.
#[derive(Clone, Copy, Debug, PartialEq)]
pub(crate) struct NodeLayer {
    pub(crate) axial: f64,
    /// EI about its own centroid; 0 where the layer is not there.
    pub(crate) bending: f64,
    pub(crate) y: f64,
    pub(crate) z: f64,
    /// The curvature about the upright axis that comes with a unit of that about the level axis.
    pub(crate) ratio: f64,
    pub(crate) shear_flexibility: f64,
    pub(crate) is_there: bool,
}

/// The section at a place.
#[derive(Clone, Debug)]
pub(crate) struct Node {
    pub(crate) section: Arc<Section>,
    pub(crate) x: f64,
    /// The merged layers on the first day and at the end.
    pub(crate) layers: [Vec<NodeLayer>; 2],
}

impl Node {
    /// The section at x of a member.
    pub(super) fn new(
        section: Arc<Section>,
        x: f64,
        sideways: Sideways,
        shear: ShearModel,
    ) -> Result<Self> {
        let [initial, end] = Time::ALL.map(|time| layers(&section, x, sideways, shear, time));
        Ok(Self {
            layers: [initial?, end?],
            section,
            x,
        })
    }

    /// The layers at a time.
    pub(crate) fn at(&self, time: Time) -> &[NodeLayer] {
        &self.layers[time.index()]
    }

    /// The height of the elastic centroid of all layers that are there.
    pub(crate) fn centroid_z(&self, time: Time) -> f64 {
        let (mut sum, mut total) = (0.0, 0.0);
        for layer in self.at(time).iter().filter(|layer| layer.is_there) {
            sum += layer.axial * layer.z;
            total += layer.axial;
        }
        sum / total
    }

    /// The merged layers as the solver takes them, with heights from `axis`.
    pub(super) fn plain_layers(&self, time: Time, axis: f64, strands: &[usize]) -> Vec<PlainLayer> {
        let plain = |(layer, &strand): (&NodeLayer, &usize)| PlainLayer {
            axial: layer.axial,
            bending: layer.bending,
            z: layer.z - axis,
            shear_flexibility: layer.shear_flexibility,
            strand,
        };
        self.at(time).iter().zip(strands).map(plain).collect()
    }

    /// The joints that are not rigid; `engaged` tells for each whether its clearance is used up.
    pub(super) fn plain_joints(
        &self,
        time: Time,
        axis: f64,
        strands: &[usize],
        engaged: impl Fn(usize) -> bool,
    ) -> Vec<PlainJoint> {
        let count = self.section.merged_layers().len();
        let joints = self.section.slips().iter().enumerate();
        joints
            .map(|(j, joint)| PlainJoint {
                above: (0..count).map(|i| joint.above.contains(&i)).collect(),
                layers: [joint.lower, joint.upper],
                strands: [strands[joint.lower], strands[joint.upper]],
                modulus: if engaged(j) {
                    joint.modulus_at(self.x, time)
                } else {
                    0.0
                },
                transverse: joint.transverse_at(self.x, time).unwrap_or(0.0),
                z: joint.z - axis,
            })
            .collect()
    }

    /// The free strain and curvature of each merged layer under free strains of the parts.
    pub(super) fn free(&self, time: Time, strains: &[InitialStrain]) -> Vec<(f64, f64)> {
        let merged = self.section.merged_layers();
        let layers = merged.iter().zip(self.at(time));
        layers
            .map(|(merged, layer)| {
                if !layer.is_there {
                    return (0.0, 0.0);
                }
                let (mut axial, mut bending) = (0.0, 0.0);
                for &p in merged.parts() {
                    if !self.section.is_there(p, self.x) {
                        continue;
                    }
                    let part = &self.section.placed()[p];
                    let (own, strain) = (part.net(), &strains[p]);
                    let e = part.material().modulus_at(time).si();
                    let force = own.area * strain.axial.si();
                    axial += e * force;
                    bending -= e
                        * (force * (own.z - layer.z)
                            - strain.curvature_y.si() * own.iyy
                            - strain.curvature_z.si() * own.iyz);
                }
                (axial / layer.axial, bending / layer.bending)
            })
            .collect()
    }

    /// The free strain of a merged layer; `strains` is empty where no part strains.
    pub(crate) fn free_strain(&self, time: Time, strains: &[InitialStrain], merged: usize) -> f64 {
        if strains.is_empty() {
            return 0.0;
        }
        self.free(time, strains)[merged].0
    }

    /// The free curvature of a merged layer.
    pub(crate) fn free_curvature(
        &self,
        time: Time,
        strains: &[InitialStrain],
        merged: usize,
    ) -> f64 {
        if strains.is_empty() {
            return 0.0;
        }
        self.free(time, strains)[merged].1
    }

    /// Whether no part creeps.
    pub(super) fn moduli_last(&self) -> bool {
        let moduli = |part: &PlacedPart| Time::ALL.map(|t| part.material().modulus_at(t));
        let same = |part: &PlacedPart| moduli(part)[0] == moduli(part)[1];
        self.section.placed().iter().all(same)
    }

    /// The mass per length of each merged layer in kg/m; densities are checked with the plan.
    pub(super) fn masses(&self) -> Vec<f64> {
        let mass = |part: &PlacedPart| part.line_mass().map_or(0.0, |mass| mass.si());
        self.section
            .merged_layers()
            .iter()
            .map(|merged| {
                let there = |p: &&usize| self.section.is_there(**p, self.x);
                let parts = merged.parts().iter().filter(there);
                parts.map(|&p| mass(&self.section.placed()[p])).sum()
            })
            .collect()
    }
}

fn layers(
    section: &Section,
    x: f64,
    sideways: Sideways,
    shear: ShearModel,
    time: Time,
) -> Result<Vec<NodeLayer>> {
    let whole = section.layer_stiffness(time);
    let there = section.layer_stiffness_at(x, time);
    let merged = section.merged_layers();
    let mut layers = Vec::with_capacity(whole.len());
    for ((whole, there), merged) in whole.iter().zip(&there).zip(merged) {
        let own = there.as_ref().unwrap_or(whole);
        let mut layer = NodeLayer {
            axial: own.axial,
            bending: own.bending,
            y: own.y,
            z: own.z,
            ratio: 0.0,
            shear_flexibility: 0.0,
            is_there: there.is_some(),
        };
        if sideways == Sideways::Free {
            let (bending, ratio) = section.stiffness(time).against_bending(sideways);
            layer.bending = bending.si();
            layer.ratio = ratio;
        }
        if layer.is_there {
            layer.shear_flexibility = match shear {
                ShearModel::Rigid => 0.0,
                ShearModel::Given(stiffness) => 1.0 / stiffness.si(),
                ShearModel::Flexible => 1.0 / layer_shear(section, merged.parts(), x, time)?,
            };
        } else {
            layer.bending = 0.0;
        }
        layers.push(layer);
    }
    Ok(layers)
}

/// kGA of the parts of a merged layer: glued over their height, but for given layers that rigid
/// joints hold side by side, at one height, which are only fastened.
fn layer_shear(section: &Section, parts: &[usize], x: f64, time: Time) -> Result<f64> {
    let groups: Vec<Vec<&PlacedPart>> = section
        .layers()
        .iter()
        .map(|layer| {
            let of_layer = |p: &&usize| {
                section.is_there(**p, x) && {
                    let name = section.placed()[**p].name();
                    layer.parts().iter().any(|part| part == name)
                }
            };
            let parts = parts.iter().filter(of_layer);
            parts.map(|&p| &section.placed()[p]).collect::<Vec<_>>()
        })
        .filter(|group| !group.is_empty())
        .collect();
    if let [only] = groups.as_slice() {
        return Ok(layer_shear_stiffness(only, time)?.si());
    }
    let stiffness = |group: &Vec<&PlacedPart>| section.stiffness_of_parts(group, time);
    let heights: Vec<_> = groups.iter().map(|g| stiffness(g).centroid_z()).collect();
    let height = |part: &&PlacedPart| (part.top() - part.bottom()).si();
    let size = groups.iter().flatten().map(height).fold(0.0, f64::max);
    if heights
        .iter()
        .all(|z| (*z - heights[0]).abs().si() < 1e-9 * size)
    {
        let own: Vec<f64> = groups
            .iter()
            .map(|group| Ok(layer_shear_stiffness(group, time)?.si()))
            .collect::<Result<_>>()?;
        let bending: Vec<f64> = groups
            .iter()
            .map(|g| stiffness(g).bending_yy().si())
            .collect();
        return Ok(side_by_side(&own, &bending));
    }
    let all: Vec<_> = groups.into_iter().flatten().collect();
    Ok(layer_shear_stiffness(&all, time)?.si())
}

/// The shear stiffness of a section at x along a member, of layers that slip that of parts which
/// each bear the share `EI_i`/sum of EI; `None` of a member that does not yield in shear.
#[cfg(feature = "document")]
pub(crate) fn shear_stiffness(
    section: &Section,
    x: Length,
    shear: ShearModel,
    time: Time,
) -> Result<Option<ShearStiffness>> {
    let given = match shear {
        ShearModel::Rigid => return Ok(None),
        ShearModel::Given(stiffness) => stiffness,
        ShearModel::Flexible => {
            let merged = section.merged_layers().iter();
            let there = section.layer_stiffness_at(x.si(), time);
            let (mut own, mut bending) = (Vec::new(), Vec::new());
            for (merged, there) in merged.zip(there) {
                if let Some(layer) = there {
                    own.push(layer_shear(section, merged.parts(), x.si(), time)?);
                    bending.push(layer.bending);
                }
            }
            ShearStiffness::from_si(side_by_side(&own, &bending))
        }
    };
    Ok(Some(given))
}

/// Shear stiffness can be given for a member of one layer only.
pub(super) fn given_shear_problem(section: &Section, shear: ShearModel) -> Option<Problem> {
    let ShearModel::Given(_) = shear else {
        return None;
    };
    (section.merged_layers().len() > 1).then(|| {
        Problem::new(
            ErrorKind::Value,
            path::key("member.shear", "given"),
            "one shear stiffness for layers that slip",
            "\"flexible\" or \"rigid\" for a section of layers",
        )
    })
}
