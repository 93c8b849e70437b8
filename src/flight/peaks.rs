//! Where quantities are greatest: extrema of the dense output, corners included.

use super::history::{History, Leg};
use super::integrate::maximum;
use super::program::Program;
use crate::math::Scalar;

/// A quantity whose summit is asked for, over the flight or one phase.
pub struct Wanted<S> {
    pub program: Program<S>,
    pub phase: Option<usize>,
}

/// A summit.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Summit {
    pub value: f64,
    pub time: f64,
    /// Index of the step that it stands in.
    pub leg: usize,
    /// It stands where two steps meet: the derivative jumps there.
    pub corner: bool,
}

/// Looks within one step before the best steps are searched closely: start, middle, end.
const LOOKS: usize = 2;

/// The summits of all that is wanted, in one walk over the flight.
pub fn search<S: Scalar>(history: &History<S>, wanted: &[Wanted<S>]) -> Vec<Option<Summit>> {
    let legs = history.legs();
    let mut best: Vec<Option<(f64, usize)>> = vec![None; wanted.len()];
    for (index, leg) in legs.iter().enumerate() {
        let phase = history.phase(leg);
        // The end of the step before has been looked at.
        let joined = index > 0 && history.joined(&legs[index - 1], leg);
        for look in usize::from(joined)..=LOOKS {
            let time = within(leg, look as f64 / LOOKS as f64);
            history.look(leg, time, |look| {
                for (wanted, best) in wanted.iter().zip(&mut best) {
                    if wanted.phase.is_some_and(|only| only != phase) {
                        continue;
                    }
                    let value = wanted.program.run(|reading| look.read(reading)).real();
                    if value.is_finite() && best.is_none_or(|(greatest, _)| exceeds(value, greatest)) {
                        *best = Some((value, index));
                    }
                }
            });
        }
    }
    wanted.iter().zip(best).map(|(wanted, best)| Some(climb(history, wanted, best?.1))).collect()
}

/// Searches the best step and its neighbours closely.
fn climb<S: Scalar>(history: &History<S>, wanted: &Wanted<S>, best: usize) -> Summit {
    let legs = history.legs();
    let mut summit = Summit { value: f64::NEG_INFINITY, time: 0.0, leg: best, corner: false };
    for (index, leg) in legs.iter().enumerate().skip(best.saturating_sub(1)).take(best.min(1) + 2) {
        if wanted.phase.is_some_and(|only| only != history.phase(leg)) {
            continue;
        }
        let at = |time: f64| {
            history.look(leg, time, |look| wanted.program.run(|reading| look.read(reading)).real())
        };
        let (time, value) = maximum(leg.start(), leg.end(), at);
        if exceeds(value, summit.value) {
            let edge = 1e-6 * (leg.end() - leg.start());
            let corner = time - leg.start() <= edge || leg.end() - time <= edge;
            summit = Summit { value, time, leg: index, corner };
        }
    }
    summit
}

/// Whether a value is greater by more than rounding: on a plateau the first summit stands.
fn exceeds(value: f64, greatest: f64) -> bool {
    value > greatest && (greatest == f64::NEG_INFINITY || value - greatest > 1e-9 * greatest.abs())
}

fn within<S: Scalar>(leg: &Leg<S>, share: f64) -> f64 {
    leg.start() + (leg.end() - leg.start()) * share
}
