//! The compiled part of the Python package `beamcore`: it converts and forwards, and knows nothing
//! that the core does not know. Docstrings are written for readers of Python.

#[macro_use]
mod record;

mod action;
mod camber;
mod characteristic;
mod classes;
mod combination;
mod concrete_age;
mod concrete_creep;
mod concrete_shrinkage;
mod convert;
mod error;
mod factors;
mod field;
mod forces;
mod initial_strain;
mod job;
mod limit;
mod load;
mod made;
mod material;
mod material_values;
mod member;
mod operand;
mod outline;
mod part;
mod placed;
mod quantity;
mod reading;
mod response;
mod run;
mod section;
mod shapes;
mod span;
mod stiffness;
mod strength;
mod stress;
mod support;
mod time;
mod transformed;
mod unit;
mod word;

use pyo3::prelude::*;

/// The compiled part of beamcore; import it from `beamcore`.
#[pymodule]
fn _core(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add("__version__", beamcore::VERSION)?;
    error::register(module)?;
    module.add_class::<unit::Unit>()?;
    module.add_class::<quantity::Quantity>()?;
    module.add_class::<strength::TimberStrength>()?;
    module.add_class::<strength::MetalStrength>()?;
    module.add_class::<concrete_creep::ConcreteCreep>()?;
    module.add_class::<concrete_shrinkage::ConcreteShrinkage>()?;
    concrete_age::register(module)?;
    characteristic::register(module)?;
    factors::register(module)?;
    module.add_class::<material::Material>()?;
    classes::register(module)?;
    module.add_class::<outline::Outline>()?;
    shapes::register(module)?;
    module.add_class::<initial_strain::InitialStrain>()?;
    module.add_class::<initial_strain::StrainPlane>()?;
    module.add_class::<part::Part>()?;
    module.add_class::<placed::PlacedPart>()?;
    module.add_class::<section::Section>()?;
    module.add_class::<forces::SectionForces>()?;
    module.add_class::<forces::PointStress>()?;
    module.add_class::<stiffness::Stiffness>()?;
    module.add_class::<stiffness::Principal>()?;
    module.add_class::<transformed::TransformedPart>()?;
    module.add_class::<transformed::TransformedSection>()?;
    support::register(module)?;
    load::register(module)?;
    action::register(module)?;
    combination::register(module)?;
    module.add_class::<span::Span>()?;
    module.add_class::<member::Member>()?;
    field::register(module)?;
    stress::register(module)?;
    camber::register(module)?;
    limit::register(module)?;
    module.add_class::<reading::Reading>()?;
    module.add_class::<response::Response>()?;
    job::register(module)
}
