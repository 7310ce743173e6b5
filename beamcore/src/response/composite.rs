//! How far the joints make the layers act together.

use super::Response;
use crate::error::{ErrorKind, Problem, Result};
use crate::field::{Extreme, Field, Piecewise};
use crate::section::JointKind;
use crate::time::Time;
use crate::units::{BendingStiffness, Length};

/// The composite action of a member of layers under one combination, seen at the place of its
/// greatest deflection under its loads; actions of free strains or settlements only are left out.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct CompositeAction {
    /// (w loose - w)/(w loose - w rigid): 0 where the joints do nothing, 1 where they do not slip.
    pub degree: f64,
    /// EI of the rigidly joined section there, times w rigid/w: the bending stiffness with which a
    /// member without slip would deflect as much.
    pub effective_stiffness: BendingStiffness,
    /// The place.
    pub at: Length,
    /// The deflection there.
    pub deflection: Length,
    /// The deflection there with all joints loose.
    pub loose: Length,
    /// The deflection there with all joints rigid.
    pub rigid: Length,
}

impl Response {
    /// The deflection under a combination without its actions of free strains or settlements only.
    fn under_loads(&self, combination: &str, time: Time) -> Result<Piecewise> {
        let deflection = self.member().layout().states.deflection(0);
        let mut sum = self.zero();
        for term in self.terms(combination, time)? {
            if !term.is_without_load() {
                sum.add(&term.field(deflection), 1.0);
            }
        }
        Ok(sum)
    }

    /// The degree of composite action and the effective bending stiffness, from the same member
    /// with all joints that slip loose, and with all of them rigid (without anchors).
    ///
    /// # Errors
    /// As for [`Response::deflection`]; [`ErrorKind::Value`] if no joint slips, or no load acts; what makes the
    /// member with loose or rigid joints impossible.
    pub fn composite_action(&self, combination: &str, time: Time) -> Result<CompositeAction> {
        let member = self.member();
        if member.section().slips().is_empty() {
            return Err(Problem::new(
                ErrorKind::Value,
                "section.joints",
                "a section whose layers do not slip",
                "a section with a joint that slips",
            )
            .into());
        }
        let peak: Extreme<Length> = self.under_loads(combination, time)?.greatest().into();
        if peak.value == Length::ZERO {
            return Err(Problem::new(
                ErrorKind::Value,
                "combination",
                format!("\"{combination}\", under which no load bends the member"),
                "a combination with loads",
            )
            .into());
        }
        let variant = |kind: JointKind| -> Result<Length> {
            let plan = member.plan().with_joints(&kind)?;
            let line = plan.check()?.solve().under_loads(combination, time)?;
            Field::new(line).value(peak.at)
        };
        let (loose, rigid) = (variant(JointKind::Loose)?, variant(JointKind::Rigid)?);
        let section = member.section_at(peak.at)?;
        let stiffness = section.stiffness(time).bending_yy();
        Ok(CompositeAction {
            degree: (loose - peak.value) / (loose - rigid),
            effective_stiffness: stiffness * (rigid / peak.value),
            at: peak.at,
            deflection: peak.value,
            loose,
            rigid,
        })
    }
}
