//! The angle of the Earth at an instant.

use std::f64::consts::TAU;

/// Julian date of the epoch J2000, 2000 January 1, 12 h.
const J2000: f64 = 2_451_545.0;

/// Earth rotation angle in rad, 0 to 2π, at a Julian date of UT1 (UTC serves, to within 0.9 s).
///
/// IAU 2000 Resolution B1.8; IERS Conventions (2010), eq. 5.15. The fraction of the day is taken from
/// the date itself, which keeps its digits.
pub fn earth_rotation_angle(julian_date: f64) -> f64 {
    let days = julian_date - J2000;
    let turns = 0.779_057_273_264_0 + 0.002_737_811_911_354_48 * days + days.fract();
    (turns - turns.floor()) * TAU
}
