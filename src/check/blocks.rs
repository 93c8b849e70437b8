//! Blocks: each checked once, on first use; and what is wrong with their lines in general.

use std::collections::HashMap;

use super::given::State;
use super::names::kind_words;
use super::{BlockId, Context};
use crate::diagnostics::codes::{
    circular_definition, foreign_fact, impossible_value, missing_fact, unknown_fact,
};
use crate::model::Value;
use crate::source::Span;
use crate::syntax::{BlockKind, Statement};

/// The results of one kind of block.
pub(super) type Results<T> = HashMap<BlockId, State<T>>;

/// Which values a quantity can have at all.
#[derive(Clone, Copy, Debug, PartialEq)]
pub(crate) enum Bound {
    Positive,
    NotNegative,
    /// From the first to the second, both included.
    Within(f64, f64),
    /// A whole number, not below this one.
    WholeFrom(f64),
}

impl Bound {
    fn holds(self, si: f64) -> bool {
        match self {
            Bound::Positive => si > 0.0,
            Bound::NotNegative => si >= 0.0,
            Bound::Within(low, high) => (low..=high).contains(&si),
            Bound::WholeFrom(low) => si >= low && si == si.trunc() && si <= f64::from(u32::MAX),
        }
    }

    fn words(self) -> String {
        match self {
            Bound::Positive => "more than zero".to_string(),
            Bound::NotNegative => "zero or more".to_string(),
            Bound::Within(low, high) => format!("between {low} and {high}"),
            Bound::WholeFrom(low) => format!("a whole number, {low} or more"),
        }
    }
}

impl<'a> Context<'a> {
    /// The result of checking a block: worked out on first use, with the block as the owner of the
    /// facts that are recorded meanwhile; and a note that the block being checked takes it in.
    pub(super) fn once_checked<T: Clone>(
        &mut self,
        block: BlockId,
        results: fn(&mut Self) -> &mut Results<T>,
        check: fn(&mut Self, BlockId) -> Option<T>,
    ) -> Option<T> {
        if let Some(subject) = self.subjects.last() {
            self.owned.entry(*subject).or_default().blocks.insert(block);
        }
        let name = &self.definition(block).block.name;
        match results(self).get(&block) {
            Some(State::Done(result)) => return result.clone(),
            Some(State::Working) => {
                self.report(circular_definition::found(name.span, &name.text, None));
                return None;
            }
            None => {}
        }
        results(self).insert(block, State::Working);
        self.subjects.push(block);
        let result = self.deeper(20, name.span, |context| check(context, block));
        self.subjects.pop();
        results(self).insert(block, State::Done(result.clone()));
        result
    }

    /// Reports a statement that has no place in a block of this kind, or a key that no fact of it
    /// has, with the nearest of `keys`.
    pub(crate) fn misplaced(&mut self, kind: BlockKind, span: Span, statement: &Statement, keys: &[&str]) {
        match statement {
            Statement::Broken => {}
            Statement::Setting(setting) => {
                let near = self.nearest(&setting.key.text, |_| keys.to_vec());
                self.report(unknown_fact::found(
                    setting.key.span,
                    &setting.key.text,
                    kind_words(kind),
                    keys,
                    near,
                ));
            }
            _ => self.report(foreign_fact::found(span, self.text(span), kind_words(kind), keys)),
        }
    }

    /// Reports a fact that a block lacks: `what` it is ("the payload") and how one writes it
    /// ("payload  132 kg"). Silent where a line of the block that could not be read may state it.
    pub(crate) fn missing(&mut self, block: BlockId, what: &str, example: &str) {
        if self.incomplete.contains(&block) {
            return;
        }
        let block = self.definition(block).block;
        self.report(missing_fact::found(
            block.name.span,
            &block.name.text,
            kind_words(block.kind),
            what,
            example,
        ));
    }

    /// Reports a value that the quantity cannot have; `what` names it ("the dry mass").
    pub(crate) fn bounded(&mut self, value: Option<Value>, bound: Bound, what: &str) -> Option<Value> {
        let value = value?;
        if bound.holds(value.si) {
            return Some(value);
        }
        let index = value.fact.0 as usize;
        let (Some(record), Some(fact)) = (self.records.get(index), self.facts.get(index)) else {
            return None;
        };
        let found = format!("{what} cannot be {}", fact.written);
        let span = record.span;
        self.report(impossible_value::found(span, &found, &bound.words()));
        None
    }
}
