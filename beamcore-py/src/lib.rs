//! The compiled part of the Python package `beamcore`: it converts and forwards, and knows nothing
//! that the core does not know. Docstrings are written for readers of Python.

#[macro_use]
mod record;

mod action;
mod camber;
mod concrete_creep;
mod convert;
mod error;
mod field;
mod job;
mod made;
mod material;
mod member;
mod operand;
mod part;
mod quantity;
mod response;
mod run;
mod section;
mod strength;
mod stress;
mod support;
mod time;
mod unit;

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
    material::register(module)?;
    part::register(module)?;
    section::register(module)?;
    support::register(module)?;
    action::register(module)?;
    module.add_class::<member::Member>()?;
    field::register(module)?;
    stress::register(module)?;
    camber::register(module)?;
    response::register(module)?;
    job::register(module)
}
