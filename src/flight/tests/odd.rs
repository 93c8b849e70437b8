//! Odd missions: each ends in a flight, whatever it says, and never in a panic or a hang.

use super::build::{light, state, value};
use super::text::{attempt, mission};
use super::{close, flown, near};
use crate::flight::{Cause, Completion, Flight, Settings, fly};
use crate::model::Quantity;

/// 1000 kg of which `propellant` says what burns, in next to no gravity.
fn in_space(stage: &str, phases: &str) -> String {
    format!(
        "world Void {{ gravity uniform 1e-12 m/s^2; surface flat; air none }}
        engine E {{ thrust 50 kN in vacuum; isp 300 s in vacuum; throttle 1 % .. 100 % }}
        stage S {{ engines 1 of E; dry 100 kg; {stage} }}
        stage T {{ engines 1 of E; dry 100 kg; propellant 500 kg }}
        vehicle V {{ stack S, T; drag none }}
        mission M {{
            flies V; within Void; payload 10 kg
            start state x 0 m y 0 m z 1000 km vx 1 m/s vy 0 m/s vz 0 m/s
            {phases}
        }}"
    )
}

fn cause(flight: &Flight) -> &Cause {
    match &flight.completion {
        Completion::Failed(failure) => &failure.cause,
        Completion::Completed => panic!("completed"),
    }
}

/// A stage whose whole load cannot be burnt, or is all reserve, is spent as soon as it is lit.
#[test]
fn nothing_to_burn() {
    let text = in_space("propellant 300 kg", "phase A { burn S; steer keep; until S spent or 5 s }");
    let mut dregs = mission(&text);
    dregs.vehicle.parts[0].propulsion.as_mut().unwrap().unusable = value(300.0);
    close(flown(&dregs).phases[0].end.time, 0.0, 1e-9);
    for stage in ["propellant 300 kg; reserve 300 kg", "propellant 300 kg; reserve 90 km/s"] {
        let flight = flown(&mission(&in_space(
            stage,
            "phase A { burn S; steer keep; until S spent; shed S }
            phase B { burn T; steer keep; until 5 s }",
        )));
        close(flight.phases[0].end.time, 0.0, 1e-9);
        close(flight.parts[0].burnt, 0.0, 1e-6);
        let flight = attempt(&in_space(stage, "phase A { burn S; steer keep; until 5 s }"));
        assert_eq!(*cause(&flight), Cause::RanDry { part: 0 });
    }
}

/// A condition that comes true at the very instant at which a hold begins to act, and a hold in the
/// next phase: it acts there too.
#[test]
fn hold_after_a_tie() {
    for until in ["acceleration >= 6 g0", "thrust_to_weight >= 6", "thrust / mass >= 58.8399 m/s^2"] {
        let flight = flown(&mission(&in_space(
            "propellant 2000 kg",
            &format!(
                "phase A {{ burn S; steer along motion; hold acceleration <= 6 g0 by throttle; until {until} or S spent }}
                phase B {{ burn S; steer keep; hold acceleration <= 6 g0 by throttle; until 5 s or S spent }}"
            ),
        )));
        let peak = flight.peaks.iter().find(|peak| peak.quantity == Quantity::Acceleration).unwrap();
        near(peak.value, 6.0 * 9.80665, 1e-9);
    }
}

/// Up and down within one step, and lower at its end than at its start: the crossing between is found.
/// A throw at 100 m/s from 100 m up is at 590 m after t = (100 − √(100² − 2·g·490))/g, near its apex.
#[test]
fn up_and_down_within_a_step() {
    for target in [590.0, 609.0, 609.8, 609.855] {
        let flight = flown(&mission(
            &format!(
                "world Plain {{ gravity uniform 9.80665 m/s^2; surface flat; air none }}
            stage S {{ dry 100 kg }}
            engine E {{ thrust 1 N in vacuum; isp 100 s in vacuum }}
            stage T {{ engines 1 of E; dry 100 kg; propellant 1 kg }}
            vehicle V {{ stack T; drag none }}
            mission M {{
                flies V; within Plain; payload 0 kg
                start state x 0 m y 0 m z 100 m vx 100 m/s vy 0 m/s vz 100 m/s
                phase Fly {{ coast; until altitude >= {target} m or 20.6 s }}
            }}"
            )
            .replace("stage S { dry 100 kg }", ""),
        ));
        let g = 9.80665;
        let time = (100.0 - (1e4f64 - 2.0 * g * (target - 100.0)).sqrt()) / g;
        assert_eq!(flight.phases[0].ended_by, Some(0), "{target}");
        near(flight.phases[0].end.time, time, 1e-7);
    }
}

/// What is to be lit after the phase has ended is never lit, and what is lit twice is lit once.
#[test]
fn lit_too_late() {
    for (at, burns) in [(9.0, 1), (5.0, 1), (0.0, 2), (-3.0, 2)] {
        let text = in_space("propellant 300 kg", "phase A { burn S; steer keep; until 5 s }");
        let mut mission = mission(&text);
        mission.phases[0].lights = vec![light(1, at), light(1, at), light(0, at)];
        assert_eq!(flown(&mission).burns.len(), burns, "{at}");
    }
}

/// A phase of no length, before and after others.
#[test]
fn phase_of_no_length() {
    let flight = flown(&mission(&in_space(
        "propellant 300 kg",
        "phase A { burn S; steer keep; until 0 s }
        phase B { burn S; steer keep; until time >= 0 s }
        phase C { burn S; steer keep; until 3 s }
        phase D { coast; until 0 s; shed S }
        phase E { coast; until 1 s }",
    )));
    assert_eq!(flight.phases.len(), 5);
    assert_eq!(flight.burns.len(), 1);
    close(flight.phases[4].end.time, 4.0, 1e-12);
    assert!(flight.samples.iter().all(|sample| sample.values[0].is_finite()));
}

/// A vehicle without burns; parts shed that never burnt.
#[test]
fn nothing_burns() {
    let flight = flown(&mission(&in_space(
        "propellant 300 kg",
        "phase A { coast; until 1 s; shed S }
            phase B { coast; until 1 s }",
    )));
    assert!(flight.burns.is_empty());
    close(flight.phases[1].end.get(Quantity::Mass).unwrap(), 610.0, 1e-9);
    assert_eq!(flight.ledger.total.paid, 0.0);
    assert_eq!(flight.ledger.total.ideal, Some(0.0));
}

const ORBIT: &str =
    "orbit perigee 900 km apogee 1000 km inclination 50 deg node 0 deg argument 0 deg anomaly 0 deg";

fn around(world: &str, start: &str, phases: &str) -> String {
    format!(
        "bring Earth from builtin
        world Still {{ gravity central 3.986004418e14 m^3/s^2; equatorial_radius 6378137 m; air none }}
        engine E {{ thrust 50 kN in vacuum; isp 300 s in vacuum; exit_area 0.1 m^2 }}
        stage S {{ engines 1 of E; dry 500 kg; propellant 2000 kg }}
        vehicle V {{ stack S; reference_area 1 m^2; drag 0.5 }}
        mission M {{ flies V; within {world}; payload 10 kg; start {start}
            {phases}
        }}"
    )
}

/// The poles have no east, and yet a pad.
#[test]
fn polar_pads() {
    for latitude in [90, -90] {
        for steer in ["upright", "pitch 60 deg heading 30 deg", "into airflow", "along motion over ground"] {
            let flight = flown(&mission(&around(
                "Earth",
                &format!("pad latitude {latitude} deg longitude 0 deg altitude 0 m"),
                &format!(
                    "phase Up {{ burn S; steer upright; until 1 s }}
            phase On {{ burn S; steer {steer}; until 20 s }}"
                ),
            )));
            assert!(flight.ledger.total.closure().abs() < 1e-6);
            assert!(flight.ledger.ground_speed_at_start < 1e-6);
        }
    }
}

/// Retrograde, exactly equatorial, exactly polar and circular orbits.
#[test]
fn singular_orbits() {
    for inclination in [0, 90, 180] {
        let flight = flown(&mission(&around(
            "Earth",
            &format!(
                "orbit perigee 800 km apogee 800 km inclination {inclination} deg node 0 deg argument 0 deg anomaly 0 deg"
            ),
            "phase Round { coast; until 6000 s }
            phase Burn { burn S; steer along motion; until 10 s }",
        )));
        near(flight.phases[0].end.get(Quantity::Radius).unwrap(), 7_178_137.0, 2e-3);
        assert!(flight.ledger.total.closure().abs() < 1e-6);
    }
}

/// A hundred days in a low orbit end, one way or the other.
#[test]
fn a_hundred_days() {
    let flight = attempt(&around(
        "Still",
        "orbit perigee 900 km apogee 1000 km inclination 50 deg node 0 deg argument 0 deg anomaly 0 deg",
        "phase Round { coast; until 100 day }",
    ));
    assert!(flight.samples.len() < 50_000);
}

/// Starts where nothing is defined: at the centre, within the body, on the ground and at rest, out of
/// all bounds. The checker refuses most of them; the flight ends all the same.
#[test]
fn strange_starts() {
    let starts = [
        ([0.0; 3], [0.0; 3]),
        ([1.0, 0.0, 0.0], [0.0; 3]),
        ([6_378_137.0, 0.0, 0.0], [0.0; 3]),
        ([7e6, 0.0, 0.0], [0.0; 3]),
        ([1e30, 0.0, 0.0], [1e30, 0.0, 0.0]),
        ([0.0, 0.0, 7e6], [0.0, 0.0, -8e3]),
        ([f64::NAN; 3], [0.0; 3]),
        ([f64::MAX; 3], [f64::MAX; 3]),
    ];
    for (position, velocity) in starts {
        for world in ["Earth", "Still"] {
            for phase in [
                "coast; until 1 hour",
                "coast; until touchdown",
                "coast; until apex",
                "burn S; steer along motion; until S spent",
                "burn S; steer into airflow; until apogee >= 1000 km or S spent",
            ] {
                let mut mission = mission(&around(world, ORBIT, &format!("phase A {{ {phase} }}")));
                mission.start = state(position, velocity);
                let flight = fly(&mission, &Settings::default());
                assert_eq!(flight.phases.len(), 1, "{world} {position:?} {phase}");
            }
        }
    }
}

/// A coast that starts on a pad does not go anywhere.
#[test]
fn coast_on_a_pad() {
    for until in ["1 s", "apex", "touchdown", "height >= 1 m", "height <= 0 m", "height falls to 0 m"] {
        let flight = attempt(&around(
            "Earth",
            "pad latitude 10 deg longitude 0 deg altitude 0 m",
            &format!("phase A {{ coast; until {until} }}"),
        ));
        assert!(flight.steps < 1000, "{until}");
    }
}

/// A drag curve over altitude as well is refused beyond its last altitude, as it is beyond its last
/// Mach number.
#[test]
fn the_second_input_of_a_drag_curve_has_a_range_too() {
    let flight = attempt(
        "bring Earth from builtin
         engine Wick { thrust 40 kN in vacuum; isp 250 s in vacuum; exit_area 0.05 m^2 }
         stage Reed { engines 1 of Wick; dry 150 kg; propellant 300 kg }
         curve ReedDrag {
             mach, altitude [km] -> cd
             0  0  0.4
             0  2  0.4
             9  0  0.6
             9  2  0.6
         }
         vehicle Plover { stack Reed; reference_area 0.1 m^2; drag ReedDrag }
         mission Heath {
             flies Plover
             within Earth
             start pad latitude 68 deg longitude 21 deg altitude 300 m
             payload 80 kg
             phase Boost { burn Reed; steer upright; until Reed spent }
         }",
    );
    let Completion::Failed(failure) = &flight.completion else { panic!("{:?}", flight.completion) };
    let Cause::CurveRange { input, value, low, high } = failure.cause else { panic!("{:?}", failure.cause) };
    assert_eq!((input, low, high), (Quantity::Altitude, 0.0, 2000.0));
    assert!(value > 2000.0);
}
