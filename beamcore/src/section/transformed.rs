//! The transformed section: presentation only, no other result rests on it.

use super::placed::PlacedPart;
use crate::error::Result;
use crate::lookup;
use crate::outline::Point;
use crate::time::Time;
use crate::units::{Area, Length, Modulus, Moment, SecondMoment, Stress};

/// One part of a transformed section: its widths, parallel to the bending axis, are multiplied by
/// n = E/E_ref about its own centroid, its heights are kept.
#[derive(Clone, Debug, PartialEq)]
pub struct TransformedPart {
    /// The name of the part.
    pub name: String,
    /// The modular ratio n = E/E_ref.
    pub ratio: f64,
    /// The transformed width of the bounding box, n b.
    pub width: Length,
    /// The corners of the transformed outline, loop by loop, y and z; arcs are given by chords of
    /// at most 12 degrees. For drawing: the sums below do not rest on it.
    pub loops: Vec<Vec<(Length, Length)>>,
    /// The least z of the outline.
    pub bottom: Length,
    /// The greatest z of the outline.
    pub top: Length,
}

/// A section as if made of one chosen material.
///
/// Source: e.g. Beer and Johnston, Mechanics of Materials, ch. 4.
#[derive(Clone, Debug, PartialEq)]
pub struct TransformedSection {
    reference: Modulus,
    parts: Vec<TransformedPart>,
    area: Area,
    centroid_z: Length,
    second_moment: SecondMoment,
}

impl TransformedSection {
    pub(super) fn new(parts: &[PlacedPart], material: &str, time: Time) -> Result<Self> {
        let Some(reference) = parts
            .iter()
            .map(PlacedPart::material)
            .find(|m| m.name() == material)
        else {
            let mut names: Vec<_> = parts.iter().map(|part| part.material().name()).collect();
            names.dedup();
            return Err(lookup::unknown("material", material, &names).into());
        };
        let reference = reference.modulus_at(time);
        let ratio = |part: &PlacedPart| part.material().modulus_at(time) / reference;
        let area: f64 = parts.iter().map(|part| ratio(part) * part.net().area).sum();
        let first: f64 = parts
            .iter()
            .map(|part| ratio(part) * part.net().area * part.net().z)
            .sum();
        let z = first / area;
        let second: f64 = parts
            .iter()
            .map(|part| {
                let (own, arm) = (part.net(), part.net().z - z);
                ratio(part) * (own.iyy + own.area * arm * arm)
            })
            .sum();
        let (area, centroid_z) = (Area::from_si(area), Length::from_si(z));
        let second_moment = SecondMoment::from_si(second);
        let parts = parts
            .iter()
            .map(|part| TransformedPart {
                name: part.name().into(),
                ratio: ratio(part),
                width: part.outline().width() * ratio(part),
                loops: loops(part, ratio(part)),
                bottom: part.bottom(),
                top: part.top(),
            })
            .collect();
        Ok(Self {
            reference,
            parts,
            area,
            centroid_z,
            second_moment,
        })
    }

    /// The modulus of the reference material at the time asked for.
    #[must_use]
    pub const fn reference_modulus(&self) -> Modulus {
        self.reference
    }

    /// The transformed parts.
    #[must_use]
    pub fn parts(&self) -> &[TransformedPart] {
        &self.parts
    }

    /// Area: sum of n A. Times the reference modulus it is EA.
    #[must_use]
    pub const fn area(&self) -> Area {
        self.area
    }

    /// z of the centroid.
    #[must_use]
    pub const fn centroid_z(&self) -> Length {
        self.centroid_z
    }

    /// Second moment of area about the horizontal axis through the centroid:
    /// sum of n (I + A dz^2). Times the reference modulus it is EI_yy.
    #[must_use]
    pub const fn second_moment(&self) -> SecondMoment {
        self.second_moment
    }

    /// The stress in the real material of a part at height z under a moment (positive sagging):
    /// -n M (z - z_centroid)/I, tension positive.
    ///
    /// # Errors
    /// [`crate::ErrorKind::Lookup`] if there is no such part.
    pub fn stress(&self, part: &str, z: Length, moment: Moment) -> Result<Stress> {
        let Some(found) = self.parts.iter().find(|p| p.name == part) else {
            let names: Vec<_> = self.parts.iter().map(|p| p.name.as_str()).collect();
            return Err(lookup::unknown("part", part, &names).into());
        };
        let arm = (z - self.centroid_z).si();
        Ok(Stress::from_si(
            -found.ratio * moment.si() * arm / self.second_moment.si(),
        ))
    }
}

/// The loops of a part's outline with their widths multiplied about the part's centroid.
fn loops(part: &PlacedPart, ratio: f64) -> Vec<Vec<(Length, Length)>> {
    let centre = part.net().y;
    let point = |p: Point| {
        (
            Length::from_si(centre + ratio * (p.y - centre)),
            Length::from_si(p.z),
        )
    };
    part.region()
        .contours()
        .iter()
        .map(|contour| contour.corners().into_iter().map(point).collect())
        .collect()
}
