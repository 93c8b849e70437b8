//! Constant expressions: their value in SI and their dimension.

use super::{Context, ScopeId, Want, operators};
use crate::diagnostics::codes::{impossible_value, not_constant, too_deep};
use crate::quantity::Dimension;
use crate::source::Span;
use crate::syntax::{Expr, ExprKind, Literal, Name, Operator};

/// A value and its dimension.
#[derive(Clone, Copy, Debug, PartialEq)]
pub(crate) struct Typed {
    pub si: f64,
    pub dimension: Dimension,
}

/// How deep expressions and the definitions that they name may lean on each other.
const DEPTH: u32 = 1200;

impl<'a> Context<'a> {
    /// The value of an expression over numbers, givens and facts; reports what keeps it from
    /// having one, flight quantities included.
    pub(crate) fn infer(&mut self, scope: ScopeId, expr: &Expr) -> Option<Typed> {
        self.deeper(1, expr.span, |context| context.infer_here(scope, expr))
    }

    fn infer_here(&mut self, scope: ScopeId, expr: &Expr) -> Option<Typed> {
        match &expr.kind {
            ExprKind::Number(literal) => self.literal(scope, literal),
            ExprKind::Path(path) => self.path_value(scope, path),
            ExprKind::Negate(of) => self.infer(scope, of).map(|of| Typed { si: -of.si, ..of }),
            ExprKind::Binary { left, operator, operator_span, right } => {
                let sides = (self.infer(scope, left), self.infer(scope, right));
                let (left_value, right_value) = (sides.0?, sides.1?);
                let dimension = self.binary(
                    scope,
                    (left, left_value.dimension),
                    (*operator, *operator_span),
                    (right, right_value.dimension),
                    Some(right_value.si),
                )?;
                let si = operators::apply_operator(*operator, left_value.si, right_value.si);
                self.finite(expr.span, Typed { si, dimension })
            }
            ExprKind::Call { function, arguments } => self.call_value(scope, expr.span, function, arguments),
            ExprKind::Peak { .. } | ExprKind::At { .. } => {
                self.report(not_constant::found(expr.span, self.text(expr.span)));
                None
            }
            ExprKind::Broken => None,
        }
    }

    fn call_value(&mut self, scope: ScopeId, span: Span, name: &Name, arguments: &[Expr]) -> Option<Typed> {
        let values: Vec<_> = arguments.iter().map(|argument| self.infer(scope, argument)).collect();
        let values: Vec<Typed> = values.into_iter().collect::<Option<_>>()?;
        let dimensions: Vec<_> = values.iter().map(|value| value.dimension).collect();
        let (function, dimension) = self.call(scope, name, arguments, &dimensions)?;
        let numbers: Vec<_> = values.iter().map(|value| value.si).collect();
        self.finite(span, Typed { si: operators::apply_function(function, &numbers), dimension })
    }

    /// The value of a number with its unit.
    pub(crate) fn literal(&mut self, scope: ScopeId, literal: &Literal) -> Option<Typed> {
        let value = match &literal.unit {
            None => Typed { si: literal.value, dimension: Dimension::NONE },
            Some(text) => {
                let unit = self.unit(scope, text)?;
                Typed { si: unit.to_si(literal.value), dimension: unit.dimension }
            }
        };
        self.finite(literal.span, value)
    }

    /// The value of an expression that has to have a given dimension. `what` names the fact in
    /// diagnostics ("the dry mass").
    pub(crate) fn constant(
        &mut self,
        scope: ScopeId,
        expr: &Expr,
        want: impl Into<Want>,
        what: &str,
    ) -> Option<f64> {
        let found = self.infer(scope, expr)?;
        self.fits(scope, expr, found.dimension, want, what).then_some(found.si)
    }

    /// The unit in which to show an expression: that of its first number of its own dimension, or of
    /// the fact that it names; empty where there is none.
    pub(crate) fn unit_of(&mut self, scope: ScopeId, expr: &Expr, dimension: Dimension) -> String {
        match &expr.kind {
            ExprKind::Number(Literal { unit: Some(unit), .. }) => match self.unit(scope, unit) {
                Some(known) if known.dimension == dimension => unit.text.clone(),
                _ => String::new(),
            },
            ExprKind::Path(path) => self
                .path_fact(scope, path)
                .and_then(|fact| self.facts.get(fact.0 as usize))
                .filter(|fact| fact.dimension == dimension)
                .map_or_else(String::new, |fact| fact.unit.clone()),
            ExprKind::Negate(of) => self.unit_of(scope, of, dimension),
            ExprKind::Binary { left, operator, right, .. } => {
                let unit = self.unit_of(scope, left, dimension);
                if unit.is_empty() && *operator != Operator::Power {
                    return self.unit_of(scope, right, dimension);
                }
                unit
            }
            ExprKind::Call { arguments, .. } => arguments
                .first()
                .map_or_else(String::new, |argument| self.unit_of(scope, argument, dimension)),
            _ => String::new(),
        }
    }

    fn finite(&mut self, span: Span, value: Typed) -> Option<Typed> {
        if value.si.is_finite() {
            return Some(value);
        }
        self.report(impossible_value::found(span, "this has no finite value", "a finite number"));
        None
    }

    /// Runs `work` one step (or several) further down; reports and gives up where definitions lean
    /// on each other too deeply for a bounded stack.
    pub(super) fn deeper<T>(
        &mut self,
        steps: u32,
        span: Span,
        work: impl FnOnce(&mut Self) -> Option<T>,
    ) -> Option<T> {
        if self.depth + steps > DEPTH {
            self.report(too_deep::found(span));
            return None;
        }
        self.depth += steps;
        let result = work(self);
        self.depth -= steps;
        result
    }
}
