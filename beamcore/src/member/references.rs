//! What names of layers and joints refer to, and which layers move together.

use super::plan::MemberPlan;
use crate::error::{ErrorKind, Problem, Result};
use crate::section::Section;
use crate::time::Time;

/// Whether axial force takes part.
pub(super) fn has_axial(plan: &MemberPlan) -> bool {
    let holds = plan
        .supports()
        .iter()
        .filter(|support| support.holds_axis());
    let loads = plan.actions().iter().flat_map(|action| action.loads());
    holds.count() > 1
        || plan.pitch_angle().is_some_and(|angle| angle.si() != 0.0)
        || loads.into_iter().any(super::Load::is_axial)
        || plan
            .supports()
            .iter()
            .any(|s| !s.held_layers().is_empty() || s.given_axial_spring().is_some())
}

/// The strands: merged layers that share a deflection. The first layer's is the first.
pub(super) fn strands(section: &Section) -> (usize, Vec<usize>) {
    let count = section.merged_layers().len();
    let mut strand: Vec<usize> = (0..count).collect();
    for joint in section.slips() {
        if joint.transverse_at(0.0, Time::Initial).is_none() {
            let (a, b) = (strand[joint.lower], strand[joint.upper]);
            let (low, high) = (a.min(b), a.max(b));
            for s in &mut strand {
                if *s == high {
                    *s = low;
                }
            }
        }
    }
    let mut found: Vec<usize> = strand.clone();
    found.sort_unstable();
    found.dedup();
    let position = |s: &usize| found.binary_search(s).unwrap_or_default();
    (found.len(), strand.iter().map(position).collect())
}

/// The merged layer that a named layer is in.
pub(crate) fn merged_layer(section: &Section, name: &str, at: &str) -> Result<usize> {
    let merged = section.merged_layers();
    let found = merged
        .iter()
        .position(|layer| layer.layers().iter().any(|own| own == name));
    found.ok_or_else(|| {
        let names: Vec<_> = section
            .layers()
            .iter()
            .map(crate::section::Layer::name)
            .collect();
        Problem::new(
            ErrorKind::Name,
            at,
            format!("the unknown layer \"{name}\""),
            format!("one of the layers {}", crate::lookup::listed(&names)),
        )
        .into()
    })
}

/// The slip of a named joint.
pub(crate) fn slip_of(section: &Section, name: &str, at: &str) -> Result<usize> {
    let joints = section.joints();
    let found = section
        .slips()
        .iter()
        .position(|slip| joints[slip.joint].name() == name);
    found.ok_or_else(|| {
        let names: Vec<_> = section
            .slips()
            .iter()
            .map(|slip| joints[slip.joint].name())
            .collect();
        let expected = if names.is_empty() {
            "a section with a joint that slips".into()
        } else {
            format!(
                "one of the joints that slip: {}",
                crate::lookup::listed(&names)
            )
        };
        Problem::new(
            ErrorKind::Name,
            at,
            format!("the joint \"{name}\", which does not slip or is not there"),
            expected,
        )
        .into()
    })
}
