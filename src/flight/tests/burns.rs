//! Burns against the rocket equation and its relatives.

use super::build::{
    G0, after, body, burn, coast, compare, engine, flat, light, mission, number, pad, pitch, shed, spent,
    stage, state, value,
};
use super::{close, end, flown, get, near};
use crate::math::Scalar;
use crate::model::{Comparison, Condition, Mission, PitchLaw, Quantity, Steer};

/// Straight up in uniform gravity: 1000 kg of which 600 kg burn within `seconds` at an isp of 250 s.
fn straight_up(seconds: f64) -> Mission {
    let thrust = 600.0 / seconds * 250.0 * G0;
    let climb = burn(&[0], Steer::Upright, spent(0));
    let parts = vec![stage(400.0, 600.0, engine(thrust, 250.0))];
    mission(flat(G0), pad(0.0, 0.0), parts, vec![climb, coast(Condition::Apex)])
}

/// Sutton & Biblarz, *Rocket Propulsion Elements*, chapter on vertical flight: speed, height and summit
/// of a burn at constant mass flow.
#[test]
fn vertical_burn() {
    let flight = flown(&straight_up(30.0));
    let burnout = &flight.phases[0].end;
    let (c, n) = (250.0 * G0, 2.5);
    let speed = c * Scalar::ln(n) - G0 * 30.0;
    let height = c * 30.0 * (1.0 - Scalar::ln(n) / (n - 1.0)) - 0.5 * G0 * 900.0;
    near(burnout.time, 30.0, 1e-12);
    near(get(burnout, Quantity::VerticalSpeed), speed, 1e-9);
    near(get(burnout, Quantity::Altitude), height, 1e-9);
    near(get(end(&flight), Quantity::Altitude), height + speed * speed / (2.0 * G0), 1e-9);
    close(get(end(&flight), Quantity::VerticalSpeed), 0.0, 1e-9);
    // The same, in numbers.
    near(get(burnout, Quantity::VerticalSpeed), 1_952.236_126, 1e-9);
    near(get(end(&flight), Quantity::Altitude), 218_526.611_7, 1e-9);
}

/// A faster burn loses less to gravity, g·t; in the limit it rises to c²·ln²n/2g.
#[test]
fn a_faster_burn_rises_higher() {
    let summit = |seconds| get(end(&flown(&straight_up(seconds))), Quantity::Altitude);
    assert!(summit(10.0) > summit(20.0) && summit(20.0) > summit(30.0));
    near(summit(1e-3), 257_298.518, 1e-4);
}

/// Two stages in free space: the sum of the rocket equation's terms, with the jump of mass between.
#[test]
fn stages_add_up() {
    let parts = vec![stage(8e3, 100e3, engine(2e6, 300.0)), stage(2e3, 20e3, engine(2e5, 350.0)), body(3e3)];
    let mut first = burn(&[0], pitch(0.0, 0.0), spent(0));
    first.sheds = vec![shed(0, None)];
    let second = burn(&[1], pitch(0.0, 0.0), spent(1));
    let flight = flown(&mission(flat(0.0), state([0.0, 0.0, 1e3], [0.0; 3]), parts, vec![first, second]));
    near(get(end(&flight), Quantity::InertialSpeed), 9_624.792_927, 1e-9);
    near(flight.ledger.rows[0].paid, 4_100.674_9, 1e-7);
    close(
        get(&flight.phases[0].end, Quantity::Mass) - get(&flight.phases[1].start, Quantity::Mass),
        8e3,
        1e-6,
    );
    let total = &flight.ledger.total;
    close(total.ideal.unwrap(), total.paid, 1e-6);
    close(flight.burns[0].propellant, 100e3, 1e-6);
}

/// Linear-tangent steering at constant acceleration without gravity (D. F. Lawden, *Optimal
/// Trajectories for Space Navigation*, 1963): the speed and the rise have closed forms. An isp so
/// great that hardly any mass is burnt keeps the acceleration.
#[test]
fn linear_tangent() {
    let tan = Scalar::tan(50.0_f64.to_radians());
    let steer = Steer::Pitch {
        pitch: PitchLaw::Tangent { a: number(tan), b: number(-2.0 * tan / 100.0) },
        heading: number(0.0),
        frozen: false,
    };
    let parts = vec![stage(1000.0, 1.0, engine(20.0 * 1001.0, 1e12))];
    let phases = vec![burn(&[0], steer, after(100.0))];
    let flight = flown(&mission(flat(0.0), state([0.0, 0.0, 10.0], [0.0; 3]), parts, phases));
    let sec = (1.0 + tan * tan).sqrt();
    let level = 20.0 * 100.0 / tan * Scalar::ln(sec + tan);
    let rise = 20.0 * 1e4 / (4.0 * tan * tan) * (sec * tan - Scalar::ln(sec + tan));
    near(end(&flight).velocity[1], level, 1e-9);
    close(end(&flight).velocity[2], 0.0, 1e-6);
    near(get(end(&flight), Quantity::Height), rise, 1e-9);
}

/// Gravity turn at constant thrust to weight (G. J. Culler, B. D. Fried, *Universal Gravity Turn
/// Trajectories*, J. Appl. Phys. 28, 1957): v = C·z^(n−1)·(1 + z²), z the tangent of half the angle
/// from the vertical.
#[test]
fn gravity_turn() {
    let angle = 5.0_f64.to_radians();
    let velocity = [50.0 * Scalar::sin(angle), 0.0, 50.0 * Scalar::cos(angle)];
    let parts = vec![stage(1000.0, 1.0, engine(2.0 * G0 * 1001.0, 1e12))];
    let turn = burn(
        &[0],
        Steer::Motion { against: false, over_ground: true },
        compare(Quantity::GroundFlightPathAngle, Comparison::FallsTo, 30.0_f64.to_radians()),
    );
    let flight = flown(&mission(flat(G0), state([0.0, 0.0, 1e3], velocity), parts, vec![turn]));
    near(end(&flight).time, 69.677_645_6, 1e-8);
    near(get(end(&flight), Quantity::GroundSpeed), 879.889_033_9, 1e-9);
    near(flight.ledger.total.paid, 2.0 * G0 * end(&flight).time, 1e-9);
}

/// A landing burn that comes to rest a metre above the ground: the rocket-with-gravity closed form run backwards.
#[test]
fn braking_to_rest() {
    let (g, c, flow) = (1.622, 311.0 * G0, 8000.0 / (311.0 * G0));
    let parts = vec![stage(1000.0, 1000.0, engine(8000.0, 311.0))];
    let brake = burn(&[0], Steer::Upright, compare(Quantity::VerticalSpeed, Comparison::RisesTo, 0.0));
    let start = state([0.0, 0.0, 517.690_465 + 1.0], [0.0, 0.0, -50.0]);
    let flight = flown(&mission(flat(g), start, parts, vec![brake]));
    let t = end(&flight).time;
    near(t, 20.551_630_7, 1e-8);
    close(c * Scalar::ln(2000.0 / (2000.0 - flow * t)) - g * t, 50.0, 1e-8);
    close(get(end(&flight), Quantity::Altitude), 1.0, 1e-5);
    near(flight.burns[0].propellant, 53.908_247, 1e-8);
}

/// Some engines of a stage give their share of thrust and flow.
#[test]
fn engines_out() {
    let mut part = stage(1000.0, 700.0, engine(7e3, 300.0));
    part.propulsion.as_mut().unwrap().engines = value(7.0);
    let mut phase = burn(&[0], pitch(0.0, 0.0), after(1.0));
    phase.burns[0].engines = Some(value(6.0));
    let flight = flown(&mission(flat(0.0), state([0.0, 0.0, 1.0], [0.0; 3]), vec![part], vec![phase]));
    close(get(end(&flight), Quantity::Thrust), 42e3, 1e-9);
    close(flight.burns[0].propellant, 42e3 / (300.0 * G0), 1e-9);
}

/// Two strap-ons beside a core, lit four seconds after it: masses, flow and speed follow in pieces.
#[test]
fn strap_ons_lit_later() {
    let core = stage(1000.0, 3000.0, engine(60e3, 300.0));
    let mut beside = stage(100.0, 200.0, engine(30e3, 250.0));
    beside.count = value(2.0);
    let mut climb = burn(&[0], pitch(0.0, 0.0), after(60.0));
    climb.lights = vec![light(1, 4.0)];
    climb.sheds = vec![shed(1, Some(spent(1)))];
    let start = state([0.0, 0.0, 1.0], [0.0; 3]);
    let flight = flown(&mission(flat(0.0), start, vec![core, beside], vec![climb]));

    let (core, both) = (60e3 / (300.0 * G0), 60e3 / (250.0 * G0));
    let burning = 400.0 / both;
    let m0 = 4600.0;
    let m1 = m0 - 4.0 * core;
    let m2 = m1 - burning * (core + both);
    let m3 = m2 - 200.0;
    let m4 = m3 - (56.0 - burning) * core;
    let speed = 300.0 * G0 * Scalar::ln(m0 / m1)
        + 120e3 / (core + both) * Scalar::ln(m1 / m2)
        + 300.0 * G0 * Scalar::ln(m3 / m4);
    near(get(end(&flight), Quantity::InertialSpeed), speed, 1e-9);
    near(get(end(&flight), Quantity::Mass), m4, 1e-12);
    close(flight.ledger.total.ideal.unwrap(), flight.ledger.total.paid, 1e-6);
    near(flight.parts[1].shed_at.unwrap(), 4.0 + burning, 1e-12);
    close(flight.parts[1].left, 0.0, 1e-9);
}
