//! Coasts around a body.

use super::build::{J2, MU, RADIUS, after, body, coast, compare, earth, mission, pad, sphere, state, value};
use super::{close, end, flown, get, near};
use crate::model::{Air, Comparison, Condition, Quantity, Start, World};
use crate::world::nodal_rate;

fn orbit(perigee: f64, apogee: f64, inclination: f64) -> Start {
    let zero = value(0.0);
    Start::Orbit {
        perigee: value(perigee),
        apogee: value(apogee),
        inclination: value(inclination),
        node: zero,
        argument: zero,
        anomaly: zero,
    }
}

/// Kepler's third law: after one period an ellipse closes.
#[test]
fn ellipse_closes() {
    let (perigee, apogee) = (200e3, 8000e3);
    let a = RADIUS + 0.5 * (perigee + apogee);
    let period = std::f64::consts::TAU * (a * a * a / MU).sqrt();
    let flight =
        flown(&mission(sphere(), orbit(perigee, apogee, 0.9), vec![body(1.0)], vec![coast(after(period))]));
    let (start, end) = (&flight.phases[0].start, end(&flight));
    for axis in 0..3 {
        close(end.position[axis], start.position[axis], 0.1);
        close(end.velocity[axis], start.velocity[axis], 1e-4);
    }
    close(get(end, Quantity::Perigee), perigee, 1e-2);
    close(get(end, Quantity::Apogee), apogee, 1e-2);
}

/// Half a period from perigee to apogee, found as the fall of vertical speed through zero.
#[test]
fn apex_is_apogee() {
    let flight =
        flown(&mission(sphere(), orbit(200e3, 800e3, 0.3), vec![body(1.0)], vec![coast(Condition::Apex)]));
    let a = RADIUS + 500e3;
    near(end(&flight).time, std::f64::consts::PI * (a * a * a / MU).sqrt(), 1e-9);
    near(get(end(&flight), Quantity::Altitude), 800e3, 1e-9);
}

/// A shot straight up under inverse-square gravity: the energy integral.
#[test]
fn shot_straight_up() {
    let start = state([RADIUS, 0.0, 0.0], [3000.0, 0.0, 0.0]);
    let flight = flown(&mission(sphere(), start, vec![body(1.0)], vec![coast(Condition::Apex)]));
    near(get(end(&flight), Quantity::Height), 494_899.766_2, 1e-9);
}

/// The node drifts by Kaula's first-order rate; what is left is of second order in J2, and short of a
/// whole number of turns a periodic term of first order.
#[test]
fn node_drifts() {
    let world = World { air: Air::None, spin: value(0.0), ..earth() };
    let inclination = 51.6_f64.to_radians();
    let day = 86_400.0;
    let flight =
        flown(&mission(world, orbit(500e3, 500e3, inclination), vec![body(1.0)], vec![coast(after(day))]));
    let drift = get(end(&flight), Quantity::Node) - std::f64::consts::TAU;
    let rate = nodal_rate(MU, RADIUS, J2, RADIUS + 500e3, 0.0, inclination);
    near(drift, rate * day, 5e-3);
    close(get(end(&flight), Quantity::Inclination), inclination, 1e-3);
}

/// Resting on the ground of a turning world: the start has the ground's own speed, and none over it.
#[test]
fn the_ground_turns() {
    let latitude = 0.5;
    let flight = flown(&mission(earth(), pad(latitude, 0.0), vec![body(1.0)], vec![coast(after(0.0))]));
    let start = &flight.phases[0].start;
    close(get(start, Quantity::GroundSpeed), 0.0, 1e-9);
    near(flight.ledger.ground_speed_at_start, get(start, Quantity::InertialSpeed), 1e-12);
    near(get(start, Quantity::Latitude), latitude, 1e-12);
    close(get(start, Quantity::Altitude), 0.0, 1e-6);
}

/// The first of several conditions ends the phase.
#[test]
fn a_comparison_of_elements() {
    let mut fall = coast(compare(Quantity::Altitude, Comparison::AtMost, 300e3));
    fall.until.push(after(1e5));
    let flight = flown(&mission(
        sphere(),
        orbit(200e3, 800e3, 0.3),
        vec![body(1.0)],
        vec![coast(Condition::Apex), fall],
    ));
    assert_eq!(flight.phases[1].ended_by, Some(0));
    near(get(end(&flight), Quantity::Altitude), 300e3, 1e-10);
}
