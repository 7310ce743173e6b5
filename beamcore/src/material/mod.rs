//! Materials: elastic values, density, creep, thermal expansion and strengths.
//!
//! A material is given by its values, or by a strength class with its standard and edition.
//! Every value of a class can be overridden, and the material remembers what was.

mod characteristic;
mod classes;
mod classes_aluminium;
mod classes_concrete;
mod classes_glulam;
mod classes_steel;
mod classes_timber;
pub mod concrete;
mod concrete_modulus;
mod creep;
mod design;
mod factors;
mod given;
#[cfg(test)]
mod relations;
mod shrinkage;
mod strength;
#[cfg(test)]
mod tests;
mod values;

pub use characteristic::{CharacteristicStrength, ConcreteStrength, MetalStrength, TimberStrength};
pub use classes::{aluminium, concrete, steel, steel_of_thickness, timber};
pub use creep::{Creep, ServiceClass};
pub use factors::{DesignFactors, TimberFactors};
pub use strength::DesignStrength;

use crate::check;
use crate::error::Problem;
use crate::path;
use crate::time::Time;
use crate::units::{Density, Modulus, Stress, ThermalExpansion};
use factors::Designed;
use values::Values;

/// Elastic values of one stuff, with its density, creep, thermal expansion and strengths.
///
/// # Examples
/// ```
/// use beamcore::material::{Creep, Material};
/// use beamcore::time::Time;
/// use beamcore::units::Number;
/// let oak = Material::new("old oak", 9.5.GPa(), Creep::factor(0.6)).density(690.kg_per_m3());
/// assert_eq!(oak.modulus_at(Time::Final).to_GPa(), 9.5 / 1.6);
/// ```
///
/// A class with one value of its own and design strengths made from those of the class:
/// ```
/// use beamcore::material::{DesignFactors, DesignStrength, ServiceClass, timber};
/// use beamcore::units::Number;
/// let joist = timber("C24", ServiceClass::One)?
///     .density(450.kg_per_m3())
///     .design_factors(DesignFactors::timber(0.8, 1.3));
/// assert_eq!(joist.overrides(), ["density 450 kg/m3 instead of 420 kg/m3"]);
/// let Some(DesignStrength::Timber { bending, .. }) = joist.strength() else { unreachable!() };
/// assert_eq!(format!("{bending:.2}"), "14.77 MPa"); // 0.8 * 24/1.3
/// # Ok::<(), beamcore::Error>(())
/// ```
#[derive(Clone, Debug, PartialEq)]
pub struct Material {
    name: String,
    values: Values,
    class: Option<Box<Class>>,
    overrides: Vec<String>,
    /// Whether the caller gave G or Poisson's ratio, and not the class.
    shear_given: bool,
    /// Whether the caller gave characteristic strengths, and not the class.
    characteristic_given: bool,
    factors: Option<DesignFactors>,
    /// Design strengths as given.
    strength: Option<DesignStrength>,
    /// Design shear strength as given.
    shear_strength: Option<Stress>,
    /// Design strengths out of characteristic ones.
    designed: Option<Designed>,
}

/// The strength class of a material, with the values it came with.
#[derive(Clone, Debug, PartialEq)]
struct Class {
    origin: String,
    expansion_origin: &'static str,
    values: Values,
}

impl Material {
    /// A material by its values: name, modulus of elasticity E and creep.
    ///
    /// The values are checked when the material is used in a section.
    pub fn new(name: impl Into<String>, modulus: Modulus, creep: Creep) -> Self {
        Self::of_values(name.into(), Values::new(modulus, creep))
    }

    fn of_values(name: String, values: Values) -> Self {
        Self {
            name,
            values,
            class: None,
            overrides: Vec::new(),
            shear_given: false,
            characteristic_given: false,
            factors: None,
            strength: None,
            shear_strength: None,
            designed: None,
        }
    }

    /// A material of a strength class, with notes on where its values come from.
    fn of_class(
        name: &str,
        values: Values,
        origin: String,
        expansion_origin: &'static str,
    ) -> Self {
        let class = Class {
            origin,
            expansion_origin,
            values: values.clone(),
        };
        Self {
            class: Some(Box::new(class)),
            ..Self::of_values(name.to_owned(), values)
        }
    }

    /// The name, by which results and errors speak of the material.
    #[must_use]
    pub fn name(&self) -> &str {
        &self.name
    }

    /// The short-term modulus of elasticity E: the mean one, of timber along the grain.
    #[must_use]
    pub const fn modulus(&self) -> Modulus {
        self.values.modulus
    }

    /// The modulus at a time: E on the first day, E/(1 + creep factor) at the end.
    ///
    /// Source: effective modulus, EN 1995-1-1:2004 eq. 2.7 (k_def), EN 1992-1-1:2004 eq. 7.20
    /// (phi), from memory.
    #[must_use]
    pub fn modulus_at(&self, time: Time) -> Modulus {
        self.lasting(self.values.modulus, time)
    }

    /// A modulus as it is at a time.
    fn lasting(&self, modulus: Modulus, time: Time) -> Modulus {
        match time {
            Time::Initial => modulus,
            Time::Final => modulus / (1.0 + self.values.creep.value()),
        }
    }

    /// The 5 % fractile of the modulus of elasticity, E_05, if it is known.
    #[must_use]
    pub const fn modulus_05(&self) -> Option<Modulus> {
        self.values.modulus_05
    }

    /// The short-term mean shear modulus: G as given, else E/(2 (1 + nu)); `None` if neither G nor
    /// Poisson's ratio is known.
    #[must_use]
    pub fn mean_shear_modulus(&self) -> Option<Modulus> {
        self.values.mean_shear_modulus()
    }

    /// The shear modulus at a time: G on the first day, G/(1 + creep factor) at the end.
    ///
    /// Source: EN 1995-1-1:2004 eq. 2.8, from memory; for other materials Poisson's ratio is taken
    /// not to change with time (common practice, no source).
    #[must_use]
    pub fn shear_modulus_at(&self, time: Time) -> Option<Modulus> {
        self.mean_shear_modulus()
            .map(|modulus| self.lasting(modulus, time))
    }

    /// Poisson's ratio nu, if it is given.
    #[must_use]
    pub const fn poisson(&self) -> Option<f64> {
        self.values.poisson_ratio
    }

    /// The mean density rho_mean, if it is known.
    #[must_use]
    pub const fn mean_density(&self) -> Option<Density> {
        self.values.density
    }

    /// The 5 % fractile of the density, rho_k, if it is known.
    #[must_use]
    pub const fn density_05(&self) -> Option<Density> {
        self.values.density_05
    }

    /// The thermal expansion alpha, if it is known.
    #[must_use]
    pub const fn expansion(&self) -> Option<ThermalExpansion> {
        self.values.expansion
    }

    /// Where the thermal expansion of a class comes from, which is often not the standard of the
    /// class; `None` if it was given or is not known.
    #[must_use]
    pub fn expansion_origin(&self) -> Option<&str> {
        self.class
            .as_ref()
            .filter(|class| class.values.expansion == self.values.expansion)
            .map(|class| class.expansion_origin)
    }

    /// The creep.
    #[must_use]
    pub const fn creep(&self) -> &Creep {
        &self.values.creep
    }

    /// The characteristic strengths, if they are known.
    #[must_use]
    pub const fn characteristic(&self) -> Option<&CharacteristicStrength> {
        self.values.characteristic.as_ref()
    }

    /// The factors from characteristic to design strengths, if they are given.
    #[must_use]
    pub const fn factors(&self) -> Option<&DesignFactors> {
        self.factors.as_ref()
    }

    /// The standard, edition and class that the values come from, if they were not given one by
    /// one. What was given nevertheless is in [`Material::overrides`].
    #[must_use]
    pub fn origin(&self) -> Option<&str> {
        self.class.as_ref().map(|class| class.origin.as_str())
    }

    /// The values of the class that were overridden, one text for each, as in
    /// `density 450 kg/m3 instead of 420 kg/m3`; empty without a class.
    #[must_use]
    pub fn overrides(&self) -> &[String] {
        &self.overrides
    }

    /// Everything that is wrong with the values.
    pub(crate) fn problems(&self) -> Vec<Problem> {
        let mut problems = Vec::new();
        check::name(&mut problems, &self.name, "materials");
        let base = path::named("materials", &self.name);
        self.values.check(&mut problems, &base);
        if let Some(strength) = &self.strength {
            strength.check(&mut problems, &path::key(&base, "design_strength"));
        }
        if let Some(strength) = self.shear_strength {
            check::positive(&mut problems, strength, &path::key(&base, "shear_strength"));
        }
        if let Some(factors) = &self.factors {
            factors.check(&mut problems, &path::key(&base, "design_factors"));
        }
        problems.extend(self.strength_problem(&base));
        problems
    }
}
