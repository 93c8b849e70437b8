//! Definitions and the scopes in which their names are in reach.

use crate::source::Span;
use crate::syntax::{Block, Given, Line};

/// Index into the scopes of a compilation: one for each file, one on top of it for each mission.
#[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord, Hash)]
pub(crate) struct ScopeId(pub u32);

/// Index into the blocks of a compilation, phases excepted.
#[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord, Hash)]
pub(crate) struct BlockId(pub u32);

/// A block and the scope in which its lines are read: that of its file, or a mission's own.
#[derive(Clone, Copy, Debug)]
pub(crate) struct Definition<'a> {
    pub block: &'a Block,
    pub scope: ScopeId,
}

/// A line of a block, its own or inherited through `like`.
#[derive(Clone, Copy, Debug)]
pub(crate) struct Inherited<'a> {
    pub line: &'a Line,
    /// Where the names in the line are looked up: the scope of the block that states it.
    pub scope: ScopeId,
    /// The block that states it.
    pub from: BlockId,
}

/// A `given` in reach.
#[derive(Clone, Copy, Debug)]
pub(crate) struct GivenDefinition<'a> {
    pub given: &'a Given,
    pub because: Option<&'a crate::syntax::Because>,
    pub scope: ScopeId,
}

impl Definition<'_> {
    pub fn name_span(&self) -> Span {
        self.block.name.span
    }
}
