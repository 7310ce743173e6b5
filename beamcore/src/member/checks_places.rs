//! Whether changes of section, hinges and anchors stand where they can.

use super::plan::MemberPlan;
use crate::check;
use crate::error::{ErrorKind, Problem};
use crate::path;
use crate::units::Length;

/// Changes of the section go from left to right, inside the member.
pub(super) fn order_of_changes(plan: &MemberPlan) -> Vec<Problem> {
    let mut problems = Vec::new();
    let mut reached = Length::ZERO;
    for (i, change) in plan.changes().iter().enumerate() {
        let base = path::key(&path::indexed("member.changes", i), change.name());
        let slack = plan.length() * super::SAME_PLACE;
        if !(change.from() >= reached && change.from() < plan.length()) {
            problems.push(Problem::new(
                ErrorKind::Position,
                path::key(&base, change.first_key()),
                change.from().to_string(),
                format!(
                    "a place from {reached} on, left of the end at {}",
                    plan.length()
                ),
            ));
        } else if !change.to().is_finite() || change.to() > plan.length() {
            problems.push(Problem::new(
                ErrorKind::Position,
                path::key(&base, "to"),
                change.to().to_string(),
                format!("a place on the member, up to {}", plan.length()),
            ));
        } else if matches!(change, super::SectionChange::Taper { .. })
            && change.to() - change.from() <= slack
        {
            problems.push(Problem::new(
                ErrorKind::Position,
                &base,
                format!("a taper from {} to {}", change.from(), change.to()),
                "a taper that ends right of where it begins",
            ));
        }
        reached = change.to();
    }
    problems
}

/// Hinges and anchors stand inside the member, each at a place of its own.
pub(super) fn places(plan: &MemberPlan) -> Vec<Problem> {
    let mut problems = Vec::new();
    let slack = plan.length() * super::SAME_PLACE;
    for (i, hinge) in plan.hinges().iter().enumerate() {
        let at = path::key(&hinge.path(i), "at");
        let place = hinge.at();
        if !(place > slack && place < plan.length() - slack) {
            problems.push(Problem::new(
                ErrorKind::Position,
                &at,
                format!("a hinge at {place}, at an end of the member or beyond it"),
                format!("a place between the ends, 0 m and {}", plan.length()),
            ));
        }
        let same = |other: &super::Hinge| {
            other.release() == hinge.release() && (other.at() - place).abs() <= slack
        };
        if plan.hinges()[..i].iter().any(same) {
            problems.push(Problem::new(
                ErrorKind::Duplicate,
                &at,
                format!("two hinges of one kind at {place}"),
                "one hinge at each place",
            ));
        }
    }
    for (i, anchor) in plan.anchors().iter().enumerate() {
        let at = path::key(&path::named("member.anchors", &anchor.name), "at");
        if !(anchor.at >= Length::ZERO && anchor.at <= plan.length()) {
            problems.push(Problem::new(
                ErrorKind::Position,
                at,
                anchor.at.to_string(),
                format!("a place on the member, from 0 m to {}", plan.length()),
            ));
        }
        let same = |other: &&super::Anchor| {
            other.joint == anchor.joint && (other.at - anchor.at).abs() <= slack
        };
        if let Some(other) = plan.anchors()[..i].iter().find(same) {
            problems.push(Problem::new(
                ErrorKind::Duplicate,
                path::key(&path::named("member.anchors", &anchor.name), "at"),
                format!(
                    "{}, where the anchor \"{}\" stops the same joint",
                    anchor.at, other.name
                ),
                "a place of its own for each anchor of a joint",
            ));
        }
        check::name(&mut problems, &anchor.name, "member.anchors");
    }
    let names = plan.anchors().iter().map(|anchor| anchor.name.as_str());
    check::unique(&mut problems, names, "anchors", "member.anchors");
    problems
}
