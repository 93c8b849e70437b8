//! Tests of the parser.

mod accepted;
mod codes;
mod example;
mod expressions;
mod recovery;
mod rejected;
mod spans;
mod statements;
mod text;
mod totality;
mod vocabulary;

use super::{Parsed, parse};
use crate::source::FileId;

/// Parses a text as the only file.
fn read(text: &str) -> Parsed {
    parse(FileId(0), text)
}

/// The codes of all diagnostics, in order.
fn codes(parsed: &Parsed) -> Vec<&'static str> {
    parsed.diagnostics.iter().map(|diagnostic| diagnostic.code.name).collect()
}
