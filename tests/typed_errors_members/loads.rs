//! Loads that refer to what is not there.

use super::{error, modulus, plan, says, section_with};
use beamcore::ErrorKind;
use beamcore::member::{Action, Load, Member, MemberPlan, Support, Tendon};
use beamcore::section::InitialStrain;
use beamcore::units::{Angle, Force, Length, Number, TemperatureChange};

fn under(load: Load) -> MemberPlan {
    plan().action(Action::permanent("more").load(load))
}

#[test]
fn movements_of_what_is_not_held() {
    says(
        under(Load::Settlement {
            support: "middle".into(),
            settlement: 1.mm(),
        }),
        ErrorKind::Name,
        "actions[\"more\"].loads[0].settlement.support: found the unknown support \"middle\"; \
         expected one of the supports \"left\", \"right\"",
    );
    says(
        under(Load::ImposedRotation {
            support: "right".into(),
            rotation: Angle::from_rad(0.01),
        }),
        ErrorKind::Value,
        "actions[\"more\"].loads[0].imposed_rotation.support: found a rotation of the support \
         \"right\", where nothing holds the rotation; expected a support that is fixed or has a \
         rotational spring",
    );
    let sunk = Load::Settlement {
        support: "left".into(),
        settlement: Length::from_m(f64::NAN),
    };
    assert_eq!(error(under(sunk)).kind(), ErrorKind::Value);
}

#[test]
fn forces_without_a_layer_or_a_hold() {
    let force = || Load::Axial {
        load: 1.kN(),
        at: 4.m(),
        height: Length::ZERO,
    };
    says(
        under(force()),
        ErrorKind::Missing,
        "actions[\"more\"].on: found a force along a member of several layers that slip; expected \
         the layer that it enters",
    );
    let free = Member::of_length(section_with(modulus()), 4.m())
        .support(Support::roller("left", Length::ZERO))
        .support(Support::roller("right", 4.m()))
        .action(Action::permanent("more").on("lower").load(force()));
    assert_eq!(error(free).kind(), ErrorKind::Mechanism);
    says(
        plan().action(Action::permanent("more").on("middle").uniform(1.kN_per_m())),
        ErrorKind::Name,
        "actions[\"more\"].on: found the unknown layer \"middle\"; expected one of the layers \
         \"lower\", \"upper\"",
    );
}

#[test]
fn strains_of_parts_that_are_not_there() {
    let warm = |degrees, parts| Load::Temperature {
        change: TemperatureChange::from_K(degrees),
        parts,
    };
    let kinds = [
        Load::Strain {
            part: "slab".into(),
            strain: InitialStrain::NONE,
        },
        warm(9.0, vec!["slab".into()]),
        warm(f64::NAN, vec![]),
    ]
    .map(|load| error(under(load)).kind());
    assert_eq!(kinds, [ErrorKind::Name, ErrorKind::Name, ErrorKind::Value]);
}

#[test]
fn tendons_that_cannot_be() {
    let kind = |force: f64, points: &[(f64, f64)]| {
        let points = points.iter().map(|(x, z)| (x.m(), z.m())).collect();
        let load = Load::Prestress {
            force: Force::from_N(force),
            tendon: Tendon::Draped(points),
        };
        error(plan().action(Action::permanent("t").on("lower").load(load))).kind()
    };
    assert_eq!(kind(1e3, &[(0.0, 0.0)]), ErrorKind::Missing);
    assert_eq!(kind(1e3, &[(1.0, 0.0), (0.0, 0.0)]), ErrorKind::Position);
    assert_eq!(kind(1e3, &[(0.0, 0.0), (5.0, 0.0)]), ErrorKind::Position);
    assert_eq!(kind(1e3, &[(0.0, f64::NAN), (4.0, 0.0)]), ErrorKind::Value);
    assert_eq!(kind(f64::NAN, &[(0.0, 0.0), (4.0, 0.0)]), ErrorKind::Value);
}
