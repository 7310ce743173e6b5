//! Shear stiffness kGA of parts that are glued over their whole height, by energy.

mod slab;
#[cfg(test)]
mod tests;

use super::placed::PlacedPart;
use super::{Section, Stiffness};
use crate::error::{Error, ErrorKind, Problem, Result};
use crate::outline::CONTACT;
use crate::path;
use crate::time::Time;
use crate::units::{Length, Modulus, ShearStiffness};
use slab::{Flank, Slab, flanks, slabs};

/// What is meant by kGA, for definitions of the shear coefficient differ.
pub const SHEAR_STIFFNESS_DEFINITION: &str =
    "shear coefficient by energy of the shear stress V ES/(b EI); 5/6 for a rectangle";

/// Positive node and the weights of the Gauss-Legendre rule of 3 points on (-1, 1): sqrt(3/5), 5/9
/// and 8/9. Source: Abramowitz and Stegun, Handbook of Mathematical Functions, table 25.4 (from
/// memory). It is exact up to the fifth power; ES(z)^2 is of the fourth.
const GAUSS: (f64, f64, f64) = (0.6, 5.0 / 9.0, 8.0 / 9.0);

impl Section {
    /// The shear stiffness at a time of a section whose parts are glued over their whole height,
    /// so that they act as one layer, bent about the level axis:
    /// kGA = EI^2/int [ES(z)^2/(sum of `b_i` `G_i`)] dz over the height, with ES(z) the sum of
    /// `E_i` `S_i` of what lies above z. It is worked out exactly.
    ///
    /// Source: energy of the shear stress V ES/(b EI), e.g. Gere and Goodno, Mechanics of Materials,
    /// from memory. Other definitions give other shear coefficients; see
    /// [`SHEAR_STIFFNESS_DEFINITION`].
    ///
    /// # Errors
    /// All of: a material without a shear modulus, an outline with a sloping or curved edge, a
    /// height at which there is no material; layers that may slip on each other, of which each has a
    /// shear stiffness of its own.
    ///
    /// # Examples
    /// ```
    /// use beamcore::material::{ServiceClass, timber};
    /// use beamcore::section::{Part, Section, rectangle};
    /// use beamcore::time::Time;
    /// use beamcore::units::Number;
    /// let timber = timber("C24", ServiceClass::One)?; // G = 690 MPa
    /// let section = Section::of([Part::new("joist", rectangle(80.mm(), 200.mm()), timber)])?;
    /// let stiffness = section.shear_stiffness(Time::Initial)?;
    /// assert!((stiffness.to_kN() - 5.0 / 6.0 * 0.690 * 80.0 * 200.0).abs() < 1e-9);
    /// # Ok::<(), beamcore::Error>(())
    /// ```
    pub fn shear_stiffness(&self, time: Time) -> Result<ShearStiffness> {
        let layers = self.merged_layers().len();
        if layers > 1 {
            return Err(Problem::new(
                ErrorKind::Geometry,
                "section.joints",
                format!("joints that let {layers} layers slip on each other"),
                "rigid joints, for one shear stiffness of the whole section",
            )
            .into());
        }
        layer_shear_stiffness(&self.placed.iter().collect::<Vec<_>>(), time)
    }

    /// The shear stiffness at a time of a section whose parts stand side by side, with their
    /// centroids at one height, and are only fastened to each other: each part bears the share
    /// `EI_i`/EI of V with a shear stress of its own, so that
    /// 1/kGA = sum of (`EI_i`/EI)^2/`kGA_i`, with `kGA_i` as in [`Section::shear_stiffness`].
    ///
    /// Source: energy of the parts, each bent by the same curvature.
    ///
    /// # Errors
    /// As for [`Section::shear_stiffness`]; parts with their centroids at different heights; a part
    /// that is set into another.
    pub fn fastened_shear_stiffness(&self, time: Time) -> Result<ShearStiffness> {
        let level = self.stiffness(time).centroid_z();
        let (mut own, mut bending, mut problems) = (Vec::new(), Vec::new(), Vec::new());
        for part in &self.placed {
            if (part.centroid_z() - level).abs() > part.outline().height() * CONTACT {
                problems.push(Problem::new(
                    ErrorKind::Geometry,
                    path::key(&path::named("section.parts", part.name()), "place"),
                    format!("a centroid at z = {}", part.centroid_z()),
                    format!(
                        "all centroids at one height, here z = {level}, as parts that are only \
                         fastened side by side have them"
                    ),
                ));
            }
            bending.push(Stiffness::new([part], time).bending_yy().si());
            match layer_shear_stiffness(&[part], time) {
                Ok(stiffness) => own.push(stiffness.si()),
                Err(error) => problems.extend(error.problems().iter().cloned()),
            }
        }
        Error::check(distinct(problems))?;
        Ok(ShearStiffness::from_si(side_by_side(&own, &bending)))
    }
}

/// The shear stiffness at a time of parts that are glued over their whole height; see
/// [`Section::shear_stiffness`].
pub(crate) fn layer_shear_stiffness(parts: &[&PlacedPart], time: Time) -> Result<ShearStiffness> {
    let mut problems = Vec::new();
    let mut edges: Vec<Flank> = Vec::new();
    for part in parts {
        if part.material().mean_shear_modulus().is_none() {
            problems.push(no_shear_modulus(part));
        }
        if foreign_insert(part, parts) {
            problems.push(Problem::new(
                ErrorKind::Geometry,
                path::named("section.parts", part.name()),
                "a host of a part that is not glued to it, for which the shear stiffness is not \
                 worked out",
                "a part that belongs to one layer with all that is set into it, or the shear \
                 stiffness kGA of its layer as a value",
            ));
        }
        let host = parts.iter().find(|host| part.host() == Some(host.name()));
        // Where a part is set in, its host is not.
        let net = |of: &dyn Fn(&PlacedPart) -> Option<Modulus>| {
            let of = |part: &PlacedPart| of(part).map_or(0.0, Modulus::si);
            of(part) - host.map_or(0.0, |host| of(host))
        };
        let modulus = net(&|part| Some(part.material().modulus_at(time)));
        let shear = net(&|part| part.material().shear_modulus_at(time));
        match flanks(&part.region(), modulus, shear) {
            Some(flanks) => edges.extend(flanks),
            None => problems.push(Problem::new(
                ErrorKind::Geometry,
                path::key(&path::named("section.parts", part.name()), "outline"),
                "a sloping or curved edge, with which the shear stiffness is not worked out yet",
                "edges that are level or upright, or the shear stiffness kGA as a value",
            )),
        }
    }
    Error::check(distinct(problems))?;
    let slabs = slabs(&edges).map_err(|(from, to)| gap(from, to))?;
    let stiffness = Stiffness::new(parts.iter().copied(), time);
    let bending = stiffness.bending_yy().si();
    let energy = energy(&slabs, stiffness.centroid_z().si());
    Ok(ShearStiffness::from_si(bending * bending / energy))
}

/// 1 over the sum of (`EI_i`/EI)^2/`kGA_i`: the shear stiffness of what stands side by side, each
/// bearing the share `EI_i`/EI of the shear force.
pub(crate) fn side_by_side(kga: &[f64], ei: &[f64]) -> f64 {
    let whole: f64 = ei.iter().sum();
    let flexibility: f64 = kga
        .iter()
        .zip(ei)
        .map(|(kga, ei)| {
            let share = ei / whole;
            share * share / kga
        })
        .sum();
    1.0 / flexibility
}

/// int [ES(z)^2/(sum of b G)] dz over slabs from the lowest upward.
fn energy(slabs: &[Slab], centroid: f64) -> f64 {
    let (node, beside, middle) = (GAUSS.0.sqrt(), GAUSS.1, GAUSS.2);
    let (mut energy, mut below) = (0.0, 0.0);
    for slab in slabs {
        let (low, half) = (slab.bottom - centroid, (slab.top - slab.bottom) / 2.0);
        // ES of what lies below a height is that of what lies above it, with the other sign.
        let first = |way: f64| below - slab.axial * way * (low + way / 2.0);
        let square = |way: f64| first(way) * first(way);
        let sum = beside * (square(half - half * node) + square(half + half * node))
            + middle * square(half);
        energy += sum * half / slab.shear;
        below = first(2.0 * half);
    }
    energy
}

/// Whether something is set into a part that is not among the given parts.
fn foreign_insert(host: &PlacedPart, parts: &[&PlacedPart]) -> bool {
    let known: f64 = parts
        .iter()
        .filter(|part| part.host() == Some(host.name()))
        .map(|part| part.whole().area)
        .sum();
    let whole = host.whole().area;
    whole - host.net().area - known > CONTACT * whole
}

fn no_shear_modulus(part: &PlacedPart) -> Problem {
    let material = path::named("materials", part.material().name());
    Problem::new(
        ErrorKind::Missing,
        path::key(&material, "shear_modulus"),
        "no shear modulus",
        "a shear modulus or Poisson's ratio, without which there is no shear stiffness",
    )
}

fn gap(from: f64, to: f64) -> Problem {
    let (from, to) = (Length::from_si(from), Length::from_si(to));
    Problem::new(
        ErrorKind::Geometry,
        "section.parts",
        format!("no material between z = {from} and z = {to}"),
        "parts of a layer that leave no height without material, or the shear stiffness kGA as a \
         value",
    )
}

/// The problems without those that stand there already.
fn distinct(problems: Vec<Problem>) -> Vec<Problem> {
    let mut kept: Vec<Problem> = Vec::with_capacity(problems.len());
    for problem in problems {
        if !kept.contains(&problem) {
            kept.push(problem);
        }
    }
    kept
}
