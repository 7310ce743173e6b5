//! The class `Field`: a result along the member.

use crate::convert;
use crate::error::OrRaise;
use crate::made::{Made, Reduced};
use crate::quantity::Quantity;
use crate::run::run;
use beamcore::field;
use beamcore::units::{
    Angle, Curvature, Force, Length, LineLoad, Moment, Quantity as CoreQuantity, ShearFlow, Stress,
};
use numpy::{PyArray1, PyReadonlyArray1};
use pyo3::exceptions::{PyAttributeError, PyTypeError};
use pyo3::prelude::*;

record! {
    /// A greatest or least value and the place where it stands.
    ///
    /// >>> Extreme(8.6*mm, at=2.1*m)
    /// Extreme(value=8.6 mm, at=2.1 m)
    Extreme {
        /// The value, with its sign.
        value: Quantity,
        /// The place, measured from the left end of the member.
        at: Quantity,
    }
}

record! {
    /// The values just left and just right of a place.
    Sides {
        /// The value just left of the place.
        left: Quantity,
        /// The value just right of the place.
        right: Quantity,
    }
}

/// A field of any of the quantities that a member has along its length.
#[derive(Debug)]
pub(crate) enum Line {
    /// Downward or sideways.
    Movement(field::Field<Length>),
    /// Of the axis or of the section.
    Slope(field::Field<Angle>),
    Curvature(field::Field<Curvature>),
    /// Across or along the member.
    Force(field::Field<Force>),
    Moment(field::Field<Moment>),
    Stress(field::Field<Stress>),
    /// Along a joint.
    Flow(field::Field<ShearFlow>),
    /// Square to a joint.
    Pressure(field::Field<LineLoad>),
}

/// The same expression for the field inside any kind of line.
macro_rules! each {
    ($line:expr, $field:ident => $result:expr) => {
        match $line {
            Line::Movement($field) => $result,
            Line::Slope($field) => $result,
            Line::Curvature($field) => $result,
            Line::Force($field) => $result,
            Line::Moment($field) => $result,
            Line::Stress($field) => $result,
            Line::Flow($field) => $result,
            Line::Pressure($field) => $result,
        }
    };
}

impl Line {
    /// The SI unit of the values, as it ends the name of their method.
    const fn unit_name(&self) -> &'static str {
        match self {
            Self::Movement(_) => "m",
            Self::Slope(_) => "rad",
            Self::Curvature(_) => "per_m",
            Self::Force(_) => "N",
            Self::Moment(_) => "Nm",
            Self::Stress(_) => "Pa",
            Self::Flow(_) | Self::Pressure(_) => "N_per_m",
        }
    }

    /// The SI values at places in m.
    fn values(&self, x_m: &[f64]) -> beamcore::Result<Vec<f64>> {
        let at = |&x: &f64| Length::from_m(x);
        each!(self, field => x_m.iter().map(|x| Ok(field.value(at(x))?.si())).collect())
    }
}

/// A quantity along the member, exact between stations and evaluated anywhere.
///
/// Deflection is positive downward, movement sideways towards positive y, slope is dw/dx, shear
/// force is V = dM/dx, a moment is positive where it stretches the bottom, a tensile stress or axial
/// force is positive, slip is that of the upper layer over the lower one, and flow has its sign. At
/// a support or a point load a shear force has two values.
#[pyclass(frozen, module = "beamcore")]
#[derive(Debug)]
pub(crate) struct Field(pub(crate) Made<Line>);

/// An extreme of a field of the core.
pub(crate) fn extreme<Q: CoreQuantity>(found: field::Extreme<Q>) -> Extreme {
    Extreme {
        value: Quantity::of(found.value),
        at: Quantity::of(found.at),
    }
}

impl Field {
    /// The values as an array, if `unit_name` is the unit of this field.
    fn array<'py>(&self, unit_name: &str, x_m: &Bound<'py, PyAny>) -> Values<'py> {
        let right = self.0.unit_name();
        if unit_name != right {
            return Err(PyAttributeError::new_err(format!(
                "this field has no values_{unit_name}: its values are values_{right}"
            )));
        }
        let (places, line) = (numbers(x_m)?, &self.0.inner);
        let values = run(x_m.py(), || line.values(&places))?;
        Ok(PyArray1::from_vec(x_m.py(), values))
    }
}

/// The numbers of a list or an array of one dimension.
fn numbers(x_m: &Bound<'_, PyAny>) -> PyResult<Vec<f64>> {
    let array = x_m.py().import("numpy")?.call_method1("asarray", (x_m,))?;
    // NumPy would read texts as numbers and drop the imaginary part of others.
    let kind: char = array.getattr("dtype")?.getattr("kind")?.extract()?;
    if !matches!(kind, 'f' | 'i' | 'u') || array.getattr("ndim")?.extract::<usize>()? != 1 {
        return Err(PyTypeError::new_err(
            "a list or an array of numbers, of one dimension, is needed",
        ));
    }
    let array: PyReadonlyArray1<'_, f64> = array.call_method1("astype", ("f8",))?.extract()?;
    Ok(array.as_array().iter().copied().collect())
}

type Values<'py> = PyResult<Bound<'py, PyArray1<f64>>>;

#[pymethods]
impl Field {
    /// The value of greatest magnitude, with its sign and place; the leftmost of equals.
    #[getter]
    fn greatest(&self) -> Extreme {
        each!(&self.0.inner, field => extreme(field.greatest()))
    }

    /// The algebraically greatest value with its place; the leftmost of equals.
    #[getter]
    fn maximum(&self) -> Extreme {
        each!(&self.0.inner, field => extreme(field.maximum()))
    }

    /// The algebraically least value with its place; the leftmost of equals.
    #[getter]
    fn minimum(&self) -> Extreme {
        each!(&self.0.inner, field => extreme(field.minimum()))
    }

    /// The value at a place: where there are two, the one just right of it (at the right end of
    /// the member, the one just left of it).
    fn value(&self, at: &Bound<'_, PyAny>) -> PyResult<Quantity> {
        let place = convert::read(at, "at")?;
        each!(&self.0.inner, field => Ok(Quantity::of(field.value(place).or_raise(at.py())?)))
    }

    /// The values on both sides of a place.
    fn sides(&self, at: &Bound<'_, PyAny>) -> PyResult<Sides> {
        let place = convert::read(at, "at")?;
        each!(&self.0.inner, field => {
            let sides = field.sides(place).or_raise(at.py())?;
            Ok(Sides { left: Quantity::of(sides.left), right: Quantity::of(sides.right) })
        })
    }

    /// Deflections (positive downward), movements sideways (towards positive y) or slips in m at
    /// places x in m, of a list or an array.
    fn values_m<'py>(&self, x_m: &Bound<'py, PyAny>) -> Values<'py> {
        self.array("m", x_m)
    }

    /// Slopes or rotations in rad at places x in m, of a list or an array.
    fn values_rad<'py>(&self, x_m: &Bound<'py, PyAny>) -> Values<'py> {
        self.array("rad", x_m)
    }

    /// Curvatures in 1/m at places x in m, of a list or an array; positive sagging.
    fn values_per_m<'py>(&self, x_m: &Bound<'py, PyAny>) -> Values<'py> {
        self.array("per_m", x_m)
    }

    /// Shear forces, or axial forces (tension positive), in N at places x in m, of a list or an array.
    #[pyo3(name = "values_N")]
    fn values_n<'py>(&self, x_m: &Bound<'py, PyAny>) -> Values<'py> {
        self.array("N", x_m)
    }

    /// Moments in N m at places x in m, of a list or an array; positive sagging.
    #[pyo3(name = "values_Nm")]
    fn values_nm<'py>(&self, x_m: &Bound<'py, PyAny>) -> Values<'py> {
        self.array("Nm", x_m)
    }

    /// Stresses in Pa at places x in m, of a list or an array; tension positive.
    #[pyo3(name = "values_Pa")]
    fn values_pa<'py>(&self, x_m: &Bound<'py, PyAny>) -> Values<'py> {
        self.array("Pa", x_m)
    }

    /// Flows or pressures in N/m at places x in m, of a list or an array.
    #[pyo3(name = "values_N_per_m")]
    fn values_n_per_m<'py>(&self, x_m: &Bound<'py, PyAny>) -> Values<'py> {
        self.array("N_per_m", x_m)
    }

    /// The places in m where the pieces of the field meet: ends, supports, point loads, ends of
    /// line loads.
    #[getter]
    fn stations_m<'py>(&self, py: Python<'py>) -> Bound<'py, PyArray1<f64>> {
        let stations = each!(&self.0.inner, field => field.stations());
        PyArray1::from_iter(py, stations.into_iter().map(Length::si))
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }
}

/// Adds the classes to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_class::<Extreme>()?;
    module.add_class::<Sides>()?;
    module.add_class::<Field>()
}
