//! Actions and the loads that belong to them.

use crate::units::{Force, Length, LineLoad};

/// The factors by which a variable action enters combinations (EN 1990:2002 Table A1.1).
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct CombinationFactors {
    /// psi_0: beside another, leading variable action.
    pub psi_0: f64,
    /// psi_1: the frequent value.
    pub psi_1: f64,
    /// psi_2: the quasi-permanent value, which makes creep.
    pub psi_2: f64,
}

/// Whether an action always acts.
#[derive(Clone, Copy, Debug, PartialEq)]
pub enum ActionKind {
    /// Acts from the first day to the last.
    Permanent,
    /// Comes and goes.
    Variable(CombinationFactors),
}

/// One load; positive downward.
#[derive(Clone, Copy, Debug, PartialEq)]
#[non_exhaustive]
pub enum Load {
    /// The weight of the section: sum of density x area x g, over the whole member.
    SelfWeight,
    /// A constant line load over the whole member.
    Uniform {
        /// Load per length.
        load: LineLoad,
    },
    /// A constant line load over a stretch.
    Partial {
        /// Load per length.
        load: LineLoad,
        /// Left end of the stretch.
        from: Length,
        /// Right end of the stretch.
        to: Length,
    },
    /// A point load.
    Point {
        /// The force.
        load: Force,
        /// Its place.
        at: Length,
    },
}

impl Load {
    /// The word used in documents.
    #[must_use]
    pub const fn name(&self) -> &'static str {
        match self {
            Self::SelfWeight => "self_weight",
            Self::Uniform { .. } => "uniform",
            Self::Partial { .. } => "partial",
            Self::Point { .. } => "point",
        }
    }
}

/// A named action: what acts together, from one cause.
#[derive(Clone, Debug, PartialEq)]
pub struct Action {
    name: String,
    kind: ActionKind,
    loads: Vec<Load>,
}

impl Action {
    /// An action of the given kind, without loads yet.
    pub fn new(name: impl Into<String>, kind: ActionKind) -> Self {
        Self {
            name: name.into(),
            kind,
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

    /// The factor of the quasi-permanent value: 1 for a permanent action, psi_2 for a variable one.
    #[must_use]
    pub const fn quasi_permanent(&self) -> f64 {
        match self.kind {
            ActionKind::Permanent => 1.0,
            ActionKind::Variable(factors) => factors.psi_2,
        }
    }
}
