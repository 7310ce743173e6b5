//! The class `Outline`.

use crate::error::raised;
use crate::made::{Recipe, Reduced};
use crate::quantity::Quantity;
use beamcore::Error;
use beamcore::section;
use beamcore::units::Length;
use pyo3::prelude::*;
use pyo3::types::PyTuple;

/// The outline of a part, without its place; all corners are sharp.
///
/// It is placed by the middle of its bounding box, or a polygon by the origin of its own
/// coordinates. Widths are along y (to the right), heights along z (up). Sizes that are impossible
/// are told when a section is made with it, or when it is asked for a value.
///
/// >>> outline = angle(100*mm, 100*mm, 10*mm)
/// >>> f"{outline.area.to(mm**2):.0f} mm2, {outline.centroid_z.to(mm) + 50:.3f} mm from below"
/// '1900 mm2, 28.684 mm from below'
#[pyclass(frozen, eq, module = "beamcore", from_py_object)]
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct Outline(pub(crate) section::Outline);

impl Outline {
    /// The outline, or the exception of all that is impossible about it.
    fn sound(&self, py: Python<'_>) -> PyResult<&section::Outline> {
        match Error::from_problems(self.0.problems("outline")) {
            Some(error) => Err(raised(py, &error)),
            None => Ok(&self.0),
        }
    }

    /// The function that makes the outline, and its arguments.
    fn call<'py>(&self, py: Python<'py>) -> PyResult<(&'static str, Bound<'py, PyTuple>)> {
        use section::Outline as Core;
        let (name, sizes) = match &self.0 {
            Core::Rectangle { width, height } => ("rectangle", vec![width, height]),
            Core::Polygon { points, holes } => {
                let vertices = |points: &[(Length, Length)]| {
                    let pairs = points.iter();
                    let pairs = pairs.map(|&(y, z)| (Quantity::of(y), Quantity::of(z)));
                    PyTuple::new(py, pairs.collect::<Vec<_>>())
                };
                let holes = holes.iter().map(|hole| vertices(hole));
                let holes = PyTuple::new(py, holes.collect::<PyResult<Vec<_>>>()?)?;
                return Ok(("polygon", (vertices(points)?, holes).into_pyobject(py)?));
            }
            Core::Disc { diameter } => ("disc", vec![diameter]),
            Core::Ring {
                diameter,
                wall_thickness,
            } => ("ring", vec![diameter, wall_thickness]),
            Core::IShape {
                height,
                top_width,
                top_thickness,
                bottom_width,
                bottom_thickness,
                web_thickness,
            } => {
                let top = [height, top_width, top_thickness];
                let bottom = [bottom_width, bottom_thickness, web_thickness];
                ("i_shape", [top, bottom].concat())
            }
            Core::Tee {
                height,
                width,
                flange_thickness,
                web_thickness,
            } => ("tee", vec![height, width, flange_thickness, web_thickness]),
            Core::Channel {
                height,
                width,
                flange_thickness,
                web_thickness,
            } => {
                let sizes = vec![height, width, flange_thickness, web_thickness];
                ("channel", sizes)
            }
            Core::Angle {
                height,
                width,
                thickness,
            } => ("angle", vec![height, width, thickness]),
            Core::HollowBox {
                width,
                height,
                side_thickness,
                plate_thickness,
            } => {
                let sizes = vec![width, height, side_thickness, plate_thickness];
                ("hollow_box", sizes)
            }
            other => return Err(unknown(other)),
        };
        let sizes: Vec<_> = sizes.into_iter().copied().map(Quantity::of).collect();
        Ok((name, PyTuple::new(py, sizes)?))
    }
}

/// The core may gain shapes; one without a function here cannot be made in Python either.
fn unknown(outline: &section::Outline) -> PyErr {
    let text = format!("{}: no function of this package makes it", outline.name());
    pyo3::exceptions::PyNotImplementedError::new_err(text)
}

#[pymethods]
impl Outline {
    /// The word used in documents: "rectangle", "polygon", "disc", "ring", "i_shape", "tee",
    /// "channel", "angle" or "box".
    #[getter]
    const fn kind(&self) -> &'static str {
        self.0.name()
    }

    /// Size along y, across the section, of the bounding box.
    #[getter]
    fn width(&self, py: Python<'_>) -> PyResult<Quantity> {
        Ok(Quantity::of(self.sound(py)?.width()))
    }

    /// Size along z, upright, of the bounding box.
    #[getter]
    fn height(&self, py: Python<'_>) -> PyResult<Quantity> {
        Ok(Quantity::of(self.sound(py)?.height()))
    }

    /// Area, int dA. Rectangle: b h. Disc: pi d^2/4. All others by Green's theorem, half the sum of
    /// y_i z_j - y_j z_i over the edges from point i to point j.
    #[getter]
    fn area(&self, py: Python<'_>) -> PyResult<Quantity> {
        Ok(Quantity::of(self.sound(py)?.area()))
    }

    /// y of the centroid, int y dA/A, from the point by which the outline is placed.
    #[getter]
    fn centroid_y(&self, py: Python<'_>) -> PyResult<Quantity> {
        Ok(Quantity::of(self.sound(py)?.centroid_y()))
    }

    /// z of the centroid, int z dA/A, from the point by which the outline is placed.
    #[getter]
    fn centroid_z(&self, py: Python<'_>) -> PyResult<Quantity> {
        Ok(Quantity::of(self.sound(py)?.centroid_z()))
    }

    /// Second moment of area about the horizontal axis through its own centroid,
    /// int (z - z_c)^2 dA. Rectangle: b h^3/12. Disc: pi d^4/64.
    #[getter]
    fn second_moment_yy(&self, py: Python<'_>) -> PyResult<Quantity> {
        Ok(Quantity::of(self.sound(py)?.second_moment_yy()))
    }

    /// Second moment of area about the upright axis through its own centroid,
    /// int (y - y_c)^2 dA. Rectangle: h b^3/12. Disc: pi d^4/64.
    #[getter]
    fn second_moment_zz(&self, py: Python<'_>) -> PyResult<Quantity> {
        Ok(Quantity::of(self.sound(py)?.second_moment_zz()))
    }

    /// Product moment of area, int (y - y_c)(z - z_c) dA: exactly zero for a shape with an upright
    /// or level axis of symmetry, negative for an angle with its heel at the bottom left.
    #[getter]
    fn second_moment_yz(&self, py: Python<'_>) -> PyResult<Quantity> {
        Ok(Quantity::of(self.sound(py)?.second_moment_yz()))
    }

    /// Length of all edges, those of holes too. Disc: pi d.
    #[getter]
    fn perimeter(&self, py: Python<'_>) -> PyResult<Quantity> {
        Ok(Quantity::of(self.sound(py)?.perimeter()))
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        let (name, args) = self.call(py)?;
        Recipe::call(py, name, args)?.reduce(py)
    }

    fn __repr__(&self) -> String {
        match &self.0 {
            // The size of one that is no loop has no meaning.
            section::Outline::Polygon { points, holes } => {
                format!(
                    "<polygon of {} points, {} holes>",
                    points.len(),
                    holes.len()
                )
            }
            other => format!("<{} {} x {}>", other.name(), other.width(), other.height()),
        }
    }
}
