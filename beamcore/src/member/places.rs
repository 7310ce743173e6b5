//! The places where a member is cut.

use super::layout::SAME_PLACE;
use super::plan::MemberPlan;
use super::sections::Stretch;

/// A place, and the station that took it in.
pub(super) type Merged = (f64, f64);

/// All places where something changes, and those that were merged.
pub(super) fn places(
    plan: &MemberPlan,
    sections: &[Stretch],
    more: &[f64],
) -> (Vec<f64>, Vec<Merged>) {
    let length = plan.length().si();
    let slack = length * SAME_PLACE;
    let supports = plan.supports().iter().map(|support| support.at().si());
    let changes = sections.iter().flat_map(|s| [s.from, s.to]);
    let own = sections.iter().flat_map(|s| s.start().places());
    let hinges = plan.hinges().iter().map(|hinge| hinge.at().si());
    let anchors = plan.anchors().iter().map(|anchor| anchor.at.si());
    let loads = plan
        .actions()
        .iter()
        .flat_map(|action| action.loads())
        .flat_map(super::Load::places)
        .map(|place| place.si());
    // Ends and supports keep their exact places; others give way to them.
    let lasting = [0.0, length]
        .into_iter()
        .chain(supports)
        .map(|place| (place, false));
    let rest = changes.chain(own).chain(hinges).chain(anchors).chain(loads);
    let rest = rest.chain(more.iter().copied()).map(|place| (place, true));
    let mut places: Vec<_> = lasting.chain(rest).collect();
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
    (kept.into_iter().map(|place| place.0).collect(), merged)
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
