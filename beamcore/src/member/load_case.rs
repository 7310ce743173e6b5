//! The loads of an action, laid out on the stations of a member.

use super::action::Action;
use super::layout::nearest;
use super::load::Load;
use crate::constants::GRAVITY;
use crate::section::Section;
use crate::solve::beam::{Beam, LoadCase};
use crate::units::{Length, LineLoad};

/// The loads of one action on a laid out member.
pub(crate) fn load_case(beam: &Beam, section: &Section, action: &Action) -> LoadCase {
    let stations = beam.stations();
    let mut case = LoadCase::none(stations.len());
    for load in action.loads() {
        match *load {
            Load::SelfWeight => {
                let mass = section
                    .line_mass()
                    .expect("densities are checked with the plan");
                let weight = LineLoad::from_N_per_m(mass.si() * GRAVITY);
                spread(&mut case, stations, whole(stations), [weight; 2]);
            }
            Load::Uniform { load } => spread(&mut case, stations, whole(stations), [load; 2]),
            Load::Partial { load, from, to } => {
                spread(&mut case, stations, [from, to], [load; 2]);
            }
            Load::Trapezoidal {
                load_from,
                load_to,
                from,
                to,
            } => spread(&mut case, stations, [from, to], [load_from, load_to]),
            Load::Area {
                load,
                tributary_width,
                stretch,
            } => {
                let ends = stretch.map_or(whole(stations), |(from, to)| [from, to]);
                spread(&mut case, stations, ends, [load * tributary_width; 2]);
            }
            Load::Point { load, at } => case.point[nearest(stations, at.si())] += load.si(),
            Load::Couple { couple, at } => {
                case.couple[nearest(stations, at.si())] += couple.si();
            }
        }
    }
    case
}

/// The free curvature of a member whose parts bear initial strains.
pub(crate) fn curvature_case(beam: &Beam, curvature: f64) -> LoadCase {
    let mut case = LoadCase::none(beam.stations().len());
    for piece in &mut case.pieces {
        piece.curvature = curvature;
    }
    case
}

/// The ends of the member.
fn whole(stations: &[f64]) -> [Length; 2] {
    [stations[0], stations[stations.len() - 1]].map(Length::from_si)
}

/// Adds a line load over a stretch that changes linearly from its beginning to its end.
fn spread(case: &mut LoadCase, stations: &[f64], ends: [Length; 2], loads: [LineLoad; 2]) {
    let [first, last] = ends.map(|place| nearest(stations, place.si()));
    let (from, length) = (stations[first], stations[last] - stations[first]);
    let [left, right] = loads.map(LineLoad::si);
    let at = |k: usize| {
        // The ends take their own values, and a constant load is the same everywhere.
        let share = (stations[k] - from) / length;
        if k == last {
            right
        } else {
            left + (right - left) * share
        }
    };
    for k in first..last {
        let line = &mut case.pieces[k].line;
        line[0] += at(k);
        line[1] += at(k + 1);
    }
}

/// The places where a load begins, ends or stands.
pub(super) fn places(load: &Load) -> Vec<f64> {
    match *load {
        Load::SelfWeight | Load::Uniform { .. } => vec![],
        Load::Area { stretch, .. } => {
            stretch.map_or_else(Vec::new, |(from, to)| vec![from.si(), to.si()])
        }
        Load::Partial { from, to, .. } | Load::Trapezoidal { from, to, .. } => {
            vec![from.si(), to.si()]
        }
        Load::Point { at, .. } | Load::Couple { at, .. } => vec![at.si()],
    }
}
