//! Sections: parts of several materials in layers with joints between them, and what follows.

mod between;
mod contact;
mod facing;
mod gather;
mod initial;
mod joint;
mod joint_creep;
mod joint_problems;
#[cfg(test)]
mod joint_tests;
mod layer;
#[cfg(test)]
mod layer_tests;
mod layered;
mod layering;
mod layering_problems;
mod part;
mod place;
mod placed;
mod placed_joint;
mod plane;
mod shear;
mod slip;
mod stiffness;
#[cfg(test)]
mod tests;
mod transformed;
mod tree;

pub use crate::outline::{
    Outline, angle, channel, disc, hollow_box, i_shape, polygon, rectangle, ring, tee,
};
pub use initial::InitialStrain;
pub use joint::{Joint, JointKind};
pub use layer::Layer;
pub use layering::MergedLayer;
pub use part::Part;
pub use place::{MirrorAxis, PartName, Placement, Side};
pub use placed::PlacedPart;
pub use placed_joint::PlacedJoint;
pub use plane::{PointStress, Principal, SectionForces, Sideways, StrainPlane};
pub use shear::SHEAR_STIFFNESS_DEFINITION;
pub(crate) use shear::{layer_shear_stiffness, side_by_side};
pub use slip::{Band, Slip, Spacing};
pub use stiffness::Stiffness;
pub use transformed::{TransformedPart, TransformedSection};

use crate::error::{Error, Result};
use crate::lookup;
use crate::time::Time;
use crate::units::LineMass;
use layering::Layering;

/// The layers and joints at one place along the member. The parts of a layer, and the layers that
/// rigid joints hold together, share one plane of strain; a section of parts alone is one layer.
///
/// # Examples
/// ```
/// use beamcore::material::{ServiceClass, steel, timber};
/// use beamcore::section::{Part, Section, rectangle};
/// use beamcore::time::Time;
/// use beamcore::units::Number;
/// let joist = Part::new("joist", rectangle(80.mm(), 200.mm()), timber("C24", ServiceClass::One)?);
/// let plate = Part::new("plate", rectangle(8.mm(), 200.mm()), steel("S275")?).right_of(&joist);
/// let section = Section::of([joist, plate])?;
/// let stiffness = section.stiffness(Time::Initial);
/// assert_eq!(stiffness.centroid_z().to_mm(), 0.0);
/// # Ok::<(), beamcore::Error>(())
/// ```
#[derive(Clone, Debug, PartialEq)]
pub struct Section {
    parts: Vec<Part>,
    placed: Vec<PlacedPart>,
    layering: Layering,
    notes: Vec<String>,
}

impl Section {
    /// A section of the given parts, as one layer named "section".
    ///
    /// # Errors
    /// All of: no part at all, values of a material or outline that are impossible, two parts of
    /// one name, one material name for two materials, a place beside a part that is not there,
    /// places that refer to each other in a circle, parts that overlap.
    pub fn of(parts: impl IntoIterator<Item = Part>) -> Result<Self> {
        let parts: Vec<Part> = parts.into_iter().collect();
        let mut problems = Vec::new();
        let placed = gather::placed(&parts, &mut problems);
        Error::check(problems)?;
        let layering = Layering::single(&placed);
        Ok(Self::new(parts, placed, layering))
    }

    /// A section of parts in layers, with joints between the layers.
    ///
    /// # Errors
    /// All of: what [`Section::of`] tells; names that are empty or stand twice; a part in no layer
    /// or in two, a name of a part or layer that is not there; layers that no chain of joints
    /// holds together, joints that close a loop; layers that do not touch without a stated gap, or
    /// with another one; values of a joint that are impossible or that a joint of its kind has no
    /// use for; a joint beside other than wood-based layers without a creep factor.
    ///
    /// # Examples
    /// ```
    /// use beamcore::material::{Creep, ServiceClass, concrete, timber};
    /// use beamcore::section::{Joint, Layer, Part, Section, Slip, rectangle};
    /// use beamcore::time::Time;
    /// use beamcore::units::{Number, SlipModulus};
    /// let wood = timber("C24", ServiceClass::One)?;
    /// let stone = concrete("C30/37", &Creep::factor(2.5))?;
    /// let joist = Part::new("joist", rectangle(100.mm(), 220.mm()), wood);
    /// let slab = Part::new("slab", rectangle(600.mm(), 70.mm()), stone).above(&joist);
    /// let modulus = Slip::Modulus(SlipModulus::from_N_per_mm2(133.0));
    /// let section = Section::layered(
    ///     [joist, slab],
    ///     [Layer::new("lower", ["joist"]), Layer::new("upper", ["slab"])],
    ///     [Joint::slipping("screws", "lower", "upper", modulus).creep(1.2)],
    /// )?;
    /// let screws = section.joint("screws")?;
    /// assert_eq!((screws.z(), screws.width()), (110.mm(), 100.mm()));
    /// let lasting = screws.slip_modulus_at(1.m(), Time::Final).unwrap();
    /// assert_eq!(format!("{lasting:.3}"), "60.455 N/mm2"); // 133/(1 + 1.2)
    /// # Ok::<(), beamcore::Error>(())
    /// ```
    pub fn layered(
        parts: impl IntoIterator<Item = Part>,
        layers: impl IntoIterator<Item = Layer>,
        joints: impl IntoIterator<Item = Joint>,
    ) -> Result<Self> {
        let parts: Vec<Part> = parts.into_iter().collect();
        let layers: Vec<Layer> = layers.into_iter().collect();
        let joints: Vec<Joint> = joints.into_iter().collect();
        let mut problems = Vec::new();
        let placed = gather::placed(&parts, &mut problems);
        problems.extend(layering_problems::problems(&parts, &layers, &joints));
        Error::check(problems)?;
        let layering = Layering::of(layers, &joints, &placed)?;
        Ok(Self::new(parts, placed, layering))
    }

    fn new(parts: Vec<Part>, placed: Vec<PlacedPart>, layering: Layering) -> Self {
        let placed = gather::displaced(placed);
        let notes = layering.notes(&placed);
        Self {
            parts,
            placed,
            layering,
            notes,
        }
    }

    /// The section of some of the parts alone, each where it stands in the whole section, with
    /// the layers that they belong to and the joints between these.
    ///
    /// # Errors
    /// [`crate::ErrorKind::Lookup`] for a name that is not that of a part; [`crate::ErrorKind::Missing`] if there
    /// are no names; [`crate::ErrorKind::Geometry`] if what held the layers together is left out.
    pub fn only(&self, names: &[String]) -> Result<Self> {
        for name in names {
            self.index(name)?;
        }
        let kept = |name: &str| names.iter().any(|known| known == name);
        let parts: Vec<_> = self
            .parts
            .iter()
            .filter(|p| kept(p.name()))
            .cloned()
            .collect();
        let placed: Vec<_> = self
            .placed
            .iter()
            .filter(|p| kept(p.name()))
            .cloned()
            .collect();
        if parts.is_empty() {
            return Err(gather::no_parts().into());
        }
        let layering = self.layering.of_kept(&placed)?;
        Ok(Self::new(parts, placed, layering))
    }

    /// The parts as given.
    #[must_use]
    pub fn parts(&self) -> &[Part] {
        &self.parts
    }

    /// The parts at their places, in the order given.
    #[must_use]
    pub fn placed(&self) -> &[PlacedPart] {
        &self.placed
    }

    /// The part of a name, at its place.
    ///
    /// # Errors
    /// [`crate::ErrorKind::Lookup`] if there is none.
    pub fn part(&self, name: &str) -> Result<&PlacedPart> {
        Ok(&self.placed[self.index(name)?])
    }

    /// The position of the part of a name.
    pub(crate) fn index(&self, name: &str) -> Result<usize> {
        self.parts
            .iter()
            .position(|part| part.name() == name)
            .ok_or_else(|| {
                let names: Vec<_> = self.parts.iter().map(Part::name).collect();
                lookup::unknown("part", name, &names).into()
            })
    }

    /// The stiffness at a time of all parts as one piece, as if every joint were rigid.
    #[must_use]
    pub fn stiffness(&self, time: Time) -> Stiffness {
        Stiffness::new(&self.placed, time)
    }

    /// The plane of strain that the section takes freely under the initial strains of its parts.
    ///
    /// Source: EA eps0 = sum of `E_i` int eps_i* dA, EI kappa = -sum of `E_i` int z eps_i* dA (e.g.
    /// Timoshenko, J. Opt. Soc. Am. 11, 1925, 233, for two strips, from memory).
    #[must_use]
    pub fn free_plane(&self, time: Time, sideways: Sideways) -> StrainPlane {
        initial::free_plane(&self.placed, &self.stiffness(time), sideways)
    }

    /// The section as if made of the material of one part, at a time.
    ///
    /// # Errors
    /// [`crate::ErrorKind::Lookup`] if no part has that material.
    pub fn transformed_to(&self, material: &str, time: Time) -> Result<TransformedSection> {
        TransformedSection::new(&self.placed, material, time)
    }

    /// Mass per length: sum of density x area. `None` if a part has no density.
    #[must_use]
    pub fn line_mass(&self) -> Option<LineMass> {
        self.placed
            .iter()
            .map(PlacedPart::line_mass)
            .try_fold(LineMass::ZERO, |sum, mass| mass.map(|mass| sum + mass))
    }

    /// What an engineer should know of this section: for example that parts do not touch.
    #[must_use]
    pub fn notes(&self) -> &[String] {
        &self.notes
    }
}
