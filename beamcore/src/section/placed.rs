//! Parts at their places in a section.

use super::initial::InitialStrain;
use super::part::Part;
use super::place::{MirrorAxis, Placement, Side};
use crate::material::Material;
use crate::outline::{Integrals, Outline, Point, Region};
use crate::units::{Area, Length, LineMass};

/// A part at its place in a section.
#[derive(Clone, Debug, PartialEq)]
pub struct PlacedPart {
    part: Part,
    /// Whether the outline is mirrored about the upright and about the level axis.
    mirrored: (bool, bool),
    /// Where the point stands by which the outline is placed.
    reference: (Length, Length),
    left: Length,
    bottom: Length,
    /// Of the whole outline, and of what parts set into it leave; about the section's origin.
    whole: Integrals,
    net: Integrals,
}

impl PlacedPart {
    pub(super) fn at(part: &Part, y: Length, z: Length) -> Self {
        Self::placed(part, (false, false), y, z)
    }

    pub(super) fn beside(part: &Part, side: Side, other: &Self) -> Self {
        let outline = part.outline();
        let (width, height) = (outline.width(), outline.height());
        let left = (other.left() + other.right()) / 2.0 - width / 2.0;
        let bottom = (other.bottom() + other.top()) / 2.0 - height / 2.0;
        let (left, bottom) = match side {
            Side::Left => (other.left() - width, bottom),
            Side::Right => (other.right(), bottom),
            Side::Above => (left, other.top()),
            Side::Below => (left, other.bottom() - height),
        };
        let y = left + width / 2.0 - outline.middle_y();
        let z = bottom + height / 2.0 - outline.middle_z();
        let mut placed = Self::placed(part, (false, false), y, z);
        // The touching edge is the neighbour's, to the last bit.
        (placed.left, placed.bottom) = (left, bottom);
        placed
    }

    pub(super) fn mirror_of(part: &Part, axis: MirrorAxis, other: &Self) -> Self {
        let ((upright, level), (y, z)) = (other.mirrored, other.reference);
        match axis {
            MirrorAxis::Upright => Self::placed(part, (!upright, level), -y, z),
            MirrorAxis::Level => Self::placed(part, (upright, !level), y, -z),
        }
    }

    fn placed(part: &Part, mirrored: (bool, bool), y: Length, z: Length) -> Self {
        let outline = part.outline();
        let sign = |flip: bool| if flip { -1.0 } else { 1.0 };
        let (sy, sz) = (sign(mirrored.0), sign(mirrored.1));
        let own = outline.integrals();
        let whole = Integrals {
            y: y.si() + sy * own.y,
            z: z.si() + sz * own.z,
            iyz: sy * sz * own.iyz,
            ..own
        };
        Self {
            part: part.clone(),
            mirrored,
            reference: (y, z),
            left: y + outline.middle_y() * sy - outline.width() / 2.0,
            bottom: z + outline.middle_z() * sz - outline.height() / 2.0,
            whole,
            net: whole,
        }
    }

    /// Takes the whole outlines of the parts off that are set into this one.
    pub(super) fn displace(&mut self, inserts: &[Integrals]) {
        let whole = self.whole;
        self.net = whole;
        if inserts.is_empty() {
            return;
        }
        let mut net = whole;
        net.area = inserts
            .iter()
            .fold(whole.area, |area, insert| area - insert.area);
        let first = |of: fn(&Integrals) -> f64| {
            let taken: f64 = inserts.iter().map(|insert| insert.area * of(insert)).sum();
            (whole.area * of(&whole) - taken) / net.area
        };
        (net.y, net.z) = (first(|i| i.y), first(|i| i.z));
        let about = |i: &Integrals| {
            let (dy, dz) = (i.y - net.y, i.z - net.z);
            [
                i.iyy + i.area * dz * dz,
                i.izz + i.area * dy * dy,
                i.iyz + i.area * dy * dz,
            ]
        };
        let taken = inserts.iter().map(about);
        let left = taken.fold(about(&whole), |sum, off| {
            [sum[0] - off[0], sum[1] - off[1], sum[2] - off[2]]
        });
        [net.iyy, net.izz, net.iyz] = left;
        self.net = net;
    }

    /// The name.
    #[must_use]
    pub fn name(&self) -> &str {
        self.part.name()
    }

    /// The outline, as given.
    #[must_use]
    pub const fn outline(&self) -> &Outline {
        self.part.outline()
    }

    /// The material.
    #[must_use]
    pub const fn material(&self) -> &Material {
        self.part.material()
    }

    /// The initial strain that the part bears; of a mirror image it is mirrored too.
    #[must_use]
    pub fn initial_strain(&self) -> InitialStrain {
        let sign = |flip: bool| if flip { -1.0 } else { 1.0 };
        let strain = self.part.given_initial_strain();
        InitialStrain {
            axial: strain.axial,
            curvature_y: strain.curvature_y * sign(self.mirrored.1),
            curvature_z: strain.curvature_z * sign(self.mirrored.0),
        }
    }

    /// The host that the part is set into, if it is.
    #[must_use]
    pub fn host(&self) -> Option<&str> {
        match self.part.placement() {
            Placement::SetInto { host, .. } => Some(host),
            Placement::At { .. } | Placement::Beside { .. } | Placement::MirrorOf { .. } => None,
        }
    }

    /// The region of the whole outline at its place.
    #[must_use]
    pub fn region(&self) -> Region {
        let (upright, level) = self.mirrored;
        let (y, z) = self.reference;
        let region = self.outline().region();
        let region = if upright || level {
            region.mirrored(upright, level)
        } else {
            region
        };
        region.moved(Point::new(y.si(), z.si()))
    }

    /// The integrals of what parts set into this one leave of it.
    pub(crate) const fn net(&self) -> &Integrals {
        &self.net
    }

    pub(super) const fn whole(&self) -> &Integrals {
        &self.whole
    }

    /// The least y of the outline.
    #[must_use]
    pub const fn left(&self) -> Length {
        self.left
    }

    /// The greatest y of the outline.
    #[must_use]
    pub fn right(&self) -> Length {
        self.left + self.outline().width()
    }

    /// The least z of the outline.
    #[must_use]
    pub const fn bottom(&self) -> Length {
        self.bottom
    }

    /// The greatest z of the outline.
    #[must_use]
    pub fn top(&self) -> Length {
        self.bottom + self.outline().height()
    }

    /// The y of the part's own centroid, without what is set into it.
    #[must_use]
    pub fn centroid_y(&self) -> Length {
        Length::from_si(self.net.y)
    }

    /// The z of the part's own centroid, without what is set into it.
    #[must_use]
    pub fn centroid_z(&self) -> Length {
        Length::from_si(self.net.z)
    }

    /// The area, without what is set into it.
    #[must_use]
    pub fn area(&self) -> Area {
        Area::from_si(self.net.area)
    }

    /// Mass per length: as given, or density x area; `None` if the material has no density.
    #[must_use]
    pub fn line_mass(&self) -> Option<LineMass> {
        let by_density = || {
            self.material()
                .mean_density()
                .map(|density| density * self.area())
        };
        self.part.given_line_mass().or_else(by_density)
    }
}
