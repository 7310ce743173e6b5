//! The layers and joints of a section, resolved: rigid joints merge layers, the others are a tree.

use super::joint::{Joint, JointKind};
use super::layer::Layer;
use super::placed::PlacedPart;
use super::placed_joint::PlacedJoint;
use super::tree::{self, Links};
use crate::error::{Error, ErrorKind, Problem, Result};
use crate::lookup;
use crate::time::Time;
use crate::units::Length;

/// Layers that rigid joints hold together: they act as one piece.
#[derive(Clone, Debug, PartialEq)]
pub struct MergedLayer {
    layers: Vec<String>,
    parts: Vec<usize>,
}

impl MergedLayer {
    /// The names of the layers as given, in their order.
    #[must_use]
    pub fn layers(&self) -> &[String] {
        &self.layers
    }

    /// The positions of its parts among those of the section.
    #[must_use]
    pub fn parts(&self) -> &[usize] {
        &self.parts
    }
}

/// A joint that is not rigid, among the merged layers.
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct ResolvedJoint {
    /// The position of the joint among those of the section.
    pub(crate) joint: usize,
    /// The merged layer below it.
    pub(crate) lower: usize,
    /// The merged layer above it.
    pub(crate) upper: usize,
    /// All merged layers on its upper side: those that hang on `upper` when the joint is cut.
    pub(crate) above: Vec<usize>,
    /// The height of the joint.
    pub(crate) z: f64,
    /// The width of the contact.
    pub(crate) width: f64,
    placed: PlacedJoint,
}

impl ResolvedJoint {
    /// The slip modulus at x in N/m2: 0 of a loose joint, outside of all bands and of the layers.
    pub(crate) fn modulus_at(&self, x: f64, time: Time) -> f64 {
        let modulus = self.placed.slip_modulus_at(Length::from_si(x), time);
        modulus.map_or(0.0, |modulus| modulus.si())
    }

    /// The modulus square to the member at x in N/m2; `None` where the layers share a deflection.
    pub(crate) fn transverse_at(&self, x: f64, time: Time) -> Option<f64> {
        let modulus = self.placed.transverse_modulus_at(Length::from_si(x), time);
        modulus.map(|modulus| modulus.si())
    }

    /// The clearance in m.
    pub(crate) fn clearance(&self) -> f64 {
        self.placed.clearance().si()
    }
}

/// The layers and joints of a section.
#[derive(Clone, Debug, PartialEq)]
pub(super) struct Layering {
    pub(super) layers: Vec<Layer>,
    pub(super) joints: Vec<Joint>,
    pub(super) placed_joints: Vec<PlacedJoint>,
    pub(super) merged: Vec<MergedLayer>,
    pub(super) slips: Vec<ResolvedJoint>,
    /// The layer, as given, of each part.
    layer_of_part: Vec<usize>,
}

impl Layering {
    /// One layer of all parts.
    pub(super) fn single(parts: &[PlacedPart]) -> Self {
        let layer = Layer::new("section", parts.iter().map(PlacedPart::name));
        Self::merged(vec![layer], Vec::new(), parts)
    }

    /// Layers and joints that [`super::layering_problems`] has nothing against.
    pub(super) fn of(layers: Vec<Layer>, joints: &[Joint], parts: &[PlacedPart]) -> Result<Self> {
        let mut problems = Vec::new();
        let mut placed_joints = Vec::new();
        for joint in joints {
            let [lower, upper] = [joint.lower(), joint.upper()].map(|name| {
                let layer = &layers[position(&layers, name)];
                (layer, parts_of(layer, parts))
            });
            match PlacedJoint::new(joint, (lower.0, &lower.1), (upper.0, &upper.1)) {
                Ok(placed) => placed_joints.push(placed),
                Err(more) => problems.extend(more),
            }
        }
        Error::check(problems)?;
        Ok(Self::merged(layers, placed_joints, parts))
    }

    /// The layers that have any of the kept parts, with the joints between them.
    pub(super) fn of_kept(&self, parts: &[PlacedPart]) -> Result<Self, Problem> {
        let is_kept = |name: &str| parts.iter().any(|part| part.name() == name);
        let layers: Vec<_> = self
            .layers
            .iter()
            .filter_map(|layer| layer.of_kept(is_kept))
            .collect();
        let has = |name: &str| layers.iter().any(|layer| layer.name() == name);
        let joints: Vec<_> = self
            .placed_joints
            .iter()
            .filter(|placed| has(placed.joint().lower()) && has(placed.joint().upper()))
            .cloned()
            .collect();
        let links = joints.iter().map(|placed| link(&layers, placed.joint()));
        let group = tree::groups(layers.len(), links);
        if let Some(apart) = group.iter().position(|group| *group > 0) {
            return Err(Problem::new(
                ErrorKind::Geometry,
                "section.layers",
                format!(
                    "the layers \"{}\" and \"{}\" without the layers that hold them together",
                    layers[0].name(),
                    layers[apart].name()
                ),
                "parts of layers that joints hold together",
            ));
        }
        Ok(Self::merged(layers, joints, parts))
    }

    fn merged(layers: Vec<Layer>, placed_joints: Vec<PlacedJoint>, parts: &[PlacedPart]) -> Self {
        let joints: Vec<_> = placed_joints.iter().map(|p| p.joint().clone()).collect();
        let links: Links = joints.iter().map(|joint| link(&layers, joint)).collect();
        let is_rigid = |joint: &Joint| *joint.kind() == JointKind::Rigid;
        let rigid = joints.iter().zip(&links).filter(|(j, _)| is_rigid(j));
        let group = tree::groups(layers.len(), rigid.map(|(_, link)| *link));
        let layer_of_part: Vec<_> = parts
            .iter()
            .map(|part| holder(&layers, part.name()))
            .collect();
        let count = group.iter().max().map_or(0, |last| last + 1);
        let merged = (0..count)
            .map(|wanted| MergedLayer {
                layers: (0..layers.len())
                    .filter(|&layer| group[layer] == wanted)
                    .map(|layer| layers[layer].name().to_owned())
                    .collect(),
                parts: (0..parts.len())
                    .filter(|&part| group[layer_of_part[part]] == wanted)
                    .collect(),
            })
            .collect();
        // Rigid joints taken out, the joints are links between the merged layers.
        let slipping: Vec<_> = (0..joints.len())
            .filter(|&j| !is_rigid(&joints[j]))
            .collect();
        let between: Links = slipping
            .iter()
            .map(|&joint| (group[links[joint].0], group[links[joint].1]))
            .collect();
        let slips = slipping
            .iter()
            .enumerate()
            .map(|(i, &joint)| ResolvedJoint {
                joint,
                lower: between[i].0,
                upper: between[i].1,
                above: tree::beyond(count, &between, i),
                z: placed_joints[joint].z().si(),
                width: placed_joints[joint].width().si(),
                placed: placed_joints[joint].clone(),
            })
            .collect();
        Self {
            layers,
            joints,
            placed_joints,
            merged,
            slips,
            layer_of_part,
        }
    }

    /// The merged layer of a part.
    pub(super) fn merged_of_part(&self, part: usize) -> usize {
        self.merged
            .iter()
            .position(|merged| merged.parts.contains(&part))
            .expect("every part is in a layer")
    }

    /// Whether a part is there at x.
    pub(super) fn is_there(&self, part: usize, x: f64) -> bool {
        self.layers[self.layer_of_part[part]].covers(x)
    }

    /// Notes on the parts of each layer that do not touch.
    pub(super) fn notes(&self, parts: &[PlacedPart]) -> Vec<String> {
        self.layers
            .iter()
            .flat_map(|layer| super::contact::notes(&parts_of(layer, parts)))
            .collect()
    }
}

fn parts_of<'a>(layer: &Layer, parts: &'a [PlacedPart]) -> Vec<&'a PlacedPart> {
    let is_in = |part: &&PlacedPart| layer.parts().iter().any(|name| name == part.name());
    parts.iter().filter(is_in).collect()
}

fn position(layers: &[Layer], name: &str) -> usize {
    layers
        .iter()
        .position(|layer| layer.name() == name)
        .expect("the layers of a joint are known")
}

fn link(layers: &[Layer], joint: &Joint) -> (usize, usize) {
    (
        position(layers, joint.lower()),
        position(layers, joint.upper()),
    )
}

fn holder(layers: &[Layer], part: &str) -> usize {
    layers
        .iter()
        .position(|layer| layer.parts().iter().any(|name| name == part))
        .expect("every part is in a layer")
}

/// A name that no joint bears.
pub(super) fn unknown_joint(name: &str, joints: &[Joint]) -> Problem {
    let names: Vec<_> = joints.iter().map(Joint::name).collect();
    lookup::unknown("joint", name, &names)
}
