//! Supports and actions of a job in words, as they were written.

use super::document::{SupportDocument, SupportKindDocument};
use super::document_action::{ActionDocument, ActionKindDocument, LoadDocument};

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
        let loads = self.loads.iter().map(LoadDocument::described);
        std::iter::once(kind)
            .chain(effect)
            .chain(loads)
            .collect::<Vec<_>>()
            .join("; ")
    }
}

impl LoadDocument {
    /// For example `2.4 kN/m from 1.1 m to 5.3 m`.
    fn described(&self) -> String {
        match self {
            Self::SelfWeight => "self-weight".to_owned(),
            Self::Uniform { load } => format!("{} over the whole member", load.text()),
            Self::Partial { load, from, to } => {
                format!("{} from {} to {}", load.text(), from.text(), to.text())
            }
            Self::Trapezoidal {
                load_from,
                load_to,
                from,
                to,
            } => format!(
                "{} at {} to {} at {}",
                load_from.text(),
                from.text(),
                load_to.text(),
                to.text()
            ),
            Self::Area {
                load,
                tributary_width,
                from,
                to,
            } => {
                let stretch = match (from, to) {
                    (Some(from), Some(to)) => format!("from {} to {}", from.text(), to.text()),
                    _ => "over the whole member".to_owned(),
                };
                format!(
                    "{} on {} width {stretch}",
                    load.text(),
                    tributary_width.text()
                )
            }
            Self::Point { load, at } => format!("{} at {}", load.text(), at.text()),
            Self::Couple { couple, at } => format!("couple {} at {}", couple.text(), at.text()),
        }
    }
}
