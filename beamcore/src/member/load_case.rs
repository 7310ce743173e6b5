//! The loads of an action, laid out on the stations of a member.

use super::action::Action;
use super::layout::{Held, HeldBy, Layout, Situation, nearest};
use super::load::{Load, Tendon};
use super::plan::MemberPlan;
use crate::constants::GRAVITY;
use crate::section::{InitialStrain, PlacedPart};
use crate::solve::beam::Beam;
use crate::solve::load::LoadCase;
use crate::time::Time;
use crate::units::{Curvature, Length, Strain, TemperatureChange};

/// A load case with the free strains that act in it.
#[derive(Clone, Debug)]
pub(crate) struct Case {
    pub(crate) loads: LoadCase,
    /// Per piece, node of it and part of its section; empty if no part strains.
    pub(crate) strains: Vec<Vec<Vec<InitialStrain>>>,
    /// Per merged layer and piece, the load per length square to the member that enters the layer,
    /// at the left and the right end of the piece.
    pub(crate) entered: Vec<Vec<[f64; 2]>>,
}

impl Case {
    /// No load.
    pub(crate) fn none(beam: &Beam) -> Self {
        Self {
            loads: beam.no_load(),
            strains: Vec::new(),
            entered: Vec::new(),
        }
    }

    /// Adds `factor` times another case on the same member.
    pub(crate) fn add(&mut self, other: &Self, factor: f64) {
        self.loads.add(&other.loads, factor);
        if self.strains.is_empty() {
            let none = |parts: &Vec<InitialStrain>| vec![InitialStrain::NONE; parts.len()];
            let pieces = other.strains.iter();
            self.strains = pieces
                .map(|nodes| nodes.iter().map(none).collect())
                .collect();
        }
        let mine = self.strains.iter_mut().flatten().flatten();
        for (sum, strain) in mine.zip(other.strains.iter().flatten().flatten()) {
            *sum = sum.plus(&strain.times(factor));
        }
        self.entered.resize(other.entered.len(), Vec::new());
        for (mine, theirs) in self.entered.iter_mut().zip(&other.entered) {
            mine.resize(theirs.len(), [0.0; 2]);
            for (sum, load) in mine.iter_mut().flatten().zip(theirs.iter().flatten()) {
                *sum += factor * load;
            }
        }
    }

    /// The load per length that enters any of the given layers, per piece.
    pub(crate) fn entering(&self, layers: &[usize]) -> Vec<[f64; 2]> {
        let pieces = self.entered.first().map_or(0, Vec::len);
        (0..pieces)
            .map(|k| {
                layers.iter().fold([0.0; 2], |sum, &layer| {
                    let [left, right] = self.entered[layer][k];
                    [sum[0] + left, sum[1] + right]
                })
            })
            .collect()
    }
}

/// Builds a case on a laid out member.
struct Builder<'a> {
    layout: &'a Layout,
    plan: &'a MemberPlan,
    time: Time,
    case: Case,
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
    fn line(&mut self, piece: usize, displacement: usize, [left, right]: [f64; 2]) {
        let half = self.layout.states.half();
        self.case.loads.line[2 * half * piece + displacement] += left;
        self.case.loads.line[2 * half * piece + half + displacement] += right;
    }

    /// Adds to the outside force on a displacement at a station.
    fn outside(&mut self, station: usize, displacement: usize, force: f64) {
        let half = self.layout.states.half();
        self.case.loads.outside[half * station + displacement] += force;
    }

    /// A force along the member on a layer at a height.
    fn push(&mut self, station: usize, layer: usize, z: f64, force: f64) {
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
    fn enter(&mut self, piece: usize, layer: usize, [left, right]: [f64; 2]) {
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

    /// Equivalent forces of a tendon: P along it on each anchor, P times each change of its slope.
    /// Slopes are small: the force along the member is P everywhere.
    fn prestress(&mut self, layer: usize, force: f64, tendon: &Tendon) {
        let points: Vec<(f64, f64)> = tendon
            .points()
            .iter()
            .map(|(x, z)| (x.si(), z.si()))
            .collect();
        let last = points.len() - 1;
        let slope = |i: usize| {
            let ((x, z), (u, v)) = (points[i], points[i + 1]);
            (v - z) / (u - x)
        };
        let w = self.layout.states.deflection(self.layout.strands[layer]);
        let (start, end) = match tendon {
            Tendon::Draped(_) => {
                for i in 1..last {
                    let station = nearest(&self.layout.places, points[i].0);
                    self.outside(station, w, -force * (slope(i) - slope(i - 1)));
                }
                (slope(0), slope(last - 1))
            }
            Tendon::Parabolic(_) => {
                // z'' by divided differences.
                let bend = 2.0 * (slope(1) - slope(0)) / (points[2].0 - points[0].0);
                let ends = [points[0].0, points[2].0];
                let [first, to] = ends.map(|x| nearest(&self.layout.places, x));
                for piece in first..to {
                    self.line(piece, w, [-force * bend; 2]);
                }
                let half = bend / 2.0;
                (
                    slope(0) - half * (points[1].0 - points[0].0),
                    slope(1) + half * (points[2].0 - points[1].0),
                )
            }
        };
        let [left, right] = [points[0].0, points[last].0].map(|x| nearest(&self.layout.places, x));
        self.push(left, layer, points[0].1, force);
        self.outside(left, w, -force * start);
        self.push(right, layer, points[last].1, -force);
        self.outside(right, w, force * end);
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

    fn warm(&mut self, change: TemperatureChange, parts: &[String]) {
        self.strain(|_, part| {
            let is_named = parts.is_empty() || parts.iter().any(|name| name == part.name());
            let alpha = part.material().expansion().filter(|_| is_named);
            InitialStrain {
                axial: alpha.map_or(Strain::ZERO, |alpha| alpha * change),
                ..InitialStrain::NONE
            }
        });
    }

    /// Every part strains by alpha dT (z - middle)/height at each height z.
    fn gradient(&mut self, difference: TemperatureChange) {
        self.strain(|placed, part| {
            let bottoms = placed.iter().map(|p| p.bottom().si());
            let tops = placed.iter().map(|p| p.top().si());
            let (bottom, top) = (
                bottoms.fold(f64::INFINITY, f64::min),
                tops.fold(f64::NEG_INFINITY, f64::max),
            );
            let alpha = part.material().expansion();
            let whole = alpha.map_or(Strain::ZERO, |alpha| alpha * difference);
            let slope = whole.si() / (top - bottom);
            InitialStrain {
                axial: Strain::from_si(slope * (part.net().z - f64::midpoint(bottom, top))),
                curvature_y: Curvature::from_si(-slope),
                ..InitialStrain::NONE
            }
        });
    }

    /// Adds free strains, told for each part among the parts of its section.
    fn strain(&mut self, of: impl Fn(&[PlacedPart], &PlacedPart) -> InitialStrain) {
        let layout = self.layout;
        let (half, strands) = (layout.states.half(), layout.states.strands);
        let gradients = half - strands;
        self.case.strains.resize(layout.pieces.len(), Vec::new());
        for (k, piece) in layout.pieces.iter().enumerate() {
            self.case.strains[k].resize(piece.nodes.len(), Vec::new());
            for (n, node) in piece.nodes.iter().enumerate() {
                let placed = node.section.placed();
                let strains: Vec<_> = placed.iter().map(|part| of(placed, part)).collect();
                let known = &mut self.case.strains[k][n];
                known.resize(placed.len(), InitialStrain::NONE);
                for (sum, strain) in known.iter_mut().zip(&strains) {
                    *sum = sum.plus(strain);
                }
                let law = layout.law_of(node, self.time);
                let forces = law.free_forces(&node.free(self.time, &strains));
                let target = if piece.is_prismatic() {
                    &mut self.case.loads.free[gradients * k..gradients * (k + 1)]
                } else {
                    let first = n * (half + gradients) + half;
                    &mut self.case.loads.at_nodes[k][first..first + gradients]
                };
                for (sum, force) in target.iter_mut().zip(forces) {
                    *sum += force;
                }
            }
        }
    }
}
