//! Members: a section along a length, on supports, under actions.

mod action;
mod case;
mod category;
mod checks;
mod checks_loads;
mod checks_parts;
mod checks_places;
mod checks_sections;
mod combination;
mod free_strain;
mod hinge;
#[cfg(test)]
mod hinge_tests;
mod holds;
mod layout;
mod load;
mod load_case;
mod mesh;
mod node;
mod places;
mod plan;
mod plausible;
mod references;
mod sections;
mod settle;
mod shear;
mod span;
mod support;
mod tendon;

pub use action::{Action, ActionKind, Effect, LoadDuration};
pub use category::{Category, CombinationFactors};
pub use combination::{Combination, CombinationKind, OwnCombination, PartialFactors};
pub use hinge::{Anchor, Hinge, Release};
pub use load::{Load, Tendon};
pub use plan::MemberPlan;
pub use sections::SectionChange;
pub use shear::ShearModel;
pub use span::Span;
pub use support::{LayerHold, Support, SupportKind};

pub(crate) use case::Case;
#[cfg(feature = "document")]
pub(crate) use checks::{Known, problems_of};
#[cfg(feature = "document")]
pub(crate) use combination::{all as combinations_of, problems as combination_problems};
pub(crate) use layout::SAME_PLACE;
pub(crate) use layout::{Held, HeldBy, Layout};
pub(crate) use load_case::{initial_strains, load_case};
pub(crate) use node::Node;
#[cfg(feature = "document")]
pub(crate) use node::shear_stiffness;
pub(crate) use references::{merged_layer, slip_of};
pub(crate) use settle::{Settled, settle};
#[cfg(feature = "document")]
pub(crate) use span::all as spans_of;

use crate::error::{ErrorKind, Problem, Result};
use crate::lookup;
use crate::section::{PlacedPart, Section, Sideways};
use crate::solve::beam::Beam;
use crate::time::Time;
use crate::units::{Angle, Length};
use layout::Situation;
use sections::Stretch;
use std::sync::Arc;

/// A member that has passed all checks and is ready to be solved.
///
/// Made by [`MemberPlan::check`]. A clone shares the data and costs nothing.
#[derive(Clone, Debug)]
pub struct Member {
    data: Arc<Data>,
}

#[derive(Debug)]
struct Data {
    plan: MemberPlan,
    sections: Vec<Stretch>,
    combinations: Vec<Combination>,
    layout: Arc<Layout>,
    beams: [Arc<Beam>; 2],
    spans: Vec<Span>,
    notes: Vec<String>,
}

impl Member {
    /// A plan of a member on two supports at its ends: a pin "left" and a roller "right".
    ///
    /// # Examples
    /// ```
    /// use beamcore::material::{ServiceClass, timber};
    /// use beamcore::member::{Action, Member};
    /// use beamcore::section::{Part, Section, rectangle};
    /// use beamcore::time::Time;
    /// use beamcore::units::Number;
    /// let joist = Part::new("joist", rectangle(80.mm(), 220.mm()), timber("C24", ServiceClass::One)?);
    /// let member = Member::simple_span(Section::of([joist])?, 4.0.m())
    ///     .action(Action::permanent("floor").uniform(1.2.kN_per_m()))
    ///     .check()?;
    /// let sag = member.solve().deflection("quasi-permanent", Time::Final)?.greatest();
    /// assert_eq!(sag.at.to_m(), 2.0);
    /// # Ok::<(), beamcore::Error>(())
    /// ```
    #[must_use]
    pub fn simple_span(section: Section, span: Length) -> MemberPlan {
        MemberPlan::new(section, span)
            .support(Support::pin("left", Length::ZERO))
            .support(Support::roller("right", span))
    }

    /// A plan of a member of the given length, without supports yet.
    #[must_use]
    pub fn of_length(section: Section, length: Length) -> MemberPlan {
        MemberPlan::new(section, length)
    }

    pub(crate) fn from_plan(plan: MemberPlan) -> Result<Self> {
        let sections = sections::stretches(plan.section(), plan.length(), plan.changes())?;
        let layout = Layout::new(&plan, &sections, &[])?;
        let initial = Arc::new(layout.beam(Time::Initial, &Situation::default(), &plan)?);
        // Where nothing creeps the end is as the beginning, and is solved once.
        let end = if layout.lasts() {
            Arc::clone(&initial)
        } else {
            Arc::new(layout.beam(Time::Final, &Situation::default(), &plan)?)
        };
        let combinations =
            combination::all(plan.actions(), plan.factors(), plan.own_combinations());
        let spans = span::all(plan.length(), plan.supports());
        let data = Data {
            spans,
            combinations,
            beams: [initial, end],
            notes: layout
                .notes()
                .into_iter()
                .chain(plausible::notes(&plan))
                .collect(),
            sections,
            layout: Arc::new(layout),
            plan,
        };
        Ok(Self {
            data: Arc::new(data),
        })
    }

    /// The section at the left end.
    #[must_use]
    pub fn section(&self) -> &Section {
        self.data.plan.section()
    }

    /// The length.
    #[must_use]
    pub fn length(&self) -> Length {
        self.data.plan.length()
    }

    /// The supports, in the order given.
    #[must_use]
    pub fn supports(&self) -> &[Support] {
        self.data.plan.supports()
    }

    /// The actions, in the order given.
    #[must_use]
    pub fn actions(&self) -> &[Action] {
        self.data.plan.actions()
    }

    /// The combinations of the actions, each with its factors.
    #[must_use]
    pub fn combinations(&self) -> &[Combination] {
        &self.data.combinations
    }

    /// The partial factors of the fundamental combination.
    #[must_use]
    pub fn partial_factors(&self) -> &PartialFactors {
        self.data.plan.factors()
    }

    /// Whether the member is held sideways.
    #[must_use]
    pub fn sideways(&self) -> Sideways {
        self.data.plan.is_held()
    }

    /// The spans and overhangs, from left to right.
    #[must_use]
    pub fn spans(&self) -> &[Span] {
        &self.data.spans
    }

    /// The span of a name.
    ///
    /// # Errors
    /// [`crate::ErrorKind::Lookup`] if there is none.
    pub fn span(&self, name: &str) -> Result<&Span> {
        let spans = self.spans();
        spans
            .iter()
            .find(|span| span.name() == name)
            .ok_or_else(|| {
                let names: Vec<_> = spans.iter().map(Span::name).collect();
                lookup::unknown("span", name, &names).into()
            })
    }

    /// What was noticed while the member was laid out: stations that were merged, values far out
    /// of the usual range.
    #[must_use]
    pub fn notes(&self) -> &[String] {
        &self.data.notes
    }

    /// The changes of the section along the member, from left to right.
    #[must_use]
    pub fn changes(&self) -> &[SectionChange] {
        self.data.plan.changes()
    }

    /// The internal hinges.
    #[must_use]
    pub fn hinges(&self) -> &[Hinge] {
        self.data.plan.hinges()
    }

    /// What stops the slip of joints.
    #[must_use]
    pub fn anchors(&self) -> &[Anchor] {
        self.data.plan.anchors()
    }

    /// How shear deformation is taken.
    #[must_use]
    pub fn shear_model(&self) -> ShearModel {
        self.data.plan.shear_model()
    }

    /// The pitch, if the member has one.
    #[must_use]
    pub fn pitch(&self) -> Option<Angle> {
        self.data.plan.pitch_angle()
    }

    /// The section just right of a place (at the right end, just left of it).
    ///
    /// # Errors
    /// [`crate::ErrorKind::Position`] if the place is not on the member.
    pub fn section_at(&self, at: Length) -> Result<Section> {
        let (x, length) = (at.si(), self.length());
        if !(x >= 0.0 && at <= length) {
            return Err(Problem::new(
                ErrorKind::Position,
                "at",
                at.to_string(),
                format!("a place on the member, from 0 m to {length}"),
            )
            .into());
        }
        let sections = &self.data.sections;
        let own = sections.iter().find(|stretch| x < stretch.to);
        let stretch = own.unwrap_or(&sections[sections.len() - 1]);
        Ok((*stretch.at(x)?).clone())
    }

    /// Whether layers have deflections of their own, by transverse moduli of their joints.
    #[must_use]
    pub fn has_deflections_of_layers(&self) -> bool {
        self.data.layout.states.strands > 1
    }

    /// The layer that loads of actions without a named layer enter: the highest one where all
    /// layers share one deflection, else the first.
    #[must_use]
    pub fn entered_layer(&self) -> &str {
        let section = self.section();
        let merged = self.data.layout.entered_layer(section);
        section.merged_layers()[merged].layers()[0].as_str()
    }

    /// Whether axial force takes part: more than one support holds the axis, something acts along
    /// the member, or it is pitched.
    #[must_use]
    pub fn has_axial_force(&self) -> bool {
        self.data.layout.states.has_axial
    }

    pub(crate) fn plan(&self) -> &MemberPlan {
        &self.data.plan
    }

    /// The sections along the member, from left to right.
    pub(crate) fn stretches(&self) -> &[Stretch] {
        &self.data.sections
    }

    pub(crate) fn layout(&self) -> &Arc<Layout> {
        &self.data.layout
    }

    pub(crate) fn beam(&self, time: Time) -> &Arc<Beam> {
        &self.data.beams[time.index()]
    }

    /// The parts of all sections along the member, each name once, at its place where it comes
    /// first from the left.
    #[must_use]
    pub fn parts(&self) -> Vec<&PlacedPart> {
        let mut parts: Vec<&PlacedPart> = Vec::new();
        for stretch in self.stretches() {
            for part in stretch.start().placed() {
                if !parts.iter().any(|known| known.name() == part.name()) {
                    parts.push(part);
                }
            }
        }
        parts
    }

    /// The first part of a name from the left, and its merged layer.
    pub(crate) fn part(&self, name: &str) -> Result<(&PlacedPart, usize)> {
        for stretch in self.stretches() {
            let section = stretch.start();
            if let Ok(index) = section.index(name) {
                return Ok((&section.placed()[index], section.layer_of_part(index)));
            }
        }
        let names: Vec<_> = self.parts().iter().map(|part| part.name()).collect();
        Err(lookup::unknown("part", name, &names).into())
    }

    /// Whether the deflection need not be zero over a support: on springs, one-way, under some of
    /// the layers only, by loads that move supports, or of a pitched member, which its supports do
    /// not hold square to its axis.
    pub(crate) fn has_moving_supports(&self) -> bool {
        let gives =
            |s: &Support| s.given_spring().is_some() || s.is_one_way() || !s.layers().is_empty();
        let moves = |load: &Load| matches!(load, Load::Settlement { .. });
        self.pitch().is_some()
            || self.supports().iter().any(gives)
            || self
                .actions()
                .iter()
                .any(|action| action.loads().iter().any(moves))
    }

    /// Whether superposition fails: supports that the member may leave, joints with clearance.
    pub(crate) fn is_one_way(&self) -> bool {
        self.supports().iter().any(Support::is_one_way)
            || self
                .section()
                .slips()
                .iter()
                .any(|joint| joint.clearance() > 0.0)
    }
}
