//! Sections: parts of several materials, rigidly joined, and what follows from them.

mod contact;
mod initial;
mod part;
mod place;
mod placed;
mod plane;
mod stiffness;
#[cfg(test)]
mod tests;
mod transformed;

pub use crate::outline::{
    Outline, angle, channel, disc, hollow_box, i_shape, polygon, rectangle, ring, tee,
};
pub use initial::InitialStrain;
pub use part::Part;
pub use place::{MirrorAxis, PartName, Placement, Side};
pub use placed::PlacedPart;
pub use plane::{PointStress, Principal, SectionForces, Sideways, StrainPlane};
pub use stiffness::Stiffness;
pub use transformed::{TransformedPart, TransformedSection};

use crate::error::{Error, ErrorKind, Problem, Result};
use crate::time::Time;
use crate::units::LineMass;
use crate::{check, lookup, path};

/// Parts joined rigidly: at one place along the member all of them share one plane of strain.
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
    notes: Vec<String>,
}

impl Section {
    /// A section of the given parts.
    ///
    /// # Errors
    /// All of: no part at all, values of a material or outline that are impossible, two parts of
    /// one name, one material name for two materials, a place beside a part that is not there,
    /// places that refer to each other in a circle, parts that overlap.
    pub fn of(parts: impl IntoIterator<Item = Part>) -> Result<Self> {
        let parts: Vec<Part> = parts.into_iter().collect();
        let mut problems = Vec::new();
        if parts.is_empty() {
            problems.push(no_parts());
        }
        for part in &parts {
            problems.extend(part.problems());
        }
        check::unique(
            &mut problems,
            parts.iter().map(Part::name),
            "parts",
            "section.parts",
        );
        problems.extend(materials(&parts));
        let placed = place::resolve(&parts, &mut problems);
        // Outlines that are not whole have no region to compare.
        if problems.is_empty() {
            problems.extend(contact::overlaps(&placed));
        }
        Error::check(problems)?;
        let placed = displaced(placed);
        let notes = contact::notes(&placed);
        Ok(Self {
            parts,
            placed,
            notes,
        })
    }

    /// The section of some of the parts alone, each where it stands in the whole section.
    ///
    /// # Errors
    /// [`ErrorKind::Lookup`] for a name that is not that of a part; [`ErrorKind::Missing`] if there
    /// are no names.
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
            return Err(no_parts().into());
        }
        let notes = contact::notes(&placed);
        Ok(Self {
            parts,
            placed: displaced(placed),
            notes,
        })
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
    /// [`ErrorKind::Lookup`] if there is none.
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

    /// The stiffness at a time.
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
    /// [`ErrorKind::Lookup`] if no part has that material.
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

fn no_parts() -> Problem {
    Problem::new(
        ErrorKind::Missing,
        "section.parts",
        "an empty section",
        "at least one part",
    )
}

/// The hosts without what is set into them.
fn displaced(mut placed: Vec<PlacedPart>) -> Vec<PlacedPart> {
    for i in 0..placed.len() {
        let name = placed[i].name().to_owned();
        let inserts = placed
            .iter()
            .filter(|part| part.host() == Some(name.as_str()));
        let inserts: Vec<_> = inserts.map(|insert| *insert.whole()).collect();
        placed[i].displace(&inserts);
    }
    placed
}

/// Problems of the materials, each material once; one name must mean one material.
fn materials(parts: &[Part]) -> Vec<Problem> {
    let mut problems = Vec::new();
    for (i, part) in parts.iter().enumerate() {
        let material = part.material();
        let earlier = parts[..i]
            .iter()
            .find(|p| p.material().name() == material.name());
        match earlier {
            None => problems.extend(material.problems()),
            Some(other) if other.material() != material => problems.push(Problem::new(
                ErrorKind::Duplicate,
                path::named("materials", material.name()),
                format!(
                    "two materials named \"{}\" with different values",
                    material.name()
                ),
                "a different name for each material",
            )),
            Some(_) => {}
        }
    }
    problems
}
