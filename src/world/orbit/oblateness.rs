//! Secular drift under J2, to first order.
//!
//! Kaula, *Theory of Satellite Geodesy* (1966), eq. 3.74 and the like in every textbook since.

use crate::math::Scalar;

/// Tropical year of 365.2421897 days of 86 400 s: the Sun's mean circuit from equinox to equinox.
pub const SECONDS_PER_YEAR: f64 = 365.242_189_7 * 86_400.0;

/// An oblate body: gravitational parameter in m³/s², equatorial radius in m.
fn scale<S: Scalar>(mu: S, equatorial_radius: S, j2: S, semi_major_axis: S, eccentricity: S) -> S {
    let mean_motion = (mu / semi_major_axis).sqrt() / semi_major_axis;
    let ratio = equatorial_radius / (semi_major_axis * (S::one() - eccentricity.square()));
    mean_motion * j2 * ratio.square() * 1.5
}

/// Mean rate of the ascending node in rad/s.
///
/// `mu` in m³/s², `equatorial_radius` and `semi_major_axis` in m, `inclination` in rad.
pub fn nodal_rate<S: Scalar>(
    mu: S,
    equatorial_radius: S,
    j2: S,
    semi_major_axis: S,
    eccentricity: S,
    inclination: S,
) -> S {
    -(scale(mu, equatorial_radius, j2, semi_major_axis, eccentricity) * inclination.cos())
}

/// Mean rate of the argument of perigee in rad/s; arguments as for [`nodal_rate`].
pub fn perigee_rate<S: Scalar>(
    mu: S,
    equatorial_radius: S,
    j2: S,
    semi_major_axis: S,
    eccentricity: S,
    inclination: S,
) -> S {
    let sin = inclination.sin();
    scale(mu, equatorial_radius, j2, semi_major_axis, eccentricity) * (S::from(2.0) - sin.square() * 2.5)
}

/// Inclination in rad at which the node turns once a `year` (s), eastward, or nothing where no orbit of
/// this size does; other arguments as for [`nodal_rate`].
pub fn sun_synchronous_inclination<S: Scalar>(
    mu: S,
    equatorial_radius: S,
    j2: S,
    semi_major_axis: S,
    eccentricity: S,
    year: S,
) -> Option<S> {
    let wanted = S::from(std::f64::consts::TAU) / year;
    let cos = -(wanted / scale(mu, equatorial_radius, j2, semi_major_axis, eccentricity));
    (cos.real().abs() <= 1.0).then(|| cos.acos())
}
