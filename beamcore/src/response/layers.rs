//! Slip and flow of joints; axial force and moment of layers.

use super::Response;
use super::solutions::Term;
use crate::error::Result;
use crate::field::{Field, Piecewise};
use crate::member::slip_of;
use crate::section::Section;
use crate::time::Time;
use crate::units::{Force, Length, LineLoad, Moment, ShearFlow};

/// What happens in a joint that is not rigid.
#[derive(Clone, Debug)]
pub struct JointResponse {
    /// The slip, displacement along x of the upper layer minus that of the lower one.
    pub slip: Field<Length>,
    /// The flow, force per length with which the joint pulls the upper layer to the left and the
    /// lower one to the right; it bears the sign of the slip.
    pub flow: Field<ShearFlow>,
    /// What the layers above press with on those below, per length, positive where they press;
    /// negative where they would part. Point loads and supports pass at their places besides.
    pub pressure: Field<LineLoad>,
}

/// The forces of one layer.
#[derive(Clone, Debug)]
pub struct LayerForces {
    /// The axial force, tension positive.
    pub axial: Field<Force>,
    /// The moment about the layer's own centroid, positive sagging.
    pub moment: Field<Moment>,
}

impl Response {
    /// Slip, flow and contact pressure of a joint that is not rigid.
    ///
    /// The pressure follows from the vertical equilibrium of the layers above the joint:
    /// p = q + (M'' of those layers) + t' z, with q the load that enters them; loads that name no
    /// layer are taken to enter from above.
    ///
    /// # Examples
    /// ```
    /// use beamcore::material::{Creep, Material};
    /// use beamcore::member::{Action, Member};
    /// use beamcore::section::{Joint, Layer, Part, Section, Slip, Spacing, rectangle};
    /// use beamcore::time::Time;
    /// use beamcore::units::Number;
    /// let wood = Material::new("wood", 11.GPa(), Creep::factor(0.6));
    /// let concrete = Material::new("concrete", 31.GPa(), Creep::factor(2.5));
    /// let joist = Part::new("joist", rectangle(100.mm(), 220.mm()), wood);
    /// let slab = Part::new("slab", rectangle(600.mm(), 70.mm()), concrete).above(&joist);
    /// let screws = Slip::Fasteners {
    ///     stiffness: 10.kN_per_mm(),
    ///     rows: 2,
    ///     planes: 1,
    ///     spacing: Spacing::Uniform(150.mm()),
    /// };
    /// let section = Section::layered(
    ///     [joist, slab],
    ///     [Layer::new("timber", ["joist"]), Layer::new("topping", ["slab"])],
    ///     [Joint::slipping("screws", "timber", "topping", screws).creep(1.2)],
    /// )?;
    /// let response = Member::simple_span(section, 6.m())
    ///     .action(Action::permanent("floor").uniform(3.kN_per_m()))
    ///     .check()?
    ///     .solve();
    /// let screws = response.joint("permanent", Time::Initial, "screws")?;
    /// let end = screws.flow.value(0.m())?;
    /// assert_eq!(format!("{:.2} N/mm", end.to_N_per_mm()), "-36.27 N/mm");
    /// # Ok::<(), beamcore::Error>(())
    /// ```
    ///
    /// # Errors
    /// As for [`Response::deflection`]; [`crate::ErrorKind::Name`] if no joint of this name slips.
    pub fn joint(&self, combination: &str, time: Time, joint: &str) -> Result<JointResponse> {
        let j = slip_of(self.member().section(), joint, "joint")?;
        let (mut slip, mut flow) = (self.zero(), self.zero());
        let mut pressure = self.zero();
        for term in self.terms(combination, time)? {
            let own = slip_at_joint(&term, self.member().section(), j);
            let carried = flow_of(&term, &own, j);
            pressure.add(&pressure_of(self, &term, j, &carried), 1.0);
            slip.add(&own, 1.0);
            flow.add(&carried, 1.0);
        }
        Ok(JointResponse {
            slip: Field::new(slip),
            flow: Field::new(flow),
            pressure: Field::new(pressure),
        })
    }

    /// Axial force and moment of the layer that a name is in, with the layers that rigid joints
    /// hold to it.
    ///
    /// The sum of the axial forces is N, and the sum of the moments with the axial forces times
    /// their arms is M.
    ///
    /// # Errors
    /// As for [`Response::deflection`]; [`crate::ErrorKind::Name`] if there is no such layer.
    pub fn layer(&self, combination: &str, time: Time, layer: &str) -> Result<LayerForces> {
        let merged = self.merged(layer)?;
        let section = self.member().section();
        let axial = self.sum(combination, time, |term| axial_of(term, section, merged))?;
        let moment = self.sum(combination, time, |term| moment_of(term, merged))?;
        Ok(LayerForces {
            axial: Field::new(axial),
            moment: Field::new(moment),
        })
    }
}

/// The slip at the height of a joint, with the factor of the term; none where one of its layers is
/// not there.
pub(super) fn slip_at_joint(term: &Term<'_>, section: &Section, j: usize) -> Piecewise {
    let states = term.layout.states;
    let mut line = term.field(states.slip(j));
    let joint = &section.slips()[j];
    let strands = [joint.lower, joint.upper].map(|layer| term.layout.strands[layer]);
    if strands[0] != strands[1] {
        let arm = joint.z - term.layout.axis;
        line.add(&term.field(states.rotation(strands[1])), arm);
        line.add(&term.field(states.rotation(strands[0])), -arm);
    }
    let is_there = |k: usize| {
        let node = &term.layout.pieces[k].nodes[0];
        let (joint, layers) = (&node.section.slips()[j], node.at(term.time));
        layers[joint.lower].is_there && layers[joint.upper].is_there
    };
    let mut slip = line.zeroed();
    slip.add_by_piece(&line, |k| f64::from(u8::from(is_there(k))));
    slip
}

/// The flow of a joint from its slip, with the factor of the term.
pub(super) fn flow_of(term: &Term<'_>, slip: &Piecewise, j: usize) -> Piecewise {
    term.mixed([slip], |node, _| {
        let joint = &node.section.slips()[j];
        let sign = term.settled.map_or(1.0, |s| s.situation.sign(j, node.x));
        let modulus = joint.modulus_at(node.x, term.time) * sign.abs();
        // What the clearance takes off; `mixed` multiplies it by the factor of the term.
        let taken = if term.settled.is_some() {
            modulus * joint.clearance() * sign
        } else {
            0.0
        };
        ([modulus], -taken)
    })
}

/// The axial force of a merged layer, with the factor of the term: what the joints next to it and
/// N leave for it.
pub(super) fn axial_of(term: &Term<'_>, section: &Section, merged: usize) -> Piecewise {
    let states = term.layout.states;
    let mut line = Piecewise::zero(std::sync::Arc::clone(term.beam.stations()));
    let mut share_of_all = 1.0;
    for (j, joint) in section.slips().iter().enumerate() {
        let force = states.force(states.slip(j));
        // T is the force of all layers above the joint.
        if joint.upper == merged {
            line.add(&term.field(force), 1.0);
            share_of_all -= 1.0;
        } else if joint.lower == merged {
            line.add(&term.field(force), -1.0);
        }
    }
    if states.has_axial {
        line.add(&term.field(states.force(states.axial())), share_of_all);
    }
    line
}

/// The moment of a merged layer about its own centroid, with the factor of the term.
pub(super) fn moment_of(term: &Term<'_>, merged: usize) -> Piecewise {
    let strand = term.layout.strands[merged];
    let curvature = term.field(term.layout.states.all() + strand);
    term.mixed([&curvature], |node, strains| {
        let layer = &node.at(term.time)[merged];
        let free = node.free_curvature(term.time, strains, merged);
        ([layer.bending], -layer.bending * free)
    })
}

/// The pressure in a joint, with the factor of the term.
fn pressure_of(response: &Response, term: &Term<'_>, j: usize, flow: &Piecewise) -> Piecewise {
    let section = response.member().section();
    let joint = &section.slips()[j];
    let axis = term.layout.axis;
    // M of the layers above, about the axis.
    let mut moment = Piecewise::zero(std::sync::Arc::clone(term.beam.stations()));
    for &merged in &joint.above {
        moment.add(&moment_of(term, merged), 1.0);
        let axial = axial_of(term, section, merged);
        let arm = term.mixed([&axial], |node, _| {
            ([-(node.at(term.time)[merged].z - axis)], 0.0)
        });
        moment.add(&arm, 1.0);
    }
    let mut pressure = moment.derivative().derivative();
    pressure.add(&flow.derivative(), joint.z - axis);
    let loads = term.case.entering(&joint.above);
    for (k, [left, right]) in loads.into_iter().enumerate() {
        pressure.add_to_piece(k, &[term.factor * left, term.factor * (right - left)]);
    }
    pressure
}
