//! Points of a drawing, in plain metres.

use std::ops::{Add, Mul, Sub};

/// A point, or the way from one point to another: y to the right, z up, in metres, in a drawing
/// that is seen against the direction of x.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Point {
    /// Coordinate to the right, in m.
    pub y: f64,
    /// Coordinate upward, in m.
    pub z: f64,
}

impl Point {
    /// The point y = 0, z = 0.
    pub const ORIGIN: Self = Self::new(0.0, 0.0);

    /// The point (y, z), in m.
    #[must_use]
    pub const fn new(y: f64, z: f64) -> Self {
        Self { y, z }
    }

    /// `a.y b.y + a.z b.z`.
    pub(super) fn dot(self, other: Self) -> f64 {
        self.y * other.y + self.z * other.z
    }

    /// `a.y b.z - a.z b.y`: positive if the other way turns to the left of this one.
    pub(super) fn cross(self, other: Self) -> f64 {
        self.y * other.z - self.z * other.y
    }

    /// Distance from the origin.
    pub(super) fn norm(self) -> f64 {
        self.dot(self).sqrt()
    }

    /// The same way turned to the right by a quarter turn.
    pub(super) const fn to_the_right(self) -> Self {
        Self::new(self.z, -self.y)
    }

    /// Half way to the other point.
    pub(super) fn middle(self, other: Self) -> Self {
        (self + other) * 0.5
    }

    pub(super) const fn is_finite(self) -> bool {
        self.y.is_finite() && self.z.is_finite()
    }
}

impl Add for Point {
    type Output = Self;
    fn add(self, other: Self) -> Self {
        Self::new(self.y + other.y, self.z + other.z)
    }
}

impl Sub for Point {
    type Output = Self;
    fn sub(self, other: Self) -> Self {
        Self::new(self.y - other.y, self.z - other.z)
    }
}

impl Mul<f64> for Point {
    type Output = Self;
    fn mul(self, factor: f64) -> Self {
        Self::new(self.y * factor, self.z * factor)
    }
}
