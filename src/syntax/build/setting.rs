//! Facts of the common shape.

use super::Builder;
use super::parts::Parts;
use crate::syntax::rules::{Pair, Rule};
use crate::syntax::{Ambient, Argument, Operand, Setting};

impl Builder<'_> {
    pub(super) fn setting(&mut self, pair: Pair<'_>) -> Option<Setting> {
        let mut parts = Parts::of(pair);
        let key = self.name(&parts.find(Rule::key)?);
        let word = parts.accept(Rule::word).map(|word| self.name(&word));
        let value = parts.accept(Rule::operand).and_then(|operand| self.operand(operand));
        let upto = if parts.has(Rule::dots) { self.next_expr(&mut parts) } else { None };
        let ambient = match parts.accept(Rule::ambient) {
            Some(ambient) => {
                let span = self.span(&ambient);
                let vacuum = Parts::of(ambient).has(Rule::kw_in);
                Some((if vacuum { Ambient::Vacuum } else { Ambient::SeaLevel }, span))
            }
            None => None,
        };
        let arguments = self.arguments(&mut parts)?;
        Some(Setting { key, word, value, upto, ambient, arguments })
    }

    fn operand(&mut self, pair: Pair<'_>) -> Option<Operand> {
        let inner = Parts::of(pair).any()?;
        match inner.as_rule() {
            Rule::instant => Some(Operand::Instant(self.span(&inner))),
            _ => Some(Operand::Expr(self.expr(inner))),
        }
    }

    /// All further arguments among the parts.
    pub(super) fn arguments(&mut self, parts: &mut Parts<'_>) -> Option<Vec<Argument>> {
        let mut arguments = Vec::new();
        while let Some(argument) = parts.find(Rule::argument) {
            let mut inner = Parts::of(argument);
            let name = self.name(&inner.find(Rule::argument_name)?);
            arguments.push(Argument { value: self.value_of(&name, &mut inner)?, name });
        }
        Some(arguments)
    }
}
