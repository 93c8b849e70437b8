//! From text to tree: line reader, grammar, builder.

use pest::Parser;

use super::build::Builder;
use super::lines;
use super::rules::{Grammar, Rule};
use super::{Item, Tree};
use crate::diagnostics::Diagnostic;
use crate::source::{FileId, Span};

/// A tree, always, and what is wrong with the text, in its order.
#[derive(Clone, Debug)]
pub struct Parsed {
    pub tree: Tree,
    pub diagnostics: Vec<Diagnostic>,
}

/// Reads one file. Any text gives a tree, in time linear in its length.
pub fn parse(file: FileId, text: &str) -> Parsed {
    let read = lines::read(file, text);
    let mut builder = Builder::new(file, text, &read.text);
    let items = match Grammar::parse(Rule::file, &read.text) {
        Ok(pairs) => builder.file(pairs),
        // invariant: the rule `file` takes any text, so this arm is for a fault of the grammar alone.
        Err(_) => vec![Item::Broken(Span::new(file, 0, text.len()))],
    };
    let mut diagnostics = read.diagnostics;
    diagnostics.append(&mut builder.diagnostics);
    diagnostics.sort_by_key(|diagnostic| diagnostic.span());
    Parsed { tree: Tree { items, comments: read.comments }, diagnostics }
}
