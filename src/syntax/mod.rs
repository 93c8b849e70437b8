//! Text to syntax tree: parsing never fails, and what is broken stays in the tree as a node.

mod build;
mod lines;
mod parse;
mod rules;
mod tree;

pub use parse::{Parsed, parse};
pub use tree::*;

#[cfg(test)]
mod tests;
