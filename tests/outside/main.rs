//! Checks of the member solver against independent programs, handbooks and other theories. The
//! programs stand beside the files of numbers that they wrote.

mod compare;
mod members;
mod plane_stress;
mod published;
mod read;
mod slip;
mod strain;
