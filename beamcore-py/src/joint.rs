//! The class `Joint`: how joints are made.

use crate::band::Band;
use crate::convert::Inputs;
use crate::layer::LayerOrName;
use crate::operand::Number;
use beamcore::section::{self, JointKind, Slip, Spacing};
use pyo3::exceptions::PyTypeError;
use pyo3::prelude::*;

/// What holds two layers together along the member: see its ways to be made, rigid, loose,
/// slipping, fasteners and glue.
///
/// lower and upper are layers or their names; of layers that stand side by side either may be
/// called the upper one. The slip of a joint is the displacement along x of its upper layer minus
/// that of its lower one.
///
/// - gap: the clear distance between the two layers, which must agree with their places to 0.1 mm;
///   it must be stated where they do not touch
/// - transverse: a modulus square to the member, force per length that one length of difference
///   between the deflections makes: the two layers then have a deflection each
/// - clearance: the slip, in either sense, before the joint carries anything, as of bolts in wider
///   holes
/// - creep: at the end the moduli are divided by (1 + creep); without it, the factor follows from
///   wood-based layers, beside any other material it must be given
///
/// >>> Joint.slipping("screws", "joist", "slab", modulus="133 N/mm2", gap=20*mm, creep=1.2).kind
/// 'slipping'
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct Joint(pub(crate) section::Joint);

/// A joint, or the name of one.
#[derive(FromPyObject)]
pub(crate) enum JointOrName {
    Joint(Py<Joint>),
    Name(String),
}

impl JointOrName {
    /// The name.
    pub(crate) fn into_name(self) -> String {
        match self {
            Self::Joint(joint) => joint.get().0.name().to_owned(),
            Self::Name(name) => name,
        }
    }
}

/// The name of a joint and its two layers.
struct Between {
    name: String,
    lower: LayerOrName,
    upper: LayerOrName,
}

/// What a joint may be told beside its kind.
#[derive(Default)]
struct Beside<'a, 'py> {
    gap: Option<&'a Bound<'py, PyAny>>,
    transverse: Option<&'a Bound<'py, PyAny>>,
    clearance: Option<&'a Bound<'py, PyAny>>,
    creep: Option<Number>,
}

impl Between {
    /// The joint of a kind, `None` being one whose problems are among the inputs.
    fn made(
        self,
        py: Python<'_>,
        mut inputs: Inputs,
        kind: Option<JointKind>,
        beside: &Beside<'_, '_>,
    ) -> PyResult<Joint> {
        let (lower, upper) = (self.lower.into_name(), self.upper.into_name());
        let mut joint = kind.map(|kind| section::Joint::new(self.name, lower, upper, kind));
        if let Some(gap) = beside.gap {
            let gap = inputs.read(gap, "joint.gap")?;
            joint = joint.zip(gap).map(|(joint, gap)| joint.gap(gap));
        }
        if let Some(modulus) = beside.transverse {
            let modulus = inputs.read(modulus, "joint.transverse")?;
            joint = joint.zip(modulus).map(|(joint, k)| joint.transverse(k));
        }
        if let Some(clearance) = beside.clearance {
            let clearance = inputs.read(clearance, "joint.clearance")?;
            joint = joint.zip(clearance).map(|(joint, c)| joint.clearance(c));
        }
        let joint = inputs.done(py, joint)?;
        Ok(Joint(match beside.creep {
            Some(factor) => joint.creep(factor.0),
            None => joint,
        }))
    }
}

/// The spacing of fasteners: one, or one in each band.
fn spacing(
    inputs: &mut Inputs,
    spacing: Option<&Bound<'_, PyAny>>,
    bands: Option<Vec<Py<Band>>>,
) -> PyResult<Option<Spacing>> {
    match (spacing, bands) {
        (Some(spacing), None) => {
            let spacing = inputs.read(spacing, "joint.fasteners.spacing")?;
            Ok(spacing.map(Spacing::Uniform))
        }
        (None, Some(bands)) => {
            let bands = bands.iter().map(|band| band.get().0);
            Ok(Some(Spacing::Bands(bands.collect())))
        }
        _ => Err(PyTypeError::new_err(
            "fasteners: neither a spacing alone nor bands alone were given; one or the other is \
             needed, for example spacing=150*mm",
        )),
    }
}

#[pymethods]
impl Joint {
    /// A joint without slip: the two layers are one piece.
    #[staticmethod]
    #[pyo3(signature = (name, lower, upper, *, gap=None))]
    fn rigid<'py>(
        py: Python<'py>,
        name: String,
        lower: LayerOrName,
        upper: LayerOrName,
        gap: Option<&Bound<'py, PyAny>>,
    ) -> PyResult<Self> {
        let between = Between { name, lower, upper };
        let beside = Beside {
            gap,
            ..Beside::default()
        };
        between.made(py, Inputs::default(), Some(JointKind::Rigid), &beside)
    }

    /// A joint in which the layers slip freely and share their deflection only.
    #[staticmethod]
    #[pyo3(signature = (name, lower, upper, *, gap=None, transverse=None, creep=None))]
    fn loose<'py>(
        py: Python<'py>,
        name: String,
        lower: LayerOrName,
        upper: LayerOrName,
        gap: Option<&Bound<'py, PyAny>>,
        transverse: Option<&Bound<'py, PyAny>>,
        creep: Option<Number>,
    ) -> PyResult<Self> {
        let between = Between { name, lower, upper };
        let beside = Beside {
            gap,
            transverse,
            clearance: None,
            creep,
        };
        between.made(py, Inputs::default(), Some(JointKind::Loose), &beside)
    }

    /// A joint that slips in proportion to the flow, with its slip modulus k as given: force per
    /// length of the joint and slip.
    #[staticmethod]
    #[pyo3(signature = (
        name, lower, upper, *, modulus, gap=None, transverse=None, clearance=None, creep=None
    ))]
    #[expect(clippy::too_many_arguments, reason = "each is a keyword in Python")]
    fn slipping<'py>(
        name: String,
        lower: LayerOrName,
        upper: LayerOrName,
        modulus: &Bound<'py, PyAny>,
        gap: Option<&Bound<'py, PyAny>>,
        transverse: Option<&Bound<'py, PyAny>>,
        clearance: Option<&Bound<'py, PyAny>>,
        creep: Option<Number>,
    ) -> PyResult<Self> {
        let mut inputs = Inputs::default();
        let modulus_core = inputs.read(modulus, "joint.slipping.modulus")?;
        let kind = modulus_core.map(|k| JointKind::Slipping(Slip::Modulus(k)));
        let beside = Beside {
            gap,
            transverse,
            clearance,
            creep,
        };
        Between { name, lower, upper }.made(modulus.py(), inputs, kind, &beside)
    }

    /// A joint of fasteners in rows: k = rows x planes x stiffness/spacing.
    ///
    /// - stiffness: the slip modulus K of one fastener in one shear plane
    /// - rows: how many rows run along the member; planes: in how many shear planes a fastener works
    /// - spacing: along a row, all along the member; or bands: a list of Band, each with a spacing
    ///   of its own, with no fasteners outside of them
    ///
    /// >>> nails = Joint.fasteners("nails", "joist", "slab", stiffness="10 kN/mm", rows=2,
    /// ...                         planes=1, spacing=150*mm, creep=1.2)
    /// >>> nails.modulus_at(1*m)
    /// 133.333 N/mm**2
    #[staticmethod]
    #[pyo3(signature = (
        name, lower, upper, *, stiffness, rows, planes, spacing=None, bands=None, gap=None,
        transverse=None, clearance=None, creep=None
    ))]
    #[expect(clippy::too_many_arguments, reason = "each is a keyword in Python")]
    fn fasteners<'py>(
        name: String,
        lower: LayerOrName,
        upper: LayerOrName,
        stiffness: &Bound<'py, PyAny>,
        rows: u32,
        planes: u32,
        spacing: Option<&Bound<'py, PyAny>>,
        bands: Option<Vec<Py<Band>>>,
        gap: Option<&Bound<'py, PyAny>>,
        transverse: Option<&Bound<'py, PyAny>>,
        clearance: Option<&Bound<'py, PyAny>>,
        creep: Option<Number>,
    ) -> PyResult<Self> {
        let mut inputs = Inputs::default();
        let one = inputs.read(stiffness, "joint.fasteners.stiffness")?;
        let spaced = self::spacing(&mut inputs, spacing, bands)?;
        let kind = one.zip(spaced).map(|(stiffness, spacing)| {
            JointKind::Slipping(Slip::Fasteners {
                stiffness,
                rows,
                planes,
                spacing,
            })
        });
        let beside = Beside {
            gap,
            transverse,
            clearance,
            creep,
        };
        Between { name, lower, upper }.made(stiffness.py(), inputs, kind, &beside)
    }

    /// A joint of a soft layer of glue: k = G b/t.
    ///
    /// - shear_modulus: G of the glue
    /// - width, thickness: the width b of the glue line across the member, and its thickness t.
    #[staticmethod]
    #[pyo3(signature = (
        name, lower, upper, *, shear_modulus, width, thickness, gap=None, transverse=None,
        clearance=None, creep=None
    ))]
    #[expect(clippy::too_many_arguments, reason = "each is a keyword in Python")]
    fn glue<'py>(
        name: String,
        lower: LayerOrName,
        upper: LayerOrName,
        shear_modulus: &Bound<'py, PyAny>,
        width: &Bound<'py, PyAny>,
        thickness: &Bound<'py, PyAny>,
        gap: Option<&Bound<'py, PyAny>>,
        transverse: Option<&Bound<'py, PyAny>>,
        clearance: Option<&Bound<'py, PyAny>>,
        creep: Option<Number>,
    ) -> PyResult<Self> {
        let mut inputs = Inputs::default();
        let modulus = inputs.read(shear_modulus, "joint.glue.shear_modulus")?;
        let across = inputs.read(width, "joint.glue.width")?;
        let thick = inputs.read(thickness, "joint.glue.thickness")?;
        let glue = || {
            Some(JointKind::Slipping(Slip::Glue {
                shear_modulus: modulus?,
                width: across?,
                thickness: thick?,
            }))
        };
        let kind = glue();
        let beside = Beside {
            gap,
            transverse,
            clearance,
            creep,
        };
        Between { name, lower, upper }.made(shear_modulus.py(), inputs, kind, &beside)
    }
}
