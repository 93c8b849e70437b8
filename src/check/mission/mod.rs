//! Missions: from their lines to the model, and whether the phases can be flown in their order.

mod asked;
mod condition;
mod formula;
mod knob;
mod order;
mod phase;
mod start;
mod steer;

use std::collections::BTreeMap;

use super::{BlockId, Bound, Context, Inherited, Key, ScopeId, Stated};
use crate::diagnostics::codes::{impossible_epoch, missing_fact, unknown_name};
use crate::model::{Epoch, Mission, Phase, Start, Vehicle, World};
use crate::quantity::Dimension;
use crate::source::Span;
use crate::syntax::{Block, BlockKind, ExprKind, Name, Operand, Statement};
use crate::world::DateTime;

const KEYS: &[Key] = &[
    Key::new("flies", "flies  Rowan"),
    Key::new("within", "within  Earth"),
    Key::new("epoch", "epoch  2027-05-14T09:30:00Z").instant(),
    Key::new("payload", "payload  132 kg"),
    Key::new("adapter", "adapter  9.5 kg"),
];

/// Words that may begin a line of a mission, beside the settings.
const WORDS: &[&str] =
    &["start", "given", "phase", "knob", "aim", "most", "least", "demand", "figure", "headline"];

/// What the lines of a mission are read against.
pub(super) struct Site<'a> {
    pub block: BlockId,
    pub vehicle: Vehicle,
    pub world: World,
    /// Place of `within`, for what the world has not.
    pub within: Span,
    /// Of a start from a pad, rad.
    pub latitude: Option<f64>,
    pub phases: Vec<PhaseBlock<'a>>,
    /// The first phase that sheds a part of this name, and where it says so.
    pub sheds: BTreeMap<&'a str, (usize, Span)>,
    /// Every figure of the mission, and where its name stands.
    pub figure_names: BTreeMap<&'a str, Span>,
    /// Figures stated so far: name, dimension (None where it has errors) and unit.
    pub figures: Vec<(String, Option<Dimension>, String)>,
}

/// A phase as it stands in the tree.
#[derive(Clone, Copy)]
pub(super) struct PhaseBlock<'a> {
    pub block: &'a Block,
    pub scope: ScopeId,
}

impl Site<'_> {
    /// Index of a phase by its name.
    pub fn phase(&self, name: &str) -> Option<usize> {
        self.phases.iter().position(|phase| phase.block.name.text == name)
    }

    /// Index of a part of the vehicle by its name.
    pub fn part(&self, name: &str) -> Option<usize> {
        self.vehicle.parts.iter().position(|part| part.name == name)
    }
}

impl<'a> Context<'a> {
    /// The checked mission; None where it has errors, which have been reported.
    pub(super) fn mission(&mut self, block: BlockId) -> Option<Mission> {
        let before = self.diagnostics.len();
        self.enter(block);
        self.naming.push(Vec::new());
        let mission = self.mission_within(block);
        let read = self.naming.pop().unwrap_or_default();
        self.leave();
        if let Some(mission) = &mission {
            self.check_knobs(block, &mission.knobs, read);
        }
        let facts = self.facts_of(block);
        let broken =
            self.definition(block).block.lines.iter().any(|line| matches!(line.statement, Statement::Broken));
        let clean = self.diagnostics[before.min(self.diagnostics.len())..]
            .iter()
            .all(|found| found.severity() == crate::diagnostics::Severity::Warning);
        mission.filter(|_| clean && !broken).map(|mission| Mission { facts, ..mission })
    }

    fn mission_within(&mut self, block: BlockId) -> Option<Mission> {
        let mut start = None;
        let mut asked: Vec<Inherited<'a>> = Vec::new();
        let mut phases: Vec<PhaseBlock<'a>> = Vec::new();
        let sheet = self.sheet(block, KEYS, WORDS, |inherited| {
            match &inherited.line.statement {
                Statement::Start { .. } => start = Some(inherited),
                Statement::Given(_) => {}
                Statement::Block(inner) if inner.kind == BlockKind::Phase => {
                    phases.push(PhaseBlock { block: inner, scope: inherited.scope });
                }
                Statement::Knob { .. }
                | Statement::Aim { .. }
                | Statement::Objective { .. }
                | Statement::Demand { .. }
                | Statement::Figure { .. }
                | Statement::Headline(_) => asked.push(inherited),
                _ => return false,
            }
            true
        });
        let vehicle =
            self.named_block(block, sheet.get("flies"), BlockKind::Vehicle, "its vehicle", "flies  Rowan");
        let world =
            self.named_block(block, sheet.get("within"), BlockKind::World, "its world", "within  Earth");
        let payload = match sheet.get("payload") {
            Some(stated) => {
                let value = self.number_of(&stated, "payload", Dimension::MASS, "the payload");
                self.bounded(value, Bound::NotNegative, "the payload")
            }
            None => {
                self.missing(block, "its payload", "payload  132 kg");
                None
            }
        };
        let adapter = sheet.get("adapter").map(|stated| {
            let value = self.number_of(&stated, "adapter", Dimension::MASS, "the adapter");
            self.bounded(value, Bound::NotNegative, "the adapter")
        });
        let epoch = sheet.get("epoch").and_then(|stated| self.epoch(&stated));
        if phases.is_empty() {
            self.missing(block, "a phase", "phase Rise { burn Bracken; steer upright; until 6 s }");
        }
        let ((vehicle_block, flies), (world_block, within)) = (vehicle?, world?);
        let (vehicle, world) = (self.vehicle(vehicle_block), self.world(world_block));
        self.check_in_air(vehicle_block, world_block, flies);
        let mut site = Site {
            block,
            vehicle: vehicle?,
            world: world?,
            within,
            latitude: None,
            sheds: sheds(&phases),
            figure_names: BTreeMap::new(),
            phases,
            figures: Vec::new(),
        };
        let start = match start {
            Some(line) => self.start(&site, line),
            None => {
                self.missing(
                    block,
                    "its start",
                    "start  pad latitude 58.2 deg longitude -11.6 deg altitude 45 m",
                );
                None
            }
        };
        if let Some(Start::Pad { latitude, .. }) = &start {
            site.latitude = Some(latitude.si);
        }
        let flown = self.phases(&site);
        let asked = self.asked(&mut site, &asked);
        if let Some(flown) = &flown
            && !self.incomplete.contains(&block)
        {
            self.check_order(&site, flown);
        }
        let (model_phases, asked) = (sound(flown?)?, asked?);
        let definition = self.definition(block).block;
        let mission = Mission {
            name: definition.name.text.clone(),
            place: self.place(definition.name.span),
            world: site.world,
            vehicle: site.vehicle,
            start: start?,
            epoch,
            payload: payload?,
            adapter: match adapter {
                Some(adapter) => Some(adapter?),
                None => None,
            },
            phases: model_phases,
            demands: asked.demands,
            figures: asked.figures,
            aims: asked.aims,
            knobs: asked.knobs,
            objective: asked.objective,
            headline: asked.headline,
            facts: Vec::new(),
        };
        Some(mission)
    }

    /// The block that a line such as `flies Rowan` names, and the line's place.
    fn named_block(
        &mut self,
        mission: BlockId,
        stated: Option<Stated<'a>>,
        kind: BlockKind,
        what: &str,
        example: &str,
    ) -> Option<(BlockId, Span)> {
        let Some(stated) = stated else {
            self.missing(mission, what, example);
            return None;
        };
        match stated.expr().map(|expr| &expr.kind) {
            Some(ExprKind::Path(path)) if path.parts.len() == 1 => {
                let block = self.find_block(stated.scope, kind, &path.parts[0])?;
                Some((block, stated.span))
            }
            Some(ExprKind::Broken) => None,
            _ => {
                self.report(missing_fact::no_value(stated.setting.key.span, what, example));
                None
            }
        }
    }

    fn epoch(&mut self, stated: &Stated<'a>) -> Option<Epoch> {
        let Some(Operand::Instant(span)) = stated.setting.value else {
            let span = stated.expr().map_or(stated.setting.key.span, |expr| expr.span);
            self.report(impossible_epoch::found(span, "an instant is written as 2027-05-14T09:30:00Z"));
            return None;
        };
        let written = self.text(span).to_string();
        match DateTime::parse(&written) {
            Ok(instant) => {
                Some(Epoch { julian_date: instant.julian_date(), written, place: self.place(span) })
            }
            Err(error) => {
                self.report(impossible_epoch::found(span, &error.to_string()));
                None
            }
        }
    }

    /// A part of the vehicle by its name.
    fn part(&mut self, site: &Site<'a>, name: &Name) -> Option<usize> {
        let found = site.part(&name.text);
        if found.is_none() {
            let near = self
                .nearest(&name.text, |_| site.vehicle.parts.iter().map(|part| part.name.as_str()).collect());
            let near = near.map(str::to_string);
            let kind = format!("a part of `{}`", site.vehicle.name);
            self.report(unknown_name::found(
                name.span,
                &kind,
                &name.text,
                near.as_deref().map(|near| (near, None)),
            ));
        }
        found
    }

    /// A phase of the mission by its name.
    fn phase_named(&mut self, site: &Site<'a>, name: &Name) -> Option<usize> {
        let found = site.phase(&name.text);
        if found.is_none() {
            let names: Vec<&str> = site.phases.iter().map(|phase| phase.block.name.text.as_str()).collect();
            let near = self.nearest(&name.text, |_| names);
            let near = near.map(str::to_string);
            let near = near.as_deref().map(|near| {
                let defined = site.phase(near).map(|index| site.phases[index].block.name.span);
                (near, defined)
            });
            self.report(unknown_name::found(name.span, "a phase of this mission", &name.text, near));
        }
        found
    }
}

fn sound(phases: Vec<phase::Checked>) -> Option<Vec<Phase>> {
    phases.into_iter().map(|phase| phase.sound.then_some(phase.model)).collect()
}

fn sheds<'a>(phases: &[PhaseBlock<'a>]) -> BTreeMap<&'a str, (usize, Span)> {
    let mut first = BTreeMap::new();
    for (index, phase) in phases.iter().enumerate() {
        for line in &phase.block.lines {
            if let Statement::Shed { part, .. } = &line.statement {
                first.entry(part.text.as_str()).or_insert((index, line.span));
            }
        }
    }
    first
}
