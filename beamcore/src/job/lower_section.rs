//! The section of the document.

use super::document_joint::{JointDocument, LayerDocument};
use super::document_section::{
    AxisDocument, ChangedSectionDocument, ForcesDocument, PartDocument, PlaceDocument,
    SectionDocument,
};
use super::written::Written;
use super::{lower_joint, lower_outline};
use crate::check;
use crate::error::{ErrorKind, Problem};
use crate::lookup;
use crate::material::Material;
use crate::path;
use crate::section::{InitialStrain, MirrorAxis, Part, Section, SectionForces, Side};
use crate::units::{Curvature, Strain};
use std::collections::BTreeMap;

/// The name under which changes speak of the section with which the member begins.
const MAIN: &str = "main";

/// A section by its name; `None` where it is wrong, which is told.
pub(super) type NamedSection = (String, Option<Section>);

/// The named forces on the section that are known; a name that stands twice is a problem.
pub(super) fn forces(
    document: &SectionDocument,
    problems: &mut Vec<Problem>,
) -> Vec<(String, SectionForces)> {
    let names = document.forces.iter().map(|forces| forces.name.as_str());
    check::unique(problems, names, "forces", "section.forces");
    let lowered = |forces: &ForcesDocument| {
        check::name(problems, &forces.name, "section.forces");
        let given = SectionForces {
            axial: forces.axial.value()?,
            moment_y: forces.moment_y.value()?,
            moment_z: forces.moment_z.value()?,
        };
        Some((forces.name.clone(), given))
    };
    document.forces.iter().filter_map(lowered).collect()
}

/// The section with which the member begins, if all its parts are known and fit together.
pub(super) fn section(
    document: &SectionDocument,
    materials: &[(String, Option<Material>)],
    problems: &mut Vec<Problem>,
) -> Option<Section> {
    let written = (&*document.parts, &*document.layers, &*document.joints);
    assembled(written, materials, problems)
}

/// All sections that changes can name: that with which the member begins, and the others.
pub(super) fn all(
    main: Option<&Section>,
    documents: &BTreeMap<String, ChangedSectionDocument>,
    materials: &[(String, Option<Material>)],
    problems: &mut Vec<Problem>,
) -> Vec<NamedSection> {
    let mut sections = vec![(MAIN.to_owned(), main.cloned())];
    for (name, document) in documents {
        let base = path::named("sections", name);
        check::name(problems, name, "sections");
        if name == MAIN {
            problems.push(Problem::new(
                ErrorKind::Duplicate,
                &base,
                format!("another section named \"{MAIN}\""),
                format!("another name, for \"{MAIN}\" is the section with which the member begins"),
            ));
            continue;
        }
        let written = (&*document.parts, &*document.layers, &*document.joints);
        let mut own = Vec::new();
        let section = assembled(written, materials, &mut own);
        problems.extend(own.iter().map(|problem| moved(problem, &base)));
        sections.push((name.clone(), section));
    }
    sections
}

/// A problem of a section told where that section stands in the document.
fn moved(problem: &Problem, base: &str) -> Problem {
    let at = match problem.path().strip_prefix("section") {
        Some(rest) => format!("{base}{rest}"),
        None => problem.path().to_owned(),
    };
    Problem::new(problem.kind(), at, problem.found(), problem.expected())
}

/// A section of written parts, layers and joints.
fn assembled(
    (part_documents, layer_documents, joint_documents): (
        &[PartDocument],
        &[LayerDocument],
        &[JointDocument],
    ),
    materials: &[(String, Option<Material>)],
    problems: &mut Vec<Problem>,
) -> Option<Section> {
    let mut parts = Vec::new();
    let mut known = true;
    for part in part_documents {
        let found = materials
            .iter()
            .find(|material| material.0 == part.material);
        if found.is_none() {
            let names: Vec<_> = materials
                .iter()
                .map(|material| material.0.as_str())
                .collect();
            problems.push(Problem::new(
                ErrorKind::Name,
                path::key(&path::named("section.parts", &part.name), "material"),
                format!("the unknown material \"{}\"", part.material),
                format!("one of the materials {}", lookup::listed(&names)),
            ));
        }
        match found
            .and_then(|material| material.1.as_ref())
            .and_then(|m| lower_part(part, m))
        {
            Some(part) => parts.push(part),
            None => known = false,
        }
    }
    let layers = lower_joint::layers(layer_documents, problems);
    let joints = lower_joint::joints(joint_documents, problems);
    if !known && parts.is_empty() {
        return None;
    }
    let (all_layers, all_joints) = (
        layers.len() == layer_documents.len(),
        joints.len() == joint_documents.len(),
    );
    let made = if layer_documents.is_empty() && joint_documents.is_empty() {
        Section::of(parts)
    } else {
        Section::layered(parts, layers, joints)
    };
    known &= all_layers && all_joints;
    match made {
        Ok(section) => known.then_some(section),
        Err(error) => {
            // What is left out here must not be missed by what speaks of it.
            let missed = |p: &Problem| {
                let found = |text: &str| p.found().starts_with(text);
                !known && found("the unknown part")
                    || !all_layers
                        && (found("the unknown layer") || found("a part that belongs to no layer"))
                    || !(all_layers && all_joints) && found("a layer that no joint")
                    || !all_layers && p.path() == "section.layers"
            };
            problems.extend(error.problems().iter().filter(|p| !missed(p)).cloned());
            None
        }
    }
}

fn lower_part(part: &PartDocument, material: &Material) -> Option<Part> {
    let lowered = Part::new(
        &part.name,
        lower_outline::outline(&part.outline)?,
        material.clone(),
    );
    let lowered = match &part.line_mass {
        Some(mass) => lowered.line_mass(mass.value()?),
        None => lowered,
    };
    let lowered = match &part.initial_strain {
        Some(written) => {
            let (y, z) = (written.curvature_y.as_ref(), written.curvature_z.as_ref());
            lowered.initial_strain(strain(&written.axial, y, z)?)
        }
        None => lowered,
    };
    Some(match &part.place {
        None => lowered,
        Some(PlaceDocument::At { y, z }) => lowered.at(y.value()?, z.value()?),
        Some(PlaceDocument::LeftOf(other)) => lowered.beside(Side::Left, other.as_str()),
        Some(PlaceDocument::RightOf(other)) => lowered.beside(Side::Right, other.as_str()),
        Some(PlaceDocument::Above(other)) => lowered.beside(Side::Above, other.as_str()),
        Some(PlaceDocument::Below(other)) => lowered.beside(Side::Below, other.as_str()),
        Some(PlaceDocument::MirrorOf { part, axis }) => {
            let axis = match axis {
                AxisDocument::Upright => MirrorAxis::Upright,
                AxisDocument::Level => MirrorAxis::Level,
            };
            lowered.mirror_of(part.as_str(), axis)
        }
        Some(PlaceDocument::SetInto { host, y, z }) => {
            lowered.set_into(host.as_str(), y.value()?, z.value()?)
        }
    })
}

/// The free strain of a part. A curvature that is not given is none.
pub(super) fn strain(
    axial: &Written<Strain>,
    curvature_y: Option<&Written<Curvature>>,
    curvature_z: Option<&Written<Curvature>>,
) -> Option<InitialStrain> {
    let curvature = |given: Option<&Written<Curvature>>| match given {
        Some(curvature) => curvature.value(),
        None => Some(Curvature::ZERO),
    };
    Some(InitialStrain {
        axial: axial.value()?,
        curvature_y: curvature(curvature_y)?,
        curvature_z: curvature(curvature_z)?,
    })
}
