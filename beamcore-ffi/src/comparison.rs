//! What a simplified method gives for each span of a member, beside the exact solution.

use crate::choice;
use crate::choice_layers;
use crate::fault::Fault;
use crate::get;
use crate::guard;
use crate::handle::{self, Slot};
use crate::response::BcResponse;
use crate::text;
use beamcore::response::SimplifiedSpan;
use std::ffi::c_char;

/// A comparison: what a simplified method gives for each span, beside the exact solution.
pub struct BcComparison(pub(crate) Vec<SimplifiedSpan>);

impl BcComparison {
    /// The span of an index.
    pub(crate) fn span(&self, index: i32) -> Result<&SimplifiedSpan, Fault> {
        handle::element(&self.0, index)
    }
}

/// Deflection, flow and stresses of each span by a simplified method (BC_METHOD_...), beside the
/// exact ones, under a combination at a time. It covers prismatic members of layers on each other
/// under transverse loads; free strains are left out of both sides.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_compare(
    response: *const BcResponse,
    combination: *const c_char,
    time: i32,
    method: i32,
    comparison_out: *mut *mut BcComparison,
) -> i32 {
    let out = (comparison_out, "comparison_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::made((response, "response"), out, |response| {
            let combination = text::read(combination, "combination")?;
            let (time, method) = (choice::time(time)?, choice_layers::method(method)?);
            Ok(BcComparison(response.0.simplified(
                combination,
                time,
                method,
            )?))
        })
    }
}

/// The number of spans of a comparison.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_comparison_span_count(
    comparison: *const BcComparison,
    count_out: *mut i32,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::count((comparison, "comparison"), count_out, |comparison| {
            Ok(comparison.0.len())
        })
    }
}

/// The name of a span. Spans are counted from 0, from the left.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_comparison_span_name(
    comparison: *const BcComparison,
    span_index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    let handle = (comparison, "comparison");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::text(handle, buffer, capacity, length_out, |comparison| {
            Ok(&comparison.span(span_index)?.span)
        })
    }
}

/// The length of the half sine wave for a span, the effective bending stiffness with the moduli of
/// the time, and whether the combination holds free strains, which are left out (1) or not (0).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_comparison_span(
    comparison: *const BcComparison,
    span_index: i32,
    length_m_out: *mut f64,
    bending_stiffness_Nm2_out: *mut f64,
    leaves_out_strains_out: *mut i32,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (comparison, length_out, bending_out, strains_out) = unsafe {
            (
                handle::shared(comparison, "comparison")?,
                Slot::new(length_m_out, "length_m_out")?,
                Slot::new(bending_stiffness_Nm2_out, "bending_stiffness_Nm2_out")?,
                Slot::new(leaves_out_strains_out, "leaves_out_strains_out")?,
            )
        };
        let span = comparison.span(span_index)?;
        length_out.put(span.length.si());
        bending_out.put(span.bending_stiffness.si());
        strains_out.put(i32::from(span.leaves_out_strains));
        Ok(())
    })
}

/// The number of factors gamma of a span, one for each layer; none of sine layers.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_comparison_factor_count(
    comparison: *const BcComparison,
    span_index: i32,
    count_out: *mut i32,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::count((comparison, "comparison"), count_out, |comparison| {
            Ok(comparison.span(span_index)?.factors.len())
        })
    }
}

/// A factor gamma of a span. Layers are counted from 0, from the lowest upward.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_comparison_factor(
    comparison: *const BcComparison,
    span_index: i32,
    layer_index: i32,
    factor_out: *mut f64,
) -> i32 {
    let out = (factor_out, "factor_out");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::value((comparison, "comparison"), out, |comparison| {
            let span = comparison.span(span_index)?;
            Ok(*handle::element(&span.factors, layer_index)?)
        })
    }
}

/// The greatest deflection of a span with its place, by the method and by the exact solution, and
/// their ratio less one.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_comparison_deflection(
    comparison: *const BcComparison,
    span_index: i32,
    value_m_out: *mut f64,
    at_m_out: *mut f64,
    exact_value_m_out: *mut f64,
    exact_at_m_out: *mut f64,
    difference_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (comparison, value_out, at_out, exact_value_out, exact_at_out, difference_out) = unsafe {
            (
                handle::shared(comparison, "comparison")?,
                Slot::new(value_m_out, "value_m_out")?,
                Slot::new(at_m_out, "at_m_out")?,
                Slot::new(exact_value_m_out, "exact_value_m_out")?,
                Slot::new(exact_at_m_out, "exact_at_m_out")?,
                Slot::new(difference_out, "difference_out")?,
            )
        };
        let span = comparison.span(span_index)?;
        value_out.put(span.deflection.value.si());
        at_out.put(span.deflection.at.si());
        exact_value_out.put(span.exact_deflection.value.si());
        exact_at_out.put(span.exact_deflection.at.si());
        difference_out.put(span.difference());
        Ok(())
    })
}

/// The number of warnings for a span: where the method does not hold, or only nearly.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_comparison_warning_count(
    comparison: *const BcComparison,
    span_index: i32,
    count_out: *mut i32,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::count((comparison, "comparison"), count_out, |comparison| {
            Ok(comparison.span(span_index)?.warnings.len())
        })
    }
}

/// A warning for a span, in words. Warnings are counted from 0.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_comparison_warning(
    comparison: *const BcComparison,
    span_index: i32,
    index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    let handle = (comparison, "comparison");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::text(handle, buffer, capacity, length_out, |comparison| {
            let span = comparison.span(span_index)?;
            Ok(handle::element(&span.warnings, index)?.text())
        })
    }
}

/// Frees a comparison; NULL is allowed.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_comparison_free(comparison: *mut BcComparison) {
    // SAFETY: the caller keeps the header's contract for this pointer.
    guard::free(|| unsafe { handle::free(comparison) });
}
