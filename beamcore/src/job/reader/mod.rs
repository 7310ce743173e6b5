//! The strict reader: text to a tree with lines, and the tree against the schema of the job.

mod choice;
mod depth;
mod nearest;
mod shape;
#[cfg(test)]
mod shelf;
mod source;
mod steps;
mod strict;
mod tree;
mod tree_json;
mod tree_toml;
mod words;

pub(crate) use steps::{Step, steps};
pub(super) use strict::check;
pub use tree::Format;
pub(super) use tree::{Node, NodeValue, describe, line_of, read};
