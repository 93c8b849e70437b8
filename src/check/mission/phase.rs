//! Phases: what burns, how it steers, what ends it.

use super::formula::Speaks;
use super::{PhaseBlock, Site};
use crate::check::{Bound, Context, Inherited, Key, ScopeId, Want};
use crate::diagnostics::codes::{
    burn_or_coast, circular_definition, engine_count, foreign_fact, hold_not_by_throttle, missing_fact,
    throttle_out_of_range, unknown_fact,
};
use crate::model::{Burn, Condition, Formula, Hold, Light, Phase, Quantity, Shed, Steer, Value};
use crate::quantity::Dimension;
use crate::source::Span;
use crate::syntax::{self, Because, Block, BlockKind, Expr, Line, Name, Operand, Statement};

const WORDS: &[&str] = &["burn", "light", "coast", "steer", "throttle", "hold", "until", "shed"];

const THROTTLE: Key = Key::new("throttle", "throttle  70 %");

/// A phase whose parts are all known, with the places of what its rules speak of.
pub(super) struct Checked {
    /// Where it is not sound, without what has errors.
    pub model: Phase,
    pub sound: bool,
    pub name: Span,
    /// One for each burn, with whether it is `hot`.
    pub burns: Vec<(Span, bool)>,
    pub lights: Vec<(Span, bool)>,
    pub sheds: Vec<Span>,
    pub until: Span,
    pub throttle: Option<Span>,
}

/// The lines of a phase, sorted by what they say.
#[derive(Default)]
struct Lines<'a> {
    burns: Vec<(&'a syntax::Burn, &'a Line)>,
    lights: Vec<(&'a Name, &'a Expr, bool, &'a Line)>,
    coast: Option<Span>,
    steer: Option<(&'a syntax::Steer, &'a Line)>,
    throttle: Option<(&'a Expr, &'a Line)>,
    hold: Option<(&'a Expr, &'a Expr, &'a Line)>,
    until: Option<(&'a [syntax::Condition], &'a Line)>,
    sheds: Vec<(&'a Name, Option<&'a syntax::Condition>, &'a Line)>,
}

impl<'a> Context<'a> {
    /// None where it is not known which parts burn or are shed.
    pub(super) fn phases(&mut self, site: &Site<'a>) -> Option<Vec<Checked>> {
        let checked: Vec<_> = site.phases.iter().map(|phase| self.phase(site, *phase)).collect();
        checked.into_iter().collect()
    }

    fn phase(&mut self, site: &Site<'a>, phase: PhaseBlock<'a>) -> Option<Checked> {
        let PhaseBlock { block, scope } = phase;
        let name = block.name.text.as_str();
        let (stated, whole) = self.lines_with_base(site, block, &mut vec![name]);
        let lines = self.phase_lines(stated);
        let broken = !whole;
        match (lines.coast, lines.burns.first(), lines.lights.first()) {
            (Some(coast), Some((_, line)), _) | (Some(coast), None, Some((.., line))) => {
                self.report(burn_or_coast::both(coast, line.span));
            }
            (None, None, None) if !broken => self.report(burn_or_coast::neither(block.name.span, name)),
            _ => {}
        }
        let burns: Vec<_> =
            lines.burns.iter().map(|(burn, line)| self.burn(site, scope, name, burn, line)).collect();
        let lights: Vec<_> = lines
            .lights
            .iter()
            .map(|(part, at, _, line)| self.light_line(site, scope, name, part, at, line))
            .collect();
        let steer = match lines.steer {
            Some((steer, line)) => self.steer(site, scope, name, steer, line.because.as_ref()),
            None if lines.coast.is_some() => Some(Steer::Keep),
            None if broken => None,
            None => {
                let example = "steer  into airflow";
                self.report(missing_fact::found(block.name.span, name, "a phase", "how it steers", example));
                None
            }
        };
        let throttle =
            lines.throttle.map(|(expr, line)| self.commanded(scope, name, expr, line.because.as_ref()));
        let hold =
            lines.hold.map(|(quantity, limit, line)| self.hold(site, scope, name, (quantity, limit), line));
        let until = match lines.until {
            Some((conditions, line)) => self.until(site, scope, name, conditions, line),
            None if broken => None,
            None => {
                let example = "until  height >= 140 m";
                self.report(missing_fact::found(block.name.span, name, "a phase", "what ends it", example));
                None
            }
        };
        let sheds: Vec<_> = lines
            .sheds
            .iter()
            .map(|(part, when, line)| self.shed(site, scope, name, (part, *when), line))
            .collect();
        if broken {
            return None;
        }
        let sound = steer.is_some() && until.is_some() && throttle != Some(None) && hold != Some(None);
        let model = Phase {
            name: name.to_string(),
            place: self.place(block.name.span),
            burns: burns.into_iter().collect::<Option<_>>()?,
            lights: lights.into_iter().collect::<Option<_>>()?,
            steer: steer.unwrap_or(Steer::Keep),
            throttle: throttle.flatten(),
            hold: hold.flatten(),
            until: until.unwrap_or_default(),
            sheds: sheds.into_iter().collect::<Option<_>>()?,
        };
        Some(Checked {
            model,
            sound,
            name: block.name.span,
            burns: lines.burns.iter().map(|(burn, _)| (burn.part.span, burn.hot)).collect(),
            lights: lines.lights.iter().map(|(part, _, hot, _)| (part.span, *hot)).collect(),
            sheds: lines.sheds.iter().map(|(part, ..)| part.span).collect(),
            until: lines.until.map_or(block.name.span, |(_, line)| line.span),
            throttle: lines.throttle.map(|(expr, _)| expr.span),
        })
    }

    /// The lines of a phase, those that it takes over through `like` included, and whether all of
    /// them could be read.
    fn lines_with_base(
        &mut self,
        site: &Site<'a>,
        block: &'a Block,
        chain: &mut Vec<&'a str>,
    ) -> (Vec<&'a Line>, bool) {
        let own = self.once(block);
        let whole = block.lines.iter().all(|line| !matches!(line.statement, Statement::Broken));
        let Some(like) = &block.like else { return (own, whole) };
        let base = match like.text == block.name.text {
            true => self.phase_before(site, block),
            false => {
                self.phase_named(site, like).and_then(|index| site.phases.get(index)).map(|one| one.block)
            }
        };
        let Some(base) = base else { return (own, false) };
        if base.name.text != block.name.text && chain.contains(&base.name.text.as_str()) {
            self.report(circular_definition::found(like.span, &like.text, Some(base.name.span)));
            return (own, false);
        }
        chain.push(&base.name.text);
        let (below, whole_below) = self.lines_with_base(site, base, chain);
        (self.over(below, own), whole && whole_below)
    }

    /// The phase of the same name in the mission that this one is like.
    fn phase_before(&mut self, site: &Site<'a>, block: &'a Block) -> Option<&'a Block> {
        let definition = self.definition(site.block);
        let like = block.like.as_ref()?;
        let base = match &definition.block.like {
            Some(mission) => {
                let base = self.find_block(definition.scope, BlockKind::Mission, mission)?;
                self.lines(base).into_iter().find_map(|Inherited { line, .. }| match &line.statement {
                    Statement::Block(phase) if phase.name.text == like.text => Some(phase),
                    _ => None,
                })
            }
            None => None,
        };
        let base = base.filter(|base| !std::ptr::eq(*base, block));
        if base.is_none() {
            self.report(circular_definition::found(like.span, &like.text, Some(block.name.span)));
        }
        base
    }

    fn phase_lines(&mut self, stated: Vec<&'a Line>) -> Lines<'a> {
        let mut lines = Lines::default();
        for line in stated {
            match &line.statement {
                Statement::Burn(burns) => lines.burns.extend(burns.iter().map(|burn| (burn, line))),
                Statement::Light { part, at, hot } => lines.lights.push((part, at, *hot, line)),
                Statement::Coast => lines.coast = Some(line.span),
                Statement::Steer(steer) => lines.steer = Some((steer, line)),
                Statement::Hold { quantity, limit } => lines.hold = Some((quantity, limit, line)),
                Statement::Until(conditions) => lines.until = Some((conditions, line)),
                Statement::Shed { part, when } => lines.sheds.push((part, when.as_ref(), line)),
                Statement::Setting(setting) if setting.key.text == THROTTLE.name => {
                    self.check_form(setting, THROTTLE);
                    match &setting.value {
                        Some(Operand::Expr(expr)) => lines.throttle = Some((expr, line)),
                        Some(Operand::Instant(_)) => {}
                        None => {
                            let key = setting.key.span;
                            self.report(missing_fact::no_value(key, "the throttle", THROTTLE.example));
                        }
                    }
                }
                Statement::Setting(setting) => {
                    let near = self.nearest(&setting.key.text, |_| WORDS.to_vec());
                    let key = &setting.key;
                    self.report(unknown_fact::found(key.span, &key.text, "a phase", WORDS, near));
                }
                Statement::Broken => {}
                _ => self.report(foreign_fact::found(line.span, self.text(line.span), "a phase", WORDS)),
            }
        }
        lines
    }

    fn burn(
        &mut self,
        site: &Site<'a>,
        scope: ScopeId,
        phase: &str,
        burn: &syntax::Burn,
        line: &Line,
    ) -> Option<Burn> {
        let part = self.burnable_part(site, &burn.part)?;
        let engines = match &burn.engines {
            None => None,
            Some((lit, all)) => {
                let path = format!("{phase}.{}.engines", burn.part.text);
                let what = "the number of engines lit";
                let because = line.because.as_ref();
                let value = self.fact(scope, &path, lit, Want::NUMBER, what, because);
                let lit_engines = self.bounded(value, Bound::WholeFrom(1.0), what);
                let all_engines = self.constant(scope, all, Want::NUMBER, "the number of engines");
                let carried = site.vehicle.parts[part].propulsion.as_ref()?.engines.si;
                let (value, counted) = (lit_engines?, all_engines?);
                if counted != carried || value.si > carried {
                    let carried = format!("{carried}");
                    self.report(engine_count::found(lit.span.to(all.span), &burn.part.text, &carried));
                    return None;
                }
                Some(value)
            }
        };
        Some(Burn { part: part as u32, engines })
    }

    fn light_line(
        &mut self,
        site: &Site<'a>,
        scope: ScopeId,
        phase: &str,
        part: &Name,
        at: &Expr,
        line: &Line,
    ) -> Option<Light> {
        let path = format!("{phase}.light.{}", part.text);
        let what = "the time of lighting";
        let at = self.fact(scope, &path, at, Dimension::TIME, what, line.because.as_ref());
        let at = self.bounded(at, Bound::NotNegative, what);
        let part = self.burnable_part(site, part)?;
        Some(Light { part: part as u32, at: at? })
    }

    /// A part that has engines.
    fn burnable_part(&mut self, site: &Site<'a>, name: &Name) -> Option<usize> {
        let part = self.part(site, name)?;
        if site.vehicle.parts[part].propulsion.is_none() {
            self.report(engine_count::none(name.span, &name.text));
            return None;
        }
        Some(part)
    }

    fn commanded(
        &mut self,
        scope: ScopeId,
        phase: &str,
        expr: &Expr,
        because: Option<&Because>,
    ) -> Option<Value> {
        let path = format!("{phase}.throttle");
        let value = self.fact(scope, &path, expr, Want::PERCENT, "the throttle", because)?;
        if value.si <= 0.0 {
            self.report(throttle_out_of_range::found(expr.span, self.text(expr.span), "more than 0 %"));
            return None;
        }
        Some(value)
    }

    fn hold(
        &mut self,
        site: &Site<'a>,
        scope: ScopeId,
        phase: &str,
        (quantity, limit): (&Expr, &Expr),
        line: &Line,
    ) -> Option<Hold> {
        let built = self.formula(site, scope, quantity, Speaks::Instant)?;
        let held = match &built.formula {
            Formula::Reading { reading } => matches!(
                reading.quantity,
                Quantity::Acceleration
                    | Quantity::AxialAcceleration
                    | Quantity::ThrustToWeight
                    | Quantity::Thrust
            ),
            _ => false,
        };
        if !held {
            self.report(hold_not_by_throttle::found(quantity.span, self.text(quantity.span)));
            return None;
        }
        let path = format!("{phase}.hold");
        let asked = (quantity.span, built.dimension, "the limit of the hold");
        let because = line.because.as_ref();
        let held = self.limit_of(site, scope, (&path, limit), Speaks::Constant, asked, because)?;
        self.require((limit, &held), |limit| limit > 0.0, ("the limit of the hold", "more than zero"))?;
        Some(Hold { quantity: built.formula, limit: held, place: self.place(line.span) })
    }

    fn until(
        &mut self,
        site: &Site<'a>,
        scope: ScopeId,
        phase: &str,
        conditions: &[syntax::Condition],
        line: &Line,
    ) -> Option<Vec<Condition>> {
        let because = line.because.as_ref();
        let built: Vec<_> = conditions
            .iter()
            .enumerate()
            .map(|(index, condition)| {
                let path = match index {
                    0 => format!("{phase}.until"),
                    _ => format!("{phase}.until.{}", index + 1),
                };
                self.condition(site, scope, &path, condition, because)
            })
            .collect();
        built.into_iter().collect()
    }

    fn shed(
        &mut self,
        site: &Site<'a>,
        scope: ScopeId,
        phase: &str,
        (part, when): (&Name, Option<&syntax::Condition>),
        line: &Line,
    ) -> Option<Shed> {
        let path = format!("{phase}.shed.{}", part.text);
        let when = when.map(|when| self.condition(site, scope, &path, when, line.because.as_ref()));
        let part = self.part(site, part)?;
        let when = match when {
            Some(when) => Some(when?),
            None => None,
        };
        Some(Shed { part: part as u32, when, place: self.place(line.span) })
    }
}
