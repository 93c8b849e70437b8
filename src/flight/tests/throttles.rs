//! Holds and commanded throttle.

use super::build::{
    G0, after, burn, compare, engine, exponential, flat, hold, mission, pad, pitch, spent, stage, state,
    throttled, value,
};
use super::{close, end, flown, get, near, times};
use crate::flight::{EventKind, Notice};
use crate::math::Scalar;
use crate::model::{Comparison, Mission, Phase, Quantity, Steer, World};

fn in_space(parts: Vec<crate::model::Part>, phases: Vec<Phase>) -> Mission {
    mission(flat(0.0), state([0.0, 0.0, 1e3], [0.0; 3]), parts, phases)
}

/// At constant sensed acceleration the mass falls as exp(−n·t/isp).
#[test]
fn constant_acceleration() {
    let mut phase = burn(&[0], pitch(0.0, 0.0), after(60.0));
    phase.hold = hold(Quantity::Acceleration, 4.0 * G0);
    let flight = flown(&in_space(vec![stage(200.0, 800.0, throttled(1e5, 300.0, 0.01))], vec![phase]));
    near(get(end(&flight), Quantity::Mass), 1000.0 * Scalar::exp(-4.0 * 60.0 / 300.0), 1e-10);
    near(get(end(&flight), Quantity::InertialSpeed), 4.0 * G0 * 60.0, 1e-10);
    let total = &flight.ledger.total;
    close(total.ideal.unwrap(), total.paid, 1e-6);
}

/// The hold enters where full thrust reaches the limit, m = T/L, located.
#[test]
fn a_hold_enters() {
    let mut phase = burn(&[0], pitch(0.0, 0.0), spent(0));
    phase.hold = hold(Quantity::Acceleration, 4.0 * G0);
    let flight = flown(&in_space(vec![stage(200.0, 800.0, throttled(2e4, 300.0, 0.01))], vec![phase]));
    let flow = 2e4 / (300.0 * G0);
    let limit = 2e4 / (4.0 * G0);
    let entered = times(&flight, &EventKind::HoldEnters(0));
    assert_eq!(entered.len(), 1);
    near(entered[0], (1000.0 - limit) / flow, 1e-10);
    for sample in flight.samples.iter().filter(|sample| sample.time > entered[0] + 1e-9) {
        near(get(sample, Quantity::Acceleration), 4.0 * G0, 1e-12);
    }
    // From there mass falls as exp(−n·t/isp) to the dry mass.
    near(end(&flight).time, entered[0] + 300.0 / 4.0 * Scalar::ln(limit / 200.0), 5e-9);
}

/// With back pressure and drag the sensed acceleration is still exactly the limit: p·Ae does not scale
/// with the throttle.
#[test]
fn a_hold_is_exact_in_air() {
    let mut engine = throttled(6e4, 280.0, 0.2);
    engine.exit_area = value(0.05);
    for quantity in
        [Quantity::Acceleration, Quantity::AxialAcceleration, Quantity::ThrustToWeight, Quantity::Thrust]
    {
        let limit = match quantity {
            Quantity::Thrust => 3e4,
            Quantity::ThrustToWeight => 2.5,
            _ => 2.5 * G0,
        };
        let mut phase = burn(&[0], pitch(1.2, 0.0), after(30.0));
        phase.hold = hold(quantity, limit);
        let world = World { air: exponential(1.225, 101_325.0, 7200.0), ..flat(G0) };
        let start = state([0.0, 0.0, 10.0], [0.0, 0.0, 10.0]);
        let parts = vec![stage(700.0, 800.0, engine.clone())];
        let mut mission = mission(world, start, parts, vec![phase]);
        mission.vehicle.drag = super::build::drag(0.5);
        let flight = flown(&mission);
        for sample in flight.samples.iter().skip(1) {
            let throttle = get(sample, Quantity::Throttle);
            assert!(get(sample, quantity) <= limit * (1.0 + 1e-9));
            if throttle < 1.0 - 1e-9 {
                near(get(sample, quantity), limit, 1e-11);
            }
        }
        assert!(get(end(&flight), Quantity::Throttle) < 1.0, "{quantity:?} acts");
    }
}

/// An engine that cannot go so low flies at its least, and the excess is told.
#[test]
fn least_throttle() {
    let mut phase = burn(&[0], pitch(0.0, 0.0), spent(0));
    phase.hold = hold(Quantity::Acceleration, 4.0 * G0);
    let flight = flown(&in_space(vec![stage(200.0, 800.0, throttled(2e4, 300.0, 0.6))], vec![phase]));
    near(get(end(&flight), Quantity::Throttle), 0.6, 1e-12);
    near(flight.phases[0].throttle_least, 0.6, 1e-12);
    let Some(Notice::HoldExceeded { phase: 0, worst, limit, time }) = flight.notices.first() else {
        panic!("{:?}", flight.notices)
    };
    near(*limit, 4.0 * G0, 1e-12);
    near(*worst, 0.6 * 2e4 / 200.0 - 4.0 * G0, 1e-9);
    near(*time, end(&flight).time, 1e-12);
}

/// A steady engine beside a throttled one: the second alone is turned down.
#[test]
fn one_engine_of_two_throttles() {
    let mut phase = burn(&[0, 1], pitch(0.0, 0.0), after(10.0));
    phase.hold = hold(Quantity::Thrust, 1.5e4);
    let parts =
        vec![stage(500.0, 800.0, engine(1e4, 280.0)), stage(500.0, 800.0, throttled(1e4, 300.0, 0.3))];
    let flight = flown(&in_space(parts, vec![phase]));
    near(get(end(&flight), Quantity::Thrust), 1.5e4, 1e-12);
    near(flight.parts[1].burnt / flight.parts[0].burnt, 0.5 * 280.0 / 300.0, 1e-9);
}

/// A commanded throttle scales thrust and flow alike; the hold stays at or under it.
#[test]
fn commanded() {
    let mut phase = burn(&[0], pitch(0.0, 0.0), after(10.0));
    phase.throttle = Some(value(0.7));
    phase.hold = hold(Quantity::Thrust, 1e9);
    let flight = flown(&in_space(vec![stage(500.0, 800.0, throttled(1e4, 300.0, 0.3))], vec![phase]));
    near(get(end(&flight), Quantity::Thrust), 7e3, 1e-12);
    near(flight.burns[0].propellant, 7e3 / (300.0 * G0) * 10.0, 1e-10);
}

/// A hold acts in its phase only, and in the next one the throttle is full again.
#[test]
fn a_hold_ends_with_its_phase() {
    let mut held = burn(&[0], Steer::Upright, compare(Quantity::Height, Comparison::AtLeast, 500.0));
    held.hold = hold(Quantity::Acceleration, 1.5 * G0);
    let free = burn(&[0], Steer::Upright, after(1.0));
    let parts = vec![stage(500.0, 1500.0, throttled(4e4, 300.0, 0.2))];
    let flight = flown(&mission(flat(G0), pad(0.0, 0.0), parts, vec![held, free]));
    near(get(&flight.phases[0].end, Quantity::Acceleration), 1.5 * G0, 1e-11);
    near(get(&flight.phases[1].start, Quantity::Throttle), 1.0, 0.0);
    // One burn throughout.
    assert_eq!(flight.burns.len(), 1);
}
