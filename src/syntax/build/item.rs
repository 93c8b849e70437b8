//! What stands outside every block.

use super::Builder;
use super::parts::Parts;
use crate::syntax::rules::{Pair, Pairs, Rule};
use crate::syntax::{Bring, BringFrom, Item, UnitDefinition};

impl Builder<'_> {
    /// The whole file.
    pub(in crate::syntax) fn file(&mut self, pairs: Pairs<'_>) -> Vec<Item> {
        let inner = pairs.flat_map(Pair::into_inner).filter(|pair| pair.as_rule() != Rule::EOI);
        inner.map(|pair| self.item(pair)).collect()
    }

    fn item(&mut self, pair: Pair<'_>) -> Item {
        let span = self.span(&pair);
        self.misplaced &= matches!(pair.as_rule(), Rule::stray_close | Rule::broken_item);
        let item = match pair.as_rule() {
            Rule::bring => self.bring(pair).map(Item::Bring),
            Rule::unit_definition => self.unit_definition(pair).map(Item::Unit),
            Rule::given_item => self.given_item(pair),
            Rule::block | Rule::phase => self.block(pair).map(Item::Block),
            Rule::broken_block | Rule::broken_kind_block => self.broken_block(pair).map(Item::Block),
            Rule::stray_close => {
                self.stray_close(span);
                None
            }
            _ => {
                self.broken_item(span);
                None
            }
        };
        item.unwrap_or(Item::Broken(span))
    }

    fn bring(&mut self, pair: Pair<'_>) -> Option<Bring> {
        let span = self.span(&pair);
        let mut parts = Parts::of(pair);
        let mut names = Vec::new();
        let from = loop {
            let part = parts.any()?;
            match part.as_rule() {
                Rule::name => names.push(self.name(&part)),
                Rule::text => break BringFrom::File(self.quoted(&part)),
                Rule::kw_builtin => break BringFrom::Builtin(self.span(&part)),
                _ => {}
            }
        };
        Some(Bring { span, names, from })
    }

    fn unit_definition(&mut self, pair: Pair<'_>) -> Option<UnitDefinition> {
        let span = self.span(&pair);
        let mut parts = Parts::of(pair);
        let name = self.next_name(&mut parts)?;
        let value = self.next_expr(&mut parts)?;
        Some(UnitDefinition { span, name, value, because: self.because(&mut parts) })
    }

    fn given_item(&mut self, pair: Pair<'_>) -> Option<Item> {
        let mut parts = Parts::of(pair);
        let given = parts.find(Rule::given)?;
        let given = self.given(given)?;
        Some(Item::Given(given, self.because(&mut parts)))
    }
}
