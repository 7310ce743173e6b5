//! The simplified methods beside the exact solution of a member.

use super::Response;
use super::layers::{axial_of, flow_of, moment_of, slip_at_joint};
use super::simplified_setup::{Method, beam, reference, set_up, stack, transverse, warnings};
use super::simplified_types::{SimplifiedJoint, SimplifiedLayer, SimplifiedMethod, SimplifiedSpan};
use super::solutions::Term;
use crate::error::{ErrorKind, Problem, Result};
use crate::field::Piecewise;
use crate::member::{Member, Release};
use crate::section::Layer;
use crate::simplified::LayerStress;
use crate::solve::beam::{Beam, Solved};
use crate::solve::states::States;
use crate::time::Time;
use crate::units::{Force, Length, Moment};
use std::sync::Arc;

impl Response {
    /// Deflection, flow and stresses of each span by a simplified method, beside the exact ones.
    ///
    /// The method's deflection is that of a member without slip whose spans have the effective
    /// bending stiffness of the method, each with its own reference length: the span where it is
    /// the only one, 0.8 of it in a continuous member, twice the length of a cantilever.
    ///
    /// # Errors
    /// As for [`Response::deflection`]; [`ErrorKind::Value`] for what the methods do not cover:
    /// layers that do not lie on each other, a section that changes, layers with a deflection of
    /// their own, axial forces, clearances, one-way supports, anchors. Free strains are left out of
    /// both sides; an action that mixes them with loads is an error.
    pub fn simplified(
        &self,
        combination: &str,
        time: Time,
        method: SimplifiedMethod,
    ) -> Result<Vec<SimplifiedSpan>> {
        let member = self.member();
        let all = self.terms(combination, time)?;
        if let Some(found) = not_covered(member, &all) {
            return Err(Problem::new(
                ErrorKind::Value,
                "member",
                format!("{found}, which simplified methods do not cover"),
                "a prismatic member of layers on each other under transverse loads",
            )
            .into());
        }
        let leaves_out_strains = all.iter().any(Term::has_strains);
        let terms: Vec<_> = all.into_iter().filter(|term| !term.has_strains()).collect();
        let section = member.section();
        let summed = |line: &dyn Fn(&Term<'_>) -> Piecewise| {
            let mut sum = self.zero();
            for term in &terms {
                sum.add(&line(term), 1.0);
            }
            sum
        };
        let stack = stack(member)?;
        let methods: Vec<[Method; 2]> = member
            .spans()
            .iter()
            .map(|span| {
                let [initial, end] = Time::ALL.map(|t| set_up(member, span, &stack, t, method));
                Ok([initial?, end?])
            })
            .collect::<Result<_>>()?;
        let beams = Time::ALL.map(|t| beam(member, &methods, t));
        let [initial, end] = beams;
        let beams = [initial?, end?];
        let solved: Vec<(usize, f64, Solved)> = terms
            .iter()
            .map(|term| {
                let beam = &beams[term.time.index()];
                let solved = beam.solve(&transverse(member.layout(), beam, &term.case.loads));
                (term.time.index(), term.factor, solved)
            })
            .collect();
        let states = States::BENDING;
        let sum = |index: usize, sign: f64, of: &dyn Fn(usize) -> f64| {
            let mut line = Piecewise::zero(Arc::clone(beams[0].stations()));
            for (time, factor, solved) in &solved {
                let beam = &beams[*time];
                let pieces = beam.stations().len() - 1;
                let fields = (0..pieces).map(|k| beam.field(solved, k, index));
                line.add_coefficients(
                    beam.terms(),
                    beam.decays(),
                    fields,
                    sign * factor * of(*time),
                );
            }
            line
        };
        let deflection = sum(states.deflection(0), 1.0, &|_| 1.0);
        let spans = member.spans().iter().zip(&methods).map(|(span, methods)| {
            let (from, to) = (span.from().si(), span.to().si());
            let w = member.layout().states.deflection(0);
            let exact = summed(&|term| term.field(w)).between(from, to);
            let mut joints = Vec::new();
            for (position, &j) in stack.joints.iter().enumerate() {
                // The method's flow is positive where the tension below grows: against the slip.
                let per_shear = |t: usize| {
                    let flows = methods[t].flows(Force::from_N(1.0));
                    flows.map_or(0.0, |flows| -flows[position].si())
                };
                let shear = states.force(states.deflection(0));
                let flow = sum(shear, 1.0, &per_shear).between(from, to);
                let name = section.joints()[section.slips()[j].joint].name();
                let own = summed(&|term| flow_of(term, &slip_at_joint(term, section, j), j));
                joints.push(SimplifiedJoint {
                    joint: name.into(),
                    flow: flow.greatest().into(),
                    exact_flow: own.between(from, to).greatest().into(),
                });
            }
            let moment = sum(states.force(states.rotation(0)), -1.0, &|_| 1.0);
            let peak = moment.between(from, to).greatest();
            let stresses = stresses_at(methods, &solved, &beams, peak.at)?;
            let value = |line: Piecewise| line.sides(peak.at).map_or(0.0, |sides| sides.1);
            let layers = stack.layers.iter().zip(stresses).map(|(&merged, stress)| {
                let axial = summed(&|term| axial_of(term, section, merged));
                let moment = summed(&|term| moment_of(term, merged));
                SimplifiedLayer {
                    layer: section.merged_layers()[merged].layers()[0].clone(),
                    at: Length::from_si(peak.at),
                    stress,
                    exact_axial: Force::from_si(value(axial)),
                    exact_moment: Moment::from_si(value(moment)),
                }
            });
            let layers = layers.collect();
            let own = &methods[time.index()];
            Ok(SimplifiedSpan {
                span: span.name().into(),
                length: reference(member, span).length(),
                factors: match own {
                    Method::Gamma(gamma) => gamma.factors().to_vec(),
                    Method::Sine(_) => Vec::new(),
                },
                bending_stiffness: own.bending_stiffness(),
                deflection: deflection.between(from, to).greatest().into(),
                exact_deflection: exact.greatest().into(),
                joints,
                layers,
                leaves_out_strains,
                warnings: warnings(member, own)?,
            })
        });
        spans.collect()
    }
}

/// The stresses of the layers under the moment at a place, by the method.
fn stresses_at(
    methods: &[Method; 2],
    solved: &[(usize, f64, Solved)],
    beams: &[Beam; 2],
    at: f64,
) -> Result<Vec<LayerStress>> {
    let mut stresses: Vec<LayerStress> = Vec::new();
    for (t, factor, solved) in solved {
        let beam = &beams[*t];
        let states = States::BENDING;
        let mut line = Piecewise::zero(Arc::clone(beam.stations()));
        let index = states.force(states.rotation(0));
        let pieces = (0..beam.stations().len() - 1).map(|k| beam.field(solved, k, index));
        line.add_coefficients(beam.terms(), beam.decays(), pieces, -factor);
        let moment = line.sides(at).map_or(0.0, |sides| sides.1);
        let own = methods[*t].stresses(Moment::from_si(moment))?;
        if stresses.is_empty() {
            stresses = own;
        } else {
            for (sum, more) in stresses.iter_mut().zip(own) {
                sum.axial += more.axial;
                sum.bending += more.bending;
            }
        }
    }
    Ok(stresses)
}

/// Whether a layer is there over a part of the length only.
fn has_short_layers(member: &Member) -> bool {
    let layers = member.section().layers().iter();
    layers.filter_map(Layer::extent).next().is_some()
}

/// Why the methods do not cover a member and its loads.
fn not_covered(member: &Member, terms: &[Term<'_>]) -> Option<&'static str> {
    let layout = member.layout();
    if member.section().slips().is_empty() {
        Some("a section whose layers do not slip")
    } else if layout.states.strands > 1 {
        Some("layers with a deflection of their own")
    } else if !member.changes().is_empty() {
        Some("a section that changes")
    } else if layout.states.has_axial {
        Some("axial forces")
    } else if member.is_one_way() {
        Some("clearances or one-way supports")
    } else if member.has_moving_supports() {
        Some("supports that move")
    } else if has_short_layers(member) {
        Some("layers over a part of the length")
    } else if !member.anchors().is_empty() {
        Some("anchors")
    } else if member
        .hinges()
        .iter()
        .any(|hinge| matches!(hinge.release(), Release::Butt(_)))
    {
        Some("butt joints")
    } else if terms
        .iter()
        .any(|term| term.has_strains() && term.case.has_loads())
    {
        Some("loads and free strains in one action")
    } else {
        None
    }
}

#[cfg(test)]
mod tests {
    use super::*;
    use crate::material::{Creep, Material};
    use crate::member::Action;
    use crate::section::{Joint, Layer, Part, Section, Slip, rectangle};
    use crate::units::{Number, SlipModulus};

    /// A concrete slab on a timber joist, computed by an independent script from Annex B and from
    /// the closed form: gamma .27195, w 11.175 mm against 11.139 mm exact, end flow 41.41 N/mm
    /// against 36.27 N/mm; slab 1.479 +- 3.233 MPa, joist 2.823 +- 3.606 MPa.
    #[test]
    fn the_gamma_method_beside_the_exact_solution() {
        let material = |name: &str, e: f64| Material::new(name, e.GPa(), Creep::none());
        let joist = Part::new(
            "joist",
            rectangle(100.mm(), 220.mm()),
            material("timber", 11.0),
        );
        let concrete = material("concrete", 31.0);
        let slab = Part::new("slab", rectangle(600.mm(), 70.mm()), concrete).above(&joist);
        let modulus = SlipModulus::from_N_per_mm2(133.333);
        let screws = Joint::slipping("screws", "joist", "slab", Slip::Modulus(modulus)).creep(0.0);
        let layers = ["joist", "slab"].map(|name| Layer::new(name, [name]));
        let section = Section::layered([joist, slab], layers, [screws]).unwrap();
        let response = Member::simple_span(section, 6.m())
            .action(Action::permanent("floor").uniform(3.kN_per_m()))
            .check()
            .unwrap()
            .solve();
        let gamma = response.simplified("permanent", Time::Initial, SimplifiedMethod::Gamma);
        let span = &gamma.unwrap()[0];
        let near = |found: f64, printed: f64, half_digit: f64| {
            assert!((found - printed).abs() <= half_digit, "{found} {printed}");
        };
        near(span.factors[1], 0.27195, 6e-6);
        near(span.deflection.value.to_mm(), 11.175, 6e-4);
        near(span.exact_deflection.value.to_mm(), 11.139, 6e-4);
        near(span.joints[0].flow.value.to_N_per_mm(), -41.41, 6e-3);
        near(span.joints[0].exact_flow.value.to_N_per_mm(), -36.27, 6e-3);
        let [joist, slab] = [&span.layers[0].stress, &span.layers[1].stress];
        near(joist.axial.to_MPa(), 2.823, 6e-4);
        near(joist.bending.to_MPa(), 3.606, 6e-4);
        near(slab.axial.to_MPa(), -1.479, 6e-4);
        near(slab.bending.to_MPa(), 3.233, 6e-4);
        near(span.difference(), 11.175 / 11.139 - 1.0, 1e-4);
        let sine = response.simplified("permanent", Time::Initial, SimplifiedMethod::SineLayers);
        let ratio = sine.unwrap()[0].deflection.value / span.deflection.value;
        near(ratio, 1.0, 1e-12);
    }
}
