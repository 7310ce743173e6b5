//! Stiffness of a section: sums weighted with the modulus of each part.

use super::part::PlacedPart;
use crate::time::Time;
use crate::units::{AxialStiffness, BendingStiffness, Length, Modulus};

/// EA, the elastic centroid and EI of a section at a time, in E-weighted sums; no reference
/// material is needed for them.
///
/// Source: transformed-section method, e.g. Gere and Goodno, Mechanics of Materials, ch. 6.
#[derive(Clone, Debug, PartialEq)]
pub struct Stiffness {
    moduli: Vec<Modulus>,
    axial: AxialStiffness,
    centroid: (Length, Length),
    bending: (BendingStiffness, BendingStiffness, BendingStiffness),
    shares: Vec<f64>,
}

impl Stiffness {
    pub(super) fn new(parts: &[PlacedPart], time: Time) -> Self {
        let moduli: Vec<_> = parts
            .iter()
            .map(|part| part.material().modulus_at(time))
            .collect();
        let (mut ea, mut es_y, mut es_z) = (0.0, 0.0, 0.0);
        for (part, modulus) in parts.iter().zip(&moduli) {
            let e_a = modulus.si() * part.area().si();
            ea += e_a;
            es_y += e_a * part.centroid_y().si();
            es_z += e_a * part.centroid_z().si();
        }
        let (y0, z0) = (es_y / ea, es_z / ea);
        let (mut yy, mut zz, mut yz) = (0.0, 0.0, 0.0);
        let mut own = Vec::with_capacity(parts.len());
        for (part, modulus) in parts.iter().zip(&moduli) {
            let (e, area) = (modulus.si(), part.area().si());
            let (dy, dz) = (part.centroid_y().si() - y0, part.centroid_z().si() - z0);
            let part_yy = e * (part.outline().second_moment_yy().si() + area * dz * dz);
            own.push(part_yy);
            yy += part_yy;
            zz += e * (part.outline().second_moment_zz().si() + area * dy * dy);
            yz += e * area * dy * dz;
        }
        Self {
            moduli,
            axial: AxialStiffness::from_si(ea),
            centroid: (Length::from_si(y0), Length::from_si(z0)),
            bending: (
                BendingStiffness::from_si(yy),
                BendingStiffness::from_si(zz),
                BendingStiffness::from_si(yz),
            ),
            shares: own.iter().map(|part| part / yy).collect(),
        }
    }

    /// EA = sum of `E_i` `A_i`.
    #[must_use]
    pub const fn axial(&self) -> AxialStiffness {
        self.axial
    }

    /// y of the elastic centroid: sum of `E_i` `A_i` `y_i` over EA.
    #[must_use]
    pub const fn centroid_y(&self) -> Length {
        self.centroid.0
    }

    /// z of the elastic centroid: sum of `E_i` `A_i` `z_i` over EA.
    #[must_use]
    pub const fn centroid_z(&self) -> Length {
        self.centroid.1
    }

    /// `EI_yy` about the horizontal axis through the centroid: sum of `E_i` (`I_i` + `A_i` `dz_i`^2).
    #[must_use]
    pub const fn bending_yy(&self) -> BendingStiffness {
        self.bending.0
    }

    /// `EI_zz` about the upright axis through the centroid: sum of `E_i` (`I_i` + `A_i` `dy_i`^2).
    #[must_use]
    pub const fn bending_zz(&self) -> BendingStiffness {
        self.bending.1
    }

    /// `EI_yz`: sum of `E_i` `A_i` `dy_i` `dz_i`; zero for a section with an axis of symmetry.
    #[must_use]
    pub const fn bending_yz(&self) -> BendingStiffness {
        self.bending.2
    }

    /// The modulus of each part at this time, in the order of the parts.
    #[must_use]
    pub fn moduli(&self) -> &[Modulus] {
        &self.moduli
    }

    /// The share of each part in `EI_yy`, in the order of the parts; they sum to 1.
    #[must_use]
    pub fn shares(&self) -> &[f64] {
        &self.shares
    }
}
