//! Text to syntax tree: parsing never fails, and what is broken stays in the tree as a node.

mod build;
mod decode;
mod lines;
mod look;
mod parse;
mod rules;
mod token;
mod tree;
mod words;

pub use decode::{NotUtf8, decode};
pub use parse::{Parsed, parse};
pub use rules::is_keyword;
pub use tree::*;

#[cfg(test)]
mod tests;
