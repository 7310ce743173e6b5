//! The units of a member's states.

use super::modes::inverse;
use super::piece::PieceLaw;
use super::states::{Scale, States};
use super::station::Station;

/// Units in which the states are near one.
pub(super) fn scale(
    states: States,
    places: &[f64],
    stations: &[Station],
    laws: &[PieceLaw],
) -> Scale {
    let held = stations.iter().filter(|s| !s.holds.is_empty()).count();
    let length = (places[places.len() - 1] - places[0]) / held.saturating_sub(1).max(1) as f64;
    let law = laws[0].laws().next().expect("a piece has a law");
    let flexibility = inverse(&law.stiffness);
    let bending = 1.0 / flexibility[(0, 0)];
    let energy = bending / length;
    let mut units = vec![1.0; states.half()];
    units[..states.strands].fill(length);
    if states.has_axial {
        let axial = states.axial();
        let gradient = axial - states.strands;
        units[axial] = (bending * flexibility[(gradient, gradient)]).sqrt();
    }
    for j in 0..states.slips {
        let slip = states.slip(j);
        let f = flexibility[(slip - states.strands, slip - states.strands)];
        let k = laws
            .iter()
            .flat_map(PieceLaw::laws)
            .map(|law| law.joints[(slip, slip)])
            .fold(0.0, f64::max);
        let rate = (k * f).sqrt().max(1.0 / length);
        units[slip] = (energy * f / rate).sqrt();
    }
    Scale::new(units, energy)
}
