//! What the loads of a member ask of the parts of a section.

use super::action::Action;
use super::load::Load;
use crate::error::{ErrorKind, Problem};
use crate::path;
use crate::section::{InitialStrain, PlacedPart, Section, Sideways};

/// Self-weight needs the density of each part.
pub(super) fn check_self_weight(
    problems: &mut Vec<Problem>,
    section: &Section,
    actions: &[Action],
) {
    let carries = |action: &&Action| action.loads().contains(&Load::SelfWeight);
    let Some(action) = actions.iter().find(carries) else {
        return;
    };
    let mut told: Vec<&str> = Vec::new();
    for part in section.placed() {
        let material = part.material();
        if material.mean_density().is_none() && !told.contains(&material.name()) {
            told.push(material.name());
            problems.push(Problem::new(
                ErrorKind::Missing,
                path::key(&path::named("materials", material.name()), "density"),
                "no density",
                format!(
                    "a density, since the action \"{}\" carries the self-weight",
                    action.name()
                ),
            ));
        }
    }
}

/// Initial strains are followed for members that are held sideways only.
pub(super) fn strains_held(section: &Section, sideways: Sideways) -> Option<Problem> {
    let strained = |part: &&PlacedPart| part.initial_strain() != InitialStrain::NONE;
    let part = section.placed().iter().find(strained)?;
    (sideways == Sideways::Free).then(|| {
        let base = path::named("section.parts", part.name());
        Problem::new(
            ErrorKind::Value,
            path::key(&base, "initial_strain"),
            "an initial strain in a member that is free sideways",
            "a member that is held sideways",
        )
    })
}
