//! Whether the phases can be flown in their order: what burns is still there, free to burn, and may
//! be lit again.

use super::Site;
use super::formula::parts_read;
use super::phase::Checked;
use crate::check::Context;
use crate::diagnostics::codes::{
    absent_quantity, already_lit, already_shed, burnt_too_early, endless_phase, nothing_throttles,
    shed_while_burning, still_carried, throttle_out_of_range, too_many_restarts, unused_part,
};
use crate::model::{Condition, Engine, Part, Role};
use crate::source::Span;

/// What has become of the parts before a phase.
struct State {
    /// Where each part was shed.
    shed: Vec<Option<Span>>,
    /// Where each part was last lit anew, and how often that was.
    lit: Vec<(Option<Span>, u32)>,
    /// Burning at the end of the phase before.
    burning: Vec<usize>,
}

impl<'a> Context<'a> {
    pub(super) fn check_order(&mut self, site: &Site<'a>, phases: &[Checked]) {
        let parts = &site.vehicle.parts;
        let mut state =
            State { shed: vec![None; parts.len()], lit: vec![(None, 0); parts.len()], burning: Vec::new() };
        for phase in phases {
            self.check_burns(parts, phase, &mut state);
            self.check_throttle(parts, phase);
            self.check_end(parts, phase, &state);
            self.check_sheds(parts, phase, &mut state);
        }
        for (index, part) in parts.iter().enumerate() {
            if part.propulsion.is_some() && state.lit[index].1 == 0 {
                let name = &self.definition(site.block).block.name;
                self.report(unused_part::found(name.span, &part.name));
            }
        }
    }

    fn check_burns(&mut self, parts: &[Part], phase: &Checked, state: &mut State) {
        let burns = phase.model.burns.iter().map(|burn| burn.part as usize).zip(&phase.burns);
        let lights = phase.model.lights.iter().map(|light| light.part as usize).zip(&phase.lights);
        let mut lit: Vec<(usize, Span)> = Vec::new();
        for (light, (part, (span, hot))) in burns.map(|one| (false, one)).chain(lights.map(|one| (true, one)))
        {
            let name = &parts[part].name;
            if let Some(shed) = state.shed[part] {
                self.report(already_shed::found(*span, name, shed));
                continue;
            }
            if let Some((_, first)) = lit.iter().find(|(before, _)| *before == part) {
                self.report(already_lit::found(*span, name, *first));
                continue;
            }
            // What is lit within the phase may come after a shed within it.
            let below = below(parts, part, state).filter(|below| {
                !(light && phase.model.sheds.iter().any(|shed| shed.part as usize == *below))
            });
            if let (false, Some(below)) = (*hot, below) {
                self.report(burnt_too_early::found(*span, name, &parts[below].name));
            }
            // A `light` starts a burn of its own: between the phases the part was out.
            if light || !state.burning.contains(&part) {
                let (before, count) = state.lit[part];
                state.lit[part] = (Some(*span), count + 1);
                let restarts = engine(&parts[part]).and_then(|engine| engine.restarts);
                if let (Some(restarts), Some(before)) = (restarts, before)
                    && f64::from(count) > restarts.si
                {
                    self.report(too_many_restarts::found(*span, name, restarts.si as u32, before));
                }
            }
            lit.push((part, *span));
        }
        state.burning = lit.into_iter().map(|(part, _)| part).collect();
    }

    fn check_throttle(&mut self, parts: &[Part], phase: &Checked) {
        let lit = phase
            .model
            .burns
            .iter()
            .map(|burn| burn.part)
            .chain(phase.model.lights.iter().map(|light| light.part));
        let engines: Vec<&Engine> = lit.filter_map(|part| engine(&parts[part as usize])).collect();
        if phase.model.hold.is_some()
            && engines.iter().all(|engine| engine.throttle_least.si >= engine.throttle_most.si)
        {
            self.report(nothing_throttles::found(phase.name, &phase.model.name));
        }
        if let (Some(throttle), Some(span)) = (phase.model.throttle, phase.throttle) {
            if engines.is_empty() {
                self.report(nothing_throttles::coast(span, &phase.model.name));
            }
            for engine in engines {
                let (least, most) = (engine.throttle_least.si, engine.throttle_most.si);
                if !(least - 1e-12..=most + 1e-12).contains(&throttle.si) {
                    let range = format!("between {} % and {} %", round(least), round(most));
                    let range = format!("{range}, the range of `{}`", engine.name);
                    self.report(throttle_out_of_range::found(span, self.text(span), &range));
                    break;
                }
            }
        }
    }

    /// A phase that ends only by a part that does not burn in it never ends.
    fn check_end(&mut self, parts: &[Part], phase: &Checked, state: &State) {
        for condition in &phase.model.until {
            let read = match condition {
                Condition::Compare { quantity, limit, .. } => {
                    parts_read(quantity).into_iter().chain(parts_read(limit)).collect()
                }
                Condition::Spent { part } => vec![*part],
                _ => Vec::new(),
            };
            for part in read {
                if let Some(shed) = state.shed[part as usize] {
                    let name = &parts[part as usize].name;
                    self.report(absent_quantity::after_shed(phase.until, name, shed));
                    return;
                }
            }
        }
        let burns = |part: u32| {
            phase.model.burns.iter().any(|burn| burn.part == part)
                || phase.model.lights.iter().any(|light| light.part == part)
        };
        let endless = |condition: &Condition| matches!(condition, Condition::Spent { part } if !burns(*part));
        if !phase.model.until.is_empty() && phase.model.until.iter().all(endless) {
            let part = phase.model.until.iter().find_map(|condition| match condition {
                Condition::Spent { part } => Some(&parts[*part as usize].name),
                _ => None,
            });
            self.report(endless_phase::found(
                phase.until,
                &phase.model.name,
                part.map_or("", String::as_str),
            ));
        }
    }

    fn check_sheds(&mut self, parts: &[Part], phase: &Checked, state: &mut State) {
        // Those in flight come before those at the phase's end; at one instant strap-ons go first,
        // and stages from the bottom up.
        let mut order: Vec<usize> = (0..phase.sheds.len()).collect();
        order.sort_by_key(|index| {
            let shed = &phase.model.sheds[*index];
            (shed.when.is_none(), !matches!(parts[shed.part as usize].role, Role::Beside { .. }), shed.part)
        });
        for index in order {
            let (shed, span) = (&phase.model.sheds[index], phase.sheds[index]);
            let part = shed.part as usize;
            let name = &parts[part].name;
            if let Some(before) = state.shed[part] {
                self.report(already_shed::twice(span, name, before));
                continue;
            }
            let spent = matches!(shed.when, Some(Condition::Spent { part: of }) if of == shed.part);
            if shed.when.is_some() && !spent && state.burning.contains(&part) {
                self.report(shed_while_burning::found(span, name, state.lit[part].0));
            }
            for (other, carried) in parts.iter().enumerate() {
                let beside = matches!(carried.role, Role::Beside { carrier } if carrier as usize == part);
                if beside && state.shed[other].is_none() {
                    self.report(still_carried::found(span, name, &carried.name));
                }
            }
            if let (Role::Stack { .. }, Some(below)) = (&parts[part].role, below(parts, part, state)) {
                self.report(still_carried::below(span, name, &parts[below].name));
            }
            state.shed[part] = Some(span);
            state.burning.retain(|burning| *burning != part);
        }
    }
}

/// The lowest stage that is still there below a stage of the stack, or below what carries a strap-on.
fn below(parts: &[Part], part: usize, state: &State) -> Option<usize> {
    let carrier = match parts[part].role {
        Role::Beside { carrier } => carrier as usize,
        Role::Stack { .. } | Role::Shroud => part,
    };
    let Role::Stack { position: own } = parts.get(carrier)?.role else { return None };
    parts.iter().enumerate().position(|(index, other)| {
        matches!(other.role, Role::Stack { position } if position < own) && state.shed[index].is_none()
    })
}

fn engine(part: &Part) -> Option<&Engine> {
    part.propulsion.as_ref().map(|propulsion| &propulsion.engine)
}

/// A fraction in percent without digits that nobody wrote.
fn round(fraction: f64) -> f64 {
    (fraction * 1e6).round() / 1e4
}
