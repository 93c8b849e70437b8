//! Local solar time of an orbit's node at the Earth.

use std::f64::consts::TAU;

use crate::math::Scalar;
use crate::world::earth_rotation_angle;

const DAY: f64 = 86_400.0;

/// Mean local solar time of a node at the Earth, in s after midnight, 0 to 86 400.
///
/// `node` is its right ascension in rad in the inertial frame that the Earth rotation angle refers to,
/// and `julian_date` the instant in UT1 (UTC serves). Mean solar time is by definition the universal time plus
/// the longitude, here the node's right ascension less the Earth's angle: no position of the Sun enters.
pub fn mean_solar_time<S: Scalar>(node: S, julian_date: f64) -> S {
    let universal = (julian_date + 0.5).fract() * DAY;
    wrapped((node - earth_rotation_angle(julian_date)) * (DAY / TAU) + universal)
}

/// Apparent local solar time of a node, in s after midnight: that of a sundial. Arguments as for
/// [`mean_solar_time`]; good to a few seconds from 1950 to 2050.
pub fn apparent_solar_time<S: Scalar>(node: S, julian_date: f64) -> S {
    wrapped(mean_solar_time(node, julian_date) + equation_of_time(julian_date))
}

/// Apparent less mean solar time in s, from the low-precision position of the Sun in the *Astronomical
/// Almanac*, page C5: its mean longitude less its right ascension, both for the equinox of date.
pub(super) fn equation_of_time(julian_date: f64) -> f64 {
    let days = julian_date - 2_451_545.0;
    let mean_longitude = 280.460 + 0.985_647_4 * days;
    let anomaly = (357.528 + 0.985_600_3 * days).to_radians();
    let centre = 1.915 * Scalar::sin(anomaly) + 0.020 * Scalar::sin(2.0 * anomaly);
    let longitude = (mean_longitude + centre).to_radians();
    let obliquity = (23.439 - 0.000_000_4 * days).to_radians();
    let right_ascension =
        Scalar::atan2(Scalar::cos(obliquity) * Scalar::sin(longitude), Scalar::cos(longitude));
    let turns = (mean_longitude.to_radians() - right_ascension) / TAU;
    (turns - turns.round()) * DAY
}

fn wrapped<S: Scalar>(seconds: S) -> S {
    seconds - (seconds.real() / DAY).floor() * DAY
}
