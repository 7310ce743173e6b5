//! The class `Support`.

use crate::convert::Inputs;
use crate::layer::LayerOrName;
use crate::made::{Recipe, Reduced};
use crate::quantity::Quantity;
use beamcore::member::{self, SupportKind};
use beamcore::units;
use pyo3::prelude::*;
use pyo3::types::{PyDict, PyMapping, PyTuple};

/// A lasting support of a member, with a name that addresses its reactions.
///
/// What it holds is rigid unless a spring is given for it:
///
/// - spring: under the deflection
/// - axial_spring: along the axis; of a pin or a fixed support in place of its rigid hold, of a
///   roller in addition
/// - rotational_spring: against rotation; of a fixed support in place of its rigid hold, of a pin
///   or roller in addition
/// - one_way: it can push up but not pull down: the member may lift off it
/// - height: of the hold along the axis, in the section's coordinates, on the first of the layers
///   that bear on it; without it, all layers together are held at the elastic centroid of the
///   section at the left end
/// - under: the layers, or their names, that bear on it; without it, all. The hold along the axis is
///   then on the first of them
/// - holding: names of layers that it holds along the member by themselves, each with the height
///   at which it does
///
/// >>> pin("left", 0*m, spring=8*kN/mm, holding={"slab": 150*mm}).holding
/// {'slab': 150 mm}
#[pyclass(frozen, eq, module = "beamcore")]
#[derive(Debug, PartialEq)]
pub(crate) struct Support(pub(crate) member::Support);

/// A support, or the name of one.
#[derive(FromPyObject)]
pub(crate) enum SupportOrName {
    Support(Py<Support>),
    Name(String),
}

impl SupportOrName {
    /// The name.
    pub(crate) fn into_name(self) -> String {
        match self {
            Self::Support(support) => support.get().0.name().to_owned(),
            Self::Name(name) => name,
        }
    }
}

/// What a support may be told beside its place.
struct Given<'a, 'py> {
    spring: Option<&'a Bound<'py, PyAny>>,
    axial_spring: Option<&'a Bound<'py, PyAny>>,
    rotational_spring: Option<&'a Bound<'py, PyAny>>,
    one_way: bool,
    height: Option<&'a Bound<'py, PyAny>>,
    under: Vec<LayerOrName>,
    holding: Option<&'a Bound<'py, PyMapping>>,
}

impl Given<'_, '_> {
    /// The support of a kind, or the exception of all that cannot be read.
    fn made(self, kind: SupportKind, name: &str, at: &Bound<'_, PyAny>) -> PyResult<Support> {
        let path = |key: &str| format!("{}.{key}", kind.name());
        let mut inputs = Inputs::default();
        let place = inputs.read(at, &path("at"))?;
        let mut support = place.map(|at| member::Support::new(name, kind, at));
        if let Some(spring) = self.spring {
            let spring = inputs.read(spring, &path("spring"))?;
            support = support.zip(spring).map(|(s, spring)| s.spring(spring));
        }
        if let Some(spring) = self.axial_spring {
            let spring = inputs.read(spring, &path("axial_spring"))?;
            support = support
                .zip(spring)
                .map(|(s, spring)| s.axial_spring(spring));
        }
        if let Some(spring) = self.rotational_spring {
            let spring = inputs.read(spring, &path("rotational_spring"))?;
            support = support
                .zip(spring)
                .map(|(s, spring)| s.rotational_spring(spring));
        }
        if let Some(height) = self.height {
            let height = inputs.read(height, &path("height"))?;
            support = support.zip(height).map(|(s, height)| s.at_height(height));
        }
        if let Some(holding) = self.holding {
            for (i, item) in holding.items()?.into_iter().enumerate() {
                let (layer, height): (String, Bound<'_, PyAny>) = item.extract()?;
                let height: Option<units::Length> =
                    inputs.read(&height, &path(&format!("holding[{i}].height")))?;
                support = support
                    .zip(height)
                    .map(|(s, height)| s.holding(layer, height));
            }
        }
        let mut support = inputs.done(at.py(), support)?;
        if self.one_way {
            support = support.one_way();
        }
        let under = self.under.into_iter().map(LayerOrName::into_name);
        Ok(Support(support.under(under)))
    }
}

#[pymethods]
impl Support {
    /// The name.
    #[getter]
    fn name(&self) -> &str {
        self.0.name()
    }

    /// What it holds: "pin", "roller" or "fixed".
    #[getter]
    const fn kind(&self) -> &'static str {
        self.0.kind().name()
    }

    /// Its distance from the left end of the member.
    #[getter]
    fn at(&self) -> Quantity {
        Quantity::of(self.0.at())
    }

    /// The spring under it; None where it is rigid.
    #[getter]
    fn spring(&self) -> Option<Quantity> {
        self.0.given_spring().map(Quantity::of)
    }

    /// The spring along the axis, if it was given; else None.
    #[getter]
    fn axial_spring(&self) -> Option<Quantity> {
        self.0.given_axial_spring().map(Quantity::of)
    }

    /// The spring against rotation, if it was given; else None.
    #[getter]
    fn rotational_spring(&self) -> Option<Quantity> {
        self.0.given_rotational_spring().map(Quantity::of)
    }

    /// Whether the member may lift off.
    #[getter]
    const fn one_way(&self) -> bool {
        self.0.is_one_way()
    }

    /// The height of the hold along the axis, if it was given; else None.
    #[getter]
    fn height(&self) -> Option<Quantity> {
        self.0.given_height().map(Quantity::of)
    }

    /// The names of the layers that bear on it; none means all.
    #[getter]
    fn under<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        PyTuple::new(py, self.0.layers())
    }

    /// The names of the layers that it holds along the member by themselves, each with the height
    /// at which it does.
    #[getter]
    fn holding<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyDict>> {
        let holding = PyDict::new(py);
        for hold in self.0.held_layers() {
            holding.set_item(&hold.layer, Quantity::of(hold.height))?;
        }
        Ok(holding)
    }

    fn __reduce__<'py>(&self, py: Python<'py>) -> PyResult<Reduced<'py>> {
        let keywords = PyDict::new(py);
        keywords.set_item("spring", self.spring())?;
        keywords.set_item("axial_spring", self.axial_spring())?;
        keywords.set_item("rotational_spring", self.rotational_spring())?;
        keywords.set_item("one_way", self.one_way())?;
        keywords.set_item("height", self.height())?;
        keywords.set_item("under", self.under(py)?)?;
        keywords.set_item("holding", self.holding(py)?)?;
        let recipe = Recipe::call(py, self.kind(), (self.name(), self.at()))?;
        recipe.with(&keywords).reduce(py)
    }

    fn __repr__(&self) -> String {
        format!("<{} {:?} at {}>", self.kind(), self.name(), self.at())
    }
}

/// One of the functions that make a support; all of them take the same.
macro_rules! support_function {
    ($(#[$doc:meta])* $name:ident, $kind:expr) => {
        $(#[$doc])*
        #[pyfunction]
        #[pyo3(signature = (
            name, at, *, spring=None, axial_spring=None, rotational_spring=None, one_way=false,
            height=None, under=vec![], holding=None
        ))]
        #[expect(clippy::too_many_arguments, reason = "each is a keyword in Python")]
        fn $name<'py>(
            name: &str,
            at: &Bound<'py, PyAny>,
            spring: Option<&Bound<'py, PyAny>>,
            axial_spring: Option<&Bound<'py, PyAny>>,
            rotational_spring: Option<&Bound<'py, PyAny>>,
            one_way: bool,
            height: Option<&Bound<'py, PyAny>>,
            under: Vec<LayerOrName>,
            holding: Option<&Bound<'py, PyMapping>>,
        ) -> PyResult<Support> {
            let given = Given {
                spring,
                axial_spring,
                rotational_spring,
                one_way,
                height,
                under,
                holding,
            };
            given.made($kind, name, at)
        }
    };
}

support_function! {
    /// A pin at a distance from the left end: holds deflection and axis; the member may turn. Its
    /// keywords are those that Support tells of.
    ///
    /// >>> pin("left", 0*m).kind
    /// 'pin'
    pin, SupportKind::Pin
}

support_function! {
    /// A roller at a distance from the left end: holds the deflection only. Its keywords are those
    /// that Support tells of.
    ///
    /// >>> roller("post", "3 m", one_way=True).one_way
    /// True
    roller, SupportKind::Roller
}

support_function! {
    /// A fixed support at a distance from the left end: holds deflection, axis and rotation. Its
    /// keywords are those that Support tells of.
    ///
    /// >>> fixed("wall", 0*m, rotational_spring="900 kN m/rad").rotational_spring
    /// 900 kN*m/rad
    fixed, SupportKind::Fixed
}

/// Adds the class and functions to the module.
pub(crate) fn register(module: &Bound<'_, PyModule>) -> PyResult<()> {
    module.add_class::<Support>()?;
    module.add_function(wrap_pyfunction!(pin, module)?)?;
    module.add_function(wrap_pyfunction!(roller, module)?)?;
    module.add_function(wrap_pyfunction!(fixed, module)?)
}
