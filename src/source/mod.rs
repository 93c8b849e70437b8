//! Files of source text, places in them, and the conversion between bytes and lines.

mod file;
mod span;

pub use file::{Location, SourceFile, Sources};
pub use span::{FileId, Span};
