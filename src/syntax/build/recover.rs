//! What is said about broken pieces.

use super::Builder;
use super::block::{Head, block_kind};
use crate::diagnostics::codes::{
    misplaced_fact, missing_line_break, stray_brace, unclosed_block, unexpected_text,
};
use crate::diagnostics::nearest;
use crate::source::Span;
use crate::syntax::rules::Rule;
use crate::syntax::{Block, Line, Name, Statement, look, token, words};

impl Builder<'_> {
    /// A `}` outside every block. After misplaced facts it is a consequence of the same mistake, a
    /// block closed too early, and stays without a word.
    pub(super) fn stray_close(&mut self, span: Span) {
        if !std::mem::take(&mut self.misplaced) {
            self.report(|| stray_brace::found(span));
        }
    }

    pub(super) fn missing_break(&mut self, at: Span) {
        let rest = self.read.get(at.range().start..).unwrap_or("");
        let end = at.range().start + token::token(rest).len();
        self.report(|| missing_line_break::found(Span::new(at.file, at.range().start, end)));
    }

    /// A block without its `}`. The brace that is missing is more likely that of a block within,
    /// which then took the brace of this one: the indentation tells.
    pub(super) fn unclosed_block(&mut self, open: Span, end: Span, lines: &[Line]) {
        let taken = lines.iter().find_map(|line| match &line.statement {
            Statement::Block(inner) => self.outdented_brace(inner).map(|brace| (inner, brace)),
            _ => None,
        });
        self.report(|| match taken {
            Some((inner, brace)) => {
                unclosed_block::found_within(Span { end: inner.name.span.end, ..inner.span }, brace)
            }
            None => unclosed_block::found(open, end),
        });
    }

    /// The closing brace of a block, if it stands alone on its line and further left than the block.
    fn outdented_brace(&self, block: &Block) -> Option<Span> {
        let brace = Span { start: block.span.end.checked_sub(1)?, ..block.span };
        let is_outdented = self.indentation(brace)? < self.indentation(block.span)?;
        (self.read.get(brace.range()) == Some("}") && is_outdented).then_some(brace)
    }

    /// How far from the start of its line a place is, if only blanks stand before it.
    fn indentation(&self, place: Span) -> Option<usize> {
        let before = self.read.get(..place.range().start)?;
        let blanks = before.len() - before.trim_end_matches(' ').len();
        before.trim_end_matches(' ').ends_with('\n').then_some(blanks)
    }

    /// Of facts outside every block that follow each other only the first is told.
    pub(super) fn broken_item(&mut self, span: Span) {
        let (file, read) = (self.file, self.read);
        let first = token::first(read, span).unwrap_or("");
        let entry = if words::KINDS.contains(&first) { Rule::lone_head } else { Rule::lone_item };
        let was_misplaced = std::mem::take(&mut self.misplaced);
        let fact = || {
            look::stop(file, read, span, Rule::lone_fact).is_none_or(|stop| stop.at() > span.range().start)
        };
        match look::stop(file, read, span, entry) {
            Some(stop) if stop.at() > span.range().start || !fact() => self.report(|| stop.diagnostic()),
            _ => {
                self.misplaced = true;
                if !was_misplaced {
                    self.report(|| misplaced_fact::found(span));
                }
            }
        }
    }

    pub(super) fn broken_line(&mut self, span: Span) {
        let (file, read) = (self.file, self.read);
        let entry = match token::first(read, span) {
            Some(word) if words::KINDS.contains(&word) => Rule::lone_head,
            Some("bring" | "unit") => Rule::lone_item,
            _ => Rule::lone_fact,
        };
        self.report(|| match look::stop(file, read, span, entry) {
            Some(stop) => stop.diagnostic(),
            None => unexpected_text::found(span, "a definition within a block", "a fact"),
        });
    }

    /// Reports a broken head; gives its kind and name where they can be read.
    pub(super) fn broken_head(&mut self, head: Span) -> Option<Head> {
        let (file, read) = (self.file, self.read);
        let text = read.get(head.range())?;
        let mut heads = text.split([' ', '\n', '{']).filter(|word| !word.is_empty());
        let (first, second) = (heads.next().unwrap_or(""), heads.next());
        let meant = block_kind(first).map(|_| first).or_else(|| nearest(first, words::KINDS.iter().copied()));
        let shaped = token::is_name(first) && second.is_none_or(token::is_name) && heads.next().is_none();
        self.report(|| match look::stop(file, read, head, Rule::lone_head) {
            Some(stop) if meant.is_some() || shaped || first.is_empty() => stop.diagnostic(),
            _ => {
                let brace = Span { start: head.end.saturating_sub(1).max(head.start), ..head };
                unexpected_text::found(brace, "`{`", "the end of the line")
                    .help("a block starts with its kind and its name, such as `stage Bracken {`")
            }
        });
        let name = second.filter(|name| token::is_name(name))?;
        let after = text.find(first)? + first.len();
        let at = head.range().start + after + text.get(after..)?.find(name)?;
        let span = Span::new(file, at, at + name.len());
        Some((block_kind(meant?)?, Name { span, text: name.to_owned() }))
    }
}
