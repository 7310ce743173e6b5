//! What the typed cases of layers read beside the fields of every case.

use super::super::line;
use beamcore::Result;
use beamcore::response::Response;
use beamcore::time::Time;

const COMBINATIONS: [&str; 4] = [
    "permanent",
    "quasi-permanent",
    "characteristic",
    "fundamental",
];

/// Every combination at both times, with its path.
pub fn states() -> impl Iterator<Item = (&'static str, Time, String)> {
    COMBINATIONS.into_iter().flat_map(|combination| {
        Time::ALL.map(|time| {
            let at = format!("combinations[\"{combination}\"].{time}");
            (combination, time, at)
        })
    })
}

/// The joints that slip and the layers of a member.
pub fn layered(case: &str, response: &Response) -> Result<String> {
    let mut text = String::new();
    let mut put = |path: String, value: f64| text += &line(case, &path, value);
    let section = response.member().section();
    for (combination, time, at) in states() {
        for joint in section.joints() {
            let at = format!("{at}.joints[\"{}\"]", joint.name());
            let found = response.joint(combination, time, joint.name())?;
            let slip = found.slip.greatest().value.to_m();
            put(format!("{at}.slip.greatest.value_m"), slip);
            let left = found.slip.value(beamcore::units::Length::ZERO)?;
            put(format!("{at}.slip.left_m"), left.to_m());
            let flow = found.flow.greatest().value.to_N_per_m();
            put(format!("{at}.flow.greatest.value_N_per_m"), flow);
            let pressure = found.pressure.minimum().value.to_N_per_m();
            put(format!("{at}.pressure.minimum.value_N_per_m"), pressure);
        }
        for layer in section.layers() {
            let at = format!("{at}.layers[\"{}\"]", layer.name());
            let found = response.layer(combination, time, layer.name())?;
            let axial = found.axial.greatest().value.to_N();
            put(format!("{at}.axial.greatest.value_N"), axial);
            let moment = found.moment.greatest().value.to_N_m();
            put(format!("{at}.moment.greatest.value_Nm"), moment);
            if response.member().has_deflections_of_layers() {
                let line = response.layer_deflection(combination, time, layer.name())?;
                let greatest = line.greatest().value.to_m();
                put(format!("{at}.deflection.greatest.value_m"), greatest);
            }
        }
    }
    Ok(text)
}
