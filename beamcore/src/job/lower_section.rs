//! The section of the document.

use super::document_section::{
    AxisDocument, ForcesDocument, InitialStrainDocument, OutlineDocument, PartDocument,
    PlaceDocument, SectionDocument,
};
use super::lower_joint;
use super::written::Written;
use crate::check;
use crate::error::{ErrorKind, Problem};
use crate::lookup;
use crate::material::Material;
use crate::outline::{Outline, Vertex};
use crate::path;
use crate::section::{InitialStrain, MirrorAxis, Part, Section, SectionForces, Side};
use crate::units::{Curvature, Length};

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

/// The section, if all its parts are known and fit together.
pub(super) fn section(
    document: &SectionDocument,
    materials: &[(String, Option<Material>)],
    problems: &mut Vec<Problem>,
) -> Option<Section> {
    let mut parts = Vec::new();
    let mut known = true;
    for part in &document.parts {
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
    let layers = lower_joint::layers(&document.layers, problems);
    let joints = lower_joint::joints(&document.joints, problems);
    if !known && parts.is_empty() {
        return None;
    }
    let (all_layers, all_joints) = (
        layers.len() == document.layers.len(),
        joints.len() == document.joints.len(),
    );
    let made = if document.layers.is_empty() && document.joints.is_empty() {
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
    let lowered = Part::new(&part.name, outline(&part.outline)?, material.clone());
    let lowered = match &part.line_mass {
        Some(mass) => lowered.line_mass(mass.value()?),
        None => lowered,
    };
    let lowered = match &part.initial_strain {
        Some(strain) => lowered.initial_strain(initial_strain(strain)?),
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

/// A curvature that is not given is none.
fn initial_strain(document: &InitialStrainDocument) -> Option<InitialStrain> {
    let curvature = |given: &Option<Written<Curvature>>| match given {
        Some(curvature) => curvature.value(),
        None => Some(Curvature::ZERO),
    };
    Some(InitialStrain {
        axial: document.axial.value()?,
        curvature_y: curvature(&document.curvature_y)?,
        curvature_z: curvature(&document.curvature_z)?,
    })
}

fn outline(document: &OutlineDocument) -> Option<Outline> {
    Some(match document {
        OutlineDocument::Rectangle { width, height } => Outline::Rectangle {
            width: width.value()?,
            height: height.value()?,
        },
        OutlineDocument::Polygon { points, holes } => Outline::Polygon {
            points: vertices(points)?,
            holes: holes
                .iter()
                .map(|hole| vertices(hole))
                .collect::<Option<_>>()?,
        },
        OutlineDocument::Disc { diameter } => Outline::Disc {
            diameter: diameter.value()?,
        },
        OutlineDocument::Ring {
            diameter,
            wall_thickness,
        } => Outline::Ring {
            diameter: diameter.value()?,
            wall_thickness: wall_thickness.value()?,
        },
        OutlineDocument::IShape {
            height,
            top_width,
            top_thickness,
            bottom_width,
            bottom_thickness,
            web_thickness,
        } => Outline::IShape {
            height: height.value()?,
            top_width: top_width.value()?,
            top_thickness: top_thickness.value()?,
            bottom_width: bottom_width.value()?,
            bottom_thickness: bottom_thickness.value()?,
            web_thickness: web_thickness.value()?,
        },
        OutlineDocument::Tee {
            height,
            width,
            flange_thickness,
            web_thickness,
        } => Outline::Tee {
            height: height.value()?,
            width: width.value()?,
            flange_thickness: flange_thickness.value()?,
            web_thickness: web_thickness.value()?,
        },
        OutlineDocument::Channel {
            height,
            width,
            flange_thickness,
            web_thickness,
        } => Outline::Channel {
            height: height.value()?,
            width: width.value()?,
            flange_thickness: flange_thickness.value()?,
            web_thickness: web_thickness.value()?,
        },
        OutlineDocument::Angle {
            height,
            width,
            thickness,
        } => Outline::Angle {
            height: height.value()?,
            width: width.value()?,
            thickness: thickness.value()?,
        },
        OutlineDocument::Box {
            width,
            height,
            side_thickness,
            plate_thickness,
        } => Outline::HollowBox {
            width: width.value()?,
            height: height.value()?,
            side_thickness: side_thickness.value()?,
            plate_thickness: plate_thickness.value()?,
        },
    })
}

fn vertices(points: &[[Written<Length>; 2]]) -> Option<Vec<Vertex>> {
    points
        .iter()
        .map(|[y, z]| Some((y.value()?, z.value()?)))
        .collect()
}
