//! The sections of the outcome, and the member as a whole.

use super::build::distinct;
use super::document_deflection::SpanOutcome;
use super::document_member::{ChangeOutcome, MemberOutcome};
use super::document_section::{
    PartOutcome, PartStiffnessOutcome, SectionOutcome, StiffnessOutcome, TransformedOutcome,
    TransformedPartOutcome, TransformedStateOutcome,
};
use super::mass::{mass, mass_of_part};
use super::{build_forces, build_layers};
use crate::error::Result;
use crate::job::Job;
use crate::member::{ShearModel, Span, shear_stiffness};
use crate::section::Section;
use crate::time::Time;
use crate::units::{Length, Mass};

/// The member as a whole.
pub(super) fn member(job: &Job) -> Result<MemberOutcome> {
    let member = job.member();
    let span = |span: &Span| SpanOutcome {
        name: span.name().into(),
        from_m: span.from().to_m(),
        to_m: span.to().to_m(),
        cantilever: span.is_cantilever(),
    };
    let shear = member.shear_model();
    let documents = job.document().member.changes.iter();
    let changes = member.changes().iter().zip(documents);
    let changes = changes.map(|(change, document)| {
        let section = change.section();
        Ok(ChangeOutcome {
            kind: change.name().into(),
            from_m: change.from().to_m(),
            to_m: change.to().to_m(),
            section: document.section().into(),
            initial: stiffness(section, change.to(), shear, Time::Initial)?,
            end: stiffness(section, change.to(), shear, Time::Final)?,
            parts: (0..section.placed().len())
                .map(|index| part(section, index, None))
                .collect(),
        })
    });
    Ok(MemberOutcome {
        length_m: member.length().to_m(),
        quantity: job.document().quantity.unwrap_or(1),
        spans: member.spans().iter().map(span).collect(),
        mass_kg: mass(member).map(|mass| mass.to_kg()),
        pitch_rad: member.pitch().map(|angle| angle.to_rad()),
        shear: shear.name().into(),
        axial_force: member.has_axial_force(),
        changes: changes.collect::<Result<_>>()?,
    })
}

/// The section with which the member begins.
pub(super) fn section(job: &Job) -> Result<SectionOutcome> {
    let member = job.member();
    let section = member.section();
    let transformed = distinct(section.placed()).into_iter().map(|material| {
        let name = material.name();
        Ok(TransformedOutcome {
            name: name.into(),
            initial: transformed(section, name, Time::Initial)?,
            end: transformed(section, name, Time::Final)?,
        })
    });
    let shear = member.shear_model();
    Ok(SectionOutcome {
        initial: stiffness(section, Length::ZERO, shear, Time::Initial)?,
        end: stiffness(section, Length::ZERO, shear, Time::Final)?,
        parts: (0..section.placed().len())
            .map(|index| {
                let mass = mass_of_part(member, section.placed()[index].name());
                part(section, index, mass)
            })
            .collect(),
        layers: build_layers::layers(section),
        joints: build_layers::joints(section, member.length()),
        forces: build_forces::forces(job)?,
        transformed: transformed.collect::<Result<_>>()?,
    })
}

/// The stiffness of a section that begins at a place of the member.
fn stiffness(
    section: &Section,
    at: Length,
    shear: ShearModel,
    time: Time,
) -> Result<StiffnessOutcome> {
    let stiffness = section.stiffness(time);
    let principal = stiffness.principal();
    Ok(StiffnessOutcome {
        principal_greater_Nm2: principal.greater.to_N_m2(),
        principal_smaller_Nm2: principal.smaller.to_N_m2(),
        principal_angle_rad: principal.angle.to_rad(),
        axial_stiffness_N: stiffness.axial().to_N(),
        centroid_y_m: stiffness.centroid_y().to_m(),
        centroid_z_m: stiffness.centroid_z().to_m(),
        bending_stiffness_yy_Nm2: stiffness.bending_yy().to_N_m2(),
        bending_stiffness_zz_Nm2: stiffness.bending_zz().to_N_m2(),
        bending_stiffness_yz_Nm2: stiffness.bending_yz().to_N_m2(),
        shear_stiffness_N: shear_stiffness(section, at, shear, time)?.map(|kga| kga.to_N()),
    })
}

fn part(section: &Section, index: usize, mass: Option<Mass>) -> PartOutcome {
    let part = &section.placed()[index];
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
        mass_kg: mass.map(|mass| mass.to_kg()),
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
