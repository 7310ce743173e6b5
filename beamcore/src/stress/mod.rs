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
    response: Response,
    part: String,
    fibres: Vec<Fibre>,
    centroid: Piecewise,
}

/// A fibre and the stress along it.
#[derive(Clone, Debug)]
struct Fibre {
    at: FibreAt,
    line: Piecewise,
}

impl Response {
    /// The normal stress in a part.
    ///
    /// # Errors
    /// [`crate::ErrorKind::Lookup`] if there is no such combination or part.
    pub fn stress(&self, combination: &str, time: Time, part: &str) -> Result<PartStress> {
        let (placed, _) = self.member().part(part)?;
        let line = |fibre: &FibreAt| {
            self.fibre_stress(combination, time, part, |placed| fibre.point(placed))
        };
        let fibres = fibres(placed, &self.directions());
        Ok(PartStress {
            response: self.clone(),
            part: part.into(),
            fibres: fibres
                .into_iter()
                .map(|at| {
                    Ok(Fibre {
                        line: line(&at)?,
                        at,
                    })
                })
                .collect::<Result<_>>()?,
            centroid: line(&FibreAt::Centroid)?,
        })
    }

    /// The directions in which the strain grows: r for each of the two shares of the load.
    fn directions(&self) -> [f64; 2] {
        let member = self.member();
        Time::ALL.map(|time| {
            let stiffness = member.section().stiffness(time);
            stiffness.against_bending(member.sideways()).1
        })
    }
}

/// Where a fibre runs in its part.
#[derive(Clone, Copy, Debug, PartialEq)]
enum FibreAt {
    Bottom,
    Top,
    Centroid,
    Point(Point),
}

impl FibreAt {
    fn point(self, placed: &PlacedPart) -> Point {
        let middle = ((placed.left() + placed.right()) / 2.0).si();
        match self {
            Self::Bottom => Point::new(middle, placed.bottom().si()),
            Self::Top => Point::new(middle, placed.top().si()),
            Self::Centroid => Point::new(placed.net().y, placed.net().z),
            Self::Point(point) => point,
        }
    }
}

/// The points of a part that can be stressed most: the bottom, then the top, for members that bend
/// about the level axis only; for others every corner, and where arcs reach farthest in the
/// directions of the two shares of the load.
fn fibres(placed: &PlacedPart, directions: &[f64; 2]) -> Vec<FibreAt> {
    if directions.iter().all(|r| *r == 0.0) {
        return vec![FibreAt::Bottom, FibreAt::Top];
    }
    let region = placed.region();
    let mut points: Vec<FibreAt> = Vec::new();
    let mut add = |point: Point| {
        if !points.contains(&FibreAt::Point(point)) {
            points.push(FibreAt::Point(point));
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
        let mut best = (of(&self.fibres[0].line), self.fibres[0].at);
        for fibre in &self.fibres[1..] {
            let peak = of(&fibre.line);
            if is_better(peak.value, best.0.value) {
                best = (peak, fibre.at);
            }
        }
        let (peak, at) = best;
        let point = self.point(at, Length::from_si(peak.at));
        StressExtreme {
            value: Stress::from_si(peak.value),
            at: Length::from_si(peak.at),
            y: Length::from_si(point.y),
            z: Length::from_si(point.z),
        }
    }

    /// Where a fibre lies at a place along the member.
    fn point(&self, fibre: FibreAt, at: Length) -> Point {
        let member = self.response.member();
        let here = member.section_at(at).ok();
        let here = here.as_ref().and_then(|s| s.part(&self.part).ok());
        // Where the part has just ended, it lies as at its beginning.
        let first = member.part(&self.part).ok().map(|(part, _)| part);
        here.or(first)
            .map_or(Point::new(0.0, 0.0), |placed| fibre.point(placed))
    }
}
