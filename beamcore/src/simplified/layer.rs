//! What the simplified methods know of a layer.

use crate::check;
use crate::error::{ErrorKind, Problem};
use crate::path;
use crate::units::{AxialStiffness, BendingStiffness, Length, Modulus, SlipModulus, Stress};

/// One layer: parts that act as one piece.
///
/// The stiffness of a layer may be that of any parts. Its height and modulus serve for stresses and
/// its width for the shear stress, which hold for a rectangular layer of one material.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct LayerInput {
    /// EA of the layer.
    pub axial: AxialStiffness,
    /// EI of the layer about its own elastic centroid.
    pub bending: BendingStiffness,
    /// The height h, with the centroid at its middle.
    pub height: Length,
    /// z of the elastic centroid, upward from any level that is the same for all layers.
    pub centroid_z: Length,
    /// The modulus E of the material whose stresses are asked for.
    pub modulus: Modulus,
    /// The width b.
    pub width: Length,
}

impl LayerInput {
    /// A rectangular layer of one material: EA = E b h, EI = E b h^3/12.
    #[must_use]
    pub fn rectangle(modulus: Modulus, width: Length, height: Length, centroid_z: Length) -> Self {
        let area = width * height;
        Self {
            axial: modulus * area,
            bending: modulus * (area * height * height / 12.0),
            height,
            centroid_z,
            modulus,
            width,
        }
    }

    fn check(&self, problems: &mut Vec<Problem>, base: &str) {
        let at = |key: &str| path::key(base, key);
        check::positive(problems, self.axial, &at("axial"));
        check::positive(problems, self.bending, &at("bending"));
        check::positive(problems, self.height, &at("height"));
        check::finite(problems, self.centroid_z, &at("centroid_z"));
        check::positive(problems, self.modulus, &at("modulus"));
        check::positive(problems, self.width, &at("width"));
    }
}

/// The normal stresses of a layer under a moment, tension positive.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct LayerStress {
    /// At the middle of the height: `sigma_i` = `E_i` `N_i`/`EA_i`.
    pub axial: Stress,
    /// What bending of the layer adds at its lower edge and takes off at its upper:
    /// `sigma_m,i` = 0.5 `E_i` `h_i` M/`EI_ef`.
    pub bending: Stress,
}

impl LayerStress {
    /// At the lower edge: `sigma_i` + `sigma_m,i`.
    #[must_use]
    pub fn bottom(&self) -> Stress {
        self.axial + self.bending
    }

    /// At the upper edge: `sigma_i` - `sigma_m,i`.
    #[must_use]
    pub fn top(&self) -> Stress {
        self.axial - self.bending
    }
}

/// The greatest shear stress of a layer.
///
/// Under V, tau = \[flow of the joint below + `E_i` `b_i` V/`EI_ef` int (-e - t) dt\]/`b_i`, with t the
/// height over the centroid, from the lower edge on. It is greatest at t = -`e_i`, or where that lies
/// outside of the layer, at the edge that is nearest to it.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct ShearStress {
    /// The stress, with the sign of the shear force.
    pub value: Stress,
    /// Its place, in the z of the layers.
    pub z: Length,
}

/// Adds everything that is wrong with layers and the joints between them.
pub(super) fn check(problems: &mut Vec<Problem>, layers: &[LayerInput], joints: &[SlipModulus]) {
    for (i, layer) in layers.iter().enumerate() {
        let base = path::indexed("layers", i);
        layer.check(problems, &base);
        if let Some(below) = i.checked_sub(1).map(|below| layers[below].centroid_z)
            && layer.centroid_z <= below
        {
            problems.push(Problem::new(
                ErrorKind::Geometry,
                path::key(&base, "centroid_z"),
                layer.centroid_z.to_string(),
                format!("more than {below}, as the layers are listed from the lowest upward"),
            ));
        }
    }
    if joints.len() + 1 != layers.len() {
        problems.push(Problem::new(
            ErrorKind::Value,
            "joints",
            format!("{} joints of {} layers", joints.len(), layers.len()),
            "one joint fewer than layers",
        ));
    }
    for (j, joint) in joints.iter().enumerate() {
        check::not_negative(problems, *joint, &path::indexed("joints", j));
    }
}
