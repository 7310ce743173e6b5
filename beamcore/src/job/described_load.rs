//! Loads of a job in words, as they were written.

use super::described::quoted;
use super::document_load::{LoadDocument, TendonDocument, TendonPointDocument};
use super::written::Written;
use crate::units::Length;

impl LoadDocument {
    /// For example `2.4 kN/m from 1.1 m to 5.3 m`.
    pub(super) fn described(&self) -> String {
        match self {
            Self::SelfWeight => "self-weight".to_owned(),
            Self::Uniform { load } => format!("{} over the whole member", load.text()),
            Self::Partial { load, from, to } => {
                format!("{} from {} to {}", load.text(), from.text(), to.text())
            }
            Self::Trapezoidal {
                load_from,
                load_to,
                from,
                to,
            } => format!(
                "{} at {} to {} at {}",
                load_from.text(),
                from.text(),
                load_to.text(),
                to.text()
            ),
            Self::Area {
                load,
                tributary_width,
                from,
                to,
            } => format!(
                "{} on {} width {}",
                load.text(),
                tributary_width.text(),
                stretch(from.as_ref(), to.as_ref())
            ),
            Self::Plan { load, from, to } => format!(
                "{} of the plan {}",
                load.text(),
                stretch(from.as_ref(), to.as_ref())
            ),
            Self::Point { load, at } => format!("{} at {}", load.text(), at.text()),
            Self::Couple { couple, at } => format!("couple {} at {}", couple.text(), at.text()),
            Self::Axial { load, at, height } => format!(
                "{} along the member at {}, z = {}",
                load.text(),
                at.text(),
                height.text()
            ),
            Self::Prestress { force, tendon } => {
                format!("tendon of {}, {}", force.text(), tendon.described())
            }
            Self::Settlement {
                support,
                settlement,
            } => format!("\"{support}\" sinks by {}", settlement.text()),
            Self::ImposedRotation { support, rotation } => {
                format!("\"{support}\" turns by {}", rotation.text())
            }
            Self::Temperature { change, parts } if parts.is_empty() => {
                format!("all parts warmer by {}", change.text())
            }
            Self::Temperature { change, parts } => {
                format!("{} warmer by {}", quoted(parts), change.text())
            }
            Self::TemperatureDifference { difference } => {
                format!("top warmer than bottom by {}", difference.text())
            }
            Self::FreeStrain {
                part,
                axial,
                curvature_y,
                curvature_z,
            } => {
                let mut text = format!("free strain of \"{part}\" {}", axial.text());
                for (axis, curvature) in [("y", curvature_y), ("z", curvature_z)] {
                    if let Some(curvature) = curvature {
                        text.push_str(&format!(", curvature_{axis} {}", curvature.text()));
                    }
                }
                text
            }
        }
    }
}

impl TendonDocument {
    fn described(&self) -> String {
        let (kind, points): (&str, &[TendonPointDocument]) = match self {
            Self::Draped(points) if points.len() == 2 => ("straight", points),
            Self::Draped(points) => ("draped", points),
            Self::Parabolic(points) => ("parabolic", points),
        };
        let point =
            |point: &TendonPointDocument| format!("({}, {})", point.at.text(), point.height.text());
        let points: Vec<_> = points.iter().map(point).collect();
        format!("{kind} through (x, z) = {}", points.join(", "))
    }
}

fn stretch(from: Option<&Written<Length>>, to: Option<&Written<Length>>) -> String {
    match (from, to) {
        (Some(from), Some(to)) => format!("from {} to {}", from.text(), to.text()),
        _ => "over the whole member".to_owned(),
    }
}
