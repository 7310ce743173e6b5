//! The components of a deflection after EN 1990, and limits on them.

mod component;
mod limit;

pub use component::Component;
pub use limit::{Allowed, Limit, LimitCheck};
