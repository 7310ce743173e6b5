//! The member laid out for the solver: stations, what each holds, sections over the pieces.

use super::mesh;
use super::node::Node;
use super::places::{Merged, places};
use super::plan::MemberPlan;
use super::references::{has_axial, strands};
use super::sections::Stretch;
use crate::error::{ErrorKind, Problem, Result};
use crate::path;
use crate::section::Section;
use crate::solve::beam::{Beam, Unsolvable};
use crate::solve::law::Law;
use crate::solve::piece::PieceLaw;
use crate::solve::states::States;
use crate::solve::station::{Hold, Station};
use crate::solve::varying::VaryingLaws;
use crate::time::Time;
use crate::units::Angle;
use std::sync::Arc;

/// Places closer than this share of the length are one station.
pub(crate) const SAME_PLACE: f64 = 1e-9;

/// What a hold of the member belongs to.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub(crate) enum HeldBy {
    /// A support, by its position, which holds this.
    Support(usize, Held),
    /// An anchor, by its position.
    Anchor(usize),
}

/// What a support holds.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub(crate) enum Held {
    /// The deflection of a strand.
    Deflection,
    /// The displacement along the axis.
    Axis,
    /// The rotation of a strand.
    Rotation,
    /// A layer along the member, by its position among those that it holds by themselves.
    Layer(usize),
}

/// A piece with the section along it: at one place where it does not change, else at the points of
/// collocation and at both ends.
#[derive(Clone, Debug)]
pub(crate) struct PieceNodes {
    pub(crate) nodes: Vec<Node>,
}

impl PieceNodes {
    /// Whether the section is the same all along.
    pub(crate) fn is_prismatic(&self) -> bool {
        self.nodes.len() == 1
    }
}

/// How a member stands: which one-way supports it has left, and which joints with clearance carry.
#[derive(Clone, Debug, Default, PartialEq)]
pub(crate) struct Situation {
    /// The positions of supports that the member has lifted off.
    pub(crate) lifted: Vec<usize>,
    /// Per joint with clearance, its position and where it carries. A joint that is not listed carries everywhere.
    pub(crate) engaged: Vec<(usize, Vec<Engaged>)>,
}

/// A stretch over which a joint with clearance carries.
#[derive(Clone, Copy, Debug, PartialEq)]
pub(crate) struct Engaged {
    pub(crate) from: f64,
    pub(crate) to: f64,
    /// The sign of the slip.
    pub(crate) sign: f64,
}

impl Situation {
    /// The sign of the slip with which a joint carries at a place; 0 where it does not, and 1 where
    /// it has no clearance.
    pub(crate) fn sign(&self, joint: usize, x: f64) -> f64 {
        match self.engaged.iter().find(|(j, _)| *j == joint) {
            None => 1.0,
            Some((_, stretches)) => stretches
                .iter()
                .find(|stretch| stretch.from <= x && x <= stretch.to)
                .map_or(0.0, |stretch| stretch.sign),
        }
    }
}

/// A member laid out.
#[derive(Clone, Debug)]
pub(crate) struct Layout {
    pub(crate) states: States,
    /// The strand of each merged layer.
    pub(crate) strands: Vec<usize>,
    /// The height from which the solver counts.
    pub(crate) axis: f64,
    /// Sine and cosine of the pitch.
    pub(crate) pitch: (f64, f64),
    pub(crate) places: Vec<f64>,
    pub(crate) pieces: Vec<PieceNodes>,
    /// Per station its holds, and what each belongs to.
    pub(super) holds: Vec<Vec<(Hold, HeldBy)>>,
    pub(super) releases: Vec<Vec<Vec<f64>>>,
    merged: Vec<Merged>,
}

impl Layout {
    /// Cuts the member at its ends, supports, hinges, changes of section, ends of bands and layers,
    /// loads, and at `more` places.
    pub(super) fn new(plan: &MemberPlan, sections: &[Stretch], more: &[f64]) -> Result<Self> {
        let first = sections[0].start();
        let (strand_count, strands) = strands(first);
        let states = States {
            strands: strand_count,
            has_axial: has_axial(plan),
            slips: first.slips().len(),
        };
        let axis = first.stiffness(Time::Initial).centroid_z().si();
        let pitch = plan.pitch_angle().map_or((0.0, 1.0), |angle: Angle| {
            let radians = angle.si();
            (crate::math::sin(radians), crate::math::cos(radians))
        });
        let (mut places, merged) = places(plan, sections, more);
        let mut pieces = Vec::new();
        let mut cut = vec![places[0]];
        for ends in places.windows(2) {
            let ends = [ends[0], ends[1]];
            let middle = f64::midpoint(ends[0], ends[1]);
            let stretch = sections
                .iter()
                .find(|s| middle < s.to)
                .unwrap_or(&sections[sections.len() - 1]);
            let make = |x: f64| {
                let section = stretch.at(x)?;
                Node::new(section, middle, plan.is_held(), plan.shear_model())
            };
            match stretch.constant() {
                Some(_) if states.strands == 1 => {
                    pieces.push(PieceNodes {
                        nodes: vec![make(middle)?],
                    });
                    cut.push(ends[1]);
                }
                _ => {
                    let corners = [make(ends[0])?, make(ends[1])?];
                    let laws = corners
                        .iter()
                        .flat_map(|node| Time::ALL.map(|t| law(node, t, states, axis, &strands)))
                        .collect::<Vec<_>>();
                    for ends in mesh::cuts(ends, &laws).windows(2) {
                        let points = mesh::points([ends[0], ends[1]]);
                        let nodes = points.map(make).collect::<Result<_>>()?;
                        pieces.push(PieceNodes { nodes });
                        cut.push(ends[1]);
                    }
                }
            }
        }
        places = cut;
        let mut layout = Self {
            states,
            strands,
            axis,
            pitch,
            holds: vec![Vec::new(); places.len()],
            releases: vec![Vec::new(); places.len()],
            places,
            pieces,
            merged,
        };
        layout.hold(plan, first)?;
        Ok(layout)
    }

    /// The direction in which a layer moves along the member at a height.
    pub(crate) fn along(&self, section: &Section, layer: usize, z: f64) -> Vec<f64> {
        let mut direction = vec![0.0; self.states.half()];
        direction[self.states.rotation(self.strands[layer])] = z - self.axis;
        if self.states.has_axial {
            direction[self.states.axial()] = 1.0;
        }
        for (j, joint) in section.slips().iter().enumerate() {
            if joint.above.contains(&layer) {
                direction[self.states.slip(j)] = 1.0;
            }
        }
        direction
    }

    /// The law at a node with all joints carrying.
    pub(super) fn law_of(&self, node: &Node, time: Time) -> Law {
        law(node, time, self.states, self.axis, &self.strands)
    }

    /// The layer that loads enter if none is named: the highest one where all layers share one
    /// deflection, else the first.
    pub(crate) fn entered_layer(&self, section: &Section) -> usize {
        if self.states.strands > 1 {
            return 0;
        }
        let heights = section.layer_stiffness(Time::Initial);
        let mut highest = 0;
        for (i, layer) in heights.iter().enumerate() {
            if layer.z > heights[highest].z {
                highest = i;
            }
        }
        highest
    }

    /// Whether nothing changes with time: neither a material nor a joint creeps.
    pub(super) fn lasts(&self) -> bool {
        let joints = |node: &Node, time: Time| -> Vec<(f64, Option<f64>)> {
            let joints = node.section.slips().iter();
            joints
                .map(|j| (j.modulus_at(node.x, time), j.transverse_at(node.x, time)))
                .collect()
        };
        self.pieces
            .iter()
            .flat_map(|piece| &piece.nodes)
            .all(|node| {
                node.layers[0] == node.layers[1]
                    && joints(node, Time::Initial) == joints(node, Time::Final)
                    && node.moduli_last()
            })
    }

    /// What each hold belongs to, in the order of the solver, with its station.
    pub(crate) fn held_by(&self) -> impl Iterator<Item = (usize, HeldBy)> {
        let stations = self.holds.iter().enumerate();
        stations.flat_map(|(k, holds)| holds.iter().map(move |(_, by)| (k, *by)))
    }

    /// The member's equations at a time, standing as told.
    pub(crate) fn beam(
        &self,
        time: Time,
        situation: &Situation,
        plan: &MemberPlan,
    ) -> Result<Beam> {
        let stations: Vec<Station> = self
            .holds
            .iter()
            .zip(&self.releases)
            .map(|(holds, releases)| Station {
                holds: holds
                    .iter()
                    .map(|(hold, by)| match by {
                        HeldBy::Support(i, Held::Deflection) if situation.lifted.contains(i) => {
                            Hold {
                                stiffness: 0.0,
                                ..hold.clone()
                            }
                        }
                        _ => hold.clone(),
                    })
                    .collect(),
                releases: releases.clone(),
            })
            .collect();
        let mut known: Vec<(usize, Vec<u64>, Arc<Law>)> = Vec::new();
        let laws: Vec<PieceLaw> = self
            .pieces
            .iter()
            .map(|piece| self.piece_law(piece, time, situation, &mut known))
            .collect();
        Beam::new(self.states, self.places.clone(), stations, &laws)
            .map_err(|why| self.unsolvable(why, plan).into())
    }

    fn piece_law(
        &self,
        piece: &PieceNodes,
        time: Time,
        situation: &Situation,
        known: &mut Vec<(usize, Vec<u64>, Arc<Law>)>,
    ) -> PieceLaw {
        let make = |node: &Node| {
            let layers = node.plain_layers(time, self.axis, &self.strands);
            let engaged = |j: usize| situation.sign(j, node.x) != 0.0;
            let joints = node.plain_joints(time, self.axis, &self.strands, engaged);
            (layers, joints)
        };
        if !piece.is_prismatic() {
            let laws: Vec<Law> = piece
                .nodes
                .iter()
                .map(|node| {
                    let (layers, joints) = make(node);
                    Law::new(self.states, layers, &joints)
                })
                .collect();
            return PieceLaw::Varying(Arc::new(VaryingLaws::new(laws)));
        }
        // Pieces of one section whose layers and joints are alike share one law.
        let node = &piece.nodes[0];
        let section = Arc::as_ptr(&node.section) as usize;
        let (layers, joints) = make(node);
        let key: Vec<u64> = joints
            .iter()
            .map(|joint| joint.modulus)
            .chain(layers.iter().map(|layer| layer.bending))
            .map(f64::to_bits)
            .collect();
        if let Some((_, _, law)) = known.iter().find(|(s, k, _)| *s == section && *k == key) {
            return PieceLaw::Prismatic(Arc::clone(law));
        }
        let law = Arc::new(Law::new(self.states, layers, &joints));
        known.push((section, key, Arc::clone(&law)));
        PieceLaw::Prismatic(law)
    }

    /// What the stations demand of deflection and rotation, for a member of one strand.
    pub(crate) fn bending_stations(&self) -> Vec<Station> {
        let half = States::BENDING.half();
        let cut = |direction: &[f64]| direction[..half].to_vec();
        let hold = |(hold, _): &(Hold, HeldBy)| Hold {
            direction: cut(&hold.direction),
            stiffness: hold.stiffness,
        };
        let stations = self.holds.iter().zip(&self.releases);
        stations
            .map(|(holds, releases)| Station {
                holds: holds.iter().map(hold).collect(),
                releases: releases.iter().map(|r| cut(r)).collect(),
            })
            .collect()
    }

    pub(crate) fn unsolvable(&self, why: Unsolvable, plan: &MemberPlan) -> Problem {
        match why {
            Unsolvable::Free(motion) => Problem::new(
                ErrorKind::Mechanism,
                "member.supports",
                format!("a member that is {motion}"),
                "supports that hold it, for example a second one",
            ),
            Unsolvable::HeldTwice(station) => {
                let x = self.places[station];
                let support = plan
                    .supports()
                    .iter()
                    .find(|support| (support.at().si() - x).abs() <= SAME_PLACE * x.abs());
                let at = support.map_or_else(
                    || "member.supports".into(),
                    |support| path::named("member.supports", support.name()),
                );
                Problem::new(
                    ErrorKind::Duplicate,
                    at,
                    format!("one movement that is held or released twice at {x} m"),
                    "each movement held, or released, once",
                )
            }
        }
    }

    /// A note for each pair of places that became one station.
    pub(super) fn notes(&self) -> Vec<String> {
        self.merged
            .iter()
            .map(|&(place, station)| {
                format!("The place {place} m was merged with the station at {station} m, closer than 1e-9 of the length")
            })
            .collect()
    }
}

/// The law at a node with all joints carrying.
fn law(node: &Node, time: Time, states: States, axis: f64, strands: &[usize]) -> Law {
    let layers = node.plain_layers(time, axis, strands);
    let joints = node.plain_joints(time, axis, strands, |_| true);
    Law::new(states, layers, &joints)
}
