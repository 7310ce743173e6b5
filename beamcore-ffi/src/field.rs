//! Fields as handles: a quantity along the member, worked out once and asked at any place.

use crate::choice;
use crate::choice_layers::{self, JointField, LayerField};
use crate::fault::Fault;
use crate::get;
use crate::guard;
use crate::handle::{self, Slot};
use crate::response::{self, BcResponse, PlainField, write_values};
use crate::text;
use beamcore::response::Response;
use beamcore::time::Time;
use std::ffi::c_char;

/// A field: a quantity along the member, in its SI unit.
pub struct BcField(Box<dyn PlainField>);

/// A new field of a response, which `of` finds under a combination at a time.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn field(
    response: *const BcResponse,
    combination: *const c_char,
    time: i32,
    field_out: *mut *mut BcField,
    of: impl FnOnce(&Response, &str, Time) -> Result<Box<dyn PlainField>, Fault>,
) -> i32 {
    let out = (field_out, "field_out");
    // SAFETY: by this function's own contract.
    unsafe {
        get::made((response, "response"), out, |response| {
            let combination = text::read(combination, "combination")?;
            let time = choice::time(time)?;
            Ok(BcField(of(&response.0, combination, time)?))
        })
    }
}

/// A field (BC_FIELD_...) of a member under a combination at a time.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_field(
    response: *const BcResponse,
    field: i32,
    combination: *const c_char,
    time: i32,
    field_out: *mut *mut BcField,
) -> i32 {
    let (number, out) = (field, (field_out, "field_out"));
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::made((response, "response"), out, |response| {
            let combination = text::read(combination, "combination")?;
            let field = response::field(&response.0, number, combination, time)?;
            Ok(BcField(field))
        })
    }
}

/// A field (BC_JOINT_FIELD_...) of a joint that is not rigid, under a combination at a time. Loads
/// that name no layer are taken to enter from above.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_joint_field(
    response: *const BcResponse,
    joint_field: i32,
    combination: *const c_char,
    time: i32,
    joint: *const c_char,
    field_out: *mut *mut BcField,
) -> i32 {
    let of = |response: &Response, combination: &str, time| -> Result<Box<dyn PlainField>, Fault> {
        // SAFETY: the caller keeps the header's contract for the name.
        let joint = unsafe { text::read(joint, "joint")? };
        let which = choice_layers::joint_field(joint_field)?;
        let fields = response.joint(combination, time, joint)?;
        Ok(match which {
            JointField::Slip => Box::new(fields.slip),
            JointField::Flow => Box::new(fields.flow),
            JointField::Pressure => Box::new(fields.pressure),
        })
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { field(response, combination, time, field_out, of) }
}

/// A field (BC_LAYER_FIELD_...) of a layer, with the layers that rigid joints hold to it, under a
/// combination at a time.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_layer_field(
    response: *const BcResponse,
    layer_field: i32,
    combination: *const c_char,
    time: i32,
    layer: *const c_char,
    field_out: *mut *mut BcField,
) -> i32 {
    let of = |response: &Response, combination: &str, time| -> Result<Box<dyn PlainField>, Fault> {
        // SAFETY: the caller keeps the header's contract for the name.
        let layer = unsafe { text::read(layer, "layer")? };
        Ok(match choice_layers::layer_field(layer_field)? {
            LayerField::Axial => Box::new(response.layer(combination, time, layer)?.axial),
            LayerField::Moment => Box::new(response.layer(combination, time, layer)?.moment),
            LayerField::Deflection => {
                Box::new(response.layer_deflection(combination, time, layer)?)
            }
        })
    };
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe { field(response, combination, time, field_out, of) }
}

/// An extreme (BC_EXTREME_...) of a field and its place; the leftmost of equals.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_field_extreme(
    field: *const BcField,
    extreme: i32,
    value_out: *mut f64,
    at_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (field, value_out, at_out) = unsafe {
            (
                handle::shared(field, "field")?,
                Slot::new(value_out, "value_out")?,
                Slot::new(at_m_out, "at_m_out")?,
            )
        };
        let (value, at) = field.0.extreme(choice::extreme(extreme)?);
        value_out.put(value);
        at_out.put(at);
        Ok(())
    })
}

/// The values of a field at count places; where it jumps, side (BC_SIDE_...) says which of the two
/// values is meant. x_m and values_out may be the same list.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_field_values(
    field: *const BcField,
    side: i32,
    x_m: *const f64,
    count: i32,
    values_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        unsafe {
            let field = handle::shared(field, "field")?;
            write_values(|| Ok(&*field.0), side, x_m, count, values_out)
        }
    })
}

/// The number of stations of a field: the places where its pieces meet.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_field_station_count(field: *const BcField, count_out: *mut i32) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::count((field, "field"), count_out, |field| {
            Ok(field.0.stations().len())
        })
    }
}

/// The place of a station of a field. Stations are counted from 0, from the left.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_field_station(
    field: *const BcField,
    index: i32,
    at_m_out: *mut f64,
) -> i32 {
    // SAFETY: the caller keeps the header's contract for these pointers.
    unsafe {
        get::value((field, "field"), (at_m_out, "at_m_out"), |field| {
            Ok(*handle::element(&field.0.stations(), index)?)
        })
    }
}

/// Frees a field; NULL is allowed.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_field_free(field: *mut BcField) {
    // SAFETY: the caller keeps the header's contract for this pointer.
    guard::free(|| unsafe { handle::free(field) });
}
