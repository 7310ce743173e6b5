//! Choices that cross as `int32_t`: axes of a section, sideways freedom, strengths.

use crate::choice::choice;
use crate::fault::Fault;
use beamcore::section::{MirrorAxis, Sideways};

/// Axis of a mirror image: the upright axis y = 0; left and right change.
pub const BC_MIRROR_UPRIGHT: i32 = 1;
/// Axis of a mirror image: the level axis z = 0; top and bottom change.
pub const BC_MIRROR_LEVEL: i32 = 2;

/// Sideways: held, as by a floor; bends about the level axis only.
pub const BC_SIDEWAYS_HELD: i32 = 1;
/// Sideways: free; also bends about the upright axis where there is no axis of symmetry.
pub const BC_SIDEWAYS_FREE: i32 = 2;

/// Design strength of timber: bending, f_m,d.
pub const BC_STRENGTH_DESIGN_BENDING: i32 = 1;
/// Design strength of timber: tension along the grain, f_t,0,d.
pub const BC_STRENGTH_DESIGN_TENSION: i32 = 2;
/// Design strength of timber: compression along the grain, f_c,0,d.
pub const BC_STRENGTH_DESIGN_COMPRESSION: i32 = 3;
/// Design strength of metal: yield, f_y,d.
pub const BC_STRENGTH_DESIGN_YIELD: i32 = 4;
/// Design strength: shear, f_v,d of timber or f_y,d/sqrt(3) of metal, unless it was given.
pub const BC_STRENGTH_DESIGN_SHEAR: i32 = 5;
/// Characteristic strength of timber: bending, f_m,k.
pub const BC_STRENGTH_BENDING: i32 = 6;
/// Characteristic strength of timber: tension along the grain, f_t,0,k.
pub const BC_STRENGTH_TENSION: i32 = 7;
/// Characteristic strength: compression, f_c,0,k of timber along the grain, f_ck of concrete.
pub const BC_STRENGTH_COMPRESSION: i32 = 8;
/// Characteristic strength of timber: shear, f_v,k.
pub const BC_STRENGTH_SHEAR: i32 = 9;
/// Characteristic strength of timber: tension across the grain, f_t,90,k.
pub const BC_STRENGTH_TENSION_ACROSS: i32 = 10;
/// Characteristic strength of timber: compression across the grain, f_c,90,k.
pub const BC_STRENGTH_COMPRESSION_ACROSS: i32 = 11;
/// Characteristic strength of metal: yield f_y, or 0.2 % proof f_o.
pub const BC_STRENGTH_YIELD: i32 = 12;
/// Characteristic strength of metal: ultimate in tension, f_u.
pub const BC_STRENGTH_ULTIMATE: i32 = 13;
/// Mean strength of concrete: compression, f_cm.
pub const BC_STRENGTH_MEAN_COMPRESSION: i32 = 14;
/// Mean strength of concrete: tension, f_ctm.
pub const BC_STRENGTH_MEAN_TENSION: i32 = 15;

/// Which strength of a material.
#[derive(Clone, Copy)]
pub(crate) enum StrengthName {
    DesignBending,
    DesignTension,
    DesignCompression,
    DesignYield,
    DesignShear,
    Bending,
    Tension,
    Compression,
    Shear,
    TensionAcross,
    CompressionAcross,
    Yield,
    Ultimate,
    MeanCompression,
    MeanTension,
}

choice!(
    mirror,
    mirror_number,
    MirrorAxis,
    "axis",
    "BC_MIRROR_UPRIGHT, BC_MIRROR_LEVEL",
    Upright = BC_MIRROR_UPRIGHT,
    Level = BC_MIRROR_LEVEL
);
choice!(
    sideways,
    sideways_number,
    Sideways,
    "sideways",
    "BC_SIDEWAYS_HELD, BC_SIDEWAYS_FREE",
    Held = BC_SIDEWAYS_HELD,
    Free = BC_SIDEWAYS_FREE
);
choice!(
    strength,
    strength_number,
    StrengthName,
    "strength",
    "BC_STRENGTH_DESIGN_BENDING, BC_STRENGTH_DESIGN_TENSION, BC_STRENGTH_DESIGN_COMPRESSION, \
     BC_STRENGTH_DESIGN_YIELD, BC_STRENGTH_DESIGN_SHEAR, BC_STRENGTH_BENDING, \
     BC_STRENGTH_TENSION, BC_STRENGTH_COMPRESSION, BC_STRENGTH_SHEAR, \
     BC_STRENGTH_TENSION_ACROSS, BC_STRENGTH_COMPRESSION_ACROSS, BC_STRENGTH_YIELD, \
     BC_STRENGTH_ULTIMATE, BC_STRENGTH_MEAN_COMPRESSION, BC_STRENGTH_MEAN_TENSION",
    DesignBending = BC_STRENGTH_DESIGN_BENDING,
    DesignTension = BC_STRENGTH_DESIGN_TENSION,
    DesignCompression = BC_STRENGTH_DESIGN_COMPRESSION,
    DesignYield = BC_STRENGTH_DESIGN_YIELD,
    DesignShear = BC_STRENGTH_DESIGN_SHEAR,
    Bending = BC_STRENGTH_BENDING,
    Tension = BC_STRENGTH_TENSION,
    Compression = BC_STRENGTH_COMPRESSION,
    Shear = BC_STRENGTH_SHEAR,
    TensionAcross = BC_STRENGTH_TENSION_ACROSS,
    CompressionAcross = BC_STRENGTH_COMPRESSION_ACROSS,
    Yield = BC_STRENGTH_YIELD,
    Ultimate = BC_STRENGTH_ULTIMATE,
    MeanCompression = BC_STRENGTH_MEAN_COMPRESSION,
    MeanTension = BC_STRENGTH_MEAN_TENSION
);
