//! Supports and actions of a job in words, as they were written.

use super::document::{
    ActionDocument, ActionKindDocument, LoadDocument, StrengthDocument, SupportDocument,
    SupportKindDocument,
};

impl SupportDocument {
    /// For example `pin at 0 m (holds deflection and axis)`.
    pub(crate) fn described(&self) -> String {
        let kind = match self.kind {
            SupportKindDocument::Pin => ("pin", "holds deflection and axis"),
            SupportKindDocument::Roller => ("roller", "holds deflection"),
            SupportKindDocument::Fixed => ("fixed", "holds deflection, axis and rotation"),
        };
        format!("{} at {} ({})", kind.0, self.at.text(), kind.1)
    }
}

impl ActionDocument {
    /// For example `permanent; self-weight; 6.4 kN/m over the whole member`.
    pub(crate) fn described(&self) -> String {
        let kind = match self.kind {
            ActionKindDocument::Permanent => "permanent".to_owned(),
            ActionKindDocument::Variable {
                psi_0,
                psi_1,
                psi_2,
            } => {
                format!("variable (psi_0 {psi_0}, psi_1 {psi_1}, psi_2 {psi_2})")
            }
        };
        let loads = self.loads.iter().map(|load| match load {
            LoadDocument::SelfWeight => "self-weight".to_owned(),
            LoadDocument::Uniform { load } => format!("{} over the whole member", load.text()),
            LoadDocument::Partial { load, from, to } => {
                format!("{} from {} to {}", load.text(), from.text(), to.text())
            }
            LoadDocument::Point { load, at } => format!("{} at {}", load.text(), at.text()),
        });
        std::iter::once(kind)
            .chain(loads)
            .collect::<Vec<_>>()
            .join("; ")
    }
}

impl StrengthDocument {
    /// For example `yield 275 MPa`.
    pub(crate) fn described(&self) -> String {
        match self {
            Self::Timber {
                bending,
                tension,
                compression,
            } => format!(
                "bending {}, tension {}, compression {}",
                bending.text(),
                tension.text(),
                compression.text()
            ),
            Self::Metal { yield_stress } => format!("yield {}", yield_stress.text()),
        }
    }
}
