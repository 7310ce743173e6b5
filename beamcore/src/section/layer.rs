//! Layers: parts that act as one piece.

use super::place::PartName;
use crate::check;
use crate::error::{ErrorKind, Problem};
use crate::path;
use crate::units::Length;

/// The parts that act as one piece, without slip between them.
///
/// # Examples
/// ```
/// use beamcore::section::Layer;
/// use beamcore::units::Number;
/// let plate = Layer::new("plate", ["left plate", "right plate"]).between(0.8.m(), 4.2.m());
/// assert_eq!(plate.parts(), ["left plate", "right plate"]);
/// assert_eq!(plate.extent(), Some((0.8.m(), 4.2.m())));
/// ```
#[derive(Clone, Debug, PartialEq)]
pub struct Layer {
    name: String,
    parts: Vec<String>,
    extent: Option<(Length, Length)>,
}

impl Layer {
    /// A layer over the whole length of the member, of the parts of these names.
    pub fn new(
        name: impl Into<String>,
        parts: impl IntoIterator<Item = impl Into<PartName>>,
    ) -> Self {
        Self {
            name: name.into(),
            parts: parts.into_iter().map(|part| part.into().0).collect(),
            extent: None,
        }
    }

    /// The same layer, there only from one place along the member to another, measured from its
    /// left end. What is set into a host displaces it over the whole length all the same.
    #[must_use]
    pub const fn between(mut self, from: Length, to: Length) -> Self {
        self.extent = Some((from, to));
        self
    }

    /// The name.
    #[must_use]
    pub fn name(&self) -> &str {
        &self.name
    }

    /// The names of the parts.
    #[must_use]
    pub fn parts(&self) -> &[String] {
        &self.parts
    }

    /// From where to where along the member the layer is there; `None` for the whole length.
    #[must_use]
    pub const fn extent(&self) -> Option<(Length, Length)> {
        self.extent
    }

    /// The path of a layer.
    pub(super) fn path(name: &str) -> String {
        path::named("section.layers", name)
    }

    /// The same layer with only the parts that are kept; `None` if there are none.
    pub(super) fn of_kept(&self, is_kept: impl Fn(&str) -> bool) -> Option<Self> {
        let kept = self.parts.iter().filter(|name| is_kept(name.as_str()));
        let parts: Vec<_> = kept.cloned().collect();
        (!parts.is_empty()).then(|| Self {
            parts,
            ..self.clone()
        })
    }

    /// Whether the layer is there at x.
    pub(super) fn covers(&self, x: f64) -> bool {
        self.extent
            .is_none_or(|(from, to)| from.si() <= x && x <= to.si())
    }

    /// What is wrong with the layer by itself.
    pub(super) fn problems(&self) -> Vec<Problem> {
        let mut problems = Vec::new();
        check::name(&mut problems, &self.name, "section.layers");
        let base = Self::path(&self.name);
        if self.parts.is_empty() {
            problems.push(Problem::new(
                ErrorKind::Missing,
                path::key(&base, "parts"),
                "a layer without parts",
                "the names of its parts, at least one",
            ));
        }
        if let Some(extent) = self.extent {
            stretch_problems(&mut problems, extent, &base);
        }
        problems
    }
}

/// Problems of a stretch along the member: it begins at 0 or later and ends after it begins.
pub(super) fn stretch_problems(
    problems: &mut Vec<Problem>,
    (from, to): (Length, Length),
    base: &str,
) {
    let before = problems.len();
    check::not_negative(problems, from, &path::key(base, "from"));
    check::finite(problems, to, &path::key(base, "to"));
    if problems.len() == before && to <= from {
        problems.push(Problem::new(
            ErrorKind::Position,
            path::key(base, "to"),
            to.to_string(),
            format!("a place to the right of where it begins, {from}"),
        ));
    }
}
