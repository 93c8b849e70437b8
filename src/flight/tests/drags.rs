//! Drag against closed forms.

use super::build::{
    G0, after, body, burn, coast, compare, curve, drag, earth, engine, exponential, flat, mission, pad,
    stage, state, value,
};
use super::{close, end, flown, get, near};
use crate::flight::{Cause, Completion, Settings, fly};
use crate::math::Scalar;
use crate::model::{Beyond, Comparison, Condition, Drag, Mission, Phase, Quantity, Smoothness, Steer, World};

/// 80 kg with a drag area of 0.7 m² in air of constant density (an endless scale height).
fn parachutist(velocity: f64, phase: Phase) -> Mission {
    let world = World { air: exponential(1.225, 0.0, 1e30), ..flat(G0) };
    let mut mission =
        mission(world, state([0.0, 0.0, 2e3], [0.0, 0.0, velocity]), vec![body(80.0)], vec![phase]);
    mission.vehicle.drag = drag(0.7);
    mission
}

/// Terminal speed of the same, m/s.
fn terminal() -> f64 {
    (2.0 * 80.0 * G0 / (1.225 * 0.7)).sqrt()
}

/// v = v∞·tanh(g·t/v∞), drop = v∞²/g·ln cosh(g·t/v∞).
#[test]
fn fall_from_rest() {
    let flight = flown(&parachutist(0.0, coast(after(5.0))));
    let x = G0 * 5.0 / terminal();
    let (up, down) = (Scalar::exp(x), Scalar::exp(-x));
    near(get(end(&flight), Quantity::Airspeed), terminal() * (up - down) / (up + down), 1e-9);
    let drop = terminal() * terminal() / G0 * Scalar::ln(0.5 * (up + down));
    near(-get(end(&flight), Quantity::Height), drop, 1e-9);
    near(get(end(&flight), Quantity::Airspeed), 34.927_497_2, 1e-8);
}

/// Thrown up at 100 m/s: v∞²/2g·ln(1 + (v₀/v∞)²) in v∞/g·atan(v₀/v∞).
#[test]
fn throw_against_drag() {
    let flight = flown(&parachutist(100.0, coast(Condition::Apex)));
    near(get(end(&flight), Quantity::Height), 174.125_662, 1e-8);
    near(end(&flight).time, terminal() / G0 * Scalar::atan(100.0 / terminal()), 1e-9);
}

/// Straight entry into exponential air without gravity (H. J. Allen, A. J. Eggers, NACA Report 1381,
/// 1958): v = vₑ·exp(−ρH/(2β·sin γ)), the greatest deceleration at vₑ·e^−½.
#[test]
fn entry() {
    let (speed, path, height): (f64, f64, f64) = (5e3, 30.0_f64.to_radians(), 7200.0);
    let world = World { air: exponential(1.225, 0.0, height), ..flat(0.0) };
    let velocity = [speed * Scalar::cos(path), 0.0, -speed * Scalar::sin(path)];
    let start = state([0.0, 0.0, 200e3], velocity);
    let mut mission = mission(world, start, vec![body(5000.0)], vec![coast(Condition::Touchdown)]);
    mission.vehicle.drag = drag(1.0);
    let flight = flown(&mission);
    let density = |altitude: f64| 1.225 * Scalar::exp(-altitude / height);
    let thinnest = density(200e3);
    let expected = |altitude: f64| {
        let weight = 2.0 * 5000.0 * Scalar::sin(path);
        speed * Scalar::exp(-(density(altitude) - thinnest) * height / weight)
    };
    for sample in &flight.samples {
        near(get(sample, Quantity::Airspeed), expected(get(sample, Quantity::Altitude)), 1e-8);
    }
    let peak = flight.peaks.iter().find(|peak| peak.quantity == Quantity::Acceleration).unwrap();
    // What the air above 200 km would have done is missing from both.
    near(peak.value, 319.339_793, 1e-8);
    near(get(&peak.state, Quantity::Altitude), 9_077.264_19, 1e-6);
    assert!(!peak.corner);
}

/// Thrust less pressure times exit area at every sample, whatever the speed.
#[test]
fn back_pressure() {
    let mut engine = engine(1e6, 320.0);
    engine.exit_area = value(1.2);
    let world = World { air: exponential(0.0, 50e3, 1e30), ..flat(0.0) };
    let parts = vec![stage(20e3, 40e3, engine)];
    let climb = burn(&[0], Steer::Upright, super::build::spent(0));
    let flight = flown(&mission(world, pad(0.0, 0.0), parts, vec![climb]));
    near(get(end(&flight), Quantity::Thrust), 1e6 - 60e3, 1e-12);
    near(flight.ledger.total.back_pressure, 206.855_159, 1e-8);
    near(flight.ledger.total.paid, 3_447.585_98, 1e-8);
}

/// Every knot of a linear curve ends a step, and a curve that is not read beyond its range stops the
/// flight at the knot.
#[test]
fn knots() {
    let world = World { air: exponential(1.225, 0.0, 1e30), ..flat(G0) };
    let fall = |beyond| {
        let start = state([0.0, 0.0, 1e5], [0.0; 3]);
        let mut mission = mission(world.clone(), start, vec![body(5000.0)], vec![coast(after(60.0))]);
        let curve = curve(&[0.0, 0.2, 0.6], &[0.3, 0.3, 0.9], Smoothness::Linear, beyond);
        mission.vehicle.drag = Drag::Curve { curve, reference_area: value(1.0) };
        fly(&mission, &Settings::default())
    };
    let held = fall(Beyond::Hold);
    assert_eq!(held.completion, Completion::Completed);
    for knot in [0.2, 0.6] {
        let at = |sample: &super::Snapshot| (get(sample, Quantity::Mach) - knot).abs() < 1e-9;
        assert!(held.samples.iter().any(at), "a step ends at mach {knot}");
    }
    let Completion::Failed(failure) = fall(Beyond::Refuse).completion else {
        panic!("read beyond its range")
    };
    let Cause::CurveRange { value, low, high, .. } = failure.cause else { panic!("{:?}", failure.cause) };
    close(value, 0.6, 1e-9);
    assert_eq!((low, high), (0.0, 0.6));
}

/// A curve that starts above rest stops a flight that starts at rest.
#[test]
fn below_a_curve() {
    let world = World { air: exponential(1.225, 0.0, 1e30), ..flat(G0) };
    let start = state([0.0, 0.0, 1e5], [0.0; 3]);
    let mut mission = mission(world, start, vec![body(5000.0)], vec![coast(after(60.0))]);
    let curve = curve(&[0.3, 0.6], &[0.3, 0.9], Smoothness::Linear, Beyond::Refuse);
    mission.vehicle.drag = Drag::Curve { curve, reference_area: value(1.0) };
    let Completion::Failed(failure) = fly(&mission, &Settings::default()).completion else {
        panic!("read below its range")
    };
    assert_eq!(failure.cause, Cause::CurveRange { input: Quantity::Mach, value: 0.0, low: 0.3, high: 0.6 });
    assert_eq!(failure.time, 0.0);
}

/// A phase may end at the very end of a curve, if the flight turns back into it from there.
#[test]
fn at_the_end_of_a_curve() {
    let world = World { air: exponential(1.225, 0.0, 1e30), ..flat(0.0) };
    let parts = vec![stage(400.0, 600.0, engine(5e4, 250.0))];
    let boost = burn(&[0], Steer::Upright, compare(Quantity::Mach, Comparison::AtLeast, 1.5));
    let start = state([0.0, 0.0, 1e3], [0.0; 3]);
    let mut mission = mission(world, start, parts, vec![boost, coast(after(5.0))]);
    let curve = curve(&[0.0, 0.7, 1.5], &[0.3, 0.5, 0.4], Smoothness::Smooth, Beyond::Refuse);
    mission.vehicle.drag = Drag::Curve { curve, reference_area: value(0.1) };
    let flight = flown(&mission);
    near(get(&flight.phases[0].end, Quantity::Mach), 1.5, 1e-9);
    assert!(get(end(&flight), Quantity::Mach) < 1.5);
}

/// Air turns with the body: at rest over the ground there is no airspeed, whatever the inertial speed.
#[test]
fn air_turns_with_the_body() {
    let mut mission = mission(earth(), pad(0.0, 20e3), vec![body(100.0)], vec![coast(after(1.0))]);
    mission.vehicle.drag = drag(1.0);
    mission.start = pad(0.0, 20e3);
    let flight = fly(&mission, &Settings::default());
    let start = &flight.phases[0].start;
    close(get(start, Quantity::Airspeed), 0.0, 1e-9);
    close(get(start, Quantity::Drag), 0.0, 1e-9);
    near(get(start, Quantity::InertialSpeed), super::build::SPIN * (super::build::RADIUS + 20e3), 1e-12);
}
