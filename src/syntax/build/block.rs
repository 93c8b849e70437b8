//! Blocks and their lines.

use super::Builder;
use super::parts::Parts;
use crate::source::Span;
use crate::syntax::rules::{Pair, Rule};
use crate::syntax::{Block, BlockKind, Line, Name, Statement};

impl Builder<'_> {
    /// Rule `block` or `phase`.
    pub(super) fn block(&mut self, pair: Pair<'_>) -> Option<Block> {
        let span = self.span(&pair);
        let mut parts = Parts::of(pair);
        let kind_pair = parts.any()?;
        let kind = block_kind(kind_pair.as_str())?;
        let name = self.next_name(&mut parts)?;
        let like = parts.accept(Rule::like).and_then(|like| self.next_name(&mut Parts::of(like)));
        let was = parts.accept(Rule::was).and_then(|was| self.next_name(&mut Parts::of(was)));
        let open = parts.find(Rule::open)?;
        let lines = self.body(parts.any()?);
        let end = self.block_end(&mut parts, self.span(&open), &lines).unwrap_or(span.end);
        Some(Block { span: Span { end, ..span }, kind, name, like, was, lines })
    }

    /// A block whose head is wrong. Where its kind and name can be read it stays a block, with a
    /// broken line in place of what is missing.
    pub(super) fn broken_block(&mut self, pair: Pair<'_>) -> Option<Block> {
        let span = self.span(&pair);
        let mut parts = Parts::of(pair);
        let head = self.span(&parts.any()?);
        let known = self.broken_head(head);
        let mut lines = vec![Line { span: head, statement: Statement::Broken, because: None }];
        lines.append(&mut self.body(parts.any()?));
        let end = self.block_end(&mut parts, head, &lines).unwrap_or(span.end);
        let (kind, name) = known?;
        Some(Block { span: Span { end, ..span }, kind, name, like: None, was: None, lines })
    }

    /// The closing brace, or what stands in its place. Gives the end of the block.
    fn block_end(&mut self, parts: &mut Parts<'_>, open: Span, lines: &[Line]) -> Option<u32> {
        let close = parts.any()?;
        let close_span = self.span(&close);
        if close.as_rule() == Rule::unclosed {
            self.unclosed_block(open, close_span, lines);
            return None;
        }
        if let Some(missing) = parts.accept(Rule::missing_break) {
            self.missing_break(self.span(&missing));
        }
        Some(close_span.end)
    }

    fn body(&mut self, pair: Pair<'_>) -> Vec<Line> {
        pair.into_inner().map(|line| self.line(line)).collect()
    }

    fn line(&mut self, pair: Pair<'_>) -> Line {
        let span = self.span(&pair);
        match pair.as_rule() {
            Rule::fact => {
                let mut parts = Parts::of(pair);
                let statement = parts.any().and_then(|statement| self.statement(statement));
                let because = self.because(&mut parts);
                Line { span, statement: statement.unwrap_or(Statement::Broken), because }
            }
            Rule::phase => self.block_line(span, Self::block, pair),
            Rule::broken_phase | Rule::broken_block => self.block_line(span, Self::broken_block, pair),
            _ => {
                self.broken_line(span);
                Line { span, statement: Statement::Broken, because: None }
            }
        }
    }

    fn block_line<'p>(
        &mut self,
        span: Span,
        build: impl Fn(&mut Self, Pair<'p>) -> Option<Block>,
        pair: Pair<'p>,
    ) -> Line {
        match build(self, pair) {
            Some(block) => Line { span: block.span, statement: Statement::Block(block), because: None },
            None => Line { span, statement: Statement::Broken, because: None },
        }
    }
}

/// The kind of block that a keyword starts.
pub(in crate::syntax) fn block_kind(word: &str) -> Option<BlockKind> {
    Some(match word {
        "world" => BlockKind::World,
        "engine" => BlockKind::Engine,
        "curve" => BlockKind::Curve,
        "stage" => BlockKind::Stage,
        "vehicle" => BlockKind::Vehicle,
        "mission" => BlockKind::Mission,
        "phase" => BlockKind::Phase,
        _ => return None,
    })
}

/// What can be told of a block with a broken head.
pub(in crate::syntax) type Head = (BlockKind, Name);
