//! What a section says of its layers and joints.

use super::joint::Joint;
use super::layer::Layer;
use super::layering::{MergedLayer, ResolvedJoint, unknown_joint};
use super::placed::PlacedPart;
use super::placed_joint::{PlacedJoint, in_order};
use super::slip::{Slip, Spacing};
use super::stiffness::Stiffness;
use super::{JointKind, Section};
use crate::error::{ErrorKind, Problem, Result};
use crate::path;
use crate::time::Time;
use crate::units::Length;

/// The stiffness of one merged layer.
#[derive(Clone, Copy, Debug, PartialEq)]
pub(crate) struct LayerStiffness {
    /// EA in N.
    pub(crate) axial: f64,
    /// EI about the level axis through the layer's own elastic centroid, in N m2.
    pub(crate) bending: f64,
    /// The layer's own elastic centroid in the section's coordinates, in m.
    pub(crate) y: f64,
    /// As `y`.
    pub(crate) z: f64,
}

impl Section {
    /// The layers as given; of a section without layers, one named "section".
    #[must_use]
    pub fn layers(&self) -> &[Layer] {
        &self.layering.layers
    }

    /// The joints as given.
    #[must_use]
    pub fn joints(&self) -> &[Joint] {
        &self.layering.joints
    }

    /// The joints at their places, in the order given.
    #[must_use]
    pub fn placed_joints(&self) -> &[PlacedJoint] {
        &self.layering.placed_joints
    }

    /// The joint of a name, at its place.
    ///
    /// # Errors
    /// [`ErrorKind::Lookup`] if there is none.
    pub fn joint(&self, name: &str) -> Result<&PlacedJoint> {
        let found = |placed: &&PlacedJoint| placed.joint().name() == name;
        self.placed_joints()
            .iter()
            .find(found)
            .ok_or_else(|| unknown_joint(name, self.joints()).into())
    }

    /// The layers with those merged that rigid joints hold together, in the order of the first
    /// layer of each.
    #[must_use]
    pub fn merged_layers(&self) -> &[MergedLayer] {
        &self.layering.merged
    }
}

impl Section {
    /// The stiffness of each merged layer with all its parts.
    pub(crate) fn layer_stiffness(&self, time: Time) -> Vec<LayerStiffness> {
        self.merged_layers()
            .iter()
            .map(|merged| self.stiffness_of(merged.parts(), time))
            .collect()
    }

    /// The stiffness of each merged layer with those of its parts that are there at x; `None`
    /// where none of them is.
    pub(crate) fn layer_stiffness_at(&self, x: f64, time: Time) -> Vec<Option<LayerStiffness>> {
        let there = |merged: &MergedLayer| -> Vec<usize> {
            let parts = merged.parts().iter().copied();
            parts
                .filter(|&part| self.layering.is_there(part, x))
                .collect()
        };
        self.merged_layers()
            .iter()
            .map(there)
            .map(|parts| (!parts.is_empty()).then(|| self.stiffness_of(&parts, time)))
            .collect()
    }

    fn stiffness_of(&self, parts: &[usize], time: Time) -> LayerStiffness {
        let parts = parts.iter().map(|&part| &self.placed()[part]);
        let stiffness = Stiffness::new(parts, time);
        LayerStiffness {
            axial: stiffness.axial().si(),
            bending: stiffness.bending_yy().si(),
            y: stiffness.centroid_y().si(),
            z: stiffness.centroid_z().si(),
        }
    }

    /// The same section with all joints that are not rigid of one kind.
    pub(crate) fn with_joints(&self, kind: &JointKind) -> Result<Self> {
        let joints = self.joints().iter().map(|joint| {
            if *joint.kind() == JointKind::Rigid {
                joint.clone()
            } else {
                joint.of_kind(kind.clone())
            }
        });
        Self::layered(
            self.parts().to_vec(),
            self.layers().to_vec(),
            joints.collect::<Vec<_>>(),
        )
    }

    /// The stiffness of some of the parts, as if they were all.
    pub(crate) fn stiffness_of_parts(&self, parts: &[&PlacedPart], time: Time) -> Stiffness {
        Stiffness::new(parts.iter().copied(), time)
    }

    /// Whether the part at a position is there at x along the member.
    pub(crate) fn is_there(&self, part: usize, x: f64) -> bool {
        self.layering.is_there(part, x)
    }

    /// The merged layer of the part at a position.
    pub(crate) fn layer_of_part(&self, part: usize) -> usize {
        self.layering.merged_of_part(part)
    }

    /// The joints that are not rigid: a tree of the merged layers.
    pub(crate) fn slips(&self) -> &[ResolvedJoint] {
        &self.layering.slips
    }

    /// Where along the member a layer begins or ends or a modulus of a joint changes, from left to
    /// right, each once, in m.
    pub(crate) fn places(&self) -> Vec<f64> {
        let extents = self.layers().iter().filter_map(Layer::extent);
        let extents = extents.flat_map(|(from, to)| [from, to]);
        let moduli = self.placed_joints().iter().flat_map(PlacedJoint::places);
        let places = in_order(extents.chain(moduli));
        places.iter().map(|place| place.si()).collect()
    }

    /// Layers and bands that reach past the end of a member of this length.
    pub(crate) fn position_problems(&self, length: Length) -> Vec<Problem> {
        let mut problems = Vec::new();
        let mut check = |to: Length, base: &str| {
            if to > length {
                problems.push(Problem::new(
                    ErrorKind::Position,
                    path::key(base, "to"),
                    to.to_string(),
                    format!("a place within the member, up to {length}"),
                ));
            }
        };
        for layer in self.layers() {
            if let Some((_, to)) = layer.extent() {
                check(to, &Layer::path(layer.name()));
            }
        }
        for joint in self.joints() {
            let JointKind::Slipping(Slip::Fasteners {
                spacing: Spacing::Bands(bands),
                ..
            }) = joint.kind()
            else {
                continue;
            };
            let base = path::key(&Joint::path(joint.name()), "kind");
            let base = path::key(&path::key(&base, "fasteners"), "bands");
            for (i, band) in bands.iter().enumerate() {
                check(band.to, &path::indexed(&base, i));
            }
        }
        problems
    }
}
