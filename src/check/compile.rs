//! From the entry file to the model.

use std::collections::{BTreeMap, BTreeSet};

use super::changed::Changes;
use super::files::{self, Reader};
use super::{BlockId, Context};
use crate::diagnostics::{Diagnostic, Severity};
use crate::model::{FORMAT, FactId, Mission, Model};
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
    links: BTreeMap<Span, FileId>,
    addresses: BTreeMap<(BlockId, String), FactId>,
}

/// Reads, parses and checks `entry` (a path from the project's folder) and all that it brings.
pub fn compile(entry: &str, reader: &dyn Reader) -> Compiled {
    let files::Project { sources, trees, links, diagnostics: parsing } = files::load(entry, reader);
    let mut checked = check(&sources, &trees, &links, Changes::default());
    checked.diagnostics.extend(parsing);
    let diagnostics = in_order(checked.diagnostics);
    let model = checked.model.filter(|_| sound(&diagnostics));
    Compiled { sources, trees, model, diagnostics, links, addresses: checked.addresses }
}

impl Compiled {
    /// The model with other values, in SI, for some of its facts; whatever is worked out from them
    /// changes with them. The numbers of all facts stay the same.
    ///
    /// # Errors
    /// What is wrong with these values, such as a mass below zero.
    pub fn with(&self, facts: &BTreeMap<FactId, f64>) -> Result<Model, Vec<Diagnostic>> {
        let changes = Changes::new(facts, &self.addresses);
        let checked = check(&self.sources, &self.trees, &self.links, changes);
        checked.model.ok_or_else(|| in_order(checked.diagnostics))
    }
}

struct Checked {
    model: Option<Model>,
    diagnostics: Vec<Diagnostic>,
    addresses: BTreeMap<(BlockId, String), FactId>,
}

fn check(sources: &Sources, trees: &[Tree], links: &BTreeMap<Span, FileId>, changes: Changes) -> Checked {
    let mut context = Context::new(sources, links, changes);
    context.collect_names(trees);
    context.read_units();
    context.check_blocks();
    let missions = context.check_missions();
    let Context { facts, diagnostics, addresses, .. } = context;
    let model = sound(&diagnostics).then(|| Model { format: FORMAT.to_string(), missions, facts });
    Checked { model, diagnostics, addresses }
}

fn sound(diagnostics: &[Diagnostic]) -> bool {
    diagnostics.iter().all(|diagnostic| diagnostic.severity() != Severity::Error)
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
        let mut missions = Vec::new();
        for block in self.blocks() {
            let definition = self.definition(block).block;
            if definition.kind == BlockKind::Mission && definition.name.span.file == FileId(0) {
                missions.extend(self.mission(block));
            }
        }
        missions
    }

    fn blocks(&self) -> Vec<BlockId> {
        (0..self.definitions.len() as u32).map(BlockId).collect()
    }
}
