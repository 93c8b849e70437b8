//! What begins and ends phases, and what keeps a flight from its end.

use super::build::{
    G0, after, body, burn, coast, compare, curve, engine, flat, light, mission, pad, pitch, shed, spent,
    stage, state, value,
};
use super::{close, end, flown, get, near, times};
use crate::flight::{Cause, Completion, EventKind, Failure, Flight, Notice, Settings, fly};
use crate::math::Scalar;
use crate::model::{
    Beyond, Comparison, Condition, Mission, Phase, Quantity, Reserve, Smoothness, Steer, Thrust,
};

fn drop_from(height: f64, phases: Vec<Phase>) -> Mission {
    mission(flat(G0), state([0.0, 0.0, height], [0.0; 3]), vec![body(10.0), body(5.0)], phases)
}

fn failed(mission: &Mission) -> (Flight, Failure) {
    let flight = fly(mission, &Settings::default());
    match flight.completion.clone() {
        Completion::Failed(failure) => (flight, failure),
        Completion::Completed => panic!("the flight was completed"),
    }
}

/// Of two conditions at one instant the first of the source ends the phase; sheds go before either.
#[test]
fn ties() {
    for order in [[0, 1], [1, 0]] {
        let both = [after(2.0), compare(Quantity::PhaseTime, Comparison::AtLeast, 2.0)];
        let mut phase = coast(both[order[0]].clone());
        phase.until.push(both[order[1]].clone());
        phase.sheds = vec![shed(1, Some(after(2.0)))];
        let flight = flown(&drop_from(1e3, vec![phase]));
        assert_eq!(flight.phases[0].ended_by, Some(0));
        close(end(&flight).time, 2.0, 1e-12);
        assert_eq!(times(&flight, &EventKind::Shed(1)), [2.0]);
        close(get(end(&flight), Quantity::Mass), 10.0, 0.0);
        assert!(flight.notices.is_empty(), "{:?}", flight.notices);
    }
}

/// A condition that is true at the start ends the phase at once, and the flight says so; a crossing is
/// waited for.
#[test]
fn already_true() {
    let falls = |comparison| coast(compare(Quantity::Altitude, comparison, 2e3));
    let phases = vec![falls(Comparison::AtMost), coast(after(1.0))];
    let flight = flown(&drop_from(1e3, phases));
    close(flight.phases[0].end.time, 0.0, 0.0);
    assert_eq!(flight.notices, [Notice::TrueAtStart { phase: 0, condition: 0 }]);
    let (flight, failure) = failed(&drop_from(1e3, vec![falls(Comparison::FallsTo)]));
    assert!(matches!(failure.cause, Cause::GroundImpact { .. }));
    assert!(flight.notices.is_empty());
}

/// The ground ends a flight that does not mean to touch down, at the speed of the fall.
#[test]
fn ground() {
    let (flight, failure) = failed(&drop_from(1e3, vec![coast(after(100.0))]));
    let Cause::GroundImpact { speed } = failure.cause else { panic!("{:?}", failure.cause) };
    near(speed, (2.0 * G0 * 1e3).sqrt(), 1e-8);
    near(failure.time, (2e3 / G0).sqrt(), 1e-8);
    // All that was flown is kept.
    assert_eq!(flight.phases.len(), 1);
    assert!(flight.samples.len() >= 10 && flight.phases[0].ended_by.is_none());

    let landed = flown(&drop_from(1e3, vec![coast(Condition::Touchdown)]));
    near(end(&landed).time, (2e3 / G0).sqrt(), 1e-8);
    assert_eq!(times(&landed, &EventKind::Touchdown).len(), 1);
}

/// A throw from the ground of a pad at altitude comes down to that altitude.
#[test]
fn ground_of_the_pad() {
    let parts = vec![stage(100.0, 10.0, engine(5e3, 250.0))];
    let phases = vec![burn(&[0], Steer::Upright, spent(0)), coast(Condition::Touchdown)];
    let flight = flown(&mission(flat(G0), pad(0.0, 1500.0), parts, phases));
    close(get(end(&flight), Quantity::Altitude), 1500.0, 1e-5);
    close(get(end(&flight), Quantity::Height), 0.0, 1e-5);
}

/// Thrust that does not exceed the weight lifts nothing.
#[test]
fn no_lift_off() {
    let parts = vec![stage(500.0, 500.0, engine(999.0 * G0, 250.0))];
    let (flight, failure) =
        failed(&mission(flat(G0), pad(0.0, 0.0), parts, vec![burn(&[0], Steer::Upright, spent(0))]));
    let Cause::NoLiftOff { thrust, weight } = failure.cause else { panic!("{:?}", failure.cause) };
    near(thrust, 999.0 * G0, 1e-12);
    near(weight, 1000.0 * G0, 1e-12);
    assert!(times(&flight, &EventKind::LiftOff).is_empty());
}

/// Propellant runs out before the phase is to end.
#[test]
fn ran_dry() {
    let parts = vec![stage(400.0, 600.0, engine(600.0 / 30.0 * 250.0 * G0, 250.0))];
    let (flight, failure) =
        failed(&mission(flat(G0), pad(0.0, 0.0), parts, vec![burn(&[0], Steer::Upright, after(40.0))]));
    assert_eq!(failure.cause, Cause::RanDry { part: 0 });
    near(failure.time, 30.0, 1e-11);
    assert_eq!(times(&flight, &EventKind::Spent(0)).len(), 1);
    close(flight.parts[0].left, 0.0, 1e-9);
}

/// With another part still burning the phase goes on.
#[test]
fn one_of_two_runs_dry() {
    let parts = vec![stage(100.0, 100.0, engine(1e4, 250.0)), stage(100.0, 900.0, engine(1e4, 250.0))];
    let flight = flown(&mission(
        flat(0.0),
        state([0.0, 0.0, 1.0], [0.0; 3]),
        parts,
        vec![burn(&[0, 1], pitch(0.0, 0.0), after(60.0))],
    ));
    near(times(&flight, &EventKind::CutOff(0))[0], 100.0 * 250.0 * G0 / 1e4, 1e-11);
    close(get(end(&flight), Quantity::Thrust), 1e4, 1e-9);
}

/// A condition that never comes: the flight ends by its limits.
#[test]
fn never_ends() {
    let phase = coast(compare(Quantity::Altitude, Comparison::AtLeast, 1e30));
    let still = mission(flat(0.0), state([0.0, 0.0, 1.0], [0.0; 3]), vec![body(1.0)], vec![phase]);
    let (_, failure) = failed(&still);
    assert!(matches!(failure.cause, Cause::NeverEnds { .. }));
}

/// Where nothing is left that has mass there is no acceleration: the flight stops, and says why.
#[test]
fn no_mass() {
    let mut phase = coast(after(10.0));
    phase.sheds = vec![shed(0, Some(after(0.0)))];
    let start = state([0.0, 0.0, 1e3], [0.0; 3]);
    let (_, failure) = failed(&mission(flat(G0), start, vec![body(1.0)], vec![phase]));
    assert!(matches!(failure.cause, Cause::Numerical { .. }), "{:?}", failure.cause);
}

/// A shed that never comes true is told, and its mass is carried.
#[test]
fn never_shed() {
    let mut phase = coast(after(1.0));
    phase.sheds = vec![shed(1, Some(compare(Quantity::Altitude, Comparison::AtLeast, 5e3)))];
    let flight = flown(&drop_from(1e3, vec![phase]));
    assert_eq!(flight.notices, [Notice::NeverShed { phase: 0, shed: 0 }]);
    close(get(end(&flight), Quantity::Mass), 15.0, 0.0);
}

/// A shed within a phase happens at its instant; a second crossing within one step is not passed over.
#[test]
fn shed_within() {
    let mut phase = coast(Condition::Touchdown);
    phase.sheds = vec![shed(1, Some(compare(Quantity::Altitude, Comparison::AtMost, 400.0)))];
    let flight = flown(&drop_from(1e3, vec![phase]));
    near(times(&flight, &EventKind::Shed(1))[0], (1200.0 / G0).sqrt(), 1e-9);
    let brief = coast(compare(Quantity::Altitude, Comparison::AtLeast, 999.0));
    let toss =
        mission(flat(G0), state([0.0; 3], [0.0, 0.0, (2.0 * G0 * 1e3).sqrt()]), vec![body(1.0)], vec![brief]);
    near(end(&flown(&toss)).time, ((2e3 / G0).sqrt()) - (2.0 / G0).sqrt(), 1e-9);
}

/// Reserves are kept: as a mass, and as a delta-v of the whole vehicle once the stage is used up.
#[test]
fn reserves() {
    let fly = |reserve| {
        let mut part = stage(300.0, 600.0, engine(1e4, 300.0));
        let propulsion = part.propulsion.as_mut().unwrap();
        propulsion.unusable = value(6.0);
        propulsion.reserve = Some(reserve);
        let start = state([0.0, 0.0, 1.0], [0.0; 3]);
        flown(&mission(flat(0.0), start, vec![part, body(94.0)], vec![burn(&[0], pitch(0.0, 0.0), spent(0))]))
    };
    let mass = fly(Reserve::Mass { mass: value(20.0) });
    close(mass.parts[0].left, 20.0, 1e-9);
    close(mass.parts[0].reserve, 20.0, 1e-9);
    let speed = fly(Reserve::Speed { speed: value(100.0) });
    let expected = 400.0 * (Scalar::exp(100.0 / (300.0 * G0)) - 1.0);
    near(speed.parts[0].left, expected, 1e-9);
    near(get(end(&speed), Quantity::Mass), 400.0 + expected, 1e-12);
}

/// Thrust over the time since ignition, in a burn that is lit later: impulse under a linear curve, a
/// step at every knot, and an end by the curve itself.
#[test]
fn thrust_curve() {
    let mut engine = engine(1.0, 250.0);
    let (times_of, thrust) = ([0.0, 2.0, 8.0, 10.0], [0.0, 2e3, 2e3, 0.0]);
    engine.thrust = Thrust::Curve { curve: curve(&times_of, &thrust, Smoothness::Linear, Beyond::Zero) };
    let parts = vec![stage(100.0, 50.0, engine)];
    let mut phase = burn(&[], pitch(0.0, 0.0), spent(0));
    phase.lights = vec![light(0, 3.0)];
    let flight = flown(&mission(flat(0.0), state([0.0, 0.0, 1.0], [0.0; 3]), parts, vec![phase]));
    close(end(&flight).time, 13.0, 1e-9);
    near(flight.burns[0].propellant, 16e3 / (250.0 * G0), 1e-9);
    for knot in [3.0, 5.0, 11.0] {
        assert!(flight.samples.iter().any(|sample| sample.time == knot), "a step ends at {knot} s");
    }
}

/// A burn that goes on into the next phase is one burn, without a second ignition.
#[test]
fn one_burn_over_phases() {
    let parts = vec![stage(400.0, 600.0, engine(2e4, 250.0))];
    let phases = vec![burn(&[0], Steer::Upright, after(5.0)), burn(&[0], pitch(1.4, 0.0), spent(0))];
    let flight = flown(&mission(flat(G0), pad(0.0, 0.0), parts, phases));
    assert_eq!(times(&flight, &EventKind::Ignition(0)).len(), 1);
    assert_eq!(flight.burns.len(), 1);
    close(flight.burns[0].propellant, 600.0, 1e-9);
}
