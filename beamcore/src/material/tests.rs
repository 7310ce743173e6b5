//! Tests of materials as a whole: values of classes, overrides, shear, strengths.

use super::*;
use crate::error::{ErrorKind, Result};
use crate::units::{Length, Number};

pub(super) fn joist() -> Material {
    timber("C24", ServiceClass::One).unwrap()
}

pub(super) fn own() -> Material {
    Material::new("own", 10.GPa(), Creep::none())
}

/// The only problem of a material, as kind, path, found, expected.
pub(super) fn problem(material: &Material) -> (ErrorKind, String, String, String) {
    let problems = material.problems();
    let [only] = problems.as_slice() else {
        panic!("{problems:?}")
    };
    let text = |text: &str| text.to_owned();
    (
        only.kind(),
        text(only.path()),
        text(only.found()),
        text(only.expected()),
    )
}

/// Values that were written down apart from the tables (E, E_05, G in MPa, rho_k, rho_mean), from
/// memory; those of GL also published: structuralbasics.com, "Glulam strength capacities according
/// to Eurocode", after EN 14080:2013.
#[test]
fn classes_have_their_values() {
    let expected = [
        ("C16", 8_000.0, 5_400.0, 500.0, 310.0, 370.0),
        ("C24", 11_000.0, 7_400.0, 690.0, 350.0, 420.0),
        ("C30", 12_000.0, 8_000.0, 750.0, 380.0, 460.0),
        ("D30", 11_000.0, 9_200.0, 690.0, 530.0, 640.0),
        ("D40", 13_000.0, 10_900.0, 810.0, 550.0, 660.0),
        ("GL24h", 11_500.0, 9_600.0, 650.0, 385.0, 420.0),
        ("GL28h", 12_600.0, 10_500.0, 650.0, 425.0, 460.0),
        ("GL30h", 13_600.0, 11_300.0, 650.0, 430.0, 480.0),
        ("GL32h", 14_200.0, 11_800.0, 650.0, 440.0, 490.0),
        ("GL24c", 11_000.0, 9_100.0, 650.0, 365.0, 400.0),
        ("GL28c", 12_500.0, 10_400.0, 650.0, 390.0, 420.0),
        ("GL30c", 13_000.0, 10_800.0, 650.0, 390.0, 430.0),
        ("GL32c", 13_500.0, 11_200.0, 650.0, 400.0, 440.0),
    ];
    for (class, modulus, modulus_05, shear, density_05, density) in expected {
        let found = timber(class, ServiceClass::Two).unwrap();
        assert_eq!(found.name(), class);
        assert_eq!(found.modulus().to_MPa(), modulus, "{class}");
        assert_eq!(found.modulus_05().unwrap().to_MPa(), modulus_05, "{class}");
        assert_eq!(
            found.mean_shear_modulus().unwrap().to_MPa(),
            shear,
            "{class}"
        );
        assert_eq!(found.density_05(), Some(density_05.kg_per_m3()), "{class}");
        assert_eq!(found.mean_density(), Some(density.kg_per_m3()), "{class}");
        assert_eq!(found.expansion(), Some(5e-6.per_K()));
        assert_eq!(found.creep().value(), 0.8);
        assert!(found.origin().unwrap().ends_with(" (from memory)"));
        assert_eq!(
            (found.overrides(), found.problems()),
            (&[] as &[String], vec![])
        );
    }
    let Some(CharacteristicStrength::Concrete(strength)) = concrete("C30/37", &Creep::factor(2.5))
        .unwrap()
        .values
        .characteristic
    else {
        panic!()
    };
    assert_eq!(
        strength,
        ConcreteStrength::new(30.MPa(), 38.MPa(), 2.9.MPa())
    );
}

/// At both ends of the ranges. EN 10025-2 Table 7 as published: readle.co.uk, "Steel grades to
/// Eurocodes"; EN 1999-1-1 Table 3.2b from memory.
#[test]
fn metals_have_the_strength_of_their_thickness() {
    let of = |material: Result<Material>| match material.unwrap().values.characteristic {
        Some(CharacteristicStrength::Metal(metal)) => metal.yield_stress.to_MPa(),
        other => panic!("{other:?}"),
    };
    let thicknesses = [3.0, 16.0, 16.1, 40.0, 63.0, 80.0, 100.0];
    for (class, expected) in [
        ("S235", [235.0, 235.0, 225.0, 225.0, 215.0, 215.0, 215.0]),
        ("S275", [275.0, 275.0, 265.0, 265.0, 255.0, 245.0, 235.0]),
        ("S355", [355.0, 355.0, 345.0, 345.0, 335.0, 325.0, 315.0]),
    ] {
        for (thickness, expected) in thicknesses.into_iter().zip(expected) {
            let found = of(steel_of_thickness(class, thickness.mm()));
            assert_eq!(found, expected, "{class} {thickness}");
        }
    }
    assert_eq!(of(aluminium("EN AW-6082 T6", 5.mm())), 250.0);
    assert_eq!(of(aluminium("EN AW-6082 T6", 5.1.mm())), 260.0);
    assert_eq!(of(aluminium("EN AW-6063 T6", 25.mm())), 160.0);
    assert_eq!(of(aluminium("EN AW-6060 T6", 15.mm())), 140.0);

    assert_eq!(
        steel_of_thickness("S420", 50.mm()).unwrap_err().to_string(),
        "thickness: found 50 mm; expected a thickness from 3 mm to 40 mm, for which the strengths \
         of S420 are known (EN 10025-3:2004 and EN 10025-4:2004)"
    );
    for thickness in [0.0, -5.0, 2.9, 100.1, f64::NAN, f64::INFINITY] {
        let error = steel_of_thickness("S275", Length::from_mm(thickness)).unwrap_err();
        assert_eq!(error.kind(), ErrorKind::Value, "{thickness}");
    }
    let plate = steel_of_thickness("S275", 20.mm()).unwrap();
    assert_eq!(
        plate.origin(),
        Some("S275, EN 1993-1-1:2005 3.2.6; f_y and f_u of 20 mm by EN 10025-2:2004 (from memory)")
    );
    assert_eq!(steel("S275").unwrap().characteristic(), None);
    assert_eq!(steel("S275").unwrap().expansion(), Some(12e-6.per_K()));
}

#[test]
fn overrides_are_remembered_against_the_class() {
    let strength = TimberStrength::new(20.MPa(), 14.5.MPa(), 21.MPa(), 3.5.MPa());
    let known = joist()
        .modulus_override(10.GPa())
        .fractile_modulus(7.GPa())
        .shear_modulus(0.7.GPa())
        .density(460.kg_per_m3())
        .density(450.kg_per_m3())
        .fractile_density(380.kg_per_m3())
        .thermal_expansion(4e-6.per_K())
        .creep_override(Creep::factor(0.7))
        .characteristic_strength(CharacteristicStrength::Timber(
            strength.across(0.4.MPa(), 2.5.MPa()),
        ));
    assert_eq!(
        known.overrides(),
        [
            "modulus 10 GPa instead of 11 GPa",
            "5 % fractile of the modulus 7 GPa instead of 7.4 GPa",
            "shear modulus 700 MPa instead of 690 MPa",
            "density 450 kg/m3 instead of 420 kg/m3",
            "5 % fractile of the density 380 kg/m3 instead of 350 kg/m3",
            "thermal expansion 4e-6 /K instead of 5e-6 /K",
            "bending strength f_m,k 20 MPa instead of 24 MPa",
            "shear strength f_v,k 3.5 MPa instead of 4 MPa",
            "creep factor 0.7 instead of 0.6",
        ]
    );
    assert_eq!(known.expansion_origin(), None);
    assert!(joist().expansion_origin().unwrap().contains("no source"));
    // The class's own value again is no override, and neither is a value the class does not have.
    let back = known.density(420.kg_per_m3());
    assert!(
        !back
            .overrides()
            .iter()
            .any(|text| text.starts_with("density"))
    );
    assert_eq!(
        steel("S235")
            .unwrap()
            .fractile_modulus(200.GPa())
            .overrides(),
        &[] as &[String]
    );
    assert_eq!(own().density(500.kg_per_m3()).overrides(), &[] as &[String]);
}

#[test]
fn shear_modulus_is_given_or_follows() {
    assert_eq!(own().mean_shear_modulus(), None);
    assert_eq!(
        own().poisson_ratio(0.25).mean_shear_modulus(),
        Some(4.GPa())
    );
    let creeping = own()
        .shear_modulus(4.GPa())
        .creep_override(Creep::factor(1.0));
    assert_eq!(creeping.shear_modulus_at(Time::Final), Some(2.GPa()));
    let both = |shear: f64| own().poisson_ratio(0.25).shear_modulus(shear.GPa());
    assert_eq!(both(4.03).problems(), vec![]);
    assert_eq!(
        problem(&both(4.05)),
        (
            ErrorKind::Value,
            "materials[\"own\"].shear_modulus".into(),
            "4.05 GPa beside Poisson's ratio 0.25".into(),
            "4 GPa, which is E/(2 (1 + nu)), within 1 %, or only one of the two".into()
        )
    );
    assert_eq!(
        problem(&own().poisson_ratio(0.6)).1,
        "materials[\"own\"].poisson_ratio"
    );
    // Of a class one or the other is replaced; with another E, G follows nu only.
    let slab = concrete("C25/30", &Creep::factor(2.0)).unwrap();
    let replaced = slab.clone().shear_modulus(12.GPa());
    assert_eq!((replaced.poisson(), replaced.problems()), (None, vec![]));
    assert_eq!(
        replaced.overrides(),
        ["shear modulus 12 GPa instead of 12.9167 GPa"]
    );
    let softer = slab.modulus_override(24.GPa());
    assert_eq!(softer.mean_shear_modulus(), Some(10.GPa()));
    assert_eq!(softer.overrides(), ["modulus 24 GPa instead of 31 GPa"]);
    assert_eq!(
        problem(&own().thermal_expansion(12.per_K())).1,
        "materials[\"own\"].thermal_expansion"
    );
}
