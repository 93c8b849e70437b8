//! The pairs of the grammar to the nodes of the tree.
//!
//! Contract of the functions here: each takes the pair of its rule, or the parts of one. `None`
//! means that the pair has not the shape that the grammar gives it, which does not happen; it
//! becomes a broken node instead of a panic.

mod block;
mod expression;
mod flight;
mod item;
mod parts;
mod recover;
mod setting;
mod statement;
mod word;

use crate::diagnostics::Diagnostic;
use crate::source::{FileId, Span};

use super::rules::Pair;

/// What the builder knows about the file, and what it has to say about it.
pub(super) struct Builder<'t> {
    file: FileId,
    /// The text as the author wrote it.
    text: &'t str,
    /// The text as the grammar sees it: of the same length, with comments blanked.
    read: &'t str,
    pub(super) diagnostics: Vec<Diagnostic>,
    /// The item before was a fact outside every block.
    misplaced: bool,
}

/// The most diagnostics that the grammar gives for one file; the tree keeps every broken piece.
const DIAGNOSTIC_LIMIT: usize = 1000;

impl<'t> Builder<'t> {
    pub(super) fn new(file: FileId, text: &'t str, read: &'t str) -> Self {
        Builder { file, text, read, diagnostics: Vec::new(), misplaced: false }
    }

    /// The place of a pair, without the blanks that the rule may have swallowed at its end.
    fn span(&self, pair: &Pair<'_>) -> Span {
        let span = pair.as_span();
        Span::new(self.file, span.start(), span.start() + span.as_str().trim_end().len())
    }

    /// Adds a diagnostic; past the limit it is not even made.
    fn report(&mut self, diagnostic: impl FnOnce() -> Diagnostic) {
        if self.diagnostics.len() < DIAGNOSTIC_LIMIT {
            self.diagnostics.push(diagnostic());
        }
    }
}
