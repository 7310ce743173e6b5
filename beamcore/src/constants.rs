//! Constants of nature and of convention.

/// Standard acceleration of free fall in m/s2, exact by definition (3rd CGPM, 1901).
pub const GRAVITY: f64 = 9.80665;
