//! The class `Material`.

use crate::characteristic::CharacteristicStrength;
use crate::convert;
use crate::error::OrRaise;
use crate::factors::Factors;
use crate::made::{Made, Recipe, Reduced};
use crate::material_values::{self, Values};
use crate::operand::Number;
use crate::quantity::Quantity;
use crate::strength::Strength;
use crate::time::TimeText;
use beamcore::material;
use pyo3::IntoPyObjectExt;
use pyo3::prelude::*;
use pyo3::types::PyTuple;

/// Elastic values of one stuff, with its density, creep, thermal expansion and strengths.
///
/// modulus is the short-term modulus of elasticity E; at the end of the life E / (1 + creep_factor)
/// acts. The values are checked when the material is used in a section.
///
/// >>> oak = Material("old oak", 9.5*GPa, creep_factor=0.6, density=690*kg/m**3)
/// >>> oak.modulus_at("final").to(GPa)
/// 5.9375
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct Material(pub(crate) Made<material::Material>);

impl Material {
    /// The material that a method of one argument makes of this one.
    fn with<'py>(
        slf: &Bound<'py, Self>,
        method: &'static str,
        argument: impl IntoPyObjectExt<'py>,
        make: impl FnOnce(material::Material) -> material::Material,
    ) -> PyResult<Self> {
        let argument = argument.into_bound_py_any(slf.py())?;
        let recipe = Recipe::method(slf, method, (argument,))?;
        Ok(Self(Made::new(make(slf.get().0.inner.clone()), recipe)))
    }
}

#[pymethods]
impl Material {
    #[new]
    #[pyo3(signature = (name, modulus, creep_factor, density=None, design_strength=None))]
    fn new<'py>(
        py: Python<'py>,
        name: &str,
        modulus: &Bound<'py, PyAny>,
        creep_factor: Number,
        density: Option<&Bound<'py, PyAny>>,
        design_strength: Option<&Bound<'py, PyAny>>,
    ) -> PyResult<Self> {
        let mut material = material_values::first(name, modulus, creep_factor.0, density)?;
        if let Some(strength) = design_strength {
            material = material.design_strength(strength.extract::<Strength>()?.into_core());
        }
        let args = (name, modulus, creep_factor.0, density, design_strength);
        Ok(Self(Made::new(
            material,
            Recipe::call(py, "Material", args)?,
        )))
    }

    /// The name, by which results and errors speak of the material.
    #[getter]
    fn name(&self) -> &str {
        self.0.name()
    }

    /// The short-term modulus of elasticity E.
    #[getter]
    fn modulus(&self) -> Quantity {
        Quantity::of(self.0.modulus())
    }

    /// The modulus at a time: E at "initial", E / (1 + creep_factor) at "final".
    fn modulus_at(&self, time: TimeText) -> Quantity {
        Quantity::of(self.0.modulus_at(time.into()))
    }

    /// The 5 % fractile of the modulus of elasticity, E_05; None if it is not known.
    #[getter]
    fn fractile_modulus(&self) -> Option<Quantity> {
        self.0.modulus_05().map(Quantity::of)
    }

    /// The short-term mean shear modulus: G as given, else E/(2 (1 + nu)); None if neither G nor
    /// Poisson's ratio is known.
    #[getter]
    fn shear_modulus(&self) -> Option<Quantity> {
        self.0.mean_shear_modulus().map(Quantity::of)
    }

    /// The shear modulus at a time: G at "initial", G/(1 + creep_factor) at "final"; None if it is
    /// not known (EN 1995-1-1:2004 eq. 2.8, from memory).
    fn shear_modulus_at(&self, time: TimeText) -> Option<Quantity> {
        self.0.shear_modulus_at(time.into()).map(Quantity::of)
    }

    /// Poisson's ratio nu; None if it is not given.
    #[getter]
    fn poisson_ratio(&self) -> Option<f64> {
        self.0.poisson()
    }

    /// The mean density, from which self-weight follows; None if it is not known.
    #[getter]
    fn density(&self) -> Option<Quantity> {
        self.0.mean_density().map(Quantity::of)
    }

    /// The 5 % fractile of the density, rho_k; None if it is not known.
    #[getter]
    fn fractile_density(&self) -> Option<Quantity> {
        self.0.density_05().map(Quantity::of)
    }

    /// The thermal expansion alpha, positive where warmth lengthens; None if it is not known.
    #[getter]
    fn thermal_expansion(&self) -> Option<Quantity> {
        self.0.expansion().map(Quantity::of)
    }

    /// Where the thermal expansion of a class comes from, which is often not the standard of the
    /// class; None if it was given or is not known.
    #[getter]
    fn thermal_expansion_origin(&self) -> Option<&str> {
        self.0.expansion_origin()
    }

    /// The creep factor: strain grows by this multiple of itself under a lasting stress.
    #[getter]
    fn creep_factor(&self) -> f64 {
        self.0.creep().value()
    }

    /// Where the creep factor comes from.
    #[getter]
    fn creep_basis(&self) -> &str {
        self.0.creep().basis()
    }

    /// The characteristic strengths; None if they are not known. No stress is compared with them.
    #[getter]
    fn characteristic_strength(&self) -> Option<CharacteristicStrength> {
        self.0.characteristic().and_then(CharacteristicStrength::of)
    }

    /// The factors from characteristic to design strengths; None if they are not given.
    #[getter]
    fn design_factors(&self) -> Option<Factors> {
        self.0.factors().and_then(Factors::of)
    }

    /// The design strengths, as given or made of the characteristic ones by the design factors;
    /// None if there are none.
    #[getter]
    fn design_strength(&self) -> Option<Strength> {
        self.0.strength().and_then(Strength::of)
    }

    /// The design shear strength: as given, else made by the design factors (f_v,d of timber), else
    /// f_y,d/sqrt(3) of metal; None if there is none.
    #[getter]
    fn design_shear_strength(&self) -> Option<Quantity> {
        self.0.design_shear_strength().map(Quantity::of)
    }

    /// The design strengths, or the error of what is missing for them.
    fn design_values(&self, py: Python<'_>) -> PyResult<Option<Strength>> {
        Ok(Strength::of(&self.0.design_values().or_raise(py)?))
    }

    /// The standard, edition and class of the values; None if they were given one by one.
    #[getter]
    fn origin(&self) -> Option<&str> {
        self.0.origin()
    }

    /// The values of the class that were overridden, one text for each; empty without a class.
    #[getter]
    fn overrides<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        PyTuple::new(py, self.0.overrides())
    }

    /// The same material under another name.
    ///
    /// >>> timber("C24", service_class=1).named("old joist").name
    /// 'old joist'
    fn named(slf: &Bound<'_, Self>, name: &str) -> PyResult<Self> {
        Self::with(slf, "named", name, |material| material.named(name))
    }

    /// The same material with values of its own, beside or instead of those it has.
    ///
    /// - modulus: another E; E_05 and G stay, unless G follows from E and nu
    /// - fractile_modulus, fractile_density: the 5 % fractiles E_05 and rho_k
    /// - shear_modulus: G; poisson_ratio: nu from 0 to 0.5, so that G = E/(2 (1 + nu)). Either
    ///   replaces what a class has; both must agree within 1 %
    /// - density: the mean density, from which self-weight follows
    /// - thermal_expansion: as 12e-6/K, positive where warmth lengthens
    /// - creep: a creep factor, or a ConcreteCreep from which it follows
    ///
    /// >>> timber("C24", service_class=1).with_values(density=450*kg/m**3).overrides
    /// ('density 450 kg/m3 instead of 420 kg/m3',)
    #[pyo3(signature = (
        *, modulus=None, fractile_modulus=None, shear_modulus=None, poisson_ratio=None,
        density=None, fractile_density=None, thermal_expansion=None, creep=None
    ))]
    #[expect(clippy::too_many_arguments, reason = "each is a keyword in Python")]
    fn with_values<'py>(
        slf: &Bound<'py, Self>,
        modulus: Option<&Bound<'py, PyAny>>,
        fractile_modulus: Option<&Bound<'py, PyAny>>,
        shear_modulus: Option<&Bound<'py, PyAny>>,
        poisson_ratio: Option<Number>,
        density: Option<&Bound<'py, PyAny>>,
        fractile_density: Option<&Bound<'py, PyAny>>,
        thermal_expansion: Option<&Bound<'py, PyAny>>,
        creep: Option<&Bound<'py, PyAny>>,
    ) -> PyResult<Self> {
        use material::Material as Core;
        let py = slf.py();
        let (material, keywords) = Values::of(py, slf.get().0.inner.clone())
            .quantity("modulus", modulus, Core::modulus_override)?
            .quantity("fractile_modulus", fractile_modulus, Core::fractile_modulus)?
            .quantity("shear_modulus", shear_modulus, Core::shear_modulus)?
            .poisson_ratio(poisson_ratio)?
            .quantity("density", density, Core::density)?
            .quantity("fractile_density", fractile_density, Core::fractile_density)?
            .quantity(
                "thermal_expansion",
                thermal_expansion,
                Core::thermal_expansion,
            )?
            .creep(creep)?
            .done()?;
        let recipe = Recipe::method(slf, "with_values", PyTuple::empty(py))?.with(&keywords);
        Ok(Self(Made::new(material, recipe)))
    }

    /// The same material with these characteristic strengths, which need design factors beside them
    /// (or design strengths) before the material can be used in a section; concrete needs none.
    fn with_characteristic_strength(
        slf: &Bound<'_, Self>,
        strength: CharacteristicStrength,
    ) -> PyResult<Self> {
        let core = strength.clone().into_core();
        Self::with(slf, "with_characteristic_strength", strength, |material| {
            material.characteristic_strength(core)
        })
    }

    /// The same material with the factors that make design strengths of the characteristic ones.
    ///
    /// >>> plate = steel_of_thickness("S275", 20*mm).with_design_factors(MetalFactors(1.0))
    /// >>> plate.design_strength.yield_stress
    /// 265 MPa
    fn with_design_factors(slf: &Bound<'_, Self>, factors: Factors) -> PyResult<Self> {
        let core = factors.clone().into_core();
        Self::with(slf, "with_design_factors", factors, |material| {
            material.design_factors(core)
        })
    }

    /// The same material with design strengths, against which stresses are compared.
    ///
    /// >>> strong = steel("S275").with_design_strength(MetalStrength(yield_stress=275*MPa))
    /// >>> strong.design_strength.yield_stress
    /// 275 MPa
    fn with_design_strength(slf: &Bound<'_, Self>, strength: Strength) -> PyResult<Self> {
        let core = strength.clone().into_core();
        Self::with(slf, "with_design_strength", strength, |material| {
            material.design_strength(core)
        })
    }

    /// The same material with this design shear strength, as f_v,d of timber.
    fn with_design_shear_strength<'py>(
        slf: &Bound<'py, Self>,
        strength: &Bound<'py, PyAny>,
    ) -> PyResult<Self> {
        let value = convert::read(strength, "material.shear_strength")?;
        Self::with(slf, "with_design_shear_strength", strength, |material| {
            material.shear_strength(value)
        })
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }

    fn __repr__(&self) -> String {
        format!("<Material {:?}, E = {}>", self.0.name(), self.modulus())
    }
}
