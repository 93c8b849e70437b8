//! From text to tree: line reader, grammar, builder.

use pest::Parser;

use super::build::Builder;
use super::lines;
use super::rules::{Grammar, Rule};
use super::{Item, Tree};
use crate::diagnostics::Diagnostic;
use crate::diagnostics::codes::{file_too_large, nesting_limit};
use crate::source::{FileId, Span};

/// The largest file in bytes.
pub(super) const SIZE_LIMIT: usize = 4 << 20;

/// A tree, always, and what is wrong with the text, in its order.
#[derive(Clone, Debug)]
pub struct Parsed {
    pub tree: Tree,
    pub diagnostics: Vec<Diagnostic>,
}

/// Reads one file. Any text gives a tree, in time linear in its length; what is wrong with it is
/// told for each broken line once, a thousand times at most.
pub fn parse(file: FileId, text: &str) -> Parsed {
    if text.len() > SIZE_LIMIT {
        let diagnostics = vec![file_too_large::found(Span::new(file, 0, 0), text.len(), SIZE_LIMIT)];
        return Parsed {
            tree: Tree { items: vec![Item::Broken(Span::new(file, 0, 0))], ..Tree::default() },
            diagnostics,
        };
    }
    let read = lines::read(file, text);
    let mut builder = Builder::new(file, text, &read.text);
    let items = match Grammar::parse(Rule::file, &read.text) {
        Ok(pairs) => builder.file(pairs),
        // The rule `file` takes any text; only a thread with next to no stack gets here.
        Err(_) => {
            let whole = Span::new(file, 0, text.len());
            builder.diagnostics.push(nesting_limit::without_stack(whole));
            vec![Item::Broken(whole)]
        }
    };
    let mut diagnostics = read.diagnostics;
    diagnostics.append(&mut builder.diagnostics);
    diagnostics.sort_by_key(Diagnostic::span);
    Parsed { tree: Tree { items, comments: read.comments }, diagnostics }
}
