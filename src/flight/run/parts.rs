//! What is carried and what burns.

use super::{After, Flown, Run};
use crate::flight::motion::Lit;
use crate::flight::plan::{Condition, Reserve};
use crate::flight::result::{Cause, EventKind};
use crate::math::Scalar;

impl<S: Scalar> Run<'_, '_, S> {
    /// Lights a part, or goes on with the burn that it is in.
    pub(super) fn set_alight(&mut self, part: usize, engines: S) {
        if self.spent[part] {
            return;
        }
        if let Some(lit) = self.motion.lit.iter_mut().find(|lit| lit.part == part) {
            lit.engines = engines;
            return;
        }
        self.motion.lit.push(Lit { part, engines, since: self.time });
        self.attach();
        let state = self.snapshot();
        self.book.ignite(part, self.motion.burnt[part].real(), state);
    }

    pub(super) fn put_out(&mut self, part: usize) {
        if self.motion.lit.iter().any(|lit| lit.part == part) {
            self.reserves[part] = Some(self.plan.parts[part].usable - self.burnable(part));
            let state = self.snapshot();
            self.book.cut_off(part, self.motion.burnt[part].real(), state);
            self.motion.lit.retain(|lit| lit.part != part);
            self.attach();
        }
    }

    pub(super) fn let_go(&mut self, part: usize) {
        self.put_out(part);
        if self.motion.carried[part] {
            let left = self.look(|look| look.left(part)).real();
            self.motion.carried[part] = false;
            self.attach();
            let state = self.snapshot();
            self.book.shed(part, left, state);
        }
    }

    /// Works out the mass of what is attached, less what parts that are not lit have burnt.
    pub(super) fn attach(&mut self) {
        let mut mass = self.plan.payload;
        for (index, part) in self.plan.parts.iter().enumerate() {
            if self.motion.carried[index] {
                mass += part.full();
                if !self.motion.lit.iter().any(|lit| lit.part == index) {
                    mass -= self.motion.burnt[index];
                }
            }
        }
        self.motion.attached = mass;
    }

    /// Usable propellant of a lit part less its reserve, kg. A reserve of speed is that of the whole
    /// vehicle once the part's usable propellant is gone.
    pub(super) fn burnable(&self, index: usize) -> S {
        let part = &self.plan.parts[index];
        let Some(motor) = &part.motor else { return S::zero() };
        let reserve = match motor.reserve {
            Reserve::Mass(mass) => mass,
            Reserve::Speed(speed) => {
                let mut last = self.motion.attached;
                for lit in &self.motion.lit {
                    last -= if lit.part == index { part.usable } else { self.motion.burnt[lit.part] };
                }
                last * ((speed / motor.exhaust).exp() - S::one())
            }
        };
        part.usable - reserve.min(part.usable)
    }

    /// A lit part that has nothing to burn at the start of a segment: all of it is unusable or reserve.
    pub(super) fn nothing_left(&self) -> Option<usize> {
        let mut lit = self.motion.lit.iter().map(|lit| lit.part);
        lit.find(|part| self.burnable(*part).real() <= self.motion.burnt[*part].real())
    }

    /// A part has burnt down to its reserve: the phase ends by it, or the others burn on.
    pub(super) fn burnt_out(&mut self, part: usize, burnable: Option<S>) -> Flown<After> {
        self.spent[part] = true;
        if let Some(burnable) = burnable {
            self.motion.burnt[part] = burnable;
        }
        let state = self.snapshot();
        self.book.event(EventKind::Spent(part), state);
        let phase = &self.plan.phases[self.motion.phase];
        let ends =
            phase.until.iter().position(|condition| matches!(condition, Condition::Spent(of) if *of == part));
        if let Some(condition) = ends {
            self.shed_now();
            return Ok(After::Ends(condition));
        }
        self.put_out(part);
        let to_come = phase.lights.iter().any(|(burn, _)| !self.spent[burn.part]);
        if self.motion.lit.is_empty() && !to_come {
            return Err(self.failure(Cause::RanDry { part }));
        }
        Ok(After::Switch)
    }

    /// Lights what is due within the phase.
    pub(super) fn light(&mut self) {
        let near = 1e-12 * self.time.real().abs().max(1.0);
        for (burn, at) in &self.plan.phases[self.motion.phase].lights {
            let due = (self.motion.phase_start + *at).real() <= self.time.real() + near;
            if due && !self.motion.lit.iter().any(|lit| lit.part == burn.part) {
                self.set_alight(burn.part, burn.engines);
            }
        }
    }

    /// Notes a change of what sets the throttle.
    pub(super) fn event_of_hold(&mut self, enters: bool) {
        let phase = self.motion.phase;
        let state = self.snapshot();
        self.book
            .event(if enters { EventKind::HoldEnters(phase) } else { EventKind::HoldLeaves(phase) }, state);
    }
}
