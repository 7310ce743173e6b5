//! What the class `Joint` tells of itself.

use crate::band::Band;
use crate::convert;
use crate::joint::Joint;
use crate::made::{Recipe, Reduced};
use crate::quantity::Quantity;
use beamcore::section::{JointKind, Slip, Spacing};
use pyo3::prelude::*;
use pyo3::types::{PyDict, PyTuple};

impl Joint {
    /// What the slip modulus follows from; `None` of a rigid or loose joint.
    const fn slip(&self) -> Option<&Slip> {
        match self.0.kind() {
            JointKind::Slipping(slip) => Some(slip),
            JointKind::Rigid | JointKind::Loose => None,
        }
    }
}

#[pymethods]
impl Joint {
    /// The name.
    #[getter]
    fn name(&self) -> &str {
        self.0.name()
    }

    /// The name of the lower layer.
    #[getter]
    fn lower(&self) -> &str {
        self.0.lower()
    }

    /// The name of the upper layer.
    #[getter]
    fn upper(&self) -> &str {
        self.0.upper()
    }

    /// How it was made: "rigid", "loose", "slipping", "fasteners" or "glue".
    #[getter]
    const fn kind(&self) -> &'static str {
        self.0.kind().name()
    }

    /// The clear distance between the layers, if it was stated; else None.
    #[getter]
    fn gap(&self) -> Option<Quantity> {
        self.0.stated_gap().map(Quantity::of)
    }

    /// The modulus square to the member, if it was given; else None.
    #[getter]
    fn transverse(&self) -> Option<Quantity> {
        self.0.transverse_modulus().map(Quantity::of)
    }

    /// The clearance, if it was given; else None.
    #[getter]
    fn clearance(&self) -> Option<Quantity> {
        self.0.given_clearance().map(Quantity::of)
    }

    /// The creep factor, if it was given; else None.
    #[getter]
    const fn creep(&self) -> Option<f64> {
        self.0.given_creep()
    }

    /// The slip modulus of a joint made by slipping; else None.
    #[getter]
    fn modulus(&self) -> Option<Quantity> {
        match self.slip()? {
            Slip::Modulus(modulus) => Some(Quantity::of(*modulus)),
            Slip::Fasteners { .. } | Slip::Glue { .. } => None,
        }
    }

    /// The slip modulus of one fastener in one shear plane; None without fasteners.
    #[getter]
    fn stiffness(&self) -> Option<Quantity> {
        match self.slip()? {
            Slip::Fasteners { stiffness, .. } => Some(Quantity::of(*stiffness)),
            Slip::Modulus(_) | Slip::Glue { .. } => None,
        }
    }

    /// How many rows of fasteners run along the member; None without fasteners.
    #[getter]
    fn rows(&self) -> Option<u32> {
        match self.slip()? {
            Slip::Fasteners { rows, .. } => Some(*rows),
            Slip::Modulus(_) | Slip::Glue { .. } => None,
        }
    }

    /// In how many shear planes a fastener works; None without fasteners.
    #[getter]
    fn planes(&self) -> Option<u32> {
        match self.slip()? {
            Slip::Fasteners { planes, .. } => Some(*planes),
            Slip::Modulus(_) | Slip::Glue { .. } => None,
        }
    }

    /// The spacing of fasteners along a row; None without fasteners, or where they have bands.
    #[getter]
    fn spacing(&self) -> Option<Quantity> {
        match self.slip()? {
            Slip::Fasteners {
                spacing: Spacing::Uniform(spacing),
                ..
            } => Some(Quantity::of(*spacing)),
            Slip::Fasteners { .. } | Slip::Modulus(_) | Slip::Glue { .. } => None,
        }
    }

    /// The bands of fasteners; None without fasteners, or where they have one spacing.
    #[getter]
    fn bands<'py>(&self, py: Python<'py>) -> PyResult<Option<Bound<'py, PyTuple>>> {
        match self.slip() {
            Some(Slip::Fasteners {
                spacing: Spacing::Bands(bands),
                ..
            }) => {
                let bands: Vec<_> = bands.iter().copied().map(Band).collect();
                PyTuple::new(py, bands).map(Some)
            }
            _ => Ok(None),
        }
    }

    /// The shear modulus of the glue; None without glue.
    #[getter]
    fn shear_modulus(&self) -> Option<Quantity> {
        match self.slip()? {
            Slip::Glue { shear_modulus, .. } => Some(Quantity::of(*shear_modulus)),
            Slip::Modulus(_) | Slip::Fasteners { .. } => None,
        }
    }

    /// The width of the glue line across the member; None without glue.
    #[getter]
    fn width(&self) -> Option<Quantity> {
        match self.slip()? {
            Slip::Glue { width, .. } => Some(Quantity::of(*width)),
            Slip::Modulus(_) | Slip::Fasteners { .. } => None,
        }
    }

    /// The thickness of the glue; None without glue.
    #[getter]
    fn thickness(&self) -> Option<Quantity> {
        match self.slip()? {
            Slip::Glue { thickness, .. } => Some(Quantity::of(*thickness)),
            Slip::Modulus(_) | Slip::Fasteners { .. } => None,
        }
    }

    /// The short-term slip modulus at a place along the member, zero where there are no fasteners;
    /// None of a rigid or loose joint.
    fn modulus_at(&self, at: &Bound<'_, PyAny>) -> PyResult<Option<Quantity>> {
        let place = convert::read(at, "at")?;
        let slip = self.slip();
        Ok(slip.map(|slip| Quantity::of(slip.modulus_at(place))))
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        let keywords = PyDict::new(py);
        let keyword = |name: &str, value: Option<Quantity>| match value {
            Some(value) => keywords.set_item(name, value),
            None => Ok(()),
        };
        keyword("gap", self.gap())?;
        keyword("transverse", self.transverse())?;
        keyword("clearance", self.clearance())?;
        keyword("modulus", self.modulus())?;
        keyword("stiffness", self.stiffness())?;
        keyword("spacing", self.spacing())?;
        keyword("shear_modulus", self.shear_modulus())?;
        keyword("width", self.width())?;
        keyword("thickness", self.thickness())?;
        if let Some(creep) = self.creep() {
            keywords.set_item("creep", creep)?;
        }
        if let Some((rows, planes)) = self.rows().zip(self.planes()) {
            keywords.set_item("rows", rows)?;
            keywords.set_item("planes", planes)?;
        }
        if let Some(bands) = self.bands(py)? {
            keywords.set_item("bands", bands)?;
        }
        let function = match self.kind() {
            "rigid" => "Joint.rigid",
            "loose" => "Joint.loose",
            "slipping" => "Joint.slipping",
            "fasteners" => "Joint.fasteners",
            _ => "Joint.glue",
        };
        let names = (self.name(), self.lower(), self.upper());
        Recipe::call(py, function, names)?
            .with(&keywords)
            .reduce(py)
    }

    fn __repr__(&self) -> String {
        format!(
            "<{} joint {:?} from {:?} to {:?}>",
            self.kind(),
            self.0.name(),
            self.0.lower(),
            self.0.upper()
        )
    }
}
