//! The one way through which every function of the ABI runs.

use crate::error;
use crate::fault::Fault;
use crate::status::BC_OK;
use std::panic::{AssertUnwindSafe, catch_unwind};

/// Runs a body; a fault becomes the last error of the thread and its status is returned.
pub(crate) fn status(body: impl FnOnce() -> Result<(), Fault>) -> i32 {
    match caught(body) {
        Ok(()) => BC_OK,
        Err(fault) => {
            let status = fault.status;
            error::remember(fault);
            status
        }
    }
}

/// Runs a body that reads the last error: a fault of its own leaves that error as it is.
pub(crate) fn reading_status(body: impl FnOnce() -> Result<(), Fault>) -> i32 {
    match caught(body) {
        Ok(()) => BC_OK,
        Err(fault) => fault.status,
    }
}

/// Runs a body that gives a number; a fault becomes the last error of the thread, beside NaN.
pub(crate) fn number(body: impl FnOnce() -> Result<f64, Fault>) -> f64 {
    caught(body).unwrap_or_else(|fault| {
        error::remember(fault);
        f64::NAN
    })
}

/// Frees a handle; there is nobody to tell of a fault.
pub(crate) fn free(body: impl FnOnce()) {
    status(|| {
        body();
        Ok(())
    });
}

fn caught<T>(body: impl FnOnce() -> Result<T, Fault>) -> Result<T, Fault> {
    // Handles are immutable and results are written last, so no panic leaves a half-made state.
    catch_unwind(AssertUnwindSafe(body)).unwrap_or_else(|payload| Err(Fault::panic(&*payload)))
}

#[cfg(test)]
mod tests {
    use super::*;
    use crate::status::BC_ERROR_PANIC;

    #[test]
    fn a_panic_becomes_a_status_and_its_message_is_kept() {
        assert_eq!(status(|| panic!("the beam broke")), BC_ERROR_PANIC);
        let text = error::last(|fault| fault.map(|fault| fault.text.clone()));
        assert!(text.unwrap().contains("the beam broke"));
        assert!(number(|| panic!("{}", "again")).is_nan());
        let text = error::last(|fault| fault.map(|fault| fault.text.clone()));
        assert!(text.unwrap().contains("again"));
    }
}
