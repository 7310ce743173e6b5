//! Laws that hold for every member whose layers slip, tried on random ones.

mod cutting;
mod drawn;
mod limits;
mod lines;
mod mirror;
mod sine;
mod statics;
mod work;
