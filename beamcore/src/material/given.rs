//! What a caller gives to a material beside its class or its first values.

use super::factors::Designed;
use super::{CharacteristicStrength, Creep, DesignFactors, DesignStrength, Material};
use crate::units::{Density, Modulus, Stress, ThermalExpansion};

impl Material {
    /// The same material under another name.
    #[must_use]
    pub fn named(mut self, name: impl Into<String>) -> Self {
        self.name = name.into();
        self
    }

    /// The same material with another mean modulus of elasticity E.
    ///
    /// The fractile E_05 and the shear modulus G stay as they are; G follows only where it is
    /// given by Poisson's ratio.
    #[must_use]
    pub fn modulus_override(mut self, modulus: Modulus) -> Self {
        self.values.modulus = modulus;
        self.noted()
    }

    /// The same material with this 5 % fractile of the modulus of elasticity, E_05.
    #[must_use]
    pub fn fractile_modulus(mut self, modulus: Modulus) -> Self {
        self.values.modulus_05 = Some(modulus);
        self.noted()
    }

    /// The same material with this mean shear modulus G.
    ///
    /// It replaces the shear modulus or Poisson's ratio of a class. Beside a given Poisson's ratio
    /// it must agree with E/(2 (1 + nu)) within 1 %.
    #[must_use]
    pub fn shear_modulus(mut self, modulus: Modulus) -> Self {
        self.leave_shear_of_class();
        self.values.shear_modulus = Some(modulus);
        self.noted()
    }

    /// The same material with this Poisson's ratio nu, from 0 to 0.5, so that G = E/(2 (1 + nu)).
    ///
    /// It replaces the shear modulus or Poisson's ratio of a class. It suits isotropic materials
    /// alone: timber is given its shear modulus.
    #[must_use]
    pub fn poisson_ratio(mut self, ratio: f64) -> Self {
        self.leave_shear_of_class();
        self.values.poisson_ratio = Some(ratio);
        self.noted()
    }

    /// The same material with a mean density rho_mean, from which self-weight follows.
    #[must_use]
    pub fn density(mut self, density: Density) -> Self {
        self.values.density = Some(density);
        self.noted()
    }

    /// The same material with this 5 % fractile of the density, rho_k.
    #[must_use]
    pub fn fractile_density(mut self, density: Density) -> Self {
        self.values.density_05 = Some(density);
        self.noted()
    }

    /// The same material with this thermal expansion alpha, positive where warmth lengthens it.
    #[must_use]
    pub fn thermal_expansion(mut self, expansion: ThermalExpansion) -> Self {
        self.values.expansion = Some(expansion);
        self.noted()
    }

    /// The same material with another creep.
    #[must_use]
    pub fn creep_override(mut self, creep: Creep) -> Self {
        self.values.creep = creep;
        self.noted()
    }

    /// The same material with these characteristic strengths.
    ///
    /// No stress is compared with them before [`Material::design_factors`] are given; strengths
    /// of timber or metal that are given here and have neither factors nor design strengths beside
    /// them are refused when the material is used in a section.
    #[must_use]
    pub fn characteristic_strength(mut self, strength: CharacteristicStrength) -> Self {
        self.values.characteristic = Some(strength);
        self.characteristic_given = true;
        self.noted()
    }

    /// The same material with the factors that make design strengths of the characteristic ones.
    ///
    /// # Examples
    /// ```
    /// use beamcore::material::{DesignFactors, DesignStrength, steel_of_thickness};
    /// use beamcore::units::Number;
    /// let plate = steel_of_thickness("S275", 20.mm())?.design_factors(DesignFactors::metal(1.0));
    /// assert_eq!(plate.strength(), Some(&DesignStrength::Metal { yield_stress: 265.MPa() }));
    /// # Ok::<(), beamcore::Error>(())
    /// ```
    #[must_use]
    pub fn design_factors(mut self, factors: DesignFactors) -> Self {
        self.factors = Some(factors);
        self.noted()
    }

    /// The same material with design strengths, against which stresses are compared.
    #[must_use]
    pub fn design_strength(mut self, strength: DesignStrength) -> Self {
        self.strength = Some(strength);
        self
    }

    /// The same material with this design shear strength, as f_v,d of timber.
    #[must_use]
    pub fn shear_strength(mut self, strength: Stress) -> Self {
        self.shear_strength = Some(strength);
        self
    }

    /// Forgets the shear modulus and Poisson's ratio of a class, once one of them is given.
    fn leave_shear_of_class(&mut self) {
        if !self.shear_given {
            self.shear_given = true;
            self.values.shear_modulus = None;
            self.values.poisson_ratio = None;
        }
    }

    /// The same material with what follows from its values brought up to date.
    fn noted(mut self) -> Self {
        if let Some(class) = &self.class {
            self.overrides = self.values.overrides(&class.values);
        }
        self.designed = match (&self.values.characteristic, &self.factors) {
            (Some(strength), Some(factors)) => Designed::of(strength, factors),
            _ => None,
        };
        self
    }
}
