//! From the solved member to the outcome document.

use super::document::{
    AccuracyOutcome, CombinationOutcome, FactorOutcome, FibreOutcome, LayerReactionOutcome,
    MaterialOutcome, OutcomeDocument, ReactionOutcome, ResultsOutcome, StrengthOutcome,
    StressOutcome, UtilisationOutcome,
};
use super::document_deflection::SpanDeflectionOutcome;
use super::{
    assumptions, build_deflection, build_layers, build_section, build_simplified, notes, warnings,
};
use crate::error::Result;
use crate::job::Job;
use crate::material::{DesignStrength, Material};
use crate::member::{Combination, Member, ShearModel, Support};
use crate::response::Response;
use crate::section::PlacedPart;
use crate::stress::StressExtreme;
use crate::time::Time;

/// The outcome of a job.
pub(super) fn outcome(job: &Job) -> Result<OutcomeDocument> {
    let member = job.member();
    let response = member.solve();
    let camber = job.camber().map(|plan| response.camber(plan)).transpose()?;
    let combinations: Result<Vec<_>> = member
        .combinations()
        .iter()
        .map(|c| combination(&response, c))
        .collect();
    let mut document = OutcomeDocument {
        outcome_version: super::VERSION,
        beamcore: crate::VERSION.into(),
        job: job.document().clone(),
        rules: notes::rules(member),
        materials: materials(member),
        section: build_section::section(job)?,
        member: build_section::member(job)?,
        combinations: combinations?,
        components: build_deflection::components(&response, camber.as_ref())?,
        limits: build_deflection::limits(&response, job.limits(), camber.as_ref())?,
        simplified: build_simplified::simplified(job, &response)?,
        camber: camber
            .as_ref()
            .map(|camber| build_deflection::camber(&response, camber, job.trestles()))
            .transpose()?,
        accuracy: AccuracyOutcome {
            residual: response.residual(),
        },
        assumptions: assumptions::assumptions(job),
        warnings: Vec::new(),
        not_checked: notes::not_checked(job),
    };
    document.warnings = warnings::warnings(member, &document);
    Ok(document)
}

/// Each material once, in the order of the parts.
pub(super) fn distinct<'a>(parts: impl IntoIterator<Item = &'a PlacedPart>) -> Vec<&'a Material> {
    let mut materials: Vec<&Material> = Vec::new();
    for part in parts {
        if !materials
            .iter()
            .any(|known| known.name() == part.material().name())
        {
            materials.push(part.material());
        }
    }
    materials
}

fn materials(member: &Member) -> Vec<MaterialOutcome> {
    let outcome = |material: &Material| MaterialOutcome {
        name: material.name().into(),
        origin: material.origin().unwrap_or("values as given").into(),
        modulus_Pa: material.modulus().to_Pa(),
        creep_factor: material.creep().value(),
        creep_basis: material.creep().basis().into(),
        shear_modulus_Pa: material.mean_shear_modulus().map(|modulus| modulus.to_Pa()),
        thermal_expansion_per_K: material.expansion().map(|alpha| alpha.to_per_K()),
        shear_strength_Pa: material.design_shear_strength().map(|f| f.to_Pa()),
        design_strength: material.strength().map(strength),
        overrides: material.overrides().to_vec(),
        density_kg_per_m3: material
            .mean_density()
            .map(|density| density.to_kg_per_m3()),
    };
    distinct(member.parts()).into_iter().map(outcome).collect()
}

fn strength(strength: &DesignStrength) -> StrengthOutcome {
    match *strength {
        DesignStrength::Timber {
            bending,
            tension,
            compression,
        } => StrengthOutcome::Timber {
            bending_Pa: bending.to_Pa(),
            tension_Pa: tension.to_Pa(),
            compression_Pa: compression.to_Pa(),
        },
        DesignStrength::Metal { yield_stress } => StrengthOutcome::Metal {
            yield_Pa: yield_stress.to_Pa(),
        },
    }
}

fn combination(response: &Response, combination: &Combination) -> Result<CombinationOutcome> {
    let actions = response.member().actions();
    let factors = actions.iter().zip(combination.factors());
    Ok(CombinationOutcome {
        name: combination.name().into(),
        factors: factors
            .map(|(action, &factor)| FactorOutcome {
                name: action.name().into(),
                factor,
            })
            .collect(),
        initial: results(response, combination, Time::Initial)?,
        end: results(response, combination, Time::Final)?,
    })
}

fn results(response: &Response, combination: &Combination, time: Time) -> Result<ResultsOutcome> {
    let name = combination.name();
    let member: &Member = response.member();
    let reactions = member.supports().iter().map(|support| {
        let reaction = response.reaction(name, time, support.name())?;
        Ok(ReactionOutcome {
            name: support.name().into(),
            force_N: reaction.force.to_N(),
            couple_Nm: reaction.couple.to_N_m(),
            along_N: reaction.along.to_N(),
            layers: layer_reactions(response, name, time, support)?,
        })
    });
    let stresses = member
        .parts()
        .into_iter()
        .map(|part| stress(response, combination, time, part.name()));
    let spans = member.spans().iter().map(|span| {
        let line = response.span_deflection(name, time, span.name())?;
        Ok(SpanDeflectionOutcome {
            name: span.name().into(),
            deflection: (&line).into(),
        })
    });
    Ok(ResultsOutcome {
        deflection: (&response.deflection(name, time)?).into(),
        spans: spans.collect::<Result<_>>()?,
        sideways: (&response.sideways(name, time)?).into(),
        slope: (&response.slope(name, time)?).into(),
        rotation: match member.shear_model() {
            ShearModel::Rigid => None,
            ShearModel::Flexible | ShearModel::Given(_) => {
                Some((&response.rotation(name, time)?).into())
            }
        },
        shear: (&response.shear(name, time)?).into(),
        moment: (&response.moment(name, time)?).into(),
        axial: (&response.axial(name, time)?).into(),
        reactions: reactions.collect::<Result<_>>()?,
        stresses: stresses.collect::<Result<_>>()?,
        joints: build_layers::joint_results(response, name, time)?,
        layers: build_layers::layer_results(response, name, time)?,
        anchors: build_layers::anchors(response, name, time)?,
        composite_action: build_layers::composite(response, combination, time)?,
        lifted: response
            .lifted(name, time)?
            .into_iter()
            .map(Into::into)
            .collect(),
        steps: response.steps(name, time)?,
    })
}

fn layer_reactions(
    response: &Response,
    combination: &str,
    time: Time,
    support: &Support,
) -> Result<Vec<LayerReactionOutcome>> {
    let held = support.held_layers().iter();
    held.map(|hold| {
        let force = response.layer_reaction(combination, time, support.name(), &hold.layer)?;
        Ok(LayerReactionOutcome {
            name: hold.layer.clone(),
            along_N: force.to_N(),
        })
    })
    .collect()
}

fn stress(
    response: &Response,
    combination: &Combination,
    time: Time,
    part: &str,
) -> Result<StressOutcome> {
    let stress = response.stress(combination.name(), time, part)?;
    let fibre = |extreme: StressExtreme| FibreOutcome {
        value_Pa: extreme.value.to_Pa(),
        at_m: extreme.at.to_m(),
        y_m: extreme.y.to_m(),
        z_m: extreme.z.to_m(),
    };
    // Design strengths belong to the fundamental combination only.
    let utilisation = if combination.is_ultimate() {
        response.utilisation(combination.name(), time, part)?
    } else {
        None
    };
    Ok(StressOutcome {
        name: part.into(),
        tension: fibre(stress.greatest_tension()),
        compression: fibre(stress.greatest_compression()),
        utilisation: utilisation.map(|u| UtilisationOutcome {
            value: u.value,
            at_m: u.at.to_m(),
        }),
    })
}
