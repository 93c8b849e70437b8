//! From the entry file to the model.

use std::collections::BTreeSet;

use super::files::{self, Reader};
use super::{BlockId, Context};
use crate::diagnostics::{Diagnostic, Severity};
use crate::model::{FORMAT, Model};
use crate::source::{Sources, Span};
use crate::syntax::{BlockKind, Tree};

/// All that comes of a source.
#[derive(Debug)]
pub struct Compiled {
    pub sources: Sources,
    /// One for each file of `sources`; empty for a table of points.
    pub trees: Vec<Tree>,
    /// Only where no diagnostic is an error.
    pub model: Option<Model>,
    /// In the order of the files and of their text, the same one once.
    pub diagnostics: Vec<Diagnostic>,
}

/// Reads, parses and checks `entry` (a path from the project's folder) and all that it brings.
pub fn compile(entry: &str, reader: &dyn Reader) -> Compiled {
    let project = files::load(entry, reader);
    let mut context = Context::new(&project.sources, &project.links);
    context.collect_names(&project);
    context.read_units(&project);
    context.check_all();
    let mut diagnostics = context.diagnostics;
    let (missions, facts) = (Vec::new(), context.facts);
    diagnostics.extend(project.diagnostics);
    let diagnostics = in_order(diagnostics);
    let sound = diagnostics.iter().all(|diagnostic| diagnostic.severity() != Severity::Error);
    let model = sound.then(|| Model { format: FORMAT.to_string(), missions, facts });
    Compiled { sources: project.sources, trees: project.trees, model, diagnostics }
}

/// Sorted by place; a definition that is used in several ways may have been reported each time.
fn in_order(mut diagnostics: Vec<Diagnostic>) -> Vec<Diagnostic> {
    diagnostics.sort_by(|a, b| (a.span(), a.code.name, &a.message).cmp(&(b.span(), b.code.name, &b.message)));
    let mut seen: BTreeSet<(Span, &str, String)> = BTreeSet::new();
    diagnostics.retain(|one| seen.insert((one.span(), one.code.name, one.message.clone())));
    diagnostics
}

impl<'a> Context<'a> {
    /// Checks every given and every block of the files, used or not; of the built-in ones those
    /// that are used.
    fn check_all(&mut self) {
        for given in self.file_givens() {
            self.given_value(given);
        }
        for number in 0..self.definitions.len() {
            let block = BlockId(number as u32);
            let definition = self.definition(block);
            let file = self.sources.file(definition.block.name.span.file).name();
            if definition.block.kind != BlockKind::Mission && file != "builtin" {
                self.check_block(block);
            }
        }
    }
}
