//! Sections of layers with joints between them.

use crate::choice;
use crate::get;
use crate::guard;
use crate::handle::{self, Slot};
use crate::joint::BcJoint;
use crate::layer::BcLayer;
use crate::part::BcPart;
use crate::section::BcSection;
use crate::text::TextOut;
use beamcore::section::{SHEAR_STIFFNESS_DEFINITION, Section};
use beamcore::units::ShearStiffness;
use std::ffi::c_char;

/// A section of parts in layers, with joints between the layers. All that is wrong is reported at
/// once.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_layered(
    parts: *const *const BcPart,
    part_count: i32,
    layers: *const *const BcLayer,
    layer_count: i32,
    joints: *const *const BcJoint,
    joint_count: i32,
    section_out: *mut *mut BcSection,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (parts, layers, joints, out) = unsafe {
            (
                handle::handles(parts, part_count, "parts")?,
                handle::handles(layers, layer_count, "layers")?,
                handle::handles(joints, joint_count, "joints")?,
                Slot::new(section_out, "section_out")?,
            )
        };
        out.give(BcSection(Section::layered(
            parts.into_iter().map(|part| part.0.clone()),
            layers.into_iter().map(|layer| layer.0.clone()),
            joints.into_iter().map(|joint| joint.0.clone()),
        )?));
        Ok(())
    })
}

/// The section whose every size and place lies at a share of the way from one section's (0) to
/// another's (1), as along a taper. The two must be alike: the same parts of the same materials and
/// shapes, placed in the same ways, in the same layers and joints.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_between(
    section: *const BcSection,
    other: *const BcSection,
    share: f64,
    section_out: *mut *mut BcSection,
) -> i32 {
    let out = (section_out, "section_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::made((section, "section"), out, |section| {
            let other = handle::shared(other, "other")?;
            Ok(BcSection(section.0.between(&other.0, share)?))
        })
    }
}

/// A shear stiffness of a section at a time, which `of` finds.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn shear(
    section: *const BcSection,
    time: i32,
    shear_stiffness_N_out: *mut f64,
    of: fn(&Section, beamcore::time::Time) -> beamcore::Result<ShearStiffness>,
) -> i32 {
    let out = (shear_stiffness_N_out, "shear_stiffness_N_out");
    // SAFETY: by this function's own contract.
    unsafe {
        get::value((section, "section"), out, |section| {
            Ok(of(&section.0, choice::time(time)?)?.si())
        })
    }
}

/// The shear stiffness kGA at a time of a section whose parts are glued over their whole height, so
/// that they act as one layer, bent about the level axis:
/// kGA = EI^2/int [ES(z)^2/(sum of b_i G_i)] dz. It is worked out exactly, for edges that are level
/// or upright.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_shear_stiffness(
    section: *const BcSection,
    time: i32,
    shear_stiffness_N_out: *mut f64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        shear(
            section,
            time,
            shear_stiffness_N_out,
            Section::shear_stiffness,
        )
    }
}

/// The shear stiffness kGA at a time of a section whose parts stand side by side, with their
/// centroids at one height, and are only fastened to each other:
/// 1/kGA = sum of (EI_i/EI)^2/kGA_i.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_fastened_shear_stiffness(
    section: *const BcSection,
    time: i32,
    shear_stiffness_N_out: *mut f64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        shear(
            section,
            time,
            shear_stiffness_N_out,
            Section::fastened_shear_stiffness,
        )
    }
}

/// What is meant by kGA, in words, for definitions of the shear coefficient differ.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_shear_stiffness_definition(
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let out = unsafe { TextOut::new(buffer, capacity, length_out)? };
        out.put(SHEAR_STIFFNESS_DEFINITION)
    })
}

/// The number of layers of a section; of a section without layers, one named "section".
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_layer_count(
    section: *const BcSection,
    count_out: *mut i32,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::count((section, "section"), count_out, |section| {
            Ok(section.0.layers().len())
        })
    }
}

/// A layer of a section as it was given. Layers are counted from 0.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_layer(
    section: *const BcSection,
    index: i32,
    layer_out: *mut *mut BcLayer,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::made((section, "section"), (layer_out, "layer_out"), |section| {
            Ok(BcLayer(handle::element(section.0.layers(), index)?.clone()))
        })
    }
}

/// The number of joints of a section.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_joint_count(
    section: *const BcSection,
    count_out: *mut i32,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::count((section, "section"), count_out, |section| {
            Ok(section.0.joints().len())
        })
    }
}

/// A joint of a section as it was given. Joints are counted from 0.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_joint(
    section: *const BcSection,
    index: i32,
    joint_out: *mut *mut BcJoint,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::made((section, "section"), (joint_out, "joint_out"), |section| {
            Ok(BcJoint(handle::element(section.0.joints(), index)?.clone()))
        })
    }
}

/// The number of merged layers of a section: layers that rigid joints hold together count once.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_merged_layer_count(
    section: *const BcSection,
    count_out: *mut i32,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::count((section, "section"), count_out, |section| {
            Ok(section.0.merged_layers().len())
        })
    }
}

/// The number of layers in a merged layer. Merged layers are counted from 0.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_merged_layer_size(
    section: *const BcSection,
    index: i32,
    count_out: *mut i32,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::count((section, "section"), count_out, |section| {
            let merged = handle::element(section.0.merged_layers(), index)?;
            Ok(merged.layers().len())
        })
    }
}

/// The name of a layer in a merged layer. Both are counted from 0.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_merged_layer_name(
    section: *const BcSection,
    index: i32,
    layer_index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::text(
            (section, "section"),
            buffer,
            capacity,
            length_out,
            |section| {
                let merged = handle::element(section.0.merged_layers(), index)?;
                Ok(handle::element(merged.layers(), layer_index)?.as_str())
            },
        )
    }
}
