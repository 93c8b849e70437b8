//! Syntax trees to a checked model: files, names, dimensions, consistency.
//!
//! Nothing here does I/O: a [`Reader`] supplies the bytes of files. All errors of all files are
//! collected; what is broken in the tree has been reported by the parser and is passed over in
//! silence. A model comes out only where there is no error.

#![allow(dead_code)]

mod context;
mod expression;
mod facts;
mod names;
mod want;

pub(crate) use context::Context;
pub(crate) use expression::Typed;
pub(crate) use names::{BlockId, Inherited, ScopeId};
pub(crate) use want::Want;
