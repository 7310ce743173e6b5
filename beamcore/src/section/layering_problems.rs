//! What is wrong with layers and joints before anything is known of places.

use super::joint::Joint;
use super::layer::Layer;
use super::part::Part;
use super::tree::{self, Links};
use crate::error::{ErrorKind, Problem};
use crate::{check, lookup, path};

/// Everything that is wrong with the names, values and connections of layers and joints.
pub(super) fn problems(parts: &[Part], layers: &[Layer], joints: &[Joint]) -> Vec<Problem> {
    let mut problems = Vec::new();
    if layers.is_empty() {
        problems.push(Problem::new(
            ErrorKind::Missing,
            "section.layers",
            "no layers",
            "at least one layer",
        ));
    }
    problems.extend(layers.iter().flat_map(Layer::problems));
    let names = layers.iter().map(Layer::name);
    check::unique(&mut problems, names, "layers", "section.layers");
    membership(&mut problems, parts, layers);
    problems.extend(joints.iter().flat_map(Joint::problems));
    let names = joints.iter().map(Joint::name);
    check::unique(&mut problems, names, "joints", "section.joints");
    if let Some(links) = links(&mut problems, layers, joints) {
        connections(&mut problems, layers, joints, &links);
    }
    problems
}

/// Each part belongs to one layer.
fn membership(problems: &mut Vec<Problem>, parts: &[Part], layers: &[Layer]) {
    let known: Vec<_> = parts.iter().map(Part::name).collect();
    for layer in layers {
        let at = path::key(&Layer::path(layer.name()), "parts");
        for name in layer.parts() {
            if !known.contains(&name.as_str()) {
                problems.push(Problem::new(
                    ErrorKind::Name,
                    &at,
                    format!("the unknown part \"{name}\""),
                    format!("one of the parts {}", lookup::listed(&known)),
                ));
            }
        }
    }
    for name in known {
        let holders: Vec<_> = layers
            .iter()
            .flat_map(|layer| layer.parts().iter().map(move |part| (layer.name(), part)))
            .filter(|(_, part)| *part == name)
            .map(|(layer, _)| layer)
            .collect();
        if holders.is_empty() && !layers.is_empty() {
            problems.push(Problem::new(
                ErrorKind::Missing,
                path::named("section.parts", name),
                "a part that belongs to no layer",
                "its name among the parts of one of the layers",
            ));
        } else if holders.len() > 1 {
            problems.push(Problem::new(
                ErrorKind::Duplicate,
                path::named("section.parts", name),
                format!(
                    "a part that is named in the layers {}",
                    lookup::listed(&holders)
                ),
                "its name among the parts of one layer, once",
            ));
        }
    }
}

/// The positions of the layers of each joint, if all are known; names that stand twice are not.
fn links(problems: &mut Vec<Problem>, layers: &[Layer], joints: &[Joint]) -> Option<Links> {
    let names: Vec<_> = layers.iter().map(Layer::name).collect();
    let before = problems.len();
    let mut links = Links::new();
    for joint in joints {
        let base = Joint::path(joint.name());
        let mut find = |key: &str, name: &str| {
            let found = names.iter().position(|known| *known == name);
            if found.is_none() {
                let expected = if names.is_empty() {
                    "a layer of the section, which has none".into()
                } else {
                    format!("one of the layers {}", lookup::listed(&names))
                };
                problems.push(Problem::new(
                    ErrorKind::Name,
                    path::key(&base, key),
                    format!("the unknown layer \"{name}\""),
                    expected,
                ));
            }
            found
        };
        let ends = (find("lower", joint.lower()), find("upper", joint.upper()));
        match ends {
            (Some(lower), Some(upper)) if lower != upper => links.push((lower, upper)),
            (Some(_), Some(_)) => problems.push(Problem::new(
                ErrorKind::Name,
                path::key(&base, "upper"),
                format!("\"{}\", which is also the lower layer", joint.upper()),
                "another layer",
            )),
            _ => {}
        }
    }
    let unique = (1..names.len()).all(|i| !names[..i].contains(&names[i]));
    (problems.len() == before && unique).then_some(links)
}

/// The joints hold all layers together, and close no loop.
fn connections(
    problems: &mut Vec<Problem>,
    layers: &[Layer],
    joints: &[Joint],
    links: &[(usize, usize)],
) {
    let quoted = |indices: &[usize]| {
        let names: Vec<_> = indices.iter().map(|&i| layers[i].name()).collect();
        lookup::listed(&names)
    };
    for (i, (joint, &(lower, upper))) in joints.iter().zip(links).enumerate() {
        if let Some(way) = tree::way(&links[..i], lower, upper) {
            problems.push(Problem::new(
                ErrorKind::Geometry,
                Joint::path(joint.name()),
                format!("a joint that closes a loop of the layers {}", quoted(&way)),
                "one way only along the joints from a layer to any other",
            ));
        }
    }
    let group = tree::groups(layers.len(), links.iter().copied());
    for (layer, _) in layers.iter().zip(&group).filter(|(_, group)| **group > 0) {
        problems.push(Problem::new(
            ErrorKind::Missing,
            Layer::path(layer.name()),
            format!(
                "a layer that no joint or chain of joints holds to {}",
                quoted(&[0])
            ),
            "a joint to one of the other layers (rigid, slipping or loose)",
        ));
    }
}
