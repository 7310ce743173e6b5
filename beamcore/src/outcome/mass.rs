//! The mass of a member and of its parts.

use crate::member::Member;
use crate::section::Section;
use crate::units::{Length, LineMass, Mass};

/// The mass of a member, if that of all its parts is known.
pub(super) fn mass(member: &Member) -> Option<Mass> {
    along(member, |section, x| {
        let there = section.placed().iter().enumerate();
        let there = there.filter(|(index, _)| section.is_there(*index, x.si()));
        there
            .map(|(_, part)| part.line_mass())
            .try_fold(LineMass::ZERO, |sum, mass| Some(sum + mass?))
    })
}

/// The mass of a part in a member, if it is known.
pub(super) fn mass_of_part(member: &Member, name: &str) -> Option<Mass> {
    along(member, |section, x| {
        let index = section.placed().iter().position(|part| part.name() == name);
        match index.filter(|&index| section.is_there(index, x.si())) {
            Some(index) => section.placed()[index].line_mass(),
            None => Some(LineMass::ZERO),
        }
    })
}

/// The integral of a mass per length along the member. Along a taper it goes at most with the
/// square of the place, for which Simpson's rule is exact.
fn along(
    member: &Member,
    line_mass: impl Fn(&Section, Length) -> Option<LineMass>,
) -> Option<Mass> {
    let mut total = Mass::ZERO;
    for stretch in member.stretches() {
        let mut ends = vec![stretch.from, stretch.to];
        let layers = stretch
            .start()
            .layers()
            .iter()
            .filter_map(crate::section::Layer::extent);
        let layer_ends = layers.flat_map(|(from, to)| [from.si(), to.si()]);
        ends.extend(layer_ends.filter(|at| *at > stretch.from && *at < stretch.to));
        ends.sort_by(f64::total_cmp);
        for ends in ends.windows(2) {
            // Which parts are there is the same all over the piece, and told by its middle.
            let middle = Length::from_si(f64::midpoint(ends[0], ends[1]));
            let length = Length::from_si(ends[1] - ends[0]);
            total += match stretch.constant() {
                Some(section) => line_mass(section, middle)? * length,
                None => {
                    let at = |x: f64| line_mass(&*stretch.at(x).ok()?, middle);
                    let sides = at(ends[0])? + at(ends[1])?;
                    (sides + at(middle.si())? * 4.0) / 6.0 * length
                }
            };
        }
    }
    Some(total)
}
