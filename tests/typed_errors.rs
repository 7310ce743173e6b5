//! The typed way refuses the same mistakes as the document, under the same paths.

use beamcore::camber::{CamberPlan, Rounding, Shape};
use beamcore::material::{Creep, Material, ServiceClass, timber};
use beamcore::member::{Action, CombinationFactors, Member, MemberPlan, Support};
use beamcore::section::{Part, Section, rectangle};
use beamcore::time::Time;
use beamcore::units::{Length, Modulus, Number};
use beamcore::{Error, ErrorKind};

fn wood() -> Material {
    timber("C24", ServiceClass::One).unwrap()
}

fn joist() -> Part {
    Part::new("joist", rectangle(75.mm(), 220.mm()), wood())
}

fn section() -> Section {
    Section::of([joist()]).unwrap()
}

fn plan() -> MemberPlan {
    Member::simple_span(section(), 4.m()).action(Action::permanent("floor").uniform(1.kN_per_m()))
}

fn section_error(parts: impl IntoIterator<Item = Part>) -> Error {
    Section::of(parts).unwrap_err()
}

fn says(error: &Error, kind: ErrorKind, message: &str) {
    assert_eq!(error.kind(), kind);
    assert_eq!(error.to_string(), message);
}

#[test]
fn sizes_that_are_not_sizes() {
    for (size, found) in [
        (0.0, "0 m"),
        (-10.0, "-10 mm"),
        (f64::NAN, "NaN mm"),
        (f64::INFINITY, "inf m"),
    ] {
        let part = Part::new("joist", rectangle(Length::from_mm(size), 220.mm()), wood());
        says(
            &section_error([part]),
            ErrorKind::Value,
            &format!(
                "section.parts[\"joist\"].outline.rectangle.width: found {found}; expected a length \
                 greater than zero"
            ),
        );
    }
}

#[test]
fn moduli_that_are_not_moduli() {
    for modulus in [-11.0, 0.0, f64::NAN, f64::INFINITY] {
        let material = Material::new("own", Modulus::from_GPa(modulus), Creep::none());
        let error = section_error([Part::new("joist", rectangle(75.mm(), 220.mm()), material)]);
        assert_eq!(
            (error.kind(), error.path()),
            (ErrorKind::Value, "materials[\"own\"].modulus")
        );
    }
    let material = Material::new("own", 11.GPa(), Creep::factor(-0.1));
    let error = section_error([Part::new("joist", rectangle(75.mm(), 220.mm()), material)]);
    assert_eq!(
        (error.kind(), error.path()),
        (ErrorKind::Value, "materials[\"own\"].creep_factor")
    );
}

#[test]
fn sections_that_cannot_be() {
    assert_eq!(section_error([]).kind(), ErrorKind::Missing);
    assert_eq!(
        section_error([joist(), joist().at(1.m(), 0.m())]).kind(),
        ErrorKind::Duplicate
    );
    let other = Part::new("plate", rectangle(10.mm(), 220.mm()), wood()).at(40.mm(), 0.mm());
    says(
        &section_error([joist(), other]),
        ErrorKind::Geometry,
        "section.parts: found the parts \"joist\" and \"plate\", which overlap by 550 mm2; \
         expected parts that touch but do not overlap",
    );
    let error =
        section_error([Part::new("plate", rectangle(10.mm(), 10.mm()), wood()).above("top")]);
    assert_eq!(
        (error.kind(), error.path()),
        (ErrorKind::Name, "section.parts[\"plate\"].place.above")
    );
    let error = section_error([Part::new("a \"b\"", rectangle(1.m(), 1.m()), wood())]);
    assert_eq!(error.kind(), ErrorKind::Value);
    let unlike = [
        Part::new(
            "a",
            rectangle(1.m(), 1.m()),
            Material::new("m", 1.GPa(), Creep::none()),
        ),
        Part::new(
            "b",
            rectangle(1.m(), 1.m()),
            Material::new("m", 2.GPa(), Creep::none()),
        )
        .above("a"),
    ];
    assert_eq!(section_error(unlike).kind(), ErrorKind::Duplicate);
}

#[test]
fn members_that_cannot_be() {
    let kind = |plan: MemberPlan| plan.check().unwrap_err().kind();
    let of_length = |length| {
        Member::of_length(section(), length).action(Action::permanent("g").uniform(1.kN_per_m()))
    };
    assert_eq!(kind(of_length(4.m())), ErrorKind::Missing);
    assert_eq!(
        kind(of_length((-4).m()).support(Support::fixed("a", 0.m()))),
        ErrorKind::Value
    );
    assert_eq!(
        kind(of_length(4.m()).support(Support::pin("a", 1.m()))),
        ErrorKind::Mechanism
    );
    assert_eq!(
        kind(of_length(4.m()).support(Support::fixed("a", 5.m()))),
        ErrorKind::Position
    );
    assert_eq!(
        kind(of_length(4.m()).support(Support::fixed("a", Length::from_m(f64::NAN)))),
        ErrorKind::Value
    );
    assert_eq!(
        kind(Member::simple_span(section(), 4.m())),
        ErrorKind::Missing
    );
    assert_eq!(
        kind(plan().support(Support::pin("mid", 4.m()))),
        ErrorKind::Duplicate
    );
    assert_eq!(
        kind(plan().support(Support::pin("left", 2.m()))),
        ErrorKind::Duplicate
    );
    assert_eq!(
        kind(plan().action(Action::permanent("g").point(1.kN(), 9.m()))),
        ErrorKind::Position
    );
    assert_eq!(
        kind(plan().action(Action::permanent("g").partial(1.kN_per_m(), 3.m(), 2.m()))),
        ErrorKind::Position
    );
    assert_eq!(
        kind(plan().action(Action::permanent("floor").uniform(1.kN_per_m()))),
        ErrorKind::Duplicate
    );
    assert_eq!(
        kind(plan().action(Action::permanent("g"))),
        ErrorKind::Missing
    );
    let factors = CombinationFactors {
        psi_0: 0.7,
        psi_1: f64::NAN,
        psi_2: 0.3,
    };
    assert_eq!(
        kind(plan().action(Action::variable("q", factors).uniform(1.kN_per_m()))),
        ErrorKind::Value
    );
}

#[test]
fn a_mechanism_says_what_is_free() {
    let free = |plan: MemberPlan| {
        let action = Action::permanent("g").uniform(1.kN_per_m());
        plan.action(action).check().unwrap_err().to_string()
    };
    let one = Member::of_length(section(), 4.m()).support(Support::pin("a", 1.5.m()));
    assert!(free(one).contains("free to turn about the place 1.5 m"));
    let rollers = Member::of_length(section(), 4.m())
        .support(Support::roller("a", 0.m()))
        .support(Support::roller("b", 4.m()));
    assert!(free(rollers).contains("free to move along its axis"));
}

#[test]
fn several_mistakes_are_all_told() {
    let error = plan()
        .support(Support::pin("far", 40.m()))
        .action(Action::permanent("g").point(1.kN(), (-1).m()))
        .action(Action::permanent("h"))
        .check()
        .unwrap_err();
    let paths: Vec<_> = error
        .problems()
        .iter()
        .map(|problem| problem.path())
        .collect();
    assert_eq!(
        paths,
        [
            "member.supports[\"far\"].at",
            "actions[\"g\"].loads[0].point.at",
            "actions[\"h\"].loads"
        ]
    );
    assert!(error.to_string().starts_with("3 problems:\n- "));
}

#[test]
fn results_that_are_not_there() {
    let response = plan().check().unwrap().solve();
    let kinds = [
        response
            .deflection("Quasi", Time::Final)
            .unwrap_err()
            .kind(),
        response
            .reaction("permanent", Time::Final, "middle")
            .unwrap_err()
            .kind(),
        response
            .stress("permanent", Time::Final, "plate")
            .unwrap_err()
            .kind(),
        section()
            .transformed_to("brass", Time::Final)
            .unwrap_err()
            .kind(),
        section().part("plate").unwrap_err().kind(),
    ];
    assert_eq!(kinds, [ErrorKind::Lookup; 5]);
    let field = response.deflection("permanent", Time::Final).unwrap();
    assert_eq!(
        field.value(4.1.m()).unwrap_err().kind(),
        ErrorKind::Position
    );
    assert_eq!(
        field.value(Length::from_m(f64::NAN)).unwrap_err().kind(),
        ErrorKind::Position
    );
    assert_eq!("later".parse::<Time>().unwrap_err().kind(), ErrorKind::Name);
}

#[test]
fn cambers_that_cannot_be() {
    let camber = CamberPlan {
        shape: Shape::Parabola,
        combination: "permanent".into(),
        time: Time::Final,
        fraction: -1.0,
        from: "right".into(),
        to: "left".into(),
        step: Length::from_mm(-1.0),
        rounding: Rounding::Down,
        least: Length::from_mm(f64::NAN),
        divisions: 5000,
    };
    let error = plan().check().unwrap().solve().camber(&camber).unwrap_err();
    let paths: Vec<_> = error
        .problems()
        .iter()
        .map(|problem| problem.path())
        .collect();
    assert_eq!(
        paths,
        [
            "camber.fraction",
            "camber.to",
            "camber.step",
            "camber.least",
            "camber.divisions"
        ]
    );
}

#[test]
fn names_of_classes_that_are_not_there() {
    says(
        &beamcore::material::steel("S276").unwrap_err(),
        ErrorKind::Name,
        "class: found the unknown steel class \"S276\"; expected one of the steel classes S235, S275, S355, S420, S420N, S420M, S450, S460, S460N, S460M",
    );
    assert_eq!(
        timber("c24", ServiceClass::One).unwrap_err().kind(),
        ErrorKind::Name
    );
    assert_eq!(
        ServiceClass::from_number(4).unwrap_err().kind(),
        ErrorKind::Value
    );
}
