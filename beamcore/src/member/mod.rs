//! Members: a section along a length, on supports, under actions.

mod action;
mod category;
mod checks;
mod combination;
mod layout;
mod load;
mod load_case;
mod plan;
mod plausible;
mod span;
mod support;

pub use action::{Action, ActionKind, Effect, LoadDuration};
pub use category::{Category, CombinationFactors};
pub use combination::{Combination, CombinationKind, OwnCombination, PartialFactors};
pub use load::Load;
pub use plan::MemberPlan;
pub use span::Span;
pub use support::{Support, SupportKind};

#[cfg(feature = "document")]
pub(crate) use checks::{Known, problems_of};
#[cfg(feature = "document")]
pub(crate) use combination::{all as combinations_of, problems as combination_problems};
pub(crate) use layout::SAME_PLACE;
pub(crate) use load_case::{curvature_case, load_case};
#[cfg(feature = "document")]
pub(crate) use span::all as spans_of;

use crate::error::Result;
use crate::lookup;
use crate::section::{Section, Sideways, Stiffness, StrainPlane};
use crate::solve::beam::Beam;
use crate::time::Time;
use crate::units::Length;
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
    combinations: Vec<Combination>,
    states: [MemberState; 2],
    spans: Vec<Span>,
    notes: Vec<String>,
}

/// What the solver needs of a member at one time.
#[derive(Clone, Debug)]
pub(crate) struct MemberState {
    pub(crate) stiffness: Stiffness,
    pub(crate) beam: Beam,
    /// The strain that the section takes freely under the initial strains of its parts.
    pub(crate) free: StrainPlane,
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
        let layout = layout::Layout::new(&plan);
        let states = Time::ALL.map(|time| {
            let stiffness = plan.section().stiffness(time);
            layout
                .beam(stiffness.against_bending(plan.is_held()).0)
                .map(|beam| MemberState {
                    free: plan.section().free_plane(time, plan.is_held()),
                    stiffness,
                    beam,
                })
        });
        let [initial, end] = states;
        let combinations =
            combination::all(plan.actions(), plan.factors(), plan.own_combinations());
        let spans = span::all(plan.length(), plan.supports());
        let data = Data {
            spans,
            combinations,
            states: [initial?, end?],
            notes: layout
                .notes()
                .into_iter()
                .chain(plausible::notes(&plan))
                .collect(),
            plan,
        };
        Ok(Self {
            data: Arc::new(data),
        })
    }

    /// The section.
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

    pub(crate) fn state(&self, time: Time) -> &MemberState {
        match time {
            Time::Initial => &self.data.states[0],
            Time::Final => &self.data.states[1],
        }
    }
}
