//! Shrinkage of concrete by EN 1992-1-1:2004 3.1.4 and Annex B.
//!
//! The formulas bear hidden units: strengths are in MPa, sizes in mm, ages in days.

use super::concrete::{Cement, check_end, check_humidity};
use crate::check;
use crate::error::{Error, ErrorKind, Problem, Result};
use crate::math::exp;
use crate::units::{Duration, Length, Strain, Stress};

/// What the shrinkage of a concrete depends on. Shrinkage is a positive strain that shortens.
///
/// # Examples
/// ```
/// use beamcore::material::concrete::{Cement, ConcreteShrinkage};
/// use beamcore::units::Number;
/// let slab = ConcreteShrinkage {
///     mean_strength: 38.MPa(),
///     relative_humidity_percent: 50.0,
///     notional_size: 150.mm(),
///     age_at_drying: 3.d(),
///     age_at_end: 50.year(),
///     cement: Cement::N,
/// };
/// assert_eq!(format!("{:.2}", slab.total()?), "0.49 permille");
/// # Ok::<(), beamcore::Error>(())
/// ```
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct ConcreteShrinkage {
    /// Mean compressive strength f_cm at 28 days, at least 18 MPa; f_ck = f_cm - 8 MPa.
    pub mean_strength: Stress,
    /// Relative humidity of the air in percent: 50 means 50 %.
    pub relative_humidity_percent: f64,
    /// Notional size h0 = 2 A_c/u.
    pub notional_size: Length,
    /// Age t_s at which drying begins, commonly the end of curing.
    pub age_at_drying: Duration,
    /// Age t at which the shrinkage is asked for.
    pub age_at_end: Duration,
    /// Hardening class of the cement.
    pub cement: Cement,
}

impl ConcreteShrinkage {
    /// The basic drying shrinkage, eps_cd,0 = 0.85 (220 + 110 a_ds1) exp(-a_ds2 f_cm/10) 1e-6
    /// 1.55 (1 - (RH/100)^3), a_ds1 = 3, 4, 6 and a_ds2 = 0.13, 0.12, 0.11 for the cements S, N, R.
    ///
    /// Source: EN 1992-1-1:2004 eq. B.11, B.12, from memory.
    ///
    /// # Errors
    /// [`ErrorKind::Value`] where a value is out of range; all of them are reported.
    pub fn basic_drying(&self) -> Result<Strain> {
        Error::check(self.problems())?;
        let (ds1, ds2) = match self.cement {
            Cement::S => (3.0, 0.13),
            Cement::N => (4.0, 0.12),
            Cement::R => (6.0, 0.11),
        };
        let humidity = self.relative_humidity_percent / 100.0;
        let dryness = 1.55 * (1.0 - humidity * humidity * humidity);
        let strong = exp(-ds2 * self.mean_strength.to_MPa() / 10.0);
        Ok(Strain::from_ratio(
            0.85 * (220.0 + 110.0 * ds1) * strong * dryness / 1e6,
        ))
    }

    /// The drying shrinkage at the end, eps_cd = b_ds k_h eps_cd,0, with
    /// b_ds = (t - t_s)/(t - t_s + 0.04 h0^1.5) and k_h = 1.0, 0.85, 0.75, 0.70 at h0 = 100, 200,
    /// 300, 500 mm and more, straight in between; below 100 mm, where the table ends, k_h stays at
    /// 1.0 (common practice, no source).
    ///
    /// Source: EN 1992-1-1:2004 eq. 3.9, 3.10, Table 3.3, from memory.
    ///
    /// # Errors
    /// As for [`ConcreteShrinkage::basic_drying`].
    pub fn drying(&self) -> Result<Strain> {
        let basic = self.basic_drying()?;
        let h0 = self.notional_size.to_mm();
        let dried = self.age_at_end.to_d() - self.age_at_drying.to_d();
        let growth = dried / (dried + 0.04 * h0 * h0.sqrt());
        Ok(growth * k_h(h0) * basic)
    }

    /// The autogenous shrinkage at the end, eps_ca = 2.5 (f_ck - 10) 1e-6 (1 - exp(-0.2 sqrt(t))).
    ///
    /// Source: EN 1992-1-1:2004 eq. 3.11 to 3.13, from memory.
    ///
    /// # Errors
    /// As for [`ConcreteShrinkage::basic_drying`].
    pub fn autogenous(&self) -> Result<Strain> {
        Error::check(self.problems())?;
        let f_ck = self.mean_strength.to_MPa() - 8.0;
        let growth = 1.0 - exp(-0.2 * self.age_at_end.to_d().sqrt());
        Ok(Strain::from_ratio(2.5 * (f_ck - 10.0) * growth / 1e6))
    }

    /// The whole shrinkage at the end, drying and autogenous, eps_cs = eps_cd + eps_ca.
    ///
    /// Source: EN 1992-1-1:2004 eq. 3.8, from memory.
    ///
    /// # Errors
    /// As for [`ConcreteShrinkage::basic_drying`].
    pub fn total(&self) -> Result<Strain> {
        Ok(self.drying()? + self.autogenous()?)
    }

    fn problems(&self) -> Vec<Problem> {
        let mut problems = Vec::new();
        if !(self.mean_strength.is_finite() && self.mean_strength.to_MPa() >= 18.0) {
            problems.push(Problem::new(
                ErrorKind::Value,
                "mean_strength",
                self.mean_strength.to_string(),
                "a mean strength of at least 18 MPa, below which the formula makes concrete swell",
            ));
        }
        check_humidity(&mut problems, self.relative_humidity_percent);
        check::positive(&mut problems, self.notional_size, "notional_size");
        check::positive(&mut problems, self.age_at_drying, "age_at_drying");
        check_end(
            &mut problems,
            self.age_at_end,
            self.age_at_drying,
            "the start of drying",
        );
        problems
    }
}

/// The factor of the notional size h0 in mm.
fn k_h(h0: f64) -> f64 {
    const TABLE: [(f64, f64); 4] = [(100.0, 1.0), (200.0, 0.85), (300.0, 0.75), (500.0, 0.70)];
    if h0 <= 100.0 {
        return 1.0;
    }
    TABLE
        .windows(2)
        .find(|pair| h0 <= pair[1].0)
        .map_or(0.70, |pair| {
            let ((h_a, k_a), (h_b, k_b)) = (pair[0], pair[1]);
            k_a + (k_b - k_a) * (h0 - h_a) / (h_b - h_a)
        })
}

#[cfg(test)]
mod tests {
    use super::*;
    use crate::units::Number;

    fn concrete(f_cm: f64, humidity: f64, h0: f64) -> ConcreteShrinkage {
        ConcreteShrinkage {
            mean_strength: f_cm.MPa(),
            relative_humidity_percent: humidity,
            notional_size: h0.mm(),
            age_at_drying: 3.d(),
            age_at_end: 1e12.d(),
            cement: Cement::N,
        }
    }

    /// EN 1992-1-1:2004 Table 3.2 in permille, from memory, printed with two decimals: within half
    /// of the last one.
    #[test]
    fn basic_drying_is_that_of_the_table() {
        let humidities = [20.0, 40.0, 60.0, 80.0, 90.0];
        let table = [
            (20.0, [0.62, 0.58, 0.49, 0.30, 0.17]),
            (40.0, [0.48, 0.46, 0.38, 0.24, 0.13]),
            (60.0, [0.38, 0.36, 0.30, 0.19, 0.10]),
            (80.0, [0.30, 0.28, 0.24, 0.15, 0.08]),
        ];
        for (f_ck, row) in table {
            for (humidity, expected) in humidities.into_iter().zip(row) {
                let found = concrete(f_ck + 8.0, humidity, 100.0)
                    .basic_drying()
                    .unwrap();
                let error = (found.to_permille() - expected).abs();
                assert!(error <= 0.005, "C{f_ck} at {humidity} %: {found}");
            }
        }
        let wet = concrete(28.0, 100.0, 100.0);
        assert_eq!(wet.basic_drying().unwrap(), Strain::ZERO);
    }

    /// Values computed from the formulas by an independent script.
    #[test]
    fn agrees_with_an_independent_calculation() {
        let near = |found: Result<Strain>, expected: f64| {
            let found = found.unwrap().to_permille();
            assert!((found - expected).abs() <= 0.5e-4, "{found} {expected}");
        };
        let slab = concrete(38.0, 50.0, 150.0);
        near(slab.basic_drying(), 0.4822);
        near(slab.drying(), 0.4461);
        near(slab.autogenous(), 0.05);
        near(slab.total(), 0.4961);
    }

    /// EN 1992-1-1:2004 Table 3.3, from memory.
    #[test]
    fn the_size_counts_as_in_the_table() {
        let sizes = [50.0, 100.0, 150.0, 200.0, 300.0, 400.0, 500.0, 900.0];
        let expected = [1.0, 1.0, 0.925, 0.85, 0.75, 0.725, 0.70, 0.70];
        for (h0, expected) in sizes.into_iter().zip(expected) {
            assert!((k_h(h0) - expected).abs() < 1e-12, "{h0}");
        }
    }

    #[test]
    fn begins_at_nothing_and_grows() {
        let at = |age: f64| ConcreteShrinkage {
            age_at_end: age.d(),
            ..concrete(38.0, 50.0, 150.0)
        };
        assert_eq!(at(3.0).drying(), Ok(Strain::ZERO));
        assert!(at(28.0).total().unwrap() < at(365.0).total().unwrap());
    }

    #[test]
    fn everything_wrong_is_said() {
        let wrong = ConcreteShrinkage {
            mean_strength: 12.MPa(),
            relative_humidity_percent: 0.5,
            notional_size: (-1).mm(),
            age_at_drying: 7.d(),
            age_at_end: 3.d(),
            cement: Cement::R,
        };
        for error in [
            wrong.basic_drying(),
            wrong.drying(),
            wrong.autogenous(),
            wrong.total(),
        ] {
            let error = error.unwrap_err();
            let paths: Vec<_> = error.problems().iter().map(|p| p.path()).collect();
            assert_eq!(
                paths,
                [
                    "mean_strength",
                    "relative_humidity_percent",
                    "notional_size",
                    "age_at_end"
                ]
            );
        }
    }
}
