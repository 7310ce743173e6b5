//! The one boundary-value solver for every member, in plain SI numbers.
//!
//! The equations are kept in the mixed first-order form y' = A y + b, where y holds displacements
//! and forces together and A holds flexibilities (see [`state`]). A member is a chain of pieces
//! between stations. Each piece gives a relation between the states at its two ends
//! ([`relation`]), each station its conditions ([`condition`]); a sweep along the chain
//! ([`sweep`]) eliminates them with row and column pivots and serves any number of load cases.

pub(crate) mod beam;
pub(crate) mod condition;
mod last;
mod link;
pub(crate) mod mechanism;
pub(crate) mod polynomial;
pub(crate) mod relation;
pub(crate) mod residual;
pub(crate) mod state;
pub(crate) mod sweep;
#[cfg(test)]
mod tests;
