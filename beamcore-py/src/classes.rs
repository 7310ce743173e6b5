//! Materials of strength classes.

use crate::concrete_creep::ConcreteCreepOrNumber;
use crate::convert::{self, Inputs};
use crate::error::OrRaise;
use crate::made::{Made, Recipe};
use crate::material::Material;
use beamcore::material::{self, ServiceClass};
use pyo3::prelude::*;

/// Solid or glued laminated timber: E_0,mean and E_0,05 along the grain, G_mean, densities,
/// characteristic strengths, and k_def as creep factor.
///
/// strength_class: C14 to C50, D18 to D70 (EN 338:2016), GL20h to GL32h or GL20c to GL32c
/// (EN 14080:2013), from memory; service_class: 1, 2 or 3 (EN 1995-1-1:2004). Thermal expansion
/// along the grain 5e-6/K: common practice, no source.
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

/// Structural steel: E = 210 GPa, G = 81 GPa, 7850 kg/m3, 12e-6/K, no creep; no strengths, which
/// depend on the thickness: see steel_of_thickness.
///
/// strength_class: S235, S275, S355, S420, S450 or S460; S420 and S460 also with N or M
/// (EN 1993-1-1:2005 3.2.6, density EN 1991-1-1:2002 Table A.4), from memory.
///
/// >>> steel("S275").density
/// 7850 kg/m**3
#[pyfunction]
fn steel(py: Python<'_>, strength_class: &str) -> PyResult<Material> {
    let material = material::steel(strength_class).or_raise(py)?;
    let recipe = Recipe::call(py, "steel", (strength_class,))?;
    Ok(Material(Made::new(material, recipe)))
}

/// Structural steel as of steel, with the yield strength f_y and the ultimate strength f_u of a
/// nominal thickness as characteristic strengths.
///
/// thickness: from 3 mm to 100 mm; of S420 and S460 to 40 mm (EN 10025-2, -3, -4:2004, from memory;
/// not the simplified EN 1993-1-1 Table 3.1).
///
/// >>> steel_of_thickness("S355", 20*mm).characteristic_strength.yield_stress
/// 345 MPa
#[pyfunction]
fn steel_of_thickness(strength_class: &str, thickness: &Bound<'_, PyAny>) -> PyResult<Material> {
    let py = thickness.py();
    let core = convert::read(thickness, "thickness")?;
    let material = material::steel_of_thickness(strength_class, core).or_raise(py)?;
    let recipe = Recipe::call(py, "steel_of_thickness", (strength_class, thickness))?;
    Ok(Material(Made::new(material, recipe)))
}

/// Aluminium as an extruded profile of a thickness: E = 70 GPa, G = 27 GPa, 2700 kg/m3, 23e-6/K, no
/// creep, 0.2 % proof strength f_o and ultimate strength f_u away from welds.
///
/// alloy_and_temper: EN AW-6060 T6, EN AW-6063 T6 or EN AW-6082 T6; thickness: from 0.6 mm to
/// 15 mm, of EN AW-6063 T6 to 25 mm (EN 1999-1-1:2007 3.2.5 and Table 3.2b, from memory).
///
/// >>> aluminium("EN AW-6082 T6", "8 mm").modulus
/// 70 GPa
#[pyfunction]
fn aluminium(alloy_and_temper: &str, thickness: &Bound<'_, PyAny>) -> PyResult<Material> {
    let py = thickness.py();
    let core = convert::read(thickness, "thickness")?;
    let material = material::aluminium(alloy_and_temper, core).or_raise(py)?;
    let recipe = Recipe::call(py, "aluminium", (alloy_and_temper, thickness))?;
    Ok(Material(Made::new(material, recipe)))
}

/// Concrete: the rounded E_cm of its class, nu = 0.2, 10e-6/K, f_ck, f_cm, f_ctm; 2500 kg/m3 with
/// its bars (common practice, no source). Its creep must be said.
///
/// strength_class: C12/15 to C90/105 (EN 1992-1-1:2004 Table 3.1, 3.1.3), from memory;
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

/// Adds the functions to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_function(wrap_pyfunction!(timber, module)?)?;
    module.add_function(wrap_pyfunction!(steel, module)?)?;
    module.add_function(wrap_pyfunction!(steel_of_thickness, module)?)?;
    module.add_function(wrap_pyfunction!(aluminium, module)?)?;
    module.add_function(wrap_pyfunction!(concrete, module)?)
}
