//! Actions: what acts together, from one cause.

use super::category::CombinationFactors;
use super::load::Load;
use crate::units::{AreaLoad, Duration, Force, Length, LineLoad, Moment};

/// Whether an action always acts.
#[derive(Clone, Copy, Debug, PartialEq)]
pub enum ActionKind {
    /// Acts from the first day to the last.
    Permanent,
    /// Comes and goes.
    Variable(CombinationFactors),
}

/// Whether an action makes things worse or better.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
pub enum Effect {
    /// It adds to what is being checked.
    #[default]
    Unfavourable,
    /// It relieves: a permanent action gets its smaller factor, a variable one is left out.
    Favourable,
}

/// How long an action acts at a time (EN 1995-1-1:2004 2.3.1.2, from memory).
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub enum LoadDuration {
    /// More than ten years.
    Permanent,
    /// Six months to ten years.
    Long,
    /// A week to six months.
    Medium,
    /// Less than a week.
    Short,
    /// Moments.
    Instantaneous,
}

impl LoadDuration {
    /// All durations, the longest first.
    pub const ALL: [Self; 5] = [
        Self::Permanent,
        Self::Long,
        Self::Medium,
        Self::Short,
        Self::Instantaneous,
    ];

    /// The word used in documents.
    #[must_use]
    pub const fn name(self) -> &'static str {
        match self {
            Self::Permanent => "permanent",
            Self::Long => "long",
            Self::Medium => "medium",
            Self::Short => "short",
            Self::Instantaneous => "instantaneous",
        }
    }
}

/// A named action: what acts together, from one cause.
#[derive(Clone, Debug, PartialEq)]
pub struct Action {
    name: String,
    kind: ActionKind,
    effect: Effect,
    duration: Option<LoadDuration>,
    start: Option<Duration>,
    layer: Option<String>,
    loads: Vec<Load>,
}

impl Action {
    /// An action of the given kind, without loads yet.
    pub fn new(name: impl Into<String>, kind: ActionKind) -> Self {
        Self {
            name: name.into(),
            kind,
            effect: Effect::Unfavourable,
            duration: None,
            start: None,
            layer: None,
            loads: Vec::new(),
        }
    }

    /// A permanent action, without loads yet.
    pub fn permanent(name: impl Into<String>) -> Self {
        Self::new(name, ActionKind::Permanent)
    }

    /// A variable action with its combination factors, without loads yet.
    pub fn variable(name: impl Into<String>, factors: CombinationFactors) -> Self {
        Self::new(name, ActionKind::Variable(factors))
    }

    /// The same action, known to relieve what is being checked; without this, an action is taken
    /// as unfavourable.
    #[must_use]
    pub fn favourable(mut self) -> Self {
        self.effect = Effect::Favourable;
        self
    }

    /// The same action with its duration, by which the engineer chooses k_mod. It is kept with the
    /// action; no result depends on it.
    #[must_use]
    pub const fn duration(mut self, duration: LoadDuration) -> Self {
        self.duration = Some(duration);
        self
    }

    /// The same action with its start, counted from the first day of the member. It is kept with
    /// the action; the final state takes the creep of the whole life.
    #[must_use]
    pub const fn starting(mut self, start: Duration) -> Self {
        self.start = Some(start);
        self
    }

    /// The same action with all its loads entering the layer of this name. Without it they enter the
    /// highest layer where all layers share one deflection, else the first layer. It matters where
    /// layers have deflections of their own, where forces act along the member (pitched members
    /// too), and for the pressure between layers.
    #[must_use]
    pub fn on(mut self, layer: impl Into<String>) -> Self {
        self.layer = Some(layer.into());
        self
    }

    /// The same action with one more load.
    #[must_use]
    pub fn load(mut self, load: Load) -> Self {
        self.loads.push(load);
        self
    }

    /// The same action with the weight of the section.
    #[must_use]
    pub fn self_weight(self) -> Self {
        self.load(Load::SelfWeight)
    }

    /// The same action with a line load over the whole member, positive downward.
    #[must_use]
    pub fn uniform(self, load: LineLoad) -> Self {
        self.load(Load::Uniform { load })
    }

    /// The same action with a line load between two places, positive downward.
    #[must_use]
    pub fn partial(self, load: LineLoad, from: Length, to: Length) -> Self {
        self.load(Load::Partial { load, from, to })
    }

    /// The same action with a point load, positive downward.
    #[must_use]
    pub fn point(self, load: Force, at: Length) -> Self {
        self.load(Load::Point { load, at })
    }

    /// The same action with a line load that grows or falls linearly between two places, positive
    /// downward; a triangular load where one of its ends is zero.
    #[must_use]
    pub fn trapezoidal(
        self,
        load_from: LineLoad,
        load_to: LineLoad,
        from: Length,
        to: Length,
    ) -> Self {
        self.load(Load::Trapezoidal {
            load_from,
            load_to,
            from,
            to,
        })
    }

    /// The same action with a load per area of floor over the whole member: the line load is
    /// load x tributary width, positive downward.
    #[must_use]
    pub fn area(self, load: AreaLoad, tributary_width: Length) -> Self {
        self.load(Load::Area {
            load,
            tributary_width,
            stretch: None,
        })
    }

    /// The same action with a couple, positive clockwise.
    #[must_use]
    pub fn couple(self, couple: Moment, at: Length) -> Self {
        self.load(Load::Couple { couple, at })
    }

    /// The name.
    #[must_use]
    pub fn name(&self) -> &str {
        &self.name
    }

    /// The kind.
    #[must_use]
    pub const fn kind(&self) -> ActionKind {
        self.kind
    }

    /// The loads, in the order given.
    #[must_use]
    pub fn loads(&self) -> &[Load] {
        &self.loads
    }

    /// The layer that its loads enter, if one was named.
    #[must_use]
    pub fn layer(&self) -> Option<&str> {
        self.layer.as_deref()
    }

    /// Whether it makes things worse or better.
    #[must_use]
    pub const fn effect(&self) -> Effect {
        self.effect
    }

    /// How long it acts at a time, if that was said.
    #[must_use]
    pub const fn load_duration(&self) -> Option<LoadDuration> {
        self.duration
    }

    /// When it starts, if that was said.
    #[must_use]
    pub const fn start(&self) -> Option<Duration> {
        self.start
    }

    pub(super) const fn is_variable(&self) -> bool {
        matches!(self.kind, ActionKind::Variable(_))
    }

    /// The factors of a variable action; a permanent one is never reduced.
    pub(super) const fn psi(&self) -> CombinationFactors {
        match self.kind {
            ActionKind::Permanent => CombinationFactors {
                psi_0: 1.0,
                psi_1: 1.0,
                psi_2: 1.0,
            },
            ActionKind::Variable(factors) => factors,
        }
    }

    /// The factor of the quasi-permanent value: 1 for a permanent action, psi_2 for a variable one
    /// (0 if it is favourable).
    #[must_use]
    pub const fn quasi_permanent(&self) -> f64 {
        match (self.kind, self.effect) {
            (ActionKind::Permanent, _) => 1.0,
            (ActionKind::Variable(factors), Effect::Unfavourable) => factors.psi_2,
            (ActionKind::Variable(_), Effect::Favourable) => 0.0,
        }
    }
}
