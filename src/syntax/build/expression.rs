//! Expressions: the flat list of terms and operators to a tree.

use super::Builder;
use super::parts::Parts;
use crate::diagnostics::codes::{expression_limit, operator_needs_blanks, unexpected_text};
use crate::source::Span;
use crate::syntax::rules::{Pair, Rule};
use crate::syntax::{Expr, ExprKind, Name, Operator};

/// The most operators in one expression, those within brackets included. It bounds the depth of the
/// tree, and so every walk over it.
pub(in crate::syntax) const OPERATOR_LIMIT: usize = 256;

/// An operator that waits for its right-hand side.
struct Pending {
    operator: Operator,
    span: Span,
}

impl Builder<'_> {
    /// The next expression among the parts.
    pub(super) fn next_expr(&mut self, parts: &mut Parts<'_>) -> Option<Expr> {
        parts.find(Rule::expr).map(|pair| self.expr(pair))
    }

    /// The value that follows a name. The grammar takes `a-b` as the name `a` and the value `-b`,
    /// which nobody means.
    pub(super) fn value_of(&mut self, name: &Name, parts: &mut Parts<'_>) -> Option<Expr> {
        let pair = parts.find(Rule::expr)?;
        let start = self.span(&pair).start;
        if start == name.span.end {
            let at = Span { start, end: start + 1, ..name.span };
            match pair.as_str().get(..1) {
                Some("-") => self.report(|| operator_needs_blanks::found(at, "-")),
                other => {
                    let found = format!("`{}`", other.unwrap_or(""));
                    self.report(|| unexpected_text::found(at, &found, "a blank"));
                }
            }
        }
        Some(self.expr(pair))
    }

    /// An outermost expression.
    pub(super) fn expr(&mut self, pair: Pair<'_>) -> Expr {
        let span = self.span(&pair);
        // An operator takes at least one byte, so a short expression needs no count.
        if span.len() > OPERATOR_LIMIT {
            let operators = pair.clone().into_inner().flatten();
            let count =
                operators.filter(|part| matches!(part.as_rule(), Rule::operator | Rule::minus)).count();
            if count > OPERATOR_LIMIT {
                self.report(|| expression_limit::found(span, count, OPERATOR_LIMIT));
                return Expr { span, kind: ExprKind::Broken };
            }
        }
        self.inner_expr(pair)
    }

    fn inner_expr(&mut self, pair: Pair<'_>) -> Expr {
        let span = self.span(&pair);
        self.operations(Parts::of(pair)).unwrap_or(Expr { span, kind: ExprKind::Broken })
    }

    /// Precedence by two stacks: an operator is applied once one arrives that does not bind tighter.
    fn operations(&mut self, mut parts: Parts<'_>) -> Option<Expr> {
        let mut values = Vec::new();
        let mut pending: Vec<Pending> = Vec::new();
        // The minus signs before a term bind looser than `^` and tighter than the rest.
        let mut minuses: Vec<Vec<Span>> = Vec::new();
        loop {
            let (signs, value) = self.term(parts.find(Rule::term)?)?;
            values.push(value);
            minuses.push(signs);
            let next = match parts.accept(Rule::operator) {
                Some(pair) => Some(Pending { operator: operator(pair.as_str())?, span: self.span(&pair) }),
                None => None,
            };
            while let Some(top) =
                pending.pop_if(|top| next.as_ref().is_none_or(|next| applies_before(top, next)))
            {
                let signs = minuses.pop()?;
                let right = negated(values.pop()?, signs);
                let signs = minuses.pop()?;
                let left = values.pop()?;
                if top.operator == Operator::Power {
                    values.push(binary(left, top, right));
                    minuses.push(signs);
                } else {
                    values.push(binary(negated(left, signs), top, right));
                    minuses.push(Vec::new());
                }
            }
            match next {
                Some(next) => pending.push(next),
                None => return Some(negated(values.pop()?, minuses.pop()?)),
            }
        }
    }

    /// The minus signs before a term, and the term itself.
    fn term(&mut self, pair: Pair<'_>) -> Option<(Vec<Span>, Expr)> {
        let mut parts = Parts::of(pair);
        let mut signs = Vec::new();
        while let Some(minus) = parts.accept(Rule::minus) {
            signs.push(self.span(&minus));
        }
        let value = self.primary(parts.any()?)?;
        let Some(place) = parts.accept(Rule::place) else {
            return Some((signs, value));
        };
        let span = value.span.to(self.span(&place));
        let mut inner = Parts::of(place);
        inner.find(Rule::kw_at)?;
        let end = inner.any()?.as_rule() == Rule::kw_end;
        let phase = self.next_name(&mut inner)?;
        Some((signs, Expr { span, kind: ExprKind::At { quantity: Box::new(value), end, phase } }))
    }

    fn primary(&mut self, pair: Pair<'_>) -> Option<Expr> {
        let span = self.span(&pair);
        let kind = match pair.as_rule() {
            Rule::quantity => self.quantity(pair).map_or(ExprKind::Broken, ExprKind::Number),
            Rule::path => ExprKind::Path(self.path(pair)),
            Rule::group => return Parts::of(pair).find(Rule::expr).map(|inner| self.inner_expr(inner)),
            Rule::call => {
                let mut parts = Parts::of(pair);
                let function = self.next_name(&mut parts)?;
                let mut arguments = Vec::new();
                while let Some(argument) = parts.find(Rule::expr) {
                    arguments.push(self.inner_expr(argument));
                }
                ExprKind::Call { function, arguments }
            }
            Rule::peak => {
                let mut parts = Parts::of(pair);
                parts.find(Rule::kw_peak)?;
                let quantity = Box::new(self.primary(parts.any()?)?);
                ExprKind::Peak { quantity, phase: self.next_name(&mut parts) }
            }
            _ => return None,
        };
        Some(Expr { span, kind })
    }
}

fn operator(mark: &str) -> Option<Operator> {
    Some(match mark {
        "+" => Operator::Add,
        "-" => Operator::Subtract,
        "*" => Operator::Multiply,
        "/" => Operator::Divide,
        "^" => Operator::Power,
        _ => return None,
    })
}

fn rank(operator: Operator) -> u8 {
    match operator {
        Operator::Add | Operator::Subtract => 0,
        Operator::Multiply | Operator::Divide => 1,
        Operator::Power => 2,
    }
}

/// Whether `left` is applied before `right` in `a left b right c`; `^` goes to the right.
fn applies_before(left: &Pending, right: &Pending) -> bool {
    match rank(left.operator).cmp(&rank(right.operator)) {
        std::cmp::Ordering::Equal => left.operator != Operator::Power,
        order => order.is_gt(),
    }
}

fn binary(left: Expr, pending: Pending, right: Expr) -> Expr {
    let span = left.span.to(right.span);
    let (left, right) = (Box::new(left), Box::new(right));
    Expr {
        span,
        kind: ExprKind::Binary { left, operator: pending.operator, operator_span: pending.span, right },
    }
}

fn negated(value: Expr, signs: Vec<Span>) -> Expr {
    signs.into_iter().rev().fold(value, |value, sign| Expr {
        span: sign.to(value.span),
        kind: ExprKind::Negate(Box::new(value)),
    })
}
