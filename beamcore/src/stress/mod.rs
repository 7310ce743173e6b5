//! Normal stress in each part, along the member, with its extremes and utilisation.

mod utilisation;

pub use utilisation::Utilisation;

use crate::error::Result;
use crate::field::{Extreme, Field, Piecewise};
use crate::response::Response;
use crate::time::Time;
use crate::units::{Length, Stress};

/// A greatest stress with its place along the member and over the height.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct StressExtreme {
    /// The stress, tension positive.
    pub value: Stress,
    /// The place along the member.
    pub at: Length,
    /// The height z of the fibre in the section's coordinates.
    pub z: Length,
}

/// The normal stress in one part: at its bottom, its own centroid and its top.
///
/// sigma = -`E_i` M (z - `z_n`)/EI, tension positive; at the end of the life the sum of two such terms,
/// one per share of the load, each with its own moduli, centroid and EI.
#[derive(Clone, Debug)]
pub struct PartStress {
    bottom: Piecewise,
    centroid: Piecewise,
    top: Piecewise,
    heights: [Length; 2],
}

impl Response {
    /// The normal stress in a part.
    ///
    /// # Errors
    /// [`crate::ErrorKind::Lookup`] if there is no such combination or part.
    pub fn stress(&self, combination: &str, time: Time, part: &str) -> Result<PartStress> {
        let section = self.member().section();
        let index = section.index(part)?;
        let placed = &section.placed()[index];
        let moments = self.parted_moment(combination, time)?;
        let line = |z: Length| {
            let mut line = moments[0].zeroed();
            for (moment, time) in moments.iter().zip(Time::ALL) {
                let stiffness = &self.member().state(time).stiffness;
                let arm = (z - stiffness.centroid_z()).si();
                let modulus = stiffness.moduli()[index].si();
                line.add(
                    moment.pieces(),
                    -modulus * arm / stiffness.bending_yy().si(),
                );
            }
            line
        };
        Ok(PartStress {
            bottom: line(placed.bottom()),
            centroid: line(placed.centroid_z()),
            top: line(placed.top()),
            heights: [placed.bottom(), placed.top()],
        })
    }
}

impl PartStress {
    /// The stress along the bottom fibre of the part.
    #[must_use]
    pub fn bottom(&self) -> Field<Stress> {
        Field::new(self.bottom.clone())
    }

    /// The stress along the part's own centroid.
    #[must_use]
    pub fn centroid(&self) -> Field<Stress> {
        Field::new(self.centroid.clone())
    }

    /// The stress along the top fibre of the part.
    #[must_use]
    pub fn top(&self) -> Field<Stress> {
        Field::new(self.top.clone())
    }

    /// The greatest tension in the part (the algebraically greatest stress) with its place.
    #[must_use]
    pub fn greatest_tension(&self) -> StressExtreme {
        let [bottom, top] = [self.bottom.maximum(), self.top.maximum()].map(Extreme::from);
        if top.value > bottom.value {
            self.extreme(top, 1)
        } else {
            self.extreme(bottom, 0)
        }
    }

    /// The greatest compression in the part (the algebraically least stress) with its place.
    #[must_use]
    pub fn greatest_compression(&self) -> StressExtreme {
        let [bottom, top] = [self.bottom.minimum(), self.top.minimum()].map(Extreme::from);
        if top.value < bottom.value {
            self.extreme(top, 1)
        } else {
            self.extreme(bottom, 0)
        }
    }

    fn extreme(&self, extreme: Extreme<Stress>, fibre: usize) -> StressExtreme {
        StressExtreme {
            value: extreme.value,
            at: extreme.at,
            z: self.heights[fibre],
        }
    }
}
