//! Normal stress in each part, along the member, with its extremes and utilisation.

mod utilisation;

pub use utilisation::Utilisation;

use crate::error::Result;
use crate::field::{Field, Peak, Piecewise};
use crate::outline::Point;
use crate::response::Response;
use crate::section::PlacedPart;
use crate::time::Time;
use crate::units::{Length, Stress};

/// A greatest stress with its place along the member and over the height.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct StressExtreme {
    /// The stress, tension positive.
    pub value: Stress,
    /// The place along the member.
    pub at: Length,
    /// The y of the fibre in the section's coordinates; the middle of the part where the member is
    /// held sideways, for then all points of one height are stressed alike.
    pub y: Length,
    /// The height z of the fibre in the section's coordinates.
    pub z: Length,
}

/// The normal stress in one part: along the fibres that can be stressed most, and along its own
/// centroid.
///
/// sigma = -`E_i` M ((z - `z_n`) + r (y - `y_n`))/EI, tension positive, with r = 0 where the member
/// is held sideways, else r = -`EI_yz`/`EI_zz` and EI = `EI_yy` - `EI_yz`^2/`EI_zz`; at the end of
/// the life the sum of two such terms, one per share of the load, each with its own moduli.
#[derive(Clone, Debug)]
pub struct PartStress {
    fibres: Vec<Fibre>,
    centroid: Piecewise,
}

/// A fibre and the stress along it.
#[derive(Clone, Debug)]
struct Fibre {
    point: Point,
    line: Piecewise,
}

impl Response {
    /// The normal stress in a part.
    ///
    /// # Errors
    /// [`crate::ErrorKind::Lookup`] if there is no such combination or part.
    pub fn stress(&self, combination: &str, time: Time, part: &str) -> Result<PartStress> {
        let member = self.member();
        let index = member.section().index(part)?;
        let placed = &member.section().placed()[index];
        let moments = self.parted_moment(combination, time)?;
        let line = |point: Point| {
            let mut line = moments[0].zeroed();
            for (moment, share) in moments.iter().zip(Time::ALL) {
                let stiffness = &member.state(share).stiffness;
                let (bending, ratio) = stiffness.against_bending(member.sideways());
                let arm = (point.z - stiffness.centroid_z().si())
                    + ratio * (point.y - stiffness.centroid_y().si());
                let modulus = stiffness.moduli()[index].si();
                line.add(moment.pieces(), -modulus * arm / bending.si());
            }
            line.shift(self.self_stress(index, point, time));
            line
        };
        let fibres = fibres(placed, &self.directions());
        Ok(PartStress {
            fibres: fibres
                .into_iter()
                .map(|point| Fibre {
                    point,
                    line: line(point),
                })
                .collect(),
            centroid: line(Point::new(placed.net().y, placed.net().z)),
        })
    }

    /// The stress that the initial strains of the parts make without any load or restraint:
    /// E (eps of the free section - eps* of the part), with the moduli of the time.
    fn self_stress(&self, part: usize, point: Point, time: Time) -> f64 {
        let state = self.member().state(time);
        let placed = &self.member().section().placed()[part];
        let strain = placed.initial_strain();
        let (y, z) = (Length::from_si(point.y), Length::from_si(point.z));
        let centroid = (placed.centroid_y(), placed.centroid_z());
        let elastic = state.free.strain_at(y, z) - strain.at(centroid, y, z);
        (state.stiffness.moduli()[part] * elastic).si()
    }

    /// The directions in which the strain grows: r for each of the two shares of the load.
    fn directions(&self) -> [f64; 2] {
        let member = self.member();
        Time::ALL.map(|time| {
            let stiffness = &member.state(time).stiffness;
            stiffness.against_bending(member.sideways()).1
        })
    }
}

/// The points of a part that can be stressed most: the bottom, then the top, for members that bend
/// about the level axis only; for others every corner, and where arcs reach farthest in the
/// directions of the two shares of the load.
fn fibres(placed: &PlacedPart, directions: &[f64; 2]) -> Vec<Point> {
    let middle = ((placed.left() + placed.right()) / 2.0).si();
    if directions.iter().all(|r| *r == 0.0) {
        let at = |z: Length| Point::new(middle, z.si());
        return vec![at(placed.bottom()), at(placed.top())];
    }
    let region = placed.region();
    let mut points: Vec<Point> = Vec::new();
    let mut add = |point: Point| {
        if !points.contains(&point) {
            points.push(point);
        }
    };
    for r in directions {
        add(region.least(*r, 1.0).at);
        add(region.greatest(*r, 1.0).at);
    }
    region.edges().for_each(|edge| add(edge.from()));
    points
}

impl PartStress {
    /// The stress along the fibre at the bottom of the part. Of a member that is free sideways, the
    /// one with the least strain under a sagging moment: the lowest in the direction of bending.
    #[must_use]
    pub fn bottom(&self) -> Field<Stress> {
        Field::new(self.fibres[0].line.clone())
    }

    /// The stress along the part's own centroid.
    #[must_use]
    pub fn centroid(&self) -> Field<Stress> {
        Field::new(self.centroid.clone())
    }

    /// The stress along the fibre at the top of the part; see [`PartStress::bottom`].
    #[must_use]
    pub fn top(&self) -> Field<Stress> {
        Field::new(self.fibres[1].line.clone())
    }

    /// The greatest tension in the part (the algebraically greatest stress) with its place.
    #[must_use]
    pub fn greatest_tension(&self) -> StressExtreme {
        self.extreme(Piecewise::maximum, |new, best| new > best)
    }

    /// The greatest compression in the part (the algebraically least stress) with its place.
    #[must_use]
    pub fn greatest_compression(&self) -> StressExtreme {
        self.extreme(Piecewise::minimum, |new, best| new < best)
    }

    /// The stress along all fibres, for checks against strengths.
    fn lines(&self) -> impl Iterator<Item = &Piecewise> {
        self.fibres.iter().map(|fibre| &fibre.line)
    }

    fn extreme(
        &self,
        of: fn(&Piecewise) -> Peak,
        is_better: fn(f64, f64) -> bool,
    ) -> StressExtreme {
        let mut best = (of(&self.fibres[0].line), self.fibres[0].point);
        for fibre in &self.fibres[1..] {
            let peak = of(&fibre.line);
            if is_better(peak.value, best.0.value) {
                best = (peak, fibre.point);
            }
        }
        let (peak, point) = best;
        StressExtreme {
            value: Stress::from_si(peak.value),
            at: Length::from_si(peak.at),
            y: Length::from_si(point.y),
            z: Length::from_si(point.z),
        }
    }
}
