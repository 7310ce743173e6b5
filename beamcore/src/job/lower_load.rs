//! Loads of the document.

use super::document_load::{LoadDocument, TendonDocument, TendonPointDocument};
use super::lower_member::known;
use super::lower_section;
use super::written::Written;
use crate::error::{ErrorKind, Problem};
use crate::member::{Load, Tendon};
use crate::path;
use crate::units::Length;

/// A load, if it is known; one end of a stretch without the other is a problem.
pub(super) fn load(
    document: &LoadDocument,
    base: &str,
    problems: &mut Vec<Problem>,
) -> Option<Load> {
    Some(match document {
        LoadDocument::SelfWeight => Load::SelfWeight,
        LoadDocument::Uniform { load } => Load::Uniform {
            load: load.value()?,
        },
        LoadDocument::Partial { load, from, to } => Load::Partial {
            load: load.value()?,
            from: from.value()?,
            to: to.value()?,
        },
        LoadDocument::Trapezoidal {
            load_from,
            load_to,
            from,
            to,
        } => Load::Trapezoidal {
            load_from: load_from.value()?,
            load_to: load_to.value()?,
            from: from.value()?,
            to: to.value()?,
        },
        LoadDocument::Area {
            load,
            tributary_width,
            from,
            to,
        } => Load::Area {
            load: load.value()?,
            tributary_width: tributary_width.value()?,
            stretch: stretch(from.as_ref(), to.as_ref(), base, "area", problems)?,
        },
        LoadDocument::Plan { load, from, to } => Load::Plan {
            load: load.value()?,
            stretch: stretch(from.as_ref(), to.as_ref(), base, "plan", problems)?,
        },
        LoadDocument::Point { load, at } => Load::Point {
            load: load.value()?,
            at: at.value()?,
        },
        LoadDocument::Couple { couple, at } => Load::Couple {
            couple: couple.value()?,
            at: at.value()?,
        },
        LoadDocument::Axial { load, at, height } => Load::Axial {
            load: load.value()?,
            at: at.value()?,
            height: height.value()?,
        },
        LoadDocument::Prestress { force, tendon } => Load::Prestress {
            force: force.value()?,
            tendon: self::tendon(tendon)?,
        },
        LoadDocument::Settlement {
            support,
            settlement,
        } => Load::Settlement {
            support: support.clone(),
            settlement: settlement.value()?,
        },
        LoadDocument::ImposedRotation { support, rotation } => Load::ImposedRotation {
            support: support.clone(),
            rotation: rotation.value()?,
        },
        LoadDocument::Temperature { change, parts } => Load::Temperature {
            change: change.value()?,
            parts: parts.clone(),
        },
        LoadDocument::TemperatureDifference { difference } => Load::TemperatureDifference {
            difference: difference.value()?,
        },
        LoadDocument::FreeStrain {
            part,
            axial,
            curvature_y,
            curvature_z,
        } => Load::Strain {
            part: part.clone(),
            strain: lower_section::strain(axial, curvature_y.as_ref(), curvature_z.as_ref())?,
        },
    })
}

/// The two ends of a stretch, or neither. The outer `None` stands for what is not known.
#[expect(
    clippy::option_option,
    reason = "given or not, and known or not, are two things"
)]
fn stretch(
    from: Option<&Written<Length>>,
    to: Option<&Written<Length>>,
    base: &str,
    kind: &str,
    problems: &mut Vec<Problem>,
) -> Option<Option<(Length, Length)>> {
    match (known(from)?, known(to)?) {
        (None, None) => Some(None),
        (Some(from), Some(to)) => Some(Some((from, to))),
        (Some(_), None) | (None, Some(_)) => {
            problems.push(Problem::new(
                ErrorKind::Missing,
                path::key(base, kind),
                "only one of from and to",
                "both, or neither for the whole member",
            ));
            None
        }
    }
}

fn tendon(document: &TendonDocument) -> Option<Tendon> {
    let point = |point: &TendonPointDocument| Some((point.at.value()?, point.height.value()?));
    Some(match document {
        TendonDocument::Draped(points) => {
            Tendon::Draped(points.iter().map(point).collect::<Option<_>>()?)
        }
        TendonDocument::Parabolic([first, middle, last]) => {
            Tendon::Parabolic([point(first)?, point(middle)?, point(last)?])
        }
    })
}
