//! The functions that make loads by which supports move and parts strain.

use crate::convert;
use crate::initial_strain::InitialStrain;
use crate::load::Load;
use crate::made::{Made, Recipe};
use crate::part::PartOrName;
use crate::support::SupportOrName;
use beamcore::member;
use pyo3::prelude::*;

/// A support, or the name of one, that sinks; the settlement is positive downward.
///
/// >>> settlement("post", 8*mm).kind
/// 'settlement'
#[pyfunction]
fn settlement(support: SupportOrName, settlement: &Bound<'_, PyAny>) -> PyResult<Load> {
    let name = support.into_name();
    let recipe = Recipe::call(settlement.py(), "settlement", (&name, settlement))?;
    let core = member::Load::Settlement {
        support: name,
        settlement: convert::read(settlement, "settlement.settlement")?,
    };
    Ok(Load(Made::new(core, recipe)))
}

/// A support, or the name of one, that turns the member's end or section with it; the rotation is
/// positive clockwise.
///
/// >>> imposed_rotation("wall", 2*mrad).kind
/// 'imposed_rotation'
#[pyfunction]
fn imposed_rotation(support: SupportOrName, rotation: &Bound<'_, PyAny>) -> PyResult<Load> {
    let name = support.into_name();
    let recipe = Recipe::call(rotation.py(), "imposed_rotation", (&name, rotation))?;
    let core = member::Load::ImposedRotation {
        support: name,
        rotation: convert::read(rotation, "imposed_rotation.rotation")?,
    };
    Ok(Load(Made::new(core, recipe)))
}

/// All parts, or those of a list (parts or their names), become warmer; each strains by its
/// thermal expansion. The change is positive where warmer.
///
/// >>> temperature(25*K, parts=["plate"]).kind
/// 'temperature'
#[pyfunction]
#[pyo3(signature = (change, parts=vec![]))]
fn temperature(change: &Bound<'_, PyAny>, parts: Vec<PartOrName>) -> PyResult<Load> {
    let parts: Vec<_> = parts.into_iter().map(PartOrName::into_name).collect();
    let recipe = Recipe::call(change.py(), "temperature", (change, &parts))?;
    let core = member::Load::Temperature {
        change: convert::read(change, "temperature.change")?,
        parts,
    };
    Ok(Load(Made::new(core, recipe)))
}

/// The top of the section becomes warmer than its bottom, linearly between them, with the mean over
/// the height unchanged.
///
/// difference: top minus bottom
///
/// >>> temperature_difference("15 K").kind
/// 'temperature_difference'
#[pyfunction]
fn temperature_difference(difference: &Bound<'_, PyAny>) -> PyResult<Load> {
    let core = member::Load::TemperatureDifference {
        difference: convert::read(difference, "temperature_difference.difference")?,
    };
    let recipe = Recipe::call(difference.py(), "temperature_difference", (difference,))?;
    Ok(Load(Made::new(core, recipe)))
}

/// A free strain of a part, or of the part of a name: moisture, shrinkage, a built-in curvature, a
/// locked strain.
///
/// strain: what the part would be strained by if it were alone
///
/// >>> free_strain("slab", InitialStrain("-0.3 permille")).kind
/// 'free_strain'
#[pyfunction]
fn free_strain(part: PartOrName, strain: &Bound<'_, InitialStrain>) -> PyResult<Load> {
    let name = part.into_name();
    let recipe = Recipe::call(strain.py(), "free_strain", (&name, strain))?;
    let core = member::Load::Strain {
        part: name,
        strain: strain.get().0,
    };
    Ok(Load(Made::new(core, recipe)))
}

/// Adds the functions to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_function(wrap_pyfunction!(settlement, module)?)?;
    module.add_function(wrap_pyfunction!(imposed_rotation, module)?)?;
    module.add_function(wrap_pyfunction!(temperature, module)?)?;
    module.add_function(wrap_pyfunction!(temperature_difference, module)?)?;
    module.add_function(wrap_pyfunction!(free_strain, module)?)
}
