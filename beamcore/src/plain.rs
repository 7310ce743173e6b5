//! Plain functions over SI numbers, for callers without types, such as the cells of spreadsheets.
//!
//! They hold no formula of their own; each forwards to the room that does. Units stand in the
//! names, as in `width_m`.

#![allow(non_snake_case, reason = "parameters bear the symbols of their units")]

use crate::check;
use crate::error::{Error, ErrorKind, Problem, Result};
use crate::field::Piecewise;
use crate::material::concrete::{Cement, ConcreteCreep};
use crate::material::{Creep, Material};
use crate::member::SAME_PLACE;
use crate::section::{Part, Section, Stiffness, rectangle};
use crate::solve::beam::Beam;
use crate::solve::law::{Law, PlainLayer};
use crate::solve::load::LoadCase;
use crate::solve::piece::PieceLaw;
use crate::solve::states::States;
use crate::solve::station::{Hold, Station};
use crate::time::Time;
use crate::units::{AnyUnit, BendingStiffness, Duration, Force, Length, LineLoad, Modulus, Stress};
use std::sync::Arc;

/// EI of rectangular layers stacked upward and joined rigidly, in N m2: sum of
/// `E_i` (`I_i` + `A_i` `dz_i`^2) about their elastic centroid (see [`Stiffness::bending_yy`]).
///
/// The lists go from the lowest layer upward.
///
/// # Errors
/// Lists of different lengths, no layer, values that are not positive; all are reported.
///
/// # Examples
/// ```
/// use beamcore::plain;
/// let stiffness = plain::stack_bending_stiffness(&[11e9, 11e9], &[0.1, 0.1], &[0.1, 0.1])?;
/// assert!((stiffness - 11e9 * 0.1 * 0.2 * 0.2 * 0.2 / 12.0).abs() < 1e-9 * stiffness);
/// # Ok::<(), beamcore::Error>(())
/// ```
pub fn stack_bending_stiffness(
    modulus_Pa: &[f64],
    width_m: &[f64],
    height_m: &[f64],
) -> Result<f64> {
    Ok(stack(modulus_Pa, width_m, height_m)?.bending_yy().si())
}

/// EA of rectangular layers stacked upward, in N: sum of `E_i` `A_i` (see [`Stiffness::axial`]).
///
/// # Errors
/// As for [`stack_bending_stiffness`].
pub fn stack_axial_stiffness(modulus_Pa: &[f64], width_m: &[f64], height_m: &[f64]) -> Result<f64> {
    Ok(stack(modulus_Pa, width_m, height_m)?.axial().si())
}

/// Height of the elastic centroid of layers stacked upward above the lowest edge, in m: sum of
/// `E_i` `A_i` `z_i` over EA (see [`Stiffness::centroid_z`]).
///
/// # Errors
/// As for [`stack_bending_stiffness`].
pub fn stack_centroid(modulus_Pa: &[f64], width_m: &[f64], height_m: &[f64]) -> Result<f64> {
    Ok(stack(modulus_Pa, width_m, height_m)?.centroid_z().si())
}

/// The stiffness of layers named "layer 1" and so on, with z = 0 at the lowest edge.
fn stack(modulus_Pa: &[f64], width_m: &[f64], height_m: &[f64]) -> Result<Stiffness> {
    let layers = modulus_Pa.len();
    let mut problems = Vec::new();
    for (list, path) in [(width_m, "width_m"), (height_m, "height_m")] {
        if list.len() != layers {
            problems.push(Problem::new(
                ErrorKind::Value,
                path,
                format!("{} numbers", list.len()),
                format!("as many as in modulus_Pa, which are {layers}"),
            ));
        }
    }
    Error::check(problems)?;
    let name = |layer: usize| format!("layer {layer}");
    let parts = (1..).zip(modulus_Pa).zip(width_m.iter().zip(height_m));
    let parts = parts.map(|((layer, modulus), (width, height))| {
        let material = Material::new(name(layer), Modulus::from_Pa(*modulus), Creep::none());
        let height = Length::from_m(*height);
        let part = Part::new(
            name(layer),
            rectangle(Length::from_m(*width), height),
            material,
        );
        if layer == 1 {
            part.at(Length::ZERO, height / 2.0)
        } else {
            part.above(name(layer - 1))
        }
    });
    Ok(Section::of(parts)?.stiffness(Time::Initial))
}

/// The greatest deflection in m of a beam on two supports at its ends under a line load over its
/// whole length, from the solver of members; positive downward, as the load.
///
/// # Errors
/// A span or stiffness that is not positive, a load that is not finite; all are reported.
///
/// # Examples
/// ```
/// use beamcore::plain;
/// let deflection = plain::simple_span_uniform_deflection(4.0, 1e6, 3000.0)?;
/// assert!((deflection - 5.0 * 3000.0 * 256.0 / (384.0 * 1e6)).abs() < 1e-9 * deflection);
/// # Ok::<(), beamcore::Error>(())
/// ```
pub fn simple_span_uniform_deflection(
    span_m: f64,
    bending_stiffness_Nm2: f64,
    load_N_per_m: f64,
) -> Result<f64> {
    let mut problems = span_problems(span_m, bending_stiffness_Nm2);
    let load = LineLoad::from_N_per_m(load_N_per_m);
    check::finite(&mut problems, load, "load_N_per_m");
    Error::check(problems)?;
    greatest_deflection(vec![0.0, span_m], bending_stiffness_Nm2, |case| {
        let deflection = States::BENDING.deflection(0);
        let half = States::BENDING.half();
        case.line[deflection] = load_N_per_m;
        case.line[half + deflection] = load_N_per_m;
    })
}

/// The greatest deflection in m of a beam on two supports at its ends under a point load at a
/// distance from its left end, from the solver of members; positive downward, as the load.
///
/// # Errors
/// A span or stiffness that is not positive, a load that is not finite, a place that is not on the
/// beam; all are reported.
pub fn simple_span_point_deflection(
    span_m: f64,
    bending_stiffness_Nm2: f64,
    load_N: f64,
    at_m: f64,
) -> Result<f64> {
    let mut problems = span_problems(span_m, bending_stiffness_Nm2);
    check::finite(&mut problems, Force::from_N(load_N), "load_N");
    let (at, span) = (Length::from_m(at_m), Length::from_m(span_m));
    if !(at_m >= 0.0 && at_m <= span_m) {
        problems.push(Problem::new(
            ErrorKind::Position,
            "at_m",
            at.to_string(),
            format!("a place on the beam, from 0 m to {span}"),
        ));
    }
    Error::check(problems)?;
    // A load as close as this to a support stands on it, as in a member.
    let slack = span_m * SAME_PLACE;
    let (stations, loaded) = if at_m <= slack {
        (vec![0.0, span_m], 0)
    } else if span_m - at_m <= slack {
        (vec![0.0, span_m], 1)
    } else {
        (vec![0.0, at_m, span_m], 1)
    };
    greatest_deflection(stations, bending_stiffness_Nm2, |case| {
        let states = States::BENDING;
        case.outside[loaded * states.half() + states.deflection(0)] = load_N;
    })
}

fn span_problems(span_m: f64, bending_stiffness_Nm2: f64) -> Vec<Problem> {
    let mut problems = Vec::new();
    check::positive(&mut problems, Length::from_m(span_m), "span_m");
    let stiffness = BendingStiffness::from_N_m2(bending_stiffness_Nm2);
    check::positive(&mut problems, stiffness, "bending_stiffness_Nm2");
    problems
}

/// The greatest deflection of a beam that is held at its two ends, under the loads that `load` sets.
fn greatest_deflection(
    stations: Vec<f64>,
    bending_stiffness: f64,
    load: impl FnOnce(&mut LoadCase),
) -> Result<f64> {
    let states = States::BENDING;
    let layer = PlainLayer {
        // The axial stiffness does not count where no axial force acts.
        axial: 1.0,
        bending: bending_stiffness,
        z: 0.0,
        shear_flexibility: 0.0,
        strand: 0,
    };
    let law = PieceLaw::Prismatic(Arc::new(Law::new(states, vec![layer], &[])));
    let laws = vec![law; stations.len() - 1];
    let mut held = vec![Station::default(); stations.len()];
    for end in [0, laws.len()] {
        let mut direction = vec![0.0; states.half()];
        direction[states.deflection(0)] = 1.0;
        held[end].holds.push(Hold {
            direction,
            stiffness: f64::INFINITY,
        });
    }
    let beam = Beam::new(states, stations, held, &laws).map_err(|_| {
        Problem::new(
            ErrorKind::Mechanism,
            "span_m",
            "a beam that is free to move",
            "a beam on two supports",
        )
    })?;
    let mut case = beam.no_load();
    load(&mut case);
    let solved = beam.solve(&case);
    let mut line = Piecewise::zero(Arc::clone(beam.stations()));
    let pieces = (0..laws.len()).map(|k| beam.field(&solved, k, states.deflection(0)));
    line.add_coefficients(beam.terms(), beam.decays(), pieces, 1.0);
    Ok(line.greatest().value)
}

/// The effective modulus in Pa of a material that creeps, E/(1 + creep factor) (see
/// [`Material::modulus_at`]).
///
/// # Errors
/// A modulus that is not positive, a creep factor outside 0 to 20.
pub fn effective_modulus(modulus_Pa: f64, creep_factor: f64) -> Result<f64> {
    let creep = Creep::factor(creep_factor);
    let material = Material::new("material", Modulus::from_Pa(modulus_Pa), creep);
    Error::check(material.problems())?;
    Ok(material.modulus_at(Time::Final).si())
}

/// The creep coefficient of concrete between two ages (see [`ConcreteCreep::coefficient`]).
///
/// # Errors
/// As for [`ConcreteCreep::coefficient`].
pub fn concrete_creep(
    mean_strength_Pa: f64,
    relative_humidity_percent: f64,
    notional_size_m: f64,
    age_at_loading_s: f64,
    age_at_end_s: f64,
    cement: Cement,
) -> Result<f64> {
    ConcreteCreep {
        mean_strength: Stress::from_Pa(mean_strength_Pa),
        relative_humidity_percent,
        notional_size: Length::from_m(notional_size_m),
        age_at_loading: Duration::from_s(age_at_loading_s),
        age_at_end: Duration::from_s(age_at_end_s),
        cement,
    }
    .coefficient()
}

/// A number of one unit as a number of another unit of the same dimension.
///
/// # Errors
/// [`ErrorKind::Unit`] if a unit is unknown or the dimensions differ, [`ErrorKind::Value`] if the
/// number or the result is NaN or infinite.
///
/// # Examples
/// ```
/// use beamcore::plain::convert;
/// assert_eq!(convert(50.0, "mm", "m")?, 0.05);
/// assert_eq!(convert(1.0, "kN/m", "N/mm")?, 1.0);
/// # Ok::<(), beamcore::Error>(())
/// ```
pub fn convert(value: f64, from_unit: &str, to_unit: &str) -> Result<f64> {
    let quantity = AnyUnit::named(from_unit)?.of(value);
    let result = quantity.number_in(AnyUnit::named(to_unit)?)?;
    if !result.is_finite() {
        return Err(Problem::new(
            ErrorKind::Value,
            "value",
            format!("{value} {from_unit}, which is {result} {to_unit}"),
            "a finite number that stays finite in the other unit",
        )
        .into());
    }
    Ok(result)
}

mod concrete;

pub use concrete::{
    concrete_mean_modulus, concrete_modulus_at_age, concrete_shrinkage, concrete_strength_share,
};

#[cfg(test)]
mod tests;
