//! Worked examples of textbooks, written as missions.

use super::text::mission;
use super::{close, flown, near};
use crate::flight::Flight;
use crate::model::Quantity;

fn coast(mu: f64, start: &str, until: &str) -> Flight {
    flown(&mission(&format!(
        "world Still {{ gravity central {mu} m^3/s^2; equatorial_radius 6378 km; air none }}
        engine E {{ thrust 1 N in vacuum; isp 100 s in vacuum }}
        stage S {{ engines 1 of E; dry 500 kg; propellant 1 kg }}
        vehicle V {{ stack S; drag none }}
        mission M {{
            flies V; within Still; payload 10 kg
            start {start}
            phase Coast {{ coast; until {until} }}
        }}"
    )))
}

fn of(flight: &Flight, quantity: Quantity) -> f64 {
    flight.phases[0].end.get(quantity).unwrap()
}

fn degrees(flight: &Flight, quantity: Quantity) -> f64 {
    of(flight, quantity).to_degrees()
}

/// H. D. Curtis, *Orbital Mechanics for Engineering Students*, 3rd ed., examples 3.1 and 3.2: 9600 by
/// 21 000 km, 4077 s from perigee to 120°, and 193.2° three hours after it.
#[test]
fn time_since_perigee() {
    let start =
        "orbit perigee 3222 km apogee 14622 km inclination 30 deg node 0 deg argument 0 deg anomaly 0 deg";
    let flight = coast(3.986e14, start, "true_anomaly >= 120 deg");
    close(of(&flight, Quantity::Time), 4077.045, 1e-2);
    close(of(&flight, Quantity::Period), 18_834.3, 0.1);
    close(of(&flight, Quantity::Eccentricity), 0.372_55, 1e-5);
    let flight = coast(3.986e14, start, "3 hour");
    close(degrees(&flight, Quantity::TrueAnomaly), 193.1557, 1e-3);
}

/// Curtis, example 4.3 (printed: 8788 km, 0.1712, 153.2°, 255.3°, 20.07°, 28.45°).
#[test]
fn elements_of_a_retrograde_orbit() {
    let start = "state x -6045 km y -3490 km z 2500 km vx -3.457 km/s vy 6.618 km/s vz 2.533 km/s";
    let flight = coast(3.986e14, start, "0 s");
    near(of(&flight, Quantity::SemiMajorAxis), 8788.10e3, 1e-6);
    close(of(&flight, Quantity::Eccentricity), 0.171_212, 1e-6);
    close(degrees(&flight, Quantity::Inclination), 153.249, 1e-3);
    close(degrees(&flight, Quantity::Node), 255.279, 1e-3);
    close(degrees(&flight, Quantity::ArgumentOfPerigee), 20.068, 1e-3);
    close(degrees(&flight, Quantity::TrueAnomaly), 28.446, 1e-3);
}

/// D. A. Vallado, *Fundamentals of Astrodynamics and Applications*, example 2-5.
#[test]
fn elements_of_an_eccentric_orbit() {
    let start =
        "state x 6524.834 km y 6862.875 km z 6448.296 km vx 4.901327 km/s vy 5.533756 km/s vz -1.976341 km/s";
    let flight = coast(3.986_004_418e14, start, "0 s");
    near(of(&flight, Quantity::SemiMajorAxis), 36_127_337.6, 1e-6);
    close(of(&flight, Quantity::Eccentricity), 0.832_853, 1e-6);
    close(degrees(&flight, Quantity::Inclination), 87.869, 1e-3);
    close(degrees(&flight, Quantity::Node), 227.898, 1e-3);
    close(degrees(&flight, Quantity::ArgumentOfPerigee), 53.385, 1e-3);
    close(degrees(&flight, Quantity::TrueAnomaly), 92.335, 1e-3);
}

/// Curtis, examples 3.7 (an hour to −3297.8, 7413.4 km) and 5.2 (Lambert's problem flown forward).
#[test]
fn two_bodies_for_an_hour() {
    let start = "state x 7000 km y -12124 km z 0 km vx 2.6679 km/s vy 4.6210 km/s vz 0 km/s";
    let end = coast(3.986e14, start, "60 minute").phases[0].end.clone();
    for (found, printed) in end.position.into_iter().zip([-3297.769e3, 7413.40e3, 0.0]) {
        close(found, printed, 10.0);
    }
    for (found, printed) in end.velocity.into_iter().zip([-8297.6, -964.0, 0.0]) {
        close(found, printed, 0.1);
    }
    let start = "state x 5000 km y 10000 km z 2100 km vx -5.9925 km/s vy 1.9254 km/s vz 3.2456 km/s";
    let end = coast(3.986e14, start, "1 hour").phases[0].end.clone();
    // The printed velocity has five digits: half of its last is 0.2 km after an hour.
    for (found, printed) in end.position.into_iter().zip([-14_600e3, 2500e3, 7000e3]) {
        close(found, printed, 1e3);
    }
}

/// Curtis, example 4.7: elements to the state of a hyperbola, (−4040, 4815, 3629) km, flown backwards
/// in the table: its state gives e = 1.4 at 30° of true anomaly, and stays on the branch.
#[test]
fn hyperbola() {
    let start = "state x -4039.896 km y 4814.560 km z 3628.625 km vx -10.38599 km/s vy -4.771922 km/s vz 1.743875 km/s";
    let flight = coast(3.986e14, start, "0 s");
    close(of(&flight, Quantity::Eccentricity), 1.4, 1e-5);
    close(degrees(&flight, Quantity::Inclination), 30.0, 1e-3);
    close(degrees(&flight, Quantity::Node), 40.0, 1e-3);
    close(degrees(&flight, Quantity::ArgumentOfPerigee), 60.0, 1e-3);
    close(degrees(&flight, Quantity::TrueAnomaly), 30.0, 1e-3);
    let later = coast(3.986e14, start, "1 hour");
    near(of(&later, Quantity::SpecificEnergy), of(&flight, Quantity::SpecificEnergy), 1e-9);
    near(of(&later, Quantity::Eccentricity), of(&flight, Quantity::Eccentricity), 1e-8);
}

/// Circular speed and Kepler's third law with the WGS 84 parameter: 7784.2617 m/s and 5309.643 s at
/// 200 km, 5553.6243 s at 400 km; the energy integral at 7000 km on 8000 km.
#[test]
fn circular_orbits() {
    for (altitude, speed, period) in [(200.137, 7784.2617, 5309.643), (400.137, 7668.5577, 5553.6243)] {
        let start = format!(
            "orbit perigee {altitude} km apogee {altitude} km inclination 0 deg node 0 deg argument 0 deg anomaly 0 deg"
        );
        let flight = coast(3.986_004_418e14, &start, &format!("{period} s"));
        near(of(&flight, Quantity::InertialSpeed), speed, 1e-6);
        near(of(&flight, Quantity::Period), period, 1e-6);
        let back = &flight.phases[0];
        // A millisecond of the printed period is eight metres.
        back.start.position.iter().zip(back.end.position).for_each(|(from, to)| close(to, *from, 8.0));
    }
    let start =
        "orbit perigee 622 km apogee 2622 km inclination 0 deg node 0 deg argument 0 deg anomaly 0 deg";
    let flight = coast(3.986_004_418e14, start, "0 s");
    near(of(&flight, Quantity::InertialSpeed), 8_003.798_18, 1e-8);
}

/// R. R. Bate, D. D. Mueller, J. E. White, *Fundamentals of Astrodynamics*, ch. 6: with Q = v²r/μ = 0.8
/// and a flight-path angle of (180° − ψ)/4 the free flight spans ψ = 83.62°, its greatest.
#[test]
fn ballistic_range() {
    let (mu, radius) = (3.986e14, 6378e3);
    let speed = (0.8f64 * mu / radius).sqrt();
    let (sin, cos) = (libm::sin(24.094_84f64.to_radians()), libm::cos(24.094_84f64.to_radians()));
    let start =
        format!("state x {radius} m y 0 m z 0 m vx {} m/s vy {} m/s vz 0 m/s", speed * sin, speed * cos);
    let flight = coast(mu, &start, "touchdown");
    near(of(&flight, Quantity::Downrange) / radius, 83.620_63f64.to_radians(), 1e-6);
    near(of(&flight, Quantity::InertialSpeed), speed, 1e-8);
}

/// A flat trajectory in vacuum, 500 m/s at 40°: range v²·sin 2γ/g, apex (v·sin γ)²/2g, time 2v·sin γ/g.
#[test]
fn flat_trajectory() {
    let (sin, cos) = (libm::sin(40f64.to_radians()), libm::cos(40f64.to_radians()));
    let flight = flown(&mission(&format!(
        "world Plain {{ gravity uniform 9.80665 m/s^2; surface flat; air none }}
        engine E {{ thrust 1 N in vacuum; isp 100 s in vacuum }}
        stage S {{ engines 1 of E; dry 500 kg; propellant 1 kg }}
        vehicle V {{ stack S; drag none }}
        mission M {{
            flies V; within Plain; payload 10 kg
            start state x 0 m y 0 m z 0 m vx {} m/s vy 0 m/s vz {} m/s
            phase Up {{ coast; until apex }}
            phase Down {{ coast; until touchdown }}
        }}",
        500.0 * cos,
        500.0 * sin
    )));
    near(of(&flight, Quantity::Altitude), 5_266.527_19, 1e-8);
    near(flight.phases[1].end.get(Quantity::Downrange).unwrap(), 25_105.610_81, 1e-8);
    near(flight.phases[1].end.time, 65.546_095, 1e-8);
}

/// The ground's own speed at the equator is ω·a = 465.101 m/s (WGS 84), and 409.05 m/s at the geodetic
/// latitude of 28.5° on the ellipsoid.
#[test]
fn speed_of_the_ground() {
    for (latitude, speed) in [(0.0, 465.1011), (28.5, 409.05)] {
        let flight = flown(&mission(&format!(
            "bring Earth from builtin
            engine E {{ thrust 50 kN in vacuum; isp 300 s in vacuum; exit_area 0 m^2 }}
            stage S {{ engines 1 of E; dry 500 kg; propellant 1 t }}
            vehicle V {{ stack S; drag none }}
            mission M {{
                flies V; within Earth; payload 10 kg
                start pad latitude {latitude} deg longitude 30 deg altitude 0 m
                phase Up {{ burn S; steer upright; until 1 s }}
            }}"
        )));
        close(flight.ledger.ground_speed_at_start, speed, 5e-3);
        close(flight.phases[0].start.get(Quantity::InertialSpeed).unwrap(), speed, 5e-3);
        close(flight.phases[0].start.get(Quantity::InertialHeading).unwrap().to_degrees(), 90.0, 1e-9);
    }
}

/// Vallado, example 6-1: 191.344 11 to 35 781.348 57 km, 2.457 038 and 1.478 187 km/s in 315.403 minutes
/// (a = 6378.1363 km there). Burns of a few thousandths of a second are as good as impulses.
#[test]
fn hohmann() {
    let (low, high) = (6_569_480.41, 42_159_484.87);
    let (first, second) = (2457.038, 1478.187);
    let engine = 1e9;
    let flight = flown(&mission(&format!(
        "world Still {{ gravity central 3.986004415e14 m^3/s^2; equatorial_radius 6378136.3 m; air none }}
        engine E {{ thrust {engine:e} N in vacuum; isp 300 s in vacuum }}
        stage S {{ engines 1 of E; dry 100 kg; propellant 900 kg }}
        vehicle V {{ stack S; drag none }}
        mission M {{
            flies V; within Still; payload 0 kg
            start orbit perigee 191.34411 km apogee 191.34411 km inclination 0 deg node 0 deg argument 0 deg anomaly 0 deg
            phase Kick {{ burn S; steer along motion; until apogee >= 35781.34857 km or S spent }}
            phase Rise {{ coast; until apex }}
            phase Round {{ burn S; steer along motion; until perigee >= 35781.348 km or S spent }}
        }}"
    )));
    close(flight.ledger.rows[0].paid, first, 2e-3);
    close(flight.ledger.rows[2].paid, second, 2e-3);
    close((flight.phases[1].end.time - flight.phases[0].end.time) / 60.0, 315.403, 1e-3);
    near(flight.phases[0].start.get(Quantity::Radius).unwrap(), low, 1e-9);
    near(flight.phases[2].end.get(Quantity::Radius).unwrap(), high, 1e-6);
}
