//! The class `Response`.

use crate::camber::Camber;
use crate::convert::Inputs;
use crate::error::OrRaise;
use crate::field::{Field, Line};
use crate::made::{Made, Recipe, Reduced};
use crate::operand::Number;
use crate::quantity::Quantity;
use crate::run::run;
use crate::stress::{PartStress, Utilisation};
use crate::time::TimeText;
use beamcore::camber::CamberPlan;
use beamcore::member::Combination;
use beamcore::response;
use beamcore::time::Time;
use pyo3::prelude::*;
use pyo3::types::{PyDict, PyTuple};

record! {
    /// The reaction of one support on the member.
    Reaction {
        /// The force, positive upward.
        force: Quantity,
        /// The couple, positive clockwise with x to the right and z up; zero unless the support
        /// holds the rotation.
        couple: Quantity,
    }
}

/// The solved member: every field under every combination, at both times.
///
/// Combinations are named "permanent", "quasi-permanent", "characteristic" and "fundamental"; where
/// several variable actions can lead, as in "fundamental, NAME leading". At "initial" all parts have
/// short-term moduli; at "final" the quasi-permanent share acts on E/(1 + creep factor) of each
/// part and the rest on E, so that only what creeps softens.
#[pyclass(frozen, module = "beamcore")]
#[derive(Debug)]
pub(crate) struct Response(pub(crate) Made<response::Response>);

impl Response {
    fn field<Q>(
        slf: &Bound<'_, Self>,
        name: &'static str,
        combination: &str,
        time: TimeText,
        of: impl FnOnce(&response::Response, Time) -> beamcore::Result<Q>,
        line: impl FnOnce(Q) -> Line,
    ) -> PyResult<Field> {
        let time = time.into();
        let field = of(&slf.get().0.inner, time).or_raise(slf.py())?;
        let recipe = Recipe::method(slf, name, (combination, time.name()))?;
        Ok(Field(Made::new(line(field), recipe)))
    }
}

#[pymethods]
impl Response {
    /// The names of the combinations.
    #[getter]
    fn combinations<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        let combinations = self.0.member().combinations();
        PyTuple::new(py, combinations.iter().map(Combination::name))
    }

    /// The deflection w along the member, positive downward.
    fn deflection(slf: &Bound<'_, Self>, combination: &str, time: TimeText) -> PyResult<Field> {
        let of = |r: &response::Response, time| r.deflection(combination, time);
        Self::field(slf, "deflection", combination, time, of, Line::Deflection)
    }

    /// The slope dw/dx along the member, positive where the deflection grows to the right.
    fn slope(slf: &Bound<'_, Self>, combination: &str, time: TimeText) -> PyResult<Field> {
        let of = |r: &response::Response, time| r.slope(combination, time);
        Self::field(slf, "slope", combination, time, of, Line::Slope)
    }

    /// The shear force V = dM/dx along the member.
    fn shear(slf: &Bound<'_, Self>, combination: &str, time: TimeText) -> PyResult<Field> {
        let of = |r: &response::Response, time| r.shear(combination, time);
        Self::field(slf, "shear", combination, time, of, Line::Shear)
    }

    /// The moment M along the member, positive where it stretches the bottom (sagging).
    fn moment(slf: &Bound<'_, Self>, combination: &str, time: TimeText) -> PyResult<Field> {
        let of = |r: &response::Response, time| r.moment(combination, time);
        Self::field(slf, "moment", combination, time, of, Line::Moment)
    }

    /// The reaction of a support.
    fn reaction(
        &self,
        py: Python<'_>,
        combination: &str,
        time: TimeText,
        support: &str,
    ) -> PyResult<Reaction> {
        let reaction = self
            .0
            .reaction(combination, time.into(), support)
            .or_raise(py)?;
        Ok(Reaction {
            force: Quantity::of(reaction.force),
            couple: Quantity::of(reaction.couple),
        })
    }

    /// The normal stress in a part.
    fn stress(
        slf: &Bound<'_, Self>,
        combination: &str,
        time: TimeText,
        part: &str,
    ) -> PyResult<PartStress> {
        let time = time.into();
        let stress = slf
            .get()
            .0
            .stress(combination, time, part)
            .or_raise(slf.py())?;
        let recipe = Recipe::method(slf, "stress", (combination, time.name(), part))?;
        Ok(PartStress(Made::new(stress, recipe)))
    }

    /// The greatest utilisation of a part; None if its material has no design strengths.
    ///
    /// Timber: |centroid stress| / tension or compression + |edge stress - centroid stress| /
    /// bending. Metal: greatest |stress| / yield stress.
    fn utilisation(
        &self,
        py: Python<'_>,
        combination: &str,
        time: TimeText,
        part: &str,
    ) -> PyResult<Option<Utilisation>> {
        let found = self
            .0
            .utilisation(combination, time.into(), part)
            .or_raise(py)?;
        Ok(found.map(|found| Utilisation {
            value: found.value,
            at: Quantity::of(found.at),
        }))
    }

    /// The camber to build in: a parabola over the chord between two supports.
    ///
    /// Its rise is fraction x the deflection under the combination at the middle of the chord,
    /// rounded ("nearest", "down" or "up") to whole steps; ordinates are given at the ends of equal
    /// divisions of the chord.
    #[pyo3(signature = (*, combination, time, fraction, from_, to, step, rounding, divisions))]
    #[expect(clippy::too_many_arguments, reason = "each is a keyword in Python")]
    fn camber<'py>(
        slf: &Bound<'py, Self>,
        combination: &str,
        time: TimeText,
        fraction: Number,
        from_: &str,
        to: &str,
        step: &Bound<'py, PyAny>,
        rounding: &str,
        divisions: u32,
    ) -> PyResult<Camber> {
        let py = slf.py();
        let time: Time = time.into();
        let mut inputs = Inputs::default();
        let height = inputs.read(step, "camber.step")?;
        let direction = inputs.checked(rounding.parse());
        let plan = height.zip(direction).map(|(step, rounding)| CamberPlan {
            combination: combination.to_owned(),
            time,
            fraction: fraction.0,
            from: from_.to_owned(),
            to: to.to_owned(),
            step,
            rounding,
            divisions,
        });
        let plan = inputs.done(py, plan)?;
        let response = &slf.get().0.inner;
        let camber = run(py, || response.camber(&plan))?;
        let keywords = PyDict::new(py);
        keywords.set_item("combination", combination)?;
        keywords.set_item("time", time.name())?;
        keywords.set_item("fraction", fraction.0)?;
        keywords.set_item("from_", from_)?;
        keywords.set_item("to", to)?;
        keywords.set_item("step", step)?;
        keywords.set_item("rounding", rounding)?;
        keywords.set_item("divisions", divisions)?;
        let recipe = Recipe::method(slf, "camber", PyTuple::empty(py))?.with(&keywords);
        Ok(Camber(Made::new(camber, recipe)))
    }

    /// What is left of equilibrium and continuity in the solutions, relative to their greatest
    /// terms: the error estimate of the calculation.
    #[getter]
    fn residual(&self) -> f64 {
        self.0.residual()
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }
}

/// Adds the classes to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_class::<Reaction>()?;
    module.add_class::<Response>()
}
