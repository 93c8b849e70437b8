//! The flight itself: phase after phase, segment after segment, step after step.

mod parts;
mod segment;
mod timing;

use super::book::Book;
use super::motion::{COLUMNS, Lit, Motion};
use super::plan::{Condition, Part, Plan, Reserve};
use super::quantities::Look;
use super::result::{Cause, EventKind, Failure, Frame, Notice, PartAccount, Snapshot};
use super::settings::Settings;
use super::throttle::Throttle;
use crate::math::{Scalar, Vector};

type Flown<T> = Result<T, Failure>;

/// The state of the flight between two segments.
///
/// A segment is a stretch in which nothing switches: the same parts burn and are carried, and the
/// same thing sets the throttle. A phase is one segment or several.
pub struct Run<'p, 's, S> {
    plan: &'p Plan<S>,
    settings: &'s Settings,
    motion: Motion<'p, S>,
    time: S,
    position: Vector<S>,
    velocity: Vector<S>,
    /// Parts that have burnt down to their reserve.
    spent: Vec<bool>,
    /// Reserve of each part when it last burnt, kg.
    reserves: Vec<Option<S>>,
    /// Which sheds of the phase have happened.
    shed: Vec<bool>,
    /// Step size that fitted last, s.
    size: Option<f64>,
    /// Values of the phase's conditions when last looked at, so that a jump is seen as a crossing.
    conditions: Vec<Option<f64>>,
    /// An event has just said what sets the throttle.
    throttle_chosen: bool,
    pub book: Book<'p, S>,
}

/// How a segment ended.
enum After {
    /// Something switched: another segment of the same phase.
    Switch,
    /// This condition of the phase came true.
    Ends(usize),
}

impl<'p, 's, S: Scalar> Run<'p, 's, S> {
    pub fn new(plan: &'p Plan<S>, settings: &'s Settings, frame: Frame) -> Self {
        let mut run = Run {
            plan,
            settings,
            motion: Motion::new(plan, frame),
            time: S::zero(),
            position: plan.start.position,
            velocity: plan.start.velocity,
            spent: vec![false; plan.parts.len()],
            reserves: vec![None; plan.parts.len()],
            shed: Vec::new(),
            size: None,
            conditions: Vec::new(),
            throttle_chosen: false,
            book: Book::new(),
        };
        run.attach();
        run
    }

    /// Flies every phase in order. Whatever was flown is in the book, a failure or not.
    pub fn fly(&mut self) -> Flown<()> {
        for index in 0..self.plan.phases.len() {
            if let Err(failure) = self.phase(index) {
                self.close(None);
                return Err(failure);
            }
        }
        self.close(Some(EventKind::End));
        Ok(())
    }

    fn close(&mut self, event: Option<EventKind>) {
        let state = self.snapshot();
        self.book.end_phase(None, &self.motion, state);
        while let Some(part) = self.motion.lit.first().map(|lit| lit.part) {
            self.put_out(part);
        }
        if let Some(kind) = event {
            let state = self.snapshot();
            self.book.event(kind, state);
        }
    }

    /// Where each part's propellant went.
    pub fn accounts(&self) -> Vec<PartAccount> {
        let account = |(index, part): (usize, &Part<S>)| {
            let stated = match part.motor.as_ref().map(|motor| motor.reserve) {
                Some(Reserve::Mass(mass)) => mass,
                _ => S::zero(),
            };
            let burnt = self.motion.burnt[index];
            let shed = self.book.shed.iter().find(|(part, ..)| *part == index);
            PartAccount {
                dry_basic: part.dry_basic.real(),
                dry_growth: part.dry_growth.real(),
                loaded: part.loaded.real(),
                unusable: (part.loaded - part.usable).real(),
                reserve: self.reserves[index].unwrap_or(stated).real(),
                burnt: burnt.real(),
                left: (part.usable - burnt).real(),
                shed_at: shed.map(|(_, _, time)| *time),
            }
        };
        self.plan.parts.iter().enumerate().map(account).collect()
    }

    fn state(&self) -> Vec<S> {
        let mut state: Vec<S> = self.position.0.into_iter().chain(self.velocity.0).collect();
        state.extend(self.motion.lit.iter().map(|lit| self.motion.burnt[lit.part]));
        state.extend([S::zero(); COLUMNS]);
        state
    }

    /// Looks at the present.
    fn look<T>(&self, see: impl FnOnce(&Look<'_, 'p, S>) -> T) -> T {
        let state = self.state();
        see(&Look::new(&self.motion, self.time, &state))
    }

    fn snapshot(&self) -> Snapshot {
        self.look(|look| look.snapshot())
    }

    fn failure(&self, cause: Cause) -> Failure {
        Failure { time: self.time.real(), phase: self.motion.phase, cause }
    }

    fn phase(&mut self, index: usize) -> Flown<()> {
        self.begin(index)?;
        let mut first = true;
        let condition = loop {
            if let Some(condition) = self.true_now(first) {
                break condition;
            }
            first = false;
            match self.segment()? {
                After::Switch => {}
                After::Ends(condition) => break condition,
            }
        };
        self.end(index, condition);
        Ok(())
    }

    fn begin(&mut self, index: usize) -> Flown<()> {
        let phase = &self.plan.phases[index];
        let goes_on = |lit: &&Lit<S>| !phase.burns.iter().any(|burn| burn.part == lit.part);
        let over: Vec<usize> = self.motion.lit.iter().filter(goes_on).map(|lit| lit.part).collect();
        for part in over {
            self.put_out(part);
        }
        self.motion.phase = index;
        self.motion.phase_start = self.time;
        self.motion.throttle = Throttle::Commanded;
        self.throttle_chosen = false;
        self.shed = vec![false; phase.sheds.len()];
        self.conditions = vec![None; phase.until.len()];
        let state = self.snapshot();
        self.book.event(EventKind::PhaseStart(index), state);
        for burn in &phase.burns {
            self.set_alight(burn.part, burn.engines);
        }
        let state = self.snapshot();
        self.book.begin_phase(index, &self.motion, state);
        if let Some(dry) = phase.burns.iter().find(|burn| self.spent[burn.part]) {
            return Err(self.failure(Cause::RanDry { part: dry.part }));
        }
        if index == 0 && self.plan.start.pad && !self.motion.lit.is_empty() {
            self.check_lift_off()?;
        }
        Ok(())
    }

    /// At rest on the ground the thrust has to exceed the weight.
    fn check_lift_off(&mut self) -> Flown<()> {
        let (thrust, weight) = self.look(|look| {
            let now = &look.now;
            let gravity = now.gravity + self.plan.spin.centrifugal(now.position);
            let up = now.local.axes.up;
            ((now.axis.dot(up) * now.thrust).real(), (-gravity.dot(up) * now.mass).real())
        });
        if thrust <= weight {
            return Err(self.failure(Cause::NoLiftOff { thrust, weight }));
        }
        let state = self.snapshot();
        self.book.event(EventKind::LiftOff, state);
        Ok(())
    }

    fn end(&mut self, index: usize, condition: usize) {
        self.motion.axis = self.look(|look| look.now.axis);
        let state = self.snapshot();
        if let Some(Condition::Touchdown) = self.plan.phases[index].until.get(condition) {
            self.book.event(EventKind::Touchdown, state.clone());
        }
        self.book.end_phase(Some(condition), &self.motion, state);
        for (shed, from) in self.plan.phases[index].sheds.iter().enumerate() {
            if from.when.is_none() {
                self.let_go(from.part);
            } else if !self.shed[shed] {
                self.book.notices.push(Notice::NeverShed { phase: index, shed });
            }
        }
    }
}
