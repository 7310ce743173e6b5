//! Creep as one factor: the share by which strain grows under a lasting stress.

use super::concrete::ConcreteCreep;
use crate::check;
use crate::error::{ErrorKind, Problem, Result};

/// The climate a timber member stands in (EN 1995-1-1:2004, 2.3.1.3).
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub enum ServiceClass {
    /// Heated rooms: moisture of most softwoods not above 12 %.
    One,
    /// Under a roof, unheated: not above 20 %.
    Two,
    /// Outside.
    Three,
}

impl ServiceClass {
    /// The class of a number from 1 to 3.
    ///
    /// # Errors
    /// [`ErrorKind::Value`] for any other number.
    pub fn from_number(number: i64) -> Result<Self> {
        match number {
            1 => Ok(Self::One),
            2 => Ok(Self::Two),
            3 => Ok(Self::Three),
            other => Err(Problem::new(
                ErrorKind::Value,
                "service_class",
                other.to_string(),
                "a service class, which is 1, 2 or 3",
            )
            .into()),
        }
    }

    /// The number of the class, from 1 to 3.
    #[must_use]
    pub const fn number(self) -> i64 {
        match self {
            Self::One => 1,
            Self::Two => 2,
            Self::Three => 3,
        }
    }
}

/// The creep of a material: strain under a lasting stress grows by this factor of itself.
#[derive(Clone, Debug, PartialEq)]
pub struct Creep {
    factor: f64,
    basis: String,
}

impl Creep {
    /// No creep, as for metals at ordinary temperatures.
    #[must_use]
    pub fn none() -> Self {
        Self {
            factor: 0.0,
            basis: "no creep".into(),
        }
    }

    /// A creep factor given as a number: k_def, phi or what the maker states.
    #[must_use]
    pub fn factor(factor: f64) -> Self {
        Self {
            factor,
            basis: "creep factor as given".into(),
        }
    }

    /// k_def of solid and glued laminated timber: 0.60, 0.80, 2.00 in service class 1, 2, 3.
    ///
    /// Source: EN 1995-1-1:2004+A1:2008+A2:2014 Table 3.2, from memory.
    #[must_use]
    pub fn timber(service_class: ServiceClass) -> Self {
        let factor = match service_class {
            ServiceClass::One => 0.60,
            ServiceClass::Two => 0.80,
            ServiceClass::Three => 2.00,
        };
        let basis = format!(
            "k_def in service class {}, EN 1995-1-1:2004+A1:2008+A2:2014 Table 3.2 (from memory)",
            service_class.number()
        );
        Self { factor, basis }
    }

    /// The creep coefficient phi of concrete between two ages.
    ///
    /// Source: EN 1992-1-1:2004 Annex B, from memory; see [`ConcreteCreep::coefficient`].
    ///
    /// # Errors
    /// Where a value of `creep` is out of range.
    pub fn concrete(creep: &ConcreteCreep) -> Result<Self> {
        let basis = format!(
            "phi by EN 1992-1-1:2004 Annex B (from memory), RH {} %, h0 {}, cement class {}, \
             loaded at {}, until {}",
            creep.relative_humidity_percent,
            creep.notional_size,
            creep.cement.letter(),
            creep.age_at_loading,
            creep.age_at_end,
        );
        Ok(Self {
            factor: creep.coefficient()?,
            basis,
        })
    }

    /// The factor.
    #[must_use]
    pub const fn value(&self) -> f64 {
        self.factor
    }

    /// Where the factor comes from.
    #[must_use]
    pub fn basis(&self) -> &str {
        &self.basis
    }

    pub(super) fn check(&self, problems: &mut Vec<Problem>, path: &str) {
        check::between(problems, self.factor, 0.0, 20.0, path);
    }
}
