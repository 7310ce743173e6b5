//! The golden case `shrinking-slab` through the typed way.

use super::super::line;
use beamcore::Result;
use beamcore::material::{Creep, Material, ServiceClass, timber};
use beamcore::member::{Action, LoadDuration, Member, Support};
use beamcore::section::{InitialStrain, Part, Section, rectangle};
use beamcore::time::Time;
use beamcore::units::{Curvature, Number, Strain};

const CASE: &str = "shrinking-slab";

pub fn answers() -> Result<String> {
    let concrete = Material::new("concrete", 31.GPa(), Creep::factor(2.0));
    let joist = Part::new(
        "joist",
        rectangle(120.mm(), 240.mm()),
        timber("C24", ServiceClass::One)?,
    );
    let slab = Part::new("slab", rectangle(500.mm(), 60.mm()), concrete)
        .above(&joist)
        .initial_strain(InitialStrain {
            axial: Strain::from_permille(-0.3),
            curvature_y: Curvature::from_per_m(0.0005),
            curvature_z: Curvature::ZERO,
        });
    let load = Action::permanent("load")
        .duration(LoadDuration::Permanent)
        .starting(28.d())
        .uniform(1.kN_per_m());
    let response = Member::of_length(Section::of([joist, slab])?, 8.m())
        .support(Support::pin("left", 0.m()))
        .support(Support::roller("middle", 4.m()))
        .support(Support::roller("right", 8.m()))
        .action(load)
        .check()?
        .solve();
    let mut text = String::new();
    let mut put = |path: &str, value: f64| text += &line(CASE, path, value);
    for time in Time::ALL {
        let at = format!("combinations[\"permanent\"].{time}");
        let minimum = response.moment("permanent", time)?.minimum().value;
        put(&format!("{at}.moment.minimum.value_Nm"), minimum.to_N_m());
        for support in ["left", "middle"] {
            let force = response.reaction("permanent", time, support)?.force;
            put(
                &format!("{at}.reactions[\"{support}\"].force_N"),
                force.to_N(),
            );
        }
        for part in ["joist", "slab"] {
            let stress = response.stress("permanent", time, part)?;
            let tension = stress.greatest_tension().value.to_Pa();
            let compression = stress.greatest_compression().value.to_Pa();
            put(
                &format!("{at}.stresses[\"{part}\"].tension.value_Pa"),
                tension,
            );
            put(
                &format!("{at}.stresses[\"{part}\"].compression.value_Pa"),
                compression,
            );
        }
    }
    Ok(text)
}
