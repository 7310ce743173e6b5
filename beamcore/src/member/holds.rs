//! What supports and anchors hold, and what hinges release.

use super::hinge::Release;
use super::layout::{Held, HeldBy, Layout};
use super::places::nearest;
use super::plan::MemberPlan;
use super::references::{merged_layer, slip_of};
use super::support::{Support, SupportKind};
use crate::error::Result;
use crate::path;
use crate::section::Section;
use crate::solve::station::Hold;
use crate::time::Time;

impl Layout {
    /// Sets what supports and anchors hold and what hinges release.
    pub(super) fn hold(&mut self, plan: &MemberPlan, section: &Section) -> Result<()> {
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
            match hinge.release() {
                Release::Shear => {
                    for strand in 0..self.states.strands {
                        let mut direction = vec![0.0; self.states.half()];
                        direction[self.states.deflection(strand)] = 1.0;
                        self.releases[station].push(direction);
                    }
                }
                Release::Moment(None) => {
                    for strand in 0..self.states.strands {
                        let turned = self.turned(section, station, strand);
                        self.releases[station].push(turned);
                    }
                }
                Release::Moment(Some(layer)) => {
                    let strand = self.strands[merged_layer(section, layer, &at)?];
                    let turned = self.turned(section, station, strand);
                    self.releases[station].push(turned);
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

    /// The displacements that part where a strand turns about the elastic centroid of its layers
    /// just right of a station: no moment about it passes.
    fn turned(&self, section: &Section, station: usize, strand: usize) -> Vec<f64> {
        let nodes = &self.pieces[station.min(self.pieces.len() - 1)].nodes;
        // Of a varying piece the last node but one lies at its left end.
        let layers = nodes[nodes.len().max(2) - 2].at(Time::Initial);
        let own = |i: &usize| self.strands[*i] == strand && layers[*i].is_there;
        let own: Vec<usize> = (0..layers.len()).filter(own).collect();
        let axial: f64 = own.iter().map(|&i| layers[i].axial).sum();
        let first: f64 = own.iter().map(|&i| layers[i].axial * layers[i].z).sum();
        let arm = first / axial - self.axis;
        let mut direction = vec![0.0; self.states.half()];
        for &layer in &own {
            for (sum, along) in direction.iter_mut().zip(self.butt(section, layer)) {
                *sum -= arm * along;
            }
        }
        direction[self.states.rotation(strand)] = 1.0;
        direction
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

    /// The direction in which the elastic centroid moves along the member: the mean of all layers,
    /// weighted with EA. Held there, a member without axial load has no axial force.
    fn mean_along(&self, section: &Section) -> Vec<f64> {
        let layers = section.layer_stiffness(Time::Initial);
        let total: f64 = layers.iter().map(|layer| layer.axial).sum();
        let mut mean = vec![0.0; self.states.half()];
        for (i, layer) in layers.iter().enumerate() {
            let share = layer.axial / total;
            for (sum, c) in mean.iter_mut().zip(self.along(section, i, layer.z)) {
                *sum += share * c;
            }
        }
        if self.states.strands == 1 {
            // The arms of all layers about the centroid cancel.
            mean[self.states.rotation(0)] = 0.0;
        }
        mean
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
            let mut direction = match (support.given_height(), layers.first()) {
                (None, None) => self.mean_along(section),
                (height, layer) => {
                    let height = height.map_or(self.axis, |z| z.si());
                    self.along(section, layer.copied().unwrap_or(0), height)
                }
            };
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
}
