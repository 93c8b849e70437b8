//! What is true now, and what a step may not pass.

use super::{Run, segment};
use crate::flight::plan::{Condition, PitchLaw, Steer, Thrust};
use crate::flight::result::Notice;
use crate::flight::throttle::{Throttle, excess, least, needed};
use crate::flight::watch::{Watch, Watches};
use crate::math::Scalar;
use crate::model::Comparison;

impl<S: Scalar> Run<'_, '_, S> {
    /// The condition of the phase that is true at this instant, if one is: at its very start, or after
    /// a jump. Sheds that are due are done first.
    pub(super) fn true_now(&mut self, first: bool) -> Option<usize> {
        self.shed_now();
        let phase = &self.plan.phases[self.motion.phase];
        let watches = Watches::new(&self.motion, Vec::new(), Vec::new());
        let mut found = None;
        for (index, condition) in phase.until.iter().enumerate() {
            let value = match condition {
                Condition::Spent(part) if self.spent[*part] => 1.0,
                Condition::Spent(_) => -1.0,
                condition => self.look(|look| watches.condition(condition, look)),
            };
            let before = self.conditions[index].replace(value);
            // What asks for a crossing is not true at a start, but a jump across is one.
            let jumped = before.is_some_and(|before| before < 0.0);
            if value >= 0.0 && (jumped || !asks_for_crossing(condition)) && found.is_none() {
                found = Some(index);
            }
        }
        if let (true, Some(condition)) = (first, found) {
            self.book.notices.push(Notice::TrueAtStart { phase: self.motion.phase, condition });
        }
        found
    }

    /// Lets go of what is due at this instant.
    pub(super) fn shed_now(&mut self) {
        let phase = &self.plan.phases[self.motion.phase];
        let watches = Watches::new(&self.motion, Vec::new(), Vec::new());
        for (index, shed) in phase.sheds.iter().enumerate() {
            let due = match &shed.when {
                None => false,
                Some(Condition::Spent(part)) => self.spent[*part],
                Some(when) if asks_for_crossing(when) => false,
                Some(when) => self.look(|look| watches.condition(when, look)) >= 0.0,
            };
            if due && !self.shed[index] {
                self.shed[index] = true;
                self.let_go(shed.part);
            }
        }
    }

    /// Chooses what sets the throttle at the start of a segment, unless an event has just done so.
    pub(super) fn choose_throttle(&mut self) {
        if std::mem::take(&mut self.throttle_chosen) {
            return;
        }
        let phase = &self.plan.phases[self.motion.phase];
        let Some(hold) = phase.hold.as_ref().filter(|_| !self.motion.lit.is_empty()) else { return };
        let before = std::mem::replace(&mut self.motion.throttle, Throttle::Commanded);
        let next = self.look(|look| {
            let common = needed(&self.motion, hold, &look.now, look.now.pressure());
            match excess(hold, &look.now).real() > 0.0 {
                false => Throttle::Commanded,
                true if common.real() < least(&self.motion).real() => Throttle::Floor,
                true => Throttle::Held,
            }
        });
        self.motion.throttle = next;
        if (before == Throttle::Commanded) != (next == Throttle::Commanded) {
            self.event_of_hold(next != Throttle::Commanded);
        }
    }

    /// Instants known beforehand at which a step has to end, all after the present, the next one last.
    pub(super) fn stops(&self) -> Vec<S> {
        let phase = &self.plan.phases[self.motion.phase];
        let start = self.motion.phase_start;
        let mut stops = vec![start + segment::LONGEST_PHASE];
        let conditions = phase.until.iter().chain(phase.sheds.iter().filter_map(|shed| shed.when.as_ref()));
        for condition in conditions {
            if let Condition::After(duration) = condition {
                stops.push(start + *duration);
            }
        }
        stops.extend(phase.lights.iter().map(|(_, at)| start + *at));
        if let Steer::Pitch { law: PitchLaw::Over { over, .. }, .. } = &phase.steer {
            stops.push(start + *over);
        }
        for lit in &self.motion.lit {
            if let Some(Thrust::Curve(table)) =
                self.plan.parts[lit.part].motor.as_ref().map(|motor| &motor.thrust)
            {
                stops.extend(table.knots().iter().map(|knot| lit.since + *knot));
            }
        }
        let now = self.time.real();
        let near = 1e-12 * now.abs().max(1.0);
        stops.retain(|stop| stop.real() > now + near);
        stops.sort_by(|a, b| b.real().total_cmp(&a.real()));
        stops
    }

    pub(super) fn watches(&self) -> Watches<S> {
        let phase = &self.plan.phases[self.motion.phase];
        let mut list: Vec<Watch> = Vec::new();
        list.extend((0..phase.sheds.len()).filter(|index| !self.shed[*index]).map(Watch::Shed));
        list.extend((0..self.motion.lit.len()).map(Watch::Spent));
        list.extend((0..phase.until.len()).map(Watch::Until));
        if phase.hold.is_some() && !self.motion.lit.is_empty() {
            let over: &[Throttle] = match self.motion.throttle {
                Throttle::Commanded | Throttle::Floor => &[Throttle::Held],
                Throttle::Held => &[Throttle::Commanded, Throttle::Floor],
            };
            list.extend(over.iter().map(|next| Watch::Throttle(*next)));
        }
        if !phase.until.iter().any(|condition| matches!(condition, Condition::Touchdown)) {
            list.push(Watch::Ground);
        }
        let burnable = self.motion.lit.iter().map(|lit| self.burnable(lit.part)).collect();
        Watches::new(&self.motion, burnable, list)
    }

    /// A lit part whose thrust curve has come to its end with no thrust left, though propellant is.
    pub(super) fn curve_over(&self) -> Option<usize> {
        let near = 1e-12 * self.time.real().abs().max(1.0);
        let over = self.motion.lit.iter().find(|lit| {
            let motor = self.plan.parts[lit.part].motor.as_ref();
            match motor.map(|motor| &motor.thrust) {
                Some(Thrust::Curve(table)) => {
                    let end = table.knots().last().copied().unwrap_or(0.0);
                    let age = (self.time - lit.since).real();
                    age + near >= end && table.at(S::from(end + 1.0), S::zero()).real() <= 0.0
                }
                _ => false,
            }
        });
        over.map(|lit| lit.part)
    }
}

fn asks_for_crossing<S>(condition: &Condition<S>) -> bool {
    matches!(
        condition,
        Condition::Compare(_, Comparison::RisesTo | Comparison::FallsTo)
            | Condition::Apex
            | Condition::Touchdown
    )
}
