//! Facts: every number of the model under its path.

use super::{BlockId, Context, ScopeId, Want};
use crate::model::{Fact, FactId, Origin, Place, Value};
use crate::quantity::Dimension;
use crate::source::Span;
use crate::syntax::{Because, Expr, Name};

impl<'a> Context<'a> {
    /// States a fact: works its expression out and records it under `path`. `what` names it in
    /// diagnostics ("the dry mass").
    pub(crate) fn fact(
        &mut self,
        scope: ScopeId,
        path: &str,
        expr: &Expr,
        want: impl Into<Want>,
        what: &str,
        because: Option<&Because>,
    ) -> Option<Value> {
        let si = self.constant(scope, expr, want, what)?;
        let _ = (path, si, because);
        None
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
        self.record(path, si, unit, dimension, Origin::Default, span)
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
        self.record(path, si, unit, dimension, Origin::Derived, span)
    }

    fn record(
        &mut self,
        path: &str,
        si: f64,
        unit: &str,
        dimension: Dimension,
        origin: Origin,
        span: Span,
    ) -> Value {
        let fact = FactId(self.facts.len() as u32);
        let place = self.place(span);
        self.facts.push(Fact {
            path: path.to_string(),
            si,
            dimension,
            unit: unit.to_string(),
            written: String::new(),
            origin,
            place,
            because: None,
        });
        Value { si, fact }
    }

    /// A `given` in reach of a scope (a mission's own first, then the file's): its fact, worked out
    /// on first use. None, without a word, where no such name is in reach; `Some(None)` where it is
    /// and its own definition is wrong, which has been reported there.
    pub(crate) fn given(&mut self, scope: ScopeId, name: &Name) -> Option<Option<Value>> {
        let _ = (scope, name);
        None
    }

    /// The dimension of a recorded fact.
    pub(crate) fn dimension(&self, fact: FactId) -> Dimension {
        self.facts.get(fact.0 as usize).map_or_else(Dimension::default, |fact| fact.dimension)
    }

    /// The facts of a block (a mission above all), those of the blocks and givens that it uses
    /// included, in order of the source.
    pub(crate) fn facts_of(&self, block: BlockId) -> Vec<FactId> {
        let _ = block;
        Vec::new()
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
