//! The class `PartStress`.

use crate::field::{Field, Line};
use crate::made::{Made, Recipe, Reduced};
use crate::quantity::Quantity;
use beamcore::stress;
use pyo3::prelude::*;

record! {
    /// A greatest stress with its place along the member and in the section.
    StressExtreme {
        /// The stress, tension positive.
        value: Quantity,
        /// The place along the member.
        at: Quantity,
        /// The y of the fibre in the section's coordinates; the middle of the part where the member
        /// is held sideways, for then all points of one height are stressed alike.
        y: Quantity,
        /// The height z of the fibre in the section's coordinates.
        z: Quantity,
    }
}

record! {
    /// The greatest utilisation of a part: stress over design strength.
    Utilisation {
        /// The ratio; above 1 the part is overstressed.
        value: f64,
        /// The place along the member.
        at: Quantity,
    }
}

/// The normal stress in one part: along the fibres that can be stressed most, and along its own
/// centroid.
///
/// sigma = -E_i M ((z - z_n) + r (y - y_n))/EI, tension positive, with r = 0 and EI = EI_yy where
/// the member is held sideways, else r = -EI_yz/EI_zz and EI = EI_yy - EI_yz^2/EI_zz; at the end of
/// the life the sum of two such terms, one per share of the load, each with its own moduli.
#[pyclass(frozen, module = "beamcore")]
#[derive(Debug)]
pub(crate) struct PartStress(pub(crate) Made<stress::PartStress>);

fn extreme(found: stress::StressExtreme) -> StressExtreme {
    StressExtreme {
        value: Quantity::of(found.value),
        at: Quantity::of(found.at),
        y: Quantity::of(found.y),
        z: Quantity::of(found.z),
    }
}

#[pymethods]
impl PartStress {
    /// The stress along the bottom fibre of the part; of a member that is free sideways, the lowest
    /// in the direction of bending.
    #[getter]
    fn bottom(slf: &Bound<'_, Self>) -> PyResult<Field> {
        let line = Line::Stress(slf.get().0.bottom());
        Ok(Field(Made::new(line, Recipe::property(slf, "bottom")?)))
    }

    /// The stress along the part's own centroid.
    #[getter]
    fn centroid(slf: &Bound<'_, Self>) -> PyResult<Field> {
        let line = Line::Stress(slf.get().0.centroid());
        Ok(Field(Made::new(line, Recipe::property(slf, "centroid")?)))
    }

    /// The stress along the top fibre of the part; of a member that is free sideways, the highest
    /// in the direction of bending.
    #[getter]
    fn top(slf: &Bound<'_, Self>) -> PyResult<Field> {
        let line = Line::Stress(slf.get().0.top());
        Ok(Field(Made::new(line, Recipe::property(slf, "top")?)))
    }

    /// The greatest tension in the part (the algebraically greatest stress) with its place.
    #[getter]
    fn greatest_tension(&self) -> StressExtreme {
        extreme(self.0.greatest_tension())
    }

    /// The greatest compression in the part (the algebraically least stress) with its place.
    #[getter]
    fn greatest_compression(&self) -> StressExtreme {
        extreme(self.0.greatest_compression())
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        self.0.reduce(py)
    }
}

/// Adds the classes to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_class::<StressExtreme>()?;
    module.add_class::<Utilisation>()?;
    module.add_class::<PartStress>()
}
