//! The member laid out for the solver: stations, what each holds, loads of each action.

use super::action::Action;
use super::load_case::places;
use super::plan::MemberPlan;
use super::support::{Support, SupportKind};
use crate::error::{ErrorKind, Problem, Result};
use crate::solve::beam::Beam;
use crate::solve::condition::Holds;
use crate::units::BendingStiffness;

/// Places closer than this share of the length are one station.
pub(crate) const SAME_PLACE: f64 = 1e-9;

/// The stations of a member and what is held at each.
pub(super) struct Layout {
    stations: Vec<f64>,
    holds: Vec<Holds>,
    merged: Vec<(f64, f64)>,
}

impl Layout {
    /// Cuts the member at its ends, supports, point loads and ends of line loads.
    pub(super) fn new(plan: &MemberPlan) -> Self {
        let length = plan.length().si();
        let slack = length * SAME_PLACE;
        let supports = plan.supports().iter().map(|support| support.at().si());
        let loads = plan
            .actions()
            .iter()
            .flat_map(Action::loads)
            .flat_map(places);
        // Ends and supports keep their exact places; places of loads give way to them.
        let lasting = [0.0, length]
            .into_iter()
            .chain(supports)
            .map(|place| (place, false));
        let mut places: Vec<_> = lasting.chain(loads.map(|place| (place, true))).collect();
        places.sort_by(|a, b| a.0.total_cmp(&b.0));
        let mut merged = Vec::new();
        let mut kept: Vec<(f64, bool)> = Vec::with_capacity(places.len());
        for place in places {
            match kept.last_mut() {
                Some(last) if place.0 - last.0 <= slack => {
                    let (stays, goes) = if last.1 {
                        (place, *last)
                    } else {
                        (*last, place)
                    };
                    if stays.0 != goes.0 {
                        merged.push((goes.0, stays.0));
                    }
                    *last = stays;
                }
                _ => kept.push(place),
            }
        }
        let stations: Vec<f64> = kept.into_iter().map(|place| place.0).collect();
        let mut holds = vec![Holds::NOTHING; stations.len()];
        for support in plan.supports() {
            holds[nearest(&stations, support.at().si())] = held(support);
        }
        Self {
            stations,
            holds,
            merged,
        }
    }

    /// The member's equations, for a bending stiffness.
    pub(super) fn beam(&self, stiffness: BendingStiffness) -> Result<Beam> {
        let pieces = vec![stiffness.si(); self.stations.len() - 1];
        Beam::new(self.stations.clone(), self.holds.clone(), &pieces).map_err(|motion| {
            Problem::new(
                ErrorKind::Mechanism,
                "member.supports",
                format!("a member that is {motion}"),
                "supports that hold it, for example a second one",
            )
            .into()
        })
    }

    /// A note for each pair of places that became one station.
    pub(super) fn notes(&self) -> Vec<String> {
        self.merged
            .iter()
            .map(|&(place, station)| {
                format!("The place {place} m was merged with the station at {station} m, closer than 1e-9 of the length")
            })
            .collect()
    }
}

/// The index of the station nearest to a place.
pub(super) fn nearest(stations: &[f64], place: f64) -> usize {
    let after = stations
        .partition_point(|&station| station < place)
        .min(stations.len() - 1);
    let before = after.saturating_sub(1);
    if place - stations[before] < stations[after] - place {
        before
    } else {
        after
    }
}

const fn held(support: &Support) -> Holds {
    match support.kind() {
        SupportKind::Pin | SupportKind::Roller => Holds::DEFLECTION,
        SupportKind::Fixed => Holds::BOTH,
    }
}
