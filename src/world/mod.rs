//! Force environments and the geometry of bodies: gravity, air, ellipsoid, spin, orbits and dates.
//!
//! Everything is generic over [`crate::math::Scalar`] and knows nothing of models or flights.

mod air;
mod geodesy;
mod gravity;
mod orbit;
mod root;
#[cfg(test)]
mod slope;

pub use air::{Air, AirState, Exponential};
pub use geodesy::{
    Axes, DateError, DateTime, Ellipsoid, Geodetic, Local, Rotation, Spin, Surface, earth_rotation_angle,
};
pub use gravity::{Central, Gravity, MAX_DEGREE};
pub use orbit::{
    Elements, Orbit, SECONDS_PER_YEAR, apparent_solar_time, eccentric_anomaly, hyperbolic_anomaly,
    mean_solar_time, nodal_rate, perigee_rate, sun_synchronous_inclination,
};

/// The worlds that ship with the compiler, in the language itself.
pub const BUILTIN: &str = include_str!("builtin.wright");

#[cfg(test)]
mod builtin_tests;
