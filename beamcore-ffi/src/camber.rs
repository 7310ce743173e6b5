//! Camber: the rise to build in and its ordinates.

use crate::choice;
use crate::choice_member;
use crate::fault::Fault;
use crate::guard;
use crate::handle::{self, Slot};
use crate::response::BcResponse;
use crate::text;
use beamcore::camber::{Camber, CamberPlan};
use beamcore::units::Length;
use std::ffi::c_char;

/// A camber: a rise over a chord between two supports, with its ordinates.
pub struct BcCamber(pub(crate) Camber);

/// The camber of a shape (BC_SHAPE_...) against the deflection of a combination at a time: fraction
/// (1 is all of it) of the deflection over the chord from one support to another, its rise rounded
/// (BC_ROUNDING_...) to whole steps and made zero where it is less than least_m, with ordinates at
/// the ends of equal divisions of the chord.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_camber_new(
    response: *const BcResponse,
    shape: i32,
    combination: *const c_char,
    time: i32,
    fraction: f64,
    from_support: *const c_char,
    to_support: *const c_char,
    step_m: f64,
    rounding: i32,
    least_m: f64,
    divisions: i32,
    camber_out: *mut *mut BcCamber,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (response, combination, from, to, out) = unsafe {
            (
                handle::shared(response, "response")?,
                text::read(combination, "combination")?,
                text::read(from_support, "from_support")?,
                text::read(to_support, "to_support")?,
                Slot::new(camber_out, "camber_out")?,
            )
        };
        let divisions = u32::try_from(divisions)
            .map_err(|_| Fault::count("divisions", i64::from(divisions), "a count above zero"))?;
        let plan = CamberPlan {
            shape: choice_member::shape(shape)?,
            combination: combination.to_owned(),
            time: choice::time(time)?,
            fraction,
            from: from.to_owned(),
            to: to.to_owned(),
            step: Length::from_m(step_m),
            rounding: choice::rounding(rounding)?,
            least: Length::from_m(least_m),
            divisions,
        };
        out.give(BcCamber(response.0.camber(&plan)?));
        Ok(())
    })
}

/// The shape (BC_SHAPE_...) of a camber.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_camber_shape(camber: *const BcCamber, shape_out: *mut i32) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (camber, out) = unsafe {
            (
                handle::shared(camber, "camber")?,
                Slot::new(shape_out, "shape_out")?,
            )
        };
        out.put(choice_member::shape_number(camber.0.shape()));
        Ok(())
    })
}

/// The radius of an arc, negative where it hangs. For other shapes and for no rise, has_value_out
/// is 0 and the radius is left as it is.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_camber_radius(
    camber: *const BcCamber,
    has_value_out: *mut i32,
    radius_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (camber, has_out, out) = unsafe {
            (
                handle::shared(camber, "camber")?,
                Slot::new(has_value_out, "has_value_out")?,
                Slot::new(radius_m_out, "radius_m_out")?,
            )
        };
        let radius = camber.0.radius();
        has_out.put(i32::from(radius.is_some()));
        if let Some(radius) = radius {
            out.put(radius.si());
        }
        Ok(())
    })
}

/// The rise before rounding: of the deflection at the middle of the chord, or of the best arc.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_camber_target(camber: *const BcCamber, target_m_out: *mut f64) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (camber, out) = unsafe {
            (
                handle::shared(camber, "camber")?,
                Slot::new(target_m_out, "target_m_out")?,
            )
        };
        out.put(camber.0.target().si());
        Ok(())
    })
}

/// The rise at the middle of the chord, rounded; positive upward; zero where it would be less than
/// the least worth building.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_camber_rise(camber: *const BcCamber, rise_m_out: *mut f64) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (camber, out) = unsafe {
            (
                handle::shared(camber, "camber")?,
                Slot::new(rise_m_out, "rise_m_out")?,
            )
        };
        out.put(camber.0.rise().si());
        Ok(())
    })
}

/// The places of the chord's ends, from the left end of the member.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_camber_chord(
    camber: *const BcCamber,
    from_m_out: *mut f64,
    to_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (camber, from_out, to_out) = unsafe {
            (
                handle::shared(camber, "camber")?,
                Slot::new(from_m_out, "from_m_out")?,
                Slot::new(to_m_out, "to_m_out")?,
            )
        };
        let (from, to) = camber.0.chord();
        from_out.put(from.si());
        to_out.put(to.si());
        Ok(())
    })
}

/// The number of ordinates, one more than the divisions.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_camber_ordinate_count(
    camber: *const BcCamber,
    count_out: *mut i32,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (camber, out) = unsafe {
            (
                handle::shared(camber, "camber")?,
                Slot::new(count_out, "count_out")?,
            )
        };
        out.put(handle::count(camber.0.ordinates().len())?);
        Ok(())
    })
}

/// An ordinate: its distance from the left end of the chord and the height above the chord,
/// positive upward. Ordinates are counted from 0, from the left.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_camber_ordinate(
    camber: *const BcCamber,
    index: i32,
    station_m_out: *mut f64,
    ordinate_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (camber, station_out, ordinate_out) = unsafe {
            (
                handle::shared(camber, "camber")?,
                Slot::new(station_m_out, "station_m_out")?,
                Slot::new(ordinate_m_out, "ordinate_m_out")?,
            )
        };
        let ordinate = handle::element(camber.0.ordinates(), index)?;
        station_out.put(ordinate.station.si());
        ordinate_out.put(ordinate.ordinate.si());
        Ok(())
    })
}

/// The height above the chord at a place of the member, positive upward.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_camber_ordinate_at(
    camber: *const BcCamber,
    at_m: f64,
    ordinate_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (camber, out) = unsafe {
            (
                handle::shared(camber, "camber")?,
                Slot::new(ordinate_m_out, "ordinate_m_out")?,
            )
        };
        out.put(camber.0.ordinate(Length::from_m(at_m))?.si());
        Ok(())
    })
}

/// Frees a camber; NULL is allowed.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_camber_free(camber: *mut BcCamber) {
    // SAFETY: the caller keeps the header's contract for this pointer.
    guard::free(|| unsafe { handle::free(camber) });
}
