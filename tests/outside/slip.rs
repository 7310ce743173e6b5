//! Members whose layers slip against closed forms and boundary-value problems solved another way.

use super::compare::{Check, compare_fields};
use super::read::{file, given, number, numbers, part, tables, text};
use beamcore::member::{Action, Member, MemberPlan, Support};
use beamcore::section::{InitialStrain, Joint, Layer, Section, Slip};
use beamcore::time::Time;
use beamcore::units::{Force, Length, LineLoad, SlipModulus, Strain};
use toml::Table;

/// Stepped spacing, two spans, three layers, anchored ends, a short layer, fixed ends, support
/// movements, forces into a layer and varying depths, by exponentials of 80 digits and collocation.
#[test]
fn boundary_value_problems() {
    let file = file("slip_bvp.toml");
    for case in tables(&file, "case") {
        let varies = text(case, "name").starts_with("taper");
        compare_fields(case, if varies { 1e-10 } else { 1e-12 });
    }
}

/// The upper and lower rectangle of a file on a simple span.
struct TwoLayers {
    file: Table,
}

impl TwoLayers {
    fn of(name: &str) -> Self {
        Self { file: file(name) }
    }

    fn number(&self, key: &str) -> f64 {
        number(&self.file, key)
    }

    fn plan(&self, joint: Joint, shrinkage: f64) -> MemberPlan {
        let part = |name: &str| {
            let layer = self.file[name].as_table().unwrap();
            part(
                name,
                layer,
                number(layer, "height_m"),
                number(layer, "z_m"),
                None,
            )
        };
        let strain = InitialStrain {
            axial: Strain::from_ratio(-shrinkage),
            ..InitialStrain::NONE
        };
        let section = Section::layered(
            [part("upper").initial_strain(strain), part("lower")],
            ["upper", "lower"].map(|name| Layer::new(name, [name])),
            [joint.creep(0.0)],
        );
        Member::simple_span(section.unwrap(), Length::from_m(self.number("length_m")))
    }
}

fn joint(k: f64) -> Joint {
    let slip = Slip::Modulus(SlipModulus::from_N_per_m2(k));
    Joint::slipping("joint", "lower", "upper", slip)
}

/// Compares all values of a case of two layers.
fn compare_two_layers(check: &Check, case: &Table) {
    let length = check.response.member().length();
    let (first, all) = (Time::Initial, "permanent");
    let (end, quarter, middle) = (Length::ZERO, length / 4.0, length / 2.0);
    let r = &check.response;
    let joint = r.joint(all, first, "joint").unwrap();
    let lower = r.layer(all, first, "lower").unwrap().axial;
    check.at("w_mid_m", case, &r.deflection(all, first).unwrap(), middle);
    check.at(
        "w_quarter_m",
        case,
        &r.deflection(all, first).unwrap(),
        quarter,
    );
    check.at("n_lower_mid_N", case, &lower, middle);
    check.at("n_lower_quarter_N", case, &lower, quarter);
    check.at("slip_end_m", case, &joint.slip, end);
    check.at("slip_quarter_m", case, &joint.slip, quarter);
    // What pulls the lower layer to the right takes from its tension.
    let flow_at = |x| -joint.flow.value(x).unwrap().si();
    let peak = joint.flow.greatest().value.si();
    let key = "dn_lower_dx_end_N_per_m";
    check.near(key, flow_at(end), number(case, key), peak);
    let key = "dn_lower_dx_quarter_N_per_m";
    if let Some(expected) = given(case, key) {
        check.near(key, flow_at(quarter), expected, peak);
    }
    if case.contains_key("slope_end_rad") {
        check.at("slope_end_rad", case, &r.slope(all, first).unwrap(), end);
    }
}

/// Newmark's closed forms with 60 digits, lambda L from 1e-3 to 1e4.
#[test]
fn closed_forms_from_soft_to_stiff() {
    let beam = TwoLayers::of("slip_closed.toml");
    let q = LineLoad::from_N_per_m(beam.number("q_N_per_m"));
    let force = Force::from_N(beam.number("central_load_N"));
    let middle = Length::from_m(beam.number("length_m")) / 2.0;
    for case in tables(&beam.file, "case") {
        let k = number(case, "k_N_per_m2");
        let of = |kind: &str, action: Action, shrinkage: f64| {
            let member = beam
                .plan(joint(k), shrinkage)
                .action(action)
                .check()
                .unwrap();
            let name = format!("{kind}, lambda L {}", number(case, "lambda_length"));
            let check = Check::new(&name, member, 1e-10);
            compare_two_layers(&check, case[kind].as_table().unwrap());
        };
        of("uniform", Action::permanent("q").uniform(q), 0.0);
        of("central", Action::permanent("P").point(force, middle), 0.0);
        let none = Action::permanent("none").uniform(LineLoad::ZERO);
        of("shrinkage", none, beam.number("upper_shrinkage"));
    }
}

/// A dead band of the joint in closed form, with 50 digits.
#[test]
fn clearance_of_bolts() {
    let beam = TwoLayers::of("slip_gap_closed.toml");
    let q = LineLoad::from_N_per_m(beam.number("q_N_per_m"));
    for case in tables(&beam.file, "case") {
        let clearance = number(case, "clearance_m");
        let joint = joint(beam.number("k_N_per_m2")).clearance(Length::from_m(clearance));
        let plan = beam
            .plan(joint, 0.0)
            .action(Action::permanent("q").uniform(q));
        let name = format!("clearance {clearance} m");
        let check = Check::new(&name, plan.check().unwrap(), 1e-10);
        compare_two_layers(&check, case);
    }
}

/// A side plate on transverse fasteners, its ends free, by exponentials of 80 digits.
#[test]
fn side_plate_with_a_deflection_of_its_own() {
    let file = file("side_plate_bvp.toml");
    let length = Length::from_m(number(&file, "length_m"));
    let made = |name: &str, y: f64| {
        let layer = file[name].as_table().unwrap();
        let z = Length::from_m(number(layer, "z_m"));
        part(name, layer, number(layer, "height_m"), 0.0, None).at(Length::from_m(y), z)
    };
    let touching = ["joist", "plate"]
        .map(|name| number(file[name].as_table().unwrap(), "width_m"))
        .iter()
        .sum::<f64>()
        / 2.0;
    for case in tables(&file, "case") {
        let k = SlipModulus::from_N_per_m2(number(case, "k_t_N_per_m2"));
        let section = Section::layered(
            [made("joist", 0.0), made("plate", touching)],
            ["joist", "plate"].map(|name| Layer::new(name, [name])),
            [Joint::loose("bolts", "joist", "plate")
                .transverse(k)
                .creep(0.0)],
        );
        let mut action = Action::permanent("loads").on("joist");
        let (q, force) = (number(case, "q_N_per_m"), number(case, "central_load_N"));
        if q != 0.0 {
            action = action.uniform(LineLoad::from_N_per_m(q));
        }
        if force != 0.0 {
            action = action.point(Force::from_N(force), length / 2.0);
        }
        let member = Member::of_length(section.unwrap(), length)
            .support(Support::pin("left", Length::ZERO).under(["joist"]))
            .support(Support::roller("right", length).under(["joist"]))
            .action(action);
        let check = Check::new(text(case, "name"), member.check().unwrap(), 1e-9);
        let field = case["result"]["field"].as_table().unwrap();
        let x = numbers(field, "x_m");
        for (i, layer) in ["joist", "plate"].into_iter().enumerate() {
            let (first, all) = (Time::Initial, "permanent");
            let w = check.response.layer_deflection(all, first, layer).unwrap();
            let m = check.response.layer(all, first, layer).unwrap().moment;
            let [w_key, m_key] = ["w", "M"].map(|key| format!("{key}_{}", i + 1));
            check.compare(&w_key, &w, &x, &numbers(field, &format!("{w_key}_m")));
            check.compare(&m_key, &m, &x, &numbers(field, &format!("{m_key}_Nm")));
        }
        check.reaction(
            "left",
            number(case["result"].as_table().unwrap(), "end_reaction_N"),
        );
    }
}
