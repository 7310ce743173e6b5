//! The creep factor of a joint.

use super::joint::Joint;
use super::placed::PlacedPart;
use crate::error::{ErrorKind, Problem};
use crate::lookup;
use crate::material::{CharacteristicStrength, Creep, Material, ServiceClass};
use crate::path;

/// A creep factor of a joint, and where it comes from.
#[derive(Clone, Debug, PartialEq)]
pub(super) struct JointCreep {
    pub(super) factor: f64,
    pub(super) basis: String,
}

impl JointCreep {
    fn none(basis: &str) -> Self {
        Self {
            factor: 0.0,
            basis: basis.into(),
        }
    }
}

/// The creep factor of a joint between layers of these parts: as given; else none where neither
/// side creeps, 2 sqrt(`k_def,1` `k_def,2`) between wood-based layers, which is 2 `k_def` between
/// equal ones; else a problem.
///
/// Source: EN 1995-1-1:2004 2.3.2.2 (3) and (4), from memory.
pub(super) fn of(
    joint: &Joint,
    lower: &[&PlacedPart],
    upper: &[&PlacedPart],
) -> Result<JointCreep, Problem> {
    if !joint.has_modulus() {
        return Ok(JointCreep::none("no stiffness that creeps"));
    }
    if let Some(factor) = joint.given_creep() {
        return Ok(JointCreep {
            factor,
            basis: "creep factor of the joint as given".into(),
        });
    }
    let creeps = |part: &&PlacedPart| part.material().creep().value() != 0.0;
    if !lower.iter().any(creeps) && !upper.iter().any(creeps) {
        return Ok(JointCreep::none("no creep on either side"));
    }
    let sides = [(joint.lower(), lower), (joint.upper(), upper)];
    let others: Vec<_> = sides
        .iter()
        .flat_map(|(_, parts)| parts.iter())
        .map(|part| part.material())
        .filter(|material| !is_wood_based(material))
        .map(Material::name)
        .collect();
    if !others.is_empty() {
        return Err(missing(joint, &others));
    }
    let [one, other] = sides.map(|(_, parts)| greatest(parts));
    let several = sides
        .iter()
        .filter(|(_, parts)| parts.iter().any(|part| factor(part) != factor(parts[0])))
        .map(|(name, parts)| {
            format!(
                "; of the materials of the layer \"{name}\" the greatest k_def, {}",
                greatest(parts)
            )
        });
    let (factor, rule) = if one == other {
        (
            2.0 * one,
            format!("2 k_def of wood-based layers, 2 * {one}"),
        )
    } else {
        (
            2.0 * (one * other).sqrt(),
            format!("2 sqrt(k_def,1 k_def,2) of wood-based layers, 2 sqrt({one} * {other})"),
        )
    };
    let basis = format!(
        "{rule}, EN 1995-1-1:2004 2.3.2.2 (from memory){}",
        several.collect::<String>()
    );
    Ok(JointCreep { factor, basis })
}

fn factor(part: &PlacedPart) -> f64 {
    part.material().creep().value()
}

/// The greatest creep factor of the parts of a layer.
fn greatest(parts: &[&PlacedPart]) -> f64 {
    parts.iter().map(|part| factor(part)).fold(0.0, f64::max)
}

/// Whether a material is known to be of wood: it creeps as timber of a service class, or has the
/// strengths of timber.
fn is_wood_based(material: &Material) -> bool {
    let classes = [ServiceClass::One, ServiceClass::Two, ServiceClass::Three];
    let has_k_def = classes
        .into_iter()
        .any(|class| *material.creep() == Creep::timber(class));
    let is_timber = matches!(
        material.characteristic(),
        Some(CharacteristicStrength::Timber(_))
    );
    has_k_def || is_timber
}

fn missing(joint: &Joint, others: &[&str]) -> Problem {
    let mut names: Vec<&str> = Vec::new();
    for name in others {
        if !names.contains(name) {
            names.push(name);
        }
    }
    Problem::new(
        ErrorKind::Missing,
        path::key(&Joint::path(joint.name()), "creep"),
        format!(
            "no creep factor, with {}, not known to be wood-based, in the layers \"{}\" and \"{}\"",
            lookup::listed(&names),
            joint.lower(),
            joint.upper()
        ),
        "the creep factor of the joint (beside timber, 2 k_def of the timber is a common choice)",
    )
}
