//! Layers and joints of a job against the same section built by its constructors.

use super::{Format, Job};
use crate::material::{Creep, Material, ServiceClass, timber};
use crate::section::{Band, Joint, Layer, Part, Section, Slip, Spacing, rectangle};
use crate::units::{Modulus, Number, SlipModulus};

const JOB: &str = r#"
version = 1
mark = "X1"
title = "Every kind of joint"

[materials.wood]
timber = "C24"
service_class = 1

[materials.stone]
modulus = "31 GPa"
creep_factor = 2.5

[section]
parts = [
    { name = "a", material = "wood", outline = { rectangle = { width = "100 mm", height = "40 mm" } } },
    { name = "b", material = "wood", outline = { rectangle = { width = "100 mm", height = "40 mm" } }, place = { above = "a" } },
    { name = "c", material = "wood", outline = { rectangle = { width = "100 mm", height = "40 mm" } }, place = { above = "b" } },
    { name = "d", material = "wood", outline = { rectangle = { width = "100 mm", height = "40 mm" } }, place = { above = "c" } },
    { name = "e", material = "wood", outline = { rectangle = { width = "100 mm", height = "40 mm" } }, place = { above = "d" } },
    { name = "f", material = "stone", outline = { rectangle = { width = "100 mm", height = "40 mm" } }, place = { above = "e" } },
    { name = "g", material = "wood", outline = { rectangle = { width = "100 mm", height = "40 mm" } }, place = { at = { y = "0 mm", z = "-60 mm" } } },
]
layers = [
    { name = "A", parts = ["a"] },
    { name = "B", parts = ["b"], from = "1 m", to = "5 m" },
    { name = "C", parts = ["c"] },
    { name = "D", parts = ["d"] },
    { name = "E", parts = ["e"] },
    { name = "F", parts = ["f"] },
    { name = "G", parts = ["g"] },
]
joints = [
    { name = "rigid", lower = "A", upper = "B", kind = "rigid" },
    { name = "loose", lower = "B", upper = "C", kind = "loose", transverse = "5 N/mm2" },
    { name = "slipping", lower = "C", upper = "D", kind = { slipping = { modulus = "9 N/mm2" } } },
    { name = "screws", lower = "D", upper = "E", kind = { fasteners = { stiffness = "8 kN/mm", rows = 2, planes = 3, spacing = "150 mm" } } },
    { name = "studs", lower = "E", upper = "F", kind = { fasteners = { stiffness = "8 kN/mm", rows = 1, bands = [
        { from = "0 m", to = "1 m", spacing = "100 mm" },
        { from = "5 m", to = "6 m", spacing = "200 mm" },
    ] } }, creep = 1.2, clearance = "1 mm" },
    { name = "glue", lower = "G", upper = "A", kind = { glue = { shear_modulus = "2 MPa", width = "80 mm", thickness = "20 mm" } }, gap = "20 mm" },
]

[member]
length = "6 m"
supports = [
    { name = "left", kind = "pin", at = "0 m" },
    { name = "right", kind = "roller", at = "6 m" },
]

[[actions]]
name = "floor"
kind = "permanent"
loads = [{ uniform = { load = "3 kN/m" } }]
"#;

fn built() -> Section {
    let wood = timber("C24", ServiceClass::One).unwrap().named("wood");
    let stone = Material::new("stone", 31.GPa(), Creep::factor(2.5));
    let part = |name: &str, material: &Material| {
        Part::new(name, rectangle(100.mm(), 40.mm()), material.clone())
    };
    let parts = [
        part("a", &wood),
        part("b", &wood).above("a"),
        part("c", &wood).above("b"),
        part("d", &wood).above("c"),
        part("e", &wood).above("d"),
        part("f", &stone).above("e"),
        part("g", &wood).at(0.mm(), (-60).mm()),
    ];
    let layers = ["A", "B", "C", "D", "E", "F", "G"].map(|name| {
        let layer = Layer::new(name, [name.to_lowercase()]);
        if name == "B" {
            layer.between(1.m(), 5.m())
        } else {
            layer
        }
    });
    let fasteners = |rows, planes, spacing| Slip::Fasteners {
        stiffness: 8.kN_per_mm(),
        rows,
        planes,
        spacing,
    };
    let band = |from: i32, to: i32, spacing: i32| Band {
        from: from.m(),
        to: to.m(),
        spacing: spacing.mm(),
    };
    let bands = Spacing::Bands(vec![band(0, 1, 100), band(5, 6, 200)]);
    let modulus = |value| SlipModulus::from_N_per_mm2(value);
    let glue = Slip::Glue {
        shear_modulus: Modulus::from_MPa(2.0),
        width: 80.mm(),
        thickness: 20.mm(),
    };
    let screws = fasteners(2, 3, Spacing::Uniform(150.mm()));
    let joints = [
        Joint::rigid("rigid", "A", "B"),
        Joint::loose("loose", "B", "C").transverse(modulus(5.0)),
        Joint::slipping("slipping", "C", "D", Slip::Modulus(modulus(9.0))),
        Joint::slipping("screws", "D", "E", screws),
        Joint::slipping("studs", "E", "F", fasteners(1, 1, bands))
            .creep(1.2)
            .clearance(1.mm()),
        Joint::slipping("glue", "G", "A", glue).gap(20.mm()),
    ];
    Section::layered(parts, layers, joints).unwrap()
}

#[test]
fn a_job_gives_the_section_that_the_constructors_give() {
    let job = Job::read(JOB, Format::Toml).unwrap_or_else(|error| panic!("{error}"));
    let (found, expected) = (job.member().section(), built());
    assert_eq!(found.layers(), expected.layers());
    assert_eq!(found.joints(), expected.joints());
    assert_eq!(found.placed_joints(), expected.placed_joints());
    assert_eq!(found.merged_layers(), expected.merged_layers());
}

#[test]
fn layers_and_joints_are_written_back() {
    let job = Job::read(JOB, Format::Toml).unwrap();
    for format in [Format::Toml, Format::Json] {
        let again = Job::read(&job.to_text(format), format).unwrap();
        assert_eq!(again.document(), job.document());
        assert_eq!(again.member().section(), job.member().section());
    }
}
