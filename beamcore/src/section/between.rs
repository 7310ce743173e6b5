//! The section between two like ones, as along a taper.

use super::part::Part;
use super::place::Placement;
use super::{Layer, Section};
use crate::error::{ErrorKind, Problem, Result};
use crate::path;
use crate::units::Length;

impl Section {
    /// The section whose every size and place lies at the given share of the way from this one's
    /// to the other's. The two must be alike: the same parts of the same materials and shapes,
    /// placed in the same ways, in the same layers and joints.
    ///
    /// # Errors
    /// [`ErrorKind::Geometry`] if the two are not alike, with what differs; else as
    /// [`Section::layered`] for sizes that do not fit together on the way.
    pub fn between(&self, other: &Self, share: f64) -> Result<Self> {
        let names = |section: &Self| -> Vec<String> {
            section.parts().iter().map(|p| p.name().into()).collect()
        };
        if names(self) != names(other) {
            return Err(unlike(
                "section.parts",
                &format!("the parts {:?} and {:?}", names(self), names(other)),
                "the same parts in the same order",
            ));
        }
        let parts: Vec<Part> = self
            .parts()
            .iter()
            .zip(other.parts())
            .map(|(a, b)| part(a, b, share))
            .collect::<Result<_>>()?;
        let grouped = |section: &Self| -> Vec<Layer> { section.layers().to_vec() };
        if grouped(self) != grouped(other) || self.joints() != other.joints() {
            return Err(unlike(
                "section.layers",
                "layers or joints that differ",
                "the same layers and joints at both ends",
            ));
        }
        if self.joints().is_empty() {
            Self::of(parts)
        } else {
            Self::layered(parts, grouped(self), self.joints().to_vec())
        }
    }
}

fn part(a: &Part, b: &Part, share: f64) -> Result<Part> {
    let base = path::named("section.parts", a.name());
    let outline = a.outline().between(b.outline(), share).ok_or_else(|| {
        unlike(
            &path::key(&base, "outline"),
            &format!("a {} and a {}", a.outline().name(), b.outline().name()),
            "outlines of one shape, with as many corners",
        )
    })?;
    if a.material() != b.material() {
        return Err(unlike(
            &path::key(&base, "material"),
            &format!(
                "\"{}\" and \"{}\"",
                a.material().name(),
                b.material().name()
            ),
            "one material along the part",
        ));
    }
    let placement = placement(a.placement(), b.placement(), share).ok_or_else(|| {
        unlike(
            &path::key(&base, "place"),
            "two places of different kinds",
            "places of one kind, beside the same part",
        )
    })?;
    let same = a.given_initial_strain() == b.given_initial_strain();
    let line_mass = match (a.given_line_mass(), b.given_line_mass()) {
        (None, None) => Some(None),
        (Some(m), Some(n)) => Some(Some(m + (n - m) * share)),
        _ => None,
    };
    let (true, Some(line_mass)) = (same, line_mass) else {
        return Err(unlike(
            &base,
            "an initial strain or a line mass at one end only",
            "the same initial strain, and line masses at both ends or none",
        ));
    };
    let made = Part::new(a.name(), outline, a.material().clone())
        .placed(placement)
        .initial_strain(a.given_initial_strain());
    Ok(match line_mass {
        Some(mass) => made.line_mass(mass),
        None => made,
    })
}

fn placement(a: &Placement, b: &Placement, share: f64) -> Option<Placement> {
    let mid = |a: Length, b: Length| a + (b - a) * share;
    match (a, b) {
        (Placement::At { y, z }, Placement::At { y: v, z: w }) => Some(Placement::At {
            y: mid(*y, *v),
            z: mid(*z, *w),
        }),
        (
            Placement::SetInto { host, y, z },
            Placement::SetInto {
                host: other,
                y: v,
                z: w,
            },
        ) if host == other => Some(Placement::SetInto {
            host: host.clone(),
            y: mid(*y, *v),
            z: mid(*z, *w),
        }),
        (Placement::Beside { .. } | Placement::MirrorOf { .. }, _) if a == b => Some(a.clone()),
        _ => None,
    }
}

fn unlike(at: &str, found: &str, expected: &str) -> crate::Error {
    Problem::new(
        ErrorKind::Geometry,
        at,
        format!("a taper between {found}"),
        expected,
    )
    .into()
}
