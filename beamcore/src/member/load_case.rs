//! The loads of an action, laid out on the stations of a member.

use super::action::Action;
use super::case::Case;
use super::layout::{Held, HeldBy, Layout, Situation};
use super::load::Load;
use super::places::nearest;
use super::plan::MemberPlan;
use crate::constants::GRAVITY;
use crate::section::InitialStrain;
use crate::solve::beam::Beam;
use crate::time::Time;
use crate::units::Length;

/// Builds a case on a laid out member.
pub(super) struct Builder<'a> {
    pub(super) layout: &'a Layout,
    plan: &'a MemberPlan,
    pub(super) time: Time,
    pub(super) case: Case,
}

/// The loads of one action at a time.
pub(crate) fn load_case(
    layout: &Layout,
    plan: &MemberPlan,
    beam: &Beam,
    action: &Action,
    time: Time,
) -> Case {
    let mut builder = Builder::new(layout, plan, beam, time);
    let layer = action.layer().and_then(|name| {
        let merged = plan.section().merged_layers();
        merged
            .iter()
            .position(|m| m.layers().iter().any(|l| l == name))
    });
    let layer = layer.unwrap_or_else(|| layout.entered_layer(plan.section()));
    for load in action.loads() {
        builder.add(load, layer);
    }
    builder.finish()
}

/// The initial strains of the parts; `None` if there are none.
pub(crate) fn initial_strains(
    layout: &Layout,
    plan: &MemberPlan,
    beam: &Beam,
    time: Time,
) -> Option<Case> {
    let strained = layout.pieces.iter().any(|piece| {
        let parts = piece.nodes[0].section.placed();
        parts
            .iter()
            .any(|p| p.initial_strain() != InitialStrain::NONE)
    });
    strained.then(|| {
        let mut builder = Builder::new(layout, plan, beam, time);
        builder.strain(|_, part| part.initial_strain());
        builder.finish()
    })
}

/// What the clearances of joints take off the forces where they carry: k c, with the sign of slip.
pub(crate) fn clearance_case(
    layout: &Layout,
    plan: &MemberPlan,
    beam: &Beam,
    time: Time,
    situation: &Situation,
) -> Case {
    let mut builder = Builder::new(layout, plan, beam, time);
    for (k, piece) in layout.pieces.iter().enumerate() {
        let node = &piece.nodes[0];
        for (j, joint) in node.section.slips().iter().enumerate() {
            let clearance = joint.clearance();
            if clearance > 0.0 {
                let force = joint.modulus_at(node.x, time) * clearance;
                let slip = layout.states.slip(j);
                builder.line(k, slip, [force * situation.sign(j, node.x); 2]);
            }
        }
    }
    builder.finish()
}

impl<'a> Builder<'a> {
    fn new(layout: &'a Layout, plan: &'a MemberPlan, beam: &Beam, time: Time) -> Self {
        let mut loads = beam.no_load();
        let (half, strands) = (layout.states.half(), layout.states.strands);
        for (piece, numbers) in layout.pieces.iter().zip(&mut loads.at_nodes) {
            if !piece.is_prismatic() {
                numbers.resize(piece.nodes.len() * (2 * half - strands), 0.0);
            }
        }
        Self {
            layout,
            plan,
            time,
            case: Case {
                loads,
                strains: Vec::new(),
                entered: vec![vec![[0.0; 2]; layout.pieces.len()]; layout.strands.len()],
            },
        }
    }

    fn finish(self) -> Case {
        self.case
    }

    fn add(&mut self, load: &Load, layer: usize) {
        let (first, last) = (Length::ZERO, self.plan.length());
        let whole = [first, last];
        match load {
            Load::SelfWeight => self.self_weight(),
            Load::Uniform { load } => self.spread(layer, whole, [load.si(); 2]),
            Load::Partial { load, from, to } => self.spread(layer, [*from, *to], [load.si(); 2]),
            Load::Trapezoidal {
                load_from,
                load_to,
                from,
                to,
            } => self.spread(layer, [*from, *to], [load_from.si(), load_to.si()]),
            Load::Area {
                load,
                tributary_width,
                stretch,
            } => {
                let ends = stretch.map_or(whole, |(from, to)| [from, to]);
                self.spread(layer, ends, [(*load * *tributary_width).si(); 2]);
            }
            Load::Plan { load, stretch } => {
                let ends = stretch.map_or(whole, |(from, to)| [from, to]);
                self.spread(layer, ends, [load.si() * self.layout.pitch.1; 2]);
            }
            Load::Point { load, at } => {
                let station = nearest(&self.layout.places, at.si());
                let (sine, cosine) = self.layout.pitch;
                let w = self.layout.states.deflection(self.layout.strands[layer]);
                self.outside(station, w, load.si() * cosine);
                if sine != 0.0 {
                    let z = self.centroid(station, layer);
                    self.push(station, layer, z, -load.si() * sine);
                }
            }
            Load::Couple { couple, at } => {
                let station = nearest(&self.layout.places, at.si());
                let theta = self.layout.states.rotation(self.layout.strands[layer]);
                self.outside(station, theta, couple.si());
            }
            Load::Axial { load, at, height } => {
                let station = nearest(&self.layout.places, at.si());
                self.push(station, layer, height.si(), load.si());
            }
            Load::Prestress { force, tendon } => self.prestress(layer, force.si(), tendon),
            Load::Settlement {
                support,
                settlement,
            } => self.moved(support, Held::Deflection, settlement.si()),
            Load::ImposedRotation { support, rotation } => {
                self.moved(support, Held::Rotation, rotation.si());
            }
            Load::Temperature { change, parts } => self.warm(*change, parts),
            Load::TemperatureDifference { difference } => self.gradient(*difference),
            Load::Strain { part, strain } => self.strain(|_, placed| {
                if placed.name() == part {
                    *strain
                } else {
                    InitialStrain::NONE
                }
            }),
        }
    }

    /// Adds to the load per length on a displacement over a piece, at its two ends.
    pub(super) fn line(&mut self, piece: usize, displacement: usize, [left, right]: [f64; 2]) {
        let half = self.layout.states.half();
        self.case.loads.line[2 * half * piece + displacement] += left;
        self.case.loads.line[2 * half * piece + half + displacement] += right;
    }

    /// Adds to the outside force on a displacement at a station.
    pub(super) fn outside(&mut self, station: usize, displacement: usize, force: f64) {
        let half = self.layout.states.half();
        self.case.loads.outside[half * station + displacement] += force;
    }

    /// A force along the member on a layer at a height.
    pub(super) fn push(&mut self, station: usize, layer: usize, z: f64, force: f64) {
        let direction = self.layout.along(self.plan.section(), layer, z);
        for (i, factor) in direction.into_iter().enumerate() {
            self.outside(station, i, force * factor);
        }
    }

    /// The height of the centroid of a layer right of a station.
    fn centroid(&self, station: usize, layer: usize) -> f64 {
        let piece = station.min(self.layout.pieces.len() - 1);
        self.layout.pieces[piece].nodes[0].at(Time::Initial)[layer].z
    }

    /// A vertical load per length of the member on a layer over a piece: square to the member, and
    /// along it at the layer's centroid.
    fn vertical(&mut self, piece: usize, layer: usize, loads: [f64; 2]) {
        let (sine, cosine) = self.layout.pitch;
        let w = self.layout.states.deflection(self.layout.strands[layer]);
        self.line(piece, w, loads.map(|q| q * cosine));
        self.enter(piece, layer, loads.map(|q| q * cosine));
        if sine != 0.0 {
            let z = self.layout.pieces[piece].nodes[0].at(Time::Initial)[layer].z;
            let direction = self.layout.along(self.plan.section(), layer, z);
            for (i, factor) in direction.into_iter().enumerate() {
                self.line(piece, i, loads.map(|q| -q * sine * factor));
            }
        }
    }

    /// Notes that a load enters a layer.
    pub(super) fn enter(&mut self, piece: usize, layer: usize, [left, right]: [f64; 2]) {
        let [a, b] = &mut self.case.entered[layer][piece];
        *a += left;
        *b += right;
    }

    /// A line load over a stretch that changes linearly from its beginning to its end.
    fn spread(&mut self, layer: usize, ends: [Length; 2], [left, right]: [f64; 2]) {
        let places = &self.layout.places;
        let [first, last] = ends.map(|place| nearest(places, place.si()));
        let (from, length) = (places[first], places[last] - places[first]);
        // The ends take their own values, and a constant load is the same everywhere.
        let at = |k: usize| {
            if k == last {
                right
            } else {
                left + (right - left) * ((places[k] - from) / length)
            }
        };
        let loads: Vec<_> = (first..last).map(|k| (k, [at(k), at(k + 1)])).collect();
        for (piece, loads) in loads {
            self.vertical(piece, layer, loads);
        }
    }

    fn self_weight(&mut self) {
        let (half, strands) = (self.layout.states.half(), self.layout.states.strands);
        let layout = self.layout;
        for (k, piece) in layout.pieces.iter().enumerate() {
            if piece.is_prismatic() {
                for (layer, mass) in piece.nodes[0].masses().into_iter().enumerate() {
                    self.vertical(k, layer, [mass * GRAVITY; 2]);
                }
                continue;
            }
            let per_node = 2 * half - strands;
            let (sine, cosine) = layout.pitch;
            // The two ends are the last two nodes.
            let ends = [piece.nodes.len() - 2, piece.nodes.len() - 1];
            let [left, right] = ends.map(|end| piece.nodes[end].masses());
            for (layer, (left, right)) in left.into_iter().zip(right).enumerate() {
                self.enter(k, layer, [left, right].map(|mass| mass * GRAVITY * cosine));
            }
            for (n, node) in piece.nodes.iter().enumerate() {
                for (layer, mass) in node.masses().into_iter().enumerate() {
                    let weight = mass * GRAVITY;
                    let z = node.at(Time::Initial)[layer].z;
                    let along = layout.along(&node.section, layer, z);
                    let w = layout.states.deflection(layout.strands[layer]);
                    let numbers = &mut self.case.loads.at_nodes[k][n * per_node..];
                    numbers[w] += weight * cosine;
                    if sine != 0.0 {
                        for (i, factor) in along.into_iter().enumerate() {
                            numbers[i] -= weight * sine * factor;
                        }
                    }
                }
            }
        }
    }

    /// Moves what a support holds.
    fn moved(&mut self, support: &str, held: Held, by: f64) {
        let supports = self.plan.supports();
        let holds = self.layout.held_by().enumerate();
        for (hold, (_, held_by)) in holds {
            if let HeldBy::Support(i, what) = held_by
                && what == held
                && supports[i].name() == support
            {
                self.case.loads.moved[hold] += by;
            }
        }
    }
}
