//! A load case of a member: forces for the solver, free strains of parts, loads by layer.

use crate::section::InitialStrain;
use crate::solve::beam::Beam;
use crate::solve::load::LoadCase;

/// A load case with the free strains that act in it.
#[derive(Clone, Debug)]
pub(crate) struct Case {
    pub(crate) loads: LoadCase,
    /// Per piece, node of it and part of its section; empty if no part strains.
    pub(crate) strains: Vec<Vec<Vec<InitialStrain>>>,
    /// Per merged layer and piece, the load per length square to the member that enters the layer,
    /// at the left and the right end of the piece.
    pub(crate) entered: Vec<Vec<[f64; 2]>>,
}

impl Case {
    /// No load.
    pub(crate) fn none(beam: &Beam) -> Self {
        Self {
            loads: beam.no_load(),
            strains: Vec::new(),
            entered: Vec::new(),
        }
    }

    /// Adds `factor` times another case on the same member.
    pub(crate) fn add(&mut self, other: &Self, factor: f64) {
        self.loads.add(&other.loads, factor);
        if self.strains.is_empty() {
            let none = |parts: &Vec<InitialStrain>| vec![InitialStrain::NONE; parts.len()];
            let pieces = other.strains.iter();
            self.strains = pieces
                .map(|nodes| nodes.iter().map(none).collect())
                .collect();
        }
        let mine = self.strains.iter_mut().flatten().flatten();
        for (sum, strain) in mine.zip(other.strains.iter().flatten().flatten()) {
            *sum = sum.plus(&strain.times(factor));
        }
        self.entered.resize(other.entered.len(), Vec::new());
        for (mine, theirs) in self.entered.iter_mut().zip(&other.entered) {
            mine.resize(theirs.len(), [0.0; 2]);
            for (sum, load) in mine.iter_mut().flatten().zip(theirs.iter().flatten()) {
                *sum += factor * load;
            }
        }
    }

    /// Whether a load acts: anything but free strains and movements of supports.
    pub(crate) fn has_loads(&self) -> bool {
        let any = |numbers: &[f64]| numbers.iter().any(|number| *number != 0.0);
        any(&self.loads.line)
            || any(&self.loads.outside)
            || self.entered.iter().flatten().any(|load| *load != [0.0; 2])
    }

    /// The load per length that enters any of the given layers, per piece.
    pub(crate) fn entering(&self, layers: &[usize]) -> Vec<[f64; 2]> {
        let pieces = self.entered.first().map_or(0, Vec::len);
        (0..pieces)
            .map(|k| {
                layers.iter().fold([0.0; 2], |sum, &layer| {
                    let [left, right] = self.entered[layer][k];
                    [sum[0] + left, sum[1] + right]
                })
            })
            .collect()
    }
}
