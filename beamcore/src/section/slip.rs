//! What the slip modulus of a joint follows from.

use super::layer::stretch_problems;
use crate::check;
use crate::error::{ErrorKind, Problem};
use crate::path;
use crate::units::{FastenerStiffness, Length, Modulus, SlipModulus};

/// What the slip modulus k of a joint follows from; k is a force per length of the joint and slip.
///
/// # Examples
/// ```
/// use beamcore::section::{Slip, Spacing};
/// use beamcore::units::Number;
/// let screws = Slip::Fasteners {
///     stiffness: 10.kN_per_mm(),
///     rows: 2,
///     planes: 1,
///     spacing: Spacing::Uniform(150.mm()),
/// };
/// // k = 2 * 1 * 10 000 N/mm / 150 mm
/// assert_eq!(format!("{:.3}", screws.modulus_at(1.m())), "133.333 N/mm2");
/// ```
#[derive(Clone, Debug, PartialEq)]
pub enum Slip {
    /// As given, all along the joint.
    Modulus(SlipModulus),
    /// Of fasteners in rows: k = rows planes K/spacing.
    Fasteners {
        /// The slip modulus K of one fastener in one shear plane.
        stiffness: FastenerStiffness,
        /// How many rows run along the member, at least one.
        rows: u32,
        /// In how many shear planes a fastener works, at least one.
        planes: u32,
        /// The spacing along a row.
        spacing: Spacing,
    },
    /// Of a soft layer of glue: k = G b/t.
    Glue {
        /// The shear modulus G of the glue.
        shear_modulus: Modulus,
        /// The width b of the glue line across the member.
        width: Length,
        /// The thickness t of the glue.
        thickness: Length,
    },
}

/// The spacing of fasteners along a row.
#[derive(Clone, Debug, PartialEq)]
pub enum Spacing {
    /// The same all along.
    Uniform(Length),
    /// One spacing in each band; there are no fasteners outside of the bands.
    Bands(Vec<Band>),
}

/// A length of the member with one spacing.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Band {
    /// Where it begins, from the left end of the member.
    pub from: Length,
    /// Where it ends.
    pub to: Length,
    /// The spacing of the fasteners of a row.
    pub spacing: Length,
}

impl Spacing {
    /// The spacing at x; `None` outside of all bands. Where two bands meet it is that of the left
    /// one.
    #[must_use]
    pub fn at(&self, x: Length) -> Option<Length> {
        match self {
            Self::Uniform(spacing) => Some(*spacing),
            Self::Bands(bands) => bands
                .iter()
                .filter(|band| band.from <= x && x <= band.to)
                .min_by(|a, b| a.from.si().total_cmp(&b.from.si()))
                .map(|band| band.spacing),
        }
    }
}

impl Slip {
    /// The short-term slip modulus at x, from the left end of the member; zero where there are no
    /// fasteners.
    #[must_use]
    pub fn modulus_at(&self, x: Length) -> SlipModulus {
        match self {
            Self::Modulus(modulus) => *modulus,
            Self::Fasteners {
                stiffness,
                rows,
                planes,
                spacing,
            } => spacing.at(x).map_or(SlipModulus::ZERO, |spacing| {
                f64::from(*rows) * f64::from(*planes) * *stiffness / spacing
            }),
            Self::Glue {
                shear_modulus,
                width,
                thickness,
            } => SlipModulus::from_si(shear_modulus.si() * width.si() / thickness.si()),
        }
    }

    /// Where the modulus changes along the member: the ends of the bands.
    #[must_use]
    pub fn places(&self) -> Vec<Length> {
        match self {
            Self::Fasteners {
                spacing: Spacing::Bands(bands),
                ..
            } => bands.iter().flat_map(|band| [band.from, band.to]).collect(),
            Self::Modulus(_) | Self::Fasteners { .. } | Self::Glue { .. } => Vec::new(),
        }
    }

    /// What is wrong with the values, given the path of the joint's kind.
    pub(super) fn problems(&self, problems: &mut Vec<Problem>, base: &str) {
        match self {
            Self::Modulus(modulus) => {
                let at = path::key(&path::key(base, "slipping"), "modulus");
                check::positive(problems, *modulus, &at);
            }
            Self::Fasteners {
                stiffness,
                rows,
                planes,
                spacing,
            } => {
                let base = path::key(base, "fasteners");
                check::positive(problems, *stiffness, &path::key(&base, "stiffness"));
                at_least_one(problems, *rows, &path::key(&base, "rows"));
                at_least_one(problems, *planes, &path::key(&base, "planes"));
                spacing.problems(problems, &base);
            }
            Self::Glue {
                shear_modulus,
                width,
                thickness,
            } => {
                let base = path::key(base, "glue");
                check::positive(problems, *shear_modulus, &path::key(&base, "shear_modulus"));
                check::positive(problems, *width, &path::key(&base, "width"));
                check::positive(problems, *thickness, &path::key(&base, "thickness"));
            }
        }
    }
}

impl Spacing {
    fn problems(&self, problems: &mut Vec<Problem>, base: &str) {
        let bands = match self {
            Self::Uniform(spacing) => {
                return check::positive(problems, *spacing, &path::key(base, "spacing"));
            }
            Self::Bands(bands) => bands,
        };
        let base = path::key(base, "bands");
        if bands.is_empty() {
            problems.push(Problem::new(
                ErrorKind::Missing,
                &base,
                "no bands",
                "at least one band",
            ));
        }
        let before = problems.len();
        for (i, band) in bands.iter().enumerate() {
            let at = path::indexed(&base, i);
            stretch_problems(problems, (band.from, band.to), &at);
            check::positive(problems, band.spacing, &path::key(&at, "spacing"));
        }
        if problems.len() == before {
            problems.extend(overlaps(bands, &base));
        }
    }
}

/// A problem for each band that begins before an earlier one of the list has ended.
fn overlaps(bands: &[Band], base: &str) -> Vec<Problem> {
    let mut problems = Vec::new();
    for (i, band) in bands.iter().enumerate() {
        let shared = |other: &&Band| band.from < other.to && other.from < band.to;
        if let Some(other) = bands[..i].iter().find(shared) {
            problems.push(Problem::new(
                ErrorKind::Position,
                path::indexed(base, i),
                format!(
                    "a band from {} to {}, which overlaps the one from {} to {}",
                    band.from, band.to, other.from, other.to
                ),
                "bands that meet at the most",
            ));
        }
    }
    problems
}

fn at_least_one(problems: &mut Vec<Problem>, number: u32, path: &str) {
    if number == 0 {
        problems.push(Problem::new(ErrorKind::Value, path, "0", "a number from 1"));
    }
}
