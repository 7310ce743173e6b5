//! The layers and joints of the document.

use super::document_joint::{BandDocument, JointDocument, JointKindDocument, LayerDocument};
use super::written::Written;
use crate::error::{ErrorKind, Problem};
use crate::path;
use crate::section::{Band, Joint, JointKind, Layer, Slip, Spacing};
use crate::units::Length;

/// The layers that are known; one end of an extent without the other is a problem.
pub(super) fn layers(documents: &[LayerDocument], problems: &mut Vec<Problem>) -> Vec<Layer> {
    documents
        .iter()
        .filter_map(|layer| lower_layer(layer, problems))
        .collect()
}

fn lower_layer(document: &LayerDocument, problems: &mut Vec<Problem>) -> Option<Layer> {
    let layer = Layer::new(&document.name, document.parts.iter().map(String::as_str));
    let mut missing = |key: &str, other: &str| {
        problems.push(Problem::new(
            ErrorKind::Missing,
            path::key(&path::named("section.layers", &document.name), key),
            format!("\"{other}\" without \"{key}\""),
            "both of them, or neither for the whole length",
        ));
    };
    match (&document.from, &document.to) {
        (Some(from), Some(to)) => Some(layer.between(from.value()?, to.value()?)),
        (None, None) => Some(layer),
        (Some(_), None) => {
            missing("to", "from");
            None
        }
        (None, Some(_)) => {
            missing("from", "to");
            None
        }
    }
}

/// The joints that are known.
pub(super) fn joints(documents: &[JointDocument], problems: &mut Vec<Problem>) -> Vec<Joint> {
    documents
        .iter()
        .filter_map(|joint| lower_joint(joint, problems))
        .collect()
}

fn lower_joint(document: &JointDocument, problems: &mut Vec<Problem>) -> Option<Joint> {
    let kind = kind(document, problems)?;
    let mut joint = Joint::new(&document.name, &document.lower, &document.upper, kind);
    if let Some(gap) = &document.gap {
        joint = joint.gap(gap.value()?);
    }
    if let Some(modulus) = &document.transverse {
        joint = joint.transverse(modulus.value()?);
    }
    if let Some(clearance) = &document.clearance {
        joint = joint.clearance(clearance.value()?);
    }
    if let Some(creep) = document.creep {
        joint = joint.creep(creep);
    }
    Some(joint)
}

fn kind(document: &JointDocument, problems: &mut Vec<Problem>) -> Option<JointKind> {
    Some(match &document.kind {
        JointKindDocument::Rigid => JointKind::Rigid,
        JointKindDocument::Loose => JointKind::Loose,
        JointKindDocument::Slipping { modulus } => {
            JointKind::Slipping(Slip::Modulus(modulus.value()?))
        }
        JointKindDocument::Fasteners {
            stiffness,
            rows,
            planes,
            spacing,
            bands,
        } => {
            let spacing = match (spacing, bands) {
                (Some(spacing), None) => Spacing::Uniform(spacing.value()?),
                (None, Some(bands)) => Spacing::Bands(lower_bands(bands)?),
                (one, _) => {
                    problems.push(one_of_spacing_and_bands(&document.name, one.as_ref()));
                    return None;
                }
            };
            JointKind::Slipping(Slip::Fasteners {
                stiffness: stiffness.value()?,
                rows: *rows,
                planes: planes.unwrap_or(1),
                spacing,
            })
        }
        JointKindDocument::Glue {
            shear_modulus,
            width,
            thickness,
        } => JointKind::Slipping(Slip::Glue {
            shear_modulus: shear_modulus.value()?,
            width: width.value()?,
            thickness: thickness.value()?,
        }),
    })
}

fn lower_bands(bands: &[BandDocument]) -> Option<Vec<Band>> {
    bands
        .iter()
        .map(|band| {
            Some(Band {
                from: band.from.value()?,
                to: band.to.value()?,
                spacing: band.spacing.value()?,
            })
        })
        .collect()
}

/// The problem of fasteners with both a spacing and bands, or with neither.
fn one_of_spacing_and_bands(joint: &str, spacing: Option<&Written<Length>>) -> Problem {
    let kind = path::key(&path::named("section.joints", joint), "kind");
    let (kind_of, found) = match spacing {
        Some(_) => (ErrorKind::Value, "spacing beside bands"),
        None => (ErrorKind::Missing, "neither spacing nor bands"),
    };
    Problem::new(
        kind_of,
        path::key(&kind, "fasteners"),
        found,
        "one of them, for example spacing = \"150 mm\"",
    )
}
