//! Stress against design strength.

use super::PartStress;
use crate::error::Result;
use crate::field::Peak;
use crate::material::DesignStrength;
use crate::response::Response;
use crate::time::Time;
use crate::units::{Length, Stress};

/// The greatest utilisation of a part: stress over design strength.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Utilisation {
    /// The ratio; above 1 the part is overstressed.
    pub value: f64,
    /// The place along the member.
    pub at: Length,
}

impl Response {
    /// The greatest utilisation of a part; `None` if its material has no design strengths.
    ///
    /// Timber: |centroid stress|/`f_t` or `f_c` + |edge stress - centroid stress|/`f_m`.
    /// Metal: greatest |stress|/`f_y`.
    ///
    /// # Errors
    /// [`crate::ErrorKind::Lookup`] if there is no such combination or part.
    pub fn utilisation(
        &self,
        combination: &str,
        time: Time,
        part: &str,
    ) -> Result<Option<Utilisation>> {
        let stress = self.stress(combination, time, part)?;
        let material = self.member().part(part)?.0.material();
        Ok(material
            .strength()
            .map(|strength| greatest(&stress, strength)))
    }
}

fn greatest(stress: &PartStress, strength: &DesignStrength) -> Utilisation {
    let peak = match *strength {
        DesignStrength::Timber {
            bending,
            tension,
            compression,
        } => timber(stress, bending, tension, compression),
        DesignStrength::Metal { yield_stress } => {
            let start = Peak {
                value: 0.0,
                at: stress.centroid.stations()[0],
            };
            stress.lines().fold(start, |best, line| {
                let peak = line.greatest().scaled(1.0 / yield_stress.si());
                larger(
                    best,
                    Peak {
                        value: peak.value.abs(),
                        ..peak
                    },
                )
            })
        }
    };
    Utilisation {
        value: peak.value,
        at: Length::from_si(peak.at),
    }
}

/// Each sign of the two stresses gives one line along the member; the greatest of all is the sum
/// of magnitudes, because a wrong sign only makes it smaller.
fn timber(stress: &PartStress, bending: Stress, tension: Stress, compression: Stress) -> Peak {
    let mut best = Peak {
        value: 0.0,
        at: stress.centroid.stations()[0],
    };
    for edge in stress.lines() {
        for (axial, remainder) in [
            (tension.si(), bending.si()),
            (tension.si(), -bending.si()),
            (-compression.si(), bending.si()),
            (-compression.si(), -bending.si()),
        ] {
            let mut line = stress.centroid.zeroed();
            line.add(&stress.centroid, 1.0 / axial - 1.0 / remainder);
            line.add(edge, 1.0 / remainder);
            best = larger(best, line.maximum());
        }
    }
    best
}

fn larger(a: Peak, b: Peak) -> Peak {
    if b.value > a.value { b } else { a }
}
