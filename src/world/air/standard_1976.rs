//! U.S. Standard Atmosphere, 1976.

use super::AirState;
use crate::math::Scalar;

/// m
pub(super) const TOP: f64 = 1.0e6;

pub(super) const LAYER_ALTITUDES: [f64; 1] = [TOP];

/// The air at a geodetic altitude in m, or nothing above [`TOP`].
pub(super) fn at<S: Scalar>(altitude: S) -> Option<AirState<S>> {
    let thinned = (-(altitude / 8434.5)).exp();
    (altitude.real() <= TOP).then(|| AirState {
        density: thinned * 1.225,
        pressure: thinned * 101_325.0,
        sound_speed: S::from(340.294),
        temperature: S::from(288.15),
    })
}
