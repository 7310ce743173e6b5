//! What is free to move, said in words.

use super::state::{STATES, Scale, THETA, W};
use nalgebra::SVector;
use std::fmt;

/// A motion that no support resists.
#[derive(Clone, Copy, Debug, PartialEq)]
pub(crate) enum Motion {
    /// The whole member goes up and down.
    Translation,
    /// The member turns about the place x, in m.
    Rotation(f64),
}

impl Motion {
    /// Reads the motion from the scaled states at the stations.
    pub(super) fn new(stations: &[f64], states: &[SVector<f64, STATES>], scale: Scale) -> Self {
        let (x, state) = (stations[0], &states[0]);
        let (w, theta) = (state[W] * scale.length, state[THETA]);
        let length = stations[stations.len() - 1] - x;
        // A unit motion: a rotation that is nothing beside the translation is rounding.
        if (theta * length).abs() < 1e-9 * w.abs() {
            Self::Translation
        } else {
            Self::Rotation(x - w / theta)
        }
    }
}

impl fmt::Display for Motion {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        match self {
            Self::Translation => write!(f, "free to move up and down as a whole"),
            Self::Rotation(x) => {
                // A place is told to the millimetre; -0 is 0.
                let x = (x * 1000.0).round() / 1000.0 + 0.0;
                write!(f, "free to turn about the place {x} m")
            }
        }
    }
}
