//! What is wrong with the values of a joint by itself.

use super::joint::{Joint, JointKind};
use crate::check;
use crate::error::{ErrorKind, Problem};
use crate::path;

impl Joint {
    /// What is wrong with the values.
    pub(super) fn problems(&self) -> Vec<Problem> {
        let mut problems = Vec::new();
        check::name(&mut problems, self.name(), "section.joints");
        let base = Self::path(self.name());
        if let JointKind::Slipping(slip) = self.kind() {
            slip.problems(&mut problems, &path::key(&base, "kind"));
        }
        if let Some(gap) = self.stated_gap() {
            check::not_negative(&mut problems, gap, &path::key(&base, "gap"));
        }
        if let Some(modulus) = self.transverse_modulus() {
            check::positive(&mut problems, modulus, &path::key(&base, "transverse"));
        }
        if let Some(clearance) = self.given_clearance() {
            check::not_negative(&mut problems, clearance, &path::key(&base, "clearance"));
        }
        if let Some(creep) = self.given_creep() {
            check::between(&mut problems, creep, 0.0, 20.0, &path::key(&base, "creep"));
        }
        self.misfits(&mut problems, &base);
        problems
    }

    /// Values that a joint of this kind has no use for.
    fn misfits(&self, problems: &mut Vec<Problem>, base: &str) {
        let mut misfit = |key: &str, found: &str, expected: &str| {
            problems.push(Problem::new(
                ErrorKind::Value,
                path::key(base, key),
                found,
                expected,
            ));
        };
        let is_rigid = *self.kind() == JointKind::Rigid;
        if is_rigid && self.transverse_modulus().is_some() {
            misfit(
                "transverse",
                "a transverse modulus of a rigid joint",
                "none, or a slipping or loose joint",
            );
        }
        if self.given_clearance().is_some() && !matches!(self.kind(), JointKind::Slipping(_)) {
            let found = if is_rigid {
                "a clearance of a rigid joint"
            } else {
                "a clearance of a loose joint"
            };
            misfit("clearance", found, "none, or a slipping joint");
        }
        if self.given_creep().is_some() && is_rigid {
            misfit(
                "creep",
                "a creep factor of a rigid joint",
                "none, or a slipping joint",
            );
        } else if self.given_creep().is_some() && !self.has_modulus() {
            misfit(
                "creep",
                "a creep factor of a loose joint, which has no stiffness that creeps",
                "none, or a slipping joint or a transverse modulus",
            );
        }
    }
}
