//! Layers: parts that act as one piece.

use crate::get;
use crate::guard;
use crate::handle::{self, Slot};
use crate::text;
use beamcore::section::Layer;
use beamcore::units::Length;
use std::ffi::c_char;

/// A layer: the parts that act as one piece, without slip between them.
pub struct BcLayer(pub(crate) Layer);

/// A layer over the whole length of the member, of the parts of these names. It is checked when it
/// is used in a section.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_layer_new(
    name: *const c_char,
    part_names: *const *const c_char,
    part_count: i32,
    layer_out: *mut *mut BcLayer,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (name, parts, out) = unsafe {
            (
                text::read(name, "name")?,
                text::list(part_names, part_count, "part_names")?,
                Slot::new(layer_out, "layer_out")?,
            )
        };
        out.give(BcLayer(Layer::new(name, parts)));
        Ok(())
    })
}

/// The same layer, there only from one place along the member to another, from the left end. What
/// is set into a host displaces it over the whole length all the same.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_layer_between(
    layer: *const BcLayer,
    from_m: f64,
    to_m: f64,
    layer_out: *mut *mut BcLayer,
) -> i32 {
    let (from, to) = (Length::from_m(from_m), Length::from_m(to_m));
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::made((layer, "layer"), (layer_out, "layer_out"), |layer| {
            Ok(BcLayer(layer.0.clone().between(from, to)))
        })
    }
}

/// The name of a layer.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_layer_name(
    layer: *const BcLayer,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::text((layer, "layer"), buffer, capacity, length_out, |layer| {
            Ok(layer.0.name())
        })
    }
}

/// The number of parts of a layer.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_layer_part_count(layer: *const BcLayer, count_out: *mut i32) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::count((layer, "layer"), count_out, |layer| {
            Ok(layer.0.parts().len())
        })
    }
}

/// The name of a part of a layer. Parts are counted from 0.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_layer_part_name(
    layer: *const BcLayer,
    index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::text((layer, "layer"), buffer, capacity, length_out, |layer| {
            Ok(handle::element(layer.0.parts(), index)?.as_str())
        })
    }
}

/// From where to where along the member a layer is there. Where it is there over the whole length,
/// has_value_out is 0 and the places are left as they are.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_layer_extent(
    layer: *const BcLayer,
    has_value_out: *mut i32,
    from_m_out: *mut f64,
    to_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (layer, has_out, from_out, to_out) = unsafe {
            (
                handle::shared(layer, "layer")?,
                Slot::new(has_value_out, "has_value_out")?,
                Slot::new(from_m_out, "from_m_out")?,
                Slot::new(to_m_out, "to_m_out")?,
            )
        };
        let extent = layer.0.extent();
        has_out.put(i32::from(extent.is_some()));
        if let Some((from, to)) = extent {
            from_out.put(from.si());
            to_out.put(to.si());
        }
        Ok(())
    })
}

/// Frees a layer; NULL is allowed.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_layer_free(layer: *mut BcLayer) {
    // SAFETY: the caller keeps the header's contract for this pointer.
    guard::free(|| unsafe { handle::free(layer) });
}
