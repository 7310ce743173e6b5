//! The one boundary-value solver for every member, in plain SI numbers.
//!
//! The equations are kept in the mixed first-order form y' = A y + b, where y holds displacements
//! and forces together and A holds flexibilities (see [`states`] and [`law`]). A member is a chain
//! of pieces between stations. Each piece gives a relation between the states at its two ends
//! ([`prismatic`] exactly, [`varying`] by collocation), each station its conditions ([`station`]);
//! a sweep along the chain ([`sweep`]) eliminates them with row and column pivots and serves any
//! number of load cases.

pub(crate) mod beam;
mod directions;
mod fields;
pub(crate) mod gauss;
mod last;
pub(crate) mod law;
mod link;
pub(crate) mod load;
pub(crate) mod mechanism;
mod mode;
pub(crate) mod modes;
pub(crate) mod piece;
mod prismatic;
mod prismatic_fields;
mod relation;
mod residual;
mod scaling;
pub(crate) mod states;
pub(crate) mod station;
mod sweep;
#[cfg(test)]
mod tests;
pub(crate) mod varying;
