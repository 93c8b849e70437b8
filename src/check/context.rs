//! What a compilation knows while it goes on.

use std::collections::{BTreeMap, BTreeSet, HashMap};
use std::sync::Arc;

use super::blocks::Results;
use super::changed::Changes;
use super::facts::{Owned, Record, Use};
use super::given::State;
use super::lines::Inherited;
use super::names::{Definition, GivenDefinition, GivenId, Scope};
use super::stage::StageFacts;
use super::{BlockId, ScopeId};
use crate::diagnostics::Diagnostic;
use crate::model::{Curve, Engine, Fact, FactId, Value, Vehicle, World};
use crate::quantity::UnitTable;
use crate::source::{FileId, Sources, Span};
use crate::syntax::Expr;

/// The sources and trees of a compilation, the names in them, and what has come of them so far.
pub(crate) struct Context<'a> {
    pub(super) sources: &'a Sources,
    pub(super) links: &'a BTreeMap<Span, FileId>,
    pub(super) diagnostics: Vec<Diagnostic>,
    /// Work that is left for the search of near names.
    pub(super) nearest_budget: usize,
    pub(super) depth: u32,

    pub(super) scopes: Vec<Scope<'a>>,
    pub(super) definitions: Vec<Definition<'a>>,
    pub(super) givens: Vec<GivenDefinition<'a>>,
    pub(super) mission_givens: HashMap<(BlockId, &'a str), GivenId>,
    pub(super) mission_scopes: HashMap<(BlockId, ScopeId), ScopeId>,
    pub(super) lines: HashMap<BlockId, Vec<Inherited<'a>>>,
    /// Blocks with lines that could not be read, or that are like something unknown: what they seem
    /// to lack is not reported.
    pub(super) incomplete: BTreeSet<BlockId>,
    /// By the scope of a file.
    pub(super) units: Vec<UnitTable>,
    /// Units whose definitions are wrong, which has been reported.
    pub(super) broken_units: BTreeSet<(ScopeId, String)>,

    /// Every number met so far; [`FactId`] is an index into it.
    pub(super) facts: Vec<Fact>,
    /// One for each fact.
    pub(super) records: Vec<Record>,
    /// By the block that states it, and its path.
    pub(super) addresses: BTreeMap<(BlockId, String), FactId>,
    pub(super) changes: Changes,
    /// What the expressions being worked out have named, innermost last.
    pub(super) naming: Vec<Vec<Use>>,
    pub(super) given_values: HashMap<GivenId, State<Value>>,
    /// The expressions of a block by their addresses within it.
    pub(super) stated: HashMap<BlockId, HashMap<String, (&'a Expr, ScopeId)>>,
    /// Those that are being worked out.
    pub(super) settings: BTreeSet<(BlockId, String)>,
    /// The blocks that are being checked, innermost last.
    pub(super) subjects: Vec<BlockId>,
    pub(super) owned: HashMap<BlockId, Owned>,

    pub(super) worlds: Results<World>,
    pub(super) engines: Results<Engine>,
    pub(super) curves: Results<Arc<Curve>>,
    pub(super) stages: Results<StageFacts>,
    pub(super) vehicles: Results<Vehicle>,
    /// Engines that say nothing about sea level.
    pub(super) vacuum_only: BTreeSet<BlockId>,
    /// Vehicles that say nothing about drag.
    pub(super) without_drag: BTreeSet<BlockId>,
}

/// Names looked at, all in all, in the search of near ones.
const NEAREST_BUDGET: usize = 200_000;

impl<'a> Context<'a> {
    pub(super) fn new(sources: &'a Sources, links: &'a BTreeMap<Span, FileId>, changes: Changes) -> Self {
        Context {
            sources,
            links,
            nearest_budget: NEAREST_BUDGET,
            diagnostics: Default::default(),
            depth: Default::default(),
            scopes: Default::default(),
            definitions: Default::default(),
            givens: Default::default(),
            mission_givens: Default::default(),
            mission_scopes: Default::default(),
            lines: Default::default(),
            incomplete: Default::default(),
            units: Default::default(),
            broken_units: Default::default(),
            facts: Default::default(),
            records: Default::default(),
            addresses: Default::default(),
            changes,
            naming: Default::default(),
            given_values: Default::default(),
            stated: Default::default(),
            settings: Default::default(),
            subjects: Default::default(),
            owned: Default::default(),
            worlds: Default::default(),
            engines: Default::default(),
            curves: Default::default(),
            stages: Default::default(),
            vehicles: Default::default(),
            vacuum_only: Default::default(),
            without_drag: Default::default(),
        }
    }

    pub(crate) fn report(&mut self, diagnostic: Diagnostic) {
        self.diagnostics.push(diagnostic);
    }

    /// The text of a span.
    pub(crate) fn text(&self, span: Span) -> &'a str {
        self.sources.text(span)
    }
}
