//! The normal stress along a fibre of a part.

use super::{Response, layers};
use crate::error::Result;
use crate::field::Piecewise;
use crate::outline::Point;
use crate::section::{InitialStrain, PlacedPart};
use crate::time::Time;
use crate::units::Length;

impl Response {
    /// The normal stress along the fibre of a part that lies where `fibre` tells, which goes with
    /// the section; zero where the part is not there.
    ///
    /// sigma = `E_p` (N_i/EA_i + eps_i* - kappa ((z - z_i) + r (y - y_i)) - eps_p*), with the axial
    /// force and free strain of the part's layer and the free strain of the part.
    pub(crate) fn fibre_stress(
        &self,
        combination: &str,
        time: Time,
        part: &str,
        fibre: impl Fn(&PlacedPart) -> Point,
    ) -> Result<Piecewise> {
        let (_, merged) = self.member.part(part)?;
        self.sum(combination, time, |term| {
            let force = layers::axial_of(term, self.member.section(), merged);
            let strand = term.layout.strands[merged];
            let curvature = term.field(term.layout.states.all() + strand);
            term.mixed([&force, &curvature], |node, strains| {
                let parts = node.section.placed();
                let index = parts.iter().position(|p| p.name() == part);
                let Some(index) = index.filter(|&p| node.section.is_there(p, node.x)) else {
                    return ([0.0; 2], 0.0);
                };
                let placed = &parts[index];
                let layer = &node.at(term.time)[merged];
                let point = fibre(placed);
                let e = placed.material().modulus_at(term.time).si();
                let arm = (point.z - layer.z) + layer.ratio * (point.y - layer.y);
                let constant = strains.get(index).map_or(0.0, |strain: &InitialStrain| {
                    let (y, z) = (Length::from_si(point.y), Length::from_si(point.z));
                    let centroid = (placed.centroid_y(), placed.centroid_z());
                    let of_layer = node.free_strain(term.time, strains, merged);
                    e * (of_layer - strain.at(centroid, y, z).si())
                });
                ([e / layer.axial, -e * arm], constant)
            })
        })
    }
}
