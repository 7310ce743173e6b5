//! Quantities with their units: one nominal type per meaning, all over one SI number.
//!
//! Quantities of different meaning are different types, even where their dimensions match:
//! a [`Modulus`] is not a [`Stress`], an [`AxialStiffness`] is not a [`Force`]. Products and
//! quotients that make sense have the right type; all others do not compile.
//!
//! A conversion is `x * num / den` with whole numbers `num` and `den`, so that 50 mm is the double
//! nearest to 0.05 m.
//!
//! # Examples
//! ```
//! use beamcore::units::{Length, LineLoad, Moment, Number};
//!
//! let span = 4.2.m();
//! let load = 6.5.kN_per_m();
//! let moment: Moment = load * span * span / 8.0;
//! assert_eq!(moment.to_string(), "14.3325 kN m");
//!
//! let depth: Length = "225 mm".parse()?;
//! assert_eq!(depth, 225.mm());
//! assert_eq!(depth.to_mm(), 225.0);
//!
//! let wrong = "4.2 kN".parse::<Length>().unwrap_err();
//! assert_eq!(
//!     wrong.to_string(),
//!     "length: found \"4.2 kN\", which is a force; expected a length (m, mm, cm, in, ft)"
//! );
//! # Ok::<(), beamcore::Error>(())
//! ```
//!
//! A length is not a force:
//! ```compile_fail,E0308
//! use beamcore::units::{Force, Length, Number};
//! let force: Force = 4.2.m();
//! ```
//!
//! and the two cannot be added:
//! ```compile_fail,E0308
//! use beamcore::units::Number;
//! let sum = 4.2.m() + 6.5.kN();
//! ```

#[macro_use]
mod table;

mod any_quantity;
mod any_unit;
mod dimension;
#[doc(hidden)]
pub mod generate;
mod number;
mod print;
mod products;
mod quantity;
#[cfg(test)]
mod tests;
mod text;
mod unit;

pub use any_quantity::AnyQuantity;
pub use any_unit::AnyUnit;
pub use dimension::Dimension;
pub use number::Number;
pub use quantity::{
    Angle, Area, AreaLoad, AxialStiffness, BendingStiffness, Curvature, Density, Duration,
    FastenerStiffness, FirstMoment, Force, Length, LineLoad, LineMass, Mass, Modulus, Moment,
    Quantity, RotationalStiffness, SecondMoment, ShearFlow, ShearStiffness, SlipModulus,
    SpringStiffness, Strain, Stress, TemperatureChange, ThermalExpansion, table,
};
pub use unit::{TypeRow, Unit};
