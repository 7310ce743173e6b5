//! The functions that make outlines.

use crate::convert::Inputs;
use crate::outline::Outline;
use beamcore::section;
use beamcore::units::Length;
use pyo3::exceptions::PyTypeError;
use pyo3::prelude::*;
use pyo3::types::PyString;

/// The lengths of a shape with their names, read all before any problem is raised.
fn lengths<const N: usize>(
    shape: &str,
    sizes: [(&str, &Bound<'_, PyAny>); N],
) -> PyResult<[Length; N]> {
    let mut inputs = Inputs::default();
    let mut found = Some([Length::ZERO; N]);
    for (i, (name, size)) in sizes.iter().enumerate() {
        let length = inputs.read(size, &format!("{shape}.{name}"))?;
        found = found.zip(length).map(|(mut found, length)| {
            found[i] = length;
            found
        });
    }
    let py = sizes[0].1.py();
    inputs.done(py, found)
}

/// A rectangle of a width (along y) and a height (along z).
///
/// >>> rectangle(75*mm, "220 mm").area.to("mm2")
/// 16500.0
#[pyfunction]
fn rectangle(width: &Bound<'_, PyAny>, height: &Bound<'_, PyAny>) -> PyResult<Outline> {
    let sizes = [("width", width), ("height", height)];
    let [width, height] = lengths("rectangle", sizes)?;
    Ok(Outline(section::rectangle(width, height)))
}

/// The y and z of a point of a polygon as it is given.
fn pair<'py>(point: &Bound<'py, PyAny>, path: &str) -> PyResult<[Bound<'py, PyAny>; 2]> {
    let pair = if point.is_instance_of::<PyString>() {
        None
    } else {
        point.extract().ok()
    };
    pair.ok_or_else(|| {
        PyTypeError::new_err(format!(
            "{path}: a point (y, z) such as (0*mm, 60*mm) is needed, not {point:?}"
        ))
    })
}

/// The points of a loop; `None` is a problem that was kept.
fn vertices(
    inputs: &mut Inputs,
    points: &[Bound<'_, PyAny>],
    path: &str,
) -> PyResult<Option<Vec<(Length, Length)>>> {
    let mut found = Some(Vec::with_capacity(points.len()));
    for (i, point) in points.iter().enumerate() {
        let [y, z] = pair(point, &format!("{path}[{i}]"))?;
        let y = inputs.read(&y, &format!("{path}[{i}][0]"))?;
        let z = inputs.read(&z, &format!("{path}[{i}][1]"))?;
        found = found.zip(y.zip(z)).map(|(mut found, point)| {
            found.push(point);
            found
        });
    }
    Ok(found)
}

/// A polygon through points (y, z), with holes of such points each, in its own coordinates.
///
/// The loops close by themselves and may be given in either direction.
///
/// >>> triangle = polygon([(0*mm, 0*mm), (30*mm, 0*mm), (0*mm, 60*mm)])
/// >>> triangle.area, triangle.centroid_z
/// (900 mm**2, 20 mm)
#[pyfunction]
#[pyo3(signature = (points, holes=vec![]))]
#[expect(
    clippy::needless_pass_by_value,
    reason = "Python's arguments are taken as owned"
)]
fn polygon(
    py: Python<'_>,
    points: Vec<Bound<'_, PyAny>>,
    holes: Vec<Vec<Bound<'_, PyAny>>>,
) -> PyResult<Outline> {
    let mut inputs = Inputs::default();
    let outer = vertices(&mut inputs, &points, "polygon.points")?;
    let mut loops = Some(Vec::with_capacity(holes.len()));
    for (i, hole) in holes.iter().enumerate() {
        let hole = vertices(&mut inputs, hole, &format!("polygon.holes[{i}]"))?;
        loops = loops.zip(hole).map(|(mut loops, hole)| {
            loops.push(hole);
            loops
        });
    }
    let (points, holes) = inputs.done(py, outer.zip(loops))?;
    Ok(Outline(section::polygon(points, holes)))
}

/// A full disc: a round bar. Its area is pi d^2/4.
///
/// >>> disc(20*mm).height
/// 20 mm
#[pyfunction]
fn disc(diameter: &Bound<'_, PyAny>) -> PyResult<Outline> {
    let [diameter] = lengths("disc", [("diameter", diameter)])?;
    Ok(Outline(section::disc(diameter)))
}

/// A round tube of an outer diameter, with a wall less than half of it.
///
/// >>> ring(60*mm, wall_thickness=5*mm).width
/// 60 mm
#[pyfunction]
fn ring(diameter: &Bound<'_, PyAny>, wall_thickness: &Bound<'_, PyAny>) -> PyResult<Outline> {
    let sizes = [("diameter", diameter), ("wall_thickness", wall_thickness)];
    let [diameter, wall_thickness] = lengths("ring", sizes)?;
    Ok(Outline(section::ring(diameter, wall_thickness)))
}

/// Two flanges joined by a web in their middle; the height is overall.
///
/// >>> beam = i_shape(200*mm, 100*mm, 10*mm, 120*mm, 10*mm, 6*mm)
/// >>> beam.area  # 100 x 10 + 120 x 10 + 180 x 6
/// 3280 mm**2
#[pyfunction]
fn i_shape(
    height: &Bound<'_, PyAny>,
    top_width: &Bound<'_, PyAny>,
    top_thickness: &Bound<'_, PyAny>,
    bottom_width: &Bound<'_, PyAny>,
    bottom_thickness: &Bound<'_, PyAny>,
    web_thickness: &Bound<'_, PyAny>,
) -> PyResult<Outline> {
    let sizes = [
        ("height", height),
        ("top_width", top_width),
        ("top_thickness", top_thickness),
        ("bottom_width", bottom_width),
        ("bottom_thickness", bottom_thickness),
        ("web_thickness", web_thickness),
    ];
    let [height, top_b, top_t, bottom_b, bottom_t, web_t] = lengths("i_shape", sizes)?;
    let outline = section::i_shape(height, top_b, top_t, bottom_b, bottom_t, web_t);
    Ok(Outline(outline))
}

/// The four sizes that a tee and a channel have.
fn flanged(
    shape: &str,
    [height, width, flange_thickness, web_thickness]: [&Bound<'_, PyAny>; 4],
) -> PyResult<[Length; 4]> {
    let sizes = [
        ("height", height),
        ("width", width),
        ("flange_thickness", flange_thickness),
        ("web_thickness", web_thickness),
    ];
    lengths(shape, sizes)
}

/// A flange on top of a web in its middle; the height is overall.
///
/// >>> tee(150*mm, 200*mm, flange_thickness=20*mm, web_thickness=10*mm).centroid_y
/// 0 m
#[pyfunction]
fn tee(
    height: &Bound<'_, PyAny>,
    width: &Bound<'_, PyAny>,
    flange_thickness: &Bound<'_, PyAny>,
    web_thickness: &Bound<'_, PyAny>,
) -> PyResult<Outline> {
    let [height, width, flange, web] =
        flanged("tee", [height, width, flange_thickness, web_thickness])?;
    Ok(Outline(section::tee(height, width, flange, web)))
}

/// A web on the left with two equal flanges to the right; height and width are overall.
///
/// >>> channel(100*mm, 40*mm, flange_thickness=8*mm, web_thickness=6*mm).centroid_z
/// 0 m
#[pyfunction]
fn channel(
    height: &Bound<'_, PyAny>,
    width: &Bound<'_, PyAny>,
    flange_thickness: &Bound<'_, PyAny>,
    web_thickness: &Bound<'_, PyAny>,
) -> PyResult<Outline> {
    let [height, width, flange, web] =
        flanged("channel", [height, width, flange_thickness, web_thickness])?;
    Ok(Outline(section::channel(height, width, flange, web)))
}

/// An upright leg on the left and a level leg at the bottom, of one thickness, with the heel at the
/// bottom left; height and width are overall.
///
/// >>> angle(90*mm, 70*mm, 8*mm).perimeter
/// 320 mm
#[pyfunction]
fn angle(
    height: &Bound<'_, PyAny>,
    width: &Bound<'_, PyAny>,
    thickness: &Bound<'_, PyAny>,
) -> PyResult<Outline> {
    let sizes = [
        ("height", height),
        ("width", width),
        ("thickness", thickness),
    ];
    let [height, width, thickness] = lengths("angle", sizes)?;
    Ok(Outline(section::angle(height, width, thickness)))
}

/// A rectangular tube; width and height are overall, the sides upright, the plates level.
///
/// >>> hollow_box(100*mm, 200*mm, side_thickness=5*mm, plate_thickness=8*mm).kind
/// 'box'
#[pyfunction]
fn hollow_box(
    width: &Bound<'_, PyAny>,
    height: &Bound<'_, PyAny>,
    side_thickness: &Bound<'_, PyAny>,
    plate_thickness: &Bound<'_, PyAny>,
) -> PyResult<Outline> {
    let sizes = [
        ("width", width),
        ("height", height),
        ("side_thickness", side_thickness),
        ("plate_thickness", plate_thickness),
    ];
    let [width, height, side, plate] = lengths("hollow_box", sizes)?;
    Ok(Outline(section::hollow_box(width, height, side, plate)))
}

/// Adds the functions to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_function(wrap_pyfunction!(rectangle, module)?)?;
    module.add_function(wrap_pyfunction!(polygon, module)?)?;
    module.add_function(wrap_pyfunction!(disc, module)?)?;
    module.add_function(wrap_pyfunction!(ring, module)?)?;
    module.add_function(wrap_pyfunction!(i_shape, module)?)?;
    module.add_function(wrap_pyfunction!(tee, module)?)?;
    module.add_function(wrap_pyfunction!(channel, module)?)?;
    module.add_function(wrap_pyfunction!(angle, module)?)?;
    module.add_function(wrap_pyfunction!(hollow_box, module)?)
}
