//! The C ABI of `beamcore`.
//!
//! This crate converts and forwards; it holds no formula, default or error text of the domain.
//! The contract for the caller (status, ownership, threads, text buffers, units, signs, panics)
//! stands once, in the head of `include/beamcore.h`, which is generated from this source.

#![deny(unsafe_op_in_unsafe_fn, clippy::undocumented_unsafe_blocks)]
#![allow(
    clippy::missing_safety_doc,
    reason = "the contract of all functions stands once, in the head of the header"
)]
#![allow(non_snake_case, reason = "parameters bear the symbols of their units")]

// What every function is made with.
mod fault;
mod get;
mod guard;
mod handle;
mod text;

// The functions, in the order in which they stand in the header.
pub mod version;

pub mod status;

pub mod error;

pub mod choice;

pub mod choice_member;

pub mod choice_section;

pub mod choice_layers;

pub mod material;

pub mod material_given;

pub mod material_strength;

pub mod material_values;

pub mod outline;

pub mod polygon;

pub mod part;

pub mod part_place;

pub mod section;

pub mod layer;

pub mod joint;

pub mod joint_given;

pub mod layered;

pub mod placed_joint;

pub mod plane;

pub mod strain;

pub mod transformed;

pub mod transformed_outline;

pub mod category;

pub mod action;

pub mod action_time;

pub mod action_along;

pub mod action_imposed;

pub mod support;

pub mod support_given;

pub mod plan;

pub mod plan_shape;

pub mod member;

pub mod member_shape;

pub mod member_layers;

pub mod combination;

pub mod response;

pub mod field;

pub mod composite;

pub mod member_anchor;

pub mod stress;

pub mod sideways;

pub mod span;

pub mod camber;

pub mod reading;

pub mod limit;

pub mod limit_check;

pub mod simplified;

pub mod simplified_forces;

pub mod spacing;

pub mod comparison;

pub mod comparison_layers;

pub mod job;

pub mod outcome;

pub mod plain;

pub mod plain_concrete;

/// Handles may be used by several threads at once: a type of the core that could not be shared
/// does not compile here.
const _: () = {
    const fn shared_between_threads<T: Send + Sync>() {}
    shared_between_threads::<(material::BcMaterial, part::BcPart, section::BcSection)>();
    shared_between_threads::<(outline::BcOutline, layer::BcLayer, joint::BcJoint)>();
    shared_between_threads::<(action::BcAction, member::BcMember, response::BcResponse)>();
    shared_between_threads::<(plan::BcPlan, support::BcSupport, reading::BcReadings)>();
    shared_between_threads::<(
        field::BcField,
        simplified::BcLayerInput,
        simplified::BcSimplified,
    )>();
    shared_between_threads::<(limit::BcLimit, limit_check::BcChecks)>();
    shared_between_threads::<(camber::BcCamber, job::BcJob, outcome::BcOutcome)>();
};
