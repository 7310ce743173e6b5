//! Reads the cases of this folder and builds the members that they describe.

use beamcore::material::{Creep, Material};
use beamcore::member::{Action, Anchor, Hinge, Load, Member, MemberPlan, ShearModel, Support};
use beamcore::section::{
    Band, InitialStrain, Joint, Layer, Part, Section, Slip, Spacing, rectangle,
};
use beamcore::units::{
    Angle, FastenerStiffness, Force, Length, LineLoad, Modulus, Moment, RotationalStiffness,
    SlipModulus, SpringStiffness, Strain,
};
use std::path::Path;
use toml::{Table, Value};

/// A file of this folder.
pub fn file(name: &str) -> Table {
    let folder = Path::new(env!("CARGO_MANIFEST_DIR")).join("tests/outside");
    std::fs::read_to_string(folder.join(name))
        .unwrap()
        .parse()
        .unwrap()
}

/// The tables of an array; none if it is not there.
pub fn tables<'a>(table: &'a Table, key: &str) -> impl Iterator<Item = &'a Table> {
    let array = table.get(key).map(|value| value.as_array().unwrap());
    array.into_iter().flatten().map(|v| v.as_table().unwrap())
}

fn real(value: &Value) -> f64 {
    value.as_float().expect("a number with a decimal point")
}

/// A number that may be left out.
pub fn given(table: &Table, key: &str) -> Option<f64> {
    table.get(key).map(real)
}

/// A number that must be there.
pub fn number(table: &Table, key: &str) -> f64 {
    given(table, key).unwrap_or_else(|| panic!("no {key} in {table}"))
}

/// A list of numbers; empty if it is not there.
pub fn numbers(table: &Table, key: &str) -> Vec<f64> {
    let list = table.get(key).map(|value| value.as_array().unwrap());
    list.into_iter().flatten().map(real).collect()
}

/// A text that must be there.
pub fn text<'a>(table: &'a Table, key: &str) -> &'a str {
    table[key].as_str().unwrap()
}

fn flag(table: &Table, key: &str) -> bool {
    table.get(key).is_some_and(|value| value.as_bool().unwrap())
}

fn m(x: f64) -> Length {
    Length::from_m(x)
}

/// A rectangle of a material of its own, which bears the name of its part.
pub fn part(name: &str, layer: &Table, height: f64, z: f64, shear: Option<f64>) -> Part {
    let mut material = Material::new(name, Modulus::from_Pa(number(layer, "E_Pa")), Creep::none());
    if let Some(g) = shear {
        material = material.shear_modulus(Modulus::from_Pa(g));
    }
    let outline = rectangle(m(number(layer, "width_m")), m(height));
    Part::new(name, outline, material).at(m(0.0), m(z))
}

/// The name of the layer or joint at a position, counted from the top.
pub fn name(kind: &str, position: usize) -> String {
    format!("{kind} {}", position + 1)
}

/// The layers of a case, the uppermost first.
pub fn layers(case: &Table) -> Vec<&Table> {
    tables(case, "layer").collect()
}

/// The section with heights and places that `sizes` picks.
fn section(case: &Table, sizes: impl Fn(usize, &Table) -> (f64, f64)) -> Section {
    let shear = given(case, "shear_modulus_Pa");
    let layers = layers(case);
    let parts: Vec<_> = layers
        .iter()
        .enumerate()
        .map(|(i, layer)| {
            let (height, z) = sizes(i, layer);
            part(&name("layer", i), layer, height, z, shear)
        })
        .collect();
    if layers.len() == 1 {
        return Section::of(parts).unwrap();
    }
    let pieces: Vec<_> = tables(case, "piece").collect();
    let made = (0..layers.len()).map(|i| {
        let there = pieces.iter().filter(|piece| !is_absent(piece, i));
        let layer = Layer::new(name("layer", i), [name("layer", i).as_str()]);
        let (from, to) = there.fold((f64::MAX, 0.0), |(from, to): (f64, f64), piece| {
            (
                from.min(number(piece, "from_m")),
                to.max(number(piece, "to_m")),
            )
        });
        if (from, to) == (0.0, number(case, "length_m")) {
            layer
        } else {
            layer.between(m(from), m(to))
        }
    });
    let joints = (1..layers.len()).map(|i| {
        let slip = slip(&pieces, i - 1);
        let (lower, upper) = (name("layer", i), name("layer", i - 1));
        Joint::slipping(name("joint", i - 1), lower, upper, slip).creep(0.0)
    });
    Section::layered(parts, made.collect::<Vec<_>>(), joints.collect::<Vec<_>>()).unwrap()
}

fn is_absent(piece: &Table, layer: usize) -> bool {
    let absent = piece.get("absent").map(|list| list.as_array().unwrap());
    let mut absent = absent.into_iter().flatten();
    absent.any(|i| i.as_integer() == i64::try_from(layer).ok())
}

/// One modulus, or bands of fasteners whose spacings give the moduli of the pieces.
fn slip(pieces: &[&Table], joint: usize) -> Slip {
    let there = pieces
        .iter()
        .filter(|p| !is_absent(p, joint) && !is_absent(p, joint + 1));
    let moduli: Vec<_> = there
        .map(|piece| (piece, numbers(piece, "k_N_per_m2")[joint]))
        .collect();
    let first = moduli[0].1;
    if moduli.iter().all(|(_, k)| *k == first) {
        return Slip::Modulus(SlipModulus::from_N_per_m2(first));
    }
    let bands = moduli
        .iter()
        .filter(|(_, k)| *k > 0.0)
        .map(|(piece, k)| Band {
            from: m(number(piece, "from_m")),
            to: m(number(piece, "to_m")),
            spacing: m(1e8 / k),
        });
    Slip::Fasteners {
        stiffness: FastenerStiffness::from_N_per_m(1e8),
        rows: 1,
        planes: 1,
        spacing: Spacing::Bands(bands.collect()),
    }
}

/// The size of a layer at an end (0 or 1) of the member.
fn size(layer: &Table, key: &str, end: usize) -> f64 {
    let ends = numbers(layer, &format!("{key}_ends"));
    ends.get(end).copied().unwrap_or_else(|| number(layer, key))
}

/// The member of a case under its loads, which are permanent.
pub fn member(case: &Table) -> Member {
    plan(case).check().unwrap()
}

/// The same, to be added to.
pub fn plan(case: &Table) -> MemberPlan {
    let length = number(case, "length_m");
    let at_end = |end| {
        section(case, |_, layer| {
            (size(layer, "height_m", end), size(layer, "z_m", end))
        })
    };
    let mut plan = Member::of_length(first_section(case).unwrap_or_else(|| at_end(0)), m(length));
    if layers(case).iter().any(|l| l.contains_key("height_m_ends")) {
        plan = plan.taper(m(0.0), m(length), at_end(1));
    }
    for piece in tables(case, "piece").skip(1) {
        if let Some(section) = section_of_piece(case, piece) {
            plan = plan.step(m(number(piece, "from_m")), section);
        }
    }
    if case.contains_key("shear_modulus_Pa") {
        plan = plan.shear(ShearModel::Flexible);
    }
    for (i, node) in tables(case, "node").enumerate() {
        plan = supported(plan, case, node, &name("node", i));
    }
    loads(case).into_iter().fold(plan, MemberPlan::action)
}

fn section_of_piece(case: &Table, piece: &Table) -> Option<Section> {
    let heights = numbers(piece, "height_m");
    (!heights.is_empty()).then(|| section(case, |i, layer| (heights[i], number(layer, "z_m"))))
}

fn first_section(case: &Table) -> Option<Section> {
    section_of_piece(case, tables(case, "piece").next().unwrap())
}

fn supported(mut plan: MemberPlan, case: &Table, node: &Table, name: &str) -> MemberPlan {
    let at = m(number(node, "x_m"));
    if flag(node, "hinge") {
        plan = plan.hinge(Hinge::moment(at));
    }
    if flag(node, "slip_held") {
        for j in 0..layers(case).len() - 1 {
            plan = plan.anchor(Anchor {
                name: format!("{name}, joint {}", j + 1),
                joint: self::name("joint", j),
                at,
                stiffness: None,
            });
        }
    }
    let spring = given(node, "spring_N_per_m");
    let one_way = flag(node, "pressure_only");
    if !node.contains_key("settlement_m") && spring.is_none() && !one_way {
        return plan;
    }
    let axial = flag(node, "axial_held");
    let mut support = match (node.contains_key("rotation_rad"), axial) {
        (true, _) => Support::fixed(name, at),
        (false, true) => Support::pin(name, at),
        (false, false) => Support::roller(name, at),
    };
    if axial {
        support = support.at_height(m(0.0));
    } else if node.contains_key("rotation_rad") {
        support = support.axial_spring(SpringStiffness::ZERO);
    }
    if let Some(k) = spring {
        support = support.spring(SpringStiffness::from_N_per_m(k));
    }
    if let Some(k) = given(node, "rotation_spring_Nm_per_rad") {
        support = support.rotational_spring(RotationalStiffness::from_N_m_per_rad(k));
    }
    plan.support(if one_way { support.one_way() } else { support })
}

fn loads(case: &Table) -> Vec<Action> {
    let mut action = Action::permanent("loads");
    for piece in tables(case, "piece") {
        let [from, to] = ["from_m", "to_m"].map(|key| m(number(piece, key)));
        if let Some(q) = given(piece, "q_N_per_m").filter(|q| *q != 0.0) {
            action = action.partial(LineLoad::from_N_per_m(q), from, to);
        }
    }
    for (i, layer) in layers(case).iter().enumerate() {
        if let Some(shrinkage) = given(layer, "shrinkage") {
            let strain = InitialStrain {
                axial: Strain::from_ratio(-shrinkage),
                ..InitialStrain::NONE
            };
            let part = name("layer", i);
            action = action.load(Load::Strain { part, strain });
        }
    }
    let mut along = Vec::new();
    for (i, node) in tables(case, "node").enumerate() {
        let (at, support) = (m(number(node, "x_m")), name("node", i));
        if let Some(force) = given(node, "load_N") {
            action = action.point(Force::from_N(force), at);
        }
        if let Some(settlement) = given(node, "settlement_m").filter(|s| *s != 0.0) {
            let (support, settlement) = (support.clone(), m(settlement));
            action = action.load(Load::Settlement {
                support,
                settlement,
            });
        }
        if let Some(rotation) = given(node, "rotation_rad").filter(|r| *r != 0.0) {
            let rotation = Angle::from_rad(rotation);
            action = action.load(Load::ImposedRotation { support, rotation });
        }
        let forces = numbers(node, "axial_N");
        let couple = given(node, "couple_Nm");
        if let Some(layer) = forces.iter().position(|force| *force != 0.0) {
            // The couple is what the force has about z = 0.
            let load = Load::Axial {
                load: Force::from_N(forces[layer]),
                at,
                height: m(couple.unwrap_or(0.0) / forces[layer]),
            };
            let action = Action::permanent(format!("{} along", name("node", i))).load(load);
            let is_layered = forces.len() > 1;
            along.push(if is_layered {
                action.on(name("layer", layer))
            } else {
                action
            });
        } else if let Some(couple) = couple {
            action = action.couple(Moment::from_N_m(couple), at);
        }
    }
    let bends = !action.loads().is_empty();
    bends.then_some(action).into_iter().chain(along).collect()
}
