//! The class `Material` and the strength classes.

use crate::concrete_creep::ConcreteCreepOrNumber;
use crate::convert::Inputs;
use crate::error::OrRaise;
use crate::made::{Made, Recipe, Reduced};
use crate::operand::Number;
use crate::quantity::Quantity;
use crate::strength::Strength;
use crate::time::TimeText;
use beamcore::material::{self, Creep, ServiceClass};
use pyo3::prelude::*;

/// Elastic values of one stuff, with its density, creep and design strengths.
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
        let mut inputs = Inputs::default();
        let given = inputs.read(modulus, "material.modulus")?;
        let material = given
            .map(|modulus| material::Material::new(name, modulus, Creep::factor(creep_factor.0)));
        let mut material = match density {
            None => material,
            Some(density) => {
                let density = inputs.read(density, "material.density")?;
                material
                    .zip(density)
                    .map(|(material, density)| material.density(density))
            }
        };
        if let Some(strength) = design_strength {
            let strength: Strength = strength.extract()?;
            material = material.map(|material| material.design_strength(strength.into_core()));
        }
        let material = inputs.done(py, material)?;
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

    /// The mean density, from which self-weight follows; None if it is not known.
    #[getter]
    fn density(&self) -> Option<Quantity> {
        self.0.mean_density().map(Quantity::of)
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

    /// The design strengths; None if they are not given.
    #[getter]
    fn design_strength(&self) -> Option<Strength> {
        self.0.strength().and_then(Strength::of)
    }

    /// The standard, edition and class of the values; None if they were given one by one.
    #[getter]
    fn origin(&self) -> Option<&str> {
        self.0.origin()
    }

    /// The same material under another name.
    ///
    /// >>> timber("C24", service_class=1).named("old joist").name
    /// 'old joist'
    fn named(slf: &Bound<'_, Self>, name: &str) -> PyResult<Self> {
        let named = slf.get().0.inner.clone().named(name);
        Ok(Self(Made::new(
            named,
            Recipe::method(slf, "named", (name,))?,
        )))
    }

    /// The same material with design strengths, against which stresses are compared.
    ///
    /// >>> strong = steel("S275").with_design_strength(MetalStrength(yield_stress=275*MPa))
    /// >>> strong.design_strength.yield_stress
    /// 275 MPa
    fn with_design_strength<'py>(
        slf: &Bound<'py, Self>,
        strength: &Bound<'py, PyAny>,
    ) -> PyResult<Self> {
        let core = strength.extract::<Strength>()?.into_core();
        let with = slf.get().0.inner.clone().design_strength(core);
        let recipe = Recipe::method(slf, "with_design_strength", (strength,))?;
        Ok(Self(Made::new(with, recipe)))
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }

    fn __repr__(&self) -> String {
        format!("<Material {:?}, E = {}>", self.0.name(), self.modulus())
    }
}

/// Solid or glued laminated timber: E_0,mean along the grain, mean density, k_def as creep factor.
///
/// strength_class: C16, C24, C30 (EN 338:2016) or GL24h, GL28h, GL32h (EN 14080:2013), from memory;
/// service_class: 1, 2 or 3 (EN 1995-1-1:2004).
///
/// >>> timber("C24", service_class=1).modulus
/// 11 GPa
#[pyfunction]
fn timber(py: Python<'_>, strength_class: &str, service_class: i64) -> PyResult<Material> {
    let mut inputs = Inputs::default();
    let class = inputs.checked(ServiceClass::from_number(service_class));
    let class = inputs.done(py, class)?;
    let material = material::timber(strength_class, class).or_raise(py)?;
    let recipe = Recipe::call(py, "timber", (strength_class, service_class))?;
    Ok(Material(Made::new(material, recipe)))
}

/// Structural steel: E = 210 GPa, 7850 kg/m3, no creep.
///
/// strength_class: S235, S275 or S355 (EN 1993-1-1:2005), from memory.
///
/// >>> steel("S275").density
/// 7850 kg/m**3
#[pyfunction]
fn steel(py: Python<'_>, strength_class: &str) -> PyResult<Material> {
    let material = material::steel(strength_class).or_raise(py)?;
    let recipe = Recipe::call(py, "steel", (strength_class,))?;
    Ok(Material(Made::new(material, recipe)))
}

/// Concrete: the rounded E_cm of its class; 2500 kg/m3 with its bars. Its creep must be said.
///
/// strength_class: C25/30 or C30/37 (EN 1992-1-1:2004 Table 3.1), from memory;
/// creep: a creep coefficient phi, or a ConcreteCreep from which it follows.
///
/// >>> concrete("C30/37", creep=2.5).modulus_at("final") == 33*GPa / 3.5
/// True
#[pyfunction]
fn concrete(strength_class: &str, creep: &Bound<'_, PyAny>) -> PyResult<Material> {
    let py = creep.py();
    let core = creep.extract::<ConcreteCreepOrNumber>()?.into_core();
    let material = material::concrete(strength_class, &core.or_raise(py)?).or_raise(py)?;
    let recipe = Recipe::call(py, "concrete", (strength_class, creep))?;
    Ok(Material(Made::new(material, recipe)))
}

/// Adds the classes and functions to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_class::<Material>()?;
    module.add_function(wrap_pyfunction!(timber, module)?)?;
    module.add_function(wrap_pyfunction!(steel, module)?)?;
    module.add_function(wrap_pyfunction!(concrete, module)?)
}
