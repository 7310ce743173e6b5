//! One calculation core for beams of more than one material.
//!
//! Data flows one way: [`units`] and errors, then [`material`]s and outlines make [`section`]s of
//! layers; sections, supports and actions make [`member`]s; a member is solved to a [`response`],
//! from which follow [`stress`] and [`camber`]. A `job` document holds all inputs, an `outcome`
//! document all results. [`simplified`] holds hand methods for layers that slip.
//!
//! Signs: x runs left to right, z up; a section is drawn as seen against x, with y to the right.
//! Deflection and loads are positive downward, slope is dw/dx, V = dM/dx, a positive (sagging)
//! moment stretches the bottom, tension is positive.
//!
//! ```
//! use beamcore::material::{ServiceClass, steel, timber};
//! use beamcore::member::{Action, Member};
//! use beamcore::section::{Part, Section, rectangle};
//! use beamcore::time::Time;
//! use beamcore::units::Number;
//!
//! let joist = Part::new("joist", rectangle(80.mm(), 220.mm()), timber("C24", ServiceClass::One)?);
//! let plate = Part::new("plate", rectangle(10.mm(), 220.mm()), steel("S275")?).right_of(&joist);
//! let member = Member::simple_span(Section::of([joist, plate])?, 4.2.m())
//!     .action(Action::permanent("wall").uniform(5.0.kN_per_m()))
//!     .check()?;
//! let peak = member.solve().deflection("quasi-permanent", Time::Final)?.greatest();
//! assert_eq!(format!("{:.1} mm at {:.2} m", peak.value.to_mm(), peak.at.to_m()), "8.6 mm at 2.10 m");
//! # Ok::<(), beamcore::Error>(())
//! ```

#![forbid(unsafe_code)]

pub mod camber;
mod check;
pub mod choice;
pub mod constants;
mod error;
pub mod field;
#[cfg(feature = "document")]
pub mod job;
pub mod limits;
mod lookup;
pub mod material;
mod math;
pub mod member;
#[cfg(feature = "document")]
pub mod outcome;
pub mod outline;
mod path;
pub mod plain;
pub mod response;
pub mod section;
pub mod simplified;
mod solve;
pub mod stress;
pub mod time;
pub mod units;

/// The version of this library.
pub const VERSION: &str = env!("CARGO_PKG_VERSION");

pub use error::{Error, ErrorKind, Problem, Result};
