//! What is free to move, said in words.

use super::states::{Scale, States};
use std::fmt;

/// A motion that nothing resists.
#[derive(Clone, Copy, Debug, PartialEq)]
pub(crate) enum Motion {
    /// The whole member goes up and down.
    Translation,
    /// The member turns about the place x, in m.
    Rotation(f64),
    /// The member folds at the place x, in m.
    Folding(f64),
    /// The member moves along its axis.
    Sliding,
    /// A layer moves along the member, beside the joint of this number.
    Slipping(usize),
}

impl Motion {
    /// Reads the motion from the scaled states at the nodes, `places` being those of the nodes.
    pub(super) fn new(places: &[f64], motion: &[f64], states: States, scale: &Scale) -> Self {
        let all = states.all();
        // The motion ends where the elimination found it.
        let places = &places[..motion.len() / all];
        let state = |node: usize, i: usize| motion[node * all + i];
        let peak =
            |i: usize| (0..places.len()).fold(0.0_f64, |size, node| size.max(state(node, i).abs()));
        let (w, theta) = (states.deflection(0), states.rotation(0));
        let down = (0..states.strands)
            .map(|strand| peak(states.deflection(strand)))
            .fold(peak(theta), f64::max);
        let rest = (2 * states.strands..states.half()).map(peak);
        let (along, size) =
            rest.enumerate().fold(
                (0, 0.0),
                |best, (i, size)| {
                    if size > best.1 { (i, size) } else { best }
                },
            );
        if size > 1e6 * down {
            let at = 2 * states.strands + along;
            return if states.has_axial && at == states.axial() {
                Self::Sliding
            } else {
                Self::Slipping(at - states.slip(0))
            };
        }
        let slope = |node: usize| state(node, theta) * scale.unit(theta);
        let greatest = peak(theta) * scale.unit(theta);
        for (node, place) in places.iter().enumerate().skip(1) {
            if (slope(node) - slope(node - 1)).abs() > 1e-6 * greatest {
                return Self::Folding(*place);
            }
        }
        let (x, length) = (places[0], places[places.len() - 1] - places[0]);
        let (w, theta) = (state(0, w) * scale.unit(w), slope(0));
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
        // A place is told to the millimetre; -0 is 0.
        let place = |x: f64| (x * 1000.0).round() / 1000.0 + 0.0;
        match self {
            Self::Translation => write!(f, "free to move up and down as a whole"),
            Self::Rotation(x) => write!(f, "free to turn about the place {} m", place(*x)),
            Self::Folding(x) => write!(f, "free to fold at the place {} m", place(*x)),
            Self::Sliding => write!(f, "free to move along its axis"),
            Self::Slipping(joint) => {
                write!(f, "free to slip as a whole in its joint {}", joint + 1)
            }
        }
    }
}
