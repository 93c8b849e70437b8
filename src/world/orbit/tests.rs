//! Orbits against textbook examples. Vallado: *Fundamentals of Astrodynamics and Applications*; Curtis:
//! *Orbital Mechanics for Engineering Students*. Each with the textbook's own μ.

use std::f64::consts::{FRAC_PI_2, PI, TAU};

use super::{Elements, Orbit, eccentric_anomaly, hyperbolic_anomaly};
use crate::math::{Scalar, Vector};
use crate::world::slope::{Slope, assert_slope};

const MU: f64 = 3.986004418e14;
const CURTIS_MU: f64 = 3.986e14;

fn orbit(position: [f64; 3], velocity: [f64; 3], mu: f64) -> Orbit<f64> {
    Orbit::new(Vector(position) * 1e3, Vector(velocity) * 1e3, mu)
}

#[track_caller]
fn close(actual: f64, expected: f64, tolerance: f64) {
    assert!((actual - expected).abs() <= tolerance, "{actual} for {expected}");
}

#[test]
fn circular_orbits() {
    // Closed forms: 7784.2617 m/s and 5309.643 s at 200 km, 5553.6243 s at 400 km.
    for (radius, speed, period) in [(6578137.0, 7784.2617, 5309.643), (6778137.0, 7668.5584, 5553.6243)] {
        let found = Orbit::new(Vector::new(radius, 0.0, 0.0), Vector::new(0.0, 0.0, speed), MU);
        close(found.period(), period, 2e-3);
        close(found.apogee_radius(), radius, 1.0);
        close(found.perigee_radius(), radius, 1.0);
        close(found.inclination(), FRAC_PI_2, 1e-15);
    }
    // A sidereal day of 86164.0905 s is that of a radius of 42164.1696 km.
    let speed = (MU / 42164169.6_f64).sqrt();
    let geostationary = Orbit::new(Vector::new(0.0, 42164169.6, 0.0), Vector::new(-speed, 0.0, 0.0), MU);
    close(geostationary.period(), 86164.0905, 1e-3);
}

#[test]
fn vis_viva() {
    // Energy integral: 8003.79818 m/s at 7000 km on a = 8000 km.
    let found = orbit([7000.0, 0.0, 0.0], [0.0, 8.00379818, 0.0], MU);
    close(found.semi_major_axis(), 8.0e6, 0.1);
    close(found.specific_energy(), -MU / 1.6e7, 1.0);
}

#[test]
fn state_to_elements_of_curtis() {
    // Example 4.3.
    let found = orbit([-6045.0, -3490.0, 2500.0], [-3.457, 6.618, 2.533], CURTIS_MU);
    close(found.angular_momentum().length() / 1e6, 58311.67, 0.01);
    let elements = found.elements();
    close(elements.inclination.to_degrees(), 153.249, 5e-4);
    close(elements.node.to_degrees(), 255.279, 5e-4);
    close(elements.eccentricity, 0.171212, 5e-7);
    close(elements.argument_of_perigee.to_degrees(), 20.068, 5e-4);
    close(elements.true_anomaly.to_degrees(), 28.446, 5e-4);
    close(found.semi_major_axis(), 8788.10e3, 10.0);
    close(elements.semi_major_axis(), found.semi_major_axis(), 1e-7);
}

#[test]
fn state_to_elements_of_vallado() {
    // Example 2-5, recomputed from the state as printed.
    let found = orbit([6524.834, 6862.875, 6448.296], [4.901327, 5.533756, -1.976341], MU);
    close(found.semi_major_axis(), 36127.3376e3, 1.0);
    close(found.semi_latus_rectum(), 11067.798e3, 1.0);
    close(found.eccentricity(), 0.832853, 1e-6);
    close(found.inclination().to_degrees(), 87.869, 1e-3);
    close(found.node().to_degrees(), 227.898, 1e-3);
    close(found.argument_of_perigee().to_degrees(), 53.385, 1e-3);
    close(found.true_anomaly().to_degrees(), 92.335, 1e-3);
}

#[test]
fn elements_to_state() {
    // Curtis, Example 4.7, a hyperbola with h 80000 km²/s.
    let elements = Elements {
        semi_latus_rectum: 8.0e10_f64.square() / CURTIS_MU,
        eccentricity: 1.4,
        inclination: 30f64.to_radians(),
        node: 40f64.to_radians(),
        argument_of_perigee: 60f64.to_radians(),
        true_anomaly: 30f64.to_radians(),
    };
    let (position, velocity) = elements.state(CURTIS_MU);
    let expected = [(-4039.896, -10.3860), (4814.56, -4.7719), (3628.62, 1.7439)];
    for (axis, (kilometres, speed)) in expected.into_iter().enumerate() {
        close(position.0[axis] / 1e3, kilometres, 6e-3);
        close(velocity.0[axis] / 1e3, speed, 6e-5);
    }
    // Vallado, Example 2-6; its inputs are rounded, to some 25 m of position.
    let elements = Elements {
        semi_latus_rectum: 11067.790e3,
        eccentricity: 0.83285,
        inclination: 87.87_f64.to_radians(),
        node: 227.89_f64.to_radians(),
        argument_of_perigee: 53.38_f64.to_radians(),
        true_anomaly: 92.335_f64.to_radians(),
    };
    let (position, velocity) = elements.state(MU);
    let expected = [(6525.344, 4.902276), (6861.535, 5.533124), (6449.125, -1.975709)];
    for (axis, (kilometres, speed)) in expected.into_iter().enumerate() {
        close(position.0[axis] / 1e3, kilometres, 0.03);
        close(velocity.0[axis] / 1e3, speed, 2e-5);
    }
}

#[test]
fn keplers_equation() {
    // Vallado, Examples 2-1 and 2-3.
    let mean = 235.4_f64.to_radians();
    let anomaly = eccentric_anomaly(mean, 0.4).rem_euclid(TAU);
    close(anomaly.to_degrees(), 220.512074767522, 1e-12 * 360.0);
    close(hyperbolic_anomaly(mean, 2.4), 1.601376144, 1e-9);
}

#[test]
fn keplers_equation_for_every_orbit() {
    for e in [0.0, 0.01, 0.5, 0.9, 0.999, 0.999999999] {
        for mean in [-20.0, -PI, -1.0, -1e-9, 0.0, 1e-12, 0.1, 3.0, PI, 4.0, 1e4] {
            let anomaly = eccentric_anomaly(mean, e);
            close(anomaly - e * Scalar::sin(anomaly), mean, 4e-16 * f64::max(4.0, mean.abs()));
        }
    }
    for e in [1.000001, 1.1, 2.0, 50.0] {
        for mean in [-1e6, -3.0, -1e-6, 0.0, 1e-9, 1.0, 200.0] {
            let anomaly = hyperbolic_anomaly(mean, e);
            let sinh = (Scalar::exp(anomaly) - Scalar::exp(-anomaly)) / 2.0;
            close(e * sinh - anomaly, mean, 1e-14 * f64::max(1.0, mean.abs()));
        }
    }
}

#[test]
fn time_along_an_ellipse() {
    // Curtis, Examples 3.1 and 3.2: 4077 s to 120°, and 193.2° three hours after perigee.
    let perigee = Elements::from_apsides(9600e3, 21000e3);
    let there = Elements { true_anomaly: 120f64.to_radians(), ..perigee };
    close(there.time_from_perigee(CURTIS_MU), 4077.045, 1e-3);
    let later = perigee.after(3.0 * 3600.0, CURTIS_MU);
    close(later.true_anomaly.to_degrees(), 193.1557, 1e-4);
}

#[test]
fn time_along_a_parabola() {
    // Curtis, Example 3.4: 10 km/s at perigee, 86 976 km from the centre six hours later.
    let perigee = Elements {
        semi_latus_rectum: 4.0 * CURTIS_MU / 1e8,
        eccentricity: 1.0,
        ..Elements::from_apsides(1.0, 1.0)
    };
    let (position, velocity) = perigee.state(CURTIS_MU);
    close(velocity.length(), 1e4, 1e-9);
    let after = |elements: Elements<f64>| elements.after(6.0 * 3600.0, CURTIS_MU).state(CURTIS_MU).0.length();
    close(after(perigee), 86_976.6e3, 100.0);
    // Its neighbours on both sides differ from it in the first order of e − 1.
    for e in [1.0 - 1e-6, 1.0 + 1e-6] {
        let neighbour =
            Elements { eccentricity: e, semi_latus_rectum: position.length() * (1.0 + e), ..perigee };
        close(after(neighbour), 86_976.6e3, 500.0);
    }
    // A second perigee time: back to where it was.
    let back = perigee.after(-500.0, CURTIS_MU).after(500.0, CURTIS_MU);
    close(Scalar::sin(back.true_anomaly), 0.0, 1e-12);
}

#[test]
fn two_body_motion() {
    // Curtis, Example 3.7 (one hour by universal variables) and Example 5.2 (the far end of its transfer).
    let cases = [
        ([7000.0, -12124.0, 0.0], [2.6679, 4.6210, 0.0], [-3297.769, 7413.40, 0.0], 0.01),
        ([5000.0, 10000.0, 2100.0], [-5.9925, 1.9254, 3.2456], [-14600.03, 2500.1, 6999.9], 0.1),
    ];
    for (position, velocity, expected, tolerance) in cases {
        let start = orbit(position, velocity, CURTIS_MU).elements();
        let (position, _) = start.after(3600.0, CURTIS_MU).state(CURTIS_MU);
        for (axis, kilometres) in expected.into_iter().enumerate() {
            close(position.0[axis] / 1e3, kilometres, tolerance);
        }
    }
}

#[test]
fn elements_and_state_there_and_back() {
    for e in [0.0, 1e-9, 0.3, 0.95, 1.0, 1.7] {
        for inclination in [0.0, 1e-8, 0.9, FRAC_PI_2, 2.5, PI] {
            for true_anomaly in [0.0, 1.0, 2.0, 4.5] {
                if e * Scalar::cos(true_anomaly) <= -0.9 {
                    continue;
                }
                let wanted = Elements {
                    semi_latus_rectum: 9.0e6,
                    eccentricity: e,
                    inclination,
                    node: 1.3,
                    argument_of_perigee: 5.0,
                    true_anomaly,
                };
                let (position, velocity) = wanted.state(MU);
                let found = Orbit::new(position, velocity, MU).elements();
                let (again, speed) = found.state(MU);
                assert!((again - position).length() < 1e-14 * position.length(), "{wanted:?} {found:?}");
                assert!((speed - velocity).length() < 1e-14 * velocity.length(), "{wanted:?} {found:?}");
                close(found.eccentricity, e, 1e-14);
                close(found.inclination, inclination, 1e-14);
            }
        }
    }
}

#[test]
fn singular_orbits_have_their_stated_elements() {
    let speed = (MU / 7.0e6).sqrt();
    let position = Vector::new(0.0, 7.0e6, 0.0);
    let equatorial = Orbit::new(position, Vector::new(-speed, 0.0, 0.0), MU).elements();
    assert_eq!((equatorial.node, equatorial.argument_of_perigee), (0.0, 0.0));
    close(equatorial.true_anomaly, FRAC_PI_2, 1e-15);
    let retrograde = Orbit::new(position, Vector::new(speed, 0.0, 0.0), MU).elements();
    close(retrograde.inclination, PI, 0.0);
    close(retrograde.true_anomaly, 1.5 * PI, 1e-15);
    let polar = Orbit::new(position, Vector::new(0.0, 0.0, speed), MU).elements();
    close(polar.node, FRAC_PI_2, 1e-15);
    close(polar.true_anomaly, 0.0, 1e-15);
    let perigee = Orbit::new(position, Vector::new(-1.2 * speed, 0.0, 0.0), MU);
    close(perigee.argument_of_perigee(), FRAC_PI_2, 1e-15);
}

#[test]
fn escape_and_fall() {
    let position = Vector::new(7.0e6, 0.0, 0.0);
    let escape = (2.0 * MU / 7.0e6).sqrt();
    let hyperbola = Orbit::new(position, Vector::new(0.0, 1.1 * escape, 0.0), MU);
    assert_eq!((hyperbola.apogee_radius(), hyperbola.period()), (f64::INFINITY, f64::INFINITY));
    assert!(hyperbola.semi_major_axis() < 0.0);
    close(hyperbola.perigee_radius(), 7.0e6, 1e-8);
    let fall = Orbit::new(position, Vector::new(-100.0, 0.0, 0.0), MU);
    close(fall.perigee_radius(), 0.0, 0.0);
    close(fall.eccentricity(), 1.0, 1e-15);
    close(fall.true_anomaly(), PI, 1e-15);
    close(fall.apogee_radius(), -MU / fall.specific_energy(), 1e-8);
    let rest = Orbit::new(position, Vector::zero(), MU);
    close(rest.apogee_radius(), 7.0e6, 1e-8);
    assert_eq!((rest.flight_path_angle(), rest.inclination(), rest.node()), (0.0, 0.0, 0.0));
}

#[test]
fn flight_path_angle_is_geocentric() {
    let found = orbit([7000.0, 0.0, 0.0], [1.0, 3.0, 4.0], MU);
    close(found.flight_path_angle(), Scalar::atan2(1.0, 5.0), 1e-15);
}

#[test]
fn derivatives_are_carried() {
    let mu = Slope::from(MU);
    let at = |speed: Slope| {
        let position = Vector::new(6.6e6.into(), 1.0e6.into(), 2.0e6.into());
        Orbit::new(position, Vector::new((-500.0).into(), speed, 3000.0.into()), mu)
    };
    let quantities: [fn(Orbit<Slope>) -> Slope; 10] = [
        |o| o.semi_major_axis(),
        |o| o.eccentricity(),
        |o| o.inclination(),
        |o| o.node(),
        |o| o.argument_of_perigee(),
        |o| o.true_anomaly(),
        |o| o.apogee_radius(),
        |o| o.perigee_radius(),
        |o| o.period(),
        |o| o.flight_path_angle(),
    ];
    for quantity in quantities {
        assert_slope(|speed| quantity(at(speed)), 7300.0, 0.05, 1e-6);
    }
    let mean = Slope::from(2.0);
    assert_slope(|e| eccentric_anomaly(mean, e), 0.4, 1e-5, 1e-8);
    assert_slope(|m| eccentric_anomaly(m, Slope::from(0.4)), 2.0, 1e-5, 1e-8);
    assert_slope(|e| hyperbolic_anomaly(mean, e), 1.4, 1e-5, 1e-8);
    assert_slope(|t| at(Slope::from(7300.0)).elements().after(t, mu).state(mu).0.x(), 2000.0, 0.1, 1e-6);
}

#[test]
fn derivatives_exist_on_circular_and_equatorial_orbits() {
    // Where an element has none, the others keep theirs and no infinity spreads.
    let speed = Slope::variable((MU / 7.0e6).sqrt());
    let position = Vector::new(Slope::from(7.0e6), Slope::zero(), Slope::zero());
    let found = Orbit::new(position, Vector::new(Slope::zero(), speed, Slope::zero()), Slope::from(MU));
    // da/dv = 2a²v/μ = 2a/v at a circle.
    close(found.semi_major_axis().slope, 1.4e7 / speed.value, 1e-6);
    for quantity in [found.apogee_radius(), found.inclination(), found.node(), found.true_anomaly()] {
        assert!(quantity.value.is_finite() && quantity.slope.is_finite());
    }
}
