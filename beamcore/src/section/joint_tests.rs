//! Joints at their places against numbers worked out by hand.

use super::layer_tests::{block, joined, near, stuff};
use super::*;
use crate::material::{Creep, Material, ServiceClass, steel, timber};
use crate::units::{Length, Modulus, Number, SlipModulus};

fn contact_of(parts: &[Part], first: usize) -> (f64, f64) {
    let section = joined(parts, first, |joint| joint).unwrap();
    let joint = section.joint("joint").unwrap();
    assert_eq!(joint.distance(), Length::ZERO);
    (joint.z().to_mm(), joint.width().to_mm())
}

#[test]
fn contacts_by_hand() {
    let joist = || block("joist", 75, 220);
    // Side by side, from -55 to 95 mm in height.
    let plate = block("plate", 10, 150).at(42.5.mm(), 20.mm());
    let (z, width) = contact_of(&[joist(), plate], 1);
    near(z, 20.0);
    near(width, 150.0);
    // A slab on two webs of 40 mm.
    let webs = [-60, 60].map(|y| block(&format!("web {y}"), 40, 100).at(y.mm(), 0.mm()));
    let slab = block("slab", 200, 20).at(0.mm(), 60.mm());
    let [left, right] = webs;
    let (z, width) = contact_of(&[left, right, slab], 2);
    near(z, 50.0);
    near(width, 80.0);
    // A bar in the joist: its whole outline.
    let bar = Part::new("bar", disc(20.mm()), stuff("steel", 200.0));
    let (z, width) = contact_of(&[joist(), bar.set_into("joist", 0.mm(), (-80).mm())], 1);
    near(z, -80.0);
    near(width, 20.0 * std::f64::consts::PI);
    // A bar on the joist: a point.
    let bar = Part::new("bar", disc(20.mm()), stuff("steel", 200.0)).at(0.mm(), 120.mm());
    let (z, width) = contact_of(&[joist(), bar], 1);
    near(z, 110.0);
    assert_eq!(width, 0.0);
    // A tube round a core: its inner circle.
    let tube = Part::new("tube", ring(100.mm(), 10.mm()), stuff("steel", 200.0));
    let core = Part::new("core", disc(80.mm()), stuff("stone", 30.0));
    let (z, width) = contact_of(&[core, tube], 1);
    near(z, 0.0);
    near(width, 80.0 * std::f64::consts::PI);
}

#[test]
fn gaps_must_be_stated_as_they_are() {
    let parts = |y: i32, z: i32| {
        [
            block("joist", 100, 220),
            block("slab", 600, 70).at(y.mm(), z.mm()),
        ]
    };
    // 20 mm of air above the joist, whose top is at 110 mm.
    for stated in [20.0, 19.95, 20.05] {
        let section = joined(&parts(0, 165), 1, |joint| joint.gap(stated.mm())).unwrap();
        let joint = section.joint("joint").unwrap();
        near(joint.distance().to_mm(), 20.0);
        near(joint.z().to_mm(), 120.0);
        near(joint.width().to_mm(), 100.0);
    }
    let message = |parts: &[Part], gap: Option<Length>| {
        let change = |joint: Joint| gap.map_or(joint.clone(), |gap| joint.gap(gap));
        joined(parts, 1, change).unwrap_err().to_string()
    };
    assert_eq!(
        message(&parts(0, 165), None),
        "section.joints[\"joint\"].gap: found no gap, with a clear distance of 20 mm between the \
         layers \"lower\" and \"upper\"; expected gap = \"20 mm\", or parts that touch"
    );
    assert_eq!(
        message(&parts(0, 165), Some(20.2.mm())),
        "section.joints[\"joint\"].gap: found a gap of 20.2 mm, with a clear distance of 20 mm \
         between the layers \"lower\" and \"upper\"; expected the clear distance to 0.1 mm, or \
         other places of the parts"
    );
    assert!(message(&parts(0, 145), Some(1.mm())).contains("clear distance of 0 m"));
    // Corner to corner, 30 across and 40 up: joist to (50, 110), slab from (80, 150).
    let section = joined(&parts(380, 185), 1, |joint| joint.gap(50.mm())).unwrap();
    let joint = section.joint("joint").unwrap();
    near(joint.distance().to_mm(), 50.0);
    near(joint.z().to_mm(), 130.0);
    assert_eq!(joint.width(), Length::ZERO);
}

/// k = rows planes K/s, and G b/t.
#[test]
fn slip_moduli_by_hand() {
    let band = |from: f64, to: f64, spacing: i32| Band {
        from: from.m(),
        to: to.m(),
        spacing: spacing.mm(),
    };
    let screws = Slip::Fasteners {
        stiffness: 8.kN_per_mm(),
        rows: 2,
        planes: 1,
        spacing: Spacing::Bands(vec![band(3.5, 5.0, 200), band(0.0, 1.5, 100)]),
    };
    let parts = [
        block("lower", 100, 200),
        block("upper", 100, 50).above("lower"),
    ];
    let layers = [
        Layer::new("lower", ["lower"]),
        Layer::new("upper", ["upper"]).between(0.5.m(), 4.5.m()),
    ];
    let joint = Joint::slipping("screws", "lower", "upper", screws)
        .creep(0.6)
        .clearance(1.mm())
        .transverse(SlipModulus::from_N_per_mm2(320.0));
    let section = Section::layered(parts, layers, [joint]).unwrap();
    let [slip] = section.slips() else {
        panic!("one joint slips")
    };
    near(slip.modulus_at(1.0, Time::Initial), 160e6);
    near(slip.modulus_at(1.0, Time::Final), 100e6);
    near(slip.modulus_at(4.0, Time::Initial), 80e6);
    // Between the bands, and where the upper layer is not there.
    assert_eq!(slip.modulus_at(2.0, Time::Initial), 0.0);
    assert_eq!(slip.modulus_at(0.2, Time::Initial), 0.0);
    assert_eq!(slip.transverse_at(2.0, Time::Final), Some(200e6));
    assert_eq!(slip.clearance(), 0.001);
    assert_eq!(section.places(), [0.0, 0.5, 1.5, 3.5, 4.5, 5.0]);
    let alone = section.layer_stiffness_at(0.2, Time::Initial);
    assert!(alone[0].is_some() && alone[1].is_none());
    assert!(section.layer_stiffness_at(1.0, Time::Initial)[1].is_some());
    let paths: Vec<_> = section
        .position_problems(4.m())
        .iter()
        .map(|problem| problem.path().to_owned())
        .collect();
    assert_eq!(
        paths,
        [
            "section.layers[\"upper\"].to",
            "section.joints[\"screws\"].kind.fasteners.bands[0].to"
        ]
    );
    let glue = Slip::Glue {
        shear_modulus: Modulus::from_MPa(2.0),
        width: 80.mm(),
        thickness: 4.mm(),
    };
    near(glue.modulus_at(1.m()).to_N_per_mm2(), 40.0);
}

#[test]
fn wood_based_layers_have_a_creep_factor() {
    let of = |class: ServiceClass| timber("C24", class).unwrap();
    let part =
        |name: &str, material: Material| Part::new(name, rectangle(90.mm(), 50.mm()), material);
    let named = |name: &str, class| {
        let values = Material::new(name, 11.GPa(), Creep::timber(class));
        part(name, values)
    };
    let creep = |parts: &[Part], first| {
        let section = joined(parts, first, |joint| joint).unwrap();
        let joint = section.joint("joint").unwrap();
        (joint.creep(), joint.creep_basis().to_owned())
    };
    let upper = || named("board", ServiceClass::Two).above("joist");
    let joist = || part("joist", of(ServiceClass::One));
    let (factor, basis) = creep(
        &[joist(), part("board", of(ServiceClass::One)).above("joist")],
        1,
    );
    assert_eq!(factor, 1.2);
    assert_eq!(
        basis,
        "2 k_def of wood-based layers, 2 * 0.6, EN 1995-1-1:2004 2.3.2.2 (from memory)"
    );
    // 2 sqrt(0.6 * 0.8) = 2 sqrt(0.48).
    let (factor, _) = creep(&[joist(), upper()], 1);
    near(factor, 1.385_640_646_055_101_7);
    let wet = named("fillet", ServiceClass::Three).below("joist");
    let (factor, basis) = creep(&[joist(), wet, upper()], 2);
    near(factor, 2.0 * 1.6_f64.sqrt());
    assert!(basis.ends_with("; of the materials of the layer \"lower\" the greatest k_def, 2"));
    let metal = || steel("S275").unwrap();
    let plates = [
        part("joist", metal()),
        part("board", metal()).above("joist"),
    ];
    assert_eq!(creep(&plates, 1), (0.0, "no creep on either side".into()));
    let error = joined(
        &[joist(), part("plate", metal()).above("joist")],
        1,
        |joint| joint,
    );
    assert_eq!(
        error.unwrap_err().to_string(),
        "section.joints[\"joint\"].creep: found no creep factor, with \"S275\", not known to be \
         wood-based, in the layers \"lower\" and \"upper\"; expected the creep factor of the joint \
         (beside timber, 2 k_def of the timber is a common choice)"
    );
}
