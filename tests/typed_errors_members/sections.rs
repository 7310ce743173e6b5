//! Changes of section, layers, bands and shear that cannot be.

use super::{error, floor, modulus, part, plan, says, section_with};
use beamcore::ErrorKind;
use beamcore::material::{Creep, Material, ServiceClass, timber};
use beamcore::member::{Member, MemberPlan, ShearModel};
use beamcore::section::{Band, Joint, Layer, Part, Section, Slip, Spacing, rectangle};
use beamcore::units::{FastenerStiffness, Length, Modulus, Number, ShearStiffness};

fn rectangle_of(name: &str, height: f64) -> Section {
    let wood = timber("C24", ServiceClass::One).unwrap();
    Section::of([Part::new(name, rectangle(100.mm(), height.mm()), wood)]).unwrap()
}

fn single() -> MemberPlan {
    Member::simple_span(rectangle_of("a", 100.0), 4.m()).action(floor())
}

#[test]
fn changes_of_section_that_cannot_be() {
    says(
        single().taper(0.m(), 4.m(), rectangle_of("b", 200.0)),
        ErrorKind::Geometry,
        "member.changes[0].taper.section: found a taper between the parts [\"a\"] and [\"b\"] \
         (section.parts); expected the same parts in the same order",
    );
    let deep = || rectangle_of("a", 200.0);
    says(
        single().taper(3.m(), 2.m(), deep()),
        ErrorKind::Position,
        "member.changes[0].taper: found a taper from 3 m to 2 m; expected a taper that ends right \
         of where it begins",
    );
    let kinds = [
        single().taper(2.m(), 5.m(), deep()),
        single()
            .taper(0.m(), 2.m(), deep())
            .taper(1.m(), 3.m(), deep()),
        single().step(4.m(), deep()),
        single().step(Length::from_m(f64::NAN), deep()),
    ]
    .map(|plan| error(plan).kind());
    assert_eq!(kinds, [ErrorKind::Position; 4]);
    says(
        plan().step(2.m(), deep()),
        ErrorKind::Geometry,
        "member.changes: found other layers or joints from 2 m on; expected the same layers and \
         joints all along a member whose joints slip",
    );
}

#[test]
fn bands_and_layers_that_leave_the_member() {
    let bands = vec![Band {
        from: 3.m(),
        to: 5.m(),
        spacing: 100.mm(),
    }];
    let screws = Slip::Fasteners {
        stiffness: FastenerStiffness::from_N_per_mm(1000.0),
        rows: 1,
        planes: 1,
        spacing: Spacing::Bands(bands),
    };
    says(
        Member::simple_span(section_with(screws), 4.m()).action(floor()),
        ErrorKind::Position,
        "section.joints[\"screws\"].kind.fasteners.bands[0].to: found 5 m; expected a place within \
         the member, up to 4 m",
    );
    let long = Section::layered(
        [part("lower", 0.0), part("upper", 200.0)],
        [
            Layer::new("lower", ["lower"]),
            Layer::new("upper", ["upper"]).between(1.m(), 5.m()),
        ],
        [Joint::slipping("screws", "lower", "upper", modulus())],
    );
    says(
        Member::simple_span(long.unwrap(), 4.m()).action(floor()),
        ErrorKind::Position,
        "section.layers[\"upper\"].to: found 5 m; expected a place within the member, up to 4 m",
    );
}

#[test]
fn shear_that_cannot_be() {
    let given = |stiffness| ShearModel::Given(ShearStiffness::from_N(stiffness));
    says(
        plan().shear(given(1e6)),
        ErrorKind::Value,
        "member.shear.given: found one shear stiffness for layers that slip; expected \"flexible\" \
         or \"rigid\" for a section of layers",
    );
    assert_eq!(
        error(single().shear(given(-1e6))).path(),
        "member.shear.given"
    );
    let material = Material::new("m", Modulus::from_GPa(1.0), Creep::none());
    let section = Section::of([Part::new("a", rectangle(1.m(), 1.m()), material)]).unwrap();
    let plan = Member::simple_span(section, 4.m()).action(floor());
    assert_eq!(
        error(plan.shear(ShearModel::Flexible)).path(),
        "materials[\"m\"].shear_modulus"
    );
}
