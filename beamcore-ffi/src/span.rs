//! The spans of a member and their deflections.

use crate::camber::BcCamber;
use crate::choice;
use crate::choice_member;
use crate::fault::Fault;
use crate::guard;
use crate::handle::{self, Slot};
use crate::member::BcMember;
use crate::response::{BcResponse, PlainField, write_extreme, write_line};
use crate::text::{self, TextOut};
use beamcore::camber::Camber;
use beamcore::member::Span;
use beamcore::response::Response;
use std::ffi::c_char;

/// The number of spans of a member: between neighbouring supports, and the overhangs.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_span_count(member: *const BcMember, count_out: *mut i32) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (member, out) = unsafe {
            (
                handle::shared(member, "member")?,
                Slot::new(count_out, "count_out")?,
            )
        };
        out.put(handle::count(member.0.spans().len())?);
        Ok(())
    })
}

/// The name of a span, by which results are addressed: "A to B" between the supports A and B,
/// "before A" and "beyond B" for overhangs. Spans are counted from 0, from the left.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_span_name(
    member: *const BcMember,
    index: i32,
    buffer: *mut c_char,
    capacity: i64,
    length_out: *mut i64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (member, out) = unsafe {
            (
                handle::shared(member, "member")?,
                TextOut::new(buffer, capacity, length_out)?,
            )
        };
        let spans: &[Span] = member.0.spans();
        out.put(handle::element(spans, index)?.name())
    })
}

/// The ends of a span from the left end of the member, and whether one of them is free (1) or both
/// are supported (0).
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_member_span(
    member: *const BcMember,
    span: *const c_char,
    from_m_out: *mut f64,
    to_m_out: *mut f64,
    is_cantilever_out: *mut i32,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (member, span, from_out, to_out, cantilever_out) = unsafe {
            (
                handle::shared(member, "member")?,
                text::read(span, "span")?,
                Slot::new(from_m_out, "from_m_out")?,
                Slot::new(to_m_out, "to_m_out")?,
                Slot::new(is_cantilever_out, "is_cantilever_out")?,
            )
        };
        let span = member.0.span(span)?;
        from_out.put(span.from().si());
        to_out.put(span.to().si());
        cantilever_out.put(i32::from(span.is_cantilever()));
        Ok(())
    })
}

/// The deflection of a span as the parameters of the ABI name it.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn span_deflection(
    response: *const BcResponse,
    combination: *const c_char,
    time: i32,
    span: *const c_char,
) -> Result<Box<dyn PlainField>, Fault> {
    // SAFETY: by this function's own contract.
    let (response, combination, span) = unsafe {
        (
            handle::shared(response, "response")?,
            text::read(combination, "combination")?,
            text::read(span, "span")?,
        )
    };
    let time = choice::time(time)?;
    Ok(Box::new(response.0.span_deflection(
        combination,
        time,
        span,
    )?))
}

/// An extreme (BC_EXTREME_...) of the deflection of one span, positive downward, and its place:
/// between two supports from the chord through them, of an overhang from its support.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_span_extreme(
    response: *const BcResponse,
    combination: *const c_char,
    time: i32,
    span: *const c_char,
    extreme: i32,
    value_m_out: *mut f64,
    at_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        unsafe {
            let field = span_deflection(response, combination, time, span)?;
            write_extreme(&*field, extreme, value_m_out, at_m_out)
        }
    })
}

/// The deflections of one span at count places, from the left end of the member.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_span_values(
    response: *const BcResponse,
    combination: *const c_char,
    time: i32,
    span: *const c_char,
    x_m: *const f64,
    count: i32,
    values_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        unsafe {
            let field = span_deflection(response, combination, time, span)?;
            write_line(field, x_m, count, values_m_out)
        }
    })
}

/// A component of the deflection of a span as the parameters of the ABI name it.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn component_line(
    response: *const BcResponse,
    component: i32,
    combination: *const c_char,
    span: *const c_char,
    camber: *const BcCamber,
) -> Result<Box<dyn PlainField>, Fault> {
    // SAFETY: by this function's own contract.
    let (response, combination, span, camber) = unsafe {
        (
            handle::shared(response, "response")?,
            text::read(combination, "combination")?,
            text::read(span, "span")?,
            camber.as_ref(),
        )
    };
    let component = choice_member::component(component)?;
    let (response, camber): (&Response, Option<&Camber>) =
        (&response.0, camber.map(|camber| &camber.0));
    Ok(Box::new(response.deflection_component(
        component,
        combination,
        span,
        camber,
    )?))
}

/// An extreme (BC_EXTREME_...) of a component (BC_COMPONENT_...) of the deflection of a span and
/// its place, under a characteristic combination or one of one's own; the camber counts for
/// BC_COMPONENT_REMAINING, and is NULL where there is none.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_component_extreme(
    response: *const BcResponse,
    component: i32,
    combination: *const c_char,
    span: *const c_char,
    camber: *const BcCamber,
    extreme: i32,
    value_m_out: *mut f64,
    at_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        unsafe {
            let field = component_line(response, component, combination, span, camber)?;
            write_extreme(&*field, extreme, value_m_out, at_m_out)
        }
    })
}

/// The values of a component of the deflection of a span at count places, from the left end of the
/// member; parameters as for bc_response_component_extreme.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_component_values(
    response: *const BcResponse,
    component: i32,
    combination: *const c_char,
    span: *const c_char,
    camber: *const BcCamber,
    x_m: *const f64,
    count: i32,
    values_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        unsafe {
            let field = component_line(response, component, combination, span, camber)?;
            write_line(field, x_m, count, values_m_out)
        }
    })
}
