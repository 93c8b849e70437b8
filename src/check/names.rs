//! Definitions, and the scopes in which their names are in reach.

use std::collections::BTreeMap;

use super::{Context, Inherited};
use crate::diagnostics::codes::{duplicate_name, not_in_file, unknown_name, wrong_kind};
use crate::source::{FileId, Span};
use crate::syntax::{
    Because, Block, BlockKind, Bring, BringFrom, Given, Item, Name, Statement, Tree, UnitDefinition,
};

/// Index into the scopes of a compilation: one for each file (of the same number), and on top of a
/// file's scope one for each mission whose lines stand there.
#[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord, Hash)]
pub(crate) struct ScopeId(pub u32);

/// Index into the blocks of a compilation, phases excepted.
#[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord, Hash)]
pub(crate) struct BlockId(pub u32);

/// Index into the givens of a compilation.
#[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord, Hash)]
pub(super) struct GivenId(pub u32);

/// A block and the scope in which its own lines are read.
#[derive(Clone, Copy, Debug)]
pub(crate) struct Definition<'a> {
    pub block: &'a Block,
    pub scope: ScopeId,
}

/// A `given` and the scope in which its value is read.
#[derive(Clone, Copy, Debug)]
pub(super) struct GivenDefinition<'a> {
    pub given: &'a Given,
    pub because: Option<&'a Because>,
    pub scope: ScopeId,
}

/// What a name stands for.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub(super) enum Meaning {
    Block(BlockId),
    Given(GivenId),
    /// Its definition is broken, or could not be brought; that has been reported.
    Broken,
}

#[derive(Clone, Copy, Debug)]
pub(super) struct Named {
    pub meaning: Meaning,
    /// The name where it is defined, in this file or another.
    pub defined: Span,
    /// The name in this file: its definition, or the word in `bring`.
    pub here: Span,
}

#[derive(Debug)]
pub(super) struct Scope<'a> {
    /// The file's scope; itself for the scope of a file.
    pub file: ScopeId,
    /// Whose givens come first.
    pub mission: Option<BlockId>,
    /// Empty for a mission, whose names are those of the file.
    pub names: BTreeMap<&'a str, Named>,
    /// Units that the file defines or brings, in the order of the source.
    pub units: Vec<(&'a UnitDefinition, FileId)>,
}

/// What a block is called in diagnostics.
pub(super) fn kind_words(kind: BlockKind) -> &'static str {
    match kind {
        BlockKind::World => "a world",
        BlockKind::Engine => "an engine",
        BlockKind::Curve => "a curve",
        BlockKind::Stage => "a stage",
        BlockKind::Vehicle => "a vehicle",
        BlockKind::Mission => "a mission",
        BlockKind::Phase => "a phase",
    }
}

impl<'a> Context<'a> {
    /// Collects the names of every file, then those that are brought, then the givens of missions.
    pub(super) fn collect_names(&mut self, trees: &'a [Tree]) {
        for (number, tree) in trees.iter().enumerate() {
            let scope = ScopeId(number as u32);
            self.scopes.push(Scope { file: scope, mission: None, names: BTreeMap::new(), units: Vec::new() });
            for item in &tree.items {
                self.collect_item(scope, item);
            }
        }
        for (number, tree) in trees.iter().enumerate() {
            for item in &tree.items {
                if let Item::Bring(bring) = item {
                    self.collect_bring(ScopeId(number as u32), bring);
                }
            }
        }
        for number in 0..self.definitions.len() {
            let block = BlockId(number as u32);
            if self.definition(block).block.kind == BlockKind::Mission {
                self.collect_mission(block);
            }
        }
    }

    fn collect_item(&mut self, scope: ScopeId, item: &'a Item) {
        match item {
            Item::Block(block) => {
                let id = BlockId(self.definitions.len() as u32);
                self.definitions.push(Definition { block, scope });
                self.define(scope, &block.name, Meaning::Block(id), block.name.span);
            }
            Item::Given(given, because) => {
                let id = self.add_given(given, because.as_ref(), scope);
                self.define(scope, &given.name, Meaning::Given(id), given.name.span);
            }
            Item::Unit(unit) => {
                let file = FileId(scope.0);
                self.scope_mut(scope).units.push((unit, file));
            }
            Item::Bring(_) => {}
            Item::Broken(span) => self.define_broken(scope, *span),
        }
    }

    /// What a broken item may have defined is not reported as unknown where it is used.
    fn define_broken(&mut self, scope: ScopeId, span: Span) {
        let is_word = |c: char| c.is_alphanumeric() || c == '_';
        for line in self.text(span).lines() {
            let mut words = line.split(|c: char| !is_word(c)).filter(|word| !word.is_empty());
            let opens = words.next().is_some_and(|first| {
                ["world", "engine", "curve", "stage", "vehicle", "mission", "given"].contains(&first)
            });
            if let (true, Some(name)) = (opens, words.next()) {
                let named = Named { meaning: Meaning::Broken, defined: span, here: span };
                self.scope_mut(scope).names.entry(name).or_insert(named);
            }
        }
    }

    fn define(&mut self, scope: ScopeId, name: &'a Name, meaning: Meaning, defined: Span) {
        let named = Named { meaning, defined, here: name.span };
        let names = &mut self.scope_mut(scope).names;
        match names.get(name.text.as_str()) {
            // The same definition brought twice does no harm.
            Some(first) if first.meaning == meaning => {}
            Some(first) if first.meaning != Meaning::Broken => {
                let first = first.here;
                self.report(duplicate_name::found(name.span, &name.text, first));
            }
            _ => {
                names.insert(&name.text, named);
            }
        }
    }

    fn collect_bring(&mut self, scope: ScopeId, bring: &'a Bring) {
        let (from, shown) = match &bring.from {
            BringFrom::Builtin(span) => (*span, "builtin"),
            BringFrom::File(path) => (path.span, path.text.as_str()),
        };
        let target = self.links.get(&from).map(|file| ScopeId(file.0));
        for name in &bring.names {
            let Some(target) = target else {
                self.define(scope, name, Meaning::Broken, name.span);
                continue;
            };
            let brought = self.scope(target).names.get(name.text.as_str()).copied();
            // A name that the other file brings itself is not its own to give.
            let brought = brought.filter(|named| named.defined.file == FileId(target.0));
            let unit = self.scope(target).units.iter().find(|(unit, _)| unit.name.text == name.text).copied();
            match (brought, unit) {
                (Some(named), _) => self.define(scope, name, named.meaning, named.defined),
                (None, Some(unit)) => self.scope_mut(scope).units.push(unit),
                (None, None) => {
                    let near = self
                        .nearest(&name.text, |context| context.scope(target).names.keys().copied().collect());
                    self.report(not_in_file::found(name.span, &name.text, shown, near));
                    self.define(scope, name, Meaning::Broken, name.span);
                }
            }
        }
    }

    /// The givens of a mission, inherited ones included, each read where it is written.
    fn collect_mission(&mut self, mission: BlockId) {
        let own = self.mission_scope(mission, self.definition(mission).scope);
        if let Some(definition) = self.definitions.get_mut(mission.0 as usize) {
            definition.scope = own;
        }
        for Inherited { line, scope, .. } in self.lines(mission) {
            if let Statement::Given(given) = &line.statement {
                let id = self.add_given(given, line.because.as_ref(), scope);
                self.mission_givens.insert((mission, &given.name.text), id);
            }
        }
    }

    /// The scope of a mission's lines that stand in a file: the mission's givens, then the file's names.
    pub(super) fn mission_scope(&mut self, mission: BlockId, file: ScopeId) -> ScopeId {
        let file = self.scope(file).file;
        if let Some(known) = self.mission_scopes.get(&(mission, file)) {
            return *known;
        }
        let scope = ScopeId(self.scopes.len() as u32);
        self.scopes.push(Scope { file, mission: Some(mission), names: BTreeMap::new(), units: Vec::new() });
        self.mission_scopes.insert((mission, file), scope);
        scope
    }

    fn add_given(&mut self, given: &'a Given, because: Option<&'a Because>, scope: ScopeId) -> GivenId {
        self.givens.push(GivenDefinition { given, because, scope });
        GivenId(self.givens.len() as u32 - 1)
    }

    pub(super) fn scope(&self, scope: ScopeId) -> &Scope<'a> {
        // invariant: only this file makes a ScopeId, as an index into this list.
        &self.scopes[scope.0 as usize]
    }

    fn scope_mut(&mut self, scope: ScopeId) -> &mut Scope<'a> {
        // invariant: as above.
        &mut self.scopes[scope.0 as usize]
    }

    /// The block of an id that this compilation gave out, and the scope of its lines. For a mission
    /// that scope has the mission's own givens on top of the names of its file.
    pub(crate) fn definition(&self, block: BlockId) -> Definition<'a> {
        // invariant: only this file makes a BlockId, as an index into this list.
        self.definitions[block.0 as usize]
    }

    /// What a name stands for in the file of a scope.
    pub(super) fn named(&self, scope: ScopeId, name: &str) -> Option<Named> {
        self.scope(self.scope(scope).file).names.get(name).copied()
    }

    /// The given of a name: a mission's own first, then one of the file.
    pub(super) fn find_given(&self, scope: ScopeId, name: &str) -> Option<GivenId> {
        let own =
            self.scope(scope).mission.and_then(|mission| self.mission_givens.get(&(mission, name)).copied());
        own.or_else(|| match self.named(scope, name)?.meaning {
            Meaning::Given(given) => Some(given),
            _ => None,
        })
    }

    /// The givens that stand outside every block, in the order of the source.
    pub(super) fn file_givens(&self) -> Vec<GivenId> {
        let numbered = (0..self.givens.len() as u32).map(GivenId).zip(&self.givens);
        let of_files = numbered.filter(|(_, given)| self.scope(given.scope).mission.is_none());
        of_files.map(|(id, _)| id).collect()
    }

    /// The givens that a mission states or inherits, in the order of its lines.
    pub(super) fn givens_of(&mut self, mission: BlockId) -> Vec<(&'a str, GivenId)> {
        let lines = self.lines(mission).into_iter();
        let names = lines.filter_map(|Inherited { line, .. }| match &line.statement {
            Statement::Given(given) => Some(given.name.text.as_str()),
            _ => None,
        });
        names.filter_map(|name| Some((name, *self.mission_givens.get(&(mission, name))?))).collect()
    }

    /// The block of a kind that a name stands for; reports a name that is unknown or of another kind.
    pub(crate) fn find_block(&mut self, scope: ScopeId, kind: BlockKind, name: &Name) -> Option<BlockId> {
        let named = self.named(scope, &name.text);
        match named.map(|named| named.meaning) {
            Some(Meaning::Block(block)) if self.definition(block).block.kind == kind => return Some(block),
            Some(Meaning::Broken) => return None,
            _ => {}
        }
        let kind_word = kind_words(kind);
        match named {
            Some(Named { meaning, defined, .. }) => {
                let found = match meaning {
                    Meaning::Block(block) => kind_words(self.definition(block).block.kind),
                    _ => "a given value",
                };
                self.report(wrong_kind::found(name.span, &name.text, kind_word, found, defined));
            }
            None => {
                let near = self.nearest_block(scope, kind, &name.text);
                let near = near.map(|block| self.definition(block).block.name.clone());
                let near = near.as_ref().map(|near| (near.text.as_str(), Some(near.span)));
                self.report(unknown_name::found(name.span, kind_word, &name.text, near));
            }
        }
        None
    }

    fn nearest_block(&mut self, scope: ScopeId, kind: BlockKind, name: &str) -> Option<BlockId> {
        let near = self.nearest(name, |context| {
            let names = &context.scope(context.scope(scope).file).names;
            let of_kind = names.iter().filter(|(_, named)| match named.meaning {
                Meaning::Block(block) => context.definition(block).block.kind == kind,
                _ => false,
            });
            of_kind.map(|(name, _)| *name).collect()
        })?;
        match self.named(scope, near)?.meaning {
            Meaning::Block(block) => Some(block),
            _ => None,
        }
    }

    /// The nearest of some names, if one is close. The work on unknown names is bounded: a source
    /// full of them soon gets no more advice.
    pub(super) fn nearest<'n>(
        &mut self,
        name: &str,
        among: impl FnOnce(&mut Self) -> Vec<&'n str>,
    ) -> Option<&'n str> {
        if self.nearest_budget == 0 {
            return None;
        }
        let among = among(self);
        self.nearest_budget = self.nearest_budget.saturating_sub(among.len());
        crate::diagnostics::nearest(name, among.into_iter())
    }
}
