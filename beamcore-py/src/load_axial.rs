//! The functions that make loads of the plan and along the member.

use crate::convert::Inputs;
use crate::layer::stretch;
use crate::load::Load;
use crate::made::{Made, Recipe};
use beamcore::member::{self, Tendon};
use beamcore::units::Length;
use pyo3::exceptions::PyTypeError;
use pyo3::prelude::*;
use pyo3::types::{PyDict, PyString};

/// A line load per length of the plan, as snow on a pitched member, positive downward; other line
/// loads count per length of the member.
///
/// It acts from from_ to to, measured along the member, which are given together, or over the
/// whole member.
///
/// >>> plan(0.8*kN/m).kind
/// 'plan'
#[pyfunction]
#[pyo3(signature = (load, from_=None, to=None))]
fn plan<'py>(
    load: &Bound<'py, PyAny>,
    from_: Option<&Bound<'py, PyAny>>,
    to: Option<&Bound<'py, PyAny>>,
) -> PyResult<Load> {
    let mut inputs = Inputs::default();
    let line = inputs.read(load, "plan.load")?;
    let stretch = stretch(&mut inputs, "plan", from_, to)?;
    let core = line
        .zip(stretch)
        .map(|(load, stretch)| member::Load::Plan { load, stretch });
    let core = inputs.done(load.py(), core)?;
    let recipe = Recipe::call(load.py(), "plan", (load, from_, to))?;
    Ok(Load(Made::new(core, recipe)))
}

/// A force along the member at a place, positive to the right, at a height of the section's
/// coordinates.
///
/// >>> axial(-20*kN, at=0*m, height=0*mm).kind
/// 'axial'
#[pyfunction]
fn axial<'py>(
    load: &Bound<'py, PyAny>,
    at: &Bound<'py, PyAny>,
    height: &Bound<'py, PyAny>,
) -> PyResult<Load> {
    let mut inputs = Inputs::default();
    let force = inputs.read(load, "axial.load")?;
    let place = inputs.read(at, "axial.at")?;
    let level = inputs.read(height, "axial.height")?;
    let core = || {
        Some(member::Load::Axial {
            load: force?,
            at: place?,
            height: level?,
        })
    };
    let core = inputs.done(load.py(), core())?;
    let recipe = Recipe::call(load.py(), "axial", (load, at, height))?;
    Ok(Load(Made::new(core, recipe)))
}

/// The points of a tendon; `None` is a problem that was kept.
fn points(
    inputs: &mut Inputs,
    points: &[Bound<'_, PyAny>],
    shape: &str,
) -> PyResult<Option<Vec<(Length, Length)>>> {
    let mut found = Some(Vec::with_capacity(points.len()));
    for (i, point) in points.iter().enumerate() {
        let path = format!("prestress.tendon.{shape}[{i}]");
        let pair = if point.is_instance_of::<PyString>() {
            None
        } else {
            point.extract::<[Bound<'_, PyAny>; 2]>().ok()
        };
        let Some([at, height]) = pair else {
            return Err(PyTypeError::new_err(format!(
                "{path}: a point (at, height) such as (2*m, -80*mm) is needed, not {point:?}"
            )));
        };
        let at = inputs.read(&at, &format!("{path}.at"))?;
        let height = inputs.read(&height, &format!("{path}.height"))?;
        found = found.zip(at.zip(height)).map(|(mut found, point)| {
            found.push(point);
            found
        });
    }
    Ok(found)
}

/// A tendon: it pulls its two anchors towards each other and presses on the member where it turns.
///
/// - force: in the tendon, positive in tension
/// - draped: its points (at, height) from left to right, between which it runs straight; the first
///   and the last are the anchors, so that a straight tendon has two points
/// - parabolic: three points of one parabola, instead
///
/// Heights are those of the section's coordinates.
///
/// >>> prestress(80*kN, draped=[(0*m, 0*mm), (3*m, -120*mm), (6*m, 0*mm)]).kind
/// 'prestress'
#[pyfunction]
#[pyo3(signature = (force, *, draped=None, parabolic=None))]
fn prestress<'py>(
    force: &Bound<'py, PyAny>,
    draped: Option<Vec<Bound<'py, PyAny>>>,
    parabolic: Option<Vec<Bound<'py, PyAny>>>,
) -> PyResult<Load> {
    let py = force.py();
    let keywords = PyDict::new(py);
    let mut inputs = Inputs::default();
    let pull = inputs.read(force, "prestress.force")?;
    let tendon = match (draped, parabolic) {
        (Some(draped), None) => {
            keywords.set_item("draped", &draped)?;
            points(&mut inputs, &draped, "draped")?.map(Tendon::Draped)
        }
        (None, Some(parabolic)) => {
            let found = points(&mut inputs, &parabolic, "parabolic")?;
            let three = |found: Vec<_>| <[_; 3]>::try_from(found).map_err(|found| found.len());
            keywords.set_item("parabolic", parabolic)?;
            match found.map(three) {
                None => None,
                Some(Ok(points)) => Some(Tendon::Parabolic(points)),
                Some(Err(count)) => {
                    return Err(PyTypeError::new_err(format!(
                        "prestress: a parabola runs through three points, {count} were given"
                    )));
                }
            }
        }
        _ => {
            return Err(PyTypeError::new_err(
                "prestress: neither draped alone nor parabolic alone was given; one or the other \
                 is needed, for example draped=[(0*m, 0*mm), (6*m, 0*mm)]",
            ));
        }
    };
    let core = pull
        .zip(tendon)
        .map(|(force, tendon)| member::Load::Prestress { force, tendon });
    let core = inputs.done(py, core)?;
    let recipe = Recipe::call(py, "prestress", (force,))?.with(&keywords);
    Ok(Load(Made::new(core, recipe)))
}

/// Adds the functions to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_function(wrap_pyfunction!(plan, module)?)?;
    module.add_function(wrap_pyfunction!(axial, module)?)?;
    module.add_function(wrap_pyfunction!(prestress, module)?)
}
