//! The response of a member: deflection, slope, forces, slips and reactions along x.

mod composite;
mod fibre;
mod layers;
mod reaction;
mod share;
mod simplified;
mod simplified_setup;
mod simplified_types;
mod solutions;

pub use composite::CompositeAction;
pub use layers::{JointResponse, LayerForces};
pub use reaction::Reaction;
pub use simplified_types::{SimplifiedJoint, SimplifiedLayer, SimplifiedMethod, SimplifiedSpan};

use crate::error::{Error, Result};
use crate::field::{Field, Piecewise};
use crate::lookup;
use crate::member::{Combination, Member};
use crate::section::Sideways;
use crate::time::Time;
use crate::units::{Angle, Curvature, Force, Length, Moment};
use solutions::{Linear, OneWay, Term};
use std::sync::Arc;

/// The solved member: every field under every combination, at both times.
///
/// Results at [`Time::Initial`] use short-term moduli. Results at [`Time::Final`] are the sum of
/// (combination - quasi-permanent share) with short-term moduli and the quasi-permanent share with
/// effective moduli E/(1 + creep factor) of each part, so that only what creeps softens.
#[derive(Clone, Debug)]
pub struct Response {
    member: Member,
    /// Solutions for the initial and the final stiffness.
    linear: [Arc<Linear>; 2],
    /// Of a member where superposition fails, per combination and time.
    one_way: Option<Arc<Vec<[Result<OneWay>; 2]>>>,
}

impl Member {
    /// Solves the member for each action at each time.
    ///
    /// A member that may lift off supports, or whose joints have clearance, is solved for each
    /// combination; where no equilibrium is found the results of that combination are errors.
    #[must_use]
    pub fn solve(&self) -> Response {
        Response::of(self.clone())
    }
}

impl Response {
    fn of(member: Member) -> Self {
        let initial = Arc::new(Linear::of(&member, Time::Initial));
        let lasts = Arc::ptr_eq(member.beam(Time::Initial), member.beam(Time::Final));
        let end = if lasts {
            Arc::clone(&initial)
        } else {
            Arc::new(Linear::of(&member, Time::Final))
        };
        let one_way = member.is_one_way().then(|| {
            let combinations = member.combinations().iter();
            let solved = combinations.map(|c| Time::ALL.map(|t| solutions::one_way(&member, c, t)));
            Arc::new(solved.collect())
        });
        Self {
            member,
            linear: [initial, end],
            one_way,
        }
    }

    /// The member that was solved.
    #[must_use]
    pub const fn member(&self) -> &Member {
        &self.member
    }

    /// The solutions that make up a combination.
    fn terms(&self, combination: &str, time: Time) -> Result<Vec<Term<'_>>> {
        let combination = self.combination(combination)?;
        match &self.one_way {
            None => Ok(solutions::linear_terms(
                &self.member,
                &self.linear,
                combination,
                time,
            )),
            Some(solved) => {
                let all = self.member.combinations();
                let at = all.iter().position(|c| c.name() == combination.name());
                let solved = &solved[at.unwrap_or_default()][time.index()];
                let solved = solved.as_ref().map_err(Clone::clone)?;
                Ok(solutions::one_way_terms(solved))
            }
        }
    }

    /// A field of zeros over the pieces of the member.
    fn zero(&self) -> Piecewise {
        Piecewise::zero(Arc::clone(self.member.beam(Time::Initial).stations()))
    }

    /// The sum over the terms of one line each.
    fn sum(
        &self,
        combination: &str,
        time: Time,
        line: impl Fn(&Term<'_>) -> Piecewise,
    ) -> Result<Piecewise> {
        let mut sum = self.zero();
        for term in self.terms(combination, time)? {
            sum.add(&line(&term), 1.0);
        }
        Ok(sum)
    }

    /// The sum over the terms of one field of the solver.
    fn summed(&self, combination: &str, time: Time, field: usize, sign: f64) -> Result<Piecewise> {
        let mut sum = self.zero();
        for term in self.terms(combination, time)? {
            if term.settled.is_none() {
                term.add_field(field, sign * term.factor, &mut sum);
            } else {
                sum.add(&term.field(field), sign);
            }
        }
        Ok(sum)
    }

    /// The deflection w along the member, positive downward (square to a pitched member); of
    /// layers with deflections of their own, that of the first layer.
    ///
    /// # Errors
    /// [`crate::ErrorKind::Lookup`] if there is no such combination. Of one-way supports and
    /// clearances, [`crate::ErrorKind::Mechanism`] if the member leaves its supports under it and
    /// [`crate::ErrorKind::Numerical`] if no equilibrium is found. So do all results.
    pub fn deflection(&self, combination: &str, time: Time) -> Result<Field<Length>> {
        Ok(Field::new(self.deflection_line(combination, time)?))
    }

    /// The deflection of a layer; that of the member unless a transverse modulus gives the layer
    /// one of its own.
    ///
    /// # Errors
    /// As for [`Response::deflection`]; [`crate::ErrorKind::Name`] if there is no such layer.
    pub fn layer_deflection(
        &self,
        combination: &str,
        time: Time,
        layer: &str,
    ) -> Result<Field<Length>> {
        let strand = self.member.layout().strands[self.merged(layer)?];
        let index = self.member.layout().states.deflection(strand);
        Ok(Field::new(self.summed(combination, time, index, 1.0)?))
    }

    /// The movement sideways along the member, positive towards positive y; zero unless the member
    /// is free sideways and its section has no axis of symmetry.
    ///
    /// v = w `EI_yz`/`EI_zz`, each share of the load with its own moduli.
    ///
    /// # Errors
    /// As for [`Response::deflection`].
    pub fn sideways(&self, combination: &str, time: Time) -> Result<Field<Length>> {
        if self.member.sideways() == Sideways::Held {
            return Ok(Field::new(self.zero()));
        }
        let line = self.sum(combination, time, |term| {
            let w = term.field(term.layout.states.deflection(0));
            term.mixed([&w], |node, _| ([-node.at(term.time)[0].ratio], 0.0))
        })?;
        Ok(Field::new(line))
    }

    /// The slope dw/dx along the member, positive where the deflection grows to the right. With
    /// shear it is not the rotation of the section.
    ///
    /// # Errors
    /// As for [`Response::deflection`].
    pub fn slope(&self, combination: &str, time: Time) -> Result<Field<Angle>> {
        let deflection = self.deflection_line(combination, time)?;
        Ok(Field::new(deflection.derivative()))
    }

    /// The rotation of the section along the member, positive clockwise; theta = dw/dx - V/kGA.
    ///
    /// # Errors
    /// As for [`Response::deflection`].
    pub fn rotation(&self, combination: &str, time: Time) -> Result<Field<Angle>> {
        let index = self.member.layout().states.rotation(0);
        Ok(Field::new(self.summed(combination, time, index, 1.0)?))
    }

    /// The curvature along the member, positive sagging, with its free part.
    ///
    /// # Errors
    /// As for [`Response::deflection`].
    pub fn curvature(&self, combination: &str, time: Time) -> Result<Field<Curvature>> {
        let index = self.member.layout().states.all();
        Ok(Field::new(self.summed(combination, time, index, 1.0)?))
    }

    /// The shear force V = dM/dx along the member, that of all layers.
    ///
    /// # Errors
    /// As for [`Response::deflection`].
    pub fn shear(&self, combination: &str, time: Time) -> Result<Field<Force>> {
        let states = self.member.layout().states;
        let mut line = self.zero();
        for strand in 0..states.strands {
            let index = states.force(states.deflection(strand));
            line.add(&self.summed(combination, time, index, 1.0)?, 1.0);
        }
        Ok(Field::new(line))
    }

    /// The moment M along the member, positive where it stretches the bottom (sagging), about the
    /// elastic centroid that the section has on the first day.
    ///
    /// # Errors
    /// As for [`Response::deflection`].
    pub fn moment(&self, combination: &str, time: Time) -> Result<Field<Moment>> {
        let states = self.member.layout().states;
        let mut line = self.zero();
        for strand in 0..states.strands {
            let index = states.force(states.rotation(strand));
            line.add(&self.summed(combination, time, index, -1.0)?, 1.0);
        }
        if states.has_axial {
            // From the axis of the solver to the centroid.
            line.add(
                &self.sum(combination, time, |term| {
                    let n = term.field(states.force(states.axial()));
                    let axis = term.layout.axis;
                    term.mixed([&n], |node, _| {
                        ([node.centroid_z(Time::Initial) - axis], 0.0)
                    })
                })?,
                1.0,
            );
        }
        Ok(Field::new(line))
    }

    /// The axial force N along the member, tension positive.
    ///
    /// # Errors
    /// As for [`Response::deflection`].
    pub fn axial(&self, combination: &str, time: Time) -> Result<Field<Force>> {
        Ok(Field::new(self.axial_line(combination, time)?))
    }

    fn axial_line(&self, combination: &str, time: Time) -> Result<Piecewise> {
        let states = self.member.layout().states;
        if states.has_axial {
            self.summed(combination, time, states.force(states.axial()), 1.0)
        } else {
            self.combination(combination)?;
            Ok(self.zero())
        }
    }

    /// The error estimate of the solutions, relative to the peak of each field: what is left of
    /// equilibrium and continuity at the stations, and of the equations between the points of
    /// pieces whose section changes.
    #[must_use]
    pub fn residual(&self) -> f64 {
        let linear = self.linear.iter().flat_map(|linear| &linear.solved);
        let one_way = self
            .one_way
            .iter()
            .flat_map(|solved| solved.iter().flatten());
        let one_way = one_way.filter_map(|solved| solved.as_ref().ok());
        let one_way = one_way.flatten().map(|(_, settled, _)| &settled.solved);
        linear
            .chain(one_way)
            .map(|solved| solved.residual)
            .fold(0.0, f64::max)
    }

    /// How many linear solutions a combination took: one, unless the member may lift off supports
    /// or its joints have clearance.
    ///
    /// # Errors
    /// As for [`Response::deflection`].
    pub fn steps(&self, combination: &str, time: Time) -> Result<usize> {
        let terms = self.terms(combination, time)?;
        let steps = terms.iter().map(|term| term.settled.map_or(1, |s| s.steps));
        Ok(steps.max().unwrap_or(1))
    }

    /// The combination of a name.
    ///
    /// # Errors
    /// [`crate::ErrorKind::Lookup`] if there is none.
    pub fn combination(&self, name: &str) -> Result<&Combination> {
        let all = self.member.combinations();
        all.iter()
            .find(|combination| combination.name() == name)
            .ok_or_else(|| {
                let names: Vec<_> = all.iter().map(Combination::name).collect();
                Error::from(lookup::unknown("combination", name, &names))
            })
    }

    /// The deflection line under a combination.
    pub(crate) fn deflection_line(&self, combination: &str, time: Time) -> Result<Piecewise> {
        let index = self.member.layout().states.deflection(0);
        self.summed(combination, time, index, 1.0)
    }

    /// The position of the merged layer that a named layer is in.
    fn merged(&self, layer: &str) -> Result<usize> {
        crate::member::merged_layer(self.member.section(), layer, "layer")
    }
}
