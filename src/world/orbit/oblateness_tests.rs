//! Secular drift against textbooks and against motion under the full J2 force.

use super::{Elements, Orbit, SECONDS_PER_YEAR, nodal_rate, perigee_rate, sun_synchronous_inclination};
use crate::math::Vector;
use crate::world::Central;

const MU: f64 = 3.986004418e14;
const A: f64 = 6378137.0;
const J2: f64 = 1.08262668e-3;
const DAY: f64 = 86400.0;

#[test]
fn drift_of_curtis() {
    // Curtis, Orbital Mechanics for Engineering Students, Example 4.9: 280 by 400 km, 51.43°, with R 6378 km
    // and J2 1.08263e-3: −5.181 and 3.920 degrees a day.
    let (a, e) = (6718e3, 60.0 / 6718.0);
    let inclination = 51.43_f64.to_radians();
    let node = nodal_rate(3.986e14, 6378e3, 1.08263e-3, a, e, inclination);
    let perigee = perigee_rate(3.986e14, 6378e3, 1.08263e-3, a, e, inclination);
    assert!((node.to_degrees() * DAY + 5.18072).abs() < 2e-3);
    assert!((perigee.to_degrees() * DAY - 3.920).abs() < 2e-3);
}

#[test]
fn perigee_rests_at_the_critical_inclination() {
    // 5·cos²i = 1: 63.4349488°.
    let rate = perigee_rate(MU, A, J2, 8.0e6, 0.1, 63.4349488_f64.to_radians());
    assert!(rate.abs() < 1e-14);
}

#[test]
fn sun_synchronous_orbits() {
    // Closed form on WGS 84 with J2 1.08262982e-3, as in the tables of Wertz & Larson, Space Mission Analysis
    // and Design; Curtis, Example 4.10, is 98.43° at 758.63 km.
    for (altitude, degrees) in [(500e3, 97.40179), (700e3, 98.18796), (758.63e3, 98.4289), (800e3, 98.60309)]
    {
        let found = sun_synchronous_inclination(MU, A, J2, A + altitude, 0.0, SECONDS_PER_YEAR).unwrap();
        assert!((found.to_degrees() - degrees).abs() < 1e-3, "{} at {altitude}", found.to_degrees());
        // 0.98564736 degrees a day.
        let rate = nodal_rate(MU, A, J2, A + altitude, 0.0, found);
        assert!((rate.to_degrees() * DAY - 0.98564736).abs() < 1e-8);
    }
    // The highest one lies at 5974.368 km.
    let at = |altitude| sun_synchronous_inclination(MU, A, J2, A + altitude, 0.0, SECONDS_PER_YEAR);
    assert!(at(5974e3).is_some());
    assert!(at(5975e3).is_none());
}

#[test]
fn node_drifts_so_under_the_force_itself() {
    // One day of a 300 by 420 km orbit by the classical Runge-Kutta method; first-order theory is good to
    // a few J2, and the short-period terms to J2 radians over the drift of the day.
    let field = Central::new(MU, A, &[J2]);
    let start = Elements { inclination: 0.9, node: 2.0, ..Elements::from_apsides(A + 300e3, A + 420e3) };
    let (mut position, mut velocity) = start.state(MU);
    let step = 20.0;
    let steps = 4320;
    let mut drift = 0.0;
    for _ in 0..steps {
        let before = Orbit::new(position, velocity, MU).node();
        (position, velocity) = runge_kutta(&field, position, velocity, step);
        drift += Orbit::new(position, velocity, MU).node() - before;
    }
    let a = start.semi_major_axis();
    let expected = nodal_rate(MU, A, J2, a, start.eccentricity, start.inclination) * step * f64::from(steps);
    assert!((drift / expected - 1.0).abs() < 0.01, "{drift} rad for {expected}");
}

fn runge_kutta(field: &Central<f64>, r: Vector<f64>, v: Vector<f64>, h: f64) -> (Vector<f64>, Vector<f64>) {
    let a1 = field.acceleration(r);
    let (v2, a2) = (v + a1 * (h / 2.0), field.acceleration(r + v * (h / 2.0)));
    let (v3, a3) = (v + a2 * (h / 2.0), field.acceleration(r + v2 * (h / 2.0)));
    let (v4, a4) = (v + a3 * h, field.acceleration(r + v3 * h));
    (r + (v + (v2 + v3) * 2.0 + v4) * (h / 6.0), v + (a1 + (a2 + a3) * 2.0 + a4) * (h / 6.0))
}
