//! The lines of a block: its own, and those that it inherits through `like`.

use std::collections::HashMap;

use super::names::Meaning;
use super::{BlockId, Context, ScopeId};
use crate::diagnostics::codes::{circular_definition, repeated_fact, too_deep};
use crate::source::Span;
use crate::syntax::{Ambient, Block, BlockKind, Line, Name, Statement};

/// A line of a block, its own or inherited through `like`.
#[derive(Clone, Copy, Debug)]
pub(crate) struct Inherited<'a> {
    pub line: &'a Line,
    /// Where the names in the line are looked up: the file that states it, and over it the givens
    /// of the mission that has it now.
    pub scope: ScopeId,
    /// The block that states it.
    pub from: BlockId,
}

/// How many definitions may be stacked on each other with `like`.
const GENERATIONS: usize = 64;

/// What a line states. Of two lines with the same key one takes the place of the other.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
enum Key<'a> {
    /// A fact, apart in vacuum and at sea level.
    Fact(&'a str, Option<bool>),
    /// One of several of a kind, by its name.
    Named(&'static str, &'a str),
}

impl<'a> Context<'a> {
    /// The lines of a block, those that it inherits through `like` included; of two lines that state
    /// the same fact the block's own stands, in the place of the other. A fact given twice within
    /// one block is reported, and the first stands. Broken lines are left out.
    pub(crate) fn lines(&mut self, block: BlockId) -> Vec<Inherited<'a>> {
        if let Some(known) = self.lines.get(&block) {
            return known.clone();
        }
        let mut merged: Vec<Inherited<'a>> = Vec::new();
        let mut places = HashMap::new();
        let kind = self.definition(block).block.kind;
        for from in self.ancestry(block).into_iter().rev() {
            let own = self.definition(from);
            let scope = match kind {
                BlockKind::Mission => self.mission_scope(block, own.scope),
                _ => own.scope,
            };
            if own.block.lines.iter().any(|line| matches!(line.statement, Statement::Broken)) {
                self.incomplete.insert(block);
            }
            let lines = self.once(own.block);
            if lines.iter().any(|line| is_table(&line.statement)) {
                merged.retain(|before| !is_table(&before.line.statement));
                places = merged
                    .iter()
                    .enumerate()
                    .filter_map(|(at, one)| Some((self.key(one.line)?, at)))
                    .collect();
            }
            for line in lines {
                let inherited = Inherited { line, scope, from };
                match self.key(line).map(|key| (key, places.get(&key).copied())) {
                    Some((_, Some(at))) => merged[at] = inherited, // invariant: an index into `merged`
                    Some((key, None)) => {
                        places.insert(key, merged.len());
                        merged.push(inherited);
                    }
                    None => merged.push(inherited),
                }
            }
        }
        self.lines.insert(block, merged.clone());
        merged
    }

    /// The block, what it is like, what that is like, and so on.
    fn ancestry(&mut self, block: BlockId) -> Vec<BlockId> {
        let mut chain = vec![block];
        let mut current = self.definition(block);
        while let Some(like) = &current.block.like {
            let next = self.find_block(current.scope, current.block.kind, like);
            let Some(next) = next.filter(|next| self.may_follow(&chain, *next, like)) else {
                self.incomplete.insert(block);
                break;
            };
            chain.push(next);
            current = self.definition(next);
        }
        chain
    }

    /// Reports a chain of `like` that closes a circle or grows too long.
    fn may_follow(&mut self, chain: &[BlockId], next: BlockId, like: &Name) -> bool {
        if chain.contains(&next) {
            let defined = self.definition(next).block.name.span;
            self.report(circular_definition::found(like.span, &like.text, Some(defined)));
            return false;
        }
        if chain.len() == GENERATIONS {
            self.report(too_deep::found(like.span));
            return false;
        }
        true
    }

    /// The lines of one block without the broken ones and without repetitions, which are reported.
    pub(crate) fn once(&mut self, block: &'a Block) -> Vec<&'a Line> {
        let mut first: HashMap<Key<'a>, Span> = HashMap::new();
        let mut lines = Vec::new();
        for line in &block.lines {
            if matches!(line.statement, Statement::Broken) {
                continue;
            }
            if let Some(key) = self.key(line) {
                if let Some(before) = first.get(&key).copied() {
                    self.report(repeated_fact::found(line.span, &self.key_words(key), before));
                    continue;
                }
                first.insert(key, line.span);
            }
            lines.push(line);
        }
        lines
    }

    /// The lines of a phase over those of the phase that it is like: of two lines that state the same
    /// fact its own stands, and a phase that coasts keeps no burn.
    pub(crate) fn over(&self, mut below: Vec<&'a Line>, own: Vec<&'a Line>) -> Vec<&'a Line> {
        let burns = |line: &Line| matches!(line.statement, Statement::Burn(_) | Statement::Light { .. });
        let coasts = |line: &Line| matches!(line.statement, Statement::Coast);
        if own.iter().any(|line| burns(line)) {
            below.retain(|line| !coasts(line));
        }
        if own.iter().any(|line| coasts(line)) {
            below.retain(|line| !burns(line));
        }
        for line in own {
            let key = self.key(line);
            match below.iter_mut().find(|before| key.is_some() && self.key(before) == key) {
                Some(before) => *before = line,
                None => below.push(line),
            }
        }
        below
    }

    fn key_words(&self, key: Key<'a>) -> String {
        match key {
            Key::Fact(name, None) => name.to_string(),
            Key::Fact(name, Some(true)) => format!("{name} in vacuum"),
            Key::Fact(name, Some(false)) => format!("{name} at sea_level"),
            Key::Named(word, name) => format!("{word} {name}"),
        }
    }

    /// What a line states; None for lines that only add to each other.
    fn key(&self, line: &'a Line) -> Option<Key<'a>> {
        Some(match &line.statement {
            Statement::Setting(setting) => {
                let vacuum = setting.ambient.map(|(ambient, _)| ambient == Ambient::Vacuum);
                Key::Fact(&setting.key.text, vacuum)
            }
            Statement::Given(given) => Key::Named("given", &given.name.text),
            Statement::Engines { .. } => Key::Fact("engines", None),
            Statement::Stack(_) => Key::Fact("stack", None),
            Statement::Beside { group, .. } => Key::Named("beside", &group.text),
            Statement::Shroud { .. } => Key::Fact("shroud", None),
            Statement::Start { .. } => Key::Fact("start", None),
            Statement::Block(block) => Key::Named("phase", &block.name.text),
            Statement::Burn(_) => Key::Fact("burn", None),
            Statement::Coast => Key::Fact("coast", None),
            Statement::Steer(_) => Key::Fact("steer", None),
            Statement::Hold { .. } => Key::Fact("hold", None),
            Statement::Until(_) => Key::Fact("until", None),
            Statement::Shed { part, .. } => Key::Named("shed", &part.text),
            Statement::Knob { path, .. } => Key::Named("knob", self.text(path.span)),
            Statement::Aim { quantity, .. } => Key::Named("aim", self.text(quantity.span)),
            Statement::Objective { .. } => Key::Fact("most or least", None),
            Statement::Demand { name: Some(name), .. } => Key::Named("demand", &name.text),
            Statement::Figure { name, .. } => Key::Named("figure", &name.text),
            Statement::Headline(_) => Key::Fact("headline", None),
            Statement::Header { .. } => Key::Fact("header", None),
            Statement::From(_) => Key::Fact("from", None),
            Statement::Demand { name: None, .. } | Statement::Light { .. } | Statement::Row(_) => {
                return None;
            }
            Statement::Broken => return None,
        })
    }

    /// What a name means, where it is that of a block or of something broken.
    pub(super) fn block_named(&self, scope: ScopeId, name: &str) -> Option<Result<BlockId, ()>> {
        match self.named(scope, name)?.meaning {
            Meaning::Block(block) => Some(Ok(block)),
            Meaning::Broken => Some(Err(())),
            Meaning::Given(_) => None,
        }
    }
}

/// A curve that states rows of its own, or a file of them, keeps none of those that it inherits.
fn is_table(statement: &Statement) -> bool {
    matches!(statement, Statement::Row(_) | Statement::From(_))
}
