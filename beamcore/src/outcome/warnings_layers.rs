//! What to look at in joints, supports that are left, and compression.

use super::document::OutcomeDocument;
use super::figure::figure;
use super::notes::each;
use crate::member::Member;
use crate::section::{Band, Joint, JointKind, PlacedJoint, Section, Slip, Spacing};
use crate::time::Time;
use crate::units::Length;

/// A pressure is taken as tension beyond this share of its peak.
const NO_TENSION: f64 = 1e-9;

/// The share of the elastic critical load from which second-order moments matter (common practice,
/// no source).
const SLENDER: f64 = 0.1;

/// Whether one layer of a joint lies on the other, with nothing between them that pulls them
/// together: of layers side by side, and across a transverse modulus, what passes square to the
/// member is no pressure.
fn can_open(section: &Section, placed: &PlacedJoint) -> bool {
    let slack = placed.distance() + Length::from_mm(0.1);
    let ends = |name: &str| -> Vec<(Length, Length)> {
        let layer = section.layers().iter().find(|layer| layer.name() == name);
        let names = layer.map_or(&[][..], |layer| layer.parts());
        let parts = section.placed().iter();
        parts
            .filter(|part| names.iter().any(|name| name == part.name()))
            .map(|part| (part.bottom(), part.top()))
            .collect()
    };
    let z = placed.z();
    placed.joint().transverse_modulus().is_none()
        && ends(placed.joint().lower())
            .iter()
            .all(|(_, top)| *top <= z + slack)
        && ends(placed.joint().upper())
            .iter()
            .all(|(bottom, _)| *bottom >= z - slack)
}

/// Joints that open: the worst combination of each.
pub(super) fn parting(member: &Member, document: &OutcomeDocument) -> Vec<String> {
    let section = member.section();
    let joints = document.section.joints.iter().zip(section.placed_joints());
    joints
        .filter(|(_, placed)| can_open(section, placed))
        .filter_map(|(joint, _)| {
            let found = each(document).filter_map(|(combination, time, results)| {
                let result = results.joints.iter().find(|j| j.name == joint.name)?;
                let (least, peak) = (&result.pressure.minimum, &result.pressure.greatest);
                let parts = least.value_N_per_m < -NO_TENSION * peak.value_N_per_m.abs();
                parts.then_some((least, &combination.name, time))
            });
            let worst = found.min_by(|a, b| a.0.value_N_per_m.total_cmp(&b.0.value_N_per_m))?;
            let (least, combination, time) = worst;
            Some(format!(
                "UPLIFT in joint \"{}\": the layers would part with {} kN/m at {} m, which \
                 something must hold ({combination}, {time})",
                joint.name,
                figure(-least.value_N_per_m / 1e3, 2),
                figure(least.at_m, 3)
            ))
        })
        .collect()
}

/// Supports that the member leaves, with the combinations.
pub(super) fn lifted(member: &Member, document: &OutcomeDocument) -> Vec<String> {
    let supports = member.supports().iter().filter(|s| s.is_one_way());
    supports
        .filter_map(|support| {
            let left = each(document)
                .filter(|(_, _, results)| results.lifted.iter().any(|n| n == support.name()));
            let places: Vec<_> = left
                .map(|(combination, time, _)| format!("{}, {time}", combination.name))
                .collect();
            (!places.is_empty()).then(|| {
                format!(
                    "LIFTS OFF: the member leaves the support \"{}\" ({})",
                    support.name(),
                    places.join("; ")
                )
            })
        })
        .collect()
}

/// Compression beyond a tenth of the elastic critical load of a span: `N_cr` = pi^2 EI/l^2, with l
/// the span, or twice the length of an overhang.
///
/// EI is the least of all sections at both times, of layers that slip the sum of theirs as if
/// nothing held them together, which is on the safe side.
pub(super) fn slender(member: &Member, document: &OutcomeDocument) -> Vec<String> {
    let Some(stiffness) = least_bending(member) else {
        return Vec::new();
    };
    let pi = std::f64::consts::PI;
    let mut critical: Option<(f64, &str)> = None;
    for span in member.spans() {
        let length = span.length().si() * if span.is_cantilever() { 2.0 } else { 1.0 };
        let load = pi * pi * stiffness / (length * length);
        if critical.is_none_or(|(least, _)| load < least) {
            critical = Some((load, span.name()));
        }
    }
    let worst = each(document)
        .map(|(combination, time, results)| {
            (results.axial.minimum.value_N, &combination.name, time)
        })
        .min_by(|a, b| a.0.total_cmp(&b.0));
    let (Some((critical, span)), Some((force, combination, time))) = (critical, worst) else {
        return Vec::new();
    };
    if force >= -SLENDER * critical {
        return Vec::new();
    }
    vec![format!(
        "SLENDER: {} kN of compression ({combination}, {time}) is more than {SLENDER} of the \
         elastic critical load {} kN of the span \"{span}\"; no second-order theory was used",
        figure(-force / 1e3, 1),
        figure(critical / 1e3, 1)
    )]
}

fn least_bending(member: &Member) -> Option<f64> {
    let sections = member.stretches().iter().flat_map(|stretch| {
        let end = stretch.at(stretch.to).ok();
        std::iter::once(std::sync::Arc::clone(stretch.start())).chain(end)
    });
    sections
        .flat_map(|section| {
            Time::ALL.map(|time| {
                let layers = section.layer_stiffness(time);
                layers.iter().map(|layer| layer.bending).sum::<f64>()
            })
        })
        .min_by(f64::total_cmp)
}

/// Lengths without fasteners, and spacings that simplified methods do not cover.
pub(super) fn bands(member: &Member) -> Vec<String> {
    let mut notes = Vec::new();
    for joint in member.section().joints() {
        let JointKind::Slipping(Slip::Fasteners {
            spacing: Spacing::Bands(bands),
            ..
        }) = joint.kind()
        else {
            continue;
        };
        notes.extend(bare(joint, bands, member.length()));
        let spacings = || bands.iter().map(|band| band.spacing.si());
        let (least, most) = (
            spacings().fold(f64::INFINITY, f64::min),
            spacings().fold(0.0, f64::max),
        );
        if most > 4.0 * least {
            notes.push(format!(
                "Joint \"{}\": the widest spacing is more than 4 times the closest; the simplified \
                 methods of EN 1995-1-1 Annex B do not cover that, this calculation does",
                joint.name()
            ));
        }
    }
    notes
}

/// A note for the lengths of a joint that have no fasteners.
fn bare(joint: &Joint, bands: &[Band], length: Length) -> Option<String> {
    let mut sorted: Vec<_> = bands.iter().collect();
    sorted.sort_by(|a, b| a.from.si().total_cmp(&b.from.si()));
    let mut reached = Length::ZERO;
    let mut gaps = Vec::new();
    for (from, to) in sorted
        .iter()
        .map(|band| (band.from, band.to))
        .chain([(length, length)])
    {
        if from > reached {
            gaps.push(format!("{reached} to {from}"));
        }
        reached = reached.max(to);
    }
    (!gaps.is_empty()).then(|| {
        format!(
            "Joint \"{}\" has no fasteners from {}",
            joint.name(),
            gaps.join(" and from ")
        )
    })
}
