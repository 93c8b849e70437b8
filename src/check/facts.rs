//! Facts: every number of the model under its path, and which blocks they belong to.

use std::collections::{BTreeMap, BTreeSet};

use super::{BlockId, Context, ScopeId, Want};
use crate::diagnostics::codes::duplicate_name;
use crate::model::{Fact, FactId, Origin, Place, Value};
use crate::quantity::Dimension;
use crate::source::Span;
use crate::syntax::{Because, BlockKind, Expr};

/// What a block has stated and which other blocks it takes in.
#[derive(Clone, Debug, Default)]
pub(super) struct Owned {
    pub facts: Vec<FactId>,
    pub blocks: BTreeSet<BlockId>,
}

/// What an expression names.
#[derive(Clone, Debug, PartialEq, Eq)]
pub(super) enum Use {
    Fact(FactId),
    /// A fact of a block that may not have been recorded yet.
    Path(BlockId, String),
}

/// What the checker alone knows of a fact.
#[derive(Clone, Debug)]
pub(super) struct Record {
    pub span: Span,
    /// What its expression names.
    pub uses: Vec<Use>,
}

impl<'a> Context<'a> {
    /// States a fact: works its expression out and records it under `path`, as one of the block that
    /// is being checked. `what` names it in diagnostics ("the dry mass").
    pub(crate) fn fact(
        &mut self,
        scope: ScopeId,
        path: &str,
        expr: &Expr,
        want: impl Into<Want>,
        what: &str,
        because: Option<&Because>,
    ) -> Option<Value> {
        let want = want.into();
        self.naming.push(Vec::new());
        let si = self.constant(scope, expr, want, what);
        let uses = self.naming.pop().unwrap_or_default();
        Some(self.stated(scope, path, expr, (si?, want.dimension), because, uses))
    }

    /// Records a fact whose expression has been worked out.
    pub(super) fn stated(
        &mut self,
        scope: ScopeId,
        path: &str,
        expr: &Expr,
        (si, dimension): (f64, Dimension),
        because: Option<&Because>,
        uses: Vec<Use>,
    ) -> Value {
        let unit = self.unit_of(scope, expr, dimension);
        let fact = Fact {
            path: path.to_string(),
            si,
            dimension,
            unit,
            written: self.text(expr.span).to_string(),
            origin: Origin::Stated,
            place: self.place(expr.span),
            because: because.map(|because| because.text.text.clone()),
        };
        self.own(fact, Record { span: expr.span, uses })
    }

    /// Records a number that nobody stated, in SI, with the unit in which reports show it;
    /// `span` is the block that lacks it.
    pub(crate) fn default(
        &mut self,
        path: &str,
        si: f64,
        unit: &str,
        dimension: Dimension,
        span: Span,
    ) -> Value {
        self.unwritten(path, (si, dimension, unit), Origin::Default, span)
    }

    /// Records a number that follows from stated facts.
    pub(crate) fn derived(
        &mut self,
        path: &str,
        si: f64,
        unit: &str,
        dimension: Dimension,
        span: Span,
    ) -> Value {
        self.unwritten(path, (si, dimension, unit), Origin::Derived, span)
    }

    fn unwritten(
        &mut self,
        path: &str,
        (si, dimension, unit): (f64, Dimension, &str),
        origin: Origin,
        span: Span,
    ) -> Value {
        let fact = Fact {
            path: path.to_string(),
            si,
            dimension,
            unit: unit.to_string(),
            written: String::new(),
            origin,
            place: self.place(span),
            because: None,
        };
        self.own(fact, Record { span, uses: Vec::new() })
    }

    fn own(&mut self, fact: Fact, record: Record) -> Value {
        let path = fact.path.clone();
        let value = self.add_fact(fact, record);
        if let Some(subject) = self.subjects.last() {
            self.owned.entry(*subject).or_default().facts.push(value.fact);
            self.addresses.entry((*subject, path)).or_insert(value.fact);
        }
        value
    }

    pub(super) fn add_fact(&mut self, mut fact: Fact, record: Record) -> Value {
        let id = FactId(self.facts.len() as u32);
        fact.si = self.changed(id, fact.si);
        let value = Value { si: fact.si, fact: id };
        self.facts.push(fact);
        self.records.push(record);
        value
    }

    /// The dimension of a recorded fact.
    pub(crate) fn dimension(&self, fact: FactId) -> Dimension {
        self.facts.get(fact.0 as usize).map_or_else(Dimension::default, |fact| fact.dimension)
    }

    /// Facts recorded and blocks looked up from here to [`Context::leave`] belong to this block
    /// (a mission); see [`Context::facts_of`]. Works out the givens of a mission.
    pub(crate) fn enter(&mut self, block: BlockId) {
        self.subjects.push(block);
        for (_, given) in self.givens_of(block) {
            if let Some(value) = self.given_value(given) {
                self.owned.entry(block).or_default().facts.push(value.fact);
            }
        }
    }

    /// Ends what [`Context::enter`] began.
    pub(crate) fn leave(&mut self) {
        let Some(block) = self.subjects.pop() else { return };
        if self.definition(block).block.kind == BlockKind::Mission {
            self.check_addresses(block);
        }
    }

    /// Two definitions of one name may stand in different files, but not reach the same mission:
    /// their facts would have the same paths.
    fn check_addresses(&mut self, mission: BlockId) {
        let mut first: BTreeMap<&str, Span> = BTreeMap::new();
        let mut clashes = Vec::new();
        for block in self.blocks_of(mission) {
            let name = &self.definition(block).block.name;
            match first.get(name.text.as_str()) {
                Some(other) => clashes.push(duplicate_name::in_one_mission(name.span, &name.text, *other)),
                None => {
                    first.insert(&name.text, name.span);
                }
            }
        }
        clashes.into_iter().for_each(|clash| self.report(clash));
    }

    /// The block and all that it takes in.
    pub(super) fn blocks_of(&self, block: BlockId) -> BTreeSet<BlockId> {
        let mut all = BTreeSet::new();
        let mut open = vec![block];
        while let Some(block) = open.pop() {
            if all.insert(block)
                && let Some(owned) = self.owned.get(&block)
            {
                open.extend(&owned.blocks);
            }
        }
        all
    }

    /// The facts of a block (a mission above all), those of the blocks and givens that it uses
    /// included, in order of the source.
    pub(crate) fn facts_of(&self, block: BlockId) -> Vec<FactId> {
        let owned = self.blocks_of(block).into_iter().filter_map(|block| self.owned.get(&block));
        let mut open: Vec<FactId> = owned.flat_map(|owned| owned.facts.iter().copied()).collect();
        let mut all = BTreeSet::new();
        while let Some(fact) = open.pop() {
            if all.insert(fact)
                && let Some(record) = self.records.get(fact.0 as usize)
            {
                open.extend(record.uses.iter().filter_map(|used| match used {
                    Use::Fact(fact) => Some(*fact),
                    Use::Path(block, path) => self.fact_of(*block, path),
                }));
            }
        }
        let mut all: Vec<_> = all.into_iter().collect();
        all.sort_by_key(|fact| (self.records.get(fact.0 as usize).map(|record| record.span), *fact));
        all
    }

    /// A recorded fact that a block itself states, by its whole path.
    pub(crate) fn fact_of(&self, block: BlockId, path: &str) -> Option<FactId> {
        self.addresses.get(&(block, path.to_string())).copied()
    }

    /// The place of a span as people count.
    pub(crate) fn place(&self, span: Span) -> Place {
        let file = self.sources.file(span.file);
        let at = file.location(span.start);
        Place {
            file: file.name().to_string(),
            line: at.line,
            column: at.column,
            start: span.start,
            end: span.end,
        }
    }
}
