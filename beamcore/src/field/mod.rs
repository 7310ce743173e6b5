//! Results along the member, exact between stations, with their extremes.

mod extremes;
mod piecewise;
mod recut;

pub(crate) use piecewise::{Peak, Piecewise};

use crate::error::{ErrorKind, Problem, Result};
use crate::units::{Length, Quantity};
use std::marker::PhantomData;

/// A greatest or least value and the place where it stands.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Extreme<Q> {
    /// The value, with its sign.
    pub value: Q,
    /// The place, measured from the left end of the member.
    pub at: Length,
}

impl<Q: Quantity> From<Peak> for Extreme<Q> {
    fn from(peak: Peak) -> Self {
        Self {
            value: Q::from_si(peak.value),
            at: Length::from_si(peak.at),
        }
    }
}

/// The values just left and just right of a place.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Sides<Q> {
    /// The value just left of the place.
    pub left: Q,
    /// The value just right of the place.
    pub right: Q,
}

/// A quantity along the member: one polynomial per piece, evaluated anywhere.
///
/// At a support or a point load a shear force has two values; [`Field::sides`] gives both, and no
/// function gives their average.
#[derive(Clone, Debug)]
pub struct Field<Q> {
    line: Piecewise,
    quantity: PhantomData<Q>,
}

impl<Q: Quantity> Field<Q> {
    pub(crate) fn new(line: Piecewise) -> Self {
        Self {
            line,
            quantity: PhantomData,
        }
    }

    /// The values on both sides of the place `at`.
    ///
    /// # Errors
    /// [`ErrorKind::Position`] if the place is not on the member.
    pub fn sides(&self, at: Length) -> Result<Sides<Q>> {
        let Some((left, right)) = self.line.sides(at.si()) else {
            let stations = self.line.stations();
            let [start, end] = [stations[0], stations[stations.len() - 1]].map(Length::from_si);
            return Err(Problem::new(
                ErrorKind::Position,
                "at",
                at.to_string(),
                format!("a place on the line, from {start} to {end}"),
            )
            .into());
        };
        Ok(Sides {
            left: Q::from_si(left),
            right: Q::from_si(right),
        })
    }

    /// The value at the place `at`: where there are two, the one just right of it
    /// (at the right end of the member, the one just left of it).
    ///
    /// # Errors
    /// [`ErrorKind::Position`] if the place is not on the member.
    pub fn value(&self, at: Length) -> Result<Q> {
        Ok(self.sides(at)?.right)
    }

    /// The value of greatest magnitude, with its sign and place; the leftmost of equals.
    #[must_use]
    pub fn greatest(&self) -> Extreme<Q> {
        self.line.greatest().into()
    }

    /// The algebraically greatest value with its place; the leftmost of equals.
    #[must_use]
    pub fn maximum(&self) -> Extreme<Q> {
        self.line.maximum().into()
    }

    /// The algebraically least value with its place; the leftmost of equals.
    #[must_use]
    pub fn minimum(&self) -> Extreme<Q> {
        self.line.minimum().into()
    }

    /// The places where the polynomials meet: ends, supports, point loads, ends of line loads.
    #[must_use]
    pub fn stations(&self) -> Vec<Length> {
        self.line
            .stations()
            .iter()
            .map(|&x| Length::from_si(x))
            .collect()
    }
}
