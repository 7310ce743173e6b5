//! From the solved member to the outcome document.

use super::document::{
    AccuracyOutcome, CombinationOutcome, FactorOutcome, FibreOutcome, MaterialOutcome,
    MemberOutcome, OutcomeDocument, PartOutcome, PartStiffnessOutcome, ReactionOutcome,
    ResultsOutcome, SectionOutcome, StiffnessOutcome, StrengthOutcome, StressOutcome,
    TransformedOutcome, TransformedPartOutcome, TransformedStateOutcome, UtilisationOutcome,
};
use super::document_deflection::{SpanDeflectionOutcome, SpanOutcome};
use super::{build_deflection, build_forces, notes};
use crate::error::Result;
use crate::job::Job;
use crate::material::{DesignStrength, Material};
use crate::member::{Combination, Member, Span};
use crate::response::Response;
use crate::section::{PlacedPart, Section};
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
        materials: materials(member.section()),
        section: section(job)?,
        member: member_outcome(job),
        combinations: combinations?,
        components: build_deflection::components(&response, camber.as_ref())?,
        limits: build_deflection::limits(&response, job.limits(), camber.as_ref())?,
        camber: camber
            .as_ref()
            .map(|camber| build_deflection::camber(&response, camber, job.trestles()))
            .transpose()?,
        accuracy: AccuracyOutcome {
            residual: response.residual(),
        },
        assumptions: notes::assumptions(job),
        warnings: Vec::new(),
        not_checked: notes::not_checked(job),
    };
    document.warnings = notes::warnings(member, &document);
    Ok(document)
}

fn member_outcome(job: &Job) -> MemberOutcome {
    let member = job.member();
    let span = |span: &Span| SpanOutcome {
        name: span.name().into(),
        from_m: span.from().to_m(),
        to_m: span.to().to_m(),
        cantilever: span.is_cantilever(),
    };
    MemberOutcome {
        length_m: member.length().to_m(),
        quantity: job.document().quantity.unwrap_or(1),
        spans: member.spans().iter().map(span).collect(),
        mass_kg: member
            .section()
            .line_mass()
            .map(|mass| (mass * member.length()).to_kg()),
    }
}

/// Each material once, in the order of the parts.
pub(super) fn distinct(section: &Section) -> Vec<&Material> {
    let mut materials: Vec<&Material> = Vec::new();
    for part in section.placed() {
        if !materials
            .iter()
            .any(|known| known.name() == part.material().name())
        {
            materials.push(part.material());
        }
    }
    materials
}

fn materials(section: &Section) -> Vec<MaterialOutcome> {
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
    distinct(section).into_iter().map(outcome).collect()
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

fn section(job: &Job) -> Result<SectionOutcome> {
    let member = job.member();
    let section = member.section();
    let transformed = distinct(section).into_iter().map(|material| {
        let name = material.name();
        Ok(TransformedOutcome {
            name: name.into(),
            initial: transformed(section, name, Time::Initial)?,
            end: transformed(section, name, Time::Final)?,
        })
    });
    Ok(SectionOutcome {
        initial: stiffness(section, Time::Initial),
        end: stiffness(section, Time::Final),
        parts: section
            .placed()
            .iter()
            .enumerate()
            .map(|(i, p)| part(member, p, i))
            .collect(),
        forces: build_forces::forces(job)?,
        transformed: transformed.collect::<Result<_>>()?,
    })
}

fn stiffness(section: &Section, time: Time) -> StiffnessOutcome {
    let stiffness = section.stiffness(time);
    let principal = stiffness.principal();
    StiffnessOutcome {
        principal_greater_Nm2: principal.greater.to_N_m2(),
        principal_smaller_Nm2: principal.smaller.to_N_m2(),
        principal_angle_rad: principal.angle.to_rad(),
        axial_stiffness_N: stiffness.axial().to_N(),
        centroid_y_m: stiffness.centroid_y().to_m(),
        centroid_z_m: stiffness.centroid_z().to_m(),
        bending_stiffness_yy_Nm2: stiffness.bending_yy().to_N_m2(),
        bending_stiffness_zz_Nm2: stiffness.bending_zz().to_N_m2(),
        bending_stiffness_yz_Nm2: stiffness.bending_yz().to_N_m2(),
    }
}

fn part(member: &Member, part: &PlacedPart, index: usize) -> PartOutcome {
    let section = member.section();
    let state = |time| {
        let stiffness = section.stiffness(time);
        PartStiffnessOutcome {
            modulus_Pa: stiffness.moduli()[index].to_Pa(),
            share: stiffness.shares()[index],
        }
    };
    PartOutcome {
        name: part.name().into(),
        material: part.material().name().into(),
        outline: part.outline().name().into(),
        left_m: part.left().to_m(),
        right_m: part.right().to_m(),
        bottom_m: part.bottom().to_m(),
        top_m: part.top().to_m(),
        area_m2: part.area().to_m2(),
        line_mass_kg_per_m: part.line_mass().map(|mass| mass.to_kg_per_m()),
        mass_kg: part
            .line_mass()
            .map(|mass| (mass * member.length()).to_kg()),
        initial: state(Time::Initial),
        end: state(Time::Final),
    }
}

fn transformed(section: &Section, name: &str, time: Time) -> Result<TransformedStateOutcome> {
    let transformed = section.transformed_to(name, time)?;
    let parts = transformed
        .parts()
        .iter()
        .map(|part| TransformedPartOutcome {
            name: part.name.clone(),
            ratio: part.ratio,
            width_m: part.width.to_m(),
            loops_m: part
                .loops
                .iter()
                .map(|corners| corners.iter().map(|(y, z)| [y.to_m(), z.to_m()]).collect())
                .collect(),
        });
    Ok(TransformedStateOutcome {
        reference_modulus_Pa: transformed.reference_modulus().to_Pa(),
        area_m2: transformed.area().to_m2(),
        centroid_z_m: transformed.centroid_z().to_m(),
        second_moment_m4: transformed.second_moment().to_m4(),
        parts: parts.collect(),
    })
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
        })
    });
    let stresses = member
        .section()
        .placed()
        .iter()
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
        shear: (&response.shear(name, time)?).into(),
        moment: (&response.moment(name, time)?).into(),
        reactions: reactions.collect::<Result<_>>()?,
        stresses: stresses.collect::<Result<_>>()?,
    })
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
