//! One segment, step by step.

use super::{After, Flown, Run};
use crate::flight::integrate::{StepFailure, Stepper, Tolerance};
use crate::flight::motion::{COLUMNS, Motion};
use crate::flight::plan::{Drag, Second};
use crate::flight::quantities::Look;
use crate::flight::result::{Cause, Failure};
use crate::flight::throttle::{Throttle, excess};
use crate::flight::watch::{Watch, Watches};
use crate::math::{Scalar, Vector};
use crate::model::Quantity;

/// A phase that goes on longer than this never ends, s.
pub(super) const LONGEST_PHASE: f64 = 400.0 * 86_400.0;
/// More steps than this in the whole flight, and it never ends: a month in a low orbit takes a sixth.
const MOST_STEPS: u64 = 120_000;
/// So far below the ground nothing flies, m.
const SUNK: f64 = 1.0;

impl<'p, S: Scalar> Run<'p, '_, S> {
    /// Flies until something switches or the phase ends.
    pub(super) fn segment(&mut self) -> Flown<After> {
        self.light();
        if let Some(part) = self.curve_over() {
            return self.burnt_out(part, None);
        }
        if let Some(part) = self.nothing_left() {
            return self.burnt_out(part, None);
        }
        self.choose_throttle();
        if let Some(failure) = self.out_of_range() {
            return Err(failure);
        }
        let watches = self.watches();
        let mut stops = self.stops();
        self.book.history.begin(&self.motion);
        let mut motion = self.motion.clone();
        let state = self.state();
        let mut stepper = Stepper::new(tolerance(self.settings.tolerance, self.motion.lit.len()));
        stepper.start(&mut motion, self.time, &state, self.size);
        let mut before = watches.values(&Look::new(&motion, self.time, &state));
        let limit = stops.pop().unwrap_or(self.time);
        while self.time.real() < limit.real() {
            if self.book.steps + stepper.steps() > MOST_STEPS {
                self.settle(&stepper);
                let after = (self.time - self.motion.phase_start).real();
                return Err(self.failure(Cause::NeverEnds { after }));
            }
            if let Err(failure) = stepper.step(&mut motion, limit) {
                self.settle(&stepper);
                return Err(self.broken(failure, &stepper));
            }
            let mut dense = stepper.dense(&mut motion);
            let last = Look::new(&motion, stepper.end_time(), stepper.end_state());
            let mut after = watches.values(&last);
            let found = watches.earliest(&dense, &before, &after, &last);
            let mut noted = Noted::new(&last);
            if let Some((time, _)) = found.filter(|(time, _)| *time < stepper.end_time().real()) {
                stepper.redo(&mut motion, S::from(time.max(stepper.start_time().real())));
                dense = stepper.dense(&mut motion);
                let last = Look::new(&motion, stepper.end_time(), stepper.end_state());
                (after, noted) = (watches.values(&last), Noted::new(&last));
            }
            self.book.history.push(dense);
            self.follow(&stepper);
            let sunk = watches.list.contains(&Watch::Ground) && noted.altitude < watches.ground - SUNK;
            if let Some(cause) = noted.second.take() {
                self.settle(&stepper);
                return Err(self.failure(cause));
            }
            self.notice(noted);
            before = after;
            match found {
                None if !sunk => {}
                Some((_, Watch::Layer(layer, _))) if !sunk => {
                    motion.layer = layer;
                    self.go_on(&motion, layer, motion.piece);
                }
                Some((_, Watch::Piece(piece, _))) if !sunk && !outside(&motion, piece) => {
                    motion.piece = piece;
                    self.go_on(&motion, motion.layer, piece);
                }
                _ => {
                    self.settle(&stepper);
                    let watch = found.map_or(Watch::Ground, |(_, watch)| watch);
                    return self.comes_about(if sunk { Watch::Ground } else { watch }, &watches);
                }
            }
        }
        self.settle(&stepper);
        match self.time.real() >= self.motion.phase_start.real() + LONGEST_PHASE {
            true => Err(self.failure(Cause::NeverEnds { after: LONGEST_PHASE })),
            false => Ok(After::Switch),
        }
    }

    /// Another formula of the air or of the drag curve holds from here on; the values join, so that
    /// the integration goes on.
    fn go_on(&mut self, motion: &Motion<'p, S>, layer: usize, piece: usize) {
        (self.motion.layer, self.motion.piece) = (layer, piece);
        self.book.history.join(motion);
    }

    /// Takes over the state at the end of the last step.
    fn follow(&mut self, stepper: &Stepper<S>) {
        let state = stepper.end_state();
        self.time = stepper.end_time();
        self.position = Vector([state[0], state[1], state[2]]);
        self.velocity = Vector([state[3], state[4], state[5]]);
        for (index, lit) in self.motion.lit.iter().enumerate() {
            self.motion.burnt[lit.part] = state[6 + index];
        }
    }

    /// Closes the segment's part of the ledger.
    fn settle(&mut self, stepper: &Stepper<S>) {
        let first = self.motion.ledger();
        for (sum, column) in self.motion.columns.iter_mut().zip(&stepper.end_state()[first..]) {
            *sum += *column;
        }
        self.book.settle(&self.motion, stepper);
        self.size = Some(stepper.next_size());
    }

    /// What follows from a watch that came about now.
    fn comes_about(&mut self, watch: Watch, watches: &Watches<S>) -> Flown<After> {
        match watch {
            Watch::Ground => {
                let speed = self.look(|look| look.now.airspeed.real());
                Err(self.failure(Cause::GroundImpact { speed }))
            }
            Watch::Spent(index) => {
                let part = self.motion.lit[index].part;
                self.burnt_out(part, watches.burnable.get(index).copied())
            }
            Watch::Throttle(next) => {
                let before = std::mem::replace(&mut self.motion.throttle, next);
                if (before == Throttle::Commanded) != (next == Throttle::Commanded) {
                    self.event_of_hold(next != Throttle::Commanded);
                }
                self.throttle_chosen = true;
                Ok(After::Switch)
            }
            Watch::Shed(index) => {
                self.shed[index] = true;
                self.let_go(self.plan.phases[self.motion.phase].sheds[index].part);
                Ok(After::Switch)
            }
            Watch::Until(condition) => {
                self.shed_now();
                Ok(After::Ends(condition))
            }
            Watch::Layer(..) => Ok(After::Switch),
            Watch::Piece(..) => Err(self.curve_range()),
        }
    }

    /// What stops the flight where it reads the drag curve outside a range that it refuses to leave
    /// already at the start of a segment.
    fn out_of_range(&self) -> Option<Failure> {
        let Drag::Curve { table, .. } = &self.plan.drag else { return None };
        let (low, high) = (table.knots().first()?, table.knots().last()?);
        let (mach, air) = self.look(|look| (look.now.mach.real(), look.now.air.is_some()));
        // A phase that ends at the curve's own end may stand past it by a rounding.
        let slack = 1e-9 * (high - low);
        let outside = mach < low - slack || mach > high + slack;
        (table.refuses() && air && outside).then(|| self.curve_range())
    }

    fn curve_range(&self) -> Failure {
        let knots = drag_knots(&self.motion);
        let (low, high) = (knots.first().copied(), knots.last().copied());
        let value = self.look(|look| look.now.mach.real());
        self.failure(Cause::CurveRange {
            input: Quantity::Mach,
            value,
            low: low.unwrap_or(0.0),
            high: high.unwrap_or(0.0),
        })
    }

    /// Notes what does not stop the flight.
    fn notice(&mut self, noted: Noted) {
        let time = self.time.real();
        if !self.motion.lit.is_empty() {
            self.book.throttled(noted.throttle);
        }
        if let Some((excess, limit)) = noted.excess {
            self.book.exceeded(self.motion.phase, excess, limit, time);
        }
        if let Some(top) = self.plan.air.top().filter(|top| noted.altitude > *top) {
            self.book.above_air(top, time);
        }
    }

    fn broken(&self, failure: StepFailure, stepper: &Stepper<S>) -> Failure {
        let detail = match failure {
            StepFailure::TooSmall => format!("the step fell below {:.1e} s", stepper.next_size()),
            StepFailure::NotFinite => "a number was not finite".to_owned(),
        };
        self.failure(Cause::Numerical { detail })
    }
}

/// What of the end of a step may be worth a note.
struct Noted {
    altitude: f64,
    throttle: f64,
    /// By how much a hold at the engines' least exceeds its limit, and the limit.
    excess: Option<(f64, f64)>,
    /// The second input of the drag curve lies outside a range that it refuses to leave.
    second: Option<Cause>,
}

impl Noted {
    fn new<S: Scalar>(look: &Look<S>) -> Self {
        let hold = look.motion.plan.phases[look.motion.phase].hold.as_ref();
        let floor = hold.filter(|_| look.motion.throttle == Throttle::Floor);
        Noted {
            altitude: look.now.local.altitude.real(),
            throttle: look.now.throttle.real(),
            excess: floor.map(|hold| (excess(hold, &look.now).real(), hold.limit.real())),
            second: second_out_of_range(look),
        }
    }
}

/// The failure of a drag curve whose second input has left its range, where there is air.
fn second_out_of_range<S: Scalar>(look: &Look<S>) -> Option<Cause> {
    let Drag::Curve { table, second, .. } = &look.motion.plan.drag else { return None };
    let input = match second {
        Second::None => return None,
        Second::Altitude => Quantity::Altitude,
        Second::AngleOfAttack => Quantity::AngleOfAttack,
    };
    let (low, high) = table.second_range()?;
    let value = look.value(input).real();
    let slack = 1e-9 * (high - low);
    let outside = value < low - slack || value > high + slack;
    (table.refuses() && look.now.air.is_some() && outside).then_some(Cause::CurveRange {
        input,
        value,
        low,
        high,
    })
}

/// Mach numbers of the drag curve's knots.
fn drag_knots<'m, S: Scalar>(motion: &'m Motion<S>) -> &'m [f64] {
    match &motion.plan.drag {
        Drag::Curve { table, .. } => table.knots(),
        _ => &[],
    }
}

/// Whether a piece of the drag curve lies outside a range that it refuses to leave.
fn outside<S: Scalar>(motion: &Motion<S>, piece: usize) -> bool {
    match &motion.plan.drag {
        Drag::Curve { table, .. } => table.refuses() && (piece == 0 || piece >= table.knots().len()),
        _ => false,
    }
}

/// The integration's own tolerance is a third of what is promised, because errors of several steps
/// and of located events add up. Absolute errors that count as nothing: a micrometre, a nanometre a second and a milligram for a
/// relative tolerance of 1e-9, and in proportion.
fn tolerance(relative: f64, lit: usize) -> Tolerance {
    let relative = 0.3 * relative;
    let mut absolute = vec![1e3 * relative; 3];
    absolute.extend([relative; 3]);
    absolute.extend(vec![1e3 * relative; lit]);
    absolute.extend([relative; COLUMNS]);
    Tolerance { relative, absolute }
}
