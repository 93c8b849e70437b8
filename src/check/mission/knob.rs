//! Knobs: facts that are freed between bounds.

use super::Site;
use crate::check::{Context, ScopeId};
use crate::diagnostics::codes::{knob_bounds, unknown_name};
use crate::model::{FactId, Knob, Origin};
use crate::syntax::{Expr, Path};

impl<'a> Context<'a> {
    pub(super) fn knob(
        &mut self,
        site: &Site<'a>,
        scope: ScopeId,
        knob: (&Path, &Expr, &Expr),
    ) -> Option<Knob> {
        let (path, low, high) = knob;
        let Some(id) = self.fact_at(site, scope, path) else {
            self.report(
                unknown_name::found(path.span, "a fact of this mission", self.text(path.span), None).help(
                    "a knob frees a fact that is stated: a given, or an address such as `Sorrel.propellant`",
                ),
            );
            return None;
        };
        let fact = self.facts.get(id.0 as usize)?.clone();
        let span = self.records.get(id.0 as usize)?.span;
        if !matches!(fact.origin, Origin::Stated | Origin::Given) {
            self.report(knob_bounds::not_stated(path.span, &fact.path));
            return None;
        }
        let what = format!("a bound of `{}`", fact.path);
        let bounds = (
            self.constant(scope, low, fact.dimension, &what),
            self.constant(scope, high, fact.dimension, &what),
        );
        let (from, to) = (bounds.0?, bounds.1?);
        if from >= to {
            self.report(knob_bounds::empty(low.span.to(high.span)));
            return None;
        }
        if !(from..=to).contains(&fact.si) {
            self.report(knob_bounds::outside(span, &fact.path, &fact.written, low.span.to(high.span)));
            return None;
        }
        Some(Knob { fact: id, low: from, high: to, place: self.place(path.span) })
    }

    /// The fact that a path names in a mission: one of its own, a given, or one of a block.
    pub(super) fn fact_at(&mut self, site: &Site<'a>, scope: ScopeId, path: &Path) -> Option<FactId> {
        let text = self.text(path.span).to_string();
        if let [only] = path.parts.as_slice()
            && let Some(value) = self.given(scope, only)
        {
            let fact = value?.fact;
            self.owned.entry(site.block).or_default().facts.push(fact);
            return Some(fact);
        }
        let blocks = self.blocks_of(site.block);
        blocks.into_iter().find_map(|block| self.fact_of(block, &text))
    }
}
