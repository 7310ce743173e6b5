//! Supports, changes of section, hinges and anchors of the document.

use super::document_member::{
    AnchorDocument, ChangeDocument, HingeDocument, MemberDocument, ShearDocument, SidewaysDocument,
    SupportDocument, SupportKindDocument,
};
use super::lower_section::NamedSection;
use super::written::Written;
use crate::error::{ErrorKind, Problem};
use crate::lookup;
use crate::member::{Anchor, Hinge, SectionChange, ShearModel, Support, SupportKind};
use crate::path;
use crate::section::{Section, Sideways};
use crate::units::Quantity;

/// A support, if all its quantities are known.
pub(super) fn support(document: &SupportDocument) -> Option<Support> {
    let kind = match document.kind {
        SupportKindDocument::Pin => SupportKind::Pin,
        SupportKindDocument::Roller => SupportKind::Roller,
        SupportKindDocument::Fixed => SupportKind::Fixed,
    };
    let mut support = Support::new(&document.name, kind, document.at.value()?);
    if let Some(spring) = known(document.spring.as_ref())? {
        support = support.spring(spring);
    }
    if let Some(spring) = known(document.axial_spring.as_ref())? {
        support = support.axial_spring(spring);
    }
    if let Some(spring) = known(document.rotational_spring.as_ref())? {
        support = support.rotational_spring(spring);
    }
    if let Some(height) = known(document.height.as_ref())? {
        support = support.at_height(height);
    }
    if document.one_way {
        support = support.one_way();
    }
    support = support.under(&document.under);
    for hold in &document.holding {
        support = support.holding(&hold.layer, hold.height.value()?);
    }
    Some(support)
}

/// The outer `None` stands for a text that cannot be read, the inner one for none given.
#[expect(
    clippy::option_option,
    reason = "given or not, and readable or not, are two things"
)]
pub(super) fn known<Q: Quantity>(written: Option<&Written<Q>>) -> Option<Option<Q>> {
    match written {
        None => Some(None),
        Some(written) => written.value().map(Some),
    }
}

/// The changes of section, if all are known. A name that no section bears is a problem.
pub(super) fn changes(
    documents: &[ChangeDocument],
    sections: &[NamedSection],
    problems: &mut Vec<Problem>,
) -> Option<Vec<SectionChange>> {
    let mut lowered = Vec::new();
    let mut complete = true;
    for (i, document) in documents.iter().enumerate() {
        let base = path::indexed("member.changes", i);
        match change(document, sections, &base, problems) {
            Some(change) => lowered.push(change),
            None => complete = false,
        }
    }
    complete.then_some(lowered)
}

fn change(
    document: &ChangeDocument,
    sections: &[NamedSection],
    base: &str,
    problems: &mut Vec<Problem>,
) -> Option<SectionChange> {
    let mut named = |name: &str, kind: &str| -> Option<Section> {
        if let Some((_, section)) = sections.iter().find(|known| known.0 == name) {
            return section.clone();
        }
        let names: Vec<_> = sections.iter().map(|known| known.0.as_str()).collect();
        problems.push(Problem::new(
            ErrorKind::Name,
            path::key(&path::key(base, kind), "section"),
            format!("the unknown section \"{name}\""),
            format!("one of the sections {}", lookup::listed(&names)),
        ));
        None
    };
    match document {
        ChangeDocument::Step { at, section } => {
            let section = named(section, "step");
            Some(SectionChange::Step {
                at: at.value()?,
                section: section?,
            })
        }
        ChangeDocument::Taper { from, to, section } => {
            let section = named(section, "taper");
            Some(SectionChange::Taper {
                from: from.value()?,
                to: to.value()?,
                section: section?,
            })
        }
    }
}

/// The hinges, if all are known.
pub(super) fn hinges(documents: &[HingeDocument]) -> Option<Vec<Hinge>> {
    let hinge = |document: &HingeDocument| {
        Some(match document {
            HingeDocument::Moment { at, layer: None } => Hinge::moment(at.value()?),
            HingeDocument::Moment {
                at,
                layer: Some(layer),
            } => Hinge::moment_of(layer, at.value()?),
            HingeDocument::Shear { at } => Hinge::shear(at.value()?),
            HingeDocument::Butt { at, layer } => Hinge::butt(layer, at.value()?),
        })
    };
    documents.iter().map(hinge).collect()
}

/// The anchors, if all are known.
pub(super) fn anchors(documents: &[AnchorDocument]) -> Option<Vec<Anchor>> {
    let anchor = |document: &AnchorDocument| {
        Some(Anchor {
            name: document.name.clone(),
            joint: document.joint.clone(),
            at: document.at.value()?,
            stiffness: known(document.stiffness.as_ref())?,
        })
    };
    documents.iter().map(anchor).collect()
}

/// How shear deformation is taken, if it is known.
pub(super) fn shear(document: &MemberDocument) -> Option<ShearModel> {
    Some(match &document.shear {
        None | Some(ShearDocument::Rigid) => ShearModel::Rigid,
        Some(ShearDocument::Flexible) => ShearModel::Flexible,
        Some(ShearDocument::Given { stiffness }) => ShearModel::Given(stiffness.value()?),
    })
}

/// Whether the member is held sideways.
pub(super) const fn sideways(document: &MemberDocument) -> Sideways {
    match document.sideways {
        None | Some(SidewaysDocument::Held) => Sideways::Held,
        Some(SidewaysDocument::Free) => Sideways::Free,
    }
}
