//! Sections and their stiffness.

use crate::choice;
use crate::fault::Fault;
use crate::guard;
use crate::handle::{self, Slot};
use crate::part::BcPart;
use crate::text::{self, TextOut};
use beamcore::section::{PlacedPart, Section};
use beamcore::units::LineMass;
use std::ffi::c_char;

/// A section: parts in layers with joints between them, each at its place.
pub struct BcSection(pub(crate) Section);

/// A section of parts, joined rigidly as one layer named "section". All that is wrong with them is
/// reported at once; no part at all is BC_ERROR_MISSING.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_new(
    parts: *const *const BcPart,
    part_count: i32,
    section_out: *mut *mut BcSection,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (parts, out) = unsafe {
            (
                handle::handles(parts, part_count, "parts")?,
                Slot::new(section_out, "section_out")?,
            )
        };
        let parts = parts.into_iter().map(|part| part.0.clone());
        out.give(BcSection(Section::of(parts)?));
        Ok(())
    })
}

/// The position of the part of a name, in the order of the parts.
pub(crate) fn position(section: &Section, part: &str) -> Result<usize, Fault> {
    let found = section.part(part)?;
    let before = |placed: &&PlacedPart| !std::ptr::eq(*placed, found);
    Ok(section.placed().iter().take_while(before).count())
}

/// EA, the sum of E A over the parts, at a time.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_axial_stiffness(
    section: *const BcSection,
    time: i32,
    axial_stiffness_N_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (section, out) = unsafe {
            (
                handle::shared(section, "section")?,
                Slot::new(axial_stiffness_N_out, "axial_stiffness_N_out")?,
            )
        };
        out.put(section.0.stiffness(choice::time(time)?).axial().si());
        Ok(())
    })
}

/// The elastic centroid at a time.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_centroid(
    section: *const BcSection,
    time: i32,
    y_m_out: *mut f64,
    z_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (section, y_out, z_out) = unsafe {
            (
                handle::shared(section, "section")?,
                Slot::new(y_m_out, "y_m_out")?,
                Slot::new(z_m_out, "z_m_out")?,
            )
        };
        let stiffness = section.0.stiffness(choice::time(time)?);
        y_out.put(stiffness.centroid_y().si());
        z_out.put(stiffness.centroid_z().si());
        Ok(())
    })
}

/// The bending stiffness at a time about the axes through the elastic centroid: yy about the
/// horizontal one, zz about the upright one, and the mixed term yz.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_bending_stiffness(
    section: *const BcSection,
    time: i32,
    yy_Nm2_out: *mut f64,
    zz_Nm2_out: *mut f64,
    yz_Nm2_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (section, yy_out, zz_out, yz_out) = unsafe {
            (
                handle::shared(section, "section")?,
                Slot::new(yy_Nm2_out, "yy_Nm2_out")?,
                Slot::new(zz_Nm2_out, "zz_Nm2_out")?,
                Slot::new(yz_Nm2_out, "yz_Nm2_out")?,
            )
        };
        let stiffness = section.0.stiffness(choice::time(time)?);
        yy_out.put(stiffness.bending_yy().si());
        zz_out.put(stiffness.bending_zz().si());
        yz_out.put(stiffness.bending_yz().si());
        Ok(())
    })
}

/// The modulus of a part at a time and its share in the bending stiffness yy; the shares of all
/// parts sum to 1.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_part_share(
    section: *const BcSection,
    time: i32,
    part: *const c_char,
    modulus_Pa_out: *mut f64,
    share_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (section, part, modulus_out, share_out) = unsafe {
            (
                &handle::shared(section, "section")?.0,
                text::read(part, "part")?,
                Slot::new(modulus_Pa_out, "modulus_Pa_out")?,
                Slot::new(share_out, "share_out")?,
            )
        };
        let stiffness = section.stiffness(choice::time(time)?);
        let index = position(section, part)?;
        modulus_out.put(stiffness.moduli()[index].si());
        share_out.put(stiffness.shares()[index]);
        Ok(())
    })
}

/// The edges of a part at its place, and its area.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_part_edges(
    section: *const BcSection,
    part: *const c_char,
    left_m_out: *mut f64,
    right_m_out: *mut f64,
    bottom_m_out: *mut f64,
    top_m_out: *mut f64,
    area_m2_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (section, part, left_out, right_out, bottom_out, top_out, area_out) = unsafe {
            (
                handle::shared(section, "section")?,
                text::read(part, "part")?,
                Slot::new(left_m_out, "left_m_out")?,
                Slot::new(right_m_out, "right_m_out")?,
                Slot::new(bottom_m_out, "bottom_m_out")?,
                Slot::new(top_m_out, "top_m_out")?,
                Slot::new(area_m2_out, "area_m2_out")?,
            )
        };
        let placed = section.0.part(part)?;
        left_out.put(placed.left().si());
        right_out.put(placed.right().si());
        bottom_out.put(placed.bottom().si());
        top_out.put(placed.top().si());
        area_out.put(placed.area().si());
        Ok(())
    })
}

/// Mass per length of the section. Where a part has no density, has_value_out is 0 and the mass
/// is left as it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_line_mass(
    section: *const BcSection,
    has_value_out: *mut i32,
    line_mass_kg_per_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (section, has_out, mass_out) = unsafe {
            (
                handle::shared(section, "section")?,
                Slot::new(has_value_out, "has_value_out")?,
                Slot::new(line_mass_kg_per_m_out, "line_mass_kg_per_m_out")?,
            )
        };
        let mass = section.0.line_mass().map(LineMass::si);
        has_out.put(i32::from(mass.is_some()));
        if let Some(mass) = mass {
            mass_out.put(mass);
        }
        Ok(())
    })
}

/// The number of notes on a section, for example on parts that do not touch.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_note_count(
    section: *const BcSection,
    count_out: *mut i32,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (section, out) = unsafe {
            (
                handle::shared(section, "section")?,
                Slot::new(count_out, "count_out")?,
            )
        };
        out.put(handle::count(section.0.notes().len())?);
        Ok(())
    })
}

/// A note on a section. Notes are counted from 0.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_note(
    section: *const BcSection,
    index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (section, out) = unsafe {
            (
                handle::shared(section, "section")?,
                TextOut::new(buffer, capacity, length_out)?,
            )
        };
        out.put(handle::element(section.0.notes(), index)?)
    })
}

/// Frees a section; NULL is allowed.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_section_free(section: *mut BcSection) {
    // SAFETY: the caller keeps the header's contract for this pointer.
    guard::free(|| unsafe { handle::free(section) });
}
