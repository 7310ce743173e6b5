//! Joints and layers of a comparison of a simplified method with the exact solution.

use crate::comparison::BcComparison;
use crate::get;
use crate::guard;
use crate::handle::{self, Slot};
use std::ffi::c_char;

/// The number of joints of a span in a comparison.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_comparison_joint_count(
    comparison: *const BcComparison,
    span_index: i32,
    count_out: *mut i32,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::count((comparison, "comparison"), count_out, |comparison| {
            Ok(comparison.span(span_index)?.joints.len())
        })
    }
}

/// The name of a joint in a comparison. Joints are counted from 0.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_comparison_joint_name(
    comparison: *const BcComparison,
    span_index: i32,
    joint_index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    let handle = (comparison, "comparison");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::text(handle, buffer, capacity, length_out, |comparison| {
            let span = comparison.span(span_index)?;
            Ok(&handle::element(&span.joints, joint_index)?.joint)
        })
    }
}

/// The greatest flow of a joint over a span with its place, by the method and by the exact
/// solution, with the sign of the slip.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_comparison_flow(
    comparison: *const BcComparison,
    span_index: i32,
    joint_index: i32,
    flow_N_per_m_out: *mut f64,
    at_m_out: *mut f64,
    exact_flow_N_per_m_out: *mut f64,
    exact_at_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (comparison, flow_out, at_out, exact_flow_out, exact_at_out) = unsafe {
            (
                handle::shared(comparison, "comparison")?,
                Slot::new(flow_N_per_m_out, "flow_N_per_m_out")?,
                Slot::new(at_m_out, "at_m_out")?,
                Slot::new(exact_flow_N_per_m_out, "exact_flow_N_per_m_out")?,
                Slot::new(exact_at_m_out, "exact_at_m_out")?,
            )
        };
        let joint = handle::element(&comparison.span(span_index)?.joints, joint_index)?;
        flow_out.put(joint.flow.value.si());
        at_out.put(joint.flow.at.si());
        exact_flow_out.put(joint.exact_flow.value.si());
        exact_at_out.put(joint.exact_flow.at.si());
        Ok(())
    })
}

/// The number of layers of a span in a comparison.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_comparison_layer_count(
    comparison: *const BcComparison,
    span_index: i32,
    count_out: *mut i32,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::count((comparison, "comparison"), count_out, |comparison| {
            Ok(comparison.span(span_index)?.layers.len())
        })
    }
}

/// The name of a layer in a comparison. Layers are counted from 0, from the lowest upward.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_comparison_layer_name(
    comparison: *const BcComparison,
    span_index: i32,
    layer_index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    let handle = (comparison, "comparison");
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::text(handle, buffer, capacity, length_out, |comparison| {
            let span = comparison.span(span_index)?;
            Ok(&handle::element(&span.layers, layer_index)?.layer)
        })
    }
}

/// The stresses of a layer by the method at the place of the span's greatest moment: at the middle
/// of its height, and what bending of the layer adds at its lower edge; with the place, and the
/// axial force and moment of the layer there by the exact solution.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_comparison_stress(
    comparison: *const BcComparison,
    span_index: i32,
    layer_index: i32,
    axial_Pa_out: *mut f64,
    bending_Pa_out: *mut f64,
    at_m_out: *mut f64,
    exact_axial_N_out: *mut f64,
    exact_moment_Nm_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (comparison, axial_out, bending_out, at_out, exact_axial_out, exact_moment_out) = unsafe {
            (
                handle::shared(comparison, "comparison")?,
                Slot::new(axial_Pa_out, "axial_Pa_out")?,
                Slot::new(bending_Pa_out, "bending_Pa_out")?,
                Slot::new(at_m_out, "at_m_out")?,
                Slot::new(exact_axial_N_out, "exact_axial_N_out")?,
                Slot::new(exact_moment_Nm_out, "exact_moment_Nm_out")?,
            )
        };
        let layer = handle::element(&comparison.span(span_index)?.layers, layer_index)?;
        axial_out.put(layer.stress.axial.si());
        bending_out.put(layer.stress.bending.si());
        at_out.put(layer.at.si());
        exact_axial_out.put(layer.exact_axial.si());
        exact_moment_out.put(layer.exact_moment.si());
        Ok(())
    })
}
