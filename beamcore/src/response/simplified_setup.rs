//! A simplified method set up for a span of a member, and the member without slip that it stands for.

use super::simplified_types::SimplifiedMethod;
use crate::error::{ErrorKind, Problem, Result};
use crate::member::{Layout, Member, Span};
use crate::section::{JointKind, Slip, Spacing};
use crate::simplified::{
    Gamma, LayerInput, LayerStress, ReferenceLength, SineLayers, Warning, effective_spacing,
};
use crate::solve::beam::Beam;
use crate::solve::law::{Law, PlainLayer};
use crate::solve::load::LoadCase;
use crate::solve::piece::PieceLaw;
use crate::solve::states::States;
use crate::time::Time;
use crate::units::{
    AxialStiffness, BendingStiffness, Force, Length, Modulus, Moment, ShearFlow, SlipModulus,
};
use std::sync::Arc;

/// Either method, set up for a span at a time.
pub(super) enum Method {
    Gamma(Gamma),
    Sine(SineLayers),
}

impl Method {
    pub(super) const fn bending_stiffness(&self) -> BendingStiffness {
        match self {
            Self::Gamma(gamma) => gamma.bending_stiffness(),
            Self::Sine(sine) => sine.bending_stiffness(),
        }
    }

    pub(super) fn flows(&self, shear: Force) -> Result<Vec<ShearFlow>> {
        match self {
            Self::Gamma(gamma) => gamma.flows(shear),
            Self::Sine(sine) => sine.flows(shear),
        }
    }

    pub(super) fn stresses(&self, moment: Moment) -> Result<Vec<LayerStress>> {
        match self {
            Self::Gamma(gamma) => gamma.stresses(moment),
            Self::Sine(sine) => sine.stresses(moment),
        }
    }
}

/// The layers in their order upward, and the joint between each two neighbours.
pub(super) struct Stack {
    pub(super) layers: Vec<usize>,
    pub(super) joints: Vec<usize>,
}

/// The layers from the lowest upward; each joint must lie between two neighbours.
pub(super) fn stack(member: &Member) -> Result<Stack> {
    let section = member.section();
    let heights = section.layer_stiffness(Time::Initial);
    let mut layers: Vec<usize> = (0..heights.len()).collect();
    layers.sort_by(|&a, &b| heights[a].z.total_cmp(&heights[b].z));
    let joints: Option<Vec<usize>> = layers
        .windows(2)
        .map(|pair| {
            let slips = section.slips().iter();
            slips
                .enumerate()
                .find(|(_, joint)| joint.lower == pair[0] && joint.upper == pair[1])
                .map(|(j, _)| j)
        })
        .collect();
    match joints {
        Some(joints) => Ok(Stack { layers, joints }),
        None => Err(Problem::new(
            ErrorKind::Value,
            "section.joints",
            "joints that do not each lie between a layer and the next one above it",
            "layers on each other, for the simplified methods",
        )
        .into()),
    }
}

/// What the reference length of a span is taken from.
pub(super) fn reference(member: &Member, span: &Span) -> ReferenceLength {
    if span.is_cantilever() {
        ReferenceLength::Cantilever(span.length())
    } else if member.spans().len() == 1 {
        ReferenceLength::Span(span.length())
    } else {
        ReferenceLength::Continuous(span.length())
    }
}

/// The least and the greatest spacing of a joint; `None` where it has no fasteners in bands.
fn spacings(slip: &Slip) -> Option<(Length, Length)> {
    let Slip::Fasteners {
        spacing: Spacing::Bands(bands),
        ..
    } = slip
    else {
        return None;
    };
    let mut all = bands.iter().map(|band| band.spacing);
    let first = all.next()?;
    Some(all.fold((first, first), |(least, most), s| {
        (least.min(s), most.max(s))
    }))
}

/// The slip modulus of a joint as the methods take it: with the effective spacing.
fn modulus(member: &Member, j: usize, time: Time) -> Result<SlipModulus> {
    let section = member.section();
    let placed = &section.placed_joints()[section.slips()[j].joint];
    let JointKind::Slipping(slip) = placed.joint().kind() else {
        return Ok(SlipModulus::ZERO);
    };
    let initial = match (slip, spacings(slip)) {
        (
            Slip::Fasteners {
                stiffness,
                rows,
                planes,
                ..
            },
            Some((least, most)),
        ) => {
            let spacing = effective_spacing(least, most)?.spacing;
            f64::from(*rows) * f64::from(*planes) * *stiffness / spacing
        }
        _ => slip.modulus_at(Length::ZERO),
    };
    Ok(match time {
        Time::Initial => initial,
        Time::Final => initial / (1.0 + placed.creep()),
    })
}

pub(super) fn set_up(
    member: &Member,
    span: &Span,
    stack: &Stack,
    time: Time,
    method: SimplifiedMethod,
) -> Result<Method> {
    let section = member.section();
    let stiffness = section.layer_stiffness(time);
    let inputs: Vec<LayerInput> = stack
        .layers
        .iter()
        .map(|&merged| {
            let own = &stiffness[merged];
            let parts = section.merged_layers()[merged].parts().iter();
            let parts: Vec<_> = parts.map(|&p| &section.placed()[p]).collect();
            let bottom = parts
                .iter()
                .map(|p| p.bottom().si())
                .fold(f64::INFINITY, f64::min);
            let top = parts
                .iter()
                .map(|p| p.top().si())
                .fold(f64::NEG_INFINITY, f64::max);
            let area: f64 = parts.iter().map(|p| p.net().area).sum();
            // A layer of one part has its own modulus; of several, their mean.
            LayerInput {
                axial: AxialStiffness::from_si(own.axial),
                bending: BendingStiffness::from_si(own.bending),
                height: Length::from_si(top - bottom),
                centroid_z: Length::from_si(own.z),
                modulus: Modulus::from_si(own.axial / area),
                width: Length::from_si(area / (top - bottom)),
            }
        })
        .collect();
    let joints: Vec<SlipModulus> = stack
        .joints
        .iter()
        .map(|&j| modulus(member, j, time))
        .collect::<Result<_>>()?;
    let length = reference(member, span);
    Ok(match method {
        SimplifiedMethod::Gamma => Method::Gamma(Gamma::of(&inputs, &joints, length)?),
        SimplifiedMethod::SineLayers => Method::Sine(SineLayers::of(&inputs, &joints, length)?),
    })
}

/// The limits of the method and of the effective spacings.
pub(super) fn warnings(member: &Member, method: &Method) -> Result<Vec<Warning>> {
    let mut all = match method {
        Method::Gamma(gamma) => gamma.warnings().to_vec(),
        Method::Sine(sine) => sine.warnings().to_vec(),
    };
    for placed in member.section().placed_joints() {
        if let JointKind::Slipping(slip) = placed.joint().kind()
            && let Some((least, most)) = spacings(slip)
        {
            for warning in effective_spacing(least, most)?.warnings {
                if !all.contains(&warning) {
                    all.push(warning);
                }
            }
        }
    }
    Ok(all)
}

/// The member without slip, each span with its effective stiffness at a time.
pub(super) fn beam(member: &Member, methods: &[[Method; 2]], time: Time) -> Result<Beam> {
    let layout = member.layout();
    let states = States::BENDING;
    let laws: Vec<Arc<Law>> = methods
        .iter()
        .map(|methods| {
            let layer = PlainLayer {
                axial: 1.0,
                bending: methods[time.index()].bending_stiffness().si(),
                z: 0.0,
                shear_flexibility: 0.0,
                strand: 0,
            };
            Arc::new(Law::new(states, vec![layer], &[]))
        })
        .collect();
    let pieces: Vec<PieceLaw> = layout
        .places
        .windows(2)
        .map(|ends| {
            let middle = f64::midpoint(ends[0], ends[1]);
            let spans = member.spans();
            let own = spans.iter().position(|span| middle < span.to().si());
            PieceLaw::Prismatic(Arc::clone(&laws[own.unwrap_or(spans.len() - 1)]))
        })
        .collect();
    let stations = layout.bending_stations();
    Beam::new(states, layout.places.clone(), stations, &pieces)
        .map_err(|why| layout.unsolvable(why, member.plan()).into())
}

/// The transverse part of a load case, for the member without slip.
pub(super) fn transverse(layout: &Layout, beam: &Beam, loads: &LoadCase) -> LoadCase {
    let mut own = beam.no_load();
    let (half, whole) = (States::BENDING.half(), layout.states.half());
    for (mine, theirs) in own
        .line
        .chunks_exact_mut(half)
        .zip(loads.line.chunks_exact(whole))
    {
        mine.copy_from_slice(&theirs[..half]);
    }
    for (mine, theirs) in own
        .outside
        .chunks_exact_mut(half)
        .zip(loads.outside.chunks_exact(whole))
    {
        mine.copy_from_slice(&theirs[..half]);
    }
    // Without axial force and anchors all holds are of deflections and rotations.
    let moved = own.moved.len();
    own.moved.copy_from_slice(&loads.moved[..moved]);
    own
}
