//! Supports, changes, hinges, anchors and actions of a job in words, as they were written.

use super::document_action::{ActionDocument, ActionKindDocument};
use super::document_load::LoadDocument;
use super::document_member::{
    AnchorDocument, ChangeDocument, HingeDocument, MemberDocument, SupportDocument,
    SupportKindDocument,
};
use super::written::Written;

impl MemberDocument {
    /// The pitch as it was written, for example `20 deg`.
    pub(crate) fn pitch(&self) -> Option<&str> {
        self.pitch.as_ref().map(Written::text)
    }
}

impl SupportDocument {
    /// For example `pin at 0 m (holds deflection and axis)`.
    pub(crate) fn described(&self) -> String {
        let kind = match self.kind {
            SupportKindDocument::Pin => ("pin", "holds deflection and axis"),
            SupportKindDocument::Roller => ("roller", "holds deflection"),
            SupportKindDocument::Fixed => ("fixed", "holds deflection, axis and rotation"),
        };
        let mut text = format!("{} at {} ({})", kind.0, self.at.text(), kind.1);
        let mut add = |more: String| {
            text.push_str("; ");
            text.push_str(&more);
        };
        if let Some(spring) = &self.spring {
            add(format!("on a spring of {}", spring.text()));
        }
        if let Some(spring) = &self.axial_spring {
            add(format!("spring along the axis {}", spring.text()));
        }
        if let Some(spring) = &self.rotational_spring {
            add(format!("spring against rotation {}", spring.text()));
        }
        if self.one_way {
            add("the member may lift off".into());
        }
        if let Some(height) = &self.height {
            add(format!("axis held at z = {}", height.text()));
        }
        if !self.under.is_empty() {
            add(format!("under {} only", quoted(&self.under)));
        }
        for hold in &self.holding {
            add(format!(
                "holds \"{}\" along the member at z = {}",
                hold.layer,
                hold.height.text()
            ));
        }
        text
    }
}

/// Names in quotation marks, one after the other.
pub(super) fn quoted(names: &[String]) -> String {
    let quoted: Vec<_> = names.iter().map(|name| format!("\"{name}\"")).collect();
    quoted.join(", ")
}

impl ChangeDocument {
    /// The name of the section after it.
    pub(crate) fn section(&self) -> &str {
        match self {
            Self::Step { section, .. } | Self::Taper { section, .. } => section,
        }
    }

    /// For example `step at 2 m to the section "deep"`.
    pub(crate) fn described(&self) -> String {
        match self {
            Self::Step { at, section } => {
                format!("step at {} to the section \"{section}\"", at.text())
            }
            Self::Taper { from, to, section } => format!(
                "taper from {} to {}, to the section \"{section}\"",
                from.text(),
                to.text()
            ),
        }
    }
}

impl HingeDocument {
    /// For example `no moment passes at 2 m`.
    pub(crate) fn described(&self) -> String {
        match self {
            Self::Moment { at, layer: None } => format!("no moment passes at {}", at.text()),
            Self::Moment {
                at,
                layer: Some(layer),
            } => format!("no moment of \"{layer}\" passes at {}", at.text()),
            Self::Shear { at } => format!("no shear force passes at {}", at.text()),
            Self::Butt { at, layer } => {
                format!("no axial force of \"{layer}\" passes at {}", at.text())
            }
        }
    }
}

impl AnchorDocument {
    /// For example `stops the slip of "screws" at 0 m`.
    pub(crate) fn described(&self) -> String {
        let at = format!("the slip of \"{}\" at {}", self.joint, self.at.text());
        match &self.stiffness {
            None => format!("stops {at}"),
            Some(stiffness) => format!("{} against {at}", stiffness.text()),
        }
    }
}

impl ActionDocument {
    /// For example `permanent; self-weight; 6.4 kN/m over the whole member`.
    pub(crate) fn described(&self) -> String {
        let kind = match &self.kind {
            ActionKindDocument::Permanent => "permanent".to_owned(),
            ActionKindDocument::Variable {
                category,
                psi_0,
                psi_1,
                psi_2,
            } => {
                let psi = [("psi_0", psi_0), ("psi_1", psi_1), ("psi_2", psi_2)];
                let given = psi
                    .iter()
                    .filter_map(|(name, value)| value.map(|value| format!("{name} {value}")));
                let category = category.iter().map(|name| format!("category {name}"));
                format!(
                    "variable ({})",
                    category.chain(given).collect::<Vec<_>>().join(", ")
                )
            }
        };
        let effect = self.favourable.then(|| "favourable".to_owned());
        let on = self.on.iter().map(|layer| format!("on \"{layer}\""));
        let loads = self.loads.iter().map(LoadDocument::described);
        std::iter::once(kind)
            .chain(effect)
            .chain(on)
            .chain(loads)
            .collect::<Vec<_>>()
            .join("; ")
    }
}
