//! Beam theory with shear against plane stress by quadratic finite elements; the tolerance of each
//! case says how far the two theories may lie apart.

use super::compare::Check;
use super::read::{file, number, part, tables, text};
use beamcore::member::{Action, Member, ShearModel, Support};
use beamcore::section::Section;
use beamcore::time::Time;
use beamcore::units::{Force, Length, LineLoad};
use toml::Table;

fn m(x: f64) -> Length {
    Length::from_m(x)
}

/// Compares a deflection with both theories of a case.
fn compare(name: &str, member: Member, at: Length, case: &Table, exactly: f64) {
    let tolerance = number(case, "tolerance_relative");
    let check = Check::new(name, member, exactly);
    let w = check.response.deflection("permanent", Time::Initial);
    let w = w.unwrap().value(at).unwrap().to_m();
    let beam = number(case, "w_beam_theory_m");
    check.near("beam theory", w, beam, beam);
    let plane = number(case, "w_plane_m");
    assert!(
        (w - plane).abs() <= tolerance * plane,
        "{name}: {w} {plane}"
    );
}

/// Three layers glued together, of different E and G: a tenth of the deflection is from shear.
#[test]
fn glued_layers() {
    let file = file("plane_stress.toml");
    let case = file["glued"].as_table().unwrap();
    let mut bottom = 0.0;
    let parts = tables(case, "layer_from_bottom")
        .enumerate()
        .map(|(i, layer)| {
            let mut sized = layer.clone();
            sized.insert("width_m".into(), case["width_m"].clone());
            let (height, g) = (number(layer, "height_m"), number(layer, "G_Pa"));
            let z = bottom + height / 2.0;
            bottom += height;
            part(&format!("layer {i}"), &sized, height, z, Some(g))
        });
    let section = Section::of(parts.collect::<Vec<_>>()).unwrap();
    let length = m(number(case, "length_m"));
    let q = LineLoad::from_N_per_m(number(case, "q_N_per_m"));
    let member = Member::simple_span(section, length)
        .shear(ShearModel::Flexible)
        .action(Action::permanent("q").uniform(q));
    compare("glued", member.check().unwrap(), length / 2.0, case, 1e-12);
}

/// Cantilevers whose depth halves towards the loaded tip.
#[test]
fn haunched_cantilevers() {
    let file = file("plane_stress.toml");
    let all = file["haunch"].as_table().unwrap();
    let depths = super::read::numbers(all, "depth_ends_m");
    let length = m(number(all, "length_m"));
    let load = Force::from_N(number(all, "tip_load_N"));
    for case in tables(all, "case") {
        let mut sized = case.clone();
        sized.insert("width_m".into(), all["width_m"].clone());
        let is_sided = case["lower_edge_only"].as_bool().unwrap();
        let [deep, shallow] = [0, 1].map(|end| {
            // With one sloping edge the top stays at z = 0.
            let z = if is_sided { -depths[end] / 2.0 } else { 0.0 };
            let g = Some(number(case, "G_Pa"));
            Section::of([part("haunch", &sized, depths[end], z, g)]).unwrap()
        });
        let member = Member::of_length(deep, length)
            .taper(Length::ZERO, length, shallow)
            .shear(ShearModel::Flexible)
            .support(Support::fixed("wall", Length::ZERO))
            .action(Action::permanent("P").point(load, length));
        let name = text(case, "name");
        compare(name, member.check().unwrap(), length, case, 1e-11);
    }
}
