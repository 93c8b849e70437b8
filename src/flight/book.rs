//! What is written down while flying: events, phases, burns, the ledger's rows and notices.

use super::history::History;
use super::integrate::Stepper;
use super::motion::{BACK_PRESSURE, COLUMNS, DRAG, GRAVITY, Motion, PAID, STEERING};
use super::plan::Thrust;
use super::result::{Burned, Event, EventKind, Frame, Ledger, LedgerRow, Notice, PhaseFlown, Snapshot};
use super::throttle::Throttle;
use crate::math::Scalar;
use crate::model::Quantity;

/// The book of one flight.
pub struct Book<'p, S> {
    pub history: History<'p, S>,
    pub events: Vec<Event>,
    pub phases: Vec<PhaseFlown>,
    pub ledger: Ledger,
    pub burns: Vec<Burned>,
    pub notices: Vec<Notice>,
    /// Part, usable propellant that went with it (kg), time (s).
    pub shed: Vec<(usize, f64, f64)>,
    pub evaluations: u64,
    pub steps: u64,
    phase: Option<Open>,
    alight: Vec<Alight>,
}

/// A phase that has begun.
struct Open {
    index: usize,
    start: Snapshot,
    columns: [f64; COLUMNS],
    ideal: Option<f64>,
    throttle_least: f64,
}

/// A part that burns.
struct Alight {
    part: usize,
    start: Snapshot,
    burnt: f64,
}

impl<'p, S: Scalar> Book<'p, S> {
    pub fn new() -> Self {
        Book {
            history: History::new(),
            events: Vec::new(),
            phases: Vec::new(),
            ledger: Ledger {
                total: LedgerRow { ideal: Some(0.0), ..LedgerRow::default() },
                ..Ledger::default()
            },
            burns: Vec::new(),
            notices: Vec::new(),
            shed: Vec::new(),
            evaluations: 0,
            steps: 0,
            phase: None,
            alight: Vec::new(),
        }
    }

    pub fn event(&mut self, kind: EventKind, state: Snapshot) {
        self.events.push(Event { kind, state });
    }

    pub fn begin_phase(&mut self, index: usize, motion: &Motion<S>, start: Snapshot) {
        let columns = motion.columns.map(Scalar::real);
        self.phase = Some(Open { index, start, columns, ideal: Some(0.0), throttle_least: f64::INFINITY });
    }

    pub fn end_phase(&mut self, ended_by: Option<usize>, motion: &Motion<S>, end: Snapshot) {
        let Some(open) = self.phase.take() else { return };
        let column = |index: usize| motion.columns[index].real() - open.columns[index];
        let row = LedgerRow {
            paid: column(PAID),
            back_pressure: column(BACK_PRESSURE),
            steering: column(STEERING),
            drag: column(DRAG),
            gravity: column(GRAVITY),
            gained: speed(motion.frame, &end) - speed(motion.frame, &open.start),
            ideal: open.ideal,
        };
        let total = &mut self.ledger.total;
        total.paid += row.paid;
        total.back_pressure += row.back_pressure;
        total.steering += row.steering;
        total.drag += row.drag;
        total.gravity += row.gravity;
        total.gained += row.gained;
        total.ideal = total.ideal.zip(row.ideal).map(|(sum, piece)| sum + piece);
        self.ledger.rows.push(row);
        let throttle_least = if open.throttle_least.is_finite() { open.throttle_least } else { 0.0 };
        self.phases.push(PhaseFlown { phase: open.index, start: open.start, end, ended_by, throttle_least });
    }

    pub fn ignite(&mut self, part: usize, burnt: f64, state: Snapshot) {
        self.alight.push(Alight { part, start: state.clone(), burnt });
        self.event(EventKind::Ignition(part), state);
    }

    pub fn cut_off(&mut self, part: usize, burnt: f64, state: Snapshot) {
        if let Some(index) = self.alight.iter().position(|alight| alight.part == part) {
            let Alight { start, burnt: before, .. } = self.alight.remove(index);
            let paid = paid(&state) - paid(&start);
            self.burns.push(Burned { part, start, end: state.clone(), propellant: burnt - before, paid });
        }
        self.event(EventKind::CutOff(part), state);
    }

    pub fn shed(&mut self, part: usize, left: f64, state: Snapshot) {
        self.shed.push((part, left, state.time));
        self.event(EventKind::Shed(part), state);
    }

    /// Closes a segment: `motion` is that of its end, the history has that of its start.
    pub fn settle(&mut self, motion: &Motion<S>, stepper: &Stepper<S>) {
        self.evaluations += stepper.evaluations();
        self.steps += stepper.steps();
        if let (Some(open), Some(start)) = (&mut self.phase, self.history.segment()) {
            let piece = ideal(start, motion);
            open.ideal = open.ideal.zip(piece).map(|(sum, piece)| sum + piece);
        }
    }

    pub fn throttled(&mut self, throttle: f64) {
        if let Some(open) = &mut self.phase {
            open.throttle_least = open.throttle_least.min(throttle);
        }
    }

    /// Notes by how much a hold's limit is exceeded; the worst of a phase stays.
    pub fn exceeded(&mut self, phase: usize, excess: f64, limit: f64, time: f64) {
        for notice in &mut self.notices {
            match notice {
                Notice::HoldExceeded { phase: of, worst, time: at, .. } if *of == phase => {
                    if excess > *worst {
                        (*worst, *at) = (excess, time);
                    }
                    return;
                }
                _ => {}
            }
        }
        self.notices.push(Notice::HoldExceeded { phase, worst: excess, limit, time });
    }

    pub fn above_air(&mut self, top: f64, time: f64) {
        if !self.notices.iter().any(|notice| matches!(notice, Notice::AboveAir { .. })) {
            self.notices.push(Notice::AboveAir { top, time });
        }
    }
}

fn speed(frame: Frame, state: &Snapshot) -> f64 {
    let quantity = match frame {
        Frame::BodyFixed => Quantity::GroundSpeed,
        Frame::Inertial => Quantity::InertialSpeed,
    };
    state.get(quantity).unwrap_or(0.0)
}

fn paid(state: &Snapshot) -> f64 {
    state.get(Quantity::PaidDeltaV).unwrap_or(0.0)
}

/// Delta-v of a segment by the rocket equation, where it has a closed form: one exhaust speed, or
/// engines that keep their shares.
fn ideal<S: Scalar>(start: &Motion<S>, end: &Motion<S>) -> Option<f64> {
    let mut motors =
        start.lit.iter().filter_map(|lit| Some((lit, start.plan.parts[lit.part].motor.as_ref()?)));
    let Some((_, first)) = motors.clone().next() else { return Some(0.0) };
    let exhaust = if motors.clone().all(|(_, motor)| motor.exhaust.real() == first.exhaust.real()) {
        first.exhaust.real()
    } else {
        let steady = motors.all(|(_, motor)| matches!(motor.thrust, Thrust::Steady(_)));
        if !steady || start.throttle != Throttle::Commanded {
            return None;
        }
        let throttle = start.plan.phases[start.phase].throttle;
        let output = start.output(start.phase_start, throttle, S::zero());
        output.vacuum.real() / output.flow.real()
    };
    let mass = |motion: &Motion<S>| {
        let burnt: f64 = start.lit.iter().map(|lit| motion.burnt[lit.part].real()).sum();
        start.attached.real() - burnt
    };
    Some(exhaust * Scalar::ln(mass(start) / mass(end)))
}
