//! Two-body orbits: osculating elements, the state from them, and the drift that oblateness causes.

mod elements;
mod kepler;
mod oblateness;
mod osculating;
mod solar_time;

pub use elements::Elements;
pub use kepler::{eccentric_anomaly, hyperbolic_anomaly};
pub use oblateness::{SECONDS_PER_YEAR, nodal_rate, perigee_rate, sun_synchronous_inclination};
pub use osculating::Orbit;
pub use solar_time::{apparent_solar_time, mean_solar_time};

use std::f64::consts::TAU;

use crate::math::Scalar;

#[cfg(test)]
mod oblateness_tests;
#[cfg(test)]
mod solar_time_tests;
#[cfg(test)]
mod tests;

/// An angle brought into [0, 2π); infinite and undefined ones stay as they are.
fn turned<S: Scalar>(angle: S) -> S {
    let turns = (angle.real() / TAU).floor();
    if turns == 0.0 || !turns.is_finite() {
        return angle;
    }
    let inside = angle - turns * TAU;
    // A tiny negative angle rounds up to a full turn.
    if inside.real() < TAU { inside } else { inside - TAU }
}
