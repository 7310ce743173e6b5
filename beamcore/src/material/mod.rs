//! Materials: elastic values, density, creep and design strengths.

mod classes;
pub mod concrete;
mod concrete_modulus;
mod creep;
mod shrinkage;
mod strength;

pub use classes::{concrete, steel, timber};
pub use creep::{Creep, ServiceClass};
pub use strength::DesignStrength;

use crate::check;
use crate::error::Problem;
use crate::path;
use crate::time::Time;
use crate::units::{Density, Modulus};

/// Elastic values of one stuff, with its density, creep and design strengths.
///
/// # Examples
/// ```
/// use beamcore::material::{Creep, Material};
/// use beamcore::time::Time;
/// use beamcore::units::Number;
/// let oak = Material::new("old oak", 9.5.GPa(), Creep::factor(0.6)).density(690.kg_per_m3());
/// assert_eq!(oak.modulus_at(Time::Final).to_GPa(), 9.5 / 1.6);
/// ```
#[derive(Clone, Debug, PartialEq)]
pub struct Material {
    name: String,
    modulus: Modulus,
    density: Option<Density>,
    creep: Creep,
    strength: Option<DesignStrength>,
    origin: Option<String>,
}

impl Material {
    /// A material by its values: name, modulus of elasticity E and creep.
    ///
    /// The values are checked when the material is used in a section.
    pub fn new(name: impl Into<String>, modulus: Modulus, creep: Creep) -> Self {
        Self {
            name: name.into(),
            modulus,
            density: None,
            creep,
            strength: None,
            origin: None,
        }
    }

    /// The same material under another name.
    #[must_use]
    pub fn named(mut self, name: impl Into<String>) -> Self {
        self.name = name.into();
        self
    }

    /// The same material with a mean density, from which self-weight follows.
    #[must_use]
    pub fn density(mut self, density: Density) -> Self {
        self.density = Some(density);
        self
    }

    /// The same material with design strengths, against which stresses are compared.
    #[must_use]
    pub fn design_strength(mut self, strength: DesignStrength) -> Self {
        self.strength = Some(strength);
        self
    }

    /// The same material with a note on where its values come from.
    fn of_class(mut self, origin: String) -> Self {
        self.origin = Some(origin);
        self
    }

    /// The name, by which results and errors speak of the material.
    #[must_use]
    pub fn name(&self) -> &str {
        &self.name
    }

    /// The short-term modulus of elasticity E.
    #[must_use]
    pub const fn modulus(&self) -> Modulus {
        self.modulus
    }

    /// The modulus at a time: E on the first day, E/(1 + creep factor) at the end.
    ///
    /// Source: effective modulus, EN 1995-1-1:2004 eq. 2.7 (k_def), EN 1992-1-1:2004 eq. 7.20
    /// (phi), from memory.
    #[must_use]
    pub fn modulus_at(&self, time: Time) -> Modulus {
        match time {
            Time::Initial => self.modulus,
            Time::Final => self.modulus / (1.0 + self.creep.value()),
        }
    }

    /// The mean density, if it is known.
    #[must_use]
    pub const fn mean_density(&self) -> Option<Density> {
        self.density
    }

    /// The creep.
    #[must_use]
    pub const fn creep(&self) -> &Creep {
        &self.creep
    }

    /// The design strengths, if they are given.
    #[must_use]
    pub const fn strength(&self) -> Option<&DesignStrength> {
        self.strength.as_ref()
    }

    /// The standard, edition and class that the values come from, if they were not given one by one.
    #[must_use]
    pub fn origin(&self) -> Option<&str> {
        self.origin.as_deref()
    }

    /// Everything that is wrong with the values.
    pub(crate) fn problems(&self) -> Vec<Problem> {
        let mut problems = Vec::new();
        check::name(&mut problems, &self.name, "materials");
        let base = path::named("materials", &self.name);
        check::positive(&mut problems, self.modulus, &path::key(&base, "modulus"));
        if let Some(density) = self.density {
            check::positive(&mut problems, density, &path::key(&base, "density"));
        }
        self.creep
            .check(&mut problems, &path::key(&base, "creep_factor"));
        if let Some(strength) = &self.strength {
            strength.check(&mut problems, &path::key(&base, "design_strength"));
        }
        problems
    }
}
