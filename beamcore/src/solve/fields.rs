//! From the states at the nodes to the fields over the pieces.

use super::beam::{Beam, Solved, Tie};
use super::load::LoadCase;
use super::residual;

impl Beam {
    /// The fields from the states at the nodes.
    pub(super) fn fields_of(&self, load: &LoadCase, nodes: &[f64]) -> Solved {
        let half = self.states.half();
        let all = 2 * half;
        let last = self.pieces.len();
        let per_piece = self.fields() * self.width();
        let mut coefficients = vec![0.0; last * per_piece];
        let mut defects = vec![0.0; all];
        let mut node = 0;
        let mut end = vec![0.0; all];
        for (k, piece) in self.pieces.iter().enumerate() {
            let start = &nodes[node * all..(node + 1) * all];
            end.copy_from_slice(&nodes[(node + 1) * all..(node + 2) * all]);
            node += 1;
            match self.ties.get(k) {
                Some(Tie::Shared(_)) => {
                    for (force, outside) in end[half..].iter_mut().zip(load.at_station(k + 1)) {
                        *force += outside;
                    }
                }
                Some(Tie::Parted) => node += 1,
                None => {}
            }
            let out = &mut coefficients[k * per_piece..(k + 1) * per_piece];
            let defect = piece.fields([start, &end], &load.piece(k), self.terms, self.width(), out);
            for (sum, more) in defects.iter_mut().zip(defect) {
                *sum += more;
            }
        }
        let mut solved = Solved {
            coefficients,
            reactions: Vec::new(),
            residual: 0.0,
        };
        residual::complete(self, load, &mut solved, &defects);
        // Only now, for the conditions hold the slip of such joints at one place.
        self.centre_loose(&mut solved);
        solved
    }

    /// Shifts the slip of joints that nothing holds to zero mean.
    fn centre_loose(&self, solved: &mut Solved) {
        let length = self.places[self.places.len() - 1] - self.places[0];
        for &joint in &self.loose {
            let slip = self.states.slip(joint);
            let mut sum = 0.0;
            for k in 0..self.pieces.len() {
                let h = self.places[k + 1] - self.places[k];
                let line = &self.field(solved, k, slip)[..self.terms];
                let terms = line.iter().enumerate();
                sum += h * terms.map(|(i, c)| c / (i as f64 + 1.0)).sum::<f64>();
            }
            for k in 0..self.pieces.len() {
                let first = (k * self.fields() + slip) * self.width();
                solved.coefficients[first] -= sum / length;
            }
        }
    }
}
