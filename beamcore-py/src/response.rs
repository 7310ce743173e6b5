//! The class `Response`.

use crate::camber::{Camber, Wish};
use crate::combination::Combination;
use crate::error::OrRaise;
use crate::field::{Field, Line};
use crate::limit::{self, Limit};
use crate::made::{Made, Recipe, Reduced};
use crate::operand::Number;
use crate::part::PartOrName;
use crate::quantity::Quantity;
use crate::reading;
use crate::stress::{PartStress, Utilisation};
use crate::time::TimeText;
use beamcore::member;
use beamcore::response;
use beamcore::time::Time;
use pyo3::prelude::*;
use pyo3::types::PyTuple;

/// The solved member: every field under every combination, at both times.
///
/// Combinations are named "permanent", "quasi-permanent", "characteristic", "frequent" and
/// "fundamental"; where several variable actions can lead, as in "fundamental, NAME leading". At
/// "initial" all parts have short-term moduli; at "final" the quasi-permanent share acts on
/// E/(1 + creep factor) of each part and the rest on E, so that only what creeps softens.
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
        PyTuple::new(py, combinations.iter().map(member::Combination::name))
    }

    /// The combination of a name, with its kind and its factors.
    fn combination(&self, py: Python<'_>, name: &str) -> PyResult<Combination> {
        Ok(Combination::of(self.0.combination(name).or_raise(py)?))
    }

    /// The deflection w along the member, positive downward (square to a pitched member); of layers
    /// with deflections of their own, that of the first layer.
    fn deflection(slf: &Bound<'_, Self>, combination: &str, time: TimeText) -> PyResult<Field> {
        let of = |r: &response::Response, time| r.deflection(combination, time);
        Self::field(slf, "deflection", combination, time, of, Line::Movement)
    }

    /// The movement sideways along the member, positive towards positive y: v = w EI_yz/EI_zz for
    /// each share of the load; zero unless it is free sideways and its section has no axis of
    /// symmetry.
    fn sideways(slf: &Bound<'_, Self>, combination: &str, time: TimeText) -> PyResult<Field> {
        let of = |r: &response::Response, time| r.sideways(combination, time);
        Self::field(slf, "sideways", combination, time, of, Line::Movement)
    }

    /// The slope dw/dx along the member, positive where the deflection grows to the right. With
    /// shear it is not the rotation of the section.
    fn slope(slf: &Bound<'_, Self>, combination: &str, time: TimeText) -> PyResult<Field> {
        let of = |r: &response::Response, time| r.slope(combination, time);
        Self::field(slf, "slope", combination, time, of, Line::Slope)
    }

    /// The rotation of the section along the member, positive clockwise: dw/dx - V/kGA.
    fn rotation(slf: &Bound<'_, Self>, combination: &str, time: TimeText) -> PyResult<Field> {
        let of = |r: &response::Response, time| r.rotation(combination, time);
        Self::field(slf, "rotation", combination, time, of, Line::Slope)
    }

    /// The curvature along the member, positive sagging, with its free part.
    fn curvature(slf: &Bound<'_, Self>, combination: &str, time: TimeText) -> PyResult<Field> {
        let of = |r: &response::Response, time| r.curvature(combination, time);
        Self::field(slf, "curvature", combination, time, of, Line::Curvature)
    }

    /// The shear force V = dM/dx along the member, that of all layers.
    fn shear(slf: &Bound<'_, Self>, combination: &str, time: TimeText) -> PyResult<Field> {
        let of = |r: &response::Response, time| r.shear(combination, time);
        Self::field(slf, "shear", combination, time, of, Line::Force)
    }

    /// The moment M along the member, positive where it stretches the bottom (sagging), about the
    /// elastic centroid that the section has on the first day.
    fn moment(slf: &Bound<'_, Self>, combination: &str, time: TimeText) -> PyResult<Field> {
        let of = |r: &response::Response, time| r.moment(combination, time);
        Self::field(slf, "moment", combination, time, of, Line::Moment)
    }

    /// The axial force N along the member, tension positive.
    fn axial(slf: &Bound<'_, Self>, combination: &str, time: TimeText) -> PyResult<Field> {
        let of = |r: &response::Response, time| r.axial(combination, time);
        Self::field(slf, "axial", combination, time, of, Line::Force)
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

    /// The deflection of one span, positive downward: between two supports from the chord through
    /// them, of an overhang from its support.
    fn span_deflection(
        slf: &Bound<'_, Self>,
        combination: &str,
        time: TimeText,
        span: &str,
    ) -> PyResult<Field> {
        let time: Time = time.into();
        let response = &slf.get().0;
        let line = response
            .span_deflection(combination, time, span)
            .or_raise(slf.py())?;
        let args = (combination, time.name(), span);
        let recipe = Recipe::method(slf, "span_deflection", args)?;
        Ok(Field(Made::new(Line::Movement(line), recipe)))
    }

    /// The line of a component of the deflection along a span, positive downward (EN 1990:2002
    /// A1.4.3, from memory).
    ///
    /// - component: "w_inst" (initial), "w_1" (permanent actions, initial), "w_2" (what creep adds
    ///   under permanent actions), "w_3" (what variable actions add, with the creep under their
    ///   quasi-permanent part), "w_tot" = w_1 + w_2 + w_3, or "w_max" = w_tot - w_c
    /// - combination: a characteristic one, or one of one's own
    /// - camber: the camber w_c, of which only w_max takes notice.
    #[pyo3(signature = (component, combination, span, camber=None))]
    fn deflection_component<'py>(
        slf: &Bound<'py, Self>,
        component: &str,
        combination: &str,
        span: &str,
        camber: Option<&Bound<'py, Camber>>,
    ) -> PyResult<Field> {
        let (py, response) = (slf.py(), &slf.get().0);
        let part = limit::component(component).or_raise(py)?;
        let built = camber.map(|camber| &camber.get().0.inner);
        let line = response
            .deflection_component(part, combination, span, built)
            .or_raise(py)?;
        let args = (component, combination, span, camber);
        let recipe = Recipe::method(slf, "deflection_component", args)?;
        Ok(Field(Made::new(Line::Movement(line), recipe)))
    }

    /// Compares limits of the deflection with the results: one LimitCheck per limit and span, each
    /// under the combination that uses the limit most.
    #[pyo3(signature = (limits, camber=None))]
    #[expect(
        clippy::needless_pass_by_value,
        reason = "Python's arguments are taken as owned"
    )]
    fn check_limits<'py>(
        slf: &Bound<'py, Self>,
        limits: Vec<Py<Limit>>,
        camber: Option<&Bound<'py, Camber>>,
    ) -> PyResult<Bound<'py, PyTuple>> {
        limit::checks(slf.py(), &slf.get().0, &limits, camber)
    }

    /// The camber to build in, over the chord between the supports from_ and to.
    ///
    /// - shape: "parabola" or "arc_through_middle", whose rise is that of the deflection line at
    ///   the middle of the chord; "mirror", the mirror image of that line; or "arc_least_gap", the
    ///   arc whose greatest gap to it is least
    /// - combination, time, fraction: fraction x this deflection is built in
    /// - step, rounding: the rise is rounded ("nearest", "down" or "up") to whole steps
    /// - least: a smaller rise is not worth building and becomes none; without it, any is built
    /// - divisions: ordinates are given at the ends of equal divisions of the chord.
    #[pyo3(signature = (
        *, shape, combination, time, fraction, from_, to, step, rounding, divisions, least=None
    ))]
    #[expect(clippy::too_many_arguments, reason = "each is a keyword in Python")]
    fn camber<'py>(
        slf: &Bound<'py, Self>,
        shape: &str,
        combination: &str,
        time: TimeText,
        fraction: Number,
        from_: &str,
        to: &str,
        step: &Bound<'py, PyAny>,
        rounding: &str,
        divisions: u32,
        least: Option<&Bound<'py, PyAny>>,
    ) -> PyResult<Camber> {
        let wish = Wish {
            shape,
            combination,
            time: time.into(),
            fraction: fraction.0,
            from: from_,
            to,
            step,
            rounding,
            least,
            divisions,
        };
        wish.made(slf)
    }

    /// The line that remains after the camber, deflection - camber: positive where the member lies
    /// below the straight line, negative where it stays crowned.
    fn remaining<'py>(
        slf: &Bound<'py, Self>,
        combination: &str,
        time: TimeText,
        camber: &Bound<'py, Camber>,
    ) -> PyResult<Field> {
        let time: Time = time.into();
        let line = slf
            .get()
            .0
            .remaining(combination, time, &camber.get().0.inner)
            .or_raise(slf.py())?;
        let args = (combination, time.name(), camber);
        let recipe = Recipe::method(slf, "remaining", args)?;
        Ok(Field(Made::new(Line::Movement(line), recipe)))
    }

    /// The readings to expect in the shop at the stations of a camber, one Reading for each.
    ///
    /// The member lies on its side, or stands on trestles at the places left and right with the
    /// given parts (a slab cast on site is not yet there), their own weight and short-term moduli:
    /// standing = camber - w + (line through w at the ends of the chord), w the deflection there.
    #[pyo3(signature = (camber, *, left, right, parts))]
    fn readings<'py>(
        slf: &Bound<'py, Self>,
        camber: &Bound<'py, Camber>,
        left: &Bound<'py, PyAny>,
        right: &Bound<'py, PyAny>,
        parts: Vec<PartOrName>,
    ) -> PyResult<Bound<'py, PyTuple>> {
        reading::readings(&slf.get().0, camber, left, right, parts)
    }

    /// The error estimate of the solutions, relative to the peak of each field: what is left of
    /// equilibrium and continuity at the stations, and of the equations between the points of
    /// pieces whose section changes.
    #[getter]
    fn residual(&self) -> f64 {
        self.0.residual()
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }
}
