//! Simplified methods in the outcome.

use super::document_simplified::{
    SimplifiedCombinationOutcome, SimplifiedJointOutcome, SimplifiedLayerOutcome,
    SimplifiedOutcome, SimplifiedSpanOutcome, SimplifiedStateOutcome,
};
use crate::error::Result;
use crate::job::Job;
use crate::member::{Combination, CombinationKind};
use crate::response::{Response, SimplifiedMethod, SimplifiedSpan};
use crate::time::Time;

const STRAINS: &str = "Free strains, such as shrinkage, are left out of both sides here: the \
                       method does not cover them";

/// The methods that the job asks for.
pub(super) fn simplified(job: &Job, response: &Response) -> Result<Vec<SimplifiedOutcome>> {
    let methods = job.simplified();
    methods.iter().map(|m| method(response, *m)).collect()
}

fn method(response: &Response, method: SimplifiedMethod) -> Result<SimplifiedOutcome> {
    let mut limits: Vec<String> = Vec::new();
    let mut state = |combination: &Combination, time: Time| -> Result<SimplifiedStateOutcome> {
        let spans = response.simplified(combination.name(), time, method)?;
        let strained = spans.iter().any(|span| span.leaves_out_strains);
        if strained && !limits.iter().any(|known| known == STRAINS) {
            limits.push(STRAINS.into());
        }
        for warning in spans.iter().flat_map(|span| &span.warnings) {
            if !limits.iter().any(|known| known == warning.text()) {
                limits.push(warning.text().into());
            }
        }
        Ok(SimplifiedStateOutcome {
            spans: spans.iter().map(span).collect(),
        })
    };
    let judged = |combination: &&Combination| {
        matches!(
            combination.kind(),
            CombinationKind::Characteristic | CombinationKind::QuasiPermanent
        )
    };
    let combinations = response.member().combinations().iter().filter(judged);
    let combinations: Vec<_> = combinations
        .map(|combination| {
            Ok(SimplifiedCombinationOutcome {
                name: combination.name().into(),
                initial: state(combination, Time::Initial)?,
                end: state(combination, Time::Final)?,
            })
        })
        .collect::<Result<_>>()?;
    Ok(SimplifiedOutcome {
        name: method.name().into(),
        limits,
        combinations,
    })
}

fn span(span: &SimplifiedSpan) -> SimplifiedSpanOutcome {
    let joints = span.joints.iter().map(|joint| SimplifiedJointOutcome {
        name: joint.joint.clone(),
        flow: joint.flow.into(),
        exact_flow: joint.exact_flow.into(),
    });
    let layers = span.layers.iter().map(|layer| SimplifiedLayerOutcome {
        name: layer.layer.clone(),
        at_m: layer.at.to_m(),
        axial_stress_Pa: layer.stress.axial.to_Pa(),
        bending_stress_Pa: layer.stress.bending.to_Pa(),
        exact_axial_N: layer.exact_axial.to_N(),
        exact_moment_Nm: layer.exact_moment.to_N_m(),
    });
    SimplifiedSpanOutcome {
        name: span.span.clone(),
        length_m: span.length.to_m(),
        factors: span.factors.clone(),
        bending_stiffness_Nm2: span.bending_stiffness.to_N_m2(),
        deflection: span.deflection.into(),
        exact_deflection: span.exact_deflection.into(),
        difference: span.difference(),
        joints: joints.collect(),
        layers: layers.collect(),
    }
}
