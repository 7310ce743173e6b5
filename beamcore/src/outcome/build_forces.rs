//! Stresses of the section under the named forces of the job.

use super::document_forces::{ForcesOutcome, PartForcesOutcome, PointOutcome};
use crate::error::Result;
use crate::job::Job;
use crate::section::{PointStress, SectionForces};
use crate::time::Time;

/// The stresses in every part under each of the forces.
pub(super) fn forces(job: &Job) -> Result<Vec<ForcesOutcome>> {
    let outcome = |(name, forces): &(String, SectionForces)| {
        Ok(ForcesOutcome {
            name: name.clone(),
            initial: parts(job, forces, Time::Initial)?,
            end: parts(job, forces, Time::Final)?,
        })
    };
    job.section_forces().iter().map(outcome).collect()
}

fn parts(job: &Job, forces: &SectionForces, time: Time) -> Result<Vec<PartForcesOutcome>> {
    let (section, sideways) = (job.member().section(), job.member().sideways());
    let point = |stress: PointStress| PointOutcome {
        value_Pa: stress.value.to_Pa(),
        y_m: stress.y.to_m(),
        z_m: stress.z.to_m(),
    };
    section
        .parts()
        .iter()
        .map(|part| {
            let name = part.name();
            let [greatest, least] = section.stress_extremes(name, forces, sideways, time)?;
            Ok(PartForcesOutcome {
                name: name.into(),
                greatest: point(greatest),
                least: point(least),
            })
        })
        .collect()
}
