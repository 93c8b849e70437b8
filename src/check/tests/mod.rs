//! Sources in, diagnostics and models out.

use super::{ReadError, Reader, compile};
use crate::check::Compiled;

mod asked;
mod blocks;
mod bounds;
mod engines;
mod examples;
mod missions;
mod model;
mod mutations;
mod names;
mod orders;
mod values;

/// Files held in memory.
struct Files<'a>(&'a [(&'a str, &'a str)]);

impl Reader for Files<'_> {
    fn read(&self, path: &str) -> Result<Vec<u8>, ReadError> {
        let found = self.0.iter().find(|(name, _)| *name == path);
        found.map(|(_, text)| text.as_bytes().to_vec()).ok_or(ReadError::Missing)
    }
}

fn compile_text(text: &str) -> Compiled {
    compile("example.wright", &Files(&[("example.wright", text)]))
}

/// The codes of all diagnostics, in order.
fn codes(compiled: &Compiled) -> Vec<&'static str> {
    compiled.diagnostics.iter().map(|diagnostic| diagnostic.code.name).collect()
}
