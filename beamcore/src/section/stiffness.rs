//! Stiffness of a section: sums weighted with the modulus of each part.

use super::placed::PlacedPart;
use super::plane::{Principal, SectionForces, Sideways, StrainPlane};
use crate::math;
use crate::time::Time;
use crate::units::{Angle, AxialStiffness, BendingStiffness, Curvature, Length, Modulus};

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
    pub(super) fn new<'a>(
        parts: impl IntoIterator<Item = &'a PlacedPart, IntoIter: Clone>,
        time: Time,
    ) -> Self {
        let parts = parts.into_iter();
        let moduli: Vec<_> = parts
            .clone()
            .map(|part| part.material().modulus_at(time))
            .collect();
        let (mut ea, mut es_y, mut es_z) = (0.0, 0.0, 0.0);
        for (part, modulus) in parts.clone().zip(&moduli) {
            let e_a = modulus.si() * part.net().area;
            ea += e_a;
            es_y += e_a * part.net().y;
            es_z += e_a * part.net().z;
        }
        let (y0, z0) = (es_y / ea, es_z / ea);
        let (mut yy, mut zz, mut yz) = (0.0, 0.0, 0.0);
        let mut own = Vec::with_capacity(moduli.len());
        for (part, modulus) in parts.clone().zip(&moduli) {
            let (e, own_part) = (modulus.si(), part.net());
            let (dy, dz) = (own_part.y - y0, own_part.z - z0);
            let part_yy = e * (own_part.iyy + own_part.area * dz * dz);
            own.push(part_yy);
            yy += part_yy;
            zz += e * (own_part.izz + own_part.area * dy * dy);
            yz += e * (own_part.iyz + own_part.area * dy * dz);
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

    /// `EI_yz`: sum of `E_i` (`I_yz,i` + `A_i` `dy_i` `dz_i`); zero for a section with an axis of symmetry.
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

    /// The principal bending stiffnesses, the greater first, and the angle from the level axis to
    /// the axis of the greater one, positive from y towards z, between -90 and 90 degrees.
    ///
    /// EI = (`EI_yy` + `EI_zz`)/2 +- sqrt(((`EI_yy` - `EI_zz`)/2)^2 + `EI_yz`^2),
    /// tan 2a = -2 `EI_yz`/(`EI_yy` - `EI_zz`) (Mohr's circle).
    #[must_use]
    pub fn principal(&self) -> Principal {
        let (yy, zz, yz) = (
            self.bending.0.si(),
            self.bending.1.si(),
            self.bending.2.si(),
        );
        let middle = f64::midpoint(yy, zz);
        let half = (yy - zz) / 2.0;
        let radius = (half * half + yz * yz).sqrt();
        Principal {
            greater: BendingStiffness::from_si(middle + radius),
            smaller: BendingStiffness::from_si(middle - radius),
            angle: Angle::from_si(math::atan2(-yz, half) / 2.0),
        }
    }

    /// The stiffness against M_y, and the curvature about the upright axis that comes with a unit
    /// of that about the level axis: `EI_yy` and 0 where the section is held sideways, else
    /// `EI_yy` - `EI_yz`^2/`EI_zz` and -`EI_yz`/`EI_zz`.
    pub(crate) fn against_bending(&self, sideways: Sideways) -> (BendingStiffness, f64) {
        let (yy, zz, yz) = (
            self.bending.0.si(),
            self.bending.1.si(),
            self.bending.2.si(),
        );
        match sideways {
            Sideways::Held => (self.bending.0, 0.0),
            Sideways::Free => (BendingStiffness::from_si(yy - yz * yz / zz), -yz / zz),
        }
    }

    /// The plane of strain under section forces: bending about both axes, coupled by `EI_yz`; with
    /// the section held sideways, about the level axis only.
    ///
    /// `kappa_y` = (M_y `EI_zz` - M_z `EI_yz`)/D, `kappa_z` = (M_z `EI_yy` - M_y `EI_yz`)/D,
    /// D = `EI_yy` `EI_zz` - `EI_yz`^2, eps0 = N/EA at the elastic centroid.
    #[must_use]
    pub fn strain_plane(&self, forces: &SectionForces, sideways: Sideways) -> StrainPlane {
        let (yy, zz, yz) = (
            self.bending.0.si(),
            self.bending.1.si(),
            self.bending.2.si(),
        );
        let (m_y, m_z) = (forces.moment_y.si(), forces.moment_z.si());
        let (kappa_y, kappa_z) = match sideways {
            Sideways::Held => (m_y / yy, 0.0),
            Sideways::Free => {
                let d = yy * zz - yz * yz;
                ((m_y * zz - m_z * yz) / d, (m_z * yy - m_y * yz) / d)
            }
        };
        StrainPlane {
            axial: forces.axial / self.axial,
            curvature_y: Curvature::from_si(kappa_y),
            curvature_z: Curvature::from_si(kappa_z),
            centroid: self.centroid,
        }
    }
}
