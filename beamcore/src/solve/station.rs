//! What a station demands of the states on its two sides.
//!
//! Displacements are continuous but for releases (hinges); forces jump by what acts on the station
//! from outside and by what holds it. A hold resists c . d, one direction c over the displacements:
//! the forces jump by f+ - f- = -F + sum of c k (c . d - moved). In units in which c has the length
//! one this is written, for each hold with its dual direction b (b . c = 1, b . others = 0),
//!
//! 1/(1 + k) b . (f+ - f- + F) = k/(1 + k) (c . d - moved),
//!
//! so that a stiffness of nothing and one without bound are ordinary.

use super::directions::{dot, duals, scaled, split};
use super::relation::Relation;
use super::states::{Scale, States};

/// One direction that is held.
#[derive(Clone, Debug, PartialEq)]
pub(crate) struct Hold {
    /// The direction over the displacements.
    pub(crate) direction: Vec<f64>,
    /// Force per displacement in SI units; infinite where it is rigid.
    pub(crate) stiffness: f64,
}

/// What is held and what is released at a station.
#[derive(Clone, Debug, Default, PartialEq)]
pub(crate) struct Station {
    pub(crate) holds: Vec<Hold>,
    /// Directions in which the displacements may part.
    pub(crate) releases: Vec<Vec<f64>>,
}

/// A direction that is held is the sum of others that are held there too.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub(crate) struct HeldTwice;

/// A station in scaled states.
#[derive(Clone, Debug)]
pub(super) struct Conditions {
    half: usize,
    /// Per hold: unit direction, dual direction, both weights, and its length.
    holds: Vec<ScaledHold>,
    /// Directions that no hold resists.
    free: Vec<Vec<f64>>,
    /// Directions of the release, and those that stay continuous.
    releases: Vec<Vec<f64>>,
    continuous: Vec<Vec<f64>>,
}

#[derive(Clone, Debug)]
struct ScaledHold {
    direction: Vec<f64>,
    dual: Vec<f64>,
    soft: f64,
    stiff: f64,
    length: f64,
}

impl ScaledHold {
    /// The one displacement along which it lies, if it does.
    fn axis(&self) -> Option<usize> {
        self.direction.iter().position(|c| *c == 1.0)
    }
}

impl Conditions {
    pub(super) fn new(station: &Station, states: States, scale: &Scale) -> Result<Self, HeldTwice> {
        let half = states.half();
        let in_units = |direction: &[f64]| -> Vec<f64> {
            (0..half).map(|i| direction[i] * scale.unit(i)).collect()
        };
        let directions: Vec<_> = station
            .holds
            .iter()
            .map(|h| in_units(&h.direction))
            .collect();
        let (held, free) = split(half, &directions).ok_or(HeldTwice)?;
        let duals = duals(&held);
        let energy = scale.unit(0) * scale.unit(half);
        let holds = station
            .holds
            .iter()
            .zip(directions)
            .zip(held.iter().zip(duals));
        let holds = holds.map(|((hold, direction), (unit, dual))| {
            let length = dot(&direction, unit);
            let stiffness = hold.stiffness * length * length / energy;
            let (soft, stiff) = if stiffness > 1.0 {
                (
                    1.0 / stiffness / (1.0 + 1.0 / stiffness),
                    1.0 / (1.0 + 1.0 / stiffness),
                )
            } else {
                (1.0 / (1.0 + stiffness), stiffness / (1.0 + stiffness))
            };
            ScaledHold {
                direction: unit.clone(),
                dual,
                soft,
                stiff,
                length,
            }
        });
        // The displacements in units are those over their units: a release of size 1/unit.
        let released: Vec<Vec<f64>> = station
            .releases
            .iter()
            .map(|r| (0..half).map(|i| r[i] / scale.unit(i)).collect())
            .collect();
        let (releases, continuous) = split(half, &released).ok_or(HeldTwice)?;
        Ok(Self {
            half,
            holds: holds.collect(),
            free,
            releases,
            continuous,
        })
    }

    /// The number of holds.
    pub(super) fn count(&self) -> usize {
        self.holds.len()
    }

    /// The displacement along which each hold lies; only for holds along one each.
    pub(super) fn axis_holds(&self) -> impl Iterator<Item = usize> {
        self.holds.iter().filter_map(ScaledHold::axis)
    }

    /// The displacements that are held rigidly one by one, if that is all this station demands.
    pub(super) fn simple(&self, axes: usize) -> Option<Vec<usize>> {
        if !self.releases.is_empty() {
            return None;
        }
        let along = |hold: &ScaledHold| {
            let axis = hold.axis()?;
            (hold.soft == 0.0 && axis < axes).then_some(axis)
        };
        self.holds.iter().map(along).collect()
    }

    /// The h conditions on the state inside an end of the member; `sign` is 1 at the left end,
    /// where the member lies right of the station, and -1 at the right end.
    pub(super) fn end(&self, sign: f64) -> Vec<f64> {
        let all = 2 * self.half;
        let mut rows = vec![0.0; self.half * all];
        let mut row = rows.chunks_exact_mut(all);
        let mut put = |displacement: &[f64], force: &[f64]| {
            let row = row.next().expect("as many conditions as displacements");
            row[..self.half].copy_from_slice(displacement);
            row[self.half..].copy_from_slice(force);
        };
        for hold in &self.holds {
            put(
                &scaled(&hold.direction, -hold.stiff),
                &scaled(&hold.dual, sign * hold.soft),
            );
        }
        for free in &self.free {
            put(&scaled(free, 0.0), &scaled(free, sign));
        }
        rows
    }

    /// The right-hand sides of [`Conditions::end`]: `outside` are the forces in units, `moved` by
    /// how much each hold moves.
    pub(super) fn end_side(&self, outside: &[f64], moved: &[f64]) -> Vec<f64> {
        let held = self.holds.iter().zip(moved).map(|(hold, moved)| {
            -hold.soft * dot(&hold.dual, outside) - hold.stiff * moved / hold.length
        });
        held.chain(self.free.iter().map(|free| -dot(free, outside)))
            .collect()
    }

    /// The equations between the states left and right of the station.
    pub(super) fn relation(&self) -> Relation {
        let (half, all) = (self.half, 2 * self.half);
        let mut relation = Relation::zero(all);
        let mut row = 0;
        for direction in &self.continuous {
            for (i, c) in direction.iter().enumerate() {
                relation.left[row * all + i] = -c;
                relation.right[row * all + i] = *c;
            }
            row += 1;
        }
        for direction in &self.releases {
            relation.left[row * all + half..(row + 1) * all].copy_from_slice(direction);
            row += 1;
        }
        let conditions = self.end(1.0);
        for condition in conditions.chunks_exact(all) {
            for i in 0..half {
                relation.right[row * all + i] = condition[i];
                relation.right[row * all + half + i] = condition[half + i];
                relation.left[row * all + half + i] = -condition[half + i];
            }
            row += 1;
        }
        relation
    }

    /// The right-hand sides of [`Conditions::relation`].
    pub(super) fn relation_side(&self, outside: &[f64], moved: &[f64]) -> Vec<f64> {
        let mut side = vec![0.0; self.half];
        side.extend(self.end_side(outside, moved));
        side
    }

    /// The force of each hold, in the unit of the forces over the direction's length: b . jump,
    /// with `jump` = f+ - f- + F in units.
    pub(super) fn held_forces(&self, jump: &[f64], scale: &Scale) -> impl Iterator<Item = f64> {
        let energy = scale.unit(0) * scale.unit(self.half);
        self.holds
            .iter()
            .map(move |hold| dot(&hold.dual, jump) * energy / hold.length)
    }

    /// What is left of the conditions in units, of displacements and of forces: `displacements`
    /// are those right of the station, `before` displacements and forces left of it (none at an
    /// end of the member), `jump` = f+ - f- + F.
    pub(super) fn left_over(
        &self,
        displacements: &[f64],
        before: Option<(&[f64], &[f64])>,
        jump: &[f64],
        moved: &[f64],
    ) -> (f64, f64) {
        let mut forces = 0.0_f64;
        let mut gaps = 0.0_f64;
        for free in &self.free {
            forces = forces.max(dot(free, jump).abs());
        }
        for (hold, moved) in self.holds.iter().zip(moved) {
            let d = dot(&hold.direction, displacements) - moved / hold.length;
            let left = (hold.soft * dot(&hold.dual, jump) - hold.stiff * d).abs();
            gaps = gaps.max(left);
        }
        if let Some((left, left_forces)) = before {
            for direction in &self.continuous {
                let gap = dot(direction, displacements) - dot(direction, left);
                gaps = gaps.max(gap.abs());
            }
            for direction in &self.releases {
                forces = forces.max(dot(direction, left_forces).abs());
            }
        }
        (gaps, forces)
    }
}
