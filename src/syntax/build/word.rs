//! Names, paths, texts, numbers and units.

use super::Builder;
use super::parts::Parts;
use crate::diagnostics::codes::number_out_of_range;
use crate::source::Span;
use crate::syntax::rules::{Pair, Rule};
use crate::syntax::{Because, Literal, Name, Path, Quoted, UnitText};

impl Builder<'_> {
    /// Any single word: rule `name`, `key`, `word`, `argument_name` or `demand_name`.
    pub(super) fn name(&self, pair: &Pair<'_>) -> Name {
        Name { span: self.span(pair), text: pair.as_str().to_owned() }
    }

    /// The next name among the parts.
    pub(super) fn next_name(&self, parts: &mut Parts<'_>) -> Option<Name> {
        parts.find(Rule::name).map(|pair| self.name(&pair))
    }

    /// All further names among the parts.
    pub(super) fn names(&self, parts: &mut Parts<'_>) -> Vec<Name> {
        std::iter::from_fn(|| self.next_name(parts)).collect()
    }

    pub(super) fn path(&self, pair: Pair<'_>) -> Path {
        Path { span: self.span(&pair), parts: self.names(&mut Parts::of(pair)) }
    }

    /// Rule `text`: `\"` and `\\` are resolved, any other backslash stands for itself.
    pub(super) fn quoted(&self, pair: &Pair<'_>) -> Quoted {
        let span = self.span(pair);
        let inner =
            self.text.get(span.start as usize + 1..(span.end as usize).saturating_sub(1)).unwrap_or("");
        let mut text = String::with_capacity(inner.len());
        let mut rest = inner.chars().peekable();
        while let Some(next) = rest.next() {
            match (next, rest.peek()) {
                ('\\', Some(&escaped @ ('"' | '\\'))) => {
                    text.push(escaped);
                    rest.next();
                }
                _ => text.push(next),
            }
        }
        Quoted { span, text }
    }

    /// The reason at the end of a fact, if it has one.
    pub(super) fn because(&self, parts: &mut Parts<'_>) -> Option<Because> {
        let pair = parts.accept(Rule::because)?;
        let span = self.span(&pair);
        let text = Parts::of(pair).find(Rule::text)?;
        Some(Because { span, text: self.quoted(&text) })
    }

    pub(super) fn unit(&self, pair: &Pair<'_>) -> UnitText {
        UnitText { span: self.span(pair), text: pair.as_str().to_owned() }
    }

    /// Rule `quantity`: a number and its unit.
    pub(super) fn quantity(&mut self, pair: Pair<'_>) -> Option<Literal> {
        let span = self.span(&pair);
        let mut parts = Parts::of(pair);
        let number = parts.find(Rule::number)?;
        let unit = parts.find(Rule::unit).map(|unit| self.unit(&unit));
        self.literal(&number, span, unit)
    }

    /// Rule `signed` or `number`, to the nearest binary64 value. One past the largest is reported.
    pub(super) fn literal(
        &mut self,
        digits: &Pair<'_>,
        span: Span,
        unit: Option<UnitText>,
    ) -> Option<Literal> {
        let value = digits.as_str().parse::<f64>().ok()?;
        let digits = self.span(digits);
        if value.is_infinite() {
            self.report(|| number_out_of_range::found(digits));
            return None;
        }
        Some(Literal { span, value, digits, unit })
    }
}
