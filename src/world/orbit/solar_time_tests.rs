//! Solar time against its definition, Meeus and the IAU's own software.

use super::solar_time::equation_of_time;
use super::{apparent_solar_time, mean_solar_time};
use crate::world::earth_rotation_angle;

const NOON: f64 = 43_200.0;

#[test]
fn equation_of_time_of_meeus() {
    // Astronomical Algorithms, Example 28.a: 13 min 42.6 s on 1992 October 13, 0 h.
    assert!((equation_of_time(2448908.5) - 822.6).abs() < 3.5);
}

#[test]
fn mean_time_over_greenwich_is_universal_time() {
    // A node over Greenwich at 6 h UT, and one 90° east of it.
    let date = 2461540.5 + 0.25;
    let angle = earth_rotation_angle(date);
    assert!((mean_solar_time(angle, date) - 6.0 * 3600.0_f64).abs() < 1e-4);
    let east = angle + std::f64::consts::FRAC_PI_2;
    assert!((mean_solar_time(east, date) - NOON).abs() < 1e-4);
}

#[test]
fn it_is_noon_under_the_sun() {
    // Right ascension of the Sun from the intermediate origin, by SOFA's epv00, ab and c2i06a (through
    // pyerfa 2.0.1.5). The Almanac's formula is good to 3.5 s of the equation of time.
    let suns = [
        (2461539.8958333335, 0.8838869820485729),
        (2451545.0, 4.909297018022631),
        (2446895.5, 0.318627491223957),
        (2462808.75, 3.8054952879360897),
    ];
    for (date, right_ascension) in suns {
        let miss = apparent_solar_time(right_ascension, date) - NOON;
        assert!(miss.abs() < 3.5_f64, "{miss} s at {date}");
    }
}

#[test]
fn time_stays_within_a_day() {
    for node in [-7.0, 0.0, 3.0, 6.2, 100.0] {
        for date in [2461540.5, 2461540.9, 2461541.49999] {
            assert!((0.0..86_400.0).contains(&mean_solar_time(node, date)));
        }
    }
}
