//! Members bent without transverse load: warmed strips, prestress, end forces, held ends.

use super::compare::{Check, compare_values};
use super::read::{file, number, plan, tables, text};
use beamcore::material::{Creep, Material};
use beamcore::member::{Action, Load, Member, Support, Tendon};
use beamcore::section::{InitialStrain, Part, Section, Sideways, rectangle};
use beamcore::time::Time;
use beamcore::units::{Force, Length, Modulus, Strain, TemperatureChange, ThermalExpansion};
use toml::Table;

fn m(x: f64) -> Length {
    Length::from_m(x)
}

fn strip(name: &str, table: &Table, z: f64) -> Part {
    let material = Material::new(name, Modulus::from_Pa(number(table, "E_Pa")), Creep::none())
        .thermal_expansion(ThermalExpansion::from_per_K(number(table, "alpha_per_K")));
    let size = ["width_m", "height_m"].map(|key| m(number(table, key)));
    Part::new(name, rectangle(size[0], size[1]), material).at(Length::ZERO, m(z))
}

/// Timoshenko's two strips and three strips: stresses along a warmed cantilever, curvature, and the
/// plane of strain of the section alone.
#[test]
fn warmed_strips() {
    let file = file("strain_closed.toml");
    for case in tables(&file, "strips") {
        let strips: Vec<_> = tables(case, "strip").collect();
        let names: Vec<_> = (0..strips.len()).map(|i| format!("strip {i}")).collect();
        let pairs = || strips.iter().zip(&names);
        let parts = pairs().map(|(table, name)| strip(name, table, number(table, "z_m")));
        let warming = number(case, "warming_K");
        let change = TemperatureChange::from_K(warming);
        let action = Action::permanent("warmth").load(Load::Temperature {
            change,
            parts: Vec::new(),
        });
        let member = Member::of_length(Section::of(parts).unwrap(), m(2.0))
            .support(Support::fixed("end", Length::ZERO))
            .action(action);
        let check = Check::new(text(case, "name"), member.check().unwrap(), 1e-12);
        let r = &check.response;
        let curvature = r.curvature("permanent", Time::Initial).unwrap();
        let kappa = number(case, "kappa_per_m");
        // Where the strips balance, the curvature is the rounding of strain / height.
        let scale = number(case, "eps0").abs() / number(strips[0], "height_m");
        let found = curvature.value(m(1.3)).unwrap().si();
        check.near("curvature", found, kappa, kappa.abs().max(1e-3 * scale));
        let tip = r.deflection("permanent", Time::Initial).unwrap();
        let tip = tip.value(m(2.0)).unwrap().si();
        check.near(
            "tip",
            tip,
            -2.0 * kappa,
            2.0 * kappa.abs().max(1e-3 * scale),
        );
        for (table, name) in pairs() {
            let stress = r.stress("permanent", Time::Initial, name).unwrap();
            let [bottom, top] = ["stress_bottom_Pa", "stress_top_Pa"].map(|key| number(table, key));
            let peak = bottom.abs().max(top.abs());
            let at = |field: beamcore::field::Field<_>| field.value(m(1.3)).unwrap();
            check.near(name, at(stress.bottom()).si(), bottom, peak);
            check.near(name, at(stress.top()).si(), top, peak);
            let area = number(table, "width_m") * number(table, "height_m");
            let force = at(stress.centroid()).si() * area;
            check.near(name, force, number(table, "N_N"), peak * area);
        }
        let strained = pairs().map(|(table, name)| {
            let axial = Strain::from_ratio(number(table, "alpha_per_K") * warming);
            strip(name, table, number(table, "z_m")).initial_strain(InitialStrain {
                axial,
                ..InitialStrain::NONE
            })
        });
        let section = Section::of(strained).unwrap();
        let plane = section.free_plane(Time::Initial, Sideways::Held);
        let bottom = plane.strain_at(Length::ZERO, Length::ZERO).si();
        check.near("eps0", bottom, number(case, "eps0"), bottom);
    }
}

/// Load balancing on one span and two, anchored at the supports.
#[test]
fn tendons() {
    let file = file("strain_closed.toml");
    for case in tables(&file, "prestress") {
        let name = text(case, "name");
        let eccentricity = m(number(case, "eccentricity_m"));
        let force = Force::from_N(number(case, "force_N"));
        let supports: Vec<_> = tables(case, "node")
            .filter(|node| node.contains_key("settlement_m"))
            .map(|node| m(number(node, "x_m")))
            .collect();
        let loads = supports.windows(2).map(|ends| {
            let middle = (ends[0] + ends[1]) / 2.0;
            let points = [
                (ends[0], Length::ZERO),
                (middle, -eccentricity),
                (ends[1], Length::ZERO),
            ];
            let tendon = if name.starts_with("draped") {
                Tendon::Draped(points.to_vec())
            } else {
                Tendon::Parabolic(points)
            };
            Load::Prestress { force, tendon }
        });
        let action = loads.fold(Action::permanent("tendon"), Action::load);
        let layer = tables(case, "layer").next().unwrap();
        let part = super::read::part("beam", layer, number(layer, "height_m"), 0.0, None);
        let mut member =
            Member::of_length(Section::of([part]).unwrap(), m(number(case, "length_m")));
        for (i, at) in supports.iter().enumerate() {
            let (name, at) = (format!("support {i}"), *at);
            member = member.support(if i == 0 {
                Support::pin(name, at)
            } else {
                Support::roller(name, at)
            });
        }
        let check = Check::new(name, member.action(action).check().unwrap(), 1e-12);
        for value in tables(case, "value") {
            let (x, expected) = (number(value, "x_m"), number(value, "value"));
            match text(value, "quantity") {
                "R_N" => {
                    let at = supports.iter().position(|at| at.to_m() == x).unwrap();
                    check.reaction(&format!("support {at}"), expected);
                }
                quantity => check.value(quantity, x, expected),
            }
        }
        // The balancing loads with the end thrusts give the same moments and deflections.
        let balanced = Check::new(name, plan(case).check().unwrap(), 1e-12);
        for value in tables(case, "value").filter(|v| text(v, "quantity") != "R_N") {
            let quantity = text(value, "quantity");
            balanced.value(quantity, number(value, "x_m"), number(value, "value"));
        }
    }
}

/// Forces along the member, out of its axis.
#[test]
fn eccentric_end_forces() {
    let file = file("strain_closed.toml");
    tables(&file, "end_force").for_each(|case| compare_values(case, 1e-12));
}

/// A member that cannot lengthen, held at its axis and below it, becomes warmer.
#[test]
fn warming_between_pins() {
    let file = file("strain_closed.toml");
    for case in tables(&file, "held") {
        let length = m(number(case, "length_m"));
        let height = m(number(case, "z_pin_m"));
        let change = TemperatureChange::from_K(number(case, "warming_K"));
        let action = Action::permanent("warmth").load(Load::Temperature {
            change,
            parts: Vec::new(),
        });
        let member = Member::of_length(Section::of([strip("beam", case, 0.0)]).unwrap(), length)
            .support(Support::pin("left", Length::ZERO).at_height(height))
            .support(Support::pin("right", length).at_height(height))
            .action(action);
        let check = Check::new(text(case, "name"), member.check().unwrap(), 1e-12);
        let (r, middle) = (&check.response, length / 2.0);
        let axial = r.axial("permanent", Time::Initial).unwrap();
        let axial = axial.value(middle).unwrap().si();
        let expected = number(case, "N_N");
        check.near("N", axial, expected, expected);
        let couple = expected * number(case, "height_m");
        let moment = r.moment("permanent", Time::Initial).unwrap();
        let moment = moment.value(middle).unwrap().si();
        check.near("M", moment, number(case, "M_about_centroid_Nm"), couple);
        let w = r.deflection("permanent", Time::Initial).unwrap();
        let w = w.value(middle).unwrap().si();
        check.near("w", w, number(case, "w_mid_m"), 3e-3);
        for (name, sign) in [("left", -1.0), ("right", 1.0)] {
            let along = r.reaction("permanent", Time::Initial, name).unwrap().along;
            check.near(name, along.si(), sign * expected, expected);
        }
    }
}
