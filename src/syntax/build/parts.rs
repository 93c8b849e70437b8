//! The parts of a pair, taken in the order of the grammar.

use crate::syntax::rules::{Pair, Pairs, Rule};

/// Walks the inner pairs of a rule from left to right.
pub(super) struct Parts<'t> {
    pairs: Pairs<'t>,
}

impl<'t> Parts<'t> {
    pub(super) fn of(pair: Pair<'t>) -> Self {
        Parts { pairs: pair.into_inner() }
    }

    /// The next part, whatever it is.
    pub(super) fn any(&mut self) -> Option<Pair<'t>> {
        self.pairs.next()
    }

    /// The next part of this rule; keywords and marks before it are passed over.
    pub(super) fn find(&mut self, rule: Rule) -> Option<Pair<'t>> {
        self.pairs.find(|pair| pair.as_rule() == rule)
    }

    /// The next part, if it is of this rule.
    pub(super) fn accept(&mut self, rule: Rule) -> Option<Pair<'t>> {
        let next = self.pairs.peek().filter(|pair| pair.as_rule() == rule)?;
        self.pairs.next();
        Some(next)
    }

    /// Whether the next part is of this rule; if so, it is taken.
    pub(super) fn has(&mut self, rule: Rule) -> bool {
        self.accept(rule).is_some()
    }
}
