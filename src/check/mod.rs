//! Syntax trees to a checked model: files, names, dimensions, consistency.
//!
//! Nothing here does I/O: a [`Reader`] supplies the bytes of files. All errors of all files are
//! collected; what is broken in the tree has been reported by the parser and is passed over in
//! silence. A model comes out only where there is no error.

mod blocks;
mod changed;
mod compile;
mod context;
mod curve;
mod dimensions;
mod engine;
mod engine_lines;
mod engine_solve;
mod expression;
mod facts;
mod files;
mod given;
mod lines;
mod mission;
mod names;
mod operators;
mod paths;
mod sheet;
mod stage;
mod table;
mod unit;
mod vehicle;
mod want;
mod world;

pub use compile::{Compiled, compile};
pub use files::{ReadError, Reader};

pub(crate) use blocks::Bound;
pub(crate) use context::Context;
pub(crate) use dimensions::with_article;
pub(crate) use expression::Typed;
pub(crate) use lines::Inherited;
pub(crate) use names::{BlockId, ScopeId};
pub(crate) use sheet::{Key, Stated};
pub(crate) use want::Want;

#[cfg(test)]
mod paths_tests;
#[cfg(test)]
mod tests;
