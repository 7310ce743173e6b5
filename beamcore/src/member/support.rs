//! Supports: where a member is held.

use crate::check;
use crate::error::Problem;
use crate::path;
use crate::units::{Length, RotationalStiffness, SpringStiffness};

/// What a support holds.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub enum SupportKind {
    /// Holds the deflection and the displacement along the axis; the member may turn.
    Pin,
    /// Holds the deflection; the member may turn and slide along its axis.
    Roller,
    /// Holds the deflection, the displacement along the axis and the rotation.
    Fixed,
}

impl SupportKind {
    /// All kinds.
    pub const ALL: [Self; 3] = [Self::Pin, Self::Roller, Self::Fixed];

    /// The word used in documents.
    #[must_use]
    pub const fn name(self) -> &'static str {
        match self {
            Self::Pin => "pin",
            Self::Roller => "roller",
            Self::Fixed => "fixed",
        }
    }
}

/// A layer that a support holds along the member by itself.
#[derive(Clone, Debug, PartialEq)]
pub struct LayerHold {
    /// The name of the layer.
    pub layer: String,
    /// The height at which it is held, in the section's coordinates.
    pub height: Length,
}

/// A lasting support of a member, with a name that addresses its reactions.
///
/// What it holds is rigid unless a spring is given for it. A fixed support holds the rotation of
/// the section, which with shear is not the slope of the axis.
#[derive(Clone, Debug, PartialEq)]
pub struct Support {
    name: String,
    kind: SupportKind,
    at: Length,
    spring: Option<SpringStiffness>,
    axial_spring: Option<SpringStiffness>,
    rotational_spring: Option<RotationalStiffness>,
    lifts_off: bool,
    height: Option<Length>,
    layers: Vec<String>,
    held_layers: Vec<LayerHold>,
}

impl Support {
    /// A support of the given kind at a distance from the left end of the member.
    pub fn new(name: impl Into<String>, kind: SupportKind, at: Length) -> Self {
        Self {
            name: name.into(),
            kind,
            at,
            spring: None,
            axial_spring: None,
            rotational_spring: None,
            lifts_off: false,
            height: None,
            layers: Vec::new(),
            held_layers: Vec::new(),
        }
    }

    /// A pin: holds deflection and axis.
    pub fn pin(name: impl Into<String>, at: Length) -> Self {
        Self::new(name, SupportKind::Pin, at)
    }

    /// A roller: holds the deflection only.
    pub fn roller(name: impl Into<String>, at: Length) -> Self {
        Self::new(name, SupportKind::Roller, at)
    }

    /// A fixed support: holds deflection, axis and rotation.
    pub fn fixed(name: impl Into<String>, at: Length) -> Self {
        Self::new(name, SupportKind::Fixed, at)
    }

    /// The same support, holding the deflection by a spring instead of rigidly.
    #[must_use]
    pub const fn spring(mut self, stiffness: SpringStiffness) -> Self {
        self.spring = Some(stiffness);
        self
    }

    /// The same support with a spring along the axis: of a pin or a fixed support in place of its
    /// rigid hold, of a roller in addition.
    #[must_use]
    pub const fn axial_spring(mut self, stiffness: SpringStiffness) -> Self {
        self.axial_spring = Some(stiffness);
        self
    }

    /// The same support with a spring against rotation: of a fixed support in place of its rigid
    /// hold, of a pin or roller in addition.
    #[must_use]
    pub const fn rotational_spring(mut self, stiffness: RotationalStiffness) -> Self {
        self.rotational_spring = Some(stiffness);
        self
    }

    /// The same support, which can push up but not pull down: the member may lift off it.
    #[must_use]
    pub const fn one_way(mut self) -> Self {
        self.lifts_off = true;
        self
    }

    /// The same support with its hold along the axis at a height of the section, on the first of
    /// the layers that bear on it. Without it, all layers together are held at the elastic centroid
    /// of the section at the left end.
    #[must_use]
    pub const fn at_height(mut self, z: Length) -> Self {
        self.height = Some(z);
        self
    }

    /// The same support as a bearing of these layers only; without it, of all. Its hold along the
    /// axis, if it has one, is then on the first of them.
    #[must_use]
    pub fn under(mut self, layers: impl IntoIterator<Item = impl Into<String>>) -> Self {
        self.layers = layers.into_iter().map(Into::into).collect();
        self
    }

    /// The same support, holding a layer along the member by itself, at a height of the section.
    #[must_use]
    pub fn holding(mut self, layer: impl Into<String>, height: Length) -> Self {
        self.held_layers.push(LayerHold {
            layer: layer.into(),
            height,
        });
        self
    }

    /// The name.
    #[must_use]
    pub fn name(&self) -> &str {
        &self.name
    }

    /// What it holds.
    #[must_use]
    pub const fn kind(&self) -> SupportKind {
        self.kind
    }

    /// Its distance from the left end of the member.
    #[must_use]
    pub const fn at(&self) -> Length {
        self.at
    }

    /// The spring under it, if it was given.
    #[must_use]
    pub const fn given_spring(&self) -> Option<SpringStiffness> {
        self.spring
    }

    /// The spring along the axis, if it was given.
    #[must_use]
    pub const fn given_axial_spring(&self) -> Option<SpringStiffness> {
        self.axial_spring
    }

    /// The spring against rotation, if it was given.
    #[must_use]
    pub const fn given_rotational_spring(&self) -> Option<RotationalStiffness> {
        self.rotational_spring
    }

    /// Whether the member may lift off.
    #[must_use]
    pub const fn is_one_way(&self) -> bool {
        self.lifts_off
    }

    /// The height of the hold along the axis, if it was given.
    #[must_use]
    pub const fn given_height(&self) -> Option<Length> {
        self.height
    }

    /// The layers that bear on it; none means all.
    #[must_use]
    pub fn layers(&self) -> &[String] {
        &self.layers
    }

    /// The layers that it holds along the member by themselves.
    #[must_use]
    pub fn held_layers(&self) -> &[LayerHold] {
        &self.held_layers
    }

    /// Whether it holds the member along the axis, rigidly or by a spring.
    pub(crate) const fn holds_axis(&self) -> bool {
        matches!(self.kind, SupportKind::Pin | SupportKind::Fixed) || self.axial_spring.is_some()
    }

    /// Whether it holds the rotation, rigidly or by a spring.
    pub(crate) const fn holds_rotation(&self) -> bool {
        matches!(self.kind, SupportKind::Fixed) || self.rotational_spring.is_some()
    }

    /// What is wrong with its own values.
    pub(super) fn problems(&self) -> Vec<Problem> {
        let mut problems = Vec::new();
        let base = path::named("member.supports", &self.name);
        let mut key = |key: &str, is_wrong: &mut dyn FnMut(&mut Vec<Problem>, &str)| {
            is_wrong(&mut problems, &path::key(&base, key));
        };
        if let Some(spring) = self.spring {
            key("spring", &mut |p, at| check::not_negative(p, spring, at));
        }
        if let Some(spring) = self.axial_spring {
            key("axial_spring", &mut |p, at| {
                check::not_negative(p, spring, at)
            });
        }
        if let Some(spring) = self.rotational_spring {
            key("rotational_spring", &mut |p, at| {
                check::not_negative(p, spring, at);
            });
        }
        if let Some(height) = self.height {
            key("height", &mut |p, at| check::finite(p, height, at));
        }
        for (i, hold) in self.held_layers.iter().enumerate() {
            key("holding", &mut |p, at| {
                let at = path::key(&path::indexed(at, i), "height");
                check::finite(p, hold.height, &at);
            });
        }
        problems
    }
}
