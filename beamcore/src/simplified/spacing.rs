//! One spacing for fasteners whose spacing changes along the member.

use super::warning::Warning;
use crate::check;
use crate::error::{Error, ErrorKind, Problem, Result};
use crate::units::Length;

/// An effective spacing, with what is to be known of it.
#[derive(Clone, Debug, PartialEq)]
pub struct EffectiveSpacing {
    /// `s_ef`.
    pub spacing: Length,
    /// Where it does not hold, or only nearly.
    pub warnings: Vec<Warning>,
}

/// The effective spacing of fasteners that stand closer where the shear force is greater:
/// `s_ef` = 0.75 `s_min` + 0.25 `s_max`, for `s_max` of 4 `s_min` at most; beyond that it is given
/// with a warning.
///
/// Source: EN 1995-1-1:2004 9.1.3 and Annex B (from memory).
///
/// # Errors
/// A spacing that is not positive, a greatest one below the least.
///
/// # Examples
/// ```
/// use beamcore::simplified::{Warning, effective_spacing};
/// use beamcore::units::Number;
/// let found = effective_spacing(100.mm(), 400.mm())?;
/// assert_eq!(found.spacing.to_string(), "175 mm");
/// assert_eq!(found.warnings, [Warning::SteppedSpacing]);
/// # Ok::<(), beamcore::Error>(())
/// ```
pub fn effective_spacing(least: Length, greatest: Length) -> Result<EffectiveSpacing> {
    let mut problems = Vec::new();
    check::positive(&mut problems, least, "least");
    check::positive(&mut problems, greatest, "greatest");
    if problems.is_empty() && greatest < least {
        problems.push(Problem::new(
            ErrorKind::Value,
            "greatest",
            greatest.to_string(),
            format!("a spacing of at least {least}, which is the least one"),
        ));
    }
    Error::check(problems)?;
    let mut warnings = Vec::new();
    if greatest > least {
        warnings.push(Warning::SteppedSpacing);
    }
    if greatest > 4.0 * least {
        warnings.push(Warning::SpacingRatio);
    }
    Ok(EffectiveSpacing {
        spacing: 0.75 * least + 0.25 * greatest,
        warnings,
    })
}
