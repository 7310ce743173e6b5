//! Responses: fields along a member, their extremes, and reactions.

use crate::choice::{self, BC_SIDE_RIGHT, ExtremeName, FieldName, PlaceSide};
use crate::fault::Fault;
use crate::guard;
use crate::handle::{self, Slot, Slots};
use crate::text;
use beamcore::field::{Extreme, Field};
use beamcore::response::Response;
use beamcore::units::{Length, Quantity};
use std::ffi::c_char;
use std::ops::Deref;

/// A response: the solved member.
pub struct BcResponse(pub(crate) Response);

/// A field in plain SI numbers, whatever its quantity is.
pub(crate) trait PlainField: Send + Sync {
    /// An extreme and its place.
    fn extreme(&self, name: ExtremeName) -> (f64, f64);
    /// The value on one side of a place.
    fn value(&self, x_m: f64, side: PlaceSide) -> Result<f64, Fault>;
    /// The places where the polynomials meet.
    fn stations(&self) -> Vec<f64>;
}

impl<Q: Quantity + Send + Sync> PlainField for Field<Q> {
    fn extreme(&self, name: ExtremeName) -> (f64, f64) {
        let Extreme { value, at } = match name {
            ExtremeName::Greatest => self.greatest(),
            ExtremeName::Maximum => self.maximum(),
            ExtremeName::Minimum => self.minimum(),
        };
        (value.si(), at.si())
    }

    fn value(&self, x_m: f64, side: PlaceSide) -> Result<f64, Fault> {
        let sides = self.sides(Length::from_m(x_m))?;
        Ok(match side {
            PlaceSide::Left => sides.left.si(),
            PlaceSide::Right => sides.right.si(),
        })
    }

    fn stations(&self) -> Vec<f64> {
        Self::stations(self).into_iter().map(Length::si).collect()
    }
}

/// The field that the three parameters of the ABI name.
pub(crate) fn field(
    response: &Response,
    field: i32,
    combination: &str,
    time: i32,
) -> Result<Box<dyn PlainField>, Fault> {
    let time = choice::time(time)?;
    Ok(match choice::field(field)? {
        FieldName::Deflection => Box::new(response.deflection(combination, time)?),
        FieldName::Slope => Box::new(response.slope(combination, time)?),
        FieldName::Shear => Box::new(response.shear(combination, time)?),
        FieldName::Moment => Box::new(response.moment(combination, time)?),
        FieldName::Axial => Box::new(response.axial(combination, time)?),
        FieldName::Rotation => Box::new(response.rotation(combination, time)?),
        FieldName::Curvature => Box::new(response.curvature(combination, time)?),
    })
}

/// The values of a field at places of the caller, all of them or none.
///
/// # Safety
/// `x_m` is NULL or points to `count` numbers, `values_out` is NULL or has room for as many.
pub(crate) unsafe fn write_values<F: Deref<Target = dyn PlainField>>(
    field: impl FnOnce() -> Result<F, Fault>,
    side: i32,
    x_m: *const f64,
    count: i32,
    values_out: *mut f64,
) -> Result<(), Fault> {
    // SAFETY: by this function's own contract.
    let places = unsafe { handle::list(x_m, count, "x_m")? };
    if places.is_empty() {
        return Err(Fault::count("count", 0, "at least one place"));
    }
    // SAFETY: by this function's own contract.
    let out = unsafe { Slots::new(values_out, places.len(), "values_out")? };
    let side = choice::side(side)?;
    let field = field()?;
    let values: Result<Vec<_>, _> = places.iter().map(|x| field.value(*x, side)).collect();
    out.put(&values?);
    Ok(())
}

/// The values of a line that does not jump, at places of the caller, all of them or none.
///
/// # Safety
/// `x_m` is NULL or points to `count` numbers, `values_m_out` is NULL or has room for as many.
pub(crate) unsafe fn write_line(
    field: Box<dyn PlainField>,
    x_m: *const f64,
    count: i32,
    values_m_out: *mut f64,
) -> Result<(), Fault> {
    // SAFETY: by this function's own contract.
    unsafe { write_values(|| Ok(field), BC_SIDE_RIGHT, x_m, count, values_m_out) }
}

/// An extreme of a line of deflections and its place.
///
/// # Safety
/// Each place for a result is NULL or may be written to.
pub(crate) unsafe fn write_extreme(
    field: &dyn PlainField,
    extreme: i32,
    value_m_out: *mut f64,
    at_m_out: *mut f64,
) -> Result<(), Fault> {
    // SAFETY: by this function's own contract.
    let (value_out, at_out) = unsafe {
        (
            Slot::new(value_m_out, "value_m_out")?,
            Slot::new(at_m_out, "at_m_out")?,
        )
    };
    let (value, at) = field.extreme(choice::extreme(extreme)?);
    value_out.put(value);
    at_out.put(at);
    Ok(())
}

/// An extreme (BC_EXTREME_...) of a field (BC_FIELD_...) and its place, found from the roots of
/// the field; the leftmost of equals. The value is in the SI unit of the field.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_extreme(
    response: *const BcResponse,
    field: i32,
    combination: *const c_char,
    time: i32,
    extreme: i32,
    value_out: *mut f64,
    at_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (response, combination, value_out, at_out) = unsafe {
            (
                handle::shared(response, "response")?,
                text::read(combination, "combination")?,
                Slot::new(value_out, "value_out")?,
                Slot::new(at_m_out, "at_m_out")?,
            )
        };
        let extreme = choice::extreme(extreme)?;
        let (value, at) = self::field(&response.0, field, combination, time)?.extreme(extreme);
        value_out.put(value);
        at_out.put(at);
        Ok(())
    })
}

/// The values of a field at count places, in the SI unit of the field. A shear force jumps at a
/// point load or support: side (BC_SIDE_...) says which of the two values is meant. x_m and
/// values_out may be the same list.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_values(
    response: *const BcResponse,
    field: i32,
    combination: *const c_char,
    time: i32,
    side: i32,
    x_m: *const f64,
    count: i32,
    values_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (response, combination) = unsafe {
            (
                handle::shared(response, "response")?,
                text::read(combination, "combination")?,
            )
        };
        let field = || self::field(&response.0, field, combination, time);
        // SAFETY: the caller keeps the header's contract for these pointers.
        unsafe { write_values(field, side, x_m, count, values_out) }
    })
}

/// The number of stations: the ends of the member, supports, point loads and ends of line loads.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_station_count(
    response: *const BcResponse,
    count_out: *mut i32,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (response, out) = unsafe {
            (
                handle::shared(response, "response")?,
                Slot::new(count_out, "count_out")?,
            )
        };
        out.put(handle::count(stations(&response.0)?.len())?);
        Ok(())
    })
}

/// The place of a station. Stations are counted from 0, from the left.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_station(
    response: *const BcResponse,
    index: i32,
    at_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (response, out) = unsafe {
            (
                handle::shared(response, "response")?,
                Slot::new(at_m_out, "at_m_out")?,
            )
        };
        out.put(*handle::element(&stations(&response.0)?, index)?);
        Ok(())
    })
}

/// The stations, which all fields of a response share.
fn stations(response: &Response) -> Result<Vec<f64>, Fault> {
    let first = handle::element(response.member().combinations(), 0)?;
    let field = response.deflection(first.name(), beamcore::time::Time::Initial)?;
    Ok(PlainField::stations(&field))
}

/// The reaction of a support: force positive upward, couple positive clockwise with x to the right
/// and z up (zero unless the support holds the rotation).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_reaction(
    response: *const BcResponse,
    combination: *const c_char,
    time: i32,
    support: *const c_char,
    force_N_out: *mut f64,
    couple_Nm_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (response, combination, support, force_out, couple_out) = unsafe {
            (
                handle::shared(response, "response")?,
                text::read(combination, "combination")?,
                text::read(support, "support")?,
                Slot::new(force_N_out, "force_N_out")?,
                Slot::new(couple_Nm_out, "couple_Nm_out")?,
            )
        };
        let time = choice::time(time)?;
        let reaction = response.0.reaction(combination, time, support)?;
        force_out.put(reaction.force.si());
        couple_out.put(reaction.couple.si());
        Ok(())
    })
}

/// What is left of equilibrium and continuity in the solution, relative to its greatest terms.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_residual(
    response: *const BcResponse,
    residual_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (response, out) = unsafe {
            (
                handle::shared(response, "response")?,
                Slot::new(residual_out, "residual_out")?,
            )
        };
        out.put(response.0.residual());
        Ok(())
    })
}

/// Frees a response; NULL is allowed.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_free(response: *mut BcResponse) {
    // SAFETY: the caller keeps the header's contract for this pointer.
    guard::free(|| unsafe { handle::free(response) });
}
