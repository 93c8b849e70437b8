//! Text to syntax tree: parsing never fails, and what is broken stays in the tree as a node.

mod tree;

pub use tree::*;
