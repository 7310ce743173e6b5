//! What can be wrong with a member, beside its section.

use super::action::{Action, ActionKind};
use super::checks_parts::check_self_weight;
use super::layout::SAME_PLACE;
use super::load::Load;
use super::support::{Support, SupportKind};
use crate::check;
use crate::error::{ErrorKind, Problem};
use crate::path;
use crate::section::Section;
use crate::units::Length;

/// A list as far as it is known: an entry whose text cannot be read is left out of it.
pub(crate) struct Known<'a, T> {
    /// The entries that are known.
    pub(crate) entries: &'a [T],
    /// Whether these are all of them.
    pub(crate) is_complete: bool,
}

impl<'a, T> From<&'a [T]> for Known<'a, T> {
    fn from(entries: &'a [T]) -> Self {
        Self {
            entries,
            is_complete: true,
        }
    }
}

/// All problems of a member, as far as its section, length, supports and actions are known.
pub(crate) fn problems_of(
    section: Option<&Section>,
    length: Option<Length>,
    supports: &Known<'_, Support>,
    actions: &Known<'_, Action>,
) -> Vec<Problem> {
    let mut problems = Vec::new();
    if let Some(length) = length {
        check::positive(&mut problems, length, "member.length");
    }
    // Without a usable length nothing can lie inside or outside the member.
    let length = length.filter(|_| problems.is_empty());
    check_supports(&mut problems, length, supports);
    check_actions(&mut problems, length, actions);
    if let Some(section) = section {
        check_self_weight(&mut problems, section, actions.entries);
    }
    problems
}

fn check_supports(
    problems: &mut Vec<Problem>,
    length: Option<Length>,
    &Known {
        entries: supports,
        is_complete,
    }: &Known<'_, Support>,
) {
    let all = "member.supports";
    if supports.is_empty() && is_complete {
        problems.push(Problem::new(
            ErrorKind::Missing,
            all,
            "no supports",
            "at least two supports, or one fixed support",
        ));
        return;
    }
    for support in supports {
        problems.extend(support.problems());
        check::name(problems, support.name(), all);
        inside(problems, length, support.at(), &at(support));
    }
    check::unique(
        problems,
        supports.iter().map(Support::name),
        "supports",
        all,
    );
    problems.extend(
        length
            .into_iter()
            .flat_map(|length| same_place(supports, length)),
    );
    if supports.iter().all(|support| {
        support.kind() == SupportKind::Roller
            && !support.holds_axis()
            && support.held_layers().is_empty()
    }) {
        problems.push(Problem::new(
            ErrorKind::Mechanism,
            all,
            "only rollers, so that the member is free to move along its axis",
            "at least one pin or fixed support",
        ));
    }
}

/// A problem for each support at the place of an earlier one, in the order of the list.
fn same_place(supports: &[Support], length: Length) -> Vec<Problem> {
    let mut order: Vec<usize> = (0..supports.len()).collect();
    order.sort_by(|&a, &b| supports[a].at().si().total_cmp(&supports[b].at().si()));
    let mut found: Vec<(usize, Problem)> = Vec::new();
    for pair in order.windows(2) {
        let (earlier, later) = (pair[0].min(pair[1]), pair[0].max(pair[1]));
        let (earlier, support) = (&supports[earlier], &supports[later]);
        if (support.at() - earlier.at()).abs() <= length * SAME_PLACE {
            let problem = Problem::new(
                ErrorKind::Duplicate,
                at(support),
                format!(
                    "{}, where the support \"{}\" stands",
                    support.at(),
                    earlier.name()
                ),
                "a place of its own for each support",
            );
            found.push((later, problem));
        }
    }
    found.sort_by_key(|(later, _)| *later);
    found.into_iter().map(|(_, problem)| problem).collect()
}

fn at(support: &Support) -> String {
    path::key(&path::named("member.supports", support.name()), "at")
}

fn check_actions(
    problems: &mut Vec<Problem>,
    length: Option<Length>,
    &Known {
        entries: actions,
        is_complete,
    }: &Known<'_, Action>,
) {
    if actions.is_empty() && is_complete {
        problems.push(Problem::new(
            ErrorKind::Missing,
            "actions",
            "no actions",
            "at least one action with its loads",
        ));
    }
    check::unique(
        problems,
        actions.iter().map(Action::name),
        "actions",
        "actions",
    );
    for action in actions {
        check::name(problems, action.name(), "actions");
        let base = path::named("actions", action.name());
        if let ActionKind::Variable(factors) = action.kind() {
            let base = path::key(&path::key(&base, "kind"), "variable");
            check::between(
                problems,
                factors.psi_0,
                0.0,
                1.0,
                &path::key(&base, "psi_0"),
            );
            check::between(
                problems,
                factors.psi_1,
                0.0,
                1.0,
                &path::key(&base, "psi_1"),
            );
            check::between(
                problems,
                factors.psi_2,
                0.0,
                1.0,
                &path::key(&base, "psi_2"),
            );
        }
        if let Some(start) = action.start() {
            check::not_negative(problems, start, &path::key(&base, "start"));
        }
        let loads = path::key(&base, "loads");
        if action.loads().is_empty() {
            problems.push(Problem::new(
                ErrorKind::Missing,
                &loads,
                "an action without loads",
                "at least one load",
            ));
        }
        for (i, load) in action.loads().iter().enumerate() {
            let base = path::key(&path::indexed(&loads, i), load.name());
            check_load(problems, length, load, &base);
        }
    }
}

fn check_load(problems: &mut Vec<Problem>, length: Option<Length>, load: &Load, base: &str) {
    let field = |name: &str| path::key(base, name);
    match load.clone() {
        Load::SelfWeight => {}
        Load::Uniform { load } => check::finite(problems, load, &field("load")),
        Load::Partial { load, from, to } => {
            check::finite(problems, load, &field("load"));
            check_stretch(problems, length, from, to, base);
        }
        Load::Trapezoidal {
            load_from,
            load_to,
            from,
            to,
        } => {
            check::finite(problems, load_from, &field("load_from"));
            check::finite(problems, load_to, &field("load_to"));
            check_stretch(problems, length, from, to, base);
        }
        Load::Area {
            load,
            tributary_width,
            stretch,
        } => {
            check::finite(problems, load, &field("load"));
            check::positive(problems, tributary_width, &field("tributary_width"));
            if let Some((from, to)) = stretch {
                check_stretch(problems, length, from, to, base);
            }
        }
        Load::Point { load, at } => {
            check::finite(problems, load, &field("load"));
            inside(problems, length, at, &field("at"));
        }
        Load::Couple { couple, at } => {
            check::finite(problems, couple, &field("couple"));
            inside(problems, length, at, &field("at"));
        }
        Load::Plan { load, stretch } => {
            check::finite(problems, load, &field("load"));
            if let Some((from, to)) = stretch {
                check_stretch(problems, length, from, to, base);
            }
        }
        Load::Axial { load, at, height } => {
            check::finite(problems, load, &field("load"));
            inside(problems, length, at, &field("at"));
            check::finite(problems, height, &field("height"));
        }
        Load::Prestress { force, tendon } => {
            check::finite(problems, force, &field("force"));
            let base = path::key(&field("tendon"), tendon.name());
            for (i, (at, height)) in tendon.points().iter().enumerate() {
                let base = path::indexed(&base, i);
                inside(problems, length, *at, &path::key(&base, "at"));
                check::finite(problems, *height, &path::key(&base, "height"));
            }
        }
        Load::Settlement { settlement, .. } => {
            check::finite(problems, settlement, &field("settlement"));
        }
        Load::ImposedRotation { rotation, .. } => {
            check::finite(problems, rotation, &field("rotation"));
        }
        Load::Temperature { change, .. } => check::finite(problems, change, &field("change")),
        Load::TemperatureDifference { difference } => {
            check::finite(problems, difference, &field("difference"));
        }
        Load::Strain { strain, .. } => problems.extend(strain.problems(base)),
    }
}

/// Both ends of a stretch on the member, the second right of the first.
fn check_stretch(
    problems: &mut Vec<Problem>,
    length: Option<Length>,
    from: Length,
    to: Length,
    base: &str,
) {
    let field = |name: &str| path::key(base, name);
    inside(problems, length, from, &field("from"));
    inside(problems, length, to, &field("to"));
    let slack = length.map_or(Length::ZERO, |length| length * SAME_PLACE);
    if from.is_finite() && to.is_finite() && to - from <= slack {
        problems.push(Problem::new(
            ErrorKind::Position,
            field("to"),
            to.to_string(),
            format!("a place to the right of the stretch's beginning at {from}"),
        ));
    }
}

/// A problem unless the place lies on the member.
fn inside(problems: &mut Vec<Problem>, length: Option<Length>, place: Length, path: &str) {
    let before = problems.len();
    check::finite(problems, place, path);
    let Some(length) = length else { return };
    if problems.len() == before && !(place >= Length::ZERO && place <= length) {
        problems.push(Problem::new(
            ErrorKind::Position,
            path,
            place.to_string(),
            format!("a place on the member, from 0 m to {length}"),
        ));
    }
}
