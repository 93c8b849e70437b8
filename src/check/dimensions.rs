//! Whether an expression is what its place needs, and what to say where it is not.

use super::want::Style;
use super::{Context, ScopeId, Want};
use crate::diagnostics::Diagnostic;
use crate::diagnostics::codes::{dimension_mismatch, missing_unit, percent_or_number, pounds_confused};
use crate::quantity::Dimension;
use crate::source::Span;
use crate::syntax::{Expr, ExprKind, Literal};

impl<'a> Context<'a> {
    /// Checks the dimension (and how a pure number is written) of an expression that has been
    /// inferred, here or by the formulas of a mission. True where it fits; otherwise it is reported.
    pub(crate) fn fits(
        &mut self,
        scope: ScopeId,
        expr: &Expr,
        found: Dimension,
        want: impl Into<Want>,
        what: &str,
    ) -> bool {
        let want = want.into();
        let literal = plain_literal(expr);
        if found == want.dimension {
            return literal
                .is_none_or(|literal| self.style_fits(scope, expr.span, literal, want.style, what));
        }
        let written = self.text(expr.span);
        let (found_words, expected) = (with_article(found), with_article(want.dimension));
        let unit = literal.and_then(|literal| literal.unit.as_ref());
        let diagnostic = match (literal, unit) {
            (Some(_), None) => {
                let units = self.units_of(scope, want.dimension);
                missing_unit::found(expr.span, what, written, &expected, &units)
            }
            (Some(literal), Some(unit))
                if is_pound(&unit.text) && other_pound(found, want.dimension).is_some() =>
            {
                let mend = other_pound(found, want.dimension).unwrap_or_default();
                let mend = format!("{} {mend}", self.text(literal.digits));
                pounds_confused::found(expr.span, what, written, &found_words, &expected, &mend)
            }
            _ => dimension_mismatch::found(expr.span, what, written, &found_words, &expected),
        };
        let diagnostic = match self.defined_at(scope, expr) {
            Some(defined) => diagnostic.and(defined, format!("defined here as {found_words}")),
            None => diagnostic,
        };
        let diagnostic = help_with_angle(diagnostic, found, want.dimension);
        let units = self.units_of(scope, want.dimension);
        let diagnostic = match diagnostic.help.is_some() || units.is_empty() {
            true => diagnostic,
            false => diagnostic.help(format!("it is written in a unit such as {}", units.join(", "))),
        };
        self.report(diagnostic);
        false
    }

    /// Whether a pure number is written as its place needs: in percent, or not.
    fn style_fits(
        &mut self,
        scope: ScopeId,
        span: Span,
        literal: &Literal,
        style: Style,
        what: &str,
    ) -> bool {
        let is_percent = literal.unit.as_ref().is_some_and(|unit| unit.text == "%");
        let written = self.text(span);
        let diagnostic = match style {
            Style::Percent if literal.unit.is_none() => {
                let percent = self.show(scope, literal.value * 100.0, "");
                percent_or_number::bare(span, what, written, &percent)
            }
            Style::Plain if is_percent => {
                let number = self.show(scope, literal.value / 100.0, "");
                percent_or_number::percent(span, what, written, &number)
            }
            _ => return true,
        };
        self.report(diagnostic);
        false
    }

    /// Reports two sides of different dimensions.
    pub(crate) fn report_sides(
        &mut self,
        scope: ScopeId,
        operator: Span,
        (left, left_dimension): (&Expr, Dimension),
        (right, right_dimension): (&Expr, Dimension),
    ) {
        let words = (with_article(left_dimension), with_article(right_dimension));
        let mut diagnostic =
            dimension_mismatch::sides(operator, (left.span, &words.0), (right.span, &words.1));
        for (side, words) in [(left, &words.0), (right, &words.1)] {
            if let Some(defined) = self.defined_at(scope, side) {
                diagnostic = diagnostic.and(defined, format!("defined here as {words}"));
            }
        }
        self.report(help_with_angle(diagnostic, left_dimension, right_dimension));
    }
}

/// A number with nothing but a sign before it.
fn plain_literal(expr: &Expr) -> Option<&Literal> {
    match &expr.kind {
        ExprKind::Number(literal) => Some(literal),
        ExprKind::Negate(of) => match &of.kind {
            ExprKind::Number(literal) => Some(literal),
            _ => None,
        },
        _ => None,
    }
}

/// Where an angle is all that makes the difference, `1 rad` takes it away.
fn help_with_angle(diagnostic: Diagnostic, found: Dimension, wanted: Dimension) -> Diagnostic {
    let without = |dimension: Dimension| Dimension { angle: 0, ..dimension };
    if found == wanted || without(found) != without(wanted) || diagnostic.help.is_some() {
        return diagnostic;
    }
    match i16::from(found.angle) - i16::from(wanted.angle) {
        1 => diagnostic
            .help("an angle is a dimension of its own: divide it by `1 rad` where a pure number is meant"),
        -1 => diagnostic.help("an angle is a dimension of its own: multiply by `1 rad` to get one"),
        _ => diagnostic,
    }
}

fn is_pound(unit: &str) -> bool {
    ["lbf", "lbm"].contains(&unit)
}

/// The pound that was meant, where one stands for the other.
fn other_pound(found: Dimension, wanted: Dimension) -> Option<&'static str> {
    match (found, wanted) {
        (Dimension::FORCE, Dimension::MASS) => Some("lbm"),
        (Dimension::MASS, Dimension::FORCE) => Some("lbf"),
        _ => None,
    }
}

/// "a force (kg·m/s²)", "an area (m²)", "a plain number"
pub(crate) fn with_article(dimension: Dimension) -> String {
    let words = dimension.describe();
    match dimension.name() {
        _ if dimension == Dimension::NONE => words,
        Some(name) if name.starts_with(['a', 'e', 'i', 'o']) => format!("an {words}"),
        Some(_) => format!("a {words}"),
        None => format!("a quantity in {words}"),
    }
}
