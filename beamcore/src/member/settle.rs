//! How a member stands under one combination, where superposition fails: supports that it may lift
//! off, and joints that carry only when their clearance is used up.
//!
//! Supports: pivoting on the complementarity of reaction and gap; all that are wrong change at
//! once while that helps, then the first of them only (Murty's rule), which is finite (Judice and
//! Pires, Investigacion Operativa, 1994, from memory). Joints: Newton's method; the force is piecewise linear in
//! the slip, so a step is a linear solution with the stretches cut where the last slip meets the
//! clearance.

use super::case::Case;
use super::layout::{Engaged, Held, HeldBy, Layout, Situation};
use super::load_case::clearance_case;
use super::{Member, SAME_PLACE};
use crate::error::{ErrorKind, Problem, Result};
use crate::field::Piecewise;
use crate::solve::beam::{Beam, Solved};
use crate::time::Time;
use std::sync::Arc;

/// More steps than any member needs.
const STEPS: usize = 200;

/// A member that stands still under one combination.
#[derive(Clone, Debug)]
pub(crate) struct Settled {
    pub(crate) layout: Arc<Layout>,
    pub(crate) beam: Arc<Beam>,
    pub(crate) solved: Solved,
    pub(crate) case: Case,
    /// The positions of the supports that it has left.
    pub(crate) lifted: Vec<usize>,
    /// The number of linear solutions.
    pub(crate) steps: usize,
    /// Where clearances are used up, as for the situation.
    pub(crate) situation: Situation,
}

/// Solves a member at a time for the loads that `loads` lays out.
pub(crate) fn settle(
    member: &Member,
    time: Time,
    loads: &dyn Fn(&Layout, &Beam) -> Case,
) -> Result<Settled> {
    let clearances: Vec<(usize, f64)> = member
        .section()
        .slips()
        .iter()
        .enumerate()
        .filter(|(_, joint)| joint.clearance() > 0.0)
        .map(|(j, joint)| (j, joint.clearance()))
        .collect();
    let length = member.length().si();
    let mut situation = Situation::default();
    let mut wrong_before = usize::MAX;
    let mut is_first = true;
    for step in 1..=STEPS {
        let (layout, beam) = stand(member, time, &situation)?;
        let mut case = loads(&layout, &beam);
        // The first solution has no clearance: its slip tells where to begin.
        if !is_first {
            let taken = clearance_case(&layout, member.plan(), &beam, time, &situation);
            case.loads.add(&taken.loads, 1.0);
        }
        let solved = beam.solve(&case.loads);
        let mut next = Situation {
            lifted: lifted(
                member,
                &layout,
                &beam,
                &solved,
                &case,
                &situation,
                &mut wrong_before,
            ),
            engaged: Vec::new(),
        };
        for &(joint, clearance) in &clearances {
            next.engaged
                .push((joint, stretches(&layout, &beam, &solved, joint, clearance)));
        }
        if !is_first && next.lifted == situation.lifted && near(&next, &situation, length) {
            return Ok(Settled {
                layout,
                beam,
                solved,
                case,
                lifted: situation.lifted.clone(),
                steps: step,
                situation,
            });
        }
        situation = next;
        is_first = false;
    }
    Err(Problem::new(
        ErrorKind::Numerical,
        "member",
        format!("no equilibrium of one-way supports and clearances after {STEPS} steps"),
        "loads under which the member stands on its supports",
    )
    .into())
}

fn stand(member: &Member, time: Time, situation: &Situation) -> Result<(Arc<Layout>, Arc<Beam>)> {
    let mut cuts = Vec::new();
    for (_, stretches) in &situation.engaged {
        for stretch in stretches {
            cuts.extend([stretch.from, stretch.to]);
        }
    }
    let layout = if cuts.is_empty() {
        Arc::clone(member.layout())
    } else {
        Arc::new(Layout::new(member.plan(), member.stretches(), &cuts)?)
    };
    let beam = layout.beam(time, situation, member.plan())?;
    Ok((layout, Arc::new(beam)))
}

/// The supports that should be left after a solution.
fn lifted(
    member: &Member,
    layout: &Layout,
    beam: &Beam,
    solved: &Solved,
    case: &Case,
    situation: &Situation,
    wrong_before: &mut usize,
) -> Vec<usize> {
    let mut wrong = Vec::new();
    for (hold, (station, by)) in layout.held_by().enumerate() {
        let HeldBy::Support(i, Held::Deflection) = by else {
            continue;
        };
        if !member.supports()[i].is_one_way() || wrong.contains(&i) {
            continue;
        }
        let is_lifted = situation.lifted.contains(&i);
        let is_wrong = if is_lifted {
            // It has sunk below its support.
            let piece = station.min(layout.pieces.len() - 1);
            let line = beam.field(solved, piece, layout.states.deflection(0));
            let w = if station == piece {
                line[0]
            } else {
                line[..beam.terms()].iter().sum()
            };
            w > case.loads.moved[hold]
        } else {
            solved.reactions[hold] < 0.0
        };
        if is_wrong {
            wrong.push(i);
        }
    }
    let mut next = situation.lifted.clone();
    let change = if wrong.len() < *wrong_before {
        *wrong_before = wrong.len().max(1);
        wrong
    } else {
        wrong.into_iter().take(1).collect()
    };
    for i in change {
        match next.iter().position(|known| *known == i) {
            Some(at) => {
                next.remove(at);
            }
            None => next.push(i),
        }
    }
    next.sort_unstable();
    next
}

/// Where the slip of a joint is beyond its clearance, with its sign.
fn stretches(
    layout: &Layout,
    beam: &Beam,
    solved: &Solved,
    joint: usize,
    clearance: f64,
) -> Vec<Engaged> {
    let slip = layout.states.slip(joint);
    let mut line = Piecewise::zero(Arc::clone(beam.stations()));
    let pieces = (0..layout.pieces.len()).map(|k| beam.field(solved, k, slip));
    line.add_coefficients(beam.terms(), beam.decays(), pieces, 1.0);
    let mut cuts: Vec<f64> = line.stations().to_vec();
    for shift in [clearance, -clearance] {
        let mut shifted = line.clone();
        shifted.shift_by_piece(|_| shift);
        cuts.extend(shifted.sign_changes());
    }
    cuts.sort_by(f64::total_cmp);
    let mut found: Vec<Engaged> = Vec::new();
    for ends in cuts.windows(2) {
        let middle = f64::midpoint(ends[0], ends[1]);
        let value = line.sides(middle).map_or(0.0, |sides| sides.1);
        if value.abs() <= clearance {
            continue;
        }
        match found.last_mut() {
            Some(last) if last.to == ends[0] && last.sign == value.signum() => last.to = ends[1],
            _ => found.push(Engaged {
                from: ends[0],
                to: ends[1],
                sign: value.signum(),
            }),
        }
    }
    found
}

/// Whether two situations carry over the same stretches.
fn near(a: &Situation, b: &Situation, length: f64) -> bool {
    let same = |a: &Engaged, b: &Engaged| {
        (a.from - b.from).abs() <= SAME_PLACE * length
            && (a.to - b.to).abs() <= SAME_PLACE * length
            && a.sign == b.sign
    };
    a.engaged.len() == b.engaged.len()
        && a.engaged
            .iter()
            .zip(&b.engaged)
            .all(|((_, a), (_, b))| a.len() == b.len() && a.iter().zip(b).all(|(a, b)| same(a, b)))
}
