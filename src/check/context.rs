//! What a compilation knows while it goes on.

use super::names::Definition;
use super::{BlockId, Inherited, ScopeId};
use crate::diagnostics::Diagnostic;
use crate::model::{Engine, Fact, Vehicle, World};
use crate::source::{Sources, Span};
use crate::syntax::{BlockKind, Name, Statement};

/// The sources and trees of a compilation, the names in them, and what has come of them so far.
pub(crate) struct Context<'a> {
    pub(super) sources: &'a Sources,
    pub(super) definitions: Vec<Definition<'a>>,
    /// Every number met so far; [`crate::model::FactId`] is an index into it.
    pub(super) facts: Vec<Fact>,
    pub(super) diagnostics: Vec<Diagnostic>,
}

impl<'a> Context<'a> {
    pub(crate) fn report(&mut self, diagnostic: Diagnostic) {
        self.diagnostics.push(diagnostic);
    }

    /// The text of a span.
    pub(crate) fn text(&self, span: Span) -> &'a str {
        self.sources.text(span)
    }

    /// The block of an id that this compilation gave out, and the scope of its lines. For a mission
    /// that scope has the mission's own givens on top of those of its file.
    pub(crate) fn definition(&self, block: BlockId) -> Definition<'a> {
        // invariant: only `names` makes a BlockId, as an index into this list.
        self.definitions[block.0 as usize]
    }

    /// The block of a kind that a name stands for; reports a name that is unknown or of another kind.
    pub(crate) fn find_block(&mut self, scope: ScopeId, kind: BlockKind, name: &Name) -> Option<BlockId> {
        let _ = (scope, kind, name);
        None
    }

    /// The lines of a block, those that it inherits through `like` included; of two lines that state
    /// the same fact the block's own stands, in the place of the other. A fact given twice within
    /// one block is reported, and the first stands. Broken lines are left out.
    pub(crate) fn lines(&mut self, block: BlockId) -> Vec<Inherited<'a>> {
        let _ = block;
        Vec::new()
    }

    /// The checked world, vehicle or engine, worked out on first use; None where it has errors,
    /// which have been reported.
    pub(crate) fn world(&mut self, block: BlockId) -> Option<World> {
        let _ = block;
        None
    }

    pub(crate) fn vehicle(&mut self, block: BlockId) -> Option<Vehicle> {
        let _ = block;
        None
    }

    pub(crate) fn engine(&mut self, block: BlockId) -> Option<Engine> {
        let _ = block;
        None
    }

    /// For a mission in a world with air: reports each engine of the vehicle that says nothing
    /// about sea level, and a vehicle that says nothing about drag. `flies` is the place of the
    /// mission's `flies` fact.
    pub(crate) fn check_in_air(&mut self, vehicle: BlockId, world: BlockId, flies: Span) {
        let _ = (vehicle, world, flies);
    }

    /// Facts recorded and blocks looked up from here to [`Context::leave`] belong to this block
    /// (a mission); see [`Context::facts_of`].
    pub(crate) fn enter(&mut self, block: BlockId) {
        let _ = block;
    }

    pub(crate) fn leave(&mut self) {}

    /// Reports a statement that has no place in a block of this kind, or a key that no fact of it
    /// has, with the nearest of `keys`.
    pub(crate) fn misplaced(&mut self, kind: BlockKind, span: Span, statement: &Statement, keys: &[&str]) {
        let _ = (kind, span, statement, keys);
    }

    /// Reports a fact that a block lacks: `what` it is ("the payload") and how one writes it
    /// ("payload  132 kg").
    pub(crate) fn missing(&mut self, block: BlockId, what: &str, example: &str) {
        let _ = (block, what, example);
    }
}
