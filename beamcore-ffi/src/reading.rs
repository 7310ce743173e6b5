//! What remains after a camber, and the readings to expect in the shop.

use crate::camber::BcCamber;
use crate::choice;
use crate::fault::Fault;
use crate::guard;
use crate::handle::{self, Slot};
use crate::response::{BcResponse, PlainField, write_extreme, write_line};
use crate::text;
use beamcore::camber::{Reading, Trestles};
use beamcore::units::Length;
use std::ffi::c_char;

/// Readings: what a tape shows at the stations of a camber when the member is measured.
pub struct BcReadings(Vec<Reading>);

/// The line that remains after a camber as the parameters of the ABI name it.
///
/// # Safety
/// As for the functions of the ABI.
unsafe fn remaining(
    response: *const BcResponse,
    combination: *const c_char,
    time: i32,
    camber: *const BcCamber,
) -> Result<Box<dyn PlainField>, Fault> {
    // SAFETY: by this function's own contract.
    let (response, combination, camber) = unsafe {
        (
            handle::shared(response, "response")?,
            text::read(combination, "combination")?,
            handle::shared(camber, "camber")?,
        )
    };
    let time = choice::time(time)?;
    Ok(Box::new(response.0.remaining(
        combination,
        time,
        &camber.0,
    )?))
}

/// An extreme (BC_EXTREME_...) of the line that remains after a camber and its place: deflection
/// less camber, positive below the straight line.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_remaining_extreme(
    response: *const BcResponse,
    combination: *const c_char,
    time: i32,
    camber: *const BcCamber,
    extreme: i32,
    value_m_out: *mut f64,
    at_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        unsafe {
            let line = remaining(response, combination, time, camber)?;
            write_extreme(&*line, extreme, value_m_out, at_m_out)
        }
    })
}

/// The heights of the line that remains after a camber at count places, positive below the
/// straight line.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_remaining_values(
    response: *const BcResponse,
    combination: *const c_char,
    time: i32,
    camber: *const BcCamber,
    x_m: *const f64,
    count: i32,
    values_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        unsafe {
            let line = remaining(response, combination, time, camber)?;
            write_line(line, x_m, count, values_m_out)
        }
    })
}

/// The readings to expect at the stations of a camber, with the named parts there, lying and
/// standing on two trestles, whose places are given from the left end of the member.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_response_readings(
    response: *const BcResponse,
    camber: *const BcCamber,
    left_trestle_m: f64,
    right_trestle_m: f64,
    part_names: *const *const c_char,
    part_count: i32,
    readings_out: *mut *mut BcReadings,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (response, camber, parts, out) = unsafe {
            (
                handle::shared(response, "response")?,
                handle::shared(camber, "camber")?,
                text::list(part_names, part_count, "part_names")?,
                Slot::new(readings_out, "readings_out")?,
            )
        };
        let trestles = Trestles {
            left: Length::from_m(left_trestle_m),
            right: Length::from_m(right_trestle_m),
            parts,
        };
        out.give(BcReadings(response.0.readings(&camber.0, &trestles)?));
        Ok(())
    })
}

/// The number of readings, one for each ordinate of the camber.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_readings_count(
    readings: *const BcReadings,
    count_out: *mut i32,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (readings, out) = unsafe {
            (
                handle::shared(readings, "readings")?,
                Slot::new(count_out, "count_out")?,
            )
        };
        out.put(handle::count(readings.0.len())?);
        Ok(())
    })
}

/// A reading, from the chord through the ends of the design chord, positive upward: its distance
/// from the left end of the chord, the height with the member lying on its side, and the height
/// with the member standing on the trestles. Readings are counted from 0, from the left.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_readings_reading(
    readings: *const BcReadings,
    index: i32,
    station_m_out: *mut f64,
    lying_m_out: *mut f64,
    standing_m_out: *mut f64,
) -> i32 {
    guard::status(|| {
        // SAFETY: the caller keeps the header's contract for these pointers.
        let (readings, station_out, lying_out, standing_out) = unsafe {
            (
                handle::shared(readings, "readings")?,
                Slot::new(station_m_out, "station_m_out")?,
                Slot::new(lying_m_out, "lying_m_out")?,
                Slot::new(standing_m_out, "standing_m_out")?,
            )
        };
        let reading = handle::element(&readings.0, index)?;
        station_out.put(reading.station.si());
        lying_out.put(reading.lying.si());
        standing_out.put(reading.standing.si());
        Ok(())
    })
}

/// Frees readings; NULL is allowed.
#[unsafe(no_mangle)]
pub unsafe extern "C" fn bc_readings_free(readings: *mut BcReadings) {
    // SAFETY: the caller keeps the header's contract for this pointer.
    guard::free(|| unsafe { handle::free(readings) });
}
