//! Free strains of the parts: warming, temperature difference, shrinkage and their like.

use super::load_case::Builder;
use crate::section::{InitialStrain, PlacedPart};
use crate::units::{Curvature, Strain, TemperatureChange};

impl Builder<'_> {
    pub(super) fn warm(&mut self, change: TemperatureChange, parts: &[String]) {
        self.strain(|_, part| {
            let is_named = parts.is_empty() || parts.iter().any(|name| name == part.name());
            let alpha = part.material().expansion().filter(|_| is_named);
            InitialStrain {
                axial: alpha.map_or(Strain::ZERO, |alpha| alpha * change),
                ..InitialStrain::NONE
            }
        });
    }

    /// Every part strains by alpha dT (z - middle)/height at each height z.
    pub(super) fn gradient(&mut self, difference: TemperatureChange) {
        self.strain(|placed, part| {
            let bottoms = placed.iter().map(|p| p.bottom().si());
            let tops = placed.iter().map(|p| p.top().si());
            let (bottom, top) = (
                bottoms.fold(f64::INFINITY, f64::min),
                tops.fold(f64::NEG_INFINITY, f64::max),
            );
            let alpha = part.material().expansion();
            let whole = alpha.map_or(Strain::ZERO, |alpha| alpha * difference);
            let slope = whole.si() / (top - bottom);
            InitialStrain {
                axial: Strain::from_si(slope * (part.net().z - f64::midpoint(bottom, top))),
                curvature_y: Curvature::from_si(-slope),
                ..InitialStrain::NONE
            }
        });
    }

    /// Adds free strains, told for each part among the parts of its section.
    pub(super) fn strain(&mut self, of: impl Fn(&[PlacedPart], &PlacedPart) -> InitialStrain) {
        let layout = self.layout;
        let (half, strands) = (layout.states.half(), layout.states.strands);
        let gradients = half - strands;
        self.case.strains.resize(layout.pieces.len(), Vec::new());
        for (k, piece) in layout.pieces.iter().enumerate() {
            self.case.strains[k].resize(piece.nodes.len(), Vec::new());
            for (n, node) in piece.nodes.iter().enumerate() {
                let placed = node.section.placed();
                let strains: Vec<_> = placed.iter().map(|part| of(placed, part)).collect();
                let known = &mut self.case.strains[k][n];
                known.resize(placed.len(), InitialStrain::NONE);
                for (sum, strain) in known.iter_mut().zip(&strains) {
                    *sum = sum.plus(strain);
                }
                let law = layout.law_of(node, self.time);
                let free = law.free_gradients(&node.free(self.time, &strains));
                let target = if piece.is_prismatic() {
                    &mut self.case.loads.free[gradients * k..gradients * (k + 1)]
                } else {
                    let first = n * (half + gradients) + half;
                    &mut self.case.loads.at_nodes[k][first..first + gradients]
                };
                for (sum, gradient) in target.iter_mut().zip(free) {
                    *sum += gradient;
                }
            }
        }
    }
}
