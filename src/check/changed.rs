//! The model of the same source with other values for some of its facts.

use std::collections::BTreeMap;

use super::{BlockId, Context};
use crate::model::FactId;

/// Facts whose values are not those of the source.
#[derive(Clone, Debug, Default)]
pub(super) struct Changes {
    /// In SI.
    facts: BTreeMap<FactId, f64>,
    /// The same by block and path, for expressions that name a fact before it is recorded.
    addresses: BTreeMap<(BlockId, String), f64>,
}

impl Changes {
    pub(super) fn new(
        facts: &BTreeMap<FactId, f64>,
        addresses: &BTreeMap<(BlockId, String), FactId>,
    ) -> Self {
        let changed =
            addresses.iter().filter_map(|(address, fact)| Some((address.clone(), *facts.get(fact)?)));
        Changes { facts: facts.clone(), addresses: changed.collect() }
    }
}

impl Context<'_> {
    /// The value of a fact that is about to be recorded: its own, or the changed one. Facts are
    /// recorded in the same order whatever their values, so their numbers stay the same.
    pub(super) fn changed(&self, fact: FactId, si: f64) -> f64 {
        self.changes.facts.get(&fact).copied().unwrap_or(si)
    }

    /// The changed value of a fact of a block, by its path.
    pub(super) fn changed_at(&self, address: &(BlockId, String)) -> Option<f64> {
        self.changes.addresses.get(address).copied()
    }

    /// Whether this is the source as it stands. With changed facts, those that would follow from
    /// others give way instead of contradicting them.
    pub(super) fn is_unchanged(&self) -> bool {
        self.changes.facts.is_empty()
    }
}
