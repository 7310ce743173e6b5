//! Categories of variable actions.

use crate::choice_member;
use crate::guard;
use crate::handle::Slot;
use crate::text;
use beamcore::member::Category;
use std::ffi::c_char;

/// The category (BC_CATEGORY_...) of a word of documents: "A" to "H", "snow", "snow_high", "wind"
/// or "temperature".
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_category_of_name(name: *const c_char, category_out: *mut i32) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (name, out) = unsafe {
            (
                text::read(name, "name")?,
                Slot::new(category_out, "category_out")?,
            )
        };
        out.put(choice_member::category_number(Category::from_name(name)?));
        Ok(())
    })
}

/// The recommended combination factors of a category (BC_CATEGORY_...), EN 1990:2002 Table A1.1:
/// psi_0 beside another variable action, psi_1 frequent, psi_2 quasi-permanent.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_category_factors(
    category: i32,
    psi_0_out: *mut f64,
    psi_1_out: *mut f64,
    psi_2_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (psi_0, psi_1, psi_2) = unsafe {
            (
                Slot::new(psi_0_out, "psi_0_out")?,
                Slot::new(psi_1_out, "psi_1_out")?,
                Slot::new(psi_2_out, "psi_2_out")?,
            )
        };
        let factors = choice_member::category(category)?.factors();
        psi_0.put(factors.psi_0);
        psi_1.put(factors.psi_1);
        psi_2.put(factors.psi_2);
        Ok(())
    })
}
