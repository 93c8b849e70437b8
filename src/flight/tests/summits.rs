//! Peaks, demands, aims and figures.

use super::build::{
    G0, after, burn, coast, compare, exponential, flat, hold, mission, number, pad, peak, pitch, reading,
    shed, spent, stage, state, throttled,
};
use super::{close, flown, get, near};
use crate::flight::Flight;
use crate::model::{
    Aim, Comparison, Condition, Demand, Edge, Figure, Formula, Mission, Operator, Place, Quantity,
    Requirement, Steer, World,
};
use crate::quantity::Dimension;

fn place() -> Place {
    Place { file: String::new(), line: 1, column: 1, start: 0, end: 0 }
}

fn plain() -> Dimension {
    Dimension { length: 0, mass: 0, time: 0, temperature: 0, angle: 0 }
}

fn demand(quantity: Formula, requirement: Requirement) -> Demand {
    Demand {
        name: String::new(),
        written: String::new(),
        quantity,
        dimension: plain(),
        unit: String::new(),
        requirement,
        because: None,
        place: place(),
    }
}

fn figure(value: Formula) -> Figure {
    Figure {
        name: String::new(),
        written: String::new(),
        value,
        dimension: plain(),
        unit: String::new(),
        because: None,
        place: place(),
    }
}

/// A climb at 10 m/s² through exponential air without drag.
fn climb(slope: f64) -> Mission {
    let mut phase = burn(&[0], pitch(slope, 0.0), after(120.0));
    phase.hold = hold(Quantity::Acceleration, 10.0);
    let world = World { air: exponential(1.225, 0.0, 7200.0), ..flat(0.0) };
    let start = state([0.0, 0.0, 0.0], [0.0; 3]);
    mission(world, start, vec![stage(500.0, 500.0, throttled(1e5, 400.0, 1e-3))], vec![phase])
}

fn summit(flight: &Flight, quantity: Quantity) -> &crate::flight::Peak {
    flight.peaks.iter().find(|peak| peak.quantity == quantity).unwrap()
}

/// q = ρ₀·a·h·e^(−h/H) is greatest one scale height up: ρ₀·a·H/e, along a slope over its sine.
#[test]
fn greatest_dynamic_pressure() {
    let flight = flown(&climb(0.5 * std::f64::consts::PI));
    let peak = summit(&flight, Quantity::DynamicPressure);
    near(peak.value, 32_446.966_7, 2e-9);
    // A summit is flat: a time near it is known to half the digits of the value.
    near(get(&peak.state, Quantity::Altitude), 7200.0, 1e-6);
    near(peak.state.time, 37.947_3, 1e-5);
    assert!(!peak.corner);
    let slope = flown(&climb(30.0_f64.to_radians()));
    near(summit(&slope, Quantity::DynamicPressure).value, 64_893.933_4, 2e-9);
}

/// A corner is found from the side where it is higher: acceleration before a cut-off, and after a shed.
#[test]
fn corners() {
    let parts = vec![
        stage(200.0, 300.0, throttled(1e4, 300.0, 1.0)),
        stage(100.0, 400.0, throttled(1e4, 300.0, 1.0)),
    ];
    let mut first = burn(&[0], pitch(0.0, 0.0), spent(0));
    first.sheds = vec![shed(0, None)];
    let second = burn(&[1], pitch(0.0, 0.0), after(1.0));
    let start = state([0.0, 0.0, 1e3], [0.0; 3]);
    let mission = mission(flat(0.0), start, parts, vec![first, second, coast(after(10.0))]);
    let flight = flown(&mission);
    let peak = summit(&flight, Quantity::Acceleration);
    near(peak.value, 1e4 / (500.0 - 1e4 / (300.0 * G0)), 1e-9);
    assert!(peak.corner);
    let (first, second) = (&flight.phases[0], &flight.phases[1]);
    near(peak.state.time, second.end.time, 1e-9);
    near(get(&first.end, Quantity::Acceleration), 1e4 / 700.0, 1e-9);
    near(get(&second.start, Quantity::Acceleration), 1e4 / 500.0, 1e-9);
    // Both sides of the jump stand among the samples.
    let at = |sample: &&crate::flight::Snapshot| sample.time == first.end.time;
    let sides: Vec<f64> =
        flight.samples.iter().filter(at).map(|sample| get(sample, Quantity::Acceleration)).collect();
    assert!(sides.iter().any(|side| (side - 1e4 / 700.0).abs() < 1e-9));
    assert!(sides.iter().any(|side| (side - 1e4 / 500.0).abs() < 1e-9));
}

/// Enough states for a plot, in order of time.
#[test]
fn samples() {
    let flight = flown(&climb(1.0));
    assert!(flight.samples.len() >= 400);
    assert!(flight.samples.windows(2).all(|pair| pair[0].time <= pair[1].time));
    assert!(flight.events.windows(2).all(|pair| pair[0].state.time <= pair[1].state.time));
}

/// Margins are positive when a demand is met; of a band the nearer end counts.
#[test]
fn demands() {
    let mut mission = climb(0.5 * std::f64::consts::PI);
    let q = || peak(Quantity::DynamicPressure);
    mission.demands = vec![
        demand(q(), Requirement::AtMost { limit: number(35e3) }),
        demand(q(), Requirement::AtLeast { limit: number(35e3) }),
        demand(
            reading(Quantity::InertialSpeed),
            Requirement::Between { low: number(1190.0), high: number(1300.0) },
        ),
        demand(
            reading(Quantity::InertialSpeed),
            Requirement::Within { target: number(1100.0), tolerance: number(50.0) },
        ),
        demand(reading(Quantity::Apogee), Requirement::AtLeast { limit: number(1.0) }),
    ];
    let flight = flown(&mission);
    let met: Vec<bool> = flight.demands.iter().map(|demand| demand.met).collect();
    assert_eq!(met, [true, false, true, false, false]);
    near(flight.demands[0].margin, 35e3 - 32_446.966_7, 1e-7);
    near(flight.demands[1].margin, 32_446.966_7 - 35e3, 1e-7);
    near(flight.demands[0].time.unwrap(), 37.947_3, 1e-5);
    close(flight.demands[2].margin, 10.0, 1e-6);
    close(flight.demands[2].limit, 1190.0, 0.0);
    close(flight.demands[2].scale, 55.0, 1e-12);
    close(flight.demands[3].margin, -50.0, 1e-6);
    close(flight.demands[3].limit, 1150.0, 1e-12);
    // No orbit on a flat world.
    assert_eq!(flight.demands[4].value, None);
}

/// Figures use those above them and places of phases; aims are hit within their tolerance.
#[test]
fn figures_and_aims() {
    let mut mission = climb(0.5 * std::f64::consts::PI);
    mission.phases.push(coast(after(10.0)));
    let at = |edge| Formula::At { of: Box::new(reading(Quantity::InertialSpeed)), edge, phase: 0 };
    mission.figures = vec![
        figure(at(Edge::End)),
        figure(Formula::Binary {
            operator: Operator::Subtract,
            left: Box::new(Formula::Figure { index: 0 }),
            right: Box::new(at(Edge::Start)),
        }),
        figure(Formula::At { of: Box::new(reading(Quantity::Time)), edge: Edge::End, phase: 9 }),
    ];
    mission.aims = [1200.0, 1201.0]
        .map(|target| Aim {
            written: String::new(),
            quantity: Formula::Figure { index: 1 },
            target: number(target),
            tolerance: number(0.5),
            dimension: plain(),
            unit: String::new(),
            place: place(),
        })
        .to_vec();
    let flight = flown(&mission);
    close(flight.figures[0].value.unwrap(), 1200.0, 1e-6);
    close(flight.figures[1].value.unwrap(), 1200.0, 1e-6);
    assert_eq!(flight.figures[2].value, None);
    assert_eq!(flight.aims.iter().map(|aim| aim.hit).collect::<Vec<_>>(), [true, false]);
}

/// A peak of a phase that lies before the peak of the flight.
#[test]
fn peak_of_one_phase() {
    let parts = vec![stage(500.0, 500.0, throttled(2e4, 300.0, 1.0))];
    let rise = burn(&[0], Steer::Upright, compare(Quantity::Height, Comparison::AtLeast, 1e3));
    let mut mission = mission(
        flat(G0),
        pad(0.0, 0.0),
        parts,
        vec![rise, burn(&[0], Steer::Upright, spent(0)), coast(Condition::Apex)],
    );
    let over = |phase| Formula::Peak { of: Box::new(reading(Quantity::GroundSpeed)), phase };
    mission.figures = vec![figure(over(Some(0))), figure(over(None)), figure(over(Some(2)))];
    let flight = flown(&mission);
    let speed = |phase: usize| get(&flight.phases[phase].end, Quantity::GroundSpeed);
    near(flight.figures[0].value.unwrap(), speed(0), 1e-12);
    near(flight.figures[1].value.unwrap(), speed(1), 1e-12);
    near(flight.figures[2].value.unwrap(), speed(1), 1e-12);
}
