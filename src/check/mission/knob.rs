//! Knobs: facts that are freed between bounds.

use std::collections::BTreeSet;

use super::Site;
use crate::check::facts::Use;
use crate::check::{BlockId, Context, ScopeId};
use crate::diagnostics::codes::{knob_bounds, unknown_name, unused_knob};
use crate::model::{FactId, Knob, Origin};
use crate::syntax::{Expr, Path, Statement};

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
        // Freeing a given is not yet a use of it.
        self.naming.push(Vec::new());
        let given = match path.parts.as_slice() {
            [only] => self.given(scope, only),
            _ => None,
        };
        self.naming.pop();
        if let Some(value) = given {
            let fact = value?.fact;
            self.owned.entry(site.block).or_default().facts.push(fact);
            return Some(fact);
        }
        let blocks = self.blocks_of(site.block);
        blocks.into_iter().find_map(|block| self.fact_of(block, &text))
    }

    /// Reports a knob on a given that nothing in the mission uses; `read` is what its formulas name.
    pub(super) fn check_knobs(&mut self, mission: BlockId, knobs: &[Knob], read: Vec<Use>) {
        let facts = self.facts_of(mission);
        let shaping = facts.iter().filter(|fact| !self.is_given(**fact));
        let mut open: Vec<Use> = shaping.map(|fact| Use::Fact(*fact)).chain(read).collect();
        let mut used = BTreeSet::new();
        while let Some(next) = open.pop() {
            let fact = match &next {
                Use::Fact(fact) => Some(*fact),
                Use::Path(block, path) => self.fact_of(*block, path),
            };
            if let Some(fact) = fact.filter(|fact| used.insert(*fact))
                && let Some(record) = self.records.get(fact.0 as usize)
            {
                open.extend(record.uses.iter().cloned());
            }
        }
        let lines = self.lines(mission);
        for knob in knobs.iter().filter(|knob| !used.contains(&knob.fact)) {
            let Some(fact) = self.facts.get(knob.fact.0 as usize).map(|fact| fact.path.clone()) else {
                continue;
            };
            let Some(defined) = self.records.get(knob.fact.0 as usize).map(|record| record.span) else {
                continue;
            };
            let at = lines.iter().find_map(|line| match &line.line.statement {
                Statement::Knob { path, .. } if path.span.start == knob.place.start => Some(path.span),
                _ => None,
            });
            self.report(unused_knob::found(at.unwrap_or(defined), &fact, defined));
        }
    }

    fn is_given(&self, fact: FactId) -> bool {
        self.facts.get(fact.0 as usize).is_some_and(|fact| fact.origin == Origin::Given)
    }
}
