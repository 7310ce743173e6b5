//! The only place where transcendental functions and root finding live.
//!
//! The standard library's `exp`, `powf` and their like are the system's, and their last bits change
//! with it. These are computed by one portable implementation, so that one build gives the same
//! bits everywhere.

pub(crate) mod curve;
pub(crate) mod eigen;
pub(crate) mod polynomial;

/// e to the power `x`.
pub(crate) fn exp(x: f64) -> f64 {
    libm::exp(x)
}

/// `base` to the power `exponent`.
pub(crate) fn pow(base: f64, exponent: f64) -> f64 {
    libm::pow(base, exponent)
}

/// The angle of the point (x, y), from -pi to pi.
pub(crate) fn atan2(y: f64, x: f64) -> f64 {
    libm::atan2(y, x)
}

/// The sine of an angle in radians.
pub(crate) fn sin(x: f64) -> f64 {
    libm::sin(x)
}

/// The cosine of an angle in radians.
pub(crate) fn cos(x: f64) -> f64 {
    libm::cos(x)
}

/// The cube root.
pub(crate) fn cbrt(x: f64) -> f64 {
    libm::cbrt(x)
}
