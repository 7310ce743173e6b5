//! The design strengths of a material, and what is missing or wrong for them.

use super::factors::yield_in_shear;
use super::{CharacteristicStrength, DesignStrength, Material};
use crate::error::{ErrorKind, Problem, Result};
use crate::path;
use crate::units::Stress;

impl Material {
    /// The design strengths, as given or out of the characteristic ones and the design factors;
    /// `None` if there are none.
    #[must_use]
    pub fn strength(&self) -> Option<&DesignStrength> {
        self.strength
            .as_ref()
            .or_else(|| self.designed.as_ref().map(|designed| &designed.strength))
    }

    /// The design shear strength: as given, else out of the characteristic strengths and the design
    /// factors (f_v,d of timber), else f_y,d/sqrt(3) of metal; `None` if there is none.
    ///
    /// Source of f_y,d/sqrt(3): EN 1993-1-1:2005 eq. 6.18, EN 1999-1-1:2007 eq. 6.29, from memory.
    #[must_use]
    pub fn design_shear_strength(&self) -> Option<Stress> {
        self.shear_strength
            .or_else(|| self.designed.as_ref().map(|designed| designed.shear))
            .or_else(|| match self.strength {
                Some(DesignStrength::Metal { yield_stress }) => Some(yield_in_shear(yield_stress)),
                _ => None,
            })
    }

    /// The design strengths, or what is missing for them.
    ///
    /// # Errors
    /// [`ErrorKind::Missing`] at `materials["x"].design_factors` if there are only characteristic
    /// strengths, and at `materials["x"].design_strength` if there are no strengths at all;
    /// [`ErrorKind::Value`] if strengths and factors are of different stuff.
    pub fn design_values(&self) -> Result<DesignStrength> {
        if let Some(strength) = self.strength() {
            return Ok(*strength);
        }
        let base = path::named("materials", &self.name);
        Err(self
            .strength_problem(&base)
            .unwrap_or_else(|| match &self.values.characteristic {
                Some(strength) => no_factors(strength, &base),
                None => Problem::new(
                    ErrorKind::Missing,
                    path::key(&base, "design_strength"),
                    "no strengths",
                    "design strengths, or characteristic strengths with design factors",
                ),
            })
            .into())
    }

    /// What is wrong between characteristic strengths, design factors and design strengths.
    pub(super) fn strength_problem(&self, base: &str) -> Option<Problem> {
        let at = |key: &str| path::key(base, key);
        let Some(factors) = &self.factors else {
            return self
                .values
                .characteristic
                .filter(|strength| {
                    let concrete = matches!(strength, CharacteristicStrength::Concrete(_));
                    self.characteristic_given && self.strength.is_none() && !concrete
                })
                .map(|strength| no_factors(&strength, base));
        };
        if self.strength.is_some() || self.shear_strength.is_some() {
            return Some(Problem::new(
                ErrorKind::Duplicate,
                at("design_factors"),
                "design factors beside design strengths",
                "either design strengths, or characteristic strengths with design factors",
            ));
        }
        match &self.values.characteristic {
            None => Some(Problem::new(
                ErrorKind::Missing,
                at("characteristic_strength"),
                "design factors without characteristic strengths",
                "the characteristic strengths that the factors are for",
            )),
            Some(strength) if strength.stuff() == factors.stuff() => None,
            Some(strength) => Some(Problem::new(
                ErrorKind::Value,
                at("design_factors"),
                format!(
                    "design factors of {} beside characteristic strengths of {}",
                    factors.stuff(),
                    strength.stuff()
                ),
                match strength {
                    CharacteristicStrength::Concrete(_) => {
                        "none, for concrete has no design strengths here"
                    }
                    _ => "factors and strengths of the same stuff",
                },
            )),
        }
    }
}

/// The problem of characteristic strengths that nothing makes design strengths of.
fn no_factors(strength: &CharacteristicStrength, base: &str) -> Problem {
    Problem::new(
        ErrorKind::Missing,
        path::key(base, "design_factors"),
        format!(
            "characteristic strengths of {} without design factors",
            strength.stuff()
        ),
        match strength {
            CharacteristicStrength::Timber(_) => "k_mod and gamma_M, or design strengths",
            CharacteristicStrength::Metal(_) => "gamma_M0 or gamma_M1, or design strengths",
            CharacteristicStrength::Concrete(_) => {
                "no comparison with strengths, for concrete has no design strengths here"
            }
        },
    )
}

#[cfg(test)]
mod tests {
    use super::super::tests::{joist, own, problem};
    use super::super::{DesignFactors, MetalStrength, TimberFactors, steel_of_thickness};
    use super::*;
    use crate::units::Number;

    /// f_d = k_mod k_h k_sys f_k/gamma_M, by hand for C24.
    #[test]
    fn design_strengths_follow_from_characteristic_ones() {
        let factors = TimberFactors::new(0.8, 1.25).size(1.1).sharing(1.05);
        let sized = joist().design_factors(DesignFactors::Timber(factors));
        let Some(DesignStrength::Timber {
            bending,
            tension,
            compression,
        }) = sized.strength()
        else {
            panic!()
        };
        let near = |found: &Stress, expected: f64| {
            assert!(
                (found.to_MPa() - expected).abs() < 1e-9,
                "{found} {expected}"
            );
        };
        near(bending, 17.7408);
        near(tension, 10.7184);
        near(compression, 14.112);
        near(&sized.design_shear_strength().unwrap(), 2.688);
        assert_eq!(sized.problems(), vec![]);

        let plate = steel_of_thickness("S355", 10.mm())
            .unwrap()
            .design_factors(DesignFactors::metal(1.1));
        assert_eq!(
            plate.design_values(),
            Ok(DesignStrength::Metal {
                yield_stress: 355.MPa() / 1.1
            })
        );
        near(&plate.design_shear_strength().unwrap(), 186.326_677_783_924);
    }

    #[test]
    fn characteristic_strengths_are_never_design_strengths() {
        let strength = CharacteristicStrength::Metal(MetalStrength::new(200.MPa()));
        let refused = own().characteristic_strength(strength);
        assert_eq!(refused.strength(), None);
        let expected = (
            ErrorKind::Missing,
            "materials[\"own\"].design_factors".to_owned(),
            "characteristic strengths of metal without design factors".to_owned(),
            "gamma_M0 or gamma_M1, or design strengths".to_owned(),
        );
        assert_eq!(problem(&refused), expected);
        // A class has strengths that nobody asked to compare with, until somebody does.
        assert_eq!((joist().strength(), joist().problems()), (None, vec![]));
        let error = joist().design_values().unwrap_err();
        assert_eq!(
            (error.kind(), error.path()),
            (ErrorKind::Missing, "materials[\"C24\"].design_factors")
        );
        let error = own().design_values().unwrap_err();
        assert_eq!(error.path(), "materials[\"own\"].design_strength");
    }

    #[test]
    fn strengths_and_factors_that_do_not_fit_are_refused() {
        let metal = DesignFactors::metal(1.0);
        let kind_and_path = |material: Material| {
            let (kind, path, ..) = problem(&material);
            (kind, path.rsplit('.').next().unwrap().to_owned())
        };
        let at = |kind, key: &str| (kind, key.to_owned());
        assert_eq!(
            kind_and_path(own().design_factors(metal)),
            at(ErrorKind::Missing, "characteristic_strength")
        );
        let wrong = joist().design_factors(metal);
        assert_eq!(wrong.design_values().unwrap_err().kind(), ErrorKind::Value);
        assert_eq!(kind_and_path(wrong), at(ErrorKind::Value, "design_factors"));
        let twice = joist()
            .design_factors(DesignFactors::timber(0.8, 1.3))
            .shear_strength(2.MPa());
        assert_eq!(
            kind_and_path(twice),
            at(ErrorKind::Duplicate, "design_factors")
        );
        for (factors, key) in [
            (TimberFactors::new(8.0, 1.3), "k_mod"),
            (TimberFactors::new(0.8, 0.0), "gamma_m"),
            (TimberFactors::new(0.8, 1.3).size(f64::NAN), "k_h"),
            (TimberFactors::new(0.8, 1.3).sharing(0.9), "k_sys"),
        ] {
            let factors = DesignFactors::Timber(factors);
            assert_eq!(
                kind_and_path(joist().design_factors(factors)),
                at(ErrorKind::Value, key)
            );
        }
        assert_eq!(
            kind_and_path(joist().shear_strength((-2).MPa())),
            at(ErrorKind::Value, "shear_strength")
        );
        let strength = MetalStrength::new(0.MPa());
        let metal = own()
            .characteristic_strength(CharacteristicStrength::Metal(strength))
            .design_factors(DesignFactors::metal(1.0));
        assert_eq!(kind_and_path(metal), at(ErrorKind::Value, "yield"));
    }

    #[test]
    fn design_shear_strength_of_given_strengths() {
        let plate = own().design_strength(DesignStrength::Metal {
            yield_stress: 300.MPa(),
        });
        let found = plate.design_shear_strength().unwrap().to_MPa();
        assert!((found - 173.205_080_756_9).abs() < 1e-9);
        assert_eq!(
            joist().shear_strength(2.5.MPa()).design_shear_strength(),
            Some(2.5.MPa())
        );
        assert_eq!(joist().design_shear_strength(), None);
    }
}
