//! The account of delta-v.

use super::build::{
    G0, after, burn, coast, compare, curve, earth, engine, flat, hold, mission, number, pad, pitch, shed,
    spent, stage, state, throttled, value,
};
use super::{close, end, flown, get, near};
use crate::flight::{Flight, Frame, LedgerRow, Settings, fly};
use crate::math::Scalar;
use crate::model::{Beyond, Comparison, Drag, Mission, PitchLaw, Quantity, Smoothness, Steer};

/// Thrust 5° off the velocity throughout: the loss is 1 − cos 5° of what the propellant pays.
#[test]
fn steering_at_a_constant_angle() {
    // Along the velocity the direction does not change, so that the angle has to be kept by turning the
    // start: a velocity that the thrust can hardly bend.
    let angle = 5.0_f64.to_radians();
    let parts = vec![stage(1000.0, 1.0, engine(1e-3, 300.0))];
    let start = state([0.0, 0.0, 1e3], [0.0, 7000.0, 0.0]);
    let flight = flown(&mission(flat(0.0), start, parts, vec![burn(&[0], pitch(angle, 0.0), after(100.0))]));
    let total = &flight.ledger.total;
    near(total.steering / total.paid, 1.0 - Scalar::cos(angle), 1e-6);
}

/// Straight up the whole account is known: c·ln n is paid, g·t is lost, the rest is gained.
#[test]
fn vertical_account() {
    let parts = vec![stage(400.0, 600.0, engine(600.0 / 30.0 * 250.0 * G0, 250.0))];
    let flight = flown(&mission(flat(G0), pad(0.0, 0.0), parts, vec![burn(&[0], Steer::Upright, spent(0))]));
    let total = &flight.ledger.total;
    near(total.paid, 2_246.435_626, 1e-9);
    near(total.gravity, G0 * 30.0, 1e-9);
    close(total.steering, 0.0, 1e-9);
    close(total.drag + total.back_pressure, 0.0, 0.0);
    close(total.closure(), 0.0, 1e-7);
}

/// Two stages from the turning Earth through its air, with holds, sheds and a coast.
fn to_space() -> Mission {
    let mut lower = throttled(43e3, 304.0, 0.55);
    lower.exit_area = value(0.047);
    let mut upper = engine(27e3, 334.0);
    upper.exit_area = value(0.21);
    let mut first = stage(1534.0, 16_900.0, lower);
    first.propulsion.as_mut().unwrap().engines = value(7.0);
    let parts = vec![first, stage(325.0, 3100.0, upper), super::build::body(60.0)];
    let rise = burn(&[0], Steer::Upright, compare(Quantity::Height, Comparison::AtLeast, 400.0));
    let kick = burn(&[0], pitch(88.5_f64.to_radians(), 1.6), after(8.0));
    let mut turn = burn(&[0], Steer::Motion { against: false, over_ground: true }, spent(0));
    turn.hold = hold(Quantity::Acceleration, 4.0 * G0);
    turn.sheds = vec![shed(0, None)];
    let tilt = Steer::Pitch {
        pitch: PitchLaw::Rate { from: number(0.6), rate: number(-0.1_f64.to_radians()) },
        heading: number(1.6),
        frozen: true,
    };
    let mut push = burn(&[1], tilt, spent(1));
    push.sheds = vec![shed(2, Some(compare(Quantity::Heating, Comparison::AtMost, 1135.0)))];
    let phases = vec![rise, kick, turn, coast(after(3.0)), push, coast(after(600.0))];
    let mut mission = mission(earth(), pad(0.5, 20.0), parts, phases);
    mission.payload = value(100.0);
    let curve =
        curve(&[0.0, 0.8, 1.1, 2.0, 5.0], &[0.31, 0.34, 0.62, 0.45, 0.27], Smoothness::Linear, Beyond::Hold);
    mission.vehicle.drag = Drag::Curve { curve, reference_area: value(1.8) };
    mission
}

fn columns(row: &LedgerRow) -> [f64; 6] {
    [row.paid, row.back_pressure, row.steering, row.drag, row.gravity, row.gained]
}

fn account(flight: &Flight) -> Vec<LedgerRow> {
    flight.ledger.rows.iter().copied().chain([flight.ledger.total]).collect()
}

/// Every row closes, what is paid is the rocket equation's, and a flight at a far closer tolerance
/// gives the same columns.
#[test]
fn closes() {
    for frame in [Frame::BodyFixed, Frame::Inertial] {
        let at =
            |tolerance| fly(&to_space(), &Settings { tolerance, frame: Some(frame), ..Settings::default() });
        let (usual, closer) = (at(1e-9), at(1e-12));
        for (row, better) in account(&usual).iter().zip(account(&closer)) {
            close(row.closure(), 0.0, 1e-6);
            close(row.ideal.unwrap(), row.paid, 1e-6);
            for (column, better) in columns(row).into_iter().zip(columns(&better)) {
                close(column, better, 1e-5);
            }
        }
        assert!(usual.ledger.total.drag > 10.0 && usual.ledger.total.back_pressure > 10.0);
    }
}

/// The rows add up to the total, and the quantities of the flight's end tell the same.
#[test]
fn rows_add_up() {
    let flight = flown(&to_space());
    let mut sum = [0.0; 6];
    for row in &flight.ledger.rows {
        for (sum, column) in sum.iter_mut().zip(columns(row)) {
            *sum += column;
        }
    }
    for (sum, total) in sum.into_iter().zip(columns(&flight.ledger.total)) {
        close(sum, total, 1e-8);
    }
    let told = [
        (Quantity::PaidDeltaV, flight.ledger.total.paid),
        (Quantity::GravityLoss, flight.ledger.total.gravity),
        (Quantity::DragLoss, flight.ledger.total.drag),
        (Quantity::SteeringLoss, flight.ledger.total.steering),
        (Quantity::BackPressureLoss, flight.ledger.total.back_pressure),
    ];
    for (quantity, total) in told {
        close(get(end(&flight), quantity), total, 1e-8);
    }
}

/// Loaded propellant is accounted for to the gram, and the mass at the end follows.
#[test]
fn propellant_adds_up() {
    let mut mission = to_space();
    mission.vehicle.parts[0].propulsion.as_mut().unwrap().unusable = value(118.3);
    let flight = flown(&mission);
    for part in &flight.parts {
        close(part.burnt + part.left + part.unusable, part.loaded, 1e-6);
    }
    let (upper, payload) = (&flight.parts[1], 100.0);
    let carried = upper.dry_basic + upper.dry_growth + upper.left + upper.unusable;
    close(get(end(&flight), Quantity::Mass), carried + payload, 1e-6);
    let burnt: f64 = flight.burns.iter().map(|burn| burn.propellant).sum();
    close(burnt, flight.parts.iter().map(|part| part.burnt).sum(), 1e-6);
}

/// The same mission gives the same bits.
#[test]
fn same_bits() {
    let (one, other) = (flown(&to_space()), flown(&to_space()));
    assert_eq!(one.samples.len(), other.samples.len());
    for (a, b) in one.samples.iter().zip(&other.samples) {
        let bits =
            |state: &super::Snapshot| state.values.iter().map(|value| value.to_bits()).collect::<Vec<_>>();
        assert_eq!(bits(a), bits(b));
    }
}
