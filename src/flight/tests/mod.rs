//! Flights against closed forms, identities of the ledger, and the rules of phases.

mod build;
mod burns;
mod drags;
mod ledgers;
mod odd;
mod orbits;
mod phases;
mod summits;
mod text;
mod textbook;
mod throttles;

use super::{Completion, EventKind, Flight, Settings, Snapshot, fly};
use crate::model::{Mission, Quantity};

/// Flies to the end, or the test fails.
fn flown(mission: &Mission) -> Flight {
    let flight = fly(mission, &Settings::default());
    assert_eq!(flight.completion, Completion::Completed);
    flight
}

fn end(flight: &Flight) -> &Snapshot {
    &flight.phases.last().unwrap().end
}

fn get(state: &Snapshot, quantity: Quantity) -> f64 {
    state.get(quantity).unwrap()
}

/// Asserts a value within a relative error.
#[track_caller]
fn near(found: f64, expected: f64, relative: f64) {
    let error = (found - expected).abs();
    assert!(
        error <= relative * expected.abs(),
        "{found:?} is {:.1e} of {expected:?} away from it",
        error / expected.abs()
    );
}

/// Asserts a value within an absolute error.
#[track_caller]
fn close(found: f64, expected: f64, error: f64) {
    assert!(
        (found - expected).abs() <= error,
        "{found:?} and {expected:?}: {:.1e}",
        (found - expected).abs()
    );
}

/// Times of all events of a kind.
fn times(flight: &Flight, kind: &EventKind) -> Vec<f64> {
    flight.events.iter().filter(|event| event.kind == *kind).map(|event| event.state.time).collect()
}
