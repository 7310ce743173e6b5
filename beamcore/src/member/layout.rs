//! The member laid out for the solver: stations, what each holds, sections over the pieces.

use super::hinge::Release;
use super::mesh;
use super::node::Node;
use super::plan::MemberPlan;
use super::sections::Stretch;
use super::support::{Support, SupportKind};
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
    /// Per joint with clearance, its position and where it carries: stretches with the sign of the
    /// slip. A joint that is not listed carries everywhere.
    pub(crate) engaged: Vec<(usize, Vec<(f64, f64, f64)>)>,
}

impl Situation {
    /// The sign of the slip with which a joint carries at a place; 0 where it does not, and 1 where
    /// it has no clearance.
    pub(crate) fn sign(&self, joint: usize, x: f64) -> f64 {
        match self.engaged.iter().find(|(j, _)| *j == joint) {
            None => 1.0,
            Some((_, stretches)) => stretches
                .iter()
                .find(|(from, to, _)| *from <= x && x <= *to)
                .map_or(0.0, |(_, _, sign)| *sign),
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
    holds: Vec<Vec<(Hold, HeldBy)>>,
    releases: Vec<Vec<Vec<f64>>>,
    merged: Vec<(f64, f64)>,
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

    /// Sets what supports and anchors hold and what hinges release.
    fn hold(&mut self, plan: &MemberPlan, section: &Section) -> Result<()> {
        for (i, support) in plan.supports().iter().enumerate() {
            let station = nearest(&self.places, support.at().si());
            for (hold, held) in self.support_holds(support, section)? {
                self.holds[station].push((hold, HeldBy::Support(i, held)));
            }
        }
        for (i, anchor) in plan.anchors().iter().enumerate() {
            let station = nearest(&self.places, anchor.at.si());
            let joint = slip_of(
                section,
                &anchor.joint,
                &path::named("member.anchors", &anchor.name),
            )?;
            let mut direction = vec![0.0; self.states.half()];
            direction[self.states.slip(joint)] = 1.0;
            let stiffness = anchor.stiffness.map_or(f64::INFINITY, |k| k.si());
            let hold = Hold {
                direction,
                stiffness,
            };
            self.holds[station].push((hold, HeldBy::Anchor(i)));
        }
        for (i, hinge) in plan.hinges().iter().enumerate() {
            let station = nearest(&self.places, hinge.at().si());
            let at = path::indexed("member.hinges", i);
            let mut direction = vec![0.0; self.states.half()];
            match hinge.release() {
                Release::Shear => {
                    for strand in 0..self.states.strands {
                        let mut direction = direction.clone();
                        direction[self.states.deflection(strand)] = 1.0;
                        self.releases[station].push(direction);
                    }
                }
                Release::Moment(None) => {
                    for strand in 0..self.states.strands {
                        let mut direction = direction.clone();
                        direction[self.states.rotation(strand)] = 1.0;
                        self.releases[station].push(direction);
                    }
                }
                Release::Moment(Some(layer)) => {
                    let layer = merged_layer(section, layer, &at)?;
                    direction[self.states.rotation(self.strands[layer])] = 1.0;
                    self.releases[station].push(direction);
                }
                Release::Butt(layer) => {
                    let layer = merged_layer(section, layer, &at)?;
                    let butt = self.butt(section, layer);
                    self.releases[station].push(butt);
                }
            }
        }
        Ok(())
    }

    /// The displacements that part where a layer is butted: its own along the member.
    fn butt(&self, section: &Section, layer: usize) -> Vec<f64> {
        let mut direction = vec![0.0; self.states.half()];
        let mut is_reference = true;
        for (j, joint) in section.slips().iter().enumerate() {
            if joint.upper == layer {
                direction[self.states.slip(j)] += 1.0;
            }
            if joint.lower == layer {
                direction[self.states.slip(j)] -= 1.0;
            }
            is_reference &= !joint.above.contains(&layer);
        }
        if is_reference && self.states.has_axial {
            direction[self.states.axial()] = 1.0;
        }
        direction
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

    fn support_holds(&self, support: &Support, section: &Section) -> Result<Vec<(Hold, Held)>> {
        let base = path::named("member.supports", support.name());
        let named = path::key(&base, "under");
        let layers: Vec<usize> = support
            .layers()
            .iter()
            .map(|name| merged_layer(section, name, &named))
            .collect::<Result<_>>()?;
        let mut strands: Vec<usize> = layers.iter().map(|&layer| self.strands[layer]).collect();
        if strands.is_empty() {
            strands = (0..self.states.strands).collect();
        }
        strands.sort_unstable();
        strands.dedup();
        let (sine, cosine) = self.pitch;
        let mut holds = Vec::new();
        for &strand in &strands {
            let mut direction = vec![0.0; self.states.half()];
            direction[self.states.deflection(strand)] = cosine;
            if self.states.has_axial && sine != 0.0 {
                direction[self.states.axial()] = -sine;
            }
            let stiffness = support.given_spring().map_or(f64::INFINITY, |k| k.si());
            holds.push((
                Hold {
                    direction,
                    stiffness,
                },
                Held::Deflection,
            ));
        }
        if self.states.has_axial && support.holds_axis() {
            let layer = layers.first().copied().unwrap_or(0);
            let height = support.given_height().map_or(self.axis, |z| z.si());
            let mut direction = self.along(section, layer, height);
            for number in &mut direction {
                *number *= cosine;
            }
            direction[self.states.deflection(strands[0])] += sine;
            let stiffness = support.given_axial_spring();
            holds.push((
                Hold {
                    direction,
                    stiffness: stiffness.map_or(f64::INFINITY, |k| k.si()),
                },
                Held::Axis,
            ));
        }
        if support.holds_rotation() {
            for &strand in &strands {
                let mut direction = vec![0.0; self.states.half()];
                direction[self.states.rotation(strand)] = 1.0;
                let stiffness = match (support.kind(), support.given_rotational_spring()) {
                    (_, Some(k)) => k.si(),
                    (SupportKind::Fixed, None) => f64::INFINITY,
                    (SupportKind::Pin | SupportKind::Roller, None) => 0.0,
                };
                let hold = Hold {
                    direction,
                    stiffness,
                };
                holds.push((hold, Held::Rotation));
            }
        }
        for (i, held) in support.held_layers().iter().enumerate() {
            let layer = merged_layer(section, &held.layer, &path::key(&base, "holding"))?;
            let hold = Hold {
                direction: self.along(section, layer, held.height.si()),
                stiffness: f64::INFINITY,
            };
            holds.push((hold, Held::Layer(i)));
        }
        Ok(holds)
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

    fn unsolvable(&self, why: Unsolvable, plan: &MemberPlan) -> Problem {
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
                    "each movement held once: rotation, and a layer at no more than one height",
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

/// Whether axial force takes part.
fn has_axial(plan: &MemberPlan) -> bool {
    let holds = plan
        .supports()
        .iter()
        .filter(|support| support.holds_axis());
    let loads = plan.actions().iter().flat_map(|action| action.loads());
    holds.count() > 1
        || plan.pitch_angle().is_some_and(|angle| angle.si() != 0.0)
        || loads.into_iter().any(super::Load::is_axial)
        || plan
            .supports()
            .iter()
            .any(|s| !s.held_layers().is_empty() || s.given_axial_spring().is_some())
}

/// The strands: merged layers that share a deflection. The first layer's is the first.
pub(super) fn strands(section: &Section) -> (usize, Vec<usize>) {
    let count = section.merged_layers().len();
    let mut strand: Vec<usize> = (0..count).collect();
    for joint in section.slips() {
        if joint.transverse_at(0.0, Time::Initial).is_none() {
            let (a, b) = (strand[joint.lower], strand[joint.upper]);
            let (low, high) = (a.min(b), a.max(b));
            for s in &mut strand {
                if *s == high {
                    *s = low;
                }
            }
        }
    }
    let mut found: Vec<usize> = strand.clone();
    found.sort_unstable();
    found.dedup();
    let position = |s: &usize| found.binary_search(s).unwrap_or_default();
    (found.len(), strand.iter().map(position).collect())
}

/// The merged layer that a named layer is in.
pub(crate) fn merged_layer(section: &Section, name: &str, at: &str) -> Result<usize> {
    let merged = section.merged_layers();
    let found = merged
        .iter()
        .position(|layer| layer.layers().iter().any(|own| own == name));
    found.ok_or_else(|| {
        let names: Vec<_> = section
            .layers()
            .iter()
            .map(crate::section::Layer::name)
            .collect();
        Problem::new(
            ErrorKind::Name,
            at,
            format!("the unknown layer \"{name}\""),
            format!("one of the layers {}", crate::lookup::listed(&names)),
        )
        .into()
    })
}

/// The slip of a named joint.
pub(crate) fn slip_of(section: &Section, name: &str, at: &str) -> Result<usize> {
    let joints = section.joints();
    let found = section
        .slips()
        .iter()
        .position(|slip| joints[slip.joint].name() == name);
    found.ok_or_else(|| {
        let names: Vec<_> = section
            .slips()
            .iter()
            .map(|slip| joints[slip.joint].name())
            .collect();
        let expected = if names.is_empty() {
            "a section with a joint that slips".into()
        } else {
            format!(
                "one of the joints that slip: {}",
                crate::lookup::listed(&names)
            )
        };
        Problem::new(
            ErrorKind::Name,
            at,
            format!("the joint \"{name}\", which does not slip or is not there"),
            expected,
        )
        .into()
    })
}

/// All places where something changes, and those that were merged.
fn places(plan: &MemberPlan, sections: &[Stretch], more: &[f64]) -> (Vec<f64>, Vec<(f64, f64)>) {
    let length = plan.length().si();
    let slack = length * SAME_PLACE;
    let supports = plan.supports().iter().map(|support| support.at().si());
    let changes = sections.iter().flat_map(|s| [s.from, s.to]);
    let own = sections.iter().flat_map(|s| s.start().places());
    let hinges = plan.hinges().iter().map(|hinge| hinge.at().si());
    let anchors = plan.anchors().iter().map(|anchor| anchor.at.si());
    let loads = plan
        .actions()
        .iter()
        .flat_map(|action| action.loads())
        .flat_map(super::Load::places)
        .map(|place| place.si());
    // Ends and supports keep their exact places; others give way to them.
    let lasting = [0.0, length]
        .into_iter()
        .chain(supports)
        .map(|place| (place, false));
    let rest = changes.chain(own).chain(hinges).chain(anchors).chain(loads);
    let rest = rest.chain(more.iter().copied()).map(|place| (place, true));
    let mut places: Vec<_> = lasting.chain(rest).collect();
    places.sort_by(|a, b| a.0.total_cmp(&b.0));
    let mut merged = Vec::new();
    let mut kept: Vec<(f64, bool)> = Vec::with_capacity(places.len());
    for place in places {
        match kept.last_mut() {
            Some(last) if place.0 - last.0 <= slack => {
                let (stays, goes) = if last.1 {
                    (place, *last)
                } else {
                    (*last, place)
                };
                if stays.0 != goes.0 {
                    merged.push((goes.0, stays.0));
                }
                *last = stays;
            }
            _ => kept.push(place),
        }
    }
    (kept.into_iter().map(|place| place.0).collect(), merged)
}

/// The index of the station nearest to a place.
pub(super) fn nearest(stations: &[f64], place: f64) -> usize {
    let after = stations
        .partition_point(|&station| station < place)
        .min(stations.len() - 1);
    let before = after.saturating_sub(1);
    if place - stations[before] < stations[after] - place {
        before
    } else {
        after
    }
}
