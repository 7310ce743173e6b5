//! Values that a material is given beside its class or its first values.

use crate::concrete_creep::ConcreteCreepOrNumber;
use crate::convert::Inputs;
use crate::operand::Number;
use beamcore::material::{Creep, Material};
use beamcore::units::Quantity;
use pyo3::prelude::*;
use pyo3::types::PyDict;

/// A material by its first values.
pub(crate) fn first(
    name: &str,
    modulus: &Bound<'_, PyAny>,
    creep_factor: f64,
    density: Option<&Bound<'_, PyAny>>,
) -> PyResult<Material> {
    let mut inputs = Inputs::default();
    let read = inputs.read(modulus, "material.modulus")?;
    let material = read.map(|modulus| Material::new(name, modulus, Creep::factor(creep_factor)));
    let material = match density {
        None => material,
        Some(density) => material
            .zip(inputs.read(density, "material.density")?)
            .map(|(material, density)| material.density(density)),
    };
    inputs.done(modulus.py(), material)
}

/// The values as given, with what is wrong in them.
pub(crate) struct Values<'py> {
    py: Python<'py>,
    inputs: Inputs,
    material: Material,
    /// What gives the same values again.
    keywords: Bound<'py, PyDict>,
}

impl<'py> Values<'py> {
    /// Values for a material, none of them given yet.
    pub(crate) fn of(py: Python<'py>, material: Material) -> Self {
        Self {
            py,
            inputs: Inputs::default(),
            material,
            keywords: PyDict::new(py),
        }
    }

    /// A quantity under a keyword, if it is given.
    pub(crate) fn quantity<Q: Quantity>(
        self,
        keyword: &str,
        given: Option<&Bound<'py, PyAny>>,
        build: fn(Material, Q) -> Material,
    ) -> PyResult<Self> {
        let Some(given) = given else {
            return Ok(self);
        };
        let mut inputs = self.inputs;
        let read = inputs.read(given, &format!("material.{keyword}"))?;
        self.keywords.set_item(keyword, given)?;
        Ok(Self {
            inputs,
            material: match read {
                Some(quantity) => build(self.material, quantity),
                None => self.material,
            },
            ..self
        })
    }

    /// Poisson's ratio, if it is given.
    pub(crate) fn poisson_ratio(self, given: Option<Number>) -> PyResult<Self> {
        let Some(Number(ratio)) = given else {
            return Ok(self);
        };
        self.keywords.set_item("poisson_ratio", ratio)?;
        Ok(Self {
            material: self.material.poisson_ratio(ratio),
            ..self
        })
    }

    /// Another creep, if it is given.
    pub(crate) fn creep(self, given: Option<&Bound<'py, PyAny>>) -> PyResult<Self> {
        let Some(given) = given else {
            return Ok(self);
        };
        let mut inputs = self.inputs;
        let creep = inputs.checked(given.extract::<ConcreteCreepOrNumber>()?.into_core());
        self.keywords.set_item("creep", given)?;
        Ok(Self {
            inputs,
            material: match creep {
                Some(creep) => self.material.creep_override(creep),
                None => self.material,
            },
            ..self
        })
    }

    /// The material with its keywords, or the exception of everything that is wrong.
    pub(crate) fn done(self) -> PyResult<(Material, Bound<'py, PyDict>)> {
        let material = self.inputs.done(self.py, Some(self.material))?;
        Ok((material, self.keywords))
    }
}
