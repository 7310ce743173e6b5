//! The values of a material, and what of a strength class was overridden.

use super::{CharacteristicStrength, Creep};
use crate::check;
use crate::error::{ErrorKind, Problem};
use crate::path;
use crate::units::{Density, Modulus, ThermalExpansion};
use std::fmt::Display;

/// All values of a material that a strength class can bear.
#[derive(Clone, Debug, PartialEq)]
pub(super) struct Values {
    pub(super) modulus: Modulus,
    pub(super) modulus_05: Option<Modulus>,
    pub(super) shear_modulus: Option<Modulus>,
    pub(super) poisson_ratio: Option<f64>,
    pub(super) density: Option<Density>,
    pub(super) density_05: Option<Density>,
    pub(super) expansion: Option<ThermalExpansion>,
    pub(super) characteristic: Option<CharacteristicStrength>,
    pub(super) creep: Creep,
}

impl Values {
    /// Only the values that every material has.
    pub(super) const fn new(modulus: Modulus, creep: Creep) -> Self {
        Self {
            modulus,
            modulus_05: None,
            shear_modulus: None,
            poisson_ratio: None,
            density: None,
            density_05: None,
            expansion: None,
            characteristic: None,
            creep,
        }
    }

    /// G as given, else E/(2 (1 + nu)).
    pub(super) fn mean_shear_modulus(&self) -> Option<Modulus> {
        self.shear_modulus.or_else(|| self.isotropic_shear())
    }

    /// E/(2 (1 + nu)), where nu is given.
    fn isotropic_shear(&self) -> Option<Modulus> {
        self.poisson_ratio
            .map(|ratio| self.modulus / (2.0 * (1.0 + ratio)))
    }

    /// What differs from the values of the class, one text for each value.
    pub(super) fn overrides(&self, class: &Self) -> Vec<String> {
        let mut texts = Vec::new();
        differ(
            &mut texts,
            "modulus",
            Some(self.modulus),
            Some(class.modulus),
        );
        differ(
            &mut texts,
            "5 % fractile of the modulus",
            self.modulus_05,
            class.modulus_05,
        );
        // A shear modulus that only follows another E by Poisson's ratio is not overridden.
        if (self.shear_modulus, self.poisson_ratio) != (class.shear_modulus, class.poisson_ratio) {
            differ(
                &mut texts,
                "shear modulus",
                self.mean_shear_modulus(),
                class.mean_shear_modulus(),
            );
        }
        differ(&mut texts, "density", self.density, class.density);
        differ(
            &mut texts,
            "5 % fractile of the density",
            self.density_05,
            class.density_05,
        );
        differ(
            &mut texts,
            "thermal expansion",
            self.expansion,
            class.expansion,
        );
        self.other_strengths(class, &mut texts);
        let factor = |values: &Self| Some(values.creep.value());
        differ(&mut texts, "creep factor", factor(self), factor(class));
        texts
    }

    fn other_strengths(&self, class: &Self, texts: &mut Vec<String>) {
        let (Some(own), Some(of_class)) = (&self.characteristic, &class.characteristic) else {
            return;
        };
        if own.stuff() != of_class.stuff() {
            texts.push(format!(
                "strengths of {} instead of those of {}",
                own.stuff(),
                of_class.stuff()
            ));
            return;
        }
        for ((_, name, own), (_, _, of_class)) in own.entries().iter().zip(of_class.entries()) {
            differ(texts, name, *own, of_class);
        }
    }

    /// Everything that is wrong with the values.
    pub(super) fn check(&self, problems: &mut Vec<Problem>, base: &str) {
        let at = |key: &str| path::key(base, key);
        check::positive(problems, self.modulus, &at("modulus"));
        if let Some(modulus) = self.modulus_05 {
            check::positive(problems, modulus, &at("fractile_modulus"));
        }
        if let Some(modulus) = self.shear_modulus {
            check::positive(problems, modulus, &at("shear_modulus"));
        }
        if let Some(ratio) = self.poisson_ratio {
            check::between(problems, ratio, 0.0, 0.5, &at("poisson_ratio"));
        }
        self.check_shear(problems, &at("shear_modulus"));
        if let Some(density) = self.density {
            check::positive(problems, density, &at("density"));
        }
        if let Some(density) = self.density_05 {
            check::positive(problems, density, &at("fractile_density"));
        }
        if let Some(expansion) = self.expansion {
            // Far beyond any stuff of a beam, but short of the 12 /K of a forgotten power of ten.
            if !(-1e-3..=1e-3).contains(&expansion.to_per_K()) {
                problems.push(Problem::new(
                    ErrorKind::Value,
                    at("thermal_expansion"),
                    expansion.to_string(),
                    "a thermal expansion from -1e-3 /K to 1e-3 /K, for example 12e-6 /K",
                ));
            }
        }
        if let Some(strength) = &self.characteristic {
            strength.check(problems, &at("characteristic_strength"));
        }
        self.creep.check(problems, &at("creep_factor"));
    }

    /// A problem if G and E/(2 (1 + nu)) are both given and differ by more than 1 %.
    fn check_shear(&self, problems: &mut Vec<Problem>, path: &str) {
        let (Some(given), Some(ratio)) = (self.shear_modulus, self.poisson_ratio) else {
            return;
        };
        if let Some(isotropic) = self.isotropic_shear()
            && (given - isotropic).abs() > 0.01 * isotropic
        {
            problems.push(Problem::new(
                ErrorKind::Value,
                path,
                format!("{given} beside Poisson's ratio {ratio}"),
                format!("{isotropic}, which is E/(2 (1 + nu)), within 1 %, or only one of the two"),
            ));
        }
    }
}

/// A text where a value of a class was replaced by another.
fn differ<T: PartialEq + Display>(
    texts: &mut Vec<String>,
    name: &str,
    own: Option<T>,
    of_class: Option<T>,
) {
    if let (Some(own), Some(of_class)) = (own, of_class)
        && own != of_class
    {
        texts.push(format!("{name} {own} instead of {of_class}"));
    }
}
