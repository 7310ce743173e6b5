//! The compiled part of the Python package `beamcore`: it converts and forwards, and knows nothing
//! that the core does not know. Docstrings are written for readers of Python.

#[macro_use]
mod record;

mod action;
mod band;
mod camber;
mod change;
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
mod gamma;
mod hinge;
mod initial_strain;
mod job;
mod joint;
mod joint_values;
mod layer;
mod layer_response;
mod limit;
mod load;
mod load_axial;
mod load_imposed;
mod made;
mod material;
mod material_values;
mod member;
mod member_given;
mod member_values;
mod operand;
mod outline;
mod part;
mod placed;
mod placed_joint;
mod quantity;
mod reaction;
mod reading;
mod response;
mod response_layers;
mod run;
mod section;
mod section_layers;
mod shapes;
mod simplified;
mod simplified_layer;
mod simplified_span;
mod sine_layers;
mod span;
mod stiffness;
mod strength;
mod stress;
mod support;
mod time;
mod transformed;
mod unit;
mod word;

use beamcore::section::SHEAR_STIFFNESS_DEFINITION;
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
    module.add_class::<layer::Layer>()?;
    module.add_class::<layer::MergedLayer>()?;
    module.add_class::<band::Band>()?;
    module.add_class::<joint::Joint>()?;
    module.add_class::<placed_joint::PlacedJoint>()?;
    module.add("SHEAR_STIFFNESS_DEFINITION", SHEAR_STIFFNESS_DEFINITION)?;
    module.add_class::<section::Section>()?;
    module.add_class::<forces::SectionForces>()?;
    module.add_class::<forces::PointStress>()?;
    module.add_class::<stiffness::Stiffness>()?;
    module.add_class::<stiffness::Principal>()?;
    module.add_class::<transformed::TransformedPart>()?;
    module.add_class::<transformed::TransformedSection>()?;
    support::register(module)?;
    change::register(module)?;
    module.add_class::<hinge::Hinge>()?;
    module.add_class::<hinge::Anchor>()?;
    load::register(module)?;
    load_axial::register(module)?;
    load_imposed::register(module)?;
    action::register(module)?;
    combination::register(module)?;
    module.add_class::<span::Span>()?;
    module.add_class::<member::Member>()?;
    field::register(module)?;
    stress::register(module)?;
    camber::register(module)?;
    limit::register(module)?;
    module.add_class::<reading::Reading>()?;
    module.add_class::<reaction::Reaction>()?;
    layer_response::register(module)?;
    module.add_class::<response::Response>()?;
    simplified::register(module)?;
    simplified_span::register(module)?;
    job::register(module)
}
