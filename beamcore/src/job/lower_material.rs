//! Materials of the document: by strength class or by values, never half of each.

use super::document_material::{CementDocument, ConcreteCreepDocument, MaterialDocument};
use super::lower_strength;
use crate::error::{ErrorKind, Problem};
use crate::material::concrete::{Cement, ConcreteCreep};
use crate::material::{self, Creep, Material, ServiceClass};
use crate::path;
use std::collections::BTreeMap;

/// All materials, in the order of the document; one that is wrong is `None`.
pub(super) fn all(
    documents: &BTreeMap<String, MaterialDocument>,
    problems: &mut Vec<Problem>,
) -> Vec<(String, Option<Material>)> {
    documents
        .iter()
        .map(|(name, document)| {
            let base = path::named("materials", name);
            let lowered = Lowering {
                name,
                document,
                base: &base,
                problems,
            };
            (name.clone(), lowered.material())
        })
        .collect()
}

struct Lowering<'a> {
    name: &'a str,
    document: &'a MaterialDocument,
    base: &'a str,
    problems: &'a mut Vec<Problem>,
}

impl Lowering<'_> {
    fn material(mut self) -> Option<Material> {
        let document = self.document;
        let classes = [
            ("timber", document.timber.is_some()),
            ("steel", document.steel.is_some()),
            ("aluminium", document.aluminium.is_some()),
            ("concrete", document.concrete.is_some()),
        ];
        let given: Vec<_> = classes.iter().filter(|g| g.1).map(|g| g.0).collect();
        let material = match given.as_slice() {
            ["timber"] => self.timber(),
            ["steel"] => self.steel(),
            ["aluminium"] => self.aluminium(),
            ["concrete"] => self.concrete(),
            [] if document.modulus.is_some() => self.own(),
            other => {
                let found = if other.is_empty() {
                    "none".into()
                } else {
                    other.join(" and ")
                };
                self.problem(
                    ErrorKind::Missing,
                    "",
                    format!("{found} of the keys timber, steel, aluminium, concrete, modulus"),
                    "one strength class, or a modulus",
                );
                return None;
            }
        }?;
        let material = material.named(self.name);
        // Beside a class, the modulus and the creep factor override those of the class.
        let is_class = !given.is_empty();
        let material = match &document.modulus {
            Some(modulus) if is_class => material.modulus_override(modulus.value()?),
            _ => material,
        };
        let material = match document.creep_factor {
            Some(factor) if is_class && document.concrete.is_none() => {
                material.creep_override(Creep::factor(factor))
            }
            _ => material,
        };
        self.values(material)
    }

    /// The values that may stand beside any kind of material.
    fn values(&self, mut material: Material) -> Option<Material> {
        let document = self.document;
        if let Some(density) = &document.density {
            material = material.density(density.value()?);
        }
        if let Some(modulus) = &document.shear_modulus {
            material = material.shear_modulus(modulus.value()?);
        }
        if let Some(ratio) = document.poisson_ratio {
            material = material.poisson_ratio(ratio);
        }
        if let Some(expansion) = &document.thermal_expansion {
            material = material.thermal_expansion(expansion.value()?);
        }
        if let Some(strength) = &document.characteristic_strength {
            material = material.characteristic_strength(lower_strength::characteristic(strength)?);
        }
        if let Some(factors) = &document.design_factors {
            material = material.design_factors(lower_strength::factors(factors));
        }
        if let Some(strength) = &document.design_strength {
            material = material.design_strength(lower_strength::design(strength)?);
        }
        if let Some(strength) = &document.shear_strength {
            material = material.shear_strength(strength.value()?);
        }
        Some(material)
    }

    fn timber(&mut self) -> Option<Material> {
        self.only("timber", &["service_class"]);
        let Some(number) = self.document.service_class else {
            self.problem(
                ErrorKind::Missing,
                "service_class",
                "no service class",
                "1, 2 or 3, on which the creep of timber depends",
            );
            return None;
        };
        let class = self.document.timber.as_deref()?;
        let service_class = self.tried("service_class", ServiceClass::from_number(number));
        // An unknown strength class is told even when the service class is wrong as well.
        let service_class_or_any = service_class.unwrap_or(ServiceClass::One);
        let material = self.tried("timber", material::timber(class, service_class_or_any))?;
        service_class.map(|_| material)
    }

    fn steel(&mut self) -> Option<Material> {
        self.only("steel", &["thickness"]);
        let class = self.document.steel.as_deref()?;
        match &self.document.thickness {
            None => self.tried("steel", material::steel(class)),
            Some(thickness) => {
                let thickness = thickness.value()?;
                self.tried("steel", material::steel_of_thickness(class, thickness))
            }
        }
    }

    fn aluminium(&mut self) -> Option<Material> {
        self.only("aluminium", &["thickness"]);
        let class = self.document.aluminium.as_deref()?;
        let Some(thickness) = &self.document.thickness else {
            self.problem(
                ErrorKind::Missing,
                "thickness",
                "no thickness",
                "the thickness, on which the strength of aluminium depends",
            );
            return None;
        };
        let thickness = thickness.value()?;
        self.tried("aluminium", material::aluminium(class, thickness))
    }

    fn concrete(&mut self) -> Option<Material> {
        self.only("concrete", &["concrete_creep"]);
        let class = self.document.concrete.as_deref()?;
        let creep = match (self.document.creep_factor, &self.document.concrete_creep) {
            (Some(factor), None) => Some(Creep::factor(factor)),
            (None, Some(creep)) => self.concrete_creep(creep),
            (Some(_), Some(_)) | (None, None) => {
                self.problem(
                    ErrorKind::Missing,
                    "creep_factor",
                    "not exactly one of creep_factor and concrete_creep",
                    "the creep of the concrete by one of them",
                );
                None
            }
        };
        // An unknown class is told even when the creep is wrong as well.
        let creep_or_none = creep.clone().unwrap_or_else(Creep::none);
        let material = self.tried("concrete", material::concrete(class, &creep_or_none))?;
        creep.map(|_| material)
    }

    fn own(&mut self) -> Option<Material> {
        self.only("modulus", &[]);
        let Some(factor) = self.document.creep_factor else {
            self.problem(
                ErrorKind::Missing,
                "creep_factor",
                "no creep factor",
                "the creep factor, which is 0 for a material that does not creep",
            );
            return None;
        };
        let modulus = self.document.modulus.as_ref()?.value()?;
        Some(Material::new(self.name, modulus, Creep::factor(factor)))
    }

    fn concrete_creep(&mut self, document: &ConcreteCreepDocument) -> Option<Creep> {
        let creep = ConcreteCreep {
            mean_strength: document.mean_strength.value()?,
            relative_humidity_percent: document.relative_humidity_percent,
            notional_size: document.notional_size.value()?,
            age_at_loading: document.age_at_loading.value()?,
            age_at_end: document.age_at_end.value()?,
            cement: match document.cement {
                CementDocument::S => Cement::S,
                CementDocument::N => Cement::N,
                CementDocument::R => Cement::R,
            },
        };
        match Creep::concrete(&creep) {
            Ok(creep) => Some(creep),
            Err(error) => {
                for problem in error.problems() {
                    let key = path::key("concrete_creep", problem.path());
                    self.problem(problem.kind(), &key, problem.found(), problem.expected());
                }
                None
            }
        }
    }

    /// A problem for each key that has no meaning beside the one that says what the material is.
    fn only(&mut self, kind: &str, allowed: &[&str]) {
        let document = self.document;
        let given = [
            ("service_class", document.service_class.is_some()),
            ("concrete_creep", document.concrete_creep.is_some()),
            ("thickness", document.thickness.is_some()),
        ];
        for (key, _) in given
            .iter()
            .filter(|(key, given)| *given && !allowed.contains(key))
        {
            self.problem(
                ErrorKind::Key,
                key,
                format!("the key {key}, which has no meaning beside {kind}"),
                match allowed {
                    [] => format!("only what belongs to a material by its {kind}"),
                    allowed => format!("beside {kind}, {}", allowed.join(", ")),
                },
            );
        }
    }

    /// The value, or its problems with the path of the key they stand at.
    fn tried<T>(&mut self, key: &str, result: crate::Result<T>) -> Option<T> {
        match result {
            Ok(value) => Some(value),
            Err(error) => {
                for problem in error.problems() {
                    self.problem(problem.kind(), key, problem.found(), problem.expected());
                }
                None
            }
        }
    }

    fn problem(
        &mut self,
        kind: ErrorKind,
        key: &str,
        found: impl Into<String>,
        expected: impl Into<String>,
    ) {
        let at = if key.is_empty() {
            self.base.to_owned()
        } else {
            format!("{}.{key}", self.base)
        };
        self.problems.push(Problem::new(kind, at, found, expected));
    }
}
