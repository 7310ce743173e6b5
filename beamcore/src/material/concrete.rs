//! Creep, shrinkage and modulus of concrete by EN 1992-1-1:2004; here its creep, Annex B.
//!
//! The formulas bear hidden units: strengths are in MPa, sizes in mm, ages in days.

pub use super::concrete_modulus::{mean_modulus, modulus_at_age, strength_share};
pub use super::shrinkage::ConcreteShrinkage;

use crate::check;
use crate::error::{Error, ErrorKind, Problem, Result};
use crate::math::pow;
use crate::units::{Duration, Length, Stress};

/// How fast the cement hardens.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub enum Cement {
    /// Slow.
    S,
    /// Normal.
    N,
    /// Rapid.
    R,
}

impl Cement {
    /// All classes.
    pub const ALL: [Self; 3] = [Self::S, Self::N, Self::R];

    /// The letter of the class.
    #[must_use]
    pub const fn letter(self) -> &'static str {
        match self {
            Self::S => "S",
            Self::N => "N",
            Self::R => "R",
        }
    }

    /// The class of a letter.
    ///
    /// # Errors
    /// [`ErrorKind::Name`] for any other text.
    pub fn from_letter(letter: &str) -> Result<Self> {
        Self::ALL
            .into_iter()
            .find(|class| class.letter() == letter)
            .ok_or_else(|| {
                Problem::new(
                    ErrorKind::Name,
                    "cement",
                    format!("\"{letter}\""),
                    "one of the cement classes S, N, R",
                )
                .into()
            })
    }

    const fn power(self) -> f64 {
        match self {
            Self::S => -1.0,
            Self::N => 0.0,
            Self::R => 1.0,
        }
    }
}

/// What the creep of a concrete depends on.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct ConcreteCreep {
    /// Mean compressive strength f_cm at 28 days.
    pub mean_strength: Stress,
    /// Relative humidity of the air in percent: 50 means 50 %.
    pub relative_humidity_percent: f64,
    /// Notional size h0 = 2 A_c/u.
    pub notional_size: Length,
    /// Age t0 at which the load comes on.
    pub age_at_loading: Duration,
    /// Age t at which the creep is asked for.
    pub age_at_end: Duration,
    /// Hardening class of the cement.
    pub cement: Cement,
}

impl ConcreteCreep {
    /// The creep coefficient phi(t, t0), to be used with 1.05 E_cm, or with E_cm as in eq. 7.20.
    ///
    /// phi = phi_RH 16.8/sqrt(f_cm) 1/(0.1 + t0^0.2) ((t - t0)/(b_H + t - t0))^0.3, with f_cm in
    /// MPa, h0 in mm and ages in days; t0 is adjusted for the cement.
    /// Source: EN 1992-1-1:2004 eq. B.1 to B.9, from memory.
    ///
    /// # Errors
    /// [`ErrorKind::Value`] where a value is out of range; all of them are reported.
    pub fn coefficient(&self) -> Result<f64> {
        Error::check(self.problems())?;
        let f_cm = self.mean_strength.to_MPa();
        let h0 = self.notional_size.to_mm();
        let dryness = 1.0 - self.relative_humidity_percent / 100.0;
        let (t, t0) = (self.age_at_end.to_d(), self.age_at_loading.to_d());
        let strong = f_cm > 35.0;
        let a = |exponent| {
            if strong {
                pow(35.0 / f_cm, exponent)
            } else {
                1.0
            }
        };
        let phi_rh = (1.0 + a(0.7) * dryness / (0.1 * pow(h0, 1.0 / 3.0))) * a(0.2);
        let adjusted = t0 * pow(9.0 / (2.0 + pow(t0, 1.2)) + 1.0, self.cement.power());
        let b_t0 = 1.0 / (0.1 + pow(adjusted.max(0.5), 0.2));
        let b_fcm = 16.8 / f_cm.sqrt();
        let humid = pow(0.012 * self.relative_humidity_percent, 18.0);
        let b_h = (1.5 * (1.0 + humid) * h0 + 250.0 * a(0.5)).min(1500.0 * a(0.5));
        let growth = pow((t - t0) / (b_h + t - t0), 0.3);
        Ok(phi_rh * b_fcm * b_t0 * growth)
    }

    fn problems(&self) -> Vec<Problem> {
        let mut problems = Vec::new();
        check::positive(&mut problems, self.mean_strength, "mean_strength");
        check::positive(&mut problems, self.notional_size, "notional_size");
        check::positive(&mut problems, self.age_at_loading, "age_at_loading");
        check_humidity(&mut problems, self.relative_humidity_percent);
        check_end(
            &mut problems,
            self.age_at_end,
            self.age_at_loading,
            "loading",
        );
        problems
    }
}

/// A problem unless the relative humidity is a possible one in percent; a share is none.
pub(super) fn check_humidity(problems: &mut Vec<Problem>, percent: f64) {
    if !(2.0..=100.0).contains(&percent) {
        problems.push(Problem::new(
            ErrorKind::Value,
            "relative_humidity_percent",
            percent.to_string(),
            "the relative humidity in percent, from 2 to 100, for example 50",
        ));
    }
}

/// A problem unless the age at the end is finite and not less than that at the `start`.
pub(super) fn check_end(problems: &mut Vec<Problem>, end: Duration, start: Duration, name: &str) {
    if !(end.is_finite() && end >= start) {
        problems.push(Problem::new(
            ErrorKind::Value,
            "age_at_end",
            end.to_string(),
            format!("an age not less than the age at {name}"),
        ));
    }
}

#[cfg(test)]
mod tests {
    use super::*;
    use crate::math::exp;
    use crate::units::Number;

    fn case(f_cm: f64, humidity: f64, h0: f64, t0: f64, t: f64, cement: Cement) -> f64 {
        ConcreteCreep {
            mean_strength: f_cm.MPa(),
            relative_humidity_percent: humidity,
            notional_size: h0.mm(),
            age_at_loading: t0.d(),
            age_at_end: t.d(),
            cement,
        }
        .coefficient()
        .unwrap()
    }

    /// Values computed from the formulas by an independent script.
    #[test]
    fn coefficients_agree_with_an_independent_calculation() {
        let near = |value: f64, expected: f64| {
            assert!((value - expected).abs() <= 0.5e-4, "{value} {expected}");
        };
        near(case(38.0, 50.0, 150.0, 28.0, 18250.0, Cement::N), 2.4542);
        near(case(38.0, 50.0, 150.0, 28.0, 1e12, Cement::N), 2.4728);
        near(case(38.0, 80.0, 200.0, 7.0, 1e12, Cement::R), 2.0303);
        near(case(33.0, 50.0, 240.0, 28.0, 1e12, Cement::N), 2.5778);
    }

    /// The one implementation of powers agrees with the exponential it is made from.
    #[test]
    fn powers_and_exponentials_agree() {
        assert!((pow(exp(1.0), 0.3) - exp(0.3)).abs() < 1e-15);
    }
}
