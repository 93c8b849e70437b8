//! What is said about broken pieces.

use super::Builder;
use super::block::Head;
use crate::diagnostics::codes::{missing_line_break, stray_brace, unclosed_block, unexpected_text};
use crate::source::Span;

impl Builder<'_> {
    pub(super) fn stray_close(&mut self, span: Span) {
        self.diagnostics.push(stray_brace::found(span));
    }

    pub(super) fn missing_break(&mut self, span: Span) {
        self.diagnostics.push(missing_line_break::found(span));
    }

    pub(super) fn unclosed_block(&mut self, open: Span, end: Span) {
        self.diagnostics.push(unclosed_block::found(open, end));
    }

    pub(super) fn broken_item(&mut self, span: Span) {
        self.diagnostics.push(unexpected_text::found(span, "this", "a definition"));
    }

    pub(super) fn broken_line(&mut self, span: Span) {
        self.diagnostics.push(unexpected_text::found(span, "this", "a fact"));
    }

    /// Reports a broken head; gives its kind and name where they can be read.
    pub(super) fn broken_head(&mut self, span: Span) -> Option<Head> {
        self.diagnostics.push(unexpected_text::found(span, "this", "the head of a block"));
        None
    }
}
