//! One mission flown: plan, run, verdict.

use super::history::History;
use super::integrate::root;
use super::lower::plan;
use super::peaks::{Wanted, search};
use super::plan::Plan;
use super::program::Program;
use super::result::{Completion, Event, EventKind, Flight, Frame, Peak, Snapshot};
use super::run::Run;
use super::settings::Settings;
use super::verdict::judge;
use crate::math::Scalar;
use crate::model::{Formula, Mission, Quantity, QuantityKind, Reading};
use crate::world::Air;

/// States for plots and tables, at least.
const SAMPLES: usize = 400;

/// Quantities whose peaks every report shows.
const PEAKS: &[Quantity] = &[
    Quantity::DynamicPressure,
    Quantity::Mach,
    Quantity::Heating,
    Quantity::Acceleration,
    Quantity::AxialAcceleration,
    Quantity::Altitude,
    Quantity::GroundSpeed,
];

/// Flies a mission. It never fails: what keeps the flight from its end is part of the result, with
/// everything that was flown before.
pub fn fly(mission: &Mission, settings: &Settings) -> Flight {
    let plan: Plan<f64> = plan(mission);
    let frame = settings.frame.unwrap_or(if plan.start.pad { Frame::BodyFixed } else { Frame::Inertial });
    let mut run = Run::new(&plan, settings, frame);
    let completion = match run.fly() {
        Ok(()) => Completion::Completed,
        Err(failure) => Completion::Failed(failure),
    };
    let parts = run.accounts();
    let mut book = run.book;
    let end = book.events.last().map(|event| event.state.clone()).unwrap_or_default();
    let verdict = judge(mission, &book.history, &book.phases, &end);
    book.ledger.ground_speed_at_start = plan.spin.velocity(plan.start.position).length();
    let (mut peaks, mut samples) = (Vec::new(), Vec::new());
    if settings.samples {
        peaks = summits(&plan, &book.history);
        samples = sample(&book.history);
        book.events.extend(crossings(&book.history, &samples));
        let of_peaks = peaks.iter().enumerate().filter(|(_, peak)| told(peak.quantity));
        book.events.extend(
            of_peaks.map(|(index, peak)| Event { kind: EventKind::Peak(index), state: peak.state.clone() }),
        );
        // Stable: what happens at one instant stays in the order in which it was done.
        book.events.sort_by(|a, b| a.state.time.total_cmp(&b.state.time));
    }
    Flight {
        completion,
        frame,
        phases: book.phases,
        events: book.events,
        ledger: book.ledger,
        burns: book.burns,
        parts,
        peaks,
        demands: verdict.demands,
        aims: verdict.aims,
        figures: verdict.figures,
        notices: book.notices,
        samples,
        evaluations: book.evaluations,
        steps: book.steps,
    }
}

/// Peaks that have a line of their own in the timeline.
fn told(quantity: Quantity) -> bool {
    matches!(quantity, Quantity::DynamicPressure | Quantity::Acceleration)
}

fn summits<S: Scalar>(plan: &Plan<S>, history: &History<S>) -> Vec<Peak> {
    let air = !matches!(plan.air, Air::None);
    let quantities: Vec<Quantity> =
        PEAKS.iter().copied().filter(|quantity| air || quantity.kind() != QuantityKind::Air).collect();
    let wanted: Vec<Wanted<S>> = quantities
        .iter()
        .map(|quantity| {
            let reading = Reading { quantity: *quantity, part: None };
            Wanted { program: Program::new(&Formula::Reading { reading }), phase: None }
        })
        .collect();
    let found = quantities.into_iter().zip(search(history, &wanted));
    found
        .filter_map(|(quantity, summit)| {
            let summit = summit?;
            let state = history.snapshot(history.legs().get(summit.leg)?, summit.time);
            Some(Peak { quantity, value: summit.value, state, corner: summit.corner })
        })
        .collect()
}

/// The ends of every step and points between.
fn sample<S: Scalar>(history: &History<S>) -> Vec<Snapshot> {
    let legs = history.legs();
    let pieces = SAMPLES.div_ceil(legs.len().max(1)).clamp(1, 50);
    // Of a very long flight every so many steps tell enough, beside those at which something jumps.
    let stride = legs.len().div_ceil(10 * SAMPLES);
    let mut samples = Vec::with_capacity(legs.len() * (pieces + 1));
    for (index, leg) in legs.iter().enumerate() {
        // Where nothing jumps the end of a step is the start of the next.
        let joined = index > 0 && history.joined(&legs[index - 1], leg);
        let goes_on = legs.get(index + 1).is_some_and(|next| history.joined(leg, next));
        if joined && goes_on && index % stride != 0 {
            continue;
        }
        for piece in usize::from(joined)..=pieces {
            let time = leg.start() + (leg.end() - leg.start()) * piece as f64 / pieces as f64;
            samples.push(history.snapshot(leg, if piece == pieces { leg.end() } else { time }));
        }
    }
    samples
}

/// The first time that the speed of sound is passed, and the first apex.
fn crossings<S: Scalar>(history: &History<S>, samples: &[Snapshot]) -> Vec<Event> {
    let mut events = Vec::new();
    let watched = [
        (EventKind::MachOne, Quantity::Mach, 1.0, 1.0),
        (EventKind::Apex, Quantity::VerticalSpeed, 0.0, -1.0),
    ];
    for (kind, quantity, threshold, sign) in watched {
        let value =
            |state: &Snapshot| state.get(quantity).map_or(f64::NAN, |value| sign * (value - threshold));
        let pair = samples.windows(2).find(|pair| value(&pair[0]) < 0.0 && value(&pair[1]) >= 0.0);
        let Some([before, after]) = pair else { continue };
        let leg = history.legs().iter().find(|leg| leg.start() <= before.time && after.time <= leg.end());
        let state = match leg {
            Some(leg) => {
                let time = root(before.time, after.time, |time| value(&history.snapshot(leg, time)));
                history.snapshot(leg, time)
            }
            // The crossing is a jump between two segments.
            None => after.clone(),
        };
        events.push(Event { kind, state });
    }
    events
}
