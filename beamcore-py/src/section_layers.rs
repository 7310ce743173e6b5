//! What the class `Section` tells of its layers and joints, and sections made of others.

use crate::error::OrRaise;
use crate::joint::{Joint, JointOrName};
use crate::layer::{Layer, MergedLayer};
use crate::made::{Made, Recipe};
use crate::operand::Number;
use crate::part::PartOrName;
use crate::placed_joint::PlacedJoint;
use crate::quantity::Quantity;
use crate::section::Section;
use crate::time::TimeText;
use beamcore::section;
use pyo3::prelude::*;
use pyo3::types::PyTuple;

#[pymethods]
impl Section {
    /// The layers as given; of a section without layers, one named "section".
    #[getter]
    fn layers<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        let layers: Vec<_> = self.0.layers().iter().cloned().map(Layer).collect();
        PyTuple::new(py, layers)
    }

    /// The joints as given.
    #[getter]
    fn joints<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        let joints: Vec<_> = self.0.joints().iter().cloned().map(Joint).collect();
        PyTuple::new(py, joints)
    }

    /// The joints at their places, in the order given.
    #[getter]
    fn placed_joints<'py>(slf: &Bound<'py, Self>) -> PyResult<Bound<'py, PyTuple>> {
        let placed = slf.get().0.placed_joints().iter();
        let placed = placed.map(|joint| PlacedJoint::of(slf, joint));
        PyTuple::new(slf.py(), placed.collect::<PyResult<Vec<_>>>()?)
    }

    /// A joint, or the joint of a name, at its place.
    fn joint(slf: &Bound<'_, Self>, joint: JointOrName) -> PyResult<PlacedJoint> {
        let name = joint.into_name();
        PlacedJoint::of(slf, slf.get().0.joint(&name).or_raise(slf.py())?)
    }

    /// The layers with those merged that rigid joints hold together, in the order of the first
    /// layer of each.
    #[getter]
    fn merged_layers<'py>(&self, py: Python<'py>) -> PyResult<Bound<'py, PyTuple>> {
        let name = |&part: &usize| self.0.parts()[part].name().to_owned();
        let merged = |merged: &section::MergedLayer| MergedLayer {
            layers: merged.layers().to_vec(),
            parts: merged.parts().iter().map(name).collect(),
        };
        let merged: Vec<_> = self.0.merged_layers().iter().map(merged).collect();
        PyTuple::new(py, merged)
    }

    /// The shear stiffness at a time, "initial" or "final", of a section whose parts are glued over
    /// their whole height, so that they act as one layer, bent about the level axis:
    /// kGA = EI^2/int [ES(z)^2/(sum of b_i G_i)] dz over the height, with ES(z) the sum of E_i S_i
    /// of what lies above z.
    ///
    /// Source: energy of the shear stress V ES/(b EI), e.g. Gere and Goodno, Mechanics of Materials,
    /// from memory. Other definitions give other shear coefficients; see
    /// SHEAR_STIFFNESS_DEFINITION.
    ///
    /// >>> joist = Part("joist", rectangle(80*mm, 200*mm), timber("C24", service_class=1))
    /// >>> Section([joist]).shear_stiffness("initial")   # 5/6 G b h
    /// 9.2 MN
    fn shear_stiffness(&self, py: Python<'_>, time: TimeText) -> PyResult<Quantity> {
        let stiffness = self.0.shear_stiffness(time.into());
        Ok(Quantity::of(stiffness.or_raise(py)?))
    }

    /// The shear stiffness at a time, "initial" or "final", of a section whose parts stand side by
    /// side, with their centroids at one height, and are only fastened to each other: each part
    /// bears the share EI_i/EI of V with a shear stress of its own, so that
    /// 1/kGA = sum of (EI_i/EI)^2/kGA_i, with kGA_i as in shear_stiffness.
    fn fastened_shear_stiffness(&self, py: Python<'_>, time: TimeText) -> PyResult<Quantity> {
        let stiffness = self.0.fastened_shear_stiffness(time.into());
        Ok(Quantity::of(stiffness.or_raise(py)?))
    }

    /// The section whose every size and place lies at the given share of the way from this one's to
    /// the other's. The two must be alike: the same parts of the same materials and shapes, placed
    /// in the same ways, in the same layers and joints.
    ///
    /// >>> wood = timber("C24", service_class=1)
    /// >>> low, high = (Section([Part("a", rectangle(80*mm, h), wood)]) for h in (100*mm, 300*mm))
    /// >>> low.between(high, 0.25).part("a").top
    /// 75 mm
    fn between(slf: &Bound<'_, Self>, other: &Bound<'_, Self>, share: Number) -> PyResult<Self> {
        let core = slf.get().0.between(&other.get().0, share.0);
        let recipe = Recipe::method(slf, "between", (other, share.0))?;
        Ok(Self(Made::new(core.or_raise(slf.py())?, recipe)))
    }

    /// The section of some of the parts alone (parts or their names), each where it stands in the
    /// whole section, with the layers that they belong to and the joints between these.
    fn only(slf: &Bound<'_, Self>, parts: Vec<PartOrName>) -> PyResult<Self> {
        let names: Vec<_> = parts.into_iter().map(PartOrName::into_name).collect();
        let core = slf.get().0.only(&names);
        let recipe = Recipe::method(slf, "only", (names,))?;
        Ok(Self(Made::new(core.or_raise(slf.py())?, recipe)))
    }
}
